package twofold.edit;

import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import twofold.design.Lever;
import twofold.design.Unit;
import twofold.layout.Outcome;
import twofold.study.Axis;
import twofold.study.Levered;

/** Edits by the design's levers. */
public final class LeverEdits {
    private LeverEdits() {}

    /**
     * Levers set to values, as a sweep or map sets them.
     *
     * @param values in SI, one a lever
     */
    public static Edit set(List<Lever> levers, double... values) {
        double[] kept = values.clone();
        String name = IntStream.range(0, kept.length)
                .mapToObj(i -> levers.get(i).name() + " to " + words(Axis.unit(levers.get(i)), kept[i]))
                .collect(Collectors.joining(" and "));
        return Edit.of("set " + name, laid -> Levered.of(laid, levers, kept).then(l -> Outcome.of(l.design())));
    }

    private static String words(Unit unit, double si) {
        String space = unit == Unit.DEG || unit == Unit.ONE ? "" : " ";
        return unit.text(si) + space + unit.symbol();
    }
}
