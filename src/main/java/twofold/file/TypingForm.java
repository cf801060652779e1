package twofold.file;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import twofold.design.Field;
import twofold.design.Mirror;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.design.Subject;
import twofold.design.Turn;
import twofold.layout.Typed;

/**
 * The form for typing: which mirrors give legs and angles in place of positions, and whether they may. Decides also
 * which mirrors lack a position.
 */
final class TypingForm {
    static final List<Field> FIELDS = List.of(Field.LEG, Field.INCIDENCE, Field.TURN, Field.HEADING);
    private static final String AT = Field.AT.json();

    private final List<PartReader.Draft> drafts;
    private final Faults faults;
    private final List<Integer> mirrors = new ArrayList<>();
    private final boolean neighboursAreKnown;
    private final Map<Integer, Typed> typed = new HashMap<>();

    private TypingForm(List<PartReader.Draft> drafts, boolean whole, Faults faults) {
        this.drafts = drafts;
        this.faults = faults;
        boolean known = whole;
        for (int i = 0; i < drafts.size(); i++) {
            known &= !faults.isBroken(Subject.part(i).at("kind"));
            if (drafts.get(i).part() instanceof Mirror) {
                mirrors.add(i);
            }
        }
        neighboursAreKnown = known;
    }

    /**
     * What was typed for each mirror, by its index among the parts; of a first mirror without position, the position is
     * put into the drafts.
     *
     * @param drafts changed where the first mirror stands at the origin
     * @param shape empty where it could not be read: then nothing is refused for its sake
     * @param whole whether the list of parts was read to its end
     */
    static Map<Integer, Typed> read(
            List<PartReader.Draft> drafts, Optional<Shape> shape, boolean whole, Faults faults) {
        TypingForm form = new TypingForm(drafts, whole, faults);
        for (int k = 0; k < form.mirrors.size(); k++) {
            Members members = form.members(k);
            if (members == null) {
                continue;
            }
            if (shape.filter(s -> s == Shape.RING).isPresent()) {
                form.ring(members);
            } else {
                form.mirror(k, members);
            }
        }
        return form.typed;
    }

    private @Nullable Members members(int k) {
        return drafts.get(mirrors.get(k)).members().orElse(null);
    }

    private boolean gives(int k, Field field) {
        Members members = k >= 0 && k < mirrors.size() ? members(k) : null;
        return members != null && members.has(field.json());
    }

    /** Whether a mirror gives a leg, or may have meant to. */
    private boolean mayGiveLeg(int k) {
        return k < mirrors.size()
                && (gives(k, Field.LEG)
                        || faults.isBroken(Subject.part(mirrors.get(k)).at(Field.LEG.json())));
    }

    private void ring(Members members) {
        for (Field field : FIELDS) {
            if (members.has(field.json())) {
                members.misplaced(
                        field.json(),
                        "found " + field.json() + " in a ring",
                        field == Field.LEG ? AT + " instead" : "nothing: it follows from the plan");
            }
        }
        if (members.has(Field.LEG.json())) {
            faults.markBroken(members.where().at(AT));
        } else {
            members.need(AT, Field.AT.accepted());
        }
    }

    private void mirror(int k, Members members) {
        position(k, members);
        heading(k, members);
        angles(k, members);
        int index = mirrors.get(k);
        OptionalDouble leg = k > 0 && !members.has(AT) ? number(index, Field.LEG) : OptionalDouble.empty();
        OptionalDouble incidence = number(index, Field.INCIDENCE);
        if (incidence.isEmpty() && laysOutNext(k)) {
            incidence = OptionalDouble.of((Double) Field.INCIDENCE.standIn());
        }
        Optional<Turn> turn =
                Optional.ofNullable((Turn) drafts.get(index).otherForms().get(Field.TURN));
        OptionalDouble heading = number(index, Field.HEADING);
        if (leg.isPresent() || incidence.isPresent() || turn.isPresent() || heading.isPresent()) {
            typed.put(index, new Typed(leg, incidence, turn, heading));
        }
    }

    /** Whether a mirror's angles lay out the next leg. */
    private boolean laysOutNext(int k) {
        return k > 0 && gives(k + 1, Field.LEG);
    }

    private OptionalDouble number(int index, Field field) {
        Object value = drafts.get(index).otherForms().get(field);
        return value instanceof Double d ? OptionalDouble.of(d) : OptionalDouble.empty();
    }

    private void position(int k, Members members) {
        boolean leg = members.has(Field.LEG.json());
        if (leg && members.has(AT)) {
            members.misplaced(Field.LEG.json(), "found leg_mm beside at_mm", "one of them");
        } else if (leg && k == 0 && neighboursAreKnown) {
            members.misplaced(
                    Field.LEG.json(),
                    "found leg_mm at the first mirror, to which no leg leads",
                    "at_mm, or neither: then it stands at the origin");
            faults.markBroken(members.where().at(AT));
        } else if (!leg && !members.has(AT)) {
            int index = mirrors.get(k);
            if (k == 0 && IntStream.range(1, mirrors.size()).anyMatch(this::mayGiveLeg)) {
                drafts.set(index, drafts.get(index).at(new Point(0, 0)));
            } else {
                members.missing(AT, Field.AT.accepted() + (k == 0 ? "" : "; or leg_mm instead"));
            }
        }
    }

    private void heading(int k, Members members) {
        String key = Field.HEADING.json();
        if (!members.has(key) || !neighboursAreKnown) {
            return;
        }
        if (k > 0) {
            members.misplaced(key, "found " + key + " away from the first mirror", "only on the first mirror");
        } else if (!mayGiveLeg(1)) {
            members.misplaced(
                    key, "found " + key + ", but the second mirror gives no leg_mm", "only before a typed leg");
        }
    }

    private void angles(int k, Members members) {
        String incidence = Field.INCIDENCE.json();
        String turn = Field.TURN.json();
        if (!neighboursAreKnown) {
            return;
        }
        if (laysOutNext(k)) {
            if (!members.has(incidence)) {
                members.missing(incidence, Field.INCIDENCE.accepted() + ", since the next mirror gives leg_mm");
            }
            OptionalDouble angle = number(mirrors.get(k), Field.INCIDENCE);
            if (!members.has(turn) && !(angle.isPresent() && angle.getAsDouble() == 0)) {
                members.missing(turn, Field.TURN.accepted() + ", since the next mirror gives leg_mm");
            }
            return;
        }
        boolean isEnd = k == 0 || k == mirrors.size() - 1;
        if (!isEnd && mayGiveLeg(k + 1)) {
            return;
        }
        for (String key : members.among(List.of(incidence, turn))) {
            members.misplaced(
                    key,
                    "found " + key + (isEnd ? " at an end mirror" : ", but the next mirror gives no leg_mm"),
                    isEnd ? "only at inner mirrors" : "nothing: it follows from the plan");
        }
    }
}
