package twofold.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.fail;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;

/**
 * Compares pictures with those kept in src/test/resources/twofold/picture. {@code -Dtwofold.golden=update} writes them
 * anew, to be looked at before they are committed.
 */
public final class Golden {
    private static final Path FOLDER = Path.of("src/test/resources/twofold/picture");
    private static final String SWITCH = "twofold.golden";

    private Golden() {}

    /** Fails where a picture differs from the one kept under a name. */
    public static void matches(String name, String svg) {
        Path file = FOLDER.resolve(name + ".svg");
        try {
            if ("update".equals(System.getProperty(SWITCH))) {
                Files.createDirectories(FOLDER);
                Files.writeString(file, svg);
                return;
            }
            if (!Files.exists(file)) {
                fail("%s is missing; -D%s=update writes it", file, SWITCH);
            }
            assertThat(svg)
                    .as("%s shows another picture than the program draws; -D%s=update writes it anew", file, SWITCH)
                    .isEqualTo(Files.readString(file));
        } catch (IOException e) {
            throw new UncheckedIOException("cannot compare with " + file, e);
        }
    }
}
