package twofold.cavity;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.List;
import java.util.function.Function;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Kind;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.design.Values;
import twofold.layout.Layout;
import twofold.optics.Plane;

/**
 * Near an edge the margin and the radius are right within 100 times what one unit in the last place of any input makes of
 * them, against 60 digits from the same doubles.
 */
class NearEdgePropertyTest {
    private static final double TURN = 0.7;

    /** A cavity as a function of its numbers. */
    @SuppressWarnings("ArrayRecordComponent") // compared by nobody
    record Case(String name, double[] inputs, Function<double[], Design> design) {
        @Override
        public String toString() {
            return name;
        }
    }

    static Stream<Case> cases() {
        return Stream.of(1e-3, 1e-6, 1e-9, 1e-12)
                .flatMap(m -> Stream.of(
                        two("near plane " + m, 0.1, 4 * 0.1 / m, 4 * 0.1 / m),
                        two("near concentric " + m, 2 - m / 4, 1, 1),
                        two("near confocal " + m, 1 + Math.sqrt(m / 2), 1, 1),
                        two("near one centre on the other mirror " + m, 0.8 * (1 - m), 0.8, 2.1),
                        triangle("near plane ring " + m, 0.3 / m),
                        found("bow-tie near its lower edge " + m, 0.052, 0.054, m),
                        found("bow-tie near its upper edge " + m, 0.058, 0.061, m)));
    }

    private static Case two(String name, double length, double r1, double r2) {
        return new Case(
                name,
                new double[] {length * Math.cos(TURN), length * Math.sin(TURN), r1, r2},
                v -> Design.of(
                        name,
                        1064e-9,
                        Shape.STANDING_WAVE,
                        List.of(mirror("A", 0, 0, v[2]), mirror("B", v[0], v[1], v[3]))));
    }

    private static Case triangle(String name, double radius) {
        return new Case(
                name,
                new double[] {0.41, 0.03, 0.2, 0.33, radius},
                v -> Design.of(
                        name,
                        1064e-9,
                        Shape.RING,
                        List.of(
                                mirror("A", 0, 0, Double.POSITIVE_INFINITY),
                                mirror("B", v[0], v[1], Double.POSITIVE_INFINITY),
                                mirror("C", v[2], v[3], v[4]))));
    }

    /** A bow-tie with a crystal whose short half leg is bisected until the sagittal plane has a margin. */
    private static Case found(String name, double inside, double outside, double margin) {
        double low = inside;
        double high = outside;
        boolean falls = sagittal(high) < sagittal(low);
        for (int i = 0; i < 200; i++) {
            double mid = (low + high) / 2;
            boolean isAbove = sagittal(mid) > margin;
            if (isAbove == falls) {
                low = mid;
            } else {
                high = mid;
            }
        }
        return new Case(name, bowTie((low + high) / 2), NearEdgePropertyTest::bowTie);
    }

    private static double sagittal(double half) {
        return ManyDigits.of(bowTie(bowTie(half)), Plane.SAGITTAL).margin().doubleValue();
    }

    private static double[] bowTie(double half) {
        return new double[] {-half, 0.013, half, 0.0127, -0.16, -0.02, 0.16, -0.0204, 0.1, 0.1, half, 0.01, 1.605};
    }

    private static Design bowTie(double[] v) {
        return Design.of(
                "bow-tie",
                1064e-9,
                Shape.RING,
                List.of(
                        mirror("A", v[0], v[1], v[8]),
                        Kind.CRYSTAL.part(
                                "X",
                                Values.NONE
                                        .with(Field.ALONG, Along.at(v[10]))
                                        .with(Field.INSIDE, (Object) v[11])
                                        .with(Field.INDEX, (Object) v[12])),
                        mirror("B", v[2], v[3], v[9]),
                        mirror("C", v[4], v[5], Double.POSITIVE_INFINITY),
                        mirror("D", v[6], v[7], Double.POSITIVE_INFINITY)));
    }

    private static Part mirror(String name, double x, double y, double radius) {
        return Kind.MIRROR.part(
                name, Values.NONE.with(Field.AT, new Point(x, y)).with(Field.ROC, (Object) radius));
    }

    @ParameterizedTest
    @MethodSource("cases")
    void isRightWithinTheLastPlaceOfTheInputs(Case c) {
        Design design = c.design().apply(c.inputs());
        Cavity cavity = Cavity.solve(Layout.of(design).value().orElseThrow());
        for (Plane plane : Plane.values()) {
            BigDecimal margin = ManyDigits.of(design, plane).margin();
            if (margin.signum() <= 0) {
                continue; // the other plane of a folded cavity may be beyond its edge
            }
            double slack = sensitivity(c, d -> ManyDigits.of(d, plane).margin());
            assertThat(error(cavity.mode(plane).margin(), margin))
                    .as("%s margin %s of %s", c, plane, margin.doubleValue())
                    .isLessThanOrEqualTo(100 * slack + 1e-15 * margin.doubleValue());
            assertThat(cavity.mode(plane).state())
                    .as("%s state %s, margin %s", c, plane, margin.doubleValue())
                    .isEqualTo(State.STABLE);
            double square = cavity.mode(plane).stations().stream()
                    .filter(s -> s.part() == 0)
                    .findFirst()
                    .orElseThrow()
                    .radius();
            square = square * square * Math.PI / design.wavelength();
            BigDecimal exact = ManyDigits.of(design, plane).squaredRadius();
            double slackSquare = sensitivity(c, d -> ManyDigits.of(d, plane).squaredRadius());
            assertThat(error(square, exact))
                    .as("%s squared radius %s", c, plane)
                    .isLessThanOrEqualTo(100 * slackSquare + 1e-14 * exact.doubleValue());
        }
    }

    private static double error(double got, BigDecimal exact) {
        return new BigDecimal(got).subtract(exact).abs().doubleValue();
    }

    /** The most that one unit in the last place of one input changes a result by. */
    private static double sensitivity(Case c, Function<Design, BigDecimal> result) {
        BigDecimal here = result.apply(c.design().apply(c.inputs()));
        return IntStream.range(0, c.inputs().length)
                .mapToDouble(i -> {
                    double[] moved = c.inputs().clone();
                    moved[i] += Math.ulp(moved[i]);
                    try {
                        return result.apply(c.design().apply(moved))
                                .subtract(here)
                                .abs()
                                .doubleValue();
                    } catch (ArithmeticException beyondTheEdge) {
                        return here.abs().doubleValue();
                    }
                })
                .max()
                .orElseThrow();
    }

    @Test
    void theCasesReachTheEdge() {
        List<Double> margins = cases().map(c -> {
                    Design design = c.design().apply(c.inputs());
                    return ManyDigits.of(design, Plane.SAGITTAL).margin().doubleValue();
                })
                .toList();
        assertThat(margins).allSatisfy(m -> assertThat(m).isPositive());
        assertThat(margins.stream().filter(m -> m < 3e-12).count()).isGreaterThanOrEqualTo(6);
    }
}
