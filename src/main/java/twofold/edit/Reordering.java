package twofold.edit;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Problem;
import twofold.design.Shape;
import twofold.design.Subject;
import twofold.layout.Outcome;
import twofold.layout.Room;
import twofold.layout.Standing;

/**
 * Parts one step up or down the beam. Two parts on one leg exchange places within the stretch that they take; a part that
 * crosses a mirror goes to the neighbouring leg, as far from the mirror as before if there is room; two mirrors exchange their
 * turns in the beam and stay where they are.
 */
final class Reordering {
    private Reordering() {}

    /**
     * Moves parts.
     *
     * @param indices of the parts, ascending
     * @param down the beam, or up
     */
    static Outcome<Design> by(Design design, List<Integer> indices, boolean down) {
        List<String> names = new ArrayList<>(
                indices.stream().map(i -> design.parts().get(i).name()).toList());
        if (down) {
            Collections.reverse(names);
        }
        Outcome<Design> moved = Outcome.of(design);
        for (String name : names) {
            moved = moved.then(d -> {
                int index = d.indexOf(name).orElseThrow();
                int count = d.parts().size();
                int first = down ? index : index - 1;
                boolean round = d.shape() == Shape.RING;
                return round || (first >= 0 && first < count - 1)
                        ? exchanged(d, Math.floorMod(first, count))
                        : atTheEnd(name, index, down);
            });
        }
        return moved.then(d -> Outcome.of(Room.settled(d)));
    }

    private static <T> Outcome<T> atTheEnd(String name, int index, boolean down) {
        return Outcome.failed(new Problem(
                Subject.part(index),
                "found " + name + " at the " + (down ? "end" : "beginning") + " of the beam",
                "a part that another one stands " + (down ? "behind" : "before")));
    }

    /** The design with the part at an index and the next one exchanged; the first follows the last. */
    private static Outcome<Design> exchanged(Design design, int i) {
        List<Part> parts = new ArrayList<>(design.parts());
        int last = parts.size() - 1;
        int j = i == last ? 0 : i + 1;
        Part a = parts.get(i);
        Part b = parts.get(j);
        if (a instanceof Mirror && b instanceof Mirror) {
            parts.set(i, b);
            parts.set(j, a);
            return Outcome.of(design.withParts(parts));
        }
        int leg = Placing.leg(design, i);
        if (a instanceof Mirror) {
            if (i == 0 && design.shape() == Shape.STANDING_WAVE) {
                return atTheEnd(b.name(), j, false);
            }
            double distance = standing(design, leg, j).middle();
            parts.remove(j);
            int to = i == 0 ? last : i;
            parts.add(to, b);
            return Outcome.of(across(design.withParts(parts), to, distance, true));
        }
        if (b instanceof Mirror) {
            if (j == last && design.shape() == Shape.STANDING_WAVE) {
                return atTheEnd(a.name(), i, true);
            }
            double distance =
                    Room.on(design, leg).path() - standing(design, leg, i).middle();
            parts.remove(i);
            int to = j == 0 ? 1 : j;
            parts.add(to, a);
            return Outcome.of(across(design.withParts(parts), to, distance, false));
        }
        Standing first = standing(design, leg, i);
        Standing second = standing(design, leg, j);
        parts.set(i, b.with(Field.ALONG, along(first.start() + second.length() / 2)));
        parts.set(j, a.with(Field.ALONG, along(second.end() - first.length() / 2)));
        return Outcome.of(design.withParts(parts));
    }

    private static Along along(double middle) {
        return Along.at(Math.max(0, middle));
    }

    private static Standing standing(Design design, int leg, int part) {
        return Room.on(design, leg).parts().stream()
                .filter(s -> s.part() == part)
                .findFirst()
                .orElseThrow();
    }

    /** A part at a distance from the mirror that it crossed, which ends its new leg or begins it. */
    private static Design across(Design design, int index, double distance, boolean fromTheEnd) {
        Room room = Room.on(design, Placing.leg(design, index));
        if (room.parts().size() == 1 && Room.along(design.parts().get(index)).inMiddle()) {
            return design;
        }
        double wanted = fromTheEnd ? room.path() - distance : distance;
        return Placing.at(design, index, room.nearest(index, wanted).orElse(wanted));
    }
}
