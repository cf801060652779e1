package twofold.edit;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Hold;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Point;
import twofold.design.Problem;
import twofold.design.Shape;
import twofold.design.Subject;
import twofold.design.Turn;
import twofold.design.Unit;
import twofold.layout.Laid;
import twofold.layout.Leg;
import twofold.layout.Outcome;
import twofold.layout.Room;
import twofold.layout.Standing;

/**
 * A leg folded by a mirror, and unfolded where one is taken out.
 *
 * <p>In a standing wave the arm beyond turns rigidly about the mirror: downstream where no place or direction is held
 * there, else upstream. In a ring, and where both sides are held, no other mirror moves: a mirror goes in beside the leg,
 * and where one is taken out its neighbours are aimed anew.
 */
final class Folding {
    /** The incidence of a new fold. */
    private static final double INCIDENCE = Unit.DEG.toSi(10);

    /** How far off the leg a new fold stands where nothing else may move, m. */
    private static final double OFF = 10e-3;

    /** How much it must turn the beam at least, so that the beam does not graze it: an incidence of 88.5°. */
    private static final double LEAST_TURN = Unit.DEG.toSi(3);

    /** How far a new fold stays from the leg's mirrors where there is so much room, m. */
    private static final double APART = 1e-3;

    private final Laid laid;
    private final Design design;
    private final List<Mirror> mirrors;

    Folding(Laid laid) {
        this.laid = laid;
        design = laid.design();
        mirrors = design.mirrors();
    }

    /**
     * The design with a leg folded.
     *
     * @param mirror whatever its place
     * @param leg number of the leg
     * @param along wanted path from the leg's start; parts in the way move it to their nearest face
     * @param side the way the beam then turns
     */
    Outcome<Design> in(Mirror mirror, int leg, double along, Turn side) {
        Leg whole = laid.legs().get(leg);
        OptionalDouble free = free(whole, along);
        if (free.isEmpty()) {
            return Outcome.failed(new Problem(
                    Subject.part(whole.from()),
                    "found no free path for " + mirror.name() + " between " + name(whole.from()) + " and "
                            + name(whole.to()),
                    "a leg that its parts do not fill"));
        }
        double path = free.getAsDouble();
        Point on = whole.at(path);
        List<Part> parts = new ArrayList<>(design.parts());
        int index = whole.from() + 1;
        for (Standing s : whole.parts()) {
            boolean before = s.middle() <= path;
            parts.set(s.part(), at(s.part(), before ? s.middle() : s.middle() - path));
            index += before ? 1 : 0;
        }
        double turn = side.sign() * (Math.PI - 2 * INCIDENCE);
        Optional<List<Part>> folded = swung(parts, leg + 1, leg + 1, on, turn);
        if (folded.isPresent()) {
            folded.get().add(index, mirror.at(on));
            return Outcome.of(design.withParts(folded.get()));
        }
        parts.add(index, mirror.at(beside(whole, on, side)));
        return Outcome.of(Room.settled(fromTheEnd(design.withParts(parts), leg + 1, whole.parts(), whole.path())));
    }

    private String name(int part) {
        return design.parts().get(part).name();
    }

    private Part at(int part, double middle) {
        return design.parts().get(part).with(Field.ALONG, Along.at(Math.max(0, middle)));
    }

    /** The path nearest to a wanted one that lies in no part, and apart from the mirrors. */
    private static OptionalDouble free(Leg leg, double wanted) {
        double apart = Math.min(APART, leg.path() / 4);
        double best = Double.NaN;
        double from = apart;
        for (int i = 0; i <= leg.parts().size(); i++) {
            boolean last = i == leg.parts().size();
            double to = last ? leg.path() - apart : Math.min(leg.parts().get(i).start(), leg.path() - apart);
            double near = Math.max(from, Math.min(to, wanted));
            if (from <= to && !(Math.abs(best - wanted) <= Math.abs(near - wanted))) {
                best = near;
            }
            from = last ? from : Math.max(from, leg.parts().get(i).end());
        }
        return Double.isNaN(best) ? OptionalDouble.empty() : OptionalDouble.of(best);
    }

