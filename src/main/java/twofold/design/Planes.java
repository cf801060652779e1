package twofold.design;

/** Which plane, or whether a requirement must hold in each. */
public enum Planes {
    /** In the plane of the table. */
    TANGENTIAL("tangential"),
    /** Across it. */
    SAGITTAL("sagittal"),
    /** In each. */
    BOTH("both");

    private final String word;

    Planes(String word) {
        this.word = word;
    }

    /** The word in a file. */
    public String word() {
        return word;
    }
}
