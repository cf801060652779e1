package twofold;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import twofold.command.Commands;

/** Where the program starts: hands the command line its streams and turns its answer into the exit status. */
public final class Main {
    private Main() {}

    /** Runs one command; ends the process. */
    public static void main(String[] args) {
        // Named, because without LANG the default character set is US-ASCII and µ comes out as a question mark.
        PrintStream out = new PrintStream(new FileOutputStream(FileDescriptor.out), false, StandardCharsets.UTF_8);
        PrintStream err = new PrintStream(new FileOutputStream(FileDescriptor.err), true, StandardCharsets.UTF_8);
        int status = Commands.run(List.of(args), out, err);
        out.flush();
        System.exit(status);
    }
}
