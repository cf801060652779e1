package twofold.file;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Pattern;
import java.util.stream.IntStream;
import twofold.design.Design;
import twofold.design.Hold;
import twofold.design.Lever;
import twofold.design.Requirement;
import twofold.design.Shape;
import twofold.design.Subject;
import twofold.design.Tolerance;
import twofold.design.Unit;
import twofold.layout.Typed;

/** Reads a whole document into a draft. What cannot be read is put on record, and a legal value stands in for it. */
final class DocumentReader {
    /** What a document of this program begins with. */
    static final String FORMAT = "twofold/1";

    private static final Pattern LATER = Pattern.compile("twofold/([2-9]|[1-9][0-9]{1,8})");
    private static final List<String> KEYS = List.of(
            "format",
            "title",
            "notes",
            "wavelength_nm",
            "shape",
            "parts",
            "holds",
            "levers",
            "requirements",
            "tolerances");

    private final Faults faults;
    private final Convert convert;

    private DocumentReader(Faults faults) {
        this.faults = faults;
        this.convert = new Convert(faults);
    }

    /**
     * What was read.
     *
     * @param design with stand-ins for what could not be read
     * @param typed what mirrors give in place of their positions, by index
     * @param root the document's object
     */
    record Draft(Design design, Map<Integer, Typed> typed, Json.Obj root) {
        /** Whether a list was read to its end, or is not there at all. */
        boolean isWhole(String list) {
            Json.Member member = root.members().get(list);
            return member == null ? root.whole() : !(member.value() instanceof Json.Arr a) || a.whole();
        }
    }

    /** Reads a document; empty, with the problem on record, where it is none that this version can speak about. */
    static Optional<Draft> read(Json root, Faults faults) {
        return new DocumentReader(faults).document(root);
    }

    private Optional<Draft> document(Json json) {
        if (!(json instanceof Json.Obj root)) {
            faults.refuse(Subject.DOCUMENT, json, "an object in braces");
            return Optional.empty();
        }
        Members members = new Members(Subject.DOCUMENT, root, faults);
        if (!format(members)) {
            return Optional.empty();
        }
        members.refuseUnknown("a design", KEYS);
        String title = words(members, "title");
        String notes = words(members, "notes");
        String waves =
                "a number from " + Unit.NM.text(Design.SHORTEST_WAVE) + " to " + Unit.NM.text(Design.LONGEST_WAVE);
        double wavelength = members.need("wavelength_nm", waves)
                .flatMap(v -> convert.number(Subject.DOCUMENT.at("wavelength_nm"), v, Unit.NM, waves))
                .orElse(Unit.NM.toSi(1000));
        List<String> shapes = List.of(Shape.values()).stream().map(Shape::word).toList();
        Optional<Shape> shape = members.need("shape", Convert.quoted(shapes))
                .flatMap(v -> convert.word(Subject.DOCUMENT.at("shape"), v, Shape.values(), Shape::word));
        List<PartReader.Draft> parts = parts(members);
        boolean whole = members.find("parts")
                .filter(v -> v instanceof Json.Arr a && a.whole())
                .isPresent();
        Map<Integer, Typed> typed = TypingForm.read(parts, shape, whole, faults);
        SettingReader settings = new SettingReader(faults);
        RequirementReader requirements = new RequirementReader(faults);
        List<Hold> holds = list(members, "holds", (where, i, v) -> settings.hold(where, v));
        List<Lever> levers = list(members, "levers", settings::lever);
        List<Requirement> asked = list(members, "requirements", (where, i, v) -> requirements.read(where, v));
        List<Tolerance> tolerances = list(members, "tolerances", (where, i, v) -> settings.tolerance(where, v));
        Design design = new Design(
                title,
                notes,
                wavelength,
                // Of a shape that is not known, the one that forbids less.
                shape.orElse(Shape.RING),
                parts.stream().map(PartReader.Draft::part).toList(),
                holds,
                levers,
                asked,
                tolerances);
        return Optional.of(new Draft(design, typed, root));
    }

    /** Whether to read on: any version but a later one. */
    private boolean format(Members members) {
        String accepted = "\"" + FORMAT + "\"";
        Subject where = Subject.DOCUMENT.at("format");
        Optional<Json> value = members.need("format", accepted);
        Optional<String> format = value.flatMap(v -> convert.text(where, v, accepted));
        if (format.isEmpty() || format.get().equals(FORMAT)) {
            return true;
        }
        boolean later = LATER.matcher(format.get()).matches();
        faults.add(
                where,
                value.get().at(),
                "found " + value.get().words() + (later ? ", a later version than this program reads" : ""),
                accepted);
        return !later;
    }

    private String words(Members members, String key) {
        return members.find(key)
                .flatMap(v -> convert.text(Subject.DOCUMENT.at(key), v, "a text"))
                .orElse("");
    }

    /** The parts of an object that has a list of them. */
    static List<PartReader.Draft> parts(Members members, Faults faults) {
        return new DocumentReader(faults).parts(members);
    }

    private List<PartReader.Draft> parts(Members members) {
        Subject where = Subject.DOCUMENT.at("parts");
        Optional<Json> value = members.need("parts", "a list of parts");
        if (value.isEmpty() || !(value.get() instanceof Json.Arr list)) {
            value.ifPresent(v -> faults.refuse(where, v, "a list of parts"));
            return List.of();
        }
        int count = list.elements().size();
        if (count > Design.MOST_PARTS) {
            // So many are not worth reading on: what follows from them would be problems without end.
            faults.add(where, list.at(), "found " + count + " parts", "at most " + Design.MOST_PARTS);
            faults.markBroken(where);
            return List.of();
        }
        PartReader reader = new PartReader(faults);
        return new ArrayList<>(IntStream.range(0, count)
                .mapToObj(i -> reader.read(i, list.elements().get(i)))
                .toList());
    }

    /** Reads one element of a list. */
    private interface Element<T> {
        T read(Subject where, int index, Json json);
    }

    private <T> List<T> list(Members members, String key, Element<T> element) {
        Subject where = Subject.DOCUMENT.at(key);
        Optional<Json> value = members.find(key);
        if (value.isEmpty() || !(value.get() instanceof Json.Arr list)) {
            value.ifPresent(v -> faults.refuse(where, v, "a list"));
            return List.of();
        }
        return IntStream.range(0, list.elements().size())
                .mapToObj(i -> element.read(where.at(i), i, list.elements().get(i)))
                .toList();
    }
}
