package twofold.design;

/** The way the beam turns at a mirror, looking along it; only in the typing form. */
public enum Turn {
    /** Counter-clockwise seen from above. */
    LEFT("left", 1),
    /** Clockwise seen from above. */
    RIGHT("right", -1);

    private final String word;
    private final int sign;

    Turn(String word, int sign) {
        this.word = word;
        this.sign = sign;
    }

    /** The word in a file. */
    public String word() {
        return word;
    }

    /** +1 left, −1 right. */
    public int sign() {
        return sign;
    }
}
