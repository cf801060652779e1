package twofold.cavity;

import static org.assertj.core.api.Assertions.assertThat;

import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;
import org.junit.jupiter.api.Test;
import twofold.bench.TwelvePartRing;
import twofold.layout.Layout;
import twofold.optics.Plane;

/** The walk and what is read off it allocate nothing, so that a map of millions of points makes no garbage. */
class AllocationTest {
    /** What the counters themselves and a late compilation may take, bytes in all, over {@link #RUNS} runs. */
    private static final long SLACK = 64 * 1024;

    private static final int RUNS = 200_000;

    @Test
    void oneEvaluationAllocatesNothing() {
        Chain chain = Chain.of(Layout.of(TwelvePartRing.design()).value().orElseThrow());
        Trial trial = chain.trial();
        assertThat(trial.run()).isEqualTo(Fit.FITS);
        assertThat(trial.margin(Plane.TANGENTIAL)).isPositive();
        assertThat(trial.margin(Plane.SAGITTAL)).isPositive();
        // Interpreted code keeps every walker on the heap; escape analysis needs the compiled one.
        spin(chain, trial, RUNS);
        ThreadMXBean threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();
        long before = threads.getCurrentThreadAllocatedBytes();
        double sum = spin(chain, trial, RUNS);
        long bytes = threads.getCurrentThreadAllocatedBytes() - before;
        assertThat(sum).isFinite();
        assertThat(bytes).as("bytes in %d runs", RUNS).isLessThan(SLACK);
    }

    private static double spin(Chain chain, Trial trial, int runs) {
        double sum = 0;
        int x = chain.x(0);
        double place = trial.get(x);
        for (int i = 0; i < runs; i++) {
            trial.set(x, place + 1e-9 * (i % 7));
            trial.run();
            sum += trial.halfTrace(Plane.TANGENTIAL) + trial.radius(0, Face.SURFACE, Plane.SAGITTAL);
        }
        trial.set(x, place);
        return sum;
    }
}
