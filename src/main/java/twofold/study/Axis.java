package twofold.study;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Arrays;
import twofold.design.Field;
import twofold.design.Lever;
import twofold.design.Unit;

/** A lever and the values that it takes, in order, in the SI unit of what it sets. */
public final class Axis {
    private final Lever lever;
    private final double[] values;

    private Axis(Lever lever, double[] values) {
        this.lever = lever;
        this.values = values;
    }

    /**
     * A lever over its whole range.
     *
     * @param points how many, evenly spread with both ends, at least 2; a list of values has its own
     */
    public static Axis of(Lever lever, int points) {
        if (lever.range() instanceof Lever.Range.Among among) {
            return new Axis(
                    lever,
                    among.values().stream().mapToDouble(Double::doubleValue).toArray());
        }
        Lever.Range.Span span = (Lever.Range.Span) lever.range();
        Unit unit = unit(lever);
        // Spread in the unit that people read, so that a step of 0.1 mm gives 0.3 and not 0.30000000000000004.
        BigDecimal from = new BigDecimal(unit.text(span.from()));
        BigDecimal all = new BigDecimal(unit.text(span.to())).subtract(from);
        BigDecimal steps = BigDecimal.valueOf(points - 1L);
        double[] values = new double[points];
        for (int i = 0; i < points; i++) {
            values[i] = unit.toSi(from.add(all.multiply(BigDecimal.valueOf(i)).divide(steps, MathContext.DECIMAL64)));
        }
        return new Axis(lever, values);
    }

    /** The same values from the smallest to the largest, each once. */
    public Axis ascending() {
        return new Axis(lever, Arrays.stream(values).sorted().distinct().toArray());
    }

    /** The lever. */
    public Lever lever() {
        return lever;
    }

    /** Whether the lever has these values and none between. */
    public boolean isList() {
        return lever.range() instanceof Lever.Range.Among;
    }

    /** The unit of the lever's values in files. */
    public Unit unit() {
        return unit(lever);
    }

    /** The unit of a lever's values in files. */
    public static Unit unit(Lever lever) {
        return Field.settableUnit(lever.set()).orElse(Unit.ONE);
    }

    /** How many values there are. */
    public int size() {
        return values.length;
    }

    /** A value, in SI. */
    public double value(int index) {
        return values[index];
    }
}
