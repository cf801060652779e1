package twofold.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import twofold.cavity.Cavity;
import twofold.cavity.Chain;
import twofold.cavity.Ledger;
import twofold.cavity.Trial;
import twofold.cavity.ZoneEdge;
import twofold.cavity.Zones;
import twofold.design.Design;
import twofold.design.Edge;
import twofold.design.Shape;
import twofold.optics.Plane;

/** The strip of zones, the diagram of standing waves and the ledger. */
class ZonesDrawingTest {
    private static final int GAP_LEG = 1;

    private static Zones zones(Cavity cavity, int leg, Plane plane) {
        Trial trial = Chain.of(cavity.laid()).trial();
        trial.run();
        return Zones.of(trial, leg, plane);
    }

    private static String svg(Plots.Drawing drawing, double width, double height, Theme theme) {
        SvgPainter painter = new SvgPainter(width, height, theme, "");
        drawing.draw(painter, width, height);
        return painter.text();
    }

    @Test
    void stripsLookAsTheyDid() {
        Cavity cavity = Drawn.solved(Drawn.zFold());
        Golden.matches("zones-z-fold", svg(Plots.strip(cavity, GAP_LEG)::draw, 600, 160, Theme.LIGHT));
        Golden.matches("zones-z-fold-small-dark", svg(Plots.strip(cavity, GAP_LEG)::draw, 300, 110, Theme.DARK));
        Golden.matches("zones-bow-tie", svg(Plots.strip(Drawn.solved(Drawn.bowTie()), 0)::draw, 600, 160, Theme.LIGHT));
        Golden.matches("zones-none", svg(Plots.strip(Drawn.solved(Drawn.onEdge()), 0)::draw, 300, 110, Theme.LIGHT));
    }

    @Test
    void edgesLieWhereTheyAreAndAnswerToThePointer() {
        Cavity cavity = Drawn.solved(Drawn.zFold());
        ZoneStripDrawing strip = Plots.strip(cavity, GAP_LEG);
        for (Plane plane : Plane.values()) {
            double y = plane == Plane.TANGENTIAL ? 50 : 110;
            List<ZoneEdge> edges = zones(cavity, GAP_LEG, plane).edges();
            Set<ZoneEdge> hit = new LinkedHashSet<>();
            List<Double> at = new ArrayList<>();
            for (ZoneEdge edge : edges) {
                double sum = 0;
                int count = 0;
                for (double x = 0; x < 600; x += 0.25) {
                    Optional<ZoneStripDrawing.Hit> found = strip.edgeAt(x, y, 600, 160);
                    if (found.isPresent() && found.get().edge().equals(edge)) {
                        assertThat(found.get().plane()).isEqualTo(plane);
                        hit.add(edge);
                        sum += x;
                        count++;
                    }
                }
                at.add(sum / count);
            }
            assertThat(hit).containsExactlyElementsOf(edges);
            // The pointer catches an edge evenly on both sides, so the middle of where it does is the edge; looked for
            // in quarters of a pixel.
            double perMetre = (at.get(3) - at.get(0))
                    / (edges.get(3).path() - edges.get(0).path());
            double second =
                    at.get(0) + perMetre * (edges.get(1).path() - edges.get(0).path());
            assertThat(at.get(1)).isCloseTo(second, within(0.5));
        }
        assertThat(strip.edgeAt(5, 5, 600, 160)).isEmpty();
    }

    @Test
    void anEdgeSaysWhatHappensThere() {
        Cavity cavity = Drawn.solved(Drawn.zFold());
        ZoneEdge edge = zones(cavity, GAP_LEG, Plane.SAGITTAL).edges().get(3);
        assertThat(new ZoneStripDrawing.Hit(Plane.SAGITTAL, edge).words())
                .isEqualTo(
                        "sagittal edge at " + Figures.mm(edge.path()) + ": the end mirrors are imaged on each other");
    }

    @Test
    void theOverlapIsFramedAndItsLengthSaid() {
        Cavity cavity = Drawn.solved(Drawn.zFold());
        Recorder recorder = new Recorder();
        Plots.strip(cavity, GAP_LEG).draw(recorder, 600, 160);
        Zones t = zones(cavity, GAP_LEG, Plane.TANGENTIAL);
        Zones s = zones(cavity, GAP_LEG, Plane.SAGITTAL);
        double from =
                Math.max(t.here().orElseThrow().from(), s.here().orElseThrow().from());
        double to = Math.min(t.here().orElseThrow().to(), s.here().orElseThrow().to());
        assertThat(recorder.texts()).contains("both stable over " + Figures.mm(to - from), "now 105.00 mm");
        Recorder.Thing frame = recorder.areas(Ink.GOOD, ZoneStripDrawing.BOTH).get(0);
        List<Recorder.Thing> all = recorder.areas(Ink.TANGENTIAL, ZoneStripDrawing.TINT);
        double perMetre =
                width(all.get(0)) / (t.zones().get(0).to() - t.zones().get(0).from());
        assertThat(width(frame) / perMetre).isCloseTo(to - from, within(1e-12));
    }

    private static double width(Recorder.Thing area) {
        return area.points().get(1).x() - area.points().get(0).x();
    }

