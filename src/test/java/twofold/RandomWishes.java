package twofold;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import twofold.design.Bound;
import twofold.design.Design;
import twofold.design.Edge;
import twofold.design.Field;
import twofold.design.Hold;
import twofold.design.Kind;
import twofold.design.Lever;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Planes;
import twofold.design.Quantity;
import twofold.design.Requirement;
import twofold.design.Shape;
import twofold.design.Tolerance;
import twofold.design.Unit;

/** Random holds, levers, requirements and tolerances that fit a design's parts. */
final class RandomWishes {
    private final Dice dice;
    private final Design design;
    private final List<String> mirrors;
    private final List<String> folds;

    RandomWishes(Dice dice, Design design) {
        this.dice = dice;
        this.design = design;
        mirrors = design.mirrors().stream().map(Part::name).toList();
        folds = design.shape() == Shape.RING ? mirrors : mirrors.subList(1, mirrors.size() - 1);
    }

    Design design() {
        List<Hold> holds = new ArrayList<>();
        for (int i = dice.count(0, 2); i > 0; i--) {
            holds.add(hold());
        }
        List<Lever> levers = new ArrayList<>();
        for (int i = dice.count(0, 3); i > 0; i--) {
            levers.add(lever("lever " + i));
        }
        List<Requirement> requirements = new ArrayList<>();
        for (int i = dice.count(0, 4); i > 0; i--) {
            requirements.add(requirement(levers.stream().map(Lever::name).toList()));
        }
        List<Tolerance> tolerances = new ArrayList<>();
        for (int i = dice.count(0, 3); i > 0; i--) {
            Setting s = setting();
            boolean relative = dice.chance(0.4);
            Tolerance.Spread spread = dice.chance(0.5) ? Tolerance.Spread.UNIFORM : Tolerance.Spread.NORMAL;
            double by = relative ? dice.number(0, 0.05, Unit.PERCENT, 1) : dice.number(0, 0.5e-3, Unit.MM, 2);
            tolerances.add(new Tolerance(s.set, s.of, by, relative, spread));
        }
        return new Design(
                design.title(),
                dice.chance(0.5) ? "" : "Two lines,\n\"quoted\" \\ and \t tabbed: é 冰 😀",
                design.wavelength(),
                design.shape(),
                design.parts(),
                List.copyOf(new LinkedHashSet<>(holds)),
                levers,
                requirements,
                tolerances);
    }

    private Hold hold() {
        return switch (dice.count(0, 4)) {
            case 0 -> new Hold.Leg(leg());
            case 1 -> new Hold.Direction(leg());
            case 2 -> folds.isEmpty() ? new Hold.RoundTrip() : new Hold.Incidence(dice.of(folds));
            case 3 -> new Hold.RoundTrip();
            default -> new Hold.Position(dice.of(mirrors));
        };
    }

    private Place leg() {
        int last = design.shape() == Shape.RING ? mirrors.size() - 1 : mirrors.size() - 2;
        int i = dice.count(0, last);
        return Place.of(mirrors.get(i), mirrors.get((i + 1) % mirrors.size()));
    }

    /** A number that can be set, of which parts, and the fields that it stands in. */
    private record Setting(String set, List<Place> of, List<Field> fields) {}

    private Setting setting() {
        if (dice.chance(0.3)) {
            Set<Place> legs = new LinkedHashSet<>();
            for (int i = dice.count(1, 3); i > 0; i--) {
                legs.add(leg());
            }
            return new Setting("leg_mm", List.copyOf(legs), List.of(Field.LEG));
        }
        if (dice.chance(0.2)) {
            return new Setting(
                    dice.chance(0.5) ? "x_mm" : "y_mm", List.of(Place.of(dice.of(mirrors))), List.of(Field.AT));
        }
        Part first = dice.of(design.parts());
        List<Field> settable = first.kind().fields().stream()
                .filter(Field::isSettable)
                .filter(f -> f != Field.LEG && (f != Field.INCIDENCE || folds.contains(first.name())))
                .toList();
        if (settable.isEmpty()) {
            return setting();
        }
        Field field = dice.of(settable);
        List<Place> of = new ArrayList<>();
        of.add(Place.of(first.name()));
        for (Part other : design.parts()) {
            boolean fits = other.kind() == first.kind() && other != first;
            if (fits && (field != Field.INCIDENCE || folds.contains(other.name())) && dice.chance(0.3)) {
                of.add(Place.of(other.name()));
            }
        }
        return new Setting(field.json(), of, List.of(field));
    }

