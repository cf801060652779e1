package twofold.design;

import java.util.List;

/**
 * How far a built number may be off.
 *
 * @param set JSON name of the number, one of {@link Field#settableNames()}
 * @param of parts, or legs where {@code set} is {@code leg_mm}
 * @param plusMinus in the SI unit of what it sets, or a share of the value where {@code relative}
 * @param relative whether {@code plusMinus} is a share of the value
 * @param spread how it is distributed
 */
public record Tolerance(String set, List<Place> of, double plusMinus, boolean relative, Spread spread) {
    /** Copies the list. */
    public Tolerance {
        of = List.copyOf(of);
    }

    /** How a tolerance is distributed. */
    public enum Spread {
        /** Evenly between the limits. */
        UNIFORM("uniform"),
        /** {@code plusMinus} is two standard deviations, cut at three. */
        NORMAL("normal");

        private final String word;

        Spread(String word) {
            this.word = word;
        }

        /** The word in a file. */
        public String word() {
            return word;
        }
    }
}
