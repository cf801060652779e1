package twofold.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import twofold.cavity.Cavity;
import twofold.cavity.Face;
import twofold.optics.Plane;

/** The beam along the path: what is drawn where, and what is at a pixel. */
class BeamDrawingTest {
    private static final double PIXEL = 1e-6;

    private final Cavity zFold = Drawn.solved(Drawn.zFold());
    private final BeamDrawing beam = new BeamDrawing(zFold);
    private final BeamView all = beam.all(1000, 360);

    private static Recorder drawn(BeamDrawing beam, BeamView view) {
        Recorder recorder = new Recorder();
        beam.draw(recorder, view);
        return recorder;
    }

    private static Recorder.Thing curve(Recorder recorder, Ink ink, Dash dash) {
        return recorder.lines(ink, dash).stream()
                .filter(t -> t.stroke().width() == 2 && t.points().size() > 2)
                .findFirst()
                .orElseThrow();
    }

    @Test
    void tangentialLiesAboveSolidAndSagittalBelowDashedToOneScale() {
        Recorder recorder = drawn(beam, all);
        Recorder.Thing t = curve(recorder, Ink.TANGENTIAL, Dash.SOLID);
        Recorder.Thing s = curve(recorder, Ink.SAGITTAL, Dash.DASHED);
        assertThat(t.points()).allMatch(p -> p.y() < 180);
        assertThat(s.points()).allMatch(p -> p.y() > 180);
        // The lane's edges, from which radii are measured.
        List<Double> edges = recorder.lines(Ink.AXIS, Dash.SOLID).stream()
                .filter(l -> l.points().get(0).y() == l.points().get(1).y()
                        && l.points().get(1).x() - l.points().get(0).x() > 900)
                .map(l -> l.points().get(0).y())
                .toList();
        double up = edges.get(0);
        double down = edges.get(1);
        double tRadius =
                zFold.tangential().station(0, Face.SURFACE).orElseThrow().radius();
        double sRadius = zFold.sagittal().station(0, Face.SURFACE).orElseThrow().radius();
        double scale = (up - t.points().get(0).y()) / tRadius;
        assertThat(s.points().get(0).y()).isCloseTo(down + sRadius * scale, within(PIXEL));
    }

    @Test
    void theTangentialRadiusJumpsByTheIndexAtABrewsterFace() {
        Recorder.Thing t = curve(drawn(beam, all), Ink.TANGENTIAL, Dash.SOLID);
        double lane = drawn(beam, all).lines(Ink.AXIS, Dash.SOLID).stream()
                .map(l -> l.points().get(0).y())
                .filter(y -> y > 100 && y < 200)
                .findFirst()
                .orElseThrow();
        double entry = all.stretch().x(0.48 + 0.0525 - 0.0025);
        List<Recorder.Spot> at =
                t.points().stream().filter(p -> Math.abs(p.x() - entry) < 1e-3).toList();
        assertThat(at).hasSize(2);
        // At Brewster's angle the beam is n times wider inside; Kogelnik et al., IEEE J. Quantum Electron. 8, 373
        // (1972).
        assertThat((lane - at.get(1).y()) / (lane - at.get(0).y())).isCloseTo(1.76, within(1e-6));
    }

    @Test
    void theCurveIsTrueWithinAFifthOfAPixel() {
        BeamView near = all.over(
                all.stretch().zoomed(40, all.stretch().x(0.5325), beam.course().length()));
        for (BeamView view : List.of(all, near)) {
            Recorder.Thing t = curve(drawn(beam, view), Ink.TANGENTIAL, Dash.SOLID);
            List<Recorder.Spot> points = t.points();
            double scale = scale(points, view);
            for (int i = 1; i < points.size(); i++) {
                double x = (points.get(i).x() + points.get(i - 1).x()) / 2;
                double y = (points.get(i).y() + points.get(i - 1).y()) / 2;
                if (points.get(i).x() - points.get(i - 1).x() > 1e-6) {
                    double there = radius(view.stretch().path(x));
                    double base = points.get(i).y() + radiusAt(points, i, view) * scale;
                    assertThat(base - y).isCloseTo(there * scale, within(0.2));
                }
            }
        }
    }

    private double radius(double path) {
        int leg = beam.course().legAt(path);
        return zFold.tangential().radiusAt(leg, path - beam.course().start(leg)).orElseThrow();
    }

    private double radiusAt(List<Recorder.Spot> points, int i, BeamView view) {
        // Just before a point, so that at a face the side of the chord counts.
        double path = view.stretch().path(points.get(i).x())
                - 1e-9 * view.stretch().path(points.get(i).x());
        return radius(path);
    }

