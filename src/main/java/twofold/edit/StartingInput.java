package twofold.edit;

import java.util.OptionalDouble;
import twofold.design.Design;
import twofold.design.Entry;
import twofold.design.Subject;
import twofold.design.Unit;

/**
 * Every number that a {@link StartingShape} starts from: its words, unit, limits, default and meaning. A form that asks for
 * them, and what it says of a value that is refused, come from here.
 */
public enum StartingInput {
    /** Vacuum wavelength. */
    WAVELENGTH("wavelength", Unit.NM, Form.NUMBER, Design.SHORTEST_WAVE, Design.LONGEST_WAVE, 1064e-9, "in vacuum"),
    /** Radius of the first end mirror. */
    END_A("radius of End A", Unit.MM, Form.RADIUS, 5e-3, 100, Limits.FLAT, "concave, flat, or negative convex"),
    /** Radius of the last end mirror. */
    END_B("radius of End B", Unit.MM, Form.RADIUS, 5e-3, 100, Limits.FLAT, "concave, flat, or negative convex"),
    /** Radius of the only fold mirror. */
    FOLD("radius of Fold", Unit.MM, Form.NUMBER, 5e-3, 10, 0.2, "concave"),
    /** Radius of the first fold mirror. */
    FOLD_1("radius of Fold 1", Unit.MM, Form.NUMBER, 5e-3, 10, 0.1, "concave"),
    /** Radius of the second fold mirror. */
    FOLD_2("radius of Fold 2", Unit.MM, Form.NUMBER, 5e-3, 10, 0.1, "concave"),
    /** Radius of a bow-tie's first curved mirror. */
    CURVED_1("radius of Curved 1", Unit.MM, Form.NUMBER, 5e-3, 10, 0.1, "concave"),
    /** Radius of a bow-tie's second curved mirror. */
    CURVED_2("radius of Curved 2", Unit.MM, Form.NUMBER, 5e-3, 10, 0.1, "concave"),
    /** Radius of a triangle's curved mirror. */
    APEX("radius of Apex", Unit.MM, Form.NUMBER, 5e-3, 100, 0.5, "concave"),
    /** Length of a cavity of two mirrors. */
    LENGTH("length", Unit.MM, Form.OPTIONAL, 1e-3, 100, Double.NaN, "End A to End B; empty: the middle of the zone"),
    /** The arm of a V that does not hold the focus. */
    ARM("long arm", Unit.MM, Form.NUMBER, 5e-3, 10, 0.4, "End A to Fold; the short arm follows"),
    /** First arm of a Z or X. */
    ARM_1("first arm", Unit.MM, Form.NUMBER, 5e-3, 10, 0.5, "End A to Fold 1"),
    /** Last arm of a Z or X. */
    ARM_2("second arm", Unit.MM, Form.NUMBER, 5e-3, 10, 0.7, "Fold 2 to End B"),
    /** Path of a bow-tie. */
    ROUND_TRIP("round trip", Unit.MM, Form.NUMBER, 20e-3, 20, 0.54, "path once round, insides of parts included"),
    /** Path of a triangle. */
    PERIMETER(
            "round trip",
            Unit.MM,
            Form.OPTIONAL,
            5e-3,
            100,
            Double.NaN,
            "path once round; empty: the middle of the zone"),
    /** The side of a triangle that faces its curved mirror. */
    BASE("base", Unit.MM, Form.NUMBER, 5e-3, 10, 0.04, "Entrance to Exit"),
    /** Incidence on the folds. */
    INCIDENCE(
            "incidence",
            Unit.DEG,
            Form.NUMBER,
            Unit.DEG.toSi(1.0),
            Unit.DEG.toSi(45.0),
            Unit.DEG.toSi(8.0),
            "on each fold; with a crystal at Brewster's angle it follows"),
    /** Path inside the crystal. */
    CRYSTAL_LENGTH("crystal length", Unit.MM, Form.NUMBER, 0.1e-3, 1, 5e-3, "path inside along the beam");

    /** What a value looks like. */
    public enum Form {
        /** A number within the limits. */
        NUMBER,
        /** A number within the limits, or nothing. */
        OPTIONAL,
        /** A size within the limits of either sign, or flat: +∞. */
        RADIUS
    }

    /** Values that several inputs share. */
    private static final class Limits {
        static final double FLAT = Double.POSITIVE_INFINITY;
    }

    private final String words;
    private final Unit unit;
    private final Form form;
    private final double least;
    private final double most;
    private final double usual;
    private final String doc;

    StartingInput(String words, Unit unit, Form form, double least, double most, double usual, String doc) {
        this.words = words;
        this.unit = unit;
        this.form = form;
        this.least = least;
        this.most = most;
        this.usual = usual;
        this.doc = doc;
    }

    /** What it is called. */
    public String words() {
        return words;
    }

    /** The unit in which a person reads it. */
    public Unit unit() {
        return unit;
    }

    /** What a value looks like. */
    public Form form() {
        return form;
    }

    /** The smallest value, of a radius the smallest size, in SI. */
    public double least() {
        return least;
    }

    /** The largest value, of a radius the largest size, in SI. */
    public double most() {
        return most;
    }

    /** What stands there unless a shape has a value of its own, in SI; empty where nothing does. */
    public OptionalDouble usual() {
        return Double.isNaN(usual) ? OptionalDouble.empty() : OptionalDouble.of(usual);
    }

    /** What it means, in a few words. */
    public String doc() {
        return doc;
    }

    /** Whether a number may stand here. */
    public boolean accepts(double si) {
        return switch (form) {
            case NUMBER, OPTIONAL -> si >= least && si <= most;
            case RADIUS -> si == Limits.FLAT || (Math.abs(si) >= least && Math.abs(si) <= most);
        };
    }

    /** What may stand here, in words, in its unit. */
    public String accepted() {
        String range = "from " + unit.text(least) + " to " + unit.text(most) + unitWord();
        return switch (form) {
            case NUMBER -> range;
            case OPTIONAL -> range + ", or nothing";
            case RADIUS -> range + ", the same negative, or flat";
        };
    }

    /** A typed number, with or without a unit; a radius may be flat: +∞. Its limits are for {@link #accepts}. */
    public Entry<Double> read(String text) {
        Subject where = Subject.DOCUMENT.at(words);
        return form == Form.RADIUS ? Entry.radius(where, text, unit) : Entry.number(where, text, unit);
    }

    /** A value as a person reads it: "104.21 mm", "flat". */
    public String shown(double si) {
        return Double.isInfinite(si) ? "flat" : unit.shown(si) + unitWord();
    }

    private String unitWord() {
        return unit == Unit.DEG ? unit.symbol() : " " + unit.symbol();
    }
}
