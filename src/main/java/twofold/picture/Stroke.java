package twofold.picture;

/**
 * How a line is drawn.
 *
 * @param ink of what
 * @param width px
 * @param dash its rhythm
 * @param alpha 0 nothing to 1 opaque
 */
public record Stroke(Ink ink, double width, Dash dash, double alpha) {
    /** A solid opaque line. */
    public static Stroke of(Ink ink, double width) {
        return new Stroke(ink, width, Dash.SOLID, 1);
    }

    /** An opaque line. */
    public static Stroke of(Ink ink, double width, Dash dash) {
        return new Stroke(ink, width, dash, 1);
    }
}
