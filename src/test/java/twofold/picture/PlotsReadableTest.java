package twofold.picture;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import twofold.cavity.Cavity;
import twofold.design.Design;

/** What makes plots readable at every size: text within its pane, large enough, never on other text; nothing outside. */
class PlotsReadableTest {
    private static final double[][] SIZES = {{300, 260}, {420, 300}, {640, 420}, {1100, 700}};

    static Stream<Design> designs() {
        return ReadableTest.designs();
    }

    @ParameterizedTest
    @MethodSource("designs")
    void everyTextCanBeRead(Design design) {
        Cavity cavity = Drawn.solved(design);
        for (Plots.Drawing drawing : Plots.drawings(cavity)) {
            for (double[] size : SIZES) {
                Recorder recorder = new Recorder();
                drawing.draw(recorder, size[0], size[1]);
                assertReadable(recorder);
            }
        }
    }

    @ParameterizedTest
    @MethodSource("designs")
    void smallPanesTakeStripDiagramAndLedger(Design design) {
        Cavity cavity = Drawn.solved(design);
        for (int leg = 0; leg < cavity.laid().legs().size(); leg++) {
            for (double[] size : new double[][] {{300, 110}, {600, 160}}) {
                Recorder recorder = new Recorder();
                Plots.strip(cavity, leg).draw(recorder, size[0], size[1]);
                assertReadable(recorder);
            }
        }
        Recorder square = new Recorder();
        Plots.diagram(cavity).draw(square, 220, 220);
        assertReadable(square);
        Recorder narrow = new Recorder();
        new LedgerDrawing(cavity.laid(), cavity.ledger(), twofold.design.Edge.LOWER).draw(narrow, 260, 130);
        assertReadable(narrow);
    }

    private static void assertReadable(Recorder recorder) {
        ReadableTest.assertWithin(recorder);
        ReadableTest.assertApart(recorder);
        assertThat(recorder.depth()).isZero();
        assertThat(recorder.drawn(Recorder.Mark.TEXT))
                .isNotEmpty()
                .allMatch(t -> t.type().size() >= 11);
    }

    @ParameterizedTest
    @MethodSource("designs")
    void nothingIsPaintedOutsideAPane(Design design) {
        Cavity cavity = Drawn.solved(design);
        int paper = Theme.DARK.rgb(Ink.PAPER);
        for (Plots.Drawing drawing : Plots.drawings(cavity)) {
            ImagePainter painter = new ImagePainter(440, 340, 1, Theme.DARK);
            painter.push(30, 20, 380, 300);
            drawing.draw(painter, 380, 300);
            painter.pop();
            for (int x = 0; x < 440; x++) {
                for (int y = 0; y < 340; y++) {
                    if (x < 30 || x >= 410 || y < 20 || y >= 320) {
                        assertThat(painter.rgb(x, y)).as("pixel %d, %d", x, y).isEqualTo(paper);
                    }
                }
            }
        }
    }
}
