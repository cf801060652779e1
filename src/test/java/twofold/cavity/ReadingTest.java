package twofold.cavity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import twofold.Samples;
import twofold.Sketch;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.Edge;
import twofold.design.FaceAngle;
import twofold.design.Field;
import twofold.design.Kind;
import twofold.design.Mount;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Point;
import twofold.design.Quantity;
import twofold.design.Shape;
import twofold.design.TiltPlane;
import twofold.design.Values;
import twofold.layout.Layout;
import twofold.optics.Plane;

/** Where quantities can be read, what they come to by hand, and where they are undefined. */
class ReadingTest {
    private static final double ROUNDING = 1e-12;

    private static Trial run(Design design) {
        Trial trial = Chain.of(Layout.of(design).value().orElseThrow()).trial();
        assertThat(trial.run()).isEqualTo(Fit.FITS);
        return trial;
    }

    private static Reading reading(Quantity what, Optional<Place> at, Optional<Plane> plane, Trial trial) {
        Optional<Edge> edge = what.hasEdge() ? Optional.of(Edge.LOWER) : Optional.empty();
        return Reading.of(what, at, plane, edge, trial.numbers.chain);
    }

    private static double read(Quantity what, Trial trial) {
        return reading(what, Optional.empty(), Optional.empty(), trial).of(trial);
    }

    private static double read(Quantity what, Place at, Trial trial) {
        return reading(what, Optional.of(at), Optional.empty(), trial).of(trial);
    }

    private static double read(Quantity what, Place at, Plane plane, Trial trial) {
        return reading(what, Optional.of(at), Optional.of(plane), trial).of(trial);
    }

    private static Part mirror(String name, double x, double y, double radius, double width, double depth) {
        return Kind.MIRROR.part(
                name,
                Values.NONE
                        .with(Field.AT, new Point(x, y))
                        .with(Field.ROC, (Object) radius)
                        .with(Field.MOUNT, new Mount(width, depth)));
    }

    /** An L of two arms of 1 m; stable, as the ends are concave with 3 m. */
    private static Design corner() {
        return corner(0.04, 0.02);
    }

    /** The same with another mount at the fold. */
    private static Design corner(double width, double depth) {
        return Design.of(
                "corner",
                1e-6,
                Shape.STANDING_WAVE,
                List.of(
                        mirror("A", 0, 0, 3, 0.04, 0.02),
                        mirror("Fold", 1, 0, Double.POSITIVE_INFINITY, width, depth),
                        mirror("B", 1, 1, 3, 0.06, 0.02)));
    }

    @Test
    void clearanceBetweenMountsIsThatByHand() {
        Trial trial = run(corner());
        // The fold's face ends at (1 ∓ 20/√2, ∓ 20/√2) mm, before A's face at x = 0 and below B's at y = 1.
        double near = 1 - 0.02 / Math.sqrt(2);
        assertThat(read(Quantity.CLEARANCE, Place.of("A"), trial)).isCloseTo(near, within(ROUNDING));
        assertThat(read(Quantity.CLEARANCE, Place.of("B"), trial)).isCloseTo(near, within(ROUNDING));
        assertThat(read(Quantity.CLEARANCE, trial)).isCloseTo(near, within(ROUNDING));
    }

