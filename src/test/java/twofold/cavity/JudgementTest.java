package twofold.cavity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.DoubleStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import twofold.Samples;
import twofold.design.Bound;
import twofold.design.Design;
import twofold.design.Lever;
import twofold.design.Place;
import twofold.design.Planes;
import twofold.design.Quantity;
import twofold.design.Requirement;
import twofold.layout.Layout;

/** Margins by hand, the worse of two planes, wishes, and the worst over a range. */
class JudgementTest {
    private static Requirement asked(Quantity what, Bound bound) {
        return new Requirement(what, Optional.empty(), Optional.empty(), Optional.empty(), bound, Optional.empty());
    }

    /** Distance to the nearest bound over half the width, over within, over |bound|, or over 1 in the unit of a file. */
    static List<Arguments> margins() {
        return List.of(
                Arguments.of(new Bound.Between(0.01, 0.03), 0.02, 1.0),
                Arguments.of(new Bound.Between(0.01, 0.03), 0.015, 0.5),
                Arguments.of(new Bound.Between(0.01, 0.03), 0.03, 0.0),
                Arguments.of(new Bound.Between(0.01, 0.03), 0.05, -2.0),
                Arguments.of(new Bound.Equal(0.1, 0.004), 0.1, 1.0),
                Arguments.of(new Bound.Equal(0.1, 0.004), 0.103, 0.25),
                Arguments.of(new Bound.Equal(0.1, 0.004), 0.092, -1.0),
                Arguments.of(new Bound.AtLeast(0.2), 0.25, 0.25),
                Arguments.of(new Bound.AtLeast(-0.2), -0.25, -0.25),
                Arguments.of(new Bound.AtMost(0.2), 0.15, 0.25),
                Arguments.of(new Bound.AtLeast(0), 0.0025, 2.5),
                Arguments.of(new Bound.AtMost(0), 0.0025, -2.5));
    }

    @ParameterizedTest
    @MethodSource("margins")
    void marginsAreThoseByHand(Bound bound, double value, double margin) {
        // Values of plan_width_mm, in m.
        assertThat(Judgement.margin(asked(Quantity.PLAN_WIDTH, bound), value)).isCloseTo(margin, within(1e-12));
    }

    private static Chain chain(Design design) {
        return Chain.of(Layout.of(design).value().orElseThrow());
    }

    private static Judgement judge(Design design, Requirement requirement) {
        Chain chain = chain(design);
        Trial trial = chain.trial();
        trial.run();
        return Judgement.of(requirement, chain, trial);
    }

    private static Requirement stable(Planes plane, Bound bound) {
        return new Requirement(
                Quantity.STABILITY_MARGIN,
                Optional.empty(),
                Optional.of(plane),
                Optional.empty(),
                bound,
                Optional.empty());
    }

    @Test
    void bothPlanesIsTheWorse() {
        Design z = Samples.design("z-fold-rod");
        double t = judge(z, stable(Planes.TANGENTIAL, new Bound.AtLeast(0.5))).value();
        double s = judge(z, stable(Planes.SAGITTAL, new Bound.AtLeast(0.5))).value();
        assertThat(t).isNotEqualTo(s);
        assertThat(judge(z, stable(Planes.BOTH, new Bound.AtLeast(0.5))).value())
                .isEqualTo(Math.min(t, s));
        assertThat(judge(z, stable(Planes.BOTH, new Bound.AtMost(0.5))).value()).isEqualTo(Math.max(t, s));
        assertThat(judge(z, stable(Planes.BOTH, new Bound.AtLeast((t + s) / 2))).verdict())
                .isEqualTo(Judgement.Verdict.NOT_MET);
        Judgement wish = judge(z, stable(Planes.BOTH, Bound.Prefer.LARGEST));
        assertThat(wish.value()).isEqualTo(Math.min(t, s));
        assertThat(wish.margin()).isNaN();
        assertThat(wish.verdict()).isEqualTo(Judgement.Verdict.WISH);
        assertThat(judge(z, stable(Planes.BOTH, Bound.Prefer.SMALLEST)).value()).isEqualTo(Math.max(t, s));
    }

    @Test
    void undefinedIsNotMet() {
        Requirement round = new Requirement(
                Quantity.ROUNDNESS,
                Optional.of(Place.of("Fold")),
                Optional.empty(),
                Optional.empty(),
                new Bound.AtLeast(-1e9),
                Optional.empty());
        Judgement judgement = judge(Samples.design("one-plane"), round);
        assertThat(judgement.value()).isNaN();
        assertThat(judgement.margin()).isNaN();
        assertThat(judgement.verdict()).isEqualTo(Judgement.Verdict.NOT_MET);
    }

    @Test
    void overALeverTheWorstValueCounts() {
        Design v = Samples.design("v-fold-pumped");
        Requirement over = v.requirements().stream()
                .filter(r -> r.over().isPresent() && r.bound() instanceof Bound.AtLeast)
                .findFirst()
                .orElseThrow();
        // What sets levers is told apart from what judges: here a range of three values stands for it.
        Sweeper three =
                (Lever lever, Function<Chain, Reading> reading, java.util.function.DoubleUnaryOperator goodness) -> {
                    assertThat(over.over()).contains(lever.name());
                    return DoubleStream.of(0.9, 0.3, 0.6)
                            .boxed()
                            .min(java.util.Comparator.comparingDouble(goodness::applyAsDouble))
                            .orElseThrow();
                };
        Judgement judgement = Judgement.over(over, chain(v), three);
        assertThat(judgement.value()).isEqualTo(0.3);
        assertThat(judgement.verdict()).isEqualTo(Judgement.Verdict.MET);
    }
}
