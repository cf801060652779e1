package twofold.study;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import java.util.function.Function;
import twofold.cavity.Chain;
import twofold.cavity.Reading;
import twofold.design.Lever;
import twofold.layout.Laid;

/**
 * The worst value of a reading over a lever's whole range while other levers stand somewhere: at 401 points, and between
 * them wherever a point is worse than its neighbours, by golden section. Confined to a thread.
 */
final class Worst {
    private static final int POINTS = 401;

    /** Golden sections, each of which leaves 0.618: a place is found to 1e-7 of a step, the worst value to its square. */
    private static final int SECTIONS = 34;

    private static final double GOLDEN = (Math.sqrt(5) - 1) / 2;

    private final Axis axis;
    private final DoubleUnaryOperator goodness;
    private final Asker asker;
    /** Which of the others' values the asker's levers have; the last lever is the moved one. */
    private final int[] kept;

    private final double[] at;
    private final double[] answer = new double[1];
    private final double[] good;

    /**
     * @param others levers that stand somewhere; where the moved one is among them, its own range is what counts
     * @param lever that is moved
     * @param reading by the chain to read
     * @param goodness of a value, the less the worse; NaN where undefined, which is worst of all
     */
    Worst(Laid laid, List<Lever> others, Lever lever, Function<Chain, Reading> reading, DoubleUnaryOperator goodness) {
        this.goodness = goodness;
        List<Lever> levers = new ArrayList<>();
        List<Integer> indices = new ArrayList<>();
        for (int i = 0; i < others.size(); i++) {
            if (!others.get(i).equals(lever)) {
                levers.add(others.get(i));
                indices.add(i);
            }
        }
        levers.add(lever);
        kept = indices.stream().mapToInt(Integer::intValue).toArray();
        at = new double[levers.size()];
        asker = Asker.of(laid, levers, List.of(reading));
        axis = Axis.of(lever, POINTS);
        good = new double[axis.size()];
    }

    /**
     * The worst value, in SI; NaN where it is undefined anywhere in the range.
     *
     * @param others values of the other levers, in SI
     */
    double value(double... others) {
        for (int i = 0; i < kept.length; i++) {
            at[i] = others[kept[i]];
        }
        double worst = Double.NaN;
        double least = Double.POSITIVE_INFINITY;
        for (int i = 0; i < good.length; i++) {
            double value = read(axis.value(i));
            good[i] = goodness.applyAsDouble(value);
            if (Double.isNaN(good[i])) {
                return Double.NaN;
            }
            if (good[i] < least) {
                least = good[i];
                worst = value;
            }
        }
        if (axis.isList()) {
            return worst;
        }
        for (int i = 0; i < good.length; i++) {
            int before = Math.max(0, i - 1);
            int after = Math.min(good.length - 1, i + 1);
            if (good[i] <= good[before] && good[i] <= good[after]) {
                double value = refined(axis.value(before), axis.value(after));
                double here = goodness.applyAsDouble(value);
                if (Double.isNaN(here)) {
                    return Double.NaN;
                }
                if (here < least) {
                    least = here;
                    worst = value;
                }
            }
        }
        return worst;
    }

    private double read(double lever) {
        at[at.length - 1] = lever;
        asker.ask(at, answer, 0);
        return answer[0];
    }

    /** The worst value between two places of the lever, near a worst point between them. */
    private double refined(double from, double to) {
        double a = from;
        double b = to;
        double c = b - GOLDEN * (b - a);
        double d = a + GOLDEN * (b - a);
        double atC = read(c);
        double atD = read(d);
        for (int i = 0; i < SECTIONS; i++) {
            if (Double.isNaN(atC) || Double.isNaN(atD)) {
                return Double.NaN;
            }
            if (goodness.applyAsDouble(atC) < goodness.applyAsDouble(atD)) {
                b = d;
                d = c;
                atD = atC;
                c = b - GOLDEN * (b - a);
                atC = read(c);
            } else {
                a = c;
                c = d;
                atC = atD;
                d = a + GOLDEN * (b - a);
                atD = read(d);
            }
        }
        return goodness.applyAsDouble(atC) < goodness.applyAsDouble(atD) ? atC : atD;
    }
}
