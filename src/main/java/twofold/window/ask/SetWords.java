package twofold.window.ask;

import twofold.design.Field;
import twofold.design.Names;

/** Names of what levers and tolerances set. */
final class SetWords {
    private SetWords() {}

    /** "Radius of curvature". */
    static String title(String set) {
        return Names.capital(Field.title(set));
    }
}
