package twofold.window.form;

import java.util.ArrayList;
import java.util.List;
import javafx.geometry.Pos;
import javafx.geometry.VPos;
import javafx.scene.Node;
import javafx.scene.control.Control;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** A name, its controls beside it, and under them why something was refused. */
public final class Row {
    private final Label name = new Label();
    private final Tooltip tip = new Tooltip();
    private final HBox controls = new HBox(4);
    private final VBox all = new VBox(2, controls);

    /** Makes a row of controls and their reasons. */
    public Row(String called, List<? extends Node> nodes, List<Reason> reasons) {
        name.setText(called);
        name.setWrapText(true);
        name.getStyleClass().add("quiet");
        // Two lines: of a longer name the tip has the rest.
        name.setMaxHeight(34);
        tip.setWrapText(true);
        tip.setMaxWidth(360);
        controls.setAlignment(Pos.CENTER_LEFT);
        controls.getChildren().addAll(nodes);
        all.getChildren().addAll(reasons);
        for (Node node : nodes) {
            if (node instanceof Control && !(node instanceof Label) && !(node instanceof Lock)) {
                HBox.setHgrow(node, Priority.SOMETIMES);
                name.setLabelFor(name.getLabelFor() == null ? node : name.getLabelFor());
            }
        }
    }

    /** The grid that rows stand in: names to the left, controls to the right. */
    public static GridPane grid() {
        GridPane grid = new GridPane();
        grid.setHgap(8);
        grid.setVgap(3);
        ColumnConstraints names = new ColumnConstraints();
        names.setMinWidth(84);
        names.setPrefWidth(96);
        ColumnConstraints controls = new ColumnConstraints();
        controls.setHgrow(Priority.ALWAYS);
        controls.setMinWidth(120);
        grid.getColumnConstraints().addAll(names, controls);
        return grid;
    }

    /** A unit or another word between controls. */
    public static Label word(String text) {
        Label label = new Label(text);
        label.getStyleClass().add("quiet");
        label.setMinWidth(Region.USE_PREF_SIZE);
        return label;
    }

    /** Puts the row at the end of a grid. */
    public void addTo(GridPane grid) {
        int row = grid.getRowCount();
        grid.add(name, 0, row);
        grid.add(all, 1, row);
        GridPane.setValignment(name, VPos.TOP);
        name.setMinHeight(24);
    }

    /** Puts the row at the end of a grid, with the controls under the name over the whole width. */
    public void addWideTo(GridPane grid) {
        int row = grid.getRowCount();
        grid.add(name, 0, row, 2, 1);
        grid.add(all, 0, row + 1, 2, 1);
    }

    /** Changes its name, and says what it is. */
    public void rename(String called, String words) {
        name.setText(called);
        help(called + "\n" + words);
    }

    /** Says what it is, when the pointer rests on it. */
    public void help(String words) {
        if (!words.equals(tip.getText())) {
            tip.setText(words);
            name.setTooltip(tip);
            List<Node> nodes = new ArrayList<>(controls.getChildren());
            nodes.stream()
                    .filter(n -> n instanceof Control && !(n instanceof Lock))
                    .map(n -> (Control) n)
                    .filter(c -> c.getTooltip() == null)
                    .forEach(c -> c.setTooltip(tip));
        }
    }

    /** Shows the row, or takes it and its room away. */
    public void appear(boolean isThere) {
        for (Node node : List.of(name, all)) {
            node.setVisible(isThere);
            node.setManaged(isThere);
        }
    }
}
