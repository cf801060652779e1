package twofold.window;

import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Supplier;
import javafx.scene.control.Button;
import javafx.scene.control.Menu;
import javafx.scene.control.MenuItem;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCombination;

/**
 * Something that a person can do, from a menu, a key or a button. What is not possible says why: in an open menu behind the
 * disabled item, else in the words of the status line.
 *
 * @param id for style and tests
 * @param text as menus show it now
 * @param keys that do it anywhere in the window
 * @param help one sentence
 * @param whyNot in words; empty where it can be done
 * @param act does it
 */
record Action(
        String id,
        Supplier<String> text,
        Optional<KeyCombination> keys,
        String help,
        Supplier<Optional<String>> whyNot,
        Runnable act) {

    /** Something that can always be done. */
    static Action of(String id, String text, String keys, String help, Runnable act) {
        return new Action(id, () -> text, combination(keys), help, Optional::empty, act);
    }

    /** This under a text that changes. */
    Action saying(Supplier<String> other) {
        return new Action(id, other, keys, help, whyNot, act);
    }

    /** This, as far as it can be done. */
    Action unless(Supplier<Optional<String>> why) {
        return new Action(id, text, keys, help, why, act);
    }

    private static Optional<KeyCombination> combination(String keys) {
        return keys.isEmpty() ? Optional.empty() : Optional.of(KeyCombination.valueOf(keys));
    }

    /** Does it, or says why not. */
    void perform(Consumer<String> say) {
        Optional<String> why = whyNot.get();
        if (why.isPresent()) {
            say.accept(text.get() + ": " + why.get());
        } else {
            act.run();
        }
    }

    /**
     * A menu's line. It is refused while its menu is open only: a key pressed later asks anew.
     *
     * @param say where words go when a key asks for what cannot be done
     */
    MenuItem item(Consumer<String> say) {
        MenuItem item = new MenuItem(text.get());
        item.setId("menu-" + id);
        item.setMnemonicParsing(false);
        keys.ifPresent(item::setAccelerator);
        item.setOnAction(e -> perform(say));
        item.setUserData(this);
        return item;
    }

    /** Keeps a menu's lines true whenever it opens. */
    static void refresh(Menu menu) {
        menu.setOnShowing(e -> menu.getItems().forEach(Action::refresh));
        menu.setOnHidden(e -> menu.getItems().stream()
                .filter(i -> i.getUserData() instanceof Action)
                .forEach(i -> i.setDisable(false)));
    }

    private static void refresh(MenuItem item) {
        if (item.getUserData() instanceof Action action) {
            Optional<String> why = action.whyNot.get();
            item.setText(action.text.get() + why.map(w -> "  (" + w + ")").orElse(""));
            item.setDisable(why.isPresent());
        }
    }

    /** A toolbar's button. */
    Button button(String label, Consumer<String> say) {
        Button button = new Button(label);
        button.setId(id);
        String tip = help + keys.map(k -> " (" + k.getDisplayText() + ")").orElse("");
        button.setTooltip(new Tooltip(tip));
        button.setAccessibleHelp(tip);
        button.setOnAction(e -> perform(say));
        return button;
    }
}
