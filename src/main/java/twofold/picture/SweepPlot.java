package twofold.picture;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import twofold.optics.Plane;

/**
 * What a picture of a sweep shows: quantities over one lever. Every number is in the unit that is shown beside it.
 *
 * @param lever name of the lever
 * @param unit symbol of its unit; empty for a pure number
 * @param values of the lever, finite, ascending
 * @param lines the quantities
 * @param bands where each plane is stable
 * @param now the lever's value in the design as it stands
 */
public record SweepPlot(
        String lever, String unit, Column values, List<Line> lines, List<Band> bands, OptionalDouble now) {
    /** Copies the lists; refuses values that are not ascending and lines of another length. */
    public SweepPlot {
        values.requireAscending("the values of " + lever);
        lines = List.copyOf(lines);
        bands = List.copyOf(bands);
        for (Line line : lines) {
            if (line.values().size() != values.size()) {
                throw new IllegalArgumentException(line.label() + " has "
                        + line.values().size() + " values for " + values.size() + " of " + lever);
            }
        }
    }

    /**
     * A quantity along the sweep.
     *
     * @param label its name, with its place where it has one
     * @param unit symbol; lines of one unit share a panel; empty for a pure number
     * @param plane of a quantity that has one
     * @param values one for each of the lever's; NaN where undefined
     * @param least what a requirement asks at the least
     * @param most what a requirement allows at the most
     */
    public record Line(
            String label,
            String unit,
            Optional<Plane> plane,
            Column values,
            OptionalDouble least,
            OptionalDouble most) {
        /** A quantity of which nothing is required. */
        public static Line of(String label, String unit, Optional<Plane> plane, Column values) {
            return new Line(label, unit, plane, values, OptionalDouble.empty(), OptionalDouble.empty());
        }
    }

    /**
     * A stretch of the lever on which a plane is stable.
     *
     * @param plane which
     * @param from where it begins
     * @param to where it ends
     * @param lower name of the edge where it begins, short; empty where it begins before the sweep does
     * @param upper name of the edge where it ends, short; empty where it goes on beyond the sweep
     */
    public record Band(Plane plane, double from, double to, String lower, String upper) {}
}
