package twofold.cavity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import twofold.Checks;
import twofold.Checks.Check;
import twofold.Sketch;
import twofold.Solved;
import twofold.design.Point;
import twofold.optics.Plane;

/** Rings in both planes: a doubling ring, a mode cleaner of four mirrors, and one of three. */
class RingReferenceTest {

    /** A walk of a few turns and steps comes back to its start but for rounding. */
    private static final double CLOSED = 1e-12;

    /** The closed form of a symmetric bow-tie around a crystal, derived and checked against matrices to 25 digits. */
    @Test
    void aDoublingRingIsTheClosedForm() {
        Check check = Checks.of("bowtie.lbo");
        double incidence = Math.toRadians(check.in("theta_deg"));
        double air = check.in("air_each_side_m");
        double crystal = check.in("crystal_m");
        // Short side and flat side together span both diagonals: s + m = 2 d cos 2θ, and m + 2 d is the long way round.
        double diagonal = (2 * air + crystal + check.in("long_arm_m")) / (2 * (1 + Math.cos(2 * incidence)));
        Sketch sketch = new Sketch()
                .mirror("C1", check.in("R_m"))
                .go(air)
                .crystal("Crystal", crystal, check.in("n"))
                .go(air)
                .mirror("C2", check.in("R_m"))
                .left(incidence)
                .go(diagonal)
                .flat("F1")
                .right(incidence)
                .go(check.in("long_arm_m") - 2 * diagonal)
                .flat("F2")
                .right(incidence)
                .go(diagonal);
        assertThat(sketch.gap()).isLessThan(CLOSED);
        Solved solved = Solved.of(sketch.ring(check.in("lambda_m")));
        for (String mirror : new String[] {"C1", "C2", "F1", "F2"}) {
            assertThat(solved.incidence(mirror)).isCloseTo(check.in("theta_deg"), within(1e-10));
        }
        for (Plane plane : Plane.values()) {
            String suffix = plane == Plane.TANGENTIAL ? "_T" : "_S";
            Waist inside = solved.waist("Crystal", "Crystal", plane);
            check.holds("zR_xtal_reduced_m" + suffix, inside.rayleigh() / check.in("n"));
            check.holds("w0_xtal_um" + suffix, inside.radius() * 1e6);
            check.holds("xi" + suffix, crystal / (2 * inside.rayleigh()));
            check.holds("w0_long_um" + suffix, solved.waist("F1", "F2", plane).radius() * 1e6);
            check.holds("half_trace" + suffix, solved.mode(plane).halfTrace());
            check.holds("gouy_rt_over_2pi" + suffix, solved.gouyFraction(plane));
            assertThat(inside.after()).as("in the middle by symmetry").isCloseTo(crystal / 2, within(1e-12));
        }
    }

    /**
     * LIGO output-mode-cleaner laboratory, public electronic log, entry 161: printed mode spacings in both planes. The
     * exact angle, 4.042° where the log says about 4°, is from memory.
     */
    @Test
    void printedModeSpacingsOfABowTie() {
        Check printed = Checks.of("bowtie.omc");
        Check exact = Checks.of("bowtie.omc.exact");
        double incidence = Math.toRadians(printed.in("theta_deg"));
        double side = printed.in("short_side_m");
        double diagonal = side / Math.cos(2 * incidence);
        Sketch sketch = new Sketch()
                .mirror("C1", printed.in("R_m"))
                .go(side)
                .mirror("C2", printed.in("R_m"))
                .left(incidence)
                .go(diagonal)
                .flat("F1")
                .right(incidence)
                .go(side)
                .flat("F2")
                .right(incidence)
                .go(diagonal);
        assertThat(sketch.gap()).isLessThan(CLOSED);
        Solved solved = Solved.of(sketch.ring(printed.in("lambda_m")));
        assertThat(solved.cavity().roundTrip()).isCloseTo(printed.in("round_trip_m"), within(1e-11));
        exact.holds("FSR_Hz", solved.cavity().freeSpectralRange());
        for (Plane plane : Plane.values()) {
            String suffix = plane == Plane.TANGENTIAL ? "_H" : "_V";
            printed.holds("spacing_over_FSR" + suffix, solved.gouyFraction(plane));
            exact.holds("spacing_over_FSR" + suffix, solved.gouyFraction(plane));
            exact.holds(
                    "w0_between_curved_um" + suffix,
                    solved.waist("C1", "C2", plane).radius() * 1e6);
            exact.holds(
                    "w0_between_flats_um" + suffix,
                    solved.waist("F1", "F2", plane).radius() * 1e6);
        }
    }

