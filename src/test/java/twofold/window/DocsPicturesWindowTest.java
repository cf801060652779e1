package twofold.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import twofold.picture.Theme;

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
            String name = "docs-window-" + theme.word();
            stage.picture(name);
            Path kept = Path.of("docs", "window-" + theme.word() + ".png");
            if ("update".equals(System.getProperty("twofold.golden"))) {
                Files.copy(Path.of("target", "window", name + ".png"), kept, StandardCopyOption.REPLACE_EXISTING);
            }
            assertThat(kept).isNotEmptyFile();
        } finally {
            stage.close();
        }
    }
}
