package twofold.cavity;

import java.util.List;
import twofold.optics.Plane;

/**
 * What happens at the edge of a stability zone. Of a standing wave, with the one-way matrix (A, B, C, D) between the
 * middles of its end mirrors, the half trace is 2AD − 1 = 2BC + 1, and the edges are the simple roots of A, B, C and D
 * (Magni, Appl. Opt. 25, 107 (1986) names them so for one lens between two mirrors); a root that two of them share only
 * touches. A ring has no such factors: there the half trace passes 1 or −1.
 */
public enum EdgeCause {
    /** B = 0. */
    ENDS_IMAGED("the end mirrors are imaged on each other"),
    /** C = 0. */
    CENTRES_IMAGED("the end mirrors' centres of curvature are imaged on each other"),
    /** A = 0. */
    FIRST_CENTRE_ON_LAST("the first mirror's centre of curvature is imaged on the last mirror"),
    /** D = 0. */
    LAST_CENTRE_ON_FIRST("the last mirror's centre of curvature is imaged on the first mirror"),
    /** The half trace of a ring passes 1. */
    CLOSES_AT_ONCE("rays close after one round trip"),
    /** The half trace of a ring passes −1. */
    CLOSES_REVERSED("rays close after two round trips");

    private final String words;

    EdgeCause(String words) {
        this.words = words;
    }

    /** What happens there, in words. A flat mirror has its centre of curvature at infinity. */
    public String words() {
        return words;
    }

    /** The causes that a cavity can have. */
    public static List<EdgeCause> of(Chain chain) {
        return chain.ring
                ? List.of(CLOSES_AT_ONCE, CLOSES_REVERSED)
                : List.of(FIRST_CENTRE_ON_LAST, ENDS_IMAGED, CENTRES_IMAGED, LAST_CENTRE_ON_FIRST);
    }

    /**
     * The number that is 0 at such an edge and changes sign there, along whatever is varied: an element of the one-way
     * matrix, in m, 1/m or none, or the half trace's distance from ±1.
     *
     * @param trial after a run
     */
    public double of(Trial trial, Plane plane) {
        return switch (this) {
            case FIRST_CENTRE_ON_LAST -> trial.way(plane, 0);
            case ENDS_IMAGED -> trial.way(plane, 1);
            case CENTRES_IMAGED -> trial.way(plane, 2);
            case LAST_CENTRE_ON_FIRST -> trial.way(plane, 3);
            case CLOSES_AT_ONCE -> trial.halfTrace(plane) - 1;
            case CLOSES_REVERSED -> trial.halfTrace(plane) + 1;
        };
    }

    /** What that number would be if nothing in it cancelled, which bounds its rounding. */
    double growth(Trial grown, Plane plane) {
        return switch (this) {
            case FIRST_CENTRE_ON_LAST, ENDS_IMAGED, CENTRES_IMAGED, LAST_CENTRE_ON_FIRST -> of(grown, plane);
            case CLOSES_AT_ONCE, CLOSES_REVERSED -> 1 + Math.abs(grown.halfTrace(plane));
        };
    }
}
