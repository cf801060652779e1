package twofold.picture;

/** Which point of a text's baseline stands at a given place. */
public enum Anchor {
    /** Its beginning. */
    START,
    /** Its middle. */
    MIDDLE,
    /** Its end. */
    END
}
