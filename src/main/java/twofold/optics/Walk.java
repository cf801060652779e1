package twofold.optics;

/**
 * One plane's ray matrix while it grows along the beam, reduced slopes, SI. Every part but a black box is a shear of two
 * multiply-adds a column. Mutable; lives in one method, never in a field, and every method here is small enough that the
 * compiler always takes it in (35 bytes of code): only then does it cost no allocation.
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

    /** One row (p, q) of a black box against the first column. */
    public double first(double p, double q) {
        return p * a + q * c;
    }

    /** One row (p, q) of a black box against the second column. */
    public double second(double p, double q) {
        return p * b + q * d;
    }

    /** Becomes a matrix, as behind a black box. */
    public void become(double newA, double newB, double newC, double newD) {
        a = newA;
        b = newB;
        c = newC;
        d = newD;
    }

    /** Writes the four numbers to an array, from an index on. */
    public void store(double[] to, int at) {
        to[at] = a;
        to[at + 1] = b;
        to[at + 2] = c;
        to[at + 3] = d;
    }
}
