package twofold.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.TimeUnit;
import java.util.function.BooleanSupplier;
import javafx.geometry.Point2D;
import javafx.geometry.VerticalDirection;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.ListView;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.picture.BeamView;
import twofold.picture.BenchView;
import twofold.picture.Theme;
import twofold.window.beam.BeamPane;
import twofold.window.bench.BenchPane;

/** What a person does in a sitting, with the robot's mouse and keys; headless, and in a real window under a display. */
@ExtendWith(ApplicationExtension.class)
@Timeout(value = 60, unit = TimeUnit.SECONDS)
@SuppressWarnings("NullAway.Init") // set before each test
class JourneysWindowTest {
    @TempDir
    static Path folder;

    private Editor editor;

    @Start
    void start(Stage stage) {
        editor = new Editor(new Background());
        App.show(
                stage,
                editor,
                new Recall(folder.resolve("settings-" + System.nanoTime() + ".json")),
                new Dialogs(stage),
                folder.resolve("journals"));
        stage.setX(0);
        stage.setY(0);
        editor.session().openSample("z-fold-rod.json");
    }

    private void until(String what, BooleanSupplier condition) throws Exception {
        try {
            WaitForAsyncUtils.waitFor(
                    10,
                    TimeUnit.SECONDS,
                    () -> WaitForAsyncUtils.asyncFx(condition::getAsBoolean).get());
        } catch (java.util.concurrent.TimeoutException e) {
            throw new AssertionError("never happened: " + what, e);
        }
    }

    private void untilOpen(String sample) throws Exception {
        until(
                sample + " is open",
                () -> editor.session()
                        .shown()
                        .source()
                        .filter(s -> s.name().equals(sample))
                        .isPresent());
    }

    private String selected() {
        return editor.session().selectedPart().map(Part::name).orElse("none");
    }

    private BenchPane bench() {
        return (BenchPane) editor.lookup("#bench");
    }

    private BeamPane beam() {
        return (BeamPane) editor.lookup("#beam");
    }

    private BenchView plan() {
        return settled(() -> bench().view().orElseThrow());
    }

    private BeamView path() {
        return settled(() -> beam().view().orElseThrow());
    }

    /** What a view is once the window's size and its dividers have come to rest. */
    private static <T> T settled(Callable<T> view) {
        T last = WaitForAsyncUtils.waitForAsyncFx(5000, view);
        for (int same = 0, i = 0; same < 3 && i < 100; i++) {
            WaitForAsyncUtils.sleep(30, TimeUnit.MILLISECONDS);
            T next = WaitForAsyncUtils.waitForAsyncFx(5000, view);
            same = next.equals(last) ? same + 1 : 0;
            last = next;
        }
        return last;
    }

    private Point2D onScreen(Node node, double x, double y) {
        return WaitForAsyncUtils.waitForAsyncFx(5000, () -> node.localToScreen(x, y));
    }

    private Point2D mirror(String name) {
        Mirror mirror = editor.session().shown().cavity().orElseThrow().laid().design().mirrors().stream()
                .filter(m -> m.name().equals(name))
                .findFirst()
                .orElseThrow();
        Point at = mirror.at();
        BenchView view = plan();
        return onScreen(bench(), view.viewport().x(at.x()), view.viewport().y(at.y()));
    }

    @Test
    void opensASampleFromTheToolbar(FxRobot robot) throws Exception {
        untilOpen("z-fold-rod.json");
        robot.clickOn("#samples").clickOn("bow-tie-doubler.json");
        untilOpen("bow-tie-doubler.json");
        assertThat(selected()).isEqualTo("Doubler");
    }

    @Test
    void readsTheCautionsInTheMenu(FxRobot robot) throws Exception {
        untilOpen("z-fold-rod.json");
        robot.clickOn("Help").clickOn("About Twofold");
        until("a window tells the cautions", () -> robot.listWindows().size() > 1);
        assertThat(robot.lookup(".alert .content").queryAs(Label.class).getText())
                .contains("laser safety officer")
                .contains("IEC 60825-1");
        robot.clickOn("Close");
        until("it is gone", () -> robot.listWindows().size() == 1);
    }

