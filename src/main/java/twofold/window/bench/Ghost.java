package twofold.window.bench;

import java.util.Optional;
import twofold.design.Kind;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Point;
import twofold.edit.Edit;
import twofold.edit.MirrorEdits;
import twofold.edit.PartEdits;
import twofold.layout.Laid;
import twofold.layout.Leg;

/** A new part at the pointer, before it is placed. */
final class Ghost {
    private Ghost() {}

    /**
     * What placing a part at a point of the table does: it goes on the nearest leg; a mirror folds that to the point's side.
     *
     * @param reach how far from the leg the point may be, m
     * @return empty where no leg is within reach
     */
    static Optional<Edit> at(Laid laid, Kind kind, Point point, double reach) {
        Leg nearest = null;
        Leg.Foot foot = null;
        for (Leg leg : laid.legs()) {
            Leg.Foot here = leg.nearest(point);
            if (here.distance() <= reach && (foot == null || here.distance() < foot.distance())) {
                nearest = leg;
                foot = here;
            }
        }
        if (nearest == null || foot == null) {
            return Optional.empty();
        }
        Place leg = Place.of(name(laid, nearest.from()), name(laid, nearest.to()));
        return Optional.of(
                kind == Kind.MIRROR
                        ? MirrorEdits.insert(leg, foot.path(), foot.side())
                        : PartEdits.insert(kind, leg, foot.path()));
    }

    private static String name(Laid laid, int part) {
        Part found = laid.design().parts().get(part);
        return found.name();
    }
}
