package twofold.design;

/** What a requirement asks of its quantity, in the quantity's SI unit. */
public sealed interface Bound {
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
