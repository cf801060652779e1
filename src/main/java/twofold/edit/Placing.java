package twofold.edit;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Problem;
import twofold.design.Shape;
import twofold.design.Subject;
import twofold.design.Unit;
import twofold.layout.Outcome;
import twofold.layout.Room;
import twofold.layout.Standing;

/** Parts that are not mirrors put on legs, where they fit. */
final class Placing {
    private Placing() {}

    /** The number of the leg on which the parts at an index stand, or which the mirror there leaves. */
    static int leg(Design design, int index) {
        return (int) design.parts().subList(0, index + 1).stream()
                        .filter(Mirror.class::isInstance)
                        .count()
                - 1;
    }

    /** The index of a mirror by its number. */
    static int mirror(Design design, int number) {
        return design.indexOf(design.mirrors().get(number).name()).orElseThrow();
    }

    static Design with(Design design, int index, Part part) {
        List<Part> parts = new ArrayList<>(design.parts());
        parts.add(index, part);
        return design.withParts(parts);
    }

    static Design without(Design design, int index) {
        List<Part> parts = new ArrayList<>(design.parts());
        parts.remove(index);
        return design.withParts(parts);
    }

    /** The design with a part's place stated as a number, m; a rounding below 0 is 0. */
    static Design at(Design design, int index, double middle) {
        List<Part> parts = new ArrayList<>(design.parts());
        parts.set(index, parts.get(index).with(Field.ALONG, Along.at(Math.max(0, middle))));
        return design.withParts(parts);
    }

    /** The design with a part in whichever gap of a leg is nearest to a wanted path, m. */
    static Outcome<Design> anywhere(Design design, int leg, Part part, double wanted) {
        int from = mirror(design, leg) + 1;
        Room room = Room.on(with(design, from, part), leg);
        List<Standing> others = room.parts().subList(1, room.parts().size());
        double half = room.parts().get(0).length() / 2;
        double best = Double.NaN;
        int index = from;
        double widest = 0;
        for (int i = 0; i <= others.size(); i++) {
            double low = (i == 0 ? 0 : others.get(i - 1).end());
            double high = i == others.size() ? room.path() : others.get(i).start();
            widest = Math.max(widest, high - low);
            double near = Math.max(low + half, Math.min(high - half, wanted));
            if (high - low >= 2 * half && !(Math.abs(best - wanted) <= Math.abs(near - wanted))) {
                best = near;
                index = from + i;
            }
        }
        if (Double.isNaN(best)) {
            return Outcome.failed(new Problem(
                    Subject.part(from),
                    "found no room for " + part.name() + ", " + Unit.MM.shown(2 * half)
                            + " mm of path, on the leg from "
                            + design.parts().get(from - 1).name(),
                    widest > 0 ? "a part of at most " + Unit.MM.shown(widest) + " mm there" : "another leg"));
        }
        return Outcome.of(at(with(design, index, part), index, best));
    }

    /**
     * The design with a part right behind another, in the middle of what is free there; before the last mirror of a standing
     * wave. Where it does not fit, in the nearest gap of that leg that takes it. A part that stood in the middle of its leg
     * stays so where it is alone.
     */
    static Outcome<Design> behind(Design design, int index, Part part) {
        boolean end = index == design.parts().size() - 1 && design.shape() == Shape.STANDING_WAVE;
        int at = end ? index : index + 1;
        Design candidate = with(design, at, part);
        int leg = leg(candidate, at);
        Room room = Room.on(candidate, leg);
        OptionalDouble low = room.nearest(at, Double.NEGATIVE_INFINITY);
        if (low.isEmpty()) {
            Standing mine = room.parts().stream()
                    .filter(s -> s.part() == at)
                    .findFirst()
                    .orElseThrow();
            return anywhere(design, leg, part, Math.max(0, mine.middle()));
        }
        if (room.parts().size() == 1 && Room.along(part).inMiddle()) {
            return Outcome.of(candidate);
        }
        double high = room.nearest(at, Double.POSITIVE_INFINITY).orElseThrow();
        return Outcome.of(at(candidate, at, (low.getAsDouble() + high) / 2));
    }
}
