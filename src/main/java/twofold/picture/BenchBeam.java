package twofold.picture;

import java.util.List;
import twofold.cavity.Cavity;
import twofold.cavity.Eigenmode;
import twofold.cavity.Waist;
import twofold.design.Point;
import twofold.layout.Leg;
import twofold.layout.Standing;
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
    static final double RIBBON = 0.18;

    /** How far beyond the pane lines run, px. */
    private static final double BEYOND = 12;

    private final Cavity cavity;
    private final List<Stand> stands;
    private final BenchView view;
    private final Points samples = new Points();
    private final Points left = new Points();
    private final Points right = new Points();
    private final double[] range = new double[2];

    BenchBeam(Cavity cavity, List<Stand> stands, BenchView view) {
        this.cavity = cavity;
        this.stands = stands;
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
        double px = length / w.length();
        double begin = range[0] > 0 ? 0 : beginCut(leg, w, dx, dy);
        double end = range[1] < 1 ? 0 : endCut(leg, w, dx, dy);
        Frame frame = new Frame(x, y, dx / length, -dy / length, 1);
        side(left, frame, px, scale, begin, end);
        side(right, frame, px, -scale, begin, end);
    }

    /** Adds one edge of a stretch: it begins and ends where it meets the faces there, not square to the axis. */
    private void side(Points to, Frame frame, double px, double scale, double begin, double end) {
        int last = samples.size() - 1;
        double first = samples.y(0) * scale;
        double stop = samples.y(last) * scale;
        double from = samples.x(0) * px - first * begin;
        double until = samples.x(last) * px - stop * end;
        frame.add(to, from, first);
        for (int i = 1; i < last; i++) {
            double along = samples.x(i) * px;
            if (along > from && along < until) {
                frame.add(to, along, samples.y(i) * scale);
            }
        }
        frame.add(to, until, stop);
    }

    /** The cut at a stretch's beginning: along the face there; square behind a thermal lens. */
    private double beginCut(Leg leg, Waist w, double dx, double dy) {
        boolean whole = !w.isInside() || w.start() <= standing(leg, w.from()).start();
        return whole ? stands.get(w.from()).cut(dx, -dy) : 0;
    }

    private double endCut(Leg leg, Waist w, double dx, double dy) {
        boolean whole = !w.isInside()
                || w.start() + w.length() * (1 + 1e-9) >= standing(leg, w.to()).end();
        return whole ? stands.get(w.to()).cut(dx, -dy) : 0;
    }

    private static Standing standing(Leg leg, int part) {
        return leg.parts().stream()
                .filter(s -> s.part() == part)
                .findFirst()
                .orElseThrow(() -> new IllegalArgumentException("part " + part + " stands on another leg"));
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
