package twofold.edit;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import twofold.design.Design;
import twofold.design.Hold;
import twofold.design.Place;
import twofold.layout.Outcome;

/** Holds as locks: closed or open. A hold of a leg is the same whichever of its mirrors is named first. */
public final class HoldEdits {
    private HoldEdits() {}

    /** Whether a design holds it. */
    public static boolean isHeld(Design design, Hold hold) {
        return design.holds().stream().anyMatch(h -> isSame(h, hold));
    }

    /** The edit that closes an open lock, or opens a closed one. */
    public static Edit toggle(Design now, Hold hold) {
        return isHeld(now, hold) ? release(hold) : hold(hold);
    }

    /** A value kept while mirrors move; where it is held already, nothing changes. */
    public static Edit hold(Hold hold) {
        return Edit.of("hold " + hold.words(), laid -> {
            List<Hold> holds = new ArrayList<>(laid.design().holds());
            if (!isHeld(laid.design(), hold)) {
                holds.add(hold);
            }
            return Outcome.of(laid.design().withHolds(holds));
        });
    }

    /** A value no longer kept. */
    public static Edit release(Hold hold) {
        return Edit.of(
                "release " + hold.words(),
                laid -> Outcome.of(laid.design()
                        .withHolds(laid.design().holds().stream()
                                .filter(h -> !isSame(h, hold))
                                .toList())));
    }

    private static boolean isSame(Hold a, Hold b) {
        return a.equals(b)
                || (a.getClass() == b.getClass()
                        && leg(a).isPresent()
                        && leg(a).map(HoldEdits::turned).equals(leg(b)));
    }

    private static Optional<Place> leg(Hold hold) {
        if (hold instanceof Hold.Leg h) {
            return Optional.of(h.leg());
        }
        return hold instanceof Hold.Direction h ? Optional.of(h.leg()) : Optional.empty();
    }

    private static Place turned(Place leg) {
        return leg.second().map(s -> new Place(s, Optional.of(leg.first()))).orElse(leg);
    }
}
