package twofold.picture;

import twofold.design.Unit;

/**
 * Numbers as pictures show them: lengths to 0.01 mm, angles to 0.01°, radii to 0.1 µm, half traces to 0.001, with a true
 * minus sign and the unit behind.
 */
public final class Figures {
    private static final char MINUS = '\u2212';

    private Figures() {}

    /** "−1.14 mm" for a length in m. */
    public static String mm(double metres) {
        return shown(Unit.MM, metres) + " mm";
    }

    /** "38.7 µm" for a radius in m. */
    public static String um(double metres) {
        return shown(Unit.UM, metres) + " µm";
    }

    /** "7.90°" for an angle in rad. */
    public static String degrees(double radians) {
        return shown(Unit.DEG, radians) + "°";
    }

    /** "124.00 MHz" for a frequency in Hz. */
    public static String mhz(double hertz) {
        return shown(Unit.MHZ, hertz) + " MHz";
    }

    private static String shown(Unit unit, double si) {
        return unit.shown(si).replace('-', MINUS);
    }

    /** "800 nm" for a wavelength in m, to 0.01 nm. */
    public static String nm(double metres) {
        return tick(Unit.NM.fromSi(metres), 2) + " nm";
    }

    /** "−0.239" for a half trace. */
    public static String halfTrace(double value) {
        return fixed(value, 3);
    }

    /** "0.76" for a margin or a ratio. */
    public static String ratio(double value) {
        return fixed(value, 2);
    }

    /** "2.07 ×" for a ratio, with about three digits. */
    static String times(double ratio) {
        double size = Math.abs(ratio);
        return fixed(ratio, size < 10 ? 2 : size < 100 ? 1 : 0) + " ×";
    }

    /** A number with so many decimals at the most, as few as say it: for axis numbers and magnifications. */
    static String tick(double value, int decimals) {
        String text = fixed(value, decimals);
        if (text.indexOf('.') < 0) {
            return text;
        }
        int end = text.length();
        while (text.charAt(end - 1) == '0') {
            end--;
        }
        return text.substring(0, text.charAt(end - 1) == '.' ? end - 1 : end);
    }

    /** A number with a fixed count of decimals, never "−0". */
    static String fixed(double value, int decimals) {
        return Unit.fixed(value, decimals).replace('-', MINUS);
    }
}
