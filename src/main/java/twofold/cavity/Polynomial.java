package twofold.cavity;

import java.util.ArrayList;
import java.util.List;

/** Real polynomials of low degree, as coefficients with the lowest first. */
final class Polynomial {
    private static final int MOST_HALVINGS = 200;

    private Polynomial() {}

    /** The value at a place. */
    static double value(double[] polynomial, double x) {
        double value = 0;
        for (int i = polynomial.length - 1; i >= 0; i--) {
            value = value * x + polynomial[i];
        }
        return value;
    }

    /** The slope at a place. */
    static double slope(double[] polynomial, double x) {
        return value(derivative(polynomial), x);
    }

    private static double[] derivative(double[] polynomial) {
        double[] derivative = new double[Math.max(1, polynomial.length - 1)];
        for (int i = 1; i < polynomial.length; i++) {
            derivative[i - 1] = i * polynomial[i];
        }
        return derivative;
    }

    /**
     * The places where a polynomial changes sign, ascending. Between neighbouring extrema there is at most one.
     *
     * @param within how far from 0 they are looked for
     */
    static List<Double> simpleRoots(double[] polynomial, double within) {
        int degree = polynomial.length - 1;
        while (degree > 0 && polynomial[degree] == 0) {
            degree--;
        }
        if (degree == 0) {
            return List.of();
        }
        if (degree == 1) {
            double root = -polynomial[0] / polynomial[1];
            return Math.abs(root) <= within ? List.of(root + 0.0) : List.of();
        }
        List<Double> bounds = new ArrayList<>();
        bounds.add(-within);
        bounds.addAll(simpleRoots(derivative(polynomial), within));
        bounds.add(within);
        List<Double> roots = new ArrayList<>();
        for (int i = 1; i < bounds.size(); i++) {
            double low = bounds.get(i - 1);
            double high = bounds.get(i);
            double atLow = value(polynomial, low);
            if (atLow * value(polynomial, high) < 0) {
                roots.add(halved(polynomial, low, high, atLow > 0));
            }
        }
        return roots;
    }

    private static double halved(double[] polynomial, double from, double to, boolean positiveAtFrom) {
        double low = from;
        double high = to;
        for (int i = 0; i < MOST_HALVINGS; i++) {
            double middle = (low + high) / 2;
            if (middle == low || middle == high) {
                break;
            }
            if (value(polynomial, middle) > 0 == positiveAtFrom) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return (low + high) / 2;
    }
}
