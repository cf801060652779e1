package twofold.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import twofold.optics.Plane;

/** Maps. */
class MapDrawingTest {
    private static MapPlot plain(double[] xs, double[] ys, double... values) {
        return new MapPlot(
                new MapPlot.Axis("gap", "mm", Column.of(xs), false),
                new MapPlot.Axis("angle", "°", Column.of(ys), false),
                "radius",
                "µm",
                Column.of(values),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty());
    }

    @Test
    void mapsLookAsTheyDid() {
        SvgPainter large = new SvgPainter(900, 620, Theme.LIGHT, "");
        new MapDrawing(Plots.map(48, 36)).draw(large, 900, 620);
        Golden.matches("map", large.text());
        SvgPainter small = new SvgPainter(420, 320, Theme.DARK, "");
        new MapDrawing(Plots.lengths(24, 18)).draw(small, 420, 320);
        Golden.matches("map-everywhere-dark", small.text());
    }

    @ParameterizedTest
    @EnumSource(Theme.class)
    void everyCellHasItsValuesColourAndGapsArePaper(Theme theme) {
        double[] values = {10, 20, 30, 40, Double.NaN, 60, 70, 80, 90};
        MapPlot plot = plain(new double[] {1, 2, 3}, new double[] {5, 6, 7}, values);
        MapDrawing drawing = new MapDrawing(plot);
        ImagePainter painter = new ImagePainter(600, 480, 1, theme);
        drawing.draw(painter, 600, 480);
        int seen = 0;
        for (int x = 0; x < 600; x++) {
            for (int y = 0; y < 480; y++) {
                Optional<MapPlot.Place> place = drawing.pointAt(x + 0.5, y + 0.5, 600, 480);
                // Off the cells' borders and off contour lines, which pass between the middles.
                if (place.isPresent() && isMiddle(place.get())) {
                    int column = (int) Math.round(place.get().x()) - 1;
                    int row = (int) Math.round(place.get().y()) - 5;
                    double value = values[3 * row + column];
                    int expected =
                            Double.isNaN(value) ? theme.rgb(Ink.PAPER) : ColourMap.rgb(ColourMap.number(value, 10, 90));
                    if (painter.rgb(x, y) == expected) {
                        seen |= 1 << (3 * row + column);
                    }
                }
            }
        }
        assertThat(seen).as("cells in their colour").isEqualTo(0x1ff);
    }

    private static boolean isMiddle(MapPlot.Place place) {
        return Math.abs(place.x() - Math.rint(place.x())) < 0.2 && Math.abs(place.y() - Math.rint(place.y())) < 0.2;
    }

    @Test
    void aClickFindsBothLeversValues() {
        MapPlot plot = Plots.map(48, 36);
        MapDrawing drawing = new MapDrawing(plot);
        Recorder recorder = new Recorder();
        drawing.draw(recorder, 800, 600);
        // The mark of now is the diamond drawn last with that ink before the legend's.
        List<Recorder.Thing> diamonds = recorder.lines(Ink.SELECTED, Dash.SOLID).stream()
                .filter(l -> l.points().size() == 4)
                .toList();
        double x = diamonds.get(0).points().get(1).x();
        double y = diamonds.get(0).points().get(0).y();
        MapPlot.Place place = drawing.pointAt(x, y, 800, 600).orElseThrow();
        assertThat(place.x()).isCloseTo(105, within(1e-9));
        assertThat(place.y()).isCloseTo(8, within(1e-9));
        assertThat(drawing.pointAt(2, 2, 800, 600)).isEmpty();
        assertThat(recorder.texts()).anyMatch(t -> t.startsWith("now gap 105.00 mm, fold angle 8.0"));
    }

