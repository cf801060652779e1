package twofold.window;

import java.nio.file.Path;
import java.util.Optional;

/** Questions that only the person can answer. */
interface Asks {
    /** What becomes of work that is not saved. */
    enum Unsaved {
        /** It is saved first. */
        SAVE,
        /** It is given up. */
        DISCARD,
        /** Everything stays as it is. */
        STAY
    }

    /** What becomes of a file that another program changed. */
    enum Changed {
        /** It is written over. */
        WRITE_OVER,
        /** The design goes into another file. */
        ELSEWHERE,
        /** Nothing is written. */
        STAY
    }

    /** Which file to open. */
    Optional<Path> open(Optional<Path> folder);

    /** Which file to save in. */
    Optional<Path> save(Optional<Path> folder, String name);

    /** What becomes of a document's unsaved work, before it is closed. */
    Unsaved unsaved(String name);

    /** Whether work that an earlier run left unsaved is deleted for good. */
    boolean delete(String title);

    /** What becomes of a file that was changed since it was read. */
    Changed changed(String name);
}
