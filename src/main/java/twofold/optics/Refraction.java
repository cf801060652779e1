package twofold.optics;

/**
 * Refraction of a ray at a plane face between vacuum and an index n, by Snell's law.
 *
 * <p>In the plane of the tilt the face multiplies the beam's width by {@link #magnification} and divides the reduced
 * slope by it (Massey &amp; Siegman, Appl. Opt. 8, 975 (1969)); across the tilt it does nothing. A slab of path L between
 * parallel faces is then a space of reduced length L/(n m²) in the plane of the tilt and L/n across it: for thickness t
 * these are t n² cos²θ/(n² − sin²θ)^{3/2} and t/√(n² − sin²θ) (Hanna, IEEE J. Quantum Electron. 5, 483 (1969)).
 */
public final class Refraction {
    private Refraction() {}

    /** Brewster's angle from vacuum, rad: arctan n. */
    public static double brewster(double index) {
        return Math.atan(index);
    }

    /** The cosine of the angle inside. */
    public static double cosInside(double index, double incidence) {
        double s = Math.sin(incidence) / index;
        return Math.sqrt((1 - s) * (1 + s));
    }

    /** The angle by which the beam turns towards the normal on entry, rad. */
    public static double turn(double index, double incidence) {
        return incidence - Math.asin(Math.sin(incidence) / index);
    }

    /** m = cosθ′/cosθ: width inside over width outside, in the plane of the tilt; n at Brewster's angle. */
    public static double magnification(double index, double incidence) {
        return cosInside(index, incidence) / Math.cos(incidence);
    }

    /**
     * The power of a tilted thin lens across its tilt, over that of the untilted one: (n cosθ′ − cosθ)/(n − 1). In the
     * plane of the tilt divide by cos²θ.
     */
    public static double tiltedLens(double index, double incidence) {
        return (index * cosInside(index, incidence) - Math.cos(incidence)) / (index - 1);
    }
}
