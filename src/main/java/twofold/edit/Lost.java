package twofold.edit;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import twofold.design.Design;
import twofold.design.Lever;
import twofold.design.Place;
import twofold.design.Requirement;
import twofold.design.Tolerance;

/** What an edit took along because what it referred to is no longer there, in words, so that nothing goes unnoticed. */
public final class Lost {
    private Lost() {}

    /** One entry each: "the hold of the leg End A/Fold 1", "the lever gap", "Fold 1 of the lever fold". */
    public static List<String> between(Design before, Design after) {
        List<String> lost = new ArrayList<>();
        if (after.holds().size() < before.holds().size()) {
            before.holds().stream()
                    .filter(h -> !after.holds().contains(h))
                    .forEach(h -> lost.add("the hold of " + h.words()));
        }
        for (Lever lever : before.levers()) {
            places("the lever " + lever.name(), lever.of(), of(after, lever), lost);
        }
        if (after.requirements().size() < before.requirements().size()) {
            before.requirements().stream()
                    .filter(r -> !after.requirements().contains(r))
                    .forEach(r -> lost.add("the requirement of " + words(r)));
        }
        if (places(after) < places(before)) {
            for (Tolerance t : before.tolerances()) {
                if (after.tolerances().stream().noneMatch(o -> o.equals(t))) {
                    places("the tolerance of " + t.set(), t.of(), of(after, t), lost);
                }
            }
        }
        return lost;
    }

    private static int places(Design design) {
        return design.tolerances().stream().mapToInt(t -> t.of().size()).sum();
    }

    private static String words(Requirement r) {
        return r.what().json() + r.at().map(p -> " at " + p).orElse("");
    }

    private static List<Place> of(Design after, Lever lever) {
        return after.levers().stream()
                .filter(l -> l.name().equals(lever.name()))
                .findFirst()
                .map(Lever::of)
                .orElse(List.of());
    }

    private static List<Place> of(Design after, Tolerance t) {
        Set<Place> before = new HashSet<>(t.of());
        return after.tolerances().stream()
                .filter(o -> o.set().equals(t.set()) && o.plusMinus() == t.plusMinus() && before.containsAll(o.of()))
                .findFirst()
                .map(Tolerance::of)
                .orElse(List.of());
    }

    /** A lever or tolerance that is gone, or the places that it lost. */
    private static void places(String what, List<Place> before, List<Place> after, List<String> lost) {
        if (after.isEmpty()) {
            lost.add(what);
        } else if (after.size() < before.size()) {
            lost.add(before.stream()
                            .filter(p -> !after.contains(p))
                            .map(Place::toString)
                            .collect(Collectors.joining(", "))
                    + " of " + what);
        }
    }
}
