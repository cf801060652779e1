package twofold.picture;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import twofold.cavity.Cavity;
import twofold.cavity.Waist;
import twofold.design.Part;
import twofold.design.Shape;
import twofold.optics.Plane;

/**
 * The beam along the unfolded path: tangential radius above, sagittal below, the parts in a lane between. Once round a ring,
 * one pass of a standing wave. The jump of a radius at a tilted face is true: the beam inside is wider.
 */
public final class BeamDrawing {
    private static final double LEFT = 62;
    private static final double RIGHT = 20;
    private static final double TOP = 66;
    private static final double BOTTOM = 32;
    private static final double LANE = 34;

    /** Px from one axis number to the next at the least. */
    private static final double APART_Y = 26;

    private static final double APART_X = 90;

    private static final Stroke GRID = Stroke.of(Ink.RULE, 1);

    private final Cavity cavity;
    private final Course course;
    private final List<Stand> stands;
    private final Points points = new Points();

    /** A drawing of a cavity; cheap, to be made anew for each. */
    public BeamDrawing(Cavity cavity) {
        this.cavity = cavity;
        this.course = new Course(cavity.laid());
        this.stands = Stand.of(cavity.laid());
    }

    /** The view that shows the whole path in a pane. */
    public BeamView all(double width, double height) {
        return new BeamView(
                width,
                height,
                new Stretch(0, course.length(), LEFT, Math.max(LEFT + 40, width - RIGHT)),
                OptionalInt.empty(),
                OptionalDouble.empty(),
                false);
    }

    /** The unfolded path, which leads from a path to a place. */
    public Course course() {
        return course;
    }

    /**
     * A waist that lies within its stretch, as a dot in the pane.
     *
     * @param plane whose
     * @param waist which
     * @param path from the first mirror, m
     * @param x px
     * @param y px
     */
    public record WaistDot(Plane plane, Waist waist, double path, double x, double y) {}

    /** Where things lie across the pane, px. */
    private record Rows(double top, double up, double middle, double down, double bottom) {
        static Rows of(BeamView view) {
            double bottom = view.height() - BOTTOM;
            double half = Math.max(10, (bottom - TOP - LANE) / 2);
            return new Rows(TOP, TOP + half, TOP + half + LANE / 2, TOP + half + LANE, TOP + 2 * half + LANE);
        }
    }

    /** The radius at the end of the axis, m; 0 without a beam. */
    private double top(BeamView view) {
        double widest = Halves.widest(
                cavity, course, view.stretch().from(), view.stretch().to());
        return widest == 0 ? 0 : Nice.top(widest * 1.1e6) * 1e-6;
    }

    private Halves halves(BeamView view, Rows rows) {
        double top = top(view);
        return new Halves(
                cavity, course, view.stretch(), rows.up(), rows.down(), top == 0 ? 0 : (rows.up() - rows.top()) / top);
    }

