package twofold.window;

import static java.util.concurrent.TimeUnit.SECONDS;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.FutureTask;
import javafx.application.Platform;
import javafx.embed.swing.SwingFXUtils;
import javafx.event.Event;
import javafx.geometry.Point2D;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.Button;
import javafx.scene.control.ChoiceBox;
import javafx.scene.control.DialogPane;
import javafx.scene.control.TextInputControl;
import javafx.scene.image.WritableImage;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseButton;
import javafx.scene.robot.Robot;
import javafx.stage.Stage;
import javafx.stage.Window;
import javax.imageio.ImageIO;
import org.testfx.api.FxToolkit;
import twofold.design.Mirror;
import twofold.design.Point;
import twofold.layout.Laid;
import twofold.picture.BenchView;
import twofold.session.Runner;
import twofold.window.bench.BenchPane;

/** An editor in a window for tests: made and driven on the toolkit's thread, reading and solving on the spot. */
final class Stagehand {
    private final Stage stage;
    private final Editor editor;
    private final Robot robot;

    private Stagehand(Stage stage, Editor editor, Robot robot) {
        this.stage = stage;
        this.editor = editor;
        this.robot = robot;
    }

    /** A window of a size with nothing open, at the corner of the screen. */
    static Stagehand open(Path settings, double width, double height) throws Exception {
        return open(settings, width, height, new Answers());
    }

    /** The same, with what a person would answer. */
    static Stagehand open(Path settings, double width, double height, Asks asks) throws Exception {
        return open(settings, width, height, asks, Runner.onTheSpot());
    }

    /** The same, with work on a runner. */
    static Stagehand open(Path settings, double width, double height, Asks asks, Runner runner) throws Exception {
        // TestFX must be the one that starts the toolkit: after another start its own robot gets no input.
        FxToolkit.registerPrimaryStage();
        Platform.setImplicitExit(false);
        Recall recall = new Recall(settings);
        recall.change(s -> s.sized(width, height, false, s.splits()));
        Stagehand hand = fx(() -> {
            Stage stage = new Stage();
            Editor editor = new Editor(runner);
            stage.setX(0);
            stage.setY(0);
            App.show(stage, editor, recall, asks, settings.resolveSibling("journals"));
            return new Stagehand(stage, editor, new Robot());
        });
        hand.awaitKeyboard();
        return hand;
    }

    /** Waits until the window has the keyboard, which a window before it may give up late. */
    private void awaitKeyboard() throws Exception {
        for (int i = 0; i < 100; i++) {
            settle();
            boolean has = fx(() -> {
                stage.toFront();
                stage.requestFocus();
                return stage.isFocused() && editor.getWidth() > 0;
            });
            if (has) {
                settle();
                return;
            }
            Thread.sleep(20);
        }
        throw new IllegalStateException("the window never got the keyboard");
    }

    /** Does something on the toolkit's thread. */
    static <T> T fx(Callable<T> work) throws Exception {
        FutureTask<T> task = new FutureTask<>(work);
        Platform.runLater(task);
        return task.get(20, SECONDS);
    }

    /** Has something done on the toolkit's thread that may wait for a person, as a dialog does. */
    static void later(Runnable work) {
        Platform.runLater(work);
    }

    /**
     * Waits until what the last turns posted has run, was laid out and drawn. Turns alone are not enough: the window's
     * size and its dividers reach the drawings at the pulses after them, and a point taken from a picture drawn before
     * that is somewhere else by the time the mouse gets there.
     */
    void settle() throws Exception {
        for (int i = 0; i < 3; i++) {
            fx(() -> true);
        }
        for (int i = 0; i < 2; i++) {
            pulse();
        }
    }

    private void pulse() throws Exception {
        if (!fx(stage::isShowing)) {
            return;
        }
        CountDownLatch laidOut = new CountDownLatch(1);
        Runnable count = laidOut::countDown;
        fx(() -> {
            editor.getScene().addPostLayoutPulseListener(count);
            Platform.requestNextPulse();
            return true;
        });
        boolean came = laidOut.await(20, SECONDS);
        fx(() -> {
            editor.getScene().removePostLayoutPulseListener(count);
            return true;
        });
        if (!came) {
            throw new IllegalStateException("no pulse came");
        }
    }

