package twofold.picture;

import twofold.design.Aperture;
import twofold.design.Crystal;
import twofold.design.Lens;
import twofold.design.Matrix;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Plate;

/** The parts in the narrow lane between the two halves: the shapes of the bench, at one size. */
final class Lane {
    /** Steepest slant of a slab's faces shown, rad: beyond, a narrow glyph would fall over. */
    private static final double SLANT = 0.45;

    private final Glyphs glyphs;
    private final double middle;
    private final double height;

    /**
     * A lane.
     *
     * @param middle of the lane, px from the top
     * @param height of glyphs, px
     */
    Lane(Painter painter, double middle, double height) {
        this.glyphs = new Glyphs(painter);
        this.middle = middle;
        this.height = height;
    }

    /**
     * Draws a part.
     *
     * @param x of its middle, px
     * @param width of its inside path, px
     * @param stand what it is like on the bench
     * @param facing 1 for a mirror that sends the beam to the right, −1 for one that it comes to from the left
     */
    void draw(Part part, double x, double width, Stand stand, int facing) {
        part.match(new Glyph(new Frame(x, middle, facing, 0, 1), Math.max(5, width), stand));
    }

    private final class Glyph implements Part.Cases<Frame> {
        private final Frame frame;
        private final double width;
        private final Stand stand;

        Glyph(Frame frame, double width, Stand stand) {
            this.frame = frame;
            this.width = width;
            this.stand = stand;
        }

        @Override
        public Frame mirror(Mirror mirror) {
            double bend = Double.isInfinite(mirror.radius())
                    ? Double.POSITIVE_INFINITY
                    : Math.copySign(1.1 * height, mirror.radius());
            glyphs.mirror(frame, height, 6, bend);
            return frame;
        }

        @Override
        public Frame lens(Lens lens) {
            glyphs.lens(frame, height, 3.2, lens.focalLength() > 0, 0);
            return frame;
        }

        @Override
        public Frame plate(Plate plate) {
            return slab(false);
        }

        @Override
        public Frame crystal(Crystal crystal) {
            return slab(true);
        }

        private Frame slab(boolean crystal) {
            double slant = Math.max(-SLANT, Math.min(SLANT, stand.normal()));
            double half = height * (crystal ? 0.34 : 0.45);
            Points outline = glyphs.slab(frame, width, half, slant, true);
            glyphs.body(outline, crystal);
            glyphs.edges(outline, crystal);
            return frame;
        }

        @Override
        public Frame aperture(Aperture aperture) {
            boolean stops = aperture.hole().isPresent()
                    || aperture.slitTangential().isPresent()
                    || aperture.slitSagittal().isPresent();
            glyphs.aperture(frame, height * 0.4, height / 2, stops);
            return frame;
        }

        @Override
        public Frame matrix(Matrix matrix) {
            glyphs.box(frame, width, height * 0.7);
            return frame;
        }
    }
}
