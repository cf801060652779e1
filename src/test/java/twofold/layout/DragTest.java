package twofold.layout;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import twofold.Samples;
import twofold.design.Design;
import twofold.design.Hold;
import twofold.design.Place;
import twofold.design.Point;

/** One mirror moved to a point. */
class DragTest {
    private static final Point BY = new Point(0.004, -0.003);

    private static Laid z(Hold... holds) {
        return Moved.laid(Moved.with(Samples.design("z-fold-rod"), List.of(holds)));
    }

    private static Point at(Laid laid, int mirror) {
        return Moved.places(laid).get(mirror);
    }

    private static Point by(Point from, double times) {
        return new Point(from.x() + times * BY.x(), from.y() + times * BY.y());
    }

    private static Laid drag(Laid laid, int mirror, Point to, Follow follow) {
        Move.Moved moved = (Move.Moved) Drag.to(laid, mirror, to, follow);
        return Moved.laid(Moved.at(laid.design(), moved.places()));
    }

    @Test
    void aStandingWaveKeepsItsArmsParallel() {
        Laid laid = z();
        assertThat(Follow.allowed(laid)).startsWith(Follow.ARM_FOLLOWS).doesNotContain(Follow.MIRRORED_PARTNER);
        Laid moved = drag(laid, 1, by(at(laid, 1), 1), Follow.ARM_FOLLOWS);
        assertThat(at(moved, 0)).isEqualTo(at(laid, 0));
        for (int m = 1; m < 4; m++) {
            assertThat(at(moved, m).distance(by(at(laid, m), 1))).isCloseTo(0, within(1e-15));
        }
        assertThat(Moved.direction(moved, 2)).isCloseTo(Moved.direction(laid, 2), within(1e-13));
    }

    @Test
    void aSwungArmChangesOneLegAndOneAngle() {
        Laid laid = z();
        Laid moved = drag(laid, 2, by(at(laid, 2), 1), Follow.ARM_SWINGS);
        assertThat(at(moved, 2)).isEqualTo(by(at(laid, 2), 1));
        assertThat(Moved.path(moved, 0)).isEqualTo(Moved.path(laid, 0));
        assertThat(Moved.path(moved, 2)).isCloseTo(Moved.path(laid, 2), within(1e-13));
        assertThat(Moved.incidence(moved, 2)).isCloseTo(Moved.incidence(laid, 2), within(1e-12));
        assertThat(Moved.incidence(moved, 1)).isNotCloseTo(Moved.incidence(laid, 1), within(1e-4));
    }

    @Test
    void othersStay() {
        Laid laid = z();
        Laid moved = drag(laid, 2, by(at(laid, 2), 1), Follow.OTHERS_STAY);
        for (int m : new int[] {0, 1, 3}) {
            assertThat(at(moved, m)).isEqualTo(at(laid, m));
        }
    }

    /** The nearest point of a circle lies on the line to its centre. */
    @Test
    void underOneHeldLegItSlidesOnACircle() {
        Laid laid = z(new Hold.Leg(Place.of("End A", "Fold 1")));
        Point wanted = by(at(laid, 1), 3);
        Laid moved = drag(laid, 1, wanted, Follow.OTHERS_STAY);
        double radius = Moved.path(laid, 0);
        double distance = wanted.distance(at(laid, 0));
        Point nearest = new Point(wanted.x() * radius / distance, wanted.y() * radius / distance);
        assertThat(at(laid, 0)).isEqualTo(new Point(0, 0));
        assertThat(Moved.path(moved, 0)).isCloseTo(radius, within(1e-12));
        // The place is good to the slope's differences.
        assertThat(at(moved, 1).distance(nearest)).isCloseTo(0, within(1e-9));
        Move.Moved said = (Move.Moved) Drag.to(laid, 1, wanted, Follow.OTHERS_STAY);
        assertThat(said.holds()).containsExactlyElementsOf(laid.design().holds());
    }

    @Test
    void underTwoHeldLegsItStays() {
        Laid laid = z(new Hold.Leg(Place.of("End A", "Fold 1")), new Hold.Leg(Place.of("Fold 2", "Fold 1")));
        Laid moved = drag(laid, 1, by(at(laid, 1), 3), Follow.OTHERS_STAY);
        assertThat(at(moved, 1).distance(at(laid, 1))).isCloseTo(0, within(1e-9));
        // The arm may still turn about the first mirror.
        Laid swung = drag(laid, 1, by(at(laid, 1), 3), Follow.ARM_SWINGS);
        assertThat(at(swung, 1).distance(at(laid, 1))).isGreaterThan(1e-3);
        assertThat(Moved.path(swung, 1)).isCloseTo(Moved.path(laid, 1), within(1e-12));
    }

    @Test
    void aPinnedMirrorStaysAndPinsTurnTheArmRound() {
        Laid laid = z(new Hold.Position("Output coupler"));
        Move.Refused refused = (Move.Refused) Drag.to(laid, 3, new Point(1, 0), Follow.ARM_FOLLOWS);
        assertThat(refused.words()).contains("the place of Output coupler");
        Laid moved = drag(laid, 2, by(at(laid, 2), 1), Follow.ARM_FOLLOWS);
        assertThat(at(moved, 3)).isEqualTo(at(laid, 3));
        assertThat(at(moved, 0).distance(by(at(laid, 0), 1))).isCloseTo(0, within(1e-15));
    }

    @Test
    void aRingsPartnerMovesAsItsMirrorImage() {
        Design ring = Moved.with(Samples.design("bow-tie-doubler"), List.of());
        Laid laid = Moved.laid(ring);
        assertThat(Follow.allowed(laid).get(0)).isEqualTo(Follow.MIRRORED_PARTNER);
        Laid moved = drag(laid, 0, by(at(laid, 0), 1), Follow.MIRRORED_PARTNER);
        for (int m : new int[] {0, 1}) {
            // The sample's axis is x = 0.
            assertThat(at(moved, m).x() - at(laid, m).x()).isCloseTo(m == 0 ? BY.x() : -BY.x(), within(1e-15));
            assertThat(at(moved, m).y() - at(laid, m).y()).isCloseTo(BY.y(), within(1e-15));
        }
        assertThatThrownBy(() -> Drag.to(laid, 0, new Point(0, 0), Follow.ARM_SWINGS))
                .hasMessageContaining("arm swings");
        Laid triangle = Moved.laid(Moved.with(Samples.design("triangle-ring"), List.of()));
        Laid apex = drag(triangle, 2, by(at(triangle, 2), 1), Follow.MIRRORED_PARTNER);
        assertThat(at(apex, 2).x()).isCloseTo(at(triangle, 2).x(), within(1e-12));
        assertThat(at(apex, 2).y()).isCloseTo(at(triangle, 2).y() + BY.y(), within(1e-12));
    }

    @Test
    void anXFoldHasPartnersAndAZHasNone() {
        Laid x = Moved.laid(Moved.with(Samples.design("x-fold"), List.of()));
        assertThat(Follow.allowed(x).get(0)).isEqualTo(Follow.MIRRORED_PARTNER);
        Laid moved = drag(x, 1, by(at(x, 1), 1), Follow.MIRRORED_PARTNER);
        double before = at(x, 1).distance(at(x, 2));
        double nx = (at(x, 2).x() - at(x, 1).x()) / before;
        double ny = (at(x, 2).y() - at(x, 1).y()) / before;
        assertThat(at(moved, 1).distance(at(moved, 2)))
                .isCloseTo(before - 2 * (BY.x() * nx + BY.y() * ny), within(1e-12));
    }
}
