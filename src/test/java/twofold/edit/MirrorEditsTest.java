package twofold.edit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static twofold.edit.Edited.by;
import static twofold.edit.Edited.names;
import static twofold.edit.Edited.refusal;
import static twofold.edit.Edited.sample;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import twofold.design.Design;
import twofold.design.Hold;
import twofold.design.Place;
import twofold.design.Point;
import twofold.design.Turn;
import twofold.layout.Follow;
import twofold.layout.Laid;

class MirrorEditsTest {
    /** Rounding of plans of about 1 m, some hundred units in the last place: m, rad. */
    private static final double ROUNDING = 1e-12;

    /** What iterations under holds reach, as the mover promises: 1e-9 mm. */
    private static final double REACHED = 1e-12;

    private final Laid z = sample("z-fold-rod");

    static Laid holding(Laid laid, Hold... holds) {
        return Edited.laid(laid.design().withHolds(List.of(holds)));
    }

    private static double wrapped(double angle) {
        return Math.IEEEremainder(angle, 2 * Math.PI);
    }

    /** A reflection at an incidence of 10° turns the beam by 180° − 20°. */
    @ParameterizedTest
    @EnumSource(Turn.class)
    void aNewFoldTurnsTheArmBeyondAsAWhole(Turn side) {
        Laid bare = holding(z);
        Laid folded = by(MirrorEdits.insert(Place.of("End A", "Fold 1"), 0.2, side), bare);

        assertThat(names(folded)).containsExactly("End A", "Mirror 1", "Fold 1", "Rod", "Fold 2", "Output coupler");
        assertThat(Edited.incidence(folded, "Mirror 1")).isCloseTo(Math.toRadians(10), within(ROUNDING));
        assertThat(wrapped(Edited.direction(folded, 1) - Edited.direction(folded, 0)))
                .isCloseTo(side.sign() * Math.toRadians(160), within(ROUNDING));
        assertThat(Edited.at(folded, "End A")).isEqualTo(Edited.at(bare, "End A"));
        assertThat(folded.legs().get(0).path()).isCloseTo(0.2, within(ROUNDING));
        assertThat(folded.legs().get(1).path()).isCloseTo(bare.legs().get(0).path() - 0.2, within(ROUNDING));
        for (int leg = 1; leg < 3; leg++) {
            assertThat(folded.legs().get(leg + 1).path())
                    .isCloseTo(bare.legs().get(leg).path(), within(ROUNDING));
            assertThat(wrapped(Edited.direction(folded, leg + 1) - Edited.direction(bare, leg)))
                    .isCloseTo(side.sign() * Math.toRadians(160), within(ROUNDING));
        }
        for (String fold : List.of("Fold 1", "Fold 2")) {
            assertThat(Edited.incidence(folded, fold)).isCloseTo(Edited.incidence(bare, fold), within(ROUNDING));
        }
    }

    @Test
    void takingTheNewFoldOutGivesThePlanBack() {
        for (String sample : List.of("z-fold-rod", "x-fold", "v-fold-pumped")) {
            Laid before = sample(sample);
            for (int leg = 0; leg < before.legs().size(); leg++) {
                Design d = before.design();
                Place place = Place.of(
                        d.mirrors().get(leg).name(), d.mirrors().get(leg + 1).name());
                Laid folded = by(MirrorEdits.insert(place, 0.04, Turn.RIGHT), before);
                Laid back = by(PartEdits.delete(List.of("Mirror 1")), folded);
                for (int m = 0; m < d.mirrors().size(); m++) {
                    assertThat(back.design()
                                    .mirrors()
                                    .get(m)
                                    .at()
                                    .distance(d.mirrors().get(m).at()))
                            .isLessThan(ROUNDING);
                }
                for (int k = 0; k < before.legs().size(); k++) {
                    assertThat(back.legs().get(k).path())
                            .isCloseTo(before.legs().get(k).path(), within(ROUNDING));
                    for (int p = 0; p < before.legs().get(k).parts().size(); p++) {
                        assertThat(back.legs().get(k).parts().get(p).middle())
                                .isCloseTo(before.legs().get(k).parts().get(p).middle(), within(ROUNDING));
                    }
                }
            }
        }
    }

    /** The rod of 5 mm is in the middle: a fold wanted there stands on its nearer face, on whose side the rod stays. */
    @Test
    void aFoldInsideAPartGoesToItsFace() {
        double middle = z.legs().get(1).path() / 2;
        Laid folded = by(MirrorEdits.insert(Place.of("Fold 1", "Fold 2"), middle + 1e-3, Turn.LEFT), z);

        assertThat(names(folded)).containsExactly("End A", "Fold 1", "Rod", "Mirror 1", "Fold 2", "Output coupler");
        assertThat(folded.legs().get(1).path()).isCloseTo(middle + 2.5e-3, within(ROUNDING));
        assertThat(Edited.along(folded, "Rod").path()).isCloseTo(middle, within(ROUNDING));
    }

