package twofold.picture;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import twofold.cavity.Cavity;
import twofold.design.Crystal;
import twofold.design.Design;
import twofold.design.Hold;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Point;
import twofold.layout.Leg;

/**
 * Names, incidences and leg lengths on the bench. Each label takes the cheapest of a few places round its part; one that
 * had to go far is tied to it by a line. What finds no place without covering other text is left out.
 */
final class BenchLabels {
    private static final double GAP = 7;
    private static final double LINE = 14;

    /** Distances from the part that are tried, px beyond the first. */
    private static final double[] RINGS = {0, 14, 30, 52, 80};

    /** Directions from "ahead" that are tried, degrees to the left: the sides, behind, in between, ahead. */
    private static final double[] TURNS = {90, 270, 180, 135, 225, 45, 315, 0};

    /** Shares of a leg at which its length may stand. */
    private static final double[] SHARES = {0.5, 0.38, 0.62, 0.28, 0.72, 0.2, 0.8};

    /** What it costs to stand nearer to another part, or behind other text. */
    private static final double ASTRAY = 20;

    /** What a length may cover along its leg before it goes elsewhere. */
    private static final double ALONG = 60;

    private static final Stroke LEADER = Stroke.of(Ink.QUIET, 1, Dash.DOTTED);

    private final Cavity cavity;
    private final List<Stand> stands;
    private final BenchBeam beam;
    private final BenchView view;
    private final Painter painter;
    private final Room room;
    private final Points points = new Points();
    private final Set<Place> heldLegs = new HashSet<>();
    private final Set<String> heldIncidences = new HashSet<>();

    BenchLabels(Cavity cavity, List<Stand> stands, BenchBeam beam, BenchView view, Painter painter, Room room) {
        this.cavity = cavity;
        this.stands = stands;
        this.beam = beam;
        this.view = view;
        this.painter = painter;
        this.room = room;
        for (Hold hold : design().holds()) {
            if (hold instanceof Hold.Leg leg) {
                heldLegs.add(leg.leg());
            } else if (hold instanceof Hold.Incidence incidence) {
                heldIncidences.add(incidence.mirror());
            }
        }
    }

    private Design design() {
        return cavity.laid().design();
    }

    /** All of them, names first. */
    void draw() {
        for (Stand s : stands) {
            double x = view.viewport().x(s.at().x());
            double y = view.viewport().y(s.at().y());
            if (x >= 0 && x <= view.width() && y >= 0 && y <= view.height()) {
                name(s);
            }
        }
        for (int leg = 0; leg < cavity.laid().legs().size(); leg++) {
            length(leg);
        }
    }

    private void name(Stand s) {
        Part part = design().parts().get(s.part());
        double incidence = cavity.laid().incidence().getOrDefault(s.part(), 0.0);
        String second = incidence > 0
                ? Figures.degrees(incidence) + " incidence" + (heldIncidences.contains(part.name()) ? ", held" : "")
                : "";
        double width = Math.max(Lettering.width(part.name(), Type.STRONG), Lettering.width(second, Type.SMALL));
        double height = second.isEmpty() ? LINE : 2 * LINE;
        Frame frame = s.frame(view.viewport());
        double best = Double.POSITIVE_INFINITY;
        double bestX = 0;
        double bestY = 0;
        double bestRing = 0;
        for (double ring : RINGS) {
            for (int i = 0; i < TURNS.length && best > ring; i++) {
                double turn = Math.toRadians(TURNS[i]);
                double ex = frame.ux() * Math.cos(turn) - frame.uy() * Math.sin(turn);
                double ey = -frame.uy() * Math.cos(turn) - frame.ux() * Math.sin(turn);
                double reach = reach(part, s, frame, ex, ey) + GAP + ring;
                double away = reach + Math.abs(ex) * width / 2 + Math.abs(ey) * height / 2;
                double x = frame.x() + ex * away;
                double y = frame.y() + ey * away;
                double cost = room.cost(x - width / 2 - 2, y - height / 2 - 1, width + 4, height + 2) + ring + i;
                if (cost < best
                        && (isNearerToAnother(s, frame, x, y) || room.crossesText(x, y, frame.x(), frame.y()))) {
                    cost += ASTRAY;
                }
                if (cost < best) {
                    best = cost;
                    bestX = x;
                    bestY = y;
                    bestRing = ring;
                }
            }
        }
        if (best > Room.TEXT) {
            return;
        }
        if (bestRing > RINGS[1]) {
            leader(bestX, bestY, width, height, frame.x(), frame.y());
        }
        veil(new Frame(bestX, bestY, 1, 0, 1), width / 2 + 2, height / 2);
        Ink ink = part instanceof Crystal ? Ink.CRYSTAL_EDGE : Ink.TEXT;
        double base = bestY - height / 2 + Lettering.capital(Type.STRONG) + (LINE - Lettering.capital(Type.STRONG)) / 2;
        painter.text(part.name(), bestX, base, Type.STRONG, ink, Anchor.MIDDLE);
        if (!second.isEmpty()) {
            painter.text(second, bestX, base + LINE, Type.SMALL, Ink.QUIET, Anchor.MIDDLE);
        }
        room.take(bestX - width / 2 - 3, bestY - height / 2 - 2, width + 6, height + 4, Room.TEXT);
    }

