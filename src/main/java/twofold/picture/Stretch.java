package twofold.picture;

/**
 * A stretch of the unfolded path along the width of a pane.
 *
 * @param from path at the left, m
 * @param to path at the right, m, above {@code from}
 * @param left where it begins, px
 * @param right where it ends, px
 */
public record Stretch(double from, double to, double left, double right) {
    /** The shortest stretch that can be shown, m. */
    public static final double SHORTEST = 1e-5;

    /** The pixel of a path. */
    public double x(double path) {
        return left + (path - from) / (to - from) * (right - left);
    }

    /** The path at a pixel, m; not limited to the stretch. */
    public double path(double x) {
        return from + (x - left) / (right - left) * (to - from);
    }

    /** Zoomed by a factor; the path at the pixel stays there as far as the ends of the whole path allow. */
    public Stretch zoomed(double factor, double x, double whole) {
        double length = Math.min(whole, Math.max(Math.min(SHORTEST, whole), (to - from) / factor));
        double share = (x - left) / (right - left);
        return within(path(x) - share * length, length, whole);
    }

    /** Moved by px, as far as the ends of the whole path allow. */
    public Stretch panned(double dx, double whole) {
        double length = to - from;
        return within(from - dx * length / (right - left), length, whole);
    }

    private Stretch within(double start, double length, double whole) {
        double begin = Math.max(0, Math.min(whole - length, start));
        return new Stretch(begin, begin + length, left, right);
    }
}
