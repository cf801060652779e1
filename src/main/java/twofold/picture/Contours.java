package twofold.picture;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * Lines of equal value through a grid, by marching squares: along each side of a square of four neighbours the value is
 * taken as linear, and where two lines could be joined in two ways, the mean of the four decides. A square with an undefined
 * corner has no line, nor has one that is thinner than anybody sees: it is the border of two bands of a list.
 */
final class Contours {
    /** What is thinner is no square but a border, px. */
    private static final double THIN = 1e-3;

    private final int columns;
    private final int rows;
    private final double[] xs;
    private final double[] ys;
    private final double[] values;

    /**
     * A grid.
     *
     * @param xs px of the columns
     * @param ys px of the rows
     * @param values row by row; NaN where undefined
     */
    Contours(double[] xs, double[] ys, double[] values) {
        this.columns = xs.length;
        this.rows = ys.length;
        this.xs = xs;
        this.ys = ys;
        this.values = values;
    }

    /** The lines of a value, px; a closed one ends where it begins. */
    List<Points> at(double level) {
        return at(level, false);
    }

    /** The same, along the borders of bands too: the outline of where values are above or below one. */
    List<Points> outline(double level) {
        return at(level, true);
    }

    private List<Points> at(double level, boolean withBorders) {
        // By the side of a square that a line crosses: the one or two sides that it goes on to.
        Map<Integer, int[]> next = new HashMap<>();
        for (int row = 0; row + 1 < rows; row++) {
            for (int column = 0; column + 1 < columns; column++) {
                boolean isBorder =
                        Math.abs(xs[column + 1] - xs[column]) < THIN || Math.abs(ys[row + 1] - ys[row]) < THIN;
                if (withBorders || !isBorder) {
                    square(row, column, level, next);
                }
            }
        }
        List<Points> lines = new ArrayList<>();
        List<Integer> sides = new ArrayList<>(next.keySet());
        sides.sort(null);
        for (int side : sides) {
            if (next.containsKey(side)) {
                lines.add(follow(side, level, next));
            }
        }
        return lines;
    }

    /** Sides are numbered 2 × (corner at their begin), one more for those along y. */
    private void square(int row, int column, double level, Map<Integer, int[]> next) {
        int corner = row * columns + column;
        double a = values[corner];
        double b = values[corner + 1];
        double c = values[corner + columns + 1];
        double d = values[corner + columns];
        if (Double.isNaN(a + b + c + d)) {
            return;
        }
        int low = 2 * corner;
        int right = 2 * (corner + 1) + 1;
        int high = 2 * (corner + columns);
        int left = 2 * corner + 1;
        int which = (a >= level ? 1 : 0) | (b >= level ? 2 : 0) | (c >= level ? 4 : 0) | (d >= level ? 8 : 0);
        boolean middle = (a + b + c + d) / 4 >= level;
        switch (which) {
            case 1, 14 -> join(low, left, next);
            case 2, 13 -> join(low, right, next);
            case 4, 11 -> join(right, high, next);
            case 8, 7 -> join(high, left, next);
            case 3, 12 -> join(left, right, next);
            case 6, 9 -> join(low, high, next);
            case 5 -> {
                join(low, middle ? right : left, next);
                join(middle ? left : right, high, next);
            }
            case 10 -> {
                join(low, middle ? left : right, next);
                join(middle ? right : left, high, next);
            }
            default -> {}
        }
    }

    private static void join(int one, int other, Map<Integer, int[]> next) {
        add(one, other, next);
        add(other, one, next);
    }

    private static void add(int from, int to, Map<Integer, int[]> next) {
        int[] ways = next.computeIfAbsent(from, s -> new int[] {-1, -1});
        ways[ways[0] < 0 ? 0 : 1] = to;
    }

    private Points follow(int side, double level, Map<Integer, int[]> next) {
        int[] ways = next.get(side);
        if (ways == null) {
            throw new IllegalArgumentException("no line crosses side " + side);
        }
        next.remove(side);
        Deque<Integer> line = new ArrayDeque<>();
        line.add(side);
        boolean closed = walk(ways[0], side, line, true, next);
        if (!closed && ways[1] >= 0) {
            walk(ways[1], side, line, false, next);
        }
        Points points = new Points();
        for (int s : line) {
            add(points, s, level);
        }
        return points;
    }

    /** Goes on from a side until the line ends; returns whether it came back to its first side. */
    private static boolean walk(int start, int first, Deque<Integer> line, boolean ahead, Map<Integer, int[]> next) {
        int before = first;
        int here = start;
        while (true) {
            int[] ways = next.remove(here);
            if (ahead) {
                line.addLast(here);
            } else {
                line.addFirst(here);
            }
            if (ways == null) {
                return here == first;
            }
            int after = ways[0] == before ? ways[1] : ways[0];
            if (after < 0) {
                return false;
            }
            before = here;
            here = after;
        }
    }

    private void add(Points points, int side, double level) {
        int corner = side / 2;
        int column = corner % columns;
        int row = corner / columns;
        boolean upright = (side & 1) == 1;
        double from = values[corner];
        double to = values[upright ? corner + columns : corner + 1];
        double share = (level - from) / (to - from);
        points.add(
                upright ? xs[column] : xs[column] + share * (xs[column + 1] - xs[column]),
                upright ? ys[row] + share * (ys[row + 1] - ys[row]) : ys[row]);
    }
}
