package twofold;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.FaceAngle;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.design.Side;
import twofold.design.TiltPlane;
import twofold.design.TwoPowers;

/** The tracer of real rays against closed forms, before it judges anything. */
class ExactRaysTest {
    /** What finite differences of 10 µm and the printed digits leave. */
    private static final double CLOSE = 2e-9;

    @Test
    void chiefRayMeetsEveryPartOfEveryDesign() {
        for (long seed = 0; seed < 200; seed++) {
            // Rounding: a hundred parts on metres, each direction known to 1e-16, magnified at most thirty times.
            assertThat(ExactRays.of(RandomDesigns.of(seed)).miss())
                    .as("seed %d", seed)
                    .isLessThan(1e-11);
        }
    }

    /** Coddington: f = R cosθ/2 in the plane of incidence, R/(2 cosθ) across it. */
    @Test
    void obliqueMirror() {
        for (double degrees : new double[] {5, 15, 45, 65}) {
            double theta = Math.toRadians(degrees);
            double[][] rays =
                    ExactRays.of(KnownCavities.fold(0.5, theta, 0.3, 0.2)).derivative();
            standing(rays, 0, 0.3, 0.2, 2 / (0.5 * Math.cos(theta)));
            standing(rays, 1, 0.3, 0.2, 2 * Math.cos(theta) / 0.5);
        }
    }

    /** Space, a lens, space, and back: with the one-way (A, B, C, D) it is (AD + BC, 2BD, 2AC, AD + BC). */
    private static void standing(double[][] rays, int plane, double first, double second, double power) {
        double a = 1 - second * power;
        double b = first + second - first * second * power;
        double d = 1 - first * power;
        closed(rays, plane, a * d - b * power, 2 * b * d, -2 * a * power);
    }

    private static void closed(double[][] rays, int plane, double a, double b, double c) {
        int i = 2 * plane;
        assertThat(rays[i][i]).as("A").isCloseTo(a, within(CLOSE * Math.max(1, Math.abs(a))));
        assertThat(rays[i + 1][i + 1]).as("D").isCloseTo(a, within(CLOSE * Math.max(1, Math.abs(a))));
        assertThat(rays[i][i + 1]).as("B").isCloseTo(b, within(CLOSE * Math.max(1, Math.abs(b))));
        assertThat(rays[i + 1][i]).as("C").isCloseTo(c, within(CLOSE * Math.max(1, Math.abs(c))));
    }

    /** Hanna, IEEE J. Quantum Electron. 5, 483 (1969): reduced lengths of a tilted plate, 5 mm of index 1.5. */
    @Test
    void tiltedPlate() {
        plate(FaceAngle.of(Math.toRadians(30)), Math.toRadians(30), 0.002983106733, 0.003535533906);
        plate(FaceAngle.BREWSTER, Math.atan(1.5), 0.001780519148, 0.004006168084);
    }

    private static void plate(FaceAngle faces, double theta, double within, double across) {
        double inner = Math.asin(Math.sin(theta) / 1.5);
        double path = 0.005 / Math.cos(inner);
        double turn = theta - inner;
        for (Side side : Side.values()) {
            boolean flat = side.of() == TiltPlane.TANGENTIAL;
            Part plate = KnownCavities.plate(0.005, KnownCavities.slab(Along.MIDDLE, 1.5, faces, side));
            Design design = KnownCavities.flat(
                    plate, path, path * Math.cos(turn), flat ? side.sign() * path * Math.sin(turn) : 0);
            assertThat(ExactRays.of(design).miss()).isLessThan(1e-15);
            double[][] rays = ExactRays.of(design).derivative();
            closed(rays, flat ? 0 : 1, 1, 2 * (0.2 - path + within), 0);
            closed(rays, flat ? 1 : 0, 1, 2 * (0.2 - path + across), 0);
        }
    }

    /**
     * A Brewster crystal is l/n³ and l/n long (Kogelnik, Ippen, Dienes and Shank, IEEE J. Quantum Electron. 8, 373 (1972));
     * a lens in its middle looks n² times as strong in the plane of the tilt, by the magnification n of a Brewster face.
     */
    @Test
    void brewsterCrystalWithLens() {
        double n = 1.76;
        double turn = 2 * Math.atan(n) - Math.PI / 2;
        double length = 0.02;
        Part crystal = KnownCavities.crystal(
                length, new TwoPowers(0.7, -0.4), KnownCavities.slab(Along.MIDDLE, n, FaceAngle.BREWSTER, Side.RIGHT));
        Design design = KnownCavities.flat(crystal, length, length * Math.cos(turn), -length * Math.sin(turn));
        double[][] rays = ExactRays.of(design).derivative();
        double air = (0.2 - length) / 2;
        double t = air + length / (2 * n * n * n);
        standing(rays, 0, t, t, 0.7 * n * n);
        double s = air + length / (2 * n);
        standing(rays, 1, s, s, -0.4);
    }

    /** An equilateral triangle with one curved mirror: half trace 1 − p/(2f), the swap of the third reflection left out. */
    @Test
    void oddRing() {
        double side = 0.4;
        double flat = Double.POSITIVE_INFINITY;
        Design design = Design.of(
                "Triangle",
                1e-6,
                Shape.RING,
                List.of(
                        KnownCavities.mirror("A", new Point(0, 0), 2),
                        KnownCavities.mirror("B", new Point(side, 0), flat),
                        KnownCavities.mirror("C", new Point(side / 2, side * Math.sqrt(0.75)), flat)));
        double[][] rays = ExactRays.of(design).derivative();
        double perimeter = 3 * side;
        double cos = Math.cos(Math.toRadians(30));
        assertThat(rays[0][1]).isCloseTo(perimeter, within(CLOSE * perimeter));
        assertThat(ExactRays.halfTrace(rays, 0)).isCloseTo(1 - perimeter / (2 * cos), within(CLOSE));
        assertThat(ExactRays.halfTrace(rays, 1)).isCloseTo(1 - perimeter * cos / 2, within(CLOSE));
    }

    /** Half traces of the design pages' X-fold and bow-tie, computed there to 40 digits from ray matrices. */
    @Test
    void foldedAndBowTie() {
        double[][] fold = ExactRays.of(KnownCavities.xFold()).derivative();
        // Its angle is printed to ten digits and the half trace reacts 1 to 100.
        assertThat(ExactRays.halfTrace(fold, 0)).isCloseTo(-0.3596418099, within(1e-8));
        assertThat(ExactRays.halfTrace(fold, 1)).isCloseTo(-0.3275808231, within(1e-8));
        double[][] ring = ExactRays.of(KnownCavities.bowTie()).derivative();
        assertThat(ExactRays.halfTrace(ring, 0)).isCloseTo(Math.cos(2 * Math.PI * 0.6499467373), within(CLOSE));
        assertThat(ExactRays.halfTrace(ring, 1)).isCloseTo(Math.cos(2 * Math.PI * 0.634522321), within(CLOSE));
    }
}
