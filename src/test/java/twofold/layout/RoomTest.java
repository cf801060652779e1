package twofold.layout;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import twofold.RandomDesigns;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.FourNumbers;
import twofold.design.Kind;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.design.Values;

class RoomTest {
    /** Rounding of paths of 100 mm, some units in the last place. */
    private static final double ROUNDING = 1e-15;

    private static Part mirror(String name, double x) {
        return Kind.MIRROR.part(name, Values.NONE.with(Field.AT, new Point(x, 0)));
    }

    private static Part box(String name, double length, double along) {
        FourNumbers unit = new FourNumbers(1, 0, 0, 1);
        return Kind.MATRIX.part(
                name,
                Values.NONE
                        .with(Field.ALONG, Along.at(along))
                        .with(Field.BOX, (Object) length)
                        .with(Field.TANGENTIAL, unit)
                        .with(Field.SAGITTAL, unit));
    }

    private static Design with(Part... parts) {
        List<Part> all = new ArrayList<>(List.of(mirror("A", 0)));
        all.addAll(List.of(parts));
        all.add(mirror("B", 0.1));
        return Design.of("", 1e-6, Shape.STANDING_WAVE, all);
    }

    private static double along(Design design, int part) {
        return Room.along(design.parts().get(part)).path();
    }

    @Test
    void thePathIsTheLegs() {
        for (long seed = 1; seed <= 40; seed++) {
            Design design = RandomDesigns.of(seed);
            Laid laid = Moved.laid(design);
            for (int leg = 0; leg < laid.legs().size(); leg++) {
                assertThat(Room.on(design, leg).path())
                        .isEqualTo(laid.legs().get(leg).path());
                assertThat(Room.on(design, leg).parts())
                        .isEqualTo(laid.legs().get(leg).parts());
            }
            assertThat(Room.settled(design)).isEqualTo(design);
        }
    }

    @Test
    void neighboursLimitAPart() {
        Room room = Room.on(with(box("P", 0.01, 0.02), box("Q", 0.02, 0.05), box("R", 0, 0.08)), 0);
        assertThat(room.nearest(2, 0.04).orElseThrow()).isEqualTo(0.04);
        assertThat(room.nearest(2, 0).orElseThrow()).isCloseTo(0.035, within(ROUNDING));
        assertThat(room.nearest(2, 1).orElseThrow()).isCloseTo(0.07, within(ROUNDING));
        assertThat(room.nearest(3, 1).orElseThrow()).isCloseTo(0.1, within(ROUNDING));
        assertThat(Room.on(with(box("P", 0.05, 0.025), box("Q", 0.02, 0.06), box("R", 0.04, 0.08)), 0)
                        .nearest(2, 0.06))
                .isEmpty();
    }

    @Test
    void partsArePushedNoFurtherThanTheyMust() {
        Design settled = Room.settled(with(box("P", 0.02, 0.02), box("Q", 0.02, 0.03), box("R", 0.02, 0.095)));
        assertThat(along(settled, 1)).isEqualTo(0.02);
        assertThat(along(settled, 2)).isCloseTo(0.04, within(ROUNDING));
        assertThat(along(settled, 3)).isCloseTo(0.09, within(ROUNDING));
        Design full = with(box("P", 0.06, 0.03), box("Q", 0.06, 0.03));
        assertThat(Room.settled(full)).isEqualTo(full);
    }

    @Test
    void aPartInTheMiddleStaysInWordsWhereItFits() {
        Design design = with(box("P", 0.02, 0.05));
        List<Part> parts = new ArrayList<>(design.parts());
        parts.set(1, parts.get(1).with(Field.ALONG, Along.MIDDLE));
        Design middle = design.withParts(parts);
        assertThat(Room.settled(middle)).isEqualTo(middle);
        assertThat(((Mirror) middle.parts().get(2)).name()).isEqualTo("B");
    }
}
