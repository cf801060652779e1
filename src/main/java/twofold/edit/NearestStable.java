package twofold.edit;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import twofold.cavity.Chain;
import twofold.cavity.Trial;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Hold;
import twofold.design.Lever;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Point;
import twofold.design.Problem;
import twofold.design.Shape;
import twofold.design.Subject;
import twofold.design.Unit;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.layout.Leg;
import twofold.layout.Move;
import twofold.layout.Mover;
import twofold.layout.Outcome;
import twofold.layout.Standing;
import twofold.layout.Target;
import twofold.optics.Plane;
import twofold.study.StableStretches;
import twofold.study.Stretch;

/**
 * A mirror or part slid along its leg to the middle of the nearest stretch in which both planes are stable.
 *
 * <p>A mirror has two legs: of all stretches along both, the one whose middle is the shortest way off is taken. What lies
 * beyond moves with it, as where the leg's length is typed (see {@link Mover}); in a ring the other mirrors move as little
 * as they can. Every place is solved anew before it counts as stable.
 */
public final class NearestStable {
    private static final int SAMPLES = 401;

    private final Laid laid;
    private final Design design;
    private final int part;
    private final List<String> refusals = new ArrayList<>();

    /**
     * A stable place.
     *
     * @param part that is moved
     * @param leg along which
     * @param what is set there: the leg's path, or the part's place on it
     * @param now its value, m
     * @param then its value at the stable place, m
     * @param stretch of values at which both planes are stable, m
     * @param design with the part there
     */
    public record Found(String part, Place leg, What what, double now, double then, Stretch stretch, Design design) {
        /** In words: which leg, how far, and how wide the stretch is. */
        public String words() {
            return part + " moves " + Unit.MM.shown(Math.abs(then - now)) + " mm along " + leg + ", "
                    + (what == What.LEG ? "a leg of " : "to ") + Unit.MM.shown(then)
                    + " mm: both planes are stable from " + Unit.MM.shown(stretch.from()) + " to "
                    + Unit.MM.shown(stretch.to()) + " mm";
        }
    }

    /** What is set. */
    public enum What {
        /** The path of a leg that ends at the mirror. */
        LEG,
        /** The part's place along its leg. */
        ALONG
    }

    /** A stretch along one leg. */
    private record Way(int leg, double now, Stretch stretch) {
        double travel() {
            return Math.abs(stretch.middle() - now);
        }
    }

    private NearestStable(Laid laid, int part) {
        this.laid = laid;
        this.design = laid.design();
        this.part = part;
    }

    /** The edit that moves a part to the nearest stable place. */
    public static Edit edit(String part) {
        return Edit.of(
                "move " + part + " to the nearest stable place",
                laid -> of(laid, part).then(found -> Outcome.of(found.design())));
    }

    /**
     * The nearest stable place of a part, or why there is none, with the stretches of both planes.
     *
     * @param part its name
     */
    public static Outcome<Found> of(Laid laid, String part) {
        return Named.part(laid.design(), part).then(index -> {
            NearestStable search = new NearestStable(laid, index);
            return laid.design().parts().get(index) instanceof Mirror ? search.mirror() : search.onLeg();
        });
    }

    private String name() {
        return design.parts().get(part).name();
    }

    private Place place(int leg) {
        Leg at = laid.legs().get(leg);
        return Place.of(
                design.parts().get(at.from()).name(),
                design.parts().get(at.to()).name());
    }

    private static boolean isStable(Laid there) {
        Trial trial = Chain.of(there).trial();
        trial.run();
        return trial.hasBeam(Plane.TANGENTIAL) && trial.hasBeam(Plane.SAGITTAL);
    }

    private Outcome<Found> mirror() {
        List<Way> ways = new ArrayList<>();
        List<String> nowhere = new ArrayList<>();
        for (int leg = 0; leg < laid.legs().size(); leg++) {
            Leg at = laid.legs().get(leg);
            if (at.from() != part && at.to() != part) {
                continue;
            }
            StableStretches stretches = along(leg);
            for (Stretch stretch : stretches.both()) {
                ways.add(new Way(leg, at.path(), stretch));
            }
            if (stretches.both().isEmpty()) {
                nowhere.add("along " + place(leg) + ", " + Unit.MM.shown(at.path()) + " mm now, " + stretches.words());
            }
        }
        ways.sort(Comparator.comparingDouble(Way::travel));
        for (Way way : ways) {
            Optional<Design> moved = moved(way.leg(), way.stretch().middle());
            if (moved.isPresent()) {
                return Outcome.of(new Found(
                        name(),
                        place(way.leg()),
                        What.LEG,
                        way.now(),
                        way.stretch().middle(),
                        way.stretch(),
                        moved.get()));
            }
        }
        nowhere.addAll(refusals);
        return refused(String.join("; ", nowhere));
    }

    private Outcome<Found> refused(String why) {
        return Outcome.failed(new Problem(
                Subject.part(part),
                "found no stable place for " + name() + ": " + why,
                "another part, or first another radius or incidence"));
    }

