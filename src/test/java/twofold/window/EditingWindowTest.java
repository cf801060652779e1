package twofold.window;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.Scene;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ListView;
import javafx.scene.control.TabPane;
import javafx.scene.control.TextField;
import javafx.scene.input.Clipboard;
import javafx.scene.input.ClipboardContent;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import javafx.stage.WindowEvent;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import twofold.Child;
import twofold.design.Design;
import twofold.design.Mirror;
import twofold.design.Point;
import twofold.file.DesignReader;
import twofold.file.DesignWriter;
import twofold.layout.Leg;
import twofold.session.Crash;
import twofold.window.bench.BenchPane;

/** A design changed by hand and by keyboard in a real window of the toolkit. */
@Tag("headless-only")
@SuppressWarnings("NullAway.Init") // set before each test
class EditingWindowTest extends Staged {
    private static final String SAMPLE = "z-fold-rod.json";

    private BenchPane bench;

    EditingWindowTest() {
        super(SAMPLE);
    }

    @BeforeEach
    void open() throws Exception {
        bench = stage.node("bench", BenchPane.class);
    }

    private Point at(String mirror) throws Exception {
        return ((Mirror) design().parts().get(design().indexOf(mirror).orElseThrow())).at();
    }

    private Point pixel(String part) throws Exception {
        return stage.pixel(bench, part);
    }

    private Point pixel(Point on) throws Exception {
        return stage.pixel(bench, on);
    }

    private void select(String part) throws Exception {
        int index = design().indexOf(part).orElseThrow();
        Stagehand.fx(() -> {
            stage.editor().session().select(Optional.of(index));
            bench.requestFocus();
            return true;
        });
        stage.settle();
    }

    @Test
    void aMirrorIsDraggedAndItsArmFollowsInOneStep() throws Exception {
        Point before = at("Fold 2");
        Point end = at("Output coupler");
        double scale = Stagehand.fx(() -> bench.view().orElseThrow()).viewport().scale();
        Point p = pixel("Fold 2");
        stage.drag(bench, MouseButton.PRIMARY, p.x(), p.y(), 12, -8);
        assertThat(at("Fold 2").x() - before.x()).isCloseTo(12 / scale, within(1e-9));
        assertThat(at("Fold 2").y() - before.y()).isCloseTo(8 / scale, within(1e-9));
        assertThat(at("Output coupler").x() - end.x()).isCloseTo(12 / scale, within(1e-9));
        assertThat(shown().undo()).contains("move Fold 2");
        assertThat(shown().isUnsaved()).isTrue();
        assertThat(stage.stage().getTitle()).startsWith("•");
        stage.press(KeyCode.CONTROL, KeyCode.Z);
        assertThat(at("Fold 2")).isEqualTo(before);
        assertThat(shown().isUnsaved()).isFalse();
        stage.press(KeyCode.CONTROL, KeyCode.Y);
        assertThat(at("Fold 2").x() - before.x()).isCloseTo(12 / scale, within(1e-9));
    }

    @Test
    void escapeAbandonsADrag() throws Exception {
        Point before = at("Fold 2");
        Point p = pixel("Fold 2");
        stage.move(bench, p.x(), p.y());
        stage.hold(MouseButton.PRIMARY);
        stage.move(bench, p.x() + 30, p.y() + 30);
        assertThat(at("Fold 2")).isNotEqualTo(before);
        assertThat(shown().isPreview()).isTrue();
        Label hint = Stagehand.fx(() -> (Label) bench.lookup("#hint"));
        assertThat(hint.isVisible()).isTrue();
        assertThat(hint.getText()).contains("Fold 2").contains("incidence");
        stage.picture("dragging-light");
        stage.press(KeyCode.ESCAPE);
        assertThat(at("Fold 2")).isEqualTo(before);
        assertThat(hint.isVisible()).isFalse();
        stage.move(bench, p.x() + 60, p.y() + 30);
        stage.release(MouseButton.PRIMARY);
        assertThat(at("Fold 2")).isEqualTo(before);
        assertThat(shown().undo()).isEmpty();
    }

    @Test
    void tabChoosesWhatFollowsDuringADrag() throws Exception {
        Point end = at("Output coupler");
        Point p = pixel("Fold 2");
        stage.move(bench, p.x(), p.y());
        stage.hold(MouseButton.PRIMARY);
        stage.move(bench, p.x() + 20, p.y());
        assertThat(at("Output coupler")).isNotEqualTo(end);
        Label hint = Stagehand.fx(() -> (Label) bench.lookup("#hint"));
        for (int i = 0; i < 4 && !hint.getText().contains("others stay"); i++) {
            stage.press(KeyCode.TAB);
        }
        assertThat(hint.getText()).contains("others stay");
        assertThat(at("Output coupler")).isEqualTo(end);
        stage.release(MouseButton.PRIMARY);
        assertThat(at("Output coupler")).isEqualTo(end);
    }

