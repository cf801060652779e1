package twofold.picture;

import twofold.cavity.Eigenmode;
import twofold.cavity.State;
import twofold.optics.Plane;

/** What the panes have in common: paper, heads, the key of the two planes, warnings in words, the crosshair's mark. */
final class Pane {
    /** Where the first baseline lies, px below the top. */
    static final double BASE = 20;

    /** How far a head reaches down, px. */
    static final double HEAD = 29;

    /** Opacity of the paper behind text. */
    static final double VEIL = 0.86;

    private static final double LEFT = 14;
    private static final double SWATCH = 26;

    private Pane() {}

    static Ink ink(Plane plane) {
        return plane == Plane.TANGENTIAL ? Ink.TANGENTIAL : Ink.SAGITTAL;
    }

    static Hatch hatch(Plane plane) {
        return plane == Plane.TANGENTIAL ? Hatch.TANGENTIAL : Hatch.SAGITTAL;
    }

    /** The line of a plane's curve. */
    static Stroke line(Plane plane, double width) {
        return Stroke.of(ink(plane), width, plane == Plane.TANGENTIAL ? Dash.SOLID : Dash.DASHED);
    }

    /** Covers the pane with paper. */
    static void paper(Painter painter, double width, double height, Points points) {
        rectangle(points, 0, 0, width, height);
        painter.polygon(points, Ink.PAPER, 1);
    }

    /** Sets the points to a rectangle's corners. */
    static Points rectangle(Points points, double left, double top, double width, double height) {
        return points.clear()
                .add(left, top)
                .add(left + width, top)
                .add(left + width, top + height)
                .add(left, top + height);
    }

    /** Title, a note behind it as far as there is room, and the key of the two planes at the right. */
    static void head(Painter painter, Points points, String title, String note, double width) {
        rectangle(points, 0, 0, width, HEAD);
        painter.polygon(points, Ink.PAPER, VEIL);
        painter.text(title, LEFT, BASE, Type.TITLE, Ink.TEXT, Anchor.START);
        double key = key(painter, width - LEFT, points);
        double x = LEFT + Lettering.width(title, Type.TITLE) + 10;
        if (x + Lettering.width(note, Type.SMALL) < key - 10) {
            painter.text(note, x, BASE, Type.SMALL, Ink.QUIET, Anchor.START);
        }
    }

    /** The key of the two planes, ending at x; returns where it begins. */
    private static double key(Painter painter, double end, Points points) {
        double x = end;
        for (Plane plane : new Plane[] {Plane.SAGITTAL, Plane.TANGENTIAL}) {
            x -= Lettering.width(plane.word(), Type.BODY);
            painter.text(plane.word(), x, BASE, Type.BODY, Ink.TEXT, Anchor.START);
            x -= SWATCH + 6;
            swatch(painter, plane, x, BASE - 9, points);
            x -= 18;
        }
        return x;
    }

    private static void swatch(Painter painter, Plane plane, double x, double y, Points points) {
        rectangle(points, x, y, SWATCH, 10);
        painter.polygon(points, ink(plane), 0.2);
        painter.hatch(points, hatch(plane), new Stroke(ink(plane), 1, Dash.SOLID, 0.6));
        double edge = plane == Plane.TANGENTIAL ? y : y + 10;
        painter.line(x, edge, x + SWATCH, edge, line(plane, 2));
    }

    /** "No tangential beam: unstable, half trace 1.204" or, in less room, without its end; returns how wide it is. */
    static double noBeam(
            Painter painter, Points points, Plane plane, Eigenmode mode, double x, double base, double room) {
        String why = "No " + plane.word() + " beam: " + (mode.state() == State.EDGE ? "on the edge" : "unstable");
        String whole = why + ", half trace " + Figures.halfTrace(mode.halfTrace());
        double width = 20 + Lettering.width(whole, Type.STRONG);
        String said = width <= room ? whole : Lettering.cut(why, Type.STRONG, room - 20);
        double wide = 20 + Lettering.width(said, Type.STRONG);
        rectangle(points, x - 3, base - 14, wide + 6, 19);
        painter.polygon(points, Ink.PAPER, VEIL);
        sign(painter, points, x + 7, base - 4.5);
        painter.text(said, x + 20, base, Type.STRONG, Ink.BAD, Anchor.START);
        return wide;
    }

    /** A triangle with an exclamation mark. */
    private static void sign(Painter painter, Points points, double x, double y) {
        points.clear().add(x, y - 7).add(x + 7.5, y + 6).add(x - 7.5, y + 6);
        painter.polyline(points, true, Stroke.of(Ink.BAD, 1.6));
        painter.line(x, y - 2.5, x, y + 1.8, Stroke.of(Ink.BAD, 1.8));
        painter.line(x, y + 2.9, x, y + 4.7, Stroke.of(Ink.BAD, 1.8));
    }

    /** The crosshair's mark, the same in every pane: a ring round the axis and a line across the beam. */
    static void cross(Painter painter, Points points, Frame frame, double reach) {
        Stroke stroke = Stroke.of(Ink.CROSSHAIR, 1.6);
        points.clear();
        frame.add(points, 0, 5.5);
        frame.add(points, 0, reach);
        frame.add(points, 0, -5.5);
        frame.add(points, 0, -reach);
        painter.segments(points, stroke);
        circle(points, frame.x(), frame.y(), 5);
        painter.polyline(points, true, stroke);
    }

    /** Four corners round what is selected. */
    static void brackets(Painter painter, Points points, double x, double y, double halfWidth, double halfHeight) {
        double arm = Math.min(6, 0.7 * Math.min(halfWidth, halfHeight));
        points.clear();
        for (int sx = -1; sx <= 1; sx += 2) {
            for (int sy = -1; sy <= 1; sy += 2) {
                double cx = x + sx * halfWidth;
                double cy = y + sy * halfHeight;
                points.add(cx, cy).add(cx - sx * arm, cy).add(cx, cy).add(cx, cy - sy * arm);
            }
        }
        painter.segments(points, Stroke.of(Ink.SELECTED, 2));
    }

    /** Sets the points to a circle's. */
    static Points circle(Points points, double x, double y, double radius) {
        points.clear();
        int steps = 16;
        for (int i = 0; i < steps; i++) {
            double turn = 2 * Math.PI * i / steps;
            points.add(x + radius * Math.cos(turn), y + radius * Math.sin(turn));
        }
        return points;
    }

    /** A dot that a waist has: filled for tangential, a ring for sagittal. */
    static void waist(Painter painter, Plane plane, double x, double y, Points points) {
        circle(points, x, y, 3.6);
        painter.polygon(points, plane == Plane.TANGENTIAL ? Ink.TANGENTIAL : Ink.PAPER, 1);
        painter.polyline(points, true, Stroke.of(ink(plane), 1.8));
    }
}
