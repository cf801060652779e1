package twofold.cavity;

import java.util.ArrayList;
import java.util.List;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.FaceAngle;
import twofold.design.Field;
import twofold.design.Kind;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.TwoPowers;
import twofold.optics.Plane;
import twofold.optics.Refraction;

/** Every number of a chain, those that a person states and those that follow from them. Mutable, confined to a trial. */
final class Numbers {
    final Chain chain;
    final double[] v;
    final boolean[] inMiddle;
    private final boolean[] atBrewster;

    Numbers(Chain chain, double[] stated) {
        this.chain = chain;
        this.v = stated;
        inMiddle = chain.inMiddle.clone();
        atBrewster = chain.atBrewster.clone();
        for (int part = 0; part < chain.kind.length; part++) {
            derive(part);
        }
    }

    private Numbers(Numbers other) {
        chain = other.chain;
        v = other.v.clone();
        inMiddle = other.inMiddle.clone();
        atBrewster = other.atBrewster.clone();
    }

    Numbers copy() {
        return new Numbers(this);
    }

    /** See {@link Trial#set}. */
    void set(int slot, double si) {
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
        v[b + Chain.HALF] = length / 2;
        v[b + Chain.SHIFT] = sagittal ? 0 : length * Math.sin(turn);
        v[b + Chain.ADVANCE] = length * Math.cos(turn);
        seenThrough(b, sagittal ? 1 : m, sagittal ? m : 1);
    }

    /** The reduced lengths and powers of a slab as seen from outside faces that widen the beam so. */
    private void seenThrough(int b, double mt, double ms) {
        double reduced = v[b + Chain.HALF] / v[b + Chain.INDEX];
        v[b + Chain.MAGNIFY_T] = mt;
        v[b + Chain.MAGNIFY_S] = ms;
        v[b + Chain.ZT] = reduced / (mt * mt);
        v[b + Chain.ZS] = reduced / (ms * ms);
        v[b + Chain.PT] = v[b + Chain.THERMAL_T] * mt * mt;
        v[b + Chain.PS] = v[b + Chain.THERMAL_S] * ms * ms;
    }

    /**
     * Makes a lens or slab act as if it stood square to the beam, while it keeps its path: a lens with its focal length, a
     * slab with its length across the tilt, its faces widening nothing and its thermal lens kept.
     */
    void untilt(int part) {
        int b = part * Chain.STRIDE;
        switch (chain.kind[part]) {
            case LENS -> {
                v[b + Chain.PT] = 1 / v[b + Chain.SIZE];
                v[b + Chain.PS] = v[b + Chain.PT];
            }
            case PLATE, CRYSTAL -> seenThrough(b, 1, 1);
            case MIRROR, MATRIX, APERTURE -> {}
        }
    }

    /** Whether a lens or slab stands at an angle to the beam. */
    boolean isTilted(int part) {
        return (chain.kind[part] == Kind.LENS || chain.kind[part].isSlab()) && v[part * Chain.STRIDE + Chain.TILT] != 0;
    }

    /** Takes the magnitudes of other numbers of this chain, so that nothing in a walk cancels. */
    void takeMagnitudes(Numbers other) {
        System.arraycopy(other.v, 0, v, 0, v.length);
        for (int part = 0; part < chain.kind.length; part++) {
            int b = part * Chain.STRIDE;
            switch (chain.kind[part]) {
                case MIRROR -> diverge(b + Chain.POWER);
                case LENS, PLATE, CRYSTAL -> {
                    diverge(b + Chain.PT);
                    diverge(b + Chain.PS);
                }
                case MATRIX -> {
                    for (int i = 0; i < 4; i++) {
                        v[b + Chain.MATRIX_T + i] = Math.abs(v[b + Chain.MATRIX_T + i]);
                        v[b + Chain.MATRIX_S + i] = Math.abs(v[b + Chain.MATRIX_S + i]);
                    }
                }
                case APERTURE -> {}
            }
        }
    }

    private void diverge(int power) {
        v[power] = -Math.abs(v[power]);
    }

    /** Width inside over width outside a part's faces; 1 for what is not a slab. */
    double magnify(int part, Plane plane) {
        return chain.kind[part].isSlab()
                ? v[part * Chain.STRIDE + (plane == Plane.TANGENTIAL ? Chain.MAGNIFY_T : Chain.MAGNIFY_S)]
                : 1;
    }

    /** The index inside a part; 1 for what is not a slab. */
    double index(int part) {
        return chain.kind[part].isSlab() ? v[part * Chain.STRIDE + Chain.INDEX] : 1;
    }

    /** The path inside a part, m; 0 in a mirror. */
    double inside(int part) {
        return chain.kind[part] == Kind.MIRROR ? 0 : 2 * v[part * Chain.STRIDE + Chain.HALF];
    }

    /** The reduced length of a slab as the chain uses it, seen from outside, m. */
    double reduced(int part, Plane plane) {
        return 2 * v[part * Chain.STRIDE + (plane == Plane.TANGENTIAL ? Chain.ZT : Chain.ZS)];
    }

    /** The power of the lens in a slab's middle as the chain uses it, seen from outside, 1/m. */
    double power(int part, Plane plane) {
        return v[part * Chain.STRIDE + (plane == Plane.TANGENTIAL ? Chain.PT : Chain.PS)];
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

    /** The angle of incidence on a lens or a slab's faces, rad; 0 for any other part. */
    double tilt(int part) {
        return isTilted(part) ? v[part * Chain.STRIDE + Chain.TILT] : 0;
    }

    /** The design that states these numbers. */
    Design design() {
        List<Part> parts = new ArrayList<>(chain.laid().design().parts());
        for (int i = 0; i < parts.size(); i++) {
            parts.set(i, stated(i, parts.get(i)));
        }
        return chain.laid().design().withParts(parts);
    }

    /** A part with the numbers of it that were set. */
    private Part stated(int part, Part from) {
        Part now = from;
        for (Field field : from.kind().fields()) {
            int offset = Chain.offset(field);
            int slot = part * Chain.STRIDE + offset;
            if (field == Field.AT) {
                int at = part * Chain.STRIDE;
                if (chain.differs(at + Chain.X, v) || chain.differs(at + Chain.Y, v)) {
                    now = now.with(field, new Point(v[at + Chain.X], v[at + Chain.Y]));
                }
            } else if (field == Field.THERMAL_POWER) {
                int t = part * Chain.STRIDE + Chain.THERMAL_T;
                int s = part * Chain.STRIDE + Chain.THERMAL_S;
                if (chain.differs(t, v) || chain.differs(s, v)) {
                    now = now.with(field, new TwoPowers(v[t], v[s]));
                }
            } else if (field == Field.ALONG) {
                now = !inMiddle[part] && (chain.inMiddle[part] || chain.differs(slot, v))
                        ? now.with(field, Along.at(v[slot]))
                        : now;
            } else if (field == Field.FACES) {
                now = !atBrewster[part] && (chain.atBrewster[part] || chain.differs(slot, v))
                        ? now.with(field, FaceAngle.of(v[slot]))
                        : now;
            } else if (offset >= 0 && field != Field.CURVATURE && chain.differs(slot, v)) {
                now = now.with(field, (Object) v[slot]);
            }
        }
        return now;
    }
}
