package twofold.file;

import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.PrettyPrinter;
import java.io.IOException;

/**
 * Lays JSON out for people and for line-by-line comparison: each key of the document on a line of its own, each element
 * of a list that is one of the document's values too, all below that inline.
 */
final class ElementALine implements PrettyPrinter {
    private static final String KEY = "\n  ";
    private static final String ELEMENT = "\n    ";

    private int depth;

    @Override
    public void writeRootValueSeparator(JsonGenerator json) throws IOException {
        json.writeRaw('\n');
    }

    @Override
    public void writeStartObject(JsonGenerator json) throws IOException {
        json.writeRaw('{');
        depth++;
    }

    @Override
    public void beforeObjectEntries(JsonGenerator json) throws IOException {
        json.writeRaw(depth == 1 ? KEY : " ");
    }

    @Override
    public void writeObjectEntrySeparator(JsonGenerator json) throws IOException {
        json.writeRaw(depth == 1 ? "," + KEY : ", ");
    }

    @Override
    public void writeObjectFieldValueSeparator(JsonGenerator json) throws IOException {
        json.writeRaw(": ");
    }

    @Override
    public void writeEndObject(JsonGenerator json, int entries) throws IOException {
        depth--;
        json.writeRaw(entries == 0 ? "}" : depth == 0 ? "\n}" : " }");
    }

    @Override
    public void writeStartArray(JsonGenerator json) throws IOException {
        json.writeRaw('[');
        depth++;
    }

    @Override
    public void beforeArrayValues(JsonGenerator json) throws IOException {
        if (depth == 2) {
            json.writeRaw(ELEMENT);
        }
    }

    @Override
    public void writeArrayValueSeparator(JsonGenerator json) throws IOException {
        json.writeRaw(depth == 2 ? "," + ELEMENT : ", ");
    }

    @Override
    public void writeEndArray(JsonGenerator json, int elements) throws IOException {
        depth--;
        json.writeRaw(depth == 1 && elements > 0 ? KEY + "]" : "]");
    }
}
