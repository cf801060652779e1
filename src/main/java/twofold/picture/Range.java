package twofold.picture;

import java.util.Arrays;
import java.util.stream.DoubleStream;

/**
 * Which values an axis or a scale of colours shows.
 *
 * @param from the smallest
 * @param to the largest, above {@code from}
 * @param isCutBelow whether there are smaller ones
 * @param isCutAbove whether there are larger ones
 */
record Range(double from, double to, boolean isCutBelow, boolean isCutAbove) {
    /** Share of the values at either end that may be cut off. */
    private static final double TAIL = 0.03;

    /** Tails are cut only where they would take more than this share of the range. */
    private static final double LONG = 0.4;

    /**
     * The range of some values: all of them, but for a tail that would squeeze the rest, as beam radii grow without end
     * towards a zone's edge.
     *
     * @param values what is not finite is left out
     * @param always values that have to be within
     */
    static Range of(DoubleStream values, double... always) {
        double[] sorted = values.filter(Double::isFinite).sorted().toArray();
        double from;
        double to;
        if (sorted.length == 0) {
            from = Double.POSITIVE_INFINITY;
            to = Double.NEGATIVE_INFINITY;
        } else {
            int tail = (int) (TAIL * sorted.length);
            double low = sorted[tail];
            double high = sorted[sorted.length - 1 - tail];
            from = sorted[0];
            to = sorted[sorted.length - 1];
            double body = high - low;
            if (body > 0 && low - from > LONG * (high - from)) {
                from = low - 0.1 * body;
            }
            if (body > 0 && to - high > LONG * (to - low)) {
                to = high + 0.1 * body;
            }
        }
        double least = sorted.length == 0 ? Double.POSITIVE_INFINITY : sorted[0];
        double most = sorted.length == 0 ? Double.NEGATIVE_INFINITY : sorted[sorted.length - 1];
        from = Math.min(from, Arrays.stream(always).min().orElse(from));
        to = Math.max(to, Arrays.stream(always).max().orElse(to));
        if (from > to) {
            return new Range(0, 1, false, false);
        }
        boolean cutBelow = least < from;
        boolean cutAbove = most > to;
        if (to - from <= 1e-9 * Math.max(Math.abs(from), Math.abs(to)) || to == from) {
            double some = Math.max(Math.abs(from) * 0.01, 1e-9);
            return new Range(from - some, to + some, false, false);
        }
        return new Range(from, to, cutBelow, cutAbove);
    }

    /** With something added at both ends, a share of the range. */
    Range padded(double share) {
        double some = share * (to - from);
        return new Range(from - some, to + some, isCutBelow, isCutAbove);
    }
}
