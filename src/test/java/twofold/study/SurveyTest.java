package twofold.study;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;
import twofold.Samples;
import twofold.design.Design;
import twofold.layout.Laid;
import twofold.layout.Layout;

/** Questions asked at many points: in order, on any number of threads, and stopped. */
class SurveyTest {
    private static Survey map(String sample, int width, int height, String... quantities) {
        Design design = Samples.design(sample);
        Laid laid = Layout.of(design).value().orElseThrow();
        List<Asked> asked = Arrays.stream(quantities)
                .map(q -> Asked.parse(q, design).value().orElseThrow())
                .toList();
        return new Survey(
                new Question(laid, design.levers().subList(0, 2), asked),
                List.of(
                        Axis.of(design.levers().get(0), width),
                        Axis.of(design.levers().get(1), height)));
    }

    private static double[] all(Survey survey, int threads) {
        int width = survey.question().quantities().size();
        double[] all = new double[(int) survey.points() * width];
        List<Long> firsts = new ArrayList<>();
        boolean ended = survey.run(
                threads,
                piece -> piece,
                piece -> {
                    firsts.add(piece.first());
                    for (int i = 0; i < piece.count(); i++) {
                        for (int q = 0; q < width; q++) {
                            all[(int) (piece.first() + i) * width + q] = piece.answer(i, q);
                        }
                    }
                },
                Progress.SILENT);
        assertThat(ended).isTrue();
        assertThat(firsts).isSorted().doesNotHaveDuplicates().startsWith(0L);
        return all;
    }

    @Test
    void anyNumberOfThreadsGivesTheSameBits() {
        for (String sample : List.of("z-fold-rod", "bow-tie-doubler", "triangle-ring")) {
            Survey survey = map(sample, 41, 23, "stability_margin:sagittal", "round_trip_mm", "clearance_mm");
            double[] one = all(survey, 1);
            assertThat(Arrays.stream(one).filter(Double::isFinite)).hasSizeGreaterThan(100);
            assertThat(all(survey, 2)).isEqualTo(one);
            assertThat(all(survey, 5)).isEqualTo(one);
        }
    }

    @Test
    void aPointOfAMapIsThePointOfASweep() {
        Survey map = map("z-fold-rod", 21, 11, "half_trace:tangential");
        double[] all = all(map, 2);
        Asker asker = map.question().asker();
        double[] answer = new double[1];
        for (int i = all.length - 1; i >= 0; i -= 7) {
            asker.ask(
                    new double[] {
                        map.axes().get(0).value(map.index(0, i)),
                        map.axes().get(1).value(map.index(1, i))
                    },
                    answer,
                    0);
            assertThat(answer[0]).isEqualTo(all[i]);
        }
    }

    @Test
    void progressStopsIt() {
        Survey survey = map("z-fold-rod", 300, 300, "half_trace:tangential");
        AtomicInteger told = new AtomicInteger();
        AtomicInteger handed = new AtomicInteger();
        boolean ended = survey.run(2, piece -> piece, piece -> handed.incrementAndGet(), share -> {
            assertThat(share).isBetween(0.0, 1.0);
            return told.incrementAndGet() < 3;
        });
        assertThat(ended).isFalse();
        assertThat(told.get()).isEqualTo(3);
        assertThat(handed.get()).isEqualTo(3);
    }

    /** A piece is a small share of the whole, and few of them wait to be handed over, however slowly they are taken. */
    @Test
    void memoryDoesNotGrowWithTheNumberOfPoints() {
        Survey survey = map("z-fold-rod", 20_000, 100, "stability_margin:sagittal");
        AtomicInteger waiting = new AtomicInteger();
        AtomicInteger most = new AtomicInteger();
        long[] seen = {0};
        survey.run(
                2,
                piece -> {
                    most.accumulateAndGet(waiting.incrementAndGet(), Math::max);
                    return piece;
                },
                piece -> {
                    waiting.decrementAndGet();
                    seen[0] += piece.count();
                    assertThat(piece.count()).isLessThanOrEqualTo(4096);
                },
                Progress.SILENT);
        assertThat(seen[0]).isEqualTo(2_000_000);
        assertThat(most.get()).isBetween(1, 6);
    }
}
