package twofold.edit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import twofold.Samples;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Kind;
import twofold.design.Part;
import twofold.design.Values;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.layout.Outcome;
import twofold.study.Stretch;

/** The nearest stable place: where it is, what moves, and what is said where there is none. */
class NearestStableTest {
    private static Laid laid(String list) {
        return Layout.of(FromList.read(list, 800e-9).design().orElseThrow())
                .value()
                .orElseThrow();
    }

    private static NearestStable.Found found(Laid laid, String part) {
        Outcome<NearestStable.Found> found = NearestStable.of(laid, part);
        assertThat(found.problems()).isEmpty();
        return found.value().orElseThrow();
    }

    /** Zones of a gap between folds of f = R cosθ/2 or R/(2 cosθ) and flat ends: 2f + {0, f²/(L₂ − f), f²/(L₁ − f), sum}. */
    private static List<Stretch> zones(double f) {
        double one = f * f / (0.48 - f);
        double two = f * f / (0.62 - f);
        return List.of(
                new Stretch(2 * f, 2 * f + Math.min(one, two)),
                new Stretch(2 * f + Math.max(one, two), 2 * f + one + two));
    }

    @ParameterizedTest
    @ValueSource(doubles = {97, 102, 103.5, 105, 108, 112})
    void aTypedZIsBroughtToAStablePlace(double gap) {
        double cos = Math.cos(Math.toRadians(7.9));
        List<Double> middles = new ArrayList<>();
        for (Stretch t : zones(0.05 * cos)) {
            for (Stretch s : zones(0.05 / cos)) {
                double from = Math.max(t.from(), s.from());
                double to = Math.min(t.to(), s.to());
                if (from < to) {
                    middles.add((from + to) / 2);
                }
            }
        }
        double expected = middles.stream()
                .min(Comparator.comparingDouble(m -> Math.abs(m - gap * 1e-3)))
                .orElseThrow();
        NearestStable.Found found = found(laid("480, " + gap + ", 620; 7.9°, 7.9°; 100"), "Fold 2");
        assertThat(found.leg()).hasToString("Fold 1/Fold 2");
        assertThat(found.then()).isCloseTo(expected, within(1e-12));
        Laid there = Layout.of(found.design()).value().orElseThrow();
        assertThat(there.legs().get(1).path()).isCloseTo(expected, within(1e-12));
        assertThat(there.legs().get(2).path()).isCloseTo(0.62, within(1e-12));
        assertThat(found.words())
                .startsWith("Fold 2 moves ")
                .contains("along Fold 1/Fold 2, a leg of ")
                .contains("both planes are stable from ");
    }

    @Test
    void theChosenMirrorMovesAndNotTheOtherEndOfItsLeg() {
        Laid before = laid("480, 108, 620; 7.9°, 7.9°; 100");
        Design first = found(before, "Fold 1").design();
        assertThat(first.mirrors().get(2)).isEqualTo(before.design().mirrors().get(2));
        assertThat(first.mirrors().get(3)).isEqualTo(before.design().mirrors().get(3));
        assertThat(first.mirrors().get(1))
                .isNotEqualTo(before.design().mirrors().get(1));
        Design second = found(before, "Fold 2").design();
        assertThat(second.mirrors().get(1)).isEqualTo(before.design().mirrors().get(1));
        assertThat(second.mirrors().get(0)).isEqualTo(before.design().mirrors().get(0));
    }

    @Test
    void theEditIsNamed() {
        assertThat(NearestStable.edit("Fold 2").name()).isEqualTo("move Fold 2 to the nearest stable place");
    }

    /** Flat ends and a fold at 40°: f = 76.604 and 130.541 mm; from f to f + f²/(300 − f), 102.871 and 231.101 mm. */
    @Test
    void zonesThatDoNotMeetAreToldWithTheirNumbers() {
        Outcome<NearestStable.Found> refused = NearestStable.of(laid("300, 104; 40°; 200"), "End B");
        assertThat(refused.value()).isEmpty();
        assertThat(refused.problems())
                .singleElement()
                .satisfies(p -> assertThat(p.line())
                        .contains("no stable place for End B: along Fold/End B, 104.00 mm now, "
                                + "tangential stable from 76.60 to 102.87 mm, "
                                + "sagittal stable from 130.54 to 231.10 mm; they are 27.67 mm apart"));
    }

    @Test
    void anUnknownPartIsRefused() {
        assertThat(NearestStable.of(laid("250; ; 500"), "Fold 9").problems())
                .singleElement()
                .satisfies(p -> assertThat(p.line()).contains("\"Fold 9\", which no part is called"));
    }

    private static Laid withLens(double along) {
        Design two = laid("400").design();
        Values values = Values.NONE.with(Field.ALONG, Along.at(along)).with(Field.FOCAL_LENGTH, (Object) 0.09);
        List<Part> parts = List.of(
                two.parts().get(0), Kind.LENS.part("Lens", values), two.parts().get(1));
        return Layout.of(two.withParts(parts)).value().orElseThrow();
    }

    /**
     * A lens of 90 mm between flats 400 mm apart, at a and b = 400 − a: 0 < (1 − a/f)(1 − b/f) < 1. Both arms beyond f, and
     * (a − f)(b − f) < f² for a − f below 110 − √(110² − 90²), so a from 90 to 136.75 mm and its mirror image.
     */
    @Test
    void aLensSlidesAlongItsLeg() {
        double edge = 0.2 - Math.sqrt(0.11 * 0.11 - 0.09 * 0.09);
        NearestStable.Found found = found(withLens(0.2), "Lens");
        assertThat(found.what()).isEqualTo(NearestStable.What.ALONG);
        assertThat(Math.min(found.then(), 0.4 - found.then())).isCloseTo((0.09 + edge) / 2, within(1e-9));
        assertThat(found(withLens(0.02), "Lens").then()).isCloseTo((0.09 + edge) / 2, within(1e-9));
    }

    @Test
    void aCrystalThatChangesNothingStaysWhereItIs() {
        Laid sample = Layout.of(Samples.design("z-fold-rod")).value().orElseThrow();
        assertThat(NearestStable.of(sample, "Rod").problems())
                .singleElement()
                .satisfies(
                        p -> assertThat(p.line()).contains("both planes are stable wherever it stands from 2.50 to"));
    }
}
