package twofold.session;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SplittableRandom;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Kind;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.design.Turn;
import twofold.edit.Edit;
import twofold.edit.MirrorEdits;
import twofold.edit.Nudges;
import twofold.edit.PartEdits;
import twofold.file.PartText;
import twofold.layout.Follow;
import twofold.layout.Laid;
import twofold.layout.Leg;

/** Edits of every kind, by a seed. Some are refused, as a person's are. */
final class RandomEdits {
    /** With more parts than so many, parts are deleted rather than added. */
    private static final int MANY = 14;

    private static final List<Kind> OTHERS = List.of(Kind.LENS, Kind.PLATE, Kind.CRYSTAL, Kind.APERTURE, Kind.MATRIX);

    private final SplittableRandom random;
    private Optional<Edit> last = Optional.empty();

    RandomEdits(long seed) {
        random = new SplittableRandom(seed);
    }

    private double any(double most) {
        return random.nextDouble(-most, most);
    }

    private <T> T one(List<T> of) {
        return of.get(random.nextInt(of.size()));
    }

    /** An edit of a design; a nudge often comes again. */
    Edit next(Laid laid) {
        if (last.isPresent() && last.get().joins() && random.nextInt(3) > 0) {
            return last.get();
        }
        Edit edit = edit(laid);
        last = Optional.of(edit);
        return edit;
    }

    private Edit edit(Laid laid) {
        Design design = laid.design();
        Part part = one(design.parts());
        String name = part.name();
        Mirror mirror = one(design.mirrors());
        Leg leg = one(laid.legs());
        Place place = Place.of(
                design.parts().get(leg.from()).name(),
                design.parts().get(leg.to()).name());
        Follow follow = one(List.of(Follow.values()));
        Turn side = one(List.of(Turn.values()));
        boolean isFull = design.parts().size() > MANY;
        Optional<String> behind = random.nextBoolean() ? Optional.of(name) : Optional.empty();
        return switch (random.nextInt(18)) {
            case 0 -> Edits.move(mirror.name(), any(1e-4), any(1e-4));
            case 1 -> Edits.nudge(mirror.name(), any(1e-5), any(1e-5));
            case 2 -> Nudges.by(mirror.name(), any(1e-4), any(1e-4), follow);
            case 3 -> Nudges.along(name, any(1e-4));
            case 4 -> Nudges.turn(name, any(2e-3));
            case 5 ->
                MirrorEdits.moveTo(
                        mirror.name(),
                        new Point(mirror.at().x() + any(1e-3), mirror.at().y() + any(1e-3)),
                        follow);
            case 6 -> MirrorEdits.x(mirror.name(), mirror.at().x() + any(1e-4), follow);
            case 7 -> MirrorEdits.leg(place, leg.path() + any(1e-4));
            case 8 ->
                MirrorEdits.incidence(
                        mirror.name(),
                        Math.toRadians(random.nextDouble(3, 20)),
                        // In a ring no arm follows parallel to itself.
                        design.shape() == Shape.RING ? Optional.empty() : Optional.of(follow));
            case 9 ->
                isFull
                        ? PartEdits.delete(List.of(name))
                        : MirrorEdits.insert(place, random.nextDouble(leg.path()), side);
            case 10, 11 ->
                isFull
                        ? PartEdits.delete(List.of(name))
                        : PartEdits.insert(one(OTHERS), place, random.nextDouble(leg.path()));
            case 12 -> PartEdits.delete(List.of(name));
            case 13 -> isFull ? PartEdits.delete(List.of(name)) : PartEdits.duplicate(List.of(name));
            case 14 -> PartEdits.rename(name, "Part " + random.nextInt(40));
            case 15 -> PartEdits.reorder(List.of(name), random.nextBoolean());
            case 16 ->
                isFull
                        ? PartEdits.delete(List.of(name))
                        : PartEdits.paste(
                                PartText.read(PartText.of(List.of(part))).parts(), behind);
            default -> number(part);
        };
    }

    /** A number of a part a little larger or smaller. */
    private Edit number(Part part) {
        List<Field> numbers = new ArrayList<>();
        part.values().stated().forEach((field, value) -> {
            if (value instanceof Double d && Double.isFinite(d)) {
                numbers.add(field);
            }
        });
        if (numbers.isEmpty()) {
            return PartEdits.rename(part.name(), part.name());
        }
        Field field = one(numbers);
        double now = (Double) part.values().find(field).orElseThrow();
        return Edits.set(part.name(), field, now * (1 + any(0.01)));
    }
}
