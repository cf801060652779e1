package twofold.layout;

import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;

/** What else moves when one mirror is moved to a point. */
public enum Follow {
    /** Nothing; neighbours are aimed anew. */
    OTHERS_STAY("others stay"),
    /** Everything beyond moves parallel to itself; standing waves alone. */
    ARM_FOLLOWS("arm follows"),
    /** Everything beyond turns with the leg before, as a rigid whole; standing waves alone. */
    ARM_SWINGS("arm swings"),
    /** The mirror's partner moves as its mirror image does; symmetric rings and X-folds alone. */
    MIRRORED_PARTNER("mirrored partner");

    private final String words;

    Follow(String words) {
        this.words = words;
    }

    /** In words. */
    public String words() {
        return words;
    }

    /** What a plan allows, the usual one first. */
    public static List<Follow> allowed(Laid laid) {
        Plan plan = Plan.of(laid);
        boolean partners = Partner.of(plan, 0).isPresent();
        if (plan.isRing()) {
            return partners ? List.of(MIRRORED_PARTNER, OTHERS_STAY) : List.of(OTHERS_STAY);
        }
        return partners
                ? List.of(MIRRORED_PARTNER, ARM_FOLLOWS, ARM_SWINGS, OTHERS_STAY)
                : List.of(ARM_FOLLOWS, ARM_SWINGS, OTHERS_STAY);
    }

    /** The number of a mirror's partner, the mirror itself where it stands on the axis; empty in a plan without symmetry. */
    public static OptionalInt partner(Laid laid, int mirror) {
        return Partner.of(Plan.of(laid), mirror).stream()
                .mapToInt(Partner::mirror)
                .findFirst();
    }

    /**
     * A mirror's partner in a symmetric plan.
     *
     * @param mirror its number; the mirror itself where it stands on the axis
     * @param normalX of the axis, x of a unit vector
     * @param normalY of the axis
     */
    record Partner(int mirror, double normalX, double normalY) {
        /** The partner in a ring that is its own mirror image, or in a standing wave of two folds that turn the same way. */
        static Optional<Partner> of(Plan plan, int mirror) {
            int count = plan.mirrors();
            if (!plan.isRing()) {
                return count == 4 && plan.turn(1) * plan.turn(2) > 0
                        ? Optional.of(across(plan, count - 1 - mirror, 1, 2))
                        : Optional.empty();
            }
            return Symmetry.of(plan, List.of()).map(s -> {
                int other = s.mirror(0) == 0 ? 1 : 0;
                return across(plan, s.mirror(mirror), other, s.mirror(other));
            });
        }

        private static Partner across(Plan plan, int partner, int a, int b) {
            double dx = plan.x[b] - plan.x[a];
            double dy = plan.y[b] - plan.y[a];
            double length = Math.hypot(dx, dy);
            return new Partner(partner, dx / length, dy / length);
        }
    }
}
