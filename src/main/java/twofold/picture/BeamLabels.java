package twofold.picture;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalInt;
import twofold.cavity.Cavity;
import twofold.design.Crystal;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Shape;
import twofold.optics.Plane;

/** Names above the beam view, radii of waists, and what stands at the crosshair. What finds no place is left out. */
final class BeamLabels {
    private static final double LINE = 15;

    /** Distances of a number from its dot that are tried, px. */
    private static final double[] OFFS = {12, 22, 34, 48, 62, 76, 90, 106, 122};

    /** From this distance on a number is tied to its dot, px. */
    private static final double FAR = 30;

    private static final Stroke TIE = Stroke.of(Ink.QUIET, 1, Dash.DOTTED);

    private final Cavity cavity;
    private final Course course;
    private final BeamView view;
    private final Painter painter;

    BeamLabels(Cavity cavity, Course course, BeamView view, Painter painter) {
        this.cavity = cavity;
        this.course = course;
        this.view = view;
        this.painter = painter;
    }

    private record Name(int part, double x) {}

    /** The parts' names in two rows above the plot, each tied to its glyph; the selected part first, then mirrors. */
    void names(double top, double lane) {
        List<Part> parts = cavity.laid().design().parts();
        Stretch s = view.stretch();
        List<Name> names = new ArrayList<>();
        for (int i = 0; i < parts.size(); i++) {
            names.add(new Name(i, s.x(course.middle(i))));
        }
        if (cavity.laid().design().shape() == Shape.RING) {
            names.add(new Name(0, s.x(course.length())));
        }
        names.sort(Comparator.comparingInt(n -> rank(n.part(), parts.get(n.part()))));
        Room room = new Room(view.width(), top);
        room.take(0, 0, view.width(), top - 2 * LINE - 8, Room.TEXT);
        for (Name n : names) {
            if (n.x() < s.left() - 1 || n.x() > s.right() + 1) {
                continue;
            }
            String name = parts.get(n.part()).name();
            double width = Lettering.width(name, Type.SMALL);
            double x = Math.min(view.width() - 6 - width / 2, Math.max(6 + width / 2, n.x()));
            for (int row = 0; row < 2; row++) {
                double base = top - 8 - row * LINE;
                if (room.cost(x - width / 2 - 3, base - 9, width + 6, 9) < Room.TEXT) {
                    Ink ink = parts.get(n.part()) instanceof Crystal ? Ink.CRYSTAL_EDGE : Ink.TEXT;
                    painter.line(n.x(), base + 3, n.x(), lane, Stroke.of(Ink.RULE, 1));
                    painter.text(name, x, base, Type.SMALL, ink, Anchor.MIDDLE);
                    room.take(x - width / 2 - 4, base - 10, width + 8, 10, Room.TEXT);
                    break;
                }
            }
        }
    }

    private int rank(int index, Part part) {
        if (view.selected().equals(OptionalInt.of(index))) {
            return 0;
        }
        return part instanceof Mirror ? 1 : part instanceof Crystal ? 2 : 3;
    }

    /** The radii of waists, on the side away from the axis, as far as they find room. */
    void numbers(List<BeamDrawing.WaistDot> dots, Halves halves, double top, double bottom, Points points) {
        Room room = new Room(view.width(), view.height());
        room.take(0, 0, view.width(), top - 4, Room.TEXT);
        room.take(0, bottom, view.width(), view.height(), Room.TEXT);
        halves.take(room);
        for (BeamDrawing.WaistDot d : dots) {
            room.take(d.x() - 4, d.y() - 4, 8, 8, Room.TEXT);
        }
        List<BeamDrawing.WaistDot> narrowFirst = dots.stream()
                .sorted(Comparator.comparingDouble(d -> d.waist().radius()))
                .toList();
        for (BeamDrawing.WaistDot d : narrowFirst) {
            String text = Figures.um(d.waist().radius());
            double width = Lettering.width(text, Type.SMALL);
            double away = d.plane() == Plane.TANGENTIAL ? -1 : 1;
            double best = 3 * Room.BODY;
            double bestX = Double.NaN;
            double bestY = 0;
            for (double off : OFFS) {
                double[] places = off > FAR
                        ? new double[] {d.x() - width / 2}
                        : new double[] {d.x() + 8, d.x() - 8 - width, d.x() - width / 2};
                for (double x : places) {
                    double y = d.y() + away * off;
                    double cost = room.cost(x - 1, y - 7, width + 2, 13) + off / 10;
                    boolean inside = x > view.stretch().left()
                            && x + width < view.stretch().right();
                    if (inside && cost < best) {
                        best = cost;
                        bestX = x;
                        bestY = y;
                    }
                }
            }
            if (!Double.isNaN(bestX)) {
                if (Math.abs(bestY - d.y()) > FAR) {
                    painter.line(d.x(), d.y() + away * 6, d.x(), bestY - away * 8, TIE);
                }
                Pane.rectangle(points, bestX - 2, bestY - 7, width + 4, 14);
                painter.polygon(points, Ink.PAPER, Pane.VEIL);
                painter.text(text, bestX, bestY + 4, Type.SMALL, Pane.ink(d.plane()), Anchor.START);
                room.take(bestX - 2, bestY - 8, width + 4, 14, Room.TEXT);
            }
        }
    }

    /** A line across both halves with the path and both radii. */
    void crosshair(double path, Halves halves, double top, double bottom, double middle, Points points) {
        Stretch s = view.stretch();
        if (path < s.from() || path > s.to()) {
            return;
        }
        double x = s.x(path);
        int leg = course.legAt(path);
        Pane.cross(painter, points, new Frame(x, middle, 1, 0, 1), 14);
        Stroke line = Stroke.of(Ink.CROSSHAIR, 1);
        painter.line(x, top, x, middle - 14, line);
        painter.line(x, middle + 14, x, bottom, line);
        boolean leftwards = x > (s.left() + s.right()) / 2;
        double at = leftwards ? x - 8 : x + 8;
        Anchor anchor = leftwards ? Anchor.END : Anchor.START;
        for (Plane plane : Plane.values()) {
            boolean above = plane == Plane.TANGENTIAL;
            cavity.mode(plane).radiusAt(leg, path - course.start(leg)).ifPresent(radius -> {
                double curve = halves.y(plane, radius);
                double outer = above ? top + 12 : bottom - 5;
                double inner = above ? halves.y(plane, 0) - 6 : halves.y(plane, 0) + 15;
                double y = Math.abs(outer - curve) > Math.abs(inner - curve) ? outer : inner;
                veiled(Figures.um(radius), at, y, Pane.ink(plane), anchor, points);
                Pane.circle(points, x, curve, 3);
                painter.polygon(points, Ink.CROSSHAIR, 1);
            });
        }
        double half = Lettering.width(Figures.mm(path), Type.STRONG) / 2;
        double within = Math.min(view.width() - half - 4, Math.max(half + 4, x));
        veiled(Figures.mm(path), within - half, bottom + 18, Ink.TEXT, Anchor.START, points);
    }

    private void veiled(String text, double x, double y, Ink ink, Anchor anchor, Points points) {
        double width = Lettering.width(text, Type.STRONG);
        double left = anchor == Anchor.END ? x - width : x;
        Pane.rectangle(points, left - 3, y - 11, width + 6, 15);
        painter.polygon(points, Ink.PAPER, 0.9);
        painter.text(text, x, y, Type.STRONG, ink, anchor);
    }
}
