package twofold.cavity;

/**
 * An edge of a stability zone along the path of a leg.
 *
 * @param cause what happens there
 * @param rank which of the places where that happens, from 0 at the shortest path; above 0 only where a lens stays in the
 *     middle of the leg
 * @param path of the leg there, inside parts included, m; below what the parts take where no mirror could go
 */
public record ZoneEdge(EdgeCause cause, int rank, double path) {
    /** Whether the same happens at both, in whichever plane: that they are one edge, followed by identity. */
    public boolean isSameAs(ZoneEdge other) {
        return cause == other.cause && rank == other.rank;
    }
}
