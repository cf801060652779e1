package twofold.edit;

import java.util.ArrayList;
import java.util.List;
import twofold.design.Design;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Point;
import twofold.design.Problem;
import twofold.design.Shape;
import twofold.design.Subject;
import twofold.design.Unit;
import twofold.layout.Outcome;

/**
 * A ring of four mirrors whose two diagonals cross, with one incidence at all four: the gap lies between the two curved
 * mirrors, and the leg between the two flat ones is parallel to it.
 *
 * <p>With the gap's leg along x, extending over e and shifted sideways by s, incidence θ and diagonals d₁, d₂: the long way
 * round is (d₁ + d₂)(1 + cos 2θ) − e, and both flats stand at one height if d₁ − d₂ = s / sin 2θ.
 *
 * @param values round trip, radii, wavelength and crystal
 * @param title of the design
 * @param sideways shift by the crystal, m
 * @param excess of the crystal's path over its extent along the leg, m
 */
record BowTiePlan(StartingValues values, String title, double sideways, double excess) implements StartingPlan {
    private static final String CURVED_1 = "Curved 1";
    private static final String CURVED_2 = "Curved 2";
    private static final String FLAT_1 = "Flat 1";
    private static final String FLAT_2 = "Flat 2";

    /** The plan, with a crystal that has been checked. */
    static BowTiePlan of(StartingValues values, String title) {
        return StartingPlan.standing(values)
                .value()
                .map(s -> new BowTiePlan(values, title, s.shift(), s.length() - s.advance()))
                .orElseGet(() -> new BowTiePlan(values, title, 0, 0));
    }

    @Override
    public Outcome<Design> at(double incidence, double gap) {
        double sin = Math.sin(2 * incidence);
        double cos = Math.cos(2 * incidence);
        double half = (gap - excess) / 2;
        double roundTrip = values.number(StartingInput.ROUND_TRIP);
        double diagonals = (roundTrip - gap + 2 * half) / (1 + cos);
        double first = (diagonals + sideways / sin) / 2;
        double second = (diagonals - sideways / sin) / 2;
        if (!(diagonals * cos > 2 * half) || !(Math.min(first, second) > 0)) {
            return Outcome.failed(new Problem(
                    Subject.DOCUMENT.at(StartingInput.ROUND_TRIP.words()),
                    "found " + StartingInput.ROUND_TRIP.shown(roundTrip) + ", too short for a bow-tie with a gap of "
                            + Unit.MM.shown(gap) + " mm and an incidence of " + Unit.DEG.shown(incidence) + "°",
                    "a longer round trip, smaller radii or a smaller incidence"));
        }
        Point one = new Point(-half, -sideways / 2);
        Point two = new Point(half, sideways / 2);
        List<Part> parts = new ArrayList<>();
        parts.add(StartingPlan.mirror(CURVED_1, one, values.number(StartingInput.CURVED_1)));
        if (values.hasCrystal()) {
            parts.add(StartingPlan.crystal(values));
        }
        double flat = Double.POSITIVE_INFINITY;
        parts.add(StartingPlan.mirror(CURVED_2, two, values.number(StartingInput.CURVED_2)));
        parts.add(StartingPlan.mirror(FLAT_1, new Point(two.x() - first * cos, two.y() - first * sin), flat));
        parts.add(StartingPlan.mirror(FLAT_2, new Point(one.x() + second * cos, one.y() - second * sin), flat));
        return Outcome.of(Design.of(title, values.number(StartingInput.WAVELENGTH), Shape.RING, parts));
    }

    @Override
    public int gapLeg() {
        return 0;
    }

    @Override
    public Place crystalLeg() {
        return Place.of(CURVED_1, CURVED_2);
    }

    @Override
    public List<String> folds() {
        return List.of(CURVED_1, CURVED_2, FLAT_1, FLAT_2);
    }

    @Override
    public double begin() {
        double focus = (values.number(StartingInput.CURVED_1) + values.number(StartingInput.CURVED_2)) / 2;
        return StartingPlan.inside(values) + focus;
    }
}
