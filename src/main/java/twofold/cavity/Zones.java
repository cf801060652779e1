package twofold.cavity;

import java.util.List;
import java.util.Optional;
import twofold.optics.Plane;

/**
 * The stability zones of one plane along the free path of a leg, in the chain alone: no mirror moves, all angles and other
 * paths stay. Parts keep their place from the mirror before, or stay in the middle, as when the leg is typed.
 *
 * @param plane which
 * @param leg its number
 * @param path of the leg now, m
 * @param least path that the parts alone take, m: no mirrors stand closer
 * @param edges by path; two of them at one place where zones touch, as with equal arms
 * @param zones by path
 * @param here the zone that holds the path of now, if the plane is stable
 */
public record Zones(
        Plane plane, int leg, double path, double least, List<ZoneEdge> edges, List<Zone> zones, Optional<Zone> here) {
    /** Copies the lists. */
    public Zones {
        edges = List.copyOf(edges);
        zones = List.copyOf(zones);
    }

    /** The zones of a plane along a leg, from a trial that has run. */
    public static Zones of(Trial trial, int leg, Plane plane) {
        return new ZoneSearch(trial, leg).zones(plane);
    }

    /** The edge at which the same happens as at another plane's. */
    public Optional<ZoneEdge> same(ZoneEdge other) {
        return edges.stream().filter(e -> e.isSameAs(other)).findFirst();
    }

    /**
     * How far apart the planes have an edge, m: its place in the tangential minus in the sagittal plane. NaN where the
     * tangential plane has no such edge.
     *
     * @param edge of the sagittal plane
     */
    static double split(Zones tangential, ZoneEdge edge) {
        return tangential.same(edge).map(ZoneEdge::path).orElse(Double.NaN) - edge.path();
    }

    /**
     * The length of leg on which both planes are stable, within the zone that holds the path of now in the sagittal plane,
     * m. NaN where no zone does, and where there is no end to it.
     */
    static double overlap(Zones tangential, Zones sagittal) {
        if (sagittal.here.isEmpty()) {
            return Double.NaN;
        }
        Zone here = sagittal.here.get();
        double sum = 0;
        for (Zone other : tangential.zones) {
            double from = Math.max(Math.max(here.from(), other.from()), sagittal.least);
            sum += Math.max(0, Math.min(here.to(), other.to()) - from);
        }
        return sum < Double.POSITIVE_INFINITY ? sum : Double.NaN;
    }
}
