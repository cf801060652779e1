package twofold.layout;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import twofold.RandomDesigns;
import twofold.cavity.Cavity;
import twofold.design.Design;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.design.Turn;
import twofold.optics.Plane;

/** A standing wave stated by its legs and angles is the one stated by its mirrors' places. */
class TypedPropertyTest {
    /**
     * Of coordinates and of matrix elements over their size: designs of up to fifty folds, each turning by an angle good to
     * 1e-15, with arms of a metre beyond it.
     */
    private static final double CLOSE = 1e-10;

    private static final Point ELSEWHERE = new Point(-700, 900);

    static LongStream seeds() {
        return LongStream.range(0, 200).filter(seed -> RandomDesigns.of(seed).shape() == Shape.STANDING_WAVE);
    }

    @Test
    void thereAreFoldedDesignsAmongThem() {
        assertThat(seeds().filter(s -> RandomDesigns.of(s).mirrors().size() > 3))
                .hasSizeGreaterThan(20);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void theTypedTwinAgrees(long seed) {
        Design design = RandomDesigns.of(seed);
        Laid laid = Layout.of(design).value().orElseThrow();
        Design twin = Layout.typed(forgotten(design), typed(laid)).value().orElseThrow();
        for (int i = 0; i < design.mirrors().size(); i++) {
            Point was = design.mirrors().get(i).at();
            Point is = twin.mirrors().get(i).at();
            assertThat(is.distance(was)).as(design.mirrors().get(i).name()).isLessThan(CLOSE);
        }
        Cavity here = Cavity.solve(laid);
        Cavity there = Cavity.solve(Layout.of(twin).value().orElseThrow());
        for (Plane plane : Plane.values()) {
            double h = here.mode(plane).halfTrace();
            double size = 1
                    + Math.abs(here.mode(plane).roundTrip().a())
                    + Math.abs(here.mode(plane).roundTrip().b())
                    + Math.abs(here.mode(plane).roundTrip().c());
            assertThat(there.mode(plane).halfTrace()).isCloseTo(h, within(1e3 * CLOSE * size));
        }
    }

    /** The design with every mirror but the first where it is not. */
    private static Design forgotten(Design design) {
        List<Part> parts = new ArrayList<>(design.parts());
        for (int i = 1; i < parts.size(); i++) {
            if (parts.get(i) instanceof Mirror mirror) {
                parts.set(i, mirror.at(ELSEWHERE));
            }
        }
        return design.withParts(parts);
    }

    /** What a person would read off the plan and type. */
    private static Map<Integer, Typed> typed(Laid laid) {
        Map<Integer, Typed> typed = new HashMap<>();
        List<Leg> legs = laid.legs();
        Point first = legs.get(0).heading();
        typed.put(
                0,
                new Typed(
                        OptionalDouble.empty(),
                        OptionalDouble.empty(),
                        Optional.empty(),
                        OptionalDouble.of(Math.atan2(first.y(), first.x()))));
        for (int k = 0; k < legs.size(); k++) {
            boolean folds = k + 1 < legs.size();
            Point in = legs.get(k).heading();
            Point out = folds ? legs.get(k + 1).heading() : in;
            boolean left = in.x() * out.y() - in.y() * out.x() > 0;
            int mirror = legs.get(k).to();
            typed.put(
                    mirror,
                    new Typed(
                            OptionalDouble.of(legs.get(k).path()),
                            folds
                                    ? OptionalDouble.of(laid.incidence().getOrDefault(mirror, Double.NaN))
                                    : OptionalDouble.empty(),
                            folds ? Optional.of(left ? Turn.LEFT : Turn.RIGHT) : Optional.empty(),
                            OptionalDouble.empty()));
        }
        return typed;
    }
}
