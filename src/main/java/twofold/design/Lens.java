package twofold.design;

import java.util.OptionalDouble;

/**
 * A thin lens in air.
 *
 * @param name unique in the design
 * @param along place on the leg
 * @param focalLength m, negative diverges
 * @param tilt angle of incidence, rad; not 0 needs a glass
 * @param tiltPlane plane of the tilt
 * @param glass what it is made of
 * @param clear diameter that the beam may use, m
 * @param loss share of power a pass
 * @param mount width and depth, centred, m
 */
public record Lens(
        String name,
        Along along,
        double focalLength,
        double tilt,
        TiltPlane tiltPlane,
        Glass glass,
        OptionalDouble clear,
        double loss,
        Mount mount)
        implements Part {

    static Lens of(String name, Values v) {
        return new Lens(
                name,
                v.get(Field.ALONG, Along.class),
                v.number(Field.FOCAL_LENGTH),
                v.number(Field.TILT),
                v.get(Field.TILT_PLANE, TiltPlane.class),
                v.glass(),
                v.optional(Field.CLEAR_DIAMETER),
                v.number(Field.LOSS),
                v.get(Field.LENS_MOUNT, Mount.class));
    }

    @Override
    public Kind kind() {
        return Kind.LENS;
    }

    @Override
    public Values values() {
        return Values.NONE
                .with(Field.ALONG, along)
                .with(Field.FOCAL_LENGTH, (Object) focalLength)
                .with(Field.TILT, (Object) tilt)
                .with(Field.TILT_PLANE, tiltPlane)
                .with(Field.INDEX, glass.index())
                .with(Field.MATERIAL, glass.material())
                .with(Field.CLEAR_DIAMETER, clear)
                .with(Field.LOSS, (Object) loss)
                .with(Field.LENS_MOUNT, mount);
    }

    @Override
    public <R> R match(Cases<R> cases) {
        return cases.lens(this);
    }
}
