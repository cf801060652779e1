package twofold;

import twofold.design.FourNumbers;

/**
 * A thing in space that a real ray meets: exact where nature is (mirrors, faces), the defining map where the part is
 * defined by one (thin lenses, black boxes). Transverse axes may point either way: no map mixes the planes.
 */
interface Optic {
    /** The ray after this; {@code back} on the return through a standing wave. */
    Ray meet(Ray ray, boolean back);

    /** Where the chief ray should meet it on the way forward. */
    Vector place();

    /** A straight line: a place on it and a unit direction. */
    record Ray(Vector at, Vector along) {
        /** Where it meets a plane. */
        Ray to(Vector place, Vector normal) {
            return new Ray(at.plus(place.minus(at).dot(normal) / along.dot(normal), along), along);
        }
    }

    /** Axes across a beam: along it, tangential, sagittal. */
    record Frame(Vector at, Vector along, Vector tangential, Vector sagittal) {
        /** Offsets and slopes (x, x′, y, y′) of a ray at the plane across this frame. */
        double[] read(Ray ray) {
            Ray here = ray.to(at, along);
            Vector off = here.at.minus(at);
            double forward = Math.abs(here.along.dot(along));
            return new double[] {
                off.dot(tangential),
                here.along.dot(tangential) / forward,
                off.dot(sagittal),
                here.along.dot(sagittal) / forward
            };
        }

        /** The ray with these offsets and slopes, along this frame or against it. */
        Ray ray(double[] four, boolean back) {
            Vector forward = new Vector(0, 0, 0).plus(back ? -1 : 1, along);
            return new Ray(
                    at.plus(four[0], tangential).plus(four[2], sagittal),
                    forward.plus(four[1], tangential).plus(four[3], sagittal).unit());
        }
    }

    /** A sphere through its vertex; the unit normal points to the light; curvature positive concave. */
    record Sphere(Vector place, Vector normal, double curvature) implements Optic {
        @Override
        public Ray meet(Ray ray, boolean back) {
            Ray flat = ray.to(place, normal);
            Vector p = flat.at.minus(place);
            Vector d = ray.along;
            // k |p + l d|² = 2 (p + l d)·N, solved for the l that vanishes with p; p·N = 0
            double b = 2 * (curvature * d.dot(p) - d.dot(normal));
            double c = curvature * p.dot(p);
            double l = -2 * c / (b + Math.sqrt(b * b - 4 * curvature * c));
            Vector hit = p.plus(l, d);
            Vector upright = normal.plus(-curvature, hit).unit();
            return new Ray(place.plus(1, hit), d.mirrored(upright).unit());
        }
    }

    /** A plane between two indices, by Snell's law for vectors. */
    record Face(Vector place, Vector normal, double before, double after) implements Optic {
        @Override
        public Ray meet(Ray ray, boolean back) {
            Ray here = ray.to(place, normal);
            double ratio = back ? after / before : before / after;
            Vector n = ray.along.dot(normal) > 0 ? normal : new Vector(0, 0, 0).minus(normal);
            Vector across = ray.along.plus(-ray.along.dot(n), n);
            Vector bent = new Vector(0, 0, 0).plus(ratio, across);
            return new Ray(here.at, bent.plus(Math.sqrt(1 - bent.dot(bent)), n).unit());
        }
    }

    /** A thin lens: takes power times offset from each slope. */
    record Thin(Frame frame, double tangential, double sagittal) implements Optic {
        @Override
        public Ray meet(Ray ray, boolean back) {
            double[] r = frame.read(ray);
            return frame.ray(new double[] {r[0], r[1] - tangential * r[0], r[2], r[3] - sagittal * r[2]}, back);
        }

        @Override
        public Vector place() {
            return frame.at;
        }
    }

    /** A black box between two planes. */
    record Box(Frame entry, Frame exit, FourNumbers t, FourNumbers s) implements Optic {
        @Override
        public Ray meet(Ray ray, boolean back) {
            double[] r = (back ? exit : entry).read(ray);
            double[] out = {
                (back ? t.d() : t.a()) * r[0] + t.b() * r[1],
                t.c() * r[0] + (back ? t.a() : t.d()) * r[1],
                (back ? s.d() : s.a()) * r[2] + s.b() * r[3],
                s.c() * r[2] + (back ? s.a() : s.d()) * r[3]
            };
            return (back ? entry : exit).ray(out, back);
        }

        @Override
        public Vector place() {
            return exit.at;
        }
    }
}
