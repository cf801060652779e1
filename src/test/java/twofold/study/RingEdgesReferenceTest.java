package twofold.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import twofold.cavity.EdgeCause;
import twofold.design.Design;
import twofold.design.Lever;
import twofold.design.Place;
import twofold.file.DesignReader;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.optics.Plane;

/**
 * Two equal lenses in a ring of flat mirrors, d apart in a round trip of L. Their ray matrices multiply to a half trace of
 * 1 − L/f + d(L − d)/(2f²), so that half trace + 1 is (2f − d)(2f − (L − d))/(2f²): where the lenses stand almost opposite each
 * other the half trace passes −1 only just, between f = d/2 and f = (L − d)/2. Closed form, no source needed.
 */
class RingEdgesReferenceTest {
    private static final double D = 0.432;
    private static final double ROUND = 0.9;

    private static Laid ring() {
        Design design =
                DesignReader.read("""
                        { "format": "twofold/1", "wavelength_nm": 1064, "shape": "ring", "parts": [
                          { "name": "A", "kind": "mirror", "at_mm": [0, 0] },
                          { "name": "L1", "kind": "lens", "along_mm": 200, "focal_length_mm": 200 },
                          { "name": "B", "kind": "mirror", "at_mm": [400, 0] },
                          { "name": "L2", "kind": "lens", "along_mm": 232, "focal_length_mm": 200 },
                          { "name": "C", "kind": "mirror", "at_mm": [200, 150] } ] }
                        """.getBytes(StandardCharsets.UTF_8)).design().orElseThrow();
        return Layout.of(design).value().orElseThrow();
    }

    private static Lever focus(double from, double to) {
        return new Lever(
                "focus",
                "focal_length_mm",
                List.of(Place.of("L1"), Place.of("L2")),
                new Lever.Range.Span(from, to),
                false);
    }

    @ParameterizedTest
    @EnumSource
    void twoEdgesWithinOneStepAreFoundByTheirExtremum(Plane plane) {
        // Steps of 54 mm: no two neighbours differ in sign.
        ZonesAlong zones = ZonesAlong.of(ring(), Axis.of(focus(0.135, 0.351), 5), plane);
        assertThat(zones.edges())
                .hasSize(2)
                .allSatisfy(e -> assertThat(e.cause()).isEqualTo(EdgeCause.CLOSES_REVERSED));
        assertThat(zones.edges().get(0).value()).isCloseTo(D / 2, within(1e-12));
        assertThat(zones.edges().get(1).value()).isCloseTo((ROUND - D) / 2, within(1e-12));
    }

    @ParameterizedTest
    @ValueSource(ints = {20, 400})
    void finerStepsFindTheSame(int points) {
        ZonesAlong zones = ZonesAlong.of(ring(), Axis.of(focus(0.135, 0.351), points), Plane.SAGITTAL);
        assertThat(zones.edges()).hasSize(2);
        assertThat(zones.edges().get(0).value()).isCloseTo(D / 2, within(1e-12));
        assertThat(zones.edges().get(1).value()).isCloseTo((ROUND - D) / 2, within(1e-12));
    }
}
