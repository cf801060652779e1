package twofold.design;

/**
 * What is wrong with a design, as a value: where, what was found, and what would be accepted.
 *
 * @param where place in the document
 * @param found in words, with the value
 * @param accepted in words, with limits
 */
public record Problem(Subject where, String found, String accepted) {
    /** One line: "parts[2].along_mm: found 3; accepted: …". */
    public String line() {
        return where + ": " + message();
    }

    /** The line without its place. */
    public String message() {
        return found + "; accepted: " + accepted;
    }
}
