package twofold.edit;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SplittableRandom;
import java.util.stream.IntStream;
import twofold.design.Bound;
import twofold.design.Design;
import twofold.design.Entry;
import twofold.design.Field;
import twofold.design.Hold;
import twofold.design.Kind;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Point;
import twofold.design.Quantity;
import twofold.design.Shape;
import twofold.design.Tolerance;
import twofold.design.Turn;
import twofold.layout.Follow;
import twofold.layout.Laid;

/** Edits of every kind at random, sensible and not, from one seed. */
final class RandomEdits {
    /** From so many parts on, more go than come. */
    private static final int MANY = 14;

    private static final List<String> JUNK = List.of("", "2,5", "abc", "-1", "1e9", "5 kg", "∞", "brewster", "0");

    private final SplittableRandom random;
    private Laid now;

    RandomEdits(long seed, Laid start) {
        random = new SplittableRandom(seed);
        now = start;
    }

    /** Every kind of edit, each by its own name. */
    enum Sort {
        INSERT,
        INSERT_BEHIND,
        FOLD,
        DELETE,
        DUPLICATE,
        PASTE,
        RENAME,
        REORDER,
        SLIDE,
        TYPE,
        CLEAR,
        STATE,
        SHAPE,
        DRAG,
        PLACE,
        LEG,
        INCIDENCE,
        NUDGE,
        TURN,
        HOLD,
        REQUIREMENT,
        LEVER,
        TOLERANCE
    }

    Sort sort() {
        return now.design().parts().size() > MANY && random.nextInt(3) == 0 ? Sort.DELETE : any(List.of(Sort.values()));
    }

    /** An edit of a sort for a plan. */
    Edit of(Sort sort, Laid laid) {
        now = laid;
        return switch (sort) {
            case INSERT -> PartEdits.insert(kind(false), leg(), along());
            case INSERT_BEHIND -> PartEdits.insertBehind(kind(true), part().name(), any(List.of(Turn.values())));
            case FOLD -> MirrorEdits.insert(leg(), along(), any(List.of(Turn.values())));
            case DELETE -> PartEdits.delete(parts(3));
            case DUPLICATE -> PartEdits.duplicate(parts(2));
            case PASTE ->
                PartEdits.paste(
                        parts(2).stream().map(this::named).toList(),
                        random.nextBoolean() ? Optional.of(part().name()) : Optional.empty());
            case RENAME ->
                PartEdits.rename(
                        part().name(), random.nextInt(5) == 0 ? part().name() : "Part " + random.nextInt(1000));
            case REORDER -> PartEdits.reorder(parts(2), random.nextBoolean());
            case SLIDE -> PartEdits.slide(part().name(), along());
            case TYPE -> typed();
            case CLEAR -> clear();
            case STATE -> stated();
            case SHAPE -> FieldEdits.shape(any(List.of(Shape.values())));
            case DRAG -> MirrorEdits.moveTo(mirror().name(), near(mirror().at()), follow());
            case PLACE -> place();
            case LEG -> MirrorEdits.leg(leg(), random.nextDouble(0.02, 0.8), some(follow()));
            case INCIDENCE ->
                MirrorEdits.incidence(mirror().name(), Math.toRadians(random.nextDouble(0, 60)), some(follow()));
            case NUDGE ->
                random.nextBoolean()
                        ? Nudges.by(mirror().name(), step(), step(), follow())
                        : Nudges.along(part().name(), step());
            case TURN -> Nudges.turn(part().name(), Math.toRadians(random.nextDouble(-1, 1)));
            case HOLD -> hold();
            case REQUIREMENT -> requirement();
            case LEVER -> lever();
            case TOLERANCE -> tolerance();
        };
    }

    private <T> T any(List<T> list) {
        return list.get(random.nextInt(list.size()));
    }

    private <T> Optional<T> some(T one) {
        return random.nextBoolean() ? Optional.of(one) : Optional.empty();
    }

    private Design design() {
        return now.design();
    }

    private Part part() {
        return any(design().parts());
    }

    private Part named(String name) {
        return design().parts().get(design().indexOf(name).orElseThrow());
    }

    private Mirror mirror() {
        return any(design().mirrors());
    }

    private List<String> parts(int most) {
        return IntStream.range(0, 1 + random.nextInt(most))
                .mapToObj(i -> part().name())
                .distinct()
                .toList();
    }

    private Place leg() {
        Place leg = any(Offers.legs(design()));
        return random.nextBoolean() ? leg : new Place(leg.second().orElseThrow(), Optional.of(leg.first()));
    }

