package twofold.layout;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Kind;
import twofold.design.Mount;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.design.Values;

/** Gaps against plans worked out by hand with ruler and set square. */
class ClearanceTest {
    /** Rounding of lengths of a metre. */
    private static final double ROUNDING = 1e-12;

    private static Part mirror(String name, double x, double y, double width, double depth) {
        return Kind.MIRROR.part(
                name, Values.NONE.with(Field.AT, new Point(x, y)).with(Field.MOUNT, new Mount(width, depth)));
    }

    /** An L: along x for 1 m, then up for 1 m; the fold at 45°. */
    private static Laid corner() {
        return laid(List.of(
                mirror("A", 0, 0, 0.04, 0.02), mirror("Fold", 1, 0, 0.04, 0.02), mirror("B", 1, 1, 0.06, 0.02)));
    }

    private static Laid laid(List<Part> parts) {
        return Layout.of(Design.of("plan", 1e-6, Shape.STANDING_WAVE, parts))
                .value()
                .orElseThrow();
    }

    private static Clearance.Gap between(List<Clearance.Gap> gaps, int part, int other) {
        return gaps.stream()
                .filter(g -> g.part() == part && g.other().equals(Optional.of(other)))
                .findFirst()
                .orElseThrow();
    }

    private static Clearance.Gap toBeam(List<Clearance.Gap> gaps, int part, int leg) {
        return gaps.stream()
                .filter(g -> g.part() == part && g.beam().equals(Optional.of(leg)))
                .findFirst()
                .orElseThrow();
    }

    @Test
    void mountsLieBehindFaces() {
        List<Footprint> footprints = Footprint.of(corner());
        // A faces +x: its mount reaches from x = −20 to 0 mm and over ±20 mm in y.
        assertThat(footprints.get(0).corners()).extracting(Point::x).allMatch(x -> x <= 1e-15 && x >= -0.02 - 1e-15);
        // The fold faces (−1, 1)/√2: the corner behind and to the right lies at (20 + 20)/√2 mm to the right of the
        // vertex.
        double right =
                footprints.get(1).corners().stream().mapToDouble(Point::x).max().orElseThrow();
        assertThat(right).isCloseTo(1 + 0.04 / Math.sqrt(2), within(ROUNDING));
        // B faces −y: its mount lies above y = 1.
        assertThat(footprints.get(2).corners()).extracting(Point::y).allMatch(y -> y >= 1 - 1e-15);
    }

    @Test
    void mountsAreMeasuredAgainstMounts() {
        List<Clearance.Gap> gaps = Clearance.of(corner(), List.of()).smallest(10);
        assertThat(gaps).isSortedAccordingTo((a, b) -> Double.compare(a.gap(), b.gap()));
        // From A's face at x = 0 to the fold's nearest corner at 1 − 20/√2 mm − ..., by hand:
        // the face's ends lie at (1 ∓ 0.02/√2, ∓ 0.02/√2); behind them by 20 mm along (1, −1)/√2.
        assertThat(between(gaps, 0, 1).gap()).isCloseTo(1 - 0.02 / Math.sqrt(2), within(ROUNDING));
        assertThat(between(gaps, 0, 2).gap()).isCloseTo(Math.hypot(1 - 0.03, 1 - 0.02), within(ROUNDING));
    }

    @Test
    void beamsAreStripsThatGrow() {
        // A strip of half width 3 mm at its waist on A, Rayleigh length 0.5 m, on the first leg: at B's corner, x =
        // 0.97,
        // it is 3 √(1 + 1.94²) mm wide, and the corner is 1 m above the axis; the nearest point lies at that width.
        Strip strip = new Strip(0, 0, 1, 3e-3, 0, 0.5);
        List<Clearance.Gap> gaps = Clearance.of(corner(), List.of(strip)).smallest(10);
        double straight = 1 - 3e-3 * Math.sqrt(1 + 4);
        double gap = toBeam(gaps, 2, 0).gap();
        // Straight down from the middle of B's face to the strip's end; slanted ways are shorter by less than slope²/2.
        assertThat(gap).isBetween(straight * (1 - 2e-5), straight + 1e-9);
        assertThat(gaps).noneMatch(g -> g.part() == 0 && g.beam().equals(Optional.of(0)));
        assertThat(gaps).noneMatch(g -> g.part() == 1 && g.beam().isPresent());
    }

    @Test
    void aMountInTheBeamIsNegativeByTheWayOut() {
        // A Z folded back so that the last mirror's mount, 40 mm wide, hangs 5 mm into the first leg's strip of ±2 mm.
        Laid z = laid(List.of(
                mirror("A", 0, 0, 0.04, 0.02),
                mirror("F1", 1, 0, 0.02, 0.02),
                mirror("F2", 0.2, 0.5, 0.02, 0.02),
                mirror("B", 0.5, 0.5, 0.04, 0.02)));
        List<Strip> strips = List.of(new Strip(0, 0, 1, 2e-3, 0, 1e9));
        double face = Footprint.of(z).get(2).corners().stream()
                .mapToDouble(Point::y)
                .min()
                .orElseThrow();
        assertThat(toBeam(Clearance.of(z, strips).smallest(20), 2, 0).gap()).isCloseTo(face - 2e-3, within(1e-9));
        Laid low = laid(List.of(
                mirror("A", 0, 0, 0.04, 0.02),
                mirror("F1", 1, 0, 0.02, 0.02),
                mirror("F2", 0.2, 0.5, 0.02, 0.02),
                mirror("B", 0.5, 0.015, 0.04, 0.02)));
        double dip = Footprint.of(low).get(3).corners().stream()
                .mapToDouble(Point::y)
                .min()
                .orElseThrow();
        assertThat(dip).isNegative();
        assertThat(toBeam(Clearance.of(low, strips).smallest(20), 3, 0).gap())
                .as("out of the strip on its upper side")
                .isCloseTo(dip - 2e-3, within(1e-9));
    }

    @Test
    void overlappingMountsAreNegativeByTheShortestWayApart() {
        Laid close = laid(List.of(
                mirror("A", 0, 0, 0.04, 0.02),
                Kind.LENS.part(
                        "L1",
                        Values.NONE
                                .with(Field.ALONG, Along.at(0.1))
                                .with(Field.FOCAL_LENGTH, (Object) 1.0)
                                .with(Field.LENS_MOUNT, new Mount(0.03, 0.012))),
                Kind.LENS.part(
                        "L2",
                        Values.NONE
                                .with(Field.ALONG, Along.at(0.108))
                                .with(Field.FOCAL_LENGTH, (Object) 1.0)
                                .with(Field.LENS_MOUNT, new Mount(0.03, 0.012))),
                mirror("B", 1, 0, 0.04, 0.02)));
        List<Clearance.Gap> gaps = Clearance.of(close, List.of()).smallest(10);
        // 12 mm deep and 8 mm apart: 4 mm into each other.
        assertThat(between(gaps, 1, 2).gap()).isCloseTo(-4e-3, within(ROUNDING));
        assertThat(gaps.get(0).to(close)).isEqualTo("L2");
    }

    @Test
    void whatStatesNoMountIsNamed() {
        Laid laid = laid(List.of(
                mirror("A", 0, 0, 0.04, 0.02),
                Kind.APERTURE.part("Stop", Values.NONE.with(Field.ALONG, Along.MIDDLE)),
                mirror("B", 1, 0, 0.04, 0.02)));
        assertThat(Clearance.of(laid, List.of()).unchecked()).containsExactly(1);
    }
}
