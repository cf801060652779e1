package twofold.session;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import twofold.cavity.Cavity;
import twofold.cavity.CrystalLine;
import twofold.cavity.Face;
import twofold.cavity.Station;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Kind;
import twofold.design.Mirror;
import twofold.design.Names;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Unit;
import twofold.layout.Leg;
import twofold.layout.Standing;
import twofold.optics.Plane;

/** Every figure of one part of a solved design, in the order in which a person asks for them. */
public final class Figures {
    /** How the size of a beam is told. */
    public enum Across {
        /** By its 1/e² radius. */
        RADIUS("radius", 1),
        /** By twice that. */
        DIAMETER("diameter", 2);

        private final String word;
        private final double times;

        Across(String word, double times) {
            this.word = word;
            this.times = times;
        }
    }

    private final Cavity cavity;
    private final Design design;
    private final int index;
    private final Part part;
    private final Across across;
    private final List<Figure> figures = new ArrayList<>();

    private Figures(Cavity cavity, int index, Across across) {
        this.across = across;
        this.cavity = cavity;
        this.design = cavity.laid().design();
        this.index = index;
        this.part = design.parts().get(index);
    }

    /** The figures of a part, its fields and numbers of the plan among them. */
    public static List<Figure> of(Cavity cavity, int part, Across across) {
        Figures all = new Figures(cavity, part, across);
        if (all.part instanceof Mirror mirror) {
            all.mirror(mirror);
        } else {
            all.standing();
        }
        all.beam();
        all.line();
        return List.copyOf(all.figures);
    }

    /** The figures of a part that follow from its fields and from the plan: the beam there, and where it comes to stand. */
    public static List<Figure> following(Cavity cavity, int part, Across across) {
        Figures all = new Figures(cavity, part, across);
        all.beam();
        all.line();
        all.stands();
        return List.copyOf(all.figures);
    }

    /** As drawings show it: with a true minus sign. */
    private static String shown(Unit unit, double si) {
        return unit.shown(si).replace('-', '−');
    }

    private void add(String name, Unit unit, double si) {
        figures.add(Figure.of(name, unit.symbol(), shown(unit, si), unit.text(si)));
    }

    private void say(String name, String words) {
        figures.add(Figure.of(name, "", words, words));
    }

    private void mirror(Mirror mirror) {
        if (Double.isInfinite(mirror.radius())) {
            say("Radius of curvature", "flat");
        } else {
            figures.add(Figure.of(
                    mirror.radius() > 0 ? "Radius of curvature, concave" : "Radius of curvature, convex",
                    Unit.MM.symbol(),
                    shown(Unit.MM, mirror.radius()),
                    Unit.MM.text(mirror.radius())));
        }
        place(mirror.at());
        Double incidence = cavity.laid().incidence().get(index);
        if (incidence != null) {
            add("Incidence", Unit.DEG, incidence);
        }
        for (Leg leg : cavity.laid().legs()) {
            if (leg.from() == index) {
                add("Leg to " + design.parts().get(leg.to()).name(), Unit.MM, leg.path());
            } else if (leg.to() == index) {
                add("Leg from " + design.parts().get(leg.from()).name(), Unit.MM, leg.path());
            }
        }
        add("Reflectance", Unit.PERCENT, mirror.reflectance());
        add("Transmittance", Unit.PERCENT, mirror.transmittance());
        add("Diameter", Unit.MM, mirror.diameter());
        add("Clear diameter", Unit.MM, mirror.clearDiameter());
        say(
                "Mount, wide × deep",
                shown(Unit.MM, mirror.mount().width()) + " × "
                        + shown(Unit.MM, mirror.mount().depth()) + " mm");
    }

    private void place(Point at) {
        add("X", Unit.MM, at.x());
        add("Y", Unit.MM, at.y());
    }

    private void standing() {
        stands();
        part.values().stated().forEach((field, value) -> {
            if (value instanceof Double d
                    && !isTold(field)
                    && !Optional.of(value).equals(field.fallback())) {
                add(Names.capital(field.doc()), field.unit(), d);
            }
        });
    }

    /** Where a part stands that is no mirror. */
    private void stands() {
        for (Leg leg : cavity.laid().legs()) {
            for (Standing s : leg.parts()) {
                if (s.part() == index) {
                    standing(leg, s);
                }
            }
        }
    }

    /** Fields that the standing part tells of already. */
    private static boolean isTold(Field field) {
        return field == Field.INDEX || field == Field.TILT || field == Field.INSIDE;
    }

    private void standing(Leg leg, Standing s) {
        String from = design.parts().get(leg.from()).name();
        String to = design.parts().get(leg.to()).name();
        say("On the leg", from + " to " + to);
        add("Along it", Unit.MM, s.middle());
        place(leg.at(s.middle()));
        if (s.length() > 0) {
            add("Path inside", Unit.MM, s.length());
        }
        if (part.kind().isSlab() || (part.kind() == Kind.LENS && s.incidence() != 0)) {
            figures.add(Figure.of("Index", "", Unit.fixed(s.index(), 5), Unit.ONE.text(s.index())));
            add("Incidence", Unit.DEG, s.incidence());
        }
        if (s.shift() != 0) {
            add("Shifts the beam to the left by", Unit.MM, s.shift());
        }
        if (s.lift() != 0) {
            add("Lifts the beam by", Unit.MM, s.lift());
        }
    }

    private void beam() {
        boolean hasTwo = part.kind().isSlab() || part.kind() == Kind.MATRIX;
        for (Face face : hasTwo ? List.of(Face.ENTRY, Face.EXIT) : List.of(Face.SURFACE)) {
            String where = hasTwo ? ", " + face.word() : "";
            both(
                    "Beam " + across.word + where,
                    Unit.UM,
                    p -> cavity.mode(p)
                            .station(index, face)
                            .map(Station::radius)
                            .map(this::wide));
            both(
                    "Wavefront curvature" + where,
                    Unit.PER_M,
                    p -> cavity.mode(p).station(index, face).map(Station::curvature));
            cavity.roundness(index, face).ifPresent(r -> add("Roundness" + where, Unit.ONE, r));
        }
    }

    private void both(String name, Unit unit, Function<Plane, Optional<Double>> value) {
        Optional<Double> t = value.apply(Plane.TANGENTIAL);
        Optional<Double> s = value.apply(Plane.SAGITTAL);
        if (t.isPresent() || s.isPresent()) {
            figures.add(new Figure(
                    name,
                    unit.symbol(),
                    t.map(v -> shown(unit, v)).orElse("–"),
                    t.map(unit::text).orElse(""),
                    Optional.of(s.map(v -> shown(unit, v)).orElse("–")),
                    Optional.of(s.map(unit::text).orElse(""))));
        }
    }

    private double wide(double radius) {
        return across.times * radius;
    }

    private void line() {
        line("", p -> cavity.line(index, p));
        line(", behind the lens", p -> cavity.line(index, p).flatMap(CrystalLine::afterLens));
    }

    private void line(String where, Function<Plane, Optional<CrystalLine>> line) {
        both(
                "Waist " + across.word + where,
                Unit.UM,
                p -> line.apply(p).map(CrystalLine::radius).map(this::wide));
        both("Waist off the middle" + where, Unit.MM, p -> line.apply(p).map(CrystalLine::offset));
        both("Move it to centre" + where, Unit.MM, p -> line.apply(p).map(CrystalLine::shiftToCentre));
        both("Rayleigh length" + where, Unit.MM, p -> line.apply(p).map(CrystalLine::rayleigh));
    }
}
