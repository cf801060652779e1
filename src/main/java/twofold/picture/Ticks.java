package twofold.picture;

import java.util.ArrayList;
import java.util.List;

/**
 * Round numbers along an axis: multiples of 1, 2 or 5 times a power of ten.
 *
 * @param step from tick to tick
 * @param values of the ticks
 */
record Ticks(double step, List<Double> values) {
    /** Beyond these, numbers are written with a power of ten. */
    private static final double LARGEST = 1e6;

    private static final double SMALLEST = 1e-5;

    /**
     * Ticks within a range.
     *
     * @param from where the axis begins
     * @param to where it ends, above {@code from}
     * @param most how many there is room for, at least 1
     */
    static Ticks within(double from, double to, int most) {
        double step = Nice.tick((to - from) / Math.max(1, most));
        double slack = 1e-6 * step;
        List<Double> values = new ArrayList<>();
        for (double n = Math.ceil((from - slack) / step); n * step <= to + slack; n++) {
            values.add(n * step + 0.0);
        }
        return new Ticks(step, values);
    }

    /** As many ticks as have room for their numbers side by side. */
    static Ticks along(Scale scale) {
        double length = Math.abs(scale.end() - scale.begin());
        for (int most = (int) (length / 24); most > 1; most--) {
            Ticks ticks = within(scale.from(), scale.to(), most);
            double widest = ticks.values().stream()
                    .mapToDouble(v -> Lettering.width(ticks.label(v), Type.SMALL))
                    .max()
                    .orElse(0);
            if (ticks.step() / (scale.to() - scale.from()) * length >= widest + 16) {
                return ticks;
            }
        }
        return within(scale.from(), scale.to(), 1);
    }

    /** As many ticks as have room for their numbers one above the other. */
    static Ticks up(Scale scale) {
        double length = Math.abs(scale.end() - scale.begin());
        return within(scale.from(), scale.to(), (int) Math.max(1, length / 24));
    }

    /** A tick's number, as short as all of them allow. */
    String label(double value) {
        double size = values.stream().mapToDouble(Math::abs).max().orElse(0);
        if (size >= LARGEST || step < SMALLEST) {
            return scientific(value, step);
        }
        return Figures.fixed(value, Nice.decimals(step));
    }

    /** A number between ticks, to a hundredth of their step. */
    String between(double value) {
        double fine = Nice.below(step) / 100;
        if (Math.abs(value) >= LARGEST || fine < SMALLEST / 100) {
            return scientific(value, fine);
        }
        return Figures.fixed(value, Nice.decimals(fine));
    }

    /** The same with its unit behind. */
    String between(double value, String unit) {
        return between(value) + (unit.isEmpty() || unit.equals("°") ? "" : " ") + unit;
    }

    private static String scientific(double value, double step) {
        if (value == 0) {
            return "0";
        }
        int exponent = (int) Math.floor(Math.log10(Math.abs(value)) + 1e-12);
        int digits = (int) Math.min(6, Math.max(0, exponent - Math.floor(Math.log10(step) + 1e-9)));
        String mantissa = Figures.tick(value / Math.pow(10, exponent), digits);
        return mantissa + "e" + Figures.fixed(exponent, 0);
    }
}
