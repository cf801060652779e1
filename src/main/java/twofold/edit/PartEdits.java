package twofold.edit;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import twofold.design.Design;
import twofold.design.Kind;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Problem;
import twofold.design.Shape;
import twofold.design.Subject;
import twofold.design.Turn;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.layout.Leg;
import twofold.layout.Outcome;
import twofold.layout.Room;
import twofold.layout.Standing;

/**
 * Parts put on the beam, taken off, copied, renamed and put in another order. What referred to a part or leg that is no longer
 * there goes with it; of a lever or tolerance with several places only that place ({@link Lost} says what went).
 *
 * <p>Mirrors stay where they are, but for what a mirror put in or taken out turns; see {@link MirrorEdits}.
 */
public final class PartEdits {
    private PartEdits() {}

    /** The parts that one design has and another had not, by name, in beam order: what an edit brought. */
    public static List<String> added(Design before, Design after) {
        List<String> known = Named.parts(before);
        return Named.parts(after).stream().filter(n -> !known.contains(n)).toList();
    }

    /**
     * A new part on a leg, in the gap nearest to a place, under a name such as "Lens 1".
     *
     * @param kind any but a mirror, for which there is {@link MirrorEdits#insert}
     * @param leg two neighbouring mirrors
     * @param along path from the mirror that the leg leaves to the part's middle, m
     */
    public static Edit insert(Kind kind, Place leg, double along) {
        if (kind == Kind.MIRROR) {
            throw new IllegalArgumentException("a mirror folds its leg");
        }
        return Edit.of(
                "place " + kind.word(),
                laid -> Named.leg(laid.design(), leg)
                        .then(l -> Placing.anywhere(laid.design(), l, NewPart.of(kind, laid.design()), along))
                        .then(PartEdits::tidy));
    }

    /** A new part of any kind behind another, in the middle of what is free there; a mirror turns the beam to a side. */
    public static Edit insertBehind(Kind kind, String part, Turn side) {
        return Edit.of(
                "place " + kind.word(),
                laid -> Named.part(laid.design(), part)
                        .then(i -> behind(laid, i, NewPart.of(kind, laid.design()), side)));
    }

    /** Parts settled where they fit, and dead references dropped. */
    private static Outcome<Design> tidy(Design design) {
        return Outcome.of(References.pruned(Room.settled(design)));
    }

    private static String several(List<String> parts) {
        return parts.size() == 1 ? parts.get(0) : parts.size() + " parts";
    }

    /**
     * Parts taken off the beam. A fold mirror's two legs become one: in a standing wave the arm beyond unfolds, so that the new
     * leg is as long as both and nothing else changes; in a ring, or where mirrors are held in place on both sides, its
     * neighbours are aimed at each other. An end mirror's neighbour becomes the end, if nothing stands between.
     */
    public static Edit delete(List<String> parts) {
        return Edit.of("delete " + several(parts), laid -> deleted(laid, parts));
    }

    /** {@link #delete}, named for parts that were {@link #copied} just before. */
    public static Edit cut(List<String> parts) {
        return Edit.of("cut " + several(parts), laid -> deleted(laid, parts));
    }

    /** Parts to copy, in beam order. */
    public static List<Part> copied(Design design, List<String> parts) {
        return design.parts().stream().filter(p -> parts.contains(p.name())).toList();
    }

    private static Outcome<Design> deleted(Laid laid, List<String> names) {
        Design design = laid.design();
        for (String name : names) {
            Outcome<Integer> found = Named.part(design, name);
            if (found.value().isEmpty()) {
                return Outcome.failed(found.problems());
            }
        }
        List<String> mirrors = design.mirrors().stream()
                .map(Mirror::name)
                .filter(names::contains)
                .toList();
        List<Part> left = design.parts().stream()
                .filter(p -> p instanceof Mirror || !names.contains(p.name()))
                .toList();
        Outcome<Design> now = tidy(design.withParts(left));
        for (String mirror : mirrors) {
            now = now.then(Layout::of).then(l -> withoutMirror(l, mirror)).then(PartEdits::tidy);
        }
        return now;
    }

    private static Outcome<Design> withoutMirror(Laid laid, String name) {
        Design design = laid.design();
        List<String> mirrors = design.mirrors().stream().map(Mirror::name).toList();
        int number = mirrors.indexOf(name);
        boolean ring = design.shape() == Shape.RING;
        int least = ring ? 3 : 2;
        if (mirrors.size() <= least) {
            return Outcome.failed(new Problem(
                    Subject.part(Placing.mirror(design, number)),
                    "found " + name + ", one of " + mirrors.size() + " mirrors",
                    "another part: a " + design.shape().word() + " needs at least " + least + " mirrors"));
        }
        if (ring || (number > 0 && number < mirrors.size() - 1)) {
            return new Folding(laid).out(number);
        }
        Leg leg = laid.legs().get(number == 0 ? 0 : number - 1);
        if (!leg.parts().isEmpty()) {
            List<String> on = leg.parts().stream()
                    .map(s -> design.parts().get(s.part()).name())
                    .toList();
            return Outcome.failed(new Problem(
                    Subject.part(Placing.mirror(design, number)),
                    "found " + String.join(", ", on) + " on the leg that " + name + " ends",
                    "an end mirror of an empty leg: move or delete what stands there first"));
        }
        return Outcome.of(Placing.without(design, Placing.mirror(design, number)));
    }

