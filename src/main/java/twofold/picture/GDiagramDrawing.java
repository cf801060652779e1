package twofold.picture;

import java.util.List;
import twofold.optics.Plane;

/**
 * The diagram of standing waves: G1 to the right, G2 upwards, shaded where 0 ≤ G1 G2 ≤ 1, with a point for each plane,
 * filled for the tangential and hollow for the sagittal, and the way that it came.
 */
public final class GDiagramDrawing {
    private static final String TITLE = "G1 and G2";
    private static final double RIM = 8;

    /** Half the width of the diagram in G, at the least. */
    private static final double LEAST = 1.5;

    /** Opacity of the stable regions. */
    static final double TINT = 0.3;

    private final List<GPair> tangential;
    private final List<GPair> sagittal;
    private final Points points = new Points();

    /**
     * A drawing of points; none of a plane for a ring, which has no such diagram.
     *
     * @param tangential the points so far, that of now last
     * @param sagittal the points so far, that of now last
     */
    public GDiagramDrawing(List<GPair> tangential, List<GPair> sagittal) {
        this.tangential = List.copyOf(tangential);
        this.sagittal = List.copyOf(sagittal);
    }

    private List<GPair> trail(Plane plane) {
        return plane == Plane.TANGENTIAL ? tangential : sagittal;
    }

    /** Draws it in a pane, px; the diagram is square. */
    public void draw(Painter painter, double width, double height) {
        painter.push(0, 0, width, height);
        Pane.paper(painter, width, height, points);
        if (tangential.isEmpty() || sagittal.isEmpty()) {
            title(painter);
            double y = 42;
            for (String line :
                    List.of("Only a standing wave has", "this diagram; a ring is", "judged by its half traces.")) {
                painter.text(Lettering.cut(line, Type.BODY, width - 28), 14, y, Type.BODY, Ink.TEXT, Anchor.START);
                y += 16;
            }
        } else {
            diagram(painter, width, height);
        }
        painter.pop();
    }

    private void diagram(Painter painter, double width, double height) {
        double top = 28;
        double left = 36;
        double bottom = 26;
        double side = Math.max(40, Math.min(width - left - RIM, height - top - bottom));
        double reach = reach();
        Scale x = new Scale(-reach, reach, 0, side);
        Scale y = new Scale(-reach, reach, side, 0);
        axes(painter, left, top, side, reach);
        painter.push(left, top, side, side);
        Pane.rectangle(points, 0, 0, side, side);
        painter.polygon(points, Ink.MOUNT, 1);
        region(painter, x, y, 1);
        region(painter, x, y, -1);
        Stroke cross = Stroke.of(Ink.AXIS, 1.2);
        painter.line(0, y.px(0), side, y.px(0), cross);
        painter.line(x.px(0), 0, x.px(0), side, cross);
        for (Plane plane : Plane.values()) {
            trail(painter, plane, x, y);
        }
        for (Plane plane : Plane.values()) {
            point(painter, plane, x, y, side);
        }
        painter.pop();
        Pane.rectangle(points, left, top, side, side);
        painter.polyline(points, true, Stroke.of(Ink.RULE, 1));
        key(painter, left + side);
    }

    private static GPair now(List<GPair> trail) {
        return trail.get(trail.size() - 1);
    }

    /** Half the width in G: in steps, so that it does not change all the time while something moves. */
    private double reach() {
        double largest = 0;
        for (Plane plane : Plane.values()) {
            GPair g = now(trail(plane));
            largest = Math.max(largest, Math.max(Math.abs(g.g1()), Math.abs(g.g2())));
        }
        return Math.max(LEAST, Nice.tick(Math.min(1e9, 1.15 * largest)));
    }

