package twofold.file;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Problem;
import twofold.design.Shape;
import twofold.design.Subject;

/**
 * Parts as a text, for the clipboard: an object with a list of parts as a design has it, {@code { "parts": [ … ] }}; the
 * list alone is read too. Nothing in it hangs on a wavelength, and whether the parts fit a design is not asked here.
 */
public final class PartText {
    private static final String PARTS = "parts";
    private static final String ACCEPTED = "a list of parts in brackets, or an object with one under \"parts\"";

    private PartText() {}

    /**
     * What came of reading a text.
     *
     * @param parts at least one where there is no problem, else none
     * @param problems all that is wrong with the text, by place
     */
    public record Read(List<Part> parts, List<Located> problems) {
        /** Copies the lists. */
        public Read {
            parts = List.copyOf(parts);
            problems = List.copyOf(problems);
        }
    }

    /** Parts as a text. */
    public static String of(List<Part> parts) {
        return DesignWriter.text(parts);
    }

    /** The parts of a text, strictly and with every problem at once. */
    public static Read read(String text) {
        Faults faults = new Faults();
        List<Part> parts = parse(text, faults).map(root -> parts(root, faults)).orElse(List.of());
        List<Located> problems =
                faults.sorted().stream().map(PartText::underParts).toList();
        return new Read(problems.isEmpty() ? parts : List.of(), problems);
    }

    private static Optional<Json.Obj> parse(String text, Faults faults) {
        if (text.length() > DesignReader.MOST_BYTES) {
            faults.add(
                    Subject.DOCUMENT,
                    Mark.START,
                    "found " + text.length() + " characters",
                    "at most " + DesignReader.MOST_BYTES);
            return Optional.empty();
        }
        if (text.isBlank()) {
            faults.add(Subject.DOCUMENT, Mark.START, "found no text", ACCEPTED);
            return Optional.empty();
        }
        Optional<Json> root = JsonText.parse(text, faults);
        if (root.isPresent() && root.get() instanceof Json.Arr list) {
            return Optional.of(new Json.Obj(list.at(), Map.of(PARTS, new Json.Member(list.at(), list)), true));
        }
        if (root.isPresent() && root.get() instanceof Json.Obj object) {
            return Optional.of(object);
        }
        root.ifPresent(r -> faults.refuse(Subject.DOCUMENT, r, ACCEPTED));
        return Optional.empty();
    }

    /** Of a list alone, the parser's places begin with an index. */
    private static Located underParts(Located located) {
        Problem problem = located.problem();
        List<String> steps = problem.where().steps();
        if (steps.isEmpty() || !steps.get(0).startsWith("[")) {
            return located;
        }
        List<String> all = new ArrayList<>(List.of(PARTS));
        all.addAll(steps);
        return new Located(
                new Problem(new Subject(all), problem.found(), problem.accepted()), located.line(), located.column());
    }

    private static List<Part> parts(Json.Obj root, Faults faults) {
        Members members = new Members(Subject.DOCUMENT, root, faults);
        members.refuseUnknown("a text of parts", List.of(PARTS));
        List<PartReader.Draft> drafts = DocumentReader.parts(members, faults);
        if (drafts.isEmpty() && faults.isEmpty()) {
            members.misplaced(PARTS, "found no part", "at least one part");
        }
        drafts.forEach(d -> place(d, faults));
        List<Part> parts = drafts.stream().map(PartReader.Draft::part).toList();
        Design design = Design.of("", Design.SHORTEST_WAVE, Shape.RING, parts);
        Sieve sieve = new Sieve(new DocumentReader.Draft(design, Map.of(), root), faults);
        Places places = new Places(root);
        List<Problem> stated = design.problems().stream()
                .filter(p -> !isAboutTheDesign(p) && sieve.keeps(p))
                .toList();
        stated.forEach(p -> faults.add(p, places.of(p.where())));
        return parts;
    }

    /** A mirror needs its place: legs and angles say where it stands only after the mirrors of a design. */
    private static void place(PartReader.Draft draft, Faults faults) {
        if (!(draft.part() instanceof Mirror) || draft.members().isEmpty()) {
            return;
        }
        Members members = draft.members().get();
        boolean isTyped = false;
        for (Field field : TypingForm.FIELDS) {
            if (members.has(field.json())) {
                isTyped = true;
                members.misplaced(
                        field.json(), "found " + field.json() + " outside a design", Field.AT.json() + " instead");
            }
        }
        if (isTyped) {
            faults.markBroken(members.where().at(Field.AT.json()));
        } else {
            members.need(Field.AT.json(), Field.AT.accepted());
        }
    }

    /** Whether a problem is of how many mirrors there are and where, which is for the design that takes the parts. */
    private static boolean isAboutTheDesign(Problem problem) {
        List<String> steps = problem.where().steps();
        return !steps.get(0).equals(PARTS)
                || steps.size() == 1
                || steps.get(steps.size() - 1).equals("kind");
    }
}
