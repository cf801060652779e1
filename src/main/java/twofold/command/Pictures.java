package twofold.command;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import twofold.design.Unit;
import twofold.file.SafeFile;
import twofold.picture.ImagePainter;
import twofold.picture.Painter;
import twofold.picture.SvgPainter;
import twofold.picture.Theme;

/**
 * A picture in the formats that commands write.
 *
 * @param width px
 * @param height px
 * @param theme colours
 * @param title what it shows, for those who do not see it
 * @param drawing draws it
 */
record Pictures(double width, double height, Theme theme, String title, Consumer<Painter> drawing) {
    private static final Pattern SIZE = Pattern.compile("(\\d{1,5})x(\\d{1,5})");
    private static final double LARGEST = 10_000;

    /** The picture as SVG. */
    byte[] svg() {
        SvgPainter painter = new SvgPainter(width, height, theme, title);
        drawing.accept(painter);
        return painter.text().getBytes(StandardCharsets.UTF_8);
    }

    /** The picture as PNG, so many times finer than its px. */
    byte[] png(double scale) {
        ImagePainter painter = new ImagePainter(width, height, scale, theme);
        drawing.accept(painter);
        return painter.png();
    }

    /** Writes it, in the format of the name's ending, and says where; returns the exit status. */
    int save(String to, Streams streams) {
        try {
            SafeFile.write(Path.of(to), ending(to).equals("svg") ? svg() : png(1));
            streams.out().println(to);
            return Commands.DONE;
        } catch (IOException | InvalidPathException e) {
            streams.err().println(Unreadable.line(to, e));
            return Commands.FILE;
        }
    }

    private static String ending(String name) {
        return name.substring(name.lastIndexOf('.') + 1).toLowerCase(Locale.ROOT);
    }

    /** Whether a file can be written under a name by its ending; complains if not. */
    static boolean accepts(String option, String to, Streams streams) {
        if (List.of("svg", "png").contains(ending(to))) {
            return true;
        }
        String more = ending(to).equals("pdf") ? "; PDF is to come" : "";
        streams.refuse(option, to, "a name that ends in .svg or .png" + more);
        return false;
    }

    /**
     * Width and height of a picture.
     *
     * @param width px
     * @param height px
     */
    record Size(double width, double height) {}

    /** A size in px, "1280x800"; empty after a complaint. */
    static Optional<Size> size(String option, String text, Size least, Streams streams) {
        Matcher match = SIZE.matcher(text);
        if (match.matches()) {
            Size size = new Size(Double.parseDouble(match.group(1)), Double.parseDouble(match.group(2)));
            if (size.width() >= least.width()
                    && size.height() >= least.height()
                    && size.width() <= LARGEST
                    && size.height() <= LARGEST) {
                return Optional.of(size);
            }
        }
        streams.refuse(
                option,
                text,
                "width x height in px, from " + Unit.ONE.text(least.width()) + "x" + Unit.ONE.text(least.height())
                        + " to 10000x10000");
        return Optional.empty();
    }

    /** A theme by its word; empty after a complaint. */
    static Optional<Theme> theme(String word, Streams streams) {
        Optional<Theme> theme = List.of(Theme.values()).stream()
                .filter(t -> t.word().equals(word))
                .findFirst();
        if (theme.isEmpty()) {
            streams.refuse("--theme", word, "light or dark");
        }
        return theme;
    }
}
