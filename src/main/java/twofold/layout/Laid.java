package twofold.layout;

import java.util.List;
import java.util.Map;
import twofold.design.Design;

/**
 * A design laid out on the table, free of problems.
 *
 * @param design what was laid out
 * @param legs in beam order; of a ring the last leads back to the first mirror
 * @param incidence at each mirror by its index among the parts, rad; 0 at the ends of a standing wave
 */
public record Laid(Design design, List<Leg> legs, Map<Integer, Double> incidence) {
    /** Copies the collections. */
    public Laid {
        legs = List.copyOf(legs);
        incidence = Map.copyOf(incidence);
    }
}
