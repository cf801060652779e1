package twofold.window.panel;

import java.util.List;
import java.util.stream.Collectors;
import javafx.geometry.HPos;
import javafx.geometry.Insets;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.Tooltip;
import javafx.scene.input.Clipboard;
import javafx.scene.input.ClipboardContent;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import twofold.design.Part;
import twofold.session.Figure;
import twofold.session.Figures;
import twofold.session.Shown;

/** Every figure of the selected part, rounded for reading; copied in full precision. */
public final class PartPane extends VBox {
    private final Label title = new Label();
    private final Button copy = new Button("Copy figures");
    private final GridPane grid = new GridPane();
    private List<Figure> figures = List.of();

    /** Makes the pane. */
    public PartPane() {
        getStyleClass().add("inner-card");
        title.getStyleClass().add("title");
        title.setMinWidth(0);
        HBox.setHgrow(title, Priority.ALWAYS);
        title.setMaxWidth(Double.MAX_VALUE);
        copy.setId("copy-figures");
        copy.setMinWidth(Region.USE_PREF_SIZE);
        copy.setTooltip(new Tooltip("Copy all figures of this part in full precision"));
        copy.setAccessibleHelp("Copies all figures of the selected part in full precision");
        copy.setOnAction(e -> copy());
        grid.setId("figures");
        grid.setHgap(10);
        grid.setVgap(3);
        grid.setPadding(new Insets(2, 4, 4, 0));
        ColumnConstraints names = new ColumnConstraints();
        names.setHgrow(Priority.ALWAYS);
        names.setMinWidth(60);
        ColumnConstraints numbers = new ColumnConstraints();
        numbers.setHalignment(HPos.RIGHT);
        numbers.setMinWidth(Region.USE_PREF_SIZE);
        grid.getColumnConstraints().addAll(names, numbers, numbers);
        ScrollPane scroll = new ScrollPane(grid);
        scroll.setFitToWidth(true);
        scroll.setId("figures-scroll");
        scroll.setAccessibleText("Figures of the selected part");
        VBox.setVgrow(scroll, Priority.ALWAYS);
        getChildren().addAll(new HBox(8, title, copy), scroll);
        show(List.of(), "No part is selected.");
    }

    /** Shows the selected part's figures. */
    public void show(Shown shown) {
        if (shown.cavity().isEmpty() || shown.selected().isEmpty()) {
            show(List.of(), "No part is selected.");
            return;
        }
        int index = shown.selected().get();
        Part part = shown.cavity().get().laid().design().parts().get(index);
        show(
                Figures.of(shown.cavity().get(), index),
                part.name() + " · " + part.kind().word());
    }

    private void show(List<Figure> next, String head) {
        title.setText(head);
        copy.setDisable(next.isEmpty());
        if (next.equals(figures) && !grid.getChildren().isEmpty()) {
            return;
        }
        figures = next;
        grid.getChildren().clear();
        int row = 0;
        boolean told = false;
        for (Figure figure : next) {
            if (figure.sagittal().isPresent() && !told) {
                grid.add(plane("tangential"), 1, row);
                grid.add(plane("sagittal"), 2, row++);
                told = true;
            }
            Label name = new Label(figure.unit().isEmpty() ? figure.name() : figure.name() + ", " + figure.unit());
            name.getStyleClass().add("quiet");
            name.setWrapText(true);
            grid.add(name, 0, row);
            if (figure.sagittal().isPresent()) {
                grid.add(value(figure.shown(), figure.full()), 1, row);
                grid.add(value(figure.sagittal().get(), figure.sagittalFull().orElse("")), 2, row);
            } else {
                grid.add(value(figure.shown(), figure.full()), 1, row, 2, 1);
            }
            row++;
        }
    }

    private static Node plane(String word) {
        Label label = new Label(word);
        label.getStyleClass().addAll("plane", word);
        return label;
    }

    private static Node value(String shown, String full) {
        Label label = new Label(shown);
        label.getStyleClass().add("figure");
        if (!full.equals(shown) && !full.isEmpty()) {
            label.setTooltip(new Tooltip(full));
        }
        return label;
    }

    /** Puts all figures on the clipboard, a line each. */
    public void copy() {
        ClipboardContent content = new ClipboardContent();
        content.putString(
                title.getText() + "\n" + figures.stream().map(Figure::line).collect(Collectors.joining("\n")) + "\n");
        Clipboard.getSystemClipboard().setContent(content);
    }
}
