package twofold.window;

import java.nio.file.Path;
import java.util.Optional;

/** A person who answers every question the same way; a native file dialog cannot be driven. */
final class Answers implements Asks {
    Optional<Path> open = Optional.empty();
    Optional<Path> save = Optional.empty();
    Unsaved unsaved = Unsaved.STAY;
    Changed changed = Changed.STAY;
    boolean delete;
    int asked;

    @Override
    public Optional<Path> open(Optional<Path> folder) {
        asked++;
        return open;
    }

    @Override
    public Optional<Path> save(Optional<Path> folder, String name) {
        asked++;
        return save;
    }

    @Override
    public Unsaved unsaved(String name) {
        asked++;
        return unsaved;
    }

    @Override
    public Changed changed(String name) {
        asked++;
        return changed;
    }

    @Override
    public boolean delete(String title) {
        asked++;
        return delete;
    }
}
