package twofold.command;

import java.io.PrintStream;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Help.Ansi;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import twofold.design.Names;
import twofold.study.Progress;

/** The command line as a whole; without a command, the way to the editor. */
@Command(
        name = "twofold",
        mixinStandardHelpOptions = true,
        version = "twofold 0.1.0",
        description = "Design folded and ring laser cavities in both planes.",
        synopsisHeading = "Usage:%n",
        customSynopsis = {"  twofold [FILE.json]", "  twofold COMMAND ..."},
        commandListHeading = "%nCommands:%n",
        footer = {
            "",
            "Exit status: 0 done; 1 the answer is no; 2 wrong usage; 3 a file could not be read, written or accepted.",
            "",
            "Example:",
            "  twofold samples/z-fold-rod.json"
        })
public final class Commands implements Callable<Integer> {
    /** Exit status: done. */
    public static final int DONE = 0;
    /** Exit status: the answer is no. */
    public static final int NO = 1;
    /** Exit status: wrong usage. */
    public static final int USAGE = 2;
    /** Exit status: a file could not be read, written or accepted. */
    public static final int FILE = 3;

    private static final List<String> NAMES = List.of("solve", "place", "draw", "check", "sweep", "map");

    private final Streams streams;

    @Parameters(
            paramLabel = "FILE.json",
            arity = "0..*",
            hideParamSyntax = true,
            description = "A design file to open.")
    private List<String> files = List.of();

    @Spec
    private CommandLine.Model.@Nullable CommandSpec spec;

    private Commands(Streams streams) {
        this.streams = streams;
    }

    /**
     * Runs one command.
     *
     * @param arguments as typed
     * @param out takes results alone
     * @param err takes errors and everything else
     * @param isTerminal whether a person watches the error stream, so that long work shows how far it is
     * @return the exit status
     */
    public static int run(List<String> arguments, PrintStream out, PrintStream err, boolean isTerminal) {
        Streams streams = new Streams(out, err, isTerminal);
        PrintWriter outWriter = new PrintWriter(out, true, StandardCharsets.UTF_8);
        PrintWriter errWriter = new PrintWriter(err, true, StandardCharsets.UTF_8);
        CommandLine line = new CommandLine(new Commands(streams))
                .addSubcommand(new SolveCommand(streams))
                .addSubcommand(new PlaceCommand(streams))
                .addSubcommand(new DrawCommand(streams))
                .addSubcommand(new CheckCommand(streams))
                .addSubcommand(new SweepCommand(streams))
                .addSubcommand(new MapCommand(streams))
                .setExpandAtFiles(false)
                .setUsageHelpWidth(110)
                .setOut(outWriter)
                .setErr(errWriter)
                .setColorScheme(CommandLine.Help.defaultColorScheme(Ansi.OFF))
                .setParameterExceptionHandler((e, args) -> {
                    streams.complain(String.valueOf(e.getMessage()));
                    streams.complain(
                            "see '" + e.getCommandLine().getCommandSpec().qualifiedName() + " --help'");
                    return USAGE;
                })
                .setExecutionExceptionHandler((e, command, parsed) -> {
                    streams.complain("this is a fault of the program, please report it: " + e);
                    e.printStackTrace(errWriter);
                    return FILE;
                });
        int status = line.execute(arguments.toArray(String[]::new));
        outWriter.flush();
        errWriter.flush();
        out.flush();
        err.flush();
        return status;
    }

    /** Writes a survey to the out stream. */
    static int survey(SurveyCsv csv, Streams streams, String what, boolean withProgress) {
        boolean ended;
        boolean stopped;
        try (ProgressLine progress = new ProgressLine(streams, what, withProgress)) {
            ended = csv.write(streams, progress);
            stopped = progress.isStopped();
        }
        if (streams.out().checkError()) {
            streams.complain("standard output is closed or full: the rest is not written");
            return FILE;
        }
        return ended || stopped ? DONE : FILE;
    }

    /** Something long that can be stopped. */
    interface Study<T> {
        /** What it comes to; empty where it was stopped. */
        Optional<T> run(int threads, Progress progress);
    }

    /** Runs a study for a picture; empty where the program was told to end. */
    static <T> Optional<T> study(Study<T> study, Streams streams, String what, boolean withProgress) {
        try (ProgressLine progress = new ProgressLine(streams, what, withProgress)) {
            return study.run(Runtime.getRuntime().availableProcessors(), progress);
        }
    }

    @Override
    public Integer call() {
        if (files.isEmpty() && spec != null) {
            streams.out().print(spec.commandLine().getUsageMessage(Ansi.OFF));
            return DONE;
        }
        String file = files.get(0);
        if (!file.endsWith(".json")) {
            streams.complain("found \"" + Names.escaped(file) + "\"" + Names.hint(file, NAMES)
                    + "; accepted: a FILE.json, or a command: " + String.join(", ", NAMES));
            return USAGE;
        }
        if (files.size() > 1) {
            streams.complain("found " + files.size() + " files; accepted: one");
            return USAGE;
        }
        // The program opens its window on a lone file; whoever asks the command line alone gets the answer as text.
        return SolveCommand.text(file, streams);
    }
}
