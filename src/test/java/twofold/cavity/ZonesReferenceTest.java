package twofold.cavity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import twofold.Checks;
import twofold.Checks.Check;
import twofold.Sketch;
import twofold.design.Design;
import twofold.design.Edge;
import twofold.design.Field;
import twofold.design.Place;
import twofold.design.Quantity;
import twofold.layout.Layout;
import twofold.optics.Plane;

/** Zones and the ledger against closed forms. */
class ZonesReferenceTest {
    /** Lengths of a metre, added up a few times: 1e-15 m each. */
    private static final double ROUNDING = 1e-13;

    private static final Place GAP = Place.of("CM1", "CM2");

    private static Trial run(Design design) {
        Chain chain = Chain.of(Layout.of(design).value().orElseThrow());
        Trial trial = chain.trial();
        assertThat(trial.run()).isEqualTo(Fit.FITS);
        return trial;
    }

    private static double read(Quantity what, Place at, Optional<Plane> plane, Optional<Edge> edge, Trial trial) {
        return Reading.of(what, Optional.of(at), plane, edge, trial.numbers.chain)
                .of(trial);
    }

    private static double split(Trial trial, Place leg, Edge edge) {
        return read(Quantity.ZONE_EDGE_SPLIT, leg, Optional.empty(), Optional.of(edge), trial);
    }

    private static Design xFold(
            double radius, double theta, double path, double index, double gap, double first, double second) {
        return new Sketch()
                .flat("M1")
                .go(first)
                .mirror("CM1", radius)
                .left(theta)
                .go(gap / 2)
                .brewster("Crystal", path, index)
                .go(gap / 2)
                .mirror("CM2", radius)
                .right(theta)
                .go(second)
                .flat("M2")
                .standingWave(800e-9);
    }

    /** Kogelnik, Ippen, Dienes and Shank 1972: two mirrors and a Brewster crystal. The gap stands within the first zone. */
    @ParameterizedTest
    @ValueSource(strings = {"a", "b", "c", "d"})
    void lowerEdgesMeetAtTheCompensatingAngleOfTwoMirrors(String letter) {
        Check check = Checks.of("kids.theta.double." + letter);
        double radius = check.in("R1_m");
        double path = check.in("path_m");
        double theta = Math.toRadians(check.expected("theta_deg"));
        double gap = inFirstZone(radius, theta, path / check.in("n"), 0.9);
        Trial trial =
                run(xFold(radius, Math.toRadians(check.expected("theta_deg")), path, check.in("n"), gap, 0.6, 0.9));
        assertThat(split(trial, GAP, Edge.LOWER)).as(check.source()).isCloseTo(0, within(1e-12));
        assertThat(Math.abs(split(trial, GAP, Edge.UPPER))).isGreaterThan(1e-6);
    }

    /** A gap of air in the middle of the sagittal plane's first zone. */
    private static double inFirstZone(double radius, double theta, double reduced, double longer) {
        double f = radius / 2 / Math.cos(theta);
        return 2 * f - reduced + f * f / (longer - f) / 2;
    }

    /** The same with one mirror and a plate in the short arm. */
    @ParameterizedTest
    @ValueSource(strings = {"a", "b", "c"})
    void lowerEdgesMeetAtTheCompensatingAngleOfOneMirror(String letter) {
        Check check = Checks.of("kids.theta.single." + letter);
        double n = check.in("n");
        double radius = check.in("R_m");
        double theta = Math.toRadians(check.expected("theta_deg"));
        double f = radius / 2 / Math.cos(theta);
        double arm = f - check.in("t_m") / n + f * f / (0.6 - f) / 2;
        Trial trial = run(new Sketch()
                .flat("M1")
                .go(arm / 2)
                .plate("Plate", check.in("t_m"), n, Math.atan(n))
                .go(arm / 2)
                .mirror("Fold", radius)
                .left(theta)
                .go(0.6)
                .flat("M2")
                .standingWave(800e-9));
        assertThat(split(trial, Place.of("M1", "Fold"), Edge.LOWER))
                .as(check.source())
                .isCloseTo(0, within(1e-12));
    }

