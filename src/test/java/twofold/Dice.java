package twofold;

import java.util.List;
import java.util.SplittableRandom;

/** Random choices from one fixed seed. Half of all numbers are round, as people type them, half use every bit. */
final class Dice {
    private final SplittableRandom random;

    Dice(long seed) {
        random = new SplittableRandom(seed);
    }

    boolean chance(double probability) {
        return random.nextDouble() < probability;
    }

    int count(int least, int most) {
        return random.nextInt(least, most + 1);
    }

    double any(double low, double high) {
        return low + (high - low) * random.nextDouble();
    }

    /** Between two numbers, half of the time with so many decimals in the unit given. */
    double number(double low, double high, twofold.design.Unit unit, int decimals) {
        double raw = any(low, high);
        if (chance(0.5)) {
            return raw;
        }
        double round = unit.toSi(
                java.math.BigDecimal.valueOf(unit.fromSi(raw)).setScale(decimals, java.math.RoundingMode.HALF_EVEN));
        return round >= low && round <= high ? round : raw;
    }

    /** A length in m, evenly spread over its logarithm. */
    double length(double low, double high) {
        double log = Math.exp(any(Math.log(low), Math.log(high)));
        return number(log, Math.min(high, log * 1.1), twofold.design.Unit.MM, 2);
    }

    double sign() {
        return chance(0.5) ? 1 : -1;
    }

    <T> T of(List<T> list) {
        return list.get(random.nextInt(list.size()));
    }
}
