package twofold.edit;

import java.util.ArrayList;
import java.util.List;
import twofold.design.Design;
import twofold.design.Lever;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Point;
import twofold.design.Problem;
import twofold.design.Shape;
import twofold.design.Subject;
import twofold.layout.Outcome;

/**
 * A ring of two flat mirrors on a base and a curved one opposite, both sides equally long. Its "gap" is the height of the
 * apex over the base, m: it sets the round trip, and all three angles follow.
 *
 * @param values radius, base, wavelength and crystal
 * @param title of the design
 */
record TrianglePlan(StartingValues values, String title) implements StartingPlan {
    private static final String ENTRANCE = "Entrance";
    private static final String EXIT = "Exit";
    private static final String APEX = "Apex";

    /** The height that gives a round trip, m; NaN where it is below twice the base. */
    static double height(double base, double perimeter) {
        double side = (perimeter - base) / 2;
        return Math.sqrt((side - base / 2) * (side + base / 2));
    }

    @Override
    public Outcome<Design> at(double incidence, double gap) {
        double base = values.number(StartingInput.BASE);
        if (!(gap > 0)) {
            return Outcome.failed(new Problem(
                    Subject.DOCUMENT.at(StartingInput.PERIMETER.words()),
                    "found a round trip that is not longer than twice the base",
                    "more than " + StartingInput.PERIMETER.shown(2 * base)));
        }
        double flat = Double.POSITIVE_INFINITY;
        List<Part> parts = new ArrayList<>();
        parts.add(StartingPlan.mirror(ENTRANCE, new Point(0, 0), flat));
        if (values.hasCrystal()) {
            parts.add(StartingPlan.crystal(values));
        }
        parts.add(StartingPlan.mirror(EXIT, new Point(base, 0), flat));
        parts.add(StartingPlan.mirror(APEX, new Point(base / 2, gap), values.number(StartingInput.APEX)));
        return Outcome.of(Design.of(title, values.number(StartingInput.WAVELENGTH), Shape.RING, parts));
    }

    @Override
    public int gapLeg() {
        return 0;
    }

    @Override
    public Place crystalLeg() {
        return Place.of(ENTRANCE, EXIT);
    }

    @Override
    public List<String> folds() {
        return List.of();
    }

    @Override
    public double begin() {
        return values.number(StartingInput.APEX) / 2;
    }

    @Override
    public Lever lever(double from, double to) {
        return new Lever("apex", "y_mm", List.of(Place.of(APEX)), new Lever.Range.Span(from, to), true);
    }
}
