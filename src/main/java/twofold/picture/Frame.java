package twofold.picture;

/**
 * A frame fixed to a part: "ahead" along the beam or a mirror's facing, "left" of it, laid onto px.
 *
 * @param x of its origin, px
 * @param y of its origin, px
 * @param ux of the unit vector ahead, x to the right
 * @param uy of the unit vector ahead, y <em>up</em>
 * @param scale px per unit of length in the frame
 */
record Frame(double x, double y, double ux, double uy, double scale) {
    /** The pixel of a place in the frame. */
    double px(double ahead, double left) {
        return x + scale * (ahead * ux - left * uy);
    }

    /** The pixel of a place in the frame. */
    double py(double ahead, double left) {
        return y - scale * (ahead * uy + left * ux);
    }

    /** How far ahead a pixel lies, in the frame's unit. */
    double ahead(double pixelX, double pixelY) {
        return ((pixelX - x) * ux - (pixelY - y) * uy) / scale;
    }

    /** How far left a pixel lies, in the frame's unit. */
    double left(double pixelX, double pixelY) {
        return (-(pixelX - x) * uy - (pixelY - y) * ux) / scale;
    }

    /** Adds a place to a buffer. */
    void add(Points to, double ahead, double left) {
        to.add(px(ahead, left), py(ahead, left));
    }
}
