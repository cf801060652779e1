package twofold.cavity;

import java.util.Arrays;
import twofold.design.Field;
import twofold.layout.Aim;
import twofold.layout.Layout;
import twofold.layout.Plan;

/** The legs of a trial, aimed from the places of its mirrors. Mutable, confined to a trial. */
final class Legs {
    private static final double COS_GRAZING = Math.cos(Field.Limits.GRAZING);

    /** Of each leg, m. */
    final double[] path;
    /** Of the incidence at the mirror that each leg ends at; without meaning at the end of a standing wave. */
    final double[] cos;

    private final Chain chain;
    private final Numbers numbers;
    private final double[] v;
    private final double[] headingX;
    private final double[] headingY;

    Legs(Numbers numbers) {
        this.numbers = numbers;
        this.chain = numbers.chain;
        this.v = numbers.v;
        int legs = chain.legs();
        path = new double[legs];
        headingX = new double[legs];
        headingY = new double[legs];
        cos = new double[legs];
    }

    /** States in a plan what the parts on each leg do to it now. */
    void load(Plan plan) {
        for (int leg = 0; leg < path.length; leg++) {
            double shift = 0;
            double excess = 0;
            for (int i = chain.mirror[leg] + 1; i < chain.end(leg); i++) {
                int b = i * Chain.STRIDE;
                if (chain.kind[i].isSlab()) {
                    shift += v[b + Chain.SHIFT];
                    excess += 2 * v[b + Chain.HALF] - v[b + Chain.ADVANCE];
                }
            }
            plan.load(leg, shift, excess);
        }
    }

    /** Takes what another trial's legs were aimed to. */
    void take(Legs other) {
        System.arraycopy(other.path, 0, path, 0, path.length);
        System.arraycopy(other.headingX, 0, headingX, 0, path.length);
        System.arraycopy(other.headingY, 0, headingY, 0, path.length);
        System.arraycopy(other.cos, 0, cos, 0, path.length);
    }

    /** Aims every leg from the mirrors' places; where the plan does not fit, what is read is NaN. */
    Fit aim() {
        Fit fit = fit();
        if (fit != Fit.FITS) {
            Arrays.fill(path, Double.NaN);
        }
        return fit;
    }

    private Fit fit() {
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
            if (numbers.inMiddle[i]) {
                v[b + Chain.AT] = whole / 2;
            }
            if (!(v[b + Chain.AT] - v[b + Chain.HALF] - done >= -Layout.TOUCH)) {
                return false;
            }
            done = v[b + Chain.AT] + v[b + Chain.HALF];
        }
        return whole > 0 && air >= -Layout.TOUCH && whole - done >= -Layout.TOUCH;
    }

    /** The cosine of the incidence at a mirror; 1 at the ends of a standing wave. */
    double cosIncidence(int mirror) {
        int leg = chain.legTo(mirror);
        return leg < 0 || (!chain.ring && leg == path.length - 1) ? 1 : cos[leg];
    }

    /** The angle of incidence at a mirror, rad; 0 at the ends of a standing wave. */
    double incidence(int mirror) {
        int in = chain.legTo(mirror);
        if (in < 0 || (!chain.ring && in == path.length - 1)) {
            return path[0] >= 0 ? 0 : Double.NaN;
        }
        int out = in + 1 < path.length ? in + 1 : 0;
        return path[0] >= 0 ? Aim.incidence(headingX[in], headingY[in], headingX[out], headingY[out]) : Double.NaN;
    }

    /** How far apart a leg's mirrors are by ruler, m. */
    double distance(int leg) {
        if (Double.isNaN(path[leg])) {
            return Double.NaN;
        }
        int from = chain.mirror[leg] * Chain.STRIDE;
        int to = chain.mirror[leg + 1] * Chain.STRIDE;
        return Math.hypot(v[to + Chain.X] - v[from + Chain.X], v[to + Chain.Y] - v[from + Chain.Y]);
    }

    /** The path of a round trip, m. */
    double roundTrip() {
        double once = 0;
        for (double leg : path) {
            once += leg;
        }
        return chain.ring ? once : 2 * once;
    }

    /** The optical path of a round trip with the phase index, m. */
    double opticalRoundTrip() {
        double more = 0;
        for (int part = 0; part < chain.kind.length; part++) {
            more += (numbers.index(part) - 1) * numbers.inside(part);
        }
        return roundTrip() + (chain.ring ? more : 2 * more);
    }

    /** The root of the sum of squares of the coordinates at a leg's ends, m. */
    double coordinates(int leg) {
        int from = chain.mirror[leg] * Chain.STRIDE;
        int to = chain.mirror[leg + 1] * Chain.STRIDE;
        return Math.hypot(
                Math.hypot(v[from + Chain.X], v[from + Chain.Y]), Math.hypot(v[to + Chain.X], v[to + Chain.Y]));
    }
}