    @Test
    void clearanceToABeamIsThatByHand() {
        // A small mount at the fold leaves the beams nearest: three radii to the left of x = 1, wider towards B.
        Trial trial = run(corner(0.004, 0.002));
        // Symmetric, L = 2 m and R = 3 m: the waist is on the fold, with a Rayleigh length of √(L(2R − L))/2.
        double rayleigh = Math.sqrt(2 * (2 * 3 - 2)) / 2;
        double waist = Math.sqrt(1e-6 / Math.PI * rayleigh);
        assertThat(read(Quantity.RADIUS, Place.of("Fold"), Plane.SAGITTAL, trial))
                .isCloseTo(waist, within(ROUNDING));
        // A's face reaches up to y = 20 mm, where the second arm is nearest to it; an outline by chords is true to
        // 5e-5.
        double gap = 1 - 3 * waist * Math.hypot(1, 0.02 / rayleigh);
        assertThat(read(Quantity.CLEARANCE, Place.of("A"), trial)).isCloseTo(gap, within(5e-5 * 3 * waist));
        // B's face reaches 30 mm to the side.
        double other = 1 - 3 * waist * Math.hypot(1, 0.03 / rayleigh);
        assertThat(read(Quantity.CLEARANCE, Place.of("B"), trial)).isCloseTo(other, within(5e-5 * 3 * waist));
        assertThat(read(Quantity.CLEARANCE, trial)).isEqualTo(read(Quantity.CLEARANCE, Place.of("B"), trial));
    }

    @Test
    void thePlanIsAsWideAndDeepAsItsMounts() {
        Trial trial = run(corner());
        // From behind A, x = −0.02, to the fold's outer corner at 1 + 40/√2 mm; B's side at 1.03 is further.
        assertThat(read(Quantity.PLAN_WIDTH, trial)).isCloseTo(1.03 + 0.02, within(ROUNDING));
        // From the fold's outer corner, y = −40/√2 mm, to behind B at 1.02.
        assertThat(read(Quantity.PLAN_DEPTH, trial)).isCloseTo(1.02 + 0.04 / Math.sqrt(2), within(ROUNDING));
    }

    @Test
    void geometryFollowsWhatIsSet() {
        Trial trial = run(corner());
        trial.set(trial.numbers.chain.y(2), 1.5);
        trial.run();
        assertThat(read(Quantity.PLAN_DEPTH, trial)).isCloseTo(1.52 + 0.04 / Math.sqrt(2), within(ROUNDING));
        assertThat(read(Quantity.LEG, Place.of("B", "Fold"), trial)).isCloseTo(1.5, within(ROUNDING));
        assertThat(read(Quantity.DISTANCE, Place.of("Fold", "B"), trial)).isCloseTo(1.5, within(ROUNDING));
        assertThat(read(Quantity.ROUND_TRIP, trial)).isCloseTo(5, within(ROUNDING));
        assertThat(read(Quantity.FSR, trial)).isCloseTo(299_792_458 / 5.0, within(1e-6));
        assertThat(read(Quantity.INCIDENCE, Place.of("Fold"), trial)).isCloseTo(Math.PI / 4, within(ROUNDING));
        assertThat(read(Quantity.INCIDENCE, Place.of("A"), trial)).isZero();
        assertThat(trial.design().mirrors().get(2).at()).isEqualTo(new Point(1, 1.5));
    }

    /** Setting every number to itself or another and reading the design back gives that number and no other. */
    @Test
    void aTrialStatesTheDesignThatItIs() {
        Design design = Samples.design("z-fold-rod");
        Trial trial = run(design);
        Chain chain = trial.numbers.chain;
        assertThat(trial.design()).isEqualTo(design);
        int rod = chain.part("Rod");
        trial.set(chain.slot(rod, Field.INSIDE), 0.006);
        trial.set(chain.slot(rod, Field.ALONG), 0.05);
        trial.set(chain.slot(rod, Field.FACES), 1.0);
        trial.set(chain.slot(rod, Field.THERMAL_POWER), 2);
        trial.set(chain.slot(chain.part("Fold 1"), Field.CURVATURE), 8);
        trial.run();
        Part now = trial.design().parts().get(rod);
        assertThat(now)
                .isEqualTo(design.parts()
                        .get(rod)
                        .with(Field.INSIDE, (Object) 0.006)
                        .with(Field.ALONG, Along.at(0.05))
                        .with(Field.FACES, FaceAngle.of(1.0))
                        .with(Field.THERMAL_POWER, new twofold.design.TwoPowers(2, 2)));
        assertThat(trial.design().mirrors().get(1).radius()).isEqualTo(0.125);
        Trial again = run(trial.design());
        for (Plane plane : Plane.values()) {
            assertThat(again.halfTrace(plane)).isCloseTo(trial.halfTrace(plane), within(ROUNDING));
        }
    }

