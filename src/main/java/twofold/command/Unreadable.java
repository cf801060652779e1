package twofold.command;

import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import twofold.design.Names;

/** Why a file cannot be opened or written, in words. */
final class Unreadable {
    private Unreadable() {}

    /** One line for the error stream. */
    static String line(String file, Exception e) {
        return Names.escaped(file + ": " + reason(file, e));
    }

    private static String reason(String file, Exception e) {
        if (e instanceof NoSuchFileException) {
            return "there is no such file";
        }
        if (e instanceof AccessDeniedException) {
            return "access is denied";
        }
        if (e instanceof java.nio.file.InvalidPathException) {
            return "this is no file name here: " + e.getMessage();
        }
        if (Files.isDirectory(Path.of(file))) {
            return "this is a folder; accepted: a file";
        }
        String message = e.getMessage();
        return message == null ? e.getClass().getSimpleName() : message;
    }
}
