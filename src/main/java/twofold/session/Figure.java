package twofold.session;

import java.util.Optional;

/**
 * One figure of a part, as shown and in full.
 *
 * @param name what it is
 * @param unit behind the numbers; may be empty
 * @param shown the number rounded for reading, or the tangential one where {@code sagittal} is present
 * @param full the same in full precision
 * @param sagittal the number of the sagittal plane
 * @param sagittalFull the same in full precision
 */
public record Figure(
        String name, String unit, String shown, String full, Optional<String> sagittal, Optional<String> sagittalFull) {
    /** A word, or a number that both planes share. */
    static Figure of(String name, String unit, String shown, String full) {
        return new Figure(name, unit, shown, full, Optional.empty(), Optional.empty());
    }

    /** A line for the clipboard: name with unit, then full numbers, tabs between. */
    public String line() {
        String head = unit.isEmpty() ? name : name + ", " + unit;
        return head + "\t" + full + sagittalFull.map(s -> "\t" + s).orElse("");
    }
}