    private Place place(boolean legs) {
        return legs ? any(Offers.legs(design())) : Place.of(part().name());
    }

    private Kind kind(boolean mirrors) {
        Kind kind = any(List.of(Kind.values()));
        return kind == Kind.MIRROR && !mirrors ? Kind.APERTURE : kind;
    }

    private Follow follow() {
        return random.nextInt(10) == 0 ? any(List.of(Follow.values())) : any(Follow.allowed(now));
    }

    private double along() {
        return random.nextDouble(-0.01, 0.6);
    }

    private double step() {
        return random.nextDouble(-1e-3, 1e-3);
    }

    private Point near(Point at) {
        return new Point(at.x() + random.nextDouble(-0.03, 0.03), at.y() + random.nextDouble(-0.03, 0.03));
    }

    private Edit place() {
        Mirror mirror = mirror();
        Point to = near(mirror.at());
        return switch (random.nextInt(3)) {
            case 0 -> MirrorEdits.place(mirror.name(), to, follow());
            case 1 -> MirrorEdits.x(mirror.name(), to.x(), follow());
            default -> MirrorEdits.y(mirror.name(), to.y(), follow());
        };
    }

    private Edit typed() {
        Part part = part();
        Field field = any(part.kind().fields());
        if (random.nextInt(4) == 0) {
            return FieldEdits.set(part.name(), field, any(JUNK));
        }
        Object value = part.values().find(field).orElse(field.standIn());
        if (value instanceof Double d && Double.isFinite(d)) {
            value = d * random.nextDouble(0.8, 1.2);
        } else if (value instanceof Point p) {
            value = near(p);
        }
        return FieldEdits.set(part.name(), field, Entry.text(field, value));
    }

    private Edit clear() {
        Part part = part();
        return FieldEdits.clear(part.name(), any(part.kind().fields()));
    }

    private Edit stated() {
        return switch (random.nextInt(3)) {
            case 0 -> FieldEdits.title("Title " + random.nextInt(100));
            case 1 -> FieldEdits.notes("line\n\"" + random.nextInt(100) + "\" µ");
            default -> FieldEdits.wavelength(random.nextInt(300, 2000) + " nm");
        };
    }

    private Edit hold() {
        List<Hold> all = Offers.holds(
                design(), random.nextInt(8) == 0 ? Optional.empty() : Optional.of(place(random.nextBoolean())));
        List<Hold> held = design().holds();
        boolean release = !held.isEmpty() && (held.size() > 3 || random.nextInt(3) == 0);
        return release || all.isEmpty()
                ? HoldEdits.release(held.isEmpty() ? new Hold.RoundTrip() : any(held))
                : HoldEdits.toggle(design(), any(all));
    }

    private Edit requirement() {
        int count = design().requirements().size();
        Optional<Place> at = random.nextInt(4) == 0 ? Optional.empty() : Optional.of(place(random.nextBoolean()));
        List<Quantity> offered = Offers.quantities(design(), at);
        return changed(
                AskEdits.REQUIREMENTS,
                count,
                offered.isEmpty()
                        ? Optional.empty()
                        : Optional.of(Offers.requirement(any(offered), at, new Bound.AtLeast(random.nextDouble()))));
    }

    private Edit lever() {
        Place at = place(random.nextBoolean());
        List<String> sets = Offers.settings(design(), at);
        return changed(
                AskEdits.LEVERS,
                design().levers().size(),
                sets.isEmpty() ? Optional.empty() : Optional.of(Offers.lever(now, any(sets), at)));
    }

    private Edit tolerance() {
        Place at = place(random.nextBoolean());
        List<String> sets = Offers.settings(design(), at);
        return changed(
                AskEdits.TOLERANCES,
                design().tolerances().size(),
                sets.isEmpty()
                        ? Optional.empty()
                        : Optional.of(new Tolerance(
                                any(sets),
                                List.of(at),
                                random.nextDouble(),
                                random.nextBoolean(),
                                Tolerance.Spread.NORMAL)));
    }

    private <T> Edit changed(AskEdits<T> list, int count, Optional<T> one) {
        List<Edit> edits = new ArrayList<>();
        int index = random.nextInt(count + 1);
        one.ifPresent(o -> {
            if (count < 6) {
                edits.add(list.add(o));
            }
            edits.add(list.replace(index, o));
        });
        edits.add(list.remove(design(), index));
        edits.add(list.move(index, random.nextInt(count + 1)));
        return any(edits);
    }
}
