package twofold.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import twofold.Samples;
import twofold.cavity.Cavity;
import twofold.cavity.Judgement;
import twofold.design.Design;
import twofold.design.Lever;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.optics.Plane;

/** What a picture of a map shows, against each point laid out and solved as a design of its own. */
class MappedTest {
    private static Laid laid(String sample) {
        return Layout.of(Samples.design(sample)).value().orElseThrow();
    }

    private static Lever lever(Laid laid, String name) {
        return laid.design().levers().stream()
                .filter(l -> l.name().equals(name))
                .findFirst()
                .orElseThrow();
    }

    private static Question question(Laid laid, String x, String y, String quantity) {
        return new Question(
                laid,
                List.of(lever(laid, x), lever(laid, y)),
                List.of(Asked.parse(quantity, laid.design()).value().orElseThrow()));
    }

    private static Optional<Mapped> mapped(Question question, int columns, int rows, Progress progress) {
        return Mapped.of(
                question,
                Axis.of(question.levers().get(0), columns).ascending(),
                Axis.of(question.levers().get(1), rows).ascending(),
                2,
                progress);
    }

    /** v-fold-pumped asks over a lever's range, once of a map over that very lever; z-fold-rod asks for clearance. */
    @ParameterizedTest
    @CsvSource({
        "z-fold-rod, gap, fold, roundness@Rod, 24, 11",
        "v-fold-pumped, short arm, fold, radius_um@Crystal:tangential, 7, 6",
        "v-fold-pumped, pump, short arm, radius_um@Crystal:tangential, 6, 7",
        "triangle-ring, apex, radius, half_trace:sagittal, 12, 9",
    })
    void everyPointIsThatDesign(String sample, String x, String y, String quantity, int columns, int rows) {
        Laid laid = laid(sample);
        Question question = question(laid, x, y, quantity);
        Mapped map = mapped(question, columns, rows, Progress.SILENT).orElseThrow();
        int met = 0;
        for (int i = 0; i < map.x().size() * map.y().size(); i++) {
            double[] levers = {
                map.x().value(i % map.x().size()), map.y().value(i / map.x().size())
            };
            Laid there = Levered.of(laid, question.levers(), levers).value().orElseThrow();
            Cavity cavity = Cavity.solve(there).judgedOver(new WorstOver(there));
            for (Plane plane : Plane.values()) {
                double halfTrace = cavity.mode(plane).halfTrace();
                // Mirrors are moved to 1e-9 mm, which an arm's gain of some 1e3 /m turns into 1e-9.
                assertThat(map.halfTrace(plane, i)).isCloseTo(halfTrace, within(1e-8 * (1 + Math.abs(halfTrace))));
            }
            double least = cavity.judgements().stream()
                    .filter(j -> j.verdict() != Judgement.Verdict.WISH)
                    .mapToDouble(Judgement::margin)
                    .reduce(Double.POSITIVE_INFINITY, Math::min);
            assertThat(map.margin(i) >= 0).as("point %d: %s", i, least).isEqualTo(least >= 0);
            if (least >= 0 || (least < 0 && beside(map, i))) {
                met++;
                assertThat(map.margin(i)).as("point %d", i).isCloseTo(least, within(1e-6 * (1 + Math.abs(least))));
            }
        }
        assertThat(met)
                .as("points that say something")
                .isBetween(2, map.x().size() * map.y().size());
    }

    /** Whether all holds at a point beside: there the outline is drawn by the margin. */
    private static boolean beside(Mapped map, int point) {
        int column = point % map.x().size();
        int row = point / map.x().size();
        for (int r = Math.max(0, row - 1); r <= Math.min(map.y().size() - 1, row + 1); r++) {
            for (int c = Math.max(0, column - 1); c <= Math.min(map.x().size() - 1, column + 1); c++) {
                if (map.margin(r * map.x().size() + c) >= 0) {
                    return true;
                }
            }
        }
        return false;
    }

    @Test
    void withoutRequirementsThereIsNoMargin() {
        Design bare = Samples.design("z-fold-rod");
        Design asksNothing = new Design(
                bare.title(),
                bare.notes(),
                bare.wavelength(),
                bare.shape(),
                bare.parts(),
                bare.holds(),
                bare.levers(),
                List.of(),
                bare.tolerances());
        Laid laid = Layout.of(asksNothing).value().orElseThrow();
        Mapped map = mapped(question(laid, "gap", "fold", "fsr_mhz"), 3, 3, Progress.SILENT)
                .orElseThrow();
        assertThat(map.hasMargins()).isFalse();
        assertThat(map.value(4)).isPositive();
    }

    @Test
    void progressStopsItAndSizeIsBounded() {
        Question question = question(laid("z-fold-rod"), "gap", "fold", "fsr_mhz");
        assertThat(mapped(question, 100, 100, share -> share < 0.5)).isEmpty();
        assertThatThrownBy(() -> mapped(question, 1001, 2, Progress.SILENT))
                .hasMessageContaining("1001 × 2 values; accepted: up to 1000");
    }

    @ParameterizedTest
    @CsvSource({
        "z-fold-rod, gap, 0.1046",
        "triangle-ring, radius, 0.5",
        "triangle-ring, apex, 0.1989975",
        "v-fold-pumped, pump, 2.5",
        "x-fold, crystal, 0.07655",
    })
    void aLeverStandsWhereTheDesignHasIt(String sample, String lever, double si) {
        Laid laid = laid(sample);
        // Places are stated to 1e-7 m, of which a leg is made.
        assertThat(Levered.now(laid, lever(laid, lever)).orElseThrow()).isCloseTo(si, within(2e-7));
    }

    @Test
    void aLeverOfPartsThatDifferStandsNowhere() {
        Laid laid = laid("z-fold-rod");
        Lever both = new Lever(
                "both",
                "roc_mm",
                List.of(twofold.design.Place.of("Fold 1"), twofold.design.Place.of("Output coupler")),
                new Lever.Range.Span(0.05, 0.2),
                false);
        assertThat(Levered.now(laid, both)).isEmpty();
    }
}
