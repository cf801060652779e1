package twofold.file;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Problem;
import twofold.design.Subject;
import twofold.design.Values;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.layout.Outcome;
import twofold.layout.Typed;

/** Lays a draft out, typed mirrors first, and finds what is wrong with its plan wherever the plan can be trusted. */
final class PlanReader {
    /** What decides where the beam runs at a part; all other fields may be wrong without any doubt about the plan. */
    private static final Set<Field> COURSE = Set.of(
            Field.AT,
            Field.ALONG,
            Field.ACROSS,
            Field.INSIDE,
            Field.BOX,
            Field.INDEX,
            Field.MATERIAL,
            Field.FACES,
            Field.TILT_PLANE,
            Field.SIDE);

    /** A leg that stands in for one that is too short, m: longer than anything on it. */
    private static final double LONG = 1e5;

    /** A length that stands in for an unreadable one, m. */
    private static final double SHORT = 1e-12;

    private final Faults faults;
    private final Map<Integer, Typed> typed;
    private final Set<Integer> distrusted = new HashSet<>();
    private final List<Problem> problems = new ArrayList<>();
    private Design design;

    private PlanReader(DocumentReader.Draft draft, Faults faults) {
        this.faults = faults;
        this.typed = new HashMap<>(draft.typed());
        this.design = draft.design();
    }

    /**
     * The design at its places, or what is wrong with its plan.
     *
     * @param draft whose kinds and shape are known
     * @param faults what is known to be wrong, all of it marked as broken
     * @return a design where nothing is wrong; else no design, and those problems that are not known yet
     */
    static Outcome<Design> read(DocumentReader.Draft draft, Faults faults) {
        PlanReader reader = new PlanReader(draft, faults);
        return reader.plan();
    }

    private Outcome<Design> plan() {
        for (int i = 0; i < design.parts().size(); i++) {
            if (isDoubtful(i)) {
                distrusted.add(i);
            }
        }
        if (!faults.isEmpty()) {
            design = legal();
        }
        if (!typed.isEmpty() && !place()) {
            return new Outcome<>(Optional.empty(), problems);
        }
        lay(distrusted);
        return new Outcome<>(problems.isEmpty() && faults.isEmpty() ? Optional.of(design) : Optional.empty(), problems);
    }

    private boolean isBroken(int part, Field field) {
        return faults.isBroken(Subject.part(part).at(field.json()));
    }

    /** Whether where the beam runs at a part is in doubt. */
    private boolean isDoubtful(int index) {
        Part part = design.parts().get(index);
        boolean needsWavelength =
                part.values().states(Field.MATERIAL) && !part.values().states(Field.INDEX);
        return faults.isBroken(Subject.part(index))
                || part.kind().fields().stream().anyMatch(f -> COURSE.contains(f) && isBroken(index, f))
                || (needsWavelength && faults.isBroken(Subject.DOCUMENT.at("wavelength_nm")));
    }

    /** The parts with a legal value in every broken field, and nothing else, so that none of this is found again. */
    private Design legal() {
        List<Part> parts = new ArrayList<>();
        for (int i = 0; i < design.parts().size(); i++) {
            Part part = design.parts().get(i);
            Values values = part.values();
            for (Field field : part.kind().fields()) {
                if (field == Field.AT && isBroken(i, field)) {
                    values = values.with(field, PartReader.far(i));
                } else if (values.states(field) && isBroken(i, field)) {
                    values = field.need() == Field.Need.REQUIRED
                            ? values.with(field, standIn(field))
                            : values.without(field);
                }
            }
            boolean needsIndex = part.kind().isSlab() || values.states(Field.MATERIAL);
            if (needsIndex && !values.states(Field.INDEX) && distrusted.contains(i)) {
                values = values.with(Field.INDEX, Field.INDEX.standIn());
            }
            boolean nameless = faults.isBroken(Subject.part(i).at("name"));
            parts.add(part.kind().part(nameless ? Subject.part(i).toString() : part.name(), values));
        }
        boolean wave = faults.isBroken(Subject.DOCUMENT.at("wavelength_nm"));
        return Design.of("", wave ? 1e-6 : design.wavelength(), design.shape(), parts);
    }

    /** A legal value; a length so short that it leaves room on any leg. */
    private static Object standIn(Field field) {
        return field.form() == Field.Form.POSITIVE ? (Object) SHORT : field.standIn();
    }

    /** Puts typed mirrors at their places; false where that cannot be done. */
    private boolean place() {
        Set<Integer> all = new HashSet<>(distrusted);
        all.addAll(typed.keySet());
        for (Problem problem : lay(all)) {
            int part = part(problem);
            if (problem.where().equals(Subject.part(part).at(Field.MATERIAL.json()))) {
                distrusted.add(part);
                List<Part> parts = new ArrayList<>(design.parts());
                parts.set(part, parts.get(part).with(Field.INDEX, Field.INDEX.standIn()));
                design = design.withParts(parts);
            }
        }
        Outcome<Design> placed = Layout.typed(design, typed);
        while (placed.value().isEmpty()) {
            for (Problem problem : placed.problems()) {
                int part = part(problem);
                Typed t = typed.get(part);
                if (t == null || t.leg().isEmpty() || t.leg().getAsDouble() == LONG) {
                    problems.addAll(placed.problems());
                    return false;
                }
                problems.add(problem);
                faults.markBroken(problem.where());
                typed.put(part, new Typed(OptionalDouble.of(LONG), t.incidence(), t.turn(), t.heading()));
            }
            placed = Layout.typed(design, typed);
        }
        design = placed.value().get();
        doubt();
        return true;
    }

    /**
     * Distrusts what rests on typed values that are broken. Behind such a value every typed mirror stands at a doubtful
     * place, but in the right way to the mirrors typed before and after it; so in doubt are only the parts on a broken
     * leg, and the last typed mirror before one with a position.
     */
    private void doubt() {
        boolean doubt = false;
        int before = -1;
        List<Integer> between = new ArrayList<>();
        for (int i = 0; i < design.parts().size(); i++) {
            if (!(design.parts().get(i) instanceof Mirror)) {
                between.add(i);
                doubt |= distrusted.contains(i);
                continue;
            }
            Typed t = typed.get(i);
            boolean byLeg = t != null && t.leg().isPresent();
            if (byLeg && isBroken(i, Field.LEG)) {
                distrusted.addAll(between);
                doubt = true;
            } else if (!byLeg) {
                if (doubt && before >= 0) {
                    distrusted.add(before);
                }
                doubt = distrusted.contains(i);
            }
            doubt |= isBroken(i, Field.INCIDENCE) || isBroken(i, Field.TURN) || isBroken(i, Field.HEADING);
            before = byLeg ? i : -1;
            between.clear();
        }
    }

    /** The index of the part that a problem is about; −1 for none. */
    private static int part(Problem problem) {
        List<String> steps = problem.where().steps();
        return steps.size() > 1 && steps.get(0).equals("parts")
                ? Integer.parseInt(steps.get(1).substring(1, steps.get(1).length() - 1))
                : -1;
    }

    /** The problems of the plan apart from doubtful parts, put to the others. */
    private List<Problem> lay(Set<Integer> doubtful) {
        Outcome<Laid> laid = Layout.of(design, doubtful);
        List<Problem> known = design.problems();
        List<Problem> more =
                laid.problems().stream().filter(p -> !known.contains(p)).toList();
        problems.addAll(more);
        return more;
    }
}
