package twofold.picture;

/** Which set of values the inks have. */
public enum Theme {
    /** Dark on light. */
    LIGHT("light"),
    /** Light on dark, for a dark room. */
    DARK("dark");

    private final String word;

    Theme(String word) {
        this.word = word;
    }

    /** The word in commands and settings. */
    public String word() {
        return word;
    }

    /** An ink's colour as 0xRRGGBB. */
    public int rgb(Ink ink) {
        return this == LIGHT ? ink.light() : ink.dark();
    }

    /** An ink's colour as style sheets and SVG write it: "#rrggbb". */
    public String css(Ink ink) {
        String hex = Integer.toHexString(rgb(ink));
        return "#" + "0".repeat(6 - hex.length()) + hex;
    }
}
