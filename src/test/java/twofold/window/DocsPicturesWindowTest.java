package twofold.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.TabPane;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import twofold.design.Point;
import twofold.picture.Theme;
import twofold.window.bench.BenchPane;

/**
 * The pictures of the window that the pages show. {@code -Dtwofold.golden=update} makes them anew; glyphs differ a little
 * from machine to machine, so they are not compared.
 */
@Tag("headless-only")
class DocsPicturesWindowTest {
    @TempDir
    @SuppressWarnings("NullAway.Init") // set by JUnit
    Path folder;

    @ParameterizedTest
    @EnumSource
    void thePagesShowTheWindow(Theme theme) throws Exception {
        Stagehand stage = Stagehand.open(folder.resolve("settings.json"), 1280, 800);
        try {
            stage.openSample(theme == Theme.LIGHT ? "z-fold-rod.json" : "bow-tie-doubler.json");
            Stagehand.fx(() -> {
                stage.editor().setTheme(theme);
                return true;
            });
            stage.picture("docs-window-" + theme.word());
            keep("docs-window-" + theme.word(), "window-" + theme.word());
        } finally {
            stage.close();
        }
    }

    @Test
    void thePageShowsAMap() throws Exception {
        Stagehand stage = Stagehand.open(folder.resolve("settings.json"), 1280, 800);
        try {
            stage.openSample("z-fold-rod.json");
            Stagehand.fx(() -> {
                stage.node("plots", TabPane.class).getSelectionModel().select(2);
                return true;
            });
            stage.settle();
            Node map = stage.node("map-plot", Node.class);
            stage.click(map, 250, 110);
            assertThat(stage.node("map-words", Label.class).getText()).startsWith("Preview: ");
            picture(stage, "window-map");
        } finally {
            stage.close();
        }
    }

    /** The steps of the page, one by one. */
    @Test
    void thePageBuildsAZFold() throws Exception {
        Stagehand stage = Stagehand.open(folder.resolve("settings.json"), 1280, 800);
        try {
            BenchPane bench = stage.node("bench", BenchPane.class);
            Stagehand.later(() -> ((Button) stage.editor().lookup("#new")).fire());
            Scene dialog = stage.dialog();
            picture(stage, dialog, "editing-new");
            stage.fire(dialog, "make");
            picture(stage, "editing-z");
            stage.press(KeyCode.CONTROL, KeyCode.DIGIT3);
            Point arm = stage.pixel(bench, new Point(0.25, 0));
            stage.move(bench, arm.x(), arm.y() + 12);
            picture(stage, "editing-place");
            stage.click(bench, arm.x(), arm.y() + 12);
            Point fold = stage.pixel(bench, "Fold 2");
            stage.move(bench, fold.x(), fold.y());
            stage.hold(MouseButton.PRIMARY);
            stage.move(bench, fold.x() + 4, fold.y() - 6);
            picture(stage, "editing-drag");
            stage.release(MouseButton.PRIMARY);
            stage.press(KeyCode.CONTROL, KeyCode.M);
            assertThat(stage.node("said", Label.class).getText()).startsWith("Both planes are stable");
        } finally {
            stage.close();
        }
    }

    private static void picture(Stagehand stage, String name) throws Exception {
        stage.picture("docs-" + name);
        keep("docs-" + name, name);
    }

    private static void picture(Stagehand stage, Scene scene, String name) throws Exception {
        stage.picture(scene, "docs-" + name);
        keep("docs-" + name, name);
    }

    private static void keep(String made, String name) throws Exception {
        Path kept = Path.of("docs", name + ".png");
        if ("update".equals(System.getProperty("twofold.golden"))) {
            Files.copy(Path.of("target", "window", made + ".png"), kept, StandardCopyOption.REPLACE_EXISTING);
        }
        assertThat(kept).isNotEmptyFile();
    }
}