    @Test
    void upstreamTurnsWhereDownstreamIsHeld() {
        Laid held = holding(z, new Hold.Position("Output coupler"));
        Laid folded = by(MirrorEdits.insert(Place.of("End A", "Fold 1"), 0.2, Turn.LEFT), held);

        for (String mirror : List.of("Fold 1", "Fold 2", "Output coupler")) {
            assertThat(Edited.at(folded, mirror)).isEqualTo(Edited.at(held, mirror));
        }
        assertThat(Edited.incidence(folded, "Mirror 1")).isCloseTo(Math.toRadians(10), within(ROUNDING));
    }

    @Test
    void besideTheLegInARingAndBetweenHolds() {
        Laid held = holding(z, new Hold.Position("End A"), new Hold.Position("Output coupler"));
        Laid folded = by(MirrorEdits.insert(Place.of("End A", "Fold 1"), 0.2, Turn.LEFT), held);
        Point heading = held.legs().get(0).heading();
        Point on = held.legs().get(0).at(0.2);
        assertThat(Edited.at(folded, "Mirror 1")
                        .distance(new Point(on.x() - 0.01 * heading.y(), on.y() + 0.01 * heading.x())))
                .isLessThan(ROUNDING);

        Laid ring = sample("bow-tie-doubler");
        for (int leg = 0; leg < 4; leg++) {
            String a = ring.design().mirrors().get(leg).name();
            String b = ring.design().mirrors().get((leg + 1) % 4).name();
            Laid five = by(MirrorEdits.insert(Place.of(a, b), 0.02, Turn.RIGHT), ring);
            assertThat(five.design().mirrors()).hasSize(5);
            ring.design()
                    .mirrors()
                    .forEach(m -> assertThat(Edited.at(five, m.name())).isEqualTo(m.at()));
        }
    }

    /** Everything beyond moves parallel to itself. */
    @Test
    void theArmFollowsParallelToItself() {
        Point to = new Point(0.39, 0.04);
        Laid moved = by(MirrorEdits.moveTo("Fold 2", to, Follow.ARM_FOLLOWS), holding(z));

        assertThat(Edited.at(moved, "Fold 2")).isEqualTo(to);
        assertThat(Edited.direction(moved, 2)).isCloseTo(Edited.direction(z, 2), within(ROUNDING));
        assertThat(moved.legs().get(2).path()).isCloseTo(z.legs().get(2).path(), within(ROUNDING));
    }

    @Test
    void aHeldLegKeepsADraggedMirrorOnACircle() {
        Laid held = holding(z, new Hold.Leg(Place.of("Fold 1", "Fold 2")), new Hold.Position("Fold 1"));
        Laid moved = by(MirrorEdits.moveTo("Fold 2", new Point(0.39, 0.06), Follow.ARM_FOLLOWS), held);

        assertThat(moved.legs().get(1).path()).isCloseTo(held.legs().get(1).path(), within(REACHED));
        assertThat(refusal(MirrorEdits.place("Fold 2", new Point(0.39, 0.06), Follow.ARM_FOLLOWS), held))
                .contains("stands the hold of the leg Fold 1/Fold 2");
        assertThat(refusal(MirrorEdits.moveTo("Fold 1", new Point(0.4, 0), Follow.ARM_FOLLOWS), held))
                .contains("the place of Fold 1");
    }

    @ParameterizedTest
    @EnumSource(
            value = Follow.class,
            names = {"ARM_FOLLOWS", "ARM_SWINGS", "OTHERS_STAY"})
    void aTypedLegIsAsLongAsTyped(Follow follow) {
        Laid moved = by(MirrorEdits.leg(Place.of("Fold 1", "Fold 2"), 0.11, Optional.of(follow)), holding(z));

        assertThat(moved.legs().get(1).path()).isCloseTo(0.11, within(REACHED));
        if (follow == Follow.OTHERS_STAY) {
            assertThat(Edited.at(moved, "Output coupler")).isEqualTo(Edited.at(z, "Output coupler"));
        } else {
            assertThat(Edited.direction(moved, 1)).isCloseTo(Edited.direction(z, 1), within(ROUNDING));
            assertThat(moved.legs().get(2).path()).isCloseTo(z.legs().get(2).path(), within(ROUNDING));
        }
    }

