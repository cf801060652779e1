package twofold.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import twofold.design.Aperture;
import twofold.design.Crystal;
import twofold.design.Lens;
import twofold.design.Matrix;
import twofold.design.Mirror;
import twofold.design.Mount;
import twofold.design.Part;
import twofold.design.Plate;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.design.Slab;
import twofold.design.TiltPlane;
import twofold.layout.Footprint;
import twofold.layout.Laid;
import twofold.layout.Leg;
import twofold.layout.Standing;

/**
 * Where a part stands on the table and what rectangle it takes there, without its mount.
 *
 * @param part index in the design
 * @param at the vertex of a mirror's face, the middle of anything else
 * @param ux of the unit vector "ahead": a mirror's facing, else the beam inside
 * @param uy of that vector, y up
 * @param length of the path inside as seen from above, m; 0 for what is thin
 * @param normal angle from "ahead" to the normal of a slab's faces as seen from above, left positive, rad; a lens's tilt
 * @param back how far it reaches behind, m
 * @param front how far it reaches ahead, m
 * @param half how far it reaches to either side, m
 */
record Stand(
        int part,
        Point at,
        double ux,
        double uy,
        double length,
        double normal,
        double back,
        double front,
        double half) {
    /** Drawn diameter of a plate, lens or box that states none, m: half an inch; common practice, no source. */
    private static final double USUAL = 12.7e-3;

    /** Drawn half height of a crystal that states none, over its length, with limits in m; as rods often are. */
    private static final double SLENDER = 0.3;

    private static final double LEAST_ROD = 1.5e-3;
    private static final double LARGEST_ROD = 4e-3;

    /** Steepest cut of a drawn beam. */
    private static final double STEEPEST = 4;

    /** How far a plate's faces reach beyond the beam at least, m. */
    private static final double MARGIN = 2e-3;

    /** Drawn reach of a stop's blades, m. */
    static final double BLADE = 9e-3;

    /** Drawn gap of a mark that stops nothing, m. */
    static final double MARK = 4e-3;

    /** Drawn bulge of a lens, m. */
    static final double BULGE = 2.2e-3;

    /** Where all parts stand, by index. */
    static List<Stand> of(Laid laid) {
        List<Part> parts = laid.design().parts();
        Stand[] all = new Stand[parts.size()];
        List<Leg> legs = laid.legs();
        boolean ring = laid.design().shape() == Shape.RING;
        for (int k = 0; k < legs.size(); k++) {
            Leg out = legs.get(k);
            Optional<Leg> in = k > 0
                    ? Optional.of(legs.get(k - 1))
                    : ring ? Optional.of(legs.get(legs.size() - 1)) : Optional.empty();
            all[out.from()] = mirror(parts, out.from(), Footprint.facing(in, Optional.of(out)));
            for (Standing s : out.parts()) {
                all[s.part()] = parts.get(s.part()).match(new OnLeg(out, s));
            }
        }
        if (!ring) {
            Leg last = legs.get(legs.size() - 1);
            all[last.to()] = mirror(parts, last.to(), Footprint.facing(Optional.of(last), Optional.empty()));
        }
        return new ArrayList<>(List.of(all));
    }

    /** The frame fixed to it, in metres. */
    Frame frame(Viewport to) {
        return new Frame(to.x(at.x()), to.y(at.y()), ux, uy, to.scale());
    }

    /**
     * The tangent of the angle from a direction to the normal of its faces, left positive: where the beam's left edge, so
     * far off the axis, meets the face, that much times as far back.
     */
    double cut(double dx, double dy) {
        double nx = ux * Math.cos(normal) - uy * Math.sin(normal);
        double ny = uy * Math.cos(normal) + ux * Math.sin(normal);
        double tan = (dx * ny - dy * nx) / (dx * nx + dy * ny);
        return Math.max(-STEEPEST, Math.min(STEEPEST, tan));
    }

    /** How far outside its rectangle a pixel lies, px; 0 within. */
    double off(Viewport view, double x, double y) {
        Frame frame = frame(view);
        double ahead = frame.ahead(x, y);
        double left = frame.left(x, y);
        double a = Math.max(0, Math.max(ahead - front, -back - ahead));
        double l = Math.max(0, Math.abs(left) - half);
        return Math.hypot(a, l) * view.scale();
    }

    private static Stand mirror(List<Part> parts, int part, Point facing) {
        Mirror m = (Mirror) parts.get(part);
        double sagitta = Glyphs.sagitta(m.radius(), m.diameter() / 2);
        return new Stand(
                part, m.at(), facing.x(), facing.y(), 0, 0, m.thickness(), Math.max(0, sagitta), m.diameter() / 2);
    }

    /** What stands on a leg. */
    private record OnLeg(Leg leg, Standing s) implements Part.Cases<Stand> {
        @Override
        public Stand mirror(Mirror mirror) {
            throw new IllegalArgumentException("a mirror stands on no leg");
        }

        @Override
        public Stand lens(Lens lens) {
            double diameter =
                    lens.clear().orElse(Math.min(2 * USUAL, lens.mount().width()));
            double tilt = lens.tiltPlane() == TiltPlane.TANGENTIAL ? lens.tilt() : 0;
            return thin(tilt, BULGE, diameter / 2);
        }

        @Override
        public Stand plate(Plate plate) {
            double normal = normal(plate.slab());
            double needed = Math.hypot(s.advance(), s.shift()) / 2 * Math.abs(Math.sin(normal)) + MARGIN;
            double half = Math.max(needed, across(plate.slab(), USUAL) / 2);
            return slab(normal, half, half * Math.abs(Math.sin(normal)));
        }

        @Override
        public Stand crystal(Crystal crystal) {
            double rod = 2 * Math.min(LARGEST_ROD, Math.max(LEAST_ROD, SLENDER * crystal.length()));
            double half = crystal.slab().clear().orElse(rod) / 2;
            double normal = normal(crystal.slab());
            return slab(normal, half, half * Math.abs(Math.tan(normal)));
        }

        @Override
        public Stand aperture(Aperture aperture) {
            OptionalDouble hole = aperture.hole().isPresent() ? aperture.hole() : aperture.slitTangential();
            return thin(0, 1e-3, Math.max(BLADE, hole.orElse(0)));
        }

        @Override
        public Stand matrix(Matrix matrix) {
            return slab(0, USUAL / 2, 0);
        }

        private double across(Slab slab, double usual) {
            return slab.clear().orElse(slab.mount().map(Mount::width).orElse(usual));
        }

        /** From the beam inside to the faces' normal: the angle of refraction, on the side that the beam turns to. */
        private double normal(Slab slab) {
            return slab.tiltPlane() == TiltPlane.TANGENTIAL
                    ? slab.side().sign() * (s.incidence() - Math.abs(s.turn()))
                    : 0;
        }

        private Stand thin(double tilt, double reach, double half) {
            Point at = leg.at(s.middle());
            return new Stand(s.part(), at, leg.heading().x(), leg.heading().y(), 0, tilt, reach, reach, half);
        }

        private Stand slab(double normal, double half, double slant) {
            double length = Math.hypot(s.advance(), s.shift());
            double cos = length > 0 ? s.advance() / length : 1;
            double sin = length > 0 ? s.shift() / length : 0;
            Point h = leg.heading();
            double reach = length / 2 + slant;
            return new Stand(
                    s.part(),
                    leg.at(s.middle()),
                    h.x() * cos - h.y() * sin,
                    h.y() * cos + h.x() * sin,
                    length,
                    normal,
                    reach,
                    reach,
                    half);
        }
    }
}
