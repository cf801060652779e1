package twofold.picture;

import java.util.Arrays;
import java.util.Optional;
import java.util.OptionalDouble;
import twofold.design.Unit;
import twofold.layout.Laid;
import twofold.optics.Plane;
import twofold.study.Levered;
import twofold.study.Mapped;

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

    /** What a map came to. */
    public static MapPlot of(Mapped mapped) {
        Laid laid = mapped.question().laid();
        Unit unit = mapped.quantity().what().unit();
        int size = mapped.x().size() * mapped.y().size();
        double[] values = new double[size];
        Arrays.parallelSetAll(values, i -> unit.fromSi(mapped.value(i)));
        OptionalDouble x = Levered.now(laid, mapped.x().lever());
        OptionalDouble y = Levered.now(laid, mapped.y().lever());
        return new MapPlot(
                axis(mapped.x()),
                axis(mapped.y()),
                mapped.quantity().words(),
                unit.symbol(),
                Column.of(values),
                Optional.of(new Column(size, i -> mapped.halfTrace(Plane.TANGENTIAL, i))),
                Optional.of(new Column(size, i -> mapped.halfTrace(Plane.SAGITTAL, i))),
                mapped.hasMargins() ? Optional.of(new Column(size, mapped::margin)) : Optional.empty(),
                x.isPresent() && y.isPresent()
                        ? Optional.of(new Place(
                                mapped.x().unit().fromSi(x.getAsDouble()),
                                mapped.y().unit().fromSi(y.getAsDouble())))
                        : Optional.empty());
    }

    private static Axis axis(twofold.study.Axis axis) {
        double[] values = new double[axis.size()];
        Arrays.setAll(values, i -> axis.unit().fromSi(axis.value(i)));
        return new Axis(axis.lever().name(), axis.unit().symbol(), Column.of(values), axis.isList());
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
     * @param isList whether it has these values and none between
     */
    public record Axis(String name, String unit, Column values, boolean isList) {
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
