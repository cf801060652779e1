package twofold.picture;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import twofold.cavity.Zone;
import twofold.cavity.ZoneEdge;
import twofold.cavity.Zones;
import twofold.optics.Plane;

/**
 * The stability zones along one leg as a strip over the leg's length: the tangential plane's above, the sagittal plane's
 * below, each with its hatching; edges named; a firm frame where both planes are stable; a mark at the length of now.
 */
public final class ZoneStripDrawing {
    /** The least height that takes it all, px. */
    public static final double LEAST_HEIGHT = 110;

    private static final double RIM = 14;

    /** What head, names and axis take of the height, px. */
    private static final double ABOVE = 38;

    private static final double BELOW = 38;

    /** A lane is not made taller than this, px. */
    private static final double TALLEST = 44;

    /** How far from an edge the pointer may be, px. */
    private static final double REACH = 6;

    /** What is shown on either side of the zones that matter, in their width. */
    private static final double MARGIN = 0.5;

    /** Opacity of a plane's tint. */
    static final double TINT = 0.16;

    /** Opacity of what lies over both where both planes are stable. */
    static final double BOTH = 0.16;

    private final Zones tangential;
    private final Zones sagittal;
    private final String leg;
    private final Points points = new Points();

    /**
     * A drawing of zones.
     *
     * @param tangential along a leg
     * @param sagittal along the same leg
     * @param leg its name
     */
    public ZoneStripDrawing(Zones tangential, Zones sagittal, String leg) {
        this.tangential = tangential;
        this.sagittal = sagittal;
        this.leg = leg;
    }

    /**
     * An edge of a plane.
     *
     * @param plane whose
     * @param edge which
     */
    public record Hit(Plane plane, ZoneEdge edge) {
        /** "tangential edge at 102.91 mm: the end mirrors are imaged on each other". */
        public String words() {
            return plane.word() + " edge at " + Figures.mm(edge.path()) + ": "
                    + edge.cause().words();
        }
    }

    /** The edge under the pointer in a pane of a size, px. */
    public Optional<Hit> edgeAt(double x, double y, double width, double height) {
        Optional<Scale> scale = scale(width);
        if (scale.isEmpty()) {
            return Optional.empty();
        }
        double lane = lane(height);
        double seam = ABOVE + lane;
        if (y < ABOVE - 16 || y > seam + lane + 16) {
            return Optional.empty();
        }
        Plane plane = y < seam ? Plane.TANGENTIAL : Plane.SAGITTAL;
        return zones(plane).edges().stream()
                .filter(e -> scale.get().holds(scale.get().px(e.path())))
                .filter(e -> Math.abs(scale.get().px(e.path()) - x) <= REACH)
                .min(Comparator.comparingDouble(e -> Math.abs(scale.get().px(e.path()) - x)))
                .map(e -> new Hit(plane, e));
    }

    private Zones zones(Plane plane) {
        return plane == Plane.TANGENTIAL ? tangential : sagittal;
    }

    private static double lane(double height) {
        return Math.min(TALLEST, Math.max(8, (height - ABOVE - BELOW) / 2));
    }

    /** Draws it in a pane, px. */
    public void draw(Painter painter, double width, double height) {
        painter.push(0, 0, width, height);
        Pane.paper(painter, width, height, points);
        Optional<Scale> scale = scale(width);
        head(painter, width);
        if (scale.isPresent()) {
            strip(painter, scale.get(), width, height);
        } else {
            words(painter, width);
        }
        painter.pop();
    }

    private void head(Painter painter, double width) {
        String now = "now " + Figures.mm(tangential.path());
        painter.text(now, width - RIM, 16, Type.BODY, Ink.TEXT, Anchor.END);
        double room = width - 2 * RIM - Lettering.width(now, Type.BODY) - 10;
        painter.text(Lettering.cut("Zones, " + leg, Type.TITLE, room), RIM, 16, Type.TITLE, Ink.TEXT, Anchor.START);
    }

    private void words(Painter painter, double width) {
        double y = 44;
        for (Plane plane : Plane.values()) {
            String said = zones(plane).here().isPresent() ? "stable at every length" : "no zone along this leg";
            painter.text(plane.word(), RIM, y, Type.STRONG, Pane.ink(plane), Anchor.START);
            double x = RIM + Lettering.width(plane.word(), Type.STRONG) + 8;
            painter.text(Lettering.cut(said, Type.BODY, width - RIM - x), x, y, Type.BODY, Ink.TEXT, Anchor.START);
            y += 20;
        }
    }

