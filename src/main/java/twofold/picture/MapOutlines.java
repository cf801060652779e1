package twofold.picture;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import twofold.optics.Plane;

/**
 * Lines over a map's colours. As no ink stands out on all colours, each line lies on a wider one of paper; text on a plate
 * of it.
 */
final class MapOutlines {
    /** Opacity of the paper under a line. */
    static final double CASING = 0.85;

    /** From dot to dot where neither plane is stable, px. */
    private static final double DOTS = 5;

    private final Painter painter;
    private final MapGrid grid;
    private final Scale x;
    private final Scale y;
    private final Points points = new Points();
    private final List<Label> labels = new ArrayList<>();
    private final List<double[]> plates = new ArrayList<>();

    MapOutlines(Painter painter, MapGrid grid, Scale x, Scale y) {
        this.painter = painter;
        this.grid = grid;
        this.x = x;
        this.y = y;
    }

    private double left() {
        return x.begin();
    }

    private double top() {
        return y.end();
    }

    private double width() {
        return x.end() - x.begin();
    }

    private double height() {
        return y.begin() - y.end();
    }

    /** Hatches where one plane alone is stable and dots where neither is. */
    void stability(Optional<Column> tangential, Optional<Column> sagittal) {
        if (tangential.isEmpty() || sagittal.isEmpty()) {
            return;
        }
        double[] t = grid.numbers(tangential.get());
        double[] s = grid.numbers(sagittal.get());
        points.clear();
        for (double py = top() + DOTS / 2; py < y.begin(); py += DOTS) {
            for (double px = left() + DOTS / 2; px < x.end(); px += DOTS) {
                if (!isStable(t, px, py) && !isStable(s, px, py)) {
                    points.add(px, py);
                }
            }
        }
        painter.dots(points, 2, Ink.PAPER);
        hatch(Plane.TANGENTIAL, t, s);
        hatch(Plane.SAGITTAL, s, t);
    }

    private boolean isStable(double[] halfTraces, double px, double py) {
        return Math.abs(grid.at(halfTraces, px, py)) < 1;
    }

    private void hatch(Plane plane, double[] own, double[] other) {
        Points lines = Pane.hatch(plane)
                .lines(left(), top(), width(), height(), (px, py) -> isStable(own, px, py) && !isStable(other, px, py));
        if (lines.size() > 0) {
            painter.segments(lines, new Stroke(Ink.PAPER, 3, Dash.SOLID, CASING));
            painter.segments(lines, Stroke.of(Pane.ink(plane), 1));
        }
    }

    /** Lines of equal value. */
    void levels(double[] values, Ticks ticks, Range range) {
        Contours contours = new Contours(grid.xs, grid.ys, values);
        for (double level : ticks.values()) {
            if (level <= range.from() || level >= range.to()) {
                continue;
            }
            List<Points> lines = contours.at(level);
            for (Points line : lines) {
                painter.polyline(line, false, new Stroke(Ink.PAPER, 2.6, Dash.SOLID, 0.6));
                painter.polyline(line, false, Stroke.of(Ink.TEXT, 1));
            }
            lines.stream()
                    .max(Comparator.comparingDouble(MapOutlines::length))
                    .ifPresent(line -> labels.add(new Label(line, ticks.label(level))));
        }
    }

    private record Label(Points line, String text) {}

    private static double length(Points line) {
        double length = 0;
        for (int i = 1; i < line.size(); i++) {
            length += Math.hypot(line.x(i) - line.x(i - 1), line.y(i) - line.y(i - 1));
        }
        return length;
    }

    /** The numbers of the lines of equal value, where there is room. */
    void labels() {
        labels.forEach(this::label);
    }

    /** Writes a number onto its line, along it, at the first of some places where it touches no other. */
    private void label(Label label) {
        double whole = length(label.line());
        double wide = Lettering.width(label.text(), Type.SMALL) + 6;
        if (whole < 2.2 * wide) {
            return;
        }
        for (double share : new double[] {0.5, 0.35, 0.65, 0.22, 0.78}) {
            double[] begin = along(label.line(), share * whole - wide / 2);
            double[] end = along(label.line(), share * whole + wide / 2);
            double px = (begin[0] + end[0]) / 2;
            double py = (begin[1] + end[1]) / 2;
            double turn = Math.atan2(end[1] - begin[1], end[0] - begin[0]);
            if (Math.abs(turn) > Math.PI / 2) {
                turn -= Math.copySign(Math.PI, turn);
            }
            double reach = wide / 2 + 4;
            boolean inside =
                    px - reach > left() && px + reach < x.end() && py - reach > top() && py + reach < y.begin();
            boolean straight = Math.hypot(end[0] - begin[0], end[1] - begin[1]) > 0.85 * wide;
            boolean free = plates.stream().allMatch(p -> Math.hypot(p[0] - px, p[1] - py) > p[2] + reach);
            if (inside && straight && free) {
                plates.add(new double[] {px, py, reach});
                plate(label.text(), px, py, turn, wide);
                return;
            }
        }
    }

    private void plate(String text, double px, double py, double turn, double wide) {
        Frame frame = new Frame(px, py, Math.cos(turn), -Math.sin(turn), 1);
        points.clear();
        frame.add(points, -wide / 2, 7);
        frame.add(points, wide / 2, 7);
        frame.add(points, wide / 2, -7);
        frame.add(points, -wide / 2, -7);
        painter.polygon(points, Ink.PAPER, Pane.VEIL);
        double down = Lettering.capital(Type.SMALL) / 2;
        painter.text(
                text,
                frame.px(0, -down),
                frame.py(0, -down),
                Type.SMALL,
                Ink.TEXT,
                Anchor.MIDDLE,
                Math.toDegrees(turn));
    }

    private static double[] along(Points line, double length) {
        double left = length;
        for (int i = 1; i < line.size(); i++) {
            double dx = line.x(i) - line.x(i - 1);
            double dy = line.y(i) - line.y(i - 1);
            double step = Math.hypot(dx, dy);
            if (left <= step && step > 0) {
                return new double[] {line.x(i - 1) + dx * left / step, line.y(i - 1) + dy * left / step};
            }
            left -= step;
        }
        int last = line.size() - 1;
        return new double[] {line.x(last), line.y(last)};
    }

    /** Both planes' zone edges: half trace ±1. */
    void zones(Optional<Column> tangential, Optional<Column> sagittal) {
        for (Plane plane : Plane.values()) {
            Optional<Column> column = plane == Plane.TANGENTIAL ? tangential : sagittal;
            if (column.isPresent()) {
                Contours contours = new Contours(grid.xs, grid.ys, grid.numbers(column.get()));
                for (double edge : new double[] {-1, 1}) {
                    for (Points line : contours.outline(edge)) {
                        painter.polyline(line, false, new Stroke(Ink.PAPER, 4.6, Dash.SOLID, CASING));
                        painter.polyline(line, false, Pane.line(plane, 2));
                    }
                }
            }
        }
    }

    /** The outline of where every requirement holds; where one is undefined, it does not. */
    void requirements(Column margins) {
        double[] numbers = grid.numbers(margins);
        for (int i = 0; i < numbers.length; i++) {
            numbers[i] = Double.isNaN(numbers[i]) ? -1 : numbers[i];
        }
        for (Points line : new Contours(grid.xs, grid.ys, numbers).outline(0)) {
            painter.polyline(line, false, new Stroke(Ink.PAPER, 5.6, Dash.SOLID, CASING));
            painter.polyline(line, false, Stroke.of(Ink.TEXT, 2.6));
        }
    }
}
