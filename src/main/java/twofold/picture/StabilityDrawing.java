package twofold.picture;

import java.util.List;
import twofold.cavity.Cavity;
import twofold.cavity.Eigenmode;
import twofold.optics.Plane;

/**
 * How far each plane is from the edge of stability: two bars back to back, as long as the margin 1 − |half trace|, so that
 * one shrinks as its edge nears; with the figures in words. An unstable plane has no bar but words.
 */
public final class StabilityDrawing {
    /** The least height that takes it all, px. */
    public static final double HEIGHT = 112;

    private static final double RIM = 14;
    private static final double BAR = 14;
    private static final double FIRST = 42;

    /** Below this margin a plane is called close to its edge; common practice, no source. */
    private static final double SMALL = 0.1;

    private final Cavity cavity;
    private final Points points = new Points();

    /** A drawing of a cavity. */
    public StabilityDrawing(Cavity cavity) {
        this.cavity = cavity;
    }

    /** Draws it in a pane, px. */
    public void draw(Painter painter, double width, double height) {
        painter.push(0, 0, width, height);
        Pane.paper(painter, width, height, points);
        painter.text("Stability", RIM, Pane.BASE, Type.TITLE, Ink.TEXT, Anchor.START);
        double spine = FIRST + 8 + BAR;
        for (Plane plane : Plane.values()) {
            boolean above = plane == Plane.TANGENTIAL;
            double base = above ? FIRST : spine + BAR + 17;
            Eigenmode mode = cavity.mode(plane);
            painter.text(plane.word(), RIM, base, Type.STRONG, Pane.ink(plane), Anchor.START);
            double room = width - 2 * RIM - Lettering.width(plane.word(), Type.STRONG) - 10;
            boolean firm = mode.isStable() && mode.margin() >= SMALL;
            painter.text(words(mode, room), width - RIM, base, Type.BODY, firm ? Ink.TEXT : Ink.BAD, Anchor.END);
            bar(painter, plane, mode, above ? spine - BAR : spine, width - 2 * RIM);
        }
        ticks(painter, spine, width);
        painter.pop();
    }

    private static String words(Eigenmode mode, double room) {
        String figure = Figures.halfTrace(mode.halfTrace());
        String margin = ", margin " + Figures.ratio(mode.margin());
        List<String> wordings = switch (mode.state()) {
            case STABLE ->
                mode.margin() < SMALL
                        ? List.of(
                                "half trace " + figure + margin + ", close to its edge",
                                "close to its edge: " + figure,
                                "edge near: " + figure)
                        : List.of("half trace " + figure + margin, figure + margin, figure);
            case UNSTABLE -> List.of("unstable: half trace " + figure, "unstable: " + figure, "unstable");
            case EDGE -> List.of("on the edge: half trace " + figure, "on the edge: " + figure, "on the edge");
        };
        return wordings.stream()
                .filter(w -> Lettering.width(w, Type.BODY) <= room)
                .findFirst()
                .orElse(wordings.get(wordings.size() - 1));
    }

    private void bar(Painter painter, Plane plane, Eigenmode mode, double top, double track) {
        Pane.rectangle(points, RIM, top, track, BAR);
        painter.polygon(points, Ink.MOUNT, 1);
        if (!mode.isStable()) {
            return;
        }
        double length = Math.max(2, track * mode.margin());
        double inset = plane == Plane.TANGENTIAL ? 1.5 : 0;
        Pane.rectangle(points, RIM, top + inset, length, BAR - 1.5);
        painter.polygon(points, Pane.ink(plane), 0.35);
        painter.hatch(points, Pane.hatch(plane), Stroke.of(Pane.ink(plane), 1));
        painter.polyline(points, true, Pane.line(plane, 1.5));
    }

    /** The spine between the bars, from the edge of stability at the left to the middle of a zone at the right. */
    private static void ticks(Painter painter, double spine, double width) {
        double right = width - RIM;
        Stroke line = Stroke.of(Ink.AXIS, 1.2);
        painter.line(RIM, spine, right, spine, line);
        painter.line(RIM, spine - BAR - 3, RIM, spine + BAR + 3, Stroke.of(Ink.AXIS, 2));
        for (int i = 1; i <= 4; i++) {
            double x = RIM + (right - RIM) * i / 4;
            painter.line(x, spine - 3, x, spine + 3, line);
        }
    }
}
