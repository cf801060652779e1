package twofold.edit;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import twofold.design.Unit;

/**
 * What a person could state instead where a starting shape has no stable place: for each number, the value closest by ratio
 * with which there is one, all others staying.
 */
final class StartingNearby {
    private static final double RATIO = 1.25;
    private static final int MOST_STEPS = 16;
    private static final int HALVINGS = 10;
    private static final int MOST_NAMED = 3;

    private final StartingShape shape;
    private final StartingValues values;

    /**
     * A value that does.
     *
     * @param input which
     * @param value in SI, round enough to be typed
     * @param ratio how far it is from what was stated, at least 1
     */
    record Nearby(StartingInput input, double value, double ratio) {}

    private StartingNearby(StartingShape shape, StartingValues values) {
        this.shape = shape;
        this.values = values;
    }

    /** The closest values that do, at most three, the closest first. */
    static List<Nearby> of(StartingShape shape, StartingValues values) {
        StartingNearby nearby = new StartingNearby(shape, values);
        List<Nearby> all = new ArrayList<>();
        for (StartingInput input : shape.inputs()) {
            if (input != StartingInput.WAVELENGTH
                    && shape.uses(input, values)
                    && values.find(input).isPresent()) {
                nearby.along(input).ifPresent(all::add);
            }
        }
        return all.stream()
                .sorted(Comparator.comparingDouble(Nearby::ratio))
                .limit(MOST_NAMED)
                .toList();
    }

    /** In words: "radius of Fold 120.00 mm, or crystal length 3.20 mm". */
    static String words(List<Nearby> nearby) {
        return nearby.isEmpty()
                ? "other values; changing one alone by up to " + Math.round(Math.pow(RATIO, MOST_STEPS))
                        + " times does not do"
                : nearby.stream()
                        .map(n -> n.input().words() + " " + n.input().shown(n.value()))
                        .collect(Collectors.joining(", or "));
    }

    private boolean does(StartingInput input, double value) {
        StartingValues other = values.with(input, value);
        return shape.problems(other).isEmpty()
                && StartingSearch.of(shape, other).value().isPresent();
    }

    private Optional<Nearby> along(StartingInput input) {
        double stated = values.number(input);
        // A flat mirror is taken for one of 1 m, from which to look both ways.
        double from = Double.isInfinite(stated) ? 1 : Math.abs(stated);
        boolean convex = stated < 0;
        for (int i = Double.isInfinite(stated) || convex ? 0 : 1; i <= MOST_STEPS; i++) {
            for (int way : new int[] {1, -1}) {
                double good = from * Math.pow(RATIO, way * i);
                if (does(input, good)) {
                    double bad = i == 0 ? good : from * Math.pow(RATIO, way * (i - 1));
                    double round = closer(input, good, bad);
                    return does(input, round)
                            ? Optional.of(new Nearby(input, round, Math.pow(RATIO, i)))
                            : Optional.empty();
                }
            }
        }
        return Optional.empty();
    }

    /** As close to the value that does not as can be told in round numbers. */
    private double closer(StartingInput input, double works, double fails) {
        double good = works;
        double bad = fails;
        for (int i = 0; i < HALVINGS; i++) {
            double middle = (good + bad) / 2;
            if (does(input, middle)) {
                good = middle;
            } else {
                bad = middle;
            }
        }
        return round(input.unit(), good, good > bad ? RoundingMode.CEILING : RoundingMode.FLOOR);
    }

    private static double round(Unit unit, double si, RoundingMode mode) {
        return unit.toSi(BigDecimal.valueOf(unit.fromSi(si)).setScale(2, mode));
    }
}
