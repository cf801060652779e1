package twofold.edit;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import twofold.design.Along;
import twofold.design.Crystal;
import twofold.design.Design;
import twofold.design.FaceAngle;
import twofold.design.Lever;
import twofold.design.Mirror;
import twofold.design.Mount;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Point;
import twofold.design.Problem;
import twofold.design.Shape;
import twofold.design.Side;
import twofold.design.Slab;
import twofold.design.Subject;
import twofold.design.TiltPlane;
import twofold.design.TwoPowers;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.layout.Outcome;
import twofold.layout.Standing;
import twofold.layout.Typed;

/** How a shape stands on the table once two numbers are known: the incidence on its folds, and its gap. */
interface StartingPlan {
    /** Half-inch mirrors in small mounts, m; common practice, no source: folded beams pass close by. */
    double DIAMETER = 12.7e-3;

    /** Thickness of such a mirror, m. */
    double THICKNESS = 6.35e-3;

    /** Name of the crystal. */
    String CRYSTAL = "Crystal";

    /** Where a crystal's material is stated. */
    String MATERIAL = "material";

    /**
     * Mirrors and crystal alone.
     *
     * @param incidence on the folds, rad
     * @param gap path of the leg of the gap, m
     */
    Outcome<Design> at(double incidence, double gap);

    /** The number of the leg with the crystal; the gap, but of a triangle. */
    int gapLeg();

    /** The mirrors at its ends. */
    Place crystalLeg();

    /** The lever that moves the gap, over a range of it, m. */
    default Lever lever(double from, double to) {
        return new Lever("gap", "leg_mm", List.of(crystalLeg()), new Lever.Range.Span(from, to), true);
    }

    /** Mirrors with the folds' incidence, those of the gap first. */
    List<String> folds();

    /** A path of the gap to begin with, m: more than the crystal takes. */
    double begin();

    /** A small mirror. */
    static Mirror mirror(String name, Point at, double radius) {
        return new Mirror(name, at, radius, 1, 0, DIAMETER, THICKNESS, OptionalDouble.empty(), new Mount(25e-3, 20e-3));
    }

    /** The crystal, in the middle of its leg; there is one. */
    static Crystal crystal(StartingValues values) {
        FaceAngle faces = values.cut() == CrystalCut.BREWSTER ? FaceAngle.BREWSTER : FaceAngle.of(0);
        Slab slab = new Slab(
                Along.MIDDLE,
                values.glass(),
                faces,
                TiltPlane.TANGENTIAL,
                Side.LEFT,
                OptionalDouble.empty(),
                0,
                Optional.of(new Mount(16e-3, 10e-3)));
        return new Crystal(CRYSTAL, values.number(StartingInput.CRYSTAL_LENGTH), TwoPowers.NONE, slab);
    }

    /** What the crystal takes of its leg, m; 0 without one. */
    static double inside(StartingValues values) {
        return values.hasCrystal() ? values.number(StartingInput.CRYSTAL_LENGTH) : 0;
    }

    /** What the crystal is on a leg of its own, or what is wrong with its glass; without a crystal, neither. */
    static Outcome<Standing> standing(StartingValues values) {
        if (!values.hasCrystal()) {
            return Outcome.failed(List.of());
        }
        List<Part> parts = List.of(mirror("A", new Point(0, 0), 1), crystal(values), mirror("B", new Point(0, 0), 1));
        Typed leg = new Typed(
                OptionalDouble.of(2 * inside(values)),
                OptionalDouble.empty(),
                Optional.empty(),
                OptionalDouble.empty());
        Design alone = Design.of(CRYSTAL, values.number(StartingInput.WAVELENGTH), Shape.STANDING_WAVE, parts);
        Outcome<Laid> laid = Layout.typed(alone, Map.of(2, leg)).then(Layout::of);
        return laid.value()
                .map(l -> Outcome.of(l.legs().get(0).parts().get(0)))
                .orElseGet(() -> Outcome.failed(laid.problems().stream()
                        .map(p -> new Problem(Subject.DOCUMENT.at(MATERIAL), p.found(), p.accepted()))
                        .toList()));
    }
}
