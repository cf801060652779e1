package twofold.file;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import twofold.design.Field;
import twofold.design.Hold;
import twofold.design.Lever;
import twofold.design.Names;
import twofold.design.Place;
import twofold.design.Subject;
import twofold.design.Tolerance;
import twofold.design.Unit;

/** Reads holds, levers and tolerances. What cannot be read is put on record, and something harmless stands in for it. */
final class SettingReader {
    private static final List<String> HOLDS = List.of("leg", "incidence", "place", "direction", "round_trip");
    private static final List<String> LEVER = List.of("name", "set", "of", "from", "to", "among", "adjuster");
    private static final List<String> TOLERANCE = List.of("set", "of", "plus_minus", "plus_minus_percent", "spread");
    private static final String PAIR = "two names of mirrors";
    private static final String NAMES = "a list of names of parts; for leg_mm, of pairs of mirrors";

    private final Faults faults;
    private final Convert convert;

    SettingReader(Faults faults) {
        this.faults = faults;
        this.convert = new Convert(faults);
    }

    /** Reads a hold. */
    Hold hold(Subject where, Json json) {
        Optional<Members> object = members(where, json, "a hold");
        if (object.isEmpty()) {
            return new Hold.RoundTrip();
        }
        Members members = object.get();
        members.refuseUnknown("a hold", HOLDS);
        List<String> keys = members.among(HOLDS);
        if (keys.isEmpty()) {
            members.lacking("found no hold", "one of " + String.join(", ", HOLDS));
            return new Hold.RoundTrip();
        }
        keys.stream()
                .skip(1)
                .forEach(k ->
                        members.misplaced(k, "found " + k + " beside " + keys.get(0), "each in a hold of its own"));
        String key = keys.get(0);
        Subject here = where.at(key);
        Json value = members.find(key).orElseThrow();
        Optional<? extends Hold> hold = switch (key) {
            case "leg" -> pair(here, value).map(Hold.Leg::new);
            case "direction" -> pair(here, value).map(Hold.Direction::new);
            case "incidence" ->
                convert.text(here, value, "the name of a mirror").map(Hold.Incidence::new);
            case "place" -> convert.text(here, value, "the name of a mirror").map(Hold.Position::new);
            default -> roundTrip(here, value);
        };
        return hold.isPresent() ? hold.get() : new Hold.RoundTrip();
    }

    private Optional<Hold> roundTrip(Subject where, Json value) {
        if (!(value instanceof Json.Bool b && b.value())) {
            faults.refuse(where, value, "true");
        }
        return Optional.of(new Hold.RoundTrip());
    }

    private Optional<Place> pair(Subject where, Json value) {
        return convert.names(where, value, 2, PAIR).map(n -> Place.of(n.get(0), n.get(1)));
    }

    private Optional<Members> members(Subject where, Json json, String what) {
        if (json instanceof Json.Obj object) {
            return Optional.of(new Members(where, object, faults));
        }
        faults.refuse(where, json, "an object: " + what);
        return Optional.empty();
    }

    /** Reads a lever. */
    Lever lever(Subject where, int index, Json json) {
        Lever.Range still = new Lever.Range.Span(0, 1);
        Optional<Members> object = members(where, json, "a lever");
        if (object.isEmpty()) {
            return new Lever(PartReader.NAMELESS + index, "", List.of(), still, false);
        }
        Members members = object.get();
        String name = members.need("name", Names.ACCEPTED)
                .flatMap(v -> convert.text(where.at("name"), v, Names.ACCEPTED))
                .orElse(PartReader.NAMELESS + index);
        String set = set(members);
        List<Place> of = of(members);
        Optional<Lever.Range> range = range(members, unit(set));
        if (range.isEmpty()) {
            faults.markBroken(where.at("from"));
            faults.markBroken(where.at("to"));
        }
        boolean adjuster = members.find("adjuster")
                .flatMap(v -> convert.flag(where.at("adjuster"), v))
                .orElse(false);
        members.refuseUnknown("a lever", LEVER);
        return new Lever(name, set, of, range.orElse(still), adjuster);
    }

