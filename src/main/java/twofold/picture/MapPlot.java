package twofold.picture;

import java.util.Optional;

/**
 * What a picture of a map shows: a quantity over two levers. Every number is in the unit that is shown beside it; grids run
 * along x first: index = row × columns + column, rows by y.
 *
 * @param x the lever to the right
 * @param y the lever upwards
 * @param quantity its name, with place and plane where it has them
 * @param unit symbol of its unit; empty for a pure number
 * @param values of the quantity; NaN where undefined
 * @param tangential half traces of that plane, pure numbers; NaN where nothing fits
 * @param sagittal half traces of that plane, pure numbers; NaN where nothing fits
 * @param margins the smallest margin of all requirements: they hold where it is at least 0; NaN where one is undefined
 * @param now where the design stands
 */
public record MapPlot(
        Axis x,
        Axis y,
        String quantity,
        String unit,
        Column values,
        Optional<Column> tangential,
        Optional<Column> sagittal,
        Optional<Column> margins,
        Optional<Place> now) {
    /** Refuses grids that do not fit the axes. */
    public MapPlot {
        int size = x.values().size() * y.values().size();
        requireSize(size, Optional.of(values));
        requireSize(size, tangential);
        requireSize(size, sagittal);
        requireSize(size, margins);
    }

    private static void requireSize(int size, Optional<Column> grid) {
        grid.filter(g -> g.size() != size).ifPresent(g -> {
            throw new IllegalArgumentException("a grid of " + g.size() + " numbers; accepted: " + size);
        });
    }

    /**
     * A lever.
     *
     * @param name of the lever
     * @param unit symbol of its unit; empty for a pure number
     * @param values finite, ascending
     */
    public record Axis(String name, String unit, Column values) {
        /** Refuses values that are not ascending. */
        public Axis {
            values.requireAscending("the values of " + name);
        }
    }

    /**
     * A place on the map.
     *
     * @param x value of its lever
     * @param y value of its lever
     */
    public record Place(double x, double y) {}
}
