package twofold.picture;

import twofold.design.Point;

/**
 * Where the table lies in a pane: model metres (x right, y up) against px (x right, y down), the same scale both ways.
 *
 * @param scale px per metre
 * @param originX where the table's origin lies, px
 * @param originY where the table's origin lies, px
 */
public record Viewport(double scale, double originX, double originY) {
    /** The smallest scale, px per metre: a table of 50 m in a pane. */
    public static final double LEAST_SCALE = 20;

    /** The largest scale, px per metre: a pixel is a micrometre. */
    public static final double LARGEST_SCALE = 1e6;

    /** Keeps the scale within its limits. */
    public Viewport {
        scale = Math.min(LARGEST_SCALE, Math.max(LEAST_SCALE, scale));
    }

    /**
     * The viewport that shows a box of the table as large as a pane allows, in its middle.
     *
     * @param box on the table
     * @param left of the pane's free area, px
     * @param top of the pane's free area, px
     * @param width of the free area, px
     * @param height of the free area, px
     */
    public static Viewport showing(Box box, double left, double top, double width, double height) {
        double scale = Math.min(width / Math.max(box.width(), 1e-6), height / Math.max(box.height(), 1e-6));
        scale = Math.min(LARGEST_SCALE, Math.max(LEAST_SCALE, scale));
        return new Viewport(
                scale,
                left + width / 2 - scale * (box.left() + box.right()) / 2,
                top + height / 2 + scale * (box.bottom() + box.top()) / 2);
    }

    /** The pixel of a place. */
    public double x(double metres) {
        return originX + scale * metres;
    }

    /** The pixel of a place. */
    public double y(double metres) {
        return originY - scale * metres;
    }

    /** The place at a pixel. */
    public Point at(double x, double y) {
        return new Point((x - originX) / scale, (originY - y) / scale);
    }

    /** Zoomed by a factor; what is at the pixel stays there. */
    public Viewport zoomed(double factor, double x, double y) {
        double to = Math.min(LARGEST_SCALE, Math.max(LEAST_SCALE, scale * factor));
        double by = to / scale;
        return new Viewport(to, x + by * (originX - x), y + by * (originY - y));
    }

    /** Moved by px. */
    public Viewport panned(double dx, double dy) {
        return new Viewport(scale, originX + dx, originY + dy);
    }
}
