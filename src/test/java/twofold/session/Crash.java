package twofold.session;

import java.nio.file.Path;
import java.util.SplittableRandom;
import twofold.Samples;
import twofold.edit.Edit;
import twofold.file.DesignWriter;
import twofold.file.Journal;

/** A program that edits a sample and does not end by itself: for tests that kill it. */
public final class Crash {
    public static final String SAMPLE = "z-fold-rod";

    private Crash() {}

    /** The n-th edit. */
    static Edit edit(int n) {
        SplittableRandom random = new SplittableRandom(n);
        return Edits.move(
                n % 2 == 0 ? "Fold 1" : "End A", random.nextDouble(-1e-6, 1e-6), random.nextDouble(-1e-6, 1e-6));
    }

    /**
     * Edits in a session with a journal, and says the number of each edit once it is made.
     *
     * @param arguments the folder of journals, and after how many edits to rest
     */
    public static void main(String[] arguments) throws InterruptedException {
        Session session =
                new Session(Runner.onTheSpot(), new Journal(Path.of(arguments[0])), Runner.onTheSpot(), shown -> {});
        session.openSample(SAMPLE + ".json");
        int edits = Integer.parseInt(arguments[1]);
        for (int n = 1; n <= edits; n++) {
            session.edit(edit(n));
            System.out.println(n);
        }
        Thread.sleep(Long.MAX_VALUE);
    }

    /** The bytes of the sample after some edits. */
    public static byte[] after(int edits) {
        Session session = new Session(Runner.onTheSpot(), shown -> {});
        session.create(Samples.design(SAMPLE));
        for (int n = 1; n <= edits; n++) {
            session.edit(edit(n));
        }
        return DesignWriter.bytes(session.shown().cavity().orElseThrow().laid().design());
    }
}
