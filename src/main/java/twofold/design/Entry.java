package twofold.design;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Function;
import java.util.regex.Pattern;

/**
 * What a person typed into a field: a value in SI, or the reason why it is none. Numbers may carry a unit ("5 cm", "0.2 in",
 * "7°30'", "1e3 um") and are in the field's own unit without; they are read exactly and rounded once, so that "5 cm" and "50"
 * are the same double. A decimal comma is refused, for nobody can tell 2,500 from 2.5.
 *
 * @param value present exactly when there is no problem
 * @param problem what was found and what would be accepted
 * @param <T> the value's type; for a field, that of its form
 */
public record Entry<T>(Optional<T> value, Optional<Problem> problem) {
    private static final String FLAT = "flat";
    private static final List<String> FLATS = List.of(FLAT, "∞", "inf", "infinity");

    /** Bare numbers with nothing but spaces between. */
    private static final Pattern BARE = Pattern.compile("[-+−.\\deE]+( +[-+−.\\deE]+)+");

    private static final String MIDDLE = "middle";
    private static final String BREWSTER = "brewster";

    static <T> Entry<T> of(T value) {
        return new Entry<>(Optional.of(value), Optional.empty());
    }

    private static <T> Entry<T> refused(Subject where, String found, String accepted) {
        return new Entry<>(Optional.empty(), Optional.of(new Problem(where, found, accepted)));
    }

    private <R> Entry<R> then(Function<T, R> next) {
        return new Entry<>(value.map(next), problem);
    }

    /**
     * A number.
     *
     * @param where it belongs, for the problem
     * @param unit without another one behind it
     */
    public static Entry<Double> number(Subject where, String text, Unit unit) {
        return number(where, text, unit, "a number");
    }

    /**
     * A radius of curvature: a number, or flat, which is +∞.
     *
     * @param unit without another one behind it
     */
    public static Entry<Double> radius(Subject where, String text, Unit unit) {
        return isFlat(text) ? of(Double.POSITIVE_INFINITY) : number(where, text, unit, "a number or flat");
    }

    private static boolean isFlat(String text) {
        return FLATS.contains(text.strip().toLowerCase(Locale.ROOT));
    }

    private static Entry<Double> number(Subject where, String text, Unit unit, String accepted) {
        TypedNumber number = TypedNumber.read(text, unit);
        return number.si().isPresent()
                ? of(number.si().getAsDouble())
                : refused(where, number.found(), accepted + TypedNumber.units(unit));
    }

    /**
     * A field's value.
     *
     * @param where it belongs, for the problem
     * @param field whose limits it keeps
     */
    public static Entry<Object> field(Subject where, String text, Field field) {
        String bare = text.strip();
        String word = bare.toLowerCase(Locale.ROOT);
        return switch (field.form()) {
            case NUMBER, POSITIVE, SIGNED ->
                field == Field.ROC && isFlat(word)
                        ? of(Double.POSITIVE_INFINITY)
                        : limited(where, bare, field).then(n -> n);
            case POINT -> numbers(where, bare, field, 2).then(n -> new Point(n.get(0), n.get(1)));
            case MOUNT -> numbers(where, bare, field, 2).then(n -> new Mount(n.get(0), n.get(1)));
            case ALONG ->
                word.equals(MIDDLE)
                        ? of(Along.MIDDLE)
                        : limited(where, bare, field).then(Along::at);
            case FACE_ANGLE ->
                word.equals(BREWSTER)
                        ? of(FaceAngle.BREWSTER)
                        : limited(where, bare, field).then(FaceAngle::of);
            case POWERS ->
                split(bare).size() == 1
                        ? limited(where, bare, field).then(n -> new TwoPowers(n, n))
                        : numbers(where, bare, field, 2).then(n -> new TwoPowers(n.get(0), n.get(1)));
            case MATRIX ->
                numbers(where, bare, field, 4).then(n -> new FourNumbers(n.get(0), n.get(1), n.get(2), n.get(3)));
            case TILT_PLANE -> word(where, bare, field, TiltPlane.values(), TiltPlane::word);
            case SIDE -> word(where, bare, field, Side.values(), Side::word);
            case TURN -> word(where, bare, field, Turn.values(), Turn::word);
            case TEXT -> bare.isEmpty() ? refused(where, "found nothing", field.accepted()) : of(bare);
        };
    }

