package twofold.session;

import java.util.Optional;
import java.util.function.LongSupplier;
import twofold.layout.Laid;
import twofold.study.Progress;

/**
 * A long question about the design: run beside everything else, cancelled by a newer one, kept with the design that it was
 * answered for. An answer that comes fast is asked for again with every design; one that does not goes stale instead, until
 * it is asked for again. Confined to the thread that made it.
 *
 * @param <A> what is answered
 */
public final class Inquiry<A> {
    /** What is asked for again by itself takes no longer than this, ns: a few frames. */
    static final long FAST = 120_000_000;

    /** Work on a design. */
    public interface Work<A> {
        /**
         * Runs it, on another thread.
         *
         * @param progress told how far it is; stops it by false
         * @return empty where it was stopped
         */
        Optional<A> on(Laid laid, Progress progress);
    }

    private record Answer<A>(Laid laid, A value, long took) {}

    /** Work that goes on; read and stopped from other threads. */
    private static final class Run<A> implements Progress {
        private final Laid laid;
        private volatile boolean isStopped;
        private volatile double share;

        Run(Laid laid) {
            this.laid = laid;
        }

        @Override
        public boolean at(double done) {
            share = done;
            return !isStopped;
        }

        Optional<Answer<A>> answer(Work<A> work, LongSupplier clock) {
            long begin = clock.getAsLong();
            Optional<A> value = isStopped ? Optional.empty() : work.on(laid, this);
            return value.map(v -> new Answer<>(laid, v, clock.getAsLong() - begin));
        }
    }

    private final Runner runner;
    private final Runnable listener;
    private final LongSupplier clock;
    private Optional<Work<A>> work = Optional.empty();
    private Optional<Laid> laid = Optional.empty();
    private Optional<Answer<A>> answer = Optional.empty();
    private Optional<Run<A>> running = Optional.empty();
    private Optional<String> failure = Optional.empty();
    private boolean isOfOther;

    /**
     * An inquiry with nothing asked.
     *
     * @param runner to run work on
     * @param listener told of every change but progress
     */
    public Inquiry(Runner runner, Runnable listener) {
        this(runner, listener, System::nanoTime);
    }

    /** The same by another clock, which counts ns. */
    Inquiry(Runner runner, Runnable listener, LongSupplier clock) {
        this.runner = runner;
        this.listener = listener;
        this.clock = clock;
    }

    /** Forgets everything: another document. */
    public void clear() {
        stop();
        work = Optional.empty();
        laid = Optional.empty();
        answer = Optional.empty();
        failure = Optional.empty();
        listener.run();
    }

    /** Asks another question. What was answered before stays shown, as stale, until then. */
    public void ask(Work<A> next) {
        work = Optional.of(next);
        isOfOther = true;
        again();
    }

    /** Asks the same of the design as it is now. */
    public void again() {
        stop();
        failure = Optional.empty();
        if (work.isPresent() && laid.isPresent()) {
            Run<A> run = new Run<>(laid.get());
            Work<A> what = work.get();
            running = Optional.of(run);
            runner.run(() -> run.answer(what, clock), ended -> ended(run, ended));
        }
        listener.run();
    }

    /** The design is another. What is still asked of an older one is stopped, unless it will be done in a moment. */
    public void design(Laid next) {
        if (laid.equals(Optional.of(next))) {
            return;
        }
        laid = Optional.of(next);
        if (answer.isEmpty() || (isFast() && running.isEmpty())) {
            again();
        } else {
            if (!isFast()) {
                stop();
            }
            listener.run();
        }
    }

    private boolean isFast() {
        return answer.map(a -> a.took() <= FAST).orElse(false);
    }

    /** Stops what is running; what was answered before stays. */
    public void cancel() {
        if (running.isPresent()) {
            stop();
            listener.run();
        }
    }

    private void stop() {
        running.ifPresent(r -> r.isStopped = true);
        running = Optional.empty();
    }

    private void ended(Run<A> run, Runner.Ended<Optional<Answer<A>>> ended) {
        if (!running.equals(Optional.of(run))) {
            return;
        }
        running = Optional.empty();
        if (ended instanceof Runner.Ended.Failed<Optional<Answer<A>>> failed) {
            failure = Optional.of(Session.words(failed.why()));
        } else if (ended instanceof Runner.Ended.Done<Optional<Answer<A>>> done
                && done.value().isPresent()) {
            answer = done.value();
            isOfOther = false;
        }
        boolean isOutrun = failure.isEmpty() && !laid.equals(Optional.of(run.laid));
        if (isOutrun && isFast()) {
            again();
        } else {
            listener.run();
        }
    }

    /** The newest answer. */
    public Optional<A> answer() {
        return answer.map(Answer::value);
    }

    /** Whether the answer is one to an older question or of an older design. */
    public boolean isStale() {
        return answer.isPresent() && (isOfOther || !answer.map(Answer::laid).equals(laid));
    }

    /** Whether work goes on. */
    public boolean isRunning() {
        return running.isPresent();
    }

    /** How far the work that goes on has come, 0 to 1. */
    public double share() {
        return running.map(r -> r.share).orElse(0.0);
    }

    /** Why the last work failed, in words. */
    public Optional<String> failure() {
        return failure;
    }
}
