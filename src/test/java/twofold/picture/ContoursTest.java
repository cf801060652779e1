package twofold.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.function.DoubleBinaryOperator;
import org.junit.jupiter.api.Test;

/** Lines of equal value against curves that are known. */
class ContoursTest {
    private static Contours of(int columns, int rows, DoubleBinaryOperator value) {
        double[] xs = Plots.steps(-10, 10, columns);
        double[] ys = Plots.steps(-10, 10, rows);
        double[] values = new double[columns * rows];
        for (int i = 0; i < values.length; i++) {
            values[i] = value.applyAsDouble(xs[i % columns], ys[i / columns]);
        }
        return new Contours(xs, ys, values);
    }

    @Test
    void aSlopesLineIsStraightAndExact() {
        List<Points> lines = of(9, 13, (x, y) -> 2 * x + y).at(3);
        assertThat(lines).hasSize(1);
        Points line = lines.get(0);
        assertThat(line.size()).isGreaterThan(12);
        for (int i = 0; i < line.size(); i++) {
            // Exact but for rounding of numbers up to 30.
            assertThat(2 * line.x(i) + line.y(i)).isCloseTo(3, within(1e-13));
        }
    }

    @Test
    void aCircleClosesOnItself() {
        double step = 20.0 / 80;
        List<Points> lines = of(81, 81, (x, y) -> x * x + y * y).at(36);
        assertThat(lines).hasSize(1);
        Points line = lines.get(0);
        int last = line.size() - 1;
        assertThat(line.x(0)).isEqualTo(line.x(last));
        assertThat(line.y(0)).isEqualTo(line.y(last));
        double length = 0;
        for (int i = 1; i <= last; i++) {
            // A chord of x² is off by up to step²/4, which along a slope of at least 2r/√2 is this length.
            assertThat(Math.hypot(line.x(i), line.y(i)))
                    .isCloseTo(6, within(step * step / 4 / (2 * 6 / Math.sqrt(2)) + 1e-12));
            length += Math.hypot(line.x(i) - line.x(i - 1), line.y(i) - line.y(i - 1));
        }
        assertThat(length).isCloseTo(12 * Math.PI, within(0.02));
    }

    @Test
    void aSaddleHasTwoBranchesThatDoNotCross() {
        for (double level : new double[] {-4, 4}) {
            List<Points> lines = of(12, 12, (x, y) -> x * y).at(level);
            assertThat(lines).hasSize(2);
            for (Points line : lines) {
                for (int i = 1; i < line.size(); i++) {
                    assertThat(Math.signum(line.x(i))).isEqualTo(Math.signum(line.x(0)));
                }
            }
        }
        // On one square alone, where the mean of the corners decides.
        assertThat(of(2, 2, (x, y) -> x * y).at(1)).hasSize(2);
    }

    @Test
    void whatIsUndefinedHasNoLine() {
        List<Points> lines =
                of(41, 41, (x, y) -> Math.hypot(x, y) < 3 ? Double.NaN : x).at(0.1);
        assertThat(lines).hasSize(2);
        for (Points line : lines) {
            for (int i = 0; i < line.size(); i++) {
                assertThat(Math.abs(line.y(i))).isGreaterThanOrEqualTo(2.9);
            }
        }
        assertThat(of(5, 5, (x, y) -> x).at(99)).isEmpty();
        assertThat(of(1, 1, (x, y) -> x).at(0)).isEmpty();
    }

    @Test
    void bandsHaveLinesOfTheirOwnAndOneOutline() {
        double[] xs = Plots.steps(-10, 10, 21);
        // Two bands, each 10 px high, whose values differ by 4 px.
        double[] ys = {0, 10 - 1e-6, 10 + 1e-6, 20};
        double[] values = new double[xs.length * ys.length];
        for (int i = 0; i < values.length; i++) {
            values[i] = xs[i % xs.length] + (i / xs.length < 2 ? 0 : 4);
        }
        Contours contours = new Contours(xs, ys, values);
        List<Points> lines = contours.at(0.5);
        assertThat(lines).hasSize(2);
        for (Points line : lines) {
            assertThat(line.x(0)).isEqualTo(line.x(1), within(1e-12));
        }
        assertThat(contours.outline(0.5)).hasSize(1);
    }
}
