package twofold.window.inspect;

import java.util.List;
import javafx.geometry.HPos;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import twofold.session.Figure;

/** Figures as a table, rounded for reading; in full where the pointer rests. */
final class FiguresGrid extends GridPane {
    private List<Figure> figures = List.of();

    FiguresGrid() {
        setId("figures");
        setHgap(10);
        setVgap(3);
        ColumnConstraints names = new ColumnConstraints();
        names.setHgrow(Priority.ALWAYS);
        names.setMinWidth(60);
        ColumnConstraints numbers = new ColumnConstraints();
        numbers.setHalignment(HPos.RIGHT);
        numbers.setMinWidth(Region.USE_PREF_SIZE);
        getColumnConstraints().addAll(names, numbers, numbers);
    }

    void show(List<Figure> next) {
        if (next.equals(figures)) {
            return;
        }
        figures = next;
        getChildren().clear();
        int row = 0;
        boolean told = false;
        for (Figure figure : next) {
            if (figure.sagittal().isPresent() && !told) {
                add(plane("tangential"), 1, row);
                add(plane("sagittal"), 2, row++);
                told = true;
            }
            Label name = new Label(figure.unit().isEmpty() ? figure.name() : figure.name() + ", " + figure.unit());
            name.getStyleClass().add("quiet");
            name.setWrapText(true);
            add(name, 0, row);
            if (figure.sagittal().isPresent()) {
                add(value(figure.shown(), figure.full()), 1, row);
                add(value(figure.sagittal().get(), figure.sagittalFull().orElse("")), 2, row);
            } else {
                add(value(figure.shown(), figure.full()), 1, row, 2, 1);
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
}
