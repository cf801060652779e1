package twofold;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import twofold.design.Design;
import twofold.file.DesignReader;
import twofold.file.ReadDesign;

/** The designs in {@code samples}. */
public final class Samples {
    private static final Path FOLDER = Path.of("samples");

    private Samples() {}

    /** All of them, by name. */
    public static List<Path> files() {
        try (Stream<Path> files = Files.list(FOLDER)) {
            return files.sorted().toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The bytes of one. */
    public static byte[] bytes(Path file) {
        try {
            return Files.readAllBytes(file);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The design in a file; problems fail the test. */
    public static Design design(Path file) {
        ReadDesign read = DesignReader.read(bytes(file));
        assertThat(read.problems()).as(file.toString()).isEmpty();
        return read.design().orElseThrow();
    }

    /** A design by the name of its file. */
    public static Design design(String name) {
        return design(FOLDER.resolve(name + ".json"));
    }
}