    private double value(List<Field> fields) {
        while (true) {
            double value = switch (fields.get(0).unit()) {
                case MM -> dice.number(1e-3, 0.3, Unit.MM, 1);
                case DEG -> dice.number(0, 1, Unit.DEG, 1);
                case PER_M -> dice.number(-5, 5, Unit.PER_M, 1);
                default -> dice.number(0, 2, Unit.ONE, 3);
            };
            if (fields.stream().allMatch(f -> f.accepts(value))) {
                return value;
            }
        }
    }

    private Lever lever(String name) {
        Setting s = setting();
        if (dice.chance(0.3)) {
            List<Double> values = new ArrayList<>();
            for (int i = dice.count(1, 5); i > 0; i--) {
                values.add(value(s.fields));
            }
            return new Lever(name, s.set, s.of, new Lever.Range.Among(values), dice.chance(0.3));
        }
        double from = value(s.fields);
        double to = value(s.fields);
        while (to == from) {
            to = value(s.fields);
        }
        return new Lever(name, s.set, s.of, new Lever.Range.Span(from, to), dice.chance(0.3));
    }

    private Requirement requirement(List<String> levers) {
        Quantity what = dice.of(List.of(Quantity.values()));
        Optional<Place> at = place(what.where());
        boolean needsPlace = what.where() != Quantity.Where.NOWHERE && what.where() != Quantity.Where.ANYWHERE_OR_PART;
        if (needsPlace && at.isEmpty()) {
            return requirement(levers);
        }
        return new Requirement(
                what,
                at,
                what.hasPlane() ? Optional.of(dice.of(List.of(Planes.values()))) : Optional.empty(),
                what.hasEdge() ? Optional.of(dice.of(List.of(Edge.values()))) : Optional.empty(),
                bound(what.unit()),
                !levers.isEmpty() && dice.chance(0.3) ? Optional.of(dice.of(levers)) : Optional.empty());
    }

    private Optional<Place> place(Quantity.Where where) {
        List<String> crystals = names(Kind.CRYSTAL);
        List<String> slabs = new ArrayList<>(crystals);
        slabs.addAll(names(Kind.PLATE));
        return switch (where) {
            case NOWHERE -> Optional.empty();
            case ANYWHERE_OR_PART -> dice.chance(0.5) ? Optional.empty() : Optional.of(part());
            case PART -> Optional.of(part());
            case MIRROR -> folds.isEmpty() ? Optional.empty() : Optional.of(Place.of(dice.of(folds)));
            case CRYSTAL -> crystals.isEmpty() ? Optional.empty() : Optional.of(Place.of(dice.of(crystals)));
            case SLAB -> slabs.isEmpty() ? Optional.empty() : Optional.of(Place.of(dice.of(slabs)));
            case SLAB_OR_STRETCH ->
                slabs.isEmpty() || dice.chance(0.5) ? Optional.of(stretch()) : Optional.of(Place.of(dice.of(slabs)));
            case PART_OR_STRETCH -> Optional.of(dice.chance(0.5) ? part() : stretch());
            case LEG -> Optional.of(leg());
        };
    }

    private List<String> names(Kind kind) {
        return design.parts().stream()
                .filter(p -> p.kind() == kind)
                .map(Part::name)
                .toList();
    }

    private Place part() {
        return Place.of(dice.of(design.parts()).name());
    }

    /** Two parts that follow each other in the design. */
    private Place stretch() {
        int i = dice.count(0, design.parts().size() - 2);
        return Place.of(design.parts().get(i).name(), design.parts().get(i + 1).name());
    }

    private Bound bound(Unit unit) {
        double value = switch (unit) {
            case MM -> dice.number(1e-3, 1, unit, 1);
            case UM -> dice.number(1e-5, 1e-3, unit, 1);
            case DEG -> dice.number(0, 3, unit, 1);
            case MHZ -> dice.number(5e7, 1e9, unit, 1);
            default -> dice.number(0, 1, unit, 3);
        };
        return switch (dice.count(0, 4)) {
            case 0 -> new Bound.AtLeast(value);
            case 1 -> new Bound.AtMost(value);
            case 2 -> new Bound.Between(-value / 3 - 1e-9, value);
            case 3 -> new Bound.Equal(value, value / 100 + 1e-9);
            default -> dice.of(List.of(Bound.Prefer.values()));
        };
    }
}
