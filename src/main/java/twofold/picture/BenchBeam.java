package twofold.picture;

import java.util.List;
import twofold.cavity.Cavity;
import twofold.cavity.Eigenmode;
import twofold.cavity.Waist;
import twofold.design.Point;
import twofold.layout.Leg;
import twofold.optics.Plane;

/**
 * The beam on the bench: tangential radius as a filled ribbon, sagittal as a dashed outline, both so many times wider than
 * true; and the axis. Only what a pane shows is sampled, so a close look at a long leg costs no more than a far one.
 */
final class BenchBeam {
    private static final Stroke AXIS = Stroke.of(Ink.AXIS, 1, Dash.DASH_DOT);
    private static final Stroke EDGE = new Stroke(Ink.TANGENTIAL, 1, Dash.SOLID, 0.6);
    private static final Stroke OUTLINE = Stroke.of(Ink.SAGITTAL, 1.4, Dash.DASHED);

    /** Opacity of the ribbon. */
    static final double RIBBON = 0.24;

    /** How far beyond the pane lines run, px. */
    private static final double BEYOND = 12;

    private final Cavity cavity;
    private final BenchView view;
    private final Points samples = new Points();
    private final Points left = new Points();
    private final Points right = new Points();
    private final double[] range = new double[2];

    BenchBeam(Cavity cavity, BenchView view) {
        this.cavity = cavity;
        this.view = view;
    }

    /** The tangential ribbon, if there is a beam. */
    void ribbon(Painter painter) {
        edges(painter, Plane.TANGENTIAL);
    }

    /** The sagittal outline, if there is a beam. */
    void outline(Painter painter) {
        edges(painter, Plane.SAGITTAL);
    }

    private void edges(Painter painter, Plane plane) {
        Eigenmode mode = cavity.mode(plane);
        int leg = -1;
        double end = 0;
        for (Waist w : mode.waists()) {
            if (w.leg() != leg || w.start() > end + w.length() * 1e-9) {
                flush(painter, plane);
            }
            leg = w.leg();
            end = w.start() + w.length();
            if (w.length() > 0) {
                add(w);
            }
        }
        flush(painter, plane);
    }

    private void add(Waist w) {
        Leg leg = cavity.laid().legs().get(w.leg());
        Point a = leg.at(w.start());
        Point b = leg.at(w.start() + w.length());
        double x = view.viewport().x(a.x());
        double y = view.viewport().y(a.y());
        double dx = view.viewport().x(b.x()) - x;
        double dy = view.viewport().y(b.y()) - y;
        double scale = view.viewport().scale() * view.magnify();
        double widest = Math.max(w.radiusAt(0), w.radiusAt(w.length())) * scale;
        double length = Math.hypot(dx, dy);
        if (length == 0 || !visible(x, y, dx, dy, widest + BEYOND)) {
            return;
        }
        Curve.sample(w, range[0] * w.length(), range[1] * w.length(), scale, samples.clear());
        for (int i = 0; i < samples.size(); i++) {
            double share = samples.x(i) / w.length();
            double half = samples.y(i) * scale / length;
            left.add(x + share * dx + half * dy, y + share * dy - half * dx);
            right.add(x + share * dx - half * dy, y + share * dy + half * dx);
        }
    }

    private void flush(Painter painter, Plane plane) {
        if (left.size() > 1) {
            if (plane == Plane.TANGENTIAL) {
                painter.polyline(left, false, EDGE);
                painter.polyline(right, false, EDGE);
                for (int i = right.size() - 1; i >= 0; i--) {
                    left.add(right.x(i), right.y(i));
                }
                painter.polygon(left, Ink.TANGENTIAL, RIBBON);
            } else {
                painter.polyline(left, false, OUTLINE);
                painter.polyline(right, false, OUTLINE);
            }
        }
        left.clear();
        right.clear();
    }

    /** The axis, beam or not. */
    void axis(Painter painter) {
        for (Leg leg : cavity.laid().legs()) {
            List<Leg.Bend> bends = leg.bends();
            for (int i = 1; i < bends.size(); i++) {
                double x = view.viewport().x(bends.get(i - 1).at().x());
                double y = view.viewport().y(bends.get(i - 1).at().y());
                double dx = view.viewport().x(bends.get(i).at().x()) - x;
                double dy = view.viewport().y(bends.get(i).at().y()) - y;
                if (visible(x, y, dx, dy, BEYOND)) {
                    painter.line(x + range[0] * dx, y + range[0] * dy, x + range[1] * dx, y + range[1] * dy, AXIS);
                }
            }
        }
    }

    /** Marks what the beam and the axis cover. */
    void take(Room room) {
        for (Leg leg : cavity.laid().legs()) {
            List<Leg.Bend> bends = leg.bends();
            for (int i = 1; i < bends.size(); i++) {
                take(room, bends.get(i - 1).at(), bends.get(i).at(), 2, 2);
            }
        }
        for (Plane plane : Plane.values()) {
            for (Waist w : cavity.mode(plane).waists()) {
                Leg leg = cavity.laid().legs().get(w.leg());
                double scale = view.viewport().scale() * view.magnify();
                double middle = Math.min(w.length(), Math.max(0, w.after()));
                double end = w.start() + w.length();
                double waist = w.radiusAt(middle) * scale;
                Point narrow = leg.at(w.start() + middle);
                take(room, leg.at(w.start()), narrow, w.radiusAt(0) * scale, waist);
                take(room, narrow, leg.at(end), waist, w.radiusAt(w.length()) * scale);
            }
        }
    }

    private void take(Room room, Point a, Point b, double half1, double half2) {
        double x = view.viewport().x(a.x());
        double y = view.viewport().y(a.y());
        double dx = view.viewport().x(b.x()) - x;
        double dy = view.viewport().y(b.y()) - y;
        if (visible(x, y, dx, dy, Math.max(half1, half2) + BEYOND)) {
            double from = half1 + range[0] * (half2 - half1);
            double to = half1 + range[1] * (half2 - half1);
            room.take(x + range[0] * dx, y + range[0] * dy, x + range[1] * dx, y + range[1] * dy, from, to, Room.BEAM);
        }
    }

    /** How wide the beam is drawn at a path of a leg, to one side, px; 0 without a beam. */
    double halfWidth(int leg, double path) {
        double half = 0;
        for (Plane plane : Plane.values()) {
            half = Math.max(half, cavity.mode(plane).radiusAt(leg, path).orElse(0.0));
        }
        return half * view.viewport().scale() * view.magnify();
    }

    /** Sets {@link #range} to the shares of a line between which it runs in the pane widened by a rim; false if nowhere. */
    private boolean visible(double x, double y, double dx, double dy, double rim) {
        range[0] = 0;
        range[1] = 1;
        return clip(x, dx, -rim, view.width() + rim) && clip(y, dy, -rim, view.height() + rim) && range[0] < range[1];
    }

    private boolean clip(double at, double d, double low, double high) {
        if (d == 0) {
            return at >= low && at <= high;
        }
        double a = (low - at) / d;
        double b = (high - at) / d;
        range[0] = Math.max(range[0], Math.min(a, b));
        range[1] = Math.min(range[1], Math.max(a, b));
        return true;
    }
}
