package twofold;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.jspecify.annotations.Nullable;

/**
 * Numbers from outside the program, {@code checks.json}: each with its inputs, expected values, tolerance, source and how
 * the value is known ({@code printed}, {@code computed from formula} or {@code memory}).
 */
public final class Checks {

    private Checks() {}

    /**
     * The entry with an id.
     *
     * @throws IllegalArgumentException if there is none
     */
    public static Check of(String id) {
        for (Object entry : all()) {
            Check check = new Check(object(entry));
            if (check.id().equals(id)) {
                return check;
            }
        }
        throw new IllegalArgumentException("no check " + id);
    }

    /** One entry. */
    public record Check(Map<String, Object> entry) {

        /** Its name. */
        public String id() {
            return text("id");
        }

        /** Where the expected numbers come from. */
        public String source() {
            return text("source") + " [" + text("how_known") + "]";
        }

        /** An input. */
        public double in(String key) {
            return number(value("inputs", key));
        }

        /** An input that is text. */
        public String name(String key) {
            return (String) value("inputs", key);
        }

        /** An input that is a list. */
        public List<Double> ins(String key) {
            return numbers(value("inputs", key));
        }

        /** An expected value. */
        public double expected(String key) {
            return number(value("expected", key));
        }

        /** An expected list. */
        public List<Double> expecteds(String key) {
            return numbers(value("expected", key));
        }

        /** An expected list of words. */
        public List<String> words(String key) {
            return list(value("expected", key)).stream().map(String.class::cast).toList();
        }

        /** Asserts that a value is the expected one within the entry's tolerance. */
        public void holds(String key, double actual) {
            assertThat(actual)
                    .as("%s: %s, %s", id(), key, source())
                    .isCloseTo(expected(key), within(tolerance(key, expected(key))));
        }

        /** Asserts that values are the expected list within the entry's tolerance. */
        public void holds(String key, List<Double> actual) {
            List<Double> expected = numbers(value("expected", key));
            assertThat(actual).as("%s: %s", id(), key).hasSameSizeAs(expected);
            for (int i = 0; i < actual.size(); i++) {
                assertThat(actual.get(i))
                        .as("%s: %s[%d], %s", id(), key, i, source())
                        .isCloseTo(expected.get(i), within(tolerance(key, expected.get(i))));
            }
        }

        /**
         * The entry's tolerance on a value: the relative one where it has one and the value is not 0, for the entries'
         * absolute one, 1e-12, would be loose for a radius in m.
         */
        private double tolerance(String key, double expected) {
            Map<String, Object> tolerance = object(field("tolerance"));
            if (tolerance.containsKey("rel") && expected != 0) {
                return number(get(tolerance, "rel")) * Math.abs(expected);
            }
            Object absolute = get(tolerance, "abs");
            return absolute instanceof Map ? number(get(object(absolute), key)) : number(absolute);
        }

        private String text(String key) {
            return (String) field(key);
        }

        private Object value(String group, String key) {
            return get(object(field(group)), key);
        }

        private Object field(String key) {
            return get(entry, key);
        }

        private static Object get(Map<String, Object> map, String key) {
            return Objects.requireNonNull(map.get(key), key);
        }
    }

    private static List<?> all() {
        try (InputStream in = Objects.requireNonNull(Checks.class.getResourceAsStream("checks.json"));
                JsonParser parser = new JsonFactory().createParser(in)) {
            parser.nextToken();
            return list(Objects.requireNonNull(read(parser)));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The value at the parser's token: a map, a list, a string, a double, a boolean or null. */
    private static @Nullable Object read(JsonParser parser) throws IOException {
        return switch (parser.currentToken()) {
            case START_OBJECT -> {
                Map<String, @Nullable Object> map = new LinkedHashMap<>();
                while (parser.nextToken() != JsonToken.END_OBJECT) {
                    String key = parser.currentName();
                    parser.nextToken();
                    map.put(key, read(parser));
                }
                yield map;
            }
            case START_ARRAY -> {
                List<@Nullable Object> list = new ArrayList<>();
                while (parser.nextToken() != JsonToken.END_ARRAY) {
                    list.add(read(parser));
                }
                yield list;
            }
            case VALUE_STRING -> parser.getText();
            case VALUE_TRUE, VALUE_FALSE -> parser.getBooleanValue();
            case VALUE_NULL -> null;
            default -> parser.getDoubleValue();
        };
    }

    @SuppressWarnings("unchecked") // keys of a JSON object are strings
    private static Map<String, Object> object(Object value) {
        return (Map<String, Object>) value;
    }

    private static List<?> list(Object value) {
        return (List<?>) value;
    }

    private static double number(Object value) {
        return (Double) value;
    }

    private static List<Double> numbers(Object value) {
        return list(value).stream().map(Checks::number).toList();
    }
}
