package twofold.layout;

import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import twofold.design.Design;
import twofold.design.Hold;
import twofold.design.Mirror;
import twofold.design.Shape;
import twofold.design.Unit;

/** Why numbers of a plan cannot be set, in words. */
final class Refusal {
    private Refusal() {}

    static String words(Laid laid, List<Knob> knobs, double[] wanted, List<Hold> inTheWay, OptionalDouble nearest) {
        Design design = laid.design();
        String asked = knobs.stream()
                .map(k -> what(k.target(), design) + " " + shown(k.target(), wanted[k.number()]))
                .collect(Collectors.joining(", "));
        String why = inTheWay.isEmpty()
                ? ""
                : ": in the way " + (inTheWay.size() == 1 ? "stands the hold of " : "stand the holds of ")
                        + inTheWay.stream().map(Hold::words).collect(Collectors.joining(", "));
        String closest =
                nearest.isPresent() ? "; the closest is " + shown(knobs.get(0).target(), nearest.getAsDouble()) : "";
        String triangle = design.shape() == Shape.RING && design.mirrors().size() == 3
                ? "; in a triangle the angles follow from the three lengths, and the three incidences add up to 90°"
                : "";
        return "no layout has " + asked + why + closest + triangle;
    }

    private static String what(Target target, Design design) {
        List<Mirror> mirrors = design.mirrors();
        if (target instanceof Target.Leg t) {
            return "the leg " + mirrors.get(t.leg()).name() + "/"
                    + mirrors.get((t.leg() + 1) % mirrors.size()).name() + " at";
        } else if (target instanceof Target.Incidence t) {
            return "an incidence at " + mirrors.get(t.mirror()).name() + " of";
        } else if (target instanceof Target.X t) {
            return mirrors.get(t.mirror()).name() + " at x =";
        }
        return mirrors.get(((Target.Y) target).mirror()).name() + " at y =";
    }

    /** A value to a millionth of its unit. */
    private static String shown(Target target, double si) {
        Unit unit = target instanceof Target.Incidence ? Unit.DEG : Unit.MM;
        double rounded = Math.rint(unit.fromSi(si) * 1e6) / 1e6;
        String number = String.format(Locale.ROOT, "%.6f", rounded).replaceAll("\\.?0+$", "");
        return number + (unit == Unit.DEG ? "°" : " mm");
    }
}
