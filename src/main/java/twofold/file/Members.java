package twofold.file;

import java.util.Collection;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import twofold.design.Names;
import twofold.design.Subject;

/** One object of the document while it is read: hands out its values, reports what is missing and what is unknown. */
final class Members {
    private static final Pattern PLAIN = Pattern.compile("[A-Za-z_][A-Za-z0-9_]{0,60}");

    private final Subject where;
    private final Json.Obj object;
    private final Faults faults;

    Members(Subject where, Json.Obj object, Faults faults) {
        this.where = where;
        this.object = object;
        this.faults = faults;
    }

    /** The path of a key, which in brackets and quotes may be any text. */
    static Subject at(Subject object, String key) {
        return object.at(PLAIN.matcher(key).matches() ? key : "[\"" + Names.shown(key) + "\"]");
    }

    /** The path of this object. */
    Subject where() {
        return where;
    }

    /** Where this object begins. */
    Mark begin() {
        return object.at();
    }

    /** Whether a key is there. */
    boolean has(String key) {
        return object.members().containsKey(key);
    }

    /** Which of some keys are there, in the object's order. */
    List<String> among(Collection<String> keys) {
        return object.members().keySet().stream().filter(keys::contains).toList();
    }

    /** The value under a key. */
    Optional<Json> find(String key) {
        return Optional.ofNullable(object.members().get(key)).map(Json.Member::value);
    }

    /** The value under a key that must be there. */
    Optional<Json> need(String key, String accepted) {
        Optional<Json> value = find(key);
        if (value.isEmpty()) {
            missing(key, accepted);
        }
        return value;
    }

    /** Reports a key that must be there and is not. */
    void missing(String key, String accepted) {
        if (object.whole()) {
            faults.add(where.at(key), object.at(), "missing", accepted);
        }
        faults.markBroken(where.at(key));
    }

    /** Reports that something is lacking of which no single key is to blame. */
    void lacking(String found, String accepted) {
        if (object.whole()) {
            faults.add(where, object.at(), found, accepted);
        }
    }

    /** Reports a key that should not be there. */
    void misplaced(String key, String found, String accepted) {
        Json.Member member = object.members().get(key);
        faults.add(where.at(key), member == null ? object.at() : member.keyAt(), found, accepted);
        faults.markBroken(where.at(key));
    }

    /** Reports every key that is none of the known ones. */
    void refuseUnknown(String what, Collection<String> known) {
        object.members().forEach((key, member) -> {
            if (known.contains(key)) {
                return;
            }
            faults.add(
                    at(where, key),
                    member.keyAt(),
                    "found \"" + Names.shown(key) + "\", which " + what + " does not have" + Names.hint(key, known),
                    String.join(", ", known));
            // What was meant is not absent, so that nothing may be concluded from its absence.
            Optional<String> nearest = Names.nearest(key, known);
            known.stream()
                    .filter(k -> !has(k) && (nearest.isEmpty() || nearest.get().equals(k)))
                    .forEach(k -> faults.markBroken(where.at(k)));
        });
    }

    /** Names in a row: keys of an object, and more. */
    static List<String> keys(List<String> first, Stream<String> more) {
        return Stream.concat(first.stream(), more).toList();
    }
}
