package twofold.cavity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.apache.commons.math3.analysis.integration.IterativeLegendreGaussIntegrator;
import org.apache.commons.math3.special.Erf;
import org.junit.jupiter.api.Test;
import twofold.Checks;
import twofold.Checks.Check;

/** Power outside openings against elementary integrals, and against their textbook form integrated by another library. */
class ClippingReferenceTest {

    @Test
    void aRoundBeamInARoundHole() {
        Check check = Checks.of("aperture.round");
        List<Double> loss = new ArrayList<>();
        List<Double> fraction = new ArrayList<>();
        for (double a : check.ins("a_over_w")) {
            loss.add(Clipping.hole(a, 1, 1));
            fraction.add(1 - Clipping.hole(a, 1, 1));
        }
        check.holds("loss", loss);
        check.holds("fraction", fraction);
    }

    @Test
    void aSlit() {
        Check check = Checks.of("aperture.slit");
        List<Double> fraction = new ArrayList<>();
        for (double a : check.ins("a_over_w")) {
            fraction.add(1 - Clipping.slit(a, 1));
        }
        check.holds("fraction", fraction);
    }

    /** The value for a = 1, w = 0.8 and 0.5, computed with 40 digits from ∫[1 − exp(−2a²k)]/k dφ and printed to nine. */
    @Test
    void anEllipticalBeamInARoundHole() {
        assertThat(1 - Clipping.hole(1, 0.8, 0.5)).isCloseTo(0.983214963, within(5e-10));
        assertThat(1 - Clipping.hole(1, 0.8, 0.8)).isCloseTo(0.9560630664, within(5e-11));
        assertThat(1 - Clipping.hole(1, Math.sqrt(0.4), Math.sqrt(0.4))).isCloseTo(0.993262053, within(5e-10));
    }

    @Test
    void isTheTextbookIntegralWhateverTheEllipse() {
        Random random = new Random(7);
        for (int i = 0; i < 100; i++) {
            double u = 0.05 + 0.95 * random.nextDouble();
            double v = 0.05 + 0.95 * random.nextDouble();
            double outside = new IterativeLegendreGaussIntegrator(20, 1e-12, 1e-15)
                            .integrate(
                                    1_000_000,
                                    phi -> {
                                        double k = Math.pow(Math.cos(phi) / u, 2) + Math.pow(Math.sin(phi) / v, 2);
                                        return Math.exp(-2 * k) / k;
                                    },
                                    0,
                                    Math.PI / 2)
                    * 2
                    / (Math.PI * u * v);
            // The library stops at 1e-12 of the integral, which at small losses is its absolute limit.
            assertThat(Clipping.hole(1, u, v)).as("%s by %s", u, v).isCloseTo(outside, within(1e-11 * outside + 1e-15));
            assertThat(Clipping.slit(1, u)).isCloseTo(Erf.erfc(Math.sqrt(2) / u), withinPercentage(1e-8));
        }
    }
}
