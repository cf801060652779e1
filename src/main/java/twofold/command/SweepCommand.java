package twofold.command;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.stream.Stream;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import twofold.layout.Laid;
import twofold.optics.Plane;
import twofold.study.Asked;
import twofold.study.Axis;
import twofold.study.Question;
import twofold.study.Survey;
import twofold.study.ZonesAlong;

/** {@code sweep}: quantities over one lever, as CSV. */
@Command(
        name = "sweep",
        mixinStandardHelpOptions = true,
        description = "Quantities over one lever of the file, as CSV.",
        footer = {
            "",
            "QUANTITY is " + Asked.FORM + ", a leg being \"Fold 1/Fold 2\":",
            "  radius_um@Rod:sagittal  zone_edge_split_mm@\"Fold 1/Fold 2\":lower  half_trace:tangential  fsr_mhz",
            "",
            "Example:",
            "  twofold sweep samples/z-fold-rod.json --lever gap --of radius_um@Rod:sagittal fsr_mhz"
        })
final class SweepCommand implements Callable<Integer> {
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

    @Option(names = "--progress", description = "Say on standard error how far it is, even outside a terminal.")
    private boolean withProgress;

    SweepCommand(Streams streams) {
        this.streams = streams;
    }

    @Override
    public Integer call() {
        if (points < 2 || points > Survey.MOST_POINTS) {
            streams.complain("--points: found " + points + "; accepted: 2 to " + Survey.MOST_POINTS);
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
        List<ZonesAlong> zones = new ArrayList<>();
        List<Asked> asked = question.get().quantities();
        if (withZones) {
            Stream.of(Plane.values()).forEach(p -> zones.add(ZonesAlong.of(laid.get(), axis, p)));
            asked = Stream.concat(asked.stream(), Stream.of(Plane.values()).map(SurveyCsv::margin))
                    .toList();
        }
        Question whole = new Question(laid.get(), question.get().levers(), asked);
        return Commands.survey(new SurveyCsv(new Survey(whole, List.of(axis)), zones), streams, "sweep", withProgress);
    }
}
