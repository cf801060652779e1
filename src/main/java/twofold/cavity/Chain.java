package twofold.cavity;

import java.util.ArrayList;
import java.util.List;
import twofold.design.Along;
import twofold.design.Aperture;
import twofold.design.Crystal;
import twofold.design.Design;
import twofold.design.FaceAngle;
import twofold.design.Field;
import twofold.design.FourNumbers;
import twofold.design.Kind;
import twofold.design.Lens;
import twofold.design.Matrix;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Plate;
import twofold.design.Shape;
import twofold.design.Slab;
import twofold.design.TiltPlane;
import twofold.layout.Laid;
import twofold.layout.Leg;
import twofold.layout.Standing;

/**
 * What a laid-out design's two chains are made of: kinds, order, and where each number stands in a {@link Trial}.
 * Immutable, shared by all threads.
 */
public final class Chain {
    /** Numbers of one part; a slot is {@code part * STRIDE + offset}. */
    static final int STRIDE = 16;

    // Of a mirror.
    static final int X = 0;
    static final int Y = 1;
    static final int ROC = 2;
    static final int CURVATURE = 3;
    static final int POWER = 4;

    // Of everything that stands on a leg.
    static final int AT = 0;
    static final int HALF = 1;

    // Of a lens or a slab: stated.
    static final int SIZE = 2;
    static final int TILT = 3;
    static final int INDEX = 4;
    static final int THERMAL_T = 5;
    static final int THERMAL_S = 6;
    static final int THERMAL = 7;

    // Of a lens or a slab: derived, as the chain uses them, seen from outside the faces.
    static final int PT = 8;
    static final int PS = 9;
    static final int ZT = 10;
    static final int ZS = 11;
    static final int SHIFT = 12;
    static final int ADVANCE = 13;
    static final int MAGNIFY_T = 14;
    static final int MAGNIFY_S = 15;

    // Of a black box.
    static final int MATRIX_T = 4;
    static final int MATRIX_S = 8;

    final Laid laid;
    final boolean ring;
    final double wavelength;
    /** Index of the mirror that each leg leaves; one more for where the last leg ends. */
    final int[] mirror;

    final Kind[] kind;
    final boolean[] sagittalTilt;
    final int[] sign;
    final boolean[] atBrewster;
    final boolean[] inMiddle;
    /** First station of each part; slabs and black boxes have two. */
    final int[] station;

    final int stations;
    private final double[] numbers;

    private Chain(Laid laid) {
        Design design = laid.design();
        this.laid = laid;
        this.ring = design.shape() == Shape.RING;
        this.wavelength = design.wavelength();
        List<Part> parts = design.parts();
        int n = parts.size();
        kind = parts.stream().map(Part::kind).toArray(Kind[]::new);
        sagittalTilt = new boolean[n];
        sign = new int[n];
        atBrewster = new boolean[n];
        inMiddle = new boolean[n];
        station = new int[n];
        numbers = new double[n * STRIDE];
        int stationsSoFar = 0;
        for (int i = 0; i < n; i++) {
            station[i] = stationsSoFar;
            stationsSoFar += kind[i].isSlab() || kind[i] == Kind.MATRIX ? 2 : 1;
        }
        stations = stationsSoFar;
        List<Integer> mirrors = new ArrayList<>();
        for (Leg leg : laid.legs()) {
            mirrors.add(leg.from());
        }
        mirrors.add(laid.legs().get(laid.legs().size() - 1).to());
        mirror = mirrors.stream().mapToInt(Integer::intValue).toArray();
        for (int i = 0; i < n; i++) {
            fill(i, parts.get(i));
        }
        for (Leg leg : laid.legs()) {
            for (Standing s : leg.parts()) {
                numbers[s.part() * STRIDE + AT] = s.middle();
                if (kind[s.part()] != Kind.MATRIX && kind[s.part()] != Kind.APERTURE) {
                    numbers[s.part() * STRIDE + INDEX] = s.index();
                    numbers[s.part() * STRIDE + TILT] = s.incidence();
                }
            }
        }
    }

    /** The chain of a laid-out design. */
    public static Chain of(Laid laid) {
        return new Chain(laid);
    }

    /** A trial filled with the design's numbers, for one thread. */
    public Trial trial() {
        return new Trial(new Numbers(this, numbers.clone()));
    }

    /** What the chain was made from. */
    public Laid laid() {
        return laid;
    }

    /** How many legs there are. */
    int legs() {
        return mirror.length - 1;
    }

    /**
     * The index of the part with a name.
     *
     * @throws IllegalArgumentException if there is none
     */
    public int part(String name) {
        return laid.design()
                .indexOf(name)
                .orElseThrow(() -> new IllegalArgumentException("no part is called \"" + name + "\""));
    }

