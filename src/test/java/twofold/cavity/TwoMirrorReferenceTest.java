package twofold.cavity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import twofold.Checks;
import twofold.Checks.Check;
import twofold.Sketch;
import twofold.Solved;
import twofold.design.Design;
import twofold.design.Point;
import twofold.optics.Plane;

/**
 * Two mirrors: closed forms of Kogelnik &amp; Li, Appl. Opt. 5, 1550 (1966) and of Siegman, Lasers (1986), and the printed
 * arms of large interferometers. Every number is asked of both planes, which are one here.
 */
class TwoMirrorReferenceTest {
    private static final double FLAT = Double.POSITIVE_INFINITY;
    private static final double ANY_WAVELENGTH = 1064e-9;

    /** Not a multiple of anything: no coordinate of a plan turned so stays a round number. */
    private static final double ODD_ANGLE = 1.2345;

    /** Kogelnik &amp; Li 1966: spots, waist, its place, resonance condition. */
    @ParameterizedTest
    @ValueSource(strings = {"res.two_mirror.general", "res.two_mirror.aligo.exact"})
    void spotsWaistAndResonancesAreKogelniksAndLis(String id) {
        Check check = Checks.of(id);
        Solved solved = solved(check, check.in("R1_m"), check.in("R2_m"));
        for (Plane plane : Plane.values()) {
            Waist waist = solved.waist("M1", "M2", plane);
            check.holds("w1_m", solved.radius("M1", plane));
            check.holds("w2_m", solved.radius("M2", plane));
            check.holds("w0_m", waist.radius());
            check.holds("z1_m", waist.after());
            check.holds("zR_m", waist.rayleigh());
            check.holds("acos_over_pi", solved.gouyFraction(plane));
            check.holds("FSR_Hz", solved.cavity().freeSpectralRange());
            assertThat(solved.mode(plane).halfTrace())
                    .as("2 g1 g2 − 1; the expected values have 12 digits")
                    .isCloseTo(2 * check.expected("g1") * check.expected("g2") - 1, within(1e-11));
        }
    }

    /** Siegman 19.2, exact values of long-radius and near-concentric resonators, where the margin is small. */
    @ParameterizedTest
    @ValueSource(strings = {"res.near_planar", "res.near_concentric"})
    void nearlyPlanarAndNearlyConcentricAreSiegmans(String id) {
        Check check = Checks.of(id);
        Solved solved = solved(check, check.in("R1_m"), check.in("R2_m"));
        for (Plane plane : Plane.values()) {
            Waist waist = solved.waist("M1", "M2", plane);
            check.holds("w1_m", solved.radius("M1", plane));
            check.holds("w1_m", solved.radius("M2", plane));
            check.holds("w0_m", waist.radius());
            check.holds("zR_m", waist.rayleigh());
            check.holds("acos_over_pi", solved.gouyFraction(plane));
        }
    }

    /** Siegman 19.2; Kogelnik &amp; Li: zR² = L(R − L), the waist on the flat mirror. */
    @Test
    void halfSymmetricHasItsWaistOnTheFlat() {
        Check check = Checks.of("res.half_symmetric");
        Solved solved = solved(check, FLAT, check.in("R_m"));
        for (Plane plane : Plane.values()) {
            Waist waist = solved.waist("M1", "M2", plane);
            check.holds("w0_m", solved.radius("M1", plane));
            check.holds("w0_m", waist.radius());
            check.holds("w2_m", solved.radius("M2", plane));
            check.holds("zR_m", waist.rayleigh());
            assertThat(waist.after()).as("rounding of lengths of 0.3 m").isCloseTo(0, within(1e-15));
        }
    }

    /** KAGRA collaboration public wiki, main-interferometer optical parameters, revision 22. */
    @Test
    void printedArmWithAFlatInputMirror() {
        Check check = Checks.of("res.half_symmetric.kagra22");
        Solved solved = solved(check, FLAT, check.in("R2_m"));
        for (Plane plane : Plane.values()) {
            check.holds("w1_m", solved.radius("M1", plane));
            check.holds("w2_m", solved.radius("M2", plane));
        }
    }

