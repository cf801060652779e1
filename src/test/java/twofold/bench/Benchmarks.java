package twofold.bench;

import java.io.PrintStream;
import java.util.Collection;
import java.util.Locale;
import org.openjdk.jmh.profile.GCProfiler;
import org.openjdk.jmh.results.Result;
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.OptionsBuilder;
import org.openjdk.jmh.runner.options.VerboseMode;

/** Runs all benchmarks and prints one table of one run; the ratios are what counts, machines differ. */
public final class Benchmarks {
    private Benchmarks() {}

    /** Runs them; takes some minutes. */
    public static void main(String[] args) throws RunnerException {
        Collection<RunResult> results = new Runner(new OptionsBuilder()
                        .include(WalkBenchmark.class.getSimpleName())
                        .include(MapBenchmark.class.getSimpleName())
                        .addProfiler(GCProfiler.class)
                        .verbosity(VerboseMode.SILENT)
                        .build())
                .run();
        PrintStream out = System.out;
        out.printf(Locale.ROOT, "%-14s %10s %8s %10s %8s%n", "benchmark", "ns", "±", "÷ bare", "B/op");
        for (RunResult result : results) {
            Result<?> time = result.getPrimaryResult();
            Result<?> bytes = result.getSecondaryResults().get("gc.alloc.rate.norm");
            out.printf(
                    Locale.ROOT,
                    "%-14s %10.1f %8.1f %10.2f %8.0f%n",
                    time.getLabel(),
                    time.getScore(),
                    time.getScoreError(),
                    time.getScore() / floor(results, time.getLabel()),
                    bytes == null ? Double.NaN : bytes.getScore());
        }
    }

    /** Maps run on all cores, and so does their floor. */
    private static double floor(Collection<RunResult> results, String label) {
        return time(results, MapBenchmark.floor(label).orElse("bare")).getScore();
    }

    private static Result<?> time(Collection<RunResult> results, String label) {
        return results.stream()
                .map(RunResult::getPrimaryResult)
                .filter(r -> r.getLabel().equals(label))
                .findFirst()
                .orElseThrow();
    }
}
