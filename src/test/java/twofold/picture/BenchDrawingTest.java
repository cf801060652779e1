package twofold.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import twofold.cavity.Cavity;
import twofold.cavity.Face;
import twofold.design.Point;
import twofold.layout.Leg;

/** The plan: what is drawn where, and what is at a pixel. */
class BenchDrawingTest {
    /** Coordinates are sums of a few products: far below a hundredth of a pixel. */
    private static final double PIXEL = 1e-6;

    private final Cavity zFold = Drawn.solved(Drawn.zFold());
    private final BenchDrawing bench = new BenchDrawing(zFold);
    private final BenchView all = bench.all(1000, 420);

    private static Recorder drawn(BenchDrawing bench, BenchView view) {
        Recorder recorder = new Recorder();
        bench.draw(recorder, view);
        return recorder;
    }

    private static Recorder.Spot pixel(BenchView view, Point p) {
        return new Recorder.Spot(view.viewport().x(p.x()), view.viewport().y(p.y()));
    }

    private static double distance(Recorder.Spot a, Recorder.Spot b) {
        return Math.hypot(a.x() - b.x(), a.y() - b.y());
    }

    @Test
    void theRibbonIsAsWideAsTheBeamTimesItsMagnification() {
        BenchView view = all.magnified(7);
        List<Recorder.Thing> ribbons = drawn(bench, view).areas(Ink.TANGENTIAL, BenchBeam.RIBBON);
        assertThat(ribbons).hasSize(3);
        // The ribbon of the first leg begins at the left end of End A's face and its polygon ends at the right.
        List<Recorder.Spot> ribbon = ribbons.get(0).points();
        double drawn = distance(ribbon.get(0), ribbon.get(ribbon.size() - 1));
        double radius =
                zFold.tangential().station(0, Face.SURFACE).orElseThrow().radius();
        assertThat(drawn).isCloseTo(2 * radius * 7 * view.viewport().scale(), within(PIXEL));
        assertThat(ribbon.get(0).x()).isCloseTo(view.viewport().x(0), within(PIXEL));
    }

    @Test
    void theRibbonMeetsAFoldAlongItsFace() {
        BenchView view = all.magnified(10);
        List<Recorder.Thing> ribbons = drawn(bench, view).areas(Ink.TANGENTIAL, BenchBeam.RIBBON);
        List<Recorder.Spot> first = ribbons.get(0).points();
        List<Recorder.Spot> second = ribbons.get(1).points();
        int half = first.size() / 2;
        // What is left of the beam before a fold that turns it about is right of it behind.
        Recorder.Spot leftIn = first.get(half - 1);
        Recorder.Spot rightIn = first.get(half);
        assertThat(distance(leftIn, second.get(second.size() - 1))).isLessThan(PIXEL);
        assertThat(distance(rightIn, second.get(0))).isLessThan(PIXEL);
        double radius =
                zFold.tangential().station(1, Face.SURFACE).orElseThrow().radius();
        double footprint = 2 * radius / Math.cos(zFold.laid().incidence().getOrDefault(1, 0.0));
        assertThat(distance(leftIn, rightIn))
                .isCloseTo(footprint * 10 * view.viewport().scale(), within(PIXEL));
    }

    @Test
    void theSagittalOutlineIsDashedAndAsWideAsItsBeam() {
        BenchView view = all.magnified(5);
        List<Recorder.Thing> outlines = drawn(bench, view).lines(Ink.SAGITTAL, Dash.DASHED).stream()
                .filter(t -> t.pane().top() == 0
                        && t.points().size() > 1
                        && t.stroke().width() < 2)
                .toList();
        double radius = zFold.sagittal().station(0, Face.SURFACE).orElseThrow().radius();
        double drawn = distance(
                outlines.get(0).points().get(0), outlines.get(1).points().get(0));
        assertThat(drawn).isCloseTo(2 * radius * 5 * view.viewport().scale(), within(PIXEL));
    }

