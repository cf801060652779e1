package twofold.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OperationsPerInvocation;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import twofold.design.Design;
import twofold.design.Lever;
import twofold.design.Place;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.study.Asked;
import twofold.study.Axis;
import twofold.study.Progress;
import twofold.study.Question;
import twofold.study.Survey;

/**
 * Maps over two lengths on all cores, per point, beside the bare products of their chains on the same cores: 24 general 2×2
 * products a plane.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@Warmup(iterations = 4, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(2)
public class MapBenchmark {
    private static final int SIDE = 1000;
    private static final int POINTS = SIDE * SIDE;
    private static final int RING_SIDE = 100;
    private static final int CORES = Runtime.getRuntime().availableProcessors();

    private final Survey wave = survey(TwelvePartWave.design(), SIDE);
    private final Survey ring = survey(TwelvePartRing.design(), RING_SIDE);

    private static Survey survey(Design design, int side) {
        Laid laid = Layout.of(design).value().orElseThrow();
        List<Lever> levers = List.of(leg("M0", "M1"), leg("M3", "M4"));
        Asked radius = Asked.parse("radius_um@M2:tangential", design).value().orElseThrow();
        return new Survey(
                new Question(laid, levers, List.of(radius)),
                levers.stream().map(l -> Axis.of(l, side)).toList());
    }

    private static Lever leg(String a, String b) {
        return new Lever(a, "leg_mm", List.of(Place.of(a, b)), new Lever.Range.Span(0.195, 0.205), false);
    }

    private static double sum(Survey survey) {
        double[] sum = {0};
        survey.run(
                CORES,
                piece -> {
                    double some = 0;
                    for (int i = 0; i < piece.count(); i++) {
                        some += piece.answer(i, 0);
                    }
                    return some;
                },
                some -> sum[0] += some,
                Progress.SILENT);
        return sum[0];
    }

    /** A standing wave of twelve parts: rigid arms. */
    @Benchmark
    @OperationsPerInvocation(POINTS)
    public double map() {
        return sum(wave);
    }

    /** A ring of twelve parts: the least movement of all its mirrors. */
    @Benchmark
    @OperationsPerInvocation(RING_SIDE * RING_SIDE)
    public double ringMap() {
        return sum(ring);
    }

    /** The floor: nothing but products of matrices, of which one changes from point to point. */
    @Benchmark
    @OperationsPerInvocation(POINTS)
    public double bareMap() throws InterruptedException, ExecutionException {
        ExecutorService pool = Executors.newFixedThreadPool(CORES);
        try {
            List<Callable<Double>> tasks = new ArrayList<>();
            for (int core = 0; core < CORES; core++) {
                tasks.add(() -> bare(POINTS / CORES));
            }
            double sum = 0;
            for (Future<Double> part : pool.invokeAll(tasks)) {
                sum += part.get();
            }
            return sum;
        } finally {
            pool.shutdown();
        }
    }

    private static double bare(int points) {
        double[] tangential = WalkBenchmark.matrices();
        double[] sagittal = WalkBenchmark.matrices();
        double sum = 0;
        for (int i = 0; i < points; i++) {
            tangential[1] = 0.1 + 1e-9 * i;
            sagittal[1] = tangential[1];
            sum += WalkBenchmark.bare(tangential) + WalkBenchmark.bare(sagittal);
        }
        return sum;
    }

    static Optional<String> floor(String label) {
        return label.endsWith("ap") ? Optional.of("bareMap") : Optional.empty();
    }
}
