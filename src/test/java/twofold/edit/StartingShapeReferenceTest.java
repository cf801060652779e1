package twofold.edit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Map;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import twofold.Checks;
import twofold.Checks.Check;
import twofold.design.Design;
import twofold.design.Unit;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.layout.Outcome;

/**
 * Starting shapes against closed forms: the compensating angle of Kogelnik, Ippen, Dienes &amp; Shank, IEEE J. Quantum
 * Electron. 8, 373 (1972), and zones of two mirrors (Kogelnik &amp; Li, Appl. Opt. 5, 1550 (1966)), of folds and rings as
 * derived from lenses f = R cosθ/2 and R/(2 cosθ).
 */
class StartingShapeReferenceTest {
    /** Lengths of a metre, added up a few times, in a middle that is iterated to 1e-14 m. */
    private static final double ROUNDING = 1e-12;

    private static Laid made(StartingShape shape, StartingValues values) {
        Outcome<Design> design = shape.make(values);
        assertThat(design.problems()).isEmpty();
        Outcome<Laid> laid = Layout.of(design.value().orElseThrow());
        assertThat(laid.problems()).isEmpty();
        return laid.value().orElseThrow();
    }

    private static double path(Laid laid, String from, String to) {
        int a = laid.design().indexOf(from).orElseThrow();
        int b = laid.design().indexOf(to).orElseThrow();
        return laid.legs().stream()
                .filter(l -> l.from() == a && l.to() == b)
                .findFirst()
                .orElseThrow()
                .path();
    }

    private static double incidence(Laid laid, String mirror) {
        return laid.incidence().getOrDefault(laid.design().indexOf(mirror).orElseThrow(), Double.NaN);
    }

    @ParameterizedTest
    @ValueSource(strings = {"kids.theta.single.a", "kids.theta.single.b", "kids.theta.single.c"})
    void aVStandsAtTheAngleThatCompensates(String id) {
        Check check = Checks.of(id);
        double n = check.in("n");
        // The path inside a Brewster-cut slab of thickness t is t √(n² + 1)/n.
        double inside = check.in("t_m") * Math.sqrt(n * n + 1) / n;
        StartingValues values = StartingShape.V
                .defaults()
                .with(CrystalCut.BREWSTER)
                .withIndex(n)
                .with(StartingInput.CRYSTAL_LENGTH, inside)
                .with(StartingInput.FOLD, check.in("R_m"));
        check.holds("theta_deg", Math.toDegrees(incidence(made(StartingShape.V, values), "Fold")));
    }

    @ParameterizedTest
    @CsvSource({
        "kids.theta.double.a, Z", "kids.theta.double.a, X", "kids.theta.double.b, Z", "kids.theta.double.b, X",
        "kids.theta.double.c, Z", "kids.theta.double.c, X", "kids.theta.double.d, Z", "kids.theta.double.d, X"
    })
    void aZAndAnXStandAtTheAngleThatCompensates(String id, StartingShape shape) {
        Check check = Checks.of(id);
        StartingValues values = shape.defaults()
                .withIndex(check.in("n"))
                .with(StartingInput.CRYSTAL_LENGTH, check.in("path_m"))
                .with(StartingInput.FOLD_1, check.in("R1_m"))
                .with(StartingInput.FOLD_2, check.in("R2_m"));
        Laid laid = made(shape, values);
        check.holds("theta_deg", Math.toDegrees(incidence(laid, "Fold 1")));
        check.holds("theta_deg", Math.toDegrees(incidence(laid, "Fold 2")));
    }

    private static StartingValues bowTie(double n, double inside, double r1, double r2, double roundTrip) {
        return StartingShape.BOW_TIE
                .defaults()
                .with(CrystalCut.BREWSTER)
                .withIndex(n)
                .with(StartingInput.CRYSTAL_LENGTH, inside)
                .with(StartingInput.CURVED_1, r1)
                .with(StartingInput.CURVED_2, r2)
                .with(StartingInput.ROUND_TRIP, roundTrip);
    }

