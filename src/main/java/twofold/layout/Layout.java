package twofold.layout;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Mirror;
import twofold.design.Point;
import twofold.design.Problem;
import twofold.design.Shape;
import twofold.design.Subject;
import twofold.design.Unit;
import twofold.material.Materials;

/** Lays a design out: every leg's heading and path, every part's place on it, or everything that is wrong. */
public final class Layout {
    /**
     * How far parts may reach into each other or beyond a leg, m: a thousandth of a wavelength, far above the rounding of
     * a plan, far below what matters.
     */
    public static final double TOUCH = 1e-9;

    /** How far the heights of a ring's beam may fail to close, m; what the file format grants. */
    private static final double LEVEL = 1e-6;

    private final Design design;
    private final Glazing glazing;
    private final List<Integer> mirrors = new ArrayList<>();
    private final Set<Integer> distrusted;
    private final List<Problem> problems = new ArrayList<>();

    private Layout(Design design, Set<Integer> distrusted) {
        this.design = design;
        this.distrusted = new HashSet<>(distrusted);
        this.glazing = new Glazing(design.wavelength(), Materials.standard());
        for (int i = 0; i < design.parts().size(); i++) {
            if (design.parts().get(i) instanceof Mirror) {
                mirrors.add(i);
            }
        }
    }

    /** The design on the table, or all its problems, those of {@link Design#problems()} first. */
    public static Outcome<Laid> of(Design design) {
        return of(design, Set.of());
    }

    /**
     * The design on the table, or all its problems but those which rest on parts that are not to be trusted, because
     * they stand in for something that could not be read.
     *
     * @param distrusted indices of such parts
     */
    public static Outcome<Laid> of(Design design, Set<Integer> distrusted) {
        return new Layout(design, distrusted).lay();
    }

    /**
     * The design with every mirror that was typed by leg and incidence at its place.
     *
     * @param draft the design, with any position for typed mirrors
     * @param typed by the mirror's index among the parts
     */
    public static Outcome<Design> typed(Design draft, Map<Integer, Typed> typed) {
        return new TypedPlan(draft, typed).place();
    }

    private Mirror mirror(int index) {
        return (Mirror) design.parts().get(index);
    }

    private boolean isClosed() {
        return design.shape() == Shape.RING;
    }

    /** How many legs there are. */
    private int legs() {
        return isClosed() ? mirrors.size() : mirrors.size() - 1;
    }

    /** The parts on a leg, by its number. */
    private List<Integer> on(int leg) {
        int from = mirrors.get(leg) + 1;
        int to =
                leg + 1 < mirrors.size() ? mirrors.get(leg + 1) : design.parts().size();
        List<Integer> parts = new ArrayList<>();
        for (int i = from; i < to; i++) {
            parts.add(i);
        }
        return parts;
    }

    private Outcome<Laid> lay() {
        problems.addAll(design.problems());
        boolean sound = mirrors.size() >= (isClosed() ? 3 : 2)
                && mirrors.get(0) == 0
                && (isClosed()
                        || mirrors.get(mirrors.size() - 1) == design.parts().size() - 1);
        for (Problem p : problems) {
            for (int i = 0; i < design.parts().size(); i++) {
                if (p.where().steps().size() > 1
                        && p.where()
                                .steps()
                                .subList(0, 2)
                                .equals(Subject.part(i).steps())) {
                    distrusted.add(i);
                }
            }
        }
        for (int i = 0; i < design.parts().size(); i++) {
            int part = i;
            if (!distrusted.contains(i)) {
                glazing.problem(i, design.parts().get(i)).ifPresent(p -> {
                    problems.add(p);
                    distrusted.add(part);
                });
            }
        }
        if (!sound) {
            return Outcome.failed(problems);
        }
        coincidences();
        List<Leg> legs = new ArrayList<>();
        Map<Integer, Leg> trusted = new HashMap<>();
        for (int leg = 0; leg < legs(); leg++) {
            Leg laid = leg(leg);
            if (laid != null) {
                legs.add(laid);
                trusted.put(leg, laid);
            }
        }
        Map<Integer, Double> incidence = incidences(trusted);
        if (isClosed()) {
            level(legs);
        }
        return problems.isEmpty() ? Outcome.of(new Laid(design, legs, incidence)) : Outcome.failed(problems);
    }