    @Test
    void radiusInACrystalIsThatInItsMiddleInside() {
        Trial trial = run(Samples.design("z-fold-rod"));
        for (Plane plane : Plane.values()) {
            double waist = read(Quantity.WAIST_RADIUS, Place.of("Rod"), plane, trial);
            double offset = read(Quantity.WAIST_OFFSET_RAYLEIGHS, Place.of("Rod"), plane, trial);
            assertThat(read(Quantity.RADIUS, Place.of("Rod"), plane, trial))
                    .isCloseTo(waist * Math.hypot(1, offset), within(ROUNDING));
            double rayleigh = read(Quantity.WAIST_OFFSET, Place.of("Rod"), plane, trial) / offset;
            assertThat(read(Quantity.FOCUS_RATIO, Place.of("Rod"), plane, trial))
                    .isCloseTo(0.005 / (2 * rayleigh), within(1e-9));
        }
        assertThat(read(Quantity.WAIST_SPLIT, Place.of("Rod"), trial))
                .isCloseTo(
                        read(Quantity.WAIST_OFFSET, Place.of("Rod"), Plane.TANGENTIAL, trial)
                                - read(Quantity.WAIST_OFFSET, Place.of("Rod"), Plane.SAGITTAL, trial),
                        within(ROUNDING));
    }

    @Test
    void anApertureDoesNotBoundAStretch() {
        Design bare = new Sketch().mirror("A", 2).go(1).flat("B").standingWave(1e-6);
        List<Part> parts = new java.util.ArrayList<>(bare.parts());
        parts.add(1, Kind.APERTURE.part("Stop", Values.NONE.with(Field.ALONG, Along.at(0.3))));
        Trial trial = run(bare.withParts(parts));
        double waist = read(Quantity.WAIST_RADIUS, Place.of("A", "B"), Plane.SAGITTAL, trial);
        assertThat(waist).isCloseTo(Math.sqrt(1e-6 / Math.PI), within(ROUNDING));
        assertThat(read(Quantity.WAIST_RADIUS, Place.of("Stop", "A"), Plane.SAGITTAL, trial))
                .isCloseTo(waist, within(ROUNDING));
        assertThat(read(Quantity.ROUNDNESS, Place.of("A", "B"), trial)).isEqualTo(1);
        assertThat(read(Quantity.WAIST_SPLIT, Place.of("Stop", "B"), trial)).isZero();
    }

    /** The footprint is longer by 1/cosθ: on a mirror at 45° and on the faces of a slab tilted either way. */
    @Test
    void clipLossCountsTheFootprint() {
        Trial trial = run(corner());
        double w = read(Quantity.RADIUS, Place.of("Fold"), Plane.SAGITTAL, trial);
        assertThat(w).isEqualTo(read(Quantity.RADIUS, Place.of("Fold"), Plane.TANGENTIAL, trial));
        double clear = 0.85 * 25.4e-3 / 2;
        // Less than 1e-100: compared by its logarithm.
        double loss = read(Quantity.CLIP_LOSS, Place.of("Fold"), trial);
        assertThat(loss).isCloseTo(Clipping.hole(clear, w * Math.sqrt(2), w), within(loss * 1e-6));
    }

