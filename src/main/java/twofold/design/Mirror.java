package twofold.design;

import java.util.OptionalDouble;

/**
 * A mirror. It always faces the beam: head-on at the ends of a standing wave, else along the bisector of its two legs.
 *
 * @param name unique in the design
 * @param at position of the vertex on the table, m
 * @param radius of curvature, m; positive concave, negative convex, +∞ flat
 * @param reflectance share of power
 * @param transmittance share of power
 * @param diameter of the optic, m
 * @param thickness of the optic, m
 * @param clear diameter that the beam may use, m; empty: 0.85 of the diameter
 * @param mount width along the face and depth behind it, m
 */
public record Mirror(
        String name,
        Point at,
        double radius,
        double reflectance,
        double transmittance,
        double diameter,
        double thickness,
        OptionalDouble clear,
        Mount mount)
        implements Part {

    /** Share of the diameter that is clear when nothing is stated. */
    private static final double USUAL_CLEAR = 0.85;

    static Mirror of(String name, Values v) {
        return new Mirror(
                name,
                v.get(Field.AT, Point.class),
                v.number(Field.ROC),
                v.number(Field.REFLECTANCE),
                v.number(Field.TRANSMITTANCE),
                v.number(Field.DIAMETER),
                v.number(Field.SUBSTRATE),
                v.optional(Field.CLEAR_DIAMETER),
                v.get(Field.MOUNT, Mount.class));
    }

    /** The curvature, 1/m; 0 is flat. */
    public double curvature() {
        return 1 / radius;
    }

    /** The diameter that the beam may use, m. */
    public double clearDiameter() {
        return clear.orElse(USUAL_CLEAR * diameter);
    }

    /** This mirror elsewhere. */
    public Mirror at(Point place) {
        return new Mirror(name, place, radius, reflectance, transmittance, diameter, thickness, clear, mount);
    }

    @Override
    public Kind kind() {
        return Kind.MIRROR;
    }

    @Override
    public Values values() {
        return Values.NONE
                .with(Field.AT, at)
                .with(Field.ROC, (Object) radius)
                .with(Field.REFLECTANCE, (Object) reflectance)
                .with(Field.TRANSMITTANCE, (Object) transmittance)
                .with(Field.DIAMETER, (Object) diameter)
                .with(Field.SUBSTRATE, (Object) thickness)
                .with(Field.CLEAR_DIAMETER, clear)
                .with(Field.MOUNT, mount);
    }

    @Override
    public <R> R match(Cases<R> cases) {
        return cases.mirror(this);
    }
}
