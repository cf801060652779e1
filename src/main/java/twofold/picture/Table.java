package twofold.picture;

/** The optical table under the parts: its holes and the scale. */
final class Table {
    /** Pitch of the holes, m; 25 mm, common practice, no source. */
    static final double PITCH = 25e-3;

    /** Below this many px from hole to hole none are drawn. */
    private static final double DENSE = 9;

    private static final double LONGEST_BAR = 170;

    private Table() {}

    /** Whether the holes are far enough apart to be drawn. */
    static boolean showsHoles(BenchView view) {
        return PITCH * view.viewport().scale() >= DENSE;
    }

    /** The holes; they stand where both coordinates are multiples of the pitch. */
    static void holes(Painter painter, BenchView view, Points points) {
        if (!showsHoles(view)) {
            return;
        }
        Viewport v = view.viewport();
        double step = PITCH * v.scale();
        double firstX = v.originX() - Math.floor(v.originX() / step) * step;
        double firstY = v.originY() - Math.floor(v.originY() / step) * step;
        points.clear();
        for (double y = firstY; y < view.height(); y += step) {
            for (double x = firstX; x < view.width(); x += step) {
                points.add(x, y);
            }
        }
        if (points.size() > 0) {
            painter.dots(points, step > 60 ? 3 : step > 18 ? 2 : 1.5, Ink.HOLE);
        }
    }

    /** The scale bar with the beam's magnification, at the lower left of the pane. */
    static void scale(Painter painter, BenchView view, boolean beam, Room room) {
        double perMetre = view.viewport().scale();
        double length = Nice.below(LONGEST_BAR / perMetre);
        double px = length * perMetre;
        double x = 16.5;
        double y = Math.floor(view.height() - 14) + 0.5;
        painter.line(x, y, x + px, y, Stroke.of(Ink.AXIS, 2));
        painter.line(x, y - 4, x, y + 4, Stroke.of(Ink.AXIS, 1));
        painter.line(x + px, y - 4, x + px, y + 4, Stroke.of(Ink.AXIS, 1));
        String bar = Figures.tick(length * 1e3, 3) + " mm";
        painter.text(bar, x, y - 8, Type.SMALL, Ink.TEXT, Anchor.START);
        String widths =
                view.magnify() == 1 ? "beam width to scale" : "beam width drawn ×" + Figures.tick(view.magnify(), 2);
        double next = x + px + 12;
        if (beam) {
            painter.text(widths, next, y + 4, Type.SMALL, Ink.TEXT, Anchor.START);
        }
        room.take(x - 4, y - 22, next + (beam ? Lettering.width(widths, Type.SMALL) : 0), 30, Room.TEXT);
    }
}
