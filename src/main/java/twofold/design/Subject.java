package twofold.design;

import java.util.ArrayList;
import java.util.List;

/**
 * A place inside a design document, printed as in {@code parts[2].along_mm}.
 *
 * @param steps names, and indices as {@code [2]}
 */
public record Subject(List<String> steps) {
    /** The document itself. */
    public static final Subject DOCUMENT = new Subject(List.of());

    /** Copies the steps. */
    public Subject {
        steps = List.copyOf(steps);
    }

    /** The value under a name. */
    public Subject at(String name) {
        return step(name);
    }

    /** The element at an index, from 0. */
    public Subject at(int index) {
        return step("[" + index + "]");
    }

    private Subject step(String step) {
        List<String> longer = new ArrayList<>(steps);
        longer.add(step);
        return new Subject(longer);
    }

    /** A part of a design, by its index. */
    public static Subject part(int index) {
        return DOCUMENT.at("parts").at(index);
    }

    @Override
    public String toString() {
        StringBuilder text = new StringBuilder();
        for (String step : steps) {
            if (text.length() > 0 && !step.startsWith("[")) {
                text.append('.');
            }
            text.append(step);
        }
        return text.length() == 0 ? "document" : text.toString();
    }
}
