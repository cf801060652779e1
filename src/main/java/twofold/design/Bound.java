package twofold.design;

import java.util.OptionalDouble;

/** What a requirement asks of its quantity, in the quantity's SI unit. */
public sealed interface Bound {
    /** The least value that it allows, where there is one. */
    default OptionalDouble least() {
        if (this instanceof AtLeast b) {
            return OptionalDouble.of(b.value());
        } else if (this instanceof Between b) {
            return OptionalDouble.of(b.low());
        }
        return this instanceof Equal b ? OptionalDouble.of(b.value() - b.within()) : OptionalDouble.empty();
    }

    /** The largest value that it allows, where there is one. */
    default OptionalDouble most() {
        if (this instanceof AtMost b) {
            return OptionalDouble.of(b.value());
        } else if (this instanceof Between b) {
            return OptionalDouble.of(b.high());
        }
        return this instanceof Equal b ? OptionalDouble.of(b.value() + b.within()) : OptionalDouble.empty();
    }

    /** At least a value. */
    record AtLeast(double value) implements Bound {}

    /** At most a value. */
    record AtMost(double value) implements Bound {}

    /** From {@code low} to {@code high}, both included. */
    record Between(double low, double high) implements Bound {}

    /** A value, give or take {@code within}, which is above 0. */
    record Equal(double value, double within) implements Bound {}

    /** A wish that ranks solutions and is never failed. */
    enum Prefer implements Bound {
        /** The smaller the better. */
        SMALLEST("smallest"),
        /** The larger the better. */
        LARGEST("largest");

        private final String word;

        Prefer(String word) {
            this.word = word;
        }

        /** The word in a file. */
        public String word() {
            return word;
        }
    }
}
