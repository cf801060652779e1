package twofold.layout;

import java.util.List;
import twofold.design.Point;

/**
 * The smallest rectangle along x and y that holds all footprints of a plan.
 *
 * @param left least x, m
 * @param right largest x, m
 * @param front least y, m
 * @param back largest y, m
 */
public record Box(double left, double right, double front, double back) {
    /** The box round a plan. */
    public static Box of(Laid laid) {
        List<Point> corners =
                Footprint.of(laid).stream().flatMap(f -> f.corners().stream()).toList();
        return new Box(
                corners.stream().mapToDouble(Point::x).min().orElse(Double.NaN),
                corners.stream().mapToDouble(Point::x).max().orElse(Double.NaN),
                corners.stream().mapToDouble(Point::y).min().orElse(Double.NaN),
                corners.stream().mapToDouble(Point::y).max().orElse(Double.NaN));
    }

    /** Its extent in x, m. */
    public double width() {
        return right - left;
    }

    /** Its extent in y, m. */
    public double depth() {
        return back - front;
    }
}
