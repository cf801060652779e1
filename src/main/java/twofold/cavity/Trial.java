package twofold.cavity;

import java.util.Arrays;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import twofold.design.Design;
import twofold.design.Kind;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.layout.Plan;
import twofold.optics.Mode;
import twofold.optics.Plane;
import twofold.optics.RayMatrix;
import twofold.optics.Walk;

/**
 * One evaluation of a chain: every number of it, then both planes in one walk. Confined to a thread; allocates only when
 * made. Set numbers, {@link #run}, read.
 */
public final class Trial {
    /** Above this margin a plane is stable whatever rounding did; below it the rounding is bounded. */
    private static final double CLEAR = 1e-6;

    final Numbers numbers;
    private final Chain chain;
    private final double[] v;
    final Legs legs;
    private final double[] tangential;
    private final double[] sagittal;
    private final double[] way = new double[8];
    private final double[] closed = new double[2 * Mode.SIZE];
    private final double[] middle = new double[4];
    private @Nullable Trial grown;

    Trial(Numbers numbers) {
        this.numbers = numbers;
        this.chain = numbers.chain;
        this.v = numbers.v;
        this.legs = new Legs(numbers);
        tangential = new double[4 * chain.stations];
        sagittal = new double[4 * chain.stations];
    }

    /**
     * Sets a number, and what follows from it. A place or an angle that was "middle" or "brewster" becomes a number.
     *
     * @param slot from {@link Chain#slot}, {@link Chain#x} or {@link Chain#y}
     * @param si in SI
     */
    public void set(int slot, double si) {
        numbers.set(slot, si);
    }

    /** The number in a slot, in SI. */
    public double get(int slot) {
        return v[slot];
    }

    /**
     * Aims every leg from the mirrors' places, then walks both planes if the plan fits. If it does not, everything that is
     * read is NaN.
     */
    public Fit run() {
        Fit fit = legs.aim();
        if (fit == Fit.FITS) {
            walk();
        } else {
            Arrays.fill(way, Double.NaN);
            Arrays.fill(closed, Double.NaN);
        }
        return fit;
    }

    /** States in a plan what the parts on each leg do to it now. */
    public void load(Plan plan) {
        legs.load(plan);
    }

    /** A copy after {@link #run}, to be walked again with other paths or parts while nothing is aimed anew. */
    Trial copy() {
        Trial copy = new Trial(numbers.copy());
        copy.legs.take(legs);
        return copy;
    }

    /**
     * Walks again with another path of one leg, in the chain alone: no mirror moves, all angles and other paths stay. Parts
     * keep their place from the mirror before, or stay in the middle. The path may be too short for the parts.
     */
    void walk(int leg, double longer) {
        legs.path[leg] = longer;
        for (int i = chain.mirror[leg] + 1; i < chain.end(leg); i++) {
            if (numbers.inMiddle[i]) {
                v[i * Chain.STRIDE + Chain.AT] = longer / 2;
            }
        }
        walk();
    }

    /** Makes a fold mirror focus as it does at normal incidence, in walks without aiming. */
    void straighten(int mirror) {
        int leg = chain.legTo(mirror);
        if (leg >= 0) {
            legs.cos[leg] = 1;
        }
    }

