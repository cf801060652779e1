package twofold.edit;

import java.util.Optional;
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
            Leg.Foot foot = leg.nearest(to);
            if (best.isEmpty() || foot.distance() < best.get().distance()) {
                Place between = Place.of(name(laid, leg.from()), name(laid, leg.to()));
                best = Optional.of(new Spot(between, foot.path(), foot.side(), foot.distance()));
            }
        }
        return best.orElseThrow();
    }

    private static String name(Laid laid, int part) {
        return laid.design().parts().get(part).name();
    }
}
