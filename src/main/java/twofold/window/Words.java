package twofold.window;

import javafx.scene.control.Alert;
import javafx.scene.control.ButtonType;
import javafx.scene.layout.Region;
import javafx.stage.Window;

/** Texts that open in a window of their own. */
final class Words {
    private static final String KEYS = """
            Bench
              drag a mirror or a part: move it;  Tab: what follows;  Esc: abandon
              arrows: 0.1 mm, Shift 1 mm, Ctrl 0.01 mm;  comma, full stop: turn 0.1°, Ctrl 0.01°
              Ctrl+1 to Ctrl+6: place a mirror, lens, plate, crystal, aperture, matrix;  Enter or click puts it down

            Bench and beam
              wheel, + and −: zoom;  Home: show all
              middle button, space bar with the first, Alt with an arrow: pan
              click, Page Up, Page Down: select a part;  Ctrl or Shift with a click: several;  Esc: none

            Sweep and map
              click, drag, arrows (Shift: ten steps): see that design;  Enter: apply;  Esc: back

            Fields and lists
              Enter or leaving a field: apply;  Esc: back to the value;  Ctrl+Enter: apply notes
              in a list: Enter opens a row, Delete removes it, Alt+Up and Alt+Down move it

            Everywhere
              Ctrl+N: new;  Ctrl+O: open;  Ctrl+S, Ctrl+Shift+S: save;  F5: reload
              Ctrl+Z, Ctrl+Shift+Z: undo, redo;  Ctrl+X, C, V: cut, copy, paste;  Ctrl+D: duplicate;  Delete
              Ctrl+A: select all;  F2: rename;  Alt+Page Up, Alt+Page Down: along the beam
              Ctrl+M: nearest stable place;  Ctrl+0: show all;  Ctrl+T: light or dark
              F6: next pane;  Tab: next control;  Ctrl+Shift+C: copy the part's figures""";

    private static final String ABOUT = """
            Twofold designs folded and ring laser cavities in both planes.

            All figures are design estimates of an ideal beam. Power inside a cavity, leakage at fold mirrors and \
            invisible wavelengths can blind: have the assessment made by a laser safety officer under IEC 60825-1 or \
            ANSI Z136.1 and local rules.""";

    private Words() {}

    static void keys(Window over) {
        show(over, "Keys and mouse", KEYS);
    }

    static void about(Window over) {
        show(over, "About Twofold", ABOUT);
    }

    private static void show(Window over, String title, String text) {
        Alert alert = new Alert(Alert.AlertType.INFORMATION, text, ButtonType.CLOSE);
        alert.initOwner(over);
        alert.setTitle(title);
        alert.setHeaderText(title);
        alert.setGraphic(null);
        alert.getDialogPane().setMinHeight(Region.USE_PREF_SIZE);
        alert.getDialogPane().setPrefWidth(680);
        alert.getDialogPane().getStylesheets().setAll(over.getScene().getRoot().getStylesheets());
        alert.getDialogPane().setStyle(over.getScene().getRoot().getStyle());
        alert.getDialogPane().getStyleClass().add("root");
        alert.show();
    }
}
