package twofold.design;

/** How the light closes on itself. */
public enum Shape {
    /** First and last part are mirrors met head-on; the light returns the way it came. */
    STANDING_WAVE("standing-wave"),
    /** The polygon of mirrors closes; at least three mirrors. */
    RING("ring");

    private final String word;

    Shape(String word) {
        this.word = word;
    }

    /** The word in a file. */
    public String word() {
        return word;
    }
}
