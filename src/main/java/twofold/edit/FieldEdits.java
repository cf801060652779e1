package twofold.edit;

import java.util.function.Function;
import twofold.design.Design;
import twofold.design.Entry;
import twofold.design.Field;
import twofold.design.Mirror;
import twofold.design.Names;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Problem;
import twofold.design.Shape;
import twofold.design.Side;
import twofold.design.Subject;
import twofold.design.TiltPlane;
import twofold.design.Unit;
import twofold.design.Values;
import twofold.layout.Follow;
import twofold.layout.Laid;
import twofold.layout.Outcome;

/**
 * What a part is made of, and what a design says of itself, set from values or from text as {@link Entry} reads it. Mirrors
 * stay where they are, whatever becomes of the legs' paths; a part that no longer fits is refused.
 */
public final class FieldEdits {
    private FieldEdits() {}

    /**
     * A field set to what a person typed.
     *
     * @param field of the part's kind; instead of a mirror's radius its curvature may be given
     */
    public static Edit set(String part, Field field, String text) {
        return Edit.of(
                name(part, field),
                laid -> Named.part(laid.design(), part).then(i -> {
                    Entry<Object> entry = Entry.field(Subject.part(i).at(field.json()), text, field);
                    return entry.problem().isPresent()
                            ? Outcome.failed(entry.problem().get())
                            : set(laid, i, field, entry.value().orElseThrow());
                }));
    }

    /**
     * A field set to a value.
     *
     * @param value of the type of the field's form, in SI
     */
    public static Edit set(String part, Field field, Object value) {
        return Edit.of(
                name(part, field), laid -> Named.part(laid.design(), part).then(i -> set(laid, i, field, value)));
    }

    private static String name(String part, Field field) {
        return "set " + field.title() + " of " + part;
    }

    private static Outcome<Design> set(Laid laid, int index, Field field, Object value) {
        Part part = laid.design().parts().get(index);
        boolean other = field.need() == Field.Need.OTHER_FORM && field != Field.CURVATURE;
        if (other || !part.kind().fields().contains(field)) {
            return Outcome.failed(foreign(index, part, field));
        }
        if (field == Field.AT) {
            return MirrorEdits.place(part.name(), (Point) value, Follow.OTHERS_STAY)
                    .change()
                    .apply(laid);
        }
        Values values = field == Field.CURVATURE
                ? part.values().with(Field.ROC, (Object) radius((Double) value))
                : matched(part.values(), field, value);
        return Outcome.of(with(laid.design(), index, part.kind().part(part.name(), values)));
    }

    private static double radius(double curvature) {
        return curvature == 0 ? Double.POSITIVE_INFINITY : 1 / curvature;
    }

    private static Problem foreign(int index, Part part, Field field) {
        return new Problem(
                Subject.part(index).at(field.json()),
                "found " + field.json() + " for " + part.name() + ", a "
                        + part.kind().word(),
                String.join(
                        ", ",
                        part.kind().fields().stream()
                                .filter(f -> f.need() != Field.Need.OTHER_FORM)
                                .map(Field::json)
                                .toList()));
    }

    /** Values with one set, and what would contradict it or make it idle set to match. */
    private static Values matched(Values values, Field field, Object value) {
        Values set = values.with(field, value);
        if (field == Field.MATERIAL) {
            // The index would win.
            return set.without(Field.INDEX);
        }
        if (field == Field.TILT_PLANE && values.stated().get(Field.SIDE) instanceof Side side) {
            Side usual = Side.usual((TiltPlane) value);
            return set.with(Field.SIDE, side.sign() == usual.sign() ? usual : usual.opposite());
        }
        return set;
    }

    private static Design with(Design design, int index, Part part) {
        return Placing.with(Placing.without(design, index), index, part);
    }

    /** An optional field taken back to what it is when nothing is stated. */
    public static Edit clear(String part, Field field) {
        return Edit.of(
                "clear " + field.title() + " of " + part,
                laid -> Named.part(laid.design(), part).then(i -> {
                    Part was = laid.design().parts().get(i);
                    if (!was.kind().fields().contains(field)) {
                        return Outcome.failed(foreign(i, was, field));
                    }
                    if (field.need() != Field.Need.OPTIONAL) {
                        return Outcome.failed(new Problem(
                                Subject.part(i).at(field.json()),
                                "found nothing for " + field.json() + ", which " + part + " must have",
                                field.accepted()));
                    }
                    return Outcome.of(with(
                            laid.design(), i, was.kind().part(part, was.values().without(field))));
                }));
    }

    /** The title. */
    public static Edit title(String title) {
        return stated(
                "change the title",
                d -> new Design(
                        title,
                        d.notes(),
                        d.wavelength(),
                        d.shape(),
                        d.parts(),
                        d.holds(),
                        d.levers(),
                        d.requirements(),
                        d.tolerances()));
    }

    /** The notes. */
    public static Edit notes(String notes) {
        return stated(
                "change the notes",
                d -> new Design(
                        d.title(),
                        notes,
                        d.wavelength(),
                        d.shape(),
                        d.parts(),
                        d.holds(),
                        d.levers(),
                        d.requirements(),
                        d.tolerances()));
    }

    private static Edit stated(String name, Function<Design, Design> change) {
        return Edit.of(name, laid -> Outcome.of(change.apply(laid.design())));
    }

    /** The vacuum wavelength from text; in nm where it says nothing else. */
    public static Edit wavelength(String text) {
        return Edit.of("set wavelength", laid -> {
            Entry<Double> entry = Entry.number(Subject.DOCUMENT.at("wavelength_nm"), text, Unit.NM);
            return entry.problem().isPresent()
                    ? Outcome.failed(entry.problem().get())
                    : Outcome.of(with(
                            laid.design(),
                            entry.value().orElseThrow(),
                            laid.design().shape()));
        });
    }

    private static Design with(Design d, double wavelength, Shape shape) {
        return new Design(
                d.title(),
                d.notes(),
                wavelength,
                shape,
                d.parts(),
                d.holds(),
                d.levers(),
                d.requirements(),
                d.tolerances());
    }

    /**
     * How the light closes on itself. Mirrors stay; a ring is opened by leaving its closing leg out, on which nothing may
     * stand. What referred to that leg goes with it.
     */
    public static Edit shape(Shape shape) {
        return Edit.of("make it a " + shape.word(), laid -> {
            Design design = laid.design();
            int last = design.parts().size() - 1;
            if (shape == Shape.STANDING_WAVE && !(design.parts().get(last) instanceof Mirror)) {
                return Outcome.failed(new Problem(
                        Subject.part(last),
                        "found " + Names.shown(design.parts().get(last).name())
                                + " on the leg that closes the ring, which a standing wave has not",
                        "an empty closing leg: move or delete what stands there first"));
            }
            return Outcome.of(References.pruned(with(design, design.wavelength(), shape)));
        });
    }
}
