package twofold.window.plot;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import javafx.scene.Node;
import org.jspecify.annotations.Nullable;
import twofold.design.Design;
import twofold.design.Edge;
import twofold.design.Place;
import twofold.design.Quantity;
import twofold.optics.Plane;
import twofold.study.Asked;

/** What is read, where, and of which plane or edge: menus of the vocabulary, of which a quantity uses those it has. */
final class QuantityPick {
    private final Pick<Quantity> what;
    private final Pick<Optional<Place>> where;
    private final Pick<Plane> plane;
    private final Pick<Edge> edge;
    private final Quantity first;
    private final boolean isOfBoth;
    private @Nullable Design design;

    /**
     * The menus.
     *
     * @param prefix of the menus' ids
     * @param first what is picked at first
     * @param isOfBoth whether both planes are read of a quantity that has them, so that none is picked
     * @param then told when a person picks something else
     */
    QuantityPick(String prefix, Quantity first, boolean isOfBoth, Runnable then) {
        this.first = first;
        this.isOfBoth = isOfBoth;
        what = new Pick<>(prefix + "-quantity", "Quantity", Quantity::title, () -> {
            places();
            then.run();
        });
        where = new Pick<>(prefix + "-place", "at", p -> p.map(Place::toString).orElse("the whole cavity"), then);
        plane = new Pick<>(prefix + "-plane", "Plane", Plane::word, then);
        edge = new Pick<>(prefix + "-edge", "Edge", Edge::word, then);
    }

    List<Node> nodes() {
        return List.of(what, where, plane, edge);
    }

    /** Offers what a design has. */
    void fill(Design next) {
        design = next;
        List<Quantity> readable = Arrays.stream(Quantity.values())
                .filter(q -> !Asked.places(q, next).isEmpty())
                .toList();
        what.fill(readable, Optional.of(first).filter(readable::contains));
        plane.fill(List.of(Plane.values()), Optional.empty());
        edge.fill(List.of(Edge.values()), Optional.empty());
        places();
    }

    private void places() {
        Design now = design;
        if (now == null || what.picked().isEmpty()) {
            return;
        }
        Quantity quantity = what.picked().get();
        List<Optional<Place>> places = Asked.places(quantity, now);
        // A crystal is what people ask about. Inside one at Brewster's angle no beam is round by nature, so that is
        // asked
        // of the last part, where the light leaves.
        Optional<Optional<Place>> last = places.stream()
                .filter(p -> p.flatMap(Place::second).isEmpty())
                .reduce((a, b) -> b)
                .filter(p -> quantity == Quantity.ROUNDNESS);
        Optional<Optional<Place>> usual = last.or(() -> places.stream()
                .filter(p -> p.flatMap(at -> now.indexOf(at.first()))
                        .map(i -> now.parts().get(i).kind() == twofold.design.Kind.CRYSTAL)
                        .orElse(false))
                .findFirst());
        where.fill(places, usual);
        where.show(!places.equals(List.of(Optional.empty())));
        plane.show(quantity.hasPlane() && !isOfBoth);
        edge.show(quantity.hasEdge());
    }

    /** What is picked: one quantity, or one of each plane. */
    List<Asked> asked() {
        if (what.picked().isEmpty() || where.picked().isEmpty()) {
            return List.of();
        }
        Quantity quantity = what.picked().get();
        Optional<Place> at = where.picked().get();
        Optional<Edge> ofEdge = quantity.hasEdge() ? edge.picked() : Optional.empty();
        if (!quantity.hasPlane()) {
            return List.of(Asked.of(quantity, at, Optional.empty(), ofEdge));
        }
        return Arrays.stream(Plane.values())
                .filter(p -> isOfBoth || plane.isPicked(p))
                .map(p -> Asked.of(quantity, at, Optional.of(p), ofEdge))
                .toList();
    }
}
