package twofold.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.IntStream;
import twofold.cavity.Cavity;
import twofold.cavity.Chain;
import twofold.cavity.Trial;
import twofold.cavity.Zones;
import twofold.design.Edge;
import twofold.design.Part;
import twofold.optics.Plane;

/**
 * Sweeps and maps to draw, of an invented folded cavity in closed form: two flat ends, arms of 480 and 620 mm, two curved
 * folds of 100 mm radius of curvature with a gap between them. Seen from the gap, a mirror of focal length f with an arm a
 * behind it images the end to f + f²/(a − f), so that the gap's zones lie between 2f and 2f + f²/(a − f) of either arm
 * (thin-lens imaging), with f = (R/2) cosθ tangentially and (R/2)/cosθ sagittally.
 */
final class Plots {
    private static final double ARM_1 = 480;
    private static final double ARM_2 = 620;
    private static final double RADIUS = 100;
    private static final double WAVELENGTH = 800e-6;

    private Plots() {}

    /** (A + D)/2 of the round trip, as 2AD − 1 with the one-way matrix arm, lens, gap, lens, arm. */
    static double halfTrace(double gap, double degrees, Plane plane) {
        double f = focal(degrees, plane);
        double a = 1 - gap / f;
        double c = -2 / f + gap / f / f;
        double oneWayA = a + c * ARM_2;
        double oneWayD = a + c * ARM_1;
        return 2 * oneWayA * oneWayD - 1;
    }

    private static double focal(double degrees, Plane plane) {
        double cos = Math.cos(Math.toRadians(degrees));
        return plane == Plane.TANGENTIAL ? RADIUS / 2 * cos : RADIUS / 2 / cos;
    }

    /** The radius on the first end, µm: w⁴ = (λ/π)² (−BD)/(AC) at a flat end. */
    static double radius(double gap, double degrees, Plane plane) {
        double f = focal(degrees, plane);
        double m = 1 - gap / f;
        double c = -2 / f + gap / f / f;
        double b = ARM_1 * (m + c * ARM_2) + gap + m * ARM_2;
        double ratio = -b * (m + c * ARM_1) / ((m + c * ARM_2) * c);
        return ratio > 0 ? 1e3 * Math.sqrt(WAVELENGTH / Math.PI * Math.sqrt(ratio)) : Double.NaN;
    }

    private static double roundness(double gap, double degrees) {
        double t = radius(gap, degrees, Plane.TANGENTIAL);
        double s = radius(gap, degrees, Plane.SAGITTAL);
        return Math.min(t, s) / Math.max(t, s);
    }

    static double[] steps(double from, double to, int count) {
        return IntStream.range(0, count)
                .mapToDouble(i -> from + (to - from) * i / (count - 1))
                .toArray();
    }

    private static Column column(double[] at, DoubleUnaryOperator of) {
        return Column.of(IntStream.range(0, at.length)
                .mapToDouble(i -> of.applyAsDouble(at[i]))
                .toArray());
    }

    /** The gap swept at 8°: radii of both planes, roundness, half traces, and a length; five units in all. */
    static SweepPlot sweep(int count) {
        double[] gaps = steps(98, 112, count);
        List<SweepPlot.Line> lines = new ArrayList<>();
        for (Plane plane : Plane.values()) {
            lines.add(new SweepPlot.Line(
                    "radius",
                    "radius@End A:" + plane.word(),
                    "µm",
                    Optional.of(plane),
                    column(gaps, g -> radius(g, 8, plane)),
                    OptionalDouble.empty(),
                    plane == Plane.TANGENTIAL ? OptionalDouble.of(700) : OptionalDouble.empty()));
        }
        lines.add(new SweepPlot.Line(
                "",
                "roundness@End A",
                "",
                Optional.empty(),
                column(gaps, g -> roundness(g, 8)),
                OptionalDouble.of(0.9),
                OptionalDouble.empty()));
        lines.add(SweepPlot.Line.of(
                "half_trace", "", Optional.of(Plane.TANGENTIAL), column(gaps, g -> halfTrace(g, 8, Plane.TANGENTIAL))));
        lines.add(SweepPlot.Line.of("round_trip", "mm", Optional.empty(), column(gaps, g -> 2 * (ARM_1 + ARM_2 + g))));
        lines.add(SweepPlot.Line.of(
                "fsr", "MHz", Optional.empty(), column(gaps, g -> 149_896.229 / (ARM_1 + ARM_2 + g))));
        lines.add(SweepPlot.Line.of("turn", "°", Optional.empty(), column(gaps, g -> 16)));
        return new SweepPlot("Over gap", "gap", "mm", Column.of(gaps), lines, bands(8), OptionalDouble.of(105));
    }

