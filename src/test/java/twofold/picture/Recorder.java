package twofold.picture;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.stream.Stream;

/** Remembers what was drawn, in the coordinates of the whole surface, with the pane that it was drawn in. */
final class Recorder implements Painter {
    /** What kind of mark a thing is. */
    enum Mark {
        LINE,
        AREA,
        IMAGE,
        TEXT
    }

    record Spot(double x, double y) {}

    /** A pane in the coordinates of the whole surface. */
    record Clip(double left, double top, double right, double bottom) {
        boolean holds(Spot p) {
            double slack = 1e-9;
            return p.x() >= left - slack && p.x() <= right + slack && p.y() >= top - slack && p.y() <= bottom + slack;
        }
    }

    /**
     * A thing that was drawn.
     *
     * @param points of a line or area; of a text the corners of its box, from baseline to capital height
     */
    record Thing(Mark mark, List<Spot> points, Stroke stroke, String text, Type type, Clip pane) {}

    private final List<Thing> things = new ArrayList<>();
    private final Deque<Clip> panes = new ArrayDeque<>();
    private Clip pane = new Clip(-1e9, -1e9, 1e9, 1e9);
    private double x;
    private double y;
    private final Deque<Spot> origins = new ArrayDeque<>();

    List<Thing> things() {
        return things;
    }

    List<String> texts() {
        return things.stream()
                .filter(t -> t.mark() == Mark.TEXT)
                .map(Thing::text)
                .toList();
    }

    /** Areas filled with an ink, an opacity given. */
    List<Thing> areas(Ink ink, double alpha) {
        return drawn(Mark.AREA)
                .filter(t -> t.stroke().ink() == ink && t.stroke().alpha() == alpha)
                .toList();
    }

    List<Thing> lines(Ink ink, Dash dash) {
        return drawn(Mark.LINE)
                .filter(t -> t.stroke().ink() == ink && t.stroke().dash() == dash)
                .toList();
    }

    Stream<Thing> drawn(Mark mark) {
        return things.stream().filter(t -> t.mark() == mark);
    }

    /** How many panes are open. */
    int depth() {
        return panes.size();
    }

    private void add(Mark mark, List<Spot> points, Stroke stroke, String text, Type type) {
        things.add(new Thing(mark, points, stroke, text, type, pane));
    }

    private List<Spot> spots(Points points) {
        List<Spot> spots = new ArrayList<>();
        for (int i = 0; i < points.size(); i++) {
            spots.add(new Spot(x + points.x(i), y + points.y(i)));
        }
        return spots;
    }

    @Override
    public void line(double x1, double y1, double x2, double y2, Stroke stroke) {
        add(Mark.LINE, List.of(new Spot(x + x1, y + y1), new Spot(x + x2, y + y2)), stroke, "", Type.SMALL);
    }

    @Override
    public void polyline(Points points, boolean closed, Stroke stroke) {
        add(Mark.LINE, spots(points), stroke, "", Type.SMALL);
    }

    @Override
    public void polygon(Points points, Ink ink, double alpha) {
        add(Mark.AREA, spots(points), new Stroke(ink, 0, Dash.SOLID, alpha), "", Type.SMALL);
    }

    @Override
    public void segments(Points points, Stroke stroke) {
        add(Mark.LINE, spots(points), stroke, "", Type.SMALL);
    }

    @Override
    public void dots(Points points, double side, Ink ink) {
        add(Mark.AREA, spots(points), new Stroke(ink, side, Dash.SOLID, 1), "", Type.SMALL);
    }

    @Override
    public void text(String text, double atX, double atY, Type type, Ink ink, Anchor anchor, double degrees) {
        double width = Lettering.width(text, type);
        double left = switch (anchor) {
            case START -> 0;
            case MIDDLE -> -width / 2;
            case END -> -width;
        };
        double up = -Lettering.capital(type);
        double cos = Math.cos(Math.toRadians(degrees));
        double sin = Math.sin(Math.toRadians(degrees));
        List<Spot> box = new ArrayList<>();
        for (double[] c : new double[][] {{left, 0}, {left + width, 0}, {left + width, up}, {left, up}}) {
            box.add(new Spot(x + atX + c[0] * cos - c[1] * sin, y + atY + c[0] * sin + c[1] * cos));
        }
        add(Mark.TEXT, box, Stroke.of(ink, 1), text, type);
    }

    @Override
    public void image(double left, double top, double width, double height, int columns, int rows, int[] argb) {
        List<Spot> corners = List.of(
                new Spot(x + left, y + top),
                new Spot(x + left + width, y + top),
                new Spot(x + left + width, y + top + height),
                new Spot(x + left, y + top + height));
        add(Mark.IMAGE, corners, Stroke.of(Ink.PAPER, 0), columns + " × " + rows, Type.SMALL);
    }

    @Override
    public void push(double left, double top, double width, double height) {
        panes.push(pane);
        origins.push(new Spot(x, y));
        x += left;
        y += top;
        pane = new Clip(
                Math.max(pane.left(), x),
                Math.max(pane.top(), y),
                Math.min(pane.right(), x + width),
                Math.min(pane.bottom(), y + height));
    }

    @Override
    public void pop() {
        pane = panes.pop();
        Spot origin = origins.pop();
        x = origin.x();
        y = origin.y();
    }
}
