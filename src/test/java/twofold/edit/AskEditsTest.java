package twofold.edit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Offset.offset;
import static twofold.edit.Edited.by;
import static twofold.edit.Edited.refusal;
import static twofold.edit.Edited.sample;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import twofold.design.Bound;
import twofold.design.Design;
import twofold.design.Hold;
import twofold.design.Lever;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Planes;
import twofold.design.Quantity;
import twofold.design.Requirement;
import twofold.design.Tolerance;
import twofold.layout.Laid;

class AskEditsTest {
    private final Laid z = sample("z-fold-rod");
    private final Place gap = Place.of("Fold 1", "Fold 2");

    @Test
    void aLockClosesAndOpens() {
        Hold turned = new Hold.Leg(Place.of("Fold 1", "End A"));
        assertThat(HoldEdits.isHeld(z.design(), turned)).isTrue();
        Laid open = by(HoldEdits.toggle(z.design(), turned), z);
        assertThat(open.design().holds()).hasSize(2);
        assertThat(HoldEdits.toggle(open.design(), turned).name()).isEqualTo("hold the leg Fold 1/End A");
        Laid closed = by(HoldEdits.toggle(open.design(), turned), open);
        assertThat(closed.design().holds()).hasSize(3).contains(turned);
        assertThat(by(HoldEdits.hold(new Hold.Leg(Place.of("End A", "Fold 1"))), closed)
                        .design())
                .isEqualTo(closed.design());
        assertThat(by(HoldEdits.hold(new Hold.RoundTrip()), z).design().holds()).hasSize(4);
        assertThat(refusal(HoldEdits.hold(new Hold.Incidence("End A")), z)).contains("met head-on");
    }

    @Test
    void requirementsAreAddedChangedOrderedAndDeleted() {
        Requirement one =
                Offers.requirement(Quantity.WAIST_RADIUS, Optional.of(Place.of("Rod")), new Bound.AtMost(4e-5));
        Laid with = by(AskEdits.REQUIREMENTS.add(one), z);
        int last = with.design().requirements().size() - 1;
        assertThat(with.design().requirements().get(last)).isEqualTo(one);
        Laid first = by(AskEdits.REQUIREMENTS.move(last, 0), with);
        assertThat(first.design().requirements().get(0)).isEqualTo(one);
        assertThat(first.design().requirements().subList(1, last + 1))
                .isEqualTo(z.design().requirements());
        assertThat(by(AskEdits.REQUIREMENTS.remove(first.design(), 0), first).design())
                .isEqualTo(z.design());
        assertThat(AskEdits.REQUIREMENTS.remove(first.design(), 0).name())
                .isEqualTo("delete requirement of waist_radius_um");
        Requirement wrong =
                Offers.requirement(Quantity.FOCUS_RATIO, Optional.of(Place.of("Fold 1")), new Bound.AtMost(1));
        assertThat(refusal(AskEdits.REQUIREMENTS.replace(0, wrong), z)).contains("a crystal");
        assertThat(refusal(AskEdits.REQUIREMENTS.remove(z.design(), 9), z))
                .contains("found the number 10 of 5 requirements");
    }

    @Test
    void aRequirementFollowsItsLeversNameAndGoesWithIt() {
        Requirement over = new Requirement(
                Quantity.STABILITY_MARGIN,
                Optional.empty(),
                Optional.of(Planes.BOTH),
                Optional.empty(),
                new Bound.AtLeast(0),
                Optional.of("gap"));
        Laid with = by(AskEdits.REQUIREMENTS.add(over), z);
        Lever lever = with.design().levers().get(1);
        Lever renamed = new Lever("space", lever.set(), lever.of(), lever.range(), lever.adjuster());
        Design followed = by(AskEdits.LEVERS.replace(1, renamed), with).design();
        assertThat(followed.requirements().get(5).over()).hasValue("space");
        Design without =
                by(AskEdits.LEVERS.remove(followed, 1), Edited.laid(followed)).design();
        assertThat(without.requirements()).isEqualTo(z.design().requirements());
        assertThat(Lost.between(followed, without))
                .containsExactly("the lever space", "the requirement of stability_margin");
    }

    @Test
    void tolerancesToo() {
        Tolerance one = new Tolerance("roc_mm", List.of(Place.of("End A")), 0.01, true, Tolerance.Spread.NORMAL);
        Laid with = by(AskEdits.TOLERANCES.add(one), z);
        assertThat(by(AskEdits.TOLERANCES.remove(with.design(), 4), with).design())
                .isEqualTo(z.design());
        assertThat(refusal(AskEdits.LEVERS.add(z.design().levers().get(0)), z)).contains("a second time");
    }

