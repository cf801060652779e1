package twofold.picture;

/**
 * A surface that pictures are drawn on. All a drawing may ask for; the surface knows its {@link Theme} and turns inks into
 * colours. Coordinates in px, x to the right, y down; calls paint over what earlier calls painted.
 *
 * <p>Point buffers belong to the caller, who reuses them after the call: an implementation copies what it keeps.
 */
public interface Painter {
    /** A straight line. */
    void line(double x1, double y1, double x2, double y2, Stroke stroke);

    /**
     * A line through points, with round joins.
     *
     * @param points at least two
     * @param closed whether it leads back to the first
     * @param stroke how
     */
    void polyline(Points points, boolean closed, Stroke stroke);

    /**
     * A filled polygon that does not cross itself.
     *
     * @param points at least three
     * @param ink of what
     * @param alpha 0 nothing to 1 opaque
     */
    void polygon(Points points, Ink ink, double alpha);

    /**
     * Unconnected straight lines, in one go.
     *
     * @param points in pairs: begin, end
     * @param stroke how
     */
    void segments(Points points, Stroke stroke);

    /**
     * Small squares round points, in one go.
     *
     * @param points their middles
     * @param side of the squares, px
     * @param ink of what
     */
    void dots(Points points, double side, Ink ink);

    /**
     * A line of text on its baseline.
     *
     * @param text without line breaks
     * @param x of the anchor
     * @param y of the baseline at the anchor
     * @param type size and weight
     * @param ink of what
     * @param anchor which point of the text stands at x
     * @param degrees turned about the anchor, clockwise as seen
     */
    void text(String text, double x, double y, Type type, Ink ink, Anchor anchor, double degrees);

    /** A line of text on a level baseline. */
    default void text(String text, double x, double y, Type type, Ink ink, Anchor anchor) {
        text(text, x, y, type, ink, anchor, 0);
    }

    /**
     * A rectangle of cells with hard edges, each of one colour whatever the theme.
     *
     * @param x of its upper left corner
     * @param y of its upper left corner
     * @param width px
     * @param height px
     * @param columns of cells
     * @param rows of cells
     * @param argb 0xAARRGGBB, row by row from the top; with alpha 0 nothing is painted
     */
    void image(double x, double y, double width, double height, int columns, int rows, int[] argb);

    /**
     * Begins a pane: until {@link #pop}, (0, 0) is its upper left corner, and nothing is painted outside. Panes nest.
     *
     * @param x of its upper left corner
     * @param y of its upper left corner
     * @param width px
     * @param height px
     */
    void push(double x, double y, double width, double height);

    /** Ends the pane begun last. */
    void pop();

    /**
     * Hatches a polygon that does not cross itself. The lines belong to the pane, not to the polygon, so neighbours join.
     *
     * @param points at least three
     * @param hatch which way and how dense
     * @param stroke of the lines
     */
    default void hatch(Points points, Hatch hatch, Stroke stroke) {
        Points lines = hatch.lines(points);
        if (lines.size() > 0) {
            segments(lines, stroke);
        }
    }
}
