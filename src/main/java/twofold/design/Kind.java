package twofold.design;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;

/** The kinds of part, with their words in a file. */
public enum Kind {
    /** A mirror: the only kind with a position; see {@link Mirror}. */
    MIRROR("mirror"),
    /** A thin lens in air; see {@link Lens}. */
    LENS("lens"),
    /** A plane-parallel plate given by its thickness; see {@link Plate}. */
    PLATE("plate"),
    /** A plane-parallel crystal given by the path inside it; see {@link Crystal}. */
    CRYSTAL("crystal"),
    /** A stop, or a place to read the beam; see {@link Aperture}. */
    APERTURE("aperture"),
    /** A black box given by its ray matrices; see {@link Matrix}. */
    MATRIX("matrix");

    private final String word;

    Kind(String word) {
        this.word = word;
    }

    /** The word in a file. */
    public String word() {
        return word;
    }

    /** The fields of this kind, in the order in which they are written; the typing form's fields of a mirror last. */
    public List<Field> fields() {
        return Fields.OF.getOrDefault(this, List.of());
    }

    /** Made once, when first asked for: the fields know the kinds. */
    private static final class Fields {
        static final Map<Kind, List<Field>> OF = Arrays.stream(Kind.values())
                .collect(Collectors.toUnmodifiableMap(
                        k -> k,
                        k -> Arrays.stream(Field.values())
                                .filter(f -> f.kinds().contains(k))
                                .toList()));
    }

    /** The field of this kind with a JSON name. */
    public Optional<Field> field(String json) {
        return fields().stream().filter(f -> f.json().equals(json)).findFirst();
    }

    /** Whether the beam runs inside this kind between two plane-parallel faces. */
    public boolean isSlab() {
        return this == PLATE || this == CRYSTAL;
    }

    /**
     * A part of this kind.
     *
     * @param name of the part
     * @param values every required field of this kind among them
     */
    public Part part(String name, Values values) {
        return switch (this) {
            case MIRROR -> Mirror.of(name, values);
            case LENS -> Lens.of(name, values);
            case PLATE -> Plate.of(name, values);
            case CRYSTAL -> Crystal.of(name, values);
            case APERTURE -> Aperture.of(name, values);
            case MATRIX -> Matrix.of(name, values);
        };
    }
}
