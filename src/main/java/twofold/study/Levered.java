package twofold.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import twofold.design.Along;
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
import twofold.layout.Target;

/** The design that levers set to values make: what a {@link Setting} does to a trial, as a design of its own. */
public final class Levered {
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
