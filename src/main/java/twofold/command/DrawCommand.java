package twofold.command;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import twofold.cavity.Cavity;
import twofold.picture.Sheet;
import twofold.picture.Theme;

/** {@code draw}: the bench and the beam as a picture. */
@Command(
        name = "draw",
        mixinStandardHelpOptions = true,
        description = "The bench and the beam as a picture.",
        footer = {"", "Example:", "  twofold draw samples/z-fold-rod.json --to z-fold.svg --size 1280x800"})
final class DrawCommand implements Callable<Integer> {
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
        if (!Pictures.accepts("--to", to, streams)) {
            return Commands.USAGE;
        }
        Optional<Pictures.Size> pixels =
                Pictures.size("--size", size, new Pictures.Size(Sheet.LEAST_WIDTH, Sheet.LEAST_HEIGHT), streams);
        if (pixels.isEmpty()) {
            return Commands.USAGE;
        }
        if (magnify != null && !(magnify >= 1 && magnify <= LARGEST_FACTOR)) {
            streams.refuse("--magnify", String.valueOf(magnify), "a number from 1 to 10000");
            return Commands.USAGE;
        }
        Optional<Theme> inks = Pictures.theme(theme, streams);
        if (inks.isEmpty()) {
            return Commands.USAGE;
        }
        Optional<Cavity> cavity = Opened.solve(file, streams);
        if (cavity.isEmpty()) {
            return Commands.FILE;
        }
        OptionalDouble factor = magnify == null ? OptionalDouble.empty() : OptionalDouble.of(magnify);
        return page(cavity.get(), pixels.get(), inks.get(), factor).save(to, streams);
    }

    /** The page of a cavity, its beam so many times wider than true, or by itself. */
    static Pictures page(Cavity cavity, Pictures.Size size, Theme theme, OptionalDouble factor) {
        return new Pictures(
                size.width(),
                size.height(),
                theme,
                cavity.laid().design().title(),
                painter -> Sheet.draw(cavity, painter, size.width(), size.height(), factor));
    }
}
