package twofold.file;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Hold;
import twofold.design.Kind;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Problem;
import twofold.design.Subject;
import twofold.design.Values;

/**
 * Tells the problems of a draft that are the file's own from those which only come from what stands in for unreadable
 * values: those at a stand-in, and those that rest on one.
 */
final class Sieve {
    /** Checks of one field that look at another: of a mirror's transmittance, say, at its reflectance. */
    private static final Map<String, List<String>> LOOKS_AT = Map.of(
            "transmittance", List.of("reflectance"),
            "side", List.of("tilt_plane"),
            "incidence_deg", List.of("index", "material"));

    /** Fields whose checks look at no part. */
    private static final Set<String> ALONE =
            Set.of("name", "set", "between", "within", "plus_minus", "plus_minus_percent", "plane", "edge");

    private final Design design;
    private final Faults faults;
    private final boolean partsAreKnown;
    private final boolean leversAreKnown;
    private final Set<String> names = new HashSet<>();
    private final Set<String> ofUnknownKind = new HashSet<>();
    private final boolean someAreNameless;
    private final Set<String> ifAllAreMirrors;
    private final Set<String> ifNoneAreMirrors;
    private final Map<Subject, Boolean> doubtful = new HashMap<>();

    Sieve(DocumentReader.Draft draft, Faults faults) {
        this.design = draft.design();
        this.faults = faults;
        boolean nameless = false;
        for (int i = 0; i < design.parts().size(); i++) {
            Part part = design.parts().get(i);
            names.add(part.name());
            nameless |= isBroken("parts", i, "name");
            if (isBroken("parts", i, "kind")) {
                ofUnknownKind.add(part.name());
            }
        }
        someAreNameless = nameless;
        partsAreKnown = draft.isWhole("parts") && !faults.isBroken(Subject.DOCUMENT.at("parts"));
        boolean levers = draft.isWhole("levers") && !faults.isBroken(Subject.DOCUMENT.at("levers"));
        for (int i = 0; i < design.levers().size(); i++) {
            levers &= !isBroken("levers", i, "name");
        }
        leversAreKnown = levers;
        ifAllAreMirrors = problemsIf(Kind.MIRROR);
        ifNoneAreMirrors = problemsIf(Kind.APERTURE);
    }

    /** What would be wrong if all parts of unknown kind were of a given one; which mirrors a leg joins hangs on it. */
    private Set<String> problemsIf(Kind kind) {
        if (ofUnknownKind.isEmpty()) {
            return Set.of();
        }
        List<Part> parts = new ArrayList<>(design.parts());
        for (int i = 0; i < parts.size(); i++) {
            if (isBroken("parts", i, "kind")) {
                Values values = Values.NONE.with(Field.AT, PartReader.far(i)).with(Field.ALONG, Along.MIDDLE);
                parts.set(i, kind.part(parts.get(i).name(), values));
            }
        }
        return design.withParts(parts).problems().stream().map(Sieve::found).collect(Collectors.toSet());
    }

    /** What was found where; what would be accepted may differ with the kinds. */
    private static String found(Problem problem) {
        return problem.where() + ": " + problem.found();
    }

    private boolean isThereWhateverTheKinds(Problem problem) {
        return ofUnknownKind.isEmpty()
                || (ifAllAreMirrors.contains(found(problem)) && ifNoneAreMirrors.contains(found(problem)));
    }

    private boolean isBroken(String list, int index, String field) {
        return faults.isBroken(Subject.DOCUMENT.at(list).at(index).at(field));
    }

    /** Whether every part's kind is known, and that there are no more parts: else nothing can be said about the plan. */
    boolean knowsAllKinds() {
        return partsAreKnown && ofUnknownKind.isEmpty();
    }

    /** Whether a problem of the draft is one of the file. */
    boolean keeps(Problem problem) {
        List<String> steps = problem.where().steps();
        if (faults.isBroken(problem.where()) || problem.line().contains(PartReader.NAMELESS)) {
            return false;
        }
        String list = steps.get(0);
        if (steps.size() == 1) {
            return !list.equals("parts") || (knowsAllKinds() && !faults.isBroken(Subject.DOCUMENT.at("shape")));
        }
        int index = Integer.parseInt(steps.get(1).substring(1, steps.get(1).length() - 1));
        String field = steps.size() > 2 ? steps.get(2) : "";
        boolean restsOnStandIn =
                LOOKS_AT.getOrDefault(field, List.of()).stream().anyMatch(f -> isBroken(list, index, f));
        if (restsOnStandIn && !isOutOfRange(field, problem)) {
            return false;
        }
        return switch (list) {
            case "parts" -> !field.equals("kind") || partsAreKnown;
            case "requirements" ->
                field.equals("over")
                        ? leversAreKnown
                        : !isPairOfUnknown(problem, index) && keepsReference(problem, list, index, field);
            default -> keepsReference(problem, list, index, field);
        };
    }

    /** Whether a problem is that of two known parts as a place, which hangs on what is read there. */
    private boolean isPairOfUnknown(Problem problem, int index) {
        Subject requirement = Subject.DOCUMENT.at("requirements").at(index);
        return faults.isBroken(requirement.at("what"))
                && problem.where().equals(requirement.at("at"))
                && design.requirements().get(index).at().flatMap(Place::second).isPresent();
    }

    /** Whether a problem is a field's own. */
    private static boolean isOutOfRange(String name, Problem problem) {
        return Arrays.stream(Field.values())
                .anyMatch(f -> f.json().equals(name) && f.accepted().equals(problem.accepted()));
    }

    private boolean keepsReference(Problem problem, String list, int index, String field) {
        return field.isEmpty()
                || ALONE.contains(field)
                || (partsAreKnown && !isDoubtful(list, index) && isThereWhateverTheKinds(problem));
    }

    /** Whether an element uses a part of unknown kind, or a name that one of the nameless parts may have. */
    private boolean isDoubtful(String list, int index) {
        return doubtful.computeIfAbsent(
                Subject.DOCUMENT.at(list).at(index),
                here -> names(list, index)
                        .anyMatch(n -> ofUnknownKind.contains(n) || (someAreNameless && !names.contains(n))));
    }

    /** The names of parts that an element of a list uses. */
    private Stream<String> names(String list, int index) {
        return switch (list) {
            case "holds" -> hold(design.holds().get(index));
            case "levers" -> design.levers().get(index).of().stream().flatMap(Sieve::names);
            case "tolerances" -> design.tolerances().get(index).of().stream().flatMap(Sieve::names);
            default -> design.requirements().get(index).at().stream().flatMap(Sieve::names);
        };
    }

    private static Stream<String> hold(Hold hold) {
        return hold instanceof Hold.Leg h
                ? names(h.leg())
                : hold instanceof Hold.Direction h
                        ? names(h.leg())
                        : hold instanceof Hold.Incidence h
                                ? Stream.of(h.mirror())
                                : hold instanceof Hold.Position h ? Stream.of(h.mirror()) : Stream.of();
    }

    private static Stream<String> names(Place place) {
        return Stream.concat(Stream.of(place.first()), place.second().stream());
    }
}