    @Test
    void theCrystalsFacesStandWhereTheAxisEntersAndLeavesAtItsIncidence() {
        Recorder.Thing body = drawn(bench, all).areas(Ink.CRYSTAL, 1).get(0);
        Leg leg = zFold.laid().legs().get(1);
        Recorder.Spot entry = pixel(all, leg.bends().get(1).at());
        Recorder.Spot exit = pixel(all, leg.bends().get(2).at());
        List<Recorder.Spot> c = body.points();
        // Corners in turn: the entry face, a side, the exit face, a side.
        assertThat(offLine(entry, c.get(0), c.get(1))).isLessThan(PIXEL);
        assertThat(offLine(exit, c.get(2), c.get(3))).isLessThan(PIXEL);
        assertThat(between(entry, c.get(0), c.get(1))).isTrue();
        assertThat(between(exit, c.get(2), c.get(3))).isTrue();
        // A parallelogram: opposite sides equal.
        assertThat(c.get(1).x() - c.get(0).x())
                .isCloseTo(c.get(2).x() - c.get(3).x(), within(PIXEL));
        assertThat(c.get(1).y() - c.get(0).y())
                .isCloseTo(c.get(2).y() - c.get(3).y(), within(PIXEL));
        // The beam in air makes Brewster's angle, arctan n, with the face's normal; Brewster, Phil. Trans. 105, 125
        // (1815).
        double fx = c.get(1).x() - c.get(0).x();
        double fy = c.get(1).y() - c.get(0).y();
        Point heading = leg.heading();
        double sin = Math.abs(fx * heading.x() - fy * heading.y()) / Math.hypot(fx, fy);
        assertThat(Math.asin(sin)).isCloseTo(Math.atan(1.76), within(1e-9));
    }

    @Test
    void aTiltedPlatesFacesStandAtItsIncidence() {
        Cavity triangle = Drawn.solved(Drawn.triangle());
        BenchDrawing drawing = new BenchDrawing(triangle);
        BenchView view = drawing.all(1000, 500);
        Recorder.Thing body = drawn(drawing, view).areas(Ink.GLASS, 1).get(0);
        List<Recorder.Spot> c = body.points();
        Leg leg = triangle.laid().legs().get(0);
        assertThat(offLine(pixel(view, leg.bends().get(1).at()), c.get(0), c.get(1)))
                .isLessThan(PIXEL);
        assertThat(offLine(pixel(view, leg.bends().get(2).at()), c.get(2), c.get(3)))
                .isLessThan(PIXEL);
        // 6 mm from face to face, by the design.
        assertThat(offLine(c.get(0), c.get(2), c.get(3)) / view.viewport().scale())
                .isCloseTo(6e-3, within(1e-9));
    }

    private static double offLine(Recorder.Spot p, Recorder.Spot a, Recorder.Spot b) {
        return Math.abs((b.x() - a.x()) * (p.y() - a.y()) - (b.y() - a.y()) * (p.x() - a.x())) / distance(a, b);
    }

    private static boolean between(Recorder.Spot p, Recorder.Spot a, Recorder.Spot b) {
        double share =
                ((p.x() - a.x()) * (b.x() - a.x()) + (p.y() - a.y()) * (b.y() - a.y())) / Math.pow(distance(a, b), 2);
        return share > 0 && share < 1;
    }

    @Test
    void anUnstablePlaneHasWordsAndNoBeam() {
        BenchDrawing one = new BenchDrawing(Drawn.solved(Drawn.oneSided()));
        Recorder recorder = drawn(one, one.all(900, 500));
        assertThat(recorder.areas(Ink.TANGENTIAL, BenchBeam.RIBBON)).isEmpty();
        assertThat(recorder.texts())
                .anyMatch(t -> t.startsWith("No tangential beam: unstable"))
                .noneMatch(t -> t.startsWith("No sagittal beam"));
        BenchDrawing none = new BenchDrawing(Drawn.solved(Drawn.tooLong()));
        recorder = drawn(none, none.all(900, 500));
        assertThat(recorder.texts())
                .anyMatch(t -> t.startsWith("No tangential beam"))
                .anyMatch(t -> t.startsWith("No sagittal beam"))
                .noneMatch(t -> t.startsWith("beam width"));
    }

    @Test
    void namesLegsAndIncidencesAreSaid() {
        List<String> texts = drawn(bench, all).texts();
        assertThat(texts)
                .contains("End A", "Fold 1", "Rod", "Fold 2", "End B")
                .contains("480.00 mm, held", "620.00 mm", "105.00 mm", "7.90° incidence")
                .contains("200 mm");
    }

    @Test
    void theAutomaticMagnificationIsRoundAndFits() {
        assertThat(all.magnify()).isEqualTo(20);
        BenchDrawing hexagon = new BenchDrawing(Drawn.solved(Drawn.hexagon()));
        assertThat(hexagon.all(1000, 420).magnify()).isEqualTo(20);
    }

