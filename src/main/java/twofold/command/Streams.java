package twofold.command;

import java.io.PrintStream;
import twofold.design.Names;

/**
 * Where a command writes.
 *
 * @param out results alone, so that they can be piped
 * @param err errors, one a line
 * @param isTerminal whether a person watches the error stream
 */
record Streams(PrintStream out, PrintStream err, boolean isTerminal) {
    /** One line that is not about a place in a file. */
    void complain(String message) {
        err.println("twofold: " + message);
    }

    /** One line that refuses what was found behind an option. */
    void refuse(String option, String found, String accepted) {
        complain(option + ": found \"" + Names.escaped(found) + "\"; accepted: " + accepted);
    }
}
