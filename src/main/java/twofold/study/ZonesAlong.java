package twofold.study;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import twofold.cavity.Chain;
import twofold.cavity.EdgeCause;
import twofold.cavity.Reading;
import twofold.design.Lever;
import twofold.design.Quantity;
import twofold.layout.Laid;
import twofold.optics.Plane;

/**
 * The edges of one plane's stability zones along any lever: simple roots of what {@link EdgeCause} tells, found where it
 * changes sign between samples and then bisected. Where it comes nearest to 0 between samples without a change of sign, its
 * extremum is tested, so that two edges within one step, as a ring has where its half trace just passes ±1, are found too. A
 * zone is known by the edges that bound it.
 *
 * @param plane which
 * @param edges by value, ascending
 */
public record ZonesAlong(Plane plane, List<Edge> edges) {
    /** How near an extremum is found, as a share: so near, its value is right to the square of that. */
    private static final double NEAR = 1e-9;

    /** Far more than the 50 or so steps of a search for an extremum. */
    private static final int MOST_STEPS = 2000;

    /** Copies the list. */
    public ZonesAlong {
        edges = List.copyOf(edges);
    }

    /**
     * An edge.
     *
     * @param cause what happens there
     * @param rank which of the places where that happens, from 0 at the smallest value
     * @param value of the lever, in SI
     */
    public record Edge(EdgeCause cause, int rank, double value) {
        /** "B = 0", or "B = 0, second" where that happens again; of a ring "half trace 1". */
        public String name() {
            String what = switch (cause) {
                case FIRST_CENTRE_ON_LAST -> "A = 0";
                case ENDS_IMAGED -> "B = 0";
                case CENTRES_IMAGED -> "C = 0";
                case LAST_CENTRE_ON_FIRST -> "D = 0";
                case CLOSES_AT_ONCE -> "half trace 1";
                case CLOSES_REVERSED -> "half trace -1";
            };
            return rank == 0 ? what : what + " #" + (rank + 1);
        }
    }

    /**
     * The edges along a lever.
     *
     * @param samples between which a sign changes at most once, or twice about the extremum that they show
     */
    public static ZonesAlong of(Laid laid, Axis samples, Plane plane) {
        List<EdgeCause> causes = EdgeCause.of(Chain.of(laid));
        Asker asker = asker(laid, samples.lever(), causes, plane);
        double[] places = java.util.stream.IntStream.range(0, samples.size())
                .mapToDouble(samples::value)
                .sorted()
                .toArray();
        double[] earlier = new double[causes.size()];
        double[] before = new double[causes.size()];
        double[] here = new double[causes.size()];
        int[] ranks = new int[causes.size()];
        List<Edge> edges = new ArrayList<>();
        for (int i = 0; i < places.length; i++) {
            asker.ask(new double[] {places[i]}, here, 0);
            for (int c = 0; c < here.length && i > 0; c++) {
                if (here[c] * before[c] < 0 || (here[c] == 0 && before[c] != 0)) {
                    edges.add(new Edge(
                            causes.get(c), ranks[c]++, root(asker, causes.size(), c, places[i - 1], places[i])));
                } else if (i > 1 && comesNear(earlier[c], before[c], here[c])) {
                    int cause = c;
                    passed(asker, causes.size(), c, places[i - 2], places[i]).ifPresent(between -> {
                        for (double[] half : between) {
                            edges.add(new Edge(
                                    causes.get(cause),
                                    ranks[cause]++,
                                    root(asker, causes.size(), cause, half[0], half[1])));
                        }
                    });
                }
            }
            System.arraycopy(before, 0, earlier, 0, before.length);
            System.arraycopy(here, 0, before, 0, here.length);
        }
        edges.sort(Comparator.comparingDouble(Edge::value));
        return new ZonesAlong(plane, edges);
    }

    /** Whether three values of one sign come nearest to 0 in their middle. */
    private static boolean comesNear(double a, double b, double c) {
        return a * b > 0 && b * c > 0 && Math.abs(b) < Math.abs(a) && Math.abs(b) <= Math.abs(c);
    }

    /** The two intervals about an extremum beyond 0, in each of which the sign changes; empty where it stays on this side. */
    private static Optional<List<double[]>> passed(Asker asker, int causes, int cause, double from, double to) {
        double[] answers = new double[causes];
        asker.ask(new double[] {from}, answers, 0);
        double sign = Math.signum(answers[cause]);
        double place = new BrentOptimizer(NEAR, NEAR * Math.max(Math.abs(from), Math.abs(to)))
                .optimize(
                        GoalType.MINIMIZE,
                        new MaxEval(MOST_STEPS),
                        new SearchInterval(from, to),
                        new UnivariateObjectiveFunction(x -> {
                            asker.ask(new double[] {x}, answers, 0);
                            return Double.isNaN(answers[cause]) ? Double.POSITIVE_INFINITY : sign * answers[cause];
                        }))
                .getPoint();
        asker.ask(new double[] {place}, answers, 0);
        return sign * answers[cause] < 0
                ? Optional.of(List.of(new double[] {from, place}, new double[] {place, to}))
                : Optional.empty();
    }

