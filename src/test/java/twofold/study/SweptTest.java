package twofold.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import twofold.Samples;
import twofold.Sketch;
import twofold.design.Design;
import twofold.design.Lever;
import twofold.design.Place;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.optics.Plane;

/**
 * What a picture of a sweep shows. Two mirrors are stable where 0 ≤ (1 − L/R₁)(1 − L/R₂) ≤ 1 (Kogelnik & Li, Appl. Opt. 5,
 * 1550 (1966), eq. 52): with R₁ below R₂ from 0 to R₁ and from R₂ to R₁ + R₂.
 */
class SweptTest {
    private static final double FIRST = 0.5;
    private static final double LAST = 0.8;

    private static Swept swept(Design design, Lever lever, int points, String... quantities) {
        Laid laid = Layout.of(design).value().orElseThrow();
        List<Asked> asked = List.of(quantities).stream()
                .map(q -> Asked.parse(q, design).value().orElseThrow())
                .toList();
        return Swept.of(
                        new Question(laid, List.of(lever), asked),
                        Axis.of(lever, points).ascending(),
                        2,
                        Progress.SILENT)
                .orElseThrow();
    }

    private static Swept twoMirrors(double from, double to, int points) {
        Design design =
                new Sketch().mirror("A", FIRST).go(0.3).mirror("B", LAST).standingWave(1e-6);
        Lever length =
                new Lever("length", "leg_mm", List.of(Place.of("A", "B")), new Lever.Range.Span(from, to), false);
        return swept(design, length, points, "leg_mm@A/B", "radius_um@A:sagittal");
    }

    private static List<ZonesAlong.Stretch> stable(Swept swept, Plane plane) {
        return swept.stable().stream().filter(s -> s.plane() == plane).toList();
    }

    /** 5 points: zones narrower than a step; 27: a point on every edge to rounding. */
    @ParameterizedTest
    @ValueSource(ints = {5, 27, 101, 400})
    void stretchesAreTheClosedFormsZones(int points) {
        Swept swept = twoMirrors(0.1, 1.4, points);
        for (Plane plane : Plane.values()) {
            List<ZonesAlong.Stretch> stable = stable(swept, plane);
            assertThat(stable).hasSize(2);
            double[] expected = {0.1, FIRST, LAST, FIRST + LAST};
            for (int i = 0; i < 4; i++) {
                ZonesAlong.Stretch s = stable.get(i / 2);
                // A root is bisected until nothing lies between its ends; the walk there rounds to some 1e-16 m.
                assertThat(i % 2 == 0 ? s.from() : s.to()).isCloseTo(expected[i], within(1e-14));
            }
            assertThat(stable.get(0).lower()).as("beyond the range").isEmpty();
            // At L = R₁ the first mirror's centre lies on the last, at R₁ + R₂ the centres meet.
            assertThat(stable.get(0).upper().orElseThrow().name()).isIn("A = 0", "D = 0");
            assertThat(stable.get(1).lower().orElseThrow().name()).isIn("A = 0", "D = 0");
            assertThat(stable.get(1).upper().orElseThrow().name()).isEqualTo("C = 0");
        }
    }

    @Test
    void aRangeThatEndsInsideAZoneHasNoEdgeThere() {
        ZonesAlong.Stretch stretch =
                stable(twoMirrors(0.9, 1.1, 7), Plane.TANGENTIAL).get(0);
        assertThat(stretch)
                .isEqualTo(new ZonesAlong.Stretch(Plane.TANGENTIAL, 0.9, 1.1, Optional.empty(), Optional.empty()));
    }

    @Test
    void whereThereIsNoLayoutAStretchEndsWithoutAnEdge() {
        Design design = new Sketch()
                .mirror("A", FIRST)
                .go(0.1)
                .lens("L", 40)
                .go(0.2)
                .mirror("B", LAST)
                .standingWave(1e-6);
        Lever along = new Lever("lens", "along_mm", List.of(Place.of("L")), new Lever.Range.Span(0.1, 0.5), false);
        Swept swept = swept(design, along, 41, "radius_um@A:tangential");
        List<ZonesAlong.Stretch> stable = stable(swept, Plane.TANGENTIAL);
        assertThat(stable).hasSize(1);
        // The leg is 0.3 m long: the last point on it is where the stretch ends.
        assertThat(stable.get(0).to()).isCloseTo(0.3, within(1e-12));
        assertThat(stable.get(0).upper()).isEmpty();
        assertThat(swept.answer(40, 0)).isNaN();
        assertThat(swept.answer(0, 0)).isPositive();
    }

    @Test
    void aDescendingRangeAndAListAscend() {
        Swept swept = twoMirrors(1.4, 0.1, 14);
        assertThat(swept.axis().value(0)).isEqualTo(0.1);
        assertThat(swept.answer(0, 0)).isCloseTo(0.1, within(1e-12));
        assertThat(stable(swept, Plane.SAGITTAL)).hasSize(2);
        Design design = Samples.design("triangle-ring");
        Lever list = new Lever(
                "radius",
                "roc_mm",
                List.of(Place.of("Apex")),
                new Lever.Range.Among(List.of(0.75, 0.3, 0.75, 0.5)),
                false);
        Swept listed = swept(design, list, 99, "half_trace:sagittal");
        assertThat(listed.axis().size()).isEqualTo(3);
        assertThat(listed.answer(0, 0)).isLessThan(listed.answer(2, 0));
    }

    @Test
    void progressStopsIt() {
        Design design = Samples.design("z-fold-rod");
        Laid laid = Layout.of(design).value().orElseThrow();
        Lever gap = design.levers().get(1);
        Question question = new Question(
                laid,
                List.of(gap),
                List.of(Asked.parse("fsr_mhz", design).value().orElseThrow()));
        assertThat(Swept.of(question, Axis.of(gap, 5000), 2, share -> share < 0.3))
                .isEmpty();
        assertThatThrownBy(() -> Swept.of(question, Axis.of(gap, 10_001), 1, Progress.SILENT))
                .hasMessageContaining("10001 values; accepted: up to 10000");
    }
}
