package twofold.design;

import java.util.Optional;

/**
 * Where something is read, set or held: a part, or the stretch between two parts, which is a leg when both are mirrors.
 *
 * @param first name of a part
 * @param second name of the part at the other end of a stretch
 */
public record Place(String first, Optional<String> second) {
    /** A part. */
    public static Place of(String part) {
        return new Place(part, Optional.empty());
    }

    /** A stretch, a leg when both are mirrors. */
    public static Place of(String first, String second) {
        return new Place(first, Optional.of(second));
    }

    /** "Fold 1", or "Fold 1/Fold 2". */
    @Override
    public String toString() {
        return second.map(s -> first + "/" + s).orElse(first);
    }
}
