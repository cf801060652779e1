package twofold.picture;

/**
 * The colours of maps, perceptually uniform: a helix in CIE L*a*b* (CIE 15:2018, D65), along which lightness grows evenly
 * while hue turns evenly at one chroma, from indigo through rose and amber to straw. Neighbours therefore differ by one and
 * the same ΔE*ab, and the order survives in grey. The same in both themes.
 */
final class ColourMap {
    /** How many colours there are; one short of 256, so that a palette has one left for what is undefined. */
    static final int SIZE = 255;

    private static final double DARKEST = 18;
    private static final double LIGHTEST = 92;
    private static final double CHROMA = 44;
    private static final double FIRST_HUE = Math.toRadians(-65);
    private static final double LAST_HUE = Math.toRadians(100);

    private ColourMap() {}

    /** A colour, 0xRRGGBB, by its number from the darkest, 0. */
    static int rgb(int number) {
        double share = number / (SIZE - 1.0);
        double hue = FIRST_HUE + share * (LAST_HUE - FIRST_HUE);
        return srgb(DARKEST + share * (LIGHTEST - DARKEST), CHROMA * Math.cos(hue), CHROMA * Math.sin(hue));
    }

    /** The number of the colour of a value within a range; values beyond it have the colours at its ends. */
    static int number(double value, double from, double to) {
        double share = to > from ? (value - from) / (to - from) : 0.5;
        return (int) Math.round((SIZE - 1) * Math.min(1, Math.max(0, share)));
    }

    /** L*a*b* to sRGB (IEC 61966-2-1), white D65. */
    private static int srgb(double lightness, double a, double b) {
        double y = (lightness + 16) / 116;
        double cx = 0.95047 * linear(y + a / 500);
        double cy = linear(y);
        double cz = 1.08883 * linear(y - b / 200);
        return channel(3.2404542 * cx - 1.5371385 * cy - 0.4985314 * cz) << 16
                | channel(-0.9692660 * cx + 1.8760108 * cy + 0.0415560 * cz) << 8
                | channel(0.0556434 * cx - 0.2040259 * cy + 1.0572252 * cz);
    }

    private static double linear(double f) {
        double bend = 6.0 / 29;
        return f > bend ? f * f * f : 3 * bend * bend * (f - 4.0 / 29);
    }

    private static int channel(double linear) {
        double coded = linear <= 0.0031308 ? 12.92 * linear : 1.055 * Math.pow(linear, 1 / 2.4) - 0.055;
        return (int) Math.round(255 * Math.min(1, Math.max(0, coded)));
    }
}
