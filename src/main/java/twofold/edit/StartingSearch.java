package twofold.edit;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import twofold.cavity.Chain;
import twofold.cavity.Fit;
import twofold.cavity.Trial;
import twofold.design.Lever;
import twofold.design.Problem;
import twofold.design.Subject;
import twofold.design.Unit;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.layout.Outcome;
import twofold.optics.Plane;
import twofold.study.EqualEdges;
import twofold.study.StableStretches;
import twofold.study.Stretch;

/** Where a starting shape's two unknowns, the incidence on its folds and its gap, make both planes stable. */
final class StartingSearch {
    /** Where a compensating angle is looked for, rad; above 60° the program warns of an incidence. */
    private static final double LEAST_ANGLE = Math.toRadians(0.05);

    private static final double MOST_ANGLE = Math.toRadians(60);

    /** An angle of a usual fold, rad; common practice, no source. */
    private static final double USUAL_ANGLE = Math.toRadians(10);

    /** A gap is found when it moves by less, m: the rounding of a plan. */
    private static final double STILL = 1e-14;

    /** Below this a secant says nothing. */
    private static final double LEAST_SLOPE = 0.1;

    private static final int MOST_STEPS = 40;
    private static final int SAMPLES = 401;

    /** By how much stretches may differ in length, as a share, and count as equal: then the lower one is taken. */
    private static final double EQUAL = 1e-9;

    private final StartingShape shape;
    private final StartingValues values;
    private final StartingPlan plan;

    /**
     * A place inside a zone.
     *
     * @param laid the plan there
     * @param incidence on the folds, rad
     * @param stretch of the gap in which both planes are stable, m
     */
    record Found(Laid laid, double incidence, Stretch stretch) {}

    private StartingSearch(StartingShape shape, StartingValues values) {
        this.shape = shape;
        this.values = values;
        plan = shape.plan(values);
    }

    /** The place inside a zone, or why there is none, for values that have been checked. */
    static Outcome<Found> of(StartingShape shape, StartingValues values) {
        return new StartingSearch(shape, values).find();
    }

    private Outcome<Found> find() {
        if (shape == StartingShape.TRIANGLE) {
            return triangle();
        }
        OptionalDouble length = values.find(StartingInput.LENGTH);
        if (shape == StartingShape.TWO_MIRROR && length.isPresent()) {
            return at(length.getAsDouble(), StartingInput.LENGTH);
        }
        if (plan.folds().isEmpty()) {
            return settle(gap -> List.of(0.0));
        }
        if (values.cut() != CrystalCut.BREWSTER) {
            return settle(gap -> List.of(values.number(StartingInput.INCIDENCE)));
        }
        return settle(
                gap -> EqualEdges.angles(angle -> laid(angle, gap).value(), plan.gapLeg(), LEAST_ANGLE, MOST_ANGLE));
    }

    private Outcome<Laid> laid(double incidence, double gap) {
        return plan.at(incidence, gap).then(Layout::of);
    }

    /** Goes to the middle of the stretch, by secants: what follows the gap may move the stretch. */
    private Outcome<Found> settle(DoubleFunction<List<Double>> angles) {
        double gap = plan.begin();
        double before = Double.NaN;
        double missedBefore = Double.NaN;
        for (int i = 0; i < MOST_STEPS; i++) {
            Outcome<Found> here = best(gap, angles.apply(gap));
            if (here.value().isEmpty()) {
                return here;
            }
            double missed = here.value().get().stretch().middle() - gap;
            if (Math.abs(missed) <= STILL) {
                return isStable(here.value().get().laid())
                        ? here
                        : refused("found both planes at the edge of stability in the middle of the gap's stretch");
            }
            double slope = (missed - missedBefore) / (gap - before);
            double next = gap + (Math.abs(slope) > LEAST_SLOPE ? -missed / slope : missed);
            before = gap;
            missedBefore = missed;
            gap = next;
        }
        return refused("found no gap: the zone moves away from it");
    }

