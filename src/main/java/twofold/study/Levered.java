package twofold.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import twofold.cavity.Chain;
import twofold.design.Along;
import twofold.design.Crystal;
import twofold.design.Design;
import twofold.design.FaceAngle;
import twofold.design.Field;
import twofold.design.Lever;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Point;
import twofold.design.Problem;
import twofold.design.Subject;
import twofold.design.TwoPowers;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.layout.Move;
import twofold.layout.Mover;
import twofold.layout.Outcome;
import twofold.layout.Plan;
import twofold.layout.Target;

/** The design that levers set to values make: what a {@link Setting} does to a trial, as a design of its own. */
public final class Levered {
    /** Values that differ by less than this share of a lever's range are one to the eye. */
    private static final double ALIKE = 1e-3;

    private Levered() {}

    /**
     * Sets levers of a design that is laid out.
     *
     * @param laid the design
     * @param levers any of it
     * @param values in SI, one a lever
     * @return the design laid out anew, or why there is none
     */
    public static Outcome<Laid> of(Laid laid, List<Lever> levers, double... values) {
        List<Part> parts = new ArrayList<>(laid.design().parts());
        List<List<Target>> targets = new ArrayList<>();
        List<Double> wanted = new ArrayList<>();
        List<String> names = new ArrayList<>();
        for (int i = 0; i < levers.size(); i++) {
            Lever lever = levers.get(i);
            List<Target> moved = new ArrayList<>();
            for (Place place : lever.of()) {
                Optional<Target> target = Target.of(laid.design(), lever.set(), place);
                if (target.isPresent()) {
                    moved.add(target.get());
                } else {
                    int part = laid.design().indexOf(place.first()).orElseThrow();
                    parts.set(part, with(parts.get(part), lever.set(), values[i]));
                }
            }
            if (!moved.isEmpty()) {
                targets.add(moved);
                wanted.add(values[i]);
                names.add(lever.name());
            }
        }
        Design set = laid.design().withParts(parts);
        if (targets.isEmpty()) {
            return Layout.of(set);
        }
        Mover mover = Mover.of(laid, targets);
        mover.load(set);
        Move move =
                mover.explain(wanted.stream().mapToDouble(Double::doubleValue).toArray());
        if (move instanceof Move.Refused refused) {
            return Outcome.failed(List.of(new Problem(
                    Subject.DOCUMENT.at("levers"),
                    refused.words(),
                    "other values of " + String.join(", ", names) + ", or fewer holds")));
        }
        return Layout.of(set.withParts(placed(parts, ((Move.Moved) move).places())));
    }

    /** Where two levers set one and the same number, so that they cannot be set together. */
    public static Optional<Place> clash(Design design, Lever a, Lever b) {
        List<String> numbers = a.of().stream().map(p -> number(design, a, p)).toList();
        return b.of().stream()
                .filter(p -> numbers.contains(number(design, b, p)))
                .findFirst();
    }

    /** What a lever sets at a place, the same for a leg named from either end. */
    private static String number(Design design, Lever lever, Place place) {
        return Target.of(design, lever.set(), place).map(Target::toString).orElse(lever.set() + " " + place);
    }

    /**
     * Where a lever stands in a design: the value of all that it sets, in SI; empty where they differ by more than a
     * thousandth of the lever's range, so that no one value is the design's.
     */
    public static OptionalDouble now(Laid laid, Lever lever) {
        double least = Double.POSITIVE_INFINITY;
        double most = Double.NEGATIVE_INFINITY;
        for (Place place : lever.of()) {
            double value = now(laid, lever.set(), place);
            if (!Double.isFinite(value)) {
                return OptionalDouble.empty();
            }
            least = Math.min(least, value);
            most = Math.max(most, value);
        }
        return most - least <= ALIKE * extent(lever) ? OptionalDouble.of((least + most) / 2) : OptionalDouble.empty();
    }

    private static double now(Laid laid, String set, Place place) {
        Optional<Target> target = Target.of(laid.design(), set, place);
        if (target.isPresent()) {
            return target.get().value(Plan.of(laid));
        }
        int index = laid.design().indexOf(place.first()).orElseThrow();
        Part part = laid.design().parts().get(index);
        Field field = part.kind().field(set).orElseThrow();
        Chain chain = Chain.of(laid);
        if (part instanceof Mirror mirror && field == Field.CLEAR_DIAMETER) {
            return mirror.clearDiameter();
        } else if (part instanceof Crystal crystal && field == Field.THERMAL_POWER) {
            TwoPowers powers = crystal.thermalPower();
            return powers.tangential() == powers.sagittal() ? powers.tangential() : Double.NaN;
        } else if (chain.has(index, field)) {
            return chain.trial().get(chain.slot(index, field));
        }
        return part.values()
                .find(field)
                .map(v -> v instanceof Double d ? d : Double.NaN)
                .orElse(Double.NaN);
    }

    private static double extent(Lever lever) {
        Axis axis = Axis.of(lever, 2).ascending();
        return axis.value(axis.size() - 1) - axis.value(0);
    }

    private static List<Part> placed(List<Part> parts, List<Point> places) {
        List<Part> placed = new ArrayList<>();
        int mirror = 0;
        for (Part part : parts) {
            placed.add(part instanceof Mirror m ? m.at(places.get(mirror++)) : part);
        }
        return placed;
    }

    private static Part with(Part part, String set, double value) {
        Field field = part.kind().field(set).orElseThrow();
        Object stated = switch (field.form()) {
            case ALONG -> Along.at(value);
            case FACE_ANGLE -> FaceAngle.of(value);
            case POWERS -> new TwoPowers(value, value);
            default -> value;
        };
        if (field == Field.CURVATURE) {
            return part.with(Field.ROC, 1 / value);
        }
        return part.with(field, stated);
    }
}
