package twofold.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import twofold.cavity.Cavity;
import twofold.design.Design;

/** The close-up and the bars of stability. */
class CloseUpDrawingTest {
    private static Recorder close(Design design, double width, OptionalInt selected) {
        Recorder recorder = new Recorder();
        new CloseUpDrawing(Drawn.solved(design)).draw(recorder, width, 280, selected);
        return recorder;
    }

    @Test
    void aCrystalsWaistsAreSaidAsThePageOnFilesRoundsThem() {
        List<String> texts = close(Drawn.zFold(), 700, OptionalInt.of(2)).texts();
        assertThat(texts)
                .contains(
                        "Close-up: Rod",
                        "5.00 mm long, faces at 60.40°",
                        "tangential waist 38.7 µm, −1.14 mm (−0.11 zR) from its middle",
                        "sagittal waist 22.3 µm, −0.36 mm (−0.11 zR) from its middle",
                        "to centre it, move Rod −0.21 mm; Rayleigh length 10.35 mm, 2.07 × its length",
                        "to centre it, move Rod −0.21 mm; Rayleigh length 3.44 mm, 0.69 × its length");
    }

    @Test
    void bothPlanesAreWordedAlikeInLessRoom() {
        List<String> texts = close(Drawn.zFold(), 320, OptionalInt.of(2)).texts();
        assertThat(texts)
                .contains(
                        "tangential 38.7 µm, −1.14 mm (−0.11 zR)",
                        "sagittal 22.3 µm, −0.36 mm (−0.11 zR)",
                        "move it −0.21 mm; zR 10.35 mm, 2.07 × its length");
    }

    @Test
    void waistDotsLieBesideTheMiddleAsFarAsSaid() {
        double width = 600;
        Recorder recorder = close(Drawn.zFold(), width, OptionalInt.of(2));
        double middle = recorder.lines(Ink.CRYSTAL_EDGE, Dash.DOTTED)
                .get(0)
                .points()
                .get(0)
                .x();
        List<Recorder.Thing> bands = recorder.areas(Ink.CRYSTAL, 0.6);
        double perMetre =
                (bands.get(0).points().get(1).x() - bands.get(0).points().get(0).x()) / 5e-3;
        Cavity cavity = Drawn.solved(Drawn.zFold());
        double t = recorder.areas(Ink.TANGENTIAL, 1).get(0).points().stream()
                .mapToDouble(Recorder.Spot::x)
                .average()
                .orElseThrow();
        double offset =
                cavity.line(2, twofold.optics.Plane.TANGENTIAL).orElseThrow().offset();
        assertThat((t - middle) / perMetre).isCloseTo(offset, within(1e-9));
    }

    @Test
    void withNothingSelectedTheFirstCrystalIsShownElseTheLegWithTheSmallestWaist() {
        assertThat(close(Drawn.bowTie(), 400, OptionalInt.empty()).texts()).contains("Close-up: Doubler");
        assertThat(close(Drawn.oneSided(), 400, OptionalInt.empty()).texts()).contains("Close-up: Left to Fold");
    }

    @Test
    void aMirrorShowsItsLeg() {
        assertThat(close(Drawn.zFold(), 500, OptionalInt.of(1)).texts()).contains("Close-up: Fold 1 to Fold 2");
    }

    @Test
    void whatIsCentredIsSaidToBe() {
        assertThat(close(Drawn.bowTie(), 320, OptionalInt.of(1)).texts())
                .anyMatch(t -> t.startsWith("centred; "))
                .noneMatch(t -> t.contains("move"));
    }

    @Test
    void anUnstablePlaneHasWordsAndNoBeam() {
        Recorder recorder = close(Drawn.tooLong(), 500, OptionalInt.of(2));
        assertThat(recorder.texts()).anyMatch(t -> t.startsWith("No tangential beam: unstable"));
        assertThat(recorder.areas(Ink.TANGENTIAL, Halves.TINT)).isEmpty();
    }

    @Test
    void barsAreAsLongAsTheirMargins() {
        Cavity cavity = Drawn.solved(Drawn.zFold());
        Recorder recorder = new Recorder();
        new StabilityDrawing(cavity).draw(recorder, 414, StabilityDrawing.HEIGHT);
        double t = width(recorder.areas(Ink.TANGENTIAL, 0.35).get(0));
        double s = width(recorder.areas(Ink.SAGITTAL, 0.35).get(0));
        double track = width(recorder.areas(Ink.MOUNT, 1).get(0));
        assertThat(t / track).isCloseTo(cavity.tangential().margin(), within(1e-9));
        assertThat(s / track).isCloseTo(cavity.sagittal().margin(), within(1e-9));
        assertThat(recorder.texts()).contains("half trace −0.239, margin 0.76", "half trace −0.209, margin 0.79");
    }

    private static double width(Recorder.Thing area) {
        return area.points().get(1).x() - area.points().get(0).x();
    }

    @Test
    void edgesAndUnstablePlanesAreSaidInWords() {
        Recorder near = new Recorder();
        new StabilityDrawing(Drawn.solved(Drawn.hexagon())).draw(near, 500, StabilityDrawing.HEIGHT);
        assertThat(near.texts()).anyMatch(t -> t.endsWith("close to its edge"));
        Recorder none = new Recorder();
        new StabilityDrawing(Drawn.solved(Drawn.oneSided())).draw(none, 320, StabilityDrawing.HEIGHT);
        assertThat(none.texts()).contains("unstable: half trace 1.138");
        assertThat(none.areas(Ink.TANGENTIAL, 0.35)).isEmpty();
        Recorder edge = new Recorder();
        new StabilityDrawing(Drawn.solved(Drawn.onEdge())).draw(edge, 320, StabilityDrawing.HEIGHT);
        assertThat(edge.texts()).contains("on the edge: half trace 1.000");
    }
}