    /** Whether a label would stand nearer to another part than to its own. */
    private boolean isNearerToAnother(Stand own, Frame frame, double x, double y) {
        double mine = Math.hypot(frame.x() - x, frame.y() - y);
        for (Stand s : stands) {
            Frame other = s.frame(view.viewport());
            if (s.part() != own.part() && Math.hypot(other.x() - x, other.y() - y) < mine) {
                return true;
            }
        }
        return false;
    }

    /** How far a part and its mount reach in a direction on the pane, px. */
    private static double reach(Part part, Stand s, Frame frame, double ex, double ey) {
        double ahead = ex * frame.ux() - ey * frame.uy();
        double left = -ex * frame.uy() - ey * frame.ux();
        double back = part instanceof Mirror m ? m.mount().depth() : s.back();
        double half = part instanceof Mirror m ? m.mount().width() / 2 : s.half();
        return frame.scale() * ((ahead > 0 ? s.front() * ahead : -back * ahead) + half * Math.abs(left));
    }

    private void leader(double x, double y, double width, double height, double toX, double toY) {
        double dx = toX - x;
        double dy = toY - y;
        double share = Math.min(
                (width / 2 + 3) / Math.max(1e-9, Math.abs(dx)), (height / 2 + 2) / Math.max(1e-9, Math.abs(dy)));
        if (share < 1) {
            painter.line(x + share * dx, y + share * dy, toX, toY, LEADER);
            room.take(x + share * dx, y + share * dy, toX, toY, 0, 0, Room.TEXT);
        }
    }

    private void veil(Frame frame, double halfLength, double halfHeight) {
        points.clear();
        frame.add(points, -halfLength, -halfHeight);
        frame.add(points, halfLength, -halfHeight);
        frame.add(points, halfLength, halfHeight);
        frame.add(points, -halfLength, halfHeight);
        painter.polygon(points, Ink.PAPER, Pane.VEIL);
    }

    /** A leg's length, along it, beside the beam. */
    private void length(int number) {
        Leg leg = cavity.laid().legs().get(number);
        List<Part> parts = design().parts();
        String from = parts.get(leg.from()).name();
        String to = parts.get(leg.to()).name();
        boolean held = heldLegs.stream().anyMatch(p -> p.equals(Place.of(from, to)) || p.equals(Place.of(to, from)));
        String text = Figures.mm(leg.path()) + (held ? ", held" : "");
        double half = Lettering.width(text, Type.SMALL) / 2;
        double ux = leg.heading().x();
        double uy = leg.heading().y();
        if (ux < 0 || (ux == 0 && uy < 0)) {
            ux = -ux;
            uy = -uy;
        }
        double best = Double.POSITIVE_INFINITY;
        Frame place = new Frame(0, 0, ux, uy, 1);
        for (double share : SHARES) {
            Point at = leg.at(share * leg.path());
            double off = beam.halfWidth(number, share * leg.path()) + 11;
            for (int side = 1; side >= -1; side -= 2) {
                Frame middle = new Frame(
                        view.viewport().x(at.x()) - side * off * uy,
                        view.viewport().y(at.y()) - side * off * ux,
                        ux,
                        uy,
                        1);
                double cost = room.cost(middle, half + 2, LINE / 2) + Math.abs(share - 0.5) * 10;
                if (cost < best) {
                    best = cost;
                    place = middle;
                }
            }
        }
        double onScreen = leg.path() * view.viewport().scale();
        if (best > ALONG || 2 * half > onScreen * 0.95) {
            beside(leg, text, half);
            return;
        }
        veil(place, half + 2, LINE / 2 - 1);
        double down = Lettering.capital(Type.SMALL) / 2;
        painter.text(
                text,
                place.px(0, -down),
                place.py(0, -down),
                Type.SMALL,
                Ink.QUIET,
                Anchor.MIDDLE,
                Math.toDegrees(Math.atan2(-uy, ux)));
        room.take(place, half + 3, half + 3, LINE / 2 + 1, Room.TEXT);
    }

    /** A leg's length where there is room for it, tied to the leg's middle. */
    private void beside(Leg leg, String text, double half) {
        Point at = leg.at(leg.path() / 2);
        double toX = view.viewport().x(at.x());
        double toY = view.viewport().y(at.y());
        double best = Room.BODY;
        double bestX = Double.NaN;
        double bestY = 0;
        for (int ring = 0; ring < 4; ring++) {
            for (int turn = 0; turn < 12; turn++) {
                double angle = Math.PI / 2 + Math.PI / 6 * turn;
                double x = toX + Math.cos(angle) * (half + 34 + 26 * ring);
                double y = toY - Math.sin(angle) * (34 + 26 * ring);
                double cost = room.cost(x - half - 2, y - LINE / 2, 2 * half + 4, LINE) + ring;
                if (cost < best && room.crossesText(x, y, toX, toY)) {
                    cost += ASTRAY;
                }
                if (cost < best) {
                    best = cost;
                    bestX = x;
                    bestY = y;
                }
            }
        }
        if (Double.isNaN(bestX) || toX < 0 || toX > view.width() || toY < 0 || toY > view.height()) {
            return;
        }
        leader(bestX, bestY, 2 * half, LINE, toX, toY);
        veil(new Frame(bestX, bestY, 1, 0, 1), half + 2, LINE / 2 - 1);
        double base = bestY + Lettering.capital(Type.SMALL) / 2;
        painter.text(text, bestX, base, Type.SMALL, Ink.QUIET, Anchor.MIDDLE);
        room.take(bestX - half - 3, bestY - LINE / 2 - 1, 2 * half + 6, LINE + 2, Room.TEXT);
    }
}
