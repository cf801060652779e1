package twofold.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import twofold.cavity.Cavity;
import twofold.cavity.Eigenmode;
import twofold.cavity.Station;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Point;
import twofold.layout.Footprint;
import twofold.optics.Plane;

/**
 * The plan of a cavity, seen from above, to scale: the table's holes, mounts, parts with their true shapes, the axis and the
 * beam, so many times wider than true. An unstable plane has no beam; the drawing says so in words.
 */
public final class BenchDrawing {
    /** Half width that the widest beam is drawn with at the least and at the most when all is shown, px. */
    private static final double NARROW = 11;

    private static final double WIDE = 22;

    /** Rims kept free for heads, names and the scale bar when all is shown, px. */
    private static final double RIM = 56;

    private static final double HEAD = 64;
    private static final double FOOT = 56;

    private final Cavity cavity;
    private final Course course;
    private final List<Stand> stands;
    private final List<Footprint> mounts;
    private final Points points = new Points();

    /** A drawing of a cavity; cheap, to be made anew for each. */
    public BenchDrawing(Cavity cavity) {
        this.cavity = cavity;
        this.course = new Course(cavity.laid());
        this.stands = Stand.of(cavity.laid());
        this.mounts = Footprint.of(cavity.laid());
    }

    /** The view that shows all of it in a pane, beam magnified by itself, nothing selected. */
    public BenchView all(double width, double height) {
        Viewport viewport =
                Viewport.showing(box(), RIM, HEAD, Math.max(40, width - 2 * RIM), Math.max(40, height - HEAD - FOOT));
        return new BenchView(
                width, height, viewport, magnification(viewport.scale()), OptionalInt.empty(), OptionalDouble.empty());
    }

    /** What parts, mounts and the axis take on the table. */
    public Box box() {
        double left = Double.POSITIVE_INFINITY;
        double bottom = Double.POSITIVE_INFINITY;
        double right = Double.NEGATIVE_INFINITY;
        double top = Double.NEGATIVE_INFINITY;
        List<Point> all = new ArrayList<>();
        mounts.forEach(m -> all.addAll(m.corners()));
        for (Stand s : stands) {
            double reach = Math.max(s.half(), Math.max(s.back(), s.front()));
            all.add(new Point(s.at().x() - reach, s.at().y() - reach));
            all.add(new Point(s.at().x() + reach, s.at().y() + reach));
        }
        for (Point p : all) {
            left = Math.min(left, p.x());
            right = Math.max(right, p.x());
            bottom = Math.min(bottom, p.y());
            top = Math.max(top, p.y());
        }
        return new Box(left, bottom, right, top);
    }

    /**
     * A round factor by which the beam is drawn wider than true, so that its widest place is about as wide as the smallest
     * mirror, and neither a thread nor a slab on the screen.
     *
     * @param scale px per metre at which all is shown
     */
    public double magnification(double scale) {
        double widest = 0;
        for (Plane plane : Plane.values()) {
            for (Station s : cavity.mode(plane).stations()) {
                widest = Math.max(widest, s.radius());
            }
        }
        double smallest = Double.POSITIVE_INFINITY;
        for (Part p : cavity.laid().design().parts()) {
            if (p instanceof Mirror m) {
                smallest = Math.min(smallest, m.diameter());
            }
        }
        double half = Math.min(WIDE, Math.max(NARROW, smallest / 2 * scale));
        return widest == 0 ? 1 : Nice.factor(half / (widest * scale));
    }

    /** Draws it all. */
    public void draw(Painter painter, BenchView view) {
        table(painter, view);
        content(painter, view);
    }

    /** The table alone, which changes with the viewport only. */
    public void table(Painter painter, BenchView view) {
        painter.push(0, 0, view.width(), view.height());
        Pane.paper(painter, view.width(), view.height(), points);
        Table.holes(painter, view, points);
        painter.pop();
    }

