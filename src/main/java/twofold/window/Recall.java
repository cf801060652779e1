package twofold.window;

import java.io.IOException;
import java.nio.file.Path;
import java.util.function.UnaryOperator;
import twofold.file.Settings;

/** What the window remembers, written at every change so that a crash loses nothing. */
final class Recall {
    private final Path file;
    private Settings settings;

    Recall(Path file) {
        this.file = file;
        this.settings = Settings.read(file);
    }

    Settings settings() {
        return settings;
    }

    void change(UnaryOperator<Settings> by) {
        Settings next = by.apply(settings);
        if (next.equals(settings)) {
            return;
        }
        settings = next;
        try {
            next.write(file);
        } catch (IOException e) {
            System.getLogger(Recall.class.getName())
                    .log(System.Logger.Level.WARNING, "settings cannot be written: " + file, e);
        }
    }
}
