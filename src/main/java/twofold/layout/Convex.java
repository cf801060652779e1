package twofold.layout;

import java.util.List;
import twofold.design.Point;

/** Distances between convex polygons on the table, corners counter-clockwise. */
final class Convex {
    private Convex() {}

    /**
     * The distance between two polygons, m; where they overlap, minus the shortest way to move them apart.
     */
    static double gap(List<Point> a, List<Point> b) {
        double apart = Math.max(widest(a, b), widest(b, a));
        if (apart <= 0) {
            return apart;
        }
        double least = Double.POSITIVE_INFINITY;
        for (int i = 0; i < a.size(); i++) {
            for (int j = 0; j < b.size(); j++) {
                least = Math.min(
                        least, segments(a.get(i), a.get((i + 1) % a.size()), b.get(j), b.get((j + 1) % b.size())));
            }
        }
        return least;
    }

    /** The widest separation along an outward normal of the first polygon's sides; negative where none separates. */
    private static double widest(List<Point> a, List<Point> b) {
        double widest = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < a.size(); i++) {
            Point p = a.get(i);
            Point q = a.get((i + 1) % a.size());
            double length = p.distance(q);
            if (length == 0) {
                continue;
            }
            double nx = (q.y() - p.y()) / length;
            double ny = (p.x() - q.x()) / length;
            double nearest = Double.POSITIVE_INFINITY;
            for (Point c : b) {
                nearest = Math.min(nearest, nx * (c.x() - p.x()) + ny * (c.y() - p.y()));
            }
            widest = Math.max(widest, nearest);
        }
        return widest;
    }

    /** The distance between two segments that do not cross. */
    private static double segments(Point a, Point b, Point c, Point d) {
        return Math.min(
                Math.min(toSegment(a, c, d), toSegment(b, c, d)), Math.min(toSegment(c, a, b), toSegment(d, a, b)));
    }

    /** The distance from a point to a segment. */
    static double toSegment(Point p, Point a, Point b) {
        double dx = b.x() - a.x();
        double dy = b.y() - a.y();
        double square = dx * dx + dy * dy;
        double share = square > 0 ? ((p.x() - a.x()) * dx + (p.y() - a.y()) * dy) / square : 0;
        double s = Math.min(1, Math.max(0, share));
        return Math.hypot(p.x() - a.x() - s * dx, p.y() - a.y() - s * dy);
    }
}
