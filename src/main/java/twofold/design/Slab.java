package twofold.design;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What a plate and a crystal share: two plane-parallel faces at an angle to the beam.
 *
 * @param along place on the leg
 * @param glass index or material, never none
 * @param faces angle of incidence on the faces
 * @param tiltPlane plane of the tilt
 * @param side the way the beam is shifted
 * @param clear diameter that the beam may use, m
 * @param loss share of power a pass
 * @param mount width and depth, centred, m; absent: not checked for clearance
 */
public record Slab(
        Along along,
        Glass glass,
        FaceAngle faces,
        TiltPlane tiltPlane,
        Side side,
        OptionalDouble clear,
        double loss,
        Optional<Mount> mount) {

    static Slab of(Values v) {
        TiltPlane tilt = v.get(Field.TILT_PLANE, TiltPlane.class);
        return new Slab(
                v.get(Field.ALONG, Along.class),
                v.glass(),
                v.get(Field.FACES, FaceAngle.class),
                tilt,
                v.maybe(Field.SIDE, Side.class).orElse(Side.usual(tilt)),
                v.optional(Field.CLEAR_DIAMETER),
                v.number(Field.LOSS),
                v.maybe(Field.SLAB_MOUNT, Mount.class));
    }

    Values values() {
        Values all = Values.NONE
                .with(Field.ALONG, along)
                .with(Field.INDEX, glass.index())
                .with(Field.MATERIAL, glass.material())
                .with(Field.FACES, faces)
                .with(Field.TILT_PLANE, tiltPlane)
                .with(Field.CLEAR_DIAMETER, clear)
                .with(Field.LOSS, (Object) loss)
                .with(Field.SLAB_MOUNT, mount);
        return side == Side.usual(tiltPlane) ? all : all.with(Field.SIDE, side);
    }
}