    @ParameterizedTest
    @CsvSource({"TANGENTIAL", "SAGITTAL"})
    void clipLossOfASlabIsThatOfItsWorseFace(TiltPlane tilt) {
        double theta = Math.toRadians(50);
        Part plate = Kind.PLATE.part(
                "Plate",
                Values.NONE
                        .with(Field.ALONG, Along.at(0.5))
                        .with(Field.ACROSS, (Object) 0.01)
                        .with(Field.INDEX, (Object) 1.5)
                        .with(Field.FACES, FaceAngle.of(theta))
                        .with(Field.TILT_PLANE, tilt)
                        .with(Field.CLEAR_DIAMETER, (Object) 2e-3));
        Part end = mirror("B", 1, 0, 1.5, 0.04, 0.02);
        Trial trial = run(Design.of(
                "plate",
                1e-6,
                Shape.STANDING_WAVE,
                List.of(mirror("A", 0, 0, Double.POSITIVE_INFINITY, 0.04, 0.02), plate, end)));
        // Towards the curved mirror the beam is wider.
        double t = trial.radius(1, Face.EXIT, Plane.TANGENTIAL);
        double s = trial.radius(1, Face.EXIT, Plane.SAGITTAL);
        boolean tangential = tilt == TiltPlane.TANGENTIAL;
        double expected =
                Clipping.hole(1e-3, tangential ? t / Math.cos(theta) : t, tangential ? s : s / Math.cos(theta));
        assertThat(read(Quantity.CLIP_LOSS, Place.of("Plate"), trial)).isCloseTo(expected, within(1e-15));
    }

    @Test
    void slitsCutEachInItsPlaneAndWhatStatesNoOpeningCutsNothing() {
        Design bare = new Sketch().mirror("A", 2).go(1).flat("B").standingWave(1e-6);
        Values at = Values.NONE.with(Field.ALONG, Along.at(0.3));
        List<Part> parts = new java.util.ArrayList<>(bare.parts());
        parts.add(
                1,
                Kind.APERTURE.part(
                        "Slits",
                        at.with(Field.SLIT_TANGENTIAL, (Object) 1e-3).with(Field.SLIT_SAGITTAL, (Object) 2e-3)));
        parts.add(2, Kind.APERTURE.part("Mark", Values.NONE.with(Field.ALONG, Along.at(0.4))));
        Trial trial = run(bare.withParts(parts));
        double w = read(Quantity.RADIUS, Place.of("Slits"), Plane.TANGENTIAL, trial);
        double through = (1 - Clipping.slit(0.5e-3, w)) * (1 - Clipping.slit(1e-3, w));
        assertThat(read(Quantity.CLIP_LOSS, Place.of("Slits"), trial)).isCloseTo(1 - through, within(ROUNDING));
        assertThat(read(Quantity.CLIP_LOSS, Place.of("Mark"), trial)).isZero();
    }

    /** Everything but lengths, angles and the plan's size is undefined in a design that is stable in one plane alone. */
    @ParameterizedTest
    @EnumSource(Quantity.class)
    void whatNeedsBothPlanesIsUndefinedInOne(Quantity what) {
        Trial trial = run(Samples.design("one-plane"));
        Optional<Place> at = switch (what.where()) {
            case NOWHERE, ANYWHERE_OR_PART -> Optional.empty();
            case PART, MIRROR -> Optional.of(Place.of("Fold"));
            case LEG, SLAB_OR_STRETCH, PART_OR_STRETCH -> Optional.of(Place.of("Fold", "End B"));
            case SLAB, CRYSTAL -> Optional.of(Place.of("Fold", "End B"));
        };
        if (what.where() == Quantity.Where.SLAB || what.where() == Quantity.Where.CRYSTAL) {
            assertThatIllegalArgumentException()
                    .isThrownBy(() -> reading(what, at, Optional.of(Plane.SAGITTAL), trial));
            return;
        }
        Optional<Plane> plane = what.hasPlane() ? Optional.of(Plane.TANGENTIAL) : Optional.empty();
        double value = reading(what, at, plane, trial).of(trial);
        boolean defined = switch (what) {
            case HALF_TRACE, STABILITY_MARGIN, INCIDENCE, LEG, DISTANCE, ROUND_TRIP, FSR, PLAN_WIDTH, PLAN_DEPTH ->
                true;
            // By identity: the sagittal zone that holds the design has its namesake elsewhere in the tangential plane.
            case ZONE_EDGE_SPLIT, ZONE_OVERLAP -> true;
            case GOUY,
                    RADIUS,
                    WAIST_RADIUS,
                    WAIST_OFFSET,
                    WAIST_OFFSET_RAYLEIGHS,
                    WAIST_SPLIT,
                    ROUNDNESS,
                    FOCUS_RATIO,
                    CLEARANCE,
                    CLIP_LOSS -> false;
        };
        assertThat(Double.isNaN(value)).isNotEqualTo(defined);
        if (what.hasPlane()) {
            assertThat(reading(what, at, Optional.of(Plane.SAGITTAL), trial).of(trial))
                    .isFinite();
        }
    }

