package twofold.window.form;

import java.util.List;
import java.util.Objects;
import java.util.function.Function;
import javafx.scene.control.ChoiceBox;
import org.jspecify.annotations.Nullable;
import twofold.design.Problem;

/**
 * One of several values, chosen from a list. A refused choice is taken back, and its reason said.
 *
 * @param <T> the values
 */
public final class Choice<T> extends ChoiceBox<T> {
    private static final double WIDE = 112;

    private final Reason reason = new Reason();
    private @Nullable T shown;
    private boolean isShowing;

    /**
     * Makes it without values.
     *
     * @param words a value in words
     * @param take applies a choice, and says what is wrong with it
     */
    public Choice(Function<T, String> words, Function<T, List<Problem>> take) {
        setMaxWidth(Double.MAX_VALUE);
        setConverter(new InWords<>(this::getItems, words));
        getSelectionModel().selectedItemProperty().addListener((o, was, is) -> {
            if (!isShowing && is != null && !is.equals(shown)) {
                choose(is, take);
            }
        });
    }

    /** Short words are never cut; long ones, as names, give way to what stands beside. */
    @Override
    protected double computeMinWidth(double height) {
        return Math.min(WIDE, computePrefWidth(height));
    }

    private void choose(T value, Function<T, List<Problem>> take) {
        List<Problem> problems = take.apply(value);
        reason.say(problems);
        if (!problems.isEmpty() && shown != null) {
            isShowing = true;
            setValue(shown);
            isShowing = false;
        }
    }

    /** Why a choice was refused, to be put under the control. */
    public Reason reason() {
        return reason;
    }

    /** Shows what can be chosen, and what is. */
    public void show(List<T> values, T now) {
        if (!Objects.equals(now, shown) || !getItems().equals(values)) {
            isShowing = true;
            if (!getItems().equals(values)) {
                getItems().setAll(values);
            }
            shown = now;
            setValue(now);
            isShowing = false;
            reason.say("");
        }
    }
}
