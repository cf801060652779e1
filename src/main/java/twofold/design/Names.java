package twofold.design;

import java.util.Collection;
import java.util.Comparator;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;
import org.apache.commons.text.similarity.LevenshteinDistance;

/** Names of parts and levers: which are allowed, and the known one nearest to a misspelling. */
public final class Names {
    private static final int LONGEST = 60;
    private static final int LONGEST_SHOWN = 80;
    private static final int MOST_LISTED = 30;
    private static final String NOT_INSIDE = "/@:\"";
    private static final String NOT_FIRST = "=+-";

    /** What a name may be, in words. */
    public static final String ACCEPTED = "1 to " + LONGEST
            + " printable characters, none of / @ : \", no space at either end, not starting with = + -";

    private Names() {}

    /** Words with a capital at their head, as a title. */
    public static String capital(String words) {
        return words.isEmpty() ? words : words.substring(0, 1).toUpperCase(Locale.ROOT) + words.substring(1);
    }

    /** Whether a text may be a name. */
    public static boolean accepts(String name) {
        int length = name.codePointCount(0, name.length());
        return length >= 1
                && length <= LONGEST
                && name.codePoints().allMatch(Names::isPrintable)
                && name.codePoints().noneMatch(c -> NOT_INSIDE.indexOf(c) >= 0)
                && NOT_FIRST.indexOf(name.charAt(0)) < 0
                && !isSpace(name.codePointAt(0))
                && !isSpace(name.codePointBefore(name.length()));
    }

    /** A text as messages quote it: its first characters, with what cannot be printed escaped. */
    public static String shown(String text) {
        int cut = text.codePointCount(0, Math.min(text.length(), 2 * LONGEST_SHOWN + 2)) > LONGEST_SHOWN
                ? text.offsetByCodePoints(0, LONGEST_SHOWN)
                : text.length();
        return escaped(text.substring(0, cut)) + (cut < text.length() ? "…" : "");
    }

    /** A text with what cannot be printed, line breaks among it, escaped as in JSON. */
    public static String escaped(String text) {
        StringBuilder printable = new StringBuilder(text.length());
        text.codePoints().forEach(c -> {
            if (isPrintable(c)) {
                printable.appendCodePoint(c);
            } else {
                for (char unit : Character.toChars(c)) {
                    String hex = Integer.toHexString(unit);
                    printable.append("\\u").append("0".repeat(4 - hex.length())).append(hex);
                }
            }
        });
        return printable.toString();
    }

    /** Names as messages list them: the first few, with commas between. */
    public static String listed(Collection<String> names) {
        return names.stream().limit(MOST_LISTED).map(Names::shown).collect(Collectors.joining(", "))
                + (names.size() > MOST_LISTED ? ", …" : "");
    }

    private static boolean isPrintable(int c) {
        return switch (Character.getType(c)) {
            case Character.CONTROL,
                    Character.FORMAT,
                    Character.SURROGATE,
                    Character.PRIVATE_USE,
                    Character.UNASSIGNED,
                    Character.LINE_SEPARATOR,
                    Character.PARAGRAPH_SEPARATOR -> false;
            default -> true;
        };
    }

    private static boolean isSpace(int c) {
        return Character.isWhitespace(c) || Character.isSpaceChar(c);
    }

    /**
     * The known name nearest to a misspelled one, if it is near enough to be meant: few letters apart, or else the
     * shortest that begins so, as "along_mm" does with "along".
     */
    public static Optional<String> nearest(String misspelled, Collection<String> known) {
        String wanted = misspelled.toLowerCase(Locale.ROOT);
        if (wanted.length() > 4 * LONGEST) {
            return Optional.empty();
        }
        LevenshteinDistance distance = new LevenshteinDistance(Math.max(2, wanted.length() / 3));
        Optional<String> near = known.stream()
                .filter(k -> distance.apply(wanted, k.toLowerCase(Locale.ROOT)) >= 0)
                .min(Comparator.comparingInt(k -> distance.apply(wanted, k.toLowerCase(Locale.ROOT))));
        return near.or(() -> known.stream()
                .filter(k -> wanted.length() > 1 && k.toLowerCase(Locale.ROOT).startsWith(wanted))
                .min(Comparator.comparingInt(String::length)));
    }

    /** "; nearest is \"x\"" or nothing. */
    public static String hint(String misspelled, Collection<String> known) {
        return nearest(misspelled, known)
                .map(n -> "; nearest is \"" + shown(n) + "\"")
                .orElse("");
    }
}
