package twofold;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.EnumSet;
import java.util.Set;
import org.junit.jupiter.api.Test;
import twofold.design.Design;
import twofold.design.Kind;
import twofold.design.Shape;

class RandomDesignsTest {
    @Test
    void stableOnesAreStable() {
        for (long seed = 0; seed < 50; seed++) {
            Design design = RandomDesigns.stable(seed);
            double[][] rays = ExactRays.of(design).derivative();
            assertThat(ExactRays.halfTrace(rays, 0)).as(design.title()).isBetween(-0.98, 0.98);
            assertThat(ExactRays.halfTrace(rays, 1)).as(design.title()).isBetween(-0.98, 0.98);
        }
    }

    @Test
    void areOfAllKindsAndRepeat() {
        Set<Kind> kinds = EnumSet.noneOf(Kind.class);
        Set<Shape> shapes = EnumSet.noneOf(Shape.class);
        int most = 0;
        for (long seed = 0; seed < 200; seed++) {
            Design design = RandomDesigns.of(seed);
            assertThat(RandomDesigns.of(seed)).isEqualTo(design);
            shapes.add(design.shape());
            design.parts().forEach(p -> kinds.add(p.kind()));
            most = Math.max(most, design.parts().size());
        }
        assertThat(kinds).containsExactlyInAnyOrder(Kind.values());
        assertThat(shapes).containsExactlyInAnyOrder(Shape.values());
        assertThat(most).isBetween(80, 100);
    }
}