    @ParameterizedTest
    @EnumSource(
            value = Follow.class,
            names = {"ARM_FOLLOWS", "ARM_SWINGS", "OTHERS_STAY"})
    void aTypedIncidenceIsTheOneTyped(Follow follow) {
        double angle = Math.toRadians(9);
        Laid moved = by(MirrorEdits.incidence("Fold 1", angle, Optional.of(follow)), holding(z));

        assertThat(Edited.incidence(moved, "Fold 1")).isCloseTo(angle, within(1e-9));
        double change = angle - Edited.incidence(z, "Fold 1");
        if (follow == Follow.ARM_SWINGS) {
            assertThat(Edited.incidence(moved, "Fold 2")).isCloseTo(Edited.incidence(z, "Fold 2"), within(ROUNDING));
            // The turn is 180° less twice the incidence, so the arm beyond turns by twice the change.
            assertThat(Math.abs(wrapped(Edited.direction(moved, 2) - Edited.direction(z, 2))))
                    .isCloseTo(2 * Math.abs(change), within(ROUNDING));
        } else if (follow == Follow.ARM_FOLLOWS) {
            // Between parallel arms both incidences change alike.
            assertThat(Edited.incidence(moved, "Fold 2") - Edited.incidence(z, "Fold 2"))
                    .isCloseTo(change, within(ROUNDING));
            assertThat(Edited.direction(moved, 2)).isCloseTo(Edited.direction(z, 2), within(ROUNDING));
            assertThat(moved.legs().get(1).path()).isCloseTo(z.legs().get(1).path(), within(ROUNDING));
        } else {
            for (String other : List.of("End A", "Fold 2", "Output coupler")) {
                assertThat(Edited.at(moved, other)).isEqualTo(Edited.at(z, other));
            }
        }
    }

    @Test
    void partnersChangeAlike() {
        Laid x = holding(sample("x-fold"));
        List<String> names = x.design().mirrors().stream().map(m -> m.name()).toList();
        Optional<Follow> partner = Optional.of(Follow.MIRRORED_PARTNER);
        Laid moved = by(MirrorEdits.incidence(names.get(1), Math.toRadians(12), partner), x);
        assertThat(Edited.incidence(moved, names.get(1))).isCloseTo(Math.toRadians(12), within(1e-9));
        assertThat(Edited.incidence(moved, names.get(2))).isCloseTo(Math.toRadians(12), within(1e-9));

        Laid longer = by(MirrorEdits.leg(Place.of(names.get(0), names.get(1)), 0.5, partner), x);
        assertThat(longer.legs().get(0).path()).isCloseTo(0.5, within(REACHED));
        assertThat(longer.legs().get(2).path() - x.legs().get(2).path())
                .isCloseTo(0.5 - x.legs().get(0).path(), within(REACHED));
        assertThat(longer.legs().get(1).path()).isCloseTo(x.legs().get(1).path(), within(REACHED));

        Laid ring = sample("bow-tie-doubler");
        String fold = ring.design().mirrors().get(0).name();
        assertThat(refusal(MirrorEdits.incidence(fold, 0.1, Optional.of(Follow.ARM_SWINGS)), ring))
                .contains("not for this plan", "others stay");
    }

    @Test
    void whatCannotBeIsSaid() {
        Laid held = holding(z, new Hold.Position("Fold 1"), new Hold.Position("Fold 2"), new Hold.Position("End A"));
        assertThat(refusal(MirrorEdits.leg(Place.of("Fold 1", "Fold 2"), 0.12), held))
                .contains("in the way", "the hold released");
        assertThat(refusal(MirrorEdits.incidence("End A", 0.1), z)).contains("met head-on");
        assertThat(refusal(MirrorEdits.incidence("Fold 1", Math.toRadians(89)), z))
                .isNotEmpty();
        assertThat(refusal(MirrorEdits.leg(Place.of("End A", "Output coupler"), 0.1), z))
                .contains("two neighbouring mirrors");
        // A leg of 2 mm is shorter than the rod that stands on it.
        assertThat(refusal(MirrorEdits.leg(Place.of("Fold 1", "Fold 2"), 2e-3), z))
                .isNotEmpty();
    }

    @Test
    void nudgesJoin() {
        Edit nudge = Nudges.by("Fold 2", 1e-4, 0, Follow.OTHERS_STAY);
        assertThat(nudge.joins()).isTrue();
        Laid moved = by(nudge, holding(z));
        assertThat(Edited.at(moved, "Fold 2").x())
                .isEqualTo(Edited.at(z, "Fold 2").x() + 1e-4);

        double step = Math.toRadians(0.1);
        Laid turned = by(Nudges.turn("Fold 2", step), holding(z));
        assertThat(Edited.incidence(turned, "Fold 2"))
                .isCloseTo(Edited.incidence(z, "Fold 2") + step, within(ROUNDING));
        Laid swung = by(Nudges.turn("Output coupler", step), holding(z));
        assertThat(wrapped(Edited.direction(swung, 2) - Edited.direction(z, 2))).isCloseTo(step, within(ROUNDING));
        assertThat(swung.legs().get(2).path()).isCloseTo(z.legs().get(2).path(), within(ROUNDING));

        double middle = z.legs().get(1).path() / 2;
        assertThat(Edited.along(by(Nudges.along("Rod", 1e-3), z), "Rod").path())
                .isCloseTo(middle + 1e-3, within(ROUNDING));
    }

    @Test
    void facesTurnThroughZeroToTheOtherSide() {
        Laid turned = by(Nudges.turn("Rod", -Math.toRadians(61)), z);
        double brewster = z.legs().get(1).parts().get(0).incidence();
        assertThat(turned.legs().get(1).parts().get(0).incidence())
                .isCloseTo(Math.toRadians(61) - brewster, within(ROUNDING));
        assertThat(turned.legs().get(1).parts().get(0).shift()).isNegative();
    }
}
