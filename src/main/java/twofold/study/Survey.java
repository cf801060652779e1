package twofold.study;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import java.util.Queue;
import java.util.concurrent.ConcurrentLinkedQueue;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.Consumer;
import java.util.function.Function;

/**
 * A question asked at every point of one or two axes, the first fastest, on several threads. Points come in pieces: each is
 * asked and worked up on a thread of its own, and handed over in order. Few pieces exist at a time, so memory does not grow
 * with the number of points; and each point stands for itself, so threads change nothing.
 */
public final class Survey {
    /** The most points of a survey. */
    public static final long MOST_POINTS = 10_000_000;

    /** The most points of a piece: enough that handing over costs nothing, few enough to stop at once. */
    private static final int MOST_IN_PIECE = 4096;

    /** So many pieces there are at least, where there are as many points. */
    private static final int LEAST_PIECES = 200;

    private final Question question;
    private final List<Axis> axes;
    private final long points;

    /**
     * @param question of as many levers as there are axes
     * @param axes one or two
     */
    public Survey(Question question, List<Axis> axes) {
        this.question = question;
        this.axes = List.copyOf(axes);
        long product = 1;
        for (Axis axis : axes) {
            product *= axis.size();
        }
        this.points = product;
    }

    /** How many points there are. */
    public long points() {
        return points;
    }

    /** The question. */
    public Question question() {
        return question;
    }

    /** The axes, the fastest first. */
    public List<Axis> axes() {
        return axes;
    }

    /** Some points that follow each other, with their answers. */
    public static final class Piece {
        private final long first;
        private final int count;
        private final double[] answers;

        Piece(long first, int count, double[] answers) {
            this.first = first;
            this.count = count;
            this.answers = answers;
        }

        /** The number of the first point. */
        public long first() {
            return first;
        }

        /** How many points there are. */
        public int count() {
            return count;
        }

        /**
         * What a quantity comes to at a point, in SI; NaN where undefined.
         *
         * @param point counted within the piece
         * @param quantity its number in the question
         */
        public double answer(int point, int quantity) {
            return answers[point * (answers.length / count) + quantity];
        }
    }

    /** Which value of an axis a point has. */
    public int index(int axis, long point) {
        return (int)
                (axis == 0 ? point % axes.get(0).size() : point / axes.get(0).size());
    }

    /**
     * Asks at every point.
     *
     * @param threads to ask on
     * @param workUp what becomes of a piece, on its thread
     * @param handOver takes what became of it, piece after piece, on the caller's thread
     * @param progress told by the caller's thread
     * @param <T> what becomes of a piece
     * @return whether it came to its end: false where progress stopped it or the caller's thread was interrupted
     */
    public <T> boolean run(int threads, Function<Piece, T> workUp, Consumer<T> handOver, Progress progress) {
        int size = (int) Math.max(1, Math.min(MOST_IN_PIECE, points / LEAST_PIECES));
        Queue<Asker> askers = new ConcurrentLinkedQueue<>();
        ExecutorService pool = Executors.newFixedThreadPool(threads, task -> {
            Thread thread = new Thread(task, "survey");
            thread.setDaemon(true);
            return thread;
        });
        try {
            Deque<Future<T>> ahead = new ArrayDeque<>();
            long asked = 0;
            long done = 0;
            while (done < points) {
                while (asked < points && ahead.size() <= 2 * threads) {
                    long first = asked;
                    int count = (int) Math.min(size, points - first);
                    ahead.add(pool.submit(() -> workUp.apply(ask(first, count, askers))));
                    asked += count;
                }
                handOver.accept(ahead.remove().get());
                done = Math.min(points, done + size);
                if (!progress.at((double) done / points)) {
                    return false;
                }
            }
            return true;
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            return false;
        } catch (ExecutionException e) {
            throw new IllegalStateException(e.getCause());
        } finally {
            pool.shutdownNow();
        }
    }

    private Piece ask(long first, int count, Queue<Asker> askers) {
        Asker free = askers.poll();
        Asker asker = free == null ? question.asker() : free;
        int width = question.quantities().size();
        double[] answers = new double[count * width];
        double[] values = new double[axes.size()];
        for (int i = 0; i < count && !Thread.currentThread().isInterrupted(); i++) {
            for (int axis = 0; axis < values.length; axis++) {
                values[axis] = axes.get(axis).value(index(axis, first + i));
            }
            asker.ask(values, answers, i * width);
        }
        askers.add(asker);
        return new Piece(first, count, answers);
    }
}
