package twofold.edit;

import java.util.function.Function;
import twofold.design.Design;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.layout.Outcome;

/**
 * One way to change a design.
 *
 * @param name what it does, as it stands behind "Undo": {@code move Fold 2}
 * @param joins whether it becomes one step with an edit of the same name right before it, as a run of nudges does
 * @param change the changed design, or why there is none; need not check that the result can be laid out
 */
public record Edit(String name, boolean joins, Function<Laid, Outcome<Design>> change) {
    /** An edit that is a step of its own. */
    public static Edit of(String name, Function<Laid, Outcome<Design>> change) {
        return new Edit(name, false, change);
    }

    /** An edit that a run of its like makes one step of. */
    public static Edit nudge(String name, Function<Laid, Outcome<Design>> change) {
        return new Edit(name, true, change);
    }

    /** The changed design on the table, or all problems that stand in the way. */
    public Outcome<Laid> on(Laid now) {
        return change.apply(now).then(Layout::of);
    }
}
