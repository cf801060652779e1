package twofold.design;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/**
 * The one place where numbers change units: decimal text in a file's or a person's unit against SI doubles.
 *
 * <p>Reading multiplies the decimal <em>text</em> exactly and rounds once. Writing gives the shortest decimal that reads
 * back to the same double, so that load and save is stable by construction.
 */
@SuppressWarnings("ImmutableEnumChecker") // a ShortDecimal holds final numbers alone
public enum Unit {
    /** A pure number. */
    ONE("", "1", 3),
    /** Millimetres for m. */
    MM("mm", "1e-3", 2),
    /** Micrometres for m. */
    UM("µm", "1e-6", 1),
    /** Nanometres for m. */
    NM("nm", "1e-9", 2),
    /** Degrees for rad. */
    DEG("°", Unit.PI_OVER_180, 2),
    /** Inverse metres, SI already. */
    PER_M("1/m", "1", 3),
    /** Inverse millimetres for 1/m. */
    PER_MM("1/mm", "1e3", 3),
    /** Megahertz for Hz. */
    MHZ("MHz", "1e6", 2),
    /** Hundredths for a pure number. */
    PERCENT("%", "1e-2", 2);

    /** π/180 to 40 digits. */
    private static final String PI_OVER_180 = "0.01745329251994329576923690768488612713443";

    private static final MathContext EXACT_ENOUGH = new MathContext(40);

    private final String symbol;
    private final BigDecimal factor;
    private final ShortDecimal decimal;
    private final int decimals;

    Unit(String symbol, String factor, int decimals) {
        this.symbol = symbol;
        this.decimals = decimals;
        this.factor = new BigDecimal(factor);
        this.decimal = new ShortDecimal(this.factor);
    }

    /** The unit as printed behind a number; empty for a pure number. */
    public String symbol() {
        return symbol;
    }

    /**
     * The SI double nearest to a decimal in this unit.
     *
     * @param decimal in this unit
     */
    public double toSi(BigDecimal decimal) {
        // Zero has no sign here: -1e-400 is 0.
        return decimal.multiply(factor).doubleValue() + 0.0;
    }

    /**
     * The SI double nearest to a number in this unit, which is taken as its shortest decimal.
     *
     * @param number finite, in this unit
     */
    public double toSi(double number) {
        return toSi(BigDecimal.valueOf(number));
    }

    /**
     * An SI value in this unit, for showing; rounded once.
     *
     * @param si any double; infinities and NaN pass through
     */
    public double fromSi(double si) {
        return Double.isFinite(si)
                ? new BigDecimal(si).divide(factor, EXACT_ENOUGH).doubleValue()
                : si;
    }

    /**
     * The shortest decimal in this unit that {@link #toSi(BigDecimal)} reads back to the same double, as JSON writes
     * numbers.
     *
     * @param si finite, in SI
     */
    public String text(double si) {
        StringBuilder text = new StringBuilder(24);
        append(si, text);
        return text.toString();
    }

    /**
     * Writes what {@link #text} gives.
     *
     * @param si finite, in SI
     * @param to takes the text
     */
    public void append(double si, StringBuilder to) {
        if (si == 0) {
            to.append('0');
        } else if (!decimal.append(si, to)) {
            to.append(slow(si));
        }
    }

    private String slow(double si) {
        BigDecimal exact = new BigDecimal(si).divide(factor, EXACT_ENOUGH);
        // A decimal of up to 15 digits survives a double, so the shortest one shows at 15 digits with zeros cut.
        for (int digits = 15; digits < 18; digits++) {
            BigDecimal shorter = exact.round(new MathContext(digits, RoundingMode.HALF_EVEN));
            if (toSi(shorter) == si) {
                return plain(shorter);
            }
        }
        return plain(exact.round(new MathContext(20)));
    }

    /**
     * An SI value in this unit as a person is shown it: lengths to 0.01 mm, angles to 0.01°, radii to 0.1 µm, pure numbers
     * to 0.001; never "-0".
     *
     * @param si any double
     */
    public String shown(double si) {
        return fixed(fromSi(si), decimals);
    }

    /** A number with a fixed count of decimals, never "-0". */
    public static String fixed(double value, int decimals) {
        // Rounds the shortest decimal of the double, half up, as java.util.Formatter does, without its cost at every
        // frame.
        return Double.isFinite(value)
                ? BigDecimal.valueOf(value)
                        .setScale(decimals, RoundingMode.HALF_UP)
                        .toPlainString()
                : String.valueOf(value);
    }

    private static String plain(BigDecimal decimal) {
        BigDecimal short_ = decimal.stripTrailingZeros();
        int leading = short_.precision() - short_.scale();
        return leading > 16 || leading < -6 ? short_.toString().replace("E+", "E") : short_.toPlainString();
    }
}
