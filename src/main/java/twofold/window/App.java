package twofold.window;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import javafx.animation.Animation;
import javafx.animation.KeyFrame;
import javafx.animation.Timeline;
import javafx.application.Platform;
import javafx.geometry.Rectangle2D;
import javafx.scene.Scene;
import javafx.stage.Screen;
import javafx.stage.Stage;
import javafx.util.Duration;
import twofold.file.Folders;
import twofold.file.Journal;
import twofold.file.Settings;
import twofold.file.UnsavedWork;
import twofold.picture.Theme;

/** The one window with the editor, on a file or on the first sample. */
final class App {
    /** How often the file on disk is looked at. */
    private static final Duration LOOK = Duration.seconds(1);

    private static final double LEAST_WIDTH = 1024;
    private static final double LEAST_HEIGHT = 700;
    private static final String FIRST_SAMPLE = "z-fold-rod.json";

    private App() {}

    /** Opens the window on a file, or on the first sample. */
    static Stage open(List<String> arguments) {
        Stage stage = new Stage();
        Recall recall = new Recall(Settings.usualFile(System.getenv(), System.getProperty("user.home")));
        Background background = new Background();
        Background scribe = new Background();
        Background studies = new Background();
        Path journals = Folders.state(System.getenv(), System.getProperty("user.home"), System.getProperty("os.name"))
                .resolve("journals");
        Editor editor = new Editor(background, new Journal(journals), scribe, studies);
        show(stage, editor, recall, new Dialogs(stage), journals);
        stage.showingProperty().addListener((o, was, is) -> {
            background.close();
            scribe.close();
            studies.close();
        });
        if (arguments.isEmpty()) {
            editor.session().openSample(FIRST_SAMPLE);
        } else {
            editor.session().open(Path.of(arguments.get(0)));
        }
        return stage;
    }

    /** Puts an editor into a window as it was last left, and offers what an earlier run left unsaved in a folder. */
    static void show(Stage stage, Editor editor, Recall recall, Asks asks, Path journals) {
        Settings settings = recall.settings();
        editor.setTheme(settings.isDark() ? Theme.DARK : Theme.LIGHT);
        Documents documents = new Documents(editor.session(), asks, editor::take);
        Bars bars = new Bars(editor, recall, documents);
        editor.onDropped(documents::open);
        stage.setOnCloseRequest(e -> {
            e.consume();
            documents.close(stage::hide);
        });
        editor.setBars(bars.menus(), bars.toolbar());
        editor.onTitle(stage::setTitle);
        editor.onOpened(file -> recall.change(s -> s.opened(file)));
        Rectangle2D screen = Screen.getPrimary().getVisualBounds();
        stage.setScene(new Scene(
                editor,
                Math.min(settings.width(), screen.getWidth()),
                Math.min(settings.height(), screen.getHeight())));
        bars.addKeys(stage.getScene());
        stage.setMinWidth(Math.min(LEAST_WIDTH, screen.getWidth()));
        stage.setMinHeight(Math.min(LEAST_HEIGHT, screen.getHeight()));
        stage.setMaximized(settings.isMaximised());
        stage.setTitle("Twofold");
        stage.setOnHiding(e -> recall.change(s -> s.sized(
                editor.getScene().getWidth(), editor.getScene().getHeight(), stage.isMaximized(), editor.dividers())));
        stage.show();
        offer(editor, documents, asks, journals);
        // Dividers have their places once the window has its size.
        Platform.runLater(() -> editor.setDividers(settings.splits()));
        Timeline look = new Timeline(new KeyFrame(LOOK, e -> editor.session().look()));
        look.setCycleCount(Animation.INDEFINITE);
        look.play();
        stage.showingProperty().addListener((o, was, is) -> {
            look.stop();
            editor.recovery().close();
        });
    }

    private static void offer(Editor editor, Documents documents, Asks asks, Path journals) {
        Recovery recovery = editor.recovery();
        try {
            recovery.offer(
                    UnsavedWork.in(journals),
                    work -> documents.recover(work, recovery::opened),
                    asks::delete,
                    editor::say);
        } catch (IOException e) {
            editor.say("What was left unsaved cannot be looked for: " + e.getMessage());
        }
    }
}
