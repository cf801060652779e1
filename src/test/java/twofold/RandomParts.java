package twofold;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import twofold.design.Along;
import twofold.design.Aperture;
import twofold.design.Crystal;
import twofold.design.FaceAngle;
import twofold.design.Field;
import twofold.design.FourNumbers;
import twofold.design.Glass;
import twofold.design.Lens;
import twofold.design.Matrix;
import twofold.design.Mirror;
import twofold.design.Mount;
import twofold.design.Part;
import twofold.design.Plate;
import twofold.design.Point;
import twofold.design.Side;
import twofold.design.Slab;
import twofold.design.TiltPlane;
import twofold.design.TwoPowers;
import twofold.design.Unit;
import twofold.material.Materials;

/**
 * Random parts, not yet in their places. Focal lengths and radii are multiplied by {@code weakness}, powers divided.
 *
 * @param dice where chance comes from
 * @param wave vacuum wavelength, m
 * @param weakness 1 for the strongest optics
 */
record RandomParts(Dice dice, double wave, double weakness) {
    private static final List<String> WORDS =
            List.of("Fold", "Rod", "Linse", "Flat", "Plättchen", "鏡", "Étalon", "Stop", "M", "Box", "λ plate", "Ø");

    /** A part and the path that the beam takes through it: in all, along the heading, to the left and up, m. */
    record Draft(Part part, double path, double ahead, double left, double up) {
        static Draft thin(Part part, double path) {
            return new Draft(part, path, path, 0, 0);
        }

        /** The same in its place. */
        Part at(Along along) {
            return part.with(Field.ALONG, along);
        }
    }

    String name(int number) {
        return dice.of(WORDS) + (dice.chance(0.5) ? " " : "-") + number;
    }

    Mirror mirror(String name, Point at) {
        double kind = dice.any(0, 1);
        double radius = kind < 0.4
                ? Double.POSITIVE_INFINITY
                : (kind < 0.8 ? 1 : -1) * dice.length(0.08, 3) * weakness * (kind < 0.8 ? 1 : 3);
        double reflectance = dice.chance(0.5) ? 1 : dice.number(0.9, 0.999, Unit.ONE, 3);
        Mirror mirror = new Mirror(
                name,
                at,
                radius,
                reflectance,
                reflectance == 1 || dice.chance(0.5) ? 0 : dice.any(0, 1 - reflectance),
                dice.chance(0.5) ? 25.4e-3 : dice.length(5e-3, 60e-3),
                dice.chance(0.5) ? 6.35e-3 : dice.length(2e-3, 10e-3),
                clear(),
                dice.chance(0.5) ? new Mount(48e-3, 25e-3) : mount());
        return mirror;
    }

    private OptionalDouble clear() {
        return dice.chance(0.7) ? OptionalDouble.empty() : OptionalDouble.of(dice.length(3e-3, 30e-3));
    }

    private Mount mount() {
        return new Mount(dice.length(10e-3, 60e-3), dice.length(5e-3, 30e-3));
    }

    /** Any part but a mirror. A slab tilted out of the plane comes only where {@code mayLift}. */
    Draft part(String name, boolean mayLift) {
        return switch (dice.count(0, 9)) {
            case 0, 1 -> lens(name);
            case 2, 3 -> slab(name, true, mayLift);
            case 4, 5, 6 -> slab(name, false, mayLift);
            case 7 -> matrix(name);
            default -> aperture(name);
        };
    }

    private Draft aperture(String name) {
        OptionalDouble hole = dice.chance(0.4) ? OptionalDouble.of(dice.length(1e-3, 20e-3)) : OptionalDouble.empty();
        boolean slits = hole.isEmpty() && dice.chance(0.6);
        OptionalDouble none = OptionalDouble.empty();
        return Draft.thin(
                new Aperture(
                        name,
                        Along.MIDDLE,
                        hole,
                        slits ? OptionalDouble.of(dice.length(1e-3, 20e-3)) : none,
                        slits && dice.chance(0.5) ? OptionalDouble.of(dice.length(1e-3, 20e-3)) : none),
                0);
    }

    private Draft lens(String name) {
        boolean tilted = dice.chance(0.4);
        return Draft.thin(
                new Lens(
                        name,
                        Along.MIDDLE,
                        (dice.chance(0.65) ? 1 : -1) * dice.length(0.06, 2) * weakness,
                        tilted ? dice.number(1e-3, 0.6, Unit.DEG, 1) : 0,
                        tilted && dice.chance(0.5) ? TiltPlane.SAGITTAL : TiltPlane.TANGENTIAL,
                        tilted || dice.chance(0.2) ? glass() : Glass.NONE,
                        clear(),
                        loss(),
                        dice.chance(0.5) ? new Mount(35e-3, 12e-3) : mount()),
                0);
    }

