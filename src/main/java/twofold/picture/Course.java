package twofold.picture;

import java.util.List;
import twofold.design.Design;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.layout.Laid;
import twofold.layout.Leg;
import twofold.layout.Standing;

/**
 * The unfolded path: one pass of a standing wave, once round a ring, from the surface of the first mirror. Leads from a path
 * to a place on the table and back.
 */
public final class Course {
    private final Laid laid;
    /** Where each leg starts, and behind the last the end of the whole; m. */
    private final double[] starts;
    /** Where each part's middle lies, by part; m. */
    private final double[] middles;
    /** The path inside each part, m. */
    private final double[] insides;
    /** The leg that each part stands on or, being a mirror, sends the beam along; the last mirror of a standing wave: the last leg. */
    private final int[] legs;

    /** The course of a plan. */
    public Course(Laid laid) {
        this.laid = laid;
        List<Leg> all = laid.legs();
        this.starts = new double[all.size() + 1];
        int parts = laid.design().parts().size();
        this.middles = new double[parts];
        this.insides = new double[parts];
        this.legs = new int[parts];
        for (int i = 0; i < all.size(); i++) {
            Leg leg = all.get(i);
            starts[i + 1] = starts[i] + leg.path();
            middles[leg.from()] = starts[i];
            legs[leg.from()] = i;
            for (Standing s : leg.parts()) {
                middles[s.part()] = starts[i] + s.middle();
                insides[s.part()] = s.length();
                legs[s.part()] = i;
            }
        }
        if (laid.design().shape() == Shape.STANDING_WAVE) {
            Leg last = all.get(all.size() - 1);
            middles[last.to()] = starts[all.size()];
            legs[last.to()] = all.size() - 1;
        }
    }

    /** The whole length, m. */
    public double length() {
        return starts[starts.length - 1];
    }

    /** Where a leg starts, m. */
    public double start(int leg) {
        return starts[leg];
    }

    /** Where a part's middle lies, m; the first mirror of a ring at 0. */
    public double middle(int part) {
        return middles[part];
    }

    /** The path inside a part, m; 0 for what is thin. */
    public double inside(int part) {
        return insides[part];
    }

    /** The leg that a part stands on or, being a mirror, sends the beam along; the last mirror of a standing wave: the last leg. */
    public int leg(int part) {
        return legs[part];
    }

    /** The leg that a path lies on; where two meet, the one behind. Limited to the whole. */
    public int legAt(double path) {
        int leg = 0;
        while (leg < starts.length - 2 && path >= starts[leg + 1]) {
            leg++;
        }
        return leg;
    }

    /** The place on the table at a path, m; limited to the whole. */
    public Point at(double path) {
        int leg = legAt(path);
        return laid.legs().get(leg).at(path - starts[leg]);
    }

    /** The part on the table that is nearest along the path: within a slab or box, that one. */
    public int partNear(double path) {
        Design design = laid.design();
        int nearest = 0;
        double least = Double.POSITIVE_INFINITY;
        for (int i = 0; i < design.parts().size(); i++) {
            double off = Math.abs(path - middles[i]);
            off = Math.max(0, off - insides[i] / 2);
            if (off < least) {
                least = off;
                nearest = i;
            }
        }
        boolean round = design.shape() == Shape.RING && length() - path < least;
        return round ? 0 : nearest;
    }

    /**
     * A place of the beam's axis.
     *
     * @param path from the first mirror, m
     * @param distance from the place asked for, m
     */
    public record Nearest(double path, double distance) {}

    /** The place of the axis nearest to a place on the table. */
    public Nearest nearest(Point to) {
        double path = 0;
        double least = Double.POSITIVE_INFINITY;
        for (int l = 0; l < laid.legs().size(); l++) {
            Leg.Foot foot = laid.legs().get(l).nearest(to);
            if (foot.distance() < least) {
                least = foot.distance();
                path = starts[l] + foot.path();
            }
        }
        return new Nearest(path, least);
    }
}
