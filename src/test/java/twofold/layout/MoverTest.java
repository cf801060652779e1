package twofold.layout;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import twofold.Samples;
import twofold.Sketch;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Hold;
import twofold.design.Kind;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.design.Values;

/** Setting legs and incidences by moving mirrors. */
class MoverTest {
    /** What is promised: 1e-9 mm and 1e-9 rad. */
    private static final double LENGTH = 1e-12;

    private static final double ANGLE = 1e-9;

    private static Design ring(double... xy) {
        List<Part> mirrors = new java.util.ArrayList<>();
        for (int i = 0; i < xy.length; i += 2) {
            mirrors.add(Kind.MIRROR.part("M" + i / 2, Values.NONE.with(Field.AT, new Point(xy[i], xy[i + 1]))));
        }
        return Design.of("ring", 1e-6, Shape.RING, mirrors);
    }

    private static Design bowTie() {
        return ring(-0.06, 0, 0.06, 0, -0.08, 0.04, 0.08, 0.04);
    }

    private static Design z() {
        return new Sketch()
                .flat("A")
                .go(0.5)
                .mirror("F1", 0.1)
                .left(Math.toRadians(8))
                .go(0.105)
                .mirror("F2", 0.1)
                .right(Math.toRadians(8))
                .go(0.6)
                .flat("B")
                .standingWave(8e-7);
    }

    private static Hold leg(String a, String b) {
        return new Hold.Leg(Place.of(a, b));
    }

    private static Mover one(Laid laid, Target... targets) {
        return Mover.of(laid, List.of(List.of(targets)));
    }

    @Test
    void aLegOfAStandingWaveMovesTheArmBeyondAlongIt() {
        Laid laid = Moved.laid(z());
        Laid moved = Moved.layout(laid, one(laid, new Target.Leg(1)), 0.11).orElseThrow();
        assertThat(Moved.path(moved, 1)).isCloseTo(0.11, within(LENGTH));
        Point u = laid.legs().get(1).heading();
        for (int mirror = 0; mirror < 4; mirror++) {
            double by = mirror < 2 ? 0 : 0.11 - Moved.path(laid, 1);
            Point from = Moved.places(laid).get(mirror);
            assertThat(Moved.places(moved)
                            .get(mirror)
                            .distance(new Point(from.x() + by * u.x(), from.y() + by * u.y())))
                    .isCloseTo(0, within(1e-15));
        }
    }

    @Test
    void aPinnedEndTurnsTheMovementRound() {
        Laid laid = Moved.laid(Moved.with(z(), List.of(new Hold.Position("B"))));
        Mover leg = one(laid, new Target.Leg(1));
        assertThat(leg.isClosedForm()).isTrue();
        Laid longer = Moved.layout(laid, leg, 0.11).orElseThrow();
        assertThat(Moved.places(longer).subList(2, 4))
                .isEqualTo(Moved.places(laid).subList(2, 4));
        assertThat(Moved.path(longer, 1)).isCloseTo(0.11, within(LENGTH));
        Laid turned =
                Moved.layout(laid, one(laid, new Target.Incidence(1)), 0.2).orElseThrow();
        assertThat(Moved.places(turned).subList(1, 4))
                .isEqualTo(Moved.places(laid).subList(1, 4));
        assertThat(Moved.incidence(turned, 1)).isCloseTo(0.2, within(1e-14));
        assertThat(Moved.incidence(turned, 2)).isCloseTo(Math.toRadians(8), within(1e-14));
    }

    @Test
    void foldsSetTogetherKeepTheArmsParallel() {
        Laid laid = Moved.laid(Moved.with(z(), List.of(new Hold.Direction(Place.of("F2", "B")))));
        Mover both = one(laid, new Target.Incidence(1), new Target.Incidence(2));
        assertThat(both.isClosedForm()).isTrue();
        Laid moved = Moved.layout(laid, both, 0.2).orElseThrow();
        assertThat(Moved.direction(moved, 2)).isCloseTo(Moved.direction(laid, 2), within(1e-14));
        assertThat(Moved.incidence(moved, 1)).isCloseTo(0.2, within(1e-14));
        assertThat(Moved.incidence(moved, 2)).isCloseTo(0.2, within(1e-14));
        // One fold alone turns the free arm, which is the one before it.
        Laid single =
                Moved.layout(laid, one(laid, new Target.Incidence(1)), 0.2).orElseThrow();
        assertThat(Moved.direction(single, 2)).isEqualTo(Moved.direction(laid, 2));
        assertThat(Moved.incidence(single, 2)).isCloseTo(Math.toRadians(8), within(1e-14));
    }

