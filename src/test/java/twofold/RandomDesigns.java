package twofold;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import twofold.RandomParts.Draft;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.design.Unit;

/**
 * Random designs that are valid and fit their legs: standing waves and rings of all kinds of part, of 2 to 100 parts.
 * The same seed gives the same design.
 */
public final class RandomDesigns {
    /** The largest angle of incidence on a mirror. */
    private static final double STEEPEST = Math.toRadians(70);

    /**
     * How far rays that start at 10 µm or 10 µrad may go from the axis, m. Beyond it the aberrations of real mirrors are
     * no longer small against 1e-7, so that real rays could not vouch for a chain.
     */
    private static final double FARTHEST = 0.3e-3;

    private final Dice dice;
    private final RandomParts parts;
    private int names;

    private RandomDesigns(Dice dice, double wave, double weakness) {
        this.dice = dice;
        parts = new RandomParts(dice, wave, weakness);
    }

    /** A valid design, stable or not, with random holds, levers, requirements and tolerances. */
    public static Design of(long seed) {
        Dice dice = new Dice(seed);
        double size = dice.any(0, 1);
        int count = size < 0.6 ? dice.count(0, 8) : size < 0.85 ? dice.count(8, 25) : dice.count(40, 92);
        return wished(dice, moderate(dice, "Random " + seed, count));
    }

    /** The same, stable in both planes: the half trace of its real rays is within ±0.98. */
    public static Design stable(long seed) {
        Dice dice = new Dice(seed);
        while (true) {
            Design bare = moderate(dice, "Stable " + seed, dice.count(0, 12));
            double[][] rays = ExactRays.of(bare).derivative();
            double worst = Math.max(Math.abs(ExactRays.halfTrace(rays, 0)), Math.abs(ExactRays.halfTrace(rays, 1)));
            if (worst < 0.98) {
                return wished(dice, bare);
            }
        }
    }

    /** Drawn again, ever weaker, until its rays stay near the axis. */
    private static Design moderate(Dice dice, String title, int count) {
        boolean ring = dice.chance(0.5);
        for (double weakness = 1; ; weakness *= 1.2) {
            double wave = dice.number(500e-9, 1600e-9, Unit.NM, 1);
            RandomDesigns designs = new RandomDesigns(dice, wave, weakness);
            List<Part> list = ring ? designs.ring(count) : designs.standingWave(count);
            Design design = Design.of(title, wave, ring ? Shape.RING : Shape.STANDING_WAVE, list);
            if (ExactRays.of(design).reach() < FARTHEST) {
                return design;
            }
        }
    }

    private static Design wished(Dice dice, Design bare) {
        Design whole = new RandomWishes(dice, bare).design();
        assertThat(whole.problems()).as(whole.title()).isEmpty();
        return whole;
    }

    private String name() {
        return parts.name(++names);
    }

    /** So many parts, shared out over so many legs. */
    private List<List<Draft>> drafts(int legs, int count, boolean closed) {
        List<List<Draft>> all = new ArrayList<>();
        for (int i = 0; i < legs; i++) {
            all.add(new ArrayList<>());
        }
        int left = count;
        while (left > 0) {
            if (closed && left >= 2 && dice.chance(0.15)) {
                parts.pair(name(), name()).forEach(d -> dice.of(all).add(d));
                left -= 2;
            } else {
                dice.of(all).add(parts.part(name(), !closed));
                left--;
            }
        }
        return all;
    }

    private List<Part> standingWave(int count) {
        int legs = dice.chance(0.25) ? 1 : dice.count(2, 6);
        List<List<Draft>> drafts = drafts(legs, count, false);
        Point at = dice.chance(0.5) ? new Point(0, 0) : new Point(dice.any(-1, 1), dice.any(-1, 1));
        double heading = dice.chance(0.3) ? 0 : dice.any(-Math.PI, Math.PI);
        List<Part> list = new ArrayList<>();
        list.add(parts.mirror(name(), at));
        for (List<Draft> leg : drafts) {
            double air = dice.length(0.02, 0.6) + leg.size() * dice.any(0.002, 0.03);
            list.addAll(placed(leg, air + path(leg)));
            double ahead = air + leg.stream().mapToDouble(Draft::ahead).sum();
            double left = left(leg);
            at = new Point(
                    at.x() + ahead * Math.cos(heading) - left * Math.sin(heading),
                    at.y() + ahead * Math.sin(heading) + left * Math.cos(heading));
            list.add(parts.mirror(name(), at));
            double incidence = dice.chance(0.7) ? dice.any(0.01, 0.35) : dice.any(0.35, 0.99 * STEEPEST);
            heading += dice.sign() * (Math.PI - 2 * incidence);
        }
        return list;
    }

