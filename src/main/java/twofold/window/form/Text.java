package twofold.window.form;

import twofold.design.Entry;
import twofold.design.Field;
import twofold.design.Unit;

/**
 * A value as text.
 *
 * @param rounded for reading
 * @param full with nothing lost, as it can be typed
 */
public record Text(String rounded, String full) {
    /** No value. */
    public static final Text NONE = new Text("", "");

    /** The longest text of a pure number that is not rounded. */
    private static final int SHORT = 7;

    private static final int INDEX_DECIMALS = 5;

    /** More than this share of a value is not rounded away. */
    private static final double LITTLE = 0.005;

    /** A text that is shown as it is. */
    public static Text of(String full) {
        return new Text(full, full);
    }

    /** A number, rounded as everywhere, but never to nothing. */
    public static Text of(Unit unit, double si) {
        String full = unit.text(si);
        if (unit == Unit.ONE && full.length() <= SHORT) {
            return of(full);
        }
        String rounded = unit == Unit.ONE ? Unit.fixed(si, INDEX_DECIMALS) : unit.shown(si);
        boolean isLost = Math.abs(unit.toSi(Double.parseDouble(rounded)) - si) > LITTLE * Math.abs(si);
        return isLost ? of(full) : new Text(rounded, full);
    }

    /** A field's value. */
    public static Text of(Field field, Object value) {
        return value instanceof Double d && Double.isFinite(d) ? of(field.unit(), d) : of(Entry.text(field, value));
    }
}