    private void strip(Painter painter, Scale scale, double width, double height) {
        double lane = lane(height);
        double seam = ABOVE + lane;
        Pane.rectangle(points, scale.begin(), ABOVE, scale.end() - scale.begin(), 2 * lane);
        painter.polygon(points, Ink.MOUNT, 1);
        for (Plane plane : Plane.values()) {
            for (Zone zone : zones(plane).zones()) {
                zone(painter, scale, plane, zone, plane == Plane.TANGENTIAL ? ABOVE : seam, lane);
            }
        }
        beyond(painter, scale, lane);
        painter.line(scale.begin(), seam, scale.end(), seam, Stroke.of(Ink.AXIS, 1.2));
        String overlap = overlap(painter, scale, lane);
        for (Plane plane : Plane.values()) {
            names(painter, scale, plane, lane, width);
        }
        axis(painter, scale, seam + lane, height, overlap, width);
        now(painter, scale, lane);
    }

    private void zone(Painter painter, Scale scale, Plane plane, Zone zone, double top, double lane) {
        double from = Math.max(scale.begin(), pixel(scale, zone.from()));
        double to = Math.min(scale.end(), pixel(scale, zone.to()));
        if (from >= to) {
            return;
        }
        Pane.rectangle(points, from, top, to - from, lane);
        painter.polygon(points, Pane.ink(plane), TINT);
        painter.hatch(points, Pane.hatch(plane), new Stroke(Pane.ink(plane), 1, Dash.SOLID, 0.7));
        double outer = plane == Plane.TANGENTIAL ? top : top + lane;
        painter.line(from, outer, to, outer, Pane.line(plane, 2));
        for (double edge : new double[] {zone.from(), zone.to()}) {
            double x = pixel(scale, edge);
            if (scale.holds(x)) {
                painter.line(x, top, x, top + lane, Pane.line(plane, 1.6));
            }
        }
    }

    private static double pixel(Scale scale, double path) {
        // Zones may have no end.
        return scale.px(Math.max(scale.from() - 1, Math.min(scale.to() + 1, path)));
    }

    /** Where the parts on the leg leave no such length. */
    private void beyond(Painter painter, Scale scale, double lane) {
        double x = pixel(scale, tangential.least());
        if (x > scale.begin() + 1) {
            Pane.rectangle(points, scale.begin(), ABOVE, x - scale.begin(), 2 * lane);
            painter.polygon(points, Ink.PAPER, 0.75);
            painter.line(x, ABOVE, x, ABOVE + 2 * lane, Stroke.of(Ink.AXIS, 1.2, Dash.DOTTED));
        }
    }

    private record Stretch(double from, double to) {
        double length() {
            return to - from;
        }
    }

    private List<Stretch> overlaps() {
        List<Stretch> both = new ArrayList<>();
        for (Zone t : tangential.zones()) {
            for (Zone s : sagittal.zones()) {
                double from = Math.max(Math.max(t.from(), s.from()), tangential.least());
                double to = Math.min(t.to(), s.to());
                if (from < to) {
                    both.add(new Stretch(from, to));
                }
            }
        }
        return both;
    }

    /** Frames where both planes are stable; returns the words about where the leg is, else about the nearest. */
    private String overlap(Painter painter, Scale scale, double lane) {
        double path = tangential.path();
        Optional<Stretch> nearest = overlaps().stream()
                .min(Comparator.comparingDouble(o -> Math.max(0, Math.max(o.from() - path, path - o.to()))));
        for (Stretch o : overlaps()) {
            double from = Math.max(scale.begin(), pixel(scale, o.from()));
            double to = Math.min(scale.end(), pixel(scale, o.to()));
            if (to - from > 1) {
                Pane.rectangle(points, from, ABOVE, to - from, 2 * lane);
                painter.polygon(points, Ink.GOOD, BOTH);
                painter.polyline(points, true, Stroke.of(Ink.TEXT, 1.8));
            }
        }
        boolean narrow = scale.end() - scale.begin() < 360;
        return nearest.map(o -> (narrow ? "both " : "both stable ")
                        + (o.length() < Double.POSITIVE_INFINITY
                                ? (narrow ? "" : "over ") + Figures.mm(o.length())
                                : "without end"))
                .orElse("nowhere both");
    }

