package twofold.session;

import java.util.List;
import twofold.cavity.Judgement;
import twofold.design.Bound;
import twofold.design.Edge;
import twofold.design.Place;
import twofold.design.Planes;
import twofold.design.Requirement;
import twofold.design.Unit;

/**
 * A requirement and how the design does on it, in words for a person.
 *
 * @param what "Roundness at End B"
 * @param value "0.989", "undefined", or "–" where a lever's range was not run
 * @param asked "≥ 0.95"
 * @param margin "0.04", or "–"
 * @param verdict met, not met, a wish, or open
 */
public record Ask(String what, String value, String asked, String margin, Judgement.Verdict verdict) {
    /** The requirements of a design, in order. */
    public static List<Ask> of(List<Judgement> judgements) {
        return judgements.stream().map(Ask::of).toList();
    }

    private static Ask of(Judgement j) {
        Requirement r = j.requirement();
        return new Ask(
                what(r),
                j.verdict() == Judgement.Verdict.OPEN ? "–" : value(r.what().unit(), j.value()),
                asked(r),
                Double.isNaN(j.margin()) ? "–" : minus(Unit.fixed(j.margin(), 2)),
                j.verdict());
    }

    private static String what(Requirement r) {
        StringBuilder words = new StringBuilder(r.what().title());
        r.at().map(Place::toString).ifPresent(p -> words.append(" at ").append(p));
        r.plane().ifPresent(p -> words.append(p == Planes.BOTH ? ", both planes" : ", " + p.word()));
        r.edge().map(Edge::word).ifPresent(e -> words.append(", ").append(e).append(" edge"));
        r.over().ifPresent(l -> words.append(", over ").append(l));
        return words.toString();
    }

    private static String value(Unit unit, double si) {
        if (Double.isNaN(si)) {
            return "undefined";
        }
        String shown = minus(unit.shown(si));
        return unit.symbol().isEmpty() ? shown : unit == Unit.DEG ? shown + "°" : shown + " " + unit.symbol();
    }

    private static String minus(String number) {
        return number.replace('-', '−');
    }

    private static String asked(Requirement r) {
        Unit unit = r.what().unit();
        Bound bound = r.bound();
        if (bound instanceof Bound.AtLeast b) {
            return "≥ " + minus(unit.text(b.value()));
        } else if (bound instanceof Bound.AtMost b) {
            return "≤ " + minus(unit.text(b.value()));
        } else if (bound instanceof Bound.Between b) {
            return minus(unit.text(b.low())) + " to " + minus(unit.text(b.high()));
        } else if (bound instanceof Bound.Equal b) {
            return minus(unit.text(b.value())) + " ± " + unit.text(b.within());
        }
        return bound instanceof Bound.Prefer wish ? "the " + wish.word() + " wished" : "";
    }
}
