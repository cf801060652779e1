package twofold.picture;

import java.util.Arrays;
import java.util.Optional;
import twofold.optics.Plane;

/**
 * A quantity over two levers as colours, with lines of equal value; both planes' zones outlined, solid and dashed; hatched
 * where one plane alone is stable and dotted where neither is; a firm outline where all requirements hold; blank where the
 * quantity is undefined.
 */
public final class MapDrawing {
    /** The smallest pane that can be read, px. */
    public static final double LEAST_WIDTH = 260;

    /** The smallest pane that can be read, px. */
    public static final double LEAST_HEIGHT = 220;

    private static final double RIM = 10;
    private static final double HEAD = 44;
    private static final double BAR = 14;

    private final MapPlot plot;
    private final Range range;
    private final boolean hasGaps;
    private final Points points = new Points();

    /** A drawing of a map. */
    public MapDrawing(MapPlot plot) {
        this.plot = plot;
        double[] shown = MapGrid.shown(plot, plot.values());
        range = Range.of(Arrays.stream(shown));
        hasGaps = Arrays.stream(shown).anyMatch(Double::isNaN);
    }

    /** Where things lie in a pane. */
    private record Plan(Scale x, Scale y, Ticks colours, Legend legend) {
        double left() {
            return x.begin();
        }

        double right() {
            return x.end();
        }

        double top() {
            return y.end();
        }

        double bottom() {
            return y.begin();
        }
    }

    /** The levers' values at a pixel of a pane of a size; empty beside the map. */
    public Optional<MapPlot.Place> pointAt(double x, double y, double width, double height) {
        Plan plan = plan(width, height);
        return plan.x().holds(x) && plan.y().holds(y)
                ? Optional.of(new MapPlot.Place(plan.x().value(x), plan.y().value(y)))
                : Optional.empty();
    }

    /** Draws it in a pane, px, with the value where the design stands. */
    public void draw(Painter painter, double width, double height) {
        draw(painter, width, height, Optional.empty());
    }

    /**
     * Draws it in a pane.
     *
     * @param width px
     * @param height px
     * @param pointer a place whose value is said instead of that where the design stands
     */
    public void draw(Painter painter, double width, double height, Optional<MapPlot.Place> pointer) {
        Plan plan = plan(width, height);
        MapGrid grid = new MapGrid(plot, plan.x(), plan.y());
        double[] values = grid.numbers(plot.values());
        painter.push(0, 0, width, height);
        Pane.paper(painter, width, height, points);
        head(painter, grid, values, plan, width, pointer);
        axes(painter, plan);
        painter.push(plan.left(), plan.top(), plan.right() - plan.left(), plan.bottom() - plan.top());
        // Within this pane the plan's own px hold again.
        painter.push(-plan.left(), -plan.top(), width, height);
        cells(painter, grid, values, plan);
        MapOutlines outlines = new MapOutlines(painter, grid, plan.x(), plan.y());
        outlines.stability(plot.tangential(), plot.sagittal());
        outlines.levels(values, plan.colours(), range);
        outlines.zones(plot.tangential(), plot.sagittal());
        plot.margins().ifPresent(outlines::requirements);
        outlines.labels();
        plot.now().ifPresent(p -> mark(painter, plan, p, Ink.SELECTED));
        pointer.ifPresent(p -> mark(painter, plan, p, Ink.CROSSHAIR));
        painter.pop();
        painter.pop();
        Pane.rectangle(points, plan.left(), plan.top(), plan.right() - plan.left(), plan.bottom() - plan.top());
        painter.polyline(points, true, Stroke.of(Ink.AXIS, 1));
        scale(painter, plan);
        plan.legend().draw(painter, RIM, plan.bottom() + 38, width - 2 * RIM);
        painter.pop();
    }

    private Plan plan(double width, double height) {
        Legend legend = legend(height);
        double below = 38 + legend.height(width - 2 * RIM) + 6;
        double top = HEAD;
        double bottom = Math.max(top + 40, height - below);
        Ticks colours = Ticks.within(range.from(), range.to(), (int) Math.max(2, (bottom - top) / 32));
        double labels = 0;
        for (double value : colours.values()) {
            labels = Math.max(labels, Lettering.width(colours.label(value), Type.SMALL));
        }
        Scale up = axis(plot.y(), bottom, top);
        double numbers = 0;
        Ticks ticks = Ticks.up(up);
        for (double value : ticks.values()) {
            numbers = Math.max(numbers, Lettering.width(ticks.label(value), Type.SMALL));
        }
        double left = RIM + 16 + numbers + 8;
        double right = Math.max(left + 40, width - RIM - labels - 6 - BAR - 14);
        return new Plan(axis(plot.x(), left, right), up, colours, legend);
    }

