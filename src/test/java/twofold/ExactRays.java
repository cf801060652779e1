package twofold;

import java.util.ArrayList;
import java.util.List;
import twofold.Optic.Frame;
import twofold.Optic.Ray;
import twofold.design.Design;
import twofold.design.Shape;

/**
 * Real rays in space through a design, independent of the program's optics: no ray matrix is multiplied anywhere. The
 * round trip of paraxial light is what is left of it for small offsets and slopes.
 *
 * <p>A round trip starts and ends in the plane across the beam at the vertex of the first mirror, light leaving it. The
 * tangential axis is carried along: every mirror reflects it, which leaves the left-right swap of reflections out, as in
 * the usual unfolded chain.
 */
final class ExactRays {
    /** The step in offset, m, and in slope. */
    static final double STEP = 1e-5;

    private final List<Optic> forward;
    private final boolean ring;
    private final Frame start;
    private final Frame end;

    private ExactRays(List<Optic> forward, boolean ring, Frame start, Frame end) {
        this.forward = forward;
        this.ring = ring;
        this.start = start;
        this.end = end;
    }

    static ExactRays of(Design design) {
        boolean ring = design.shape() == Shape.RING;
        ExactPlan plan = new ExactPlan(design);
        List<Optic> forward = plan.optics();
        Vector along = plan.heading(0);
        Frame start = new Frame(plan.vertex(0), along, along.left(), Vector.UP);
        Vector carried = start.tangential();
        for (boolean back : ring ? new boolean[] {false} : new boolean[] {false, true}) {
            for (Optic optic : order(forward, back)) {
                if (optic instanceof Optic.Sphere sphere) {
                    carried = carried.mirrored(sphere.normal());
                }
            }
        }
        return new ExactRays(forward, ring, start, new Frame(start.at(), along, carried, Vector.UP));
    }

    /** On the way back the last mirror has been met already; the first one, first in the list, comes last. */
    private static List<Optic> order(List<Optic> forward, boolean back) {
        if (!back) {
            return forward.subList(1, forward.size());
        }
        List<Optic> reversed = new ArrayList<>(forward.subList(0, forward.size() - 1));
        java.util.Collections.reverse(reversed);
        return reversed;
    }

    /** What comes back for (x, x′, y, y′) sent out, and how far the ray ever was from the chief ray. */
    private double[] roundTrip(double[] four, double[] reach) {
        Ray ray = start.ray(four, false);
        for (boolean back : ring ? new boolean[] {false} : new boolean[] {false, true}) {
            for (Optic optic : order(forward, back)) {
                ray = optic.meet(ray, back);
                Vector off = ray.at().minus(optic.place());
                reach[0] = Math.max(reach[0], back && optic instanceof Optic.Box ? 0 : off.length());
            }
        }
        return end.read(ray);
    }

    /** How far the chief ray misses the places that the plan gives it, m, and the slope at which it comes back. */
    double miss() {
        double[] reach = {0};
        double[] back = roundTrip(new double[4], reach);
        double worst = reach[0];
        for (double b : back) {
            worst = Math.max(worst, Math.abs(b));
        }
        return worst;
    }

    /** How far rays of one step ever go from the chief ray, m. */
    double reach() {
        double[] reach = {0};
        for (int i = 0; i < 4; i++) {
            double[] four = new double[4];
            four[i] = STEP;
            roundTrip(four, reach);
        }
        return reach[0];
    }

    /**
     * The derivative of what comes back, out by in, order (x, x′, y, y′): central differences, whose error is even in the
     * step, and one Richardson step, which removes its second order.
     */
    double[][] derivative() {
        double[][] whole = derivative(STEP);
        double[][] half = derivative(STEP / 2);
        double[][] best = new double[4][4];
        for (int i = 0; i < 4; i++) {
            for (int j = 0; j < 4; j++) {
                best[i][j] = (4 * half[i][j] - whole[i][j]) / 3;
            }
        }
        return best;
    }

    private double[][] derivative(double step) {
        double[][] d = new double[4][4];
        for (int j = 0; j < 4; j++) {
            double[] four = new double[4];
            four[j] = step;
            double[] plus = roundTrip(four, new double[1]);
            four[j] = -step;
            double[] minus = roundTrip(four, new double[1]);
            for (int i = 0; i < 4; i++) {
                d[i][j] = (plus[i] - minus[i]) / (2 * step);
            }
        }
        return d;
    }

    /** (A + D)/2 in one plane: 0 tangential, 1 sagittal. */
    static double halfTrace(double[][] derivative, int plane) {
        return (derivative[2 * plane][2 * plane] + derivative[2 * plane + 1][2 * plane + 1]) / 2;
    }
}
