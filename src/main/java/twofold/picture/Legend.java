package twofold.picture;

import java.util.ArrayList;
import java.util.List;

/** What signs mean, sign and words side by side, in as many rows as it takes. */
final class Legend {
    /** How wide and high a sign is, px. */
    static final double WIDE = 24;

    static final double HIGH = 10;

    private static final double ROW = 16;
    private static final double GAP = 16;

    /** Draws a sign with its upper left corner at a place. */
    interface Sign {
        /** Draws it, {@link #WIDE} × {@link #HIGH} px. */
        void draw(Painter painter, double x, double y);
    }

    /** In a pane lower than this every row counts, px. */
    private static final double LOW = 320;

    /** With more rows than this the short words are taken. */
    private final int most;

    private record Item(Sign sign, String words) {
        double width() {
            return WIDE + 6 + Lettering.width(words, Type.SMALL);
        }
    }

    private final List<Item> items = new ArrayList<>();
    private final List<Item> brief = new ArrayList<>();

    /** An empty legend of a pane of a height, px. */
    Legend(double paneHeight) {
        most = paneHeight < LOW ? 1 : 2;
    }

    /** Adds a sign with what it means, and with the same in fewer words. */
    void add(String words, String few, Sign sign) {
        items.add(new Item(sign, words));
        brief.add(new Item(sign, few));
    }

    /** How high it is in a width, px. */
    double height(double width) {
        return ROW * rows(width).size();
    }

    private List<List<Item>> rows(double width) {
        List<List<Item>> rows = rows(items, width);
        return rows.size() > most ? rows(brief, width) : rows;
    }

    private static List<List<Item>> rows(List<Item> items, double width) {
        List<List<Item>> rows = new ArrayList<>();
        double used = Double.POSITIVE_INFINITY;
        for (Item item : items) {
            if (used + item.width() > width) {
                rows.add(new ArrayList<>());
                used = 0;
            }
            rows.get(rows.size() - 1).add(item);
            used += item.width() + GAP;
        }
        return rows;
    }

    /** Draws it with its upper left corner at a place. */
    void draw(Painter painter, double left, double top, double width) {
        double base = top + 11;
        for (List<Item> row : rows(width)) {
            double x = left;
            for (Item item : row) {
                item.sign().draw(painter, x, base - 9);
                painter.text(
                        Lettering.cut(item.words(), Type.SMALL, left + width - x - WIDE - 6),
                        x + WIDE + 6,
                        base,
                        Type.SMALL,
                        Ink.QUIET,
                        Anchor.START);
                x += item.width() + GAP;
            }
            base += ROW;
        }
    }
}