    /** KAGRA public wiki, input/output-optics parameter page: angles, spots and q of a triangle, astigmatism neglected. */
    @Test
    void printedSpotsOfATriangle() {
        Check check = Checks.of("ring3.imc");
        Solved solved = triangle(check, check.in("side_m"));
        check.holds("theta_apex_deg", solved.incidence("Apex"));
        check.holds("theta_flat_deg", solved.incidence("Flat 1"));
        check.holds("theta_flat_deg", solved.incidence("Flat 2"));
        for (Plane plane : Plane.values()) {
            Waist waist = solved.waist("Flat 1", "Flat 2", plane);
            check.holds("w0_mm", waist.radius() * 1e3);
            check.holds("zR_m", waist.rayleigh());
            check.holds("w_flat_mm", solved.radius("Flat 1", plane) * 1e3);
            check.holds("w_flat_mm", solved.radius("Flat 2", plane) * 1e3);
            check.holds("w_apex_mm", solved.radius("Apex", plane) * 1e3);
        }
    }

    /** The same triangle in both planes, with matrices; the half turn of odd modes is left to the mode spectrum. */
    @Test
    void aTriangleInBothPlanes() {
        Check check = Checks.of("ring3.imc.exact");
        Solved solved = triangle(check, check.in("side_m"));
        check.holds("FSR_Hz", solved.cavity().freeSpectralRange());
        for (Plane plane : Plane.values()) {
            String suffix = plane == Plane.TANGENTIAL ? "_T" : "_S";
            Waist waist = solved.waist("Flat 1", "Flat 2", plane);
            check.holds("half_trace" + suffix, solved.mode(plane).halfTrace());
            check.holds("zR_m" + suffix, waist.rayleigh());
            check.holds("w0_mm" + suffix, waist.radius() * 1e3);
            check.holds("w_apex_mm" + suffix, solved.radius("Apex", plane) * 1e3);
            check.holds("gouy_rt_over_2pi" + suffix, solved.gouyFraction(plane));
        }
        check.holds("TEM01_offset_over_FSR", solved.gouyFraction(Plane.SAGITTAL));
        check.holds("TEM20_offset_over_FSR", 2 * solved.gouyFraction(Plane.TANGENTIAL));
    }

    /** KAGRA public wiki, optical characterisation page: a measured range and the round trip that belongs to it. */
    @Test
    void printedRangeOfATriangle() {
        Check check = Checks.of("ring3.imc.fsr");
        Check triangle = Checks.of("ring3.imc");
        double roundTrip = check.expected("round_trip_m");
        Solved solved = triangle(triangle, (roundTrip - triangle.in("base_m")) / 2);
        // 9 µm of uncertainty of the round trip are 1 Hz.
        assertThat(solved.cavity().freeSpectralRange()).as(check.source()).isCloseTo(check.in("FSR_Hz"), within(1.2));
        check.holds("round_trip_m", solved.cavity().roundTrip());
    }

    private static Solved triangle(Check check, double side) {
        double half = check.in("base_m") / 2;
        double base = Math.acos(half / side);
        Sketch sketch = new Sketch(new Point(-half, 0), 0)
                .flat("Flat 1")
                .go(2 * half)
                .flat("Flat 2")
                .left(base / 2)
                .go(side)
                .mirror("Apex", check.in("R_apex_m"))
                .left(Math.PI / 2 - base)
                .go(side);
        assertThat(sketch.gap()).isLessThan(CLOSED * 100);
        return Solved.of(sketch.ring(check.in("lambda_m")));
    }
}
