package twofold.edit;

import java.util.List;
import java.util.Optional;
import twofold.design.Design;
import twofold.design.Names;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Problem;
import twofold.design.Subject;
import twofold.layout.Outcome;
import twofold.layout.Target;

/** Parts, mirrors and legs found by name, or a problem in words. */
final class Named {
    private Named() {}

    /** The names of all parts. */
    static List<String> parts(Design design) {
        return design.parts().stream().map(Part::name).toList();
    }

    /** The index of a part. */
    static Outcome<Integer> part(Design design, String name) {
        List<String> names = parts(design);
        return design.indexOf(name)
                .map(Outcome::of)
                .orElseGet(() -> missing(name, "no part is called", names, "the name of a part"));
    }

    /** The number of a mirror along the beam. */
    static Outcome<Integer> mirror(Design design, String name) {
        List<String> names = design.mirrors().stream().map(Part::name).toList();
        int number = names.indexOf(name);
        return number >= 0 ? Outcome.of(number) : missing(name, "no mirror is called", names, "the name of a mirror");
    }

    /** The number of a leg, its mirrors named in either order. */
    static Outcome<Integer> leg(Design design, Place leg) {
        Optional<Integer> number = Target.leg(design, leg);
        return number.map(Outcome::of)
                .orElseGet(() -> missing(leg.toString(), "no leg is called", List.of(), "two neighbouring mirrors"));
    }

    private static <T> Outcome<T> missing(String name, String what, List<String> known, String accepted) {
        return Outcome.failed(new Problem(
                Subject.DOCUMENT,
                "found \"" + Names.shown(name) + "\", which " + what + Names.hint(name, known),
                accepted));
    }
}
