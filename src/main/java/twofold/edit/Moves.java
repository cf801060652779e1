package twofold.edit;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Hold;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Problem;
import twofold.design.Shape;
import twofold.design.Subject;
import twofold.design.Unit;
import twofold.layout.Follow;
import twofold.layout.Laid;
import twofold.layout.Move;
import twofold.layout.Mover;
import twofold.layout.Outcome;
import twofold.layout.Plan;
import twofold.layout.Target;

/** Numbers of the plan set by moving mirrors, with what follows, as designs or problems. */
final class Moves {
    /** Mirror images may differ by the rounding of plans that people write down, m and rad; then they are set to one value. */
    private static final double ALIKE = 1e-6;

    private Moves() {}

    /** The design with its mirrors at other places. */
    static Design at(Design design, List<Point> places) {
        List<Part> parts = new ArrayList<>(design.parts().size());
        int mirror = 0;
        for (Part part : design.parts()) {
            parts.add(part instanceof Mirror m ? m.at(places.get(mirror++)) : part);
        }
        return design.withParts(parts);
    }

    static String words(Point at) {
        return "(" + Unit.MM.text(at.x()) + ", " + Unit.MM.text(at.y()) + ") mm";
    }

    static Outcome<Follow> allowed(Laid laid, Follow follow) {
        List<Follow> allowed = Follow.allowed(laid);
        return allowed.contains(follow)
                ? Outcome.of(follow)
                : Outcome.failed(new Problem(
                        Subject.DOCUMENT,
                        "found \"" + follow.words() + "\", which is not for this plan",
                        String.join(", ", allowed.stream().map(Follow::words).toList())));
    }

    /** The number of a mirror that folds the beam. */
    static Outcome<Integer> folding(Laid laid, String name) {
        return Named.mirror(laid.design(), name)
                .then(m -> isEnd(laid.design(), m)
                        ? Outcome.failed(new Problem(
                                Subject.part(Placing.mirror(laid.design(), m)),
                                "found the end mirror " + name + ", which is met head-on",
                                "a mirror that folds the beam"))
                        : Outcome.of(m));
    }

    static boolean isEnd(Design design, int mirror) {
        return design.shape() == Shape.STANDING_WAVE
                && (mirror == 0 || mirror == design.mirrors().size() - 1);
    }

    static boolean isPinned(Design design, int from, int to) {
        List<String> names =
                design.mirrors().subList(from, to).stream().map(Mirror::name).toList();
        return design.holds().stream().anyMatch(h -> h instanceof Hold.Position p && names.contains(p.mirror()));
    }

    /** A refused move as a problem at a mirror. */
    static Problem problem(Laid laid, int mirror, Move.Refused refused) {
        return new Problem(
                Subject.part(Placing.mirror(laid.design(), mirror)).at(Field.AT.json()),
                refused.words(),
                "a value that the plan can have" + (refused.holds().isEmpty() ? "" : ", or the hold released"));
    }

    /**
     * A leg set.
     *
     * @param moved name of the mirror that moves where others stay
     */
    static Outcome<Design> leg(Laid laid, int leg, String moved, double path, Optional<Follow> follow) {
        Outcome<Integer> mirror = Named.mirror(laid.design(), moved);
        if (follow.isEmpty()) {
            return mirror.then(m -> set(laid, List.of(new Target.Leg(leg)), path, m));
        }
        return mirror.then(m -> allowed(laid, follow.get()).then(f -> switch (f) {
            case OTHERS_STAY -> alone(laid, new Target.Leg(leg), path, m);
            case ARM_FOLLOWS, ARM_SWINGS -> set(laid, List.of(new Target.Leg(leg)), path, m);
            case MIRRORED_PARTNER -> alike(laid, new Target.Leg(leg), new Target.Leg(image(laid, leg)), path, m);
        }));
    }

    /** The mirror image of a leg. */
    private static int image(Laid laid, int leg) {
        int mirrors = laid.design().mirrors().size();
        int a = Follow.partner(laid, leg).orElseThrow();
        int b = Follow.partner(laid, (leg + 1) % mirrors).orElseThrow();
        return (a + 1) % mirrors == b ? a : b;
    }

    /** An incidence set, but not by swinging the next mirror round. */
    static Outcome<Design> incidence(Laid laid, int mirror, double angle, Optional<Follow> follow) {
        Target target = new Target.Incidence(mirror);
        if (follow.isEmpty()) {
            return set(laid, List.of(target), angle, mirror);
        }
        return allowed(laid, follow.get()).then(f -> switch (f) {
            case OTHERS_STAY -> alone(laid, target, angle, mirror);
            case ARM_FOLLOWS, ARM_SWINGS -> set(laid, List.of(target), angle, mirror);
            case MIRRORED_PARTNER ->
                alike(
                        laid,
                        target,
                        new Target.Incidence(Follow.partner(laid, mirror).orElseThrow()),
                        angle,
                        mirror);
        });
    }

    /** A number set, and its mirror image changed by as much. */
    private static Outcome<Design> alike(Laid laid, Target target, Target image, double value, int mirror) {
        if (image.equals(target)) {
            return set(laid, List.of(target), value, mirror);
        }
        Plan plan = Plan.of(laid);
        double apart = image.value(plan) - target.value(plan);
        return Math.abs(apart) < ALIKE
                ? set(laid, List.of(target, image), value, mirror)
                : moved(
                        laid,
                        Mover.of(laid, List.of(List.of(target), List.of(image))).explain(value, value + apart),
                        mirror);
    }

    private static Outcome<Design> set(Laid laid, List<Target> targets, double value, int mirror) {
        return moved(laid, Mover.of(laid, List.of(targets)).explain(value), mirror);
    }

    private static Outcome<Design> moved(Laid laid, Move move, int mirror) {
        return move instanceof Move.Moved moved
                ? Outcome.of(at(laid.design(), moved.places()))
                : Outcome.failed(problem(laid, mirror, (Move.Refused) move));
    }

    /** A number set by moving one mirror, all others pinned. */
    private static Outcome<Design> alone(Laid laid, Target target, double value, int mirror) {
        Design design = laid.design();
        List<Hold> pinned = new ArrayList<>(design.holds());
        IntStream.range(0, design.mirrors().size())
                .filter(m -> m != mirror)
                .mapToObj(m -> new Hold.Position(design.mirrors().get(m).name()))
                .filter(h -> !pinned.contains(h))
                .forEach(pinned::add);
        Design held = design.withHolds(pinned);
        Move move = Mover.of(new Laid(held, laid.legs(), laid.incidence()), List.of(List.of(target)))
                .explain(value);
        if (move instanceof Move.Moved moved) {
            return Outcome.of(at(design, moved.places()));
        }
        Move.Refused refused = (Move.Refused) move;
        if (design.holds().containsAll(refused.holds())) {
            return Outcome.failed(problem(laid, mirror, refused));
        }
        Unit unit = target instanceof Target.Incidence ? Unit.DEG : Unit.MM;
        String what = unit == Unit.DEG ? "incidence" : "leg";
        String name = design.mirrors().get(mirror).name();
        return Outcome.failed(new Problem(
                Subject.part(Placing.mirror(design, mirror)).at(Field.AT.json()),
                "found " + unit.text(value) + " " + unit.symbol() + ", a" + (unit == Unit.DEG ? "n " : " ") + what
                        + " that " + name + " alone cannot make",
                (refused.nearest().isPresent()
                                ? "up to " + unit.shown(refused.nearest().getAsDouble()) + " " + unit.symbol() + ", or "
                                : "")
                        + "something else that moves along"));
    }
}
