package twofold.picture;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import twofold.optics.Plane;

/**
 * Quantities over one lever: panels one above the other; where each plane is stable as two hatched lanes on
 * top, whose edges are named and run down through the panels; a mark where the design stands.
 */
public final class SweepDrawing {
    /** The smallest pane that can be read, px. */
    public static final double LEAST_WIDTH = 260;

    /** The smallest pane that can be read, px. */
    public static final double LEAST_HEIGHT = 200;

    private static final double RIM = 10;
    private static final double HEAD = 26;
    private static final double LANE = 12;
    private static final double NAMES = 17;
    private static final double GAP = 12;

    /** How many panels there are at the most. */
    private static final int MOST = 4;

    /** A panel is not made lower than this, px. */
    private static final double LOWEST = 58;

    /** What labels at the curves' ends may take of the width. */
    private static final double LABELS = 0.32;

    private final SweepPlot plot;
    private final Points points = new Points();

    /** A drawing of a sweep. */
    public SweepDrawing(SweepPlot plot) {
        this.plot = plot;
    }

    private record Plan(Scale x, List<SweepPanel> panels, int left, double top, double bottom, Legend legend) {}

    /** The lever's value at a pixel of a pane of a size; empty beside the panels. */
    public OptionalDouble valueAt(double x, double width, double height) {
        Scale scale = plan(width, height).x();
        return scale.holds(x) ? OptionalDouble.of(scale.value(x)) : OptionalDouble.empty();
    }

    /** Draws it in a pane, px. */
    public void draw(Painter painter, double width, double height) {
        draw(painter, width, height, OptionalDouble.empty());
    }

    /**
     * Draws it in a pane.
     *
     * @param width px
     * @param height px
     * @param pointer a value of the lever at which every curve's value is written
     */
    public void draw(Painter painter, double width, double height, OptionalDouble pointer) {
        Plan plan = plan(width, height);
        painter.push(0, 0, width, height);
        Pane.paper(painter, width, height, points);
        head(painter, plan, width, pointer);
        lanes(painter, plan, width);
        for (SweepPanel panel : plan.panels()) {
            panel.draw(painter, plot.bands(), plot.now(), pointer);
        }
        axis(painter, plan);
        plan.legend().draw(painter, RIM, plan.bottom() + 36, width - 2 * RIM);
        painter.pop();
    }

    private Plan plan(double width, double height) {
        Map<String, List<SweepPlot.Line>> panels = new LinkedHashMap<>();
        for (SweepPlot.Line line : plot.lines()) {
            panels.computeIfAbsent(line.panel(), p -> new ArrayList<>()).add(line);
        }
        boolean zones = !plot.bands().isEmpty();
        Legend legend = legend(zones, height);
        double top = HEAD + (zones ? 2 * (NAMES + LANE) + 4 : 0);
        double bottom = height - 36 - legend.height(width - 2 * RIM) - 4;
        int room = (int) Math.max(1, Math.min(MOST, (bottom - top + GAP) / (LOWEST + GAP)));
        int shown = Math.min(room, panels.size());
        double each = shown == 0 ? 0 : Math.max(20, (bottom - top + GAP) / shown - GAP);
        double labels = plot.lines().stream()
                .mapToDouble(l -> SweepPanel.labelWidth(l.label()))
                .max()
                .orElse(0);
        double right = width - RIM - Math.min(labels, LABELS * width);
        List<SweepPanel> all = new ArrayList<>();
        double left = RIM;
        double y = top;
        for (List<SweepPlot.Line> lines : panels.values()) {
            if (all.size() < shown) {
                SweepPanel panel = new SweepPanel(lines.get(0).unit(), lines, plot.values(), y, each);
                left = Math.max(left, RIM + panel.numbersWidth() + 8);
                all.add(panel);
                y += each + GAP;
            }
        }
        Scale x = scale(left, Math.max(left + 40, right));
        all.forEach(p -> p.along(x, width - RIM));
        int rest = panels.values().stream().skip(shown).mapToInt(List::size).sum();
        return new Plan(x, all, rest, top, bottom, legend);
    }

    private Scale scale(double left, double right) {
        double from = plot.values().at(0);
        double to = plot.values().at(plot.values().size() - 1);
        double some = from < to ? 0 : Math.max(Math.abs(from) * 0.01, 1e-9);
        return new Scale(from - some, to + some, left, right);
    }

