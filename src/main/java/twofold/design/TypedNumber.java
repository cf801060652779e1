package twofold.design;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import java.util.OptionalDouble;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/**
 * One number as typed, with or without a unit.
 *
 * @param si the value in SI; empty where it is none
 * @param found what was found instead, in words
 */
record TypedNumber(OptionalDouble si, String found) {
    private static final String DECIMAL = "(?:\\d+(?:\\.\\d*)?|\\.\\d+)";
    private static final Pattern NUMBER =
            Pattern.compile("([-+−]?" + DECIMAL + "(?:[eE][-+−]?\\d{1,4})?)\\s*(\\D.*|)", Pattern.DOTALL);

    /** Degrees, minutes and seconds of arc; at least one mark, the last one of seconds may be two of minutes. */
    private static final Pattern ARC = Pattern.compile("([-+−]?)(?:(" + DECIMAL + ")\\s*°)?\\s*(?:(" + DECIMAL
            + ")\\s*['′])?\\s*(?:(" + DECIMAL + ")\\s*(?:[\"″]|''|′′))?");

    private static final Pattern COMMA = Pattern.compile("\\d*,\\d");
    private static final String COMMA_WORDS = ", with a comma; the decimal sign is a point, as in 2.5";
    /** How many units messages list: those that come first are the usual spellings. */
    private static final int SHOWN = 6;

    private static final int LONGEST = 400;
    private static final BigDecimal SIXTY = new BigDecimal(60);
    private static final MathContext EXACT_ENOUGH = new MathContext(40);

    static TypedNumber read(String text, Unit unit) {
        String bare = text.strip();
        if (bare.isEmpty()) {
            return none("found nothing");
        }
        if (bare.length() > LONGEST) {
            return none("found " + bare.length() + " characters");
        }
        Matcher arc = ARC.matcher(bare);
        if (unit == Unit.DEG && arc.matches() && bare.matches(".*[°'′\"″].*")) {
            return arc(bare, arc);
        }
        Matcher number = NUMBER.matcher(bare);
        if (!number.matches()) {
            return none(quoted(bare) + (COMMA.matcher(bare).find() ? COMMA_WORDS : ", which is no number"));
        }
        String word = number.group(2).strip();
        if (word.startsWith(",")) {
            return none(quoted(bare) + COMMA_WORDS);
        }
        BigDecimal decimal = decimal(number.group(1));
        double si = word.isEmpty() ? unit.toSi(decimal) : Double.NaN;
        for (Spelling spelling : Spelling.of(unit)) {
            if (spelling.word().equals(word)) {
                si = spelling.toSi(decimal);
            }
        }
        if (Double.isNaN(si)) {
            return none(quoted(bare) + ", whose unit \"" + Names.shown(word) + "\" does not belong here");
        }
        return Double.isFinite(si)
                ? new TypedNumber(OptionalDouble.of(si), "")
                : none(quoted(bare) + ", which is too large");
    }

    private static TypedNumber none(String found) {
        return new TypedNumber(OptionalDouble.empty(), found);
    }

    static String quoted(String text) {
        return "found \"" + Names.shown(text) + "\"";
    }

    private static BigDecimal decimal(String text) {
        return new BigDecimal(text.replace('−', '-'));
    }

    private static TypedNumber arc(String text, Matcher arc) {
        BigDecimal degrees = group(arc, 2);
        BigDecimal minutes = group(arc, 3);
        BigDecimal seconds = group(arc, 4);
        boolean both = arc.group(2) != null;
        if ((both && minutes.compareTo(SIXTY) >= 0)
                || ((both || arc.group(3) != null) && seconds.compareTo(SIXTY) >= 0)) {
            return none(quoted(text) + ", with 60 minutes or seconds or more");
        }
        BigDecimal whole =
                degrees.add(minutes.add(seconds.divide(SIXTY, EXACT_ENOUGH)).divide(SIXTY, EXACT_ENOUGH));
        boolean negative = arc.group(1).equals("-") || arc.group(1).equals("−");
        return new TypedNumber(OptionalDouble.of(Unit.DEG.toSi(negative ? whole.negate() : whole)), "");
    }

    private static BigDecimal group(Matcher arc, int group) {
        String text = arc.group(group);
        return text == null ? BigDecimal.ZERO : new BigDecimal(text);
    }

    /** Which units may be typed, as messages say it behind what is accepted. */
    static String units(Unit unit) {
        List<Spelling> spellings = Spelling.of(unit);
        String all = spellings.stream().map(Spelling::word).limit(SHOWN).collect(Collectors.joining(", "));
        return switch (unit) {
            case ONE -> "";
            case PERCENT -> ", in %";
            case DEG -> ", in degrees (7.5 or 7°30'), or with a unit: rad, mrad, µrad";
            default -> ", in " + unit.symbol() + ", or with a unit: " + all;
        };
    }
}