    private String set(Members members) {
        String accepted = "one of " + String.join(", ", Field.settableNames());
        return members.need("set", accepted)
                .flatMap(v -> convert.text(members.where().at("set"), v, accepted))
                .orElse("");
    }

    /** The unit in which a setting's numbers are stated; of an unknown one, none. */
    private static Unit unit(String set) {
        return Field.settableUnit(set).orElse(Unit.ONE);
    }

    private List<Place> of(Members members) {
        Subject where = members.where().at("of");
        Optional<Json> value = members.need("of", NAMES);
        if (value.isEmpty()) {
            return List.of();
        }
        if (!(value.get() instanceof Json.Arr list)) {
            faults.refuse(where, value.get(), NAMES);
            return List.of();
        }
        if (!list.whole()) {
            faults.markBroken(where);
        }
        List<Place> places = new ArrayList<>();
        for (int i = 0; i < list.elements().size(); i++) {
            places.add(convert.place(where.at(i), list.elements().get(i), "the name of a part, or a pair of mirrors")
                    .orElse(Place.of(PartReader.NAMELESS + i)));
        }
        return places;
    }

    private Optional<Lever.Range> range(Members members, Unit unit) {
        Subject where = members.where();
        boolean span = members.has("from") || members.has("to");
        if (members.has("among")) {
            members.among(List.of("from", "to"))
                    .forEach(k -> members.misplaced(k, "found " + k + " beside among", "from and to, or among"));
            return members.find("among")
                    .flatMap(v -> values(where.at("among"), v, unit))
                    .map(Lever.Range.Among::new);
        }
        if (!span) {
            members.lacking("found neither from and to nor among", "one of them");
            return Optional.empty();
        }
        Optional<Double> from =
                members.need("from", "a number").flatMap(v -> convert.number(where.at("from"), v, unit, "a number"));
        Optional<Double> to =
                members.need("to", "a number").flatMap(v -> convert.number(where.at("to"), v, unit, "a number"));
        // One end alone is still checked: the other stands apart from it.
        double apart = 1 + from.orElse(0.0) + to.orElse(0.0);
        return Optional.of(new Lever.Range.Span(from.orElse(apart), to.orElse(apart)));
    }

    private Optional<List<Double>> values(Subject where, Json value, Unit unit) {
        if (!(value instanceof Json.Arr list)) {
            faults.refuse(where, value, "a list of numbers");
            return Optional.empty();
        }
        if (!list.whole()) {
            faults.markBroken(where);
        }
        List<Double> values = new ArrayList<>();
        for (int i = 0; i < list.elements().size(); i++) {
            values.add(convert.number(where.at(i), list.elements().get(i), unit, "a number")
                    .orElse(0.0));
        }
        return Optional.of(values);
    }

    /** Reads a tolerance. */
    Tolerance tolerance(Subject where, Json json) {
        Optional<Members> object = members(where, json, "a tolerance");
        if (object.isEmpty()) {
            return new Tolerance("", List.of(), 0, false, Tolerance.Spread.UNIFORM);
        }
        Members members = object.get();
        String set = set(members);
        List<Place> of = of(members);
        boolean relative = members.has("plus_minus_percent");
        if (relative && members.has("plus_minus")) {
            members.misplaced("plus_minus_percent", "found plus_minus_percent beside plus_minus", "one of them");
        } else if (!relative && !members.has("plus_minus")) {
            members.lacking("found neither plus_minus nor plus_minus_percent", "one of them");
        }
        String key = relative ? "plus_minus_percent" : "plus_minus";
        double plusMinus = members.find(key)
                .flatMap(v ->
                        convert.number(where.at(key), v, relative ? Unit.PERCENT : unit(set), "0 or a positive number"))
                .orElse(0.0);
        Tolerance.Spread spread = members.find("spread")
                .flatMap(v -> convert.word(where.at("spread"), v, Tolerance.Spread.values(), Tolerance.Spread::word))
                .orElse(Tolerance.Spread.UNIFORM);
        members.refuseUnknown("a tolerance", TOLERANCE);
        return new Tolerance(set, of, plusMinus, relative, spread);
    }
}
