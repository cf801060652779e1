package twofold.layout;

import java.util.List;
import java.util.Optional;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Hold;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Shape;

/** A number of the plan that can be set. Mirrors and legs are numbered along the beam, as in {@link Plan}. */
public sealed interface Target {
    /** The path of a leg, m. */
    record Leg(int leg) implements Target {}

    /** The angle of incidence at a mirror that folds the beam, rad. */
    record Incidence(int mirror) implements Target {}

    /** The x of a mirror, m. */
    record X(int mirror) implements Target {}

    /** The y of a mirror, m. */
    record Y(int mirror) implements Target {}

    /**
     * The number that a lever or tolerance sets at a place.
     *
     * @param set its JSON name
     * @return empty where it is a field of a part and no number of the plan
     */
    static Optional<Target> of(Design design, String set, Place place) {
        List<String> mirrors = design.mirrors().stream().map(Part::name).toList();
        int first = mirrors.indexOf(place.first());
        return switch (set) {
            case "leg_mm" -> leg(design, place).map(Leg::new);
            case "x_mm" -> Optional.of(new X(first));
            case "y_mm" -> Optional.of(new Y(first));
            case "incidence_deg" -> first < 0 ? Optional.empty() : Optional.of(new Incidence(first));
            default -> Optional.empty();
        };
    }

    /** The number of the leg between two mirrors, named in either order. */
    static Optional<Integer> leg(Design design, Place place) {
        List<Mirror> mirrors = design.mirrors();
        int legs = design.shape() == Shape.RING ? mirrors.size() : mirrors.size() - 1;
        for (int i = 0; i < legs; i++) {
            String a = mirrors.get(i).name();
            String b = mirrors.get((i + 1) % mirrors.size()).name();
            String other = place.second().orElse("");
            if ((place.first().equals(a) && other.equals(b)) || (place.first().equals(b) && other.equals(a))) {
                return Optional.of(i);
            }
        }
        return Optional.empty();
    }

    /** The number of a mirror; −1 where none has the name. */
    static int mirror(Design design, String name) {
        return design.mirrors().stream().map(Part::name).toList().indexOf(name);
    }

    /** The present value, in SI. */
    default double value(Plan plan) {
        if (this instanceof Leg t) {
            return plan.path(t.leg());
        } else if (this instanceof Incidence t) {
            return plan.incidence(t.mirror());
        } else if (this instanceof X t) {
            return plan.x[t.mirror()];
        } else if (this instanceof Y t) {
            return plan.y[t.mirror()];
        }
        throw new IllegalStateException(toString());
    }

    /** Whether a number can have a value at all: an incidence from 0 to below 89°, a leg above 0. */
    default boolean accepts(double si) {
        return this instanceof Incidence ? si >= 0 && si < Field.Limits.GRAZING : !(this instanceof Leg) || si > 0;
    }

    /** Whether a hold keeps this very number and no other: what is set outright, the hold then keeps at the new value. */
    default boolean isHeldBy(Hold hold, Design design) {
        if (hold instanceof Hold.Leg h) {
            return leg(design, h.leg()).map(l -> equals(new Leg(l))).orElse(false);
        }
        return hold instanceof Hold.Incidence i && equals(new Incidence(mirror(design, i.mirror())));
    }
}
