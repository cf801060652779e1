package twofold.edit;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.SplittableRandom;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import twofold.Samples;
import twofold.cavity.Cavity;
import twofold.design.Design;
import twofold.design.Lever;
import twofold.design.Mirror;
import twofold.design.Place;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.layout.Leg;
import twofold.layout.Outcome;
import twofold.optics.Plane;
import twofold.study.Levered;

/** Any mirror of any sample, displaced at random along a leg, is brought back into the middle of a zone. */
class NearestStablePropertyTest {
    /** Displacements, m. */
    private static final double FAR = 20e-3;

    private static final int DRAWS = 3;

    static Stream<Path> samples() {
        return Samples.files().stream();
    }

    @ParameterizedTest
    @MethodSource("samples")
    void aDisplacedMirrorIsBroughtToTheMiddleOfAZone(Path sample) {
        SplittableRandom random = new SplittableRandom(17);
        int edges = 0;
        Laid rest = Layout.of(Samples.design(sample)).value().orElseThrow();
        for (Mirror mirror : rest.design().mirrors()) {
            for (int i = 0; i < DRAWS; i++) {
                Optional<Laid> displaced = displaced(rest, mirror, random);
                if (displaced.isPresent()) {
                    edges += stands(displaced.get(), mirror.name());
                }
            }
        }
        assertThat(edges).as("edges of stability at the ends of stretches").isGreaterThan(DRAWS);
    }

    private static Lever leg(Place leg) {
        return new Lever("leg", "leg_mm", List.of(leg), new Lever.Range.Span(1e-3, 10), true);
    }

    private static Place place(Design design, Leg leg) {
        return Place.of(
                design.parts().get(leg.from()).name(),
                design.parts().get(leg.to()).name());
    }

    /** One of the mirror's legs longer or shorter; empty where holds or parts do not let it. */
    private static Optional<Laid> displaced(Laid rest, Mirror mirror, SplittableRandom random) {
        int part = rest.design().indexOf(mirror.name()).orElseThrow();
        List<Leg> legs = rest.legs().stream()
                .filter(l -> l.from() == part || l.to() == part)
                .toList();
        Leg leg = legs.get(random.nextInt(legs.size()));
        double path = leg.path() + FAR * (2 * random.nextDouble() - 1);
        return Levered.of(rest, List.of(leg(place(rest.design(), leg))), path).value();
    }

    /** How many ends of the stretch are edges of stability; the others are ends of what fits or can be laid out. */
    private static int stands(Laid displaced, String mirror) {
        Outcome<NearestStable.Found> outcome = NearestStable.of(displaced, mirror);
        assertThat(outcome.problems()).as(mirror).isEmpty();
        NearestStable.Found found = outcome.value().orElseThrow();
        Outcome<Laid> edited = NearestStable.edit(mirror).on(displaced);
        assertThat(edited.problems()).isEmpty();
        Laid laid = edited.value().orElseThrow();
        assertThat(laid.design()).isEqualTo(found.design());
        assertThat(margin(Cavity.solve(laid))).as(found.words()).isPositive();
        double half = found.stretch().length() / 2;
        int edges = 0;
        for (int side : new int[] {-1, 1}) {
            double inside = margin(displaced, found, found.then() + side * 0.999 * half);
            assertThat(inside).as("%s, inside, side %s", found.words(), side).isPositive();
            if (inside < 0.02) {
                edges++;
                assertThat(margin(displaced, found, found.then() + side * 1.001 * half))
                        .as("%s, outside, side %s", found.words(), side)
                        .isNotPositive();
            }
        }
        return edges;
    }

    /** The smaller margin of both planes with the found leg at a path; −1 where there is no layout. */
    private static double margin(Laid laid, NearestStable.Found found, double path) {
        return Levered.of(laid, List.of(leg(found.leg())), path)
                .value()
                .map(l -> margin(Cavity.solve(l)))
                .orElse(-1.0);
    }

    private static double margin(Cavity cavity) {
        return Math.min(
                1 - Math.abs(cavity.mode(Plane.TANGENTIAL).halfTrace()),
                1 - Math.abs(cavity.mode(Plane.SAGITTAL).halfTrace()));
    }
}