    @Test
    void pinsOnBothSidesLeaveTheLeastMovement() {
        List<Hold> pins = List.of(new Hold.Position("A"), new Hold.Position("B"));
        Laid laid = Moved.laid(Moved.with(z(), pins));
        Mover mover = one(laid, new Target.Leg(1));
        assertThat(mover.isClosedForm()).isFalse();
        Laid moved = Moved.layout(laid, mover, 0.11).orElseThrow();
        assertThat(Moved.path(moved, 1)).isCloseTo(0.11, within(LENGTH));
        assertThat(Moved.places(moved).get(0)).isEqualTo(Moved.places(laid).get(0));
        assertThat(Moved.places(moved).get(3)).isEqualTo(Moved.places(laid).get(3));
        // Free folds share the way: each goes half of it along the leg between them.
        for (int mirror = 1; mirror < 3; mirror++) {
            assertThat(Moved.places(moved)
                            .get(mirror)
                            .distance(Moved.places(laid).get(mirror)))
                    .isCloseTo(0.0025, within(LENGTH));
        }
    }

    @Test
    void aHeldRoundTripIsKept() {
        Laid laid = Moved.laid(Moved.with(z(), List.of(new Hold.RoundTrip())));
        Laid moved = Moved.layout(laid, one(laid, new Target.Leg(1)), 0.11).orElseThrow();
        assertThat(Moved.path(moved, 1)).isCloseTo(0.11, within(LENGTH));
        assertThat(Moved.path(moved, 0) + Moved.path(moved, 1) + Moved.path(moved, 2))
                .isCloseTo(Moved.path(laid, 0) + Moved.path(laid, 1) + Moved.path(laid, 2), within(LENGTH));
    }

    @Test
    void whatIsSetOutrightIsHeldAtItsNewValue() {
        Laid laid = Moved.laid(Moved.with(bowTie(), List.of(leg("M0", "M1"), leg("M2", "M3"))));
        Laid moved = Moved.layout(laid, one(laid, new Target.Leg(0)), 0.13).orElseThrow();
        assertThat(Moved.path(moved, 0)).isCloseTo(0.13, within(LENGTH));
        assertThat(Moved.path(moved, 2)).isCloseTo(Moved.path(laid, 2), within(LENGTH));
    }

    @Test
    void aBowTieOfFourHeldLegsIsALinkage() {
        Design held = Moved.with(bowTie(), List.of(leg("M0", "M1"), leg("M1", "M2"), leg("M2", "M3"), leg("M3", "M0")));
        Laid laid = Moved.laid(held);
        Mover mover = one(laid, new Target.Incidence(0));
        double present = Moved.incidence(laid, 0);
        Laid moved = Moved.layout(laid, mover, present + 0.02).orElseThrow();
        for (int leg = 0; leg < 4; leg++) {
            assertThat(Moved.path(moved, leg)).isCloseTo(Moved.path(laid, leg), within(LENGTH));
        }
        assertThat(Moved.incidence(moved, 0)).isCloseTo(present + 0.02, within(ANGLE));
        // Two angles of a linkage cannot be chosen apart.
        Mover two = Mover.of(laid, List.of(List.of(new Target.Incidence(0)), List.of(new Target.Incidence(2))));
        Move.Refused refused = (Move.Refused) two.explain(present + 0.02, Moved.incidence(laid, 2));
        assertThat(refused.holds()).isNotEmpty().isSubsetOf(held.holds());
        assertThat(refused.words())
                .contains("no layout has an incidence at M0 of")
                .contains("the leg M");
    }

    /** A four-bar linkage turns until two of its legs lie in line; the diagonal then is known (law of cosines). */
    @Test
    void aLinkageSaysHowFarItReaches() {
        Design held = Moved.with(bowTie(), List.of(leg("M0", "M1"), leg("M1", "M2"), leg("M2", "M3"), leg("M3", "M0")));
        Laid laid = Moved.laid(held);
        double a = Moved.path(laid, 1);
        double b = Moved.path(laid, 2);
        double stretched = Moved.path(laid, 3) + Moved.path(laid, 0);
        double folded = Moved.path(laid, 3) - Moved.path(laid, 0);
        // The angle between the legs at M2 is twice the incidence.
        double most = Math.acos((a * a + b * b - stretched * stretched) / (2 * a * b)) / 2;
        double least = Math.acos((a * a + b * b - folded * folded) / (2 * a * b)) / 2;
        Mover mover = one(laid, new Target.Incidence(2));
        for (double limit : new double[] {most, least}) {
            double beyond = limit == most ? most + 0.02 : least - 0.02;
            Move.Refused refused = (Move.Refused) mover.explain(beyond);
            assertThat(refused.holds()).containsExactlyInAnyOrderElementsOf(held.holds());
            // Near the limit the plan moves by the root of what is missing, so legs kept to 1e-12 m tell it to 1e-9.
            assertThat(refused.nearest().orElseThrow()).isCloseTo(limit, within(1e-9));
            assertThat(refused.words()).contains("the closest is");
        }
        assertThat(mover.explain(most - 1e-4)).isInstanceOf(Move.Moved.class);
    }

