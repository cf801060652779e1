package twofold.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

/** The colours of maps, measured back from sRGB to CIE L*a*b* by the formulas of IEC 61966-2-1 and CIE 15:2018. */
class ColourMapPropertyTest {
    /** A channel of 8 bits is off by up to half a step, which is worth up to 0.6 in L* where colours are dark. */
    private static final double ROUNDING = 0.6;

    private static double[] lab(int rgb) {
        double[] c = IntStream.of(rgb >> 16 & 0xff, rgb >> 8 & 0xff, rgb & 0xff)
                .mapToDouble(v -> v / 255.0)
                .map(v -> v <= 0.04045 ? v / 12.92 : Math.pow((v + 0.055) / 1.055, 2.4))
                .toArray();
        double x = f((0.4124564 * c[0] + 0.3575761 * c[1] + 0.1804375 * c[2]) / 0.95047);
        double y = f(0.2126729 * c[0] + 0.7151522 * c[1] + 0.0721750 * c[2]);
        double z = f((0.0193339 * c[0] + 0.1191920 * c[1] + 0.9503041 * c[2]) / 1.08883);
        return new double[] {116 * y - 16, 500 * (x - y), 200 * (y - z)};
    }

    private static double f(double t) {
        return t > 216.0 / 24389 ? Math.cbrt(t) : (24389.0 / 27 * t + 16) / 116;
    }

    @Test
    void theFormulasGiveTheirKnownValues() {
        // White and black by definition; sRGB red is L* 53.24, a* 80.09, b* 67.20 in common tables.
        assertThat(lab(0xffffff)[0]).isCloseTo(100, within(0.01));
        assertThat(lab(0)[0]).isCloseTo(0, within(1e-9));
        assertThat(lab(0xff0000)).containsExactly(new double[] {53.24, 80.09, 67.20}, within(0.02));
    }

    @Test
    void lightnessGrowsAllAlongAndEvenly() {
        double first = lab(ColourMap.rgb(0))[0];
        double last = lab(ColourMap.rgb(ColourMap.SIZE - 1))[0];
        assertThat(last - first).isGreaterThan(70);
        for (int i = 0; i < ColourMap.SIZE; i++) {
            double even = first + (last - first) * i / (ColourMap.SIZE - 1);
            assertThat(lab(ColourMap.rgb(i))[0]).as("L* of colour %d", i).isCloseTo(even, within(ROUNDING));
            if (i >= 3) {
                // Three steps are worth 0.87, more than rounding can take away.
                assertThat(lab(ColourMap.rgb(i))[0]).isGreaterThan(lab(ColourMap.rgb(i - 3))[0]);
            }
        }
    }

    @Test
    void equalStepsLookEqual() {
        // Over 16 colours, where rounding no longer counts, every stretch has the same ΔE*ab to a tenth.
        double[] steps = IntStream.range(0, (ColourMap.SIZE - 1) / 16)
                .mapToDouble(i -> distance(lab(ColourMap.rgb(16 * i)), lab(ColourMap.rgb(16 * i + 16))))
                .toArray();
        double mean = IntStream.range(0, steps.length)
                .mapToDouble(i -> steps[i])
                .average()
                .orElseThrow();
        for (double step : steps) {
            assertThat(step).isBetween(0.9 * mean, 1.1 * mean);
        }
    }

    private static double distance(double[] a, double[] b) {
        return Math.sqrt(Math.pow(a[0] - b[0], 2) + Math.pow(a[1] - b[1], 2) + Math.pow(a[2] - b[2], 2));
    }

    @Test
    void valuesBeyondTheRangeHaveTheColoursAtItsEnds() {
        assertThat(ColourMap.number(-5, 0, 1)).isZero();
        assertThat(ColourMap.number(0.5, 0, 1)).isEqualTo(127);
        assertThat(ColourMap.number(7, 0, 1)).isEqualTo(ColourMap.SIZE - 1);
    }
}
