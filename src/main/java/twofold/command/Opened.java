package twofold.command;

import java.io.IOException;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import twofold.cavity.Cavity;
import twofold.design.Design;
import twofold.file.DesignReader;
import twofold.file.Located;
import twofold.file.ReadDesign;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.study.WorstOver;

/**
 * What became of a file that a command was given.
 *
 * @param design present when the file was read without problems
 * @param problems everything wrong with it
 * @param isReadable whether the file could be opened at all
 */
record Opened(Optional<Design> design, List<Located> problems, boolean isReadable) {

    /** Reads a file; what is wrong goes to the error stream, a line a problem. */
    static Opened read(String file, Streams streams) {
        try {
            ReadDesign result = DesignReader.read(Path.of(file));
            result.problems().forEach(p -> streams.err().println(p.line(file)));
            return new Opened(result.design(), result.problems(), true);
        } catch (IOException | InvalidPathException e) {
            streams.err().println(Unreadable.line(file, e));
            return new Opened(Optional.empty(), List.of(), false);
        }
    }

    /** Reads and solves a file; empty when that cannot be, and then the error stream says why. */
    static Optional<Cavity> solve(String file, Streams streams) {
        return read(file, streams)
                .design()
                .map(Opened::laid)
                .map(l -> Cavity.solve(l).judgedOver(new WorstOver(l)));
    }

    /** Reads and lays out a file; empty when that cannot be, and then the error stream says why. */
    static Optional<Laid> lay(String file, Streams streams) {
        return read(file, streams).design().map(Opened::laid);
    }

    private static Laid laid(Design design) {
        return Layout.of(design)
                .value()
                .orElseThrow(() -> new IllegalStateException("a design without problems lies on the table"));
    }
}
