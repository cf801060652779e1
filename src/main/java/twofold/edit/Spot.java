package twofold.edit;

import java.util.Optional;
import twofold.design.Design;
import twofold.design.Place;
import twofold.design.Point;
import twofold.design.Turn;
import twofold.layout.Laid;
import twofold.layout.Leg;

/**
 * The place on the beam's axis that is nearest to a point of the table, such as where a pointer is.
 *
 * @param leg its two mirrors along the beam
 * @param along path from the mirror that the leg leaves, m
 * @param side of the beam on which the point lies, looking along it; a point on the axis lies to the left
 * @param distance from the point to the axis, m
 */
public record Spot(Place leg, double along, Turn side, double distance) {
    /** The spot nearest to a point. */
    public static Spot nearest(Laid laid, Point to) {
        Optional<Spot> best = Optional.empty();
        for (Leg leg : laid.legs()) {
            for (int i = 1; i < leg.bends().size(); i++) {
                Spot spot = on(
                        laid.design(), leg, leg.bends().get(i - 1), leg.bends().get(i), to);
                if (best.isEmpty() || spot.distance() < best.get().distance()) {
                    best = Optional.of(spot);
                }
            }
        }
        return best.orElseThrow();
    }

    /** The spot on a straight stretch of a leg. */
    private static Spot on(Design design, Leg leg, Leg.Bend a, Leg.Bend b, Point to) {
        double x = b.at().x() - a.at().x();
        double y = b.at().y() - a.at().y();
        double rx = to.x() - a.at().x();
        double ry = to.y() - a.at().y();
        double square = x * x + y * y;
        double share = square > 0 ? Math.max(0, Math.min(1, (rx * x + ry * y) / square)) : 0;
        Point nearest = new Point(a.at().x() + share * x, a.at().y() + share * y);
        return new Spot(
                Place.of(
                        design.parts().get(leg.from()).name(),
                        design.parts().get(leg.to()).name()),
                a.path() + share * (b.path() - a.path()),
                x * ry - y * rx < 0 ? Turn.RIGHT : Turn.LEFT,
                nearest.distance(to));
    }
}
