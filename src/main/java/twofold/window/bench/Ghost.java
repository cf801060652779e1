package twofold.window.bench;

import java.util.Optional;
import twofold.design.Kind;
import twofold.design.Point;
import twofold.edit.Edit;
import twofold.edit.MirrorEdits;
import twofold.edit.PartEdits;
import twofold.edit.Spot;
import twofold.layout.Laid;

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
        Spot spot = Spot.nearest(laid, point);
        if (spot.distance() > reach) {
            return Optional.empty();
        }
        return Optional.of(
                kind == Kind.MIRROR
                        ? MirrorEdits.insert(spot.leg(), spot.along(), spot.side())
                        : PartEdits.insert(kind, spot.leg(), spot.along()));
    }
}