    @Test
    void theFourEdgesOfAnXFoldAreWhereAndWhatTheClosedFormSays() {
        Check check = Checks.of("xfold.tisa.edges");
        double path = check.in("path_m");
        Trial trial = run(xFold(
                check.in("R_m"),
                Math.toRadians(check.in("theta_deg")),
                path,
                check.in("n"),
                2 * check.in("a_m"),
                check.in("L1_m"),
                check.in("L2_m")));
        for (Plane plane : Plane.values()) {
            Zones zones = Zones.of(trial, 1, plane);
            check.holds(
                    plane == Plane.TANGENTIAL ? "gap_m_T" : "gap_m_S",
                    zones.edges().stream().map(e -> e.path() - path).toList());
            // Flat ends have their centres at infinity: parallel light stays parallel at the first edge. At the second
            // it
            // comes from M1, goes through CM1 and is focused on M2 by CM2, a little beyond its focal length.
            assertThat(zones.edges())
                    .extracting(ZoneEdge::cause)
                    .containsExactly(
                            EdgeCause.CENTRES_IMAGED,
                            EdgeCause.FIRST_CENTRE_ON_LAST,
                            EdgeCause.LAST_CENTRE_ON_FIRST,
                            EdgeCause.ENDS_IMAGED);
            assertThat(zones.zones()).hasSize(2);
            assertThat(zones.here()).contains(zones.zones().get(0));
        }
    }

    /** Equal arms: the second and third edge are one place, a double root that no sign tells. */
    @ParameterizedTest
    @ValueSource(doubles = {0.3, 0.6, 0.9})
    void equalArmsMakeTwoEdgesMeet(double arm) {
        double theta = Math.toRadians(9);
        double index = 1.76;
        double length = 0.004;
        Trial trial = run(xFold(0.1, theta, length, index, 0.1, arm, arm));
        for (Plane plane : Plane.values()) {
            boolean t = plane == Plane.TANGENTIAL;
            double f = t ? 0.05 * Math.cos(theta) : 0.05 / Math.cos(theta);
            double reduced = t ? length / Math.pow(index, 3) : length / index;
            double first = 2 * f - reduced + length;
            double step = f * f / (arm - f);
            Zones zones = Zones.of(trial, 1, plane);
            assertThat(zones.edges()).hasSize(4);
            assertThat(zones.edges().get(0).path()).isCloseTo(first, within(ROUNDING));
            assertThat(zones.edges().get(1).path()).isCloseTo(first + step, within(ROUNDING));
            assertThat(zones.edges().get(2).path()).isCloseTo(first + step, within(ROUNDING));
            assertThat(zones.edges().get(3).path()).isCloseTo(first + 2 * step, within(ROUNDING));
            assertThat(zones.edges().subList(1, 3))
                    .extracting(ZoneEdge::cause)
                    .containsExactlyInAnyOrder(EdgeCause.FIRST_CENTRE_ON_LAST, EdgeCause.LAST_CENTRE_ON_FIRST);
            assertThat(zones.zones()).as("two zones that touch").hasSize(2);
        }
    }

    /** Overlap against the four closed forms: the first zone of the sagittal plane within both of the tangential. */
    @ParameterizedTest
    @CsvSource({"0.6, 0.9, 7.1", "0.6, 0.9, 9", "0.4, 0.5, 4", "0.9, 0.3, 11"})
    void overlapIsTheCommonLength(double one, double two, double degrees) {
        double theta = Math.toRadians(degrees);
        double cos = Math.cos(theta);
        double fs = 0.05 / cos;
        double ft = 0.05 * cos;
        double shorter = Math.max(one, two);
        double longer = Math.min(one, two);
        double s0 = 2 * fs - 0.004 / 1.76;
        double s1 = s0 + fs * fs / (shorter - fs);
        double t0 = 2 * ft - 0.004 / Math.pow(1.76, 3);
        double t1 = t0 + ft * ft / (shorter - ft);
        double t2 = t0 + ft * ft / (longer - ft);
        double t3 = t2 + ft * ft / (shorter - ft);
        double expected =
                Math.max(0, Math.min(s1, t1) - Math.max(s0, t0)) + Math.max(0, Math.min(s1, t3) - Math.max(s0, t2));
        Trial trial = run(xFold(0.1, theta, 0.004, 1.76, (s0 + s1) / 2, one, two));
        assertThat(read(Quantity.ZONE_OVERLAP, GAP, Optional.empty(), Optional.empty(), trial))
                .isCloseTo(expected, within(ROUNDING));
        assertThat(split(trial, GAP, Edge.LOWER)).isCloseTo(t0 - s0, within(ROUNDING));
        assertThat(split(trial, GAP, Edge.UPPER)).isCloseTo(t1 - s1, within(ROUNDING));
    }

