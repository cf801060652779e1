package twofold.session;

import static org.assertj.core.api.Assertions.assertThat;

import java.lang.management.ManagementFactory;
import org.junit.jupiter.api.Test;
import twofold.Samples;
import twofold.design.Design;

/** How much a long history holds of the heap, after collections. */
class HistoryHeapTest {
    private static final int FEW = 2_000;
    private static final int MANY = 20_000;
    private static final long MB = 1 << 20;

    /** What is in use once collections no longer find anything, bytes. */
    private static long heap() throws InterruptedException {
        long least = Long.MAX_VALUE;
        for (int unchanged = 0; unchanged < 3; unchanged++) {
            System.gc();
            Thread.sleep(20);
            long now = ManagementFactory.getMemoryMXBean().getHeapMemoryUsage().getUsed();
            if (now < least - 10_000) {
                least = now;
                unchanged = 0;
            }
        }
        return least;
    }

    private static void edit(Session session, int from, int to) {
        for (int i = from; i < to; i++) {
            assertThat(session.edit(Edits.move(i % 2 == 0 ? "Fold 1" : "Fold 2", (i % 7 - 3) * 1e-7, 1e-8))
                            .problems())
                    .isEmpty();
        }
    }

    @Test
    void aLongHistoryHoldsLittleAndADroppedOneNothing() throws Exception {
        Session session = new Session(Runner.onTheSpot(), s -> {});
        Design design = Samples.design("z-fold-rod");
        session.create(design);
        edit(session, 0, FEW);
        long few = heap();
        edit(session, FEW, MANY);
        double each = (double) (heap() - few) / (MANY - FEW);
        for (int i = FEW; i < MANY; i++) {
            session.undo();
        }
        edit(session, 0, 1);
        long dropped = heap() - few;
        System.getLogger(HistoryHeapTest.class.getName())
                .log(
                        System.Logger.Level.INFO,
                        "a step of history holds {0} bytes; once {1} undone ones are dropped, {2} bytes more than before",
                        Math.round(each),
                        MANY - FEW,
                        dropped);
        assertThat(dropped).as("bytes that a dropped history left").isLessThan(2 * MB);
        // A design, its list of parts and the one mirror that moved; a plan or an answer would be some 10 kB.
        assertThat(each).as("bytes of a step").isLessThan(400);
        assertThat(session.shown().undo()).isPresent();
    }
}
