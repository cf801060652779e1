package twofold;

import static org.assertj.core.api.Assertions.assertThat;

import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;
import java.util.function.IntToDoubleFunction;
import twofold.cavity.Chain;
import twofold.cavity.Trial;
import twofold.layout.Layout;
import twofold.optics.Plane;

/** What a piece of work allocates once it is compiled. */
public final class Allocated {
    /** What the counters themselves and a late compilation may take, bytes in all, over {@link #RUNS} runs. */
    private static final long SLACK = 64 * 1024;

    private static final int RUNS = 50_000;

    /** So long are runs repeated, ns, until the compiler, whose cores may be busy, has come round to them. */
    private static final long PATIENCE = 60_000_000_000L;

    private static final int KINDS = 24;
    private static final int WALKS = 4000;

    private Allocated() {}

    /** Walks standing waves and rings with every kind of part, so that the compiler has seen them all. */
    public static void seeEveryKind() {
        double sum = 0;
        for (int seed = 0; seed < KINDS; seed++) {
            Trial trial = Chain.of(Layout.of(RandomDesigns.of(seed)).value().orElseThrow())
                    .trial();
            for (int i = 0; i < WALKS; i++) {
                trial.run();
                sum += trial.halfTrace(Plane.TANGENTIAL);
            }
        }
        assertThat(sum).isFinite();
    }

    /** Asserts that work allocates nothing; it is given the number of the run and returns a finite number. */
    public static void nothing(IntToDoubleFunction run) {
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
