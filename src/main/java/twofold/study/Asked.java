package twofold.study;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import twofold.cavity.Chain;
import twofold.cavity.Judgement;
import twofold.cavity.Reading;
import twofold.design.Bound;
import twofold.design.Design;
import twofold.design.Edge;
import twofold.design.Names;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Planes;
import twofold.design.Problem;
import twofold.design.Quantity;
import twofold.design.Requirement;
import twofold.design.Subject;
import twofold.layout.Outcome;
import twofold.optics.Plane;

/**
 * A quantity as a person asks for it: {@code what[@place[:plane-or-edge]]}, the place a part or two parts with a slash
 * between. A quantity of the whole cavity has no place: {@code half_trace:sagittal}.
 *
 * @param text as written
 * @param what the quantity
 * @param at where
 * @param plane of a quantity that has one
 * @param edge of a quantity that needs one
 */
public record Asked(String text, Quantity what, Optional<Place> at, Optional<Plane> plane, Optional<Edge> edge) {
    /** How a quantity is written. */
    public static final String FORM = "what[@place[:plane-or-edge]]";

    /** A quantity of the whole cavity in a plane. */
    public static Asked of(Quantity what, Plane plane) {
        return of(what, Optional.empty(), Optional.of(plane), Optional.empty());
    }

    /** What a requirement asks for, in a plane where its quantity has planes. */
    static Asked of(Requirement requirement, Optional<Plane> plane) {
        return of(requirement.what(), requirement.at(), plane, requirement.edge());
    }

    /** Whether a requirement asks for this quantity, in this plane where it has one. */
    public boolean isOf(Requirement requirement) {
        return requirement.what() == what
                && requirement.at().equals(at)
                && requirement.edge().equals(edge)
                && Judgement.planes(requirement).contains(plane);
    }

    /** "Radius at Rod, sagittal": in words, without its unit. */
    public String words() {
        return wordsOfBoth() + plane.map(p -> ", " + p.word()).orElse("");
    }

    /** "Radius at Rod": the same of both planes. */
    public String wordsOfBoth() {
        return what.title()
                + at.map(p -> " at " + p).orElse("")
                + edge.map(e -> ", " + e.word() + " edge").orElse("");
    }

    /** Compiles it against a chain of the design that it was parsed for. */
    public Reading reading(Chain chain) {
        return Reading.of(what, at, plane, edge, chain);
    }

    /** Everywhere that a quantity can be read in a design, in beam order; an empty place is the whole cavity. */
    public static List<Optional<Place>> places(Quantity what, Design design) {
        List<String> names = design.parts().stream().map(Part::name).toList();
        List<String> mirrors = design.mirrors().stream().map(Part::name).toList();
        List<Optional<Place>> all = new ArrayList<>();
        all.add(Optional.empty());
        names.forEach(n -> all.add(Optional.of(Place.of(n))));
        all.addAll(neighbours(mirrors));
        all.addAll(neighbours(names));
        Optional<Planes> plane = what.hasPlane() ? Optional.of(Planes.SAGITTAL) : Optional.empty();
        Optional<Edge> edge = what.hasEdge() ? Optional.of(Edge.LOWER) : Optional.empty();
        return all.stream()
                .distinct()
                .filter(at -> design.problems(
                                new Requirement(what, at, plane, edge, Bound.Prefer.LARGEST, Optional.empty()))
                        .isEmpty())
                .toList();
    }

    /** Each with the next, the last with the first; a standing wave does not join those. */
    private static List<Optional<Place>> neighbours(List<String> names) {
        return IntStream.range(0, names.size() == 2 ? 1 : names.size())
                .mapToObj(i -> Optional.of(Place.of(names.get(i), names.get((i + 1) % names.size()))))
                .toList();
    }

