package twofold.window.bench;

import java.util.ArrayList;
import java.util.List;
import twofold.design.Part;
import twofold.design.Unit;
import twofold.layout.Laid;
import twofold.layout.Leg;
import twofold.layout.Standing;

/** What stands beside the pointer while a part is moved or placed. */
final class PointerWords {
    private PointerWords() {}

    /** Where a part stands: of a mirror its legs and incidence, of another its distance from the mirror before. */
    static String place(Laid laid, int part) {
        List<Part> parts = laid.design().parts();
        List<String> words = new ArrayList<>();
        for (Leg leg : laid.legs()) {
            if (leg.from() == part || leg.to() == part) {
                words.add(parts.get(leg.from()).name() + "/"
                        + parts.get(leg.to()).name() + " " + Unit.MM.shown(leg.path()) + " mm");
            }
            for (Standing s : leg.parts()) {
                if (s.part() == part) {
                    words.add(Unit.MM.shown(s.middle()) + " mm from "
                            + parts.get(leg.from()).name());
                }
            }
        }
        Double incidence = laid.incidence().get(part);
        if (incidence != null && words.size() > 1) {
            words.add("incidence " + Unit.DEG.shown(incidence) + "°");
        }
        return String.join("\n", words);
    }
}
