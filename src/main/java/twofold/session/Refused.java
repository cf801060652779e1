package twofold.session;

import java.util.List;
import java.util.Optional;
import twofold.file.Located;

/**
 * A file that was asked for and could not be opened; the open document stays as it is beside it.
 *
 * @param source what was asked for
 * @param problems what is wrong with it
 * @param failure why it cannot be read at all, in words
 */
public record Refused(Source source, List<Located> problems, Optional<String> failure) {
    /** Copies the list. */
    public Refused {
        problems = List.copyOf(problems);
    }
}
