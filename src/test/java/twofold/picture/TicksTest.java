package twofold.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import java.util.stream.DoubleStream;
import org.junit.jupiter.api.Test;

/** Axes: round numbers, ranges without long tails, labels moved apart. */
class TicksTest {
    @Test
    void ticksAreRoundNumbersWithinTheRange() {
        Ticks ticks = Ticks.within(98, 112, 7);
        assertThat(ticks.values()).containsExactly(98.0, 100.0, 102.0, 104.0, 106.0, 108.0, 110.0, 112.0);
        assertThat(ticks.label(104)).isEqualTo("104");
        assertThat(ticks.between(104.123)).isEqualTo("104.12");
        assertThat(ticks.between(104.123, "mm")).isEqualTo("104.12 mm");
        assertThat(ticks.between(-7.5, "°")).isEqualTo("−7.50°");
        Ticks small = Ticks.within(-0.02, 0.031, 5);
        assertThat(small.values().stream().map(small::label)).containsExactly("−0.02", "0.00", "0.02");
    }

    @Test
    void veryLargeAndVerySmallNumbersHavePowersOfTen() {
        Ticks large = Ticks.within(0, 4e9, 4);
        assertThat(large.values().stream().map(large::label)).containsExactly("0", "1e9", "2e9", "3e9", "4e9");
        Ticks tiny = Ticks.within(1e-9, 3e-9, 2);
        assertThat(tiny.values().stream().map(tiny::label)).containsExactly("1e−9", "2e−9", "3e−9");
    }

    @Test
    void numbersAlongAnAxisHaveRoom() {
        for (double width : new double[] {60, 200, 500, 1200}) {
            Ticks ticks = Ticks.along(new Scale(2395.5, 2431.25, 0, width));
            double apart = ticks.step() / (2431.25 - 2395.5) * width;
            assertThat(ticks.values()).allMatch(v -> v >= 2395.5 && v <= 2431.25);
            if (ticks.values().size() > 1) {
                assertThat(apart).isGreaterThan(Lettering.width("2400", Type.SMALL) + 6);
            }
        }
    }

    @Test
    void aLongTailIsCutAndSaidToBe() {
        Range plain = Range.of(DoubleStream.of(3, 1, Double.NaN, 2));
        assertThat(plain).isEqualTo(new Range(1, 3, false, false));
        Range tail = Range.of(DoubleStream.iterate(0, i -> i + 1).limit(400).map(i -> i < 397 ? i / 397 : 1000));
        assertThat(tail.isCutAbove()).isTrue();
        assertThat(tail.isCutBelow()).isFalse();
        assertThat(tail.from()).isZero();
        assertThat(tail.to()).isBetween(1.0, 1.2);
        assertThat(Range.of(DoubleStream.of(1, 2), 5).to()).isEqualTo(5);
        assertThat(Range.of(DoubleStream.empty())).isEqualTo(new Range(0, 1, false, false));
        Range one = Range.of(DoubleStream.of(7, 7));
        assertThat(one.from()).isLessThan(7);
        assertThat(one.to()).isGreaterThan(7);
    }

    @Test
    void labelsMoveApartNoFurtherThanTheyHaveTo() {
        assertThat(Spread.apart(new double[] {10, 40, 90}, new double[] {10, 10, 10}, 2, 0, 100))
                .containsExactly(10, 40, 90);
        assertThat(Spread.apart(new double[] {50, 50}, new double[] {10, 10}, 2, 0, 100))
                .containsExactly(44, 56);
        assertThat(Spread.apart(new double[] {0, 100}, new double[] {10, 10}, 2, 0, 100))
                .containsExactly(5, 95);
        assertThat(Spread.apart(new double[] {1, 2, 3}, new double[] {40, 40, 40}, 0, 0, 100))
                .isEmpty();
    }

    @Test
    void labelsNeverTouchWhateverTheirPlaces() {
        Random random = new Random(11);
        for (int round = 0; round < 300; round++) {
            int n = 1 + random.nextInt(8);
            double[] wishes = random.doubles(n, -20, 320).sorted().toArray();
            double[] sizes = random.doubles(n, 4, 30).toArray();
            double[] middles = Spread.apart(wishes, sizes, 3, 0, 300);
            assertThat(middles).hasSize(n);
            // Rounding of places up to 300 px.
            assertThat(middles[0] - sizes[0] / 2).isGreaterThanOrEqualTo(-1e-9);
            assertThat(middles[n - 1] + sizes[n - 1] / 2).isLessThanOrEqualTo(300 + 1e-9);
            for (int i = 1; i < n; i++) {
                double apart = middles[i] - middles[i - 1] - (sizes[i] + sizes[i - 1]) / 2;
                assertThat(apart).isGreaterThanOrEqualTo(3 - 1e-9);
            }
        }
        assertThat(Spread.apart(new double[] {7}, new double[] {4}, 3, 0, 300)[0])
                .isCloseTo(7, within(1e-12));
    }
}
