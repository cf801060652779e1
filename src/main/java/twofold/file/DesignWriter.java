package twofold.file;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import twofold.design.Along;
import twofold.design.Bound;
import twofold.design.Design;
import twofold.design.FaceAngle;
import twofold.design.Field;
import twofold.design.FourNumbers;
import twofold.design.Hold;
import twofold.design.Lever;
import twofold.design.Mount;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Point;
import twofold.design.Requirement;
import twofold.design.Side;
import twofold.design.TiltPlane;
import twofold.design.Tolerance;
import twofold.design.TwoPowers;
import twofold.design.Unit;

/**
 * Writes design files: equal designs as equal bytes, in UTF-8 with LF, one part, hold, lever, requirement or tolerance a
 * line. What has its default value is left out; every number is the shortest decimal that reads back to the same value.
 */
public final class DesignWriter {
    private static final JsonFactory FACTORY = new JsonFactory();

    private final JsonGenerator json;

    private DesignWriter(JsonGenerator json) {
        this.json = json;
    }

    /** A design as the text of a file. */
    public static String text(Design design) {
        return text(w -> w.design(design));
    }

    /** Parts as a text: an object with the same list of parts as a design. */
    static String text(List<Part> parts) {
        return text(w -> {
            w.json.writeStartObject();
            w.parts(parts);
            w.json.writeEndObject();
        });
    }

    /** Something that a writer writes. */
    private interface Content {
        void on(DesignWriter writer) throws IOException;
    }

    private static String text(Content content) {
        StringWriter text = new StringWriter();
        try (JsonGenerator json = FACTORY.createGenerator(text)) {
            json.setPrettyPrinter(new ElementALine());
            content.on(new DesignWriter(json));
        } catch (IOException e) {
            throw new UncheckedIOException("writing to memory failed", e);
        }
        return text.append('\n').toString();
    }

    /** A design as the bytes of a file. */
    public static byte[] bytes(Design design) {
        return text(design).getBytes(StandardCharsets.UTF_8);
    }

    private void design(Design design) throws IOException {
        json.writeStartObject();
        json.writeStringField("format", DocumentReader.FORMAT);
        words("title", design.title());
        words("notes", design.notes());
        number("wavelength_nm", Unit.NM, design.wavelength());
        json.writeStringField("shape", design.shape().word());
        parts(design.parts());
        list("holds", design.holds(), this::hold);
        list("levers", design.levers(), this::lever);
        list("requirements", design.requirements(), this::requirement);
        list("tolerances", design.tolerances(), this::tolerance);
        json.writeEndObject();
    }

    private void parts(List<Part> parts) throws IOException {
        json.writeArrayFieldStart("parts");
        for (Part part : parts) {
            part(part);
        }
        json.writeEndArray();
    }

    private void words(String key, String text) throws IOException {
        if (!text.isEmpty()) {
            json.writeStringField(key, text);
        }
    }

    /** Writes one element of a list. */
    private interface Element<T> {
        void write(T element) throws IOException;
    }

    private <T> void list(String key, List<T> elements, Element<T> element) throws IOException {
        if (!elements.isEmpty()) {
            json.writeArrayFieldStart(key);
            for (T e : elements) {
                element.write(e);
            }
            json.writeEndArray();
        }
    }

    private void number(String key, Unit unit, double si) throws IOException {
        json.writeFieldName(key);
        number(unit, si);
    }

    private void number(Unit unit, double si) throws IOException {
        json.writeNumber(unit.text(si));
    }

    private void numbers(Unit unit, double... si) throws IOException {
        json.writeStartArray();
        for (double each : si) {
            number(unit, each);
        }
        json.writeEndArray();
    }

    private void part(Part part) throws IOException {
        json.writeStartObject();
        json.writeStringField("name", part.name());
        json.writeStringField("kind", part.kind().word());
        for (var stated : part.values().stated().entrySet()) {
            Field field = stated.getKey();
            boolean usual = field.fallback().equals(Optional.of(stated.getValue()));
            if (!usual) {
                json.writeFieldName(field.json());
                value(field, stated.getValue());
            }
        }
        json.writeEndObject();
    }

