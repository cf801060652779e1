package twofold.design;

/** What keeps the plan's present value while mirrors are moved. */
public sealed interface Hold {
    /** What it keeps, in words: "the leg End A/Fold 1". */
    String words();

    /** The path length of a leg. */
    record Leg(Place leg) implements Hold {
        @Override
        public String words() {
            return "the leg " + leg;
        }
    }

    /** The angle of incidence at a mirror. */
    record Incidence(String mirror) implements Hold {
        @Override
        public String words() {
            return "the incidence at " + mirror;
        }
    }

    /** The position of a mirror. */
    record Position(String mirror) implements Hold {
        @Override
        public String words() {
            return "the place of " + mirror;
        }
    }

    /** The heading of a leg. */
    record Direction(Place leg) implements Hold {
        @Override
        public String words() {
            return "the direction of " + leg;
        }
    }

    /** The optical round trip. */
    record RoundTrip() implements Hold {
        @Override
        public String words() {
            return "the round trip";
        }
    }
}
