package twofold.picture;

import java.util.ArrayList;
import java.util.List;
import twofold.cavity.Cavity;
import twofold.cavity.Eigenmode;
import twofold.cavity.Waist;
import twofold.optics.Plane;

/**
 * The two halves of a beam view: tangential radius upwards from one line, sagittal downwards from another, to one scale, so
 * that a balanced cavity looks like its own reflection.
 */
final class Halves {
    /** Opacity of the tint and of the hatching between curve and axis. */
    static final double TINT = 0.13;

    static final double HATCH = 0.3;

    private final Cavity cavity;
    private final Course course;
    private final Stretch stretch;
    private final double up;
    private final double down;
    private final double scale;
    private final Points curve = new Points();
    private final Points samples = new Points();

    /**
     * Halves to draw on.
     *
     * @param up where the tangential radius is 0, px
     * @param down where the sagittal radius is 0, px
     * @param scale px per metre of radius
     */
    Halves(Cavity cavity, Course course, Stretch stretch, double up, double down, double scale) {
        this.cavity = cavity;
        this.course = course;
        this.stretch = stretch;
        this.up = up;
        this.down = down;
        this.scale = scale;
    }

    /** The largest radius within a stretch, both planes, m; 0 without a beam. */
    static double widest(Cavity cavity, Course course, double from, double to) {
        double widest = 0;
        for (Plane plane : Plane.values()) {
            for (Waist w : cavity.mode(plane).waists()) {
                double start = course.start(w.leg()) + w.start();
                double a = Math.max(from, start) - start;
                double b = Math.min(to, start + w.length()) - start;
                if (a <= b) {
                    widest = Math.max(widest, Math.max(w.radiusAt(a), w.radiusAt(b)));
                }
            }
        }
        return widest;
    }

    /** The pixel of a radius in a plane's half. */
    double y(Plane plane, double radius) {
        return plane == Plane.TANGENTIAL ? up - radius * scale : down + radius * scale;
    }

    /** The tint, hatching and curve of a plane's beam. */
    void draw(Painter painter, Plane plane, double width) {
        double end = Double.NaN;
        curve.clear();
        for (Waist w : cavity.mode(plane).waists()) {
            double start = course.start(w.leg()) + w.start();
            double from = Math.max(start, stretch.from());
            double to = Math.min(start + w.length(), stretch.to());
            if (from >= to) {
                continue;
            }
            if (!(from <= end + 1e-9 * w.length())) {
                flush(painter, plane, width);
            }
            end = to;
            Curve.sample(w, from - start, to - start, scale, samples.clear());
            for (int i = 0; i < samples.size(); i++) {
                curve.add(stretch.x(start + samples.x(i)), y(plane, samples.y(i)));
            }
        }
        flush(painter, plane, width);
    }

    private void flush(Painter painter, Plane plane, double width) {
        int size = curve.size();
        if (size > 1) {
            samples.clear().add(curve.x(0), y(plane, 0));
            for (int i = 0; i < size; i++) {
                samples.add(curve.x(i), curve.y(i));
            }
            samples.add(curve.x(size - 1), y(plane, 0));
            painter.polygon(samples, Pane.ink(plane), TINT);
            painter.hatch(samples, Pane.hatch(plane), new Stroke(Pane.ink(plane), 1, Dash.SOLID, HATCH));
            painter.polyline(curve, false, Pane.line(plane, width));
        }
        curve.clear();
    }

    /** Marks what the curves and the strip between the halves cover. */
    void take(Room room) {
        room.take(stretch.left(), up - 2, stretch.right() - stretch.left(), down - up + 4, Room.TEXT);
        for (Plane plane : Plane.values()) {
            for (Waist w : cavity.mode(plane).waists()) {
                double start = course.start(w.leg()) + w.start();
                double from = Math.max(start, stretch.from());
                double to = Math.min(start + w.length(), stretch.to());
                if (from < to) {
                    Curve.sample(w, from - start, to - start, scale, samples.clear());
                    for (int i = 1; i < samples.size(); i++) {
                        room.take(
                                stretch.x(start + samples.x(i - 1)),
                                y(plane, samples.y(i - 1)),
                                stretch.x(start + samples.x(i)),
                                y(plane, samples.y(i)),
                                1,
                                1,
                                Room.BODY);
                    }
                }
            }
        }
    }

    /** Every real waist that the stretch shows. */
    List<BeamDrawing.WaistDot> dots() {
        List<BeamDrawing.WaistDot> dots = new ArrayList<>();
        for (Plane plane : Plane.values()) {
            Eigenmode mode = cavity.mode(plane);
            for (Waist w : mode.waists()) {
                // A waist on an end mirror may lie off its stretch by rounding.
                double after = Math.min(w.length(), Math.max(0, w.after()));
                double path = course.start(w.leg()) + w.start() + after;
                double slack = 1e-9 * course.length();
                if (w.isReal() && w.length() > 0 && path >= stretch.from() - slack && path <= stretch.to() + slack) {
                    dots.add(new BeamDrawing.WaistDot(plane, w, path, stretch.x(path), y(plane, w.radius())));
                }
            }
        }
        return dots;
    }
}
