package twofold.picture;

import java.util.Comparator;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;
import twofold.cavity.Cavity;
import twofold.cavity.CrystalLine;
import twofold.cavity.Eigenmode;
import twofold.cavity.Waist;
import twofold.design.Kind;
import twofold.design.Part;
import twofold.optics.Plane;

/**
 * A close look at one crystal, plate or leg: where each plane's waist lies against its middle, how far to move the part so
 * that it is centred, and how the Rayleigh length compares with the part's length.
 */
public final class CloseUpDrawing {
    /** The least height at which curves and words do not touch, px. */
    public static final double LEAST_HEIGHT = 160;

    private static final double RIM = 14;
    private static final double LINE = 15;
    private static final double TOP = 64;
    private static final double BOTTOM = 38;

    /** What is shown beside a slab, in its lengths from its middle, at the least and at the most. */
    private static final double LEAST = 1.5;

    private static final double MOST = 5;

    private final Cavity cavity;
    private final Course course;
    private final List<Part> parts;
    private final Points points = new Points();

    /** A drawing of a cavity; cheap, to be made anew for each. */
    public CloseUpDrawing(Cavity cavity) {
        this.cavity = cavity;
        this.course = new Course(cavity.laid());
        this.parts = cavity.laid().design().parts();
    }

    /**
     * Draws the selected crystal or plate; the leg of any other selected part; with nothing selected the first crystal or,
     * failing that, the leg with the smallest waist.
     *
     * @param width of the pane, px
     * @param height of the pane, px
     * @param selected index of a part
     */
    public void draw(Painter painter, double width, double height, OptionalInt selected) {
        if (selected.isPresent() && isSlab(selected.getAsInt())) {
            slab(painter, width, height, selected.getAsInt());
        } else if (selected.isPresent()) {
            leg(painter, width, height, course.leg(selected.getAsInt()));
        } else if (firstCrystal().isPresent()) {
            slab(painter, width, height, firstCrystal().getAsInt());
        } else {
            leg(painter, width, height, narrowest());
        }
    }

    private boolean isSlab(int part) {
        return parts.get(part).kind().isSlab();
    }

    private OptionalInt firstCrystal() {
        for (int i = 0; i < parts.size(); i++) {
            if (parts.get(i).kind() == Kind.CRYSTAL) {
                return OptionalInt.of(i);
            }
        }
        return OptionalInt.empty();
    }

    private int narrowest() {
        int leg = 0;
        double least = Double.POSITIVE_INFINITY;
        for (Plane plane : Plane.values()) {
            for (Waist w : cavity.mode(plane).waists()) {
                if (w.isReal() && w.radius() < least) {
                    least = w.radius();
                    leg = w.leg();
                }
            }
        }
        return leg;
    }

    /** Draws a crystal or plate with some path before and behind it. */
    public void slab(Painter painter, double width, double height, int part) {
        double length = course.inside(part);
        double reach = LEAST;
        for (Plane plane : Plane.values()) {
            double off = cavity.line(part, plane).map(CrystalLine::offset).orElse(0.0);
            reach = Math.max(reach, Math.min(MOST, 1.2 * Math.abs(off) / length));
        }
        double middle = course.middle(part);
        double from = Math.max(0, middle - reach * length);
        double to = Math.min(course.length(), middle + reach * length);
        String faces = cavity.laid().legs().get(course.leg(part)).parts().stream()
                .filter(s -> s.part() == part && s.incidence() > 0)
                .findFirst()
                .map(s -> ", faces at " + Figures.degrees(s.incidence()))
                .orElse("");
        painter.push(0, 0, width, height);
        head(painter, width, height, parts.get(part).name(), Figures.mm(length) + " long" + faces);
        plot(painter, width, height, new Stretch(from, to, RIM, width - RIM), OptionalInt.of(part));
        Map<Plane, CloseUpWords> words = new EnumMap<>(Plane.class);
        for (Plane plane : Plane.values()) {
            cavity.line(part, plane)
                    .ifPresent(line -> words.put(
                            plane, CloseUpWords.of(line, length, parts.get(part).name())));
        }
        words(painter, width, height, words);
        painter.pop();
    }

