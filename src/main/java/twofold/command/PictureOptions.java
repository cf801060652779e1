package twofold.command;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Option;
import twofold.picture.Theme;

/** The options of commands that write a picture in place of a table. */
final class PictureOptions {
    private static final String SIZE = "1000x640";

    @Option(
            names = "--picture",
            paramLabel = "OUT",
            description = "Writes a picture, .svg or .png by its ending, in place of the table.")
    private @Nullable String to;

    @Option(names = "--pixels", paramLabel = "WxH", description = "Its width and height in px (" + SIZE + ").")
    private @Nullable String pixels;

    @Option(names = "--theme", paramLabel = "light|dark", description = "Its colours (light).")
    private @Nullable String theme;

    /**
     * A picture that is asked for.
     *
     * @param to name of its file
     * @param size px
     * @param theme colours
     */
    record Wanted(String to, Pictures.Size size, Theme theme) {}

    /** Whether a picture is asked for. */
    boolean isWanted() {
        return to != null;
    }

    /** Whether the options make sense together; complains if not. */
    boolean isPlain(Streams streams) {
        if (to == null && pixels != null) {
            streams.refuse("--pixels", pixels, "only beside --picture");
        } else if (to == null && theme != null) {
            streams.refuse("--theme", theme, "only beside --picture");
        }
        return to != null || (pixels == null && theme == null);
    }

    /** The picture that is asked for; empty where none is, or after a complaint. */
    Optional<Wanted> wanted(Pictures.Size least, Streams streams) {
        if (to == null || !Pictures.accepts("--picture", to, streams)) {
            return Optional.empty();
        }
        String file = to;
        return Pictures.size("--pixels", pixels == null ? SIZE : pixels, least, streams)
                .flatMap(size -> Pictures.theme(theme == null ? Theme.LIGHT.word() : theme, streams)
                        .map(inks -> new Wanted(file, size, inks)));
    }
}
