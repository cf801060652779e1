package twofold.session;

import java.util.concurrent.Callable;
import java.util.function.Consumer;

/** Runs work that may take longer than a few milliseconds, and hands what came of it back to the caller's thread. */
public interface Runner {
    /** What came of work: a value, or why there is none. */
    sealed interface Ended<T> {
        /** A value. */
        record Done<T>(T value) implements Ended<T> {}

        /** What was thrown instead. */
        record Failed<T>(Exception why) implements Ended<T> {}
    }

    /**
     * Runs work.
     *
     * @param work may be slow; touches nothing that is shared
     * @param then on the caller's thread, later or at once
     * @param <T> what the work makes
     */
    <T> void run(Callable<T> work, Consumer<Ended<T>> then);

    /** Runs everything at once on the caller's thread: for tests. */
    static Runner onTheSpot() {
        return new Runner() {
            @Override
            public <T> void run(Callable<T> work, Consumer<Ended<T>> then) {
                then.accept(attempt(work));
            }
        };
    }

    /** The work's end, whichever it is. */
    static <T> Ended<T> attempt(Callable<T> work) {
        try {
            return new Ended.Done<>(work.call());
        } catch (Exception e) {
            return new Ended.Failed<>(e);
        }
    }
}
