package twofold.optics;

/**
 * The formulas of a closed chain, on primitives; nothing else evaluates them.
 *
 * <p>A closed chain is an array of {@link #SIZE} numbers: its round trip (a, b, c, d) at some plane, its half trace h and
 * 1 − h², the last two formed without the cancellation that (a + d)/2 suffers near an edge. A prefix (p, q, r, s) leads
 * from that plane to the place where the beam is read. Sources: Kogelnik &amp; Li, Appl. Opt. 5, 1550 (1966), sections 3.2
 * to 3.5, for q and its law; Baues, Opto-Electron. 1, 37 (1969) (from memory) for the one-way matrix of a standing wave.
 */
public final class Mode {
    /** Numbers that describe a closed chain. */
    public static final int SIZE = 6;
    /** Where the half trace stands. */
    public static final int HALF_TRACE = 4;
    /** Where 1 − h² stands. */
    public static final int ONE_MINUS_SQUARE = 5;

    private Mode() {}

    /**
     * Closes a standing wave on itself. The one-way matrix runs from the middle of the first mirror to the middle of the
     * last, each taken as two half lenses; the way back is its mirror image (d, b, c, a), so the round trip is
     * (ad + bc, 2bd, 2ac, ad + bc), h = 1 + 2bc = 2ad − 1 and 1 − h² = −4abcd: near an edge one factor is small and
     * keeps its own relative precision.
     *
     * @param a of the one-way matrix
     * @param b of the one-way matrix, m
     * @param c of the one-way matrix, 1/m
     * @param d of the one-way matrix
     * @param to array that takes the closed chain, read in the middle of the first mirror
     * @param at index of its first number
     */
    public static void standing(double a, double b, double c, double d, double[] to, int at) {
        double ad = a * d;
        double bc = b * c;
        double h = Math.abs(bc) < Math.abs(ad) ? 1 + 2 * bc : 2 * ad - 1;
        to[at] = h;
        to[at + 1] = 2 * b * d;
        to[at + 2] = 2 * a * c;
        to[at + 3] = h;
        to[at + HALF_TRACE] = h;
        to[at + ONE_MINUS_SQUARE] = -4 * ad * bc;
    }

    /**
     * Closes a ring: the walk came back to its start. 1 − h² = −bc − ((a − d)/2)², as the determinant is 1.
     *
     * @param a of the round trip
     * @param b of the round trip, m
     * @param c of the round trip, 1/m
     * @param d of the round trip
     * @param to array that takes the closed chain
     * @param at index of its first number
     */
    public static void ring(double a, double b, double c, double d, double[] to, int at) {
        to[at] = a;
        to[at + 1] = b;
        to[at + 2] = c;
        to[at + 3] = d;
        double half = (a - d) / 2;
        to[at + HALF_TRACE] = (a + d) / 2;
        to[at + ONE_MINUS_SQUARE] = -b * c - half * half;
    }

    /** 1 − |h|, from 1 − h²; negative where unstable. */
    public static double margin(double[] chain, int at) {
        return chain[at + ONE_MINUS_SQUARE] / (1 + Math.abs(chain[at + HALF_TRACE]));
    }

    /**
     * The round-trip Gouy phase, rad, 0 to 2π: arccos h if b &gt; 0, else 2π minus it. NaN where unstable.
     */
    public static double gouy(double[] chain, int at) {
        double arc = Math.atan2(Math.sqrt(chain[at + ONE_MINUS_SQUARE]), chain[at + HALF_TRACE]);
        return chain[at + 1] > 0 ? arc : 2 * Math.PI - arc;
    }

    /** |h| + √(h² − 1): how much a round trip magnifies; 1 where stable. */
    public static double magnification(double[] chain, int at) {
        return Math.abs(chain[at + HALF_TRACE]) + Math.sqrt(Math.max(0, -chain[at + ONE_MINUS_SQUARE]));
    }

    /** The round trip's b as seen from a prefix (p, q, ·, ·), m. */
    private static double b(double[] m, int at, double p, double q) {
        return m[at + 1] * p * p - (m[at] - m[at + 3]) * p * q - m[at + 2] * q * q;
    }

    /** The round trip's c as seen from a prefix (·, ·, r, s), 1/m. */
    private static double c(double[] m, int at, double r, double s) {
        return m[at + 2] * s * s + (m[at] - m[at + 3]) * r * s - m[at + 1] * r * r;
    }

    /** The round trip's d − a as seen from a prefix. */
    private static double dMinusA(double[] m, int at, double[] prefix, int p) {
        double x = prefix[p];
        double y = prefix[p + 1];
        double z = prefix[p + 2];
        double w = prefix[p + 3];
        return (m[at + 3] - m[at]) * (x * w + y * z) + 2 * (m[at + 1] * x * z - m[at + 2] * y * w);
    }

    /**
     * The 1/e² radius of intensity, m: w² = (λ/π) |b′| / √(1 − h²). NaN where unstable.
     *
     * @param m closed chains
     * @param at index of the chain
     * @param prefix prefixes
     * @param p index of the prefix
     * @param wavelength vacuum, m
     */
    public static double radius(double[] m, int at, double[] prefix, int p, double wavelength) {
        double b = b(m, at, prefix[p], prefix[p + 1]);
        return Math.sqrt(wavelength / Math.PI * Math.abs(b) / Math.sqrt(m[at + ONE_MINUS_SQUARE]));
    }

    /** Re 1/q̂ = (d′ − a′)/(2b′), 1/m: the reduced curvature of the wavefront, positive diverging. */
    public static double reducedCurvature(double[] m, int at, double[] prefix, int p) {
        return dMinusA(m, at, prefix, p) / (2 * b(m, at, prefix[p], prefix[p + 1]));
    }

    /**
     * Re q̂ = (a′ − d′)/(2c′), m: the reduced path from the waist to here, positive behind the waist.
     */
    public static double reducedPathFromWaist(double[] m, int at, double[] prefix, int p) {
        return -dMinusA(m, at, prefix, p) / (2 * c(m, at, prefix[p + 2], prefix[p + 3]));
    }

    /** Im q̂ = √(1 − h²)/|c′|, m: the reduced Rayleigh length, π w0²/λ. */
    public static double reducedRayleigh(double[] m, int at, double[] prefix, int p) {
        return Math.sqrt(m[at + ONE_MINUS_SQUARE]) / Math.abs(c(m, at, prefix[p + 2], prefix[p + 3]));
    }
}
