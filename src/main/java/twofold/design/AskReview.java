package twofold.design;

import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;

/** What is wrong with levers, tolerances and requirements. */
final class AskReview {
    private final Design design;
    private final Found found;
    private final References references;

    AskReview(Design design, Found found, References references) {
        this.design = design;
        this.found = found;
        this.references = references;
    }

    private void settings(Subject where, String set, List<Place> of) {
        if (Field.settableUnit(set).isEmpty()) {
            found.add(
                    where.at("set"),
                    "found \"" + Names.shown(set) + "\"" + Names.hint(set, Field.settableNames()),
                    String.join(", ", Field.settableNames()));
            return;
        }
        if (of.isEmpty()) {
            found.add(where.at("of"), "found an empty list", "at least one name");
        }
        Set<Place> seen = new HashSet<>();
        for (int i = 0; i < of.size(); i++) {
            Subject here = where.at("of").at(i);
            Place place = of.get(i);
            if (!seen.add(set.equals("leg_mm") ? either(place) : place)) {
                found.add(here, "found \"" + Names.shown(place.toString()) + "\" a second time", "each once");
            } else if (set.equals("leg_mm")) {
                references.leg(here, place);
            } else if (place.second().isPresent()) {
                found.add(here, "found a pair", "the name of a part");
            } else if (set.equals("x_mm") || set.equals("y_mm")) {
                references.mirror(here, place.first());
            } else {
                references.settable(here, set, place.first());
            }
        }
    }

    void lever(Subject where, Lever lever) {
        settings(where, lever.set(), lever.of());
        if (lever.range() instanceof Lever.Range.Span span) {
            value(where.at("from"), lever.set(), lever.of(), span.from());
            value(where.at("to"), lever.set(), lever.of(), span.to());
            if (span.from() == span.to()) {
                found.add(where.at("to"), "found the same value as from", "another value");
            }
        } else if (lever.range() instanceof Lever.Range.Among among) {
            if (among.values().isEmpty()) {
                found.add(where.at("among"), "found an empty list", "at least one value");
            }
            for (int i = 0; i < among.values().size(); i++) {
                value(
                        where.at("among").at(i),
                        lever.set(),
                        lever.of(),
                        among.values().get(i));
            }
        }
    }

    private void value(Subject where, String set, List<Place> of, double si) {
        Stream<Field> fields = set.equals("x_mm") || set.equals("y_mm")
                ? Stream.of(Field.AT)
                : Arrays.stream(Field.values())
                        .filter(f -> f.json().equals(set) && f.isSettable())
                        .filter(f -> of.stream().anyMatch(p -> references.has(p, f)));
        fields.filter(f -> !f.accepts(si)).findFirst().ifPresent(f -> found.number(where, f, f.unit(), si));
    }

    void tolerance(Subject where, Tolerance tolerance) {
        settings(where, tolerance.set(), tolerance.of());
        if (!(tolerance.plusMinus() >= 0)) {
            Unit unit = tolerance.relative()
                    ? Unit.PERCENT
                    : Field.settableUnit(tolerance.set()).orElse(Unit.ONE);
            found.add(
                    where.at(tolerance.relative() ? "plus_minus_percent" : "plus_minus"),
                    "found " + Found.text(unit, tolerance.plusMinus()),
                    "0 or a positive number");
        }
    }

    void requirement(Subject where, Requirement r) {
        at(where, r);
        if (r.what().hasPlane() && r.plane().isEmpty()) {
            found.add(
                    where,
                    "found no plane for " + r.what().json(),
                    "\"plane\": \"tangential\", \"sagittal\" or \"both\"");
        } else if (!r.what().hasPlane() && r.plane().isPresent()) {
            found.add(
                    where.at("plane"),
                    "found \"" + r.plane().get().word() + "\" for " + r.what().json() + ", which has no plane",
                    "no plane");
        }
        if (r.what().hasEdge() && r.edge().isEmpty()) {
            found.add(where, "found no edge for " + r.what().json(), "\"edge\": \"lower\" or \"upper\"");
        } else if (!r.what().hasEdge() && r.edge().isPresent()) {
            found.add(where.at("edge"), "found an edge for " + r.what().json() + ", which has none", "no edge");
        }
        if (r.bound() instanceof Bound.Between b && !(b.low() < b.high())) {
            Unit unit = r.what().unit();
            found.add(
                    where.at("between"),
                    "found " + Found.text(unit, b.low()) + " before " + Found.text(unit, b.high()),
                    "two numbers, the smaller first");
        } else if (r.bound() instanceof Bound.Equal e && !(e.within() > 0)) {
            found.add(where.at("within"), "found " + Found.text(r.what().unit(), e.within()), "a number above 0");
        }
        r.over().ifPresent(name -> {
            List<String> levers = design.levers().stream().map(Lever::name).toList();
            if (!levers.contains(name)) {
                found.add(
                        where.at("over"),
                        "found \"" + Names.shown(name) + "\", which no lever is called" + Names.hint(name, levers),
                        levers.isEmpty() ? "the name of a lever" : Names.listed(levers));
            }
        });
    }

    private void at(Subject where, Requirement r) {
        Subject here = where.at("at");
        Quantity.Where rule = r.what().where();
        if (r.at().isEmpty()) {
            if (rule != Quantity.Where.NOWHERE && rule != Quantity.Where.ANYWHERE_OR_PART) {
                found.add(where, "found no place for " + r.what().json(), "\"at\": " + rule.words());
            }
            return;
        }
        Place place = r.at().get();
        boolean pair = place.second().isPresent();
        boolean fits = switch (rule) {
            case NOWHERE -> false;
            case ANYWHERE_OR_PART, PART -> !pair;
            case MIRROR -> !pair && references.isKind(place, Kind.MIRROR);
            case CRYSTAL -> !pair && references.isKind(place, Kind.CRYSTAL);
            case SLAB -> !pair && (references.isKind(place, Kind.CRYSTAL) || references.isKind(place, Kind.PLATE));
            case SLAB_OR_STRETCH ->
                pair || references.isKind(place, Kind.CRYSTAL) || references.isKind(place, Kind.PLATE);
            case PART_OR_STRETCH -> true;
            case LEG -> pair;
        };
        if (!fits) {
            found.add(
                    here,
                    "found \"" + Names.shown(place.toString()) + "\" for "
                            + r.what().json(),
                    rule.words());
        } else if (rule == Quantity.Where.LEG) {
            references.leg(here, place);
        } else if (pair) {
            references.stretch(here, place);
        } else {
            references.part(here, place.first());
        }
    }

    /** A leg is the same named from either end. */
    private static Place either(Place leg) {
        return leg.second()
                .filter(b -> b.compareTo(leg.first()) < 0)
                .map(b -> Place.of(b, leg.first()))
                .orElse(leg);
    }
}
