package twofold.cavity;

/**
 * The share of a Gaussian beam's power that falls outside an opening centred on it.
 *
 * <p>For a hole of radius a and radii u and v the power outside is ∫exp(−2a²k)/k dφ / (2πuv) with k = cos²φ/u² +
 * sin²φ/v². With tan φ = (v/u) tan ψ that is the mean of exp(−2a²/(u²cos²ψ + v²sin²ψ)) over ψ, smooth and at most 1; for v
 * = 0, a slit, it is Craig's form of erfc(√2 a/u) (IEEE MILCOM 91, 571 (1991), from memory). The trapezium rule converges
 * geometrically on a periodic function (Trefethen &amp; Weideman, SIAM Rev. 56, 385 (2014), from memory), and allocates nothing.
 */
public final class Clipping {
    /** How well two successive halvings of the step must agree, relative. */
    private static final double AGREE = 1e-13;

    private static final int FEWEST = 16;
    private static final int MOST = 1 << 16;

    private Clipping() {}

    /**
     * Outside a round hole.
     *
     * @param hole its radius, m
     * @param u radius of the beam in one plane, m
     * @param v radius in the other, m
     */
    public static double hole(double hole, double u, double v) {
        double a = 2 * hole * hole;
        // Over a quarter turn the function is symmetric at both ends, so that their halves count once.
        double sum = (Math.exp(-a / (u * u)) + Math.exp(-a / (v * v))) / 2 + inner(a, u, v, FEWEST, 1);
        double mean = sum / FEWEST;
        for (int steps = 2 * FEWEST; steps <= MOST; steps *= 2) {
            sum += inner(a, u, v, steps, 2);
            double finer = sum / steps;
            if (!(Math.abs(finer - mean) > AGREE * finer)) {
                return finer;
            }
            mean = finer;
        }
        return mean;
    }

    /** The function at every step, or every other step, between the ends. */
    private static double inner(double a, double u, double v, int steps, int stride) {
        double sum = 0;
        for (int i = 1; i < steps; i += stride) {
            double psi = i * Math.PI / (2 * steps);
            double x = u * Math.cos(psi);
            double y = v * Math.sin(psi);
            sum += Math.exp(-a / (x * x + y * y));
        }
        return sum;
    }

    /**
     * Outside a slit: erfc(√2 a/w).
     *
     * @param half its half width, m
     * @param radius of the beam across it, m
     */
    public static double slit(double half, double radius) {
        return hole(half, radius, 0);
    }

    /** Outside either of two openings that cut across each other. */
    public static double both(double one, double other) {
        return one + other - one * other;
    }
}