    @Test
    void withoutAZoneThereAreWords() {
        Recorder recorder = new Recorder();
        Plots.strip(Drawn.solved(Drawn.onEdge()), 0).draw(recorder, 300, 110);
        assertThat(recorder.texts()).contains("no zone along this leg");
        assertThat(Plots.strip(Drawn.solved(Drawn.onEdge()), 0).edgeAt(150, 60, 300, 110))
                .isEmpty();
    }

    @Test
    void twoMirrorsAloneLieWhereTheClosedFormPutsThem() {
        // Kogelnik & Li, Appl. Opt. 5, 1550 (1966): g = 1 − L/R for either mirror.
        Design design = Design.of(
                "Two mirrors",
                1064e-9,
                Shape.STANDING_WAVE,
                List.of(Drawn.curved("Near", 0, 0, 300), Drawn.curved("Far", 250, 0, -400)));
        for (Plane plane : Plane.values()) {
            GPair g = GPair.of(Drawn.solved(design).mode(plane)).orElseThrow();
            // A handful of roundings of numbers of order 1.
            assertThat(g.g1()).isCloseTo(1 - 250.0 / 300, within(1e-14));
            assertThat(g.g2()).isCloseTo(1 + 250.0 / 400, within(1e-14));
        }
    }

    static java.util.stream.Stream<Design> designs() {
        return ReadableTest.designs();
    }

    @ParameterizedTest
    @MethodSource("designs")
    void pointsAndHalfTracesAgree(Design design) {
        Cavity cavity = Drawn.solved(design);
        for (Plane plane : Plane.values()) {
            Optional<GPair> g = GPair.of(cavity.mode(plane));
            assertThat(g.isPresent()).isEqualTo(design.shape() == Shape.STANDING_WAVE);
            g.ifPresent(p -> {
                double halfTrace = cavity.mode(plane).halfTrace();
                assertThat(2 * p.g1() * p.g2() - 1).isCloseTo(halfTrace, within(1e-12 * (1 + Math.abs(halfTrace))));
            });
        }
    }

    @Test
    void diagramsLookAsTheyDid() {
        Cavity cavity = Drawn.solved(Drawn.zFold());
        Golden.matches("g-diagram-z-fold", svg(Plots.diagram(cavity)::draw, 220, 220, Theme.LIGHT));
        Golden.matches("g-diagram-ring", svg(Plots.diagram(Drawn.solved(Drawn.bowTie()))::draw, 220, 220, Theme.DARK));
    }

    @Test
    void aFarPointStaysAtTheRimAndDrawsNoBadNumber() {
        GPair far = new GPair(-3e14, 2e-9);
        SvgPainter svg = new SvgPainter(220, 220, Theme.LIGHT, "");
        new GDiagramDrawing(List.of(new GPair(0.5, 0.5), far), List.of(far)).draw(svg, 220, 220);
        assertThat(svg.text()).contains("<polyline");
    }

    @Test
    void ledgersLookAsTheyDid() {
        Cavity cavity = Drawn.solved(Drawn.zFold());
        LedgerDrawing ledger = new LedgerDrawing(cavity.laid(), cavity.ledger(), Edge.LOWER);
        Golden.matches("ledger-z-fold", svg(ledger::draw, 320, ledger.height(), Theme.LIGHT));
        Golden.matches(
                "ledger-none-dark",
                svg(new LedgerDrawing(cavity.laid(), Optional.empty(), Edge.UPPER)::draw, 320, 110, Theme.DARK));
    }

    @Test
    void aLedgersBarsAreAsLongAsItsShares() {
        Cavity cavity = Drawn.solved(Drawn.zFold());
        Ledger ledger = cavity.ledger().orElseThrow();
        LedgerDrawing drawing = new LedgerDrawing(cavity.laid(), cavity.ledger(), Edge.LOWER);
        Recorder recorder = new Recorder();
        drawing.draw(recorder, 400, drawing.height());
        // The example of the page on files: −0.954, −0.954 and +1.924 mm make 0.016 mm.
        assertThat(recorder.texts())
                .containsSubsequence("Fold 1", "−0.954 mm", "Rod", "+1.924 mm", "Fold 2", "−0.954 mm");
        assertThat(recorder.texts()).containsSubsequence("true split, T − S", "+0.016 mm");
        Recorder.Thing fold = recorder.areas(Ink.OPTIC_EDGE, LedgerDrawing.TINT).get(0);
        Recorder.Thing rod =
                recorder.areas(Ink.CRYSTAL_EDGE, LedgerDrawing.TINT).get(0);
        assertThat(fold.points().get(1).x()).isCloseTo(rod.points().get(0).x(), within(1e-9));
        assertThat(width(fold) / width(rod))
                .isCloseTo(
                        -ledger.shares().get(0).length()
                                / ledger.shares().get(1).length(),
                        within(1e-9));
    }

    @Test
    void inLessHeightTheSmallestSharesAreOne() {
        Cavity cavity = Drawn.solved(Drawn.zFold());
        LedgerDrawing drawing = new LedgerDrawing(cavity.laid(), cavity.ledger(), Edge.LOWER);
        Recorder recorder = new Recorder();
        drawing.draw(recorder, 400, drawing.height() - 20);
        assertThat(recorder.texts()).containsSubsequence("Rod", "+1.924 mm", "2 more parts", "−1.907 mm");
    }
}
