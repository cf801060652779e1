package twofold.bench;

import java.util.Arrays;
import java.util.concurrent.TimeUnit;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.RealMatrix;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import twofold.cavity.Chain;
import twofold.cavity.Face;
import twofold.cavity.Trial;
import twofold.layout.Layout;
import twofold.optics.Plane;

/** The walk of both planes beside the bare products of the same ring, and beside Commons Math matrices. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@Warmup(iterations = 5, time = 400, timeUnit = TimeUnit.MILLISECONDS)
@Measurement(iterations = 5, time = 400, timeUnit = TimeUnit.MILLISECONDS)
@Fork(3)
public class WalkBenchmark {
    /** A matrix for each of twelve parts and for the space before it. */
    private static final int PRODUCTS = 24;

    private final double[] tangential = matrices();
    private final double[] sagittal = matrices();
    private final RealMatrix[] tangentialMatrices = new RealMatrix[PRODUCTS];
    private final RealMatrix[] sagittalMatrices = new RealMatrix[PRODUCTS];
    private Trial trial =
            Chain.of(Layout.of(TwelvePartRing.design()).value().orElseThrow()).trial();
    private int x;
    private double place;
    private double step = 1e-6;

    /** Fills the matrices. */
    @Setup
    public void fill() {
        Chain chain = Chain.of(Layout.of(TwelvePartRing.design()).value().orElseThrow());
        trial = chain.trial();
        x = chain.x(0);
        place = trial.get(x);
        for (int i = 0; i < PRODUCTS; i++) {
            double[] m = Arrays.copyOfRange(tangential, 4 * i, 4 * i + 4);
            tangentialMatrices[i] = new Array2DRowRealMatrix(new double[][] {{m[0], m[1]}, {m[2], m[3]}}, false);
            sagittalMatrices[i] = tangentialMatrices[i].copy();
        }
    }

    /** 24 general 2×2 products a plane over flat arrays: the floor. */
    @Benchmark
    public double bare() {
        return bare(tangential) + bare(sagittal);
    }

    static double bare(double[] m) {
        double a = 1;
        double b = 0;
        double c = 0;
        double d = 1;
        for (int i = 0; i < m.length; i += 4) {
            double p = m[i] * a + m[i + 1] * c;
            double q = m[i] * b + m[i + 1] * d;
            double r = m[i + 2] * a + m[i + 3] * c;
            double s = m[i + 2] * b + m[i + 3] * d;
            a = p;
            b = q;
            c = r;
            d = s;
        }
        return (a + d) / 2;
    }

    /** Spaces and weak lenses. */
    static double[] matrices() {
        double[] all = new double[4 * PRODUCTS];
        for (int i = 0; i < PRODUCTS; i++) {
            double[] m = i % 2 == 0 ? new double[] {1, 0.1, 0, 1} : new double[] {1, 0, -0.3, 1};
            System.arraycopy(m, 0, all, 4 * i, 4);
        }
        return all;
    }

    /** From a moved mirror to both half traces and one radius. */
    @Benchmark
    public double walk() {
        step = -step;
        trial.set(x, place + step);
        trial.run();
        return trial.halfTrace(Plane.TANGENTIAL)
                + trial.halfTrace(Plane.SAGITTAL)
                + trial.radius(0, Face.SURFACE, Plane.TANGENTIAL);
    }

    /** The same number of products with Commons Math. */
    @Benchmark
    public double commonsMath() {
        return product(tangentialMatrices).getTrace() / 2
                + product(sagittalMatrices).getTrace() / 2;
    }

    private static RealMatrix product(RealMatrix[] matrices) {
        RealMatrix product = matrices[0];
        for (int i = 1; i < matrices.length; i++) {
            product = matrices[i].multiply(product);
        }
        return product;
    }
}
