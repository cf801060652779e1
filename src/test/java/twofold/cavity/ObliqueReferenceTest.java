package twofold.cavity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import twofold.Checks;
import twofold.Checks.Check;
import twofold.Sketch;
import twofold.Solved;
import twofold.design.Design;
import twofold.layout.Standing;
import twofold.optics.Plane;
import twofold.optics.Refraction;

/**
 * Oblique incidence: mirrors, faces, plates, Brewster crystals, and how they compensate each other. Focal lengths and
 * reduced lengths are not asked of the code that forms them, but recovered from the half traces of solved cavities.
 */
class ObliqueReferenceTest {
    private static final double WAVELENGTH = 1064e-9;

    /** Coddington; Kogelnik and others, IEEE J. Quantum Electron. 8, 373 (1972); Hanna, same 5, 483 (1969). */
    @ParameterizedTest
    @ValueSource(strings = {"mirror.oblique.5", "mirror.oblique.10", "mirror.oblique.15"})
    void aMirrorFocusesDifferentlyInBothPlanes(String id) {
        Check check = Checks.of(id);
        double incidence = Math.toRadians(check.in("theta_deg"));
        double tangential = focalLength(check.in("R_m"), incidence, Plane.TANGENTIAL);
        double sagittal = focalLength(check.in("R_m"), incidence, Plane.SAGITTAL);
        check.holds("fT_m", tangential);
        check.holds("fS_m", sagittal);
        check.holds("fS_minus_fT_m", sagittal - tangential);
    }

    /** Massey &amp; Siegman, Appl. Opt. 8, 975 (1969): a face's A and D, which do not depend on its curvature. */
    @Test
    void aFaceWidensTheBeamInThePlaneOfIncidence() {
        Check check = Checks.of("refract.sphere.oblique");
        double incidence = Math.toRadians(check.in("theta1_deg"));
        double magnification = Refraction.magnification(check.in("n2"), incidence);
        check.holds("A_T", magnification);
        check.holds("D_T", 1 / magnification);
        check.holds("theta2_deg", Math.toDegrees(incidence - Refraction.turn(check.in("n2"), incidence)));
    }

    /** Hanna 1969; Kogelnik and others 1972: reduced lengths; Snell's law: glass path and side shift. */
    @ParameterizedTest
    @ValueSource(strings = {"plate.30deg", "plate.brewster150"})
    void aTiltedPlateIsAShorterSpaceAndShiftsTheBeam(String id) {
        Check check = Checks.of(id);
        double incidence = Math.toRadians(check.in("theta_deg"));
        Solved solved = Solved.of(beforeAMirror(
                new Sketch().flat("Flat").go(0.1).plate("Plate", check.in("t_m"), check.in("n"), incidence)));
        check.holds("L_T_m", reducedLength(solved, Plane.TANGENTIAL));
        check.holds("L_S_m", reducedLength(solved, Plane.SAGITTAL));
        Standing plate = solved.cavity().laid().legs().get(0).parts().get(0);
        check.holds("path_m", plate.length());
        check.holds("shift_m", plate.shift());
        if (id.equals("plate.brewster150")) {
            check.holds("theta_B_deg", Math.toDegrees(Refraction.brewster(check.in("n"))));
        }
    }

    /** Hanna 1969; Kogelnik and others 1972: l/n³ and l/n. */
    @ParameterizedTest
    @ValueSource(strings = {"brewster_crystal.1.76", "brewster_crystal.1.6"})
    void aBrewsterCrystalIsAShorterSpace(String id) {
        Check check = Checks.of(id);
        Solved solved = Solved.of(beforeAMirror(
                new Sketch().flat("Flat").go(0.1).brewster("Crystal", check.in("path_m"), check.in("n"))));
        check.holds("L_T_m", reducedLength(solved, Plane.TANGENTIAL));
        check.holds("L_S_m", reducedLength(solved, Plane.SAGITTAL));
        Standing crystal = solved.cavity().laid().legs().get(0).parts().get(0);
        check.holds("theta_B_deg", Math.toDegrees(crystal.incidence()));
        check.holds("theta_inside_deg", Math.toDegrees(crystal.incidence() - crystal.turn()));
        check.holds("equivalent_plate_thickness_m", crystal.length() * Math.cos(crystal.incidence() - crystal.turn()));
    }

    /** Kogelnik, Ippen, Dienes &amp; Shank 1972: a Brewster plate's astigmatism is N(n) times its thickness. */
    @ParameterizedTest
    @ValueSource(strings = {"kids.N.1.45", "kids.N.1.5", "kids.N.1.76", "kids.N.1.82"})
    void aBrewsterPlatesAstigmatismIsKogelniksN(String id) {
        Check check = Checks.of(id);
        check.holds("N", astigmatismPerThickness(check.in("n")));
    }

