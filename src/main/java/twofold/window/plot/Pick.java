package twofold.window.plot;

import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.function.Function;
import javafx.collections.FXCollections;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import twofold.window.form.InWords;

/**
 * One of several things, picked from a menu with its name before it.
 *
 * @param <T> what is picked; told apart by their words
 */
final class Pick<T> extends HBox {
    /** Room for the longest name, so that menus stand below each other, px. */
    private static final double NAMES = 56;

    private final ComboBox<T> box = new ComboBox<>();
    private final Function<T, String> words;
    private boolean isFilling;

    /**
     * An empty menu.
     *
     * @param words what an item is called
     * @param then told when a person picks another
     */
    Pick(String id, String name, Function<T, String> words, Runnable then) {
        super(5);
        this.words = words;
        getStyleClass().add("pick");
        Label label = new Label(name);
        label.setLabelFor(box);
        label.setMinWidth(NAMES);
        box.setId(id);
        box.setAccessibleText(name);
        box.setMinWidth(0);
        box.setMaxWidth(Double.MAX_VALUE);
        setHgrow(box, Priority.ALWAYS);
        box.setConverter(new InWords<>(box::getItems, words));
        box.valueProperty().addListener((o, was, is) -> {
            if (!isFilling) {
                then.run();
            }
        });
        getChildren().addAll(label, box);
    }

    /** Offers some items; what was picked stays so where it is among them, else the one that is given. */
    void fill(List<T> items, Optional<T> else_) {
        Optional<String> before = picked().map(words);
        Optional<T> kept = items.stream()
                .filter(i -> before.equals(Optional.of(words.apply(i))))
                .findFirst()
                .or(() -> else_)
                .or(() -> items.stream().findFirst());
        isFilling = true;
        box.setItems(FXCollections.observableArrayList(items));
        box.setValue(kept.orElse(null));
        isFilling = false;
        box.setDisable(items.isEmpty());
    }

    /** Shows or hides it: a quantity has no place, plane or edge. */
    void show(boolean isUsed) {
        setVisible(isUsed);
        setManaged(isUsed);
    }

    Optional<T> picked() {
        return Optional.ofNullable(box.getValue());
    }

    boolean isPicked(T item) {
        return Objects.equals(box.getValue(), item);
    }
}
