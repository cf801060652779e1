package twofold.command;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import twofold.design.Names;
import twofold.layout.Laid;
import twofold.picture.MapDrawing;
import twofold.picture.MapPlot;
import twofold.study.Asked;
import twofold.study.Axis;
import twofold.study.Mapped;
import twofold.study.Question;
import twofold.study.Survey;

/** {@code map}: a quantity over two levers, as CSV or a picture. */
@Command(
        name = "map",
        mixinStandardHelpOptions = true,
        description =
                "A quantity over two levers of the file, as CSV of three columns, the first lever fastest, or a picture.",
        footer = {
            "",
            "QUANTITY is " + Asked.FORM + ", a leg being \"Fold 1/Fold 2\".",
            "",
            "Example:",
            "  twofold map samples/z-fold-rod.json --lever gap --lever fold --of roundness@Rod --size 60x40",
            "  twofold map samples/z-fold-rod.json --lever gap --lever fold --of roundness@Rod --picture map.png"
        })
final class MapCommand implements Callable<Integer> {
    private static final Pattern SIZE = Pattern.compile("([0-9]{1,8})x([0-9]{1,8})");

    private static final Pictures.Size LEAST = new Pictures.Size(MapDrawing.LEAST_WIDTH, MapDrawing.LEAST_HEIGHT);

    private final Streams streams;

    @Parameters(paramLabel = "FILE", description = "A design file.")
    private String file = "";

    @Option(
            names = "--lever",
            paramLabel = "NAME",
            required = true,
            description = "A lever of the file; given twice, the one that runs fastest first.")
    private List<String> levers = List.of();

    @Option(names = "--of", paramLabel = "QUANTITY", required = true, description = "What to read.")
    private String quantity = "";

    @Option(
            names = "--size",
            paramLabel = "WxH",
            description = "How many values of each lever (${DEFAULT-VALUE}); a list has its own.")
    private String size = "400x300";

    @Mixin
    private final PictureOptions picture = new PictureOptions();

    @Option(names = "--progress", description = "Say on standard error how far it is, even outside a terminal.")
    private boolean withProgress;

    MapCommand(Streams streams) {
        this.streams = streams;
    }

    @Override
    public Integer call() {
        Matcher match = SIZE.matcher(size);
        if (!match.matches() || number(match, 1) < 2 || number(match, 2) < 2) {
            streams.complain(
                    "--size: found \"" + Names.shown(size) + "\"; accepted: two numbers from 2, as in 400x300");
            return Commands.USAGE;
        }
        if (levers.size() != 2 || levers.get(0).equals(levers.get(1))) {
            streams.complain("--lever: found " + (levers.size() == 2 ? "the same twice" : String.valueOf(levers.size()))
                    + "; accepted: two different levers");
            return Commands.USAGE;
        }
        Optional<PictureOptions.Wanted> wanted = picture.wanted(LEAST, streams);
        if (!picture.isPlain(streams) || wanted.isPresent() != picture.isWanted()) {
            return Commands.USAGE;
        }
        if (!picture.isWanted() && !fits(number(match, 1) * (long) number(match, 2))) {
            return Commands.USAGE;
        }
        if (picture.isWanted() && Math.max(number(match, 1), number(match, 2)) > Mapped.MOST) {
            streams.refuse("--size", size, "up to " + Mapped.MOST + "x" + Mapped.MOST + " for a picture");
            return Commands.USAGE;
        }
        Optional<Laid> laid = Opened.lay(file, streams);
        if (laid.isEmpty()) {
            return Commands.FILE;
        }
        Optional<Question> question = Levers.question(laid.get(), levers, List.of(quantity), streams);
        if (question.isEmpty()) {
            return Commands.USAGE;
        }
        Axis x = Axis.of(question.get().levers().get(0), number(match, 1));
        Axis y = Axis.of(question.get().levers().get(1), number(match, 2));
        if (wanted.isPresent()) {
            return Levers.fits(x, Mapped.MOST, streams) && Levers.fits(y, Mapped.MOST, streams)
                    ? draw(question.get(), x, y, wanted.get())
                    : Commands.USAGE;
        }
        Survey survey = new Survey(question.get(), List.of(x, y));
        return fits(survey.points())
                ? Commands.survey(new SurveyCsv(survey, List.of()), streams, "map", withProgress)
                : Commands.USAGE;
    }

    private boolean fits(long points) {
        if (points > Survey.MOST_POINTS) {
            streams.complain("--size: found " + points + " points; accepted: up to " + Survey.MOST_POINTS);
        }
        return points <= Survey.MOST_POINTS;
    }

    private int draw(Question question, Axis x, Axis y, PictureOptions.Wanted wanted) {
        return Commands.study(
                        (threads, progress) -> Mapped.of(question, x.ascending(), y.ascending(), threads, progress),
                        streams,
                        "map",
                        withProgress)
                .map(mapped -> {
                    MapDrawing drawing = new MapDrawing(MapPlot.of(mapped));
                    Pictures.Size size = wanted.size();
                    String title = question.laid().design().title() + ", "
                            + mapped.quantity().words() + " over " + levers.get(0) + " and " + levers.get(1);
                    return new Pictures(
                                    size.width(),
                                    size.height(),
                                    wanted.theme(),
                                    title,
                                    painter -> drawing.draw(painter, size.width(), size.height()))
                            .save(wanted.to(), streams);
                })
                .orElse(Commands.DONE);
    }

    private static int number(Matcher match, int group) {
        return Integer.parseInt(match.group(group));
    }
}
