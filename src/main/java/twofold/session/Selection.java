package twofold.session;

import java.util.Collection;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.IntStream;
import twofold.design.Design;
import twofold.design.Part;

/**
 * Which parts are selected, by their indices.
 *
 * @param lead the part that is shown and that the keyboard moves; there exactly when any is selected
 * @param all every selected part, sorted, the lead among them
 */
public record Selection(Optional<Integer> lead, List<Integer> all) {
    /** No part. */
    public static final Selection NONE = new Selection(Optional.empty(), List.of());

    /** Copies the list. */
    public Selection {
        all = List.copyOf(all);
        if (lead.isPresent() ? !all.contains(lead.get()) : !all.isEmpty()) {
            throw new IllegalArgumentException("the lead " + lead + " is not one of " + all);
        }
    }

    /** One part. */
    static Selection of(int part) {
        return of(part, List.of(part));
    }

    private static Selection of(int lead, Collection<Integer> all) {
        return new Selection(Optional.of(lead), List.copyOf(new TreeSet<>(all)));
    }

    /** Some parts, the last of them as the lead. */
    static Selection of(List<Integer> parts) {
        return parts.isEmpty() ? NONE : of(parts.get(parts.size() - 1), parts);
    }

    /** With a part more, which leads, or without it. */
    Selection toggled(int part) {
        Set<Integer> next = new TreeSet<>(all);
        if (next.remove(part)) {
            return of(List.copyOf(next)).led(lead);
        }
        next.add(part);
        return of(part, next);
    }

    private Selection led(Optional<Integer> by) {
        return by.filter(all::contains).map(l -> of(l, all)).orElse(this);
    }

    /** All from the lead to a part; the lead stays. */
    Selection upTo(int part) {
        int from = lead.orElse(part);
        return of(
                from,
                IntStream.rangeClosed(Math.min(from, part), Math.max(from, part))
                        .boxed()
                        .toList());
    }

    /** Every part, under the same lead. */
    Selection everything(int parts) {
        return of(IntStream.range(0, parts).boxed().toList()).led(lead.isPresent() ? lead : Optional.of(0));
    }

    /**
     * The selection after a design became another. It follows parts by name, and one that got a new name by its place;
     * parts that were added become the selection; where the lead is gone, its neighbour is selected.
     */
    Selection after(Design before, Design next) {
        if (before.parts().equals(next.parts())) {
            return this;
        }
        Set<String> known = names(before);
        List<Integer> added = IntStream.range(0, next.parts().size())
                .filter(i -> !known.contains(next.parts().get(i).name()))
                .boxed()
                .toList();
        if (next.parts().size() > before.parts().size() && !added.isEmpty()) {
            return of(added);
        }
        boolean isSameCount = next.parts().size() == before.parts().size();
        List<Integer> kept = all.stream()
                .flatMap(i -> next
                        .indexOf(before.parts().get(i).name())
                        .or(() -> isSameCount && added.contains(i) ? Optional.of(i) : Optional.empty())
                        .stream())
                .toList();
        Optional<Integer> led =
                lead.flatMap(i -> next.indexOf(before.parts().get(i).name())
                        .or(() -> isSameCount && added.contains(i) ? Optional.of(i) : Optional.empty()));
        if (lead.isPresent() && kept.isEmpty()) {
            return of(Math.min(lead.get(), next.parts().size() - 1));
        }
        return of(kept).led(led);
    }

    private static Set<String> names(Design design) {
        Set<String> names = new HashSet<>();
        design.parts().stream().map(Part::name).forEach(names::add);
        return names;
    }
}
