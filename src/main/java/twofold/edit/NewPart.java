package twofold.edit;

import java.util.Optional;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.FourNumbers;
import twofold.design.Kind;
import twofold.design.Names;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Values;
import twofold.material.Materials;

/** Parts as they come onto the table, with what a field must have and the vocabulary's defaults for all else. */
final class NewPart {
    /** m. */
    private static final double FOCAL_LENGTH = 100e-3;

    /** m. */
    private static final double THICKNESS = 3e-3;

    /** m. */
    private static final double LENGTH = 5e-3;

    private NewPart() {}

    /** A part under the first free name of its kind: a flat mirror, a lens of 100 mm, a plate of 3 mm, a crystal of 5 mm. */
    static Part of(Kind kind, Design design) {
        Values values = Values.NONE;
        for (Field field : kind.fields()) {
            if (field.need() == Field.Need.REQUIRED) {
                values = values.with(field, first(field));
            }
        }
        if (kind.isSlab()) {
            values = glass(
                    values, kind == Kind.PLATE ? "fused silica" : "YAG", kind == Kind.PLATE ? 1.45 : 1.82, design);
        }
        return kind.part(FreeName.first(Names.capital(kind.word()), Named.parts(design)), values);
    }

    private static Object first(Field field) {
        return switch (field) {
            case AT -> new Point(0, 0);
            case ALONG -> Along.MIDDLE;
            case FOCAL_LENGTH -> FOCAL_LENGTH;
            case ACROSS -> THICKNESS;
            case INSIDE -> LENGTH;
            case TANGENTIAL, SAGITTAL -> new FourNumbers(1, 0, 0, 1);
            default -> field.standIn();
        };
    }

    /** A usual material; where its fit does not reach the wavelength, its index near 1 µm. */
    private static Values glass(Values values, String material, double index, Design design) {
        boolean covered = Materials.standard()
                .find(material)
                .filter(m -> m.covers(design.wavelength()))
                .isPresent();
        return covered ? values.with(Field.MATERIAL, Optional.of(material)) : values.with(Field.INDEX, (Object) index);
    }
}