    /** Derived: N is largest at n² = (1 + √17)/2. */
    @Test
    void theAstigmatismOfABrewsterPlateIsLargestAtOneIndex() {
        Check check = Checks.of("kids.N.max");
        double index = check.expected("n_at_max");
        double most = astigmatismPerThickness(index);
        check.holds("N_max", most);
        assertThat(most).isGreaterThan(astigmatismPerThickness(index - 0.01));
        assertThat(most).isGreaterThan(astigmatismPerThickness(index + 0.01));
    }

    /** Kogelnik and others 1972: one fold mirror at the angle of the closed form cancels one Brewster plate. */
    @ParameterizedTest
    @ValueSource(strings = {"kids.theta.single.a", "kids.theta.single.b", "kids.theta.single.c"})
    void aFoldMirrorCancelsABrewsterPlate(String id) {
        Check check = Checks.of(id);
        double incidence = Math.toRadians(check.expected("theta_deg"));
        double mirror = astigmatism(check.in("R_m"), incidence);
        double plate = astigmatismPerThickness(check.in("n")) * check.in("t_m");
        assertThat(mirror / plate).as(check.source()).isCloseTo(1, within(1e-9));
        assertThat(check.expected("full_fold_deg")).isCloseTo(2 * check.expected("theta_deg"), within(1e-9));
    }

    /** Kogelnik and others 1972, extended to two mirrors and a Brewster-cut crystal. */
    @ParameterizedTest
    @ValueSource(strings = {"kids.theta.double.a", "kids.theta.double.b", "kids.theta.double.c", "kids.theta.double.d"})
    void twoFoldMirrorsCancelABrewsterCrystal(String id) {
        Check check = Checks.of(id);
        cancel(check, check.in("n"), check.in("R1_m"), check.in("R2_m"), check.expected("theta_deg"));
    }

    /** The fold angle barely depends on which axis of sapphire is taken. */
    @Test
    void theFoldAngleOfTitaniumSapphire() {
        Check check = Checks.of("n.brewster.tisa");
        double radius = check.in("R_m");
        cancel(check, check.expected("n_o"), radius, radius, check.expected("fold_theta_o_deg"));
        cancel(check, check.expected("n_e"), radius, radius, check.expected("fold_theta_e_deg"));
    }

    private static void cancel(Check check, double index, double radius1, double radius2, double degrees) {
        double incidence = Math.toRadians(degrees);
        double mirrors = astigmatism(radius1, incidence) + astigmatism(radius2, incidence);
        Solved solved = Solved.of(
                beforeAMirror(new Sketch().flat("Flat").go(0.1).brewster("Crystal", check.in("path_m"), index)));
        double crystal = reducedLength(solved, Plane.SAGITTAL) - reducedLength(solved, Plane.TANGENTIAL);
        assertThat(mirrors / crystal).as(check.source()).isCloseTo(1, within(1e-9));
    }

    /** f_S − f_T of a fold mirror, m. */
    private static double astigmatism(double radius, double incidence) {
        return focalLength(radius, incidence, Plane.SAGITTAL) - focalLength(radius, incidence, Plane.TANGENTIAL);
    }

    /** L_S − L_T of a Brewster plate over its thickness. */
    private static double astigmatismPerThickness(double index) {
        double thickness = 0.01;
        Solved solved = Solved.of(
                beforeAMirror(new Sketch().flat("Flat").go(0.1).plate("Plate", thickness, index, Math.atan(index))));
        return (reducedLength(solved, Plane.SAGITTAL) - reducedLength(solved, Plane.TANGENTIAL)) / thickness;
    }

    /**
     * The focal length of a fold mirror, from a V of two flat mirrors at arms d shorter than it: the one-way A is 1 − d/f
     * and the half trace 2A² − 1.
     */
    private static double focalLength(double radius, double incidence, Plane plane) {
        double arm = radius / 4;
        Solved solved = Solved.of(new Sketch()
                .flat("A")
                .go(arm)
                .mirror("Fold", radius)
                .left(incidence)
                .go(arm)
                .flat("B")
                .standingWave(WAVELENGTH));
        return arm / (1 - Math.sqrt((1 + solved.mode(plane).halfTrace()) / 2));
    }

    /** A slab on the way from a flat mirror to one of 1 m. */
    private static Design beforeAMirror(Sketch untilSlab) {
        return untilSlab.go(0.1).mirror("Curved", 1).standingWave(WAVELENGTH);
    }

    /** What a slab adds to 0.2 m of air: the half trace is 2(1 − L/R) − 1. */
    private static double reducedLength(Solved solved, Plane plane) {
        return (1 - solved.mode(plane).halfTrace()) / 2 - 0.2;
    }
}
