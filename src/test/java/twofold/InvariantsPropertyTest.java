package twofold;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.LongStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import twofold.cavity.Cavity;
import twofold.cavity.Eigenmode;
import twofold.cavity.Face;
import twofold.cavity.Station;
import twofold.cavity.Waist;
import twofold.design.Design;
import twofold.design.FourNumbers;
import twofold.design.Matrix;
import twofold.design.Part;
import twofold.design.Shape;
import twofold.layout.Layout;
import twofold.optics.Plane;
import twofold.optics.RayMatrix;

/** What must hold of every cavity, whatever it is made of: laws of Gaussian beams in closed chains, needing no source. */
class InvariantsPropertyTest {
    /**
     * For radii and phases. Matrix elements of up to 1e4 make numbers near 1, and 1 − |half trace| is above 0.02: of
     * sixteen digits ten are left.
     */
    private static final double CLOSE = 1e-10;

    static LongStream seeds() {
        return LongStream.range(0, 120);
    }

    private static Cavity solve(Design design) {
        assertThat(Layout.of(design).problems()).as(design.title()).isEmpty();
        return Cavity.solve(Layout.of(design).value().orElseThrow());
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void determinantIsOne(long seed) {
        Design design = RandomDesigns.of(seed);
        for (Plane plane : Plane.values()) {
            RayMatrix m = solve(design).mode(plane).roundTrip();
            // Each of at most four hundred shears rounds once, the product of large elements magnifies that.
            double size = 1 + Math.abs(m.a() * m.d()) + Math.abs(m.b() * m.c());
            assertThat(m.determinant()).as(design.title()).isCloseTo(1, within(1e-12 * size));
        }
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void planesAreEqualWithoutTilt(long seed) {
        Cavity cavity = solve(Restated.straight(RandomDesigns.of(seed)));
        // The same arithmetic on the same numbers: equal to the last bit.
        assertThat(cavity.tangential()).isEqualTo(cavity.sagittal());
    }

    /** Every mirror of a ring is as good a start as another. */
    @ParameterizedTest
    @MethodSource("seeds")
    void aRingMayStartAnywhere(long seed) {
        Design design = RandomDesigns.stable(seed);
        if (design.shape() == Shape.RING) {
            for (int mirror = 1; mirror < design.mirrors().size(); mirror++) {
                sameStations(design, Restated.started(design, mirror), 1, 1);
            }
        }
    }

    /** The way back sees the same beam: a standing wave read from its other end, a ring walked the other way round. */
    @ParameterizedTest
    @MethodSource("seeds")
    void theOtherWayIsTheSame(long seed) {
        Design design = RandomDesigns.stable(seed);
        Design back = Restated.reversed(design);
        Cavity there = solve(design);
        Cavity here = solve(back);
        for (Plane plane : Plane.values()) {
            sameTrip(design, there.mode(plane), here.mode(plane));
            for (Station s : there.mode(plane).stations()) {
                if (s.face() == Face.SURFACE) {
                    Part part = design.parts().get(s.part());
                    int other = back.indexOf(part.name()).orElseThrow();
                    double radius = here.mode(plane)
                            .station(other, Face.SURFACE)
                            .orElseThrow()
                            .radius();
                    assertThat(radius)
                            .as("%s at %s", design.title(), part.name())
                            .isCloseTo(s.radius(), within(CLOSE * s.radius()));
                }
            }
        }
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void movingAndTurningThePlanChangesNothing(long seed) {
        Design design = RandomDesigns.stable(seed);
        sameStations(design, Restated.moved(design, 0.37, -0.21, 2.3), 1, 1);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void radiiGoWithTheRootOfTheWavelength(long seed) {
        Design design = RandomDesigns.stable(seed);
        sameStations(design, Restated.tinted(design, 1.7 * design.wavelength()), Math.sqrt(1.7), 1);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void radiiGoWithTheRootOfAllLengths(long seed) {
        Design design = RandomDesigns.stable(seed);
        sameStations(design, Restated.scaled(design, 2.3), Math.sqrt(2.3), 1 / 2.3);
    }

    private static void sameTrip(Design design, Eigenmode a, Eigenmode b) {
        assertThat(b.halfTrace()).as("half trace of %s", design.title()).isCloseTo(a.halfTrace(), within(CLOSE));
        double turns = Math.IEEEremainder(b.gouy() - a.gouy(), 2 * Math.PI);
        assertThat(turns).as("Gouy phase of %s", design.title()).isCloseTo(0, within(CLOSE));
    }

    private static void sameStations(Design design, Design other, double times, double curved) {
        Cavity first = solve(design);
        Cavity second = solve(other);
        for (Plane plane : Plane.values()) {
            Eigenmode mode = second.mode(plane);
            sameTrip(design, first.mode(plane), mode);
            assertThat(mode.stations()).hasSameSizeAs(first.mode(plane).stations());
            for (Station s : first.mode(plane).stations()) {
                String name = design.parts().get(s.part()).name();
                Station same = mode.station(other.indexOf(name).orElseThrow(), s.face())
                        .orElseThrow();
                assertThat(same.radius())
                        .as("%s at %s", design.title(), name)
                        .isCloseTo(times * s.radius(), within(CLOSE * times * s.radius()));
                double beam = design.wavelength() / (Math.PI * s.radius() * s.radius());
                assertThat(same.curvature())
                        .as("%s, wavefront at %s", design.title(), name)
                        .isCloseTo(curved * s.curvature(), within(CLOSE * curved * Math.hypot(s.curvature(), beam)));
            }
        }
    }

    /** Free paths and black boxes make up the whole Gouy phase; a lens adds none. */
    @ParameterizedTest
    @MethodSource("seeds")
    void stretchesAddUpToTheGouyPhase(long seed) {
        Design design = RandomDesigns.stable(seed);
        Cavity cavity = solve(design);
        for (Plane plane : Plane.values()) {
            Eigenmode mode = cavity.mode(plane);
            double sum = 0;
            for (Waist w : mode.waists()) {
                sum += Math.atan((w.length() - w.after()) / w.rayleigh()) + Math.atan(w.after() / w.rayleigh());
            }
            for (int i = 0; i < design.parts().size(); i++) {
                if (design.parts().get(i) instanceof Matrix box) {
                    sum += gouy(
                            plane == Plane.TANGENTIAL ? box.tangential() : box.sagittal(),
                            mode.station(i, Face.ENTRY).orElseThrow(),
                            design.wavelength());
                }
            }
            double trip = design.shape() == Shape.RING ? sum : 2 * sum;
            assertThat(Math.IEEEremainder(trip - mode.gouy(), 2 * Math.PI))
                    .as("%s, %s", design.title(), plane.word())
                    .isCloseTo(0, within(CLOSE));
        }
    }

    /** Minus the phase of a + b/q, with 1/q = curvature − iλ/(πw²): Siegman, Lasers (1986), ch. 20, from memory. */
    private static double gouy(FourNumbers m, Station entry, double wavelength) {
        double beam = wavelength / (Math.PI * entry.radius() * entry.radius());
        return Math.atan2(m.b() * beam, m.a() + m.b() * entry.curvature());
    }
}
