package twofold.bench;

import java.io.IOException;
import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;
import javafx.application.Platform;

/**
 * What drawing costs: the CPU time of the toolkit's and the renderer's thread for one redraw of bench, beam and close-up of
 * the twelve-part ring at 1440 × 900 in software, and for an edit of it from the key to the finished frame, in blocks that alternate with an empty canvas
 * of that size; and the time from the start of the process to the first picture beside a window with the same stock controls and empty canvases.
 */
public final class WindowBenchmark {
    private static final int BLOCKS = 5;
    private static final int FRAMES = 120;
    private static final int STARTS = 7;

    private WindowBenchmark() {}

    /** Measures and prints; takes about a minute. */
    public static void main(String[] args) throws Exception {
        List<Double> editor = new ArrayList<>();
        List<Double> empty = new ArrayList<>();
        for (int i = 0; i < STARTS; i++) {
            editor.add(start("editor"));
            empty.add(start("empty"));
        }
        Platform.startup(() -> {});
        Platform.setImplicitExit(false);
        FirstPicture full = fx(() -> FirstPicture.open("editor", () -> {}));
        FirstPicture bare = fx(() -> FirstPicture.open("canvas", () -> {}));
        FirstPicture edit = fx(() -> FirstPicture.open("edit", () -> {}));
        List<Double> drawn = new ArrayList<>();
        List<Double> edited = new ArrayList<>();
        List<Double> floor = new ArrayList<>();
        block(full, new ArrayList<>());
        block(edit, new ArrayList<>());
        block(bare, new ArrayList<>());
        for (int i = 0; i < BLOCKS; i++) {
            block(full, drawn);
            block(edit, edited);
            block(bare, floor);
        }
        System.out.printf(
                Locale.ROOT,
                "%-34s %10s %10s %12s%n",
                "window, 1440 x 900, software",
                "median ms",
                "95 % ms",
                "÷ empty");
        row("redraw, CPU of both threads", drawn, floor);
        row("an edit, key to finished frame", edited, floor);
        row("empty canvas", floor, floor);
        row("start to first picture, wall", editor, empty);
        row("same controls, empty canvases", empty, empty);
        System.exit(0);
    }

    private static void row(String name, List<Double> values, List<Double> floor) {
        System.out.printf(
                Locale.ROOT,
                "%-34s %10.2f %10.2f %12.2f%n",
                name,
                quantile(values, 0.5),
                quantile(values, 0.95),
                quantile(values, 0.5) / quantile(floor, 0.5));
    }

    private static double quantile(List<Double> values, double share) {
        double[] sorted =
                values.stream().mapToDouble(Double::doubleValue).sorted().toArray();
        return sorted[(int) Math.min(sorted.length - 1L, Math.round(share * (sorted.length - 1)))];
    }

    private static <T> T fx(Callable<T> work) throws InterruptedException, ExecutionException {
        FutureTask<T> task = new FutureTask<>(work);
        Platform.runLater(task);
        return task.get();
    }

    /** Redraws frame by frame and notes what both threads spent on each. */
    private static void block(FirstPicture window, List<Double> to) throws Exception {
        fx(() -> {
            window.toFront();
            return true;
        });
        double before = cpu();
        for (int i = 0; i < FRAMES; i++) {
            int step = i;
            fx(() -> {
                window.redraw(step);
                return true;
            });
            window.awaitPulse();
            double now = cpu();
            to.add(now - before);
            before = now;
        }
    }

    /** CPU time of the toolkit's and the renderer's thread so far, ms. */
    private static double cpu() {
        ThreadMXBean threads = ManagementFactory.getThreadMXBean();
        return Arrays.stream(threads.getThreadInfo(threads.getAllThreadIds()))
                .filter(t -> t != null
                        && (t.getThreadName().equals("JavaFX Application Thread")
                                || t.getThreadName().startsWith("QuantumRenderer")))
                .mapToDouble(t -> threads.getThreadCpuTime(t.getThreadId()) * 1e-6)
                .sum();
    }

    /** One start of a process of its own to its first picture, ms. */
    private static double start(String what) throws IOException, InterruptedException {
        List<String> command = new ArrayList<>();
        command.add(ProcessHandle.current().info().command().orElse("java"));
        command.addAll(ManagementFactory.getRuntimeMXBean().getInputArguments());
        command.addAll(List.of("-cp", System.getProperty("java.class.path"), FirstPicture.class.getName(), what));
        Process process = new ProcessBuilder(command)
                .redirectError(ProcessBuilder.Redirect.DISCARD)
                .start();
        String text = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        if (process.waitFor() != 0) {
            throw new IllegalStateException(what + " did not start: " + text);
        }
        return Double.parseDouble(text.strip());
    }
}
