package twofold.study;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Queue;
import java.util.concurrent.ConcurrentLinkedQueue;
import twofold.design.Quantity;
import twofold.layout.Laid;
import twofold.optics.Plane;

/**
 * A quantity over two levers with what a picture of it needs besides: both planes' half traces and how well all requirements
 * hold. Every grid runs along x first: index = row × columns + column; its arrays are nobody's to change.
 */
public final class Mapped {
    /** The most values of a lever: no picture shows more. */
    public static final int MOST = 1000;

    private static final int HALF_TRACES = 1;
    private static final int DEMANDS = HALF_TRACES + 2;

    private final Question question;
    private final Axis x;
    private final Axis y;
    private final double[] values;
    private final double[] tangential;
    private final double[] sagittal;
    private final Optional<double[]> margins;

    private Mapped(Question question, Axis x, Axis y, boolean hasDemands) {
        this.question = question;
        this.x = x;
        this.y = y;
        int size = x.size() * y.size();
        values = new double[size];
        tangential = new double[size];
        sagittal = new double[size];
        margins = hasDemands ? Optional.of(new double[size]) : Optional.empty();
    }

    /**
     * Asks at every point of two axes.
     *
     * @param question of one quantity and the axes' levers
     * @param x of the first lever, ascending, up to {@link #MOST} values
     * @param y of the second, likewise
     * @param threads to ask on
     * @param progress told how far it is; can stop it
     * @return empty where it was stopped
     */
    public static Optional<Mapped> of(Question question, Axis x, Axis y, int threads, Progress progress) {
        if (x.size() > MOST || y.size() > MOST) {
            throw new IllegalArgumentException(x.size() + " × " + y.size() + " values; accepted: up to " + MOST);
        }
        Laid laid = question.laid();
        Optional<Demands> demands = Demands.of(laid.design());
        List<Asked> asked = new ArrayList<>(question.quantities());
        for (Plane plane : Plane.values()) {
            asked.add(Asked.of(Quantity.HALF_TRACE, plane));
        }
        demands.ifPresent(d -> asked.addAll(d.quantities()));
        Mapped mapped = new Mapped(question, x, y, demands.isPresent());
        Survey survey = new Survey(new Question(laid, question.levers(), asked), List.of(x, y));
        Queue<Demands.Judge> judges = new ConcurrentLinkedQueue<>();
        boolean ended = survey.run(
                threads,
                piece -> {
                    Optional<Demands.Judge> judge = demands.map(d -> {
                        Demands.Judge free = judges.poll();
                        return free == null ? d.new Judge(laid, question.levers()) : free;
                    });
                    for (int i = 0; i < piece.count() && !Thread.currentThread().isInterrupted(); i++) {
                        mapped.take(survey, piece, i, asked.size(), judge);
                    }
                    judge.ifPresent(judges::add);
                    return piece.count();
                },
                count -> {},
                progress);
        if (ended && demands.isPresent() && demands.get().hasShortcut()) {
            mapped.sharpen(demands.get().new Judge(laid, question.levers()));
        }
        return ended ? Optional.of(mapped) : Optional.empty();
    }

    /** Where a point at which not all holds lies beside one where all does, its margin tells where between them it ends. */
    private void sharpen(Demands.Judge judge) {
        double[] margin = margins.orElseThrow();
        boolean[] isRim = new boolean[margin.length];
        for (int i = 0; i < margin.length; i++) {
            isRim[i] = margin[i] < 0 && hasMetNeighbour(margin, i);
        }
        double[] levers = new double[2];
        for (int i = 0; i < margin.length && !Thread.currentThread().isInterrupted(); i++) {
            if (isRim[i]) {
                levers[0] = x.value(i % x.size());
                levers[1] = y.value(i / x.size());
                margin[i] = judge.margin(levers);
            }
        }
    }

    private boolean hasMetNeighbour(double[] margin, int point) {
        int column = point % x.size();
        int row = point / x.size();
        for (int r = Math.max(0, row - 1); r <= Math.min(y.size() - 1, row + 1); r++) {
            for (int c = Math.max(0, column - 1); c <= Math.min(x.size() - 1, column + 1); c++) {
                if (margin[r * x.size() + c] >= 0) {
                    return true;
                }
            }
        }
        return false;
    }

    /** Pieces lie apart, so threads do not meet. */
    private void take(Survey survey, Survey.Piece piece, int point, int width, Optional<Demands.Judge> judge) {
        int at = (int) piece.first() + point;
        values[at] = piece.answer(point, 0);
        tangential[at] = piece.answer(point, HALF_TRACES);
        sagittal[at] = piece.answer(point, HALF_TRACES + 1);
        if (judge.isPresent() && margins.isPresent()) {
            double[] answers = new double[width - DEMANDS];
            for (int q = 0; q < answers.length; q++) {
                answers[q] = piece.answer(point, DEMANDS + q);
            }
            double[] levers = {x.value(survey.index(0, at)), y.value(survey.index(1, at))};
            margins.get()[at] = judge.get().margin(levers, answers);
        }
    }

    /** The design and the levers. */
    public Question question() {
        return question;
    }

    /** The quantity. */
    public Asked quantity() {
        return question.quantities().get(0);
    }

    /** The first lever. */
    public Axis x() {
        return x;
    }

    /** The second lever. */
    public Axis y() {
        return y;
    }

    /** The quantity at a point, in SI; NaN where undefined. */
    public double value(int index) {
        return values[index];
    }

    /** A plane's half trace at a point; NaN where nothing fits. */
    public double halfTrace(Plane plane, int index) {
        return (plane == Plane.TANGENTIAL ? tangential : sagittal)[index];
    }

    /** Whether anything is required. */
    public boolean hasMargins() {
        return margins.isPresent();
    }

    /**
     * The smallest margin of all requirements at a point, which hold where it is at least 0; NaN where one is undefined.
     * Away from the points where all hold it is below 0 and may not be the smallest.
     *
     * @throws java.util.NoSuchElementException where nothing is required
     */
    public double margin(int index) {
        return margins.orElseThrow()[index];
    }

    /** At how many points every requirement holds. */
    public long met() {
        return margins.map(m -> Arrays.stream(m).filter(v -> v >= 0).count()).orElse(0L);
    }
}
