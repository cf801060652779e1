package twofold.window;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ListView;
import javafx.scene.input.Clipboard;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import twofold.design.Part;
import twofold.design.Point;
import twofold.picture.BeamView;
import twofold.picture.BenchView;
import twofold.picture.Theme;
import twofold.session.Shown;
import twofold.window.beam.BeamPane;
import twofold.window.bench.BenchPane;

/** The editor under a real mouse and real keys of the toolkit. */
@Tag("headless-only")
@SuppressWarnings("NullAway.Init") // set before each test
class EditorWindowTest {
    private static final String SAMPLE = "z-fold-rod.json";

    @TempDir
    Path folder;

    private Stagehand stage;
    private BenchPane bench;
    private BeamPane beam;

    @BeforeEach
    void open() throws Exception {
        stage = Stagehand.open(folder.resolve("settings.json"), 1280, 800);
        stage.openSample(SAMPLE);
        bench = stage.node("bench", BenchPane.class);
        beam = stage.node("beam", BeamPane.class);
    }

    @AfterEach
    void close() throws Exception {
        stage.close();
    }

    private Shown shown() throws Exception {
        return Stagehand.fx(() -> stage.editor().session().shown());
    }

    private BenchView benchView() throws Exception {
        return Stagehand.fx(() -> bench.view().orElseThrow());
    }

    private BeamView beamView() throws Exception {
        return Stagehand.fx(() -> beam.view().orElseThrow());
    }

    private String selectedName() throws Exception {
        return Stagehand.fx(
                () -> stage.editor().session().selectedPart().map(Part::name).orElse("none"));
    }

    private void clickMirror(String name) throws Exception {
        Part mirror = shown().cavity().orElseThrow().laid().design().parts().stream()
                .filter(p -> p.name().equals(name))
                .findFirst()
                .orElseThrow();
        Point at = ((twofold.design.Mirror) mirror).at();
        BenchView view = benchView();
        stage.click(bench, view.viewport().x(at.x()), view.viewport().y(at.y()));
    }

    @Test
    void theFirstCrystalIsSelectedAtFirst() throws Exception {
        assertThat(selectedName()).isEqualTo("Rod");
        assertThat(stage.node("said", Label.class).getText()).startsWith("Both planes are stable.");
        assertThat(stage.node("facts", Label.class).getText())
                .contains("800 nm")
                .contains("MHz");
        assertThat(stage.stage().getTitle()).startsWith(SAMPLE);
    }

    @Test
    void aClickOnTheBenchPicksAPartEverywhere() throws Exception {
        clickMirror("Fold 2");
        assertThat(selectedName()).isEqualTo("Fold 2");
        ListView<?> list = stage.node("parts", ListView.class);
        assertThat(list.getSelectionModel().getSelectedIndex()).isEqualTo(3);
        stage.click(bench, 30, bench.getHeight() - 60);
        assertThat(selectedName()).isEqualTo("none");
    }

    @Test
    void aClickOnTheBeamPicksAPart() throws Exception {
        BeamView view = beamView();
        stage.click(beam, view.stretch().left() + 1, beam.getHeight() / 2);
        assertThat(selectedName()).isEqualTo("End A");
    }

    @Test
    void aClickInTheListPicksAPart() throws Exception {
        ListView<?> list = stage.node("parts", ListView.class);
        stage.click(list, 40, 10);
        assertThat(selectedName()).isEqualTo("End A");
    }

    @Test
    void theCrosshairIsTiedBothWays() throws Exception {
        BeamView view = beamView();
        stage.move(beam, view.stretch().x(0.25), 120);
        assertThat(benchView().crosshair().orElseThrow()).isCloseTo(0.25, within(2e-3));
        BenchView plan = benchView();
        stage.move(bench, plan.viewport().x(0.1), plan.viewport().y(0));
        assertThat(beamView().crosshair().orElseThrow()).isCloseTo(0.1, within(2e-3));
        stage.move(bench, 30, bench.getHeight() - 40);
        assertThat(beamView().crosshair()).isEmpty();
    }