    private static Entry<Double> limited(Subject where, String text, Field field) {
        return limited(where, text, field, field.unit(), text);
    }

    private static Entry<Double> limited(Subject where, String text, Field field, Unit unit, String whole) {
        Entry<Double> number = number(where, text, unit, field.accepted());
        return number.value().filter(n -> !field.accepts(n)).isPresent()
                ? refused(where, "found " + Names.shown(whole), field.accepted() + TypedNumber.units(unit))
                : number;
    }

    /** Several numbers; of four, the ray matrix's units in turn. */
    private static Entry<List<Double>> numbers(Subject where, String text, Field field, int count) {
        List<String> texts = split(text);
        if (texts.size() != count) {
            return refused(where, TypedNumber.quoted(text), field.accepted() + ", with commas or semicolons between");
        }
        List<Unit> units = field.form() == Field.Form.MATRIX
                ? List.of(Unit.ONE, Unit.MM, Unit.PER_MM, Unit.ONE)
                : List.of(field.unit(), field.unit());
        List<Double> numbers = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            Entry<Double> number = limited(where.at(i), texts.get(i), field, units.get(i), texts.get(i));
            if (number.value().isEmpty()) {
                return new Entry<>(Optional.empty(), number.problem());
            }
            numbers.add(number.value().get());
        }
        return of(numbers);
    }

    /** A list's elements: between semicolons, else commas, crosses, or spaces between bare numbers; brackets may stand round it. */
    private static List<String> split(String text) {
        String bare =
                text.replaceFirst("^[\\[(]", "").replaceFirst("[\\])]$", "").strip();
        String by = ";";
        if (!bare.contains(";")) {
            by = bare.contains(",")
                    ? ","
                    : bare.contains("×") ? "×" : BARE.matcher(bare).matches() ? " +" : " *x *";
        }
        return Arrays.stream(bare.split(by, -1)).map(String::strip).toList();
    }

    private static <E> Entry<Object> word(Subject where, String text, Field field, E[] all, Function<E, String> word) {
        return Arrays.stream(all)
                .filter(e -> word.apply(e).equalsIgnoreCase(text))
                .findFirst()
                .map(e -> Entry.<Object>of(e))
                .orElseGet(() -> refused(
                        where,
                        TypedNumber.quoted(text)
                                + Names.hint(text, Arrays.stream(all).map(word).toList()),
                        field.accepted()));
    }

    /** A field's value as a person would type it, with nothing lost: {@link #field} reads it back to the same. */
    public static String text(Field field, Object value) {
        Unit unit = field.unit();
        if (value instanceof Double d) {
            return Double.isInfinite(d) ? FLAT : unit.text(d);
        } else if (value instanceof Point p) {
            return unit.text(p.x()) + ", " + unit.text(p.y());
        } else if (value instanceof Mount m) {
            return unit.text(m.width()) + ", " + unit.text(m.depth());
        } else if (value instanceof Along a) {
            return a.inMiddle() ? MIDDLE : unit.text(a.path());
        } else if (value instanceof FaceAngle f) {
            return f.atBrewster() ? BREWSTER : unit.text(f.incidence());
        } else if (value instanceof TwoPowers p) {
            return p.tangential() == p.sagittal()
                    ? unit.text(p.tangential())
                    : unit.text(p.tangential()) + ", " + unit.text(p.sagittal());
        } else if (value instanceof FourNumbers m) {
            return Unit.ONE.text(m.a()) + ", " + Unit.MM.text(m.b()) + ", " + Unit.PER_MM.text(m.c()) + ", "
                    + Unit.ONE.text(m.d());
        } else if (value instanceof TiltPlane t) {
            return t.word();
        } else if (value instanceof Side s) {
            return s.word();
        } else if (value instanceof Turn t) {
            return t.word();
        }
        return value.toString();
    }
}
