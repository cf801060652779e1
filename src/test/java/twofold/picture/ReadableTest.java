package twofold.picture;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.geom.Area;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import twofold.Samples;
import twofold.cavity.Cavity;
import twofold.design.Design;

/** What makes a drawing readable, whatever is drawn: text within its pane, large enough, never on other text. */
class ReadableTest {
    static Stream<Design> designs() {
        return Stream.concat(Samples.files().stream().map(Samples::design), built());
    }

    private static Stream<Design> built() {
        return Stream.of(
                Drawn.zFold(),
                Drawn.bowTie(),
                Drawn.triangle(),
                Drawn.longV(),
                Drawn.oneSided(),
                Drawn.tooLong(),
                Drawn.hexagon());
    }

    private static List<Recorder> drawings(Design design) {
        Cavity cavity = Drawn.solved(design);
        List<Recorder> all = new ArrayList<>();
        for (double[] size : new double[][] {{1000, 420}, {640, 360}, {1800, 800}, {420, 300}}) {
            Recorder bench = new Recorder();
            BenchDrawing drawing = new BenchDrawing(cavity);
            drawing.draw(bench, drawing.all(size[0], size[1]).selecting(OptionalInt.of(1)));
            all.add(bench);
            Recorder beam = new Recorder();
            BeamDrawing path = new BeamDrawing(cavity);
            path.draw(beam, path.all(size[0], size[1]).numbering(true));
            all.add(beam);
        }
        for (int part = 0; part < design.parts().size(); part++) {
            for (double width : new double[] {260, 320, 500}) {
                Recorder close = new Recorder();
                new CloseUpDrawing(cavity).draw(close, width, 260, OptionalInt.of(part));
                all.add(close);
            }
        }
        Recorder stability = new Recorder();
        new StabilityDrawing(cavity).draw(stability, 320, StabilityDrawing.HEIGHT);
        all.add(stability);
        for (double[] size : new double[][] {{480, 480}, {1280, 800}, {1920, 1080}}) {
            Recorder sheet = new Recorder();
            Sheet.draw(cavity, sheet, size[0], size[1], OptionalDouble.empty());
            all.add(sheet);
        }
        return all;
    }

    @ParameterizedTest
    @MethodSource("designs")
    void everyTextLiesWithinItsPane(Design design) {
        drawings(design).forEach(ReadableTest::assertWithin);
    }

    static void assertWithin(Recorder drawing) {
        drawing.drawn(Recorder.Mark.TEXT)
                .forEach(t -> assertThat(t.points())
                        .as("the box of \"%s\" within %s", t.text(), t.pane())
                        .allMatch(t.pane()::holds));
    }

    @ParameterizedTest
    @MethodSource("designs")
    void noTextCoversAnother(Design design) {
        drawings(design).forEach(ReadableTest::assertApart);
    }

    static void assertApart(Recorder drawing) {
        List<Recorder.Thing> texts = drawing.drawn(Recorder.Mark.TEXT).toList();
        for (int i = 0; i < texts.size(); i++) {
            for (int j = 0; j < i; j++) {
                Area both = area(texts.get(i));
                both.intersect(area(texts.get(j)));
                Rectangle2D common = both.getBounds2D();
                assertThat(common.getWidth() * common.getHeight())
                        .as(
                                "\"%s\" on \"%s\"",
                                texts.get(i).text(), texts.get(j).text())
                        .isZero();
            }
        }
    }

    private static Area area(Recorder.Thing text) {
        Path2D path = new Path2D.Double();
        path.moveTo(text.points().get(0).x(), text.points().get(0).y());
        for (Recorder.Spot s : text.points()) {
            path.lineTo(s.x(), s.y());
        }
        path.closePath();
        return new Area(path);
    }

    @ParameterizedTest
    @MethodSource("designs")
    void noTextIsSmallerThan11(Design design) {
        for (Recorder drawing : drawings(design)) {
            assertThat(drawing.drawn(Recorder.Mark.TEXT))
                    .isNotEmpty()
                    .allMatch(t -> t.type().size() >= 11);
        }
    }

    @ParameterizedTest
    @MethodSource("designs")
    void panesAreClosedAndEverythingLiesInOne(Design design) {
        Cavity cavity = Drawn.solved(design);
        Recorder recorder = new Recorder();
        new BenchDrawing(cavity).draw(recorder, new BenchDrawing(cavity).all(800, 400));
        new BeamDrawing(cavity).draw(recorder, new BeamDrawing(cavity).all(800, 300));
        new CloseUpDrawing(cavity).draw(recorder, 320, 260, OptionalInt.empty());
        new StabilityDrawing(cavity).draw(recorder, 320, StabilityDrawing.HEIGHT);
        assertThat(recorder.depth()).isZero();
        assertThat(recorder.things())
                .allMatch(t -> t.pane().right() <= 800 && t.pane().bottom() <= 400);
    }

    @ParameterizedTest
    @MethodSource("designs")
    void nothingIsPaintedOutsideAPane(Design design) {
        Cavity cavity = Drawn.solved(design);
        ImagePainter painter = new ImagePainter(700, 480, 1, Theme.DARK);
        BenchDrawing bench = new BenchDrawing(cavity);
        BenchView view = bench.all(300, 200);
        painter.push(50, 40, 300, 200);
        // Zoomed in at the first mirror, so that beam and labels would run far beyond.
        bench.draw(painter, view.through(view.viewport().zoomed(9, 40, 100)).crossing(OptionalDouble.of(0.01)));
        painter.pop();
        BeamDrawing beam = new BeamDrawing(cavity);
        BeamView whole = beam.all(250, 200);
        painter.push(400, 250, 250, 200);
        beam.draw(
                painter,
                whole.over(whole.stretch().zoomed(6, 120, beam.course().length()))
                        .numbering(true));
        painter.pop();
        int paper = Theme.DARK.rgb(Ink.PAPER);
        int painted = 0;
        for (int x = 0; x < 700; x++) {
            for (int y = 0; y < 480; y++) {
                boolean inBench = x >= 50 && x < 350 && y >= 40 && y < 240;
                boolean inBeam = x >= 400 && x < 650 && y >= 250 && y < 450;
                if (!inBench && !inBeam) {
                    assertThat(painter.rgb(x, y)).as("pixel %d, %d", x, y).isEqualTo(paper);
                } else if (painter.rgb(x, y) != paper) {
                    painted++;
                }
            }
        }
        assertThat(painted).isGreaterThan(2000);
    }
}
