package twofold.edit;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Kind;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.design.Turn;
import twofold.design.Unit;
import twofold.design.Values;
import twofold.layout.Layout;
import twofold.layout.Outcome;
import twofold.layout.Typed;

/**
 * Legs and incidences of a plan without anything between its mirrors.
 *
 * @param isRing whether the last leg leads back to the first mirror
 * @param legs m
 * @param angles of incidence at the mirror after each leg, rad; of a ring the last at the first mirror
 * @param turns the way the beam turns there; of a ring, empty where it is not stated
 * @param radii of all mirrors from the first, m
 */
record ListedPlan(
        boolean isRing, List<Double> legs, List<Double> angles, List<Optional<Turn>> turns, List<Double> radii) {
    /** Copies the lists. */
    ListedPlan {
        legs = List.copyOf(legs);
        angles = List.copyOf(angles);
        turns = List.copyOf(turns);
        radii = List.copyOf(radii);
    }

    /** The plan of a text without faults. */
    static ListedPlan of(ListText list) {
        List<Double> legs = list.legs().stream().map(ListText.Entered::si).toList();
        List<Double> angles = list.angles().stream().map(ListText.Entered::si).toList();
        boolean ring = angles.size() == legs.size();
        List<Optional<Turn>> turns = new ArrayList<>();
        Turn before = Turn.RIGHT;
        for (ListText.Entered angle : list.angles()) {
            Turn other = before == Turn.LEFT ? Turn.RIGHT : Turn.LEFT;
            before = angle.turn().orElse(other);
            turns.add(ring ? angle.turn() : Optional.of(before));
        }
        return new ListedPlan(ring, legs, angles, turns, radii(list, ring));
    }

    private static List<Double> radii(ListText list, boolean ring) {
        int mirrors = ring ? list.legs().size() : list.legs().size() + 1;
        List<Double> stated = list.radii().stream().map(ListText.Entered::si).toList();
        boolean all = stated.size() == mirrors;
        return IntStream.range(0, mirrors)
                .mapToObj(m -> {
                    if (all) {
                        return stated.get(m);
                    }
                    boolean folds = ring || (m > 0 && m < mirrors - 1);
                    if (stated.isEmpty() || !folds) {
                        return Double.POSITIVE_INFINITY;
                    }
                    return stated.size() == 1 ? stated.get(0) : stated.get(m - 1);
                })
                .toList();
    }

    private String name(int mirror) {
        if (isRing) {
            return "Mirror " + (mirror + 1);
        }
        int last = radii.size() - 1;
        if (mirror == 0 || mirror == last) {
            return mirror == 0 ? "End A" : "End B";
        }
        return last == 2 ? "Fold" : "Fold " + mirror;
    }

    /** The design, its first mirror at the origin, its first leg along +x; of a ring, as typed up to the last mirror. */
    Outcome<Design> design(double wavelength) {
        List<Part> mirrors = new ArrayList<>();
        Map<Integer, Typed> typed = new HashMap<>();
        for (int m = 0; m < radii.size(); m++) {
            Values values = Values.NONE.with(Field.AT, new Point(0, 0)).with(Field.ROC, (Object) radii.get(m));
            mirrors.add(Kind.MIRROR.part(name(m), values));
            boolean folds = m > 0 && m - 1 < angles.size();
            typed.put(
                    m,
                    new Typed(
                            m > 0 ? OptionalDouble.of(legs.get(m - 1)) : OptionalDouble.empty(),
                            folds ? OptionalDouble.of(angles.get(m - 1)) : OptionalDouble.empty(),
                            folds ? turns.get(m - 1) : Optional.empty(),
                            OptionalDouble.empty()));
        }
        Shape shape = isRing ? Shape.RING : Shape.STANDING_WAVE;
        return Layout.typed(Design.of("From a list", wavelength, shape, mirrors), typed);
    }

    /** As it may be typed: lengths to 0.0001 mm, angles to 0.0001°. */
    String text() {
        String folds = IntStream.range(0, angles.size())
                .mapToObj(i -> fine(Unit.DEG, angles.get(i)) + "°"
                        + turns.get(i).map(t -> t == Turn.LEFT ? " L" : " R").orElse(""))
                .collect(Collectors.joining(", "));
        boolean flat = radii.stream().allMatch(r -> Double.isInfinite(r));
        String curved = radii.stream()
                .map(r -> Double.isInfinite(r) ? "flat" : Unit.MM.text(r))
                .collect(Collectors.joining(", "));
        return legs.stream().map(l -> fine(Unit.MM, l)).collect(Collectors.joining(", ")) + "; " + folds
                + (flat ? "" : "; " + curved);
    }

    private static String fine(Unit unit, double si) {
        return Unit.fixed(unit.fromSi(si), 4).replaceFirst("\\.?0+$", "");
    }
}