    @Test
    void menusOfferWhatTheFormatSays() {
        assertThat(Offers.legs(z.design()).get(1)).isEqualTo(gap);
        // Section 4 of the file format.
        assertThat(Offers.quantities(z.design(), Optional.empty()).stream().map(Quantity::json))
                .containsExactly(
                        "half_trace",
                        "stability_margin",
                        "gouy_deg",
                        "round_trip_mm",
                        "fsr_mhz",
                        "clearance_mm",
                        "plan_width_mm",
                        "plan_depth_mm");
        assertThat(Offers.quantities(z.design(), Optional.of(Place.of("Rod"))).stream()
                        .map(Quantity::json))
                .contains("radius_um", "waist_offset_mm", "focus_ratio", "roundness", "clip_loss", "clearance_mm")
                .doesNotContain("leg_mm", "incidence_deg");
        assertThat(Offers.quantities(z.design(), Optional.of(Place.of("End A", "Fold 1"))).stream()
                        .map(Quantity::json))
                .containsExactly(
                        "waist_radius_um",
                        "waist_split_mm",
                        "roundness",
                        "zone_edge_split_mm",
                        "zone_overlap_mm",
                        "leg_mm",
                        "distance_mm");
        assertThat(Offers.settings(z.design(), gap)).containsExactly("leg_mm");
        assertThat(Offers.settings(z.design(), Place.of("Fold 1")))
                .contains("roc_mm", "incidence_deg", "x_mm", "y_mm")
                .doesNotContain("leg_mm", "curvature_per_m");
        assertThat(Offers.settings(z.design(), Place.of("End A"))).doesNotContain("incidence_deg");
        assertThat(Offers.settings(z.design(), Place.of("Rod")))
                .contains("along_mm", "length_mm", "incidence_deg", "thermal_power_per_m");
        assertThat(Offers.holds(z.design(), Optional.of(gap))).hasSize(2);
        assertThat(Offers.holds(z.design(), Optional.of(Place.of("End A"))))
                .containsExactly(new Hold.Position("End A"));
        assertThat(Offers.holds(z.design(), Optional.of(Place.of("Rod")))).isEmpty();
        assertThat(Offers.materials(z.design()).stream().map(m -> m.name())).contains("YAG", "fused silica");
    }

    /** Whatever a menu offers can be added as it stands. */
    @ParameterizedTest
    @ValueSource(strings = {"z-fold-rod", "bow-tie-doubler", "x-fold", "gas-tube", "triangle-ring", "v-fold-pumped"})
    void whatIsOfferedIsAccepted(String sample) {
        Laid laid = sample(sample);
        List<Place> places = new ArrayList<>(Offers.legs(laid.design()));
        laid.design().parts().stream().map(Part::name).map(Place::of).forEach(places::add);
        int offered = 0;
        for (Place place : places) {
            for (String set : Offers.settings(laid.design(), place)) {
                by(AskEdits.LEVERS.add(Offers.lever(laid, set, place)), laid);
                by(
                        AskEdits.TOLERANCES.add(
                                new Tolerance(set, List.of(place), 0.01, true, Tolerance.Spread.UNIFORM)),
                        laid);
                offered++;
            }
            for (Quantity quantity : Offers.quantities(laid.design(), Optional.of(place))) {
                by(
                        AskEdits.REQUIREMENTS.add(
                                Offers.requirement(quantity, Optional.of(place), new Bound.AtLeast(0))),
                        laid);
                offered++;
            }
            for (Hold hold : Offers.holds(laid.design(), Optional.of(place))) {
                by(HoldEdits.hold(hold), laid);
                offered++;
            }
        }
        assertThat(offered).isGreaterThan(30);
    }

    @Test
    void aLeverBeginsAroundThePresentValue() {
        Lever lever = Offers.lever(z, "roc_mm", Place.of("Fold 1"));
        assertThat(lever.range()).isEqualTo(new Lever.Range.Span(0.09, 0.11));
        assertThat(lever.name()).isEqualTo("radius of curvature Fold 1");
        assertThat(Offers.value(z, "leg_mm", gap))
                .hasValueCloseTo(z.legs().get(1).path(), offset(1e-15));
        assertThat(Offers.value(z, "along_mm", Place.of("Rod")))
                .hasValue(z.legs().get(1).path() / 2);
        assertThat(Offers.lever(z, "roc_mm", Place.of("End A")).range()).isEqualTo(new Lever.Range.Span(0.09, 0.11));
    }
}
