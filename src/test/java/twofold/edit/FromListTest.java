package twofold.edit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import twofold.design.Design;
import twofold.design.Mirror;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.layout.Laid;
import twofold.layout.Layout;

/** Plans from typed lists: the grammar, where faults lie, rings that close and rings that do not. */
class FromListTest {
    private static final double WAVELENGTH = 800e-9;

    /** Sums of a few lengths of a metre. */
    private static final double ROUNDING = 1e-14;

    private static Design design(String text) {
        FromList list = FromList.read(text, WAVELENGTH);
        assertThat(list.faults()).as(text).isEmpty();
        return list.design().orElseThrow();
    }

    private static Point at(Design design, int mirror) {
        return design.mirrors().get(mirror).at();
    }

    private static void isAt(Point point, double x, double y) {
        assertThat(point.x()).isCloseTo(x, within(ROUNDING));
        assertThat(point.y()).isCloseTo(y, within(ROUNDING));
    }

    @Test
    void aZKeepsItsArmsParallel() {
        Design design = design("480, 105, 620; 7.9°, 7.9°");
        double turn = Math.toRadians(2 * 7.9);
        double x = 0.48 - 0.105 * Math.cos(turn);
        double y = 0.105 * Math.sin(turn);
        assertThat(design.shape()).isEqualTo(Shape.STANDING_WAVE);
        assertThat(design.mirrors().stream().map(Mirror::name)).containsExactly("End A", "Fold 1", "Fold 2", "End B");
        isAt(at(design, 1), 0.48, 0);
        isAt(at(design, 2), x, y);
        isAt(at(design, 3), x + 0.62, y);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "480, 105, 620; 7.9 L, 7.9 L",
                "48 cm,105mm,  0.62 m;left 7.9°, 7.9° left",
                "480, 105, 620;\n+7.9, l7.9",
                "480, 105, 620; 7.9, 7.9 L;",
                "480, 105, 620; 7°54', 7.9 L"
            })
    void anXCrossesItsArms(String text) {
        Design design = design(text);
        double turn = Math.toRadians(2 * 7.9);
        double x = 0.48 - 0.105 * Math.cos(turn);
        double y = 0.105 * Math.sin(turn);
        isAt(at(design, 3), x + 0.62 * Math.cos(2 * turn), y - 0.62 * Math.sin(2 * turn));
    }

    @Test
    void aTurnThatIsStatedTurnsTheNextOneBack() {
        assertThat(design("480, 105, 620; 7.9 R, 7.9")).isEqualTo(design("480, 105, 620; -7.9, +7.9"));
        assertThat(at(design("480, 105, 620; 7.9 R, 7.9"), 2).y()).isNegative();
        assertThat(at(design("480, 105, 620; 7.9 R, 7.9"), 3).y())
                .isCloseTo(at(design("480, 105, 620; 7.9 R, 7.9"), 2).y(), within(ROUNDING));
    }

    @Test
    void radiiAreOfTheFoldsOrOfAll() {
        assertThat(radii("480, 105, 620; 8, 8; 100")).containsExactly(flat(), 0.1, 0.1, flat());
        assertThat(radii("480, 105, 620; 8, 8; 100, 10 cm")).containsExactly(flat(), 0.1, 0.1, flat());
        assertThat(radii("480, 105, 620; 8, 8; 100, 50")).containsExactly(flat(), 0.1, 0.05, flat());
        assertThat(radii("480, 105, 620; 8, 8; flat, 100, 50, -500")).containsExactly(flat(), 0.1, 0.05, -0.5);
        assertThat(radii("250; ; flat, 500")).containsExactly(flat(), 0.5);
        assertThat(radii("250")).containsExactly(flat(), flat());
    }

    private static List<Double> radii(String text) {
        return design(text).mirrors().stream().map(Mirror::radius).toList();
    }

    private static double flat() {
        return Double.POSITIVE_INFINITY;
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "480, 1o5, 620; 7.9, 7.9       | 5  | 8  | 1o5          | a number",
                "480, 105, 620; 7.9            | 15 | 18 | 1 angle      | 2 for a standing wave, or 3 for a ring",
                "480, 105; 7.9, 8              | 10 | 16 | 2 angles     | 1 for a standing wave",
                "480, , 620; 7.9, 7.9          | 5  | 5  | nothing      | a number",
                "480, 105, -620; 7.9, 7.9      | 10 | 14 | -620         | above 0",
                "480, 105, 620; 7.9, 95        | 20 | 22 | 95           | below 89",
                "480, 105, 620; 7.9, -7.9 L    | 20 | 26 | turn         | a sign, L or R",
                "480, 105, 620; 7, 7; 1, 2, 3  | 21 | 28 | 3 radii      | 1 for every fold, 2 for the folds, or 4",
                "480, 105, 620; 7, 7; 100; 200 | 26 | 29 | fourth group | no more",
                "''                            | 0  | 0  | no leg       | at least one length",
            })
    void aFaultLiesAtItsCharacters(String text, int from, int to, String found, String accepted) {
        FromList list = FromList.read(text, WAVELENGTH);
        assertThat(list.design()).isEmpty();
        assertThat(list.faults()).singleElement().satisfies(f -> {
            assertThat(f.from()).isEqualTo(from);
            assertThat(f.to()).isEqualTo(to);
            assertThat(f.found()).startsWith("found ").contains(found);
            assertThat(f.accepted()).contains(accepted);
            assertThat(f.line()).startsWith("character " + (from + 1) + ": found ");
        });
    }

    @Test
    void allFaultsAreTold() {
        assertThat(FromList.read("x, 105, y; z, 7.9", WAVELENGTH).faults())
                .extracting(FromList.Fault::from)
                .containsExactly(0, 8, 11);
    }

    /** Mirrors of one line: the last leg leads back through the first mirror. */
    @Test
    void whatCannotStandIsRefusedAsAWhole() {
        FromList list = FromList.read("100, 100; 0", WAVELENGTH);
        assertThat(list.faults())
                .singleElement()
                .satisfies(f -> assertThat(f.found()).contains("\"End B\" at the point of \"End A\""));
    }

    /** An equilateral triangle: incidences of 30°. */
    @Test
    void aTriangleClosesExactly() {
        Design design = design("200, 200, 200; 30, 30, 30; 500");
        assertThat(design.shape()).isEqualTo(Shape.RING);
        isAt(at(design, 1), 0.2, 0);
        isAt(at(design, 2), 0.1, 0.2 * Math.sqrt(0.75));
    }

    /** A bow-tie of a gap g, diagonals d and an arm s = 2 d cos 2θ − g; which turns it takes is found. */
    @Test
    void aBowTieFindsItsTurns() {
        double theta = Math.toRadians(8);
        double arm = 2 * 140 * Math.cos(2 * theta) - 117;
        String text = "117, 140, " + String.format(java.util.Locale.ROOT, "%.3f", arm) + ", 140; 8, 8, 8, 8";
        Laid laid = Layout.of(design(text)).value().orElseThrow();
        assertThat(laid.legs()).hasSize(4);
        laid.incidence().values().forEach(i -> assertThat(Math.toDegrees(i)).isCloseTo(8, within(0.001)));
        assertThat(laid.legs().get(3).path()).isCloseTo(0.14, within(1e-6));
    }

    @Test
    void aRingThatMissesItsBeginningSaysByHowMuchAndWhatWouldClose() {
        FromList list = FromList.read("200, 200, 201; 30, 30, 30", WAVELENGTH);
        assertThat(list.design()).isEmpty();
        assertThat(list.faults())
                .singleElement()
                .satisfies(f -> assertThat(f.line())
                        .startsWith(
                                "character 1: found a ring that misses its beginning by 1.00 mm and 0.00°; accepted: lengths")
                        .contains("the closest: 200."));
        design(list.closing().orElseThrow());
    }

    /** Random polygons are measured, their numbers changed a little: what is offered closes, and is no further off than they. */
    @Test
    void theClosestListThatClosesIsClosest() {
        SplittableRandom random = new SplittableRandom(9);
        int offered = 0;
        for (int i = 0; i < 60; i++) {
            int n = 3 + random.nextInt(4);
            List<Point> corners = new ArrayList<>();
            for (int k = 0; k < n; k++) {
                double angle = 2 * Math.PI * (k + 0.4 * random.nextDouble()) / n;
                double radius = 200 + 100 * random.nextDouble();
                corners.add(new Point(radius * Math.cos(angle), radius * Math.sin(angle)));
            }
            List<Double> legs = new ArrayList<>();
            List<Double> angles = new ArrayList<>();
            for (int k = 0; k < n; k++) {
                Point a = corners.get(k);
                Point b = corners.get((k + 1) % n);
                Point c = corners.get((k + 2) % n);
                legs.add(a.distance(b));
                double ba = Math.atan2(a.y() - b.y(), a.x() - b.x());
                double bc = Math.atan2(c.y() - b.y(), c.x() - b.x());
                angles.add(Math.toDegrees(Math.abs(Math.IEEEremainder(ba - bc, 2 * Math.PI)) / 2));
            }
            List<Double> typedLegs =
                    legs.stream().map(l -> l + random.nextDouble() - 0.5).toList();
            List<Double> typedAngles = angles.stream()
                    .map(a -> a + 0.2 * (random.nextDouble() - 0.5))
                    .toList();
            FromList list = FromList.read(text(typedLegs) + ";" + text(typedAngles), WAVELENGTH);
            assertThat(list.design()).isEmpty();
            assertThat(list.closing()).isPresent();
            String closing = list.closing().get();
            ListedPlan plan = ListedPlan.of(ListText.of(closing));
            design(closing);
            offered++;
            double arm = typedLegs.stream().mapToDouble(l -> l).average().orElseThrow();
            // 0.0001 mm and 0.0001° are what is printed.
            assertThat(off(plan.legs(), 1e3, plan.angles(), 180 / Math.PI, typedLegs, typedAngles, arm))
                    .isLessThanOrEqualTo(off(legs, 1, angles, 1, typedLegs, typedAngles, arm) + 0.01);
        }
        assertThat(offered).isEqualTo(60);
    }

    private static String text(List<Double> numbers) {
        return numbers.stream().map(String::valueOf).collect(Collectors.joining(", "));
    }

    private static double off(
            List<Double> legs,
            double perMm,
            List<Double> angles,
            double perDeg,
            List<Double> typedLegs,
            List<Double> typedAngles,
            double arm) {
        double sum = 0;
        for (int i = 0; i < legs.size(); i++) {
            sum += Math.pow(legs.get(i) * perMm - typedLegs.get(i), 2);
            sum += Math.pow(Math.toRadians(angles.get(i) * perDeg - typedAngles.get(i)) * arm, 2);
        }
        return Math.sqrt(sum);
    }
}
