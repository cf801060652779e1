package twofold.design;

/**
 * A place on the table, seen from above.
 *
 * @param x to the right, m
 * @param y up, m
 */
public record Point(double x, double y) {
    /** The distance to another place, m. */
    public double distance(Point other) {
        return Math.hypot(other.x - x, other.y - y);
    }
}
