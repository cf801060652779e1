package twofold.file;

import java.math.BigDecimal;
import java.util.List;
import java.util.Map;
import twofold.design.Names;

/** A JSON value that knows its place. Numbers keep their decimal, and the text they were written as. */
sealed interface Json {
    /** Where the value begins. */
    Mark at();

    /** What it is, for "found …": "the text "abc"". */
    String words();

    /**
     * An object.
     *
     * @param members by key, in order; of a key that comes twice, the first
     * @param whole whether its end was reached
     */
    record Obj(Mark at, Map<String, Member> members, boolean whole) implements Json {
        @Override
        public String words() {
            return "an object";
        }
    }

    /** A key with its place, and its value. */
    record Member(Mark keyAt, Json value) {}

    /**
     * A list.
     *
     * @param whole whether its end was reached
     */
    record Arr(Mark at, List<Json> elements, boolean whole) implements Json {
        @Override
        public String words() {
            return elements.isEmpty() ? "an empty list" : "a list of " + elements.size();
        }
    }

    /** A text. */
    record Str(Mark at, String text) implements Json {
        @Override
        public String words() {
            return "\"" + Names.shown(text) + "\"";
        }
    }

    /** A number within {@link JsonText}'s limits. */
    record Num(Mark at, BigDecimal decimal, String text) implements Json {
        @Override
        public String words() {
            return Names.shown(text);
        }
    }

    /** true or false. */
    record Bool(Mark at, boolean value) implements Json {
        @Override
        public String words() {
            return Boolean.toString(value);
        }
    }

    /** null. */
    record Null(Mark at) implements Json {
        @Override
        public String words() {
            return "null";
        }
    }

    /** A value that was refused when the text was parsed, as NaN is; its problem is on record. */
    record Refused(Mark at) implements Json {
        @Override
        public String words() {
            return "a refused value";
        }
    }
}
