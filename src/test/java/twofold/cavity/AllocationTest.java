package twofold.cavity;

import static org.assertj.core.api.Assertions.assertThat;

import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;
import java.util.Optional;
import java.util.function.IntToDoubleFunction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import twofold.bench.TwelvePartRing;
import twofold.design.Place;
import twofold.design.Quantity;
import twofold.layout.Layout;
import twofold.optics.Plane;

/** The walk and what is read off it allocate nothing, so that a map of millions of points makes no garbage. */
class AllocationTest {
    /** What the counters themselves and a late compilation may take, bytes in all, over {@link #RUNS} runs. */
    private static final long SLACK = 64 * 1024;

    private static final int RUNS = 50_000;

    /** So long are runs repeated, ns, until the compiler, whose cores may be busy, has come round to them. */
    private static final long PATIENCE = 60_000_000_000L;

    @Test
    void oneEvaluationAllocatesNothing() {
        Chain chain = Chain.of(Layout.of(TwelvePartRing.design()).value().orElseThrow());
        Trial trial = chain.trial();
        assertThat(trial.run()).isEqualTo(Fit.FITS);
        assertThat(trial.margin(Plane.TANGENTIAL)).isPositive();
        assertThat(trial.margin(Plane.SAGITTAL)).isPositive();
        int x = chain.x(0);
        double place = trial.get(x);
        allocatesNothing(i -> {
            trial.set(x, place + 1e-9 * (i % 7));
            trial.run();
            return trial.halfTrace(Plane.TANGENTIAL) + trial.radius(0, Face.SURFACE, Plane.SAGITTAL);
        });
    }

    /** Every quantity of the light, wherever it can be read; zones, clearances and the plan's box may allocate. */
    @ParameterizedTest
    @EnumSource(
            mode = EnumSource.Mode.EXCLUDE,
            names = {"ZONE_EDGE_SPLIT", "ZONE_OVERLAP", "CLEARANCE", "PLAN_WIDTH", "PLAN_DEPTH"})
    void readingLightAllocatesNothing(Quantity what) {
        Chain chain = Chain.of(Layout.of(TwelvePartRing.design()).value().orElseThrow());
        Trial trial = chain.trial();
        trial.run();
        Optional<Place> at = switch (what.where()) {
            case NOWHERE, ANYWHERE_OR_PART -> Optional.empty();
            case PART -> Optional.of(Place.of(what == Quantity.CLIP_LOSS ? "M3" : "Pumped"));
            case PART_OR_STRETCH, CRYSTAL, SLAB -> Optional.of(Place.of("Pumped"));
            case SLAB_OR_STRETCH -> Optional.of(Place.of("M4", "Pumped"));
            case MIRROR -> Optional.of(Place.of("M3"));
            case LEG -> Optional.of(Place.of("M3", "M4"));
        };
        Optional<Plane> plane = what.hasPlane() ? Optional.of(Plane.TANGENTIAL) : Optional.empty();
        Reading reading = Reading.of(what, at, plane, Optional.empty(), chain);
        assertThat(reading.of(trial)).isFinite();
        allocatesNothing(i -> reading.of(trial));
    }

    private static void allocatesNothing(IntToDoubleFunction run) {
        // Interpreted code keeps every walker on the heap; escape analysis needs the compiled one.
        ThreadMXBean threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();
        long bytes = Long.MAX_VALUE;
        double sum = 0;
        long start = System.nanoTime();
        while (bytes >= SLACK && System.nanoTime() - start < PATIENCE) {
            long before = threads.getCurrentThreadAllocatedBytes();
            for (int i = 0; i < RUNS; i++) {
                sum += run.applyAsDouble(i);
            }
            bytes = threads.getCurrentThreadAllocatedBytes() - before;
        }
        assertThat(sum).isFinite();
        assertThat(bytes).as("bytes in %d runs", RUNS).isLessThan(SLACK);
    }
}
