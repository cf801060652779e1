package twofold.file;

import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonStreamContext;
import com.fasterxml.jackson.core.exc.StreamConstraintsException;
import java.util.List;
import twofold.design.Names;

/**
 * Where and why a text is not JSON, in plain words instead of the parser's.
 *
 * @param offset in the text
 * @param found what stands there
 * @param accepted what could
 */
record SyntaxFault(long offset, String found, String accepted) {
    /** What the parser's message says, and what that means to a person; the first that fits counts. */
    private static final List<Meaning> MEANINGS = List.of(
            new Meaning("closing quote", "the double quote that ends a text"),
            new Meaning("in character escape sequence", "the double quote that ends a text"),
            new Meaning("Illegal unquoted character", "inside a text, an escape: \\n, \\t or \\u and four hex digits"),
            new Meaning("hex-digit", "four hex digits after \\u"),
            new Meaning(
                    "Unrecognized character escape", "\\\" \\\\ \\/ \\b \\f \\n \\r \\t, or \\u and four hex digits"),
            new Meaning("a colon to separate", "a colon after the key"),
            new Meaning("comma to separate Object", "a comma or }"),
            new Meaning("comma to separate Array", "a comma or ]"),
            new Meaning("double-quote to start field name", "a key in double quotes"),
            new Meaning("expected '}'", "}"),
            new Meaning("expected ']'", "]"),
            new Meaning("Leading zeroes", "a number without leading zeros"),
            new Meaning("Decimal point not followed", "a digit after the decimal point"),
            new Meaning("Exponent indicator not followed", "a digit in the exponent"),
            new Meaning("plus sign", "a number without a plus sign"),
            new Meaning("minus sign", "a digit after the minus sign"),
            new Meaning("comment", "a value: JSON has no comments"),
            new Meaning("white space", "spaces, tabs and line breaks between values"));

    /** What numbers are written with. */
    private static final String NUMBER = "0123456789+-.eE";

    private record Meaning(String said, String accepted) {}

    /** What a fault comes to. */
    static SyntaxFault of(JsonProcessingException fault, JsonParser parser, String text) {
        if (fault instanceof StreamConstraintsException) {
            return limit(fault, parser, text);
        }
        JsonLocation location = fault.getLocation();
        long offset = location == null ? parser.currentLocation().getCharOffset() : location.getCharOffset();
        JsonStreamContext context = parser.getParsingContext();
        String said = fault.getOriginalMessage();
        if (said.contains("white space") || said.contains("plus sign")) {
            // Of these faults the parser gives the place behind.
            offset--;
        }
        if (said.contains("end-of-input") || offset >= text.length()) {
            return new SyntaxFault(text.length(), "found the end of the text", rest(said, context));
        }
        String found = "found " + words(text, (int) Math.max(0, offset), said.contains("Unrecognized token"));
        if (context.inRoot() && context.getCurrentIndex() >= 0 && !said.contains("Illegal")) {
            boolean first = text.substring(0, (int) offset).isBlank();
            return new SyntaxFault(
                    offset, found, first ? "an object in braces" : "nothing after the end of the document");
        }
        return new SyntaxFault(offset, found, meaning(said));
    }

    private static SyntaxFault limit(JsonProcessingException fault, JsonParser parser, String text) {
        int offset = (int) Math.min(parser.currentLocation().getCharOffset(), text.length());
        if (fault.getOriginalMessage().contains("nesting")) {
            return new SyntaxFault(
                    offset - 1L,
                    "found lists and objects nested too deep",
                    "at most " + JsonText.DEEPEST + " inside each other");
        }
        while (offset > 0 && NUMBER.indexOf(text.charAt(offset - 1)) >= 0) {
            offset--;
        }
        return new SyntaxFault(
                offset, "found a number that is too long", "at most " + JsonText.LONGEST_NUMBER + " characters");
    }

    private static String rest(String said, JsonStreamContext context) {
        if (said.contains("closing quote") || said.contains("escape")) {
            return "the double quote that ends a text";
        }
        return context.inObject()
                ? "the rest of the object, up to }"
                : context.inArray() ? "the rest of the list, up to ]" : "an object in braces";
    }

    private static String words(String text, int offset, boolean word) {
        int end = text.offsetByCodePoints(offset, 1);
        while (word && end < text.length() && end - offset < 40 && Character.isLetterOrDigit(text.charAt(end))) {
            end++;
        }
        String there = text.substring(offset, end);
        return switch (there) {
            case "\n", "\r" -> "a line break";
            case "\t" -> "a tab";
            default -> "\"" + Names.shown(there) + "\"";
        };
    }

    private static String meaning(String said) {
        return MEANINGS.stream()
                .filter(m -> said.contains(m.said()))
                .map(Meaning::accepted)
                .findFirst()
                .orElse("a text in double quotes, a number, true, false, a list or an object");
    }
}