    /** A point off the leg, to a side, from where the beam does not graze the mirror. */
    private Point beside(Leg leg, Point on, Turn side) {
        double x = -side.sign() * leg.heading().y();
        double y = side.sign() * leg.heading().x();
        Point a = ((Mirror) design.parts().get(leg.from())).at();
        Point b = ((Mirror) design.parts().get(leg.to())).at();
        // On a long leg the beam is folded so little that 10 mm are not enough.
        double least = Math.tan(LEAST_TURN) / (1 / a.distance(on) + 1 / on.distance(b));
        double off = Math.max(OFF, least);
        return new Point(on.x() + off * x, on.y() + off * y);
    }

    /**
     * The design without a mirror that folds the beam. Parts of the second leg follow those of the first: at their path from
     * the first leg's start where the arm unfolds, else at their distance from the leg's end.
     *
     * @param mirror its number
     */
    Outcome<Design> out(int mirror) {
        int before = mirror > 0 ? mirror - 1 : laid.legs().size() - 1;
        Leg in = laid.legs().get(before);
        Leg on = laid.legs().get(mirror);
        int index = in.to();
        List<Part> parts = new ArrayList<>(design.parts());
        in.parts().forEach(s -> parts.set(s.part(), at(s.part(), s.middle())));
        on.parts().forEach(s -> parts.set(s.part(), at(s.part(), in.path() + s.middle())));
        Point u = in.heading();
        Point v = on.heading();
        double turn = Math.atan2(u.x() * v.y() - u.y() * v.x(), u.x() * v.x() + u.y() * v.y());
        Optional<List<Part>> unfolded =
                swung(parts, mirror, mirror + 1, mirrors.get(mirror).at(), -turn);
        List<Part> fewer = unfolded.orElse(parts);
        fewer.remove(index);
        if (index == 0) {
            // What stood on the leg of the first mirror of a ring now stands on the closing leg, last in the list.
            for (int i = 0; i < on.parts().size(); i++) {
                fewer.add(fewer.remove(0));
            }
        }
        Design joined = design.withParts(fewer);
        if (unfolded.isPresent() || (design.shape() == Shape.RING && mirrors.size() < 4)) {
            return Outcome.of(joined);
        }
        int leg = mirror > 0 ? before : before - 1;
        return Outcome.of(Room.settled(fromTheEnd(joined, leg, on.parts(), on.path())));
    }

    /** States parts of a leg at the distance from its end that they had on another of that path. */
    private Design fromTheEnd(Design changed, int leg, List<Standing> were, double path) {
        double now = Room.on(changed, leg).path();
        List<Part> parts = new ArrayList<>(changed.parts());
        List<String> names = were.stream().map(s -> name(s.part())).toList();
        for (Standing s : Room.on(changed, leg).parts()) {
            int i = names.indexOf(parts.get(s.part()).name());
            if (i >= 0) {
                parts.set(
                        s.part(),
                        at(were.get(i).part(), now - (path - were.get(i).middle())));
            }
        }
        return changed.withParts(parts);
    }

    /**
     * The parts with the mirrors on one side turned about a point; empty where that may not be.
     *
     * @param up the first mirror that does not belong to the upstream side
     * @param down the first mirror of the downstream side
     */
    private Optional<List<Part>> swung(List<Part> parts, int up, int down, Point about, double by) {
        if (design.shape() == Shape.RING) {
            return Optional.empty();
        }
        boolean isDown = isFree(down, mirrors.size());
        if (!isDown && !isFree(0, up)) {
            return Optional.empty();
        }
        List<String> moved = (isDown ? mirrors.subList(down, mirrors.size()) : mirrors.subList(0, up))
                .stream().map(Mirror::name).toList();
        List<Part> swung = new ArrayList<>();
        for (Part part : parts) {
            swung.add(
                    part instanceof Mirror m && moved.contains(m.name())
                            ? m.at(Turned.about(about, m.at(), isDown ? by : -by))
                            : part);
        }
        return Optional.of(swung);
    }

    /** Whether no place of these mirrors is held, nor a direction of the legs between them. */
    private boolean isFree(int from, int to) {
        List<String> names =
                mirrors.subList(from, to).stream().map(Mirror::name).toList();
        return design.holds().stream()
                .noneMatch(h -> (h instanceof Hold.Position p && names.contains(p.mirror()))
                        || (h instanceof Hold.Direction d && isBetween(d.leg(), names)));
    }

    private static boolean isBetween(Place leg, List<String> names) {
        return names.contains(leg.first()) && names.contains(leg.second().orElse(""));
    }
}
