package twofold.window.ask;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import twofold.design.Design;
import twofold.design.Part;
import twofold.design.Place;
import twofold.edit.Offers;
import twofold.layout.Laid;
import twofold.layout.Leg;
import twofold.session.Shown;

/**
 * A place where something can be asked.
 *
 * @param at a part or leg; empty: the whole cavity
 */
record Offered(Optional<Place> at) {
    /** In a menu. */
    String words() {
        return at.map(p -> p.second().isPresent() ? "Leg " + p : p.toString()).orElse("The whole cavity");
    }

    /** The whole cavity, the selected part, and the legs that it ends or stands on; without a selection every leg. */
    static List<Offered> near(Laid laid, Shown shown) {
        List<Offered> all = new ArrayList<>(List.of(new Offered(Optional.empty())));
        Optional<Integer> selected =
                shown.selected().filter(i -> i < laid.design().parts().size());
        selected.ifPresent(i -> all.add(part(laid.design().parts().get(i))));
        for (Leg leg : laid.legs()) {
            boolean isNear = selected.map(i -> leg.from() == i
                            || leg.to() == i
                            || leg.parts().stream().anyMatch(s -> s.part() == i))
                    .orElse(true);
            if (isNear) {
                all.add(new Offered(Optional.of(Place.of(name(laid, leg.from()), name(laid, leg.to())))));
            }
        }
        return all;
    }

    private static String name(Laid laid, int part) {
        return laid.design().parts().get(part).name();
    }

    private static Offered part(Part part) {
        return new Offered(Optional.of(Place.of(part.name())));
    }

    /** All other parts and legs. */
    static List<Offered> far(Laid laid, Shown shown) {
        Design design = laid.design();
        List<Offered> all = new ArrayList<>();
        design.parts().forEach(p -> all.add(part(p)));
        Offers.legs(design).forEach(l -> all.add(new Offered(Optional.of(l))));
        all.removeAll(near(laid, shown));
        return all;
    }
}
