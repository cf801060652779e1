package twofold.layout;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import twofold.design.Design;
import twofold.design.Hold;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Point;

/** Designs whose mirrors were moved, laid out anew: what movers promise is measured on the layout, not on their own word. */
final class Moved {
    private Moved() {}

    static Laid laid(Design design) {
        Outcome<Laid> outcome = Layout.of(design);
        assertThat(outcome.problems()).as(design.title()).isEmpty();
        return outcome.value().orElseThrow();
    }

    static Design with(Design design, List<Hold> holds) {
        return new Design(
                design.title(),
                design.notes(),
                design.wavelength(),
                design.shape(),
                design.parts(),
                holds,
                List.of(),
                List.of(),
                List.of());
    }

    /** The design with its mirrors at other places. */
    static Design at(Design design, List<Point> places) {
        List<Part> parts = new ArrayList<>();
        int mirror = 0;
        for (Part part : design.parts()) {
            parts.add(part instanceof Mirror m ? m.at(places.get(mirror++)) : part);
        }
        return design.withParts(parts);
    }

    /** Where mirrors go for values; empty where there is no such layout, or parts no longer fit it. */
    static Optional<Laid> layout(Laid from, Mover mover, double... values) {
        Plan plan = Plan.of(from);
        return mover.move(values, plan)
                ? Layout.of(at(from.design(), plan.places())).value()
                : Optional.empty();
    }

    static double path(Laid laid, int leg) {
        return laid.legs().get(leg).path();
    }

    /** The angle of incidence at a mirror, by its number along the beam. */
    static double incidence(Laid laid, int mirror) {
        int part = laid.design()
                .indexOf(laid.design().mirrors().get(mirror).name())
                .orElseThrow();
        return laid.incidence().getOrDefault(part, Double.NaN);
    }

    static double direction(Laid laid, int leg) {
        Point u = laid.legs().get(leg).heading();
        return Math.atan2(u.y(), u.x());
    }

    static List<Point> places(Laid laid) {
        return laid.design().mirrors().stream().map(Mirror::at).toList();
    }

    /** Sum of squared displacements, m². */
    static double squares(Laid from, Laid to) {
        double sum = 0;
        for (int i = 0; i < places(from).size(); i++) {
            double by = places(from).get(i).distance(places(to).get(i));
            sum += by * by;
        }
        return sum;
    }
}
