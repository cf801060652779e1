package twofold.edit;

import java.util.ArrayList;
import java.util.List;
import java.util.function.BiFunction;
import java.util.function.Function;
import java.util.function.UnaryOperator;
import twofold.design.Design;
import twofold.design.Lever;
import twofold.design.Problem;
import twofold.design.Requirement;
import twofold.design.Subject;
import twofold.design.Tolerance;
import twofold.layout.Outcome;

/**
 * Requirements, levers and tolerances added, replaced, taken away and put in another order, by their index in the design. A
 * requirement over a lever follows the lever's name and goes with it.
 *
 * @param <T> which of the three
 */
public final class AskEdits<T> {
    /** Requirements. */
    public static final AskEdits<Requirement> REQUIREMENTS = new AskEdits<>(
            "requirements",
            Design::requirements,
            Design::withRequirements,
            r -> "requirement of " + r.what().json());

    /** Levers. */
    public static final AskEdits<Lever> LEVERS =
            new AskEdits<>("levers", Design::levers, Design::withLevers, l -> "lever " + l.name());

    /** Tolerances. */
    public static final AskEdits<Tolerance> TOLERANCES =
            new AskEdits<>("tolerances", Design::tolerances, Design::withTolerances, t -> "tolerance of " + t.set());

    private final String list;
    private final Function<Design, List<T>> get;
    private final BiFunction<Design, List<T>, Design> with;
    private final Function<T, String> words;

    private AskEdits(
            String list,
            Function<Design, List<T>> get,
            BiFunction<Design, List<T>, Design> with,
            Function<T, String> words) {
        this.list = list;
        this.get = get;
        this.with = with;
        this.words = words;
    }

    /** One more, at the end. */
    public Edit add(T one) {
        return Edit.of("add " + words.apply(one), laid -> {
            List<T> all = new ArrayList<>(get.apply(laid.design()));
            all.add(one);
            return Outcome.of(with.apply(laid.design(), all));
        });
    }

    /** Another in the place of one. */
    public Edit replace(int index, T one) {
        return Edit.of(
                "change " + words.apply(one),
                laid -> changed(laid.design(), index, all -> {
                            all.set(index, one);
                            return all;
                        })
                        .then(d -> Outcome.of(overFollows(laid.design(), d, index))));
    }

    /** One less. */
    public Edit remove(Design now, int index) {
        String what = index >= 0 && index < get.apply(now).size()
                ? words.apply(get.apply(now).get(index))
                : list;
        return Edit.of(
                "delete " + what,
                laid -> changed(laid.design(), index, all -> {
                            all.remove(index);
                            return all;
                        })
                        .then(d -> Outcome.of(References.pruned(d))));
    }

    /**
     * One at another place among its like.
     *
     * @param to index that it then has; limited to the list
     */
    public Edit move(int index, int to) {
        return Edit.of(
                "reorder " + list,
                laid -> changed(laid.design(), index, all -> {
                    T one = all.remove(index);
                    all.add(Math.max(0, Math.min(all.size(), to)), one);
                    return all;
                }));
    }

    private Outcome<Design> changed(Design design, int index, UnaryOperator<List<T>> change) {
        List<T> all = new ArrayList<>(get.apply(design));
        return index >= 0 && index < all.size()
                ? Outcome.of(with.apply(design, change.apply(all)))
                : Outcome.failed(new Problem(
                        Subject.DOCUMENT.at(list),
                        "found the number " + (index + 1) + " of " + all.size() + " " + list,
                        all.isEmpty() ? "one that is there" : "from 1 to " + all.size()));
    }

    /** A lever's new name in the requirements over it. */
    private static Design overFollows(Design before, Design after, int index) {
        if (after.levers().size() != before.levers().size() || before.levers().equals(after.levers())) {
            return after;
        }
        String was = before.levers().get(index).name();
        String is = after.levers().get(index).name();
        return after.withRequirements(after.requirements().stream()
                .map(r -> new Requirement(
                        r.what(),
                        r.at(),
                        r.plane(),
                        r.edge(),
                        r.bound(),
                        r.over().map(o -> o.equals(was) ? is : o)))
                .toList());
    }
}
