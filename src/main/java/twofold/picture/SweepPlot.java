package twofold.picture;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import twofold.design.Design;
import twofold.design.Unit;
import twofold.optics.Plane;
import twofold.study.Asked;
import twofold.study.Axis;
import twofold.study.Levered;
import twofold.study.Swept;
import twofold.study.ZonesAlong;

/**
 * What a picture of a sweep shows: quantities over one lever. Every number is in the unit that is shown beside it.
 *
 * @param title what is shown
 * @param lever name of the lever
 * @param unit symbol of its unit; empty for a pure number
 * @param values of the lever, finite, ascending
 * @param lines the quantities
 * @param bands where each plane is stable
 * @param now the lever's value in the design as it stands
 */
public record SweepPlot(
        String title,
        String lever,
        String unit,
        Column values,
        List<Line> lines,
        List<Band> bands,
        OptionalDouble now) {
    /** Copies the lists; refuses values that are not ascending, lines of another length and panels of two units. */
    public SweepPlot {
        values.requireAscending("the values of " + lever);
        lines = List.copyOf(lines);
        bands = List.copyOf(bands);
        Map<String, String> units = new HashMap<>();
        for (Line line : lines) {
            String first = units.computeIfAbsent(line.panel(), p -> line.unit());
            if (!first.equals(line.unit())) {
                throw new IllegalArgumentException(line.label() + " is in " + line.unit() + " on a panel in " + first);
            }
            if (line.values().size() != values.size()) {
                throw new IllegalArgumentException(line.label() + " has "
                        + line.values().size() + " values for " + values.size() + " of " + lever);
            }
        }
    }

    /** What a sweep came to, with what the design requires of its quantities. */
    public static SweepPlot of(Swept swept) {
        Axis axis = swept.axis();
        Design design = swept.question().laid().design();
        List<Asked> asked = swept.question().quantities();
        // Of one quantity in both planes the title says the rest.
        boolean isOne = asked.stream().map(Asked::wordsOfBoth).distinct().count() == 1;
        List<Line> lines = new ArrayList<>();
        for (int q = 0; q < asked.size(); q++) {
            int quantity = q;
            Asked what = asked.get(q);
            Unit unit = what.what().unit();
            double[] values = IntStream.range(0, axis.size())
                    .mapToDouble(i -> unit.fromSi(swept.answer(i, quantity)))
                    .toArray();
            lines.add(new Line(
                    what.what().title(),
                    isOne ? what.plane().map(Plane::word).orElse(what.words()) : what.words(),
                    unit.symbol(),
                    what.plane(),
                    Column.of(values),
                    bound(design, what, true),
                    bound(design, what, false)));
        }
        Unit unit = axis.unit();
        double[] values = IntStream.range(0, axis.size())
                .mapToDouble(i -> unit.fromSi(axis.value(i)))
                .toArray();
        List<Band> bands = swept.stable().stream()
                .map(s -> new Band(
                        s.plane(), unit.fromSi(s.from()), unit.fromSi(s.to()), name(s.lower()), name(s.upper())))
                .toList();
        return new SweepPlot(
                (isOne ? asked.get(0).wordsOfBoth() + " over " : "Over ")
                        + axis.lever().name(),
                axis.lever().name(),
                unit.symbol(),
                Column.of(values),
                lines,
                bands,
                shown(unit, Levered.now(swept.question().laid(), axis.lever())));
    }

    private static String name(Optional<ZonesAlong.Edge> edge) {
        return edge.map(e -> e.name().replace('-', '−')).orElse("");
    }

    private static OptionalDouble shown(Unit unit, OptionalDouble si) {
        return si.isPresent() ? OptionalDouble.of(unit.fromSi(si.getAsDouble())) : si;
    }

    /** The nearest that any requirement without {@code over} allows a quantity, in its unit. */
    private static OptionalDouble bound(Design design, Asked asked, boolean isLeast) {
        DoubleStream bounds = design.requirements().stream()
                .filter(r -> r.over().isEmpty() && asked.isOf(r))
                .map(r -> isLeast ? r.bound().least() : r.bound().most())
                .flatMapToDouble(OptionalDouble::stream);
        return shown(asked.what().unit(), isLeast ? bounds.max() : bounds.min());
    }

    /**
     * A quantity along the sweep.
     *
     * @param panel lines of one panel, which have one unit, share an axis
     * @param label its name, with its place where it has one
     * @param unit symbol; empty for a pure number
     * @param plane of a quantity that has one
     * @param values one for each of the lever's; NaN where undefined
     * @param least what a requirement asks at the least
     * @param most what a requirement allows at the most
     */
    public record Line(
            String panel,
            String label,
            String unit,
            Optional<Plane> plane,
            Column values,
            OptionalDouble least,
            OptionalDouble most) {
        /** A quantity of which nothing is required, in a panel with all others of its unit. */
        public static Line of(String label, String unit, Optional<Plane> plane, Column values) {
            return new Line(unit, label, unit, plane, values, OptionalDouble.empty(), OptionalDouble.empty());
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
