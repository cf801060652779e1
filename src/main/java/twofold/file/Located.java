package twofold.file;

import java.util.Comparator;
import twofold.design.Names;
import twofold.design.Problem;

/**
 * A problem with its place in a file.
 *
 * @param problem what is wrong, and where inside the document
 * @param line from 1
 * @param column from 1, in characters
 */
public record Located(Problem problem, int line, int column) {
    /** By place in the file. */
    static final Comparator<Located> BY_PLACE =
            Comparator.comparingInt((Located l) -> l.line).thenComparingInt(l -> l.column);

    /**
     * One line for standard error: {@code FILE:LINE:COLUMN: parts[2].along_mm: found …; accepted: …}. Nothing in it can
     * break the line.
     *
     * @param file as the person named it
     */
    public String line(String file) {
        return Names.escaped(file + ":" + line + ":" + column + ": " + problem.line());
    }
}