    @Test
    void aPartSlidesAlongItsLeg() throws Exception {
        select("Rod");
        Point p = pixel("Rod");
        double scale = Stagehand.fx(() -> bench.view().orElseThrow()).viewport().scale();
        Leg leg = laid().legs().get(1);
        double before = leg.parts().get(0).middle();
        stage.drag(bench, MouseButton.PRIMARY, p.x(), p.y(), 10, 0);
        // The pointer's way along the leg. Taken inside the rod, where the refracted axis is not parallel to the leg,
        // its
        // foot is up to the rod's side shift times that angle off: hundredths of a millimetre, of a pixel's 1.4.
        assertThat(laid().legs().get(1).parts().get(0).middle() - before)
                .isCloseTo(10 / scale * leg.heading().x(), within(5e-5));
        assertThat(shown().undo()).contains("move Rod");
    }

    @Test
    void arrowsNudgeAndARunIsOneStep() throws Exception {
        select("Fold 2");
        Point before = at("Fold 2");
        stage.press(KeyCode.RIGHT);
        stage.press(KeyCode.RIGHT);
        stage.press(KeyCode.SHIFT, KeyCode.RIGHT);
        stage.press(KeyCode.CONTROL, KeyCode.UP);
        assertThat(at("Fold 2").x() - before.x()).isCloseTo(1.2e-3, within(1e-12));
        assertThat(at("Fold 2").y() - before.y()).isCloseTo(1e-5, within(1e-12));
        stage.press(KeyCode.CONTROL, KeyCode.Z);
        assertThat(at("Fold 2")).isEqualTo(before);
        double incidence = laid().incidence().getOrDefault(3, 0.0);
        stage.press(KeyCode.PERIOD);
        assertThat(Math.toDegrees(laid().incidence().getOrDefault(3, 0.0) - incidence))
                .isCloseTo(0.1, within(1e-9));
        stage.press(KeyCode.CONTROL, KeyCode.COMMA);
        assertThat(Math.toDegrees(laid().incidence().getOrDefault(3, 0.0) - incidence))
                .isCloseTo(0.09, within(1e-9));
    }

    @Test
    void aPlateIsPlacedAtThePointer() throws Exception {
        stage.press(KeyCode.CONTROL, KeyCode.DIGIT3);
        assertThat(shown().isPreview()).isTrue();
        Point a = at("End A");
        Point b = at("Fold 1");
        Point p = pixel(new Point((2 * a.x() + b.x()) / 3, (2 * a.y() + b.y()) / 3));
        stage.move(bench, p.x(), p.y() + 10);
        stage.picture("placing-light");
        assertThat(design().parts()).hasSize(6);
        assertThat(Stagehand.fx(() -> stage.editor().session().laid())
                        .orElseThrow()
                        .design()
                        .parts())
                .hasSize(5);
        stage.click(bench, p.x(), p.y() + 10);
        assertThat(shown().isPreview()).isFalse();
        assertThat(design().parts().get(1).name()).isEqualTo("Plate 1");
        assertThat(laid().legs().get(0).parts().get(0).middle()).isCloseTo(0.5 / 3, within(5e-3));
        assertThat(shown().undo()).contains("place plate");
        // A second click selects again and places nothing.
        stage.click(bench, 30, bench.getHeight() - 60);
        assertThat(design().parts()).hasSize(6);
    }

    @Test
    void aLensIsPlacedFromTheKeyboardBehindTheSelectedPart() throws Exception {
        select("End A");
        stage.press(KeyCode.CONTROL, KeyCode.DIGIT2);
        stage.press(KeyCode.ENTER);
        assertThat(design().parts().get(1).name()).isEqualTo("Lens 1");
        assertThat(shown().selected()).contains(1);
        stage.press(KeyCode.CONTROL, KeyCode.DIGIT2);
        stage.press(KeyCode.ESCAPE);
        assertThat(design().parts()).hasSize(6);
    }

    @Test
    void deletingUndoingAndRenamingByKeyboard() throws Exception {
        select("Rod");
        stage.press(KeyCode.DELETE);
        assertThat(design().indexOf("Rod")).isEmpty();
        stage.press(KeyCode.CONTROL, KeyCode.Z);
        assertThat(design().indexOf("Rod")).isPresent();
        select("Rod");
        stage.press(KeyCode.F2);
        TextField field =
                Stagehand.fx(() -> (TextField) stage.editor().getScene().getFocusOwner());
        Stagehand.fx(() -> {
            field.setText("End A");
            return true;
        });
        stage.press(KeyCode.ENTER);
        assertThat(design().indexOf("Rod")).isPresent();
        assertThat(stage.node("said", Label.class).getText()).contains("a second time");
        Stagehand.fx(() -> {
            field.setText("Ruby");
            return true;
        });
        stage.press(KeyCode.ENTER);
        assertThat(design().indexOf("Ruby")).isPresent();
        ListView<?> list = stage.node("parts", ListView.class);
        assertThat(list.isFocused()).isTrue();
    }

