package twofold.command;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import twofold.cavity.Cavity;
import twofold.design.Names;
import twofold.design.Unit;
import twofold.file.SafeFile;
import twofold.picture.Sheet;
import twofold.picture.Theme;

/** {@code draw}: the bench and the beam as a picture. */
@Command(
        name = "draw",
        mixinStandardHelpOptions = true,
        description = "The bench and the beam as a picture.",
        footer = {"", "Example:", "  twofold draw samples/z-fold-rod.json --to z-fold.svg --size 1280x800"})
final class DrawCommand implements Callable<Integer> {
    private static final Pattern SIZE = Pattern.compile("(\\d{1,5})x(\\d{1,5})");
    private static final double LARGEST = 10_000;
    private static final double LARGEST_FACTOR = 10_000;

    private final Streams streams;

    @Parameters(paramLabel = "FILE", description = "A design file.")
    private String file = "";

    @Option(
            names = "--to",
            required = true,
            paramLabel = "OUT",
            description = "The picture, .svg or .png by its ending.")
    private String to = "";

    @Option(names = "--size", paramLabel = "WxH", description = "Width and height in px (1280x800).")
    private String size = "1280x800";

    @Option(
            names = "--magnify",
            paramLabel = "N",
            description = "How many times wider than true the beam is drawn (by itself: a round factor that suits it).")
    private @Nullable Double magnify;

    @Option(names = "--theme", paramLabel = "light|dark", description = "Light or dark (light).")
    private String theme = Theme.LIGHT.word();

    DrawCommand(Streams streams) {
        this.streams = streams;
    }

    @Override
    public Integer call() {
        String ending = to.substring(to.lastIndexOf('.') + 1).toLowerCase(Locale.ROOT);
        if (ending.equals("pdf")) {
            return usage("--to", to, "a name that ends in .svg or .png; PDF is to come");
        }
        if (!List.of("svg", "png").contains(ending)) {
            return usage("--to", to, "a name that ends in .svg or .png");
        }
        Matcher pixels = SIZE.matcher(size);
        if (!pixels.matches() || !fits(pixels)) {
            return usage(
                    "--size",
                    size,
                    "width x height in px, from " + Unit.ONE.text(Sheet.LEAST_WIDTH) + "x"
                            + Unit.ONE.text(Sheet.LEAST_HEIGHT) + " to 10000x10000");
        }
        if (magnify != null && !(magnify >= 1 && magnify <= LARGEST_FACTOR)) {
            return usage("--magnify", String.valueOf(magnify), "a number from 1 to 10000");
        }
        Optional<Theme> inks = List.of(Theme.values()).stream()
                .filter(t -> t.word().equals(theme))
                .findFirst();
        if (inks.isEmpty()) {
            return usage("--theme", theme, "light or dark");
        }
        Optional<Cavity> cavity = Opened.solve(file, streams);
        if (cavity.isEmpty()) {
            return Commands.FILE;
        }
        Pictures pictures = new Pictures(
                Double.parseDouble(pixels.group(1)),
                Double.parseDouble(pixels.group(2)),
                inks.get(),
                magnify == null ? OptionalDouble.empty() : OptionalDouble.of(magnify));
        byte[] bytes = ending.equals("svg")
                ? pictures.svg(cavity.get()).getBytes(StandardCharsets.UTF_8)
                : pictures.png(cavity.get(), 1);
        return save(bytes);
    }

    private static boolean fits(Matcher pixels) {
        double width = Double.parseDouble(pixels.group(1));
        double height = Double.parseDouble(pixels.group(2));
        return width >= Sheet.LEAST_WIDTH && height >= Sheet.LEAST_HEIGHT && width <= LARGEST && height <= LARGEST;
    }

    private int usage(String option, String found, String accepted) {
        streams.complain(option + ": found \"" + Names.escaped(found) + "\"; accepted: " + accepted);
        return Commands.USAGE;
    }

    private int save(byte[] bytes) {
        try {
            SafeFile.write(Path.of(to), bytes);
            streams.out().println(to);
            return Commands.DONE;
        } catch (IOException | InvalidPathException e) {
            streams.err().println(Unreadable.line(to, e));
            return Commands.FILE;
        }
    }
}