    /** The shaded region of a quarter, under the hyperbola G1 G2 = 1. */
    private void region(Painter painter, Scale x, Scale y, int sign) {
        double reach = x.to();
        points.clear().add(x.px(0), y.px(0)).add(x.px(0), y.px(sign * reach));
        int steps = 48;
        double low = 1 / reach;
        for (int i = 0; i <= steps; i++) {
            double g = low * Math.pow(reach / low, (double) i / steps);
            points.add(x.px(sign * g), y.px(sign / g));
        }
        points.add(x.px(sign * reach), y.px(0));
        painter.polygon(points, Ink.GOOD, TINT);
        Points edge = new Points();
        for (int i = 2; i < points.size() - 1; i++) {
            edge.add(points.x(i), points.y(i));
        }
        painter.polyline(edge, false, Stroke.of(Ink.AXIS, 1.2));
    }

    private void trail(Painter painter, Plane plane, Scale x, Scale y) {
        List<GPair> trail = trail(plane);
        points.clear();
        for (GPair g : trail) {
            points.add(clamp(x.px(g.g1())), clamp(y.px(g.g2())));
        }
        if (points.size() > 1) {
            painter.polyline(points, false, Pane.line(plane, 1.4));
        }
    }

    private static double clamp(double px) {
        // Far outside the pane a picture cannot hold the number; there the trail is cut anyway.
        return Math.max(-1e6, Math.min(1e6, px));
    }

    private void point(Painter painter, Plane plane, Scale x, Scale y, double side) {
        GPair g = now(trail(plane));
        double px = Math.max(4, Math.min(side - 4, clamp(x.px(g.g1()))));
        double py = Math.max(4, Math.min(side - 4, clamp(y.px(g.g2()))));
        boolean filled = plane == Plane.TANGENTIAL;
        // The hollow one is larger, so that both are seen where they lie on each other.
        Pane.circle(points, px, py, filled ? 3.6 : 6);
        if (filled) {
            painter.polygon(points, Ink.TANGENTIAL, 1);
        }
        painter.polyline(points, true, Stroke.of(Pane.ink(plane), 1.8));
    }

    private void axes(Painter painter, double left, double top, double side, double reach) {
        Ticks ticks = Ticks.along(new Scale(-reach, reach, 0, side));
        Scale x = new Scale(-reach, reach, left, left + side);
        Scale y = new Scale(-reach, reach, top + side, top);
        for (double value : ticks.values()) {
            painter.line(x.px(value), top + side, x.px(value), top + side + 3, Stroke.of(Ink.AXIS, 1));
            painter.line(left - 3, y.px(value), left, y.px(value), Stroke.of(Ink.AXIS, 1));
            String label = ticks.label(value);
            double half = Lettering.width(label, Type.SMALL) / 2;
            if (x.px(value) + half < left + side - 22) {
                painter.text(label, x.px(value), top + side + 14, Type.SMALL, Ink.QUIET, Anchor.MIDDLE);
            }
            if (y.px(value) > top + 18) {
                painter.text(label, left - 5, y.px(value) + 4, Type.SMALL, Ink.QUIET, Anchor.END);
            }
        }
        painter.text("G1", left + side, top + side + 14, Type.SMALL, Ink.TEXT, Anchor.END);
        painter.text("G2", left - 5, top + 9, Type.SMALL, Ink.TEXT, Anchor.END);
    }

    private static void title(Painter painter) {
        painter.text(TITLE, 14, 18, Type.TITLE, Ink.TEXT, Anchor.START);
    }

    /** "● tangential ○ sagittal", and the title where there is room beside: the axes say it too. */
    private void key(Painter painter, double right) {
        double x = right;
        for (Plane plane : new Plane[] {Plane.SAGITTAL, Plane.TANGENTIAL}) {
            x -= Lettering.width(plane.word(), Type.SMALL);
            painter.text(plane.word(), x, 18, Type.SMALL, Ink.TEXT, Anchor.START);
            x -= 9;
            boolean filled = plane == Plane.TANGENTIAL;
            Pane.circle(points, x, 14, filled ? 3.6 : 4.6);
            if (filled) {
                painter.polygon(points, Ink.TANGENTIAL, 1);
            }
            painter.polyline(points, true, Stroke.of(Pane.ink(plane), 1.8));
            x -= 16;
        }
        if (14 + Lettering.width(TITLE, Type.TITLE) < x) {
            title(painter);
        }
    }
}
