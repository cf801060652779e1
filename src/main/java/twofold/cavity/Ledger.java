package twofold.cavity;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import twofold.design.Edge;
import twofold.design.Kind;
import twofold.optics.Plane;

/**
 * What each part adds to the difference between the planes, as a length: how far apart they have an edge of the zone that
 * holds the cavity in the sagittal plane, along the free path of a leg in the chain alone.
 *
 * <p>A part's share is how much the split changes when the part alone is replaced by one that acts alike in both planes: a
 * fold mirror by f = R/2, a tilted slab by its length across the tilt with faces that widen nothing and its thermal lens
 * kept, a tilted lens by the untilted one; a black box has no such twin. Between two mirrors, at the lower edge, shares add
 * up to the split exactly: −(R/2) sinθ tanθ of each mirror and N t of a Brewster plate (Kogelnik, Ippen, Dienes &amp;
 * Shank, IEEE J. Quantum Electron. QE-8, 373 (1972)); elsewhere to first order.
 *
 * @param leg number of the leg
 * @param edge which edge of the zone
 * @param at that edge in the sagittal plane
 * @param shares of all parts that stand at an angle and focus or refract, in beam order
 * @param split the tangential minus the sagittal place of the edge, m
 */
public record Ledger(int leg, Edge edge, ZoneEdge at, List<Share> shares, double split) {
    /** Copies the list. */
    public Ledger {
        shares = List.copyOf(shares);
    }

    /**
     * A part's share.
     *
     * @param part its index
     * @param length m; NaN where the edge is gone without the part's astigmatism
     */
    public record Share(int part, double length) {}

    /** The sum of the shares, m. */
    public double sum() {
        return shares.stream().mapToDouble(Share::length).sum();
    }

    /** What the shares leave of the split, m: 0 where they add up. */
    public double remainder() {
        return split - sum();
    }

    /**
     * The ledger of a leg.
     *
     * @param trial after a run
     * @return empty where the sagittal plane has no such edge, or the tangential plane none of its kind
     */
    public static Optional<Ledger> of(Trial trial, int leg, Edge edge) {
        ZoneSearch search = new ZoneSearch(trial, leg);
        Optional<ZoneEdge> at = search.zones(Plane.SAGITTAL).here().flatMap(z -> z.edge(edge));
        if (at.isEmpty()) {
            return Optional.empty();
        }
        double split = Zones.split(search.zones(Plane.TANGENTIAL), at.get());
        if (Double.isNaN(split)) {
            return Optional.empty();
        }
        List<Share> shares = new ArrayList<>();
        Chain chain = trial.numbers.chain;
        for (int part = 0; part < chain.kind.length; part++) {
            if (isAstigmatic(trial, part)) {
                shares.add(new Share(part, split - withTwin(trial, leg, part, at.get())));
            }
        }
        return Optional.of(new Ledger(leg, edge, at.get(), shares, split));
    }

    private static boolean isAstigmatic(Trial trial, int part) {
        Numbers numbers = trial.numbers;
        if (numbers.chain.kind[part] == Kind.MIRROR) {
            return numbers.v[part * Chain.STRIDE + Chain.POWER] != 0 && trial.legs.cosIncidence(part) < 1;
        }
        return numbers.isTilted(part);
    }

    /** The split with one part replaced by its twin. */
    private static double withTwin(Trial trial, int leg, int part, ZoneEdge at) {
        Trial other = trial.copy();
        if (trial.numbers.chain.kind[part] == Kind.MIRROR) {
            other.straighten(part);
        } else {
            other.numbers.untilt(part);
        }
        other.walk(leg, trial.pathOf(leg));
        ZoneSearch search = new ZoneSearch(other, leg);
        return search.zones(Plane.SAGITTAL)
                .same(at)
                .map(e -> Zones.split(search.zones(Plane.TANGENTIAL), e))
                .orElse(Double.NaN);
    }
}