    @Test
    void savingAsksForANameOnceAndThenSavesThere() throws Exception {
        Path file = folder.resolve("mine.json");
        answers.save = Optional.of(file);
        select("Fold 2");
        stage.press(KeyCode.RIGHT);
        stage.press(KeyCode.CONTROL, KeyCode.S);
        assertThat(shown().isUnsaved()).isFalse();
        assertThat(DesignReader.read(Files.readAllBytes(file)).design()).contains(design());
        assertThat(answers.asked).isEqualTo(1);
        stage.press(KeyCode.RIGHT);
        stage.press(KeyCode.CONTROL, KeyCode.S);
        assertThat(answers.asked).isEqualTo(1);
        assertThat(DesignReader.read(Files.readAllBytes(file)).design()).contains(design());
    }

    @Test
    void leavingUnsavedWorkAsks() throws Exception {
        select("Fold 2");
        stage.press(KeyCode.RIGHT);
        Design mine = design();
        Path other = folder.resolve("other.json");
        Files.copy(Path.of("samples", "bow-tie-doubler.json"), other);
        answers.open = Optional.of(other);
        stage.press(KeyCode.CONTROL, KeyCode.O);
        assertThat(design()).isEqualTo(mine);
        answers.unsaved = Asks.Unsaved.DISCARD;
        stage.press(KeyCode.CONTROL, KeyCode.O);
        assertThat(design()).isNotEqualTo(mine);
    }

    @Test
    void partsAreCutAndPastedAsText() throws Exception {
        select("Rod");
        stage.press(KeyCode.CONTROL, KeyCode.X);
        assertThat(design().indexOf("Rod")).isEmpty();
        String text = Stagehand.fx(() -> Clipboard.getSystemClipboard().getString());
        assertThat(text).contains("\"kind\": \"crystal\"");
        select("End A");
        stage.press(KeyCode.CONTROL, KeyCode.V);
        assertThat(design().parts().get(1).name()).isEqualTo("Rod");
        stage.press(KeyCode.CONTROL, KeyCode.Z);
        stage.press(KeyCode.CONTROL, KeyCode.Z);
        assertThat(design().parts().get(2).name()).isEqualTo("Rod");
    }

    @Test
    void aBrokenPartIsNotPastedAndSaysWhere() throws Exception {
        Design before = design();
        Stagehand.fx(() -> {
            ClipboardContent content = new ClipboardContent();
            content.putString(
                    "{ \"parts\": [\n  { \"name\": \"L\", \"kind\": \"lens\", \"along_mm\": 5, \"focal_lenght_mm\": 3 } ] }");
            return Clipboard.getSystemClipboard().setContent(content);
        });
        select("End A");
        stage.press(KeyCode.CONTROL, KeyCode.V);
        assertThat(design()).isEqualTo(before);
        ListView<?> problems = stage.node("problems", ListView.class);
        assertThat(problems.isVisible()).isTrue();
        assertThat(problems.getItems().toString())
                .contains("line 2")
                .contains("focal_lenght_mm")
                .contains("nearest is \"focal_length_mm\"");
        stage.picture("broken-paste-light");
        Button dismiss = stage.node("dismiss", Button.class);
        stage.click(dismiss, 10, 10);
        assertThat(problems.getParent().isVisible()).isFalse();
    }

    @Test
    void aMirrorGoesToTheNearestStablePlace() throws Exception {
        select("Fold 2");
        for (int i = 0; i < 4; i++) {
            stage.press(KeyCode.SHIFT, KeyCode.RIGHT);
        }
        assertThat(stage.node("said", Label.class).getText()).startsWith("Neither plane is stable");
        stage.press(KeyCode.CONTROL, KeyCode.M);
        assertThat(stage.node("said", Label.class).getText()).startsWith("Both planes are stable");
        assertThat(shown().undo()).contains("move Fold 2 to the nearest stable place");
    }

