package twofold.window;

import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.function.Consumer;
import javafx.application.Platform;
import twofold.session.Runner;

/** Runs work on one thread beside the window's own and hands what came of it back to the window's. */
final class Background implements Runner, AutoCloseable {
    private final ExecutorService worker = Executors.newSingleThreadExecutor(work -> {
        Thread thread = new Thread(work, "twofold-background");
        thread.setDaemon(true);
        return thread;
    });

    @Override
    public <T> void run(Callable<T> work, Consumer<Ended<T>> then) {
        worker.execute(() -> {
            Ended<T> ended = Runner.attempt(work);
            Platform.runLater(() -> then.accept(ended));
        });
    }

    @Override
    public void close() {
        worker.shutdown();
    }
}
