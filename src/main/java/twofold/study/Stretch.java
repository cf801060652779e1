package twofold.study;

/**
 * A range of a number that is varied, in SI.
 *
 * @param from where it begins
 * @param to where it ends, not below
 */
public record Stretch(double from, double to) {
    /** Its middle. */
    public double middle() {
        return from + (to - from) / 2;
    }

    /** How long it is. */
    public double length() {
        return to - from;
    }

    /** How far a value lies outside; 0 inside. */
    public double distance(double value) {
        return Math.max(0, Math.max(from - value, value - to));
    }
}
