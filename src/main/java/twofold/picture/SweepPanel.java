package twofold.picture;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;

/** A panel of a sweep: the quantities of one unit over the lever, each named at the end of its curve. */
final class SweepPanel {
    /** Opacity of a stable stretch behind the curves. */
    static final double TINT = 0.05;

    private static final double SWATCH = 20;
    private static final double LINE = 13;

    /** How quantities without a plane are told apart, besides their names. */
    private static final List<Dash> DASHES = List.of(Dash.DASH_DOT, Dash.DOTTED, Dash.SOLID, Dash.DASHED);

    private final String unit;
    private final List<SweepPlot.Line> lines;
    private final Column values;
    private final double top;
    private final Scale y;
    private final Ticks ticks;
    private final boolean isEmpty;
    private final Points points = new Points();
    private Scale x = new Scale(0, 1, 0, 1);
    private double right;

    SweepPanel(String unit, List<SweepPlot.Line> lines, Column values, double top, double height) {
        this.unit = unit;
        this.lines = lines;
        this.values = values;
        this.top = top;
        DoubleStream all = lines.stream()
                .flatMapToDouble(l -> IntStream.range(0, values.size()).mapToDouble(l.values()::at));
        double[] bounds = lines.stream()
                .flatMapToDouble(l -> DoubleStream.concat(stream(l.least()), stream(l.most())))
                .toArray();
        isEmpty = lines.stream()
                .noneMatch(l -> IntStream.range(0, values.size())
                        .anyMatch(i -> Double.isFinite(l.values().at(i))));
        Range range = Range.of(all, bounds).padded(0.06);
        y = new Scale(range.from(), range.to(), top + height, top);
        ticks = Ticks.up(y);
    }

    private static DoubleStream stream(OptionalDouble value) {
        return value.isPresent() ? DoubleStream.of(value.getAsDouble()) : DoubleStream.empty();
    }

    /** What a label takes of the width behind the curves, px. */
    static double labelWidth(String label) {
        return SWATCH + 12 + Lettering.width(label, Type.SMALL);
    }

    /** How wide the axis numbers and the unit over them are, px. */
    double numbersWidth() {
        double numbers = ticks.values().stream()
                .mapToDouble(v -> Lettering.width(ticks.label(v), Type.SMALL))
                .max()
                .orElse(0);
        return Math.max(numbers, Lettering.width(unit(), Type.SMALL));
    }

    private String unit() {
        return unit.isEmpty() ? "number" : unit;
    }

    /** Sets where it lies. */
    void along(Scale scale, double labelsEnd) {
        x = scale;
        right = labelsEnd;
    }

    void draw(Painter painter, List<SweepPlot.Band> bands, OptionalDouble now, OptionalDouble pointer) {
        Stroke rule = Stroke.of(Ink.RULE, 1);
        for (double value : ticks.values()) {
            painter.line(x.begin(), y.px(value), x.end(), y.px(value), rule);
            if (y.px(value) > top + 18) {
                painter.text(ticks.label(value), x.begin() - 6, y.px(value) + 4, Type.SMALL, Ink.QUIET, Anchor.END);
            }
        }
        painter.push(x.begin(), top, x.end() - x.begin(), y.begin() - top);
        painter.push(-x.begin(), -top, right + 100, y.begin() + 100);
        bands.forEach(b -> band(painter, b));
        for (int i = 0; i < lines.size(); i++) {
            bounds(painter, lines.get(i));
            curve(painter, lines.get(i), stroke(i));
        }
        now.ifPresent(v -> upright(painter, v, Stroke.of(Ink.SELECTED, 2, Dash.DASH_DOT)));
        pointer.ifPresent(v -> upright(painter, v, Stroke.of(Ink.CROSSHAIR, 1.4)));
        painter.pop();
        painter.pop();
        Pane.rectangle(points, x.begin(), top, x.end() - x.begin(), y.begin() - top);
        painter.polyline(points, true, Stroke.of(Ink.AXIS, 1));
        painter.text(unit(), x.begin() - 6, top + 9, Type.SMALL, Ink.TEXT, Anchor.END);
        if (isEmpty) {
            painter.text(
                    Lettering.cut("undefined all along", Type.BODY, x.end() - x.begin() - 16),
                    (x.begin() + x.end()) / 2,
                    (top + y.begin()) / 2 + 4,
                    Type.BODY,
                    Ink.TEXT,
                    Anchor.MIDDLE);
        }
        labels(painter);
        pointer.ifPresent(v -> figures(painter, v));
    }

    /** Tangential solid, sagittal dashed, others in a rhythm of their own; a second of a plane is thinner. */
    private Stroke stroke(int index) {
        SweepPlot.Line line = lines.get(index);
        int before = (int) lines.stream()
                .limit(index)
                .filter(l -> l.plane().equals(line.plane()))
                .count();
        if (line.plane().isPresent()) {
            return Pane.line(line.plane().get(), before == 0 ? 2.2 : 1.2);
        }
        return Stroke.of(Ink.TEXT, before < DASHES.size() ? 1.8 : 1, DASHES.get(before % DASHES.size()));
    }

    private void band(Painter painter, SweepPlot.Band band) {
        double from = Math.max(x.begin(), Math.min(x.end(), x.px(band.from())));
        double to = Math.max(x.begin(), Math.min(x.end(), x.px(band.to())));
        if (to <= from) {
            return;
        }
        Pane.rectangle(points, from, top, to - from, y.begin() - top);
        painter.polygon(points, Pane.ink(band.plane()), TINT);
        painter.hatch(points, Pane.hatch(band.plane()), new Stroke(Pane.ink(band.plane()), 1, Dash.SOLID, 0.16));
        if (!band.lower().isEmpty()) {
            painter.line(from, top, from, y.begin(), Pane.line(band.plane(), 1));
        }
        if (!band.upper().isEmpty()) {
            painter.line(to, top, to, y.begin(), Pane.line(band.plane(), 1));
        }
    }

