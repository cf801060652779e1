package twofold.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Locale;
import java.util.Random;
import org.junit.jupiter.api.Test;
import twofold.design.Point;

/** From the table and the path to pixels and back; round numbers; hatchings. */
class GeometryTest {
    private final Random random = new Random(20261201);

    @Test
    void aViewportLeadsToPixelsAndBack() {
        Viewport v = Viewport.showing(new Box(-0.1, -0.2, 1.1, 0.3), 50, 60, 900, 300);
        for (int i = 0; i < 100; i++) {
            Point p = new Point(random.nextDouble() * 2 - 1, random.nextDouble() * 2 - 1);
            Point back = v.at(v.x(p.x()), v.y(p.y()));
            // A few roundings of numbers of order 1.
            assertThat(back.distance(p)).isLessThan(1e-12);
        }
        assertThat(v.x(-0.1)).isGreaterThanOrEqualTo(50 - 1e-9);
        assertThat(v.x(1.1)).isLessThanOrEqualTo(950 + 1e-9);
        assertThat(v.y(0.3)).isGreaterThanOrEqualTo(60 - 1e-9);
        assertThat(v.y(-0.2)).isLessThanOrEqualTo(360 + 1e-9);
        assertThat(v.y(1)).as("up on the table is up in the picture").isLessThan(v.y(0));
    }

    @Test
    void zoomingKeepsThePointerAndStaysWithinLimits() {
        Viewport v = new Viewport(800, 100, 300);
        for (int i = 0; i < 100; i++) {
            double x = random.nextDouble() * 1000;
            double y = random.nextDouble() * 500;
            Viewport z = v.zoomed(Math.pow(10, random.nextDouble() * 6 - 3), x, y);
            assertThat(z.at(x, y).distance(v.at(x, y))).isLessThan(1e-9);
            assertThat(z.scale()).isBetween(Viewport.LEAST_SCALE, Viewport.LARGEST_SCALE);
        }
        assertThat(v.panned(5, -7).x(0.1)).isEqualTo(v.x(0.1) + 5);
        assertThat(v.panned(5, -7).y(0.1)).isEqualTo(v.y(0.1) - 7);
    }

    @Test
    void aStretchLeadsToPixelsAndBackAndStaysOnThePath() {
        Stretch s = new Stretch(0, 1.2, 60, 980);
        assertThat(s.path(s.x(0.37))).isCloseTo(0.37, within(1e-12));
        for (int i = 0; i < 100; i++) {
            double x = 60 + 920 * random.nextDouble();
            s = s.zoomed(Math.pow(10, random.nextDouble() * 2 - 0.9), x, 1.2)
                    .panned(200 * random.nextDouble() - 100, 1.2);
            assertThat(s.from()).isGreaterThanOrEqualTo(0);
            assertThat(s.to()).isLessThanOrEqualTo(1.2 + 1e-12);
            assertThat(s.to() - s.from()).isGreaterThanOrEqualTo(Stretch.SHORTEST * (1 - 1e-9));
        }
        Stretch whole = new Stretch(0, 1.2, 60, 980);
        double kept = whole.path(500);
        assertThat(whole.zoomed(7, 500, 1.2).path(500)).isCloseTo(kept, within(1e-12));
    }

    @Test
    void theCourseLeadsFromPathToTableAndBack() {
        Course course = new Course(Drawn.solved(Drawn.triangle()).laid());
        for (int i = 0; i < 200; i++) {
            double path = random.nextDouble() * course.length();
            Course.Nearest nearest = course.nearest(course.at(path));
            assertThat(nearest.distance()).isLessThan(1e-12);
            assertThat(nearest.path()).isCloseTo(path, within(1e-9));
        }
        assertThat(course.length()).isCloseTo(0.72089, within(1e-5));
    }

    @Test
    void thePartNearAPathIsFoundRoundARing() {
        Course course = new Course(Drawn.solved(Drawn.bowTie()).laid());
        assertThat(course.partNear(0.056)).isEqualTo(1);
        assertThat(course.partNear(course.length() - 0.01)).isZero();
        assertThat(course.partNear(0.111)).isEqualTo(2);
    }

