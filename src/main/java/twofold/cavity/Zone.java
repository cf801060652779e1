package twofold.cavity;

import java.util.Optional;
import twofold.design.Edge;

/**
 * A range of a leg's path in which a plane is stable.
 *
 * @param lower where it begins; empty where it reaches down without end
 * @param upper where it ends; empty where it reaches up without end
 */
public record Zone(Optional<ZoneEdge> lower, Optional<ZoneEdge> upper) {
    /** One of its edges. */
    public Optional<ZoneEdge> edge(Edge which) {
        return which == Edge.LOWER ? lower : upper;
    }

    /** The path at which it begins, m; −∞ without an edge. */
    public double from() {
        return lower.map(ZoneEdge::path).orElse(Double.NEGATIVE_INFINITY);
    }

    /** The path at which it ends, m; +∞ without an edge. */
    public double to() {
        return upper.map(ZoneEdge::path).orElse(Double.POSITIVE_INFINITY);
    }
}
