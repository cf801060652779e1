package twofold.layout;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;

/**
 * A way in which a ring is its own mirror image: mirror k is the image of mirror {@code sum − k}, counted round the ring.
 *
 * @param sum of the numbers of a mirror and its image
 * @param mirrors how many there are
 */
record Symmetry(int sum, int mirrors) {
    /** How far images may differ, m and rad: a thousandth of a millimetre, the rounding of plans that people write down. */
    private static final double ALIKE = 1e-6;

    /** The image of a mirror. */
    int mirror(int k) {
        return Math.floorMod(sum - k, mirrors);
    }

    /** The image of a leg. */
    int leg(int k) {
        return Math.floorMod(sum - k - 1, mirrors);
    }

    /** The one of a ring that leaves most of what is set where it is; empty where the ring has none. */
    static Optional<Symmetry> of(Plan plan, List<Knob> knobs) {
        if (!plan.isRing()) {
            return Optional.empty();
        }
        return IntStream.range(0, plan.mirrors())
                .mapToObj(sum -> new Symmetry(sum, plan.mirrors()))
                .filter(s -> s.isOf(plan))
                .max(Comparator.comparingLong(
                        s -> knobs.stream().filter(s::keeps).count()));
    }

    private boolean isOf(Plan plan) {
        return IntStream.range(0, mirrors)
                .allMatch(k -> Math.abs(plan.path(k) - plan.path(leg(k))) < ALIKE
                        && Math.abs(plan.incidence(k) - plan.incidence(mirror(k))) < ALIKE);
    }

    private boolean keeps(Knob knob) {
        if (knob.target() instanceof Target.Leg leg) {
            return leg(leg.leg()) == leg.leg();
        }
        return knob.target() instanceof Target.Incidence fold && mirror(fold.mirror()) == fold.mirror();
    }
}
