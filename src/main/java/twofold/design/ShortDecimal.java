package twofold.design;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;

/**
 * The shortest decimal in a unit that reads back to a double, as {@link Unit#text} says, fast enough for millions of numbers.
 *
 * <p>A double from 1e-6 to 1e16 times a power of ten that makes it 17 digits long is exact as a sum of two doubles, the
 * rounded product and what a fused multiply-add finds missing; times a unit that is no power of ten it is good to 1e-31.
 * Rounded to 15, 16 or 17 digits it reads back if it is less than half a unit in the last place away.
 */
final class ShortDecimal {
    private static final double LEAST = 1e-6;
    private static final double MOST = 1e16;
    private static final double SEVENTEEN = 1e16;

    /** What is closer than this to half way to the next number is not shortened. */
    private static final double ROUNDING = 1e-12;

    private static final double[] POWERS = new double[23];
    private static final int MOST_DIGITS = 17;

    /** How many digits before the point, or zeros behind it, a plain decimal may have; as in {@link Unit#text}. */
    private static final int MOST_BEFORE = 16;

    private static final int MOST_ZEROS = 6;

    static {
        double power = 1;
        for (int i = 0; i < POWERS.length; i++) {
            // Powers of ten up to 22 are exact.
            POWERS[i] = power;
            power *= 10;
        }
    }

    /** The SI unit over the unit, in two doubles, less powers of ten. */
    private final double times;

    private final double timesRest;
    /** The power of ten that was taken out. */
    private final int power;

    /**
     * For a unit.
     *
     * @param factor the unit in SI
     */
    ShortDecimal(BigDecimal factor) {
        boolean isPower = factor.unscaledValue().equals(BigInteger.ONE);
        BigDecimal inverse = isPower ? BigDecimal.ONE : BigDecimal.ONE.divide(factor, new MathContext(40));
        power = isPower ? factor.scale() : 0;
        times = inverse.doubleValue();
        timesRest = inverse.subtract(new BigDecimal(times)).doubleValue();
    }

    /**
     * Writes a number in the unit.
     *
     * @param si any double
     * @param to takes the text
     * @return whether it could; else nothing was written
     */
    boolean append(double si, StringBuilder to) {
        double size = Math.abs(si);
        double shown = size * times;
        if (!(shown >= LEAST && shown < MOST)) {
            return false;
        }
        double rest = Math.fma(size, times, -shown) + size * timesRest;
        int shift = 16 - (int) Math.floor(Math.log10(shown));
        if (shift >= 0 && shift < POWERS.length && shown * POWERS[shift] >= 10 * SEVENTEEN) {
            shift--;
        } else if (shift + 1 < POWERS.length && shown * POWERS[shift] < SEVENTEEN) {
            shift++;
        }
        if (shift < 0 || shift >= POWERS.length) {
            return false;
        }
        double high = shown * POWERS[shift];
        double low = Math.fma(shown, POWERS[shift], -high) + rest * POWERS[shift];
        if (!(high >= SEVENTEEN && high < 10 * SEVENTEEN)) {
            return false;
        }
        // The digits are those of whole, and part of one more, from 0 to 1.
        long whole = (long) high + (long) Math.floor(low);
        double part = low - Math.floor(low);
        double up = Math.ulp(size) / 2 * times * POWERS[shift];
        // Below a power of two the next number lies half as far away.
        double down = (size - Math.nextDown(size)) / 2 * times * POWERS[shift];
        long digits = nearest(whole, part, 1);
        int dropped = 0;
        for (int drop = 2; drop >= 1; drop--) {
            long ten = drop == 2 ? 100 : 10;
            long shorter = nearest(whole, part, ten);
            double away = (shorter * ten - whole) - part;
            if (Math.abs(away) < (away > 0 ? up : down) * (1 - ROUNDING)) {
                digits = shorter;
                dropped = drop;
                break;
            }
        }
        // The value in the unit is digits × 10^(dropped − shift + power).
        return plain(si < 0, digits, dropped - shift + power, to);
    }

    /** The whole number nearest to digits over ten or a hundred, even at a tie. */
    private static long nearest(long whole, double part, long ten) {
        long down = whole / ten;
        double rest = whole - down * ten + part;
        double half = ten / 2.0;
        return rest > half || (rest == half && (down & 1) == 1) ? down + 1 : down;
    }

    private static boolean plain(boolean negative, long number, int exponent, StringBuilder to) {
        long digits = number;
        int scale = exponent;
        while (digits % 10 == 0) {
            digits /= 10;
            scale++;
        }
        String text = Long.toString(digits);
        int before = text.length() + scale;
        if (text.length() > MOST_DIGITS || before > MOST_BEFORE || before < -MOST_ZEROS) {
            return false;
        }
        if (negative) {
            to.append('-');
        }
        if (before <= 0) {
            to.append("0.");
            zeros(-before, to);
            to.append(text);
        } else if (scale >= 0) {
            to.append(text);
            zeros(scale, to);
        } else {
            to.append(text, 0, before).append('.').append(text, before, text.length());
        }
        return true;
    }

    private static void zeros(int count, StringBuilder to) {
        for (int i = 0; i < count; i++) {
            to.append('0');
        }
    }
}
