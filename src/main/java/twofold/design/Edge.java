package twofold.design;

/** Which edge of a stability zone along a lever. */
public enum Edge {
    /** Where the lever is smaller. */
    LOWER("lower"),
    /** Where the lever is larger. */
    UPPER("upper");

    private final String word;

    Edge(String word) {
        this.word = word;
    }

    /** The word in a file. */
    public String word() {
        return word;
    }
}
