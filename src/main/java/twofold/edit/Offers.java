package twofold.edit;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import twofold.design.Along;
import twofold.design.Bound;
import twofold.design.Design;
import twofold.design.Edge;
import twofold.design.FaceAngle;
import twofold.design.Field;
import twofold.design.Hold;
import twofold.design.Lever;
import twofold.design.Mirror;
import twofold.design.Names;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Planes;
import twofold.design.Quantity;
import twofold.design.Requirement;
import twofold.design.Shape;
import twofold.design.Tolerance;
import twofold.design.TwoPowers;
import twofold.design.Unit;
import twofold.layout.Laid;
import twofold.layout.Plan;
import twofold.layout.Standing;
import twofold.layout.Target;
import twofold.material.Material;
import twofold.material.Materials;

/**
 * What can be asked, set and held at a place of a design, for menus: exactly what the design's own rules accept there.
 */
public final class Offers {
    /** How far a new lever reaches to either side of the present value, as a share of it. */
    private static final double REACH = 0.1;

    private Offers() {}

    /** The legs, each as its two mirrors along the beam. */
    public static List<Place> legs(Design design) {
        List<String> mirrors = design.mirrors().stream().map(Mirror::name).toList();
        int count = mirrors.size();
        List<Place> legs = new ArrayList<>();
        for (int i = 0; i < (design.shape() == Shape.RING ? count : count - 1); i++) {
            legs.add(Place.of(mirrors.get(i), mirrors.get((i + 1) % count)));
        }
        return legs;
    }

    /**
     * The quantities that can be asked at a place.
     *
     * @param at a part, or two that follow each other; empty: of the whole cavity
     */
    public static List<Quantity> quantities(Design design, Optional<Place> at) {
        return Arrays.stream(Quantity.values())
                .filter(q -> design.problems(requirement(q, at, Bound.Prefer.LARGEST))
                        .isEmpty())
                .toList();
    }

    /** A requirement with what its quantity needs: in both planes, of the lower edge. */
    public static Requirement requirement(Quantity what, Optional<Place> at, Bound bound) {
        return new Requirement(
                what,
                at,
                what.hasPlane() ? Optional.of(Planes.BOTH) : Optional.empty(),
                what.hasEdge() ? Optional.of(Edge.LOWER) : Optional.empty(),
                bound,
                Optional.empty());
    }

    /** What a lever or tolerance can set at a place, by its JSON name. */
    public static List<String> settings(Design design, Place at) {
        return Field.settableNames().stream()
                .filter(set -> !set.equals(Field.CURVATURE.json()))
                .filter(set -> design
                        .withTolerances(List.of(new Tolerance(set, List.of(at), 0, false, Tolerance.Spread.UNIFORM)))
                        .problems()
                        .stream()
                        .noneMatch(p -> p.where().steps().get(0).equals("tolerances")))
                .toList();
    }

    /** The holds that can be set at a place; at none, that of the round trip. */
    public static List<Hold> holds(Design design, Optional<Place> at) {
        List<Hold> all = at.isEmpty()
                ? List.of(new Hold.RoundTrip())
                : at.get().second().isPresent()
                        ? List.of(new Hold.Leg(at.get()), new Hold.Direction(at.get()))
                        : List.of(
                                new Hold.Position(at.get().first()),
                                new Hold.Incidence(at.get().first()));
        return all.stream()
                .filter(h -> design.withHolds(List.of(h)).problems().stream()
                        .noneMatch(p -> p.where().steps().get(0).equals("holds")))
                .toList();
    }

    /** The names of all materials. */
    public static List<String> materialNames() {
        return Materials.standard().names();
    }

    /** The materials whose published index reaches the design's wavelength. */
    public static List<Material> materials(Design design) {
        Materials all = Materials.standard();
        return all.names().stream()
                .flatMap(n -> all.find(n).stream())
                .filter(m -> m.covers(design.wavelength()))
                .toList();
    }

    /** The present value of what can be set at a place, in SI; empty where there is none, as of what is absent. */
    public static OptionalDouble value(Laid laid, String set, Place at) {
        Optional<Target> target = Target.of(laid.design(), set, at);
        if (target.isPresent()) {
            return OptionalDouble.of(target.get().value(Plan.of(laid)));
        }
        int index = laid.design().indexOf(at.first()).orElse(-1);
        if (index < 0) {
            return OptionalDouble.empty();
        }
        Part part = laid.design().parts().get(index);
        Optional<Object> value =
                part.kind().field(set).flatMap(f -> part.values().find(f));
        if (value.isEmpty()) {
            return OptionalDouble.empty();
        }
        if (value.get() instanceof Double d) {
            return OptionalDouble.of(d);
        } else if (value.get() instanceof TwoPowers p) {
            return OptionalDouble.of(p.tangential());
        }
        Standing standing = laid.legs().stream()
                .flatMap(l -> l.parts().stream())
                .filter(s -> s.part() == index)
                .findFirst()
                .orElseThrow();
        return value.get() instanceof Along
                ? OptionalDouble.of(standing.middle())
                : value.get() instanceof FaceAngle ? OptionalDouble.of(standing.incidence()) : OptionalDouble.empty();
    }

    /**
     * A lever to begin with: a tenth to either side of the present value, in round numbers, under a free name.
     *
     * @param set one of {@link #settings}
     */
    public static Lever lever(Laid laid, String set, Place at) {
        Design design = laid.design();
        Unit unit = Field.settableUnit(set).orElseThrow(() -> new IllegalArgumentException(set));
        double now = value(laid, set, at).orElse(0);
        // Of what is 0, flat or absent, a tenth is nothing to begin with.
        double middle = Double.isFinite(now) && now != 0 ? now : unit.toSi(set.equals(Field.ROC.json()) ? 100 : 1);
        double reach = REACH * Math.abs(middle);
        double from = limited(design, set, at, rounded(unit, middle - reach), middle);
        double to = limited(design, set, at, rounded(unit, middle + reach), middle);
        String title = Field.title(set) + " " + at;
        String name = Names.accepts(title) ? title : set.replaceFirst("_.*", "");
        return new Lever(
                FreeName.like(name, design.levers().stream().map(Lever::name).toList()),
                set,
                List.of(at),
                new Lever.Range.Span(from, to),
                false);
    }

    /**
     * A tolerance to begin with, as workshops state them (common practice, no source): a hundredth of a radius, focal length or
     * pure number, 0.1 mm of any other length, 0.1° of an angle.
     *
     * @param set one of {@link #settings}
     */
    public static Tolerance tolerance(String set, Place at) {
        Unit unit = Field.settableUnit(set).orElseThrow(() -> new IllegalArgumentException(set));
        boolean relative = set.equals(Field.ROC.json())
                || set.equals(Field.FOCAL_LENGTH.json())
                || !(unit == Unit.MM || unit == Unit.DEG);
        return new Tolerance(set, List.of(at), relative ? 0.01 : unit.toSi(0.1), relative, Tolerance.Spread.UNIFORM);
    }

    private static double rounded(Unit unit, double si) {
        return unit.toSi(new BigDecimal(unit.fromSi(si)).round(new MathContext(4)));
    }

    /** A value where the design accepts it there, else another. */
    private static double limited(Design design, String set, Place at, double value, double other) {
        Lever lever = new Lever("lever", set, List.of(at), new Lever.Range.Among(List.of(value)), false);
        boolean good = design.withLevers(List.of(lever)).problems().stream()
                .noneMatch(p -> p.where().steps().get(0).equals("levers"));
        return good ? value : other;
    }
}
