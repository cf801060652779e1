package twofold.layout;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
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

/**
 * The rectangle that a part's mount takes on the table: behind the face of a mirror, centred on any other part and square
 * to its leg.
 *
 * @param part index in the design
 * @param corners counter-clockwise
 */
public record Footprint(int part, List<Point> corners) {
    /** Copies the list. */
    public Footprint {
        corners = List.copyOf(corners);
    }

    /** The footprints of all parts that have a mount, in beam order. */
    public static List<Footprint> of(Laid laid) {
        List<Footprint> all = new ArrayList<>();
        List<Leg> legs = laid.legs();
        boolean ring = laid.design().shape() == Shape.RING;
        for (int k = 0; k < legs.size(); k++) {
            Leg out = legs.get(k);
            Optional<Leg> in = k > 0
                    ? Optional.of(legs.get(k - 1))
                    : ring ? Optional.of(legs.get(legs.size() - 1)) : Optional.empty();
            all.add(mirror(laid, out.from(), facing(in, Optional.of(out))));
            for (Standing s : out.parts()) {
                mount(laid.design().parts().get(s.part()))
                        .ifPresent(m -> all.add(new Footprint(
                                s.part(),
                                rectangle(
                                        out.at(s.middle()), out.heading(), m.width(), -m.depth() / 2, m.depth() / 2))));
            }
        }
        if (!ring) {
            Leg last = legs.get(legs.size() - 1);
            all.add(mirror(laid, last.to(), facing(Optional.of(last), Optional.empty())));
        }
        return all;
    }

    private static Footprint mirror(Laid laid, int part, Point facing) {
        Mirror m = (Mirror) laid.design().parts().get(part);
        return new Footprint(
                part, rectangle(m.at(), facing, m.mount().width(), -m.mount().depth(), 0));
    }

    /** The unit vector that a mirror between two legs faces along: into the beam. */
    public static Point facing(Optional<Leg> in, Optional<Leg> out) {
        double x = out.map(l -> l.heading().x()).orElse(0.0)
                - in.map(l -> l.heading().x()).orElse(0.0);
        double y = out.map(l -> l.heading().y()).orElse(0.0)
                - in.map(l -> l.heading().y()).orElse(0.0);
        double length = Math.hypot(x, y);
        return new Point(x / length, y / length);
    }

    /** A rectangle of a width across a unit vector, from one place along it to another. */
    private static List<Point> rectangle(Point centre, Point along, double width, double from, double to) {
        double w = width / 2;
        return List.of(
                corner(centre, along, from, w),
                corner(centre, along, from, -w),
                corner(centre, along, to, -w),
                corner(centre, along, to, w));
    }

    private static Point corner(Point centre, Point u, double along, double left) {
        return new Point(centre.x() + along * u.x() - left * u.y(), centre.y() + along * u.y() + left * u.x());
    }

    private static Optional<Mount> mount(Part part) {
        return part.match(new Part.Cases<Optional<Mount>>() {
            @Override
            public Optional<Mount> mirror(Mirror mirror) {
                return Optional.of(mirror.mount());
            }

            @Override
            public Optional<Mount> lens(Lens lens) {
                return Optional.of(lens.mount());
            }

            @Override
            public Optional<Mount> plate(Plate plate) {
                return plate.slab().mount();
            }

            @Override
            public Optional<Mount> crystal(Crystal crystal) {
                return crystal.slab().mount();
            }

            @Override
            public Optional<Mount> aperture(Aperture aperture) {
                return Optional.empty();
            }

            @Override
            public Optional<Mount> matrix(Matrix matrix) {
                return Optional.empty();
            }
        });
    }
}