    @Test
    void picksPartsOnTheBenchWithTheMouse(FxRobot robot) throws Exception {
        untilOpen("z-fold-rod.json");
        robot.clickOn(mirror("End A"));
        until("End A is selected", () -> selected().equals("End A"));
        robot.clickOn(mirror("Output coupler"));
        until("the coupler is selected", () -> selected().equals("Output coupler"));
        ListView<?> list = robot.lookup("#parts").queryListView();
        assertThat(list.getSelectionModel().getSelectedIndex()).isEqualTo(4);
    }

    @Test
    void picksPartsInTheListWithTheKeys(FxRobot robot) throws Exception {
        untilOpen("z-fold-rod.json");
        robot.clickOn("#parts").type(KeyCode.HOME).type(KeyCode.DOWN);
        until("Fold 1 is selected", () -> selected().equals("Fold 1"));
    }

    @Test
    void walksAlongTheBeamWithTheKeys(FxRobot robot) throws Exception {
        untilOpen("z-fold-rod.json");
        robot.clickOn(mirror("End A")).type(KeyCode.PAGE_DOWN, 2);
        until("the rod is selected", () -> selected().equals("Rod"));
        robot.type(KeyCode.ESCAPE);
        until("nothing is selected", () -> selected().equals("none"));
    }

    @Test
    void zoomsAndShowsAll(FxRobot robot) throws Exception {
        untilOpen("z-fold-rod.json");
        BenchView before = plan();
        robot.moveTo(onScreen(bench(), 300, 250)).scroll(3, VerticalDirection.UP);
        until(
                "the bench zoomed",
                () -> bench().view().orElseThrow().viewport().scale()
                        != before.viewport().scale());
        robot.clickOn("#show-all");
        until("all is shown", () -> bench().view().orElseThrow().viewport().equals(before.viewport()));
    }

    @Test
    void zoomsWithTheKeys(FxRobot robot) throws Exception {
        untilOpen("z-fold-rod.json");
        double before = plan().viewport().scale();
        robot.clickOn(mirror("End A")).type(KeyCode.ADD).type(KeyCode.ADD);
        until("the bench zoomed", () -> bench().view().orElseThrow().viewport().scale() > 1.5 * before);
        robot.type(KeyCode.HOME);
        until("all is shown", () -> bench().view().orElseThrow().viewport().scale() == before);
    }

    @Test
    void pansWithTheMiddleButton(FxRobot robot) throws Exception {
        untilOpen("z-fold-rod.json");
        double before = plan().viewport().originX();
        robot.moveTo(onScreen(bench(), 300, 250)).press(MouseButton.MIDDLE);
        robot.moveTo(onScreen(bench(), 380, 270)).release(MouseButton.MIDDLE);
        until(
                "the bench moved by 80 px",
                () -> Math.abs(bench().view().orElseThrow().viewport().originX() - before - 80) < 2);
    }

    @Test
    void readsTheCrosshairBothWays(FxRobot robot) throws Exception {
        untilOpen("z-fold-rod.json");
        BeamView view = path();
        robot.moveTo(onScreen(beam(), view.stretch().x(0.3), 110));
        until(
                "the bench shows the point",
                () -> bench().view().orElseThrow().crosshair().isPresent());
        assertThat(plan().crosshair().orElseThrow()).isBetween(0.29, 0.31);
    }

    @Test
    void dragsAMirrorAndTakesItBack(FxRobot robot) throws Exception {
        untilOpen("z-fold-rod.json");
        Point before = place("Fold 2");
        robot.moveTo(mirror("Fold 2")).press(MouseButton.PRIMARY).moveBy(20, 0).moveBy(10, 4);
        until(
                "the beam follows",
                () -> editor.session().shown().isPreview() && !place("Fold 2").equals(before));
        robot.release(MouseButton.PRIMARY);
        until("it is one step", () -> editor.session().shown().undo().equals(Optional.of("move Fold 2")));
        robot.push(KeyCode.CONTROL, KeyCode.Z);
        until("it is back", () -> place("Fold 2").equals(before));
        assertThat(editor.session().shown().isUnsaved()).isFalse();
    }

