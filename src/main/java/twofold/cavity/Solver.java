package twofold.cavity;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import twofold.design.Edge;
import twofold.design.Kind;
import twofold.design.Part;
import twofold.design.Requirement;
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

    /**
     * Of a trial that has run.
     *
     * @param laid what the trial's numbers state
     */
    Solver(Laid laid, Trial trial) {
        this.laid = laid;
        this.trial = trial;
        this.chain = trial.numbers.chain;
    }

    /** Runs a trial of a laid-out design and copies it. */
    static Cavity solve(Laid laid) {
        Trial trial = Chain.of(laid).trial();
        Fit fit = trial.run();
        if (fit != Fit.FITS) {
            throw new IllegalStateException("a laid-out design fits, but the chain says " + fit);
        }
        return new Solver(laid, trial).cavity();
    }

    /** The gaps between mounts and the beam, if there is one in the tangential plane. */
    Clearance clearance() {
        boolean stable = trial.hasBeam(Plane.TANGENTIAL);
        return clearance(stable ? waists(Plane.TANGENTIAL) : List.of());
    }

    private Clearance clearance(List<Waist> tangential) {
        return Clearance.of(
                laid,
                tangential.stream()
                        .map(w ->
                                new Strip(w.leg(), w.start(), w.length(), STRIP * w.radius(), w.after(), w.rayleigh()))
                        .toList());
    }

    private Cavity cavity() {
        Eigenmode tangential = mode(Plane.TANGENTIAL);
        Eigenmode sagittal = mode(Plane.SAGITTAL);
        Optional<Integer> leg = ledgerLeg(tangential, sagittal);
        return new Cavity(
                laid,
                tangential,
                sagittal,
                lengths(),
                lines(tangential, Plane.TANGENTIAL),
                lines(sagittal, Plane.SAGITTAL),
                clearance(tangential.waists()),
                laid.design().requirements().stream().map(this::judge).toList(),
                leg,
                leg.flatMap(l -> Ledger.of(trial, l, Edge.LOWER)));
    }

    private Judgement judge(Requirement requirement) {
        return requirement.over().isPresent() ? Judgement.open(requirement) : Judgement.of(requirement, chain, trial);
    }

    private Optional<Integer> ledgerLeg(Eigenmode tangential, Eigenmode sagittal) {
        for (int leg = 0; leg < chain.legs(); leg++) {
            for (int i = chain.mirror[leg] + 1; i < chain.end(leg); i++) {
                if (chain.kind[i] == Kind.CRYSTAL) {
                    return Optional.of(leg);
                }
            }
        }
        return Stream.concat(tangential.waists().stream(), sagittal.waists().stream())
                .filter(Waist::isReal)
                .min(Comparator.comparingDouble(Waist::radius))
                .map(Waist::leg);
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
                trial.oneWay(plane),
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
            double start = 0;
            for (Standing s : leg.parts()) {
                int part = s.part();
                if (chain.kind[part] == Kind.APERTURE) {
                    continue;
                }
                waists.add(waist(Stretch.behind(chain, from), from, part, number, start, s.start() - start, plane));
                if (chain.kind[part].isSlab()) {
                    inside(waists, s, number, plane);
                }
                from = part;
                start = s.end();
            }
            waists.add(waist(Stretch.behind(chain, from), from, leg.to(), number, start, leg.path() - start, plane));
        }
        return waists;
    }

    private void inside(List<Waist> to, Standing s, int leg, Plane plane) {
        int part = s.part();
        boolean split = trial.numbers.hasThermalLens(part);
        double length = split ? s.length() / 2 : s.length();
        to.add(waist(Stretch.inside(chain, part), part, part, leg, s.start(), length, plane));
        if (split) {
            to.add(waist(Stretch.insideBehindLens(chain, part), part, part, leg, s.middle(), length, plane));
        }
    }

    private Waist waist(Stretch stretch, int from, int to, int leg, double start, double length, Plane plane) {
        return new Waist(
                from,
                to,
                leg,
                start,
                Math.max(0, length),
                stretch.radius(trial, plane),
                stretch.after(trial, plane),
                stretch.rayleigh(trial, plane));
    }

    private Map<Integer, CrystalLine> lines(Eigenmode mode, Plane plane) {
        Map<Integer, CrystalLine> lines = new HashMap<>();
        for (int part = 0; part < chain.kind.length; part++) {
            List<Waist> inside = mode.inside(part);
            if (inside.isEmpty()) {
                continue;
            }
            double length = trial.numbers.inside(part);
            double share = trial.numbers.reduced(part, plane) / length;
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
                    tangential += trial.numbers.reduced(part, Plane.TANGENTIAL) - s.length();
                    sagittal += trial.numbers.reduced(part, Plane.SAGITTAL) - s.length();
                } else if (chain.kind[part] == Kind.MATRIX) {
                    tangential += trial.numbers.boxLength(part, Plane.TANGENTIAL) - s.length();
                    sagittal += trial.numbers.boxLength(part, Plane.SAGITTAL) - s.length();
                }
            }
            all.add(new Cavity.Lengths(leg.path(), leg.distance(), optical, tangential, sagittal));
        }
        return all;
    }
}
