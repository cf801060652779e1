package twofold.picture;

/**
 * A rectangle on the table, m, y up.
 *
 * @param left least x
 * @param bottom least y
 * @param right largest x
 * @param top largest y
 */
public record Box(double left, double bottom, double right, double top) {
    /** Its width, m. */
    public double width() {
        return right - left;
    }

    /** Its height, m. */
    public double height() {
        return top - bottom;
    }
}
