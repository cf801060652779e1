package twofold.cavity;

/** Which face of a part a station is at. */
public enum Face {
    /** The one surface of a mirror, a lens or an aperture. */
    SURFACE("surface"),
    /** Just inside the first face of a plate, a crystal or a black box. */
    ENTRY("entry"),
    /** Just outside the second face. */
    EXIT("exit");

    private final String word;

    Face(String word) {
        this.word = word;
    }

    /** The word in answers. */
    public String word() {
        return word;
    }
}