    @Test
    void workLeftByAKilledProgramIsOfferedAndOpened() throws Exception {
        Path journals = folder.resolve("crash").resolve("journals");
        try (Child child = Child.start(Crash.class, journals.toString(), "20")) {
            String line = child.line();
            while (line != null && !line.equals("20")) {
                line = child.line();
            }
            child.kill();
        }
        stage.close();
        stage = Stagehand.open(folder.resolve("crash").resolve("settings.json"), 1280, 800, answers);
        stage.openSample(SAMPLE);
        Parent offered = stage.node("recovery", Parent.class);
        assertThat(offered.isVisible()).isTrue();
        stage.picture("recovery-light");
        Node delete = List.copyOf(offered.lookupAll(".button")).get(2);
        int asked = answers.asked;
        stage.click(delete, 10, 10);
        assertThat(answers.asked).as("nothing is deleted unasked").isEqualTo(asked + 1);
        assertThat(offered.isVisible()).isTrue();
        Button open = (Button) offered.lookup(".button");
        stage.click(open, 10, 10);
        assertThat(DesignWriter.bytes(design())).isEqualTo(Crash.after(20));
        assertThat(shown().isUnsaved()).isTrue();
        assertThat(offered.isVisible()).isFalse();
    }

    @Test
    void aBrokenFileLeavesTheEditedDesignAsItIs() throws Exception {
        select("Fold 2");
        stage.press(KeyCode.RIGHT);
        Design mine = design();
        Path bad = folder.resolve("bad.json");
        Files.writeString(bad, Files.readString(Path.of("samples", SAMPLE)).replace("roc_mm", "rock_mm"));
        answers.open = Optional.of(bad);
        answers.unsaved = Asks.Unsaved.DISCARD;
        stage.press(KeyCode.CONTROL, KeyCode.O);
        assertThat(design()).isEqualTo(mine);
        assertThat(shown().isUnsaved()).isTrue();
        assertThat(stage.node("problems", ListView.class).getItems().toString()).contains("rock_mm");
        stage.picture("broken-beside-light");
        stage.press(KeyCode.CONTROL, KeyCode.Z);
        assertThat(shown().isUnsaved()).isFalse();
    }

    @Test
    void closingWithUnsavedWorkAsks() throws Exception {
        select("Fold 2");
        stage.press(KeyCode.RIGHT);
        Stagehand.fx(() -> {
            stage.stage().fireEvent(new WindowEvent(stage.stage(), WindowEvent.WINDOW_CLOSE_REQUEST));
            return true;
        });
        assertThat(answers.asked).isEqualTo(1);
        assertThat(Stagehand.fx(() -> stage.stage().isShowing())).isTrue();
        answers.unsaved = Asks.Unsaved.SAVE;
        answers.save = Optional.of(folder.resolve("kept.json"));
        Design mine = design();
        Stagehand.fx(() -> {
            stage.stage().fireEvent(new WindowEvent(stage.stage(), WindowEvent.WINDOW_CLOSE_REQUEST));
            return true;
        });
        assertThat(Stagehand.fx(() -> stage.stage().isShowing())).isFalse();
        assertThat(DesignReader.read(Files.readAllBytes(folder.resolve("kept.json")))
                        .design())
                .contains(mine);
    }

    @Test
    void aNewZStartsInsideItsZone() throws Exception {
        answers.unsaved = Asks.Unsaved.DISCARD;
        Stagehand.later(() -> ((Button) stage.editor().lookup("#new")).fire());
        Scene dialog = stage.dialog();
        stage.type(dialog, "input-fold_1", "7 parsecs");
        stage.fire(dialog, "make");
        Label refused = (Label) dialog.lookup("#refused");
        assertThat(refused.getText()).contains("radius of Fold 1").contains("parsecs");
        stage.picture(dialog, "new-refused-light");
        stage.type(dialog, "input-fold_1", "15 cm");
        stage.type(dialog, "input-fold_2", "150");
        stage.fire(dialog, "make");
        assertThat(design().title()).contains("Z-fold");
        assertThat(((Mirror) design().parts().get(1)).radius()).isEqualTo(0.15);
        assertThat(stage.node("said", Label.class).getText()).startsWith("Both planes are stable");
        assertThat(shown().isUnsaved()).isTrue();
        stage.picture("new-z-light");
    }

    @Test
    void aNewDesignComesFromAList() throws Exception {
        Stagehand.later(() -> ((Button) stage.editor().lookup("#new")).fire());
        Scene dialog = stage.dialog();
        Stagehand.fx(() -> {
            ((TabPane) dialog.lookup("#ways")).getSelectionModel().select(1);
            return true;
        });
        stage.type(dialog, "list", "480, 105, 620; 7.9°, 7.9x");
        stage.fire(dialog, "make");
        assertThat(((Label) dialog.lookup("#list-refused")).getText()).startsWith("character 22");
        stage.picture(dialog, "list-refused-light");
        stage.type(dialog, "list", "480, 105, 620; 7.9°, 7.9°; 100, 100");
        stage.fire(dialog, "make");
        assertThat(laid().legs().get(0).path()).isCloseTo(0.48, within(1e-12));
        assertThat(Math.toDegrees(laid().incidence().getOrDefault(1, 0.0))).isCloseTo(7.9, within(1e-9));
    }
}
