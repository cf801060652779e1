package twofold.layout;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import twofold.design.Design;
import twofold.design.Hold;

/**
 * Sets numbers of a plan, legs, incidences and coordinates, by moving mirrors; several numbers at once, and several to one
 * value. Every answer starts from the plan at rest, so it does not depend on what was set before.
 *
 * <p>In a standing wave the arm beyond moves as a rigid whole ({@link RigidMove}), in closed form; a coordinate alone moves
 * its mirror alone. In a ring, or where that would break a hold, the plan moves as little as it can and keeps every hold
 * ({@link LeastMove}); a ring that is its own mirror image stays so as long as holds and values leave it the choice. A hold
 * of the very number that is set keeps the new value.
 *
 * <p>Confined to a thread.
 */
public final class Mover {
    /** How far a closed form may miss a hold and still count as keeping it, m: the rounding of a plan. */
    private static final double ROUNDING = 1e-11;

    /** Steps on the way to a value that cannot be had at once; beyond that it cannot be had. */
    private static final double COARSE = 1.0 / 8;

    /** Where the search for the closest value ends, as a share of the way. */
    private static final double FINE = 1e-14;

    private final Laid laid;
    private final List<Knob> knobs;
    private final List<Hold> holds;
    private final int values;
    private final boolean[] pinned;
    private final double arm;
    private final Plan rest;
    private final Plan begun;
    private final List<Equation> reached = new ArrayList<>();
    private final List<Equation> kept = new ArrayList<>();
    private final List<Equation> symmetric = new ArrayList<>();
    private final @Nullable RigidMove rigid;
    private final boolean alone;
    private final LeastMove least;
    private @Nullable LeastMove symmetricMove;

    private Mover(Laid laid, List<Knob> knobs, List<Hold> holds) {
        this.laid = laid;
        this.knobs = List.copyOf(knobs);
        this.holds = List.copyOf(holds);
        Design design = laid.design();
        values = knobs.stream().mapToInt(Knob::number).max().orElse(-1) + 1;
        rest = Plan.of(laid);
        begun = rest.copy();
        arm = laid.legs().stream().mapToDouble(Leg::path).average().orElseThrow();
        pinned = new boolean[rest.mirrors()];
        knobs.forEach(k -> reached.add(Equation.reach(k, arm)));
        boolean[] heading = new boolean[rest.legs()];
        for (Hold hold : holds) {
            if (hold instanceof Hold.Position h) {
                pin(Target.mirror(design, h.mirror()));
            } else if (hold instanceof Hold.Direction h) {
                heading[Target.leg(design, h.leg()).orElseThrow()] = true;
            }
            if (knobs.stream().noneMatch(k -> k.target().isHeldBy(hold, design))) {
                Equation.keep(hold, design, arm).ifPresent(kept::add);
            }
        }
        least = new LeastMove(equations(), pinned, arm);
        Optional<RigidMove> candidate = RigidMove.of(rest, knobs, pinned, heading);
        rigid = candidate
                .filter(r -> probes().allMatch(p -> r.move(p, begun) && keeps(p)))
                .orElse(null);
        alone = rigid == null
                && knobs.stream().allMatch(k -> k.target() instanceof Target.X || k.target() instanceof Target.Y)
                && probes().allMatch(p -> place(p, begun) && keeps(p));
        if (rigid == null && !alone) {
            mirrorImage();
        }
    }

    /**
     * A mover for a laid-out design and its holds.
     *
     * @param laid the plan at rest
     * @param knobs for each value, the numbers that are set to it together
     */
    public static Mover of(Laid laid, List<List<Target>> knobs) {
        List<Knob> flat = new ArrayList<>();
        for (int i = 0; i < knobs.size(); i++) {
            for (Target target : knobs.get(i)) {
                flat.add(new Knob(target, i));
            }
        }
        return new Mover(laid, flat, laid.design().holds());
    }

    /** Keeps a mirror where it is, or what is not set of its coordinates. */
    private void pin(int mirror) {
        boolean x = knobs.stream().anyMatch(k -> k.target().equals(new Target.X(mirror)));
        boolean y = knobs.stream().anyMatch(k -> k.target().equals(new Target.Y(mirror)));
        pinned[mirror] = !x && !y;
        if (x && !y) {
            kept.add(Equation.still(Equation.Kind.Y, mirror, arm));
        } else if (y && !x) {
            kept.add(Equation.still(Equation.Kind.X, mirror, arm));
        }
    }

