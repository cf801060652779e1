package twofold.window;

import javafx.scene.control.Alert;
import javafx.scene.control.ButtonType;
import javafx.scene.layout.Region;
import javafx.stage.Window;

/** Texts that open in a window of their own. */
final class Words {
    private static final String KEYS = """
            Bench and beam
              wheel, + and −: zoom;  Home: show all
              middle button, space bar with the first, Alt with an arrow: pan
              click, Page Up, Page Down: select a part;  Esc: select none

            Everywhere
              Ctrl+O: open;  F5: reload;  Ctrl+0: show all
              Ctrl+T: light or dark;  F6: next pane;  Tab: next control
              Ctrl+Shift+C: copy the figures of the selected part in full precision""";

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
        alert.getDialogPane().setPrefWidth(560);
        alert.getDialogPane().getStylesheets().setAll(over.getScene().getRoot().getStylesheets());
        alert.getDialogPane().setStyle(over.getScene().getRoot().getStyle());
        alert.getDialogPane().getStyleClass().add("root");
        alert.show();
    }
}
