package twofold.window;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import twofold.design.Design;
import twofold.design.Mirror;
import twofold.file.DesignReader;

/** A whole build without a mouse: every step is a key pressed where the keyboard is. */
@Tag("headless-only")
class KeyboardWindowTest extends Staged {
    private String selected() throws Exception {
        return Stagehand.fx(
                () -> stage.editor().session().selectedPart().map(p -> p.name()).orElse(""));
    }

    private static String focused(Scene scene) throws Exception {
        return Stagehand.fx(() ->
                Optional.ofNullable(scene.getFocusOwner()).map(Node::getId).orElse(""));
    }

    /** Presses a key until something has the keyboard; fails where it never gets there. */
    private void reach(Scene scene, KeyCode key, String id) throws Exception {
        for (int i = 0; i < 40 && !id.equals(focused(scene)); i++) {
            stage.keys(key);
        }
        assertThat(focused(scene)).isEqualTo(id);
    }

    private void select(String part) throws Exception {
        Scene scene = stage.editor().getScene();
        reach(scene, KeyCode.F6, "bench");
        for (int i = 0; i < 20 && !part.equals(selected()); i++) {
            stage.press(KeyCode.PAGE_DOWN);
        }
        assertThat(selected()).isEqualTo(part);
    }

    @Test
    void aZIsBuiltSavedAndOpenedAgain() throws Exception {
        Scene scene = stage.editor().getScene();
        stage.press(KeyCode.CONTROL, KeyCode.N);
        Scene dialog = stage.dialog();
        reach(dialog, KeyCode.TAB, "input-arm_1");
        stage.type(dialog, "48 cm");
        stage.keys(KeyCode.ENTER);
        assertThat(laid().legs().get(0).path()).isCloseTo(0.48, within(1e-12));
        assertThat(stage.node("said", Label.class).getText()).startsWith("Both planes are stable");

        select("Fold 1");
        reach(scene, KeyCode.F6, "fields-scroll");
        reach(scene, KeyCode.TAB, "field-roc_mm");
        stage.type("101");
        stage.press(KeyCode.ENTER);
        assertThat(((Mirror) laid().design().parts().get(1)).radius()).isEqualTo(0.101);

        select("End A");
        stage.press(KeyCode.CONTROL, KeyCode.DIGIT3);
        stage.press(KeyCode.ENTER);
        assertThat(selected()).isEqualTo("Plate 1");
        double before = laid().legs().get(0).parts().get(0).middle();
        stage.press(KeyCode.SHIFT, KeyCode.RIGHT);
        assertThat(laid().legs().get(0).parts().get(0).middle() - before).isCloseTo(1e-3, within(1e-12));

        Path file = folder.resolve("built.json");
        answers.save = Optional.of(file);
        stage.press(KeyCode.CONTROL, KeyCode.S);
        Design built = laid().design();
        assertThat(shown().isUnsaved()).isFalse();
        assertThat(DesignReader.read(Files.readAllBytes(file)).design()).contains(built);
        stage.press(KeyCode.DELETE);
        assertThat(laid().design()).isNotEqualTo(built);
        answers.open = Optional.of(file);
        answers.unsaved = Asks.Unsaved.DISCARD;
        stage.press(KeyCode.CONTROL, KeyCode.O);
        assertThat(laid().design()).isEqualTo(built);
        assertThat(shown().isUnsaved()).isFalse();
    }
}