    /** A quantity of a place, a plane and an edge, where it has them. */
    public static Asked of(Quantity what, Optional<Place> at, Optional<Plane> plane, Optional<Edge> edge) {
        String way = plane.map(Plane::word)
                .or(() -> edge.map(Edge::word))
                .map(w -> ":" + w)
                .orElse("");
        return new Asked(what.json() + at.map(p -> "@" + p).orElse("") + way, what, at, plane, edge);
    }

    /** Reads a quantity, or says what is wrong with it and what would be accepted. */
    public static Outcome<Asked> parse(String text, Design design) {
        int mark = text.indexOf('@');
        int colon = text.lastIndexOf(':');
        int name = mark >= 0 ? mark : colon >= 0 ? colon : text.length();
        String json = text.substring(0, name);
        Optional<Quantity> known = Quantity.named(json);
        if (known.isEmpty()) {
            return wrong(
                    "found \"" + Names.shown(json) + "\"" + Names.hint(json, Quantity.names()),
                    FORM + ", with what one of " + String.join(", ", Quantity.names()));
        }
        Quantity what = known.get();
        boolean isRead = colon > mark;
        Optional<String> way = isRead ? Optional.of(text.substring(colon + 1)) : Optional.empty();
        String where = mark >= 0 ? text.substring(mark + 1, isRead ? colon : text.length()) : "";
        Optional<Place> at = where.isEmpty() ? Optional.empty() : Optional.of(place(where));
        Optional<Planes> plane = way.flatMap(w -> word(w, Planes.values(), Planes::word));
        Optional<Edge> edge = way.flatMap(w -> word(w, Edge.values(), Edge::word));
        if (way.isPresent() && ((plane.isEmpty() && edge.isEmpty()) || plane.equals(Optional.of(Planes.BOTH)))) {
            return wrong(
                    "found \"" + Names.shown(way.get()) + "\"" + Names.hint(way.get(), ways(what)), accepted(what));
        }
        if (what.hasPlane() && plane.isEmpty()) {
            return wrong("found no plane for " + json, text + ":tangential or " + text + ":sagittal");
        }
        if (what.hasEdge() && edge.isEmpty()) {
            return wrong("found no edge for " + json, text + ":lower or " + text + ":upper");
        }
        Optional<Problem> problem =
                design.problems(new Requirement(what, at, plane, edge, Bound.Prefer.LARGEST, Optional.empty())).stream()
                        .findFirst();
        if (problem.isPresent()) {
            return Outcome.failed(List.of(hinted(problem.get(), at, design)));
        }
        return Outcome.of(new Asked(
                text, what, at, plane.map(p -> p == Planes.TANGENTIAL ? Plane.TANGENTIAL : Plane.SAGITTAL), edge));
    }

    private static Outcome<Asked> wrong(String found, String accepted) {
        return Outcome.failed(List.of(new Problem(Subject.DOCUMENT, found, accepted)));
    }

    private static Place place(String where) {
        int slash = where.indexOf('/');
        return slash < 0 ? Place.of(where) : Place.of(where.substring(0, slash), where.substring(slash + 1));
    }

    private static List<String> ways(Quantity what) {
        return what.hasEdge() ? List.of("lower", "upper") : List.of("tangential", "sagittal");
    }

    private static String accepted(Quantity what) {
        return what.hasPlane() || what.hasEdge()
                ? String.join(" or ", ways(what)) + " behind the colon"
                : "no colon: " + what.json() + " has neither plane nor edge";
    }

    private static <T> Optional<T> word(String word, T[] all, java.util.function.Function<T, String> name) {
        return Arrays.stream(all).filter(a -> name.apply(a).equals(word)).findFirst();
    }

    /** A place with parts that the design does not have: the names that it has. */
    private static Problem hinted(Problem problem, Optional<Place> at, Design design) {
        List<String> names = design.parts().stream().map(Part::name).toList();
        boolean unknown = at.stream()
                .flatMap(p -> Stream.concat(Stream.of(p.first()), p.second().stream()))
                .anyMatch(n -> !names.contains(n));
        return unknown ? new Problem(problem.where(), problem.found(), Names.listed(names)) : problem;
    }
}
