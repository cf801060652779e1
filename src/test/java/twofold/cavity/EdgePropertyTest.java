package twofold.cavity;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Kind;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.design.Values;
import twofold.layout.Layout;
import twofold.optics.Plane;

/** Marginal cavities are on the edge wherever on the table and in whatever direction they stand. */
class EdgePropertyTest {
    private static Part mirror(String name, double x, double y, double radius) {
        return Kind.MIRROR.part(
                name, Values.NONE.with(Field.AT, new Point(x, y)).with(Field.ROC, (Object) radius));
    }

    /** Marginal by 0 ≤ g1 g2 ≤ 1, common practice, no source. */
    @ParameterizedTest
    @CsvSource({
        "confocal, 0.5, 0.5, 0.5",
        "concentric, 1, 0.5, 0.5",
        "centre on the other mirror, 0.8, 0.8, 3",
        "plane-parallel, 0.3, Infinity, Infinity",
        "plane and half-concentric, 0.7, Infinity, 0.7"
    })
    void staysOnTheEdge(String name, double length, double r1, double r2) {
        Random random = new Random(7);
        for (int i = 0; i < 2000; i++) {
            double spread = Math.pow(10, -2 + 4 * random.nextDouble());
            double x = spread * (2 * random.nextDouble() - 1);
            double y = spread * (2 * random.nextDouble() - 1);
            double heading = 2 * Math.PI * random.nextDouble();
            Design design = Design.of(
                    name,
                    1e-6,
                    Shape.STANDING_WAVE,
                    List.of(
                            mirror("A", x, y, r1),
                            mirror("B", x + length * Math.cos(heading), y + length * Math.sin(heading), r2)));
            Cavity cavity = Cavity.solve(Layout.of(design).value().orElseThrow());
            assertThat(cavity.mode(Plane.TANGENTIAL).state())
                    .as("%s at (%s, %s), heading %s", name, x, y, heading)
                    .isEqualTo(State.EDGE);
            assertThat(cavity.mode(Plane.SAGITTAL).magnification()).isEqualTo(1);
        }
    }
}