    Editor editor() {
        return editor;
    }

    Stage stage() {
        return stage;
    }

    /** A node by its id. */
    <T extends Node> T node(String id, Class<T> type) {
        return type.cast(editor.lookup("#" + id));
    }

    void openSample(String name) throws Exception {
        fx(() -> {
            editor.session().openSample(name);
            return true;
        });
        settle();
    }

    void open(Path file) throws Exception {
        fx(() -> {
            editor.session().open(file);
            return true;
        });
        settle();
    }

    /** Moves the mouse to a point of a node. */
    void move(Node on, double x, double y) throws Exception {
        fx(() -> {
            // What has just become visible has its place only after a layout.
            editor.applyCss();
            editor.layout();
            Point2D at = on.localToScreen(x, y);
            robot.mouseMove(at);
            return true;
        });
        settle();
    }

    void click(Node on, double x, double y) throws Exception {
        move(on, x, y);
        fx(() -> {
            robot.mousePress(MouseButton.PRIMARY);
            return true;
        });
        settle();
        fx(() -> {
            robot.mouseRelease(MouseButton.PRIMARY);
            return true;
        });
        settle();
    }

    void drag(Node on, MouseButton button, double x, double y, double dx, double dy) throws Exception {
        move(on, x, y);
        fx(() -> {
            robot.mousePress(button);
            return true;
        });
        settle();
        for (int i = 1; i <= 4; i++) {
            move(on, x + dx * i / 4, y + dy * i / 4);
        }
        fx(() -> {
            robot.mouseRelease(button);
            return true;
        });
        settle();
    }

    void wheel(int steps) throws Exception {
        fx(() -> {
            robot.mouseWheel(steps);
            return true;
        });
        settle();
    }

    /** Presses a button of the mouse and keeps it down. */
    void hold(MouseButton button) throws Exception {
        fx(() -> {
            robot.mousePress(button);
            return true;
        });
        settle();
    }

    /** Lets a button of the mouse go. */
    void release(MouseButton button) throws Exception {
        fx(() -> {
            robot.mouseRelease(button);
            return true;
        });
        settle();
    }

    /** Presses a key and keeps it down. */
    void hold(KeyCode key) throws Exception {
        awaitKeyboard();
        fx(() -> {
            robot.keyPress(key);
            return true;
        });
        settle();
    }

    /** Lets a key go. */
    void release(KeyCode key) throws Exception {
        fx(() -> {
            robot.keyRelease(key);
            return true;
        });
        settle();
    }

    void press(KeyCode... keys) throws Exception {
        awaitKeyboard();
        keys(keys);
    }

    /** Presses keys for whichever window has the keyboard. */
    void keys(KeyCode... keys) throws Exception {
        fx(() -> {
            for (KeyCode key : keys) {
                robot.keyPress(key);
            }
            return true;
        });
        settle();
        fx(() -> {
            for (int i = keys.length - 1; i >= 0; i--) {
                robot.keyRelease(keys[i]);
            }
            return true;
        });
        settle();
    }

    /** The dialog that is open. */
    Scene dialog() throws Exception {
        settle();
        return fx(() -> Window.getWindows().stream()
                .filter(w -> w != stage && w.isShowing() && w.getScene().getRoot() instanceof DialogPane)
                .findFirst()
                .orElseThrow()
                .getScene());
    }

    /** Puts a text into a field of a dialog. */
    void type(Scene dialog, String id, String text) throws Exception {
        fx(() -> {
            ((TextInputControl) dialog.lookup("#" + id)).setText(text);
            return true;
        });
    }

    /** Presses a button of a dialog. */
    void fire(Scene dialog, String id) throws Exception {
        later(() -> ((Button) dialog.lookup("#" + id)).fire());
        settle();
    }