    private Legend legend(boolean zones, double height) {
        Legend legend = new Legend(height);
        for (Plane plane : Plane.values()) {
            boolean used =
                    zones || plot.lines().stream().anyMatch(l -> l.plane().isPresent());
            if (used) {
                legend.add(
                        zones ? plane.word() + ", stable where hatched" : plane.word(),
                        plane.word(),
                        (painter, x, y) -> {
                            if (zones) {
                                Pane.rectangle(points, x, y, Legend.WIDE, Legend.HIGH);
                                painter.hatch(
                                        points, Pane.hatch(plane), new Stroke(Pane.ink(plane), 1, Dash.SOLID, 0.7));
                            }
                            double line = zones ? (plane == Plane.TANGENTIAL ? y : y + Legend.HIGH) : y + 5;
                            painter.line(x, line, x + Legend.WIDE, line, Pane.line(plane, 2));
                        });
            }
        }
        if (plot.lines().stream()
                .anyMatch(l -> l.least().isPresent() || l.most().isPresent())) {
            legend.add(
                    "required, on the ticks' side",
                    "required",
                    (painter, x, y) -> SweepPanel.bound(painter, points, x, x + Legend.WIDE, y + 7, true));
        }
        if (plot.now().isPresent()) {
            legend.add(
                    "now",
                    "now",
                    (painter, x, y) ->
                            painter.line(x + 12, y - 1, x + 12, y + 11, Stroke.of(Ink.SELECTED, 2, Dash.DASH_DOT)));
        }
        return legend;
    }

    private void head(Painter painter, Plan plan, double width, OptionalDouble pointer) {
        Ticks ticks = Ticks.along(plan.x());
        OptionalDouble said = pointer.isPresent() ? pointer : plot.now();
        String note = said.isEmpty()
                ? ""
                : (pointer.isPresent() ? "at " : "now ") + ticks.between(said.getAsDouble(), plot.unit());
        double right = width - RIM;
        if (!note.isEmpty()) {
            painter.text(note, right, 17, Type.BODY, Ink.TEXT, Anchor.END);
            right -= Lettering.width(note, Type.BODY) + 12;
        }
        String title = Lettering.cut(plot.title(), Type.TITLE, right - RIM);
        painter.text(title, RIM, 17, Type.TITLE, Ink.TEXT, Anchor.START);
        String rest = plan.left() == 1 ? "1 more quantity has no room" : plan.left() + " more quantities have no room";
        double x = RIM + Lettering.width(title, Type.TITLE) + 12;
        if (plan.left() > 0 && x + Lettering.width(rest, Type.SMALL) < right) {
            painter.text(rest, x, 17, Type.SMALL, Ink.QUIET, Anchor.START);
        }
    }

    /** Tangential names and lane, sagittal lane and names, above the panels. */
    private void lanes(Painter painter, Plan plan, double width) {
        if (plot.bands().isEmpty()) {
            return;
        }
        Scale x = plan.x();
        double first = HEAD + NAMES;
        Pane.rectangle(points, x.begin(), first, x.end() - x.begin(), 2 * LANE);
        painter.polygon(points, Ink.MOUNT, 1);
        for (Plane plane : Plane.values()) {
            boolean above = plane == Plane.TANGENTIAL;
            double lane = above ? first : first + LANE;
            LabelRow names = new LabelRow();
            for (SweepPlot.Band band : plot.bands()) {
                if (band.plane() == plane) {
                    band(painter, x, band, lane);
                    edge(names, x, band.from(), band.lower(), band);
                    edge(names, x, band.to(), band.upper(), band);
                }
            }
            double base = above ? first - 6 : first + 2 * LANE + 14;
            names.draw(painter, 4, width - 4, base, above ? first : first + 2 * LANE, Pane.ink(plane));
        }
        painter.line(x.begin(), first + LANE, x.end(), first + LANE, Stroke.of(Ink.AXIS, 1));
    }

    private static void edge(LabelRow names, Scale x, double value, String name, SweepPlot.Band band) {
        if (!name.isEmpty() && x.holds(x.px(value))) {
            names.add(x.px(value), List.of(name), band.to() - band.from());
        }
    }

    private void band(Painter painter, Scale x, SweepPlot.Band band, double top) {
        double from = Math.max(x.begin(), Math.min(x.end(), x.px(band.from())));
        double to = Math.max(x.begin(), Math.min(x.end(), x.px(band.to())));
        if (to <= from) {
            return;
        }
        Pane.rectangle(points, from, top, to - from, LANE);
        painter.polygon(points, Pane.ink(band.plane()), ZoneStripDrawing.TINT);
        painter.hatch(points, Pane.hatch(band.plane()), new Stroke(Pane.ink(band.plane()), 1, Dash.SOLID, 0.7));
        double outer = band.plane() == Plane.TANGENTIAL ? top : top + LANE;
        painter.line(from, outer, to, outer, Pane.line(band.plane(), 2));
    }

    private void axis(Painter painter, Plan plan) {
        Ticks ticks = Ticks.along(plan.x());
        for (double value : ticks.values()) {
            double x = plan.x().px(value);
            painter.line(x, plan.bottom(), x, plan.bottom() + 4, Stroke.of(Ink.AXIS, 1));
            painter.text(ticks.label(value), x, plan.bottom() + 16, Type.SMALL, Ink.QUIET, Anchor.MIDDLE);
        }
        String title = plot.lever() + (plot.unit().isEmpty() ? "" : ", " + plot.unit());
        painter.text(
                Lettering.cut(title, Type.SMALL, plan.x().end() - plan.x().begin()),
                (plan.x().begin() + plan.x().end()) / 2,
                plan.bottom() + 30,
                Type.SMALL,
                Ink.TEXT,
                Anchor.MIDDLE);
    }
}