    private Glass glass() {
        double kind = dice.any(0, 1);
        return new Glass(
                kind < 0.8 ? OptionalDouble.of(dice.number(1.3, 2.4, Unit.ONE, 2)) : OptionalDouble.empty(),
                kind < 0.7 ? Optional.empty() : Optional.of(dice.of(materials())));
    }

    private List<String> materials() {
        Materials all = Materials.standard();
        return all.names().stream()
                .filter(n -> all.find(n).orElseThrow().covers(wave))
                .toList();
    }

    private double index(Glass glass) {
        return glass.index()
                .orElseGet(() -> Materials.standard()
                        .find(glass.material().orElseThrow())
                        .orElseThrow()
                        .index(wave));
    }

    private double loss() {
        return dice.chance(0.6) ? 0 : dice.number(0, 0.02, Unit.PERCENT, 1);
    }

    private Draft matrix(String name) {
        double length = dice.chance(0.4) ? 0 : dice.length(1e-3, 40e-3);
        return Draft.thin(new Matrix(name, Along.MIDDLE, length, numbers(length), numbers(length)), length);
    }

    /** A magnification, a length and a power; d makes the determinant 1. */
    private FourNumbers numbers(double length) {
        double a = Math.exp(dice.any(-0.5, 0.5) / weakness);
        double b = length + dice.any(-0.02, 0.05);
        double c = dice.any(-3, 2) / weakness;
        return new FourNumbers(a, b, c, (1 + b * c) / a);
    }

    private Draft slab(String name, boolean plate, boolean mayLift) {
        boolean lifts = mayLift && dice.chance(0.35);
        FaceAngle faces = faces();
        Side side = lifts ? (dice.chance(0.5) ? Side.UP : Side.DOWN) : (dice.chance(0.5) ? Side.LEFT : Side.RIGHT);
        return slab(name, plate, faces, side);
    }

    private FaceAngle faces() {
        double kind = dice.any(0, 1);
        return kind < 0.3
                ? FaceAngle.of(0)
                : kind < 0.65 ? FaceAngle.BREWSTER : FaceAngle.of(dice.number(0.01, 1.2, Unit.DEG, 1));
    }

    private Draft slab(String name, boolean plate, FaceAngle faces, Side side) {
        Slab slab = new Slab(
                Along.MIDDLE,
                glass(),
                faces,
                side.of(),
                side,
                clear(),
                loss(),
                dice.chance(0.5) ? Optional.of(mount()) : Optional.empty());
        double outside = incidence(slab);
        double inside = Math.asin(Math.sin(outside) / index(slab.glass()));
        double thickness = dice.length(0.5e-3, 12e-3);
        double path = plate ? thickness / Math.cos(inside) : dice.length(1e-3, 30e-3);
        Part part = plate ? new Plate(name, thickness, slab) : new Crystal(name, path, powers(), slab);
        double turn = outside - inside;
        double aside = path * Math.sin(turn) * side.sign();
        boolean lifts = side.of() == TiltPlane.SAGITTAL;
        return new Draft(part, path, path * Math.cos(turn), lifts ? 0 : aside, lifts ? aside : 0);
    }

    private double incidence(Slab slab) {
        return slab.faces().atBrewster()
                ? Math.atan(index(slab.glass()))
                : slab.faces().incidence();
    }

    private TwoPowers powers() {
        double kind = dice.any(0, 1);
        if (kind < 0.4) {
            return TwoPowers.NONE;
        }
        double first = dice.number(-4, 8, Unit.PER_M, 1) / weakness;
        return new TwoPowers(first, kind < 0.7 ? first : dice.number(-4, 8, Unit.PER_M, 2) / weakness);
    }

    /** Two slabs tilted out of the plane whose shifts in height cancel. */
    List<Draft> pair(String first, String second) {
        Draft up = slab(first, false, faces(), Side.UP);
        Crystal crystal = (Crystal) up.part();
        Slab down = new Slab(
                Along.MIDDLE,
                crystal.slab().glass(),
                crystal.slab().faces(),
                TiltPlane.SAGITTAL,
                Side.DOWN,
                clear(),
                loss(),
                Optional.empty());
        double inside = Math.asin(Math.sin(incidence(down)) / index(down.glass()));
        // Half of the time the way down is a plate, whose thickness follows from the crystal's path.
        Part part = dice.chance(0.5)
                ? new Plate(second, crystal.length() * Math.cos(inside), down)
                : new Crystal(second, crystal.length(), powers(), down);
        List<Draft> both = new ArrayList<>(List.of(up, new Draft(part, up.path(), up.ahead(), 0, -up.up())));
        if (dice.chance(0.5)) {
            java.util.Collections.reverse(both);
        }
        return both;
    }
}