    @Test
    void numbersAreRound() {
        assertThat(Nice.tick(0.013)).isCloseTo(0.02, within(1e-12));
        assertThat(Nice.tick(37)).isEqualTo(50);
        assertThat(Nice.tick(50)).isEqualTo(50);
        assertThat(Nice.below(170)).isEqualTo(100);
        assertThat(Nice.below(0.21)).isCloseTo(0.2, within(1e-12));
        assertThat(Nice.factor(22.7)).isEqualTo(20);
        assertThat(Nice.factor(0.4)).isEqualTo(1);
        assertThat(Nice.factor(160)).isEqualTo(150);
        assertThat(Nice.decimals(0.05)).isEqualTo(2);
        assertThat(Nice.decimals(200)).isZero();
        for (int i = 0; i < 200; i++) {
            double value = Math.exp(20 * random.nextDouble() - 10);
            assertThat(Nice.tick(value))
                    .isGreaterThanOrEqualTo(value * (1 - 1e-9))
                    .isLessThanOrEqualTo(2.5 * value * (1 + 1e-9));
            assertThat(Nice.below(value))
                    .isLessThanOrEqualTo(value * (1 + 1e-9))
                    .isGreaterThanOrEqualTo(value / 2.5 * (1 - 1e-9));
            assertThat(Nice.top(value))
                    .isGreaterThanOrEqualTo(value * (1 - 1e-9))
                    .isLessThanOrEqualTo(1.13 * value);
        }
    }

    @Test
    void figuresHaveTrueMinusSignsAndNoNegativeZero() {
        assertThat(Figures.mm(-1.136e-3)).isEqualTo("−1.14 mm");
        assertThat(Figures.mm(-0.000001)).isEqualTo("0.00 mm");
        assertThat(Figures.um(38.66e-6)).isEqualTo("38.7 µm");
        assertThat(Figures.degrees(Math.toRadians(7.9))).isEqualTo("7.90°");
        assertThat(Figures.halfTrace(-0.23901)).isEqualTo("−0.239");
        assertThat(Figures.nm(1064e-9)).isEqualTo("1064 nm");
        assertThat(Figures.nm(632.8e-9)).isEqualTo("632.8 nm");
        assertThat(Figures.mhz(124.0037e6)).isEqualTo("124.00 MHz");
        assertThat(Figures.times(169.75)).isEqualTo("170 ×");
    }

    @Test
    void figuresRoundAsTheTextAnswersDo() {
        for (int i = 0; i < 2000; i++) {
            // Ties of the decimal among them: 0.5 steps of the last place.
            double value = i % 2 == 0 ? (random.nextInt(20000) - 10000) / 2000.0 : 100 * random.nextGaussian();
            int decimals = random.nextInt(4);
            String other = String.format(Locale.ROOT, "%." + decimals + "f", value);
            boolean zero = other.startsWith("-") && other.chars().noneMatch(c -> c >= '1' && c <= '9');
            assertThat(Figures.fixed(value, decimals)).isEqualTo(zero ? other.substring(1) : other.replace('-', '−'));
        }
    }

    @Test
    void hatchingsStayInsideAndLeanOppositeWays() {
        Points polygon = new Points();
        for (int i = 0; i < 9; i++) {
            polygon.add(10 * i, i % 2 == 0 ? 20 + 5 * i : 60);
        }
        polygon.add(80, 120).add(0, 120);
        for (Hatch hatch : Hatch.values()) {
            Points lines = hatch.lines(polygon);
            assertThat(lines.size()).isGreaterThan(20).matches(n -> n % 2 == 0);
            for (int i = 0; i < lines.size(); i += 2) {
                double dx = lines.x(i + 1) - lines.x(i);
                double dy = lines.y(i + 1) - lines.y(i);
                // y runs down: /// falls as x grows in numbers, so dy = −dx.
                assertThat(dy).isCloseTo(hatch == Hatch.TANGENTIAL ? -dx : dx, within(1e-9));
                assertThat(inside(polygon, lines.x(i) + dx / 2, lines.y(i) + dy / 2))
                        .isTrue();
            }
        }
    }

    /** By the crossings of a ray to the right. */
    private static boolean inside(Points polygon, double x, double y) {
        boolean inside = false;
        for (int i = 0, j = polygon.size() - 1; i < polygon.size(); j = i++) {
            if (polygon.y(i) > y != polygon.y(j) > y
                    && x
                            < polygon.x(j)
                                    + (y - polygon.y(j))
                                            / (polygon.y(i) - polygon.y(j))
                                            * (polygon.x(i) - polygon.x(j))) {
                inside = !inside;
            }
        }
        return inside;
    }
}