    private void coincidences() {
        for (int j = 1; j < mirrors.size(); j++) {
            for (int i = 0; i < j; i++) {
                Mirror a = mirror(mirrors.get(i));
                Mirror b = mirror(mirrors.get(j));
                if (a.at().distance(b.at()) <= TOUCH
                        && !distrusted.contains(mirrors.get(i))
                        && !distrusted.contains(mirrors.get(j))) {
                    problems.add(new Problem(
                            Subject.part(mirrors.get(j)).at("at_mm"),
                            "found \"" + b.name() + "\" at the point of \"" + a.name() + "\"",
                            "a point where no other mirror is"));
                    distrusted.add(mirrors.get(j));
                }
            }
        }
    }

    private Map<Integer, Double> incidences(Map<Integer, Leg> legs) {
        Map<Integer, Double> incidence = new HashMap<>();
        int count = mirrors.size();
        for (int k = 0; k < count; k++) {
            int part = mirrors.get(k);
            if (!isClosed() && (k == 0 || k == count - 1)) {
                incidence.put(part, 0.0);
                continue;
            }
            Leg in = legs.get((k + count - 1) % count);
            Leg out = legs.get(k);
            if (in == null || out == null) {
                continue;
            }
            double angle = Aim.incidence(
                    in.heading().x(),
                    in.heading().y(),
                    out.heading().x(),
                    out.heading().y());
            incidence.put(part, angle);
            if (angle >= Field.Limits.GRAZING) {
                problems.add(new Problem(
                        Subject.part(part).at("at_mm"),
                        "found an incidence of " + Unit.DEG.text(rounded(angle)) + "° at \""
                                + mirror(part).name() + "\", where the beam goes "
                                + (angle > Math.PI / 2 - 1e-6 ? "straight through" : "past at grazing incidence"),
                        "a plan in which the beam turns there: an incidence below 89°"));
            }
        }
        return incidence;
    }

    /** An angle to a millionth of a degree, for words. */
    private static double rounded(double angle) {
        return Unit.DEG.toSi(Math.rint(Unit.DEG.fromSi(angle) * 1e6) / 1e6);
    }

    private void level(List<Leg> legs) {
        double lift = 0;
        int first = -1;
        for (Leg leg : legs) {
            for (Standing s : leg.parts()) {
                lift += s.lift();
                if (s.lift() != 0 && first < 0) {
                    first = s.part();
                }
            }
        }
        if (Math.abs(lift) > LEVEL && distrusted.isEmpty()) {
            problems.add(new Problem(
                    Subject.part(first).at("tilt_plane"),
                    "found sagittal tilts that lift the beam by " + millimetres(lift) + " mm a round trip",
                    "tilts whose height shifts cancel to 0.001 mm in a ring"));
        }
    }

    /** The slabs of a leg at path 0, and their sums. */
    private List<Standing> loose(List<Integer> parts) {
        return parts.stream()
                .map(i -> glazing.standing(i, design.parts().get(i)))
                .toList();
    }

