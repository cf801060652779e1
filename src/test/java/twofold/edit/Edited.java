package twofold.edit;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import twofold.Samples;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.Mirror;
import twofold.design.Point;
import twofold.design.Problem;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.layout.Leg;
import twofold.layout.Outcome;
import twofold.layout.Room;

/** Samples and edits of them, laid out anew. */
final class Edited {
    private Edited() {}

    static Laid sample(String name) {
        return laid(Samples.design(name));
    }

    static Laid laid(Design design) {
        Outcome<Laid> laid = Layout.of(design);
        assertThat(laid.problems()).isEmpty();
        return laid.value().orElseThrow();
    }

    /** What an edit makes of a plan; problems fail the test. */
    static Laid by(Edit edit, Laid laid) {
        Outcome<Laid> edited = edit.on(laid);
        assertThat(edited.problems()).as(edit.name()).isEmpty();
        return edited.value().orElseThrow();
    }

    /** Why an edit is refused. */
    static String refusal(Edit edit, Laid laid) {
        Outcome<Laid> edited = edit.on(laid);
        assertThat(edited.value()).as(edit.name()).isEmpty();
        assertThat(edited.problems()).isNotEmpty();
        return String.join(
                "\n", edited.problems().stream().map(Problem::message).toList());
    }

    static List<String> names(Laid laid) {
        return Named.parts(laid.design());
    }

    static Point at(Laid laid, String mirror) {
        return laid.design().mirrors().stream()
                .filter(m -> m.name().equals(mirror))
                .map(Mirror::at)
                .findFirst()
                .orElseThrow();
    }

    static Along along(Laid laid, String part) {
        return Room.along(laid.design().parts().get(laid.design().indexOf(part).orElseThrow()));
    }

    static double incidence(Laid laid, String mirror) {
        return laid.incidence().getOrDefault(laid.design().indexOf(mirror).orElseThrow(), Double.NaN);
    }

    static List<Double> paths(Laid laid) {
        return laid.legs().stream().map(Leg::path).toList();
    }

    /** The direction of a leg, rad. */
    static double direction(Laid laid, int leg) {
        Point heading = laid.legs().get(leg).heading();
        return Math.atan2(heading.y(), heading.x());
    }
}
