package twofold.command;

import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/** {@code check}: reads files and reports every error of each. */
@Command(
        name = "check",
        mixinStandardHelpOptions = true,
        description = "Reads files and reports every error.",
        footer = {"", "Example:", "  twofold check samples/z-fold-rod.json samples/x-fold.json"})
final class CheckCommand implements Callable<Integer> {
    private final Streams streams;

    @Parameters(paramLabel = "FILE", arity = "1..*", description = "Design files.")
    private List<String> files = List.of();

    CheckCommand(Streams streams) {
        this.streams = streams;
    }

    @Override
    public Integer call() {
        int status = Commands.DONE;
        for (String file : files) {
            Opened opened = Opened.read(file, streams);
            if (!opened.isReadable()) {
                status = Commands.FILE;
            } else if (!opened.problems().isEmpty()) {
                status = Math.max(status, Commands.NO);
            } else {
                streams.out().println(file + ": no problems");
            }
        }
        return status;
    }
}