    /** The widest stretch of the first angle that has one. */
    private Outcome<Found> best(double gap, List<Double> angles) {
        if (angles.isEmpty()) {
            Outcome<Laid> any = laid(USUAL_ANGLE, gap);
            return any.value().isEmpty()
                    ? Outcome.failed(any.problems())
                    : refused("found no incidence up to " + Unit.DEG.shown(MOST_ANGLE)
                            + "° at which both planes have the lower edge of a zone at one gap");
        }
        Outcome<Found> last = Outcome.failed(List.of());
        for (double angle : angles) {
            Outcome<Laid> laid = laid(angle, gap);
            if (laid.value().isEmpty()) {
                last = Outcome.failed(laid.problems());
                continue;
            }
            StableStretches stretches = along(laid.value().get());
            Optional<Stretch> widest = widest(stretches);
            if (widest.isPresent()) {
                return Outcome.of(new Found(laid.value().get(), angle, widest.get()));
            }
            last = refused("found no gap at which both planes are stable"
                    + (plan.folds().isEmpty() ? "" : ", at an incidence of " + Unit.DEG.shown(angle) + "°") + ": "
                    + stretches.words());
        }
        return last;
    }

    private StableStretches along(Laid laid) {
        return shape == StartingShape.TRIANGLE
                ? StableStretches.alongLever(laid, height(), SAMPLES)
                : StableStretches.alongLeg(laid, plan.gapLeg());
    }

    /** A triangle's apex of radius R closes round trips up to 2R, to first order, so its height stays below R. */
    private Lever height() {
        double most = 1.05 * values.number(StartingInput.APEX);
        return plan.lever(most / SAMPLES, most);
    }

    private static Trial run(Laid laid) {
        Trial trial = Chain.of(laid).trial();
        Fit fit = trial.run();
        if (fit != Fit.FITS) {
            throw new IllegalStateException("a plan that was laid out does not fit: " + fit);
        }
        return trial;
    }

    private static Optional<Stretch> widest(StableStretches stretches) {
        Optional<Stretch> widest = Optional.empty();
        for (Stretch stretch : stretches.both()) {
            if (widest.isEmpty()
                    || stretch.length() > (1 + EQUAL) * widest.get().length()) {
                widest = Optional.of(stretch);
            }
        }
        return widest;
    }

    private static boolean isStable(Laid laid) {
        Trial trial = run(laid);
        return trial.hasBeam(Plane.TANGENTIAL) && trial.hasBeam(Plane.SAGITTAL);
    }

    /** At a gap that follows from a value. */
    private Outcome<Found> at(double gap, StartingInput input) {
        Outcome<Laid> laid = laid(0, gap);
        if (laid.value().isEmpty()) {
            return Outcome.failed(laid.problems());
        }
        StableStretches stretches = along(laid.value().get());
        return stretches.both().stream()
                .filter(s -> s.distance(gap) == 0 && isStable(laid.value().get()))
                .findFirst()
                .map(s -> Outcome.of(new Found(laid.value().get(), 0, s)))
                .orElseGet(() -> Outcome.failed(new Problem(
                        Subject.DOCUMENT.at(input.words()),
                        "found " + input.shown(values.number(input)) + ", where not both planes are stable: "
                                + stretches.words(),
                        "a stable one")));
    }

    private Outcome<Found> triangle() {
        OptionalDouble perimeter = values.find(StartingInput.PERIMETER);
        if (perimeter.isPresent()) {
            double base = values.number(StartingInput.BASE);
            return at(TrianglePlan.height(base, perimeter.getAsDouble()), StartingInput.PERIMETER);
        }
        return settle(gap -> List.of(0.0));
    }

    private static Outcome<Found> refused(String found) {
        return Outcome.failed(new Problem(Subject.DOCUMENT, found, "other values"));
    }
}
