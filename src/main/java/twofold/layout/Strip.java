package twofold.layout;

import java.util.ArrayList;
import java.util.List;
import twofold.design.Point;

/**
 * A straight stretch of beam as seen from above, whose half width follows a hyperbola.
 *
 * @param leg number of the leg
 * @param start path from the leg's beginning to the stretch's, m
 * @param length of the stretch, m
 * @param waist half width at the waist, m
 * @param after path from the stretch's beginning to the waist, m
 * @param rayleigh path from the waist to where the half width is √2 as large, m
 */
public record Strip(int leg, double start, double length, double waist, double after, double rayleigh) {
    /**
     * Step of the outline in asinh of the path over the Rayleigh length: a chord then lies outside the hyperbola by at most
     * step²/8, 5e-5, of the half width.
     */
    private static final double STEP = 0.02;

    double halfWidth(double path) {
        return waist * Math.hypot(1, (path - after) / rayleigh);
    }

    double widest() {
        return Math.max(halfWidth(0), halfWidth(length));
    }

    /** Paths from the stretch's beginning at which an outline by chords is true to 5e-5 of the half width. */
    List<Double> samples() {
        double low = asinh(-after / rayleigh);
        double high = asinh((length - after) / rayleigh);
        int steps = Math.max(1, (int) Math.ceil((high - low) / STEP));
        List<Double> paths = new ArrayList<>();
        for (int i = 0; i <= steps; i++) {
            double path = after + rayleigh * Math.sinh(low + (high - low) * i / steps);
            paths.add(i == 0 ? 0 : i == steps ? length : path);
        }
        return paths;
    }

    private static double asinh(double x) {
        return Math.signum(x) * Math.log(Math.abs(x) + Math.hypot(1, x));
    }

    /**
     * The gap to a convex polygon, m. Where they overlap: minus the way across the beam by which the polygon would have to
     * move to clear it.
     *
     * @param corners of the polygon
     * @param from where the stretch begins on the table
     * @param u unit vector along the beam
     * @param atMost where the gap is larger, this is the answer
     */
    double gap(List<Point> corners, Point from, Point u, double atMost) {
        List<Point> local = corners.stream()
                .map(c -> new Point(
                        (c.x() - from.x()) * u.x() + (c.y() - from.y()) * u.y(),
                        (c.y() - from.y()) * u.x() - (c.x() - from.x()) * u.y()))
                .toList();
        double above = Double.POSITIVE_INFINITY;
        double below = Double.POSITIVE_INFINITY;
        // Half width is convex in the path, so what lies between polygon and beam is least at a corner.
        for (Point p : clipped(local)) {
            above = Math.min(above, p.y() - halfWidth(p.x()));
            below = Math.min(below, -p.y() - halfWidth(p.x()));
        }
        double across = Math.max(above, below);
        return across <= 0 ? across : outline(local, Math.min(across, atMost));
    }

    /** The part of a polygon beside the stretch, as corners. */
    private List<Point> clipped(List<Point> corners) {
        List<Point> inside = new ArrayList<>();
        for (int i = 0; i < corners.size(); i++) {
            Point a = corners.get(i);
            Point b = corners.get((i + 1) % corners.size());
            if (a.x() >= 0 && a.x() <= length) {
                inside.add(a);
            }
            for (double limit : new double[] {0, length}) {
                if ((a.x() - limit) * (b.x() - limit) < 0) {
                    inside.add(new Point(limit, a.y() + (limit - a.x()) / (b.x() - a.x()) * (b.y() - a.y())));
                }
            }
        }
        return inside;
    }

    /**
     * The distance from a polygon that does not overlap, in the stretch's own frame, to the stretch.
     *
     * @param atMost a distance that it does not exceed; what is further away by its extent alone is not measured
     */
    private double outline(List<Point> corners, double atMost) {
        double left = corners.stream().mapToDouble(Point::x).min().orElse(0);
        double right = corners.stream().mapToDouble(Point::x).max().orElse(0);
        double below = corners.stream().mapToDouble(Point::y).min().orElse(0);
        double above = corners.stream().mapToDouble(Point::y).max().orElse(0);
        if (Math.hypot(
                        Math.max(0, Math.max(left - length, -right)),
                        Math.max(0, Math.max(below - widest(), -above - widest())))
                >= atMost) {
            return atMost;
        }
        double least = atMost;
        List<Double> paths = samples();
        for (int i = 1; i < paths.size(); i++) {
            double a = paths.get(i - 1);
            double b = paths.get(i);
            double wa = halfWidth(a);
            double wb = halfWidth(b);
            double w = Math.max(wa, wb);
            double along = Math.max(0, Math.max(left - b, a - right));
            double across = Math.max(0, Math.max(below - w, -above - w));
            if (Math.hypot(along, across) >= least) {
                continue;
            }
            least = Math.min(
                    least,
                    Convex.gap(
                            corners,
                            List.of(new Point(a, -wa), new Point(b, -wb), new Point(b, wb), new Point(a, wa))));
        }
        return least;
    }
}