    private Mover mover(int leg) {
        return Mover.of(laid, List.of(List.of(new Target.Leg(leg))));
    }

    /** A rigid arm changes that path alone, so the chain's zones are exact; else all that moves is moved. */
    private StableStretches along(int leg) {
        StableStretches alone = StableStretches.alongLeg(laid, leg);
        if (mover(leg).isClosedForm()) {
            return alone;
        }
        Leg at = laid.legs().get(leg);
        double inside = at.parts().stream().mapToDouble(Standing::length).sum();
        double free = at.path() - inside;
        double most = Math.max(2 * at.path(), alone.range().to());
        return StableStretches.alongLever(
                laid, lever("leg_mm", place(leg), inside + free / SAMPLES, Math.min(most, 10 * at.path())), SAMPLES);
    }

    private static Lever lever(String set, Place of, double from, double to) {
        return new Lever("place", set, List.of(of), new Lever.Range.Span(from, to), true);
    }

    /** The design with a leg of a length, if there is one and it is stable. */
    private Optional<Design> moved(int leg, double path) {
        Mover mover = mover(leg);
        Move move = mover.explain(path);
        if (move instanceof Move.Refused no) {
            refusals.add(no.words());
            return Optional.empty();
        }
        List<Point> places = anchored(leg, ((Move.Moved) move).places(), mover.isClosedForm());
        return checked(Moves.at(design, places), "a leg " + place(leg) + " of " + Unit.MM.shown(path) + " mm");
    }

    private Optional<Design> checked(Design changed, String what) {
        Outcome<Laid> there = Layout.of(changed);
        if (there.value().isEmpty()) {
            refusals.add(what + " cannot be: "
                    + there.problems().stream().map(Problem::line).collect(Collectors.joining("; ")));
            return Optional.empty();
        }
        if (!isStable(there.value().get())) {
            refusals.add(what + " is at the edge of stability");
            return Optional.empty();
        }
        return Optional.of(changed);
    }

    /** Where nothing is held in place, it is the chosen mirror and its arm that move, not what lies beyond the leg. */
    private List<Point> anchored(int leg, List<Point> places, boolean rigid) {
        boolean free = design.holds().stream().noneMatch(Hold.Position.class::isInstance);
        List<Mirror> mirrors = design.mirrors();
        int mirror = Target.leg(design, place(leg)).orElseThrow();
        if (design.shape() == Shape.RING
                || !rigid
                || !free
                || laid.legs().get(leg).from() != part) {
            return places;
        }
        double byX = places.get(mirror + 1).x() - mirrors.get(mirror + 1).at().x();
        double byY = places.get(mirror + 1).y() - mirrors.get(mirror + 1).at().y();
        return IntStream.range(0, places.size())
                .mapToObj(i -> i > mirror
                        ? mirrors.get(i).at()
                        : new Point(places.get(i).x() - byX, places.get(i).y() - byY))
                .toList();
    }

    private Outcome<Found> onLeg() {
        int leg = IntStream.range(0, laid.legs().size())
                .filter(l -> laid.legs().get(l).parts().stream().anyMatch(s -> s.part() == part))
                .findFirst()
                .orElseThrow();
        List<Standing> on = laid.legs().get(leg).parts();
        int at = IntStream.range(0, on.size())
                .filter(i -> on.get(i).part() == part)
                .findFirst()
                .orElseThrow();
        double half = on.get(at).length() / 2;
        double now = on.get(at).middle();
        double from = (at == 0 ? 0 : on.get(at - 1).end()) + half;
        double to = (at == on.size() - 1
                        ? laid.legs().get(leg).path()
                        : on.get(at + 1).start())
                - half;
        if (!(from < to)) {
            return refused("it fills its place on " + place(leg));
        }
        StableStretches stretches =
                StableStretches.alongLever(laid, lever(Field.ALONG.json(), Place.of(name()), from, to), SAMPLES);
        String range = "from " + Unit.MM.shown(from) + " to " + Unit.MM.shown(to) + " mm along " + place(leg);
        if (stretches.both().size() == 1 && stretches.both().get(0).equals(stretches.range())) {
            return refused("both planes are stable wherever it stands " + range);
        }
        List<Stretch> nearest = stretches.both().stream()
                .sorted(Comparator.comparingDouble(s -> Math.abs(s.middle() - now)))
                .toList();
        for (Stretch stretch : nearest) {
            List<Part> parts = new ArrayList<>(design.parts());
            parts.set(part, parts.get(part).with(Field.ALONG, Along.at(stretch.middle())));
            Optional<Design> moved =
                    checked(design.withParts(parts), name() + " at " + Unit.MM.shown(stretch.middle()) + " mm");
            if (moved.isPresent()) {
                return Outcome.of(
                        new Found(name(), place(leg), What.ALONG, now, stretch.middle(), stretch, moved.get()));
            }
        }
        refusals.add(0, range + " " + stretches.words());
        return refused(String.join("; ", refusals));
    }
}