    private List<Equation> equations() {
        List<Equation> all = new ArrayList<>(reached);
        all.addAll(kept);
        all.addAll(symmetric);
        return all;
    }

    /** Values close to the present ones, for seeing what a way of moving keeps. */
    private java.util.stream.Stream<double[]> probes() {
        double[] present = present();
        return java.util.stream.DoubleStream.of(1e-4, -1.7e-4).mapToObj(by -> {
            double[] probe = present.clone();
            for (int i = 0; i < probe.length; i++) {
                probe[i] += by * (1 + 0.37 * i) * (isAngle(i) ? 1 : arm);
            }
            return probe;
        });
    }

    private boolean isAngle(int value) {
        return knobs.stream().anyMatch(k -> k.number() == value && k.target() instanceof Target.Incidence);
    }

    /** The present values; of numbers that are to be set together, their mean. */
    private double[] present() {
        double[] present = new double[values];
        for (int i = 0; i < values; i++) {
            int value = i;
            present[i] = knobs.stream()
                    .filter(k -> k.number() == value)
                    .mapToDouble(k -> k.target().value(rest))
                    .average()
                    .orElse(0);
        }
        return present;
    }

    /** Whether the plan begun has the values and keeps the holds. */
    private boolean keeps(double[] probe) {
        start(probe);
        for (int m = 0; m < pinned.length; m++) {
            if (pinned[m] && (begun.x[m] != rest.x[m] || begun.y[m] != rest.y[m])) {
                return false;
            }
        }
        return equations().stream().allMatch(this::isKept);
    }

    /** Adds that a symmetric ring stays symmetric, where holds and values leave it the choice. */
    private void mirrorImage() {
        Optional<Symmetry> symmetry = Symmetry.of(rest, knobs);
        if (symmetry.isEmpty()) {
            return;
        }
        List<Equation> wanted = Equation.symmetry(symmetry.get(), rest, arm);
        List<Equation> before = equations();
        start(present());
        wanted.forEach(e -> e.start(rest, present()));
        symmetric.addAll(Independent.of(before, wanted, rest));
        LeastMove move = new LeastMove(equations(), pinned, arm);
        boolean kept = probes().allMatch(p -> {
            begun.take(rest);
            return least(move, 1, p) && wanted.stream().allMatch(this::isKept);
        });
        if (kept) {
            symmetricMove = move;
        } else {
            symmetric.clear();
        }
    }

    private boolean isKept(Equation equation) {
        return Math.abs(equation.missed(begun)) < ROUNDING * Math.max(1, arm);
    }

    private void start(double[] wanted) {
        reached.forEach(e -> e.start(rest, wanted));
        kept.forEach(e -> e.start(rest, wanted));
        symmetric.forEach(e -> e.start(rest, wanted));
    }

    /** Whether mirrors move in closed form: without holds or closed polygons in the way. */
    public boolean isClosedForm() {
        return rigid != null || alone;
    }

    /**
     * Takes over what the parts on the legs do, after they changed; mirrors start from where they stood.
     *
     * @param plan whose legs are {@link Plan#load loaded} with it
     */
    public void load(Plan plan) {
        System.arraycopy(plan.shift, 0, rest.shift, 0, rest.shift.length);
        System.arraycopy(plan.excess, 0, rest.excess, 0, rest.excess.length);
        System.arraycopy(plan.shift, 0, begun.shift, 0, rest.shift.length);
        System.arraycopy(plan.excess, 0, begun.excess, 0, rest.excess.length);
        if (rigid != null) {
            rigid.restart();
        }
    }

    /** Takes over what the parts of a design do, whose mirrors are those of the plan at rest. */
    public void load(Design changed) {
        Plan plan = rest.copy();
        plan.load(changed);
        load(plan);
    }

    /**
     * Sets the values.
     *
     * @param wanted in SI, one for each list of numbers that are set together
     * @param to takes the mirrors' places, if there is such a layout
     * @return whether there is
     */
    public boolean move(double[] wanted, Plan to) {
        if (!accepts(wanted)) {
            return false;
        }
        if (rigid != null) {
            return rigid.move(wanted, to);
        }
        if (alone) {
            return place(wanted, to);
        }
        if (!approach(wanted, COARSE).isPresent()) {
            return false;
        }
        to.take(begun);
        return true;
    }

