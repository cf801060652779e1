package twofold.picture;

/** Round numbers: 1, 2 or 5 times a power of ten for ticks, some more for magnifications. */
final class Nice {
    private static final double[] TICKS = {1, 2, 5, 10};
    private static final double[] FACTORS = {1, 1.5, 2, 3, 5, 10};
    private static final double[] TOPS = {
        1, 1.1, 1.2, 1.3, 1.4, 1.5, 1.6, 1.8, 2, 2.2, 2.5, 2.8, 3, 3.3, 3.6, 4, 4.5, 5, 5.5, 6, 6.5, 7, 7.5, 8, 9, 10
    };

    private Nice() {}

    /** The smallest tick step that is not below a positive number. */
    static double tick(double least) {
        return above(least, TICKS);
    }

    /** The largest of 1, 2 or 5 times a power of ten that is not above a positive number. */
    static double below(double most) {
        double power = power(most);
        double best = power;
        for (double s : TICKS) {
            if (s * power <= most * (1 + 1e-9)) {
                best = s * power;
            }
        }
        return best;
    }

    /** The smallest end of a scale that is not below a positive number. */
    static double top(double least) {
        return above(least, TOPS);
    }

    /** The largest magnification that is not above a number, at least 1. */
    static double factor(double most) {
        double power = power(most);
        double best = 1;
        for (double f : FACTORS) {
            if (f * power <= most * (1 + 1e-9)) {
                best = Math.max(best, f * power);
            }
        }
        return best;
    }

    /** Decimals that a multiple of a tick step needs. */
    static int decimals(double step) {
        return (int) Math.max(0, -Math.floor(Math.log10(step) + 1e-9));
    }

    private static double above(double least, double[] steps) {
        double power = power(least);
        for (double s : steps) {
            if (s * power >= least * (1 - 1e-9)) {
                return s * power;
            }
        }
        return 10 * power;
    }

    private static double power(double of) {
        return Math.pow(10, Math.floor(Math.log10(of)));
    }
}
