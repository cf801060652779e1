package twofold.window.panel;

import java.util.List;
import java.util.Optional;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.ListCell;
import javafx.scene.control.ListView;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import twofold.design.Part;
import twofold.session.Session;
import twofold.session.Shown;

/** The parts in beam order; the selection is the session's. */
public final class PartsPane extends VBox {
    private final ListView<Part> list = new ListView<>();
    private boolean isShowing;

    /** Makes the pane. */
    public PartsPane(Session session) {
        getStyleClass().add("inner-card");
        list.setId("parts");
        list.setAccessibleText("Parts in beam order");
        list.setCellFactory(view -> new Row());
        list.setPlaceholder(new Label("Nothing is open."));
        list.getSelectionModel().selectedIndexProperty().addListener((o, was, is) -> {
            if (!isShowing && is.intValue() >= 0) {
                session.select(Optional.of(is.intValue()));
            }
        });
        VBox.setVgrow(list, Priority.ALWAYS);
        getChildren().add(list);
    }

    /** Shows the parts of the design that is shown. */
    public void show(Shown shown) {
        List<Part> parts = shown.cavity().map(c -> c.laid().design().parts()).orElse(List.of());
        isShowing = true;
        if (!list.getItems().equals(parts)) {
            list.getItems().setAll(parts);
        }
        if (shown.selected().isPresent()) {
            int index = shown.selected().get();
            if (list.getSelectionModel().getSelectedIndex() != index) {
                list.getSelectionModel().clearAndSelect(index);
                list.scrollTo(Math.max(0, index - 2));
            }
        } else {
            list.getSelectionModel().clearSelection();
        }
        isShowing = false;
    }

    private static final class Row extends ListCell<Part> {
        private final Label name = new Label();
        private final Label kind = new Label();
        private final HBox box;

        Row() {
            Region gap = new Region();
            HBox.setHgrow(gap, Priority.ALWAYS);
            kind.getStyleClass().add("quiet");
            name.setMinWidth(0);
            kind.setMinWidth(Region.USE_PREF_SIZE);
            box = new HBox(8, name, gap, kind);
            box.setAlignment(Pos.CENTER_LEFT);
            setPrefWidth(0);
        }

        @Override
        protected void updateItem(Part part, boolean empty) {
            super.updateItem(part, empty);
            if (empty || part == null) {
                setGraphic(null);
                setAccessibleText(null);
            } else {
                name.setText(part.name());
                kind.setText(part.kind().word());
                setGraphic(box);
                setAccessibleText(part.name() + ", " + part.kind().word());
            }
        }
    }
}
