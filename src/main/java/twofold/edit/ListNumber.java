package twofold.edit;

import java.math.BigDecimal;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import twofold.design.Names;
import twofold.design.Problem;
import twofold.design.Subject;
import twofold.design.Unit;
import twofold.layout.Outcome;

/** A number of a list with or without a unit. */
final class ListNumber {
    private static final Pattern NUMBER =
            Pattern.compile("([-+−]?(?:\\d+(?:\\.\\d*)?|\\.\\d+)(?:[eE][-+]?\\d{1,3})?)\\s*(\\S*)");
    private static final Map<String, BigDecimal> LENGTHS =
            Map.of("mm", BigDecimal.ONE, "cm", BigDecimal.TEN, "m", new BigDecimal(1000), "in", new BigDecimal("25.4"));

    private ListNumber() {}

    static Outcome<Double> read(Subject where, String text, Unit unit) {
        Matcher matcher = NUMBER.matcher(text.strip());
        String found = text.isBlank() ? "found nothing" : "found \"" + Names.shown(text.strip()) + "\"";
        if (matcher.matches()) {
            BigDecimal decimal = new BigDecimal(matcher.group(1).replace('−', '-'));
            String word = matcher.group(2);
            if (word.isEmpty() || word.equals(unit.symbol())) {
                return Outcome.of(unit.toSi(decimal));
            }
            BigDecimal factor = LENGTHS.get(word);
            if (unit == Unit.MM && factor != null) {
                return Outcome.of(unit.toSi(decimal.multiply(factor)));
            }
        }
        return Outcome.failed(new Problem(where, found, "a number in " + unit.symbol()));
    }
}
