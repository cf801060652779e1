package twofold.edit;

import java.util.List;
import java.util.Optional;
import java.util.function.DoubleFunction;
import twofold.design.Design;
import twofold.design.Entry;
import twofold.design.Kind;
import twofold.design.Mirror;
import twofold.design.Place;
import twofold.design.Point;
import twofold.design.Problem;
import twofold.design.Subject;
import twofold.design.Turn;
import twofold.design.Unit;
import twofold.layout.Drag;
import twofold.layout.Follow;
import twofold.layout.Laid;
import twofold.layout.Move;
import twofold.layout.Outcome;

/**
 * Mirrors put in, and moved by hand or to typed numbers of the plan. What else moves is chosen, as {@link Follow} says; where
 * it is not, a leg or incidence is set as a lever sets it: in a standing wave the arm beyond moves rigidly, in a ring
 * everything moves as little as it can.
 *
 * <p>A typed number is reached or refused, with the holds in the way and the closest that can be had; a point to which a
 * mirror is dragged is only wanted, and holds keep the mirror as near as they allow.
 */
public final class MirrorEdits {
    private MirrorEdits() {}

    /**
     * A new mirror that folds a leg with an incidence of 10°. In a standing wave the arm beyond turns rigidly, so that no other
     * leg and no other incidence changes; in a ring, or where mirrors are held in place on both sides, it stands 10 mm off the
     * leg. What stands on the leg stays where it is.
     *
     * @param leg two neighbouring mirrors
     * @param along path from the mirror that the leg leaves, m; what stands there moves it to the nearest free place
     * @param side the way the beam then turns
     */
    public static Edit insert(Place leg, double along, Turn side) {
        return Edit.of(
                "place mirror",
                laid -> Named.leg(laid.design(), leg)
                        .then(l ->
                                new Folding(laid).in((Mirror) NewPart.of(Kind.MIRROR, laid.design()), l, along, side))
                        .then(d -> Outcome.of(References.pruned(d))));
    }

    /** A mirror as near to a point as the holds let it; for dragging. */
    public static Edit moveTo(String mirror, Point to, Follow follow) {
        return Edit.of(
                "move " + mirror,
                laid -> dragged(laid, mirror, to, follow).then(m -> Outcome.of(Moves.at(laid.design(), m.places()))));
    }

    /** A mirror at a point, typed. */
    public static Edit place(String mirror, Point at, Follow follow) {
        return Edit.of("move " + mirror, laid -> placed(laid, mirror, at, follow));
    }

    /** A mirror at an x, typed, m. */
    public static Edit x(String mirror, double x, Follow follow) {
        return Edit.of(
                "move " + mirror,
                laid -> Named.mirror(laid.design(), mirror)
                        .then(m -> placed(
                                laid,
                                mirror,
                                new Point(x, laid.design().mirrors().get(m).at().y()),
                                follow)));
    }

    /** A mirror at a y, typed, m. */
    public static Edit y(String mirror, double y, Follow follow) {
        return Edit.of(
                "move " + mirror,
                laid -> Named.mirror(laid.design(), mirror)
                        .then(m -> placed(
                                laid,
                                mirror,
                                new Point(laid.design().mirrors().get(m).at().x(), y),
                                follow)));
    }

    private static Outcome<Design> placed(Laid laid, String mirror, Point at, Follow follow) {
        boolean there = laid.design().mirrors().stream().anyMatch(m -> m.name().equals(mirror) && m.at().equals(at));
        // A held place may be typed again as it is.
        return there
                ? Outcome.of(laid.design())
                : dragged(laid, mirror, at, follow).then(m -> reached(laid, m, mirror + " at " + Moves.words(at)));
    }

    static Outcome<Move.Moved> dragged(Laid laid, String mirror, Point to, Follow follow) {
        return Named.mirror(laid.design(), mirror)
                .then(m -> Moves.allowed(laid, follow).then(f -> {
                    Move move = Drag.to(laid, m, to, f);
                    return move instanceof Move.Moved moved
                            ? Outcome.of(moved)
                            : Outcome.failed(Moves.problem(laid, m, (Move.Refused) move));
                }));
    }

    /** The design with the mirrors moved, if no hold kept the dragged one from its point. */
    private static Outcome<Design> reached(Laid laid, Move.Moved moved, String wanted) {
        return moved.holds().isEmpty()
                ? Outcome.of(Moves.at(laid.design(), moved.places()))
                : Outcome.failed(new Problem(
                        Subject.DOCUMENT,
                        "no layout has " + wanted + ": in the way "
                                + (moved.holds().size() == 1 ? "stands the hold of " : "stand the holds of ")
                                + String.join(
                                        ", ",
                                        moved.holds().stream()
                                                .map(h -> h.words())
                                                .toList()),
                        "a value that keeps it, or the hold released"));
    }

