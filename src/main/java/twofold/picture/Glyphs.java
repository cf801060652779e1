package twofold.picture;

import twofold.design.Kind;

/**
 * The outlines of parts, in a {@link Frame} fixed to each: the same shapes on the bench, there in metres and true, and in
 * the lane of the beam view, there in px. Bodies and edges are drawn apart, so that a beam can run inside a crystal.
 */
final class Glyphs {
    /** Steps of a curved face; a chord is then off by less than 1/30 of the sagitta of its own step. */
    private static final int STEPS = 10;

    private final Painter painter;
    private final Points points = new Points();

    Glyphs(Painter painter) {
        this.painter = painter;
    }

    /** How far a spherical face of a radius (positive: its centre lies ahead) stands ahead at a distance off its vertex. */
    static double sagitta(double radius, double off) {
        if (Double.isInfinite(radius)) {
            return 0;
        }
        double r = Math.abs(radius);
        double y = Math.min(off, r);
        // r − √(r² − y²), without cancellation.
        return Math.signum(radius) * y * y / (r + Math.sqrt(r * r - y * y));
    }

    /** A mirror whose face's vertex is the frame's origin; radius positive concave. */
    void mirror(Frame frame, double diameter, double thickness, double radius) {
        points.clear();
        face(frame, diameter, radius);
        frame.add(points, -thickness, diameter / 2);
        frame.add(points, -thickness, -diameter / 2);
        painter.polygon(points, Ink.OPTIC, 1);
        painter.polyline(points, true, Stroke.of(Ink.OPTIC_EDGE, 1));
        points.clear();
        face(frame, diameter, radius);
        painter.polyline(points, false, Stroke.of(Ink.OPTIC_EDGE, 2.2));
    }

    private void face(Frame frame, double diameter, double radius) {
        int steps = Double.isInfinite(radius) ? 1 : STEPS;
        for (int i = 0; i <= steps; i++) {
            double off = diameter * ((double) i / steps - 0.5);
            frame.add(points, sagitta(radius, Math.abs(off)), off);
        }
    }

    /**
     * The corners of a slab whose inside beam runs along the frame and has its middle in the origin.
     *
     * @param length inside, along the beam
     * @param half height of the body, square to the inside beam where sides follow it, else along its faces
     * @param normal angle from the inside beam to the faces' normal, left positive, rad
     * @param along whether the sides follow the inside beam, as a cut rod's do, or the normal, as a plate's do
     */
    Points slab(Frame frame, double length, double half, double normal, boolean along) {
        points.clear();
        for (int end = -1; end <= 1; end += 2) {
            for (int side = end; side != -3 * end; side -= 2 * end) {
                if (along) {
                    frame.add(points, end * length / 2 - side * half * Math.tan(normal), side * half);
                } else {
                    double cos = Math.cos(normal);
                    double sin = Math.sin(normal);
                    double t = end * length / 2 * cos;
                    frame.add(points, t * cos - side * half * sin, t * sin + side * half * cos);
                }
            }
        }
        return points;
    }

    /** Fills what {@link #slab} outlined. */
    void body(Points slab, boolean crystal) {
        painter.polygon(slab, crystal ? Ink.CRYSTAL : Ink.GLASS, 1);
    }

    /** Outlines what {@link #slab} outlined. */
    void edges(Points slab, boolean crystal) {
        painter.polyline(slab, true, Stroke.of(crystal ? Ink.CRYSTAL_EDGE : Ink.OPTIC_EDGE, 1.2));
    }

    /** A thin lens in the origin, bulging or hollow by so much on each side at its middle. */
    void lens(Frame frame, double diameter, double bulge, boolean converging, double tilt) {
        points.clear();
        double cos = Math.cos(tilt);
        double sin = Math.sin(tilt);
        for (int side = -1; side <= 1; side += 2) {
            for (int i = 0; i <= STEPS; i++) {
                double off = side * (2.0 * i / STEPS - 1);
                double thick = converging ? bulge * (1 - off * off) : bulge * (0.3 + off * off);
                double ahead = side * thick;
                double left = off * diameter / 2;
                frame.add(points, ahead * cos - left * sin, ahead * sin + left * cos);
            }
        }
        painter.polygon(points, Ink.GLASS, 1);
        painter.polyline(points, true, Stroke.of(Ink.OPTIC_EDGE, 1.2));
    }

    /** Two blades square to the beam, from half the gap out to a reach; thin where they stop nothing. */
    void aperture(Frame frame, double gap, double reach, boolean stops) {
        points.clear();
        for (int side = -1; side <= 1; side += 2) {
            frame.add(points, 0, side * gap / 2);
            frame.add(points, 0, side * reach);
        }
        painter.segments(points, Stroke.of(Ink.OPTIC_EDGE, stops ? 3 : 1.2));
    }

    /** A black box with its middle in the origin. */
    void box(Frame frame, double length, double width) {
        points.clear();
        frame.add(points, -length / 2, -width / 2);
        frame.add(points, length / 2, -width / 2);
        frame.add(points, length / 2, width / 2);
        frame.add(points, -length / 2, width / 2);
        painter.polygon(points, Ink.OPTIC, 1);
        painter.polyline(points, true, Stroke.of(Ink.OPTIC_EDGE, 2));
    }

    /** What bodies of a kind are filled with. */
    static Ink body(Kind kind) {
        return switch (kind) {
            case CRYSTAL -> Ink.CRYSTAL;
            case PLATE, LENS -> Ink.GLASS;
            case MIRROR, APERTURE, MATRIX -> Ink.OPTIC;
        };
    }
}