    /** The closed form of a symmetric bow-tie over a range of arms: stable iff 0 < (a − f)(b − f) < f². */
    @ParameterizedTest
    @CsvSource({"0.30, 6", "0.40, 6", "0.55, 8", "0.90, 12", "0.25, 3"})
    void aSymmetricBowTie(double longArm, double degrees) {
        double theta = Math.toRadians(degrees);
        double length = 0.01;
        double index = 1.605;
        double b = longArm / 2;
        double fs = 0.05 / Math.cos(theta);
        double a = fs + fs * fs / (b - fs) / 3;
        double path = 2 * a - length / index + length;
        Trial trial = run(bowTie(theta, path, length, index, longArm));
        for (Plane plane : Plane.values()) {
            double f = plane == Plane.TANGENTIAL ? 0.05 * Math.cos(theta) : fs;
            Zones zones = Zones.of(trial, 0, plane);
            double more = length - length / index;
            assertThat(zones.edges())
                    .extracting(ZoneEdge::cause)
                    .containsExactly(EdgeCause.CLOSES_REVERSED, EdgeCause.CLOSES_AT_ONCE);
            // The plan is closed to rounding, and so are its arms.
            assertThat(zones.edges().get(0).path()).isCloseTo(2 * f + more, within(1e-12));
            assertThat(zones.edges().get(1).path()).isCloseTo(2 * (f + f * f / (b - f)) + more, within(1e-12));
            assertThat(zones.zones()).hasSize(1);
            double u = (a - f) * (b - f);
            if (u > 0 && u < f * f) {
                double rayleigh = Math.sqrt((a - f) * (f * f - u) / (b - f));
                double far = Math.sqrt((b - f) * (f * f - u) / (a - f));
                assertThat(read(
                                Quantity.WAIST_RADIUS,
                                Place.of("Crystal"),
                                Optional.of(plane),
                                Optional.empty(),
                                trial))
                        .isCloseTo(Math.sqrt(1064e-9 / Math.PI * rayleigh), within(1e-12));
                assertThat(read(
                                Quantity.WAIST_RADIUS,
                                Place.of("F1", "F2"),
                                Optional.of(plane),
                                Optional.empty(),
                                trial))
                        .isCloseTo(Math.sqrt(1064e-9 / Math.PI * far), within(1e-12));
            } else {
                assertThat(trial.hasBeam(plane)).isFalse();
            }
        }
    }

    private static Design bowTie(double theta, double path, double length, double index, double longArm) {
        double cos = Math.cos(2 * theta);
        // Two diagonals d and a straight arm 2 d cos 2θ − path make the long way round.
        double diagonal = (longArm + path) / (2 + 2 * cos);
        Sketch sketch = new Sketch()
                .mirror("C1", 0.1)
                .go((path - length) / 2)
                .crystal("Crystal", length, index)
                .go((path - length) / 2)
                .mirror("C2", 0.1)
                .left(theta)
                .go(diagonal)
                .flat("F1")
                .right(theta)
                .go(2 * diagonal * cos - path)
                .flat("F2")
                .right(theta)
                .go(diagonal);
        assertThat(sketch.gap()).isLessThan(1e-14);
        return sketch.ring(1064e-9);
    }

