package twofold.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleFunction;
import org.apache.commons.math3.analysis.solvers.BracketingNthOrderBrentSolver;
import twofold.cavity.Chain;
import twofold.cavity.Fit;
import twofold.cavity.Trial;
import twofold.cavity.ZoneEdge;
import twofold.cavity.Zones;
import twofold.layout.Laid;
import twofold.optics.Plane;

/**
 * The angle of incidence at which folds cancel the astigmatism of what stands on a leg: where both planes have one edge of a
 * zone along that leg at one place. For a focus between two mirrors and the lower edge of its first zone this is
 * Σ R sinθ tanθ = 2 N t (Kogelnik, Ippen, Dienes &amp; Shank, IEEE J. Quantum Electron. 8, 373 (1972)); here it is solved in
 * the chain, for whatever stands on the table.
 */
public final class EqualEdges {
    /** Where a solution ends, rad: a thousandth of what a tenth of a nanometre does to a leg. */
    private static final double EXACT = 1e-15;

    private static final int MOST_STEPS = 200;
    private static final double STRIDE = 1.5;
    private static final int HALVINGS = 30;

    private final DoubleFunction<Optional<Laid>> plans;
    private final int leg;

    private EqualEdges(DoubleFunction<Optional<Laid>> plans, int leg) {
        this.plans = plans;
        this.leg = leg;
    }

    /**
     * The angles that do it, one for each zone of the sagittal plane whose lower edge mirrors can stand at, by the edge's
     * place at small angles; zones without such an angle are passed over.
     *
     * @param plans the plan at an angle of incidence, rad; empty where there is none
     * @param leg along which zones are counted
     * @param least smallest angle, rad, above 0; or the first above it that has a plan
     * @param most largest angle, rad
     */
    public static List<Double> angles(DoubleFunction<Optional<Laid>> plans, int leg, double least, double most) {
        EqualEdges search = new EqualEdges(plans, leg);
        List<Double> angles = new ArrayList<>();
        double begin = search.firstPlan(least, most);
        for (ZoneEdge edge : search.edges(begin)) {
            search.angle(edge, begin, most).ifPresent(angles::add);
        }
        return angles;
    }

    /** The smallest angle that has a plan: arms of a ring may not part at smaller ones. */
    private double firstPlan(double least, double most) {
        double good = least;
        while (good < most && plans.apply(good).isEmpty()) {
            good = Math.min(most, good * STRIDE);
        }
        double bad = good > least ? good / STRIDE : good;
        for (int i = 0; i < HALVINGS && bad < good; i++) {
            double middle = (bad + good) / 2;
            if (plans.apply(middle).isPresent()) {
                good = middle;
            } else {
                bad = middle;
            }
        }
        return good;
    }

    private List<ZoneEdge> edges(double angle) {
        return run(angle)
                .map(trial -> Zones.of(trial, leg, Plane.SAGITTAL))
                .map(zones -> zones.zones().stream()
                        .flatMap(z -> z.lower().stream())
                        .filter(e -> e.path() > zones.least())
                        .toList())
                .orElse(List.of());
    }

    private Optional<Trial> run(double angle) {
        return plans.apply(angle).map(laid -> {
            Trial trial = Chain.of(laid).trial();
            return trial.run() == Fit.FITS ? trial : null;
        });
    }

    /** How far the tangential plane has the edge beyond the sagittal, m; NaN where either has none. */
    private double split(ZoneEdge edge, double angle) {
        Optional<Trial> trial = run(angle);
        if (trial.isEmpty()) {
            return Double.NaN;
        }
        Optional<ZoneEdge> t = Zones.of(trial.get(), leg, Plane.TANGENTIAL).same(edge);
        Optional<ZoneEdge> s = Zones.of(trial.get(), leg, Plane.SAGITTAL).same(edge);
        return t.isPresent() && s.isPresent() ? t.get().path() - s.get().path() : Double.NaN;
    }

    private Optional<Double> angle(ZoneEdge edge, double least, double most) {
        double a = least;
        double atA = split(edge, a);
        while (a < most) {
            double b = Math.min(most, a * STRIDE);
            double atB = split(edge, b);
            if (!(Math.abs(atB) < Double.POSITIVE_INFINITY)) {
                return Optional.empty();
            }
            if (atA * atB <= 0) {
                return Optional.of(new BracketingNthOrderBrentSolver(EXACT, EXACT, 5)
                        .solve(MOST_STEPS, x -> split(edge, x), a, b));
            }
            a = b;
            atA = atB;
        }
        return Optional.empty();
    }
}
