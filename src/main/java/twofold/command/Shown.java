package twofold.command;

import twofold.design.Unit;

/** Numbers as a person is shown them: lengths to 0.01 mm, angles to 0.01°, radii to 0.1 µm, half traces to 0.001. */
final class Shown {
    private Shown() {}

    static String millimetres(double metres) {
        return Table.fixed(Unit.MM.fromSi(metres), 2);
    }

    static String micrometres(double metres) {
        return Table.fixed(Unit.UM.fromSi(metres), 1);
    }

    static String degrees(double radians) {
        return Table.fixed(Unit.DEG.fromSi(radians), 2);
    }

    static String pure(double value) {
        return Table.fixed(value, 3);
    }
}
