package twofold.design;

import java.util.OptionalDouble;

/**
 * A stop with a hole, or with a slit in one or both planes, or a mere mark where the beam is read.
 *
 * @param name unique in the design
 * @param along place on the leg
 * @param hole diameter, m; excludes slits
 * @param slitTangential full width, m
 * @param slitSagittal full width, m
 */
public record Aperture(
        String name, Along along, OptionalDouble hole, OptionalDouble slitTangential, OptionalDouble slitSagittal)
        implements Part {

    static Aperture of(String name, Values v) {
        return new Aperture(
                name,
                v.get(Field.ALONG, Along.class),
                v.optional(Field.HOLE),
                v.optional(Field.SLIT_TANGENTIAL),
                v.optional(Field.SLIT_SAGITTAL));
    }

    @Override
    public Kind kind() {
        return Kind.APERTURE;
    }

    @Override
    public Values values() {
        return Values.NONE
                .with(Field.ALONG, along)
                .with(Field.HOLE, hole)
                .with(Field.SLIT_TANGENTIAL, slitTangential)
                .with(Field.SLIT_SAGITTAL, slitSagittal);
    }

    @Override
    public <R> R match(Cases<R> cases) {
        return cases.aperture(this);
    }
}
