package twofold.cavity;

/**
 * The waist that the light of one plane has, or would have, on a stretch without focusing: in the air between two parts,
 * or inside a slab, whose thermal lens parts it into two stretches.
 *
 * @param from index of the part that the stretch begins at; inside a slab, the slab
 * @param to index of the part that it ends at; inside a slab, the slab
 * @param leg number of the leg
 * @param start path from the leg's beginning to the stretch's, m
 * @param length of the stretch, m
 * @param radius 1/e² radius of intensity at the waist, m
 * @param after path from the stretch's beginning to the waist, m, positive downstream; may lie outside the stretch
 * @param rayleigh πn w0²/λ, m
 */
public record Waist(
        int from, int to, int leg, double start, double length, double radius, double after, double rayleigh) {
    /** Rounding of a waist that lies on an end mirror, as a share of the lengths at hand. */
    private static final double ROUNDING = 1e-9;

    /** Whether it lies inside a part. */
    public boolean isInside() {
        return from == to;
    }

    /** Whether the waist lies within its stretch, ends included. */
    public boolean isReal() {
        double slack = ROUNDING * (length + rayleigh);
        return after >= -slack && after <= length + slack;
    }

    /** The beam's radius at a path from the stretch's beginning, m. */
    public double radiusAt(double path) {
        double z = (path - after) / rayleigh;
        return radius * Math.sqrt(1 + z * z);
    }
}
