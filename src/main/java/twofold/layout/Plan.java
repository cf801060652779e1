package twofold.layout;

import java.util.ArrayList;
import java.util.List;
import twofold.design.Design;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.material.Materials;

/**
 * A plan as plain numbers, for moving mirrors millions of times: where each mirror stands, and what the parts on each leg do
 * to it. Mirrors and legs are numbered along the beam; leg k leaves mirror k. Mutable, confined to a thread; lengths in m,
 * angles in rad, counter-clockwise.
 */
public final class Plan {
    private final boolean ring;
    private final int legs;
    final double[] x;
    final double[] y;
    /** How far the slabs of each leg shift the beam sideways, left positive. */
    final double[] shift;
    /** Path of each leg minus its extent along its heading. */
    final double[] excess;

    private Plan(boolean ring, int legs, double[] x, double[] y, double[] shift, double[] excess) {
        this.ring = ring;
        this.legs = legs;
        this.x = x;
        this.y = y;
        this.shift = shift;
        this.excess = excess;
    }

    /** The numbers of a laid-out design. */
    public static Plan of(Laid laid) {
        List<Mirror> mirrors = laid.design().mirrors();
        int legs = laid.legs().size();
        Plan plan = new Plan(
                laid.design().shape() == Shape.RING,
                legs,
                mirrors.stream().mapToDouble(m -> m.at().x()).toArray(),
                mirrors.stream().mapToDouble(m -> m.at().y()).toArray(),
                new double[legs],
                new double[legs]);
        plan.load(laid.design());
        return plan;
    }

    /** The same numbers apart from these. */
    public Plan copy() {
        return new Plan(ring, legs, x.clone(), y.clone(), shift.clone(), excess.clone());
    }

    /** How many mirrors there are. */
    public int mirrors() {
        return x.length;
    }

    /** How many legs there are. */
    public int legs() {
        return legs;
    }

    boolean isRing() {
        return ring;
    }

    /** The number of the mirror that a leg meets. */
    int end(int leg) {
        return leg + 1 < x.length ? leg + 1 : 0;
    }

    /** The number of the leg that meets a mirror; the mirror folds the beam. */
    int before(int mirror) {
        return mirror > 0 ? mirror - 1 : legs - 1;
    }

    /** Whether the beam is folded at a mirror: not at the ends of a standing wave. */
    boolean folds(int mirror) {
        return ring || (mirror > 0 && mirror < x.length - 1);
    }

    /** A mirror's x, m. */
    public double x(int mirror) {
        return x[mirror];
    }

    /** A mirror's y, m. */
    public double y(int mirror) {
        return y[mirror];
    }

    /**
     * States what the parts on a leg do to it.
     *
     * @param sideways sum of their shifts, m, left positive
     * @param longer sum of their paths minus their extents along the heading, m
     */
    public void load(int leg, double sideways, double longer) {
        shift[leg] = sideways;
        excess[leg] = longer;
    }

    /** States what the parts of a design of the same mirrors do to its legs, whether they fit or not. */
    void load(Design design) {
        Glazing glazing = new Glazing(design.wavelength(), Materials.standard());
        int leg = -1;
        double sideways = 0;
        double longer = 0;
        for (int i = 0; i < design.parts().size(); i++) {
            Part part = design.parts().get(i);
            if (part instanceof Mirror) {
                leg++;
                sideways = 0;
                longer = 0;
            } else {
                Standing s = glazing.standing(i, part);
                sideways += s.shift();
                longer += s.length() - s.advance();
            }
            if (leg < legs) {
                load(leg, sideways, longer);
            }
        }
    }

    void take(Plan other) {
        System.arraycopy(other.x, 0, x, 0, x.length);
        System.arraycopy(other.y, 0, y, 0, y.length);
    }

    /** Where the mirrors stand. */
    public List<Point> places() {
        List<Point> places = new ArrayList<>();
        for (int i = 0; i < x.length; i++) {
            places.add(new Point(x[i], y[i]));
        }
        return places;
    }

    private double dx(int leg) {
        return x[end(leg)] - x[leg];
    }

    private double dy(int leg) {
        return y[end(leg)] - y[leg];
    }

    /** The extent of a leg along its heading, m; NaN where its slabs shift the beam by more than its mirrors are apart. */
    double extent(int leg) {
        return Aim.extent(dx(leg), dy(leg), shift[leg]);
    }

    /** The path of a leg, m. */
    public double path(int leg) {
        return extent(leg) + excess[leg];
    }

    /** The direction of a leg, rad. */
    double direction(int leg) {
        double dx = dx(leg);
        double dy = dy(leg);
        double extent = Aim.extent(dx, dy, shift[leg]);
        return Math.atan2(Aim.headingY(dx, dy, extent, shift[leg]), Aim.headingX(dx, dy, extent, shift[leg]));
    }

    /** The angle by which the beam turns at a mirror that folds it, rad, from −π to π; ±π is normal incidence. */
    double turn(int mirror) {
        return wrapped(direction(mirror) - direction(before(mirror)));
    }

    /** The angle of incidence at a mirror that folds the beam, rad. */
    public double incidence(int mirror) {
        return (Math.PI - Math.abs(turn(mirror))) / 2;
    }

    /** An angle less whole turns, from −π to π. */
    static double wrapped(double angle) {
        return Math.IEEEremainder(angle, 2 * Math.PI);
    }

    /** Turns a mirror about a point and moves it on. */
    void carry(int mirror, double aboutX, double aboutY, double cos, double sin, double toX, double toY) {
        double rx = x[mirror] - aboutX;
        double ry = y[mirror] - aboutY;
        x[mirror] = toX + cos * rx - sin * ry;
        y[mirror] = toY + sin * rx + cos * ry;
    }
}
