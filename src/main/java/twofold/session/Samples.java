package twofold.session;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.URI;
import java.net.URISyntaxException;
import java.net.URL;
import java.nio.file.FileSystem;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;

/** The sample designs that the program carries. */
public final class Samples {
    private static final String FOLDER = "/twofold/samples/";

    private Samples() {}

    /** Their names, sorted. */
    public static List<String> names() {
        URL folder = Samples.class.getResource(FOLDER);
        if (folder == null) {
            return List.of();
        }
        try {
            URI uri = folder.toURI();
            if (!uri.getScheme().equals("jar")) {
                return names(Path.of(uri));
            }
            try (FileSystem jar = FileSystems.newFileSystem(uri, Map.of())) {
                return names(jar.getPath(FOLDER));
            }
        } catch (IOException e) {
            throw new UncheckedIOException("the program's own samples cannot be listed", e);
        } catch (URISyntaxException e) {
            throw new IllegalStateException("the program's own place is no URI: " + folder, e);
        }
    }

    private static List<String> names(Path folder) throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(f -> f.getFileName().toString())
                    .filter(n -> n.endsWith(".json"))
                    .sorted()
                    .toList();
        }
    }

    /** A sample's text as bytes. */
    static byte[] bytes(String name) throws IOException {
        try (InputStream sample = Samples.class.getResourceAsStream(FOLDER + name)) {
            if (sample == null) {
                throw new NoSuchFileException(name, null, "the program carries no such sample");
            }
            return sample.readAllBytes();
        }
    }
}
