package twofold.command;

import java.util.ArrayList;
import java.util.List;

/** Aligned text: the first column to the left, all others to the right. */
final class Table {
    private static final String BETWEEN = "  ";

    private final List<List<String>> rows = new ArrayList<>();

    Table row(String... cells) {
        rows.add(List.of(cells));
        return this;
    }

    boolean isEmpty() {
        return rows.isEmpty();
    }

    /** The rows as lines, each after an indent. */
    String text(String indent) {
        int columns = rows.stream().mapToInt(List::size).max().orElse(0);
        int[] widths = new int[columns];
        for (List<String> row : rows) {
            for (int c = 0; c < row.size(); c++) {
                widths[c] = Math.max(widths[c], length(row.get(c)));
            }
        }
        StringBuilder text = new StringBuilder();
        for (List<String> row : rows) {
            StringBuilder line = new StringBuilder(indent);
            for (int c = 0; c < row.size(); c++) {
                String blanks = " ".repeat(widths[c] - length(row.get(c)));
                line.append(c > 0 ? BETWEEN : "");
                line.append(c == 0 ? row.get(c) + blanks : blanks + row.get(c));
            }
            text.append(line.toString().stripTrailing()).append('\n');
        }
        return text.toString();
    }

    private static int length(String cell) {
        return cell.codePointCount(0, cell.length());
    }
}
