package twofold.file;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonStreamContext;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.json.JsonReadFeature;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import twofold.design.Subject;

/**
 * Parses a JSON text (RFC 8259) into {@link Json}. Duplicate keys and numbers that are none (NaN, Infinity) are put on
 * record and parsing goes on; a fault of syntax is put on record and ends it, and what was read until there is handed
 * over.
 */
final class JsonText {
    /** Deepest nesting; a design needs five. */
    static final int DEEPEST = 100;

    /** Longest number, in characters. */
    static final int LONGEST_NUMBER = 1000;

    /** Largest power of ten, and its inverse the smallest, that a number may be written with. */
    static final int LARGEST_EXPONENT = 9999;

    private static final JsonFactory FACTORY = JsonFactory.builder()
            .enable(JsonReadFeature.ALLOW_NON_NUMERIC_NUMBERS)
            .streamReadConstraints(StreamReadConstraints.builder()
                    .maxNestingDepth(DEEPEST)
                    .maxNumberLength(LONGEST_NUMBER)
                    .maxNameLength(Integer.MAX_VALUE)
                    .maxStringLength(Integer.MAX_VALUE)
                    .build())
            .build();

    private final String text;
    private final Faults faults;
    private final Marks marks;
    private final JsonParser parser;
    private boolean stopped;

    private JsonText(String text, Faults faults, JsonParser parser) {
        this.text = text;
        this.faults = faults;
        this.marks = new Marks(text);
        this.parser = parser;
    }

    /**
     * The value of a text, as far as it parses; empty if not even its beginning does.
     *
     * @param text without byte order mark
     * @param faults takes the problems
     */
    static Optional<Json> parse(String text, Faults faults) {
        try (JsonParser parser = FACTORY.createParser(text.toCharArray())) {
            return new JsonText(text, faults, parser).document();
        } catch (IOException e) {
            throw new UncheckedIOException("reading from memory failed", e);
        }
    }

    private Optional<Json> document() throws IOException {
        JsonToken first = next();
        if (first == null) {
            if (!stopped) {
                faults.add(Subject.DOCUMENT, Mark.START, "found an empty file", "an object in braces");
            }
            return Optional.empty();
        }
        Json root = value(first);
        JsonToken more = next();
        if (more != null) {
            faults.add(Subject.DOCUMENT, here(), "found more after the end of the document", "nothing after it");
        }
        return Optional.of(root);
    }

    private @Nullable JsonToken next() throws IOException {
        if (stopped) {
            return null;
        }
        try {
            JsonToken token = parser.nextToken();
            if (token == JsonToken.VALUE_STRING) {
                // Texts are parsed when asked for; a fault inside belongs here.
                parser.finishToken();
            }
            return token;
        } catch (JsonProcessingException e) {
            stopped = true;
            SyntaxFault fault = SyntaxFault.of(e, parser, text);
            faults.add(where(parser.getParsingContext()), marks.at(fault.offset()), fault.found(), fault.accepted());
            return null;
        }
    }

    private Mark here() {
        return marks.at(parser.currentTokenLocation().getCharOffset());
    }

    private Json value(JsonToken token) throws IOException {
        Mark at = here();
        return switch (token) {
            case START_OBJECT -> object(at);
            case START_ARRAY -> list(at);
            case VALUE_STRING -> new Json.Str(at, parser.getText());
            case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> number(at, parser.getText());
            case VALUE_TRUE -> new Json.Bool(at, true);
            case VALUE_FALSE -> new Json.Bool(at, false);
            case VALUE_NULL -> new Json.Null(at);
            default -> throw new IllegalStateException("no value begins with " + token);
        };
    }

    private Json object(Mark at) throws IOException {
        Map<String, Json.Member> members = new LinkedHashMap<>();
        JsonToken token = next();
        while (token == JsonToken.FIELD_NAME) {
            String key = parser.currentName();
            Mark keyAt = here();
            token = next();
            if (token == null) {
                break;
            }
            Json.Member member = new Json.Member(keyAt, value(token));
            if (members.putIfAbsent(key, member) != null) {
                faults.add(
                        Members.at(where(parser.getParsingContext()), key),
                        keyAt,
                        "found the key a second time",
                        "each key once");
            }
            token = next();
        }
        return new Json.Obj(at, members, token != null);
    }

    private Json list(Mark at) throws IOException {
        List<Json> elements = new ArrayList<>();
        JsonToken token = next();
        while (token != null && token != JsonToken.END_ARRAY) {
            elements.add(value(token));
            token = next();
        }
        return new Json.Arr(at, elements, token != null);
    }

    private Json number(Mark at, String digits) {
        String problem = null;
        if (!Character.isDigit(digits.charAt(digits.length() - 1))) {
            problem = "a finite number";
        } else if (!hasSaneExponent(digits)) {
            problem = "a number with an exponent from -" + LARGEST_EXPONENT + " to " + LARGEST_EXPONENT;
        }
        if (problem == null) {
            return new Json.Num(at, new BigDecimal(digits), digits);
        }
        JsonStreamContext context = parser.getParsingContext();
        faults.add(element(where(context), context), at, "found " + digits, problem);
        return new Json.Refused(at);
    }

    private static boolean hasSaneExponent(String digits) {
        int e = Math.max(digits.indexOf('e'), digits.indexOf('E'));
        if (e < 0) {
            return true;
        }
        String exponent = digits.substring(e + 1).replaceFirst("^[+-]?0*", "");
        return exponent.length() <= 4;
    }

    /** The path of the list or object that a context stands for. */
    private static Subject where(JsonStreamContext context) {
        JsonStreamContext parent = context.getParent();
        return parent == null ? Subject.DOCUMENT : element(where(parent), parent);
    }

    private static Subject element(Subject container, JsonStreamContext context) {
        if (context.inArray()) {
            return container.at(context.getCurrentIndex());
        }
        String name = context.getCurrentName();
        return name == null ? container : Members.at(container, name);
    }
}
