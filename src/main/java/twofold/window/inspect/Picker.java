package twofold.window.inspect;

import java.util.List;
import java.util.function.Function;
import javafx.scene.control.Control;
import javafx.scene.layout.GridPane;
import org.jspecify.annotations.Nullable;
import twofold.design.Problem;
import twofold.window.form.Choice;
import twofold.window.form.Reason;
import twofold.window.form.Row;

/**
 * A row with a choice alone, or one that leads a typed row.
 *
 * @param <T> what is chosen among
 */
final class Picker<T> {
    /** Applies a choice. */
    interface Take<T> {
        /** Applies it to a part, and says what is wrong with it. */
        List<Problem> choose(Inspected now, T value);
    }

    private final Choice<T> choice;
    private final Function<Inspected, List<T>> all;
    private final Function<Inspected, T> value;
    private @Nullable Inspected now;

    Picker(
            String id,
            Function<T, String> words,
            Function<Inspected, List<T>> all,
            Function<Inspected, T> value,
            Take<T> take) {
        this.all = all;
        this.value = value;
        choice = new Choice<>(words, v -> now == null ? List.of() : take.choose(now, v));
        choice.setId("choice-" + id);
    }

    Control control() {
        return choice;
    }

    Reason reason() {
        return choice.reason();
    }

    void show(Inspected shown) {
        now = shown;
        choice.show(all.apply(shown), value.apply(shown));
    }

    void name(String called, String help) {
        choice.setAccessibleText(called);
        choice.setAccessibleHelp(help);
    }

    /** A row of the choice alone. */
    Line line(String title, String help) {
        Row row = new Row(title, List.of(choice), List.of(choice.reason()));
        name(title, help);
        row.help(help);
        return new Line() {
            @Override
            public void addTo(GridPane grid) {
                row.addTo(grid);
            }

            @Override
            public void show(Inspected shown) {
                Picker.this.show(shown);
            }

            @Override
            public void stash() {}
        };
    }

    /** A row of the choice and a typed value behind it. */
    Line leading(TypedLine typed) {
        return new Line() {
            @Override
            public void addTo(GridPane grid) {
                typed.addTo(grid);
            }

            @Override
            public void show(Inspected shown) {
                Picker.this.show(shown);
                typed.show(shown);
            }

            @Override
            public void stash() {
                typed.stash();
            }
        };
    }
}
