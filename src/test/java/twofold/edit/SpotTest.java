package twofold.edit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import twofold.design.Place;
import twofold.design.Point;
import twofold.design.Turn;
import twofold.layout.Laid;

class SpotTest {
    /** m; rounding of plans of about 1 m. */
    private static final double ROUNDING = 1e-12;

    @Test
    void aPointHasItsPlaceOnTheBeam() {
        Laid z = Edited.sample("z-fold-rod");
        // The first leg runs along +x from the origin.
        Spot above = Spot.nearest(z, new Point(0.2, 3e-3));
        assertThat(above).isEqualTo(new Spot(Place.of("End A", "Fold 1"), 0.2, Turn.LEFT, 3e-3));
        assertThat(Spot.nearest(z, new Point(0.2, -3e-3)).side()).isEqualTo(Turn.RIGHT);
        assertThat(Spot.nearest(z, new Point(-0.1, 0)).along()).isZero();
    }

    @Test
    void pointsOfTheAxisAreFoundAgain() {
        Laid x = Edited.sample("x-fold");
        for (int leg = 0; leg < 3; leg++) {
            for (double share : new double[] {0.1, 0.3, 0.5, 0.597, 0.9}) {
                double along = share * x.legs().get(leg).path();
                Spot spot = Spot.nearest(x, x.legs().get(leg).at(along));
                assertThat(spot.leg()).isEqualTo(Offers.legs(x.design()).get(leg));
                assertThat(spot.along()).isCloseTo(along, within(ROUNDING));
                assertThat(spot.distance()).isCloseTo(0, within(ROUNDING));
            }
        }
    }
}