    @Test
    void theWheelZoomsAboutThePointer() throws Exception {
        BenchView before = benchView();
        Point under = before.viewport().at(300, 200);
        stage.move(bench, 300, 200);
        stage.wheel(3);
        BenchView after = benchView();
        assertThat(after.viewport().scale()).isNotCloseTo(before.viewport().scale(), within(1.0));
        assertThat(after.viewport().at(300, 200).distance(under)).isLessThan(1e-3);
        stage.press(KeyCode.HOME);
        stage.click(bench, 30, bench.getHeight() - 60);
        stage.press(KeyCode.HOME);
        assertThat(benchView().viewport()).isEqualTo(before.viewport());
    }

    @Test
    void theMiddleButtonTheKeysAndTheSpaceBarPan() throws Exception {
        BenchView before = benchView();
        stage.drag(bench, MouseButton.MIDDLE, 300, 300, 80, 40);
        assertThat(benchView().viewport().originX() - before.viewport().originX())
                .isCloseTo(80, within(1.0));
        assertThat(benchView().viewport().originY() - before.viewport().originY())
                .isCloseTo(40, within(1.0));
        Stagehand.fx(() -> {
            bench.requestFocus();
            return true;
        });
        stage.press(KeyCode.ALT, KeyCode.LEFT);
        assertThat(benchView().viewport().originX() - before.viewport().originX())
                .isCloseTo(120, within(1.0));
        String selected = selectedName();
        stage.hold(KeyCode.SPACE);
        stage.drag(bench, MouseButton.PRIMARY, 300, 300, -50, 30);
        stage.release(KeyCode.SPACE);
        assertThat(benchView().viewport().originX() - before.viewport().originX())
                .isCloseTo(70, within(1.0));
        assertThat(benchView().viewport().originY() - before.viewport().originY())
                .isCloseTo(70, within(1.0));
        assertThat(selectedName()).as("a pan selects nothing").isEqualTo(selected);
        stage.drag(bench, MouseButton.PRIMARY, 300, 300, -50, 30);
        assertThat(benchView().viewport().originX() - before.viewport().originX())
                .as("without the space bar nothing moves")
                .isCloseTo(70, within(1.0));
    }

    @Test
    void theBeamZoomsPansAndShowsAll() throws Exception {
        double whole = beamView().stretch().to();
        stage.move(beam, 200, 100);
        stage.wheel(2);
        double length = beamView().stretch().to() - beamView().stretch().from();
        if (length >= whole - 1e-12) {
            stage.wheel(-4); // the headless screen turns the wheel the other way
            length = beamView().stretch().to() - beamView().stretch().from();
        }
        assertThat(length).isLessThan(0.9 * whole);
        double from = beamView().stretch().from();
        stage.drag(beam, MouseButton.MIDDLE, 200, 100, -60, 0);
        assertThat(beamView().stretch().from()).isGreaterThan(from);
        stage.press(KeyCode.HOME);
        assertThat(beamView().stretch().to()).isEqualTo(whole);
    }

    @Test
    void keysWalkAlongTheBeam() throws Exception {
        clickMirror("End A");
        stage.press(KeyCode.PAGE_DOWN);
        assertThat(selectedName()).isEqualTo("Fold 1");
        stage.press(KeyCode.PAGE_UP);
        stage.press(KeyCode.PAGE_UP);
        assertThat(selectedName()).isEqualTo("Output coupler");
        stage.press(KeyCode.ESCAPE);
        assertThat(selectedName()).isEqualTo("none");
        stage.press(KeyCode.F6);
        assertThat(beam.isFocused()).isTrue();
        stage.press(KeyCode.SHIFT, KeyCode.F6);
        assertThat(bench.isFocused()).isTrue();
    }

