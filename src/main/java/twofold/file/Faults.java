package twofold.file;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import twofold.design.Problem;
import twofold.design.Subject;

/** The problems found while one file is read, and which places of the document a legal value stands in for. */
final class Faults {
    /** More than this are a wrong file, not a file with mistakes. */
    static final int MOST = 1000;

    private final List<Located> found = new ArrayList<>();
    private final Set<Subject> broken = new HashSet<>();
    private int left;

    /** Puts a problem on record. */
    void add(Subject where, Mark at, String what, String accepted) {
        add(new Problem(where, what, accepted), at);
    }

    /** Puts a problem on record. */
    void add(Problem problem, Mark at) {
        if (found.size() < MOST) {
            found.add(new Located(problem, at.line(), at.column()));
        } else {
            left++;
        }
    }

    /** A value that cannot be used: on record, unless it already is, and broken. */
    void refuse(Subject where, Json value, String accepted) {
        if (!(value instanceof Json.Refused)) {
            add(where, value.at(), "found " + value.words(), accepted);
        }
        markBroken(where);
    }

    /** Says that what the design holds at a place is not what the file holds. */
    void markBroken(Subject where) {
        broken.add(where);
    }

    /** Whether the design's value at a place, or at one that holds it, only stands in for one that cannot be used. */
    boolean isBroken(Subject where) {
        for (int length = broken.isEmpty() ? -1 : where.steps().size(); length >= 0; length--) {
            if (broken.contains(new Subject(where.steps().subList(0, length)))) {
                return true;
            }
        }
        return false;
    }

    /** Whether there is none. */
    boolean isEmpty() {
        return found.isEmpty();
    }

    /** All by place, each once. */
    List<Located> sorted() {
        List<Located> all = new ArrayList<>(
                found.stream().distinct().sorted(Located.BY_PLACE).toList());
        if (left > 0) {
            all.add(new Located(
                    new Problem(
                            Subject.DOCUMENT,
                            "found " + left + " more problems, which are not listed",
                            "a file without problems"),
                    all.get(all.size() - 1).line(),
                    all.get(all.size() - 1).column()));
        }
        return List.copyOf(all);
    }
}
