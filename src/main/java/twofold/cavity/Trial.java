package twofold.cavity;

import java.util.Arrays;
import twofold.design.Field;
import twofold.design.Kind;
import twofold.layout.Aim;
import twofold.layout.Layout;
import twofold.optics.Mode;
import twofold.optics.Plane;
import twofold.optics.RayMatrix;
import twofold.optics.Refraction;
import twofold.optics.Walk;

/**
 * One evaluation of a chain: every number of it, then both planes in one walk. Confined to a thread; allocates only when
 * made. Set numbers, {@link #run}, read.
 */
public final class Trial {
    private static final double COS_GRAZING = Math.cos(Field.Limits.GRAZING);

    private final Chain chain;
    private final double[] v;
    private final boolean[] inMiddle;
    private final boolean[] atBrewster;
    private final double[] path;
    private final double[] headingX;
    private final double[] headingY;
    private final double[] cos;
    private final double[] tangential;
    private final double[] sagittal;
    private final double[] closed = new double[2 * Mode.SIZE];
    private final double[] middle = new double[4];

    Trial(Chain chain, double[] numbers) {
        this.chain = chain;
        this.v = numbers;
        inMiddle = chain.inMiddle.clone();
        atBrewster = chain.atBrewster.clone();
        int legs = chain.legs();
        path = new double[legs];
        headingX = new double[legs];
        headingY = new double[legs];
        cos = new double[legs];
        tangential = new double[4 * chain.stations];
        sagittal = new double[4 * chain.stations];
        for (int part = 0; part < chain.kind.length; part++) {
            derive(part);
        }
    }

    /**
     * Sets a number, and what follows from it. A place or an angle that was "middle" or "brewster" becomes a number.
     *
     * @param slot from {@link Chain#slot}, {@link Chain#x} or {@link Chain#y}
     * @param si in SI
     */
    public void set(int slot, double si) {
        int part = slot / Chain.STRIDE;
        int offset = slot % Chain.STRIDE;
        v[slot] = si;
        if (chain.kind[part] == Kind.MIRROR) {
            if (offset == Chain.ROC) {
                v[part * Chain.STRIDE + Chain.CURVATURE] = 1 / si;
            } else if (offset == Chain.CURVATURE) {
                v[part * Chain.STRIDE + Chain.ROC] = 1 / si;
            }
        } else if (offset == Chain.AT) {
            inMiddle[part] = false;
        } else if (offset == Chain.TILT) {
            atBrewster[part] = false;
        } else if (offset == Chain.THERMAL) {
            v[part * Chain.STRIDE + Chain.THERMAL_T] = si;
            v[part * Chain.STRIDE + Chain.THERMAL_S] = si;
        }
        derive(part);
    }

    /** The number in a slot, in SI. */
    public double get(int slot) {
        return v[slot];
    }

    private void derive(int part) {
        int b = part * Chain.STRIDE;
        switch (chain.kind[part]) {
            case MIRROR -> v[b + Chain.POWER] = 2 * v[b + Chain.CURVATURE];
            case LENS -> deriveLens(part, b);
            case PLATE, CRYSTAL -> deriveSlab(part, b);
            case MATRIX -> v[b + Chain.HALF] = v[b + Chain.SIZE] / 2;
            case APERTURE -> v[b + Chain.HALF] = 0;
        }
    }

    private void deriveLens(int part, int b) {
        double power = 1 / v[b + Chain.SIZE];
        double tilt = v[b + Chain.TILT];
        double across = tilt == 0 ? power : power * Refraction.tiltedLens(v[b + Chain.INDEX], tilt);
        double in = tilt == 0 ? power : across / (Math.cos(tilt) * Math.cos(tilt));
        v[b + Chain.PT] = chain.sagittalTilt[part] ? across : in;
        v[b + Chain.PS] = chain.sagittalTilt[part] ? in : across;
    }

