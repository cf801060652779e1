package twofold.cavity;

import twofold.optics.Plane;

/**
 * What rounding can make of 1 − |half trace|.
 *
 * <p>The walk over the magnitudes of all numbers, each leg lengthened by the coordinates that it is the difference of, gives matrices G that bound how errors grow along the chain. Each element
 * of the true chain is then good to √N u G, with N the number of elementary steps and u = 2⁻⁵³; 1 − |half trace| is good to
 * what its formula in {@link twofold.optics.Mode} makes of that. This is the running error analysis of Wilkinson, Rounding
 * Errors in Algebraic Processes (1963), with √N for N because rounding errors are as good as independent (Higham &amp; Mary,
 * SIAM J. Sci. Comput. 41, A2815 (2019)); both from memory.
 */
final class Rounding {
    /** Half a unit in the last place of 1. */
    private static final double UNIT = 0x1p-53;

    private Rounding() {}

    /** The bound on the error of {@link Trial#margin} after a run. */
    static double ofMargin(Trial trial, Plane plane) {
        double u = Math.sqrt(trial.steps()) * UNIT;
        Trial grown = trial.magnitudes();
        if (trial.isRing()) {
            double da = u * Math.abs(grown.closed(plane, 0));
            double db = u * Math.abs(grown.closed(plane, 1));
            double dc = u * Math.abs(grown.closed(plane, 2));
            double dd = u * Math.abs(grown.closed(plane, 3));
            double bc = product(trial.closed(plane, 1), trial.closed(plane, 2), db, dc);
            double difference = Math.abs(trial.closed(plane, 0) - trial.closed(plane, 3));
            double square = (difference + da + dd) * (da + dd) / 2;
            return (bc + square) / (1 + Math.abs(trial.halfTrace(plane)));
        }
        // 1 − |h| is −2bc near h = 1 and 2ad near h = −1.
        return trial.halfTrace(plane) > 0
                ? 2
                        * product(
                                trial.way(plane, 1),
                                trial.way(plane, 2),
                                u * grown.way(plane, 1),
                                u * grown.way(plane, 2))
                : 2
                        * product(
                                trial.way(plane, 0),
                                trial.way(plane, 3),
                                u * grown.way(plane, 0),
                                u * grown.way(plane, 3));
    }

    /** The bound on the error of what is 0 at an edge of a zone. */
    static double of(Trial trial, EdgeCause cause, Plane plane) {
        return Math.sqrt(trial.steps()) * UNIT * cause.growth(trial.magnitudes(), plane);
    }

    /**
     * By how much to lengthen a leg so that the bound covers the rounding of the coordinates that it is the difference of:
     * twice their root sum of squares, given once and not at every step.
     */
    static double ofCoordinates(int steps, double coordinates) {
        return 2 * coordinates / Math.sqrt(steps);
    }

    /** The error of x y for errors dx and dy. */
    private static double product(double x, double y, double dx, double dy) {
        return Math.abs(x) * dy + Math.abs(y) * dx + dx * dy;
    }
}
