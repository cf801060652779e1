package twofold.file;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.Collectors;
import twofold.design.Unit;

/**
 * Tables as RFC 4180 has them, in UTF-8 with a line feed behind each row: a header, then numbers in its units. A number is
 * the shortest decimal that reads back to the same double; an undefined one is an empty cell.
 */
public final class Csv {
    private Csv() {}

    /**
     * A column.
     *
     * @param name what it holds
     * @param unit of its numbers
     */
    public record Column(String name, Unit unit) {
        String title() {
            return unit.symbol().isEmpty() ? name : name + " (" + unit.symbol() + ")";
        }
    }

    /** The header row, with its line end. */
    public static String header(List<Column> columns) {
        return columns.stream().map(c -> cell(c.title())).collect(Collectors.joining(",", "", "\n"));
    }

    /** A text as a cell: quoted where it holds a comma, a quote or a line end. */
    public static String cell(String text) {
        boolean plain = text.chars().noneMatch(c -> c == ',' || c == '"' || c == '\n' || c == '\r');
        return plain ? text : '"' + text.replace("\"", "\"\"") + '"';
    }

    /**
     * Writes a number's cell.
     *
     * @param si in SI; NaN and infinities leave the cell empty
     * @param unit of its column
     * @param to takes the text
     */
    public static void number(double si, Unit unit, StringBuilder to) {
        if (Double.isFinite(si)) {
            unit.append(si, to);
        }
    }

    /** Rows as bytes. */
    public static byte[] bytes(CharSequence rows) {
        return rows.toString().getBytes(StandardCharsets.UTF_8);
    }
}
