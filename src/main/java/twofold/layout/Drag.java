package twofold.layout;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import twofold.design.Design;
import twofold.design.Hold;
import twofold.design.Point;

/**
 * One mirror moved to a point, with what follows it. Under holds it goes to the nearest place that keeps them: with one held
 * leg it slides on a circle; with two, it stays.
 */
public final class Drag {
    /** How far a held value may be missed, m. */
    private static final double KEPT = 1e-12;

    /** Step of a slope, as a share of a leg. */
    private static final double SLOPE = 1e-6;

    private static final int MOST_STEPS = 60;
    private static final double LEAST_SHARE = 1.0 / 64;

    private final Laid laid;
    private final int mirror;
    private final Follow follow;
    private final Plan rest;
    private final Plan plan;
    private final double arm;
    private final List<Hold> holds = new ArrayList<>();
    private final List<Equation> equations = new ArrayList<>();
    private final boolean[] pinned;
    private final boolean down;
    private final Optional<Follow.Partner> partner;

    private Drag(Laid laid, int mirror, Follow follow) {
        this.laid = laid;
        this.mirror = mirror;
        this.follow = follow;
        rest = Plan.of(laid);
        plan = rest.copy();
        arm = laid.legs().stream().mapToDouble(Leg::path).average().orElseThrow();
        pinned = new boolean[rest.mirrors()];
        Design design = laid.design();
        for (Hold hold : design.holds()) {
            if (hold instanceof Hold.Position p) {
                pinned[Target.mirror(design, p.mirror())] = true;
            }
            Equation.keep(hold, design, arm).ifPresent(e -> {
                e.start(rest, new double[0]);
                holds.add(hold);
                equations.add(e);
            });
        }
        down = mirror > 0 && (isFree(mirror + 1, pinned.length) || mirror == pinned.length - 1);
        partner = Follow.Partner.of(rest, mirror);
    }

    /**
     * Moves a mirror.
     *
     * @param laid the plan, with the design's holds
     * @param mirror its number along the beam, from 0
     * @param to where it is wanted
     * @param follow what else moves; one of {@link Follow#allowed}
     * @throws IllegalArgumentException where the plan does not allow it
     */
    public static Move to(Laid laid, int mirror, Point to, Follow follow) {
        if (!Follow.allowed(laid).contains(follow)) {
            throw new IllegalArgumentException(follow.words() + " is not for this plan");
        }
        return new Drag(laid, mirror, follow).move(to);
    }

    private boolean isFree(int from, int to) {
        return IntStream.range(from, to).noneMatch(i -> pinned[i]);
    }

    private Move move(Point to) {
        List<Hold> pins = laid.design().holds().stream()
                .filter(h -> h instanceof Hold.Position p && isMoved(Target.mirror(laid.design(), p.mirror())))
                .toList();
        if (!pins.isEmpty()) {
            String name = laid.design().mirrors().get(mirror).name();
            return new Move.Refused(
                    name + " cannot be moved (" + follow.words() + "): in the way stands the hold of "
                            + pins.get(0).words(),
                    pins,
                    java.util.OptionalDouble.empty());
        }
        place(to.x(), to.y());
        List<Hold> broken = IntStream.range(0, holds.size())
                .filter(i -> !(Math.abs(equations.get(i).missed(plan)) <= KEPT))
                .mapToObj(holds::get)
                .toList();
        if (!broken.isEmpty()) {
            slide(to);
        }
        return new Move.Moved(plan.places(), broken);
    }

    /** Whether a mirror moves along. */
    private boolean isMoved(int other) {
        if (other == mirror) {
            return true;
        }
        return switch (follow) {
            case OTHERS_STAY -> false;
            case ARM_FOLLOWS, ARM_SWINGS -> down ? other > mirror : other < mirror;
            case MIRRORED_PARTNER -> partner.map(p -> p.mirror() == other).orElse(false);
        };
    }

    /** Puts the mirror at a place, and with it what follows. */
    private void place(double x, double y) {
        plan.take(rest);
        plan.x[mirror] = x;
        plan.y[mirror] = y;
        double byX = x - rest.x[mirror];
        double byY = y - rest.y[mirror];
        switch (follow) {
            case OTHERS_STAY -> {}
            case ARM_FOLLOWS -> carry(0);
            case ARM_SWINGS -> {
                int leg = down ? mirror - 1 : mirror;
                carry(leg < plan.legs() ? plan.direction(leg) - rest.direction(leg) : 0);
            }
            case MIRRORED_PARTNER -> {
                Follow.Partner p = partner.orElseThrow();
                double across = byX * p.normalX() + byY * p.normalY();
                // On the axis a mirror stays on it; its partner goes the other way across it.
                double back = p.mirror() == mirror ? across : 2 * across;
                plan.x[p.mirror()] = rest.x[p.mirror()] + byX - back * p.normalX();
                plan.y[p.mirror()] = rest.y[p.mirror()] + byY - back * p.normalY();
            }
        }
    }

    private void carry(double turn) {
        double cos = Math.cos(turn);
        double sin = Math.sin(turn);
        for (int i = 0; i < plan.mirrors(); i++) {
            if (i != mirror && isMoved(i)) {
                plan.carry(i, rest.x[mirror], rest.y[mirror], cos, sin, plan.x[mirror], plan.y[mirror]);
            }
        }
    }

    /** Goes to the place nearest to the wanted one that keeps the holds; nearer to where it was, if that is all there is. */
    private void slide(Point to) {
        for (double share = 1; share >= LEAST_SHARE; share /= 2) {
            double x = rest.x[mirror] + share * (to.x() - rest.x[mirror]);
            double y = rest.y[mirror] + share * (to.y() - rest.y[mirror]);
            if (project(x, y)) {
                return;
            }
        }
        plan.take(rest);
    }

    /** As {@link LeastMove}, with the mirror's two coordinates for unknowns. */
    private boolean project(double toX, double toY) {
        LeastStep least = new LeastStep(equations.size(), 2);
        double[] missed = new double[equations.size()];
        double[] right = new double[equations.size()];
        double[] step = new double[2];
        double h = SLOPE * arm;
        double x = toX;
        double y = toY;
        for (int i = 0; i < MOST_STEPS; i++) {
            slope(x + h, y, x - h, y, h, 0, least);
            slope(x, y + h, x, y - h, h, 1, least);
            place(x, y);
            double worst = 0;
            for (int e = 0; e < missed.length; e++) {
                missed[e] = equations.get(e).missed(plan);
                worst = Math.max(worst, Math.abs(missed[e]));
                right[e] = -missed[e] - least.matrix[e][0] * (toX - x) - least.matrix[e][1] * (toY - y);
            }
            if (!(worst < Double.POSITIVE_INFINITY)) {
                return false;
            }
            least.solve(right, step);
            double byX = toX + step[0] - x;
            double byY = toY + step[1] - y;
            double far = Math.hypot(byX, byY);
            if (worst <= KEPT && far <= 1e-9 * arm) {
                return true;
            }
            if (far <= 1e-13 * arm) {
                return false;
            }
            double share = Math.min(1, arm / 2 / far);
            x += share * byX;
            y += share * byY;
        }
        return false;
    }

    private void slope(double x1, double y1, double x0, double y0, double h, int column, LeastStep least) {
        place(x1, y1);
        for (int e = 0; e < equations.size(); e++) {
            least.matrix[e][column] = equations.get(e).missed(plan);
        }
        place(x0, y0);
        for (int e = 0; e < equations.size(); e++) {
            least.matrix[e][column] =
                    (least.matrix[e][column] - equations.get(e).missed(plan)) / (2 * h);
        }
    }
}
