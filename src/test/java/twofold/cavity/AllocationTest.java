package twofold.cavity;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Optional;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import twofold.Allocated;
import twofold.bench.TwelvePartRing;
import twofold.design.Place;
import twofold.design.Quantity;
import twofold.layout.Layout;
import twofold.optics.Plane;

/** The walk and what is read off it allocate nothing, so that a map of millions of points makes no garbage. */
class AllocationTest {
    /** What the compiler makes of the walk depends on what it has seen: a session sees every kind of cavity. */
    @BeforeAll
    static void everyKindOfCavityWasWalked() {
        Allocated.seeEveryKind();
    }

    @Test
    void oneEvaluationAllocatesNothing() {
        Chain chain = Chain.of(Layout.of(TwelvePartRing.design()).value().orElseThrow());
        Trial trial = chain.trial();
        assertThat(trial.run()).isEqualTo(Fit.FITS);
        assertThat(trial.margin(Plane.TANGENTIAL)).isPositive();
        assertThat(trial.margin(Plane.SAGITTAL)).isPositive();
        int x = chain.x(0);
        double place = trial.get(x);
        Allocated.nothing(i -> {
            trial.set(x, place + 1e-9 * (i % 7));
            trial.run();
            return trial.halfTrace(Plane.TANGENTIAL) + trial.radius(0, Face.SURFACE, Plane.SAGITTAL);
        });
    }

    /** Every quantity of the light, wherever it can be read; zones, clearances and the plan's box may allocate. */
    @ParameterizedTest
    @EnumSource(
            mode = EnumSource.Mode.EXCLUDE,
            names = {"ZONE_EDGE_SPLIT", "ZONE_OVERLAP", "CLEARANCE", "PLAN_WIDTH", "PLAN_DEPTH"})
    void readingLightAllocatesNothing(Quantity what) {
        Chain chain = Chain.of(Layout.of(TwelvePartRing.design()).value().orElseThrow());
        Trial trial = chain.trial();
        trial.run();
        Optional<Place> at = switch (what.where()) {
            case NOWHERE, ANYWHERE_OR_PART -> Optional.empty();
            case PART -> Optional.of(Place.of(what == Quantity.CLIP_LOSS ? "M3" : "Pumped"));
            case PART_OR_STRETCH, CRYSTAL, SLAB -> Optional.of(Place.of("Pumped"));
            case SLAB_OR_STRETCH -> Optional.of(Place.of("M4", "Pumped"));
            case MIRROR -> Optional.of(Place.of("M3"));
            case LEG -> Optional.of(Place.of("M3", "M4"));
        };
        Optional<Plane> plane = what.hasPlane() ? Optional.of(Plane.TANGENTIAL) : Optional.empty();
        Reading reading = Reading.of(what, at, plane, Optional.empty(), chain);
        assertThat(reading.of(trial)).isFinite();
        Allocated.nothing(i -> reading.of(trial));
    }
}