    private void bounds(Painter painter, SweepPlot.Line line) {
        line.least().ifPresent(v -> bound(painter, points, x.begin(), x.end(), y.px(v), true));
        line.most().ifPresent(v -> bound(painter, points, x.begin(), x.end(), y.px(v), false));
    }

    /** A line with short ticks on the side that is allowed. */
    static void bound(Painter painter, Points points, double from, double to, double y, boolean above) {
        painter.line(from, y, to, y, Stroke.of(Ink.TEXT, 1.2));
        points.clear();
        for (double at = from + 6; at < to; at += 12) {
            points.add(at, y).add(at, y + (above ? -4 : 4));
        }
        painter.segments(points, Stroke.of(Ink.TEXT, 1));
    }

    private void curve(Painter painter, SweepPlot.Line line, Stroke stroke) {
        points.clear();
        for (int i = 0; i <= values.size(); i++) {
            double value = i < values.size() ? line.values().at(i) : Double.NaN;
            if (Double.isFinite(value)) {
                points.add(x.px(values.at(i)), clamp(y.px(value)));
            } else {
                flush(painter, stroke);
            }
        }
    }

    private double clamp(double px) {
        // Far beyond the panel, where it is cut off, a curve may go on without end.
        double far = 20 * (y.begin() - top);
        return Math.max(top - far, Math.min(y.begin() + far, px));
    }

    private void flush(Painter painter, Stroke stroke) {
        if (points.size() > 1) {
            painter.polyline(points, false, stroke);
        } else if (points.size() == 1) {
            painter.dots(points, 2 * stroke.width(), stroke.ink());
        }
        points.clear();
    }

    private void upright(Painter painter, double value, Stroke stroke) {
        double px = x.px(value);
        if (x.holds(px)) {
            painter.line(px, top, px, y.begin(), stroke);
        }
    }

    private record Mark(int line, double y) {}

    /** Names at the right, each beside the end of its curve, with a piece of the curve's line. */
    private void labels(Painter painter) {
        List<Mark> marks = new ArrayList<>();
        for (int i = 0; i < lines.size(); i++) {
            marks.add(new Mark(i, inside(y.px(lastOf(lines.get(i))))));
        }
        write(marks, (mark, middle) -> {
            double left = x.end() + 6;
            painter.line(left, middle, left + SWATCH, middle, stroke(mark.line()));
            painter.text(
                    Lettering.cut(lines.get(mark.line()).label(), Type.SMALL, right - left - SWATCH - 4),
                    left + SWATCH + 4,
                    middle + 4,
                    Type.SMALL,
                    Ink.TEXT,
                    Anchor.START);
        });
    }

    private double lastOf(SweepPlot.Line line) {
        for (int i = values.size() - 1; i >= 0; i--) {
            if (Double.isFinite(line.values().at(i))) {
                return line.values().at(i);
            }
        }
        return y.from();
    }

    private double inside(double px) {
        return Math.max(top + LINE / 2, Math.min(y.begin() - LINE / 2, px));
    }

    private interface Writer {
        void write(Mark mark, double middle);
    }

    /** Writes marks one below the other, as near to their places as can be; what has no room is left out from the end. */
    private void write(List<Mark> marks, Writer writer) {
        List<Mark> shown = new ArrayList<>(marks.subList(0, Math.min(marks.size(), Math.max(1, (int)
                ((y.begin() - top) / LINE)))));
        shown.sort(Comparator.comparingDouble(Mark::y));
        double[] sizes = new double[shown.size()];
        Arrays.fill(sizes, LINE);
        double[] middles = Spread.apart(
                shown.stream().mapToDouble(Mark::y).toArray(), sizes, 0, Math.min(top, y.begin() - LINE), y.begin());
        for (int i = 0; i < middles.length; i++) {
            writer.write(shown.get(i), middles[i]);
        }
    }

    /** The value of each curve beside the pointer, with a dot on the curve. */
    private void figures(Painter painter, double at) {
        double px = x.px(at);
        if (!x.holds(px)) {
            return;
        }
        int index = nearest(at);
        List<Mark> marks = new ArrayList<>();
        for (int i = 0; i < lines.size(); i++) {
            double value = lines.get(i).values().at(index);
            if (Double.isFinite(value)) {
                double py = y.px(value);
                marks.add(new Mark(i, inside(py)));
                if (y.holds(py)) {
                    Pane.circle(points, x.px(values.at(index)), py, 3);
                    painter.polygon(points, Ink.PAPER, 1);
                    painter.polyline(points, true, Stroke.of(stroke(i).ink(), 1.8));
                }
            }
        }
        write(marks, (mark, middle) -> {
            String text = ticks.between(lines.get(mark.line()).values().at(index));
            double wide = Lettering.width(text, Type.SMALL) + 6;
            boolean before = px + 8 + wide > x.end();
            double left = before ? px - 8 - wide : px + 8;
            Pane.rectangle(points, left, middle - LINE / 2, wide, LINE);
            painter.polygon(points, Ink.PAPER, Pane.VEIL);
            Ink ink = lines.get(mark.line()).plane().map(Pane::ink).orElse(Ink.TEXT);
            painter.text(text, left + 3, middle + 4, Type.SMALL, ink, Anchor.START);
        });
    }

    private int nearest(double at) {
        int best = 0;
        for (int i = 1; i < values.size(); i++) {
            if (Math.abs(values.at(i) - at) < Math.abs(values.at(best) - at)) {
                best = i;
            }
        }
        return best;
    }
}
