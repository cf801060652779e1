package twofold.cavity;

import java.util.List;
import java.util.Optional;
import twofold.optics.RayMatrix;

/**
 * One plane's answer.
 *
 * @param state whether there is a mode
 * @param halfTrace (A + D)/2 of the round trip
 * @param margin 1 − |half trace|, negative where unstable
 * @param gouy round-trip Gouy phase, rad; NaN unless stable
 * @param magnification of a round trip; 1 unless unstable
 * @param roundTrip from the surface of the first mirror, light leaving it
 * @param oneWay of a standing wave, from the middle of the first mirror to the middle of the last, their curvatures
 *     included; empty for a ring
 * @param stations along one pass; empty unless stable
 * @param waists one for each stretch, in beam order; empty unless stable
 */
public record Eigenmode(
        State state,
        double halfTrace,
        double margin,
        double gouy,
        double magnification,
        RayMatrix roundTrip,
        Optional<RayMatrix> oneWay,
        List<Station> stations,
        List<Waist> waists) {
    /** Copies the lists. */
    public Eigenmode {
        stations = List.copyOf(stations);
        waists = List.copyOf(waists);
    }

    /** Whether there is a beam. */
    public boolean isStable() {
        return state == State.STABLE;
    }

    /** The beam at a face of a part. */
    public Optional<Station> station(int part, Face face) {
        return stations.stream()
                .filter(s -> s.part() == part && s.face() == face)
                .findFirst();
    }

    /** The waists inside a slab: one, or two beside its thermal lens. */
    public List<Waist> inside(int part) {
        return waists.stream().filter(w -> w.isInside() && w.from() == part).toList();
    }

    /** The radius of the beam at a path from a leg's beginning, m; empty where there is no beam or it is not known, as inside a black box. */
    public Optional<Double> radiusAt(int leg, double path) {
        return waists.stream()
                .filter(w -> w.leg() == leg && path >= w.start() && path <= w.start() + w.length())
                .findFirst()
                .map(w -> w.radiusAt(path - w.start()));
    }
}