    private @org.jspecify.annotations.Nullable Leg leg(int number) {
        int from = mirrors.get(number);
        int to = mirrors.get((number + 1) % mirrors.size());
        List<Integer> parts = on(number);
        if (distrusted.contains(from)
                || distrusted.contains(to)
                || parts.stream().anyMatch(distrusted::contains)) {
            return null;
        }
        List<Standing> loose = loose(parts);
        Point a = mirror(from).at();
        Point b = mirror(to).at();
        double dx = b.x() - a.x();
        double dy = b.y() - a.y();
        double shift = loose.stream().mapToDouble(Standing::shift).sum();
        double advance = loose.stream().mapToDouble(Standing::advance).sum();
        double inside = loose.stream().mapToDouble(Standing::length).sum();
        double extent = Aim.extent(dx, dy, shift);
        double air = extent - advance;
        if (!(air >= -TOUCH)) {
            problems.add(new Problem(
                    Subject.part(parts.get(0)).at("along_mm"),
                    "found parts that take " + millimetres(Math.hypot(advance, shift)) + " mm from \""
                            + mirror(from).name() + "\" to \"" + mirror(to).name() + "\", which are "
                            + millimetres(a.distance(b)) + " mm apart",
                    "mirrors further apart, or shorter parts"));
            return null;
        }
        double path = air + inside;
        List<Standing> standing = fit(loose, path, from, to);
        if (standing.isEmpty() && !loose.isEmpty()) {
            return null;
        }
        Point heading = new Point(Aim.headingX(dx, dy, extent, shift), Aim.headingY(dx, dy, extent, shift));
        return new Leg(from, to, heading, path, a.distance(b), standing, bends(a, b, heading, path, standing));
    }

    /** The parts at their places, or nothing and problems. */
    private List<Standing> fit(List<Standing> loose, double path, int from, int to) {
        List<Standing> placed = new ArrayList<>();
        for (Standing s : loose) {
            Along along = Room.along(design.parts().get(s.part()));
            double middle = along.inMiddle() ? path / 2 : along.path();
            placed.add(s.at(middle));
        }
        boolean fits = true;
        for (int i = 0; i < placed.size(); i++) {
            Standing s = placed.get(i);
            double low = i == 0 ? 0 : placed.get(i - 1).end();
            boolean last = i == placed.size() - 1;
            if (s.start() < low - TOUCH || (last && s.end() > path + TOUCH)) {
                String before = i == 0
                        ? mirror(from).name()
                        : design.parts().get(placed.get(i - 1).part()).name();
                double high = last ? path : Math.min(path, placed.get(i + 1).start());
                misfit(s, low, high, path, before, to);
                fits = false;
            }
        }
        return fits ? placed : List.of();
    }

    private void misfit(Standing s, double low, double high, double path, String before, int to) {
        boolean middle = Room.along(design.parts().get(s.part())).inMiddle();
        String reach = s.length() > 0
                ? ": it reaches from " + millimetres(s.start()) + " to " + millimetres(s.end()) + " mm"
                : "";
        String wrong = s.start() < low - TOUCH
                ? ", but \"" + before + "\" before it ends at " + millimetres(low) + " mm"
                : ", but the leg to \"" + mirror(to).name() + "\" ends at " + millimetres(path) + " mm";
        double least = low + s.length() / 2;
        double most = high - s.length() / 2;
        problems.add(new Problem(
                Subject.part(s.part()).at("along_mm"),
                "found " + (middle ? "\"middle\", " + millimetres(s.middle()) : Unit.MM.text(s.middle())) + reach
                        + wrong,
                most >= least
                        ? "from " + millimetres(least) + " to " + millimetres(most)
                        : "nothing here: only " + millimetres(Math.max(0, high - low)) + " mm are free"));
    }

    /** A length to a billionth of a metre, for words. */
    static String millimetres(double metres) {
        return Unit.MM.text(Math.rint(metres * 1e9) / 1e9);
    }

    private static List<Leg.Bend> bends(Point a, Point b, Point heading, double path, List<Standing> parts) {
        List<Leg.Bend> bends = new ArrayList<>();
        bends.add(new Leg.Bend(0, a));
        double done = 0;
        double x = a.x();
        double y = a.y();
        for (Standing s : parts) {
            if (s.length() > 0) {
                x += (s.start() - done) * heading.x();
                y += (s.start() - done) * heading.y();
                bends.add(new Leg.Bend(s.start(), new Point(x, y)));
                x += s.advance() * heading.x() - s.shift() * heading.y();
                y += s.advance() * heading.y() + s.shift() * heading.x();
                bends.add(new Leg.Bend(s.end(), new Point(x, y)));
                done = s.end();
            }
        }
        bends.add(new Leg.Bend(path, b));
        return bends;
    }
}
