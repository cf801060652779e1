package twofold.layout;

import java.util.List;
import java.util.Optional;
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

    /** Problems without a value. */
    public static <T> Outcome<T> failed(List<Problem> problems) {
        return new Outcome<>(Optional.empty(), problems);
    }
}
