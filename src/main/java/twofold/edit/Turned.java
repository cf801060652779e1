package twofold.edit;

import twofold.design.Point;

/** Points turned about others. */
final class Turned {
    private Turned() {}

    /**
     * A point turned about another.
     *
     * @param angle rad, counter-clockwise
     */
    static Point about(Point centre, Point point, double angle) {
        double cos = Math.cos(angle);
        double sin = Math.sin(angle);
        double x = point.x() - centre.x();
        double y = point.y() - centre.y();
        return new Point(centre.x() + cos * x - sin * y, centre.y() + sin * x + cos * y);
    }
}
