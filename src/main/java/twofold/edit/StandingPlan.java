package twofold.edit;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import twofold.design.Design;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.design.Turn;
import twofold.layout.Layout;
import twofold.layout.Outcome;
import twofold.layout.Typed;

/**
 * A standing wave typed by legs and incidences.
 *
 * @param values wavelength and crystal
 * @param title of the design
 * @param names of the mirrors, along the beam
 * @param radii of the mirrors, m
 * @param legs their paths, m; that of the gap without meaning
 * @param gapLeg which leg is the gap
 * @param turns the way the beam turns at each fold
 */
record StandingPlan(
        StartingValues values,
        String title,
        List<String> names,
        List<Double> radii,
        List<Double> legs,
        int gapLeg,
        List<Turn> turns)
        implements StartingPlan {

    static StandingPlan twoMirrors(StartingValues v, String title) {
        return new StandingPlan(
                v,
                title,
                List.of("End A", "End B"),
                List.of(v.number(StartingInput.END_A), v.number(StartingInput.END_B)),
                List.of(0.0),
                0,
                List.of());
    }

    static StandingPlan vee(StartingValues v, String title) {
        return new StandingPlan(
                v,
                title,
                List.of("End A", "Fold", "End B"),
                List.of(v.number(StartingInput.END_A), v.number(StartingInput.FOLD), v.number(StartingInput.END_B)),
                List.of(v.number(StartingInput.ARM), 0.0),
                1,
                List.of(Turn.LEFT));
    }

    static StandingPlan fourMirrors(StartingValues v, String title, Turn second) {
        return new StandingPlan(
                v,
                title,
                List.of("End A", "Fold 1", "Fold 2", "End B"),
                List.of(
                        v.number(StartingInput.END_A),
                        v.number(StartingInput.FOLD_1),
                        v.number(StartingInput.FOLD_2),
                        v.number(StartingInput.END_B)),
                List.of(v.number(StartingInput.ARM_1), 0.0, v.number(StartingInput.ARM_2)),
                1,
                List.of(Turn.LEFT, second));
    }

    @Override
    public Outcome<Design> at(double incidence, double gap) {
        List<Part> parts = new ArrayList<>();
        Map<Integer, Typed> typed = new HashMap<>();
        for (int m = 0; m < names.size(); m++) {
            OptionalDouble leg =
                    m == 0 ? OptionalDouble.empty() : OptionalDouble.of(m - 1 == gapLeg ? gap : legs.get(m - 1));
            boolean folds = m > 0 && m < names.size() - 1;
            typed.put(
                    parts.size(),
                    new Typed(
                            leg,
                            folds ? OptionalDouble.of(incidence) : OptionalDouble.empty(),
                            folds ? Optional.of(turns.get(m - 1)) : Optional.empty(),
                            OptionalDouble.empty()));
            Mirror mirror = StartingPlan.mirror(names.get(m), new Point(0, 0), radii.get(m));
            parts.add(mirror);
            if (m == gapLeg && values.hasCrystal()) {
                parts.add(StartingPlan.crystal(values));
            }
        }
        double wavelength = values.number(StartingInput.WAVELENGTH);
        return Layout.typed(Design.of(title, wavelength, Shape.STANDING_WAVE, parts), typed);
    }

    @Override
    public Place crystalLeg() {
        return Place.of(names.get(gapLeg), names.get(gapLeg + 1));
    }

    @Override
    public List<String> folds() {
        return names.subList(1, names.size() - 1);
    }

    @Override
    public double begin() {
        double focus = radii.stream()
                .filter(r -> r > 0 && r < Double.POSITIVE_INFINITY)
                .mapToDouble(r -> r / 2)
                .sum();
        return StartingPlan.inside(values) + Math.max(focus, 1e-3);
    }
}
