package twofold.window.ask;

import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import twofold.cavity.Judgement;
import twofold.design.Field;
import twofold.design.Lever;
import twofold.design.Place;
import twofold.design.Tolerance;
import twofold.design.Unit;
import twofold.edit.Offers;
import twofold.layout.Laid;
import twofold.session.Ask;

/**
 * What a row says while it is shut.
 *
 * @param mark a sign that is told from the others without colour; may be empty
 * @param said the sign in a word
 * @param style of the sign and the value
 * @param what it is
 * @param value its present value; may be empty
 * @param asked what is asked, small
 */
record Head(String mark, String said, String style, String what, String value, String asked) {
    /** All of it, for a screen reader. */
    String words() {
        return Stream.of(
                        what,
                        value,
                        said,
                        asked.replace("\n", ", ").replace("≥", "at least").replace("≤", "at most"))
                .filter(s -> !s.isEmpty())
                .collect(Collectors.joining(", "));
    }

    static Head of(Ask ask) {
        return new Head(
                sign(ask.verdict()),
                ask.verdict().word(),
                style(ask.verdict()),
                ask.what(),
                ask.value(),
                ask.asked() + (ask.margin().equals("–") ? "" : "\nmargin " + ask.margin()));
    }

    private static String sign(Judgement.Verdict verdict) {
        return switch (verdict) {
            case MET -> "✓";
            case NOT_MET -> "!";
            case WISH -> "☆";
            case OPEN -> "?";
        };
    }

    private static String style(Judgement.Verdict verdict) {
        return switch (verdict) {
            case MET -> "good";
            case NOT_MET -> "bad";
            case WISH, OPEN -> "quiet";
        };
    }

    static Head of(Laid laid, Lever lever) {
        Unit unit = Field.settableUnit(lever.set()).orElse(Unit.ONE);
        return new Head(
                "",
                "",
                "",
                lever.name() + ": " + places(lever.set(), lever.of()),
                Offers.value(laid, lever.set(), lever.of().get(0)).stream()
                        .mapToObj(v -> with(shown(unit, v), unit))
                        .findFirst()
                        .orElse("–"),
                range(unit, lever.range()) + (lever.adjuster() ? "\nadjuster" : ""));
    }

    private static String range(Unit unit, Lever.Range range) {
        if (range instanceof Lever.Range.Span span) {
            return minus(unit.text(span.from())) + " to " + with(minus(unit.text(span.to())), unit);
        }
        List<Double> values = ((Lever.Range.Among) range).values();
        return "among " + values.size() + (values.size() == 1 ? " value" : " values");
    }

    static Head of(Tolerance tolerance) {
        Unit unit = tolerance.relative()
                ? Unit.PERCENT
                : Field.settableUnit(tolerance.set()).orElse(Unit.ONE);
        return new Head(
                "",
                "",
                "",
                places(tolerance.set(), tolerance.of()),
                "± " + with(unit.text(tolerance.plusMinus()), unit),
                tolerance.spread().word());
    }

    /** "Radius of curvature of Fold 1, Fold 2". */
    static String places(String set, List<Place> of) {
        return SetWords.title(set) + " of " + of.stream().map(Place::toString).collect(Collectors.joining(", "));
    }

    private static String shown(Unit unit, double si) {
        return Double.isInfinite(si) ? "flat" : minus(unit.shown(si));
    }

    private static String minus(String number) {
        return number.replace('-', '−');
    }

    static String with(String number, Unit unit) {
        return unit.symbol().isEmpty() || number.equals("flat")
                ? number
                : unit == Unit.DEG ? number + "°" : number + " " + unit.symbol();
    }
}
