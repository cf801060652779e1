package twofold.cavity;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import twofold.design.Kind;
import twofold.design.Part;
import twofold.layout.Clearance;
import twofold.layout.Laid;
import twofold.layout.Leg;
import twofold.layout.Standing;
import twofold.layout.Strip;
import twofold.optics.Plane;

/** Copies what one trial says into the records of a {@link Cavity}. */
final class Solver {
    /** Half width of the strip that a beam needs, in tangential radii; what the file format says. */
    private static final double STRIP = 3;

    private final Laid laid;
    private final Chain chain;
    private final Trial trial;

    Solver(Laid laid) {
        this.laid = laid;
        this.chain = Chain.of(laid);
        this.trial = chain.trial();
    }

    Cavity solve() {
        Fit fit = trial.run();
        if (fit != Fit.FITS) {
            throw new IllegalStateException("a laid-out design fits, but the chain says " + fit);
        }
        Eigenmode tangential = mode(Plane.TANGENTIAL);
        Eigenmode sagittal = mode(Plane.SAGITTAL);
        List<Strip> strips = tangential.waists().stream()
                .map(w -> new Strip(w.leg(), w.start(), w.length(), STRIP * w.radius(), w.after(), w.rayleigh()))
                .toList();
        return new Cavity(
                laid,
                tangential,
                sagittal,
                lengths(),
                lines(tangential, Plane.TANGENTIAL),
                lines(sagittal, Plane.SAGITTAL),
                Clearance.of(laid, strips));
    }

    private Eigenmode mode(Plane plane) {
        State state = trial.state(plane);
        boolean stable = state == State.STABLE;
        return new Eigenmode(
                state,
                trial.halfTrace(plane),
                trial.margin(plane),
                stable ? trial.gouy(plane) : Double.NaN,
                state == State.UNSTABLE ? trial.magnification(plane) : 1,
                trial.roundTrip(plane),
                stable ? stations(plane) : List.of(),
                stable ? waists(plane) : List.of());
    }

    private List<Station> stations(Plane plane) {
        List<Part> parts = laid.design().parts();
        List<Station> stations = new ArrayList<>();
        for (int i = chain.ring ? 1 : 0; i < parts.size(); i++) {
            stations(stations, i, plane);
        }
        if (chain.ring) {
            stations(stations, 0, plane);
        }
        return stations;
    }

    private void stations(List<Station> to, int part, Plane plane) {
        Kind kind = chain.kind[part];
        List<Face> faces =
                kind.isSlab() || kind == Kind.MATRIX ? List.of(Face.ENTRY, Face.EXIT) : List.of(Face.SURFACE);
        for (Face face : faces) {
            // Adding 0 turns −0 into 0.
            to.add(new Station(part, face, trial.radius(part, face, plane), trial.curvature(part, face, plane) + 0.0));
        }
    }

    private List<Waist> waists(Plane plane) {
        List<Waist> waists = new ArrayList<>();
        for (int number = 0; number < laid.legs().size(); number++) {
            Leg leg = laid.legs().get(number);
            int from = leg.from();
            int station = chain.station(from, Face.SURFACE);
            double start = 0;
            for (Standing s : leg.parts()) {
                int part = s.part();
                if (chain.kind[part] == Kind.APERTURE) {
                    continue;
                }
                waists.add(inAir(from, part, number, start, s.start() - start, station, plane));
                if (chain.kind[part].isSlab()) {
                    inside(waists, s, number, plane);
                }
                from = part;
                start = s.end();
                station = chain.station(part, Face.SURFACE) + (hasTwoFaces(part) ? 1 : 0);
            }
            waists.add(inAir(from, leg.to(), number, start, leg.path() - start, station, plane));
        }
        return waists;
    }

    private boolean hasTwoFaces(int part) {
        return chain.kind[part].isSlab() || chain.kind[part] == Kind.MATRIX;
    }

    private Waist inAir(int from, int to, int leg, double start, double length, int station, Plane plane) {
        return waist(
                from,
                to,
                leg,
                start,
                length,
                trial.reducedPathFromWaist(station, plane),
                trial.reducedRayleigh(station, plane),
                1,
                1);
    }

    private void inside(List<Waist> to, Standing s, int leg, Plane plane) {
        int part = s.part();
        double n = trial.index(part);
        double m = trial.magnify(part, plane);
        boolean split = trial.hasThermalLens(part);
        double length = split ? s.length() / 2 : s.length();
        int station = chain.station(part, Face.ENTRY);
        to.add(waist(
                part,
                part,
                leg,
                s.start(),
                length,
                trial.reducedPathFromWaist(station, plane),
                trial.reducedRayleigh(station, plane),
                n,
                m));
        if (split) {
            to.add(waist(
                    part,
                    part,
                    leg,
                    s.middle(),
                    length,
                    trial.reducedPathFromWaistBehindLens(part, plane),
                    trial.reducedRayleighBehindLens(part, plane),
                    n,
                    m));
        }
    }

    /** Inside a face that widens by m, q̂ is m² times that outside; lengths are n times reduced ones. */
    private Waist waist(
            int from,
            int to,
            int leg,
            double start,
            double length,
            double reducedFromWaist,
            double reducedRayleigh,
            double n,
            double m) {
        double scale = m * m;
        return new Waist(
                from,
                to,
                leg,
                start,
                Math.max(0, length),
                Math.sqrt(chain.wavelength / Math.PI * reducedRayleigh * scale),
                -reducedFromWaist * scale * n + 0.0,
                reducedRayleigh * scale * n);
    }

    private Map<Integer, CrystalLine> lines(Eigenmode mode, Plane plane) {
        Map<Integer, CrystalLine> lines = new HashMap<>();
        for (int part = 0; part < chain.kind.length; part++) {
            List<Waist> inside = mode.inside(part);
            if (inside.isEmpty()) {
                continue;
            }
            double length = trial.inside(part);
            double share = trial.reduced(part, plane) / length;
            Optional<CrystalLine> after = inside.size() > 1
                    ? Optional.of(line(inside.get(1), inside.get(1).after(), share, Optional.empty()))
                    : Optional.empty();
            lines.put(part, line(inside.get(0), inside.get(0).after() - length / 2, share, after));
        }
        return lines;
    }

    private static CrystalLine line(Waist w, double offset, double share, Optional<CrystalLine> after) {
        return new CrystalLine(w.radius(), offset, offset * share, w.rayleigh(), w.isReal(), after);
    }

    private List<Cavity.Lengths> lengths() {
        List<Cavity.Lengths> all = new ArrayList<>();
        for (Leg leg : laid.legs()) {
            double optical = leg.path();
            double tangential = leg.path();
            double sagittal = leg.path();
            for (Standing s : leg.parts()) {
                int part = s.part();
                optical += (s.index() - 1) * s.length();
                if (chain.kind[part].isSlab()) {
                    tangential += trial.reduced(part, Plane.TANGENTIAL) - s.length();
                    sagittal += trial.reduced(part, Plane.SAGITTAL) - s.length();
                } else if (chain.kind[part] == Kind.MATRIX) {
                    tangential += trial.boxLength(part, Plane.TANGENTIAL) - s.length();
                    sagittal += trial.boxLength(part, Plane.SAGITTAL) - s.length();
                }
            }
            all.add(new Cavity.Lengths(leg.path(), leg.distance(), optical, tangential, sagittal));
        }
        return all;
    }
}
