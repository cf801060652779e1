package twofold.session;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.concurrent.Callable;
import java.util.function.Consumer;

/** Holds work back until the test lets it run. */
final class Later implements Runner {
    private final Deque<Runnable> waiting = new ArrayDeque<>();

    @Override
    public <T> void run(Callable<T> work, Consumer<Ended<T>> then) {
        waiting.add(() -> then.accept(Runner.attempt(work)));
    }

    int count() {
        return waiting.size();
    }

    void runOne() {
        waiting.remove().run();
    }

    void runLast() {
        waiting.removeLast().run();
    }

    void runAll() {
        while (!waiting.isEmpty()) {
            runOne();
        }
    }
}
