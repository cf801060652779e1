package twofold.design;

import java.math.BigDecimal;
import java.util.List;

/**
 * A unit as people write it behind a number.
 *
 * @param word as written; letters count as they are: m is not M
 * @param unit that the number is converted from
 * @param times how many of that unit it is, exactly
 */
record Spelling(String word, Unit unit, BigDecimal times) {
    /** The inch is 25.4 mm exactly: international yard and pound agreement of 1959. */
    private static final List<Spelling> LENGTHS = List.of(
            of("mm", Unit.MM, "1"),
            of("cm", Unit.MM, "10"),
            of("m", Unit.MM, "1000"),
            of("µm", Unit.UM, "1"),
            of("nm", Unit.NM, "1"),
            of("in", Unit.MM, "25.4"),
            // Other ways to write the same: without the Greek letter, with the letter itself for the micro sign.
            of("um", Unit.UM, "1"),
            of("μm", Unit.UM, "1"),
            of("inch", Unit.MM, "25.4"),
            of("\"", Unit.MM, "25.4"),
            of("″", Unit.MM, "25.4"));

    private static final List<Spelling> ANGLES = List.of(
            of("°", Unit.DEG, "1"),
            of("deg", Unit.DEG, "1"),
            of("rad", Unit.ONE, "1"),
            of("mrad", Unit.ONE, "0.001"),
            of("µrad", Unit.ONE, "0.000001"),
            of("urad", Unit.ONE, "0.000001"),
            of("μrad", Unit.ONE, "0.000001"));

    private static final List<Spelling> POWERS = List.of(
            of("1/m", Unit.PER_M, "1"),
            of("1/mm", Unit.PER_MM, "1"),
            of("1/cm", Unit.PER_M, "100"),
            of("/m", Unit.PER_M, "1"),
            of("/mm", Unit.PER_MM, "1"),
            of("/cm", Unit.PER_M, "100"),
            of("m⁻¹", Unit.PER_M, "1"),
            of("mm⁻¹", Unit.PER_MM, "1"),
            of("dpt", Unit.PER_M, "1"));

    private static final List<Spelling> FREQUENCIES = List.of(
            of("MHz", Unit.MHZ, "1"),
            of("GHz", Unit.MHZ, "1000"),
            of("THz", Unit.MHZ, "1000000"),
            of("kHz", Unit.MHZ, "0.001"),
            of("Hz", Unit.MHZ, "0.000001"));

    private static final List<Spelling> SHARES = List.of(of("%", Unit.PERCENT, "1"));

    private static Spelling of(String word, Unit unit, String times) {
        return new Spelling(word, unit, new BigDecimal(times));
    }

    /** What may stand behind a number that is meant in a unit unless it says otherwise. */
    static List<Spelling> of(Unit unit) {
        return switch (unit) {
            case MM, UM, NM -> LENGTHS;
            case DEG -> ANGLES;
            case PER_M, PER_MM -> POWERS;
            case MHZ -> FREQUENCIES;
            case ONE, PERCENT -> SHARES;
        };
    }

    /** A number in this unit, in SI. */
    double toSi(BigDecimal number) {
        return unit.toSi(number.multiply(times));
    }
}
