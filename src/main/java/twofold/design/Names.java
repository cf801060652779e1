package twofold.design;

import java.util.Collection;
import java.util.Comparator;
import java.util.Locale;
import java.util.Optional;
import org.apache.commons.text.similarity.LevenshteinDistance;

/** Names of parts and levers: which are allowed, and the known one nearest to a misspelling. */
public final class Names {
    private static final int LONGEST = 60;
    private static final String NOT_INSIDE = "/@:\"";
    private static final String NOT_FIRST = "=+-";

    /** What a name may be, in words. */
    public static final String ACCEPTED = "1 to " + LONGEST
            + " printable characters, none of / @ : \", no space at either end, not starting with = + -";

    private Names() {}

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

    /** The known name nearest to a misspelled one, if it is near enough to be meant. */
    public static Optional<String> nearest(String misspelled, Collection<String> known) {
        String wanted = misspelled.toLowerCase(Locale.ROOT);
        int reach = Math.max(2, wanted.length() / 3);
        if (wanted.length() > 4 * LONGEST) {
            return Optional.empty();
        }
        LevenshteinDistance distance = new LevenshteinDistance(reach);
        return known.stream()
                .filter(k -> distance.apply(wanted, k.toLowerCase(Locale.ROOT)) >= 0)
                .min(Comparator.comparingInt(k -> distance.apply(wanted, k.toLowerCase(Locale.ROOT))));
    }

    /** "; nearest is \"x\"" or nothing. */
    public static String hint(String misspelled, Collection<String> known) {
        return nearest(misspelled, known).map(n -> "; nearest is \"" + n + "\"").orElse("");
    }
}