    /** Draws it all. */
    public void draw(Painter painter, BeamView view) {
        Rows rows = Rows.of(view);
        Halves halves = halves(view, rows);
        Stretch s = view.stretch();
        painter.push(0, 0, view.width(), view.height());
        Pane.paper(painter, view.width(), view.height(), points);
        Pane.head(painter, points, "Beam along the path", note(), view.width());
        radiusAxis(painter, view, rows);
        pathAxis(painter, view, rows);
        bands(painter, view, rows);
        for (Plane plane : Plane.values()) {
            if (cavity.mode(plane).isStable()) {
                halves.draw(painter, plane, 2);
            } else {
                double y = plane == Plane.TANGENTIAL ? (rows.top() + rows.up()) / 2 : (rows.down() + rows.bottom()) / 2;
                Pane.noBeam(painter, points, plane, cavity.mode(plane), s.left() + 14, y, s.right() - s.left() - 14);
            }
        }
        painter.line(s.left(), rows.up(), s.right(), rows.up(), Stroke.of(Ink.AXIS, 1));
        painter.line(s.left(), rows.down(), s.right(), rows.down(), Stroke.of(Ink.AXIS, 1));
        painter.line(s.left(), rows.middle(), s.right(), rows.middle(), Stroke.of(Ink.AXIS, 1, Dash.DASH_DOT));
        new BeamLabels(cavity, course, view, painter).names(rows.top(), rows.up());
        lane(painter, view, rows);
        List<WaistDot> dots = halves.dots();
        for (WaistDot d : dots) {
            Pane.waist(painter, d.plane(), d.x(), d.y(), points);
        }
        BeamLabels labels = new BeamLabels(cavity, course, view, painter);
        if (view.numbers()) {
            labels.numbers(dots, halves, rows.top(), rows.bottom(), points);
        }
        if (view.crosshair().isPresent()) {
            double path = view.crosshair().getAsDouble();
            labels.crosshair(path, halves, rows.top(), rows.bottom(), rows.middle(), points);
        }
        painter.pop();
    }

    private String note() {
        String way = cavity.laid().design().shape() == Shape.RING ? "once round" : "one pass";
        return way + ": tangential radius above, sagittal below";
    }

    private void radiusAxis(Painter painter, BeamView view, Rows rows) {
        double top = top(view);
        painter.text("radius, µm", 16, rows.middle(), Type.SMALL, Ink.QUIET, Anchor.MIDDLE, -90);
        if (top == 0) {
            return;
        }
        double perMicrometre = (rows.up() - rows.top()) / (top * 1e6);
        double step = Nice.tick(APART_Y / perMicrometre);
        int decimals = Nice.decimals(step);
        Stretch s = view.stretch();
        for (int i = 0; i * step <= top * 1e6 * (1 + 1e-9); i++) {
            double off = i * step * perMicrometre;
            String text = Figures.fixed(i * step, decimals);
            for (int side = -1; side <= 1; side += 2) {
                double y = Math.round((side < 0 ? rows.up() - off : rows.down() + off) - 0.5) + 0.5;
                if (i > 0) {
                    painter.line(s.left(), y, s.right(), y, GRID);
                }
                if (i > 0 || side < 0) {
                    double at = i == 0 ? rows.middle() : y;
                    painter.text(text, s.left() - 12, at + 4, Type.SMALL, Ink.QUIET, Anchor.END);
                }
            }
        }
    }

    private void pathAxis(Painter painter, BeamView view, Rows rows) {
        Stretch s = view.stretch();
        double perMm = (s.right() - s.left()) / ((s.to() - s.from()) * 1e3);
        double step = Nice.tick(APART_X / perMm);
        int decimals = Nice.decimals(step);
        String unit = "path, mm";
        double free = s.right() - Lettering.width(unit, Type.SMALL) - 10;
        painter.text(unit, s.right(), rows.bottom() + 18, Type.SMALL, Ink.QUIET, Anchor.END);
        // The crosshair's own number stands in the row of numbers.
        double crossing = view.crosshair().isPresent() ? s.x(view.crosshair().getAsDouble()) : Double.NEGATIVE_INFINITY;
        double taken = Lettering.width(Figures.mm(s.to()), Type.STRONG) / 2 + 6;
        for (double k = Math.ceil(s.from() * 1e3 / step - 1e-9); k * step <= s.to() * 1e3 * (1 + 1e-12); k++) {
            double x = s.x(k * step * 1e-3);
            painter.line(x, rows.bottom(), x, rows.bottom() + 4, Stroke.of(Ink.AXIS, 1));
            String text = Figures.fixed(k * step, decimals);
            double half = Lettering.width(text, Type.SMALL) / 2;
            if (x + half < free && Math.abs(x - crossing) > half + taken) {
                painter.text(text, x, rows.bottom() + 18, Type.SMALL, Ink.QUIET, Anchor.MIDDLE);
            }
        }
        painter.line(s.left(), rows.bottom(), s.right(), rows.bottom(), GRID);
    }