    /** The whole of the optics, once: both planes from the first mirror to where the chain closes. */
    private void walk() {
        Walk t = new Walk();
        Walk s = new Walk();
        if (!chain.ring) {
            double half = v[Chain.POWER] / 2;
            t.lens(half);
            s.lens(half);
        }
        t.store(tangential, 0);
        s.store(sagittal, 0);
        double[] path = legs.path;
        double[] cos = legs.cos;
        int count = path.length;
        for (int leg = 0; leg < count; leg++) {
            double done = 0;
            int end = chain.end(leg);
            for (int i = chain.mirror[leg] + 1; i < end; i++) {
                int b = i * Chain.STRIDE;
                int mark = 4 * chain.station[i];
                double gap = v[b + Chain.AT] - v[b + Chain.HALF] - done;
                t.space(gap);
                s.space(gap);
                switch (chain.kind[i]) {
                    case PLATE, CRYSTAL -> {
                        t.store(tangential, mark);
                        s.store(sagittal, mark);
                        t.space(v[b + Chain.ZT]);
                        s.space(v[b + Chain.ZS]);
                        t.lens(v[b + Chain.PT]);
                        s.lens(v[b + Chain.PS]);
                        t.space(v[b + Chain.ZT]);
                        s.space(v[b + Chain.ZS]);
                        mark += 4;
                    }
                    case LENS -> {
                        t.lens(v[b + Chain.PT]);
                        s.lens(v[b + Chain.PS]);
                    }
                    case MATRIX -> {
                        t.store(tangential, mark);
                        s.store(sagittal, mark);
                        int m = b + Chain.MATRIX_T;
                        t.become(
                                t.first(v[m], v[m + 1]),
                                t.second(v[m], v[m + 1]),
                                t.first(v[m + 2], v[m + 3]),
                                t.second(v[m + 2], v[m + 3]));
                        m = b + Chain.MATRIX_S;
                        s.become(
                                s.first(v[m], v[m + 1]),
                                s.second(v[m], v[m + 1]),
                                s.first(v[m + 2], v[m + 3]),
                                s.second(v[m + 2], v[m + 3]));
                        mark += 4;
                    }
                    case APERTURE, MIRROR -> {}
                }
                t.store(tangential, mark);
                s.store(sagittal, mark);
                done = v[b + Chain.AT] + v[b + Chain.HALF];
            }
            t.space(path[leg] - done);
            s.space(path[leg] - done);
            int at = chain.mirror[leg + 1];
            double power = v[at * Chain.STRIDE + Chain.POWER];
            if (leg + 1 < count) {
                t.lens(power / cos[leg]);
                s.lens(power * cos[leg]);
                t.store(tangential, 4 * chain.station[at]);
                s.store(sagittal, 4 * chain.station[at]);
            } else if (chain.ring) {
                t.lens(power / cos[leg]);
                s.lens(power * cos[leg]);
                Mode.ring(t.a, t.b, t.c, t.d, closed, 0);
                Mode.ring(s.a, s.b, s.c, s.d, closed, Mode.SIZE);
            } else {
                t.lens(power / 2);
                s.lens(power / 2);
                t.store(way, 0);
                s.store(way, 4);
                Mode.standing(t.a, t.b, t.c, t.d, closed, 0);
                Mode.standing(s.a, s.b, s.c, s.d, closed, Mode.SIZE);
                t.lens(power / 2);
                s.lens(power / 2);
                t.store(tangential, 4 * chain.station[at]);
                s.store(sagittal, 4 * chain.station[at]);
            }
        }
    }

    private static int offset(Plane plane) {
        return plane == Plane.TANGENTIAL ? 0 : Mode.SIZE;
    }

    private double[] prefixes(Plane plane) {
        return plane == Plane.TANGENTIAL ? tangential : sagittal;
    }

    /** (A + D)/2 of the round trip. */
    public double halfTrace(Plane plane) {
        return closed[offset(plane) + Mode.HALF_TRACE];
    }

    /** 1 − |half trace|, without cancellation; negative where unstable. */
    public double margin(Plane plane) {
        return Mode.margin(closed, offset(plane));
    }

    /** The round-trip Gouy phase, rad; NaN where unstable. */
    public double gouy(Plane plane) {
        return Mode.gouy(closed, offset(plane));
    }

    /** What a round trip magnifies. */
    public double magnification(Plane plane) {
        return Mode.magnification(closed, offset(plane));
    }

    /** The 1/e² radius of intensity at a station, m: inside a slab's entry face as wide as it is there. NaN where unstable. */
    public double radius(int part, Face face, Plane plane) {
        double outside =
                Mode.radius(closed, offset(plane), prefixes(plane), 4 * chain.station(part, face), chain.wavelength);
        return face == Face.ENTRY ? outside * numbers.magnify(part, plane) : outside;
    }

    /** The wavefront's curvature just after a station's face in the forward pass, 1/m, positive diverging. */
    public double curvature(int part, Face face, Plane plane) {
        double reduced = Mode.reducedCurvature(closed, offset(plane), prefixes(plane), 4 * chain.station(part, face));
        if (face != Face.ENTRY) {
            return reduced;
        }
        double m = numbers.magnify(part, plane);
        return reduced / (m * m * numbers.index(part));
    }

    /**
     * The radius in the middle of a slab, inside, m; of any other part as at its first face. NaN where unstable.
     */
    public double radius(int part, Plane plane) {
        if (!chain.kind[part].isSlab()) {
            return radius(part, chain.kind[part] == Kind.MATRIX ? Face.ENTRY : Face.SURFACE, plane);
        }
        behindLens(part, plane);
        return Mode.radius(closed, offset(plane), middle, 0, chain.wavelength) * numbers.magnify(part, plane);
    }

    /**
     * The half axis of the beam's footprint on a face of a part, m: the radius outside the face over the cosine of the
     * incidence in the plane of the incidence. NaN where unstable.
     */
    public double footprint(int part, Face face, Plane plane) {
        double outside =
                Mode.radius(closed, offset(plane), prefixes(plane), 4 * chain.station(part, face), chain.wavelength);
        if (chain.kind[part] == Kind.MIRROR) {
            return plane == Plane.TANGENTIAL ? outside / legs.cosIncidence(part) : outside;
        }
        boolean inTilt = chain.sagittalTilt[part] == (plane == Plane.SAGITTAL);
        return inTilt ? outside / Math.cos(numbers.tilt(part)) : outside;
    }

