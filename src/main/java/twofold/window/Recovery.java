package twofold.window;

import java.io.IOException;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.Consumer;
import java.util.function.Predicate;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import twofold.file.UnsavedWork;

/** Lines above the panes that offer work that an earlier run left unsaved; takes no room where there is none. */
final class Recovery extends VBox {
    private static final DateTimeFormatter TIME =
            DateTimeFormatter.ofPattern("d MMM yyyy, HH:mm", Locale.ENGLISH).withZone(ZoneId.systemDefault());

    private final List<UnsavedWork> left = new ArrayList<>();

    Recovery() {
        setId("recovery");
        update();
    }

    /**
     * Offers work.
     *
     * @param open opens one; it is no longer offered then
     * @param mayDelete asks about one by its title
     * @param failed told in words what could not be deleted
     */
    void offer(
            List<UnsavedWork> works, Consumer<UnsavedWork> open, Predicate<String> mayDelete, Consumer<String> failed) {
        for (UnsavedWork work : works) {
            left.add(work);
            getChildren().add(line(work, open, mayDelete, failed));
        }
        update();
    }

    private HBox line(
            UnsavedWork work, Consumer<UnsavedWork> open, Predicate<String> mayDelete, Consumer<String> failed) {
        Label words = new Label("Work that was not saved: " + work.title() + ", "
                + TIME.format(work.entry().time()) + ".");
        words.setMinWidth(0);
        words.setMaxWidth(Double.MAX_VALUE);
        HBox.setHgrow(words, Priority.ALWAYS);
        HBox line = new HBox(words);
        line.getStyleClass().add("notice");
        line.getChildren()
                .addAll(
                        button("Open it", "Opens the work as it was at the last edit", () -> open.accept(work)),
                        button("Later", "Keeps the work and offers it at the next start", () -> later(work, line)),
                        button("Delete it", "Deletes the work for good", () -> {
                            if (mayDelete.test(work.title())) {
                                delete(work, line, failed);
                            }
                        }));
        line.setUserData(work);
        return line;
    }

    private static Button button(String text, String help, Runnable action) {
        Button button = new Button(text);
        button.setMinWidth(USE_PREF_SIZE);
        button.setAccessibleHelp(help);
        button.setOnAction(e -> action.run());
        return button;
    }

    /** Takes a work's line away: it has been opened. */
    void opened(UnsavedWork work) {
        left.remove(work);
        getChildren().removeIf(n -> work.equals(n.getUserData()));
        update();
    }

    private void later(UnsavedWork work, HBox line) {
        left.remove(work);
        getChildren().remove(line);
        leave(work);
        update();
    }

    private void delete(UnsavedWork work, HBox line, Consumer<String> failed) {
        left.remove(work);
        getChildren().remove(line);
        try {
            work.discard();
        } catch (IOException e) {
            failed.accept("It cannot be deleted: " + e.getMessage());
        }
        update();
    }

    /** Leaves what is still offered for another time. */
    void close() {
        left.forEach(Recovery::leave);
        left.clear();
    }

    private static void leave(UnsavedWork work) {
        try {
            work.close();
        } catch (IOException e) {
            System.getLogger(Recovery.class.getName())
                    .log(System.Logger.Level.WARNING, "unsaved work cannot be let go", e);
        }
    }

    private void update() {
        boolean any = !getChildren().isEmpty();
        setVisible(any);
        setManaged(any);
    }
}
