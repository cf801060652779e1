package twofold.design;

/**
 * One plane's ray matrix of a black box, for the forward pass and reduced slopes; the way back is (d, b, c, a).
 *
 * @param a pure number
 * @param b m
 * @param c 1/m
 * @param d pure number
 */
public record FourNumbers(double a, double b, double c, double d) {
    /** a d − b c, 1 for any box without gain or loss. */
    public double determinant() {
        return a * d - b * c;
    }
}
