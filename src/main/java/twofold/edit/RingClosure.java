package twofold.edit;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.RealVector;
import org.apache.commons.math3.linear.SingularValueDecomposition;
import twofold.design.Field;
import twofold.design.Turn;
import twofold.design.Unit;

/**
 * How far the beam of a typed ring, once round, misses the place and direction in which it began.
 *
 * @param plan with every turn stated: those with which it closes best
 * @param x missed along the first leg, m
 * @param y missed to the left of it, m
 * @param turn missed direction, rad, left positive, from −π to π
 */
record RingClosure(ListedPlan plan, double x, double y, double turn) {
    /** What may be missed: a person types round numbers. */
    private static final double CLOSE = 1e-5;

    private static final double CLOSE_TURN = Math.toRadians(0.01);

    /** Turns beyond so many are not tried; a ring then turns to the left throughout. */
    private static final int MOST_OPEN = 12;

    private static final int MOST_STEPS = 60;
    private static final double EXACT = 1e-12;

    /** The closure with the turns that close best. */
    static RingClosure of(ListedPlan typed) {
        List<Integer> open = new ArrayList<>();
        for (int i = 0; i < typed.turns().size(); i++) {
            if (typed.turns().get(i).isEmpty()) {
                open.add(i);
            }
        }
        int choices = open.size() <= MOST_OPEN ? 1 << open.size() : 1;
        RingClosure best = with(typed, open, 0);
        for (int choice = 1; choice < choices; choice++) {
            RingClosure other = with(typed, open, choice);
            // What differs by rounding alone is the mirror image; of the two, the first.
            if (other.missed() < best.missed() - EXACT) {
                best = other;
            }
        }
        return best;
    }

    private static RingClosure with(ListedPlan typed, List<Integer> open, int choice) {
        List<Optional<Turn>> turns = new ArrayList<>(typed.turns());
        for (int i = 0; i < open.size(); i++) {
            turns.set(open.get(i), Optional.of((choice >> i & 1) == 0 ? Turn.LEFT : Turn.RIGHT));
        }
        return measured(new ListedPlan(true, typed.legs(), typed.angles(), turns, typed.radii()));
    }

    private static RingClosure measured(ListedPlan plan) {
        double x = 0;
        double y = 0;
        double heading = 0;
        for (int i = 0; i < plan.legs().size(); i++) {
            x += plan.legs().get(i) * Math.cos(heading);
            y += plan.legs().get(i) * Math.sin(heading);
            heading += sign(plan, i) * (Math.PI - 2 * plan.angles().get(i));
        }
        return new RingClosure(plan, x, y, Math.IEEEremainder(heading, 2 * Math.PI));
    }

    private static int sign(ListedPlan plan, int fold) {
        return plan.turns().get(fold).orElse(Turn.LEFT).sign();
    }

    private double arm() {
        return plan.legs().stream().mapToDouble(Double::doubleValue).average().orElseThrow();
    }

    private double missed() {
        return Math.hypot(Math.hypot(x, y), arm() * turn);
    }

    /** Whether it counts as closed. */
    boolean closes() {
        return Math.hypot(x, y) <= CLOSE && Math.abs(turn) <= CLOSE_TURN;
    }

    /** How far it misses, in words. */
    String words() {
        return Unit.MM.shown(Math.hypot(x, y)) + " mm and " + Unit.DEG.shown(Math.abs(turn)) + "°";
    }

    /**
     * The closest plan that closes: the least sum of squares of changed lengths and of changed angles times a mean leg, by
     * Gauss–Newton steps with the pseudo-inverse. Empty where the steps find none.
     */
    Optional<ListedPlan> nearest() {
        int n = plan.legs().size();
        double arm = arm();
        RingClosure now = this;
        for (int step = 0; step < MOST_STEPS; step++) {
            if (now.missed() < EXACT) {
                return Optional.of(now.plan());
            }
            double[][] slopes = now.slopes(arm);
            RealVector wanted = new ArrayRealVector(new double[] {-now.x(), -now.y(), -arm * now.turn()});
            Array2DRowRealMatrix matrix = new Array2DRowRealMatrix(slopes, false);
            RealVector back = change(now.plan(), plan, arm);
            RealVector to = new SingularValueDecomposition(matrix)
                    .getSolver()
                    .solve(wanted.subtract(matrix.operate(back)))
                    .add(back);
            List<Double> legs = new ArrayList<>();
            List<Double> angles = new ArrayList<>();
            for (int i = 0; i < n; i++) {
                legs.add(now.plan().legs().get(i) + to.getEntry(i));
                angles.add(now.plan().angles().get(i) + to.getEntry(n + i) / arm);
            }
            if (!legs.stream().allMatch(Field.LEG::accepts) || !angles.stream().allMatch(Field.INCIDENCE::accepts)) {
                return Optional.empty();
            }
            now = measured(new ListedPlan(true, legs, angles, plan.turns(), plan.radii()));
        }
        return Optional.empty();
    }

    /** From one plan to another, in lengths. */
    private static RealVector change(ListedPlan from, ListedPlan to, double arm) {
        int n = from.legs().size();
        RealVector change = new ArrayRealVector(2 * n);
        for (int i = 0; i < n; i++) {
            change.setEntry(i, to.legs().get(i) - from.legs().get(i));
            change.setEntry(n + i, arm * (to.angles().get(i) - from.angles().get(i)));
        }
        return change;
    }

    /** How x, y and turn (times the arm) follow legs, then angles (times the arm). */
    private double[][] slopes(double arm) {
        int n = plan.legs().size();
        double[][] slopes = new double[3][2 * n];
        double heading = 0;
        double atX = 0;
        double atY = 0;
        for (int i = 0; i < n; i++) {
            slopes[0][i] = Math.cos(heading);
            slopes[1][i] = Math.sin(heading);
            atX += plan.legs().get(i) * Math.cos(heading);
            atY += plan.legs().get(i) * Math.sin(heading);
            heading += sign(plan, i) * (Math.PI - 2 * plan.angles().get(i));
            // All that follows turns about this mirror, by twice the angle, the other way.
            double turned = -2.0 * sign(plan, i) / arm;
            slopes[0][n + i] = -turned * (y - atY);
            slopes[1][n + i] = turned * (x - atX);
            slopes[2][n + i] = arm * turned;
        }
        return slopes;
    }
}
