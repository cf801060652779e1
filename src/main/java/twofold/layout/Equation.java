package twofold.layout;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import twofold.design.Design;
import twofold.design.Hold;

/**
 * Something that a plan must keep: a sum of paths, turns or directions, or one coordinate, at a value. What is 0 when it is
 * kept is in m; angles count as arcs of a length.
 */
final class Equation {
    /** What an equation is about. */
    enum Kind {
        /** The path of leg {@code i}; minus that of leg {@code j}, if there is one. */
        PATH,
        /** The turn at mirror {@code i}, with a sign; minus that at mirror {@code j}, if there is one. */
        TURN,
        /** The direction of leg {@code i}. */
        DIRECTION,
        /** The path of all legs together. */
        ROUND,
        /** The x of mirror {@code i}. */
        X,
        /** The y of mirror {@code i}. */
        Y
    }

    private static final int NONE = -1;

    private final Kind kind;
    private final int i;
    private final int j;
    /** Index of the value to reach; {@link #NONE} keeps the plan's own. */
    private final int knob;
    /** The arc length of 1 rad, m. */
    private final double arm;

    // Signs of the turns, and the value to reach: from the plan at rest, or set.
    private double signI = 1;
    private double signJ = 1;
    private double wanted;

    private Equation(Kind kind, int i, int j, int knob, double arm) {
        this.kind = kind;
        this.i = i;
        this.j = j;
        this.knob = knob;
        this.arm = arm;
    }

    static Equation reach(Knob knob, double arm) {
        Target t = knob.target();
        int n = knob.number();
        if (t instanceof Target.Leg leg) {
            return new Equation(Kind.PATH, leg.leg(), NONE, n, arm);
        } else if (t instanceof Target.Incidence fold) {
            return new Equation(Kind.TURN, fold.mirror(), NONE, n, arm);
        } else if (t instanceof Target.X x) {
            return new Equation(Kind.X, x.mirror(), NONE, n, arm);
        }
        return new Equation(Kind.Y, ((Target.Y) t).mirror(), NONE, n, arm);
    }

    /** What a hold asks for; nothing where it is about a place, which is kept otherwise. */
    static Optional<Equation> keep(Hold hold, Design design, double arm) {
        @Nullable Equation equation = null;
        if (hold instanceof Hold.Leg h) {
            equation = new Equation(Kind.PATH, Target.leg(design, h.leg()).orElseThrow(), NONE, NONE, arm);
        } else if (hold instanceof Hold.Direction h) {
            equation = new Equation(Kind.DIRECTION, Target.leg(design, h.leg()).orElseThrow(), NONE, NONE, arm);
        } else if (hold instanceof Hold.Incidence h) {
            equation = new Equation(Kind.TURN, Target.mirror(design, h.mirror()), NONE, NONE, arm);
        } else if (hold instanceof Hold.RoundTrip) {
            equation = new Equation(Kind.ROUND, NONE, NONE, NONE, arm);
        }
        return Optional.ofNullable(equation);
    }

    /** That a coordinate of a mirror stays. */
    static Equation still(Kind axis, int mirror, double arm) {
        return new Equation(axis, mirror, NONE, NONE, arm);
    }

    /** That a ring stays its own mirror image: legs and turns that are each other's images stay equally far apart. */
    static List<Equation> symmetry(Symmetry symmetry, Plan plan, double arm) {
        List<Equation> all = new ArrayList<>();
        for (int k = 0; k < plan.legs(); k++) {
            if (symmetry.leg(k) > k) {
                all.add(new Equation(Kind.PATH, k, symmetry.leg(k), NONE, arm));
            }
            if (symmetry.mirror(k) > k) {
                all.add(new Equation(Kind.TURN, k, symmetry.mirror(k), NONE, arm));
            }
        }
        return all;
    }

    /** Takes signs, and the value to keep, from a plan. */
    void start(Plan plan, double[] values) {
        if (kind == Kind.TURN) {
            signI = Math.copySign(1, plan.turn(i));
            signJ = j == NONE ? 1 : Math.copySign(1, plan.turn(j));
        }
        if (knob == NONE) {
            wanted = value(plan);
        } else if (kind == Kind.TURN) {
            wanted = Math.PI - 2 * values[knob];
        } else {
            wanted = values[knob];
        }
    }

    private double value(Plan plan) {
        return switch (kind) {
            case PATH -> plan.path(i) - (j == NONE ? 0 : plan.path(j));
            case TURN -> signI * plan.turn(i) - (j == NONE ? 0 : signJ * plan.turn(j));
            case DIRECTION -> plan.direction(i);
            case ROUND -> {
                double sum = 0;
                for (int k = 0; k < plan.legs(); k++) {
                    sum += plan.path(k);
                }
                yield sum;
            }
            case X -> plan.x[i];
            case Y -> plan.y[i];
        };
    }

    /** By how much it is missed, m. */
    double missed(Plan plan) {
        double by = value(plan) - wanted;
        return kind == Kind.TURN || kind == Kind.DIRECTION ? arm * Plan.wrapped(by) : by;
    }

    /**
     * How what is missed grows with each coordinate.
     *
     * @param row takes it: of mirror m, x at 2m and y at 2m + 1
     */
    void slope(Plan plan, double[] row) {
        java.util.Arrays.fill(row, 0);
        switch (kind) {
            case PATH -> {
                path(plan, i, 1, row);
                if (j != NONE) {
                    path(plan, j, -1, row);
                }
            }
            case TURN -> {
                turn(plan, i, arm * signI, row);
                if (j != NONE) {
                    turn(plan, j, -arm * signJ, row);
                }
            }
            case DIRECTION -> direction(plan, i, arm, row);
            case ROUND -> {
                for (int k = 0; k < plan.legs(); k++) {
                    path(plan, k, 1, row);
                }
            }
            case X -> row[2 * i] = 1;
            case Y -> row[2 * i + 1] = 1;
        }
    }

    private static void turn(Plan plan, int mirror, double times, double[] row) {
        direction(plan, mirror, times, row);
        direction(plan, plan.before(mirror), -times, row);
    }

    /** With D from mirror to mirror and e the extent: de = D·dD / e. */
    private static void path(Plan plan, int leg, double times, double[] row) {
        int to = plan.end(leg);
        double by = times / plan.extent(leg);
        ends(leg, to, by * (plan.x[to] - plan.x[leg]), by * (plan.y[to] - plan.y[leg]), row);
    }

    /** The direction is that of D less arcsin(S/|D|), S the shift: dφ = (D × dD + (S/e) D·dD) / D². */
    private static void direction(Plan plan, int leg, double times, double[] row) {
        int to = plan.end(leg);
        double dx = plan.x[to] - plan.x[leg];
        double dy = plan.y[to] - plan.y[leg];
        double aside = plan.shift[leg] == 0 ? 0 : plan.shift[leg] / plan.extent(leg);
        double by = times / (dx * dx + dy * dy);
        ends(leg, to, by * (aside * dx - dy), by * (aside * dy + dx), row);
    }

    private static void ends(int from, int to, double byX, double byY, double[] row) {
        row[2 * to] += byX;
        row[2 * to + 1] += byY;
        row[2 * from] -= byX;
        row[2 * from + 1] -= byY;
    }
}