    /** Draws a leg from mirror to mirror. */
    public void leg(Painter painter, double width, double height, int leg) {
        String from = parts.get(cavity.laid().legs().get(leg).from()).name();
        String to = parts.get(cavity.laid().legs().get(leg).to()).name();
        double start = course.start(leg);
        double length = cavity.laid().legs().get(leg).path();
        painter.push(0, 0, width, height);
        head(painter, width, height, from + " to " + to, Figures.mm(length));
        plot(painter, width, height, new Stretch(start, start + length, RIM, width - RIM), OptionalInt.empty());
        Map<Plane, CloseUpWords> words = new EnumMap<>(Plane.class);
        for (Plane plane : Plane.values()) {
            cavity.mode(plane).waists().stream()
                    .filter(w -> w.leg() == leg && w.length() > 0)
                    .min(Comparator.comparing((Waist w) -> !w.isReal()).thenComparingDouble(Waist::radius))
                    .ifPresent(w -> words.put(
                            plane, CloseUpWords.of(w, parts.get(w.from()).name())));
        }
        words(painter, width, height, words);
        painter.pop();
    }

    private void head(Painter painter, double width, double height, String what, String note) {
        Pane.paper(painter, width, height, points);
        double right = width - RIM - Lettering.width(note, Type.SMALL);
        String title = "Close-up: " + what;
        boolean fits = RIM + Lettering.width(title, Type.TITLE) + 12 < right;
        String cut = Lettering.cut(title, Type.TITLE, fits ? right - RIM : width - 2 * RIM);
        painter.text(cut, RIM, Pane.BASE, Type.TITLE, Ink.TEXT, Anchor.START);
        if (fits) {
            painter.text(note, right, Pane.BASE, Type.SMALL, Ink.QUIET, Anchor.START);
        }
    }

    private void plot(Painter painter, double width, double height, Stretch stretch, OptionalInt centred) {
        double bottom = height - BOTTOM - 8;
        double axis = (TOP + 8 + bottom) / 2;
        double half = Math.max(8, (bottom - TOP - 8) / 2);
        double widest = Halves.widest(cavity, course, stretch.from(), stretch.to());
        Halves halves = new Halves(cavity, course, stretch, axis, axis, widest == 0 ? 0 : half / (1.05 * widest));
        for (int i = 0; i < parts.size(); i++) {
            double left = Math.max(stretch.left(), stretch.x(course.middle(i) - course.inside(i) / 2));
            double right = Math.min(stretch.right(), stretch.x(course.middle(i) + course.inside(i) / 2));
            if (right - left > 1) {
                Pane.rectangle(points, left, axis - half, right - left, 2 * half);
                painter.polygon(points, Glyphs.body(parts.get(i).kind()), 0.6);
            }
        }
        for (Plane plane : Plane.values()) {
            Eigenmode mode = cavity.mode(plane);
            if (mode.isStable()) {
                halves.draw(painter, plane, 2);
            } else {
                double y = plane == Plane.TANGENTIAL ? TOP - 20 : height - 14;
                Pane.noBeam(painter, points, plane, mode, RIM, y, width - 2 * RIM);
            }
        }
        painter.line(RIM, axis, width - RIM, axis, Stroke.of(Ink.AXIS, 1));
        if (centred.isPresent()) {
            double middle = stretch.x(course.middle(centred.getAsInt()));
            painter.line(middle, axis - half, middle, axis + half, Stroke.of(Ink.CRYSTAL_EDGE, 1.2, Dash.DOTTED));
        }
        for (BeamDrawing.WaistDot d : halves.dots()) {
            painter.line(d.x(), axis, d.x(), d.y(), Pane.line(d.plane(), 1.6));
            Pane.waist(painter, d.plane(), d.x(), d.y(), points);
        }
    }

    private static void words(Painter painter, double width, double height, Map<Plane, CloseUpWords> words) {
        double room = width - 2 * RIM;
        int first = 0;
        int second = 0;
        for (Map.Entry<Plane, CloseUpWords> e : words.entrySet()) {
            first = Math.max(first, e.getValue().firstThatFits(e.getKey(), room));
            second = Math.max(second, e.getValue().secondThatFits(room));
        }
        for (Map.Entry<Plane, CloseUpWords> e : words.entrySet()) {
            Plane plane = e.getKey();
            double base = plane == Plane.TANGENTIAL ? TOP - 20 : height - BOTTOM + 14;
            String where = e.getValue().first(plane, first);
            String further = e.getValue().second(second);
            painter.text(
                    Lettering.cut(where, Type.STRONG, room), RIM, base, Type.STRONG, Pane.ink(plane), Anchor.START);
            painter.text(
                    Lettering.cut(further, Type.SMALL, room), RIM, base + LINE, Type.SMALL, Ink.TEXT, Anchor.START);
        }
    }
}
