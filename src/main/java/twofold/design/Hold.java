package twofold.design;

/** What keeps the plan's present value while mirrors are moved. */
public sealed interface Hold {
    /** The path length of a leg. */
    record Leg(Place leg) implements Hold {}

    /** The angle of incidence at a mirror. */
    record Incidence(String mirror) implements Hold {}

    /** The position of a mirror. */
    record Position(String mirror) implements Hold {}

    /** The heading of a leg. */
    record Direction(Place leg) implements Hold {}

    /** The optical round trip. */
    record RoundTrip() implements Hold {}
}
