package twofold.file;

import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;

/** Where the platform keeps what programs remember. */
public final class Folders {
    private static final String PROGRAM = "twofold";

    private Folders() {}

    /**
     * The folder of the program's state, which may not be there yet: journals lie in it. On Linux by the XDG Base Directory
     * Specification; on macOS in Application Support, on Windows in the local application data.
     *
     * @param environment of the process
     * @param home the person's folder
     * @param system the name of the operating system, as Java's os.name
     */
    public static Path state(Map<String, String> environment, String home, String system) {
        String name = system.toLowerCase(Locale.ROOT);
        if (name.contains("windows")) {
            String local = environment.getOrDefault("LOCALAPPDATA", "");
            return (local.isEmpty() ? Path.of(home, "AppData", "Local") : Path.of(local)).resolve(PROGRAM);
        }
        if (name.contains("mac")) {
            return Path.of(home, "Library", "Application Support", PROGRAM);
        }
        String stated = environment.getOrDefault("XDG_STATE_HOME", "");
        // The specification has relative folders ignored.
        boolean isUsable = !stated.isEmpty() && Path.of(stated).isAbsolute();
        return (isUsable ? Path.of(stated) : Path.of(home, ".local", "state")).resolve(PROGRAM);
    }
}
