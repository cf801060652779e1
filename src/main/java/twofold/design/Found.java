package twofold.design;

import java.util.ArrayList;
import java.util.List;

/** Problems as they are found. */
final class Found {
    /** After so many problems, unknown names come without the nearest known one, whose search takes long. */
    private static final int HINTED = 200;

    private final List<Problem> problems = new ArrayList<>();

    void add(Subject where, String what, String accepted) {
        problems.add(new Problem(where, what, accepted));
    }

    /** A number's problem, unless its field accepts it. */
    void number(Subject where, Field field, Unit unit, double si) {
        if (!field.accepts(si)) {
            add(where, "found " + text(unit, si), field.accepted());
        }
    }

    /** The nearest known name; searched for only as long as a person would read on. */
    String hint(String name, List<String> near) {
        return problems.size() < HINTED ? Names.hint(name, near) : "";
    }

    List<Problem> problems() {
        return List.copyOf(problems);
    }

    static String text(Unit unit, double si) {
        return Double.isFinite(si) ? unit.text(si) : Double.toString(si);
    }
}
