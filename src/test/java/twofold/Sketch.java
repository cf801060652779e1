package twofold;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import twofold.design.Along;
import twofold.design.Crystal;
import twofold.design.Design;
import twofold.design.FaceAngle;
import twofold.design.Field;
import twofold.design.Glass;
import twofold.design.Kind;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.design.Side;
import twofold.design.Slab;
import twofold.design.TiltPlane;
import twofold.design.TwoPowers;
import twofold.design.Values;

/**
 * Draws a cavity as one walks it: paths, slabs and turns give the mirrors' places on the table. Made for stating published
 * cavities, and on purpose independent of how the program lays out typed legs. All lengths in m.
 */
public final class Sketch {
    private final List<Part> parts = new ArrayList<>();
    private double x;
    private double y;
    private double heading;
    private double path;

    /** Starts at a point, along a heading from +x towards +y, rad. */
    public Sketch(Point start, double heading) {
        x = start.x();
        y = start.y();
        this.heading = heading;
    }

    /** Starts at the origin along +x. */
    public Sketch() {
        this(new Point(0, 0), 0);
    }

    /** A mirror here. */
    public Sketch mirror(String name, double radius) {
        parts.add(Kind.MIRROR.part(
                name, Values.NONE.with(Field.AT, (Object) new Point(x, y)).with(Field.ROC, (Object) radius)));
        path = 0;
        return this;
    }

    /** A flat mirror here. */
    public Sketch flat(String name) {
        return mirror(name, Double.POSITIVE_INFINITY);
    }

    /** Straight on through air. */
    public Sketch go(double air) {
        step(air, 0);
        return this;
    }

    /** A thin lens here. */
    public Sketch lens(String name, double focalLength) {
        parts.add(Kind.LENS.part(
                name,
                Values.NONE.with(Field.ALONG, (Object) Along.at(path)).with(Field.FOCAL_LENGTH, (Object) focalLength)));
        return this;
    }

    /** A crystal at normal incidence, by the path inside. */
    public Sketch crystal(String name, double length, double index) {
        slab(name, length, index, FaceAngle.of(0));
        step(length, 0);
        return this;
    }

    /** A crystal at Brewster's angle, by the path inside; the beam is shifted to the left. */
    public Sketch brewster(String name, double length, double index) {
        slab(name, length, index, FaceAngle.BREWSTER);
        // At Brewster's angle the angles outside and inside add up to a right angle.
        step(length, 2 * Math.atan(index) - Math.PI / 2);
        return this;
    }

    /** A plate at an incidence, by the thickness across its faces; the beam is shifted to the left. */
    public Sketch plate(String name, double thickness, double index, double incidence) {
        double inside = Math.asin(Math.sin(incidence) / index);
        double length = thickness / Math.cos(inside);
        parts.add(Kind.PLATE.part(
                name,
                Values.NONE
                        .with(Field.ALONG, (Object) Along.at(path + length / 2))
                        .with(Field.ACROSS, (Object) thickness)
                        .with(Field.INDEX, (Object) index)
                        .with(Field.FACES, (Object) FaceAngle.of(incidence))));
        step(length, incidence - inside);
        return this;
    }

    /** Reflected to the left at an incidence, rad. */
    public Sketch left(double incidence) {
        heading += Math.PI - 2 * incidence;
        return this;
    }

    /** Reflected to the right at an incidence, rad. */
    public Sketch right(double incidence) {
        heading -= Math.PI - 2 * incidence;
        return this;
    }

    /** How far the walk is from where it started, m. */
    public double gap() {
        return ((Mirror) parts.get(0)).at().distance(new Point(x, y));
    }

    /** What was drawn, as a standing wave. */
    public Design standingWave(double wavelength) {
        return Design.of("", wavelength, Shape.STANDING_WAVE, parts);
    }

    /** What was drawn, as a ring. */
    public Design ring(double wavelength) {
        return Design.of("", wavelength, Shape.RING, parts);
    }

    private void slab(String name, double length, double index, FaceAngle faces) {
        parts.add(new Crystal(
                name,
                length,
                TwoPowers.NONE,
                new Slab(
                        Along.at(path + length / 2),
                        new Glass(OptionalDouble.of(index), Optional.empty()),
                        faces,
                        TiltPlane.TANGENTIAL,
                        Side.LEFT,
                        OptionalDouble.empty(),
                        0,
                        Optional.empty())));
    }

    private void step(double length, double aside) {
        x += length * Math.cos(heading + aside);
        y += length * Math.sin(heading + aside);
        path += length;
    }
}