    /**
     * The number of the leg between two mirrors, named in either order.
     *
     * @throws IllegalArgumentException if no leg joins them
     */
    public int leg(Place place) {
        int a = part(place.first());
        int b = place.second().map(this::part).orElse(a);
        for (int leg = 0; leg < legs(); leg++) {
            if ((mirror[leg] == a && mirror[leg + 1] == b) || (mirror[leg] == b && mirror[leg + 1] == a)) {
                return leg;
            }
        }
        throw new IllegalArgumentException("\"" + place + "\" is no leg");
    }

    /** The leg that ends at a mirror; −1 for the first mirror of a standing wave. */
    int legTo(int part) {
        for (int leg = 0; leg < legs(); leg++) {
            if (mirror[leg + 1] == part) {
                return leg;
            }
        }
        return -1;
    }

    /** One past the last part on a leg. */
    int end(int leg) {
        return leg + 1 < mirror.length && mirror[leg + 1] > mirror[leg] ? mirror[leg + 1] : kind.length;
    }

    /**
     * Where a number of a part stands.
     *
     * @param part index in the design
     * @param field one that {@link Field#isSettable} of that kind
     * @throws IllegalArgumentException with the names, where that number does not act on the light
     */
    public int slot(int part, Field field) {
        if (!has(part, field)) {
            throw new IllegalArgumentException(
                    field.json() + " of \"" + laid.design().parts().get(part).name() + "\" is no number of the chain");
        }
        return part * STRIDE + offset(field);
    }

    /** Where a field's number stands among those of a part; −1 for one that light does not feel. */
    static int offset(Field field) {
        return switch (field) {
            case ROC -> ROC;
            case CURVATURE -> CURVATURE;
            case ALONG -> AT;
            case FOCAL_LENGTH, ACROSS, INSIDE, BOX -> SIZE;
            case INDEX -> INDEX;
            case TILT, FACES -> TILT;
            case THERMAL_POWER -> THERMAL;
            default -> -1;
        };
    }

    /** Whether a number was set to another value than the design's. */
    boolean differs(int slot, double[] now) {
        return numbers[slot] != now[slot];
    }

    /** Whether a field of a part is a number of the chain: light feels it. */
    public boolean has(int part, Field field) {
        return offset(field) >= 0 && field.kinds().contains(kind[part]);
    }

    /** Where a mirror's x stands. */
    public int x(int mirror) {
        return position(mirror, X);
    }

    /** Where a mirror's y stands. */
    public int y(int mirror) {
        return position(mirror, Y);
    }

    private int position(int part, int offset) {
        if (kind[part] != Kind.MIRROR) {
            throw new IllegalArgumentException(
                    "\"" + laid.design().parts().get(part).name() + "\" has no position");
        }
        return part * STRIDE + offset;
    }

    /** The station of a part's face. */
    public int station(int part, Face face) {
        return station[part] + (face == Face.EXIT ? 1 : 0);
    }

    private void fill(int part, Part what) {
        int base = part * STRIDE;
        what.match(new Part.Cases<Boolean>() {
            @Override
            public Boolean mirror(Mirror m) {
                numbers[base + X] = m.at().x();
                numbers[base + Y] = m.at().y();
                numbers[base + ROC] = m.radius();
                numbers[base + CURVATURE] = m.curvature();
                return true;
            }

            @Override
            public Boolean lens(Lens l) {
                numbers[base + SIZE] = l.focalLength();
                sagittalTilt[part] = l.tiltPlane() == TiltPlane.SAGITTAL;
                return along(l.along());
            }

            @Override
            public Boolean plate(Plate p) {
                numbers[base + SIZE] = p.thickness();
                return slab(p.slab());
            }

            @Override
            public Boolean crystal(Crystal c) {
                numbers[base + SIZE] = c.length();
                numbers[base + THERMAL_T] = c.thermalPower().tangential();
                numbers[base + THERMAL_S] = c.thermalPower().sagittal();
                return slab(c.slab());
            }

            @Override
            public Boolean aperture(Aperture a) {
                return along(a.along());
            }

            @Override
            public Boolean matrix(Matrix m) {
                numbers[base + SIZE] = m.length();
                four(base + MATRIX_T, m.tangential());
                four(base + MATRIX_S, m.sagittal());
                return along(m.along());
            }

            private Boolean slab(Slab s) {
                FaceAngle faces = s.faces();
                atBrewster[part] = faces.atBrewster();
                sagittalTilt[part] = s.tiltPlane() == TiltPlane.SAGITTAL;
                sign[part] = s.side().sign();
                return along(s.along());
            }

            private Boolean along(Along along) {
                inMiddle[part] = along.inMiddle();
                return true;
            }

            private void four(int at, FourNumbers m) {
                numbers[at] = m.a();
                numbers[at + 1] = m.b();
                numbers[at + 2] = m.c();
                numbers[at + 3] = m.d();
            }
        });
    }
}
