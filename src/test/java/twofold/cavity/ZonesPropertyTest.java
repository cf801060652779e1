package twofold.cavity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import twofold.RandomDesigns;
import twofold.Solved;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Kind;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.design.TwoPowers;
import twofold.design.Values;
import twofold.layout.Layout;
import twofold.optics.Plane;

/** Zones against stability itself, place by place. */
class ZonesPropertyTest {
    private static final int PLACES = 300;

    static LongStream seeds() {
        return LongStream.range(0, 60);
    }

    /** A plane is stable at a path if and only if a zone holds it; near an edge neither is asked. */
    @ParameterizedTest
    @MethodSource("seeds")
    void aPlaneIsStableWithinItsZonesAndNowhereElse(long seed) {
        Chain chain = Chain.of(Layout.of(RandomDesigns.stable(seed)).value().orElseThrow());
        Trial trial = chain.trial();
        trial.run();
        for (int leg = 0; leg < chain.legs(); leg++) {
            for (Plane plane : Plane.values()) {
                Zones zones = Zones.of(trial, leg, plane);
                assertThat(zones.edges()).isSortedAccordingTo((a, b) -> Double.compare(a.path(), b.path()));
                assertThat(zones.here()).as("the cavity is stable").isPresent();
                Trial probe = trial.copy();
                for (int i = 0; i < PLACES; i++) {
                    double path = trial.pathOf(leg) * (0.2 + 2.0 * i / PLACES);
                    probe.walk(leg, path);
                    boolean within = zones.zones().stream().anyMatch(z -> z.from() < path && path < z.to());
                    if (Math.abs(probe.margin(plane)) > 1e-6) {
                        assertThat(within)
                                .as("leg %d, %s, %s", leg, plane, path)
                                .isEqualTo(probe.margin(plane) > 0);
                    }
                }
            }
        }
    }

    /** At an edge 1 − |half trace| is 0: to rounding of the path times the slope there. */
    @ParameterizedTest
    @MethodSource("seeds")
    void theMarginIsZeroAtAnEdge(long seed) {
        Chain chain = Chain.of(Layout.of(RandomDesigns.stable(seed)).value().orElseThrow());
        Trial trial = chain.trial();
        trial.run();
        for (int leg = 0; leg < chain.legs(); leg++) {
            for (Plane plane : Plane.values()) {
                for (ZoneEdge edge : Zones.of(trial, leg, plane).edges()) {
                    Trial probe = trial.copy();
                    double step = 1e-9 * Math.max(Math.abs(edge.path()), trial.pathOf(leg));
                    probe.walk(leg, edge.path() - step);
                    double before = edge.cause().of(probe, plane);
                    probe.walk(leg, edge.path() + step);
                    assertThat(before * edge.cause().of(probe, plane))
                            .as("what is 0 there changes sign there: leg %d, %s, %s", leg, plane, edge)
                            .isNegative();
                }
            }
        }
    }

    /**
     * Without folds a mirror that moves changes nothing but the path. A pumped crystal in the middle stays there, so that
     * its lens moves half as far: three places where one thing can happen.
     */
    @Test
    void alongAStraightCavityZonesAreThoseOfMovedMirrors() {
        double now = 0.3;
        Chain chain = Chain.of(Layout.of(pumped(now)).value().orElseThrow());
        Trial trial = chain.trial();
        trial.run();
        for (Plane plane : Plane.values()) {
            List<ZoneEdge> edges = Zones.of(trial, 0, plane).edges();
            assertThat(edges).hasSizeGreaterThan(4);
            assertThat(edges).anyMatch(e -> e.rank() == 1);
            for (ZoneEdge edge : edges) {
                if (edge.path() > 0.02) {
                    double below =
                            Solved.of(pumped(edge.path() - 1e-7)).mode(plane).margin();
                    double above =
                            Solved.of(pumped(edge.path() + 1e-7)).mode(plane).margin();
                    assertThat(below * above).as("%s", edge).isNegative();
                    assertThat(Solved.of(pumped(edge.path())).mode(plane).margin())
                            .isCloseTo(0, within(1e-12));
                }
            }
        }
    }

    private static Design pumped(double path) {
        Part crystal = Kind.CRYSTAL.part(
                "Crystal",
                Values.NONE
                        .with(Field.ALONG, Along.MIDDLE)
                        .with(Field.INSIDE, (Object) 0.01)
                        .with(Field.INDEX, (Object) 1.8)
                        .with(Field.THERMAL_POWER, new TwoPowers(5, 7)));
        return Design.of(
                "pumped", 1e-6, Shape.STANDING_WAVE, List.of(mirror("A", 0, -0.5), crystal, mirror("B", path, 0.8)));
    }

    private static Part mirror(String name, double x, double radius) {
        return Kind.MIRROR.part(
                name, Values.NONE.with(Field.AT, new Point(x, 0)).with(Field.ROC, (Object) radius));
    }
}
