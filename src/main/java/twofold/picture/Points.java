package twofold.picture;

import java.util.Arrays;

/** A buffer of points, px. Mutable and reused, so that drawing again costs no memory; never kept by a painter. */
public final class Points {
    private double[] xs = new double[64];
    private double[] ys = new double[64];
    private int size;

    /** Empties it. */
    public Points clear() {
        size = 0;
        return this;
    }

    /** Adds a point. */
    public Points add(double x, double y) {
        if (size == xs.length) {
            xs = Arrays.copyOf(xs, 2 * size);
            ys = Arrays.copyOf(ys, 2 * size);
        }
        xs[size] = x;
        ys[size++] = y;
        return this;
    }

    /** How many points there are. */
    public int size() {
        return size;
    }

    /** The x of a point. */
    public double x(int i) {
        return xs[i];
    }

    /** The y of a point. */
    public double y(int i) {
        return ys[i];
    }

    /** The array behind all x, of which the first {@link #size} count; not to be changed. */
    public double[] xs() {
        return xs;
    }

    /** The array behind all y, of which the first {@link #size} count; not to be changed. */
    public double[] ys() {
        return ys;
    }
}
