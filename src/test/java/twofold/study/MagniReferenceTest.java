package twofold.study;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import twofold.Checks;
import twofold.Sketch;
import twofold.cavity.Chain;
import twofold.cavity.EdgeCause;
import twofold.cavity.Reading;
import twofold.design.Design;
import twofold.design.Lever;
import twofold.design.Place;
import twofold.design.Quantity;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.optics.Plane;

/** One lens of variable power between two mirrors, swept by a lever: Magni, Appl. Opt. 25, 107 (1986). */
class MagniReferenceTest {
    /** 1/m. */
    private static final double STEP = 1e-4;

    private final Checks.Check check = Checks.of("magni.zones.0");
    private final Laid laid = laid();

    private Laid laid() {
        Design design = new Sketch()
                .flat("A")
                .go(check.in("L1_m"))
                .lens("Lens", 1)
                .go(check.in("L2_m"))
                .flat("B")
                .standingWave(check.in("lambda_m"));
        return Layout.of(design).value().orElseThrow();
    }

    /** A lever on the focal length, over a range of powers in 1/m. */
    private static Lever focal(double weakest, double strongest) {
        return new Lever(
                "focus",
                "focal_length_mm",
                List.of(Place.of("Lens")),
                new Lever.Range.Span(1 / strongest, 1 / weakest),
                false);
    }

    @Test
    void zonesBeginAndEndAtThePrintedPowers() {
        ZonesAlong zones = ZonesAlong.of(laid, Axis.of(focal(0.1, 5), 2000), Plane.TANGENTIAL);
        List<Double> powers = new ArrayList<>(
                zones.edges().stream().map(e -> 1 / e.value()).sorted().toList());
        // The first edge is a lens of no power.
        powers.add(0, 0.0);
        check.holds("edges_per_m", powers);
        assertThat(zones.edges().stream().map(ZonesAlong.Edge::cause))
                .containsExactly(EdgeCause.ENDS_IMAGED, EdgeCause.LAST_CENTRE_ON_FIRST, EdgeCause.FIRST_CENTRE_ON_LAST);
        assertThat(zones.zone(1 / 0.5)).isEqualTo("A = 0 to -");
        assertThat(zones.zone(1 / 3.0)).isEqualTo("B = 0 to D = 0");
    }

    /**
     * The spot at the lens is stationary where it is smallest, and equally small in both zones. The edges lie at ±a and ±b
     * about a middle; with u from there w⁴ goes with u²/((a² − u²)(u² − b²)), which is least at u² = a b.
     */
    @Test
    void theSpotAtTheLensIsStationaryOnceInEachZone() {
        List<Double> edges = check.expecteds("edges_per_m");
        double middle = (edges.get(0) + edges.get(3)) / 2;
        double a = edges.get(3) - middle;
        double b = edges.get(2) - middle;
        for (int side : new int[] {-1, 1}) {
            double place = middle + side * Math.sqrt(a * b);
            Lever lever = side < 0 ? focal(0.02, edges.get(1) - 0.02) : focal(edges.get(2) + 0.02, edges.get(3) - 0.02);
            double smallest = new WorstOver(laid).worst(lever, MagniReferenceTest::spot, v -> v);
            check.holds("w_lens_min_m", smallest);
            Asker asker = Asker.of(laid, List.of(lever), List.of(MagniReferenceTest::spot));
            double[] spots = new double[2];
            asker.ask(new double[] {1 / (place - STEP)}, spots, 0);
            asker.ask(new double[] {1 / (place + STEP)}, spots, 1);
            // Stationary: both sides are above the smallest by some squares of the step alone.
            assertThat(spots[0] / smallest - 1).isBetween(0.0, 10 * STEP * STEP);
            assertThat(spots[1] / smallest - 1).isBetween(0.0, 10 * STEP * STEP);
        }
    }

    private static Reading spot(Chain chain) {
        return Reading.of(
                Quantity.RADIUS, Optional.of(Place.of("Lens")), Optional.of(Plane.TANGENTIAL), Optional.empty(), chain);
    }
}
