package twofold;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.function.UnaryOperator;
import twofold.design.Along;
import twofold.design.Crystal;
import twofold.design.Design;
import twofold.design.FaceAngle;
import twofold.design.Field;
import twofold.design.FourNumbers;
import twofold.design.Glass;
import twofold.design.Kind;
import twofold.design.Lens;
import twofold.design.Matrix;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Plate;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.design.Side;
import twofold.design.TiltPlane;
import twofold.design.TwoPowers;
import twofold.layout.Layout;
import twofold.layout.Leg;
import twofold.layout.Standing;
import twofold.material.Materials;

/** The same cavity stated otherwise, or one that follows from it by a simple law. Only parts are kept. */
final class Restated {
    private Restated() {}

    private static Design parts(Design design, List<Part> parts) {
        return Design.of(design.title(), design.wavelength(), design.shape(), parts);
    }

    private static Design each(Design design, UnaryOperator<Part> change) {
        return parts(design, design.parts().stream().map(change).toList());
    }

    /** A ring that starts at another mirror, counted from 0. */
    static Design started(Design ring, int mirror) {
        List<Part> list = new ArrayList<>(ring.parts());
        Collections.rotate(list, -list.indexOf(ring.mirrors().get(mirror)));
        return parts(ring, list);
    }

    /** Walked the other way; a ring still starts at its first mirror. */
    static Design reversed(Design design) {
        List<Part> list = new ArrayList<>(design.parts());
        for (Leg leg : Layout.of(design).value().orElseThrow().legs()) {
            for (Standing s : leg.parts()) {
                list.set(s.part(), turned(list.get(s.part()), leg.path() - s.middle()));
            }
        }
        Collections.reverse(list);
        if (design.shape() == Shape.RING) {
            Collections.rotate(list, 1);
        }
        return parts(design, list);
    }

    /** What went up goes down the other way; left stays left, as side and direction turn both. */
    private static Part turned(Part part, double along) {
        Part turned = part.values().find(Field.ALONG).orElseThrow().equals(Along.MIDDLE)
                ? part
                : part.with(Field.ALONG, Along.at(Math.max(0, along))); // what touches the last mirror may round below
        if (turned instanceof Matrix m) {
            return new Matrix(m.name(), m.along(), m.length(), turned(m.tangential()), turned(m.sagittal()));
        }
        Object side = turned.values().find(Field.SIDE).orElse(null);
        if (part.kind().isSlab() && tilt(part) == TiltPlane.SAGITTAL) {
            return turned.with(Field.SIDE, side == Side.DOWN ? Side.UP : Side.DOWN);
        }
        return turned;
    }

    private static Object tilt(Part part) {
        return part.values().find(Field.TILT_PLANE).orElseThrow();
    }

    private static FourNumbers turned(FourNumbers m) {
        return new FourNumbers(m.d(), m.b(), m.c(), m.a());
    }

    /** Moved and turned as a whole. */
    static Design moved(Design design, double x, double y, double angle) {
        return each(
                design,
                p -> p instanceof Mirror m
                        ? m.at(KnownCavities.from(new Point(x, y), angle, m.at().x(), m.at().y()))
                        : p);
    }

    /** At another wavelength, every index as it was. */
    static Design tinted(Design design, double wavelength) {
        List<Part> list = fixed(design).parts();
        return Design.of(design.title(), wavelength, design.shape(), list);
    }

    /** Every material replaced by its index. */
    static Design fixed(Design design) {
        return each(design, p -> {
            Glass glass = p instanceof Lens l
                    ? l.glass()
                    : p instanceof Plate a
                            ? a.slab().glass()
                            : p instanceof Crystal c ? c.slab().glass() : Glass.NONE;
            if (glass.material().isEmpty() || glass.index().isPresent()) {
                return p;
            }
            double index = Materials.standard()
                    .find(glass.material().get())
                    .orElseThrow()
                    .index(design.wavelength());
            return p.with(Field.INDEX, index);
        });
    }

    /** Every length times a factor, every power divided by it. */
    static Design scaled(Design design, double by) {
        return each(design, part -> {
            Part p = part;
            if (p instanceof Mirror m) {
                p = m.at(new Point(by * m.at().x(), by * m.at().y())).with(Field.ROC, by * m.radius());
            }
            Object along = p.values().find(Field.ALONG).orElse(null);
            if (p.kind() != Kind.MIRROR && along instanceof Along a && !a.inMiddle()) {
                p = p.with(Field.ALONG, Along.at(by * a.path()));
            }
            if (p instanceof Lens l) {
                return l.with(Field.FOCAL_LENGTH, by * l.focalLength());
            } else if (p instanceof Plate a) {
                return a.with(Field.ACROSS, by * a.thickness());
            } else if (p instanceof Crystal c) {
                TwoPowers t = c.thermalPower();
                return c.with(Field.INSIDE, by * c.length())
                        .with(Field.THERMAL_POWER, new TwoPowers(t.tangential() / by, t.sagittal() / by));
            } else if (p instanceof Matrix m) {
                FourNumbers t = scaled(m.tangential(), by);
                return new Matrix(m.name(), m.along(), by * m.length(), t, scaled(m.sagittal(), by));
            }
            return p;
        });
    }

    private static FourNumbers scaled(FourNumbers m, double by) {
        return new FourNumbers(m.a(), by * m.b(), m.c() / by, m.d());
    }

    /** The same parts on one straight line, 20 mm of air between them, with nothing in them that tells the planes apart. */
    static Design straight(Design design) {
        List<Part> list = new ArrayList<>();
        List<Mirror> mirrors = design.mirrors();
        double at = 0;
        for (Part part : fixed(design).parts()) {
            at += 0.02;
            if (part instanceof Lens l) {
                list.add(l.with(Field.TILT, 0.0).with(Field.ALONG, Along.at(at)));
            } else if (part.kind().isSlab()) {
                double path = part instanceof Plate a ? a.thickness() : ((Crystal) part).length();
                Part slab = part.with(Field.FACES, FaceAngle.of(0)).with(Field.ALONG, Along.at(at + path / 2));
                list.add(slab instanceof Crystal c ? round(c) : slab);
                at += path;
            } else if (part instanceof Matrix m) {
                list.add(new Matrix(
                        m.name(), Along.at(at + m.length() / 2), m.length(), m.tangential(), m.tangential()));
                at += m.length();
            } else if (!(part instanceof Mirror)) {
                list.add(part.with(Field.ALONG, Along.at(at)));
            }
        }
        list.add(0, mirrors.get(0).at(new Point(0, 0)));
        list.add(mirrors.get(mirrors.size() - 1).at(new Point(at + 0.02, 0)));
        return Design.of(design.title(), design.wavelength(), Shape.STANDING_WAVE, list);
    }

    private static Part round(Crystal c) {
        double power = c.thermalPower().tangential();
        return c.with(Field.THERMAL_POWER, new TwoPowers(power, power));
    }
}
