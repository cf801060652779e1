package twofold;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import twofold.design.Along;
import twofold.design.Crystal;
import twofold.design.Design;
import twofold.design.FaceAngle;
import twofold.design.Glass;
import twofold.design.Mirror;
import twofold.design.Mount;
import twofold.design.Part;
import twofold.design.Plate;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.design.Side;
import twofold.design.Slab;
import twofold.design.TwoPowers;

/** Designs whose chains are known in closed form. */
final class KnownCavities {
    private KnownCavities() {}

    static Mirror mirror(String name, Point at, double radius) {
        Mount mount = new Mount(48e-3, 25e-3);
        return new Mirror(name, at, radius, 1, 0, 25.4e-3, 6.35e-3, OptionalDouble.empty(), mount);
    }

    static Slab slab(Along along, double index, FaceAngle faces, Side side) {
        Glass glass = new Glass(OptionalDouble.of(index), Optional.empty());
        return new Slab(along, glass, faces, side.of(), side, OptionalDouble.empty(), 0, Optional.empty());
    }

    static Crystal crystal(double length, TwoPowers powers, Slab slab) {
        return new Crystal("Crystal", length, powers, slab);
    }

    /** A place some way along a heading. */
    static Point from(Point at, double heading, double ahead, double left) {
        double cos = Math.cos(heading);
        double sin = Math.sin(heading);
        return new Point(at.x() + ahead * cos - left * sin, at.y() + ahead * sin + left * cos);
    }

    /** Two flat mirrors 200 mm of path apart and a slab between them, displacing the beam so far ahead and left. */
    static Design flat(Part slab, double path, double ahead, double left) {
        Point end = new Point(0.2 - path + ahead, left);
        double flat = Double.POSITIVE_INFINITY;
        return Design.of(
                "Flat",
                1e-6,
                Shape.STANDING_WAVE,
                List.of(mirror("A", new Point(0, 0), flat), slab, mirror("B", end, flat)));
    }

    /** Flat mirror, first arm, one curved fold, second arm, flat mirror. */
    static Design fold(double radius, double theta, double first, double second) {
        Point middle = new Point(first, 0);
        double flat = Double.POSITIVE_INFINITY;
        Point end = from(middle, Math.PI - 2 * theta, second, 0);
        return Design.of(
                "V",
                1e-6,
                Shape.STANDING_WAVE,
                List.of(mirror("A", new Point(0, 0), flat), mirror("F", middle, radius), mirror("B", end, flat)));
    }

    /**
     * The X-fold with a Brewster crystal: flat, 0.6 m, R = 100 mm, 50 mm, crystal of 4 mm and index 1.76, 50 mm, R = 100
     * mm, 0.9 m, flat; 800 nm; both folds at 7.098812303°.
     */
    static Design xFold() {
        double theta = Math.toRadians(7.098812303);
        double brewster = Math.atan(1.76);
        double turn = 2 * brewster - Math.PI / 2;
        double radius = 0.1;
        double flat = Double.POSITIVE_INFINITY;
        Point first = new Point(0.6, 0);
        double back = Math.PI - 2 * theta;
        Point second = from(first, back, 0.1 + 0.004 * Math.cos(turn), 0.004 * Math.sin(turn));
        Point end = from(second, 0, 0.9, 0);
        List<Part> parts = new ArrayList<>();
        parts.add(mirror("M1", new Point(0, 0), flat));
        parts.add(mirror("CM1", first, radius));
        parts.add(crystal(0.004, TwoPowers.NONE, slab(Along.MIDDLE, 1.76, FaceAngle.BREWSTER, Side.LEFT)));
        parts.add(mirror("CM2", second, radius));
        parts.add(mirror("M2", end, flat));
        return Design.of("X-fold", 800e-9, Shape.STANDING_WAVE, parts);
    }

    /** The bow-tie with 10 mm of index 1.605 between R = 100 mm mirrors at 6°, 50 mm of air each side, long arm 400 mm. */
    static Design bowTie() {
        double theta = Math.toRadians(6);
        double path = 0.11;
        double half = path / 2;
        // Long way round: two diagonals and a straight arm, 400 mm in all; diagonals d, straight arm d cos 2θ · 2 −
        // path.
        double diagonal = (0.4 + path) / (2 + 2 * Math.cos(2 * theta));
        double height = diagonal * Math.sin(2 * theta);
        double reach = diagonal * Math.cos(2 * theta) - half;
        double flat = Double.POSITIVE_INFINITY;
        return Design.of(
                "Bow-tie",
                1064e-9,
                Shape.RING,
                List.of(
                        mirror("C1", new Point(-half, 0), 0.1),
                        crystal(0.01, TwoPowers.NONE, slab(Along.MIDDLE, 1.605, FaceAngle.of(0), Side.LEFT)),
                        mirror("C2", new Point(half, 0), 0.1),
                        mirror("F1", new Point(-reach, -height), flat),
                        mirror("F2", new Point(reach, -height), flat)));
    }

    static Plate plate(double thickness, Slab slab) {
        return new Plate("Plate", thickness, slab);
    }
}