    @Test
    void figuresAreCopiedInFullPrecision() throws Exception {
        clickMirror("Fold 1");
        Button copy = stage.node("copy-figures", Button.class);
        stage.click(copy, 10, 10);
        String text = Stagehand.fx(() -> Clipboard.getSystemClipboard().getString());
        assertThat(text).startsWith("Fold 1").contains("Beam radius, µm\t").contains("Leg from End A, mm\t500");
        assertThat(text.lines()
                        .filter(l -> l.startsWith("Incidence"))
                        .findFirst()
                        .orElseThrow())
                .as("more digits than the window shows")
                .hasSizeGreaterThan(20);
    }

    @Test
    void aBadFileListsItsProblemsBesideTheLastGoodDesign() throws Exception {
        Path file = folder.resolve("mine.json");
        String good = Files.readString(Path.of("samples", SAMPLE));
        Files.writeString(file, good);
        stage.open(file);
        Files.writeString(file, good.replace("\"roc_mm\"", "\"rock_mm\""));
        Stagehand.fx(() -> {
            stage.editor().session().look();
            return true;
        });
        stage.settle();
        assertThat(stage.node("notice", javafx.scene.layout.HBox.class).isVisible())
                .isTrue();
        assertThat(shown().problems()).isEmpty();
        stage.click(stage.node("reload", Button.class), 10, 10);
        ListView<?> list = stage.node("problems", ListView.class);
        assertThat(list.isVisible()).isTrue();
        assertThat(list.getItems())
                .hasSize(3)
                .allSatisfy(i -> assertThat(i.toString())
                        .contains("line ")
                        .contains("column ")
                        .contains("rock_mm")
                        .contains("nearest is \"roc_mm\""));
        assertThat(shown().isStale()).isTrue();
        assertThat(benchView()).isNotNull();
        stage.picture("problems-light");
        Files.writeString(file, good);
        stage.press(KeyCode.F5);
        assertThat(shown().problems()).isEmpty();
        assertThat(list.getParent().isVisible()).isFalse();
    }

    @Test
    void aFileThatIsNotThereIsSaid() throws Exception {
        stage.open(folder.resolve("none.json"));
        assertThat(shown().failure()).isPresent();
        assertThat(stage.node("said", Label.class).getText()).contains("cannot be read");
        assertThat(shown().cavity()).as("the last good design").isPresent();
    }

    @Test
    void theThemeAndTheRecentFilesAreRemembered() throws Exception {
        Path file = Files.copy(Path.of("samples", SAMPLE), folder.resolve("mine.json"));
        stage.open(file);
        stage.press(KeyCode.CONTROL, KeyCode.T);
        assertThat(stage.editor().theme()).isEqualTo(Theme.DARK);
        stage.close();
        stage = Stagehand.open(folder.resolve("settings.json"), 1280, 800);
        assertThat(stage.editor().theme()).isEqualTo(Theme.DARK);
        assertThat(new Recall(folder.resolve("settings.json")).settings().recent())
                .isEqualTo(List.of(file.toAbsolutePath().toString()));
    }

    @Test
    void anUnstableDesignIsSaidInWords() throws Exception {
        stage.openSample("one-plane.json");
        assertThat(stage.node("said", Label.class).getText()).startsWith("Tangential unstable, sagittal stable.");
        stage.picture("one-plane-light");
    }

    @Test
    void whereTheFileIsGoneNothingIsLost() throws Exception {
        Path file = Files.copy(Path.of("samples", SAMPLE), folder.resolve("mine.json"));
        stage.open(file);
        Files.delete(file);
        Stagehand.fx(() -> {
            stage.editor().session().look();
            stage.editor().session().reload();
            return true;
        });
        stage.settle();
        assertThat(shown().failure()).isPresent();
        assertThat(shown().cavity()).isPresent();
        assertThat(Optional.of(benchView())).isPresent();
    }
}
