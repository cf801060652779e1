package twofold.edit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import twofold.cavity.Judgement;
import twofold.design.Bound;
import twofold.design.Quantity;
import twofold.design.Requirement;

/** Bounds to begin with, and bounds made of others. */
class BoundKindTest {
    private static Requirement with(Quantity what, Bound bound) {
        return new Requirement(what, Optional.empty(), Optional.empty(), Optional.empty(), bound, Optional.empty());
    }

    private static boolean isValid(Bound bound) {
        return bound instanceof Bound.Between b
                ? b.low() < b.high()
                : !(bound instanceof Bound.Equal e) || e.within() > 0;
    }

    @ParameterizedTest
    @EnumSource(Quantity.class)
    void whatABoundBeginsWithIsMet(Quantity what) {
        Random random = new Random(20260112);
        for (int i = 0; i < 200; i++) {
            double a = what.unit().toSi((random.nextDouble() - 0.5) * Math.pow(10, random.nextInt(7) - 3));
            double b = random.nextBoolean() ? a : a * random.nextDouble();
            Bound bound = BoundKind.starting(what, List.of(a, b));
            assertThat(isValid(bound)).as("%s for %s and %s", bound, a, b).isTrue();
            for (double value : List.of(a, b)) {
                // A bound of a few digits lies up to the rounding of the margin's own arithmetic beside the value.
                assertThat(Judgement.margin(with(what, bound), value))
                        .as("%s at %s", bound, value)
                        .isGreaterThan(-1e-12);
            }
        }
        assertThat(isValid(BoundKind.starting(what, List.of(Double.NaN)))).isTrue();
        assertThat(isValid(BoundKind.starting(what, List.of(0.0)))).isTrue();
    }

    @Test
    void everyKindIsMadeOfEveryOther() {
        for (BoundKind was : BoundKind.values()) {
            for (BoundKind is : BoundKind.values()) {
                for (double value : new double[] {0, 0.7, -3, Double.NaN}) {
                    Bound before = was.like(new Bound.AtLeast(0.5), Quantity.ROUNDNESS, value);
                    Bound after = is.like(before, Quantity.ROUNDNESS, value);
                    assertThat(BoundKind.of(after)).isEqualTo(is);
                    assertThat(isValid(after)).as("%s of %s", after, before).isTrue();
                }
            }
        }
    }

    @Test
    void numbersAreKept() {
        Bound between = new Bound.Between(0.2, 0.4);
        assertThat(BoundKind.AT_LEAST.like(between, Quantity.ROUNDNESS, 1)).isEqualTo(new Bound.AtLeast(0.2));
        assertThat(BoundKind.AT_MOST.like(between, Quantity.ROUNDNESS, 1)).isEqualTo(new Bound.AtMost(0.4));
        Bound.Equal equal = (Bound.Equal) BoundKind.EQUALS.like(between, Quantity.ROUNDNESS, 1);
        // The middle and half the width, to the rounding of a sum of doubles.
        assertThat(equal.value()).isCloseTo(0.3, within(1e-15));
        assertThat(equal.within()).isCloseTo(0.1, within(1e-15));
        assertThat(BoundKind.BETWEEN.like(new Bound.AtMost(2), Quantity.ROUNDNESS, 1))
                .isEqualTo(new Bound.Between(1.8, 2));
    }
}