    @ParameterizedTest
    @EnumSource(Plane.class)
    void zoneOutlinesFollowTheClosedForm(Plane plane) {
        MapDrawing drawing = new MapDrawing(Plots.map(181, 181));
        Recorder recorder = new Recorder();
        drawing.draw(recorder, 900, 700);
        Dash dash = plane == Plane.TANGENTIAL ? Dash.SOLID : Dash.DASHED;
        List<Recorder.Thing> lines = recorder.lines(Pane.ink(plane), dash).stream()
                .filter(l -> l.stroke().width() == 2)
                .toList();
        assertThat(lines).hasSize(4);
        for (Recorder.Thing line : lines) {
            for (Recorder.Spot spot : line.points()) {
                MapPlot.Place p = drawing.pointAt(spot.x(), spot.y(), 900, 700).orElseThrow();
                double halfTrace = Plots.halfTrace(p.x(), p.y(), plane);
                // Linear within cells of 0.1 mm by 0.1°, where the half trace bends by less than 0.5 per mm².
                assertThat(Math.abs(halfTrace)).isCloseTo(1, within(0.02));
            }
        }
    }

    @Test
    void theRequirementsOutlineIsWhereTheMarginIsNought() {
        double[] axis = Plots.steps(-5, 5, 41);
        double[] margins = new double[41 * 41];
        for (int i = 0; i < margins.length; i++) {
            margins[i] = 3 - Math.hypot(axis[i % 41], axis[i / 41]);
        }
        MapPlot plot = new MapPlot(
                new MapPlot.Axis("a", "mm", Column.of(axis), false),
                new MapPlot.Axis("b", "mm", Column.of(axis), false),
                "q",
                "",
                new Column(margins.length, i -> axis[i % 41]),
                Optional.empty(),
                Optional.empty(),
                Optional.of(Column.of(margins)),
                Optional.empty());
        MapDrawing drawing = new MapDrawing(plot);
        Recorder recorder = new Recorder();
        drawing.draw(recorder, 700, 600);
        Recorder.Thing outline = recorder.lines(Ink.TEXT, Dash.SOLID).stream()
                .filter(l -> l.stroke().width() == 2.6 && l.points().size() > 4)
                .findFirst()
                .orElseThrow();
        for (Recorder.Spot spot : outline.points()) {
            MapPlot.Place p = drawing.pointAt(spot.x(), spot.y(), 700, 600).orElseThrow();
            // A chord of a distance over a cell of 0.25 is off by its square over 8 r.
            assertThat(Math.hypot(p.x(), p.y())).isCloseTo(3, within(0.25 * 0.25 / 8 / 3 + 1e-9));
        }
        assertThat(recorder.texts()).contains("all requirements hold");
    }

    @Test
    void unevenLeversSingleValuesAndEmptyMapsCanBeDrawn() {
        double nan = Double.NaN;
        for (MapPlot plot : List.of(
                plain(new double[] {250, 500, 2000}, new double[] {1, 2}, 1, 2, 3, 4, 5, 6),
                plain(new double[] {7}, new double[] {1, 2}, 1, 2),
                plain(new double[] {7}, new double[] {0}, 3),
                plain(new double[] {1, 2}, new double[] {1, 2}, nan, nan, nan, Double.POSITIVE_INFINITY))) {
            SvgPainter svg = new SvgPainter(400, 300, Theme.LIGHT, "");
            new MapDrawing(plot).draw(svg, 400, 300, Optional.of(new MapPlot.Place(7, 1)));
            assertThat(svg.text()).contains("<image ").doesNotContain("NaN");
        }
    }

    @Test
    void unevenCellsReachHalfwayToTheirNeighbours() {
        MapPlot plot = plain(new double[] {0, 10, 40}, new double[] {0, 1}, 1, 2, 3, 1, 2, 3);
        MapDrawing drawing = new MapDrawing(plot);
        ImagePainter painter = new ImagePainter(500, 400, 1, Theme.LIGHT);
        drawing.draw(painter, 500, 400);
        int middle = ColourMap.rgb(ColourMap.number(2, 1, 3));
        double least = Double.POSITIVE_INFINITY;
        double most = Double.NEGATIVE_INFINITY;
        for (int x = 0; x < 500; x++) {
            Optional<MapPlot.Place> place = drawing.pointAt(x + 0.5, 60, 500, 400);
            if (place.isPresent() && painter.rgb(x, 60) == middle) {
                least = Math.min(least, place.get().x());
                most = Math.max(most, place.get().x());
            }
        }
        // To a pixel, which is 0.2 mm here.
        assertThat(least).isCloseTo(5, within(0.3));
        assertThat(most).isCloseTo(25, within(0.3));
    }

