package twofold.picture;

import java.util.function.IntToDoubleFunction;

/**
 * Numbers in a row, read where they are kept; NaN where undefined.
 *
 * @param size how many
 * @param reader gives each by its index; the same number for the same index at every call
 */
public record Column(int size, IntToDoubleFunction reader) {
    /** Numbers of an array, which is not copied and not to be changed. */
    public static Column of(double... numbers) {
        return new Column(numbers.length, i -> numbers[i]);
    }

    /** A number. */
    public double at(int index) {
        return reader.applyAsDouble(index);
    }

    /** A caller's numbers along an axis: at least one, finite, each above the one before. */
    void requireAscending(String what) {
        for (int i = 0; i < size; i++) {
            if (!Double.isFinite(at(i)) || (i > 0 && at(i) <= at(i - 1))) {
                throw new IllegalArgumentException(
                        what + " are not finite and ascending: number " + i + " is " + at(i));
            }
        }
        if (size == 0) {
            throw new IllegalArgumentException(what + " are none");
        }
    }
}