    @Test
    void theAnglesOfATriangleFollowFromItsLengths() {
        Design triangle = ring(0, 0, 0.04, 0, 0.02, 0.2);
        Design held =
                Moved.with(triangle, List.of(leg("M0", "M1"), leg("M1", "M2"), leg("M2", "M0"), new Hold.RoundTrip()));
        Laid laid = Moved.laid(held);
        Move.Refused refused = (Move.Refused) one(laid, new Target.Incidence(0)).explain(0.6);
        assertThat(refused.words()).contains("in a triangle the angles follow from the three lengths");
        assertThat(refused.holds()).hasSize(3).contains(leg("M0", "M1"));
        assertThat(refused.nearest().orElseThrow()).isCloseTo(Moved.incidence(laid, 0), within(1e-6));
        // With nothing held it goes, and the others make up for it.
        Laid free = Moved.laid(triangle);
        Laid moved = Moved.layout(free, one(free, new Target.Incidence(0)), 0.7).orElseThrow();
        assertThat(Moved.incidence(moved, 0)).isCloseTo(0.7, within(ANGLE));
        assertThat(Moved.incidence(moved, 0) + Moved.incidence(moved, 1) + Moved.incidence(moved, 2))
                .isCloseTo(Math.PI / 2, within(1e-14));
        assertThat(((Move.Refused) one(free, new Target.Incidence(0)).explain(Math.toRadians(89.5))).holds())
                .isEmpty();
    }

    @Test
    void holdsInTheWayAreNamedAndOthersAreNot() {
        List<Hold> holds = List.of(
                new Hold.Incidence("M2"), new Hold.Position("M0"), new Hold.RoundTrip(), new Hold.Position("M1"));
        Laid laid = Moved.laid(Moved.with(bowTie(), holds));
        Move.Refused refused = (Move.Refused) one(laid, new Target.Leg(0)).explain(0.13);
        assertThat(refused.holds()).containsExactly(new Hold.Position("M0"), new Hold.Position("M1"));
        assertThat(refused.nearest().orElseThrow()).isCloseTo(0.12, within(1e-9));
        assertThat(refused.words())
                .isEqualTo("no layout has the leg M0/M1 at 130 mm: in the way stand the holds of the place of M0, the"
                        + " place of M1; the closest is 120 mm");
    }

    @Test
    void aSymmetricRingStaysSymmetric() {
        for (Design design : List.of(bowTie(), Samples.design("bow-tie-doubler"), ring(0, 0, 0.04, 0, 0.02, 0.2))) {
            Laid laid = Moved.laid(Moved.with(
                    design, List.of(new Hold.Position(design.mirrors().get(0).name()))));
            Laid moved = Moved.layout(laid, one(laid, new Target.Incidence(1)), Moved.incidence(laid, 1) + 0.01)
                    .orElseThrow();
            assertThat(Moved.incidence(moved, 0)).isCloseTo(Moved.incidence(moved, 1), within(ANGLE));
            int last = moved.legs().size() - 1;
            assertThat(Moved.path(moved, 1)).isCloseTo(Moved.path(moved, last), within(LENGTH));
        }
    }

    @Test
    void aHoldThatBreaksTheSymmetryWins() {
        Laid laid = Moved.laid(Moved.with(bowTie(), List.of(leg("M1", "M2"))));
        Laid moved = Moved.layout(laid, one(laid, new Target.Leg(3)), 0.15).orElseThrow();
        assertThat(Moved.path(moved, 1)).isCloseTo(Moved.path(laid, 1), within(LENGTH));
        assertThat(Moved.path(moved, 3)).isCloseTo(0.15, within(LENGTH));
    }

    /** Nothing but a place: that mirror goes there alone. */
    @Test
    void aCoordinateMovesItsMirrorAlone() {
        Laid laid = Moved.laid(Samples.design("triangle-ring"));
        Mover mover = one(laid, new Target.Y(2));
        assertThat(mover.isClosedForm()).isTrue();
        Laid moved = Moved.layout(laid, mover, 0.22).orElseThrow();
        assertThat(Moved.places(moved).get(2)).isEqualTo(new Point(0.02, 0.22));
        assertThat(Moved.places(moved).subList(0, 2))
                .isEqualTo(Moved.places(laid).subList(0, 2));
    }

    @Test
    void aCoordinateUnderAHeldLegTakesTheNeighbourAlong() {
        Laid laid = Moved.laid(Moved.with(bowTie(), List.of(leg("M0", "M1"))));
        Laid moved = Moved.layout(laid, one(laid, new Target.X(0)), -0.07).orElseThrow();
        assertThat(Moved.places(moved).get(0).x()).isCloseTo(-0.07, within(LENGTH));
        assertThat(Moved.path(moved, 0)).isCloseTo(0.12, within(LENGTH));
    }
}