    /** Copies of parts behind the last of them, under free names. */
    public static Edit duplicate(List<String> parts) {
        return Edit.of("duplicate " + several(parts), laid -> {
            List<Part> copied = copied(laid.design(), parts);
            return copied.isEmpty()
                    ? nothing("duplicate")
                    : pasted(
                            laid,
                            copied,
                            Optional.of(copied.get(copied.size() - 1).name()));
        });
    }

    private static <T> Outcome<T> nothing(String what) {
        return Outcome.failed(new Problem(Subject.DOCUMENT, "found no part to " + what, "at least one part"));
    }

    /**
     * Parts from elsewhere, one behind the other, each in the middle of what is free there; renamed where a name is taken. A
     * mirror folds the leg with an incidence of 10°, to the left.
     *
     * @param parts whose places count for nothing
     * @param after name of the part behind which they go; empty: at the end of the beam
     */
    public static Edit paste(List<Part> parts, Optional<String> after) {
        return Edit.of("paste " + several(parts.stream().map(Part::name).toList()), laid -> pasted(laid, parts, after));
    }

    private static Outcome<Design> pasted(Laid laid, List<Part> parts, Optional<String> after) {
        if (parts.isEmpty()) {
            return nothing("paste");
        }
        String behind = after.orElse(
                laid.design().parts().get(laid.design().parts().size() - 1).name());
        Outcome<Laid> now = Outcome.of(laid);
        for (Part part : parts) {
            String anchor = behind;
            String name = now.value()
                    .map(l -> FreeName.like(part.name(), Named.parts(l.design())))
                    .orElse(part.name());
            now = now.then(l -> Named.part(l.design(), anchor)
                    .then(i -> behind(l, i, part.named(name), Turn.LEFT))
                    .then(Layout::of));
            behind = name;
        }
        return now.then(l -> Outcome.of(l.design()));
    }

    /** The design with a part behind another. */
    private static Outcome<Design> behind(Laid laid, int index, Part part, Turn side) {
        Design design = laid.design();
        if (!(part instanceof Mirror mirror)) {
            return Placing.behind(design, index, part).then(PartEdits::tidy);
        }
        boolean end = index == design.parts().size() - 1 && design.shape() == Shape.STANDING_WAVE;
        int leg = Placing.leg(design, end ? index - 1 : index);
        double low = 0;
        double high = laid.legs().get(leg).path();
        for (Standing s : laid.legs().get(leg).parts()) {
            if (s.part() <= index) {
                low = s.end();
            } else {
                high = Math.min(high, s.start());
            }
        }
        return new Folding(laid).in(mirror, leg, (low + high) / 2, side).then(PartEdits::tidy);
    }

    /** A part under another name; everything that refers to it follows. */
    public static Edit rename(String part, String to) {
        return Edit.of("rename " + part, laid -> {
            Design design = laid.design();
            return Named.part(design, part).then(i -> {
                List<Part> parts = new ArrayList<>(design.parts());
                parts.set(i, parts.get(i).named(to.strip()));
                return Outcome.of(References.renamed(design.withParts(parts), part, to.strip()));
            });
        });
    }

    /**
     * Parts one step along the beam. A part that crosses a mirror goes to the neighbouring leg; mirrors that pass each other
     * stay where they are.
     *
     * @param down the beam, or up
     */
    public static Edit reorder(List<String> parts, boolean down) {
        return Edit.of("move " + several(parts) + (down ? " downstream" : " upstream"), laid -> {
            Design design = laid.design();
            List<Integer> indices = new ArrayList<>();
            for (int i = 0; i < design.parts().size(); i++) {
                if (parts.contains(design.parts().get(i).name())) {
                    indices.add(i);
                }
            }
            return indices.isEmpty()
                    ? nothing("move")
                    : Reordering.by(design, indices, down).then(PartEdits::tidy);
        });
    }

    /** A part elsewhere on its leg, as near to a path as its neighbours let it, m. */
    public static Edit slide(String part, double along) {
        return Edit.of("move " + part, laid -> slid(laid.design(), part, along));
    }

    static Outcome<Design> slid(Design design, String part, double along) {
        return Named.part(design, part)
                .then(i -> design.parts().get(i) instanceof Mirror
                        ? Outcome.failed(new Problem(
                                Subject.part(i), "found " + part + ", a mirror", "a part that stands on a leg"))
                        : Outcome.of(Placing.at(
                                design,
                                i,
                                Room.on(design, Placing.leg(design, i))
                                        .nearest(i, along)
                                        .orElse(along))));
    }
}
