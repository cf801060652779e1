package twofold.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.function.BiConsumer;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import twofold.Sketch;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Lever;
import twofold.design.Place;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.optics.Plane;

/**
 * A symmetric bow-tie ring over a map of its short side and its angle, against the closed form: with f of a curved mirror,
 * half arms a through the crystal (reduced) and b the long way round, the waist in the middle of the crystal has
 * zR² = (a − f)(f² − (a − f)(b − f))/(b − f), and the plane is stable where 0 &lt; (a − f)(b − f) &lt; f². Derived for this
 * program from the ray matrices of half a ring; computed to 25 digits in the check bowtie.lbo.
 */
class BowTieReferenceTest {
    private static final double WAVE = 1064e-9;
    private static final double RADIUS = 0.1;
    private static final double CRYSTAL = 0.01;
    private static final double INDEX = 1.605;

    private static Laid laid() {
        double incidence = Math.toRadians(6);
        double air = 0.05;
        double around = 0.4;
        double diagonal = (2 * air + CRYSTAL + around) / (2 * (1 + Math.cos(2 * incidence)));
        Design ring = new Sketch()
                .mirror("C1", RADIUS)
                .go(air)
                .crystal("Crystal", CRYSTAL, INDEX)
                .go(air)
                .mirror("C2", RADIUS)
                .left(incidence)
                .go(diagonal)
                .flat("F1")
                .right(incidence)
                .go(around - 2 * diagonal)
                .flat("F2")
                .ring(WAVE);
        Design middle = ring.withParts(ring.parts().stream()
                .map(p -> p.name().equals("Crystal") ? p.with(Field.ALONG, Along.MIDDLE) : p)
                .toList());
        return Layout.of(middle).value().orElseThrow();
    }

    private static Lever lever(String set, Place place, double from, double to) {
        return new Lever(set, set, List.of(place), new Lever.Range.Span(from, to), false);
    }

    /** A map of short sides and of the incidence at one of two mirrors that are each other's images. */
    private static Survey map(String... quantities) {
        Laid laid = laid();
        Lever gap = lever("leg_mm", Place.of("C1", "C2"), 0.100, 0.125);
        Lever fold = lever("incidence_deg", Place.of("C1"), Math.toRadians(5), Math.toRadians(9));
        List<Asked> asked = Stream.of(quantities)
                .map(q -> Asked.parse(q, laid.design()).value().orElseThrow())
                .toList();
        return new Survey(new Question(laid, List.of(gap, fold), asked), List.of(Axis.of(gap, 26), Axis.of(fold, 9)));
    }

    /** Gives the values of both levers at each point, and its answers. */
    private static void each(Survey map, BiConsumer<double[], double[]> look) {
        map.run(
                1,
                piece -> piece,
                piece -> {
                    for (int i = 0; i < piece.count(); i++) {
                        double[] answers =
                                new double[map.question().quantities().size()];
                        for (int q = 0; q < answers.length; q++) {
                            answers[q] = piece.answer(i, q);
                        }
                        double gap = map.axes().get(0).value(map.index(0, piece.first() + i));
                        double angle = map.axes().get(1).value(map.index(1, piece.first() + i));
                        look.accept(new double[] {gap, angle}, answers);
                    }
                },
                Progress.SILENT);
    }

    @ParameterizedTest
    @EnumSource(Plane.class)
    void theWaistInTheCrystalFollowsTheClosedForm(Plane plane) {
        Survey map = map("waist_radius_um@Crystal:" + plane.word(), "round_trip_mm");
        int[] stable = {0};
        each(map, (set, read) -> {
            double cos = Math.cos(set[1]);
            double f = RADIUS / 2 * (plane == Plane.TANGENTIAL ? cos : 1 / cos);
            double a = (set[0] - CRYSTAL) / 2 + CRYSTAL / (2 * INDEX) - f;
            double b = (read[1] - set[0]) / 2 - f;
            if (a * b > 0 && a * b < f * f) {
                stable[0]++;
                double expected = Math.sqrt(WAVE / Math.PI * Math.sqrt(a * (f * f - a * b) / b));
                // Paths are kept to 1e-12 m, and a − f is 0.1 mm or more.
                assertThat(read[0]).isCloseTo(expected, within(1e-8 * expected));
            } else {
                assertThat(read[0]).isNaN();
            }
        });
        assertThat(stable[0]).isBetween(30, (int) map.points() - 30);
    }

    @Test
    void theValuesAreReachedAndTheRingStaysItsOwnMirrorImage() {
        Survey map = map("leg_mm@C1/C2", "incidence_deg@C1", "incidence_deg@C2", "leg_mm@C2/F1", "leg_mm@F2/C1");
        each(map, (set, read) -> {
            assertThat(read[0]).isCloseTo(set[0], within(1e-12));
            assertThat(read[1]).isCloseTo(set[1], within(1e-9));
            assertThat(read[2]).isCloseTo(set[1], within(1e-9));
            assertThat(read[3]).isCloseTo(read[4], within(1e-12));
        });
    }
}