    @Test
    void aMapOfMoreCellsThanCanBeSeenIsThinned() {
        int side = 3000;
        MapPlot plot = new MapPlot(
                new MapPlot.Axis("a", "mm", new Column(side, i -> i), false),
                new MapPlot.Axis("b", "mm", new Column(side, i -> i), false),
                "q",
                "",
                new Column(side * side, i -> i % side),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty());
        Recorder recorder = new Recorder();
        new MapDrawing(plot).draw(recorder, 600, 400);
        // Picked unevenly, so a cell of the picture for each px of the pane.
        Recorder.Thing cells = recorder.drawn(Recorder.Mark.IMAGE).findFirst().orElseThrow();
        int width = (int)
                Math.ceil(cells.points().get(1).x() - cells.points().get(0).x());
        int height = (int)
                Math.ceil(cells.points().get(2).y() - cells.points().get(1).y());
        assertThat(cells.text()).isEqualTo(width + " × " + height);
    }

    @Test
    void aGridThatDoesNotFitIsRefused() {
        assertThatThrownBy(() -> plain(new double[] {1, 2}, new double[] {1, 2}, 1, 2, 3))
                .hasMessageContaining("a grid of 3 numbers; accepted: 4");
        assertThatThrownBy(() -> plain(new double[] {1, 1}, new double[] {1}, 1, 2))
                .hasMessageContaining("ascending");
    }

    /** A list of values 1, 2 and 4 upwards, over 0 to 10 to the right; all holds from 5 on, but in the middle band. */
    private static MapPlot listed(double whereMet) {
        double[] xs = Plots.steps(0, 10, 11);
        double[] margins = new double[33];
        for (int i = 0; i < margins.length; i++) {
            margins[i] = i / 11 == 1 ? -1 : xs[i % 11] - whereMet;
        }
        return new MapPlot(
                new MapPlot.Axis("gap", "mm", Column.of(xs), false),
                new MapPlot.Axis("radius", "mm", Column.of(1, 2, 4), true),
                "q",
                "",
                new Column(33, i -> i % 11),
                Optional.empty(),
                Optional.empty(),
                Optional.of(Column.of(margins)),
                Optional.empty());
    }

    @Test
    void aListsBandsAreOutlinedAlongTheirBorders() {
        MapDrawing drawing = new MapDrawing(listed(5));
        Recorder recorder = new Recorder();
        drawing.draw(recorder, 700, 600);
        List<Recorder.Thing> outlines = recorder.lines(Ink.TEXT, Dash.SOLID).stream()
                .filter(l -> l.stroke().width() == 2.6 && l.points().size() > 4)
                .toList();
        // The lowest band reaches to 1.5 and the highest begins at 3: half way to their neighbours.
        assertThat(outlines).hasSize(2);
        for (Recorder.Thing outline : outlines) {
            for (Recorder.Spot spot : outline.points()) {
                MapPlot.Place p = drawing.pointAt(spot.x(), spot.y(), 700, 600).orElseThrow();
                // The borders lie a millionth of a band inside.
                boolean onBorder = Math.abs(p.y() - 1.5) < 1e-4 || Math.abs(p.y() - 3) < 1e-4;
                boolean onEdge = Math.abs(p.x() - 5) < 1e-9;
                assertThat(onBorder || onEdge).as("%s", p).isTrue();
            }
        }
    }

    @Test
    void wordsTellWhereNoOutlineCan() {
        Recorder nowhere = new Recorder();
        new MapDrawing(listed(11)).draw(nowhere, 700, 600);
        assertThat(nowhere.texts()).contains("all requirements hold: nowhere here");
        MapPlot met = listed(5);
        Recorder everywhere = new Recorder();
        new MapDrawing(new MapPlot(
                        met.x(),
                        met.y(),
                        "q",
                        "",
                        met.values(),
                        Optional.empty(),
                        Optional.empty(),
                        Optional.of(new Column(33, i -> 0)),
                        Optional.empty()))
                .draw(everywhere, 700, 600);
        assertThat(everywhere.texts()).contains("all requirements hold: everywhere here");
    }
}
