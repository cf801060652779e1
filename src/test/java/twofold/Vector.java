package twofold;

import twofold.design.Point;

/** A direction or place in space: x and y on the table, z up. */
record Vector(double x, double y, double z) {
    static final Vector UP = new Vector(0, 0, 1);

    static Vector of(Point point, double height) {
        return new Vector(point.x(), point.y(), height);
    }

    Vector plus(double times, Vector other) {
        return new Vector(x + times * other.x, y + times * other.y, z + times * other.z);
    }

    Vector minus(Vector other) {
        return plus(-1, other);
    }

    double dot(Vector other) {
        return x * other.x + y * other.y + z * other.z;
    }

    double length() {
        return Math.sqrt(dot(this));
    }

    Vector unit() {
        double length = length();
        return new Vector(x / length, y / length, z / length);
    }

    /** To the left of this horizontal direction, seen from above. */
    Vector left() {
        return new Vector(-y, x, 0);
    }

    /** Mirrored in a plane with a unit normal. */
    Vector mirrored(Vector normal) {
        return plus(-2 * dot(normal), normal);
    }
}
