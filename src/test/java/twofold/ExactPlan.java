package twofold;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;
import twofold.Optic.Frame;
import twofold.design.Along;
import twofold.design.Aperture;
import twofold.design.Crystal;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Glass;
import twofold.design.Lens;
import twofold.design.Matrix;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Plate;
import twofold.design.Shape;
import twofold.design.Slab;
import twofold.design.TiltPlane;
import twofold.design.TwoPowers;
import twofold.material.Materials;

/** Where a design's parts stand in space, worked out for {@link ExactRays} alone from mirror positions and places along. */
final class ExactPlan {
    private final Design design;
    private final List<Mirror> mirrors;
    private final List<List<Part>> legs = new ArrayList<>();
    private final List<Double> heights = new ArrayList<>();

    ExactPlan(Design design) {
        this.design = design;
        mirrors = design.mirrors();
        for (Part part : design.parts()) {
            if (part instanceof Mirror) {
                legs.add(new ArrayList<>());
            } else {
                legs.get(legs.size() - 1).add(part);
            }
        }
        if (design.shape() == Shape.STANDING_WAVE) {
            legs.remove(legs.size() - 1);
        }
        double height = 0;
        for (List<Part> leg : legs) {
            heights.add(height);
            height += sum(leg, s -> s.up);
        }
        heights.add(height);
    }

    /** What a part does to the chief ray: path, and displacement along the heading, to the left and up, m. */
    private record Span(double path, double ahead, double left, double up) {}

    private double sum(List<Part> leg, ToDoubleFunction<Span> number) {
        return leg.stream().mapToDouble(p -> number.applyAsDouble(span(p))).sum();
    }

    private Span span(Part part) {
        if (part instanceof Matrix box) {
            return new Span(box.length(), box.length(), 0, 0);
        }
        if (!(part instanceof Plate) && !(part instanceof Crystal)) {
            return new Span(0, 0, 0, 0);
        }
        Slab slab = slab(part);
        double path = inside(part);
        double turn = outer(slab) - inner(slab);
        double aside = slab.side().sign() * path * Math.sin(turn);
        boolean flat = slab.tiltPlane() == TiltPlane.TANGENTIAL;
        return new Span(path, path * Math.cos(turn), flat ? aside : 0, flat ? 0 : aside);
    }

    private static Slab slab(Part part) {
        return part instanceof Plate plate ? plate.slab() : ((Crystal) part).slab();
    }

    private double inside(Part part) {
        return part instanceof Plate plate
                ? plate.thickness() / Math.cos(inner(plate.slab()))
                : ((Crystal) part).length();
    }

    private double outer(Slab slab) {
        return slab.faces().atBrewster()
                ? Math.atan(index(slab.glass()))
                : slab.faces().incidence();
    }

    private double inner(Slab slab) {
        return Math.asin(Math.sin(outer(slab)) / index(slab.glass()));
    }

    private double index(Glass glass) {
        return glass.index()
                .orElseGet(() -> Materials.standard()
                        .find(glass.material().orElseThrow())
                        .orElseThrow()
                        .index(design.wavelength()));
    }

    /** The vertex of a mirror in space. */
    Vector vertex(int mirror) {
        return Vector.of(mirrors.get(mirror).at(), heights.get(mirror));
    }

    /** The direction of a leg in air: with it, heading times (air and ahead) plus left times aside joins the mirrors. */
    Vector heading(int leg) {
        Vector line = Vector.of(mirrors.get((leg + 1) % mirrors.size()).at(), 0)
                .minus(Vector.of(mirrors.get(leg).at(), 0));
        double aside = sum(legs.get(leg), s -> s.left);
        double forth = Math.sqrt(line.dot(line) - aside * aside);
        return new Vector(0, 0, 0).plus(forth, line).plus(-aside, line.left()).unit();
    }

    private double path(int leg) {
        Vector line = Vector.of(mirrors.get((leg + 1) % mirrors.size()).at(), 0)
                .minus(Vector.of(mirrors.get(leg).at(), 0));
        return line.dot(heading(leg)) - sum(legs.get(leg), s -> s.ahead) + sum(legs.get(leg), s -> s.path);
    }

