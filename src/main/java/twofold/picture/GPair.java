package twofold.picture;

import java.util.Optional;
import twofold.cavity.Eigenmode;

/**
 * A point of the diagram of standing waves: A and D of the one-way matrix between the middles of the end mirrors, their
 * curvatures included. Of two mirrors alone they are 1 − L/R1 and 1 − L/R2 (Kogelnik &amp; Li, Appl. Opt. 5, 1550 (1966));
 * stable where 0 &lt; G1 G2 &lt; 1.
 *
 * @param g1 A
 * @param g2 D
 */
public record GPair(double g1, double g2) {
    /** The point of a plane; empty for a ring. */
    public static Optional<GPair> of(Eigenmode mode) {
        return mode.oneWay().map(m -> new GPair(m.a(), m.d()));
    }
}
