package twofold.layout;

import java.util.ArrayList;
import java.util.List;

/** Which of several equations say more, at a plan, than those before them: Gram–Schmidt on their slopes. */
final class Independent {
    /** What is left of a slope of length 1 that counts as nothing. */
    private static final double NOTHING = 1e-6;

    private Independent() {}

    /** The candidates that say more than the given ones and the candidates before. */
    static List<Equation> of(List<Equation> given, List<Equation> candidates, Plan plan) {
        List<double[]> basis = new ArrayList<>();
        for (Equation equation : given) {
            add(equation, plan, basis);
        }
        List<Equation> more = new ArrayList<>();
        for (Equation equation : candidates) {
            if (add(equation, plan, basis)) {
                more.add(equation);
            }
        }
        return more;
    }

    private static boolean add(Equation equation, Plan plan, List<double[]> basis) {
        double[] slope = new double[2 * plan.mirrors()];
        equation.slope(plan, slope);
        double whole = Math.sqrt(product(slope, slope));
        for (double[] b : basis) {
            double along = product(slope, b);
            for (int i = 0; i < slope.length; i++) {
                slope[i] -= along * b[i];
            }
        }
        double left = Math.sqrt(product(slope, slope));
        if (!(left > NOTHING * whole)) {
            return false;
        }
        for (int i = 0; i < slope.length; i++) {
            slope[i] /= left;
        }
        basis.add(slope);
        return true;
    }

    private static double product(double[] a, double[] b) {
        double sum = 0;
        for (int i = 0; i < a.length; i++) {
            sum += a[i] * b[i];
        }
        return sum;
    }
}
