package twofold.cavity;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import twofold.Checks;
import twofold.Checks.Check;
import twofold.Sketch;
import twofold.Solved;
import twofold.optics.Plane;

/** Folded standing waves in both planes. */
class FoldedReferenceTest {

    /** The eigenmode of an X- or Z-fold around a Brewster crystal; formulas as Kogelnik and others 1972. */
    @ParameterizedTest
    @ValueSource(booleans = {true, false})
    void aFoldAroundABrewsterCrystal(boolean crossed) {
        Check check = Checks.of("xfold.tisa");
        Solved solved = fold(check, check.in("a_m"), check.in("a_m"), crossed);
        for (Plane plane : Plane.values()) {
            String suffix = plane == Plane.TANGENTIAL ? "_T" : "_S";
            check.holds("half_trace" + suffix, solved.mode(plane).halfTrace());
            check.holds("gouy_rt_over_2pi" + suffix, solved.gouyFraction(plane));
            check.holds("wM1_um" + suffix, solved.radius("M1", plane) * 1e6);
            check.holds("wCM1_um" + suffix, solved.radius("CM1", plane) * 1e6);
            check.holds("wCM2_um" + suffix, solved.radius("CM2", plane) * 1e6);
            check.holds("wM2_um" + suffix, solved.radius("M2", plane) * 1e6);
            Waist inside = solved.waist("Crystal", "Crystal", plane);
            check.holds("wX_um" + suffix, inside.radiusAt(check.in("path_m") / 2) * 1e6);
            check.holds("xtal_waist_w0_um" + suffix, inside.radius() * 1e6);
            CrystalLine line = solved.line("Crystal", plane);
            check.holds("xtal_waist_w0_um" + suffix, line.radius() * 1e6);
            check.holds("xtal_waist_offset_mm" + suffix, line.offset() * 1e3);
        }
    }

    /** The edges of the same cavity's stability zones: found where the margin changes sign, by bisection. */
    @Test
    void theZonesOfAFoldAroundABrewsterCrystal() {
        Check check = Checks.of("xfold.tisa.edges");
        // Between two neighbours of these gaps lies one edge in each plane.
        double[] between = {0.097, 0.1, 0.102, 0.1045, 0.108};
        for (Plane plane : Plane.values()) {
            double[] edges = new double[between.length - 1];
            for (int i = 0; i < edges.length; i++) {
                double low = between[i];
                double high = between[i + 1];
                boolean stableBelow = margin(check, low, plane) > 0;
                assertThat(margin(check, high, plane) > 0).isNotEqualTo(stableBelow);
                for (int step = 0; step < 40; step++) {
                    double middle = (low + high) / 2;
                    if (margin(check, middle, plane) > 0 == stableBelow) {
                        low = middle;
                    } else {
                        high = middle;
                    }
                }
                edges[i] = low;
            }
            check.holds(
                    plane == Plane.TANGENTIAL ? "gap_m_T" : "gap_m_S", List.of(edges[0], edges[1], edges[2], edges[3]));
        }
    }

    /**
     * KAGRA collaboration public wiki, main-interferometer optical parameters, revision 22: four mirrors, one of them
     * convex. The source neglects the fold angles, so the plan lies on one line.
     */
    @Test
    void printedSpotsOfATelescopicCavity() {
        Check printed = Checks.of("linear5.kagra22");
        Check exact = Checks.of("linear5.kagra22.exact");
        Solved solved = telescope(printed);
        for (Plane plane : Plane.values()) {
            for (String mirror : List.of("PRM", "PR2", "PR3")) {
                double millimetres = solved.radius(mirror, plane) * 1e3;
                printed.holds("w_" + mirror + "_mm", millimetres);
                exact.holds("w_" + mirror + "_mm", millimetres);
            }
            exact.holds("one_way_gouy_deg", Math.toDegrees(solved.mode(plane).gouy()) / 2);
        }
    }

    /** The same cavity with the fold angle that the source prints: the long mirror magnifies the astigmatism. */
    @Test
    void aSmallFoldAngleSplitsTheTelescopicCavity() {
        Check check = Checks.of("linear5.kagra22.folded");
        Solved solved = telescope(check);
        for (Plane plane : Plane.values()) {
            String suffix = plane == Plane.TANGENTIAL ? "_T" : "_S";
            for (String mirror : List.of("PRM", "PR2", "PR3")) {
                check.holds("w_" + mirror + "_mm" + suffix, solved.radius(mirror, plane) * 1e3);
            }
        }
    }

    private static double margin(Check check, double gap, Plane plane) {
        return fold(check, gap / 2, gap / 2, false).mode(plane).margin();
    }

    private static Solved fold(Check check, double before, double after, boolean crossed) {
        double incidence = Math.toRadians(check.in("theta_deg"));
        Sketch half = new Sketch()
                .flat("M1")
                .go(check.in("L1_m"))
                .mirror("CM1", check.in("R_m"))
                .left(incidence)
                .go(before)
                .brewster("Crystal", check.in("path_m"), check.in("n"))
                .go(after)
                .mirror("CM2", check.in("R_m"));
        return Solved.of((crossed ? half.left(incidence) : half.right(incidence))
                .go(check.in("L2_m"))
                .flat("M2")
                .standingWave(check.in("lambda_m")));
    }

    private static Solved telescope(Check check) {
        double incidence = Math.toRadians(check.in("theta_deg"));
        return Solved.of(new Sketch()
                .mirror("PRM", check.in("R_PRM_m"))
                .go(check.in("d_PRM_PR2_m"))
                .mirror("PR2", check.in("R_PR2_m"))
                .left(incidence)
                .go(check.in("d_PR2_PR3_m"))
                .mirror("PR3", check.in("R_PR3_m"))
                .right(incidence)
                .go(check.in("d_PR3_ITM_m"))
                .flat("ITM")
                .standingWave(check.in("lambda_m")));
    }
}