    /** From half a step before the first value to half a step behind the last, so that the outermost cells are whole. */
    private static Scale axis(MapPlot.Axis axis, double begin, double end) {
        Column v = axis.values();
        int last = v.size() - 1;
        double half = last > 0 ? (v.at(last) - v.at(0)) / last / 2 : Math.max(Math.abs(v.at(0)) * 0.01, 1e-9);
        return new Scale(v.at(0) - half, v.at(last) + half, begin, end);
    }

    private Legend legend(double height) {
        Legend legend = new Legend(height);
        for (Plane plane : Plane.values()) {
            if ((plane == Plane.TANGENTIAL ? plot.tangential() : plot.sagittal()).isPresent()) {
                legend.add(plane.word() + " zone, hatched where alone", plane.word(), (painter, x, y) -> {
                    Pane.rectangle(points, x, y, Legend.WIDE, Legend.HIGH);
                    painter.hatch(points, Pane.hatch(plane), Stroke.of(Pane.ink(plane), 1));
                    painter.polyline(points, true, Pane.line(plane, 1.8));
                });
            }
        }
        if (plot.tangential().isPresent() && plot.sagittal().isPresent()) {
            legend.add("dotted: neither stable", "neither", (painter, x, y) -> {
                Pane.rectangle(points, x, y, Legend.WIDE, Legend.HIGH);
                painter.polygon(points, Ink.AXIS, 1);
                points.clear();
                for (double at = x + 2; at < x + Legend.WIDE; at += 5) {
                    points.add(at, y + 2.5).add(at, y + 7.5);
                }
                painter.dots(points, 2, Ink.PAPER);
            });
        }
        if (plot.margins().isPresent()) {
            String where = metWords();
            legend.add("all requirements hold" + where, "met" + where, (painter, x, y) -> {
                Pane.rectangle(points, x, y, Legend.WIDE, Legend.HIGH);
                painter.polyline(points, true, Stroke.of(Ink.TEXT, 2.6));
            });
        }
        if (plot.now().isPresent()) {
            legend.add("now", "now", (painter, x, y) -> diamond(painter, x + Legend.WIDE / 2, y + 5, Ink.SELECTED));
        }
        if (hasGaps) {
            legend.add("blank: undefined", "undefined", (painter, x, y) -> {
                Pane.rectangle(points, x, y, Legend.WIDE, Legend.HIGH);
                painter.polyline(points, true, Stroke.of(Ink.RULE, 1));
            });
        }
        if (range.isCutAbove() || range.isCutBelow()) {
            legend.add("colours end, values go on", "beyond", (painter, x, y) -> arrow(painter, x + 12, y + 10, -1));
        }
        return legend;
    }

    /** Where no outline tells, words do. */
    private String metWords() {
        double[] margins = plot.margins().map(m -> MapGrid.shown(plot, m)).orElse(new double[0]);
        long met = Arrays.stream(margins).filter(m -> m >= 0).count();
        return met == 0 ? ": nowhere here" : met == margins.length ? ": everywhere here" : "";
    }

    private void head(
            Painter painter, MapGrid grid, double[] values, Plan plan, double width, Optional<MapPlot.Place> pointer) {
        String title = plot.quantity() + (plot.unit().isEmpty() ? "" : ", " + plot.unit());
        painter.text(Lettering.cut(title, Type.TITLE, width - 2 * RIM), RIM, 17, Type.TITLE, Ink.TEXT, Anchor.START);
        Optional<MapPlot.Place> place = pointer.or(plot::now);
        place.ifPresent(p -> painter.text(
                Lettering.cut(said(grid, values, plan, p, pointer.isEmpty()), Type.SMALL, width - 2 * RIM),
                RIM,
                34,
                Type.SMALL,
                Ink.QUIET,
                Anchor.START));
    }

    private String said(MapGrid grid, double[] values, Plan plan, MapPlot.Place p, boolean isNow) {
        String where =
                (isNow ? "now " : "") + named(plot.x(), p.x(), plan.x()) + ", " + named(plot.y(), p.y(), plan.y());
        double x = plan.x().px(p.x());
        double y = plan.y().px(p.y());
        if (!plan.x().holds(x) || !plan.y().holds(y)) {
            return where + ": beside the map";
        }
        double value = values[grid.nearest(x, y)];
        return where + ": "
                + (Double.isNaN(value) ? "undefined" : plan.colours().between(value, plot.unit()));
    }

    private static String named(MapPlot.Axis axis, double value, Scale scale) {
        return axis.name() + " " + Ticks.along(scale).between(value, axis.unit());
    }