    private void deriveSlab(int part, int b) {
        double n = v[b + Chain.INDEX];
        if (atBrewster[part]) {
            v[b + Chain.TILT] = Refraction.brewster(n);
        }
        double incidence = v[b + Chain.TILT];
        boolean tilted = incidence != 0;
        double m = tilted ? Refraction.magnification(n, incidence) : 1;
        double turn = tilted ? chain.sign[part] * Refraction.turn(n, incidence) : 0;
        double length = chain.kind[part] == Kind.PLATE
                ? v[b + Chain.SIZE] / Refraction.cosInside(n, incidence)
                : v[b + Chain.SIZE];
        boolean sagittal = chain.sagittalTilt[part];
        double mt = sagittal ? 1 : m;
        double ms = sagittal ? m : 1;
        double half = length / 2;
        v[b + Chain.HALF] = half;
        v[b + Chain.MAGNIFY_T] = mt;
        v[b + Chain.MAGNIFY_S] = ms;
        v[b + Chain.ZT] = half / (n * mt * mt);
        v[b + Chain.ZS] = half / (n * ms * ms);
        v[b + Chain.PT] = v[b + Chain.THERMAL_T] * mt * mt;
        v[b + Chain.PS] = v[b + Chain.THERMAL_S] * ms * ms;
        v[b + Chain.SHIFT] = sagittal ? 0 : length * Math.sin(turn);
        v[b + Chain.ADVANCE] = length * Math.cos(turn);
    }

    /** Aims every leg from the mirrors' places, then walks both planes if the plan fits. */
    public Fit run() {
        Fit fit = aim();
        if (fit == Fit.FITS) {
            walk();
        }
        return fit;
    }

    private Fit aim() {
        int legs = path.length;
        for (int leg = 0; leg < legs; leg++) {
            int from = chain.mirror[leg] * Chain.STRIDE;
            int to = chain.mirror[leg + 1] * Chain.STRIDE;
            double dx = v[to + Chain.X] - v[from + Chain.X];
            double dy = v[to + Chain.Y] - v[from + Chain.Y];
            double shift = 0;
            double advance = 0;
            double inside = 0;
            for (int i = chain.mirror[leg] + 1; i < chain.end(leg); i++) {
                int b = i * Chain.STRIDE;
                switch (chain.kind[i]) {
                    case PLATE, CRYSTAL -> {
                        shift += v[b + Chain.SHIFT];
                        advance += v[b + Chain.ADVANCE];
                        inside += 2 * v[b + Chain.HALF];
                    }
                    case MATRIX -> {
                        advance += v[b + Chain.SIZE];
                        inside += v[b + Chain.SIZE];
                    }
                    case MIRROR, LENS, APERTURE -> {}
                }
            }
            double extent = Aim.extent(dx, dy, shift);
            double whole = extent - advance + inside;
            path[leg] = whole;
            headingX[leg] = Aim.headingX(dx, dy, extent, shift);
            headingY[leg] = Aim.headingY(dx, dy, extent, shift);
            if (!room(leg, whole, extent - advance)) {
                return Fit.TOO_SHORT;
            }
        }
        int folds = chain.ring ? legs : legs - 1;
        for (int leg = 0; leg < folds; leg++) {
            int next = leg + 1 < legs ? leg + 1 : 0;
            cos[leg] = Aim.cosIncidence(headingX[leg], headingY[leg], headingX[next], headingY[next]);
            if (!(cos[leg] > COS_GRAZING)) {
                return Fit.GRAZING;
            }
        }
        return Fit.FITS;
    }

