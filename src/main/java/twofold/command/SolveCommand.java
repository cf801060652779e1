package twofold.command;

import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import twofold.cavity.Cavity;
import twofold.file.SolveJson;

/** {@code solve}: both planes of a design, as text for a person or JSON for a program. */
@Command(
        name = "solve",
        mixinStandardHelpOptions = true,
        description = "Stability, mode, waists and beam sizes in both planes.",
        footer = {"", "Example:", "  twofold solve samples/z-fold-rod.json --json"})
final class SolveCommand implements Callable<Integer> {
    private final Streams streams;

    @Parameters(paramLabel = "FILE", description = "A design file.")
    private String file = "";

    @Option(names = "--json", description = "Answer as JSON, with full precision, instead of text.")
    private boolean asJson;

    SolveCommand(Streams streams) {
        this.streams = streams;
    }

    @Override
    public Integer call() {
        return asJson ? json() : text(file, streams);
    }

    private int json() {
        Optional<Cavity> cavity = Opened.solve(file, streams);
        cavity.ifPresent(c -> streams.out().print(SolveJson.of(c)));
        return cavity.isPresent() ? Commands.DONE : Commands.FILE;
    }

    static int text(String file, Streams streams) {
        Optional<Cavity> cavity = Opened.solve(file, streams);
        cavity.ifPresent(c -> streams.out().print(SolveText.of(c)));
        return cavity.isPresent() ? Commands.DONE : Commands.FILE;
    }
}