    @Test
    void makesANewBowTie(FxRobot robot) throws Exception {
        untilOpen("z-fold-rod.json");
        robot.clickOn("#new").clickOn("#shape").clickOn("Bow-tie").clickOn("#make");
        until(
                "it is there",
                () -> editor.session()
                                .shown()
                                .cavity()
                                .orElseThrow()
                                .laid()
                                .design()
                                .shape()
                        == Shape.RING);
        assertThat(editor.session().shown().isUnsaved()).isTrue();
    }

    @Test
    void placesAPlateAndIsAskedBeforeItIsLeft(FxRobot robot) throws Exception {
        untilOpen("z-fold-rod.json");
        robot.clickOn("#place").clickOn("Plate");
        Point a = place("End A");
        Point b = place("Fold 1");
        BenchView view = plan();
        double x = view.viewport().x((a.x() + b.x()) / 2);
        robot.moveTo(onScreen(bench(), x, view.viewport().y(a.y()) + 10)).clickOn(MouseButton.PRIMARY);
        until(
                "the plate stands there",
                () -> selected().equals("Plate 1") && !editor.session().shown().isPreview());
        robot.clickOn("#samples").clickOn("bow-tie-doubler.json").clickOn("Go on editing");
        assertThat(selected()).isEqualTo("Plate 1");
        robot.clickOn("#samples").clickOn("bow-tie-doubler.json").clickOn("Do not save");
        untilOpen("bow-tie-doubler.json");
    }

    private Point place(String mirror) {
        return editor.session().shown().cavity().orElseThrow().laid().design().mirrors().stream()
                .filter(m -> m.name().equals(mirror))
                .findFirst()
                .orElseThrow()
                .at();
    }

    @Test
    void changesTheTheme(FxRobot robot) throws Exception {
        untilOpen("z-fold-rod.json");
        robot.clickOn("#theme");
        until("it is dark", () -> editor.theme() == Theme.DARK);
        robot.push(KeyCode.CONTROL, KeyCode.T);
        until("it is light", () -> editor.theme() == Theme.LIGHT);
    }

    @Test
    void setsTheBeamWidth(FxRobot robot) throws Exception {
        untilOpen("z-fold-rod.json");
        robot.clickOn("#beam-width").clickOn("50 times");
        until("the beam is wide", () -> bench().view().orElseThrow().magnify() == 50);
    }

    @Test
    void mendsABrokenFileBesideATextEditor(FxRobot robot) throws Exception {
        untilOpen("z-fold-rod.json");
        Path file = folder.resolve("mine.json");
        String good = Files.readString(Path.of("samples/z-fold-rod.json"));
        Files.writeString(file, good);
        WaitForAsyncUtils.waitForAsyncFx(5000, () -> {
            editor.session().open(file);
            return true;
        });
        untilOpen("mine.json");
        Files.writeString(file, good.replace("\"mirror\"", "\"miror\""));
        until("the change is noticed", () -> editor.session().shown().isChangedOnDisk());
        robot.clickOn("#reload");
        until("problems are listed", () -> !editor.session().shown().problems().isEmpty());
        ListView<?> list = robot.lookup("#problems").queryListView();
        assertThat(String.valueOf(list.getItems().get(0))).contains("nearest is \"mirror\"");
        assertThat(editor.session().shown().isStale()).isTrue();
        Files.writeString(file, good);
        until("the mended file is noticed", () -> editor.session().shown().isChangedOnDisk());
        robot.clickOn("#reload");
        until("all is well", () -> editor.session().shown().problems().isEmpty());
        assertThat(robot.lookup("#said").queryAs(Label.class).getText()).startsWith("Both planes are stable.");
    }

    @Test
    void movesFromPaneToPaneAndReadsAboutKeys(FxRobot robot) throws Exception {
        untilOpen("z-fold-rod.json");
        robot.clickOn(mirror("End A"));
        until("End A is selected", () -> selected().equals("End A"));
        robot.type(KeyCode.F6);
        until("the beam has the keyboard", () -> beam().isFocused());
        robot.type(KeyCode.F1);
        until("a window tells the keys", () -> robot.listWindows().size() > 1);
        robot.clickOn("Close");
        until("it is gone", () -> robot.listWindows().size() == 1);
    }
}