    @Test
    void aPixelOnAPartFindsIt() {
        for (int part = 0; part < 5; part++) {
            Point at = bench.course().at(bench.course().middle(part));
            Recorder.Spot p = pixel(all, at);
            assertThat(bench.partAt(all, p.x(), p.y(), 6)).hasValue(part);
        }
        assertThat(bench.partAt(all, 500, 380, 6)).isEmpty();
        // Behind Fold 1's face, in its mount only.
        Recorder.Spot mount = pixel(all, new Point(0.480 + 0.018, 0.002));
        assertThat(bench.partAt(all, mount.x(), mount.y(), 2)).hasValue(1);
    }

    @Test
    void whereTwoPartsAreNearTheNearerIsTaken() {
        Point rod = bench.course().at(bench.course().middle(2));
        Point fold = bench.course().at(bench.course().middle(1));
        Recorder.Spot a = pixel(all, rod);
        Recorder.Spot b = pixel(all, fold);
        double x = a.x() + 0.3 * (b.x() - a.x());
        double y = a.y() + 0.3 * (b.y() - a.y());
        assertThat(bench.partAt(all, x, y, 60)).hasValue(2);
    }

    @Test
    void aPixelByTheAxisFindsItsPathAndBack() {
        for (double path : new double[] {0.01, 0.2, 0.53, 0.7, 1.1}) {
            Recorder.Spot p = pixel(all, bench.course().at(path));
            OptionalDouble found = bench.pathAt(all, p.x(), p.y(), 3);
            assertThat(found).isPresent();
            // Where legs cross, another path may lie at the same pixel; none of these is there.
            assertThat(found.getAsDouble()).isCloseTo(path, within(1e-9));
        }
        assertThat(bench.pathAt(all, 500, 390, 5)).isEmpty();
    }

    @Test
    void theSelectedPartHasBracketsAndTheCrosshairItsMark() {
        Recorder plain = drawn(bench, all);
        assertThat(plain.lines(Ink.SELECTED, Dash.SOLID)).isEmpty();
        assertThat(plain.lines(Ink.CROSSHAIR, Dash.SOLID)).isEmpty();
        Recorder marked = drawn(bench, all.selecting(OptionalInt.of(1)).crossing(OptionalDouble.of(0.25)));
        assertThat(marked.lines(Ink.SELECTED, Dash.SOLID)).hasSize(1);
        Recorder.Thing ring = marked.lines(Ink.CROSSHAIR, Dash.SOLID).get(1);
        Recorder.Spot at = pixel(all, new Point(0.25, 0));
        assertThat(ring.points()).allMatch(p -> Math.abs(distance(p, at) - 5) < PIXEL);
    }

    @Test
    void holesAreDrawnOnlyWhereTheyCanBeTold() {
        assertThat(drawn(bench, all).areas(Ink.HOLE, 1)).hasSize(1);
        BenchView far = all.through(new Viewport(300, 500, 200));
        assertThat(drawn(bench, far).areas(Ink.HOLE, 1)).isEmpty();
        Recorder.Thing holes = drawn(bench, all).areas(Ink.HOLE, 1).get(0);
        Recorder.Spot first = holes.points().get(0);
        double x = all.viewport().at(first.x(), first.y()).x() / 25e-3;
        double y = all.viewport().at(first.x(), first.y()).y() / 25e-3;
        assertThat(x).isCloseTo(Math.rint(x), within(1e-6));
        assertThat(y).isCloseTo(Math.rint(y), within(1e-6));
    }

    @Test
    void aCloseLookDrawsLittleMoreThanAFarOne() {
        Point rod = bench.course().at(bench.course().middle(2));
        BenchView near = all.through(new Viewport(2e5, 500 - 2e5 * rod.x(), 200 + 2e5 * rod.y()));
        Recorder recorder = drawn(bench, near);
        assertThat(recorder.areas(Ink.CRYSTAL, 1)).hasSize(1);
        assertThat(recorder.drawn(Recorder.Mark.LINE)
                        .filter(t -> t.stroke().dash() == Dash.DASH_DOT)
                        .flatMap(t -> t.points().stream()))
                .isNotEmpty()
                .allMatch(p -> Math.abs(p.x()) < 1100 && Math.abs(p.y()) < 600);
    }
}
