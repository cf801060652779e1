package twofold.design;

/**
 * One thing on the table that the beam meets. Parts stand in a design in beam order; mirrors have positions, all others
 * stand on the leg between two mirrors.
 *
 * <p>A new kind is one record here, its constant in {@link Kind}, its fields in {@link Field} and a method in
 * {@link Cases}; what forgets it does not compile.
 */
public sealed interface Part permits Mirror, Lens, Plate, Crystal, Aperture, Matrix {
    /** The name, unique in a design. */
    String name();

    /** The kind. */
    Kind kind();

    /** The fields of this part and their values; what is absent is not among them. */
    Values values();

    /** Calls the one case that fits. */
    <R> R match(Cases<R> cases);

    /** This part with one field set to a value of that field's form. */
    default Part with(Field field, Object value) {
        return kind().part(name(), values().with(field, value));
    }

    /** This part under another name. */
    default Part named(String name) {
        return kind().part(name, values());
    }

    /**
     * One answer for each kind of part.
     *
     * @param <R> the answer
     */
    interface Cases<R> {
        /** For a mirror. */
        R mirror(Mirror mirror);

        /** For a lens. */
        R lens(Lens lens);

        /** For a plate. */
        R plate(Plate plate);

        /** For a crystal. */
        R crystal(Crystal crystal);

        /** For an aperture. */
        R aperture(Aperture aperture);

        /** For a black box. */
        R matrix(Matrix matrix);
    }
}
