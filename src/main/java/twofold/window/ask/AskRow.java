package twofold.window.ask;

import javafx.geometry.HPos;
import javafx.geometry.VPos;
import javafx.scene.AccessibleRole;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/**
 * A row that opens to be edited: Enter, Space or a click on its head; Delete removes it, Alt with an arrow key moves it.
 *
 * @param <T> a requirement, lever or tolerance
 */
final class AskRow<T> extends VBox {
    /** What a row has done to it. */
    interface Acts<T> {
        /** Takes it off the list. */
        void remove(AskRow<T> row);

        /** Moves it one place. */
        void move(AskRow<T> row, boolean down);

        /** Is told that the person opened it. */
        void opened(AskRow<T> row);
    }

    private final Sheet<T> sheet;
    private final GridPane head = new GridPane();
    private final Label mark = new Label();
    private final Label what = new Label();
    private final Label value = new Label();
    private final Label asked = new Label();
    private final Button up = new Button("Up");
    private final Button down = new Button("Down");
    private final Button remove = new Button("Remove");
    private final VBox inside;
    private final Acts<T> acts;
    private Head said = new Head("", "", "", "", "", "");
    private String style = "";

    AskRow(Sheet<T> sheet, Acts<T> acts) {
        this.sheet = sheet;
        this.acts = acts;
        getStyleClass().add("ask");
        head.getStyleClass().add("ask-head");
        head.setHgap(8);
        head.setFocusTraversable(true);
        head.setAccessibleRole(AccessibleRole.BUTTON);
        head.setAccessibleHelp("Enter opens and shuts it, Delete removes it, Alt with an arrow key moves it");
        head.setOnMouseClicked(this::clicked);
        ColumnConstraints marks = new ColumnConstraints();
        marks.setMinWidth(Region.USE_PREF_SIZE);
        ColumnConstraints numbers = new ColumnConstraints();
        numbers.setMinWidth(Region.USE_PREF_SIZE);
        ColumnConstraints rest = new ColumnConstraints();
        rest.setHgrow(Priority.ALWAYS);
        rest.setHalignment(HPos.RIGHT);
        head.getColumnConstraints().addAll(marks, numbers, rest);
        mark.getStyleClass().add("mark");
        what.setWrapText(true);
        what.setMinWidth(0);
        value.getStyleClass().add("figure");
        asked.getStyleClass().addAll("quiet", "small");
        asked.setWrapText(true);
        head.add(mark, 0, 0);
        head.add(what, 1, 0, 2, 1);
        head.add(value, 1, 1);
        head.add(asked, 2, 1);
        GridPane.setValignment(mark, VPos.TOP);
        button(up, "Moves it one place up the list (Alt+Up)");
        up.setOnAction(e -> acts.move(this, false));
        button(down, "Moves it one place down the list (Alt+Down)");
        down.setOnAction(e -> acts.move(this, true));
        button(remove, "Takes it off the list (Delete)");
        remove.setOnAction(e -> acts.remove(this));
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        inside = new VBox(4, sheet.node(), new HBox(6, up, down, gap, remove));
        inside.getStyleClass().add("ask-sheet");
        getChildren().addAll(head, inside);
        open(false);
        addEventHandler(KeyEvent.KEY_PRESSED, this::pressed);
    }

    private static void button(Button button, String help) {
        button.getStyleClass().add("low");
        button.setTooltip(new Tooltip(help));
        button.setAccessibleHelp(help);
    }

    private void clicked(MouseEvent e) {
        if (e.getButton() == MouseButton.PRIMARY) {
            head.requestFocus();
            turn();
            e.consume();
        }
    }

    private void pressed(KeyEvent e) {
        boolean isHead = head.isFocused();
        KeyCode key = e.getCode();
        if (isHead && (key == KeyCode.ENTER || key == KeyCode.SPACE)) {
            turn();
        } else if (key == KeyCode.DELETE && !e.isShortcutDown()) {
            acts.remove(this);
        } else if (e.isAltDown() && (key == KeyCode.UP || key == KeyCode.DOWN)) {
            acts.move(this, key == KeyCode.DOWN);
        } else if (key == KeyCode.ESCAPE && isOpen()) {
            head.requestFocus();
            open(false);
        } else {
            return;
        }
        e.consume();
    }

    private void turn() {
        open(!isOpen());
        if (isOpen()) {
            acts.opened(this);
        }
    }

    boolean isOpen() {
        return inside.isManaged();
    }

    void open(boolean isOpen) {
        inside.setVisible(isOpen);
        inside.setManaged(isOpen);
        tell();
    }

    private void tell() {
        head.setAccessibleText(said.words() + (isOpen() ? ", open" : ""));
    }

    Node head() {
        return head;
    }

    Sheet<T> sheet() {
        return sheet;
    }

    void show(Listed<T> now, int count, Head next) {
        sheet.show(now);
        up.setDisable(now.index() == 0);
        down.setDisable(now.index() == count - 1);
        if (next.equals(said)) {
            return;
        }
        said = next;
        mark.setText(next.mark());
        what.setText(next.what());
        value.setText(next.value());
        asked.setText(next.asked().replace("\n", " · "));
        boolean isMarked = !next.mark().isEmpty();
        mark.setVisible(isMarked);
        mark.setManaged(isMarked);
        if (!next.style().equals(style)) {
            for (Label label : new Label[] {mark, value}) {
                label.getStyleClass().remove(style);
                label.getStyleClass().add(next.style());
            }
            style = next.style();
        }
        tell();
    }
}