    private void names(Painter painter, Scale scale, Plane plane, double lane, double width) {
        LabelRow row = new LabelRow();
        for (ZoneEdge edge : zones(plane).edges()) {
            double x = scale.px(edge.path());
            if (scale.holds(x)) {
                row.add(x, EdgeWords.of(edge.cause()), -Math.abs(edge.path() - tangential.path()));
            }
        }
        boolean above = plane == Plane.TANGENTIAL;
        double base = above ? ABOVE - 6 : ABOVE + 2 * lane + 13;
        row.draw(painter, 4, width - 4, base, above ? ABOVE : ABOVE + 2 * lane, Pane.ink(plane));
    }

    private static void axis(Painter painter, Scale scale, double under, double height, String overlap, double width) {
        double base = Math.min(height - 4, under + 32);
        painter.text(overlap, width - RIM, base, Type.SMALL, Ink.TEXT, Anchor.END);
        double end = width - RIM - Lettering.width(overlap, Type.SMALL) - 12;
        Ticks ticks = Ticks.along(new Scale(scale.from() * 1e3, scale.to() * 1e3, scale.begin(), scale.end()));
        boolean isFirst = true;
        for (double value : ticks.values()) {
            double x = scale.px(value * 1e-3);
            String label = ticks.label(value) + (isFirst ? " mm" : "");
            double half = Lettering.width(label, Type.SMALL) / 2;
            painter.line(x, under, x, under + 3, Stroke.of(Ink.AXIS, 1));
            if (x + half < end && x - half > 0) {
                painter.text(label, x, base, Type.SMALL, Ink.QUIET, Anchor.MIDDLE);
                isFirst = false;
            }
        }
    }

    private void now(Painter painter, Scale scale, double lane) {
        double x = scale.px(tangential.path());
        double bottom = ABOVE + 2 * lane;
        painter.line(x, ABOVE, x, bottom, Stroke.of(Ink.PAPER, 5));
        painter.line(x, ABOVE - 2, x, bottom + 2, Stroke.of(Ink.SELECTED, 2));
        points.clear()
                .add(x - 5, ABOVE + lane)
                .add(x, ABOVE + lane - 6)
                .add(x + 5, ABOVE + lane)
                .add(x, ABOVE + lane + 6);
        painter.polygon(points, Ink.SELECTED, 1);
        painter.polyline(points, true, Stroke.of(Ink.PAPER, 1.2));
    }

    /** The range that is shown: the length of now, the zones that hold it, else the nearest, and something beside. */
    private Optional<Scale> scale(double width) {
        double path = tangential.path();
        double low = path;
        double high = path;
        boolean any = false;
        for (Plane plane : Plane.values()) {
            Zones zones = zones(plane);
            Optional<Zone> zone = zones.here()
                    .or(() -> zones.zones().stream().min(Comparator.comparingDouble(z -> distance(z, path))));
            if (zone.isPresent()) {
                for (double end : new double[] {zone.get().from(), zone.get().to()}) {
                    if (Double.isFinite(end)) {
                        low = Math.min(low, Math.max(0, end));
                        high = Math.max(high, end);
                        any = true;
                    }
                }
            }
        }
        if (!any) {
            return Optional.empty();
        }
        double span = Math.max(high - low, 1e-6 * path);
        // No leg is shorter than nothing, though a zone may begin there.
        double from = Math.max(0, low - MARGIN * span);
        double to = high + MARGIN * span;
        for (Plane plane : Plane.values()) {
            for (ZoneEdge edge : zones(plane).edges()) {
                // The next zone's near edge, where it is not far off.
                if (edge.path() > from - span && edge.path() < from) {
                    from = Math.max(0, edge.path() - 0.1 * span);
                }
                if (edge.path() < to + span && edge.path() > to) {
                    to = edge.path() + 0.1 * span;
                }
            }
        }
        return Optional.of(new Scale(from, to, RIM, width - RIM));
    }

    private static double distance(Zone zone, double path) {
        return Math.max(0, Math.max(zone.from() - path, path - zone.to()));
    }
}
