package twofold;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.logging.Level;
import java.util.logging.Logger;
import twofold.command.Commands;
import twofold.command.WithoutWindow;
import twofold.window.Start;

/** Where the program starts: picks command or window, hands over streams, turns the answer into the exit status. */
public final class Main {
    /** JavaFX's own logger; kept, since loggers that nobody keeps lose their level. */
    private static final Logger TOOLKIT = Logger.getLogger("javafx");

    private Main() {}

    /** Runs one command or the window; ends the process. */
    public static void main(String[] args) {
        // Named, because without LANG the default character set is US-ASCII and µ comes out as a question mark.
        PrintStream out = new PrintStream(new FileOutputStream(FileDescriptor.out), false, StandardCharsets.UTF_8);
        PrintStream err = new PrintStream(new FileOutputStream(FileDescriptor.err), true, StandardCharsets.UTF_8);
        List<String> arguments = List.of(args);
        int status =
                isForWindow(arguments) ? window(arguments, out, err) : Commands.run(arguments, out, err, isTerminal());
        out.flush();
        System.exit(status);
    }

    private static boolean isForWindow(List<String> arguments) {
        return arguments.isEmpty()
                || (arguments.size() == 1
                        && arguments.get(0).endsWith(".json")
                        && !arguments.get(0).startsWith("-"));
    }

    private static int window(List<String> arguments, PrintStream out, PrintStream err) {
        TOOLKIT.setLevel(Level.SEVERE);
        // A toolkit that cannot start prints traces of its own; the reason that comes back is all that a person needs.
        System.setErr(new PrintStream(OutputStream.nullOutputStream(), false, StandardCharsets.UTF_8));
        Optional<String> why = Start.window(arguments, System.getenv(), () -> System.setErr(err));
        System.setErr(err);
        if (why.isEmpty()) {
            return Commands.DONE;
        }
        return arguments.isEmpty()
                ? Commands.run(arguments, out, err, isTerminal())
                : WithoutWindow.answer(arguments.get(0), why.get(), out, err);
    }

    /** Whether standard error goes to a terminal; false where the system does not say, as Java 17 has no way to ask. */
    private static boolean isTerminal() {
        try {
            String target = Path.of("/proc/self/fd/2").toRealPath().toString();
            return target.startsWith("/dev/pts/") || target.startsWith("/dev/tty");
        } catch (IOException e) {
            return false;
        }
    }
}
