package twofold.edit;

import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import twofold.design.Glass;

/**
 * What a person states for a {@link StartingShape}. Immutable.
 *
 * @param numbers by input, in SI; an optional one may be absent
 * @param cut of the crystal
 * @param glass of the crystal; without meaning where there is none
 */
public record StartingValues(Map<StartingInput, Double> numbers, CrystalCut cut, Glass glass) {
    /** Copies the map. */
    public StartingValues {
        numbers = Map.copyOf(numbers);
    }

    /** These values with one number set. */
    public StartingValues with(StartingInput input, double si) {
        Map<StartingInput, Double> copy = copy();
        copy.put(input, si);
        return new StartingValues(copy, cut, glass);
    }

    /** These values without one number. */
    public StartingValues without(StartingInput input) {
        Map<StartingInput, Double> copy = copy();
        copy.remove(input);
        return new StartingValues(copy, cut, glass);
    }

    /** These values with another cut of the crystal. */
    public StartingValues with(CrystalCut other) {
        return new StartingValues(numbers, other, glass);
    }

    /** These values with a crystal of another glass. */
    public StartingValues with(Glass other) {
        return new StartingValues(numbers, cut, other);
    }

    /** These values with a crystal of a material. */
    public StartingValues withMaterial(String name) {
        return with(new Glass(OptionalDouble.empty(), Optional.of(name)));
    }

    /** These values with a crystal of an index. */
    public StartingValues withIndex(double index) {
        return with(new Glass(OptionalDouble.of(index), Optional.empty()));
    }

    private Map<StartingInput, Double> copy() {
        Map<StartingInput, Double> copy = new EnumMap<>(StartingInput.class);
        copy.putAll(numbers);
        return copy;
    }

    /** A number, if it is stated. */
    public OptionalDouble find(StartingInput input) {
        Double value = numbers.get(input);
        return value == null ? OptionalDouble.empty() : OptionalDouble.of(value);
    }

    /**
     * A number that must be stated, in SI.
     *
     * @throws IllegalArgumentException where it is not
     */
    double number(StartingInput input) {
        return find(input).orElseThrow(() -> new IllegalArgumentException(input.words() + " is missing"));
    }

    boolean hasCrystal() {
        return cut != CrystalCut.NONE;
    }
}
