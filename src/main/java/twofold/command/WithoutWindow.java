package twofold.command;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.OptionalDouble;
import twofold.cavity.Cavity;
import twofold.file.SafeFile;
import twofold.picture.Theme;

/** The main job where no window can be opened: the text answer and the pictures, with the reason. */
public final class WithoutWindow {
    private static final Pictures.Size SIZE = new Pictures.Size(1280, 800);

    private WithoutWindow() {}

    /**
     * Answers for a file.
     *
     * @param file as typed
     * @param why no window can be opened, in words
     * @param out takes the answer and the paths of the pictures
     * @param err takes the reason and errors
     * @return the exit status
     */
    public static int answer(String file, String why, PrintStream out, PrintStream err) {
        Streams streams = new Streams(out, err, false);
        Optional<Cavity> cavity = Opened.solve(file, streams);
        if (cavity.isEmpty()) {
            return Commands.FILE;
        }
        out.print(SolveText.of(cavity.get()));
        int status = pictures(file, cavity.get(), streams);
        streams.complain("no window can be opened: " + why + "; this is the answer as text and pictures");
        return status;
    }

    private static int pictures(String file, Cavity cavity, Streams streams) {
        String last = String.valueOf(Path.of(file).getFileName());
        String name = last.endsWith(".json") ? last.substring(0, last.length() - ".json".length()) : last;
        Pictures page = DrawCommand.page(cavity, SIZE, Theme.LIGHT, OptionalDouble.empty());
        try {
            Path folder = Files.createTempDirectory("twofold-");
            Path svg = folder.resolve(name + ".svg");
            Path png = folder.resolve(name + ".png");
            SafeFile.write(svg, page.svg());
            SafeFile.write(png, page.png(2));
            streams.out().println();
            streams.out().println(svg);
            streams.out().println(png);
            return Commands.DONE;
        } catch (IOException e) {
            streams.err().println(Unreadable.line(name, e));
            return Commands.FILE;
        }
    }
}