    /** Magni, Appl. Opt. 25, 107 (1986): two zones along the power of a lens, equally wide, with one smallest spot. */
    @Test
    void aLensBetweenTwoFlatMirrors() {
        Check check = Checks.of("magni.zones.0");
        Trial trial = run(new Sketch()
                .flat("M1")
                .go(check.in("L1_m"))
                .lens("Lens", 1)
                .go(check.in("L2_m"))
                .flat("M2")
                .standingWave(check.in("lambda_m")));
        Chain chain = trial.numbers.chain;
        int focus = chain.slot(chain.part("Lens"), Field.FOCAL_LENGTH);
        List<Double> edges = new ArrayList<>();
        for (EdgeCause cause : EdgeCause.of(chain)) {
            double step = 0.1234567;
            for (double power = -0.05; power < 4; power += step) {
                double low = at(cause, trial, focus, power);
                if (low * at(cause, trial, focus, power + step) < 0) {
                    edges.add(new BrentSolver(1e-14, 1e-14, 1e-15)
                            .solve(100, p -> at(cause, trial, focus, p), power, power + step));
                }
            }
        }
        edges.sort(null);
        check.holds("edges_per_m", edges);
        check.holds("width_per_m", edges.get(1) - edges.get(0));
        check.holds("width_per_m", edges.get(3) - edges.get(2));
        Reading spot = Reading.of(
                Quantity.RADIUS, Optional.of(Place.of("Lens")), Optional.of(Plane.SAGITTAL), Optional.empty(), chain);
        for (int zone = 0; zone < 2; zone++) {
            // Where a function is flat its value is known to the square of what its place is.
            double least = new BrentOptimizer(1e-9, 1e-12)
                    .optimize(
                            new MaxEval(200),
                            new UnivariateObjectiveFunction(p -> {
                                trial.set(focus, 1 / p);
                                trial.run();
                                return spot.of(trial);
                            }),
                            GoalType.MINIMIZE,
                            new SearchInterval(edges.get(2 * zone) + 1e-3, edges.get(2 * zone + 1) - 1e-3))
                    .getValue();
            check.holds("w_lens_min_m", least);
        }
    }

    private static double at(EdgeCause cause, Trial trial, int focus, double power) {
        trial.set(focus, 1 / power);
        trial.run();
        return cause.of(trial, Plane.TANGENTIAL);
    }

    /** Each mirror −(R/2) sinθ tanθ and the crystal N t = l(n² − 1)/n³, whatever the angles and radii. */
    @ParameterizedTest
    @CsvSource({"0.1, 7.9, 0.005, 1.76", "0.1, 11.2, 0.01, 1.76", "0.05, 14, 0.002, 1.82", "0.15, 3, 0.003, 1.45"})
    void sharesAreThoseOfTheClosedForm(double radius, double degrees, double length, double index) {
        double theta = Math.toRadians(degrees);
        double gap = inFirstZone(radius, theta, length / index, 0.9);
        Trial trial = run(xFold(radius, theta, length, index, gap, 0.6, 0.9));
        Ledger ledger = Ledger.of(trial, 1, Edge.LOWER).orElseThrow();
        double mirror = -radius / 2 * Math.sin(theta) * Math.tan(theta);
        double crystal = length * (index * index - 1) / Math.pow(index, 3);
        assertThat(ledger.shares()).extracting(Ledger.Share::part).containsExactly(1, 2, 3);
        assertThat(ledger.shares().get(0).length()).isCloseTo(mirror, within(ROUNDING));
        assertThat(ledger.shares().get(1).length()).isCloseTo(crystal, within(ROUNDING));
        assertThat(ledger.shares().get(2).length()).isCloseTo(mirror, within(ROUNDING));
        assertThat(ledger.sum()).isCloseTo(2 * mirror + crystal, within(ROUNDING));
        assertThat(ledger.remainder()).as("shares add up at the lower edge").isCloseTo(0, within(ROUNDING));
        assertThat(ledger.split()).isEqualTo(split(trial, GAP, Edge.LOWER));
    }

    /** Along an arm the edges contain products of what the parts do: what shares leave of the split is of second order. */
    @Test
    void elsewhereSharesAddUpToFirstOrder() {
        double remains = remains(Math.toRadians(2), 0.4e-3);
        double smaller = remains(Math.toRadians(1), 0.1e-3);
        assertThat(remains).as("not nothing").isGreaterThan(1e-3);
        // Half the angle is a quarter of the astigmatism, of which terms of third order are 3 %.
        assertThat(smaller / remains).isCloseTo(0.25, within(0.01));
    }

    /** What the shares leave of the split along the second arm, relative to the largest of them. */
    private static double remains(double theta, double length) {
        double gap = inFirstZone(0.1, theta, length / 1.5, 0.9);
        Ledger ledger = Ledger.of(run(xFold(0.1, theta, length, 1.5, gap, 0.6, 0.9)), 2, Edge.LOWER)
                .orElseThrow();
        double largest = ledger.shares().stream()
                .mapToDouble(s -> Math.abs(s.length()))
                .max()
                .orElseThrow();
        return Math.abs(ledger.remainder()) / largest;
    }
}
