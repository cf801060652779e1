package twofold.optics;

/**
 * One plane's ray matrix while it grows along the beam, reduced slopes, SI. Every part but a black box is a shear of two
 * multiply-adds a column. Mutable; lives in one method, never in a field: only then does it cost no allocation.
 */
public final class Walk {
    /** First row, first column; a pure number. */
    public double a = 1;
    /** First row, second column, m. */
    public double b;
    /** Second row, first column, 1/m. */
    public double c;
    /** Second row, second column; a pure number. */
    public double d = 1;

    /** Goes a reduced length, m. */
    public void space(double reduced) {
        a += reduced * c;
        b += reduced * d;
    }

    /** Passes a lens of a power, 1/m, positive converging. */
    public void lens(double power) {
        c -= power * a;
        d -= power * b;
    }

    /** Passes a black box whose four numbers start at an index. */
    public void matrix(double[] numbers, int at) {
        double p = numbers[at];
        double q = numbers[at + 1];
        double r = numbers[at + 2];
        double s = numbers[at + 3];
        double oldA = a;
        double oldB = b;
        a = p * oldA + q * c;
        b = p * oldB + q * d;
        c = r * oldA + s * c;
        d = r * oldB + s * d;
    }

    /** Writes the four numbers to an array, from an index on. */
    public void store(double[] to, int at) {
        to[at] = a;
        to[at + 1] = b;
        to[at + 2] = c;
        to[at + 3] = d;
    }
}
