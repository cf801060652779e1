package twofold.command;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import twofold.design.Design;
import twofold.design.Lever;
import twofold.design.Names;
import twofold.design.Problem;
import twofold.layout.Laid;
import twofold.layout.Outcome;
import twofold.study.Asked;
import twofold.study.Axis;
import twofold.study.Levered;
import twofold.study.Question;

/** What a sweep or map asks, from its arguments; what cannot be understood goes to the error stream, a line each. */
final class Levers {
    private Levers() {}

    /** A question of a design; empty after complaints. */
    static Optional<Question> question(Laid laid, List<String> levers, List<String> quantities, Streams streams) {
        Design design = laid.design();
        List<String> complaints = new ArrayList<>();
        List<Lever> known = new ArrayList<>();
        List<String> names = design.levers().stream().map(Lever::name).toList();
        for (String name : levers) {
            Optional<Lever> lever =
                    design.levers().stream().filter(l -> l.name().equals(name)).findFirst();
            if (lever.isEmpty()) {
                complaints.add("--lever: found \"" + Names.shown(name) + "\", which no lever of the file is called"
                        + Names.hint(name, names) + "; accepted: "
                        + (names.isEmpty() ? "nothing here: the file has no levers" : Names.listed(names)));
            }
            lever.ifPresent(known::add);
        }
        if (known.size() == 2) {
            same(known.get(0), known.get(1), design).ifPresent(complaints::add);
        }
        List<Asked> asked = new ArrayList<>();
        for (String text : quantities) {
            Outcome<Asked> parsed = Asked.parse(text, design);
            parsed.value().ifPresent(asked::add);
            for (Problem p : parsed.problems()) {
                complaints.add("--of " + Names.shown(text) + ": " + p.message());
            }
        }
        complaints.forEach(streams::complain);
        return complaints.isEmpty() ? Optional.of(new Question(laid, known, asked)) : Optional.empty();
    }

    /** Whether an axis has no more values than can be shown; complains if not. */
    static boolean fits(Axis axis, long most, Streams streams) {
        if (axis.size() > most) {
            streams.complain("--lever: found " + axis.size() + " values of \""
                    + axis.lever().name() + "\"; accepted: up to " + most);
        }
        return axis.size() <= most;
    }

    /** What is wrong with two levers that set the same number. */
    private static Optional<String> same(Lever a, Lever b, Design design) {
        return Levered.clash(design, a, b)
                .map(place -> "--lever: found \"" + a.name() + "\" and \"" + b.name() + "\", which both set " + a.set()
                        + " of " + Names.shown(place.toString()) + "; accepted: two levers of different numbers");
    }
}
