package twofold;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import twofold.cavity.Face;
import twofold.cavity.State;
import twofold.design.Crystal;
import twofold.design.Design;
import twofold.design.Kind;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Plate;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.file.DesignWriter;
import twofold.layout.Clearance;
import twofold.layout.Leg;
import twofold.optics.Plane;

class SamplesTest {
    /** Common practice, no source: the room a builder wants between a mount and a beam or another mount, m. */
    private static final double ROOM = 1e-3;

    static List<Path> files() {
        return Samples.files();
    }

    @ParameterizedTest
    @MethodSource("files")
    void isWrittenAsItStands(Path file) {
        String stands = new String(Samples.bytes(file), StandardCharsets.UTF_8);
        assertThat(DesignWriter.text(Samples.design(file))).isEqualTo(stands);
    }

    @ParameterizedTest
    @MethodSource("files")
    void saysWhatItIsForAndWhatIsAskedOfIt(Path file) {
        Design design = Samples.design(file);
        assertThat(design.title()).startsWith("Ice profiler, ");
        assertThat(design.notes()).hasSizeGreaterThan(100);
        assertThat(design.requirements()).isNotEmpty();
        assertThat(design.levers()).isNotEmpty();
    }

    @ParameterizedTest
    @MethodSource("files")
    void isStableInBothPlanesButForTheOne(Path file) {
        Solved solved = Solved.of(Samples.design(file));
        boolean isOne = file.endsWith("one-plane.json");
        assertThat(solved.state(Plane.SAGITTAL)).isEqualTo(State.STABLE);
        assertThat(solved.state(Plane.TANGENTIAL)).isEqualTo(isOne ? State.UNSTABLE : State.STABLE);
    }

    @ParameterizedTest
    @MethodSource("files")
    void noMountComesNearABeamOrAnotherMount(Path file) {
        List<Clearance.Gap> gaps =
                Solved.of(Samples.design(file)).cavity().clearance().smallest(1);
        assertThat(gaps.get(0).gap()).isGreaterThan(ROOM);
    }

    /** The mirrors that are not in a focus see a beam that is round in the sense of ISO 11146-1, and better. */
    @ParameterizedTest
    @ValueSource(strings = {"z-fold-rod", "x-fold", "v-fold-pumped", "gas-tube", "triangle-ring", "bow-tie-doubler"})
    void astigmatismIsCompensated(String name) {
        Solved solved = Solved.of(Samples.design(name));
        for (Mirror mirror : Samples.design(name).mirrors()) {
            int part = Samples.design(name).indexOf(mirror.name()).orElseThrow();
            assertThat(solved.cavity().roundness(part, Face.SURFACE).orElseThrow())
                    .as(mirror.name())
                    .isGreaterThan(0.93);
        }
    }

    @Test
    void togetherTheyHaveEveryKindOfPart() {
        Set<Kind> kinds = EnumSet.noneOf(Kind.class);
        for (Path file : files()) {
            Samples.design(file).parts().stream().map(Part::kind).forEach(kinds::add);
        }
        assertThat(kinds).containsExactlyInAnyOrder(Kind.values());
    }

    @Test
    void aZTurnsBackTheWayItCameRoundABrewsterRod() {
        Design z = Samples.design("z-fold-rod");
        assertThat(turns(z)).hasSize(2);
        assertThat(turns(z).get(0) * turns(z).get(1)).isNegative();
        assertThat(only(z, Crystal.class).slab().faces().atBrewster()).isTrue();
    }

    @Test
    void anXTurnsOnTheSameWayBetweenUnequalFolds() {
        Design x = Samples.design("x-fold");
        assertThat(turns(x)).hasSize(2);
        assertThat(turns(x).get(0) * turns(x).get(1)).isPositive();
        assertThat(x.mirrors().get(1).radius()).isNotEqualTo(x.mirrors().get(2).radius());
    }

    @Test
    void aVHasItsPumpedCrystalOnTheEndMirror() {
        Design v = Samples.design("v-fold-pumped");
        assertThat(turns(v)).hasSize(1);
        assertThat(only(v, Crystal.class).thermalPower().tangential()).isPositive();
        // Touching to the rounding of a place and half a length in mm.
        assertThat(Solved.of(v).cavity().laid().legs().get(0).parts().get(0).start())
                .isCloseTo(0, within(1e-15));
        assertThat(only(v, Plate.class).slab().faces().atBrewster()).isTrue();
    }

    @Test
    void aBowTieHasItsCrystalHeadOnInTheMiddle() {
        Design ring = Samples.design("bow-tie-doubler");
        assertThat(ring.shape()).isEqualTo(Shape.RING);
        assertThat(ring.mirrors()).hasSize(4);
        Crystal crystal = only(ring, Crystal.class);
        assertThat(crystal.slab().faces().incidence()).isZero();
        assertThat(crystal.slab().along().inMiddle()).isTrue();
        Solved solved = Solved.of(ring);
        for (Plane plane : Plane.values()) {
            // By symmetry the waist is in the middle; the plan is round to 0.1 µm.
            assertThat(solved.line(crystal.name(), plane).offset()).isCloseTo(0, within(1e-7));
        }
        assertThat(solved.line(crystal.name(), Plane.TANGENTIAL).radius()
                        / solved.line(crystal.name(), Plane.SAGITTAL).radius())
                .as("both planes share a waist where the light is doubled")
                .isCloseTo(1, within(0.01));
    }

    @Test
    void aTriangleIsOddAndAGasTubeIsStraight() {
        assertThat(Samples.design("triangle-ring").shape()).isEqualTo(Shape.RING);
        assertThat(Samples.design("triangle-ring").mirrors()).hasSize(3);
        assertThat(Samples.design("gas-tube").shape()).isEqualTo(Shape.STANDING_WAVE);
        assertThat(Samples.design("gas-tube").mirrors()).hasSize(2);
    }

    /** What its notes say: closed to 12° at the same arm lengths, the trial fold is stable in both planes. */
    @Test
    void closingTheTrialFoldBringsBothPlanesBack() {
        Design found = Samples.design("one-plane");
        Mirror fold = found.mirrors().get(1);
        Mirror end = found.mirrors().get(2);
        double arm = fold.at().distance(end.at());
        double twice = Math.toRadians(2 * 12);
        List<Part> parts = new ArrayList<>(found.parts());
        // The first arm runs along +x.
        parts.set(
                parts.size() - 1,
                end.at(new Point(
                        fold.at().x() - arm * Math.cos(twice), fold.at().y() + arm * Math.sin(twice))));
        Solved closed = Solved.of(found.withParts(parts));
        for (Plane plane : Plane.values()) {
            assertThat(closed.state(plane)).isEqualTo(State.STABLE);
        }
    }

    /** Which way the beam turns at each inner mirror, left positive. */
    private static List<Double> turns(Design design) {
        List<Point> headings = Solved.of(design).cavity().laid().legs().stream()
                .map(Leg::heading)
                .toList();
        return IntStream.range(1, headings.size())
                .mapToObj(i -> headings.get(i - 1).x() * headings.get(i).y()
                        - headings.get(i - 1).y() * headings.get(i).x())
                .toList();
    }

    private static <T extends Part> T only(Design design, Class<T> kind) {
        List<T> found =
                design.parts().stream().filter(kind::isInstance).map(kind::cast).toList();
        assertThat(found).hasSize(1);
        return found.get(0);
    }
}