    /** The pixel of a part's middle on the bench. */
    Point pixel(BenchPane bench, String part) throws Exception {
        Laid laid = fx(() -> editor.session().shown().cavity().orElseThrow().laid());
        int index = laid.design().indexOf(part).orElseThrow();
        Point on = laid.design().parts().get(index) instanceof Mirror m
                ? m.at()
                : laid.legs().stream()
                        .flatMap(l -> l.parts().stream()
                                .filter(s -> s.part() == index)
                                .map(s -> l.at(s.middle())))
                        .findFirst()
                        .orElseThrow();
        return pixel(bench, on);
    }

    /** The pixel of a place of the table on the bench. */
    Point pixel(BenchPane bench, Point on) throws Exception {
        BenchView view = fx(() -> bench.view().orElseThrow());
        return new Point(view.viewport().x(on.x()), view.viewport().y(on.y()));
    }

    /** Types characters, whatever key they are on, into what has the keyboard. */
    void type(String text) throws Exception {
        awaitKeyboard();
        type(editor.getScene(), text);
    }

    /** Types characters into what has a window's keyboard. */
    void type(Scene scene, String text) throws Exception {
        fx(() -> {
            text.codePoints().mapToObj(Character::toString).forEach(c -> {
                Node owner = scene.getFocusOwner();
                Event.fireEvent(
                        owner, new KeyEvent(KeyEvent.KEY_TYPED, c, "", KeyCode.UNDEFINED, false, false, false, false));
            });
            return true;
        });
        settle();
    }

    /** Types a text in place of what is in a field, and takes it. */
    void enter(String id, String text) throws Exception {
        Node field = fx(() -> Optional.ofNullable(editor.lookup("#" + id)))
                .orElseThrow(() -> new AssertionError("there is no field " + id));
        fx(() -> {
            field.requestFocus();
            return true;
        });
        settle();
        press(KeyCode.CONTROL, KeyCode.A);
        if (text.isEmpty()) {
            press(KeyCode.DELETE);
        } else {
            type(text);
        }
        press(KeyCode.ENTER);
    }

    /** Chooses what a box of choices says in words. */
    void choose(String id, String words) throws Exception {
        choose(node(id, Node.class), words);
    }

    /** Chooses what a box of choices says in words. */
    void choose(Node box, String words) throws Exception {
        fx(() -> {
            choose((ChoiceBox<?>) box, words);
            return true;
        });
        settle();
    }

    private static <T> void choose(ChoiceBox<T> box, String words) {
        box.setValue(box.getItems().stream()
                .filter(v -> box.getConverter().toString(v).equals(words))
                .findFirst()
                .orElseThrow());
    }

    /** What a box of choices shows. */
    String chosen(String id) throws Exception {
        return fx(() -> words((ChoiceBox<?>) editor.lookup("#" + id)));
    }

    private static <T> String words(ChoiceBox<T> box) {
        return box.getConverter().toString(box.getValue());
    }

    /** All that a box of choices offers. */
    List<String> choices(String id) throws Exception {
        return fx(() -> all((ChoiceBox<?>) editor.lookup("#" + id)));
    }

    private static <T> List<String> all(ChoiceBox<T> box) {
        return box.getItems().stream().map(box.getConverter()::toString).toList();
    }

    /** A picture of the whole window, kept under target for looking at. */
    WritableImage picture(String name) throws Exception {
        return picture(editor.getScene(), name);
    }

    /** A picture of another window. */
    WritableImage picture(Scene scene, String name) throws Exception {
        settle();
        WritableImage image = fx(() -> scene.snapshot(null));
        File file = Path.of("target", "window", name + ".png").toFile();
        Files.createDirectories(file.toPath().getParent());
        if (!ImageIO.write(SwingFXUtils.fromFXImage(image, null), "png", file)) {
            throw new IOException("no PNG was written: " + file);
        }
        return image;
    }

    /** Closes the window. */
    void close() throws Exception {
        fx(() -> {
            stage.hide();
            return true;
        });
        settle();
    }
}
