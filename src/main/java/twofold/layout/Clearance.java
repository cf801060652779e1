package twofold.layout;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.PriorityQueue;
import twofold.design.Part;
import twofold.design.Point;

/**
 * Gaps between mounts and beams in the plan: each footprint against the strip of every leg that neither ends nor stands on
 * its part, and each footprint against every other.
 */
public final class Clearance {
    private final Laid laid;
    private final List<Footprint> footprints;
    private final List<Strip> strips;

    /**
     * A gap.
     *
     * @param part index of the part whose mount it is
     * @param beam number of the leg it is to
     * @param other index of the part whose mount it is to
     * @param gap m, negative where they overlap
     */
    public record Gap(int part, Optional<Integer> beam, Optional<Integer> other, double gap) {
        /** What the gap is to, in words: "beam End A/Fold 1", or the name of a part. */
        public String to(Laid laid) {
            List<Part> parts = laid.design().parts();
            return beam.map(laid.legs()::get)
                    .map(leg -> "beam " + parts.get(leg.from()).name() + "/"
                            + parts.get(leg.to()).name())
                    .or(() -> other.map(parts::get).map(Part::name))
                    .orElseThrow();
        }
    }

    private Clearance(Laid laid, List<Strip> strips) {
        this.laid = laid;
        this.footprints = Footprint.of(laid);
        this.strips = List.copyOf(strips);
    }

    /**
     * The clearances of a plan.
     *
     * @param laid the plan
     * @param strips the beam's width along the legs; none where there is no beam, which then only mounts limit
     */
    public static Clearance of(Laid laid, List<Strip> strips) {
        return new Clearance(laid, strips);
    }

    /** Whether beams take part. */
    public boolean knowsBeams() {
        return !strips.isEmpty();
    }

    /** Indices of the parts that take no part because they state no mount. */
    public List<Integer> unchecked() {
        List<Integer> unchecked = new ArrayList<>();
        for (int i = 0; i < laid.design().parts().size(); i++) {
            int part = i;
            if (footprints.stream().noneMatch(f -> f.part() == part)) {
                unchecked.add(i);
            }
        }
        return unchecked;
    }

    /**
     * The smallest gaps, smallest first.
     *
     * @param most how many at the most
     */
    public List<Gap> smallest(int most) {
        return smallest(most, Optional.empty());
    }

    /** The smallest gap that a part's mount has to anything; empty where it states none. */
    public Optional<Gap> smallestOf(int part) {
        return smallest(1, Optional.of(part)).stream().findFirst();
    }

    private List<Gap> smallest(int most, Optional<Integer> part) {
        PriorityQueue<Gap> kept =
                new PriorityQueue<>(Comparator.comparingDouble(Gap::gap).reversed());
        for (int i = 0; i < footprints.size(); i++) {
            Footprint f = footprints.get(i);
            boolean meant = part.map(p -> p == f.part()).orElse(true);
            for (int j = i + 1; j < footprints.size(); j++) {
                Footprint other = footprints.get(j);
                if ((meant || part.map(p -> p == other.part()).orElse(true))
                        && (kept.size() < most || atLeast(f.corners(), other.corners()) < worst(kept))) {
                    keep(
                            kept,
                            most,
                            new Gap(
                                    f.part(),
                                    Optional.empty(),
                                    Optional.of(other.part()),
                                    Convex.gap(f.corners(), other.corners())));
                }
            }
        }
        // Mounts are quickly measured, and what is near among them spares beams that are further away.
        for (Footprint f : footprints) {
            for (int leg = 0; leg < laid.legs().size(); leg++) {
                if (part.map(p -> p == f.part()).orElse(true)
                        && !touches(laid.legs().get(leg), f.part())) {
                    offer(kept, most, f, leg);
                }
            }
        }
        return kept.stream().sorted(Comparator.comparingDouble(Gap::gap)).toList();
    }

    private void offer(PriorityQueue<Gap> kept, int most, Footprint f, int leg) {
        double limit = kept.size() < most ? Double.POSITIVE_INFINITY : worst(kept);
        double least = limit;
        for (Strip strip : strips) {
            if (strip.leg() != leg || strip.length() <= 0) {
                continue;
            }
            Point a = laid.legs().get(leg).at(strip.start());
            Point b = laid.legs().get(leg).at(strip.start() + strip.length());
            double length = a.distance(b);
            double near = Convex.toSegment(centre(f.corners()), a, b) - reach(f.corners()) - strip.widest();
            if (length > 0 && near < least) {
                least = Math.min(
                        least,
                        strip.gap(
                                f.corners(), a, new Point((b.x() - a.x()) / length, (b.y() - a.y()) / length), least));
            }
        }
        if (least < limit) {
            keep(kept, most, new Gap(f.part(), Optional.of(leg), Optional.empty(), least));
        }
    }

    private static boolean touches(Leg leg, int part) {
        return leg.from() == part || leg.to() == part || leg.parts().stream().anyMatch(s -> s.part() == part);
    }

    private static void keep(PriorityQueue<Gap> kept, int most, Gap gap) {
        kept.add(gap);
        if (kept.size() > most) {
            kept.poll();
        }
    }

    private static double worst(PriorityQueue<Gap> kept) {
        Gap gap = kept.peek();
        return gap == null ? Double.POSITIVE_INFINITY : gap.gap();
    }

    /** A distance that two footprints do not come below. */
    private static double atLeast(List<Point> a, List<Point> b) {
        return centre(a).distance(centre(b)) - reach(a) - reach(b);
    }

    private static Point centre(List<Point> corners) {
        return new Point(
                corners.stream().mapToDouble(Point::x).average().orElse(0),
                corners.stream().mapToDouble(Point::y).average().orElse(0));
    }

    private static double reach(List<Point> corners) {
        Point centre = centre(corners);
        return corners.stream().mapToDouble(centre::distance).max().orElse(0);
    }
}