    private void axes(Painter painter, Plan plan) {
        Stroke line = Stroke.of(Ink.AXIS, 1);
        Ticks along = Ticks.along(plan.x());
        for (double value : along.values()) {
            double x = plan.x().px(value);
            painter.line(x, plan.bottom(), x, plan.bottom() + 4, line);
            painter.text(along.label(value), x, plan.bottom() + 16, Type.SMALL, Ink.QUIET, Anchor.MIDDLE);
        }
        Ticks up = Ticks.up(plan.y());
        for (double value : up.values()) {
            double y = plan.y().px(value);
            painter.line(plan.left() - 4, y, plan.left(), y, line);
            painter.text(up.label(value), plan.left() - 7, y + 4, Type.SMALL, Ink.QUIET, Anchor.END);
        }
        double middle = (plan.left() + plan.right()) / 2;
        painter.text(
                Lettering.cut(title(plot.x()), Type.SMALL, plan.right() - plan.left()),
                middle,
                plan.bottom() + 31,
                Type.SMALL,
                Ink.TEXT,
                Anchor.MIDDLE);
        painter.text(
                Lettering.cut(title(plot.y()), Type.SMALL, plan.bottom() - plan.top()),
                RIM + 10,
                (plan.top() + plan.bottom()) / 2,
                Type.SMALL,
                Ink.TEXT,
                Anchor.MIDDLE,
                -90);
    }

    private static String title(MapPlot.Axis axis) {
        return axis.name() + (axis.unit().isEmpty() ? "" : ", " + axis.unit());
    }

    private void cells(Painter painter, MapGrid grid, double[] values, Plan plan) {
        double width = plan.right() - plan.left();
        double height = plan.bottom() - plan.top();
        // A cell of the picture for each of the grid, but for levers over uneven lists: there one for each px.
        int columns = MapGrid.isEven(grid.xs) ? grid.xs.length : (int) Math.ceil(width);
        int rows = MapGrid.isEven(grid.ys) ? grid.ys.length : (int) Math.ceil(height);
        int[] argb = new int[columns * rows];
        for (int row = 0; row < rows; row++) {
            double y = plan.top() + (row + 0.5) * height / rows;
            for (int column = 0; column < columns; column++) {
                double x = plan.left() + (column + 0.5) * width / columns;
                double value = values[grid.nearest(x, y)];
                if (!Double.isNaN(value)) {
                    int colour = ColourMap.number(value, range.from(), range.to());
                    argb[row * columns + column] = 0xff000000 | ColourMap.rgb(colour);
                }
            }
        }
        painter.image(plan.left(), plan.top(), width, height, columns, rows, argb);
    }

    private void mark(Painter painter, Plan plan, MapPlot.Place place, Ink ink) {
        double x = plan.x().px(place.x());
        double y = plan.y().px(place.y());
        if (plan.x().holds(x) && plan.y().holds(y)) {
            points.clear().add(x - 12, y).add(x - 5, y).add(x + 5, y).add(x + 12, y);
            points.add(x, y - 12).add(x, y - 5).add(x, y + 5).add(x, y + 12);
            painter.segments(points, Stroke.of(Ink.PAPER, 4.5));
            painter.segments(points, Stroke.of(ink, 2));
            diamond(painter, x, y, ink);
        }
    }

    private void diamond(Painter painter, double x, double y, Ink ink) {
        points.clear().add(x - 5, y).add(x, y - 5).add(x + 5, y).add(x, y + 5);
        painter.polygon(points, Ink.PAPER, 1);
        painter.polyline(points, true, Stroke.of(ink, 2));
    }

    /** The colours' scale, with an arrow where values go on beyond its end. */
    private void scale(Painter painter, Plan plan) {
        double left = plan.right() + 14;
        int[] argb = new int[ColourMap.SIZE];
        Arrays.setAll(argb, i -> 0xff000000 | ColourMap.rgb(ColourMap.SIZE - 1 - i));
        double above = range.isCutAbove() ? 9 : 0;
        double below = range.isCutBelow() ? 9 : 0;
        Scale y = new Scale(range.from(), range.to(), plan.bottom() - below, plan.top() + above);
        painter.image(left, y.end(), BAR, y.begin() - y.end(), 1, ColourMap.SIZE, argb);
        Pane.rectangle(points, left, y.end(), BAR, y.begin() - y.end());
        painter.polyline(points, true, Stroke.of(Ink.AXIS, 1));
        if (above > 0) {
            arrow(painter, left + BAR / 2, y.end() - 1, -1);
        }
        if (below > 0) {
            arrow(painter, left + BAR / 2, y.begin() + 1, 1);
        }
        for (double value : plan.colours().values()) {
            painter.line(left + BAR, y.px(value), left + BAR + 4, y.px(value), Stroke.of(Ink.AXIS, 1));
            painter.text(
                    plan.colours().label(value), left + BAR + 6, y.px(value) + 4, Type.SMALL, Ink.QUIET, Anchor.START);
        }
    }

    private void arrow(Painter painter, double x, double y, int way) {
        points.clear().add(x - BAR / 2, y).add(x + BAR / 2, y).add(x, y + 8 * way);
        painter.polygon(points, Ink.AXIS, 1);
    }
}