    private static Asker asker(Laid laid, Lever lever, List<EdgeCause> causes, Plane plane) {
        return Asker.of(
                laid,
                List.of(lever),
                causes.stream()
                        .<Function<Chain, Reading>>map(cause -> chain -> trial -> cause.of(trial, plane))
                        .toList());
    }

    /** Halves the interval until nothing lies between its ends. */
    private static double root(Asker asker, int causes, int cause, double from, double to) {
        double[] answers = new double[causes];
        asker.ask(new double[] {from}, answers, 0);
        double atFrom = answers[cause];
        double a = from;
        double b = to;
        while (true) {
            double middle = a + (b - a) / 2;
            if (middle <= a || middle >= b) {
                return b;
            }
            asker.ask(new double[] {middle}, answers, 0);
            if (answers[cause] * atFrom > 0) {
                a = middle;
            } else {
                b = middle;
            }
        }
    }

    /**
     * The identity of the zone that holds a value of the lever, by its edges: "B = 0 to D = 0"; "-" stands for an edge
     * beyond the lever's range.
     *
     * @param value where the plane is stable
     */
    public String zone(double value) {
        Optional<Edge> lower = edges.stream().filter(e -> e.value() <= value).reduce((a, b) -> b);
        Optional<Edge> upper = edges.stream().filter(e -> e.value() > value).findFirst();
        return java.util.stream.Stream.of(lower, upper)
                .map(e -> e.map(Edge::name).orElse("-"))
                .collect(Collectors.joining(" to "));
    }

    /**
     * A stretch of the lever on which a plane is stable.
     *
     * @param plane which
     * @param from where it begins, in SI
     * @param to where it ends, in SI
     * @param lower the edge where it begins; empty where that is the range's end, or where there is no such layout beyond
     * @param upper the edge where it ends, likewise
     */
    public record Stretch(Plane plane, double from, double to, Optional<Edge> lower, Optional<Edge> upper) {}

    /**
     * Where the plane is stable.
     *
     * @param samples that the edges were found between, ascending
     * @param margins the plane's stability margin at each of them, NaN where there is no such layout
     */
    List<Stretch> stable(Laid laid, Axis samples, double[] margins) {
        Asker asker = new Question(laid, List.of(samples.lever()), List.of(Asked.of(Quantity.STABILITY_MARGIN, plane)))
                .asker();
        List<Stretch> stretches = new ArrayList<>();
        int sample = 0;
        for (int i = 0; i <= edges.size(); i++) {
            Optional<Edge> lower = i == 0 ? Optional.empty() : Optional.of(edges.get(i - 1));
            Optional<Edge> upper = i == edges.size() ? Optional.empty() : Optional.of(edges.get(i));
            double from = lower.map(Edge::value).orElse(samples.value(0));
            double to = upper.map(Edge::value).orElse(samples.value(samples.size() - 1));
            while (lower.isPresent() && sample < samples.size() && samples.value(sample) <= from) {
                // On the edge itself the margin is 0.
                sample++;
            }
            int first = sample;
            while (sample < samples.size() && samples.value(sample) < to) {
                sample++;
            }
            if (first == sample && from < to) {
                double[] margin = new double[1];
                asker.ask(new double[] {from + (to - from) / 2}, margin, 0);
                if (margin[0] > 0) {
                    stretches.add(new Stretch(plane, from, to, lower, upper));
                }
            } else if (first < sample) {
                runs(new Stretch(plane, from, to, lower, upper), samples, first, sample, margins, stretches);
            }
        }
        return stretches;
    }

    /** The runs of stable samples between two edges: one, but where there is no layout in between. */
    private static void runs(
            Stretch between, Axis samples, int first, int end, double[] margins, List<Stretch> stretches) {
        for (int i = first; i < end; i++) {
            if (!(margins[i] > 0)) {
                continue;
            }
            int begin = i;
            while (i + 1 < end && margins[i + 1] > 0) {
                i++;
            }
            boolean fromEdge = begin == first;
            boolean toEdge = i == end - 1;
            stretches.add(new Stretch(
                    between.plane(),
                    fromEdge ? between.from() : samples.value(begin),
                    toEdge ? between.to() : samples.value(i),
                    fromEdge ? between.lower() : Optional.empty(),
                    toEdge ? between.upper() : Optional.empty()));
        }
    }
}
