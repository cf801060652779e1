package twofold.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.function.Function;
import org.junit.jupiter.api.Test;
import twofold.Sketch;
import twofold.cavity.Chain;
import twofold.cavity.Reading;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Lever;
import twofold.design.Place;
import twofold.layout.Laid;
import twofold.layout.Layout;

/** The worst value over a lever's whole range, on two mirrors, where h = 2 (1 − L/R₁)(1 − L/R₂) − 1. */
class WorstOverTest {
    private static final double FIRST = 0.5;
    private static final double LAST = 0.8;

    private static Laid laid() {
        Design design =
                new Sketch().mirror("A", FIRST).go(0.3).mirror("B", LAST).standingWave(1e-6);
        return Layout.of(design).value().orElseThrow();
    }

    private static double halfTrace(double length) {
        return 2 * (1 - length / FIRST) * (1 - length / LAST) - 1;
    }

    private static Lever lever(String set, Place place, Lever.Range range) {
        return new Lever("moved", set, List.of(place), range, false);
    }

    private static Lever length(double from, double to) {
        return lever("leg_mm", Place.of("A", "B"), new Lever.Range.Span(from, to));
    }

    private static Function<Chain, Reading> reading(Laid laid, String text) {
        return chain -> Asked.parse(text, laid.design()).value().orElseThrow().reading(chain);
    }

    private static double smallest(Lever lever, String what) {
        Laid laid = laid();
        return new WorstOver(laid).worst(lever, reading(laid, what), v -> v);
    }

    @Test
    void atAnEndOfTheRange() {
        assertThat(smallest(length(0.1, 0.4), "leg_mm@A/B")).isCloseTo(0.1, within(1e-12));
        assertThat(smallest(length(0.4, 0.1), "leg_mm@A/B")).isCloseTo(0.1, within(1e-12));
    }

    /** The half trace is a parabola, least half way between the radii. */
    @Test
    void betweenTwoPoints() {
        double least = halfTrace((FIRST + LAST) / 2);
        assertThat(smallest(length(0.31, 1.1234), "half_trace:sagittal")).isCloseTo(least, within(1e-12));
    }

    /** Where it is unstable, the margin is 1 + h. */
    @Test
    void theMarginIsLeastWhereItIsMostUnstable() {
        double least = 1 + halfTrace((FIRST + LAST) / 2);
        assertThat(smallest(length(0.2, 1.2), "stability_margin:tangential")).isCloseTo(least, within(1e-12));
    }

    /** A margin is largest at a kink, where the half trace is 0: no smooth top to be found by its slope. */
    @Test
    void aKinkIsFound() {
        Laid laid = laid();
        double largest =
                new WorstOver(laid).worst(length(0.05, 0.45), reading(laid, "stability_margin:tangential"), v -> -v);
        // At a kink the value is only as good as the place: 1e-7 of a step of 1 mm, and the slope is some 5 a metre.
        assertThat(largest).isCloseTo(1, within(1e-8));
    }

    @Test
    void undefinedAnywhereIsUndefined() {
        assertThat(smallest(length(0.2, 0.45), "radius_um@A:sagittal")).isPositive();
        // Unstable between the radii.
        assertThat(smallest(length(0.2, 0.7), "radius_um@A:sagittal")).isNaN();
    }

    @Test
    void aRangeAsNarrowAsRoundingEnds() {
        double from = 0.3;
        assertThat(smallest(length(from, Math.nextUp(from)), "leg_mm@A/B")).isCloseTo(from, within(1e-12));
        assertThat(smallest(length(from, from + 1e-10), "half_trace:sagittal"))
                .isCloseTo(halfTrace(from), within(1e-8));
    }

    @Test
    void overAListOnlyItsValuesCount() {
        Lever list = lever("leg_mm", Place.of("A", "B"), new Lever.Range.Among(List.of(0.4, 0.9, 0.1)));
        assertThat(smallest(list, "half_trace:sagittal"))
                .isCloseTo(Math.min(halfTrace(0.4), halfTrace(0.9)), within(1e-12));
    }

    /** A clear diameter is no number that light feels, yet it clips: exp(−2a²/w²) of a round beam passes by a hole. */
    @Test
    void overWhatOnlyClips() {
        Laid laid = laid();
        Lever hole = lever(Field.CLEAR_DIAMETER.json(), Place.of("A"), new Lever.Range.Span(1e-3, 3e-3));
        double radius =
                smallest(lever("roc_mm", Place.of("A"), new Lever.Range.Among(List.of(FIRST))), "radius_um@A:sagittal");
        double loss = new WorstOver(laid).worst(hole, reading(laid, "clip_loss@A"), v -> -v);
        double expected = Math.exp(-2 * Math.pow(0.5e-3 / radius, 2));
        assertThat(expected).isGreaterThan(1e-4);
        assertThat(loss).isCloseTo(expected, within(1e-9));
    }
}
