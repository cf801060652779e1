package twofold.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Set;
import java.util.SplittableRandom;
import java.util.TreeSet;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import twofold.RandomDesigns;
import twofold.cavity.Chain;
import twofold.cavity.Fit;
import twofold.cavity.Trial;
import twofold.design.Design;
import twofold.design.Lever;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.layout.Outcome;
import twofold.optics.Plane;

/**
 * A trial set by levers answers as the design does that states the levers' values: two ways that share the mover alone, over
 * random levers of every kind on random designs with holds.
 */
class SettingPropertyTest {
    private static double value(Lever lever, SplittableRandom random) {
        if (lever.range() instanceof Lever.Range.Span span) {
            return span.from() + random.nextDouble() * (span.to() - span.from());
        }
        List<Double> values = ((Lever.Range.Among) lever.range()).values();
        return values.get(random.nextInt(values.size()));
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2})
    void aTrialAnswersAsTheDesignDoes(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        Set<String> fitted = new TreeSet<>();
        int refused = 0;
        for (int n = 0; n < 400; n++) {
            Design design = RandomDesigns.of(10_000 * seed + n);
            if (design.levers().isEmpty() || design.parts().size() > 30) {
                continue;
            }
            Laid laid = Layout.of(design).value().orElseThrow();
            Chain chain = Chain.of(laid);
            List<Lever> levers = design.levers().stream()
                    .filter(l -> Setting.canSet(chain, l))
                    .limit(n % 2 + 1)
                    .toList();
            double[] values = levers.stream().mapToDouble(l -> value(l, random)).toArray();
            Trial trial = chain.trial();
            boolean set = Setting.of(chain, levers).set(values, trial);
            Outcome<Laid> stated = Levered.of(laid, levers, values);
            // A lens of no known index has no power once it is tilted.
            boolean fits = set && trial.run() == Fit.FITS && !Double.isNaN(trial.halfTrace(Plane.TANGENTIAL));
            if (stated.value().isEmpty()) {
                refused++;
                // Lifted out of a ring's plane, or a number out of range, is no matter of a trial.
                boolean elsewhere = stated.problems().stream()
                        .anyMatch(p -> p.found().contains("lift") || p.found().contains("point of"));
                assertThat(fits && !elsewhere)
                        .as("%s %s", design.title(), stated.problems())
                        .isFalse();
                continue;
            }
            assertThat(fits).as(design.title()).isTrue();
            levers.forEach(l -> fitted.add(l.set()));
            Trial other = Chain.of(stated.value().get()).trial();
            assertThat(other.run()).isEqualTo(Fit.FITS);
            for (Plane plane : Plane.values()) {
                double expected = other.halfTrace(plane);
                // What rounding of places a unit or two in the last place makes of a chain of up to 30 parts.
                assertThat(trial.halfTrace(plane))
                        .as("%s %s", design.title(), levers)
                        .isCloseTo(expected, within(1e-9 * Math.max(1, Math.abs(expected))));
            }
        }
        assertThat(refused).isPositive();
        assertThat(fitted)
                .contains("leg_mm", "roc_mm", "along_mm", "focal_length_mm", "incidence_deg", "x_mm", "y_mm", "index");
    }
}
