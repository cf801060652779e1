package twofold.edit;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Arrays;
import java.util.List;
import twofold.design.Bound;
import twofold.design.Quantity;
import twofold.design.Unit;

/** The kinds of bound that a requirement can have, and how one is made of another. */
public enum BoundKind {
    /** At least a value. */
    AT_LEAST("at least"),
    /** At most a value. */
    AT_MOST("at most"),
    /** From one value to another. */
    BETWEEN("between"),
    /** A value, give or take another. */
    EQUALS("equals"),
    /** A wish. */
    SMALLEST("smallest wished"),
    /** A wish. */
    LARGEST("largest wished");

    /** Digits of a number to begin with. */
    private static final int DIGITS = 3;

    /** How wide a bound is to begin with, as a share of its value. */
    private static final double WIDTH = 0.1;

    private final String words;

    BoundKind(String words) {
        this.words = words;
    }

    /** In words. */
    public String words() {
        return words;
    }

    /** A bound's kind. */
    public static BoundKind of(Bound bound) {
        if (bound instanceof Bound.AtLeast) {
            return AT_LEAST;
        } else if (bound instanceof Bound.AtMost) {
            return AT_MOST;
        } else if (bound instanceof Bound.Between) {
            return BETWEEN;
        } else if (bound instanceof Bound.Equal) {
            return EQUALS;
        }
        return bound == Bound.Prefer.SMALLEST ? SMALLEST : LARGEST;
    }

    /** Which kind a quantity is asked by to begin with: what has a sign about nothing, what is lost at most, all else at least. */
    public static BoundKind usual(Quantity what) {
        return switch (what) {
            case HALF_TRACE, WAIST_OFFSET, WAIST_OFFSET_RAYLEIGHS, WAIST_SPLIT, ZONE_EDGE_SPLIT -> BETWEEN;
            case CLIP_LOSS, PLAN_WIDTH, PLAN_DEPTH -> AT_MOST;
            case LEG, DISTANCE, ROUND_TRIP, FSR, INCIDENCE, GOUY -> EQUALS;
            case STABILITY_MARGIN, RADIUS, WAIST_RADIUS, ROUNDNESS, FOCUS_RATIO, ZONE_OVERLAP, CLEARANCE -> AT_LEAST;
        };
    }

    /**
     * A bound to begin with, which the present values meet: to be typed over.
     *
     * @param now the present value in each plane that counts, in SI; NaN where it is undefined
     */
    public static Bound starting(Quantity what, List<Double> now) {
        Unit unit = what.unit();
        double[] values =
                now.stream().mapToDouble(v -> v).filter(v -> !Double.isNaN(v)).toArray();
        double least = Arrays.stream(values).min().orElse(0);
        double most = Arrays.stream(values).max().orElse(0);
        return switch (usual(what)) {
            case AT_LEAST -> new Bound.AtLeast(round(unit, least, RoundingMode.FLOOR));
            case AT_MOST -> new Bound.AtMost(round(unit, most, RoundingMode.CEILING));
            case BETWEEN -> {
                double far = Math.max(Math.abs(least), Math.abs(most));
                double reach = far == 0 ? unit.toSi(1) : round(unit, far, RoundingMode.CEILING);
                yield new Bound.Between(-reach, reach);
            }
            case EQUALS -> {
                double middle = round(unit, (least + most) / 2, RoundingMode.HALF_EVEN);
                double off = Math.max(most - middle, middle - least);
                yield new Bound.Equal(middle, Math.max(width(unit, middle), round(unit, off, RoundingMode.CEILING)));
            }
            case SMALLEST -> Bound.Prefer.SMALLEST;
            case LARGEST -> Bound.Prefer.LARGEST;
        };
    }

    private static Bound equal(Unit unit, double value, double about) {
        return new Bound.Equal(value, width(unit, about));
    }

    /** A tenth of a value, or one unit of nothing. */
    private static double width(Unit unit, double about) {
        return about == 0 ? unit.toSi(1) : round(unit, WIDTH * Math.abs(about), RoundingMode.CEILING);
    }

    private static double round(Unit unit, double si, RoundingMode mode) {
        return si == 0 || !Double.isFinite(si)
                ? 0
                : unit.toSi(BigDecimal.valueOf(unit.fromSi(si)).round(new MathContext(DIGITS, mode)));
    }

    /**
     * A bound of this kind that asks for about the same.
     *
     * @param was the bound before
     * @param now the present value in SI, for what a wish had no number for; NaN where it is undefined
     */
    public Bound like(Bound was, Quantity what, double now) {
        Unit unit = what.unit();
        double value = Double.isNaN(now) ? 0 : round(unit, now, RoundingMode.HALF_EVEN);
        double low = was.least().orElse(was.most().orElse(value));
        double high = was.most().orElse(was.least().orElse(value));
        return switch (this) {
            case AT_LEAST -> new Bound.AtLeast(low);
            case AT_MOST -> new Bound.AtMost(high);
            case BETWEEN ->
                low < high
                        ? new Bound.Between(low, high)
                        : was.most().isPresent()
                                ? new Bound.Between(high - width(unit, high), high)
                                : new Bound.Between(low, low + width(unit, low));
            case EQUALS -> low < high ? new Bound.Equal((low + high) / 2, (high - low) / 2) : equal(unit, low, low);
            case SMALLEST -> Bound.Prefer.SMALLEST;
            case LARGEST -> Bound.Prefer.LARGEST;
        };
    }
}
