package twofold.design;

/**
 * The way a tilted plate or crystal shifts the beam, looking along it: to a side of the table for a tangential tilt, up
 * or down for a sagittal one. {@link #sign} is +1 to the left and up.
 */
public enum Side {
    /** To the left, the default of a tangential tilt. */
    LEFT("left", TiltPlane.TANGENTIAL, 1),
    /** To the right. */
    RIGHT("right", TiltPlane.TANGENTIAL, -1),
    /** Away from the table, the default of a sagittal tilt. */
    UP("up", TiltPlane.SAGITTAL, 1),
    /** Towards the table. */
    DOWN("down", TiltPlane.SAGITTAL, -1);

    private final String word;
    private final TiltPlane of;
    private final int sign;

    Side(String word, TiltPlane of, int sign) {
        this.word = word;
        this.of = of;
        this.sign = sign;
    }

    /** The word in a file. */
    public String word() {
        return word;
    }

    /** The tilt plane that this side goes with. */
    public TiltPlane of() {
        return of;
    }

    /** +1 left or up, −1 right or down. */
    public int sign() {
        return sign;
    }

    /** The other side of the same tilt. */
    public Side opposite() {
        return switch (this) {
            case LEFT -> RIGHT;
            case RIGHT -> LEFT;
            case UP -> DOWN;
            case DOWN -> UP;
        };
    }

    /** The side that is taken when none is given. */
    public static Side usual(TiltPlane tilt) {
        return tilt == TiltPlane.TANGENTIAL ? LEFT : UP;
    }
}
