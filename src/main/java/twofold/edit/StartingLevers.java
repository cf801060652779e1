package twofold.edit;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import twofold.design.Design;
import twofold.design.Hold;
import twofold.design.Lever;
import twofold.design.Place;
import twofold.design.Unit;
import twofold.study.Stretch;

/** What a starting shape has beside its parts: the hold of its crystal's leg, and levers for its gap and its folds. */
final class StartingLevers {
    /** How far the gap's lever reaches beyond the zone, as a share of it. */
    private static final double BEYOND = 0.1;

    private static final double LEAST_FOLD = 0.5;
    private static final double MOST_FOLD = 60;

    private StartingLevers() {}

    static Design added(StartingPlan plan, StartingValues values, StartingSearch.Found found) {
        Design design = found.laid().design();
        List<Hold> holds = values.hasCrystal() ? List.of(new Hold.Leg(plan.crystalLeg())) : List.of();
        List<Lever> levers = new ArrayList<>();
        if (!plan.folds().isEmpty()) {
            double degrees = Unit.DEG.fromSi(found.incidence());
            double from = Math.max(LEAST_FOLD, Math.floor(degrees / 2));
            double to = Math.min(MOST_FOLD, Math.ceil(2 * degrees));
            Lever.Range span = new Lever.Range.Span(Unit.DEG.toSi(from), Unit.DEG.toSi(to));
            List<Place> folds = plan.folds().stream().map(Place::of).toList();
            levers.add(new Lever("fold", "incidence_deg", folds, span, false));
        }
        levers.add(gap(plan, values, found.stretch()));
        return new Design(
                design.title(),
                design.notes(),
                design.wavelength(),
                design.shape(),
                design.parts(),
                holds,
                levers,
                design.requirements(),
                design.tolerances());
    }

    /** Over the zone and a little beyond, in round millimetres. */
    private static Lever gap(StartingPlan plan, StartingValues values, Stretch stretch) {
        BigDecimal length = BigDecimal.valueOf(Unit.MM.fromSi(stretch.length()));
        // In hundredths of the zone's order: 4.3 mm in steps of 0.01 mm.
        int scale = 2 - (length.precision() - length.scale() - 1);
        double beyond = BEYOND * stretch.length();
        double least = StartingPlan.inside(values) + beyond;
        double from = round(Math.max(stretch.from() - beyond, least), scale);
        double to = round(stretch.to() + beyond, scale);
        return plan.lever(from, to);
    }

    private static double round(double metres, int scale) {
        BigDecimal exact = BigDecimal.valueOf(Unit.MM.fromSi(metres));
        return Unit.MM.toSi(exact.setScale(scale, RoundingMode.CEILING));
    }
}