    /** Equal mirrors: the lower edge is at a gap of 2f whatever the long way round, so the angle is that of a Z. */
    @ParameterizedTest
    @ValueSource(strings = {"kids.theta.double.a", "kids.theta.double.b", "kids.theta.double.c", "kids.theta.double.d"})
    void aBowTieStandsAtTheAngleThatCompensates(String id) {
        Check check = Checks.of(id);
        Laid laid = made(
                StartingShape.BOW_TIE,
                bowTie(check.in("n"), check.in("path_m"), check.in("R1_m"), check.in("R2_m"), 1.2));
        for (String mirror : List.of("Curved 1", "Curved 2", "Flat 1", "Flat 2")) {
            check.holds("theta_deg", Math.toDegrees(incidence(laid, mirror)));
        }
        assertThat(laid.legs().stream().mapToDouble(l -> l.path()).sum()).isCloseTo(1.2, within(ROUNDING));
    }

    /**
     * Unequal mirrors: with gap g, long way round L and F = f₁ + f₂, the half trace 1 − (g + L)F/(2 f₁ f₂) + g L/(2 f₁ f₂)
     * of two lenses is −1 at g = (L F − 4 f₁ f₂)/(L − F), to be reached at one air path in both planes.
     */
    @Test
    void aBowTieOfUnequalMirrorsCompensatesItsOwnEdge() {
        double n = 1.76;
        double inside = 6e-3;
        Laid laid = made(StartingShape.BOW_TIE, bowTie(n, inside, 0.1, 0.15, 1.2));
        double cos = Math.cos(incidence(laid, "Curved 1"));
        double longWay = 1.2 - path(laid, "Curved 1", "Curved 2");
        double tangential = lowerEdge(0.05 * cos, 0.075 * cos, longWay) - inside / (n * n * n);
        double sagittal = lowerEdge(0.05 / cos, 0.075 / cos, longWay) - inside / n;
        assertThat(tangential).isCloseTo(sagittal, within(ROUNDING));
    }

    private static double lowerEdge(double f1, double f2, double longWay) {
        return (longWay * (f1 + f2) - 4 * f1 * f2) / (longWay - f1 - f2);
    }

    /** 0 < (1 − L/R₁)(1 − L/R₂) < 1: from 0 to the smaller radius, from the larger to the sum. */
    @ParameterizedTest
    @CsvSource({"Infinity, 500, 250", "300, 500, 150", "500, 500, 250", "-100, 500, 450", "500, -100, 450"})
    void twoMirrorsStandInTheMiddleOfTheirZone(double first, double second, double length) {
        StartingValues values = StartingShape.TWO_MIRROR
                .defaults()
                .with(StartingInput.END_A, first * 1e-3)
                .with(StartingInput.END_B, second * 1e-3);
        assertThat(path(made(StartingShape.TWO_MIRROR, values), "End A", "End B"))
                .isCloseTo(length * 1e-3, within(ROUNDING));
    }

    /**
     * Flat end mirrors: the gap's zones are f₁ + f₂ − L_eff + {0, f₂²/(L₂ − f₂), f₁²/(L₁ − f₁), sum}, and at the angle that
     * compensates the lower edge of the first is one in both planes.
     */
    @ParameterizedTest
    @CsvSource({"Z, 0.1, 0.1, 0.5, 0.7", "X, 0.1, 0.1, 0.6, 0.9", "Z, 0.15, 0.1, 0.45, 0.45", "X, 0.05, 0.2, 0.8, 1.2"})
    void aFocusBetweenFoldsIsInTheMiddleOfItsFirstZone(
            StartingShape shape, double r1, double r2, double arm1, double arm2) {
        double n = 1.76;
        double inside = 4e-3;
        StartingValues values = shape.defaults()
                .withIndex(n)
                .with(StartingInput.CRYSTAL_LENGTH, inside)
                .with(StartingInput.FOLD_1, r1)
                .with(StartingInput.FOLD_2, r2)
                .with(StartingInput.ARM_1, arm1)
                .with(StartingInput.ARM_2, arm2);
        Laid laid = made(shape, values);
        double cos = Math.cos(incidence(laid, "Fold 1"));
        double lower = (r1 + r2) / 2 * cos + inside - inside / (n * n * n);
        double upper = Math.min(
                lower + firstZone(r1 / 2 * cos, r2 / 2 * cos, arm1, arm2),
                lower + firstZone(r1 / 2 / cos, r2 / 2 / cos, arm1, arm2));
        assertThat(path(laid, "Fold 1", "Fold 2")).isCloseTo((lower + upper) / 2, within(ROUNDING));
    }

