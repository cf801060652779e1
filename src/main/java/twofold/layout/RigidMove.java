package twofold.layout;

import java.util.List;
import java.util.Optional;

/**
 * Legs and incidences of a standing wave set by moving the arm beyond as a rigid whole: for a leg along the leg, for an
 * incidence about that mirror. No other leg and no other incidence changes. Closed form, without allocation.
 *
 * <p>"Beyond" is the side on which no mirror is pinned, downstream first.
 */
final class RigidMove {
    private final int[] leg;
    private final int[] legKnob;
    private final boolean[] legDown;
    private final int[] mirror;
    private final int[] mirrorKnob;
    private final boolean[] mirrorDown;

    // What follows from the plan at rest.
    private final Plan rest;
    private final double[] extent;
    private final double[] headingX;
    private final double[] headingY;
    private final double[] turn;

    private RigidMove(Plan rest, List<Knob> legs, List<Knob> folds) {
        this.rest = rest;
        leg = legs.stream().mapToInt(k -> ((Target.Leg) k.target()).leg()).toArray();
        legKnob = legs.stream().mapToInt(Knob::number).toArray();
        legDown = new boolean[leg.length];
        mirror = folds.stream()
                .mapToInt(k -> ((Target.Incidence) k.target()).mirror())
                .toArray();
        mirrorKnob = folds.stream().mapToInt(Knob::number).toArray();
        mirrorDown = new boolean[mirror.length];
        extent = new double[leg.length];
        headingX = new double[leg.length];
        headingY = new double[leg.length];
        turn = new double[mirror.length];
    }

    /**
     * A way to set numbers of a plan.
     *
     * @param rest the plan that everything starts from
     * @param knobs what is set
     * @param pinned mirrors that must not move
     * @param heading legs that must not turn, as far as there is a choice
     * @return empty in a ring, where a place is set, or where mirrors are pinned on both sides
     */
    static Optional<RigidMove> of(Plan rest, List<Knob> knobs, boolean[] pinned, boolean[] heading) {
        List<Knob> legs =
                knobs.stream().filter(k -> k.target() instanceof Target.Leg).toList();
        List<Knob> folds = knobs.stream()
                .filter(k -> k.target() instanceof Target.Incidence)
                .toList();
        if (rest.isRing() || legs.size() + folds.size() < knobs.size()) {
            return Optional.empty();
        }
        RigidMove move = new RigidMove(rest, legs, folds);
        for (int i = 0; i < move.leg.length; i++) {
            move.legDown[i] = !any(pinned, move.leg[i] + 1, pinned.length);
            if (!move.legDown[i] && any(pinned, 0, move.leg[i] + 1)) {
                return Optional.empty();
            }
        }
        for (int i = 0; i < move.mirror.length; i++) {
            int m = move.mirror[i];
            boolean down = !any(pinned, m + 1, pinned.length);
            boolean up = !any(pinned, 0, m);
            if (!down && !up) {
                return Optional.empty();
            }
            move.mirrorDown[i] = down && !(up && any(heading, m, heading.length) && !any(heading, 0, m));
        }
        move.restart();
        return Optional.of(move);
    }

    private static boolean any(boolean[] flags, int from, int to) {
        for (int i = from; i < to; i++) {
            if (flags[i]) {
                return true;
            }
        }
        return false;
    }

    /** Takes up what became of the plan at rest. */
    void restart() {
        for (int i = 0; i < leg.length; i++) {
            int k = leg[i];
            double dx = rest.x[k + 1] - rest.x[k];
            double dy = rest.y[k + 1] - rest.y[k];
            extent[i] = Aim.extent(dx, dy, rest.shift[k]);
            headingX[i] = Aim.headingX(dx, dy, extent[i], rest.shift[k]);
            headingY[i] = Aim.headingY(dx, dy, extent[i], rest.shift[k]);
        }
        for (int i = 0; i < mirror.length; i++) {
            turn[i] = rest.turn(mirror[i]);
        }
    }

    /**
     * Sets the values.
     *
     * @param values by knob, in SI
     * @param to takes the mirrors' places
     * @return whether every leg could be as long as asked
     */
    boolean move(double[] values, Plan to) {
        int last = rest.mirrors();
        System.arraycopy(rest.x, 0, to.x, 0, last);
        System.arraycopy(rest.y, 0, to.y, 0, last);
        for (int i = 0; i < leg.length; i++) {
            int k = leg[i];
            double wanted = values[legKnob[i]] - rest.excess[k];
            if (!(wanted > 0)) {
                return false;
            }
            double by = legDown[i] ? wanted - extent[i] : extent[i] - wanted;
            double byX = by * headingX[i];
            double byY = by * headingY[i];
            int end = legDown[i] ? last : k + 1;
            for (int j = legDown[i] ? k + 1 : 0; j < end; j++) {
                to.x[j] += byX;
                to.y[j] += byY;
            }
        }
        for (int i = 0; i < mirror.length; i++) {
            int m = mirror[i];
            double wanted = Math.copySign(Math.PI - 2 * values[mirrorKnob[i]], turn[i]);
            double by = mirrorDown[i] ? wanted - turn[i] : turn[i] - wanted;
            double cos = Math.cos(by);
            double sin = Math.sin(by);
            double x = to.x[m];
            double y = to.y[m];
            int end = mirrorDown[i] ? last : m;
            for (int j = mirrorDown[i] ? m + 1 : 0; j < end; j++) {
                to.carry(j, x, y, cos, sin, x, y);
            }
        }
        return true;
    }
}