    private boolean accepts(double[] wanted) {
        for (int i = 0; i < knobs.size(); i++) {
            Knob knob = knobs.get(i);
            if (!knob.target().accepts(wanted[knob.number()])) {
                return false;
            }
        }
        return true;
    }

    private boolean place(double[] wanted, Plan to) {
        to.take(rest);
        for (int i = 0; i < knobs.size(); i++) {
            Knob knob = knobs.get(i);
            if (knob.target() instanceof Target.X t) {
                to.x[t.mirror()] = wanted[knob.number()];
            } else if (knob.target() instanceof Target.Y t) {
                to.y[t.mirror()] = wanted[knob.number()];
            }
        }
        return true;
    }

    /** Moves as little as possible to a share of the way to the values; {@code begun} takes the plan. */
    private boolean least(LeastMove move, double share, double[] wanted) {
        double[] now = wanted;
        if (share < 1) {
            double[] present = present();
            now = new double[values];
            for (int i = 0; i < values; i++) {
                now[i] = present[i] + share * (wanted[i] - present[i]);
            }
        }
        start(now);
        return accepts(now) && move.move(rest, begun);
    }

    /**
     * Goes to the values, at once or in steps; {@code begun} takes the plan. A symmetric ring stays so if it can.
     *
     * @param finest step, as a share of the way
     * @return 1 where they were reached; with a fine step, else the share of the way that can be had
     */
    private OptionalDouble approach(double[] wanted, double finest) {
        if (least.unknowns() == 0) {
            begun.take(rest);
            return keeps(wanted) ? OptionalDouble.of(1) : OptionalDouble.empty();
        }
        if (symmetricMove != null && approach(symmetricMove, wanted, COARSE).isPresent()) {
            return OptionalDouble.of(1);
        }
        return approach(least, wanted, finest);
    }

    private OptionalDouble approach(LeastMove move, double[] wanted, double finest) {
        begun.take(rest);
        if (least(move, 1, wanted)) {
            return OptionalDouble.of(1);
        }
        begun.take(rest);
        if (finest < COARSE && !least(move, 0, wanted)) {
            return OptionalDouble.empty();
        }
        Plan good = rest.copy();
        double done = 0;
        for (double by = 0.5; by >= finest && done < 1; ) {
            begun.take(good);
            double next = Math.min(1, done + by);
            if (least(move, next, wanted)) {
                good.take(begun);
                done = next;
            } else {
                by /= 2;
            }
        }
        begun.take(good);
        return done == 1 || finest < COARSE ? OptionalDouble.of(done) : OptionalDouble.empty();
    }

    /**
     * Sets the values, or says why that cannot be: which holds stand in the way, and how near one can come.
     *
     * @param wanted in SI, one for each list of numbers that are set together
     */
    public Move explain(double... wanted) {
        Plan to = rest.copy();
        if (move(wanted, to)) {
            return new Move.Moved(to.places(), List.of());
        }
        OptionalDouble share = rigid == null ? approach(wanted, FINE) : OptionalDouble.empty();
        if (share.isPresent() && share.getAsDouble() == 1) {
            return new Move.Moved(begun.places(), List.of());
        }
        OptionalDouble nearest = OptionalDouble.empty();
        if (share.isPresent() && values == 1) {
            double present = present()[0];
            nearest = OptionalDouble.of(present + share.getAsDouble() * (wanted[0] - present));
        }
        List<Hold> inTheWay = inTheWay(wanted);
        return new Move.Refused(Refusal.words(laid, knobs, wanted, inTheWay, nearest), inTheWay, nearest);
    }

    /** A smallest set of holds that together forbid the values; none where no layout has them anyway. */
    private List<Hold> inTheWay(double[] wanted) {
        if (!without(List.of()).reaches(wanted)) {
            return List.of();
        }
        List<Hold> left = new ArrayList<>(holds);
        for (int i = holds.size() - 1; i >= 0; i--) {
            List<Hold> fewer = new ArrayList<>(left);
            fewer.remove(i);
            if (!without(fewer).reaches(wanted)) {
                left = fewer;
            }
        }
        return left;
    }

    private boolean reaches(double[] wanted) {
        return move(wanted, rest.copy())
                || (!isClosedForm() && approach(wanted, FINE).orElse(0) == 1);
    }

    private Mover without(List<Hold> fewer) {
        Mover other = new Mover(laid, knobs, fewer);
        other.load(rest);
        return other;
    }

    @Override
    public String toString() {
        return "Mover" + knobs + Arrays.toString(pinned);
    }
}
