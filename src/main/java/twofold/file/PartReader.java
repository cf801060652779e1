package twofold.file;

import java.util.Arrays;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import twofold.design.Field;
import twofold.design.Kind;
import twofold.design.Names;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Subject;
import twofold.design.Values;

/** Reads one part of a document. What cannot be read is put on record, and a legal value stands in for it. */
final class PartReader {
    /** Begins the names that stand in for unreadable ones; no readable name begins so, nor is near to it. */
    static final String NAMELESS = "@@@ stands in for an unreadable name @@@";

    private static final List<Kind> KINDS = List.of(Kind.values());
    private static final List<String> KIND_WORDS =
            KINDS.stream().map(Kind::word).toList();
    private static final List<String> HEAD = List.of("name", "kind");

    /** Every key that some part has. */
    private static final List<String> KEYS =
            Members.keys(HEAD, Arrays.stream(Field.values()).map(Field::json).distinct());

    private final Faults faults;
    private final Convert convert;

    PartReader(Faults faults) {
        this.faults = faults;
        this.convert = new Convert(faults);
    }

    /**
     * What was read.
     *
     * @param part with stand-ins for what could not be read, a mirror's position among them
     * @param members of the object; empty where there is none, or its kind is beyond guessing
     * @param otherForms what a mirror gives in place of its own fields: the typing form
     */
    record Draft(Part part, Optional<Members> members, Map<Field, Object> otherForms) {
        Draft at(Point point) {
            return new Draft(part.with(Field.AT, point), members, otherForms);
        }
    }

    /** A place for a mirror whose own is not known: far away, and another one for each. */
    static Point far(int index) {
        return new Point(1e5 + 100.0 * index, 0.5 * index * index);
    }

    /**
     * Reads a part.
     *
     * @param index among the parts
     */
    Draft read(int index, Json json) {
        Subject where = Subject.part(index);
        if (!(json instanceof Json.Obj object)) {
            faults.refuse(where, json, "an object: a part with a name and a kind");
            faults.markBroken(where.at("kind"));
            return standIn(NAMELESS + index);
        }
        Members members = new Members(where, object, faults);
        String name = members.need("name", Names.ACCEPTED)
                .flatMap(v -> convert.text(where.at("name"), v, Names.ACCEPTED))
                .orElse(NAMELESS + index);
        Optional<Json> word = members.need("kind", Convert.quoted(KIND_WORDS));
        Optional<Kind> kind = word.flatMap(v -> convert.word(where.at("kind"), v, Kind.values(), Kind::word))
                .or(() -> word.flatMap(PartReader::guess));
        if (kind.isEmpty()) {
            members.refuseUnknown("a part", KEYS);
            return standIn(name);
        }
        return fields(index, name, kind.get(), members);
    }

    /** The kind that a misspelt word probably means. */
    private static Optional<Kind> guess(Json word) {
        Optional<String> nearest = word instanceof Json.Str s ? Names.nearest(s.text(), KIND_WORDS) : Optional.empty();
        return nearest.flatMap(
                n -> KINDS.stream().filter(k -> k.word().equals(n)).findFirst());
    }

    private static Draft standIn(String name) {
        Values values = Values.NONE.with(Field.ALONG, Field.ALONG.standIn());
        return new Draft(Kind.APERTURE.part(name, values), Optional.empty(), Map.of());
    }

    private Draft fields(int index, String name, Kind kind, Members members) {
        Values values = Values.NONE;
        Map<Field, Object> otherForms = new EnumMap<>(Field.class);
        for (Field field : kind.fields()) {
            Subject where = members.where().at(field.json());
            Object standIn = field == Field.AT ? far(index) : field.standIn();
            Optional<Json> json = members.find(field.json());
            if (json.isPresent()) {
                Optional<?> value = convert.field(where, json.get(), field);
                if (field.need() != Field.Need.OTHER_FORM) {
                    values = values.with(field, value.isPresent() ? value.get() : standIn);
                } else {
                    otherForms.put(
                            field,
                            value.filter(v -> isInRange(where, json.get(), field, v))
                                    .<Object>map(v -> v)
                                    .orElse(standIn));
                }
            } else if (field == Field.AT) {
                // Whether it must be there, the typing form decides.
                values = values.with(field, standIn);
            } else if (field.need() == Field.Need.REQUIRED) {
                members.missing(field.json(), field.accepted());
                values = values.with(field, standIn);
            }
        }
        if (otherForms.containsKey(Field.CURVATURE)) {
            values = values.with(Field.ROC, radius(members, (Double) otherForms.get(Field.CURVATURE)));
        }
        members.refuseUnknown(
                (kind == Kind.APERTURE ? "an " : "a ") + kind.word(),
                Members.keys(HEAD, kind.fields().stream().map(Field::json)));
        return new Draft(kind.part(name, values), Optional.of(members), otherForms);
    }

    /** What is never stored is checked here, all else by the design. */
    private boolean isInRange(Subject where, Json json, Field field, Object value) {
        if (!(value instanceof Double d) || field.accepts(d)) {
            return true;
        }
        faults.refuse(where, json, field.accepted());
        return false;
    }

    private Object radius(Members members, double curvature) {
        String key = Field.CURVATURE.json();
        double radius = curvature == 0 ? Double.POSITIVE_INFINITY : 1 / curvature;
        if (members.has(Field.ROC.json())) {
            members.misplaced(key, "found " + key + " beside " + Field.ROC.json(), "one of them");
        } else if (curvature != 0 && !Field.ROC.accepts(radius)) {
            members.find(key)
                    .ifPresent(v -> faults.refuse(
                            members.where().at(key),
                            v,
                            "0 for flat, or 1000 over a roc_mm that is " + Field.ROC.accepted()));
        } else {
            return radius;
        }
        return Double.POSITIVE_INFINITY;
    }
}
