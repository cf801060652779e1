package twofold.picture;

import java.util.Arrays;
import java.util.stream.IntStream;

/**
 * A map's grid laid onto px, thinned to what a picture can show: px of columns and rows, and numbers there. Values between
 * neighbours are bilinear.
 */
final class MapGrid {
    /** More columns or rows than this are thinned evenly. */
    private static final int MOST = 1000;

    private final int[] columnOf;
    private final int[] rowOf;
    private final int stride;
    final double[] xs;
    final double[] ys;

    /**
     * Lays a map out.
     *
     * @param x against px, rightwards
     * @param y against px, upwards
     */
    MapGrid(MapPlot plot, Scale x, Scale y) {
        stride = plot.x().values().size();
        columnOf = placed(plot.x());
        rowOf = placed(plot.y());
        xs = places(plot.x(), columnOf, x);
        ys = places(plot.y(), rowOf, y);
    }

    /** Which values are shown; of a list each twice, at both borders of its band. */
    private static int[] placed(MapPlot.Axis axis) {
        int[] shown = thinned(axis.values().size());
        return axis.isList()
                ? Arrays.stream(shown).flatMap(i -> IntStream.of(i, i)).toArray()
                : shown;
    }

    /** Of a list, bands that reach half way to their neighbours: a lever that has no value between has no line there. */
    private static double[] places(MapPlot.Axis axis, int[] shown, Scale scale) {
        double[] places = new double[shown.length];
        for (int i = 0; i < places.length; i++) {
            double here = axis.values().at(shown[i]);
            if (axis.isList()) {
                boolean isBegin = i % 2 == 0;
                int beside = i + (isBegin ? -1 : 1);
                double border = beside < 0
                        ? scale.from()
                        : beside == places.length
                                ? scale.to()
                                : (here + axis.values().at(shown[beside])) / 2;
                // A hair inside, so that the places ascend.
                here += (border - here) * (1 - 1e-6);
            }
            places[i] = scale.px(here);
        }
        return places;
    }

    private static int[] thinned(int size) {
        int count = Math.min(size, MOST);
        int[] picked = new int[count];
        for (int i = 0; i < count; i++) {
            picked[i] = count == 1 ? 0 : (int) Math.round((double) i * (size - 1) / (count - 1));
        }
        return picked;
    }

    /** The numbers of a grid of the map, row by row; what is not finite is NaN. */
    double[] numbers(Column grid) {
        return numbers(grid, stride, columnOf, rowOf);
    }

    /** The same numbers, wherever they lie. */
    static double[] shown(MapPlot plot, Column grid) {
        int stride = plot.x().values().size();
        return numbers(grid, stride, thinned(stride), thinned(plot.y().values().size()));
    }

    private static double[] numbers(Column grid, int stride, int[] columnOf, int[] rowOf) {
        double[] numbers = new double[columnOf.length * rowOf.length];
        for (int row = 0; row < rowOf.length; row++) {
            for (int column = 0; column < columnOf.length; column++) {
                double number = grid.at(rowOf[row] * stride + columnOf[column]);
                numbers[row * columnOf.length + column] = Double.isFinite(number) ? number : Double.NaN;
            }
        }
        return numbers;
    }

    /** A number at a pixel: bilinear, beyond the outermost values as there; NaN beside what is undefined. */
    double at(double[] numbers, double x, double y) {
        double column = place(xs, x);
        double row = place(ys, y);
        int c = (int) column;
        int r = (int) row;
        int nextColumn = Math.min(xs.length - 1, c + 1);
        int nextRow = Math.min(ys.length - 1, r + 1);
        double low = mix(numbers[r * xs.length + c], numbers[r * xs.length + nextColumn], column - c);
        double high = mix(numbers[nextRow * xs.length + c], numbers[nextRow * xs.length + nextColumn], column - c);
        return mix(low, high, row - r);
    }

    private static double mix(double one, double other, double share) {
        return one + share * (other - one);
    }

    /** The index into {@link #numbers} of the cell that holds a pixel. */
    int nearest(double x, double y) {
        return (int) Math.round(place(ys, y)) * xs.length + (int) Math.round(place(xs, x));
    }

    /** Whether columns or rows follow each other at one distance. */
    static boolean isEven(double[] places) {
        double step = (places[places.length - 1] - places[0]) / Math.max(1, places.length - 1);
        for (int i = 0; i < places.length; i++) {
            if (Math.abs(places[i] - places[0] - i * step) > 0.05 * Math.abs(step)) {
                return false;
            }
        }
        return true;
    }

    /** The fractional index of a pixel, from the first to the last; places ascend or descend. */
    private static double place(double[] places, double px) {
        int last = places.length - 1;
        double sign = places[last] >= places[0] ? 1 : -1;
        if (sign * (px - places[0]) <= 0) {
            return 0;
        }
        if (sign * (px - places[last]) >= 0) {
            return last;
        }
        int low = 0;
        int high = last;
        while (high - low > 1) {
            int middle = (low + high) / 2;
            if (sign * (px - places[middle]) >= 0) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return low + (px - places[low]) / (places[high] - places[low]);
    }
}
