package twofold.cavity;

import java.util.Optional;
import twofold.design.Kind;
import twofold.design.Place;
import twofold.design.Shape;
import twofold.optics.Plane;

/**
 * A stretch of the chain without focusing, on which the light of each plane has one waist: in the air behind a station,
 * or inside a slab.
 *
 * @param chain that it belongs to
 * @param station whose prefix it is read from: the one that it begins at
 * @param slab index of the slab that it is inside; −1 in the air
 * @param behindLens whether it begins at the lens in the slab's middle
 */
record Stretch(Chain chain, int station, int slab, boolean behindLens) {
    private static final int AIR = -1;

    /** In the air behind a part. */
    static Stretch behind(Chain chain, int part) {
        boolean twoFaces = chain.kind[part].isSlab() || chain.kind[part] == Kind.MATRIX;
        return new Stretch(chain, chain.station(part, twoFaces ? Face.EXIT : Face.SURFACE), AIR, false);
    }

    /** Inside a slab from its entry face on, or up to the lens in its middle. */
    static Stretch inside(Chain chain, int slab) {
        return new Stretch(chain, chain.station(slab, Face.ENTRY), slab, false);
    }

    /** Inside a slab behind the lens in its middle. */
    static Stretch insideBehindLens(Chain chain, int slab) {
        return new Stretch(chain, chain.station(slab, Face.ENTRY), slab, true);
    }

    /**
     * A slab, or two parts between which there is nothing but air and apertures.
     *
     * @throws IllegalArgumentException with words for any other place
     */
    static Stretch at(Chain chain, Place place) {
        int a = chain.part(place.first());
        Optional<Integer> other = place.second().map(chain::part);
        if (other.isEmpty()) {
            if (!chain.kind[a].isSlab()) {
                throw new IllegalArgumentException("\"" + place + "\" has no inside");
            }
            return inside(chain, a);
        }
        int first = Math.min(a, other.get());
        int last = Math.max(a, other.get());
        boolean round = chain.laid().design().shape() == Shape.RING;
        if (first < last && isFree(chain, first + 1, last)) {
            return behind(chain, first);
        }
        if (round && first == 0 && isFree(chain, last + 1, chain.kind.length)) {
            return behind(chain, last);
        }
        throw new IllegalArgumentException("\"" + place + "\" is no free stretch");
    }

    private static boolean isFree(Chain chain, int from, int to) {
        for (int i = from; i < to; i++) {
            if (chain.kind[i] != Kind.APERTURE) {
                return false;
            }
        }
        return true;
    }

    /** Inside a face that widens by m, q̂ is m² times that outside. */
    private double scale(Trial trial, Plane plane) {
        if (slab == AIR) {
            return 1;
        }
        double m = trial.numbers.magnify(slab, plane);
        return m * m;
    }

    private double reducedRayleigh(Trial trial, Plane plane) {
        return scale(trial, plane)
                * (behindLens ? trial.reducedRayleighBehindLens(slab, plane) : trial.reducedRayleigh(station, plane));
    }

    private double index(Trial trial) {
        return slab == AIR ? 1 : trial.numbers.index(slab);
    }

    /** The 1/e² radius at the waist, m; a number without meaning where there is no beam, as with all below. */
    double radius(Trial trial, Plane plane) {
        return Math.sqrt(chain.wavelength / Math.PI * reducedRayleigh(trial, plane));
    }

    /** πn w0²/λ, m. */
    double rayleigh(Trial trial, Plane plane) {
        return reducedRayleigh(trial, plane) * index(trial);
    }

    /** The path from the stretch's beginning to the waist, m, positive downstream. */
    double after(Trial trial, Plane plane) {
        double reduced = behindLens
                ? trial.reducedPathFromWaistBehindLens(slab, plane)
                : trial.reducedPathFromWaist(station, plane);
        // Adding 0 turns −0 into 0.
        return -reduced * scale(trial, plane) * index(trial) + 0.0;
    }

    /** The path from a slab's middle to the waist of the light inside it, before the lens there, m. */
    double offset(Trial trial, Plane plane) {
        return after(trial, plane) - trial.numbers.inside(slab) / 2;
    }
}
