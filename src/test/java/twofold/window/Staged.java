package twofold.window;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.io.TempDir;
import twofold.design.Design;
import twofold.layout.Laid;
import twofold.session.Shown;

/** A test with the editor in a window of 1280 × 800 and a person who answers its questions. */
@SuppressWarnings("NullAway.Init") // set before each test
abstract class Staged {
    @TempDir
    Path folder;

    Answers answers;
    Stagehand stage;

    private final Optional<String> sample;

    /** With nothing open. */
    Staged() {
        sample = Optional.empty();
    }

    /** With a sample open. */
    Staged(String sample) {
        this.sample = Optional.of(sample);
    }

    @BeforeEach
    void raise() throws Exception {
        answers = new Answers();
        stage = Stagehand.open(folder.resolve("settings.json"), 1280, 800, answers);
        if (sample.isPresent()) {
            stage.openSample(sample.get());
        }
    }

    @AfterEach
    void drop() throws Exception {
        stage.close();
    }

    final Shown shown() throws Exception {
        return Stagehand.fx(() -> stage.editor().session().shown());
    }

    final Laid laid() throws Exception {
        return shown().cavity().orElseThrow().laid();
    }

    final Design design() throws Exception {
        return laid().design();
    }

    /** Selects parts, the last of them as the lead. */
    final void selectAll(List<String> parts) throws Exception {
        Stagehand.fx(() -> {
            stage.editor().session().select(parts);
            return true;
        });
        stage.settle();
    }
}