    /** Whether there is a beam in a plane: it is stable, and not for rounding alone. */
    public boolean hasBeam(Plane plane) {
        double margin = margin(plane);
        return margin > CLEAR || (margin > 0 && state(plane) == State.STABLE);
    }

    /** The design with the numbers of this trial. */
    public Design design() {
        return numbers.design();
    }

    /** That design on the table; empty where it does not fit. */
    public Optional<Laid> laid() {
        Design design = design();
        return design.equals(chain.laid().design())
                ? Optional.of(chain.laid())
                : Layout.of(design).value();
    }

    /** The path of a leg, m. */
    public double pathOf(int leg) {
        return legs.path[leg];
    }

    /** Reduced path from the waist to a station and the reduced Rayleigh length there, in outside measure, m. */
    double reducedPathFromWaist(int station, Plane plane) {
        return Mode.reducedPathFromWaist(closed, offset(plane), prefixes(plane), 4 * station);
    }

    double reducedRayleigh(int station, Plane plane) {
        return Mode.reducedRayleigh(closed, offset(plane), prefixes(plane), 4 * station);
    }

    /** As {@link #reducedPathFromWaist} for the second half of a slab, behind the lens in its middle. */
    double reducedPathFromWaistBehindLens(int part, Plane plane) {
        behindLens(part, plane);
        return Mode.reducedPathFromWaist(closed, offset(plane), middle, 0);
    }

    double reducedRayleighBehindLens(int part, Plane plane) {
        behindLens(part, plane);
        return Mode.reducedRayleigh(closed, offset(plane), middle, 0);
    }

    private void behindLens(int part, Plane plane) {
        double[] from = prefixes(plane);
        int at = 4 * chain.station[part];
        Walk walk = new Walk();
        walk.a = from[at];
        walk.b = from[at + 1];
        walk.c = from[at + 2];
        walk.d = from[at + 3];
        walk.space(numbers.reduced(part, plane) / 2);
        walk.lens(numbers.power(part, plane));
        walk.store(middle, 0);
    }

    /** The round trip from the surface of the first mirror, light leaving it. */
    RayMatrix roundTrip(Plane plane) {
        int at = offset(plane);
        double a = closed[at];
        double b = closed[at + 1];
        double c = closed[at + 2];
        double d = closed[at + 3];
        if (chain.ring) {
            return new RayMatrix(a, b, c, d);
        }
        // From the middle of the first mirror to its surface: one half lens p in front, its inverse behind.
        double p = v[Chain.POWER] / 2;
        return new RayMatrix(a + b * p, b, c + p * (d - a) - p * p * b, d - p * b);
    }

    /** Whether a plane is stable, see {@link Rounding}. Walks once more, over magnitudes; allocates the first time. */
    public State state(Plane plane) {
        double margin = margin(plane);
        if (!(Math.abs(margin) > Rounding.ofMargin(this, plane))) {
            return State.EDGE;
        }
        return margin > 0 ? State.STABLE : State.UNSTABLE;
    }

    /** A closed chain's number, by its place in {@link Mode}. */
    double closed(Plane plane, int number) {
        return closed[offset(plane) + number];
    }

    /** An element of the one-way matrix between the middles of a standing wave's end mirrors: 0 to 3 are a, b, c, d. */
    double way(Plane plane, int element) {
        return way[(plane == Plane.TANGENTIAL ? 0 : 4) + element];
    }

    /** The one-way matrix between the middles of a standing wave's end mirrors; empty for a ring. */
    Optional<RayMatrix> oneWay(Plane plane) {
        return chain.ring
                ? Optional.empty()
                : Optional.of(new RayMatrix(way(plane, 0), way(plane, 1), way(plane, 2), way(plane, 3)));
    }

    boolean isRing() {
        return chain.ring;
    }

    /** This trial after {@link #run}, walked again over the magnitudes of its numbers so that nothing cancels. */
    Trial magnitudes() {
        Trial copy = grown;
        if (copy == null) {
            copy = copy();
            grown = copy;
        }
        copy.numbers.takeMagnitudes(numbers);
        copy.legs.take(legs);
        for (int leg = 0; leg < chain.legs(); leg++) {
            copy.legs.path[leg] += Rounding.ofCoordinates(steps(), legs.coordinates(leg));
        }
        copy.walk();
        return copy;
    }

    /** How many elementary steps one walk takes. */
    int steps() {
        int steps = 1;
        for (Kind kind : chain.kind) {
            steps += switch (kind) {
                case MIRROR, LENS -> 2;
                case PLATE, CRYSTAL -> 4;
                case MATRIX -> 3;
                case APERTURE -> 1;
            };
        }
        return steps;
    }
}
