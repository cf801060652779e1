package twofold.command;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.stream.Stream;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import twofold.design.Quantity;
import twofold.layout.Laid;
import twofold.optics.Plane;
import twofold.picture.SweepDrawing;
import twofold.picture.SweepPlot;
import twofold.study.Asked;
import twofold.study.Axis;
import twofold.study.Question;
import twofold.study.Survey;
import twofold.study.Swept;
import twofold.study.ZonesAlong;

/** {@code sweep}: quantities over one lever, as CSV or a picture. */
@Command(
        name = "sweep",
        mixinStandardHelpOptions = true,
        description = "Quantities over one lever of the file, as CSV or a picture.",
        footer = {
            "",
            "QUANTITY is " + Asked.FORM + ", a leg being \"Fold 1/Fold 2\":",
            "  radius_um@Rod:sagittal  zone_edge_split_mm@\"Fold 1/Fold 2\":lower  half_trace:tangential  fsr_mhz",
            "",
            "Example:",
            "  twofold sweep samples/z-fold-rod.json --lever gap --of radius_um@Rod:sagittal fsr_mhz",
            "  twofold sweep samples/z-fold-rod.json --lever gap --of roundness@Rod --picture gap.svg"
        })
final class SweepCommand implements Callable<Integer> {
    private static final Pictures.Size LEAST = new Pictures.Size(SweepDrawing.LEAST_WIDTH, SweepDrawing.LEAST_HEIGHT);

    private final Streams streams;

    @Parameters(paramLabel = "FILE", description = "A design file.")
    private String file = "";

    @Option(names = "--lever", paramLabel = "NAME", required = true, description = "A lever of the file.")
    private String lever = "";

    @Option(
            names = "--of",
            paramLabel = "QUANTITY",
            arity = "1..*",
            required = true,
            description = "What to read; several, or the option again, for several columns.")
    private List<String> quantities = List.of();

    @Option(
            names = "--points",
            paramLabel = "N",
            description = "How many values, evenly spread with both ends (${DEFAULT-VALUE}); a list has its own.")
    private int points = 401;

    @Option(
            names = "--zones",
            description = "Also the zone of each plane that holds the point, by the edges that bound it.")
    private boolean withZones;

    @Mixin
    private final PictureOptions picture = new PictureOptions();

    @Option(names = "--progress", description = "Say on standard error how far it is, even outside a terminal.")
    private boolean withProgress;

    SweepCommand(Streams streams) {
        this.streams = streams;
    }

    @Override
    public Integer call() {
        long most = picture.isWanted() ? Swept.MOST : Survey.MOST_POINTS;
        if (points < 2 || points > most) {
            streams.complain("--points: found " + points + "; accepted: 2 to " + most
                    + (picture.isWanted() ? " for a picture" : ""));
            return Commands.USAGE;
        }
        Optional<PictureOptions.Wanted> wanted = picture.wanted(LEAST, streams);
        if (!picture.isPlain(streams) || wanted.isPresent() != picture.isWanted()) {
            return Commands.USAGE;
        }
        Optional<Laid> laid = Opened.lay(file, streams);
        if (laid.isEmpty()) {
            return Commands.FILE;
        }
        Optional<Question> question = Levers.question(laid.get(), List.of(lever), quantities, streams);
        if (question.isEmpty()) {
            return Commands.USAGE;
        }
        Axis axis = Axis.of(question.get().levers().get(0), points);
        if (!Levers.fits(axis, most, streams)) {
            return Commands.USAGE;
        }
        return wanted.isPresent() ? draw(question.get(), axis, wanted.get()) : print(question.get(), axis);
    }

    private int print(Question question, Axis axis) {
        List<ZonesAlong> zones = new ArrayList<>();
        List<Asked> asked = question.quantities();
        if (withZones) {
            Stream.of(Plane.values()).forEach(p -> zones.add(ZonesAlong.of(question.laid(), axis, p)));
            asked = Stream.concat(
                            asked.stream(), Stream.of(Plane.values()).map(p -> Asked.of(Quantity.STABILITY_MARGIN, p)))
                    .toList();
        }
        Question whole = new Question(question.laid(), question.levers(), asked);
        return Commands.survey(new SurveyCsv(new Survey(whole, List.of(axis)), zones), streams, "sweep", withProgress);
    }

    private int draw(Question question, Axis axis, PictureOptions.Wanted wanted) {
        return Commands.study(
                        (threads, progress) -> Swept.of(question, axis.ascending(), threads, progress),
                        streams,
                        "sweep",
                        withProgress)
                .map(swept -> {
                    SweepDrawing drawing = new SweepDrawing(SweepPlot.of(swept));
                    Pictures.Size size = wanted.size();
                    String title = question.laid().design().title() + ", over " + lever;
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
}