    /** Whether the parts of a leg stand apart and within it; sets the place of those in its middle. */
    private boolean room(int leg, double whole, double air) {
        double done = 0;
        for (int i = chain.mirror[leg] + 1; i < chain.end(leg); i++) {
            int b = i * Chain.STRIDE;
            if (inMiddle[i]) {
                v[b + Chain.AT] = whole / 2;
            }
            if (!(v[b + Chain.AT] - v[b + Chain.HALF] - done >= -Layout.TOUCH)) {
                return false;
            }
            done = v[b + Chain.AT] + v[b + Chain.HALF];
        }
        return whole > 0 && air >= -Layout.TOUCH && whole - done >= -Layout.TOUCH;
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
        int legs = path.length;
        for (int leg = 0; leg < legs; leg++) {
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
            if (leg + 1 < legs) {
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
        return face == Face.ENTRY ? outside * magnify(part, plane) : outside;
    }

    /** The wavefront's curvature just after a station's face in the forward pass, 1/m, positive diverging. */
    public double curvature(int part, Face face, Plane plane) {
        double reduced = Mode.reducedCurvature(closed, offset(plane), prefixes(plane), 4 * chain.station(part, face));
        if (face != Face.ENTRY) {
            return reduced;
        }
        double m = magnify(part, plane);
        return reduced / (m * m * index(part));
    }

    /** Width inside over width outside a part's faces. */
    double magnify(int part, Plane plane) {
        if (!chain.kind[part].isSlab()) {
            return 1;
        }
        return v[part * Chain.STRIDE + (plane == Plane.TANGENTIAL ? Chain.MAGNIFY_T : Chain.MAGNIFY_S)];
    }

    /** The index inside a part; 1 for what is not a slab. */
    double index(int part) {
        return chain.kind[part].isSlab() ? v[part * Chain.STRIDE + Chain.INDEX] : 1;
    }

    /** The path inside a part, m. */
    double inside(int part) {
        return 2 * v[part * Chain.STRIDE + Chain.HALF];
    }

    /** The reduced length of a slab as the chain uses it, seen from outside, m. */
    double reduced(int part, Plane plane) {
        return 2 * v[part * Chain.STRIDE + (plane == Plane.TANGENTIAL ? Chain.ZT : Chain.ZS)];
    }

    /** The b of a black box, m: what it does as a space. */
    double boxLength(int part, Plane plane) {
        return v[part * Chain.STRIDE + (plane == Plane.TANGENTIAL ? Chain.MATRIX_T : Chain.MATRIX_S) + 1];
    }

    /** Whether a slab has a lens in its middle. */
    boolean hasThermalLens(int part) {
        int b = part * Chain.STRIDE;
        return chain.kind[part] == Kind.CRYSTAL && (v[b + Chain.THERMAL_T] != 0 || v[b + Chain.THERMAL_S] != 0);
    }

    /** The path of a leg, m. */
    public double pathOf(int leg) {
        return path[leg];
    }

    /** The place of a part on its leg, m. */
    double along(int part) {
        return v[part * Chain.STRIDE + Chain.AT];
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
        int b = part * Chain.STRIDE;
        Walk walk = new Walk();
        walk.a = from[at];
        walk.b = from[at + 1];
        walk.c = from[at + 2];
        walk.d = from[at + 3];
        boolean t = plane == Plane.TANGENTIAL;
        walk.space(v[b + (t ? Chain.ZT : Chain.ZS)]);
        walk.lens(v[b + (t ? Chain.PT : Chain.PS)]);
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

    /** Whether a plane is stable, see {@link Rounding}. Allocates; not for sweeps. */
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

    /** The one-way matrix between the middles of a standing wave's end mirrors. */
    double[] way(Plane plane) {
        int end = chain.mirror[chain.mirror.length - 1];
        int last = 4 * chain.station[end];
        double[] prefix = Arrays.copyOfRange(prefixes(plane), last, last + 4);
        double half = v[end * Chain.STRIDE + Chain.POWER] / 2;
        prefix[2] += half * prefix[0];
        prefix[3] += half * prefix[1];
        return prefix;
    }

    boolean isRing() {
        return chain.ring;
    }

    /** This trial after {@link #run}, walked again over the magnitudes of its numbers so that nothing cancels. */
    Trial magnitudes() {
        Trial copy = new Trial(chain, v.clone());
        System.arraycopy(cos, 0, copy.cos, 0, cos.length);
        for (int leg = 0; leg < path.length; leg++) {
            copy.path[leg] = path[leg] + Rounding.ofCoordinates(steps(), coordinates(leg));
        }
        for (int part = 0; part < chain.kind.length; part++) {
            int b = part * Chain.STRIDE;
            switch (chain.kind[part]) {
                case MIRROR -> copy.diverge(b + Chain.POWER);
                case LENS, PLATE, CRYSTAL -> {
                    copy.diverge(b + Chain.PT);
                    copy.diverge(b + Chain.PS);
                }
                case MATRIX -> {
                    for (int i = 0; i < 4; i++) {
                        copy.v[b + Chain.MATRIX_T + i] = Math.abs(v[b + Chain.MATRIX_T + i]);
                        copy.v[b + Chain.MATRIX_S + i] = Math.abs(v[b + Chain.MATRIX_S + i]);
                    }
                }
                case APERTURE -> {}
            }
        }
        copy.walk();
        return copy;
    }

    /** The root of the sum of squares of the coordinates at a leg's ends, m. */
    private double coordinates(int leg) {
        int from = chain.mirror[leg] * Chain.STRIDE;
        int to = chain.mirror[leg + 1] * Chain.STRIDE;
        return Math.hypot(
                Math.hypot(v[from + Chain.X], v[from + Chain.Y]), Math.hypot(v[to + Chain.X], v[to + Chain.Y]));
    }

    private void diverge(int power) {
        v[power] = -Math.abs(v[power]);
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
