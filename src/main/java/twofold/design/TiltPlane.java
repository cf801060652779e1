package twofold.design;

/** The plane in which a lens, plate or crystal is tilted. */
public enum TiltPlane {
    /** In the plane of the table. */
    TANGENTIAL("tangential"),
    /** Across the plane of the table. */
    SAGITTAL("sagittal");

    private final String word;

    TiltPlane(String word) {
        this.word = word;
    }

    /** The word in a file. */
    public String word() {
        return word;
    }
}
