package twofold.layout;

import java.util.Optional;
import java.util.OptionalDouble;
import twofold.design.Turn;

/**
 * What a person typed for a mirror instead of its position.
 *
 * @param leg path from the mirror before, m; empty where the mirror gives its position, or is the first
 * @param incidence at this mirror, rad; needed where the next mirror gives a leg
 * @param turn the way the beam turns here; empty only at normal incidence
 * @param heading of the first leg, rad, on the first mirror; empty: along +x
 */
public record Typed(OptionalDouble leg, OptionalDouble incidence, Optional<Turn> turn, OptionalDouble heading) {}
