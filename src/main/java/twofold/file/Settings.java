package twofold.file;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import java.io.IOException;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/**
 * What the window remembers between starts. Losing it costs a person nothing but comfort, so a file that cannot be read
 * gives the defaults.
 *
 * @param isDark whether the theme is dark
 * @param width of the window, px
 * @param height of the window, px
 * @param isMaximised whether the window fills the screen
 * @param splits positions of the dividers, 0 to 1, in the order of the window
 * @param recent files opened, the newest first
 */
public record Settings(
        boolean isDark, double width, double height, boolean isMaximised, List<Double> splits, List<String> recent) {
    /** A window that fits most screens, light. */
    public static final Settings DEFAULTS =
            new Settings(false, 1440, 900, false, List.of(0.74, 0.58, 0.7, 0.6), List.of());

    private static final int MOST_RECENT = 10;
    private static final int MOST_BYTES = 100_000;

    /** Copies the lists. */
    public Settings {
        splits = List.copyOf(splits);
        recent = List.copyOf(recent);
    }

    /** The file of settings in the platform's configuration folder. */
    public static Path usualFile(Map<String, String> environment, String home) {
        String configured = environment.getOrDefault("XDG_CONFIG_HOME", "");
        Path folder = configured.isEmpty() ? Path.of(home, ".config") : Path.of(configured);
        return folder.resolve("twofold").resolve("settings.json");
    }

    /** These settings with a file at the head of the recent ones. */
    public Settings opened(Path file) {
        List<String> all = new ArrayList<>(recent);
        String name = file.toAbsolutePath().normalize().toString();
        all.remove(name);
        all.add(0, name);
        return new Settings(
                isDark, width, height, isMaximised, splits, all.subList(0, Math.min(MOST_RECENT, all.size())));
    }

    /** These settings in another theme. */
    public Settings dark(boolean dark) {
        return new Settings(dark, width, height, isMaximised, splits, recent);
    }

    /** These settings with the window as it is. */
    public Settings sized(double wide, double high, boolean maximised, List<Double> dividers) {
        return new Settings(isDark, wide, high, maximised, dividers, recent);
    }

    /** The settings in a file; the defaults where there are none that can be read. */
    public static Settings read(Path file) {
        try {
            return Files.exists(file) ? parsed(SafeFile.read(file, MOST_BYTES)) : DEFAULTS;
        } catch (IOException e) {
            System.getLogger(Settings.class.getName())
                    .log(System.Logger.Level.WARNING, "settings cannot be read, defaults are used: " + file, e);
            return DEFAULTS;
        }
    }

    private static Settings parsed(byte[] bytes) throws IOException {
        boolean dark = DEFAULTS.isDark;
        double wide = DEFAULTS.width;
        double high = DEFAULTS.height;
        boolean maximised = DEFAULTS.isMaximised;
        List<Double> splits = new ArrayList<>();
        List<String> recent = new ArrayList<>();
        try (JsonParser parser = new JsonFactory().createParser(new String(bytes, StandardCharsets.UTF_8))) {
            String list = "";
            for (JsonToken t = parser.nextToken(); t != null; t = parser.nextToken()) {
                String name = String.valueOf(parser.currentName());
                if (t == JsonToken.START_ARRAY) {
                    list = name;
                } else if (t == JsonToken.END_ARRAY) {
                    list = "";
                } else if (t == JsonToken.VALUE_STRING && list.equals("recent")) {
                    recent.add(parser.getText());
                } else if (t.isNumeric() && list.equals("splits")) {
                    splits.add(Math.min(0.95, Math.max(0.05, parser.getDoubleValue())));
                } else if (t.isBoolean() && name.equals("dark")) {
                    dark = parser.getBooleanValue();
                } else if (t.isBoolean() && name.equals("maximised")) {
                    maximised = parser.getBooleanValue();
                } else if (t.isNumeric() && name.equals("width")) {
                    wide = Math.min(20_000, Math.max(200, parser.getDoubleValue()));
                } else if (t.isNumeric() && name.equals("height")) {
                    high = Math.min(20_000, Math.max(200, parser.getDoubleValue()));
                }
            }
        }
        boolean isWhole = splits.size() == DEFAULTS.splits.size();
        return new Settings(dark, wide, high, maximised, isWhole ? splits : DEFAULTS.splits, recent);
    }

    /** Writes the settings to a file, whose folder is made where it lacks. */
    public void write(Path file) throws IOException {
        StringWriter text = new StringWriter();
        try (JsonGenerator json = new JsonFactory().createGenerator(text)) {
            json.setPrettyPrinter(new DefaultPrettyPrinter());
            json.writeStartObject();
            json.writeBooleanField("dark", isDark);
            json.writeNumberField("width", width);
            json.writeNumberField("height", height);
            json.writeBooleanField("maximised", isMaximised);
            json.writeArrayFieldStart("splits");
            for (double split : splits) {
                json.writeNumber(split);
            }
            json.writeEndArray();
            json.writeArrayFieldStart("recent");
            for (String name : recent) {
                json.writeString(name);
            }
            json.writeEndArray();
            json.writeEndObject();
        }
        Path folder = file.toAbsolutePath().getParent();
        if (folder != null) {
            Files.createDirectories(folder);
        }
        SafeFile.write(file, text.append('\n').toString().getBytes(StandardCharsets.UTF_8));
    }
}
