package twofold.command;

import java.io.IOException;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import twofold.cavity.Cavity;
import twofold.design.Design;
import twofold.file.DesignWriter;
import twofold.file.SafeFile;

/** {@code place}: where everything stands on the table, and the laid-out design as a file. */
@Command(
        name = "place",
        mixinStandardHelpOptions = true,
        description = "Where everything stands: coordinates, legs, incidences, clearances.",
        footer = {"", "Example:", "  twofold place samples/z-fold-rod.json --write laid-out.json"})
final class PlaceCommand implements Callable<Integer> {
    private final Streams streams;

    @Parameters(paramLabel = "FILE", description = "A design file.")
    private String file = "";

    @Option(
            names = "--write",
            paramLabel = "OUT.json",
            description = "Also write the design with every mirror at its place; OUT.json is replaced as a whole.")
    private @Nullable String write;

    PlaceCommand(Streams streams) {
        this.streams = streams;
    }

    @Override
    public Integer call() {
        if (write != null && !write.endsWith(".json")) {
            streams.complain("--write: found \"" + write + "\"; accepted: a name that ends in .json");
            return Commands.USAGE;
        }
        Optional<Cavity> cavity = Opened.solve(file, streams);
        if (cavity.isEmpty()) {
            return Commands.FILE;
        }
        if (write != null && !save(write, cavity.get().laid().design())) {
            return Commands.FILE;
        }
        streams.out().print(PlaceText.of(cavity.get()));
        return Commands.DONE;
    }

    private boolean save(String to, Design design) {
        try {
            SafeFile.write(Path.of(to), DesignWriter.bytes(design));
            return true;
        } catch (IOException | InvalidPathException e) {
            streams.err().println(Unreadable.line(to, e));
            return false;
        }
    }
}
