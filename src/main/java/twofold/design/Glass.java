package twofold.design;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What a part is made of: an index, a material whose published index is taken at the design's wavelength, or both, where
 * the index wins.
 *
 * @param index phase index, pure number
 * @param material a name of {@code twofold.material}
 */
public record Glass(OptionalDouble index, Optional<String> material) {
    /** Neither: only a lens that is not tilted can do without. */
    public static final Glass NONE = new Glass(OptionalDouble.empty(), Optional.empty());

    /** Whether neither is given. */
    public boolean isNone() {
        return index.isEmpty() && material.isEmpty();
    }
}