    private List<Part> ring(int count) {
        int corners = dice.count(3, 8);
        List<List<Draft>> drafts = drafts(corners, count, true);
        while (true) {
            List<Point> at = new ArrayList<>();
            for (int i = 0; i < corners; i++) {
                at.add(new Point(dice.any(-0.3, 0.3), dice.any(-0.15, 0.25)));
            }
            List<Point> scaled = scaled(at, drafts);
            if (closes(scaled, drafts)) {
                List<Part> list = new ArrayList<>();
                for (int i = 0; i < corners; i++) {
                    Mirror mirror = parts.mirror(name(), scaled.get(i));
                    list.add(mirror);
                    double distance = mirror.at().distance(scaled.get((i + 1) % corners));
                    list.addAll(placed(drafts.get(i), air(distance, drafts.get(i)) + path(drafts.get(i))));
                }
                return list;
            }
        }
    }

    /** Blown up until the parts of each leg fit with room between them. */
    private static List<Point> scaled(List<Point> at, List<List<Draft>> drafts) {
        double scale = 1;
        for (int i = 0; i < at.size(); i++) {
            List<Draft> leg = drafts.get(i);
            double needed = 0.03 + 0.004 * leg.size() + path(leg) + Math.abs(left(leg));
            scale = Math.max(scale, needed / at.get(i).distance(at.get((i + 1) % at.size())));
        }
        double s = scale;
        return at.stream().map(p -> new Point(s * p.x(), s * p.y())).toList();
    }

    /** Whether no corner is too steep or straight and nothing had to be blown up out of all proportion. */
    private static boolean closes(List<Point> at, List<List<Draft>> drafts) {
        int n = at.size();
        double longest = 0;
        double least = 1;
        for (int i = 0; i < n; i++) {
            double turn = heading(at, drafts, i) - heading(at, drafts, (i + n - 1) % n);
            least = Math.min(least, Math.sqrt((1 - Math.cos(turn)) / 2));
            longest = Math.max(longest, at.get(i).distance(at.get((i + 1) % n)));
        }
        return least > Math.cos(0.99 * STEEPEST) && longest < 4;
    }

    /** The direction of a leg: that of the line between its mirrors, turned back by what its slabs shift. */
    private static double heading(List<Point> at, List<List<Draft>> drafts, int leg) {
        Point from = at.get(leg);
        Point to = at.get((leg + 1) % at.size());
        double aside = left(drafts.get(leg)) / from.distance(to);
        return Math.atan2(to.y() - from.y(), to.x() - from.x()) - Math.asin(aside);
    }

    private static double air(double distance, List<Draft> leg) {
        double aside = left(leg);
        return Math.sqrt(distance * distance - aside * aside)
                - leg.stream().mapToDouble(Draft::ahead).sum();
    }

    private static double path(List<Draft> leg) {
        return leg.stream().mapToDouble(Draft::path).sum();
    }

    private static double left(List<Draft> leg) {
        return leg.stream().mapToDouble(Draft::left).sum();
    }

    /** Puts parts on a leg, one of them perhaps in the middle. */
    private List<Part> placed(List<Draft> leg, double path) {
        List<Part> list = new ArrayList<>();
        int middle = leg.isEmpty() || dice.chance(0.6) ? -1 : dice.count(0, leg.size() - 1);
        if (middle >= 0) {
            double half = leg.get(middle).path() / 2;
            List<Draft> before = leg.subList(0, middle);
            List<Draft> after = leg.subList(middle + 1, leg.size());
            if (Math.max(path(before), path(after)) + half < path / 2 - 1e-3) {
                list.addAll(between(before, 0, path / 2 - half));
                list.add(leg.get(middle).at(Along.MIDDLE));
                list.addAll(between(after, path / 2 + half, path));
                return list;
            }
        }
        return between(leg, 0, path);
    }

    /** Puts parts between two places, with gaps of which some are nothing. */
    private List<Part> between(List<Draft> leg, double from, double to) {
        double[] gaps = new double[leg.size() + 1];
        double sum = 0;
        for (int i = 0; i < gaps.length; i++) {
            gaps[i] = dice.chance(0.15) ? 0 : dice.any(0.1, 1);
            sum += gaps[i];
        }
        double free = to - from - path(leg);
        List<Part> list = new ArrayList<>();
        double done = from;
        for (int i = 0; i < leg.size(); i++) {
            Draft draft = leg.get(i);
            done += sum == 0 ? free / gaps.length : free * gaps[i] / sum;
            list.add(draft.at(Along.at(done + draft.path() / 2)));
            done += draft.path();
        }
        return list;
    }
}
