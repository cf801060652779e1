package twofold.picture;

import java.util.Locale;
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
        return fixed(Unit.MM.fromSi(metres), 2) + " mm";
    }

    /** "38.7 µm" for a radius in m. */
    public static String um(double metres) {
        return fixed(Unit.UM.fromSi(metres), 1) + " µm";
    }

    /** "7.90°" for an angle in rad. */
    public static String degrees(double radians) {
        return fixed(Unit.DEG.fromSi(radians), 2) + "°";
    }

    /** "124.00 MHz" for a frequency in Hz. */
    public static String mhz(double hertz) {
        return fixed(Unit.MHZ.fromSi(hertz), 2) + " MHz";
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
        String text = String.format(Locale.ROOT, "%." + decimals + "f", value);
        if (!text.startsWith("-")) {
            return text;
        }
        boolean zero = text.chars().noneMatch(c -> c >= '1' && c <= '9');
        return zero ? text.substring(1) : MINUS + text.substring(1);
    }
}
