package twofold.picture;

/** The sizes and weights of text; one family, DejaVu Sans. */
public enum Type {
    /** Heads a page. */
    HEADING(17, true),
    /** Heads a pane. */
    TITLE(13, true),
    /** Names of parts. */
    STRONG(12, true),
    /** Values. */
    BODY(12, false),
    /** Axis numbers, notes; the smallest there is. */
    SMALL(11, false);

    private final double size;
    private final boolean bold;

    Type(double size, boolean bold) {
        this.size = size;
        this.bold = bold;
    }

    /** The font's size, px. */
    public double size() {
        return size;
    }

    /** Whether it is bold. */
    public boolean isBold() {
        return bold;
    }
}
