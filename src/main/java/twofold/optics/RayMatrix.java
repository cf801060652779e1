package twofold.optics;

/**
 * A ray matrix as an answer, reduced slopes; it has no algebra.
 *
 * @param a pure number
 * @param b m
 * @param c 1/m
 * @param d pure number
 */
public record RayMatrix(double a, double b, double c, double d) {
    /** (a + d)/2. */
    public double halfTrace() {
        return (a + d) / 2;
    }

    /** a d − b c; 1 but for rounding. */
    public double determinant() {
        return a * d - b * c;
    }
}
