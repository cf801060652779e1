package twofold.layout;

import java.util.List;
import twofold.design.Point;
import twofold.design.Turn;

/**
 * The beam from one mirror to the next.
 *
 * @param from index of the mirror it leaves, among the design's parts
 * @param to index of the mirror it meets
 * @param heading unit vector of the beam in the air
 * @param path inside parts included, m
 * @param distance mirror to mirror by ruler, in the plan, m
 * @param parts that stand on it, in beam order
 * @param bends where the beam starts, enters and leaves each part with a length, and ends
 */
public record Leg(
        int from, int to, Point heading, double path, double distance, List<Standing> parts, List<Bend> bends) {
    /** Copies the lists. */
    public Leg {
        parts = List.copyOf(parts);
        bends = List.copyOf(bends);
    }

    /**
     * A point of the beam's axis.
     *
     * @param path from the leg's start, m
     * @param at on the table
     */
    public record Bend(double path, Point at) {}

    /** The point of the axis at a path from the leg's start, m; limited to the leg. */
    public Point at(double along) {
        int i = 1;
        while (i < bends.size() - 1 && bends.get(i).path() < along) {
            i++;
        }
        Bend a = bends.get(i - 1);
        Bend b = bends.get(i);
        double length = b.path() - a.path();
        double share = length > 0 ? Math.min(1, Math.max(0, (along - a.path()) / length)) : 0;
        return new Point(
                a.at().x() + share * (b.at().x() - a.at().x()), a.at().y() + share * (b.at().y() - a.at().y()));
    }

    /**
     * The place of the axis that is nearest to a point of the table.
     *
     * @param path from the leg's start, m
     * @param distance from the point, m
     * @param side the point's, looking along the beam
     */
    public record Foot(double path, double distance, Turn side) {}

    /** The place of the axis nearest to a point of the table. */
    public Foot nearest(Point to) {
        Foot nearest = new Foot(0, Double.POSITIVE_INFINITY, Turn.LEFT);
        for (int i = 1; i < bends.size(); i++) {
            Bend a = bends.get(i - 1);
            Bend b = bends.get(i);
            double alongX = b.at().x() - a.at().x();
            double alongY = b.at().y() - a.at().y();
            double offX = to.x() - a.at().x();
            double offY = to.y() - a.at().y();
            double square = alongX * alongX + alongY * alongY;
            double share = square == 0 ? 0 : Math.min(1, Math.max(0, (offX * alongX + offY * alongY) / square));
            double distance = Math.hypot(offX - share * alongX, offY - share * alongY);
            if (distance < nearest.distance()) {
                nearest = new Foot(
                        a.path() + share * (b.path() - a.path()),
                        distance,
                        alongX * offY - alongY * offX >= 0 ? Turn.LEFT : Turn.RIGHT);
            }
        }
        return nearest;
    }
}
