package twofold.window.panel;

import java.util.List;
import javafx.scene.control.Label;
import javafx.scene.control.ListCell;
import javafx.scene.control.ListView;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import twofold.file.Located;
import twofold.session.Shown;

/** What is wrong with the file as it stands, each with its place; takes no room when nothing is. */
public final class ProblemsPane extends VBox {
    private final Label title = new Label();
    private final ListView<String> list = new ListView<>();

    /** Makes the pane, hidden. */
    public ProblemsPane() {
        getStyleClass().addAll("card", "problems");
        title.getStyleClass().addAll("title", "bad");
        title.setWrapText(true);
        title.setLabelFor(list);
        list.setId("problems");
        list.setAccessibleText("Problems of the file");
        list.setCellFactory(view -> new Row());
        list.setPrefHeight(150);
        VBox.setVgrow(list, Priority.ALWAYS);
        getChildren().addAll(title, list);
        setVisible(false);
        setManaged(false);
    }

    /** Shows the problems of the file that is shown. */
    public void show(Shown shown) {
        boolean isBad = !shown.problems().isEmpty() || shown.failure().isPresent();
        setVisible(isBad);
        setManaged(isBad);
        if (!isBad) {
            return;
        }
        String name = shown.attended().map(s -> s.name()).orElse("The file");
        String beside = shown.isStale()
                ? " The pictures show the last good design."
                : shown.source().map(s -> " " + s.name() + " stays open.").orElse("");
        List<String> lines = shown.failure()
                .map(List::of)
                .orElseGet(
                        () -> shown.problems().stream().map(ProblemsPane::line).toList());
        title.setText(
                shown.failure().isPresent()
                        ? "! " + name + " cannot be read." + beside
                        : "! " + name + " has " + lines.size() + (lines.size() == 1 ? " problem." : " problems.")
                                + beside);
        list.getItems().setAll(lines);
    }

    private static String line(Located problem) {
        return "line " + problem.line() + ", column " + problem.column() + ": "
                + problem.problem().line();
    }

    /** Wraps, so that a long message is read without scrolling sideways. */
    private static final class Row extends ListCell<String> {
        Row() {
            setWrapText(true);
            setPrefWidth(0);
        }

        @Override
        protected void updateItem(String line, boolean empty) {
            super.updateItem(line, empty);
            setText(empty ? null : line);
        }
    }
}
