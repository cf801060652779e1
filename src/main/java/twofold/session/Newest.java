package twofold.session;

import java.util.Optional;
import java.util.function.BiConsumer;

/**
 * Runs one piece of work at a time, and of those asked for meanwhile only the newest: what was asked for last is always
 * run, and no queue grows. Confined to the thread that made it.
 *
 * @param <Q> what is asked
 * @param <A> what is answered
 */
final class Newest<Q, A> {
    /** Work on a question. */
    interface Work<Q, A> {
        A on(Q question) throws Exception;
    }

    private final Runner runner;
    private final Work<Q, A> work;
    private final BiConsumer<Q, Runner.Ended<A>> then;
    private Optional<Q> running = Optional.empty();
    private Optional<Q> next = Optional.empty();

    Newest(Runner runner, Work<Q, A> work, BiConsumer<Q, Runner.Ended<A>> then) {
        this.runner = runner;
        this.work = work;
        this.then = then;
    }

    void ask(Q question) {
        if (running.isPresent()) {
            next = Optional.of(question);
            return;
        }
        running = Optional.of(question);
        runner.run(() -> work.on(question), ended -> ended(question, ended));
    }

    private void ended(Q question, Runner.Ended<A> ended) {
        running = Optional.empty();
        Optional<Q> waiting = next;
        next = Optional.empty();
        waiting.ifPresent(this::ask);
        then.accept(question, ended);
    }
}
