package twofold.file;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.IntStream;
import twofold.design.Along;
import twofold.design.FaceAngle;
import twofold.design.Field;
import twofold.design.FourNumbers;
import twofold.design.Mount;
import twofold.design.Names;
import twofold.design.Place;
import twofold.design.Point;
import twofold.design.Side;
import twofold.design.Subject;
import twofold.design.TiltPlane;
import twofold.design.Turn;
import twofold.design.TwoPowers;
import twofold.design.Unit;

/** Makes JSON values into the design's, in SI; what cannot be made is put on record and comes back empty. */
final class Convert {
    /** The word for the middle of a leg. */
    static final String MIDDLE = "middle";

    /** The word for Brewster's angle. */
    static final String BREWSTER = "brewster";

    private final Faults faults;

    Convert(Faults faults) {
        this.faults = faults;
    }

    private <T> Optional<T> refused(Subject where, Json value, String accepted) {
        faults.refuse(where, value, accepted);
        return Optional.empty();
    }

    /** A text of whole characters. */
    Optional<String> text(Subject where, Json value, String accepted) {
        if (!(value instanceof Json.Str s)) {
            return refused(where, value, accepted);
        }
        boolean whole = s.text().codePoints().noneMatch(c -> Character.getType(c) == Character.SURROGATE);
        return whole ? Optional.of(s.text()) : refused(where, value, "no half of a surrogate pair");
    }

    /** true or false. */
    Optional<Boolean> flag(Subject where, Json value) {
        return value instanceof Json.Bool b ? Optional.of(b.value()) : refused(where, value, "true or false");
    }

    /** A finite number, from a unit to SI. */
    Optional<Double> number(Subject where, Json value, Unit unit, String accepted) {
        if (!(value instanceof Json.Num n)) {
            return refused(where, value, accepted);
        }
        double si = unit.toSi(n.decimal());
        if (Double.isFinite(si)) {
            return Optional.of(si);
        }
        faults.add(where, value.at(), "found " + value.words() + ", which is too large", accepted);
        faults.markBroken(where);
        return Optional.empty();
    }

    /** As many finite numbers as units. */
    Optional<List<Double>> numbers(Subject where, Json value, String accepted, Unit... units) {
        if (!(value instanceof Json.Arr list)
                || (list.whole() && list.elements().size() != units.length)) {
            return refused(where, value, accepted);
        }
        List<Double> numbers = new ArrayList<>();
        for (int i = 0; i < Math.min(units.length, list.elements().size()); i++) {
            number(where.at(i), list.elements().get(i), units[i], "a number").ifPresent(numbers::add);
        }
        if (numbers.size() < units.length) {
            faults.markBroken(where);
            return Optional.empty();
        }
        return Optional.of(numbers);
    }

    /** One of some words. */
    <E> Optional<E> word(Subject where, Json value, E[] all, Function<E, String> word) {
        List<String> words = Arrays.stream(all).map(word).toList();
        String accepted = quoted(words);
        if (!(value instanceof Json.Str s)) {
            return refused(where, value, accepted);
        }
        int index = words.indexOf(s.text());
        if (index >= 0) {
            return Optional.of(all[index]);
        }
        faults.add(where, value.at(), "found " + value.words() + Names.hint(s.text(), words), accepted);
        faults.markBroken(where);
        return Optional.empty();
    }

    /** Words as messages offer them. */
    static String quoted(List<String> words) {
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < words.size(); i++) {
            text.append(i == 0 ? "" : i == words.size() - 1 ? " or " : ", ")
                    .append('"')
                    .append(words.get(i))
                    .append('"');
        }
        return text.toString();
    }

    /** A name, or a pair of them. */
    Optional<Place> place(Subject where, Json value, String accepted) {
        if (!(value instanceof Json.Arr)) {
            return text(where, value, accepted).map(Place::of);
        }
        return names(where, value, 2, accepted).map(n -> Place.of(n.get(0), n.get(1)));
    }

    /** A list of a given number of names. */
    Optional<List<String>> names(Subject where, Json value, int count, String accepted) {
        if (!(value instanceof Json.Arr list)
                || (list.whole() && list.elements().size() != count)) {
            return refused(where, value, accepted);
        }
        List<String> names = IntStream.range(0, Math.min(count, list.elements().size()))
                .boxed()
                .flatMap(i -> text(where.at(i), list.elements().get(i), "the name of a part").stream())
                .toList();
        if (names.size() < count) {
            faults.markBroken(where);
            return Optional.empty();
        }
        return Optional.of(names);
    }

    /** The value of a part's field, of the Java type of the field's form. */
    Optional<?> field(Subject where, Json value, Field field) {
        Unit unit = field.unit();
        String accepted = field.accepted();
        return switch (field.form()) {
            case NUMBER, POSITIVE, SIGNED -> number(where, value, unit, accepted);
            case POINT -> numbers(where, value, accepted, unit, unit).map(n -> new Point(n.get(0), n.get(1)));
            case MOUNT -> numbers(where, value, accepted, unit, unit).map(n -> new Mount(n.get(0), n.get(1)));
            case ALONG ->
                is(value, MIDDLE)
                        ? Optional.of(Along.MIDDLE)
                        : number(where, value, unit, accepted).map(Along::at);
            case FACE_ANGLE ->
                is(value, BREWSTER)
                        ? Optional.of(FaceAngle.BREWSTER)
                        : number(where, value, unit, accepted).map(FaceAngle::of);
            case POWERS ->
                value instanceof Json.Arr
                        ? numbers(where, value, accepted, unit, unit).map(n -> new TwoPowers(n.get(0), n.get(1)))
                        : number(where, value, unit, accepted).map(n -> new TwoPowers(n, n));
            case MATRIX ->
                numbers(where, value, accepted, Unit.ONE, Unit.MM, Unit.PER_MM, Unit.ONE)
                        .map(n -> new FourNumbers(n.get(0), n.get(1), n.get(2), n.get(3)));
            case TILT_PLANE -> word(where, value, TiltPlane.values(), TiltPlane::word);
            case SIDE -> word(where, value, Side.values(), Side::word);
            case TURN -> word(where, value, Turn.values(), Turn::word);
            case TEXT -> text(where, value, accepted);
        };
    }

    private static boolean is(Json value, String word) {
        return value instanceof Json.Str s && s.text().equals(word);
    }
}
