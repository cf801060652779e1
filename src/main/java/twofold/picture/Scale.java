package twofold.picture;

/**
 * Numbers along an axis against px.
 *
 * @param from the number at the begin
 * @param to the number at the end, above {@code from}
 * @param begin px
 * @param end px; below {@code begin} for an axis that runs upwards
 */
record Scale(double from, double to, double begin, double end) {
    /** The pixel of a number. */
    double px(double value) {
        return begin + (value - from) / (to - from) * (end - begin);
    }

    /** The number at a pixel, not limited to the axis. */
    double value(double px) {
        return from + (px - begin) / (end - begin) * (to - from);
    }

    /** Whether a pixel lies on the axis. */
    boolean holds(double px) {
        return px >= Math.min(begin, end) && px <= Math.max(begin, end);
    }
}