    /** KAGRA public wiki, input/output-optics parameter page: spots, waist and q at the mirror. */
    @Test
    void printedSymmetricArm() {
        Check check = Checks.of("res.symmetric.kagra");
        Solved solved = solved(check, check.in("R1_m"), check.in("R2_m"));
        for (Plane plane : Plane.values()) {
            Waist waist = solved.waist("M1", "M2", plane);
            check.holds("w1_m", solved.radius("M1", plane));
            check.holds("w1_m", solved.radius("M2", plane));
            check.holds("w0_m", waist.radius());
            check.holds("re_q_at_mirror_m", waist.after());
            check.holds("im_q_m", waist.rayleigh());
        }
    }

    /**
     * From memory: Advanced LIGO, Class. Quantum Grav. 32, 074001 (2015), Table 1; Advanced Virgo, Class. Quantum Grav.
     * 32, 024001 (2015).
     */
    @ParameterizedTest
    @ValueSource(strings = {"res.two_mirror.aligo", "res.two_mirror.advirgo"})
    void armsOfInterferometersFromMemory(String id) {
        Check check = Checks.of(id);
        Solved solved = solved(check, check.in("R1_m"), check.in("R2_m"));
        for (Plane plane : Plane.values()) {
            check.holds("w1_m", solved.radius("M1", plane));
            check.holds("w2_m", solved.radius("M2", plane));
        }
    }

    /**
     * Boyd &amp; Gordon, Bell Syst. Tech. J. 40, 489 (1961). A confocal resonator itself is on the edge, so it is approached:
     * a part in a million short of it, which moves the waist by 3e-13, spots and spacing by 5e-7 of themselves.
     */
    @Test
    void confocalIsApproached() {
        Check check = Checks.of("res.confocal");
        double radius = check.in("R_m");
        Solved solved = Solved.of(twoMirrors(check.in("lambda_m"), check.in("L_m") * (1 - 1e-6), radius, radius, 0));
        for (Plane plane : Plane.values()) {
            check.holds("w0_m", solved.waist("M1", "M2", plane).radius());
            assertThat(solved.radius("M1", plane) / check.expected("w_mirror_m"))
                    .isCloseTo(1, within(6e-7));
            assertThat(solved.gouyFraction(plane) / check.expected("transverse_spacing_over_FSR"))
                    .isCloseTo(1, within(7e-7));
        }
    }

    /** Kogelnik &amp; Li 1966: stable for 0 &lt; g1 g2 &lt; 1, marginal at both ends. */
    @ParameterizedTest
    @ValueSource(doubles = {0, ODD_ANGLE})
    void classesOfStability(double heading) {
        Check check = Checks.of("res.stability.edge");
        List<Double> products = new ArrayList<>();
        List<String> classes = new ArrayList<>();
        for (double length : check.ins("L_m")) {
            Solved solved = Solved.of(twoMirrors(ANY_WAVELENGTH, length, check.in("R1_m"), check.in("R2_m"), heading));
            Eigenmode mode = solved.mode(Plane.TANGENTIAL);
            assertThat(solved.state(Plane.SAGITTAL)).isEqualTo(mode.state());
            products.add((1 + mode.halfTrace()) / 2);
            classes.add(mode.state() == State.EDGE ? "marginal" : mode.state().word());
        }
        check.holds("g1g2", products);
        assertThat(classes).as(check.source()).isEqualTo(check.words("class"));
    }

    /** Common practice, no source: what magnifies by exactly one a round trip is on the edge, and no error. */
    @ParameterizedTest
    @ValueSource(doubles = {0, ODD_ANGLE, -3, 0.1, 2.5})
    void planeParallelConfocalAndConcentricAreOnTheEdge(double heading) {
        double[][] radii = {{FLAT, FLAT}, {0.7, 0.7}, {0.35, 0.35}, {0.3, 0.4}, {FLAT, 0.7}};
        for (double[] pair : radii) {
            Solved solved = Solved.of(twoMirrors(ANY_WAVELENGTH, 0.7, pair[0], pair[1], heading));
            for (Plane plane : Plane.values()) {
                Eigenmode mode = solved.mode(plane);
                assertThat(mode.state()).as("%s %s", pair[0], pair[1]).isEqualTo(State.EDGE);
                // √ of a margin that is rounding.
                assertThat(mode.magnification()).isCloseTo(1, within(1e-7));
                assertThat(mode.stations()).isEmpty();
                assertThat(mode.waists()).isEmpty();
            }
        }
    }

