package twofold.edit;

import java.util.Collection;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Names that nothing in a list has yet. */
final class FreeName {
    private static final Pattern COUNTED = Pattern.compile("(.*\\S) +(\\d{1,6})");

    /** How many characters a name without its number may have: with a space and six digits it stays below 60. */
    private static final int LONGEST = 53;

    private FreeName() {}

    /** The name itself where it is free; else with the next free number: after "Fold 1" comes "Fold 2". */
    static String like(String name, Collection<String> taken) {
        if (!taken.contains(name)) {
            return name;
        }
        Matcher counted = COUNTED.matcher(name);
        return counted.matches()
                ? counted(counted.group(1), Integer.parseInt(counted.group(2)) + 1, taken)
                : counted(name, 2, taken);
    }

    /** The first of "Lens 1", "Lens 2", … that is free. */
    static String first(String base, Collection<String> taken) {
        return counted(base, 1, taken);
    }

    private static String counted(String base, int from, Collection<String> taken) {
        int length = base.codePointCount(0, base.length());
        String cut = length > LONGEST
                ? base.substring(0, base.offsetByCodePoints(0, LONGEST)).strip()
                : base;
        int number = from;
        while (taken.contains(cut + " " + number)) {
            number++;
        }
        return cut + " " + number;
    }
}
