package twofold.edit;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import twofold.cavity.Cavity;
import twofold.cavity.State;
import twofold.design.Design;
import twofold.design.Hold;
import twofold.design.Lever;
import twofold.design.Names;
import twofold.layout.Clearance;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.layout.Outcome;
import twofold.optics.Plane;
import twofold.study.Levered;

/** Starting shapes over random values: inside a zone in both planes, or refused with words that help. */
class StartingShapePropertyTest {
    private static final int DRAWS = 60;

    private static Cavity solved(Design design) {
        Outcome<Laid> laid = Layout.of(design);
        assertThat(laid.problems()).isEmpty();
        return Cavity.solve(laid.value().orElseThrow());
    }

    private static void stable(Cavity cavity) {
        for (Plane plane : Plane.values()) {
            assertThat(cavity.mode(plane).state()).as(plane.toString()).isEqualTo(State.STABLE);
        }
    }

    @ParameterizedTest
    @EnumSource
    void aPersonMayMakeOneAtOnce(StartingShape shape) {
        for (CrystalCut cut : shape.cuts()) {
            Cavity cavity =
                    solved(shape.make(shape.defaults().with(cut)).value().orElseThrow());
            stable(cavity);
            assertThat(cavity.clearance().smallest(1))
                    .as("gaps of %s with %s", shape, cut)
                    .extracting(Clearance.Gap::gap)
                    .allSatisfy(gap -> assertThat(gap).isGreaterThanOrEqualTo(0));
        }
    }

    @ParameterizedTest
    @EnumSource
    void leversMoveAndTheCrystalsLegIsHeld(StartingShape shape) {
        for (CrystalCut cut : shape.cuts()) {
            Laid laid = solved(shape.make(shape.defaults().with(cut)).value().orElseThrow())
                    .laid();
            assertThat(laid.design().levers()).isNotEmpty();
            for (Lever lever : laid.design().levers()) {
                Lever.Range.Span span = (Lever.Range.Span) lever.range();
                for (double value : new double[] {span.from(), span.to()}) {
                    assertThat(Levered.of(laid, List.of(lever), value).problems())
                            .as("%s of %s with %s at %s", lever.name(), shape, cut, value)
                            .isEmpty();
                }
            }
            assertThat(laid.design().holds())
                    .hasSize(cut == CrystalCut.NONE ? 0 : 1)
                    .allMatch(Hold.Leg.class::isInstance);
        }
    }

    @ParameterizedTest
    @EnumSource
    void everyValueInRangeGivesAStableCavityOrWords(StartingShape shape) {
        SplittableRandom random = new SplittableRandom(20_261_201L);
        int made = 0;
        for (int i = 0; i < DRAWS; i++) {
            StartingValues values = drawn(shape, random);
            Outcome<Design> outcome = shape.make(values);
            if (outcome.value().isPresent()) {
                made++;
                stable(solved(outcome.value().get()));
                continue;
            }
            assertThat(outcome.problems()).as("%s", values).isNotEmpty().allSatisfy(p -> {
                assertThat(p.found()).startsWith("found ");
                assertThat(p.accepted()).isNotEmpty();
            });
        }
        assertThat(made).as("made of %s", DRAWS).isGreaterThan(DRAWS / 10);
    }

    @ParameterizedTest
    @EnumSource
    void whatIsNamedInsteadDoes(StartingShape shape) {
        SplittableRandom random = new SplittableRandom(4711L);
        int named = 0;
        for (int i = 0; i < DRAWS && named < 4; i++) {
            StartingValues values = drawn(shape, random);
            if (!shape.problems(values).isEmpty() || shape.make(values).value().isPresent()) {
                continue;
            }
            for (StartingNearby.Nearby nearby : StartingNearby.of(shape, values)) {
                named++;
                StartingValues other = values.with(nearby.input(), nearby.value());
                assertThat(shape.make(other).value())
                        .as("%s: %s", values, nearby)
                        .isPresent();
            }
        }
        assertThat(named).isPositive();
    }

    private static StartingValues drawn(StartingShape shape, SplittableRandom random) {
        StartingValues values = shape.defaults()
                .with(shape.cuts().get(random.nextInt(shape.cuts().size())))
                .withIndex(1.3 + random.nextDouble());
        for (StartingInput input : shape.inputs()) {
            double low = Math.log(input.least());
            double high = Math.log(Math.min(input.most(), input == StartingInput.CRYSTAL_LENGTH ? 0.03 : 3));
            double value = Math.exp(low + (high - low) * random.nextDouble());
            boolean flat = input.form() == StartingInput.Form.RADIUS && random.nextDouble() < 0.4;
            boolean convex = input.form() == StartingInput.Form.RADIUS && random.nextDouble() < 0.3;
            boolean absent = input.form() == StartingInput.Form.OPTIONAL && random.nextBoolean();
            if (input != StartingInput.WAVELENGTH && !absent) {
                values = values.with(input, flat ? Double.POSITIVE_INFINITY : convex ? -value : value);
            }
        }
        return values;
    }

    @Test
    void aValueOutOfRangeIsToldByItsInput() {
        StartingValues values = StartingShape.Z
                .defaults()
                .with(StartingInput.FOLD_1, -0.1)
                .with(StartingInput.ARM_2, Double.NaN)
                .without(StartingInput.ARM_1)
                .withMaterial("saphire e");
        assertThat(StartingShape.Z.make(values).problems())
                .extracting(p -> p.line())
                .containsExactlyInAnyOrder(
                        "radius of Fold 1: found -100.00 mm; accepted: from 5 to 10000 mm",
                        "first arm: found nothing; accepted: from 5 to 10000 mm",
                        "second arm: found NaN mm; accepted: from 5 to 10000 mm");
        Outcome<Design> misspelled =
                StartingShape.Z.make(StartingShape.Z.defaults().withMaterial("saphire e"));
        assertThat(misspelled.problems())
                .singleElement()
                .satisfies(p -> assertThat(p.line()).startsWith("material: ").contains("sapphire e"));
        assertThat(StartingShape.TRIANGLE
                        .make(StartingShape.TRIANGLE.defaults().with(CrystalCut.BREWSTER))
                        .problems())
                .extracting(p -> p.line())
                .containsExactly("crystal: found Brewster's angle; accepted: no crystal, normal incidence");
    }

    @Test
    void everyInputHasWordsAndADefaultWithinItsLimits() {
        for (StartingShape shape : StartingShape.values()) {
            assertThat(shape.inputs().stream().map(StartingInput::words)).doesNotHaveDuplicates();
            for (StartingInput input : shape.inputs()) {
                assertThat(Names.accepts(input.words())).isTrue();
                shape.defaults()
                        .find(input)
                        .ifPresent(v ->
                                assertThat(input.accepts(v)).as(input.words()).isTrue());
            }
        }
    }
}
