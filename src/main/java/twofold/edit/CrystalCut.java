package twofold.edit;

/** Whether a starting shape has a crystal, and how its faces meet the beam. */
public enum CrystalCut {
    /** No crystal. */
    NONE("no crystal"),
    /** Faces square to the beam. */
    NORMAL("normal incidence"),
    /** Faces at Brewster's angle, tilted in the plane of the table. */
    BREWSTER("Brewster's angle");

    private final String words;

    CrystalCut(String words) {
        this.words = words;
    }

    /** In words. */
    public String words() {
        return words;
    }
}
