package twofold.picture;

import java.util.List;
import twofold.cavity.EdgeCause;

/** Short names of what happens at a zone's edge, for places where {@link EdgeCause#words} does not fit. */
final class EdgeWords {
    private EdgeWords() {}

    /** Two names, the longer first. */
    static List<String> of(EdgeCause cause) {
        return switch (cause) {
            case FIRST_CENTRE_ON_LAST -> List.of("first centre on last", "A = 0");
            case ENDS_IMAGED -> List.of("ends imaged", "B = 0");
            case CENTRES_IMAGED -> List.of("centres imaged", "C = 0");
            case LAST_CENTRE_ON_FIRST -> List.of("last centre on first", "D = 0");
            case CLOSES_AT_ONCE -> List.of("closes after one", "half trace 1");
            case CLOSES_REVERSED -> List.of("closes after two", "half trace −1");
        };
    }
}
