package twofold.command;

import java.nio.file.InvalidPathException;
import twofold.design.Names;

/** Why a file cannot be opened or written, in words. */
final class Unreadable {
    private Unreadable() {}

    /** One line for the error stream. */
    static String line(String file, Exception e) {
        return Names.escaped(file + ": " + reason(e));
    }

    private static String reason(Exception e) {
        if (e instanceof InvalidPathException) {
            return "this is no file name here: " + e.getMessage();
        }
        String message = e.getMessage();
        return message == null ? e.getClass().getSimpleName() : message;
    }
}
