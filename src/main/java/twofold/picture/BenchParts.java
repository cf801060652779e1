package twofold.picture;

import java.util.List;
import java.util.OptionalDouble;
import twofold.design.Aperture;
import twofold.design.Crystal;
import twofold.design.Lens;
import twofold.design.Matrix;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Plate;
import twofold.design.Point;
import twofold.layout.Footprint;

/** The parts on the bench, true to scale, each as far as a pane shows it. */
final class BenchParts {
    private final List<Part> parts;
    private final List<Stand> stands;
    private final List<Footprint> mounts;
    private final BenchView view;
    private final Painter painter;
    private final Glyphs glyphs;
    private final Points points = new Points();

    BenchParts(List<Part> parts, List<Stand> stands, List<Footprint> mounts, BenchView view, Painter painter) {
        this.parts = parts;
        this.stands = stands;
        this.mounts = mounts;
        this.view = view;
        this.painter = painter;
        this.glyphs = new Glyphs(painter);
    }

    /** The mounts' rectangles. */
    void mounts() {
        for (Footprint f : mounts) {
            if (visible(stands.get(f.part()), 0.1)) {
                outline(f);
                painter.polygon(points, Ink.MOUNT, 1);
                painter.polyline(points, true, Stroke.of(Ink.MOUNT_EDGE, 1));
            }
        }
    }

    private void outline(Footprint f) {
        points.clear();
        for (Point p : f.corners()) {
            points.add(view.viewport().x(p.x()), view.viewport().y(p.y()));
        }
    }

    /** The bodies of plates and crystals, for the beam to run over. */
    void slabBodies() {
        for (Stand s : stands) {
            boolean crystal = parts.get(s.part()) instanceof Crystal;
            if ((crystal || parts.get(s.part()) instanceof Plate) && visible(s, s.half())) {
                glyphs.body(slab(s, crystal), crystal);
            }
        }
    }

    private Points slab(Stand s, boolean crystal) {
        return glyphs.slab(s.frame(view.viewport()), s.length(), s.half(), s.normal(), crystal);
    }

    /** Everything that lies on the beam: mirrors, lenses, stops, boxes, the edges of plates and crystals. */
    void bodies() {
        for (Stand s : stands) {
            if (visible(s, s.half())) {
                parts.get(s.part()).match(new Body(s));
            }
        }
    }

    /** Brackets round the selected part, so that it is not told by colour alone. */
    void selection() {
        if (view.selected().isEmpty()) {
            return;
        }
        Stand s = stands.get(view.selected().getAsInt());
        Frame frame = s.frame(view.viewport());
        double rim = 6 / frame.scale();
        double back = Math.max(s.back(), 3 / frame.scale()) + rim;
        double front = Math.max(s.front(), 3 / frame.scale()) + rim;
        double half = Math.max(s.half(), 4 / frame.scale()) + rim;
        double arm = Math.min(10 / frame.scale(), Math.min(half, (back + front) / 2) * 0.7);
        points.clear();
        for (int end = -1; end <= 1; end += 2) {
            double ahead = end < 0 ? -back : front;
            for (int side = -1; side <= 1; side += 2) {
                frame.add(points, ahead, side * half);
                frame.add(points, ahead - end * arm, side * half);
                frame.add(points, ahead, side * half);
                frame.add(points, ahead, side * (half - arm));
            }
        }
        painter.segments(points, Stroke.of(Ink.SELECTED, 2));
    }

    /** Marks what bodies and mounts cover. */
    void take(Room room) {
        for (Footprint f : mounts) {
            if (visible(stands.get(f.part()), 0.1)) {
                outline(f);
                room.take(
                        (points.x(0) + points.x(1)) / 2,
                        (points.y(0) + points.y(1)) / 2,
                        (points.x(2) + points.x(3)) / 2,
                        (points.y(2) + points.y(3)) / 2,
                        Math.hypot(points.x(1) - points.x(0), points.y(1) - points.y(0)) / 2,
                        Math.hypot(points.x(1) - points.x(0), points.y(1) - points.y(0)) / 2,
                        Room.MOUNT);
            }
        }
        for (Stand s : stands) {
            if (visible(s, s.half())) {
                room.take(s.frame(view.viewport()), s.back(), s.front(), s.half(), Room.BODY);
            }
        }
    }

    /** Whether a part may be seen, given how far it reaches beyond its ends, m. */
    private boolean visible(Stand s, double reach) {
        double x = view.viewport().x(s.at().x());
        double y = view.viewport().y(s.at().y());
        double rim = (reach + s.back() + s.front()) * view.viewport().scale() + 10;
        return x > -rim && x < view.width() + rim && y > -rim && y < view.height() + rim;
    }

    /** Draws what lies on the beam. */
    private final class Body implements Part.Cases<Stand> {
        private final Stand s;
        private final Frame frame;

        Body(Stand s) {
            this.s = s;
            this.frame = s.frame(view.viewport());
        }

        @Override
        public Stand mirror(Mirror mirror) {
            glyphs.mirror(frame, mirror.diameter(), mirror.thickness(), mirror.radius());
            return s;
        }

        @Override
        public Stand lens(Lens lens) {
            glyphs.lens(frame, 2 * s.half(), Stand.BULGE, lens.focalLength() > 0, s.normal());
            return s;
        }

        @Override
        public Stand plate(Plate plate) {
            glyphs.edges(slab(s, false), false);
            return s;
        }

        @Override
        public Stand crystal(Crystal crystal) {
            glyphs.edges(slab(s, true), true);
            return s;
        }

        @Override
        public Stand aperture(Aperture aperture) {
            OptionalDouble hole = aperture.hole().isPresent() ? aperture.hole() : aperture.slitTangential();
            boolean stops = hole.isPresent() || aperture.slitSagittal().isPresent();
            double gap = hole.orElse(Stand.MARK);
            glyphs.aperture(frame, gap, Math.max(s.half(), gap / 2 + Stand.MARK / 2), stops);
            return s;
        }

        @Override
        public Stand matrix(Matrix matrix) {
            glyphs.box(frame, Math.max(s.length(), 3 / frame.scale()), 2 * s.half());
            return s;
        }
    }
}
