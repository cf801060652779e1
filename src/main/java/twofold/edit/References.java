package twofold.edit;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.UnaryOperator;
import java.util.stream.IntStream;
import twofold.design.Design;
import twofold.design.Hold;
import twofold.design.Lever;
import twofold.design.Place;
import twofold.design.Requirement;
import twofold.design.Subject;
import twofold.design.Tolerance;

/** What holds, levers, requirements and tolerances say about parts, kept true while the parts change. */
final class References {
    private References() {}

    /** The design with a part's old name replaced wherever something refers to it. */
    static Design renamed(Design design, String before, String after) {
        UnaryOperator<String> name = n -> n.equals(before) ? after : n;
        UnaryOperator<Place> place =
                p -> new Place(name.apply(p.first()), p.second().map(name));
        return design.withHolds(design.holds().stream()
                        .map(h -> renamed(h, name, place))
                        .toList())
                .withLevers(design.levers().stream()
                        .map(l -> with(l, l.of().stream().map(place).toList()))
                        .toList())
                .withRequirements(design.requirements().stream()
                        .map(r ->
                                new Requirement(r.what(), r.at().map(place), r.plane(), r.edge(), r.bound(), r.over()))
                        .toList())
                .withTolerances(design.tolerances().stream()
                        .map(t -> with(t, t.of().stream().map(place).toList()))
                        .toList());
    }

    private static Hold renamed(Hold hold, UnaryOperator<String> name, UnaryOperator<Place> place) {
        if (hold instanceof Hold.Leg h) {
            return new Hold.Leg(place.apply(h.leg()));
        } else if (hold instanceof Hold.Direction h) {
            return new Hold.Direction(place.apply(h.leg()));
        } else if (hold instanceof Hold.Incidence h) {
            return new Hold.Incidence(name.apply(h.mirror()));
        } else if (hold instanceof Hold.Position h) {
            return new Hold.Position(name.apply(h.mirror()));
        }
        return hold;
    }

    private static Lever with(Lever lever, List<Place> of) {
        return new Lever(lever.name(), lever.set(), of, lever.range(), lever.adjuster());
    }

    private static Tolerance with(Tolerance t, List<Place> of) {
        return new Tolerance(t.set(), of, t.plusMinus(), t.relative(), t.spread());
    }

    /**
     * The design without what refers to parts, legs or levers that are no longer there: the hold, the requirement, the
     * place of a lever or tolerance, and a lever or tolerance that has no place left.
     */
    static Design pruned(Design design) {
        Design now = design;
        while (true) {
            Design fewer = prunedOnce(now);
            if (fewer.equals(now)) {
                return now;
            }
            now = fewer;
        }
    }

    private static Design prunedOnce(Design design) {
        Set<String> bad = new HashSet<>();
        design.problems().forEach(p -> {
            for (int length = 2; length <= p.where().steps().size(); length++) {
                bad.add(new Subject(p.where().steps().subList(0, length)).toString());
            }
        });
        if (bad.isEmpty()) {
            return design;
        }
        List<Lever> levers = new ArrayList<>();
        for (int i = 0; i < design.levers().size(); i++) {
            Lever lever = design.levers().get(i);
            good(bad, Subject.DOCUMENT.at("levers").at(i), lever.of()).ifPresent(of -> levers.add(with(lever, of)));
        }
        List<Tolerance> tolerances = new ArrayList<>();
        for (int i = 0; i < design.tolerances().size(); i++) {
            Tolerance tolerance = design.tolerances().get(i);
            good(bad, Subject.DOCUMENT.at("tolerances").at(i), tolerance.of())
                    .ifPresent(of -> tolerances.add(with(tolerance, of)));
        }
        return design.withHolds(good(bad, "holds", design.holds()))
                .withLevers(levers)
                .withRequirements(good(bad, "requirements", design.requirements()))
                .withTolerances(tolerances);
    }

    private static <T> List<T> good(Set<String> bad, String list, List<T> all) {
        return IntStream.range(0, all.size())
                .filter(i -> !bad.contains(Subject.DOCUMENT.at(list).at(i).toString()))
                .mapToObj(all::get)
                .toList();
    }

    /** The places that are good; empty where none is left. */
    private static Optional<List<Place>> good(Set<String> bad, Subject where, List<Place> of) {
        List<Place> good = IntStream.range(0, of.size())
                .filter(i -> !bad.contains(where.at("of").at(i).toString()))
                .mapToObj(of::get)
                .toList();
        return good.isEmpty() ? Optional.empty() : Optional.of(good);
    }
}
