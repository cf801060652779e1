package twofold.picture;

import java.util.Arrays;

/** A hatching: parallel lines at 45°, as plain geometry, so that every painter paints the same. */
public enum Hatch {
    /** /// for the tangential plane. */
    TANGENTIAL(1),
    /** \\\ for the sagittal plane. */
    SAGITTAL(-1);

    /** From line to line along x, px. */
    private static final double SPACING = 8;

    /** Shorter lines, which touch a corner, are left out, px. */
    private static final double SHORTEST = 0.1;

    private final int sign;

    Hatch(int sign) {
        this.sign = sign;
    }

    /** The lines inside a polygon, in pairs of begin and end. Lines lie where x ± y is a multiple of the spacing. */
    Points lines(Points polygon) {
        int n = polygon.size();
        double[] level = new double[n];
        double low = Double.POSITIVE_INFINITY;
        double high = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < n; i++) {
            level[i] = (polygon.x(i) + sign * polygon.y(i)) / SPACING;
            low = Math.min(low, level[i]);
            high = Math.max(high, level[i]);
        }
        Points lines = new Points();
        double[] crossings = new double[n];
        for (double line = Math.ceil(low); line <= high; line++) {
            int found = 0;
            for (int i = 0, j = n - 1; i < n; j = i++) {
                if (level[i] > line != level[j] > line) {
                    double share = (line - level[i]) / (level[j] - level[i]);
                    crossings[found++] = polygon.x(i) + share * (polygon.x(j) - polygon.x(i));
                }
            }
            Arrays.sort(crossings, 0, found);
            for (int k = 0; k + 1 < found; k += 2) {
                if (crossings[k + 1] - crossings[k] > SHORTEST) {
                    add(lines, crossings[k], line);
                    add(lines, crossings[k + 1], line);
                }
            }
        }
        return lines;
    }

    /** Which places are hatched. */
    interface Region {
        /** Whether a pixel is. */
        boolean holds(double x, double y);
    }

    /** The lines inside a region within a rectangle, to a pixel, in pairs of begin and end. */
    Points lines(double left, double top, double width, double height, Region region) {
        Points lines = new Points();
        double one = left + sign * top;
        double other = left + width + sign * (top + height);
        double third = left + sign * (top + height);
        double fourth = left + width + sign * top;
        double low = Math.min(Math.min(one, other), Math.min(third, fourth)) / SPACING;
        double high = Math.max(Math.max(one, other), Math.max(third, fourth)) / SPACING;
        for (double line = Math.ceil(low); line <= high; line++) {
            double begin = Double.NaN;
            for (double x = left; x <= left + width + 1; x++) {
                double y = sign * (line * SPACING - x);
                boolean inside = x <= left + width && y >= top && y <= top + height && region.holds(x, y);
                if (inside && Double.isNaN(begin)) {
                    begin = x;
                } else if (!inside && !Double.isNaN(begin)) {
                    if (x - 1 > begin) {
                        add(lines, begin, line);
                        add(lines, x - 1, line);
                    }
                    begin = Double.NaN;
                }
            }
        }
        return lines;
    }

    private void add(Points lines, double x, double line) {
        lines.add(x, sign * (line * SPACING - x));
    }
}