    /** Both zones of each plane along the gap. */
    static List<SweepPlot.Band> bands(double degrees) {
        List<SweepPlot.Band> bands = new ArrayList<>();
        for (Plane plane : Plane.values()) {
            double f = focal(degrees, plane);
            double long_ = f * f / (ARM_2 - f);
            double short_ = f * f / (ARM_1 - f);
            bands.add(new SweepPlot.Band(plane, 2 * f, 2 * f + long_, "C = 0", "A = 0"));
            bands.add(new SweepPlot.Band(plane, 2 * f + short_, 2 * f + long_ + short_, "D = 0", "B = 0"));
        }
        return bands;
    }

    /** The tangential radius on an end over gap and incidence, with both planes' half traces and a requirement. */
    static MapPlot map(int columns, int rows) {
        double[] gaps = steps(96, 114, columns);
        double[] angles = steps(2, 20, rows);
        double[] radii = new double[columns * rows];
        double[][] traces = new double[2][columns * rows];
        double[] margins = new double[columns * rows];
        for (int i = 0; i < radii.length; i++) {
            double gap = gaps[i % columns];
            double angle = angles[i / columns];
            traces[0][i] = halfTrace(gap, angle, Plane.TANGENTIAL);
            traces[1][i] = halfTrace(gap, angle, Plane.SAGITTAL);
            boolean both = Math.abs(traces[0][i]) < 1 && Math.abs(traces[1][i]) < 1;
            radii[i] = both ? radius(gap, angle, Plane.TANGENTIAL) : Double.NaN;
            margins[i] = both ? (roundness(gap, angle) - 0.9) / 0.9 : Double.NaN;
        }
        return new MapPlot(
                new MapPlot.Axis("gap", "mm", Column.of(gaps), false),
                new MapPlot.Axis("fold angle", "°", Column.of(angles), false),
                "radius@End A:tangential",
                "µm",
                Column.of(radii),
                Optional.of(Column.of(traces[0])),
                Optional.of(Column.of(traces[1])),
                Optional.of(Column.of(margins)),
                Optional.of(new MapPlot.Place(105, 8)));
    }

    /** A quantity that is defined everywhere: the round trip over gap and incidence. */
    static MapPlot lengths(int columns, int rows) {
        MapPlot map = map(columns, rows);
        return new MapPlot(
                map.x(),
                map.y(),
                "round_trip",
                "mm",
                new Column(
                        columns * rows,
                        i -> 2 * (ARM_1 + ARM_2 + map.x().values().at(i % columns))
                                + map.y().values().at(i / columns)),
                map.tangential(),
                map.sagittal(),
                Optional.empty(),
                Optional.empty());
    }

    /** A drawing on any painter. */
    interface Drawing {
        void draw(Painter painter, double width, double height);
    }

    /** All that plots draw, of a cavity and of the sweeps and maps here. */
    static List<Drawing> drawings(Cavity cavity) {
        SweepPlot sweep = sweep(57);
        MapPlot map = map(48, 36);
        MapPlot lengths = lengths(30, 20);
        List<Drawing> all = new ArrayList<>();
        all.add(strip(cavity, 0)::draw);
        all.add(strip(cavity, cavity.ledgerLeg().orElse(0))::draw);
        all.add(diagram(cavity)::draw);
        all.add(new LedgerDrawing(cavity.laid(), cavity.ledger(), Edge.LOWER)::draw);
        all.add((painter, w, h) -> new SweepDrawing(sweep).draw(painter, w, h));
        all.add((painter, w, h) -> new SweepDrawing(sweep).draw(painter, w, h, OptionalDouble.of(103)));
        all.add((painter, w, h) -> new MapDrawing(map).draw(painter, w, h));
        all.add((painter, w, h) -> new MapDrawing(map).draw(painter, w, h, Optional.of(new MapPlot.Place(101, 4))));
        all.add((painter, w, h) -> new MapDrawing(lengths).draw(painter, w, h));
        return all;
    }

    /** The zones along a leg. */
    static ZoneStripDrawing strip(Cavity cavity, int leg) {
        Trial trial = Chain.of(cavity.laid()).trial();
        trial.run();
        List<Part> parts = cavity.laid().design().parts();
        String name = parts.get(cavity.laid().legs().get(leg).from()).name() + " to "
                + parts.get(cavity.laid().legs().get(leg).to()).name();
        return new ZoneStripDrawing(Zones.of(trial, leg, Plane.TANGENTIAL), Zones.of(trial, leg, Plane.SAGITTAL), name);
    }

    /** The diagram of a cavity, with a trail that leads to where it is. */
    static GDiagramDrawing diagram(Cavity cavity) {
        return new GDiagramDrawing(trail(cavity, Plane.TANGENTIAL), trail(cavity, Plane.SAGITTAL));
    }

    private static List<GPair> trail(Cavity cavity, Plane plane) {
        return GPair.of(cavity.mode(plane))
                .map(g -> List.of(new GPair(g.g1() - 0.4, g.g2() + 0.3), new GPair(g.g1() - 0.1, g.g2() + 0.2), g))
                .orElse(List.of());
    }
}
