package twofold.study;

import java.util.List;
import java.util.function.DoubleUnaryOperator;
import java.util.function.Function;
import twofold.cavity.Chain;
import twofold.cavity.Reading;
import twofold.cavity.Sweeper;
import twofold.design.Lever;
import twofold.layout.Laid;

/**
 * The worst value of a reading over a lever's whole range: at 401 points, and between them wherever a point is worse than
 * its neighbours, by golden section.
 */
public final class WorstOver implements Sweeper {
    private static final int POINTS = 401;

    /** Golden sections, each of which leaves 0.618: a place is found to 1e-7 of a step, the worst value to its square. */
    private static final int SECTIONS = 34;

    private static final double GOLDEN = (Math.sqrt(5) - 1) / 2;

    private final Laid laid;

    /** For levers and readings of a design. */
    public WorstOver(Laid laid) {
        this.laid = laid;
    }

    @Override
    public double worst(Lever lever, Function<Chain, Reading> reading, DoubleUnaryOperator goodness) {
        Range range = new Range(lever, reading, goodness);
        Axis axis = Axis.of(lever, POINTS);
        double[] good = new double[axis.size()];
        double worst = Double.NaN;
        double least = Double.POSITIVE_INFINITY;
        for (int i = 0; i < good.length; i++) {
            double value = range.value(axis.value(i));
            good[i] = goodness.applyAsDouble(value);
            if (Double.isNaN(good[i])) {
                return Double.NaN;
            }
            if (good[i] < least) {
                least = good[i];
                worst = value;
            }
        }
        if (lever.range() instanceof Lever.Range.Among) {
            return worst;
        }
        for (int i = 0; i < good.length; i++) {
            int before = Math.max(0, i - 1);
            int after = Math.min(good.length - 1, i + 1);
            if (good[i] <= good[before] && good[i] <= good[after]) {
                double value = range.refined(axis.value(before), axis.value(after));
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

    /** A lever's range with a reading, on one asker. */
    private final class Range {
        private final DoubleUnaryOperator goodness;
        private final Asker asker;
        private final double[] at = new double[1];
        private final double[] answer = new double[1];

        Range(Lever lever, Function<Chain, Reading> reading, DoubleUnaryOperator goodness) {
            this.goodness = goodness;
            this.asker = Asker.of(laid, List.of(lever), List.of(reading));
        }

        double value(double lever) {
            at[0] = lever;
            asker.ask(at, answer, 0);
            return answer[0];
        }

        /** The worst value between two places of the lever, near a worst point between them. */
        double refined(double from, double to) {
            double a = from;
            double b = to;
            double c = b - GOLDEN * (b - a);
            double d = a + GOLDEN * (b - a);
            double atC = value(c);
            double atD = value(d);
            for (int i = 0; i < SECTIONS; i++) {
                if (Double.isNaN(atC) || Double.isNaN(atD)) {
                    return Double.NaN;
                }
                if (goodness.applyAsDouble(atC) < goodness.applyAsDouble(atD)) {
                    b = d;
                    d = c;
                    atD = atC;
                    c = b - GOLDEN * (b - a);
                    atC = value(c);
                } else {
                    a = c;
                    c = d;
                    atC = atD;
                    d = a + GOLDEN * (b - a);
                    atD = value(d);
                }
            }
            return goodness.applyAsDouble(atC) < goodness.applyAsDouble(atD) ? atC : atD;
        }
    }
}
