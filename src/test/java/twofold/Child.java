package twofold;

import java.io.BufferedReader;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** A program in a process of its own, that a test can kill. */
public final class Child implements AutoCloseable {
    private final Process process;
    private final BufferedReader out;

    private Child(Process process) {
        this.process = process;
        this.out = process.inputReader(StandardCharsets.UTF_8);
    }

    /** Starts the main method of a class, with everything that this process has on its class path. */
    public static Child start(Class<?> main, String... arguments) throws IOException {
        List<String> command = new ArrayList<>(List.of(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                // What lets a short program start soonest.
                "-Xshare:auto",
                "-XX:TieredStopAtLevel=1",
                "-XX:+UseSerialGC",
                "-Xmx128m",
                "-cp",
                System.getProperty("java.class.path"),
                main.getName()));
        command.addAll(List.of(arguments));
        return new Child(new ProcessBuilder(command)
                .redirectError(ProcessBuilder.Redirect.INHERIT)
                .start());
    }

    /** The next line that the program says; null once it has ended. */
    public @Nullable String line() throws IOException {
        return out.readLine();
    }

    /** Kills the program where it stands; what it said until then can still be read. */
    public void kill() {
        // Of the process itself, this would close its output too.
        process.toHandle().destroyForcibly();
        process.onExit().join();
    }

    @Override
    public void close() throws IOException {
        kill();
        out.close();
    }
}
