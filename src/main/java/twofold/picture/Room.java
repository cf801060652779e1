package twofold.picture;

/**
 * What is taken on a pane, in square cells: lets labels find a free place by looking, cheaply enough for every mouse move.
 * Each cell holds the dearest thing that covers it.
 */
final class Room {
    /** Side of a cell, px. */
    private static final double CELL = 4;

    /** What it costs to cover a cell of a mount. */
    static final byte MOUNT = 1;

    /** Of a beam. */
    static final byte BEAM = 2;

    /** Of a part's body. */
    static final byte BODY = 12;

    /** Of other text. */
    static final byte TEXT = 120;

    private final int columns;
    private final int rows;
    private final byte[] taken;

    Room(double width, double height) {
        columns = Math.max(1, (int) (width / CELL));
        rows = Math.max(1, (int) (height / CELL));
        taken = new byte[columns * rows];
    }

    /** Takes a rectangle in a frame, from behind to ahead and to either side. */
    void take(Frame frame, double back, double front, double half, byte what) {
        double step = CELL / 2 / frame.scale();
        int along = steps((front + back) / step);
        int across = steps(2 * half / step);
        for (int i = 0; i <= along; i++) {
            for (int j = 0; j <= across; j++) {
                double a = -back + (front + back) * i / along;
                double l = half * (2.0 * j / across - 1);
                mark(frame.px(a, l), frame.py(a, l), what);
            }
        }
    }

    /** Takes a strip along a straight line, half so wide at its begin and end. */
    void take(double x1, double y1, double x2, double y2, double half1, double half2, byte what) {
        double length = Math.hypot(x2 - x1, y2 - y1);
        int along = steps(length / CELL);
        double nx = length > 0 ? (y2 - y1) / length : 0;
        double ny = length > 0 ? (x1 - x2) / length : 0;
        for (int i = 0; i <= along; i++) {
            double share = (double) i / along;
            double half = half1 + share * (half2 - half1);
            int across = steps(2 * half / CELL);
            for (int j = 0; j <= across; j++) {
                double off = half * (2.0 * j / across - 1);
                mark(x1 + share * (x2 - x1) + off * nx, y1 + share * (y2 - y1) + off * ny, what);
            }
        }
    }

    /** Takes an upright rectangle. */
    void take(double left, double top, double width, double height, byte what) {
        int firstColumn = Math.max(0, (int) (left / CELL));
        int lastColumn = Math.min(columns - 1, (int) ((left + width) / CELL));
        for (int row = Math.max(0, (int) (top / CELL)); row <= (int) ((top + height) / CELL) && row < rows; row++) {
            for (int column = firstColumn; column <= lastColumn; column++) {
                int cell = row * columns + column;
                taken[cell] = (byte) Math.max(taken[cell], what);
            }
        }
    }

    private static int steps(double count) {
        // Far beyond any pane: what is larger is seen in part only, and a coarse mark does.
        return (int) Math.min(400, Math.max(1, Math.ceil(count)));
    }

    private void mark(double x, double y, byte what) {
        int column = (int) Math.floor(x / CELL);
        int row = (int) Math.floor(y / CELL);
        if (column >= 0 && column < columns && row >= 0 && row < rows) {
            int cell = row * columns + column;
            taken[cell] = (byte) Math.max(taken[cell], what);
        }
    }

    /** The sum of what an upright rectangle would cover; infinite where it leaves the pane. */
    double cost(double left, double top, double width, double height) {
        int firstColumn = (int) Math.floor(left / CELL);
        int lastColumn = (int) Math.floor((left + width) / CELL);
        int firstRow = (int) Math.floor(top / CELL);
        int lastRow = (int) Math.floor((top + height) / CELL);
        if (firstColumn < 0 || lastColumn >= columns || firstRow < 0 || lastRow >= rows) {
            return Double.POSITIVE_INFINITY;
        }
        double sum = 0;
        for (int row = firstRow; row <= lastRow; row++) {
            for (int column = firstColumn; column <= lastColumn; column++) {
                sum += taken[row * columns + column];
            }
        }
        return sum;
    }

    /** As {@link #cost(double, double, double, double)} for a rectangle turned about its middle, in its own frame. */
    double cost(Frame middle, double halfLength, double halfHeight) {
        int along = steps(2 * halfLength / CELL);
        int across = steps(2 * halfHeight / CELL);
        double sum = 0;
        for (int i = 0; i <= along; i++) {
            for (int j = 0; j <= across; j++) {
                double a = halfLength * (2.0 * i / along - 1);
                double l = halfHeight * (2.0 * j / across - 1);
                int column = (int) Math.floor(middle.px(a, l) / CELL);
                int row = (int) Math.floor(middle.py(a, l) / CELL);
                if (column < 0 || column >= columns || row < 0 || row >= rows) {
                    return Double.POSITIVE_INFINITY;
                }
                sum += taken[row * columns + column];
            }
        }
        return sum;
    }

    /** Whether a straight line runs across text. */
    boolean crossesText(double x1, double y1, double x2, double y2) {
        int along = steps(Math.hypot(x2 - x1, y2 - y1) / CELL);
        for (int i = 0; i <= along; i++) {
            double share = (double) i / along;
            int column = (int) Math.floor((x1 + share * (x2 - x1)) / CELL);
            int row = (int) Math.floor((y1 + share * (y2 - y1)) / CELL);
            if (column >= 0 && column < columns && row >= 0 && row < rows && taken[row * columns + column] == TEXT) {
                return true;
            }
        }
        return false;
    }
}