    /**
     * A leg of a typed path, the usual way.
     *
     * @param path m
     */
    public static Edit leg(Place leg, double path) {
        return leg(leg, path, Optional.empty());
    }

    /**
     * A leg of a typed path.
     *
     * @param leg two neighbouring mirrors; where others stay, the second one moves
     * @param path m
     * @param follow what else moves; a mirrored partner: the leg's mirror image changes by as much
     */
    public static Edit leg(Place leg, double path, Optional<Follow> follow) {
        return Edit.of(
                "set leg " + leg,
                laid -> Named.leg(laid.design(), leg)
                        .then(l -> Moves.leg(laid, l, leg.second().orElseThrow(), path, follow)));
    }

    /**
     * An incidence, typed, the usual way: that incidence alone changes where it can.
     *
     * @param angle rad
     */
    public static Edit incidence(String mirror, double angle) {
        return incidence(mirror, angle, Optional.empty());
    }

    /**
     * An incidence, typed.
     *
     * @param angle rad
     * @param follow what else moves: the arm beyond swings about the mirror; or the next mirror goes round this one and the arm
     *     follows it, parallel to itself; or this mirror moves and others stay; or the partner's incidence changes by as much
     */
    public static Edit incidence(String mirror, double angle, Optional<Follow> follow) {
        return Edit.of("set incidence at " + mirror, laid -> incident(laid, mirror, angle, follow));
    }

    /** A leg of a path as typed, in mm where it says nothing else. */
    public static Edit leg(Place leg, String path, Optional<Follow> follow) {
        return typed("leg_mm", path, Unit.MM, "set leg " + leg, p -> leg(leg, p, follow));
    }

    /** An incidence as typed, in degrees where it says nothing else. */
    public static Edit incidence(String mirror, String angle, Optional<Follow> follow) {
        return typed("incidence_deg", angle, Unit.DEG, "set incidence at " + mirror, a -> incidence(mirror, a, follow));
    }

    /** A mirror at an x as typed, in mm where it says nothing else. */
    public static Edit x(String mirror, String x, Follow follow) {
        return typed("x_mm", x, Unit.MM, "move " + mirror, v -> x(mirror, v, follow));
    }

    /** A mirror at a y as typed, in mm where it says nothing else. */
    public static Edit y(String mirror, String y, Follow follow) {
        return typed("y_mm", y, Unit.MM, "move " + mirror, v -> y(mirror, v, follow));
    }

    private static Edit typed(String field, String text, Unit unit, String name, DoubleFunction<Edit> edit) {
        return Edit.of(name, laid -> {
            Entry<Double> entry = Entry.number(Subject.DOCUMENT.at(field), text, unit);
            return entry.problem().isPresent()
                    ? Outcome.failed(entry.problem().get())
                    : edit.apply(entry.value().orElseThrow()).change().apply(laid);
        });
    }

    static Outcome<Design> incident(Laid laid, String mirror, double angle, Optional<Follow> follow) {
        return Moves.folding(laid, mirror)
                .then(m -> follow.equals(Optional.of(Follow.ARM_FOLLOWS))
                        ? Moves.allowed(laid, Follow.ARM_FOLLOWS).then(f -> parallel(laid, m, angle))
                        : Moves.incidence(laid, m, angle, follow));
    }

    /** The next mirror goes round a fold, and what is beyond follows parallel to itself. */
    private static Outcome<Design> parallel(Laid laid, int mirror, double angle) {
        Design design = laid.design();
        List<Mirror> mirrors = design.mirrors();
        Point in = laid.legs().get(mirror - 1).heading();
        Point out = laid.legs().get(mirror).heading();
        double turn = Math.atan2(in.x() * out.y() - in.y() * out.x(), in.x() * out.x() + in.y() * out.y());
        double by = Math.copySign(Math.PI - 2 * angle, turn) - turn;
        boolean down = !Moves.isPinned(design, mirror + 1, mirrors.size());
        Mirror next = mirrors.get(down ? mirror + 1 : mirror - 1);
        Point to = Turned.about(mirrors.get(mirror).at(), next.at(), down ? by : -by);
        return dragged(laid, next.name(), to, Follow.ARM_FOLLOWS)
                .then(m -> reached(
                        laid,
                        m,
                        "an incidence at " + mirrors.get(mirror).name() + " of " + Unit.DEG.text(angle) + "°"));
    }
}