    /** Kogelnik &amp; Li 1966: the beam at a distance from its waist, as the mode between its waist and its wavefront. */
    @Test
    void aMirrorOnAWavefrontKeepsTheBeam() {
        Check check = Checks.of("gauss.propagate");
        Solved solved = Solved.of(twoMirrors(check.in("lambda_m"), check.in("z_m"), FLAT, check.expected("R_m"), 0));
        for (Plane plane : Plane.values()) {
            check.holds("zR_m", solved.waist("M1", "M2", plane).rayleigh());
            check.holds("w_m", solved.radius("M2", plane));
            // To the end and back.
            check.holds("gouy_rad", solved.mode(plane).gouy() / 2);
            assertThat(solved.radius("M1", plane) / check.in("w0_m")).isCloseTo(1, within(1e-9));
        }
    }

    /**
     * Kogelnik &amp; Li 1966: a waist before a lens and the waist behind it, each on a flat mirror. The distance behind
     * the lens stands 0.46 mm outside the focus and is known to 12 digits, which leaves 1e-9 for what follows from it.
     */
    @Test
    void aLensTurnsAWaistIntoAnother() {
        Check check = Checks.of("gauss.lens");
        Solved solved = Solved.of(new Sketch()
                .flat("M1")
                .go(check.in("d_m"))
                .lens("Lens", check.in("f_m"))
                .go(check.expected("d2_m"))
                .flat("M2")
                .standingWave(check.in("lambda_m")));
        for (Plane plane : Plane.values()) {
            check.holds("w02_m", solved.radius("M2", plane));
            check.holds("zR2_m", solved.waist("Lens", "M2", plane).rayleigh());
            assertThat(solved.radius("M1", plane) / check.in("w0_m")).isCloseTo(1, within(1e-9));
        }
    }

    /** Leibniz University Hannover, Institute of Quantum Optics, public wiki, cavity-spectrum page; and exact. */
    @Test
    void printedSpectrumOfASymmetricCavity() {
        Check printed = Checks.of("spectrum.symmetric_48cm");
        Check exact = Checks.of("spectrum.symmetric_48cm.exact");
        Solved solved =
                Solved.of(twoMirrors(ANY_WAVELENGTH, printed.in("L_m"), printed.in("R1_m"), printed.in("R2_m"), 0));
        double range = solved.cavity().freeSpectralRange();
        for (Plane plane : Plane.values()) {
            double spacing = solved.gouyFraction(plane) * range;
            printed.holds("FSR_Hz", range);
            exact.holds("FSR_Hz", range);
            printed.holds("spacing_Hz", spacing);
            exact.holds("spacing_Hz", spacing);
            printed.holds("FSR_minus_3_Hz", range - 3 * spacing);
            printed.holds("14FSR_minus_43_Hz", 14 * range - 43 * spacing);
        }
    }

    /** Caltech 40 m prototype, public electronic log, entry 469: places of transverse modes modulo the range. */
    @Test
    void printedModeOffsetsOfALongArm() {
        Check check = Checks.of("spectrum.arm40m");
        Solved solved = Solved.of(twoMirrors(ANY_WAVELENGTH, check.in("L_m"), check.in("R1_m"), check.in("R2_m"), 0));
        for (Plane plane : Plane.values()) {
            List<Double> megahertz = new ArrayList<>();
            for (int order = 1; order <= 22; order++) {
                megahertz.add(
                        order * solved.gouyFraction(plane) % 1 * solved.cavity().freeSpectralRange() / 1e6);
            }
            check.holds("offset_MHz", megahertz);
        }
    }

    private static Solved solved(Check check, double radius1, double radius2) {
        return Solved.of(twoMirrors(check.in("lambda_m"), check.in("L_m"), radius1, radius2, 0));
    }

    private static Design twoMirrors(double wavelength, double length, double radius1, double radius2, double heading) {
        return new Sketch(new Point(0, 0), heading)
                .mirror("M1", radius1)
                .go(length)
                .mirror("M2", radius2)
                .standingWave(wavelength);
    }
}
