package twofold;

import static org.assertj.core.api.Assertions.assertThat;

import twofold.cavity.Cavity;
import twofold.cavity.CrystalLine;
import twofold.cavity.Eigenmode;
import twofold.cavity.Face;
import twofold.cavity.State;
import twofold.cavity.Waist;
import twofold.design.Design;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.layout.Outcome;
import twofold.optics.Plane;

/**
 * A solved cavity, read by the names of its parts, SI.
 *
 * @param cavity the program's answer
 */
public record Solved(Cavity cavity) {

    /** Lays a design out and solves it; problems fail the test. */
    public static Solved of(Design design) {
        Outcome<Laid> laid = Layout.of(design);
        assertThat(laid.problems()).isEmpty();
        return new Solved(Cavity.solve(laid.value().orElseThrow()));
    }

    /** A plane's answer. */
    public Eigenmode mode(Plane plane) {
        return cavity.mode(plane);
    }

    /** Whether a plane has a mode. */
    public State state(Plane plane) {
        return mode(plane).state();
    }

    /** The beam's radius on a mirror, a lens or an aperture. */
    public double radius(String part, Plane plane) {
        return mode(plane).station(part(part), Face.SURFACE).orElseThrow().radius();
    }

    /** The waist on the stretch that begins at a part and ends at another; both the same inside a part. */
    public Waist waist(String from, String to, Plane plane) {
        return mode(plane).waists().stream()
                .filter(w -> w.from() == part(from) && w.to() == part(to))
                .findFirst()
                .orElseThrow();
    }

    /** The round-trip Gouy phase over a full turn. */
    public double gouyFraction(Plane plane) {
        return mode(plane).gouy() / (2 * Math.PI);
    }

    /** The angle of incidence at a mirror, °. */
    public double incidence(String mirror) {
        return Math.toDegrees(cavity.laid().incidence().getOrDefault(part(mirror), Double.NaN));
    }

    /** Where the waist lies in a crystal or plate. */
    public CrystalLine line(String part, Plane plane) {
        return cavity.line(part(part), plane).orElseThrow();
    }

    private int part(String name) {
        return cavity.laid().design().indexOf(name).orElseThrow();
    }
}
