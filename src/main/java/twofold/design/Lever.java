package twofold.design;

import java.util.List;

/**
 * A number that may be moved, of one or several parts together.
 *
 * @param name unique among levers
 * @param set JSON name of the number, one of {@link Field#settableNames()}
 * @param of parts, or legs where {@code set} is {@code leg_mm}
 * @param range over which it moves
 * @param adjuster whether it is still adjusted on the built table
 */
public record Lever(String name, String set, List<Place> of, Range range, boolean adjuster) {
    /** Copies the list. */
    public Lever {
        of = List.copyOf(of);
    }

    /** Over which values a lever moves, in the SI unit of what it sets. */
    public sealed interface Range {
        /** From one value to another. */
        record Span(double from, double to) implements Range {}

        /** Over a list, ascending or not. */
        record Among(List<Double> values) implements Range {
            /** Copies the list. */
            public Among {
                values = List.copyOf(values);
            }
        }
    }
}