    private static double firstZone(double f1, double f2, double arm1, double arm2) {
        return Math.min(f1 * f1 / (arm1 - f1), f2 * f2 / (arm2 - f2));
    }

    /** Half the gap, a, and half the long way round, b: 0 < (a − f)(b − f) < f². */
    @Test
    void aBowTieStandsInTheMiddleOfItsZone() {
        Laid laid = made(StartingShape.BOW_TIE, StartingShape.BOW_TIE.defaults().with(CrystalCut.NONE));
        double cos = Math.cos(incidence(laid, "Curved 1"));
        double gap = path(laid, "Curved 1", "Curved 2");
        double b = (0.54 - gap) / 2;
        double tangential = 0.05 * cos;
        double sagittal = 0.05 / cos;
        double lower = 2 * Math.max(tangential, sagittal);
        double upper = 2
                * Math.min(
                        tangential + tangential * tangential / (b - tangential),
                        sagittal + sagittal * sagittal / (b - sagittal));
        assertThat(gap).isCloseTo((lower + upper) / 2, within(ROUNDING));
    }

    /** One lens in a ring: stable while the round trip is below 4f, tangentially 2R cosθ with cosθ = height/side. */
    @Test
    void aTriangleStandsInTheMiddleOfItsZone() {
        double base = 0.04;
        double radius = 0.5;
        Laid laid = made(StartingShape.TRIANGLE, StartingShape.TRIANGLE.defaults());
        BrentSolver solver = new BrentSolver(1e-15, 1e-15);
        double lower = solver.solve(1000, y -> excess(y, base, radius), 1e-3, 0.05);
        double upper = solver.solve(1000, y -> excess(y, base, radius), 0.05, 0.6);
        double height = laid.design().mirrors().get(2).at().y();
        assertThat(height).isCloseTo((lower + upper) / 2, within(ROUNDING));
    }

    private static double excess(double height, double base, double radius) {
        double side = Math.hypot(height, base / 2);
        return base + 2 * side - 2 * radius * height / side;
    }

    @Test
    void aLengthThatIsStatedIsKept() {
        StartingValues two = StartingShape.TWO_MIRROR.defaults().with(StartingInput.LENGTH, 0.3);
        assertThat(path(made(StartingShape.TWO_MIRROR, two), "End A", "End B")).isCloseTo(0.3, within(ROUNDING));
        StartingValues ring = StartingShape.TRIANGLE.defaults().with(StartingInput.PERIMETER, 0.44);
        Laid laid = made(StartingShape.TRIANGLE, ring);
        assertThat(laid.legs().stream().mapToDouble(l -> l.path()).sum()).isCloseTo(0.44, within(ROUNDING));
    }

    /** A flat and a concave mirror of radius R are stable up to R: 600 mm need at least that. */
    @Test
    void aRadiusThatWouldDoIsNamed() {
        StartingValues values = StartingShape.TWO_MIRROR.defaults().with(StartingInput.LENGTH, 0.6);
        Outcome<Design> refused = StartingShape.TWO_MIRROR.make(values);
        assertThat(refused.value()).isEmpty();
        assertThat(refused.problems())
                .singleElement()
                .satisfies(p -> assertThat(p.line())
                        .contains("length: found 600.00 mm", "0.00 to 500.00 mm", "length ", "radius of End B "));
        Map<StartingInput, Double> nearby = new java.util.EnumMap<>(StartingInput.class);
        StartingNearby.of(StartingShape.TWO_MIRROR, values).forEach(n -> nearby.put(n.input(), n.value()));
        // Halved ten times from a step of a quarter, then rounded to 0.01 mm.
        assertThat(nearby.get(StartingInput.END_B)).isBetween(0.6, 0.6 * (1 + 0.25 / 1000) + 1e-5);
        assertThat(nearby.get(StartingInput.LENGTH)).isBetween(0.5 * (1 - 0.25 / 1000) - 1e-5, 0.5);
    }

    /** The program's unit of angles is exact: 8° is what is asked for and what stands. */
    @Test
    void withoutABrewsterCrystalTheIncidenceIsThePersons() {
        Laid laid = made(StartingShape.Z, StartingShape.Z.defaults().with(CrystalCut.NORMAL));
        assertThat(incidence(laid, "Fold 2")).isCloseTo(Unit.DEG.toSi(8.0), within(ROUNDING));
    }
}
