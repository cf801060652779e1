package twofold.file;

import twofold.design.Field;
import twofold.design.Problem;
import twofold.design.Subject;

/** Finds the places of a document's values in its text. */
final class Places {
    private final Json root;

    Places(Json root) {
        this.root = root;
    }

    /** Where a value begins; where there is none, what would hold it. */
    Mark of(Subject where) {
        Json here = root;
        for (String step : where.steps()) {
            Json next = step(here, step);
            if (next == null) {
                return here.at();
            }
            here = next;
        }
        return here.at();
    }

    private static @org.jspecify.annotations.Nullable Json step(Json here, String step) {
        if (here instanceof Json.Obj object) {
            Json.Member member = object.members().get(step);
            return member == null ? null : member.value();
        }
        if (here instanceof Json.Arr list && step.startsWith("[")) {
            int index = Integer.parseInt(step.substring(1, step.length() - 1));
            return index < list.elements().size() ? list.elements().get(index) : null;
        }
        return null;
    }

    private boolean has(Subject object, String key) {
        Json here = root;
        for (String step : object.steps()) {
            Json next = step(here, step);
            if (next == null) {
                return false;
            }
            here = next;
        }
        return here instanceof Json.Obj o && o.members().containsKey(key);
    }

    /** A problem of a mirror's position, put to the leg where the file gives that instead. */
    Problem asWritten(Problem problem) {
        Subject where = problem.where();
        int last = where.steps().size() - 1;
        if (last < 1 || !where.steps().get(last).equals(Field.AT.json())) {
            return problem;
        }
        Subject part = new Subject(where.steps().subList(0, last));
        boolean typed = !has(part, Field.AT.json()) && has(part, Field.LEG.json());
        return typed ? new Problem(part.at(Field.LEG.json()), problem.found(), problem.accepted()) : problem;
    }
}
