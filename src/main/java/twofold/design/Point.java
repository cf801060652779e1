package twofold.design;

/**
 * A place on the table, seen from above.
 *
 * @param x to the right, m
 * @param y up, m
 */
public record Point(double x, double y) {
    /** Has no negative zeros: one place, one point. */
    public Point {
        x += 0.0;
        y += 0.0;
    }

    /** The distance to another place, m. */
    public double distance(Point other) {
        return Math.hypot(other.x - x, other.y - y);
    }
}
