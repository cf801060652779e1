package twofold;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.stream.LongStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import twofold.cavity.Cavity;
import twofold.design.Design;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.layout.Outcome;
import twofold.optics.Plane;
import twofold.optics.RayMatrix;

/**
 * The program's round trips against real rays in space: what comes back for 10 µm and 10 µrad, by reflection at spheres
 * and refraction at tilted faces, must be what the two chains say.
 */
class ExactRaysPropertyTest {
    /**
     * What is asked: a ten-millionth. Rays keep about eleven digits of a step of 10 µm, and what their aberrations leave
     * after one Richardson step is smaller; the worst of these designs differs by 2e-9.
     */
    private static final double CLOSE = 1e-7;

    static LongStream seeds() {
        return LongStream.range(0, 200);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void randomDesigns(long seed) {
        agrees(RandomDesigns.of(seed));
    }

    @Test
    void knownCavities() {
        agrees(KnownCavities.xFold());
        agrees(KnownCavities.bowTie());
        agrees(KnownCavities.fold(0.1, Math.toRadians(30), 0.3, 0.2));
    }

    static Stream<Path> samples() {
        return Samples.files().stream();
    }

    @ParameterizedTest
    @MethodSource("samples")
    void everySampleAgrees(Path sample) {
        agrees(Samples.design(sample));
    }

    private static void agrees(Design design) {
        Outcome<Laid> laid = Layout.of(design);
        assertThat(laid.problems()).as(design.title()).isEmpty();
        Cavity cavity = Cavity.solve(laid.value().orElseThrow());
        double[][] rays = ExactRays.of(design).derivative();
        double largest = 0;
        for (Plane plane : Plane.values()) {
            RayMatrix chain = cavity.mode(plane).roundTrip();
            int i = plane == Plane.TANGENTIAL ? 0 : 2;
            double pure = Math.max(1, Math.max(Math.abs(chain.a()), Math.abs(chain.d())));
            double length = Math.max(1, Math.abs(chain.b()));
            double power = Math.max(1, Math.abs(chain.c()));
            String where = design.title() + " " + plane.word() + " ";
            assertThat(rays[i][i]).as(where + "A").isCloseTo(chain.a(), within(CLOSE * pure));
            assertThat(rays[i + 1][i + 1]).as(where + "D").isCloseTo(chain.d(), within(CLOSE * pure));
            assertThat(rays[i][i + 1]).as(where + "B").isCloseTo(chain.b(), within(CLOSE * length));
            assertThat(rays[i + 1][i]).as(where + "C").isCloseTo(chain.c(), within(CLOSE * power));
            largest = Math.max(largest, Math.max(pure, Math.max(length, power)));
        }
        for (int out = 0; out < 4; out++) {
            for (int in = 0; in < 4; in++) {
                if (out / 2 != in / 2) {
                    assertThat(rays[out][in])
                            .as("%s: one plane into the other, %d from %d", design.title(), out, in)
                            .isCloseTo(0, within(CLOSE * largest));
                }
            }
        }
    }
}
