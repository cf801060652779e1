package twofold.design;

import java.util.Optional;

/**
 * A quantity with a bound.
 *
 * @param what the quantity
 * @param at where it is read; empty for the whole cavity
 * @param plane of a quantity that has one
 * @param edge of a quantity that needs one
 * @param bound what is asked
 * @param over name of a lever over whose whole range the worst value counts
 */
public record Requirement(
        Quantity what,
        Optional<Place> at,
        Optional<Planes> plane,
        Optional<Edge> edge,
        Bound bound,
        Optional<String> over) {}
