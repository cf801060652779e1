package twofold.layout;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import twofold.design.Problem;

/**
 * What was asked for, or why it cannot be.
 *
 * @param value present exactly when there is no problem
 * @param problems everything that is wrong
 * @param <T> what was asked for
 */
public record Outcome<T>(Optional<T> value, List<Problem> problems) {
    /** Copies the list. */
    public Outcome {
        problems = List.copyOf(problems);
    }

    /** A value without problems. */
    public static <T> Outcome<T> of(T value) {
        return new Outcome<>(Optional.of(value), List.of());
    }

    /** One problem without a value. */
    public static <T> Outcome<T> failed(Problem problem) {
        return failed(List.of(problem));
    }

    /** Problems without a value. */
    public static <T> Outcome<T> failed(List<Problem> problems) {
        return new Outcome<>(Optional.empty(), problems);
    }

    /** What follows from the value, or the problems that there are already. */
    public <R> Outcome<R> then(Function<T, Outcome<R>> next) {
        return value.map(next).orElseGet(() -> failed(problems));
    }
}
