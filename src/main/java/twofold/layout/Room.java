package twofold.layout;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.material.Materials;

/**
 * The room on one leg: which parts stand there and where, whether they fit or not, and where they would fit. For designs
 * under way from one that is laid out to another; mirrors stand where the design has them.
 *
 * <p>Paths in m from the surface of the mirror that the leg leaves, inside parts included.
 */
public final class Room {
    private final Design design;
    private final double path;
    private final List<Standing> parts;

    private Room(Design design, double path, List<Standing> parts) {
        this.design = design;
        this.path = path;
        this.parts = List.copyOf(parts);
    }

    /**
     * The room on a leg.
     *
     * @param design of which the first part is a mirror
     * @param leg its number along the beam
     */
    public static Room on(Design design, int leg) {
        List<Integer> mirrors = mirrors(design);
        int from = mirrors.get(leg);
        int to =
                leg + 1 < mirrors.size() ? mirrors.get(leg + 1) : design.parts().size();
        Glazing glazing = new Glazing(design.wavelength(), Materials.standard());
        List<Standing> loose = new ArrayList<>();
        for (int i = from + 1; i < to; i++) {
            loose.add(glazing.standing(i, design.parts().get(i)));
        }
        double path = path(place(design, from), place(design, mirrors.get((leg + 1) % mirrors.size())), loose);
        return new Room(
                design,
                path,
                loose.stream().map(s -> s.at(middle(design, s.part(), path))).toList());
    }

    /** The path of a leg between two points with parts on it, m; NaN where the parts shift the beam by more than that. */
    private static double path(Point a, Point b, List<Standing> parts) {
        double shift = parts.stream().mapToDouble(Standing::shift).sum();
        double advance = parts.stream().mapToDouble(Standing::advance).sum();
        double inside = parts.stream().mapToDouble(Standing::length).sum();
        return Aim.extent(b.x() - a.x(), b.y() - a.y(), shift) - advance + inside;
    }

    private static List<Integer> mirrors(Design design) {
        List<Integer> mirrors = new ArrayList<>();
        for (int i = 0; i < design.parts().size(); i++) {
            if (design.parts().get(i) instanceof Mirror) {
                mirrors.add(i);
            }
        }
        return mirrors;
    }

    private static Point place(Design design, int mirror) {
        return ((Mirror) design.parts().get(mirror)).at();
    }

    private static double middle(Design design, int part, double path) {
        Along along = along(design.parts().get(part));
        return along.inMiddle() ? path / 2 : along.path();
    }

    /** Where a part that is not a mirror is stated to stand. */
    public static Along along(Part part) {
        return part.values()
                .find(Field.ALONG)
                .map(Along.class::cast)
                .orElseThrow(() -> new IllegalArgumentException("a mirror stands on no leg"));
    }

    /** The path of the leg with all that stands on it, m; NaN where the mirrors are too close together for that. */
    public double path() {
        return path;
    }

    /** What stands on the leg, in beam order, where it is stated to stand; {@link Standing#part} is its index in the design. */
    public List<Standing> parts() {
        return parts;
    }

    /** The place between its neighbours, where they stand, that is nearest to the one wanted; empty where it does not fit. */
    public OptionalDouble nearest(int part, double wanted) {
        for (int i = 0; i < parts.size(); i++) {
            Standing s = parts.get(i);
            if (s.part() == part) {
                double low = (i == 0 ? 0 : parts.get(i - 1).end()) + s.length() / 2;
                double high = (i == parts.size() - 1 ? path : parts.get(i + 1).start()) - s.length() / 2;
                return low <= high + Layout.TOUCH
                        ? OptionalDouble.of(Math.max(0, Math.max(low, Math.min(high, wanted))))
                        : OptionalDouble.empty();
            }
        }
        throw new IllegalArgumentException("no part " + part + " on this leg");
    }

    /** The design with this leg's parts pushed only as far as they must be to fit; where they cannot, as it was. */
    public Design settled() {
        int count = parts.size();
        double[] middle = new double[count];
        double free = 0;
        for (int i = 0; i < count; i++) {
            double half = parts.get(i).length() / 2;
            middle[i] = Math.max(parts.get(i).middle(), free + half);
            free = middle[i] + half;
        }
        free = path;
        for (int i = count - 1; i >= 0; i--) {
            double half = parts.get(i).length() / 2;
            middle[i] = Math.min(middle[i], free - half);
            free = middle[i] - half;
        }
        if (!(free >= -Layout.TOUCH)) {
            return design;
        }
        List<Part> placed = new ArrayList<>(design.parts());
        for (int i = 0; i < count; i++) {
            if (Math.abs(middle[i] - parts.get(i).middle()) > Layout.TOUCH / 2) {
                int part = parts.get(i).part();
                placed.set(part, placed.get(part).with(Field.ALONG, Along.at(Math.max(0, middle[i]))));
            }
        }
        return design.withParts(placed);
    }

    /** The design with the parts of every leg {@link #settled()}. */
    public static Design settled(Design design) {
        int mirrors = mirrors(design).size();
        Design settled = design;
        for (int leg = 0; leg < (design.shape() == Shape.RING ? mirrors : mirrors - 1); leg++) {
            settled = on(settled, leg).settled();
        }
        return settled;
    }
}
