package twofold.study;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import twofold.Samples;
import twofold.design.Design;
import twofold.design.Edge;
import twofold.design.Place;
import twofold.design.Quantity;
import twofold.optics.Plane;

/** Quantities as people write them. */
class AskedTest {
    private static final Design DESIGN = Samples.design("z-fold-rod");

    private static Asked parsed(String text) {
        return Asked.parse(text, DESIGN).value().orElseThrow();
    }

    @Test
    void placesPlanesAndEdges() {
        assertThat(parsed("radius_um@Rod:sagittal"))
                .isEqualTo(new Asked(
                        "radius_um@Rod:sagittal",
                        Quantity.RADIUS,
                        Optional.of(Place.of("Rod")),
                        Optional.of(Plane.SAGITTAL),
                        Optional.empty()));
        assertThat(parsed("zone_edge_split_mm@Fold 1/Fold 2:lower"))
                .returns(Optional.of(Place.of("Fold 1", "Fold 2")), Asked::at)
                .returns(Optional.of(Edge.LOWER), Asked::edge)
                .returns(Optional.empty(), Asked::plane);
        assertThat(parsed("fsr_mhz").at()).isEmpty();
        assertThat(parsed("half_trace:tangential").plane()).contains(Plane.TANGENTIAL);
        assertThat(parsed("half_trace@:tangential").plane()).contains(Plane.TANGENTIAL);
        assertThat(parsed("clearance_mm@Rod").at()).contains(Place.of("Rod"));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "radius@Rod:sagittal      | found \"radius\"; nearest is \"radius_um\"",
                "radius_um@Rod            | found no plane for radius_um; accepted: radius_um@Rod:tangential or",
                "half_trace               | accepted: half_trace:tangential or half_trace:sagittal",
                "radius_um@Rodd:sagittal  | nearest is \"Rod\"; accepted: End A, Fold 1, Rod",
                "radius_um@Rod:sagital    | found \"sagital\"; nearest is \"sagittal\"; accepted: tangential or sagittal",
                "radius_um@Rod:both       | found \"both\"",
                "radius_um:sagittal       | found no place for radius_um; accepted: \"at\": a part",
                "fsr_mhz@Rod              | accepted: no place",
                "fsr_mhz:sagittal         | has no plane",
                "zone_edge_split_mm@Fold 1/Fold 2 | found no edge for zone_edge_split_mm",
                "zone_edge_split_mm@Fold 1/Fold 2:tangential | edge",
                "leg_mm@End A/Fold 2      | which no leg joins",
                "leg_mm@Fold 1            | a leg, as two neighbouring mirrors",
                "''                       | accepted: what[@place[:plane-or-edge]]",
            })
    void whatIsWrongIsSaidWithWhatWouldBeAccepted(String text, String said) {
        assertThat(Asked.parse(text, DESIGN).value()).isEmpty();
        assertThat(Asked.parse(text, DESIGN).problems().get(0).message()).contains(said);
    }

    @Test
    void everywhereAQuantityCanBeReadIsOffered() {
        assertThat(Asked.places(Quantity.FSR, DESIGN)).containsExactly(Optional.empty());
        assertThat(Asked.places(Quantity.FOCUS_RATIO, DESIGN)).containsExactly(Optional.of(Place.of("Rod")));
        assertThat(Asked.places(Quantity.LEG, DESIGN))
                .containsExactly(
                        Optional.of(Place.of("End A", "Fold 1")),
                        Optional.of(Place.of("Fold 1", "Fold 2")),
                        Optional.of(Place.of("Fold 2", "Output coupler")));
        assertThat(Asked.places(Quantity.CLEARANCE, DESIGN))
                .hasSize(1 + DESIGN.parts().size())
                .contains(Optional.empty());
        Design ring = Samples.design("triangle-ring");
        assertThat(Asked.places(Quantity.LEG, ring)).hasSize(ring.mirrors().size());
        for (Design design : java.util.List.of(DESIGN, ring)) {
            for (Quantity quantity : Quantity.values()) {
                for (Optional<Place> at : Asked.places(quantity, design)) {
                    Asked asked = Asked.of(
                            quantity,
                            at,
                            quantity.hasPlane() ? Optional.of(Plane.SAGITTAL) : Optional.empty(),
                            quantity.hasEdge() ? Optional.of(Edge.UPPER) : Optional.empty());
                    assertThat(Asked.parse(asked.text(), design).value()).contains(asked);
                }
            }
        }
    }

    @Test
    void wordsForAPerson() {
        assertThat(parsed("radius_um@Rod:sagittal").words()).isEqualTo("Radius at Rod, sagittal");
        assertThat(parsed("zone_edge_split_mm@Fold 1/Fold 2:lower").words())
                .isEqualTo("Zone edge split at Fold 1/Fold 2, lower edge");
        assertThat(parsed("fsr_mhz").words()).isEqualTo("Free spectral range");
    }
}
