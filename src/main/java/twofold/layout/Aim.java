package twofold.layout;

/**
 * The geometry of one leg, on primitives. With D the vector from mirror to mirror, S the sum of the sideways shifts of the
 * slabs on the leg (left positive) and C the sum of their advances along the beam, the beam leaves the first mirror along
 * the unit vector û with D = (air + C) û + S n̂, where n̂ is û turned left; so air = √(D² − S²) − C.
 */
public final class Aim {
    private Aim() {}

    /** √(D² − S²): the extent of the leg along its heading, m; NaN where the shift exceeds the distance. */
    public static double extent(double dx, double dy, double shift) {
        return shift == 0 ? Math.sqrt(dx * dx + dy * dy) : Math.sqrt(dx * dx + dy * dy - shift * shift);
    }

    /** The heading's x. */
    public static double headingX(double dx, double dy, double extent, double shift) {
        return (extent * dx + shift * dy) / (dx * dx + dy * dy);
    }

    /** The heading's y. */
    public static double headingY(double dx, double dy, double extent, double shift) {
        return (extent * dy - shift * dx) / (dx * dx + dy * dy);
    }

    /**
     * The cosine of the incidence at a mirror between two headings: √((1 − u·u′)/2).
     */
    public static double cosIncidence(double inX, double inY, double outX, double outY) {
        return Math.sqrt(Math.max(0, (1 - (inX * outX + inY * outY)) / 2));
    }

    /** The angle of incidence at a mirror between two headings, rad, precise at every angle. */
    public static double incidence(double inX, double inY, double outX, double outY) {
        return Math.atan2(Math.abs(inX * outY - inY * outX), -(inX * outX + inY * outY)) / 2;
    }
}
