package twofold.cavity;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import twofold.layout.Clearance;
import twofold.layout.Laid;
import twofold.optics.Plane;

/**
 * Everything that one design answers: a trial run once, copied into records.
 *
 * @param laid what was solved
 * @param tangential the mode in the plane of the table
 * @param sagittal the mode across it
 * @param lengths of each leg, in beam order
 * @param tangentialLines where the tangential waist lies in each crystal and plate, by part; empty unless stable
 * @param sagittalLines where the sagittal waist lies in each crystal and plate, by part; empty unless stable
 * @param clearance gaps between mounts and beams
 * @param judgements of the design's requirements, in order
 * @param ledgerLeg number of the leg whose ledger is kept: the one with the first crystal, else with the smallest waist
 * @param ledger what each part adds to the difference between the planes, at the lower edge; empty where there is none
 */
public record Cavity(
        Laid laid,
        Eigenmode tangential,
        Eigenmode sagittal,
        List<Lengths> lengths,
        Map<Integer, CrystalLine> tangentialLines,
        Map<Integer, CrystalLine> sagittalLines,
        Clearance clearance,
        List<Judgement> judgements,
        Optional<Integer> ledgerLeg,
        Optional<Ledger> ledger) {
    /** Speed of light in vacuum, m/s; exact by definition of the metre. */
    public static final double LIGHT = 299_792_458;

    /** Copies the collections. */
    public Cavity {
        lengths = List.copyOf(lengths);
        judgements = List.copyOf(judgements);
        tangentialLines = Map.copyOf(tangentialLines);
        sagittalLines = Map.copyOf(sagittalLines);
    }

    /**
     * The lengths of a leg, m.
     *
     * @param path inside parts included
     * @param distance mirror to mirror by ruler, in the plan
     * @param optical Σ nL with the phase index
     * @param tangential what the tangential chain uses: reduced lengths; a black box counts with its B
     * @param sagittal what the sagittal chain uses
     */
    public record Lengths(double path, double distance, double optical, double tangential, double sagittal) {
        /** The reduced length in a plane, m. */
        public double reduced(Plane plane) {
            return plane == Plane.TANGENTIAL ? tangential : sagittal;
        }
    }

    /** Solves both planes of a laid-out design. */
    public static Cavity solve(Laid laid) {
        return Solver.solve(laid);
    }

    /** This answer with its requirements over a lever's range judged too. */
    public Cavity judgedOver(Sweeper sweeper) {
        Chain chain = Chain.of(laid);
        return new Cavity(
                laid,
                tangential,
                sagittal,
                lengths,
                tangentialLines,
                sagittalLines,
                clearance,
                judgements.stream()
                        .map(j -> j.verdict() == Judgement.Verdict.OPEN
                                ? Judgement.over(j.requirement(), chain, sweeper)
                                : j)
                        .toList(),
                ledgerLeg,
                ledger);
    }

    /** A plane's answer. */
    public Eigenmode mode(Plane plane) {
        return plane == Plane.TANGENTIAL ? tangential : sagittal;
    }

    /** Where the waist lies in a crystal or plate; empty where the plane is not stable. */
    public Optional<CrystalLine> line(int part, Plane plane) {
        return Optional.ofNullable((plane == Plane.TANGENTIAL ? tangentialLines : sagittalLines).get(part));
    }

    /** The path of a round trip, m. */
    public double roundTrip() {
        return passes() * lengths.stream().mapToDouble(Lengths::path).sum();
    }

    /** The optical path of a round trip, m. */
    public double opticalRoundTrip() {
        return passes() * lengths.stream().mapToDouble(Lengths::optical).sum();
    }

    /** The free spectral range, Hz: c over the optical round trip, with the phase index. */
    public double freeSpectralRange() {
        return LIGHT / opticalRoundTrip();
    }

    private int passes() {
        return laid.design().shape() == twofold.design.Shape.RING ? 1 : 2;
    }

    /** Smaller radius over larger at a part's face; empty unless both planes are stable. */
    public Optional<Double> roundness(int part, Face face) {
        Optional<Station> t = tangential.station(part, face);
        Optional<Station> s = sagittal.station(part, face);
        if (t.isEmpty() || s.isEmpty()) {
            return Optional.empty();
        }
        double a = t.get().radius();
        double b = s.get().radius();
        return Optional.of(Math.min(a, b) / Math.max(a, b));
    }
}
