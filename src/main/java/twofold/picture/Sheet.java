package twofold.picture;

import java.util.OptionalDouble;
import java.util.OptionalInt;
import twofold.cavity.Cavity;
import twofold.cavity.Eigenmode;
import twofold.design.Design;
import twofold.design.Shape;
import twofold.optics.Plane;

/** One page: title, bench on top, beam below and, where it is wide enough, the stability bars and a close-up beside it. */
public final class Sheet {
    /** The smallest page that can be read, px. */
    public static final double LEAST_WIDTH = 480;

    /** The smallest page that can be read, px. */
    public static final double LEAST_HEIGHT = 480;

    private static final double GAP = 10;
    private static final double HEAD = 58;
    private static final double SIDE = 320;

    /** From this width on the side panes find room, px. */
    private static final double WIDE = 900;

    /** What the bench takes of the height at the least and at the most. */
    private static final double LEAST_BENCH = 0.36;

    private static final double LARGEST_BENCH = 0.57;

    /** What heads and labels take of the bench's height, px. */
    private static final double BENCH_RIMS = 150;

    private Sheet() {}

    /**
     * Draws the page.
     *
     * @param cavity what
     * @param painter on what; its theme decides the colours
     * @param width px, at least {@link #LEAST_WIDTH}
     * @param height px, at least {@link #LEAST_HEIGHT}
     * @param magnify how many times wider than true the beam is drawn on the bench; empty: a round factor that suits it
     */
    public static void draw(Cavity cavity, Painter painter, double width, double height, OptionalDouble magnify) {
        if (!(width >= LEAST_WIDTH && height >= LEAST_HEIGHT)) {
            throw new IllegalArgumentException(
                    "a page of " + width + " × " + height + " px; accepted from " + LEAST_WIDTH + " × " + LEAST_HEIGHT);
        }
        Points points = new Points();
        Pane.rectangle(points, 0, 0, width, height);
        painter.polygon(points, Ink.DESK, 1);
        double inner = width - 2 * GAP;
        double free = height - HEAD - 2 * GAP;
        BenchDrawing bench = new BenchDrawing(cavity);
        Box box = bench.box();
        double wish = box.height() / box.width() * inner + BENCH_RIMS;
        double benchHeight = Math.floor(Math.min(LARGEST_BENCH * free, Math.max(LEAST_BENCH * free, wish)));
        double low = HEAD + benchHeight + GAP;
        double lowHeight = height - GAP - low;

        boolean wide = width >= WIDE && lowHeight >= StabilityDrawing.HEIGHT + GAP + CloseUpDrawing.LEAST_HEIGHT;
        head(cavity, painter, width, wide);
        BenchView whole = bench.all(inner, benchHeight);
        BenchView view = magnify.isPresent() ? whole.magnified(magnify.getAsDouble()) : whole;
        pane(painter, points, GAP, HEAD, inner, benchHeight, () -> bench.draw(painter, view));

        double beamWidth = wide ? inner - SIDE - GAP : inner;
        BeamDrawing beam = new BeamDrawing(cavity);
        pane(
                painter,
                points,
                GAP,
                low,
                beamWidth,
                lowHeight,
                () -> beam.draw(painter, beam.all(beamWidth, lowHeight).numbering(true)));
        if (wide) {
            double left = GAP + beamWidth + GAP;
            pane(
                    painter,
                    points,
                    left,
                    low,
                    SIDE,
                    StabilityDrawing.HEIGHT,
                    () -> new StabilityDrawing(cavity).draw(painter, SIDE, StabilityDrawing.HEIGHT));
            double under = low + StabilityDrawing.HEIGHT + GAP;
            double rest = height - GAP - under;
            pane(
                    painter,
                    points,
                    left,
                    under,
                    SIDE,
                    rest,
                    () -> new CloseUpDrawing(cavity).draw(painter, SIDE, rest, OptionalInt.empty()));
        }
    }

    private static void pane(
            Painter painter, Points points, double x, double y, double width, double height, Runnable drawing) {
        painter.push(x, y, width, height);
        drawing.run();
        painter.pop();
        Pane.rectangle(points, x - 0.5, y - 0.5, width + 1, height + 1);
        painter.polyline(points, true, Stroke.of(Ink.RULE, 1));
    }

    private static void head(Cavity cavity, Painter painter, double width, boolean wide) {
        Design design = cavity.laid().design();
        double room = width - 2 * GAP - 8;
        String shape = design.shape() == Shape.RING ? "ring" : "standing wave";
        String title = design.title().isEmpty() ? "Untitled " + shape : design.title();
        painter.text(Lettering.cut(title, Type.HEADING, room), GAP + 4, 26, Type.HEADING, Ink.TEXT, Anchor.START);
        String facts = shape + " · " + Figures.nm(design.wavelength()) + " · round trip "
                + Figures.mm(cavity.roundTrip()) + " · free spectral range "
                + Figures.mhz(cavity.freeSpectralRange());
        if (!wide) {
            facts = said(cavity, Plane.TANGENTIAL) + " · " + said(cavity, Plane.SAGITTAL) + " · " + facts;
        }
        painter.text(Lettering.cut(facts, Type.SMALL, room), GAP + 4, 46, Type.SMALL, Ink.QUIET, Anchor.START);
    }

    private static String said(Cavity cavity, Plane plane) {
        Eigenmode mode = cavity.mode(plane);
        return plane.word() + " " + mode.state().word() + " (half trace " + Figures.halfTrace(mode.halfTrace()) + ")";
    }
}
