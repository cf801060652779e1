package twofold.window.ask;

import java.util.Locale;
import twofold.design.Field;

/** Names of what levers and tolerances set. */
final class SetWords {
    private SetWords() {}

    /** "Radius of curvature". */
    static String title(String set) {
        String title = Field.title(set);
        return title.substring(0, 1).toUpperCase(Locale.ROOT) + title.substring(1);
    }
}
