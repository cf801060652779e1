package twofold.window.panel;

import java.util.List;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ListCell;
import javafx.scene.control.ListView;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import twofold.file.Located;
import twofold.session.Shown;

/** What is wrong with the file as it stands, each with its place; takes no room when nothing is. */
public final class ProblemsPane extends VBox {
    private final Label title = new Label();
    private final ListView<String> list = new ListView<>();
    private boolean isPasted;

    /**
     * Makes the pane, hidden.
     *
     * @param dismiss forgets a refused file
     */
    public ProblemsPane(Runnable dismiss) {
        getStyleClass().addAll("card", "problems");
        title.getStyleClass().addAll("title", "bad");
        title.setWrapText(true);
        title.setLabelFor(list);
        list.setId("problems");
        list.setAccessibleText("Problems of the file");
        list.setCellFactory(view -> new Row());
        list.setPrefHeight(150);
        VBox.setVgrow(list, Priority.ALWAYS);
        Button close = new Button("Dismiss");
        close.setId("dismiss");
        close.setMinWidth(Region.USE_PREF_SIZE);
        close.setAccessibleHelp("Takes these problems away; the open design stays as it is");
        close.setOnAction(e -> {
            pasted(List.of());
            dismiss.run();
        });
        title.setMaxWidth(Double.MAX_VALUE);
        HBox.setHgrow(title, Priority.ALWAYS);
        getChildren().addAll(new HBox(8, title, close), list);
        setVisible(false);
        setManaged(false);
    }

    /** Shows what is wrong with a text that was to be pasted, until it is taken away or a document's problems come. */
    public void pasted(List<Located> problems) {
        setVisible(!problems.isEmpty());
        setManaged(!problems.isEmpty());
        title.setText("! The clipboard's text cannot be pasted.");
        list.getItems().setAll(problems.stream().map(ProblemsPane::line).toList());
        isPasted = !problems.isEmpty();
    }

    /** Shows the problems of the file that is shown. */
    public void show(Shown shown) {
        boolean isBad = !shown.problems().isEmpty() || shown.failure().isPresent();
        if (isPasted && !isBad) {
            return;
        }
        isPasted = false;
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