    /** The stretches inside plates, crystals and boxes, where they are wide enough to see. */
    private void bands(Painter painter, BeamView view, Rows rows) {
        Stretch s = view.stretch();
        for (Stand stand : stands) {
            Ink ink =
                    Glyphs.body(cavity.laid().design().parts().get(stand.part()).kind());
            double half = course.inside(stand.part()) / 2;
            double left = Math.max(s.left(), s.x(course.middle(stand.part()) - half));
            double right = Math.min(s.right(), s.x(course.middle(stand.part()) + half));
            if (right - left > 3) {
                Pane.rectangle(points, left, rows.top(), right - left, rows.bottom() - rows.top());
                painter.polygon(points, ink, 0.45);
            }
        }
    }

    private void lane(Painter painter, BeamView view, Rows rows) {
        Lane lane = new Lane(painter, rows.middle(), LANE - 8);
        Stretch s = view.stretch();
        double perMetre = (s.right() - s.left()) / (s.to() - s.from());
        List<Part> parts = cavity.laid().design().parts();
        for (Stand stand : stands) {
            double x = s.x(course.middle(stand.part()));
            double width = course.inside(stand.part()) * perMetre;
            if (x + width / 2 > s.left() - 10 && x - width / 2 < s.right() + 10) {
                int facing = stand.part() == 0 || parts.get(stand.part()).kind() != twofold.design.Kind.MIRROR ? 1 : -1;
                lane.draw(parts.get(stand.part()), x, width, stand, facing);
                if (view.selected().equals(OptionalInt.of(stand.part()))) {
                    Pane.brackets(painter, points, x, rows.middle(), Math.max(8, width / 2 + 5), LANE / 2 - 1);
                }
            }
        }
        double end = s.x(course.length());
        if (cavity.laid().design().shape() == Shape.RING && end < s.right() + 10) {
            lane.draw(parts.get(0), end, 0, stands.get(0), -1);
        }
    }

    /** The part at a pixel: the one whose glyph, or place along the path, is nearest within a tolerance, px. */
    public OptionalInt partAt(BeamView view, double x, double y, double tolerance) {
        Rows rows = Rows.of(view);
        if (y < rows.top() - 34 || y > rows.bottom()) {
            return OptionalInt.empty();
        }
        int part = course.partNear(view.stretch().path(x));
        double half = course.inside(part) / 2;
        double perMetre = view.stretch().x(1) - view.stretch().x(0);
        double off = Math.abs(view.stretch().path(x) - course.middle(part));
        if (part == 0 && cavity.laid().design().shape() == Shape.RING) {
            off = Math.min(off, Math.abs(view.stretch().path(x) - course.length()));
        }
        return Math.max(0, off - half) * perMetre <= tolerance ? OptionalInt.of(part) : OptionalInt.empty();
    }

    /** The path at a pixel, m, if that lies within the plot. */
    public OptionalDouble pathAt(BeamView view, double x, double y) {
        Stretch s = view.stretch();
        boolean inside = x >= s.left() - 0.5 && x <= s.right() + 0.5 && y >= 0 && y <= view.height();
        return inside ? OptionalDouble.of(Math.min(course.length(), Math.max(0, s.path(x)))) : OptionalDouble.empty();
    }

    /** The waist whose dot is nearest to a pixel within a tolerance, px. */
    public Optional<WaistDot> waistAt(BeamView view, double x, double y, double tolerance) {
        Halves halves = halves(view, Rows.of(view));
        WaistDot best = null;
        double least = tolerance;
        for (WaistDot d : halves.dots()) {
            double off = Math.hypot(d.x() - x, d.y() - y);
            if (off <= least) {
                least = off;
                best = d;
            }
        }
        return Optional.ofNullable(best);
    }
}
