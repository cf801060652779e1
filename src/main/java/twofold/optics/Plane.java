package twofold.optics;

/** The two planes of a plan laid on a table; each has its own chain and its own mode. */
public enum Plane {
    /** In the plane of the table, which is the plane of incidence at every fold. */
    TANGENTIAL("tangential"),
    /** Across the plane of the table. */
    SAGITTAL("sagittal");

    private final String word;

    Plane(String word) {
        this.word = word;
    }

    /** The word in files and answers. */
    public String word() {
        return word;
    }
}
