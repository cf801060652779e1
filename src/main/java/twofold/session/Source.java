package twofold.session;

import java.nio.file.Path;
import java.util.Optional;

/**
 * Where a document comes from.
 *
 * @param name as titles show it
 * @param file on disk; empty for a sample carried in the program and for a new document
 */
public record Source(String name, Optional<Path> file) {
    /** A document that is in no file yet. */
    public static final Source UNTITLED = new Source("Untitled", Optional.empty());

    /** A file on disk. */
    public static Source of(Path file) {
        Path last = file.getFileName();
        return new Source(last == null ? file.toString() : last.toString(), Optional.of(file));
    }

    /** A sample carried in the program. */
    public static Source sample(String name) {
        return new Source(name, Optional.empty());
    }
}