    private void value(Field field, Object value) throws IOException {
        Unit unit = field.unit();
        switch (field.form()) {
            case NUMBER, POSITIVE, SIGNED -> number(unit, (Double) value);
            case POINT -> numbers(unit, ((Point) value).x(), ((Point) value).y());
            case MOUNT -> numbers(unit, ((Mount) value).width(), ((Mount) value).depth());
            case ALONG -> {
                Along along = (Along) value;
                wordOr(along.inMiddle(), Convert.MIDDLE, unit, along.path());
            }
            case FACE_ANGLE -> {
                FaceAngle angle = (FaceAngle) value;
                wordOr(angle.atBrewster(), Convert.BREWSTER, unit, angle.incidence());
            }
            case POWERS -> {
                TwoPowers powers = (TwoPowers) value;
                if (powers.tangential() == powers.sagittal()) {
                    number(unit, powers.tangential());
                } else {
                    numbers(unit, powers.tangential(), powers.sagittal());
                }
            }
            case MATRIX -> {
                FourNumbers m = (FourNumbers) value;
                json.writeStartArray();
                number(Unit.ONE, m.a());
                number(Unit.MM, m.b());
                number(Unit.PER_MM, m.c());
                number(Unit.ONE, m.d());
                json.writeEndArray();
            }
            case TILT_PLANE -> json.writeString(((TiltPlane) value).word());
            case SIDE -> json.writeString(((Side) value).word());
            case TEXT -> json.writeString((String) value);
            case TURN -> throw new IllegalArgumentException(field.json() + " is never stored");
        }
    }

    private void wordOr(boolean isWord, String word, Unit unit, double si) throws IOException {
        if (isWord) {
            json.writeString(word);
        } else {
            number(unit, si);
        }
    }

    private void place(Place place) throws IOException {
        if (place.second().isPresent()) {
            json.writeArray(new String[] {place.first(), place.second().get()}, 0, 2);
        } else {
            json.writeString(place.first());
        }
    }

    private void hold(Hold hold) throws IOException {
        json.writeStartObject();
        if (hold instanceof Hold.Leg h) {
            json.writeFieldName("leg");
            place(h.leg());
        } else if (hold instanceof Hold.Incidence h) {
            json.writeStringField("incidence", h.mirror());
        } else if (hold instanceof Hold.Position h) {
            json.writeStringField("place", h.mirror());
        } else if (hold instanceof Hold.Direction h) {
            json.writeFieldName("direction");
            place(h.leg());
        } else {
            json.writeBooleanField("round_trip", true);
        }
        json.writeEndObject();
    }

    /** What is set and where; the unit of its numbers. */
    private Unit setting(String set, List<Place> of) throws IOException {
        json.writeStringField("set", set);
        json.writeArrayFieldStart("of");
        for (Place place : of) {
            place(place);
        }
        json.writeEndArray();
        return Field.settableUnit(set).orElse(Unit.ONE);
    }

    private void lever(Lever lever) throws IOException {
        json.writeStartObject();
        json.writeStringField("name", lever.name());
        Unit unit = setting(lever.set(), lever.of());
        if (lever.range() instanceof Lever.Range.Span span) {
            number("from", unit, span.from());
            number("to", unit, span.to());
        } else if (lever.range() instanceof Lever.Range.Among among) {
            json.writeFieldName("among");
            numbers(unit, among.values().stream().mapToDouble(v -> v).toArray());
        }
        if (lever.adjuster()) {
            json.writeBooleanField("adjuster", true);
        }
        json.writeEndObject();
    }

    private void requirement(Requirement r) throws IOException {
        json.writeStartObject();
        json.writeStringField("what", r.what().json());
        if (r.at().isPresent()) {
            json.writeFieldName("at");
            place(r.at().get());
        }
        if (r.plane().isPresent()) {
            json.writeStringField("plane", r.plane().get().word());
        }
        if (r.edge().isPresent()) {
            json.writeStringField("edge", r.edge().get().word());
        }
        bound(r.what().unit(), r.bound());
        if (r.over().isPresent()) {
            json.writeStringField("over", r.over().get());
        }
        json.writeEndObject();
    }

    private void bound(Unit unit, Bound bound) throws IOException {
        if (bound instanceof Bound.AtLeast b) {
            number("at_least", unit, b.value());
        } else if (bound instanceof Bound.AtMost b) {
            number("at_most", unit, b.value());
        } else if (bound instanceof Bound.Between b) {
            json.writeFieldName("between");
            numbers(unit, b.low(), b.high());
        } else if (bound instanceof Bound.Equal b) {
            number("equals", unit, b.value());
            number("within", unit, b.within());
        } else if (bound instanceof Bound.Prefer p) {
            json.writeStringField("prefer", p.word());
        }
    }

    private void tolerance(Tolerance tolerance) throws IOException {
        json.writeStartObject();
        Unit unit = setting(tolerance.set(), tolerance.of());
        number(
                tolerance.relative() ? "plus_minus_percent" : "plus_minus",
                tolerance.relative() ? Unit.PERCENT : unit,
                tolerance.plusMinus());
        if (tolerance.spread() != Tolerance.Spread.UNIFORM) {
            json.writeStringField("spread", tolerance.spread().word());
        }
        json.writeEndObject();
    }
}
