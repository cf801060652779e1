package twofold.window;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.CountDownLatch;
import javafx.application.Platform;

/** Opens the window, or says why none can be opened. */
public final class Start {
    private Start() {}

    /**
     * Opens the window and returns when it is closed.
     *
     * @param arguments a file to open, or none
     * @param environment where a display is looked for
     * @param started called once the toolkit has started
     * @return why no window could be opened; empty after one was
     */
    public static Optional<String> window(List<String> arguments, Map<String, String> environment, Runnable started) {
        boolean isLinux =
                System.getProperty("os.name", "").toLowerCase(Locale.ROOT).contains("linux");
        String display = environment.getOrDefault("DISPLAY", "");
        if (isLinux && display.isEmpty()) {
            return Optional.of("DISPLAY is not set");
        }
        CountDownLatch closed = new CountDownLatch(1);
        try {
            Platform.startup(() -> {
                started.run();
                App.open(arguments).showingProperty().addListener((o, was, is) -> closed.countDown());
            });
            closed.await();
            return Optional.empty();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            return Optional.empty();
        } catch (UnsupportedOperationException | UnsatisfiedLinkError e) {
            String message = String.valueOf(e.getMessage()).lines().findFirst().orElse("");
            return Optional.of(
                    isLinux
                            ? "display " + display + " does not answer or GTK 3 is missing (" + message + ")"
                            : message);
        }
    }
}
