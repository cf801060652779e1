package twofold.command;

import java.util.Locale;
import twofold.cavity.Cavity;
import twofold.cavity.Judgement;
import twofold.design.Bound;
import twofold.design.Requirement;
import twofold.design.Unit;

/** How a design does on its requirements, one a line, for a person. */
final class RequirementText {
    /** Below this a pure number is shown with a power of ten. */
    private static final double SMALL = 1e-3;

    private RequirementText() {}

    /** The list and an empty line; nothing where nothing is asked. */
    static String of(Cavity cavity) {
        Table table = new Table().row("requirement", "value", "asked", "margin", "");
        for (Judgement j : cavity.judgements()) {
            Requirement r = j.requirement();
            table.row(
                    place(r),
                    j.verdict() == Judgement.Verdict.OPEN ? "-" : value(r.what().unit(), j.value()),
                    asked(r),
                    Double.isNaN(j.margin()) ? "-" : Unit.fixed(j.margin(), 2),
                    j.verdict().word());
        }
        return cavity.judgements().isEmpty() ? "" : table.text("") + '\n';
    }

    /** What is asked, written as on the command line. */
    private static String place(Requirement r) {
        StringBuilder text = new StringBuilder(r.what().json());
        r.at().ifPresent(at -> text.append('@').append(at));
        r.plane().ifPresent(p -> text.append(':').append(p.word()));
        r.edge().ifPresent(e -> text.append(':').append(e.word()));
        r.over().ifPresent(lever -> text.append(", worst over ").append(lever));
        return text.toString();
    }

    private static String value(Unit unit, double si) {
        if (Double.isNaN(si)) {
            return "undefined";
        }
        double value = unit.fromSi(si);
        String number = unit == Unit.ONE && value != 0 && Math.abs(value) < SMALL
                ? String.format(Locale.ROOT, "%.1e", value)
                : Unit.fixed(value, unit == Unit.UM ? 1 : unit == Unit.MM || unit == Unit.ONE ? 3 : 2);
        return number + unit(unit);
    }

    private static String unit(Unit unit) {
        return unit.symbol().isEmpty() ? "" : unit == Unit.DEG ? unit.symbol() : " " + unit.symbol();
    }

    private static String asked(Requirement r) {
        Unit unit = r.what().unit();
        Bound bound = r.bound();
        if (bound instanceof Bound.AtLeast b) {
            return "at least " + unit.text(b.value());
        } else if (bound instanceof Bound.AtMost b) {
            return "at most " + unit.text(b.value());
        } else if (bound instanceof Bound.Between b) {
            return unit.text(b.low()) + " to " + unit.text(b.high());
        } else if (bound instanceof Bound.Equal b) {
            return unit.text(b.value()) + " within " + unit.text(b.within());
        }
        return bound instanceof Bound.Prefer wish ? wish.word() : "";
    }
}