    private double scale(List<Recorder.Spot> points, BeamView view) {
        Recorder.Spot a = points.get(1);
        Recorder.Spot b = points.get(points.size() / 4);
        return (b.y() - a.y())
                / (radius(view.stretch().path(a.x())) - radius(view.stretch().path(b.x())));
    }

    @Test
    void axesHaveRoundNumbersAndUnits() {
        List<String> texts = drawn(beam, all).texts();
        assertThat(texts).contains("radius, µm", "path, mm", "200", "400", "600", "1000");
    }

    @Test
    void waistsShowTheirRadiiOnPaper() {
        // Rounded in the page on files: 38.7 and 22.3 µm.
        assertThat(drawn(beam, all.numbering(true)).texts()).contains("38.7 µm", "22.3 µm");
        assertThat(drawn(beam, all).texts()).doesNotContain("38.7 µm");
    }

    @Test
    void theCrosshairSaysPathAndBothRadii() {
        List<String> texts = drawn(beam, all.crossing(OptionalDouble.of(0.2))).texts();
        String t = Figures.um(zFold.tangential().radiusAt(0, 0.2).orElseThrow());
        String s = Figures.um(zFold.sagittal().radiusAt(0, 0.2).orElseThrow());
        assertThat(texts).contains("200.00 mm", t, s);
    }

    @Test
    void anUnstablePlaneHasWordsAndNoCurve() {
        BeamDrawing one = new BeamDrawing(Drawn.solved(Drawn.oneSided()));
        Recorder recorder = drawn(one, one.all(900, 360));
        assertThat(recorder.texts()).anyMatch(t -> t.startsWith("No tangential beam: unstable, half trace 1.138"));
        assertThat(recorder.lines(Ink.TANGENTIAL, Dash.SOLID).stream()
                        .filter(t -> t.points().get(0).y() > 40))
                .isEmpty();
        assertThat(curve(recorder, Ink.SAGITTAL, Dash.DASHED).points()).isNotEmpty();
    }

    @Test
    void aRingEndsWhereItBegan() {
        BeamDrawing ring = new BeamDrawing(Drawn.solved(Drawn.bowTie()));
        List<String> texts = drawn(ring, ring.all(1000, 360)).texts();
        assertThat(texts.stream().filter("Curved 1"::equals)).hasSize(2);
        Recorder.Thing t = curve(drawn(ring, ring.all(1000, 360)), Ink.TANGENTIAL, Dash.SOLID);
        double begin = t.points().get(0).y();
        double end = t.points().get(t.points().size() - 1).y();
        // A closed mode: what comes round is what set out, to the rounding of the chain.
        assertThat(end).isCloseTo(begin, within(1e-6));
    }

    @Test
    void aPixelOnAGlyphFindsItsPart() {
        for (int part = 0; part < 5; part++) {
            double x = all.stretch().x(beam.course().middle(part));
            assertThat(beam.partAt(all, x, 180, 8)).hasValue(part);
        }
        assertThat(beam.partAt(all, all.stretch().x(0.2), 180, 8)).isEmpty();
        assertThat(beam.partAt(all, all.stretch().x(0.48), 20, 8)).isEmpty();
    }

    @Test
    void aPixelFindsItsPathAndOneOnADotItsWaist() {
        assertThat(beam.pathAt(all, all.stretch().x(0.3), 100).orElseThrow()).isCloseTo(0.3, within(1e-12));
        assertThat(beam.pathAt(all, 3, 100)).isEmpty();
        Recorder recorder = drawn(beam, all);
        Recorder.Thing dot = recorder.areas(Ink.TANGENTIAL, 1).stream()
                .filter(a -> a.points().size() == 16
                        && Math.abs(a.points().get(0).x() - all.stretch().x(0.5325)) < 8)
                .findFirst()
                .orElseThrow();
        double x = dot.points().stream().mapToDouble(Recorder.Spot::x).average().orElseThrow();
        double y = dot.points().stream().mapToDouble(Recorder.Spot::y).average().orElseThrow();
        Optional<BeamDrawing.WaistDot> waist = beam.waistAt(all, x + 2, y - 2, 6);
        assertThat(waist).isPresent();
        assertThat(waist.get().plane()).isEqualTo(Plane.TANGENTIAL);
        assertThat(waist.get().waist().radius()).isCloseTo(38.7e-6, within(0.05e-6));
        assertThat(beam.waistAt(all, x, y - 40, 6)).isEmpty();
    }

    @Test
    void selectionHasBrackets() {
        assertThat(drawn(beam, all).lines(Ink.SELECTED, Dash.SOLID)).isEmpty();
        assertThat(drawn(beam, all.selecting(OptionalInt.of(2))).lines(Ink.SELECTED, Dash.SOLID))
                .hasSize(1);
    }
}
