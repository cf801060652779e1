package twofold.bench;

import java.lang.management.ManagementFactory;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.Semaphore;
import javafx.application.Platform;
import javafx.event.Event;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.Scene;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ListView;
import javafx.scene.control.Menu;
import javafx.scene.control.MenuBar;
import javafx.scene.control.MenuButton;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.SplitPane;
import javafx.scene.control.Tab;
import javafx.scene.control.TabPane;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Pane;
import javafx.scene.layout.VBox;
import javafx.scene.paint.Color;
import javafx.stage.Stage;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.file.DesignWriter;
import twofold.session.Runner;
import twofold.session.Session;
import twofold.window.Editor;

/** A window to measure: the editor on the twelve-part ring, redrawn or edited, the same stock controls with empty canvases, or one canvas. */
final class FirstPicture {
    private static final double WIDTH = 1440;
    private static final double HEIGHT = 900;

    private final Stage stage;
    private final Runnable[] redraw;
    private final Semaphore pulses = new Semaphore(0);
    private int step;

    private FirstPicture(Stage stage, Runnable[] redraw) {
        this.stage = stage;
        this.redraw = redraw;
    }

    /** Prints the ms from the start of the process to the first picture. */
    public static void main(String[] args) {
        Platform.startup(() -> open(args[0], () -> {
            long start = ManagementFactory.getRuntimeMXBean().getStartTime();
            System.out.println(System.currentTimeMillis() - start);
            System.out.flush();
            Runtime.getRuntime().halt(0);
        }));
    }

    /** Opens one; must be called on the toolkit's thread. */
    static FirstPicture open(String what, Runnable shown) {
        Stage stage = new Stage();
        Runnable[] redraw = new Runnable[1];
        FirstPicture[] made = new FirstPicture[1];
        Parent root = switch (what) {
            case "editor" -> editor(redraw, made);
            case "edit" -> edited(redraw, made);
            case "empty" -> empty();
            default -> canvas(redraw, made);
        };
        Scene scene = new Scene(root, WIDTH, HEIGHT);
        FirstPicture window = new FirstPicture(stage, redraw);
        made[0] = window;
        stage.setScene(scene);
        stage.show();
        int[] pulse = {0};
        scene.addPostLayoutPulseListener(() -> {
            window.pulses.release();
            if (++pulse[0] == 2) {
                shown.run();
            } else if (pulse[0] == 1) {
                // A window that needs no second layout has no second pulse of its own.
                Platform.requestNextPulse();
            }
        });
        Platform.requestNextPulse();
        return window;
    }

    private static Parent editor(Runnable[] redraw, FirstPicture[] made) {
        Editor editor = new Editor(Runner.onTheSpot());
        try {
            Path file = Files.createTempFile("ring", ".json");
            Files.write(file, DesignWriter.bytes(TwelvePartRing.design()));
            editor.session().open(file);
            Files.delete(file);
        } catch (java.io.IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
        // A crosshair that moves redraws bench and beam; another selected crystal redraws the close-up too.
        redraw[0] = () -> {
            editor.session().point(java.util.Optional.of(0.01 + 1e-3 * (made[0].step % 900)));
            editor.session().select(java.util.Optional.of(made[0].step % 2 == 0 ? 1 : 3));
        };
        return editor;
    }

    /** Every step nudges a mirror by key, there and back. */
    private static Parent edited(Runnable[] redraw, FirstPicture[] made) {
        Parent editor = editor(redraw, made);
        Session session = ((Editor) editor).session();
        session.select(session.laid().orElseThrow().design().parts().stream()
                .filter(Mirror.class::isInstance)
                .map(Part::name)
                .skip(2)
                .limit(1)
                .toList());
        redraw[0] = () -> {
            int steps = session.shown().undo().isPresent() ? 1 : 0;
            Event.fireEvent(
                    editor.lookup("#bench"),
                    new KeyEvent(
                            KeyEvent.KEY_PRESSED,
                            "",
                            "",
                            made[0].step % 2 == 0 ? KeyCode.RIGHT : KeyCode.LEFT,
                            false,
                            true,
                            false,
                            false));
            if (steps == 0 && session.shown().undo().isEmpty()) {
                throw new IllegalStateException("the key edited nothing");
            }
        };
        return editor;
    }

    private static Parent empty() {
        MenuBar menus = new MenuBar(new Menu("File"), new Menu("View"), new Menu("Help"));
        HBox tools = new HBox(
                8,
                new Button("Open…"),
                new MenuButton("Samples"),
                new Button("Show all"),
                new MenuButton("Beam width"),
                new Button("Light or dark"));
        SplitPane lower = new SplitPane(pane(), pane());
        SplitPane pictures = new SplitPane(pane(), lower);
        pictures.setOrientation(javafx.geometry.Orientation.VERTICAL);
        GridPane grid = new GridPane();
        for (int i = 0; i < 18; i++) {
            grid.addRow(i, new Label("Figure"), new Label("0.00"), new Label("0.00"));
        }
        ListView<String> list = new ListView<>();
        for (int i = 0; i < 12; i++) {
            list.getItems().add("Part " + i);
        }
        Pane stability = pane();
        stability.setPrefHeight(112);
        TabPane looks = tabs(
                new VBox(6, new HBox(8, new Label("Part"), new Button("Copy figures")), new ScrollPane(grid)),
                pane(),
                pane());
        TabPane lists = tabs(list, new ScrollPane(new GridPane()));
        VBox side = new VBox(8, stability, looks, lists);
        SplitPane whole = new SplitPane(pictures, side);
        whole.setDividerPositions(0.76);
        BorderPane root = new BorderPane(whole);
        root.setTop(new VBox(menus, tools));
        root.setBottom(new HBox(new Label("Said"), new Label("Facts")));
        return root;
    }

    /** Tabs as the editor has them. */
    private static TabPane tabs(Node... contents) {
        TabPane tabs = new TabPane();
        for (Node content : contents) {
            tabs.getTabs().add(new Tab("Tab", content));
        }
        return tabs;
    }

    private static Pane pane() {
        Canvas canvas = new Canvas(400, 300);
        return new Pane(canvas);
    }

    private static Parent canvas(Runnable[] redraw, FirstPicture[] made) {
        Canvas canvas = new Canvas(WIDTH, HEIGHT);
        redraw[0] = () -> {
            GraphicsContext g = canvas.getGraphicsContext2D();
            g.clearRect(0, 0, WIDTH, HEIGHT);
            g.setFill(Color.gray(made[0].step % 2 == 0 ? 0.9 : 0.92));
            g.fillRect(0, 0, 1, 1);
        };
        return new Pane(canvas);
    }

    void toFront() {
        stage.toFront();
    }

    void redraw(int next) {
        step = next;
        pulses.drainPermits();
        redraw[0].run();
        Platform.requestNextPulse();
    }

    /** Waits until the frame has been laid out and handed to the renderer, and one more. */
    void awaitPulse() throws InterruptedException {
        pulses.acquire();
        Thread.sleep(20); // a frame of the renderer's own thread
    }
}
