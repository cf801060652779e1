package twofold.window;

import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import twofold.session.Shown;
import twofold.session.Source;

/** A line above the panes that says that the file was changed by another program; takes no room otherwise. */
final class Notice extends HBox {
    private final Label words = new Label();

    Notice(Runnable reload) {
        getStyleClass().add("notice");
        setId("notice");
        Button button = new Button("Reload");
        button.setId("reload");
        button.setAccessibleHelp("Reads the file from disk again");
        button.setOnAction(e -> reload.run());
        getChildren().addAll(words, button);
        setVisible(false);
        setManaged(false);
    }

    void show(Shown shown) {
        setVisible(shown.isChangedOnDisk());
        setManaged(shown.isChangedOnDisk());
        words.setText(
                shown.attended().map(Source::name).orElse("The file") + " was changed on disk by another program.");
    }
}