    /** All that stands on the table. */
    public void content(Painter painter, BenchView view) {
        BenchBeam beam = new BenchBeam(cavity, stands, view);
        BenchParts parts = new BenchParts(cavity.laid().design().parts(), stands, mounts, view, painter);
        Room room = new Room(view.width(), view.height());
        painter.push(0, 0, view.width(), view.height());
        parts.mounts();
        parts.slabBodies();
        beam.ribbon(painter);
        beam.outline(painter);
        beam.axis(painter);
        parts.bodies();
        parts.selection();
        beam.take(room);
        parts.take(room);
        head(painter, view, room);
        Table.scale(painter, view, hasBeam(), room);
        new BenchLabels(cavity, stands, beam, view, painter, room).draw();
        crosshair(painter, view, beam);
        painter.pop();
    }

    private boolean hasBeam() {
        return cavity.tangential().isStable() || cavity.sagittal().isStable();
    }

    private void head(Painter painter, BenchView view, Room room) {
        String note = Table.showsHoles(view) ? "seen from above, 25 mm holes" : "seen from above";
        Pane.head(painter, points, "Bench", note, view.width());
        room.take(0, 0, view.width(), Pane.HEAD, Room.TEXT);
        double y = 46;
        for (Plane plane : Plane.values()) {
            Eigenmode mode = cavity.mode(plane);
            if (!mode.isStable()) {
                double width = Pane.noBeam(painter, points, plane, mode, 14, y, view.width() - 28);
                room.take(0, y - 14, width + 28, 22, Room.TEXT);
                y += 19;
            }
        }
    }

    private void crosshair(Painter painter, BenchView view, BenchBeam beam) {
        if (view.crosshair().isEmpty()) {
            return;
        }
        double path = Math.min(course.length(), Math.max(0, view.crosshair().getAsDouble()));
        int leg = course.legAt(path);
        double along = path - course.start(leg);
        Point at = course.at(path);
        double x = view.viewport().x(at.x());
        double y = view.viewport().y(at.y());
        Point heading = cavity.laid().legs().get(leg).heading();
        double reach = beam.halfWidth(leg, along) + 10;
        Pane.cross(painter, points, new Frame(x, y, heading.x(), heading.y(), 1), reach);
    }

    /**
     * The part at a pixel: the one whose body is nearest within a tolerance; failing that, the one whose mount is there.
     *
     * @param view what is shown
     * @param x px
     * @param y px
     * @param tolerance px
     */
    public OptionalInt partAt(BenchView view, double x, double y, double tolerance) {
        int best = -1;
        double least = tolerance;
        double size = Double.POSITIVE_INFINITY;
        for (Stand s : stands) {
            double off = s.off(view.viewport(), x, y);
            double reach = s.half() * (s.back() + s.front());
            if (off < least || (off == least && reach < size)) {
                best = s.part();
                least = off;
                size = reach;
            }
        }
        for (int i = 0; i < mounts.size() && best < 0; i++) {
            if (covers(mounts.get(i), view.viewport().at(x, y))) {
                best = mounts.get(i).part();
            }
        }
        return best < 0 ? OptionalInt.empty() : OptionalInt.of(best);
    }

    private static boolean covers(Footprint mount, Point p) {
        List<Point> c = mount.corners();
        for (int i = 0; i < c.size(); i++) {
            Point a = c.get(i);
            Point b = c.get((i + 1) % c.size());
            if ((b.x() - a.x()) * (p.y() - a.y()) - (b.y() - a.y()) * (p.x() - a.x()) < 0) {
                return false;
            }
        }
        return true;
    }

    /** The path of the axis nearest to a pixel, m, if that is within a tolerance, px. */
    public OptionalDouble pathAt(BenchView view, double x, double y, double tolerance) {
        Course.Nearest nearest = course.nearest(view.viewport().at(x, y));
        return nearest.distance() * view.viewport().scale() <= tolerance
                ? OptionalDouble.of(nearest.path())
                : OptionalDouble.empty();
    }

    /** The unfolded path, which leads from a path to a place. */
    public Course course() {
        return course;
    }
}
