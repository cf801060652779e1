package twofold.window.inspect;

import java.util.List;
import java.util.Optional;
import twofold.cavity.Cavity;
import twofold.design.Design;
import twofold.design.Part;
import twofold.layout.Laid;
import twofold.layout.Leg;
import twofold.layout.Standing;

/**
 * The part that is inspected, in its design.
 *
 * @param document number of the open document
 * @param cavity the solved design
 * @param index of the part
 */
record Inspected(int document, Cavity cavity, int index) {
    Laid laid() {
        return cavity.laid();
    }

    Design design() {
        return laid().design();
    }

    Part part() {
        return design().parts().get(index);
    }

    String name() {
        return part().name();
    }

    /** Whose values these are; the same as long as the part has its name. */
    String whose() {
        return document + " " + name();
    }

    /** The leg that meets the mirror. */
    Optional<Leg> before() {
        return laid().legs().stream().filter(l -> l.to() == index).findFirst();
    }

    /** The leg that leaves the mirror. */
    Optional<Leg> after() {
        return laid().legs().stream().filter(l -> l.from() == index).findFirst();
    }

    /** Where a part stands that is no mirror. */
    Standing standing() {
        return laid().legs().stream()
                .map(Leg::parts)
                .flatMap(List::stream)
                .filter(s -> s.part() == index)
                .findFirst()
                .orElseThrow();
    }

    String name(int part) {
        return design().parts().get(part).name();
    }
}
