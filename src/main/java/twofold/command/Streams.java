package twofold.command;

import java.io.PrintStream;

/**
 * Where a command writes.
 *
 * @param out results alone, so that they can be piped
 * @param err errors, one a line
 */
record Streams(PrintStream out, PrintStream err) {
    /** One line that is not about a place in a file. */
    void complain(String message) {
        err.println("twofold: " + message);
    }
}
