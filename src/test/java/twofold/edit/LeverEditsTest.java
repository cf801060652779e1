package twofold.edit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import twofold.Samples;
import twofold.design.Design;
import twofold.design.Lever;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.layout.Outcome;

/** Levers set by an edit. */
class LeverEditsTest {
    private static final Design DESIGN = Samples.design("z-fold-rod");
    private static final Lever FOLD = DESIGN.levers().get(0);
    private static final Lever GAP = DESIGN.levers().get(1);

    @Test
    void everyLeverHasItsValueAndTheNameSaysSo() {
        Edit edit = LeverEdits.set(List.of(GAP, FOLD), 0.1052, Math.toRadians(9));
        assertThat(edit.name()).isEqualTo("set gap to 105.2 mm and fold to 9°");
        Laid set = edit.on(Layout.of(DESIGN).value().orElseThrow()).value().orElseThrow();
        assertThat(set.legs().get(1).path()).isCloseTo(0.1052, within(1e-12));
        // To 1e-9 rad, as mirrors are moved.
        assertThat(set.incidence().get(1)).isCloseTo(Math.toRadians(9), within(1e-9));
        assertThat(set.incidence().get(3)).isCloseTo(Math.toRadians(9), within(1e-9));
        assertThat(set.design().levers()).isEqualTo(DESIGN.levers());
    }

    @Test
    void whatCannotBeLaidOutIsRefusedInWords() {
        Edit edit = LeverEdits.set(List.of(GAP), 0.001);
        Outcome<Laid> refused = edit.on(Layout.of(DESIGN).value().orElseThrow());
        assertThat(refused.value()).isEmpty();
        assertThat(refused.problems()).isNotEmpty();
    }
}