    /** The first mirror, then everything in the order of the beam; in a ring the first mirror again. */
    List<Optic> optics() {
        List<Optic> list = new ArrayList<>();
        int n = mirrors.size();
        boolean ring = design.shape() == Shape.RING;
        list.add(sphere(0, ring ? heading(n - 1) : null));
        for (int leg = 0; leg < legs.size(); leg++) {
            stand(leg, list);
            int next = (leg + 1) % n;
            list.add(sphere(next, heading(leg)));
        }
        return list;
    }

    private Optic sphere(int mirror, @org.jspecify.annotations.Nullable Vector arriving) {
        Vector normal = new Vector(0, 0, 0);
        boolean last = design.shape() == Shape.STANDING_WAVE && mirror == mirrors.size() - 1;
        normal = arriving == null ? normal : normal.minus(arriving);
        normal = last ? normal : normal.plus(1, heading(mirror));
        return new Optic.Sphere(
                vertex(mirror), normal.unit(), 1 / mirrors.get(mirror).radius());
    }

    /** Puts the optics of one leg in space, walking along the chief ray. */
    private void stand(int leg, List<Optic> list) {
        Vector heading = heading(leg);
        Vector at = vertex(leg);
        double done = 0;
        for (Part part : legs.get(leg)) {
            Span span = span(part);
            Along along = (Along) part.values().find(Field.ALONG).orElseThrow();
            double start = (along.inMiddle() ? path(leg) / 2 : along.path()) - span.path / 2;
            at = at.plus(start - done, heading);
            Vector out =
                    at.plus(span.ahead, heading).plus(span.left, heading.left()).plus(span.up, Vector.UP);
            Frame here = frame(at, heading);
            if (part instanceof Lens lens) {
                list.add(thin(lens, here));
            } else if (part instanceof Matrix box) {
                list.add(new Optic.Box(here, frame(out, heading), box.tangential(), box.sagittal()));
            } else if (!(part instanceof Aperture)) {
                slab(part, here, out, list);
            }
            at = out;
            done = start + span.path;
        }
    }

    private static Frame frame(Vector at, Vector along) {
        return new Frame(at, along, along.left(), Vector.UP);
    }

    private Optic thin(Lens lens, Frame here) {
        double power = 1 / lens.focalLength();
        if (lens.tilt() == 0) {
            return new Optic.Thin(here, power, power);
        }
        double n = index(lens.glass());
        double inside = Math.asin(Math.sin(lens.tilt()) / n);
        double cos = Math.cos(lens.tilt());
        double across = power * (n * Math.cos(inside) - cos) / (n - 1);
        double within = across / (cos * cos);
        return lens.tiltPlane() == TiltPlane.TANGENTIAL
                ? new Optic.Thin(here, within, across)
                : new Optic.Thin(here, across, within);
    }

    /** Two parallel faces, and between them the thermal lens, which acts on n times the slope inside. */
    private void slab(Part part, Frame here, Vector out, List<Optic> list) {
        Slab slab = slab(part);
        boolean flat = slab.tiltPlane() == TiltPlane.TANGENTIAL;
        Vector side = new Vector(0, 0, 0).plus(slab.side().sign(), flat ? here.tangential() : here.sagittal());
        double theta = outer(slab);
        double n = index(slab.glass());
        Vector normal = new Vector(0, 0, 0).plus(Math.cos(theta), here.along()).plus(Math.sin(theta), side);
        list.add(new Optic.Face(here.at(), normal, 1, n));
        TwoPowers powers = part instanceof Crystal crystal ? crystal.thermalPower() : TwoPowers.NONE;
        if (!powers.isNone()) {
            double turn = theta - inner(slab);
            Vector inside = out.minus(here.at()).unit();
            Vector across = new Vector(0, 0, 0).plus(Math.cos(turn), side).plus(-Math.sin(turn), here.along());
            Vector middle = here.at().plus(0.5, out.minus(here.at()));
            Frame frame = new Frame(middle, inside, flat ? across : here.tangential(), flat ? here.sagittal() : across);
            list.add(new Optic.Thin(frame, powers.tangential() / n, powers.sagittal() / n));
        }
        list.add(new Optic.Face(out, normal, n, 1));
    }
}