    @ParameterizedTest
    @EnumSource(Quantity.class)
    void nothingIsDefinedWhereThePlanDoesNotFit(Quantity what) {
        Trial trial = run(Samples.design("z-fold-rod"));
        Optional<Place> at = switch (what.where()) {
            case NOWHERE, ANYWHERE_OR_PART -> Optional.empty();
            case PART, MIRROR -> Optional.of(Place.of("Fold 1"));
            case LEG -> Optional.of(Place.of("Fold 1", "Fold 2"));
            case SLAB_OR_STRETCH, PART_OR_STRETCH, SLAB, CRYSTAL -> Optional.of(Place.of("Rod"));
        };
        Optional<Plane> plane = what.hasPlane() ? Optional.of(Plane.SAGITTAL) : Optional.empty();
        Reading reading = reading(what, at, plane, trial);
        assertThat(reading.of(trial)).isFinite();
        trial.set(trial.numbers.chain.slot(2, Field.INSIDE), 0.2);
        assertThat(trial.run()).isEqualTo(Fit.TOO_SHORT);
        assertThat(reading.of(trial)).isNaN();
    }

    /** A plane that stands on its edge has no beam, however the last bit of its margin fell. */
    @Test
    void onTheEdgeThereIsNoBeam() {
        Trial confocal = run(new Sketch().mirror("A", 1).go(1).mirror("B", 1).standingWave(1e-6));
        assertThat(read(Quantity.RADIUS, Place.of("A"), Plane.SAGITTAL, confocal))
                .isNaN();
        assertThat(confocal.hasBeam(Plane.TANGENTIAL)).isFalse();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            WAIST_RADIUS | Fold 1 | Fold 2         | more than one free stretch
            WAIST_SPLIT  | End A  | Rod            | do not follow each other
            ROUNDNESS    | Fold 1 | Output coupler | do not follow each other
            RADIUS       | Fold 1 | Rod            | accepted: a part
            LEG          | Fold 1 | Rod            | the name of a mirror
            LEG          | End A  | Fold 2         | which no leg joins
            CLIP_LOSS    | Rood   |                | nearest is "Rod"
            GOUY         | Rod    |                | accepted: no place
            FOCUS_RATIO  | Fold 1 |                | accepted: a crystal
            """)
    void aPlaceThatDoesNotFitIsRefusedWithWords(Quantity what, String first, String second, String words) {
        Trial trial = run(Samples.design("z-fold-rod"));
        Optional<Plane> plane = what.hasPlane() ? Optional.of(Plane.SAGITTAL) : Optional.empty();
        assertThatIllegalArgumentException()
                .isThrownBy(
                        () -> reading(what, Optional.of(new Place(first, Optional.ofNullable(second))), plane, trial))
                .withMessageContaining("; accepted: ")
                .withMessageContaining(words);
    }

    @Test
    void aQuantityNeedsItsPlaneAndItsEdge() {
        Chain chain = run(Samples.design("z-fold-rod")).numbers.chain;
        assertThatIllegalArgumentException()
                .isThrownBy(
                        () -> Reading.of(Quantity.GOUY, Optional.empty(), Optional.empty(), Optional.empty(), chain))
                .withMessageContaining("no plane");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Reading.of(
                        Quantity.ZONE_EDGE_SPLIT,
                        Optional.of(Place.of("Fold 1", "Fold 2")),
                        Optional.empty(),
                        Optional.empty(),
                        chain))
                .withMessageContaining("no edge");
    }
}
