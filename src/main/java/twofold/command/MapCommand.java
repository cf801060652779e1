package twofold.command;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import twofold.design.Names;
import twofold.layout.Laid;
import twofold.study.Asked;
import twofold.study.Axis;
import twofold.study.Question;
import twofold.study.Survey;

/** {@code map}: a quantity over two levers, as CSV. */
@Command(
        name = "map",
        mixinStandardHelpOptions = true,
        description = "A quantity over two levers of the file, as CSV of three columns, the first lever fastest.",
        footer = {
            "",
            "QUANTITY is " + Asked.FORM + ", a leg being \"Fold 1/Fold 2\".",
            "",
            "Example:",
            "  twofold map samples/z-fold-rod.json --lever gap --lever fold --of roundness@Rod --size 60x40"
        })
final class MapCommand implements Callable<Integer> {
    private static final Pattern SIZE = Pattern.compile("([0-9]{1,8})x([0-9]{1,8})");

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
        if (number(match, 1) * (long) number(match, 2) > Survey.MOST_POINTS) {
            streams.complain("--size: found " + number(match, 1) * (long) number(match, 2) + " points; accepted: up to "
                    + Survey.MOST_POINTS);
            return Commands.USAGE;
        }
        if (levers.size() != 2 || levers.get(0).equals(levers.get(1))) {
            streams.complain("--lever: found " + (levers.size() == 2 ? "the same twice" : String.valueOf(levers.size()))
                    + "; accepted: two different levers");
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
        List<Axis> axes = List.of(
                Axis.of(question.get().levers().get(0), number(match, 1)),
                Axis.of(question.get().levers().get(1), number(match, 2)));
        return Commands.survey(
                new SurveyCsv(new Survey(question.get(), axes), List.of()), streams, "map", withProgress);
    }

    private static int number(Matcher match, int group) {
        return Integer.parseInt(match.group(group));
    }
}
