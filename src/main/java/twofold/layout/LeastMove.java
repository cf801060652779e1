package twofold.layout;

import java.util.List;

/**
 * The smallest movement, as least sum of squared displacements, that brings a plan to satisfy equations.
 *
 * <p>Each step asks, to first order at the plan reached, for the plan nearest to the one at rest that satisfies all
 * equations: x = x₀ − J⁺(c + J(x₀ − x)), with J⁺ the pseudo-inverse (Gauss–Newton with an anchor). Its fixed point is the
 * nearest plan. Steps are shortened where they do not shrink; last, shortest steps onto the equations alone (x − J⁺c) take
 * them to the rounding.
 */
final class LeastMove {
    /** What an equation may be missed by, m: a thousandth of the 1e-9 mm that is promised, and the same arc. */
    private static final double KEPT = 1e-12;

    /** A step that no longer matters, as a share of a leg. */
    private static final double STILL = 1e-12;

    private static final int MOST_STEPS = 80;
    private static final int MOST_LAST_STEPS = 12;
    private static final double LEAST_SHARE = 1.0 / 16;

    private final List<Equation> equations;
    /** Coordinates that may change: x of mirror m is 2m, y 2m + 1. */
    private final int[] free;

    private final double arm;
    private final LeastStep least;
    private final double[] row;
    private final double[] missed;
    private final double[] right;
    private final double[] step;

    /**
     * @param equations to satisfy
     * @param pinned mirrors that do not move
     * @param arm a length of the plan's scale, m
     */
    LeastMove(List<Equation> equations, boolean[] pinned, double arm) {
        this.equations = List.copyOf(equations);
        this.arm = arm;
        free = java.util.stream.IntStream.range(0, 2 * pinned.length)
                .filter(i -> !pinned[i / 2])
                .toArray();
        least = new LeastStep(equations.size(), free.length);
        row = new double[2 * pinned.length];
        missed = new double[equations.size()];
        right = new double[equations.size()];
        step = new double[free.length];
    }

    /** How many coordinates there are. */
    int unknowns() {
        return free.length;
    }

    /**
     * Moves a plan.
     *
     * @param rest the plan to stay near; equations have {@link Equation#start started}
     * @param plan where to begin; takes the answer
     * @return whether every equation is kept
     */
    boolean move(Plan rest, Plan plan) {
        double share = 1;
        double before = Double.POSITIVE_INFINITY;
        for (int i = 0; i < MOST_STEPS; i++) {
            if (!linearize(plan)) {
                return false;
            }
            for (int e = 0; e < missed.length; e++) {
                double sum = missed[e];
                for (int k = 0; k < free.length; k++) {
                    sum += least.matrix[e][k] * (at(rest, free[k]) - at(plan, free[k]));
                }
                right[e] = -sum;
            }
            least.solve(right, step);
            double far = 0;
            for (int k = 0; k < free.length; k++) {
                step[k] += at(rest, free[k]) - at(plan, free[k]);
                far = Math.max(far, Math.abs(step[k]));
            }
            if (!(far < Double.POSITIVE_INFINITY)) {
                return false;
            }
            if (far < STILL * arm) {
                break;
            }
            if (far > 0.9 * before) {
                share = Math.max(share / 2, LEAST_SHARE);
            }
            before = far;
            go(plan, Math.min(share, arm / 2 / far));
        }
        return settle(plan);
    }

    private boolean settle(Plan plan) {
        double best = Double.POSITIVE_INFINITY;
        for (int i = 0; i < MOST_LAST_STEPS; i++) {
            if (!linearize(plan)) {
                return false;
            }
            double worst = 0;
            for (int e = 0; e < missed.length; e++) {
                worst = Math.max(worst, Math.abs(missed[e]));
                right[e] = -missed[e];
            }
            // Down to the rounding, but not for ever.
            if (worst < KEPT / 16 || (worst < KEPT && worst >= best / 2)) {
                return true;
            }
            best = Math.min(best, worst);
            least.solve(right, step);
            go(plan, 1);
        }
        return false;
    }

    private void go(Plan plan, double share) {
        for (int k = 0; k < free.length; k++) {
            double[] axis = free[k] % 2 == 0 ? plan.x : plan.y;
            axis[free[k] / 2] += share * step[k];
        }
    }

    private static double at(Plan plan, int coordinate) {
        return coordinate % 2 == 0 ? plan.x[coordinate / 2] : plan.y[coordinate / 2];
    }

    /** What is missed at a plan, and how it changes; false where the plan has a leg shorter than its slabs' shift. */
    private boolean linearize(Plan plan) {
        for (int e = 0; e < missed.length; e++) {
            Equation equation = equations.get(e);
            missed[e] = equation.missed(plan);
            equation.slope(plan, row);
            for (int k = 0; k < free.length; k++) {
                least.matrix[e][k] = row[free[k]];
            }
            if (!(Math.abs(missed[e]) < Double.POSITIVE_INFINITY)) {
                return false;
            }
        }
        return true;
    }
}
