package twofold.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import twofold.optics.Plane;

/** Sweeps. */
class SweepDrawingTest {
    private static Recorder drawn(SweepPlot plot, double width, double height) {
        Recorder recorder = new Recorder();
        new SweepDrawing(plot).draw(recorder, width, height);
        return recorder;
    }

    private static SweepPlot plain(SweepPlot.Line... lines) {
        int size = lines[0].values().size();
        return new SweepPlot(
                "Over gap",
                "gap",
                "mm",
                Column.of(size == 1 ? new double[] {7} : Plots.steps(0, 10, size)),
                List.of(lines),
                List.of(),
                OptionalDouble.empty());
    }

    private static SweepPlot.Line line(String unit, double... values) {
        return SweepPlot.Line.of("q " + unit, unit, Optional.of(Plane.TANGENTIAL), Column.of(values));
    }

    @Test
    void sweepsLookAsTheyDid() {
        SvgPainter large = new SvgPainter(1000, 640, Theme.LIGHT, "");
        new SweepDrawing(Plots.sweep(61)).draw(large, 1000, 640);
        Golden.matches("sweep", large.text());
        SvgPainter small = new SvgPainter(420, 300, Theme.DARK, "");
        new SweepDrawing(Plots.sweep(61)).draw(small, 420, 300, OptionalDouble.of(103));
        Golden.matches("sweep-small-dark", small.text());
    }

    @Test
    void aClickFindsTheLeversValue() {
        SweepDrawing drawing = new SweepDrawing(Plots.sweep(61));
        Recorder recorder = drawn(Plots.sweep(61), 800, 500);
        Recorder.Thing now = recorder.lines(Ink.SELECTED, Dash.DASH_DOT).get(0);
        assertThat(drawing.valueAt(now.points().get(0).x(), 800, 500).orElseThrow())
                .isCloseTo(105, within(1e-9));
        assertThat(drawing.valueAt(3, 800, 500)).isEmpty();
        assertThat(drawing.valueAt(797, 800, 500)).isEmpty();
    }

    @Test
    void gapsStayGaps() {
        double nan = Double.NaN;
        Recorder recorder = drawn(plain(line("mm", 1, 2, nan, nan, 3, 2, 4, nan, 5)), 600, 300);
        List<Recorder.Thing> curves = recorder.lines(Ink.TANGENTIAL, Dash.SOLID).stream()
                .filter(l -> l.stroke().width() == 2.2 && l.points().size() > 1)
                .toList();
        // Two pieces and the piece beside the name; a lonely value is a dot.
        assertThat(curves.stream().map(c -> c.points().size())).containsExactly(2, 3, 2);
        assertThat(recorder.areas(Ink.TANGENTIAL, 1)).hasSize(1);
    }

    @Test
    void planesAreToldApartByTheirLines() {
        SweepPlot.Line t = line("mm", 1, 2, 3);
        SweepPlot.Line s = SweepPlot.Line.of("s", "mm", Optional.of(Plane.SAGITTAL), Column.of(3, 2, 1));
        SweepPlot.Line n = SweepPlot.Line.of("n", "mm", Optional.empty(), Column.of(2, 2, 1));
        SweepPlot.Line m = SweepPlot.Line.of("m", "mm", Optional.empty(), Column.of(1, 2, 2));
        Recorder recorder = drawn(plain(t, s, n, m), 600, 300);
        assertThat(recorder.lines(Ink.TANGENTIAL, Dash.SOLID)).isNotEmpty();
        assertThat(recorder.lines(Ink.TANGENTIAL, Dash.DASHED)).isEmpty();
        assertThat(recorder.lines(Ink.SAGITTAL, Dash.DASHED)).isNotEmpty();
        assertThat(recorder.lines(Ink.SAGITTAL, Dash.SOLID)).isEmpty();
        assertThat(recorder.lines(Ink.TEXT, Dash.DASH_DOT)).hasSize(2);
        assertThat(recorder.lines(Ink.TEXT, Dash.DOTTED)).hasSize(2);
        assertThat(recorder.texts()).contains("q mm", "s", "n", "m");
    }

    @Test
    void whatHasNoRoomIsCounted() {
        assertThat(drawn(Plots.sweep(61), 1000, 640).texts())
                .contains("1 more quantity has no room", "round_trip", "fsr")
                .doesNotContain("turn");
    }

    @Test
    void thePointerReadsEveryCurveAndNothingWhereUndefined() {
        Recorder recorder = new Recorder();
        new SweepDrawing(plain(line("mm", 1, 2, Double.NaN), line("µm", 10, 20, 40)))
                .draw(recorder, 700, 400, OptionalDouble.of(10));
        assertThat(recorder.texts()).contains("at 10.00 mm", "40.0").doesNotContain("NaN");
    }

    @Test
    void zoneEdgesAreNamedInTheirPlanesLane() {
        Recorder recorder = drawn(Plots.sweep(61), 1000, 640);
        assertThat(recorder.texts().stream().filter(t -> t.equals("C = 0"))).hasSize(2);
        assertThat(recorder.areas(Ink.TANGENTIAL, ZoneStripDrawing.TINT)).hasSize(2);
        assertThat(recorder.areas(Ink.SAGITTAL, ZoneStripDrawing.TINT)).hasSize(2);
    }

    @Test
    void valuesWithoutEndOneValueAndNoneCanBeDrawn() {
        double inf = Double.POSITIVE_INFINITY;
        for (SweepPlot plot : List.of(
                plain(line("mm", 1, 1e300, inf, -1e300)),
                plain(line("mm", 5)),
                plain(line("mm", Double.NaN, Double.NaN)))) {
            SvgPainter svg = new SvgPainter(500, 300, Theme.LIGHT, "");
            new SweepDrawing(plot).draw(svg, 500, 300);
            assertThat(svg.text()).contains("Over gap");
        }
        assertThat(drawn(plain(line("mm", Double.NaN, Double.NaN)), 500, 300).texts())
                .contains("undefined all along");
    }

    @Test
    void aCallersMistakesAreRefused() {
        assertThatThrownBy(() -> new SweepPlot(
                        "Over gap",
                        "gap",
                        "mm",
                        Column.of(1, 2),
                        List.of(line("mm", 1)),
                        List.of(),
                        OptionalDouble.empty()))
                .hasMessageContaining("1 values for 2 of gap");
        SweepPlot.Line stray = new SweepPlot.Line(
                "mm", "q", "µm", Optional.empty(), Column.of(1, 2), OptionalDouble.empty(), OptionalDouble.empty());
        assertThatThrownBy(() -> new SweepPlot(
                        "Over gap",
                        "gap",
                        "mm",
                        Column.of(1, 2),
                        List.of(line("mm", 1, 2), stray),
                        List.of(),
                        OptionalDouble.empty()))
                .hasMessageContaining("q is in µm on a panel in mm");
        assertThatThrownBy(() -> new SweepPlot(
                        "Over gap", "gap", "mm", Column.of(2, 1), List.of(), List.of(), OptionalDouble.empty()))
                .hasMessageContaining("ascending");
        assertThatThrownBy(() -> new SweepPlot(
                        "Over gap", "gap", "mm", Column.of(), List.of(), List.of(), OptionalDouble.empty()))
                .hasMessageContaining("none");
    }
}
