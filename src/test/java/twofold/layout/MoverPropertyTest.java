package twofold.layout;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SplittableRandom;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import twofold.RandomDesigns;
import twofold.design.Design;
import twofold.design.Hold;
import twofold.design.Place;
import twofold.design.Shape;

/** What moving mirrors must keep, on random designs of all kinds of part, measured by laying them out anew. */
class MoverPropertyTest {
    /** Rounding of a plan of about 1 m, some hundred units in the last place: legs m, angles rad. */
    private static final double ROUNDING = 1e-12;

    private static List<Target> targets(Laid laid) {
        List<Target> all = new ArrayList<>();
        for (int leg = 0; leg < laid.legs().size(); leg++) {
            all.add(new Target.Leg(leg));
        }
        int mirrors = laid.design().mirrors().size();
        boolean ring = laid.design().shape() == Shape.RING;
        for (int m = ring ? 0 : 1; m < (ring ? mirrors : mirrors - 1); m++) {
            all.add(new Target.Incidence(m));
        }
        return all;
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3})
    void aRigidArmChangesNothingElse(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        int seen = 0;
        for (int n = 0; n < 60; n++) {
            Design design = RandomDesigns.of(1000 * seed + n);
            if (design.shape() == Shape.RING) {
                continue;
            }
            Laid laid = Moved.laid(Moved.with(design, List.of()));
            for (Target target : targets(laid)) {
                Mover mover = Mover.of(laid, List.of(List.of(target)));
                assertThat(mover.isClosedForm()).isTrue();
                double wanted = target.value(Plan.of(laid)) + random.nextDouble(0, 0.1);
                Optional<Laid> moved = Moved.layout(laid, mover, wanted);
                if (moved.isEmpty()) {
                    continue;
                }
                seen++;
                Plan after = Plan.of(moved.get());
                for (Target other : targets(laid)) {
                    double expected = other.equals(target) ? wanted : other.value(Plan.of(laid));
                    assertThat(other.value(after))
                            .as("%s of %s", other, design.title())
                            .isCloseTo(expected, within(ROUNDING));
                }
            }
        }
        assertThat(seen).isGreaterThan(50);
    }

    @ParameterizedTest
    @ValueSource(longs = {4, 5})
    void ringsKeepTheirHoldsAndReachTheValue(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        int reached = 0;
        int tried = 0;
        for (int n = 0; n < 60; n++) {
            Design design = RandomDesigns.of(1000 * seed + n);
            if (design.shape() != Shape.RING || design.mirrors().size() < 4) {
                continue;
            }
            Laid bare = Moved.laid(Moved.with(design, List.of()));
            List<Target> all = new ArrayList<>(targets(bare));
            Target target = all.remove(random.nextInt(all.size()));
            List<Hold> holds = new ArrayList<>();
            List<Target> held = new ArrayList<>();
            for (int i = random.nextInt(3); i > 0; i--) {
                Target t = all.remove(random.nextInt(all.size()));
                held.add(t);
                holds.add(hold(design, t));
            }
            if (random.nextBoolean()) {
                holds.add(new Hold.Position(design.mirrors().get(0).name()));
            }
            Laid laid = Moved.laid(Moved.with(design, holds));
            Mover mover = Mover.of(laid, List.of(List.of(target)));
            // m or rad
            double wanted = target.value(Plan.of(laid)) + random.nextDouble(-0.01, 0.01);
            tried++;
            Plan plan = Plan.of(laid);
            if (!mover.move(new double[] {wanted}, plan)) {
                continue;
            }
            reached++;
            assertThat(target.value(plan)).as(design.title()).isCloseTo(wanted, within(tolerance(target)));
            for (Target t : held) {
                assertThat(t.value(plan)).as(design.title()).isCloseTo(t.value(Plan.of(laid)), within(tolerance(t)));
            }
            if (holds.size() > held.size()) {
                assertThat(plan.places().get(0)).isEqualTo(Moved.places(laid).get(0));
            }
        }
        assertThat(tried).isGreaterThan(15);
        assertThat(reached).isGreaterThan(tried * 9 / 10);
    }

    private static double tolerance(Target target) {
        return target instanceof Target.Leg ? 1e-12 : 1e-9;
    }

    private static Hold hold(Design design, Target target) {
        List<String> names = design.mirrors().stream().map(m -> m.name()).toList();
        if (target instanceof Target.Leg t) {
            return new Hold.Leg(Place.of(names.get(t.leg()), names.get((t.leg() + 1) % names.size())));
        }
        return new Hold.Incidence(names.get(((Target.Incidence) target).mirror()));
    }

    /** No random movement that reaches the value and keeps the holds, found by projecting shaken plans, is smaller. */
    @ParameterizedTest
    @ValueSource(longs = {6, 7, 8})
    void theMovementIsTheLeast(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        Design design = RandomDesigns.of(seed);
        for (long s = seed; design.shape() != Shape.RING; s += 10) {
            design = RandomDesigns.of(s);
        }
        Laid laid = Moved.laid(Moved.with(design, List.of()));
        Plan rest = Plan.of(laid);
        Target target = new Target.Leg(0);
        double wanted = rest.path(0) + 0.02;
        Plan best = rest.copy();
        assertThat(Mover.of(laid, List.of(List.of(target))).move(new double[] {wanted}, best))
                .isTrue();
        for (int i = 0; i < 200; i++) {
            Plan other = best.copy();
            for (int m = 0; m < other.mirrors(); m++) {
                other.x[m] += 1e-4 * random.nextDouble(-1, 1);
                other.y[m] += 1e-4 * random.nextDouble(-1, 1);
            }
            // Back to the value, along the leg.
            double by = (wanted - other.path(0)) / 2;
            double angle = other.direction(0);
            other.x[0] -= by * Math.cos(angle);
            other.y[0] -= by * Math.sin(angle);
            other.x[1] += by * Math.cos(angle);
            other.y[1] += by * Math.sin(angle);
            assertThat(other.path(0)).isCloseTo(wanted, within(1e-9));
            assertThat(squares(rest, other)).isGreaterThan(squares(rest, best) - 1e-11);
        }
    }

    private static double squares(Plan a, Plan b) {
        double sum = 0;
        for (int m = 0; m < a.mirrors(); m++) {
            sum += Math.pow(a.x[m] - b.x[m], 2) + Math.pow(a.y[m] - b.y[m], 2);
        }
        return sum;
    }
}
