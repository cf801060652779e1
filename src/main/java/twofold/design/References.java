package twofold.design;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** What is wrong with the names by which a design speaks of its parts and legs. */
final class References {
    private final Design design;
    private final Found found;
    private final List<Part> parts;
    private final Map<String, Part> byName = new HashMap<>();
    private final List<String> names;
    private final List<String> mirrors;
    /** The parts that have a settable field, by its name. */
    private final Map<String, List<String>> having = new HashMap<>();

    References(Design design, Found found) {
        this.design = design;
        this.found = found;
        parts = design.parts();
        parts.forEach(p -> byName.putIfAbsent(p.name(), p));
        names = parts.stream().map(Part::name).distinct().toList();
        mirrors = design.mirrors().stream().map(Part::name).toList();
    }

    /** Any part. */
    void part(Subject where, String name) {
        known(where, name, names);
    }

    /** Whether a part has a field. */
    boolean has(Place place, Field field) {
        Part part = byName.get(place.first());
        return part != null && field.kinds().contains(part.kind());
    }

    void mirror(Subject where, String name) {
        Part part = known(where, name, mirrors);
        if (part != null && part.kind() != Kind.MIRROR) {
            found.add(
                    where,
                    "found \"" + Names.shown(name) + "\", a " + part.kind().word(),
                    "the name of a mirror");
        }
    }

    void folding(Subject where, String name) {
        mirror(where, name);
        if (design.shape() == Shape.STANDING_WAVE
                && (mirrors.indexOf(name) == 0 || mirrors.indexOf(name) == mirrors.size() - 1)
                && mirrors.contains(name)) {
            found.add(
                    where,
                    "found the end mirror \"" + name + "\", which is met head-on",
                    "a mirror that folds the beam");
        }
    }

    private @Nullable Part known(Subject where, String name, List<String> near) {
        Part part = byName.get(name);
        if (part == null) {
            found.add(
                    where,
                    "found \"" + Names.shown(name) + "\", which no part is called" + found.hint(name, near),
                    "the name of a part");
        }
        return part;
    }

    void leg(Subject where, Place leg) {
        if (leg.second().isEmpty()) {
            found.add(where, "found \"" + Names.shown(leg.toString()) + "\"", "two neighbouring mirrors");
            return;
        }
        String a = leg.first();
        String b = leg.second().get();
        mirror(where.at(0), a);
        mirror(where.at(1), b);
        int i = mirrors.indexOf(a);
        int j = mirrors.indexOf(b);
        if (i >= 0 && j >= 0 && !neighbours(i, j, mirrors.size())) {
            found.add(
                    where,
                    "found \"" + Names.shown(a) + "\" and \"" + Names.shown(b) + "\", which no leg joins",
                    "two neighbouring mirrors");
        }
    }

    private boolean neighbours(int i, int j, int count) {
        return Math.abs(i - j) == 1 || (design.shape() == Shape.RING && i != j && Math.abs(i - j) == count - 1);
    }

    void settable(Subject where, String set, String name) {
        List<String> fitting = having.computeIfAbsent(
                set,
                s -> parts.stream()
                        .filter(p -> p.kind().field(s).filter(Field::isSettable).isPresent())
                        .map(Part::name)
                        .toList());
        Part part = known(where, name, fitting.isEmpty() ? names : fitting);
        if (part == null) {
            return;
        }
        if (part.kind().field(set).filter(Field::isSettable).isEmpty()) {
            found.add(
                    where,
                    "found \"" + Names.shown(name) + "\", a " + part.kind().word() + ", which has no " + set,
                    fitting.isEmpty() ? "a part that has it" : "one of " + Names.listed(fitting));
        } else if (part.kind() == Kind.MIRROR && set.equals("incidence_deg")) {
            folding(where, name);
        }
    }

    /** Whether the part is of a kind; a name that nothing has is another problem's. */
    boolean isKind(Place place, Kind kind) {
        Part part = byName.get(place.first());
        return part == null || part.kind() == kind;
    }

    void stretch(Subject where, Place place) {
        String a = place.first();
        String b = place.second().orElseThrow();
        Part first = known(where.at(0), a, names);
        Part second = known(where.at(1), b, names);
        if (first == null || second == null) {
            return;
        }
        int i = Math.min(parts.indexOf(first), parts.indexOf(second));
        int j = Math.max(parts.indexOf(first), parts.indexOf(second));
        boolean round = design.shape() == Shape.RING && i == 0;
        if (i == j || (!isFree(i + 1, j) && !(round && isFree(j + 1, parts.size())))) {
            boolean isLeg = mirrors.contains(a)
                    && mirrors.contains(b)
                    && neighbours(mirrors.indexOf(a), mirrors.indexOf(b), mirrors.size());
            found.add(
                    where,
                    "found \"" + Names.shown(a) + "\" and \"" + Names.shown(b) + "\", "
                            + (isLeg ? "a leg with more than one free stretch" : "which do not follow each other"),
                    "a leg of one free stretch, or two parts with nothing but air and apertures between");
        }
    }

    private boolean isFree(int from, int to) {
        return parts.subList(from, Math.max(from, to)).stream().allMatch(p -> p.kind() == Kind.APERTURE);
    }
}
