package twofold.window;

import java.io.File;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javafx.scene.control.Alert;
import javafx.scene.control.Button;
import javafx.scene.control.ButtonBar;
import javafx.scene.control.ButtonType;
import javafx.scene.control.Dialog;
import javafx.scene.control.DialogPane;
import javafx.scene.layout.Region;
import javafx.stage.FileChooser;
import javafx.stage.Window;

/** Questions asked in dialogs over a window. */
final class Dialogs implements Asks {
    private final Window over;

    Dialogs(Window over) {
        this.over = over;
    }

    /** Makes a dialog look like the window that it belongs to. */
    static void dress(Dialog<?> dialog, Window over) {
        dialog.initOwner(over);
        DialogPane pane = dialog.getDialogPane();
        pane.setMinHeight(Region.USE_PREF_SIZE);
        pane.getStylesheets().setAll(over.getScene().getRoot().getStylesheets());
        pane.setStyle(over.getScene().getRoot().getStyle());
        pane.getStyleClass().add("root");
    }

    @Override
    public Optional<Path> open(Optional<Path> folder) {
        return Optional.ofNullable(chooser("Open a design", folder).showOpenDialog(over))
                .map(File::toPath);
    }

    @Override
    public Optional<Path> save(Optional<Path> folder, String name) {
        FileChooser chooser = chooser("Save the design", folder);
        chooser.setInitialFileName(name);
        return Optional.ofNullable(chooser.showSaveDialog(over)).map(File::toPath);
    }

    private static FileChooser chooser(String title, Optional<Path> folder) {
        FileChooser chooser = new FileChooser();
        chooser.setTitle(title);
        chooser.getExtensionFilters().add(new FileChooser.ExtensionFilter("Designs", "*.json"));
        folder.map(Path::toFile).filter(File::isDirectory).ifPresent(chooser::setInitialDirectory);
        return chooser;
    }

    @Override
    public Unsaved unsaved(String name) {
        ButtonType save = new ButtonType("Save", ButtonBar.ButtonData.YES);
        ButtonType discard = new ButtonType("Do not save", ButtonBar.ButtonData.NO);
        ButtonType stay = new ButtonType("Go on editing", ButtonBar.ButtonData.CANCEL_CLOSE);
        return ask(
                "Work that is not saved",
                name + " has changes that are not saved. Save them?",
                Map.of(save, Unsaved.SAVE, discard, Unsaved.DISCARD, stay, Unsaved.STAY),
                List.of(save, discard, stay),
                Unsaved.STAY);
    }

    @Override
    public Changed changed(String name) {
        ButtonType over = new ButtonType("Write over it", ButtonBar.ButtonData.YES);
        ButtonType elsewhere = new ButtonType("Save elsewhere…", ButtonBar.ButtonData.NO);
        ButtonType stay = new ButtonType("Do not save", ButtonBar.ButtonData.CANCEL_CLOSE);
        return ask(
                "The file was changed",
                name + " was changed on disk by another program since it was read here. "
                        + "Writing over it loses that change.",
                Map.of(over, Changed.WRITE_OVER, elsewhere, Changed.ELSEWHERE, stay, Changed.STAY),
                List.of(elsewhere, over, stay),
                Changed.STAY);
    }

    @Override
    public boolean delete(String title) {
        ButtonType delete = new ButtonType("Delete it", ButtonBar.ButtonData.YES);
        ButtonType keep = new ButtonType("Keep it", ButtonBar.ButtonData.CANCEL_CLOSE);
        return ask(
                "Work that is not saved",
                "Delete " + title + " for good? It was never saved in a file.",
                Map.of(delete, true, keep, false),
                List.of(keep, delete),
                false);
    }

    private <T> T ask(String title, String text, Map<ButtonType, T> answers, List<ButtonType> order, T none) {
        Alert alert = new Alert(Alert.AlertType.CONFIRMATION, text, order.toArray(ButtonType[]::new));
        dress(alert, over);
        alert.setTitle(title);
        alert.setHeaderText(title);
        alert.setGraphic(null);
        alert.getDialogPane().setPrefWidth(480);
        order.forEach(type -> {
            if (alert.getDialogPane().lookupButton(type) instanceof Button button) {
                button.setDefaultButton(type.equals(order.get(0)));
            }
        });
        return alert.showAndWait().map(answers::get).orElse(none);
    }
}
