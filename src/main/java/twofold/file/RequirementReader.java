package twofold.file;

import java.util.List;
import java.util.Optional;
import twofold.design.Bound;
import twofold.design.Edge;
import twofold.design.Place;
import twofold.design.Planes;
import twofold.design.Quantity;
import twofold.design.Requirement;
import twofold.design.Subject;
import twofold.design.Unit;

/** Reads requirements. What cannot be read is put on record, and something harmless stands in for it. */
final class RequirementReader {
    private static final List<String> BOUNDS = List.of("at_least", "at_most", "between", "equals", "prefer");
    private static final List<String> KEYS = List.of(
            "what", "at", "plane", "edge", "at_least", "at_most", "between", "equals", "within", "prefer", "over");
    private static final String ONE_BOUND = "one of at_least, at_most, between, equals with within, prefer";

    private final Faults faults;
    private final Convert convert;

    RequirementReader(Faults faults) {
        this.faults = faults;
        this.convert = new Convert(faults);
    }

    /** Reads a requirement. */
    Requirement read(Subject where, Json json) {
        if (!(json instanceof Json.Obj object)) {
            faults.refuse(where, json, "an object: a requirement");
            return new Requirement(
                    Quantity.CLEARANCE,
                    Optional.empty(),
                    Optional.empty(),
                    Optional.empty(),
                    Bound.Prefer.LARGEST,
                    Optional.empty());
        }
        Members members = new Members(where, object, faults);
        members.refuseUnknown("a requirement", KEYS);
        Optional<Quantity> known = members.need("what", "one of " + String.join(", ", Quantity.names()))
                .flatMap(v -> convert.word(where.at("what"), v, Quantity.values(), Quantity::json));
        // Roundness can be read anywhere: of an unknown quantity, only the names in its place are checked.
        Quantity what = known.orElse(Quantity.ROUNDNESS);
        Optional<Place> at = members.find("at")
                .map(v -> convert.place(where.at("at"), v, what.where().words()).orElse(Place.of(PartReader.NAMELESS)));
        if (at.isEmpty() && known.isEmpty()) {
            faults.markBroken(where.at("at"));
        }
        Optional<Planes> plane = members.find("plane")
                .map(v -> convert.word(where.at("plane"), v, Planes.values(), Planes::word)
                        .orElse(Planes.BOTH));
        Optional<Edge> edge = members.find("edge")
                .map(v -> convert.word(where.at("edge"), v, Edge.values(), Edge::word)
                        .orElse(Edge.LOWER));
        Bound bound = bound(members, known.map(Quantity::unit).orElse(Unit.ONE)).orElse(Bound.Prefer.LARGEST);
        Optional<String> over =
                members.find("over").flatMap(v -> convert.text(where.at("over"), v, "the name of a lever"));
        return new Requirement(
                what,
                at.isEmpty() && known.isEmpty() ? Optional.of(Place.of(PartReader.NAMELESS)) : at,
                known.isEmpty() ? Optional.empty() : plane,
                known.isEmpty() ? Optional.empty() : edge,
                bound,
                over);
    }

    private Optional<Bound> bound(Members members, Unit unit) {
        List<String> given = members.among(BOUNDS);
        if (given.isEmpty()) {
            members.lacking("found no bound", ONE_BOUND);
            return Optional.empty();
        }
        String key = given.get(0);
        given.stream().skip(1).forEach(k -> members.misplaced(k, "found " + k + " beside " + key, ONE_BOUND));
        if (members.has("within") && !given.contains("equals")) {
            members.misplaced("within", "found within without equals", "only beside equals");
        }
        Subject where = members.where().at(key);
        Json value = members.find(key).orElseThrow();
        return switch (key) {
            case "at_least" -> convert.number(where, value, unit, "a number").map(Bound.AtLeast::new);
            case "at_most" -> convert.number(where, value, unit, "a number").map(Bound.AtMost::new);
            case "between" ->
                convert.numbers(where, value, "two numbers, the smaller first", unit, unit)
                        .map(n -> new Bound.Between(n.get(0), n.get(1)));
            case "prefer" ->
                convert.word(where, value, Bound.Prefer.values(), Bound.Prefer::word)
                        .map(p -> p);
            default -> equal(members, unit);
        };
    }

    private Optional<Bound> equal(Members members, Unit unit) {
        Subject where = members.where();
        Optional<Double> value =
                members.find("equals").flatMap(v -> convert.number(where.at("equals"), v, unit, "a number"));
        Optional<Double> within = members.need("within", "a number above 0")
                .flatMap(v -> convert.number(where.at("within"), v, unit, "a number above 0"));
        return Optional.of(new Bound.Equal(value.orElse(0.0), within.orElse(1.0)));
    }
}
