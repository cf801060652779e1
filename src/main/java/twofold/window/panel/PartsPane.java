package twofold.window.panel;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.stream.Collectors;
import javafx.collections.ListChangeListener;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.ListCell;
import javafx.scene.control.ListView;
import javafx.scene.control.MultipleSelectionModel;
import javafx.scene.control.SelectionMode;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import twofold.design.Part;
import twofold.design.Problem;
import twofold.edit.PartEdits;
import twofold.session.Session;
import twofold.session.Shown;

/**
 * The parts in beam order; the selection is the session's. F2 or a double click renames in place: Enter takes the name, Esc
 * does not, and a name that is refused stays with its reason.
 */
public final class PartsPane extends VBox {
    private final ListView<Part> list = new ListView<>();
    private boolean isShowing;

    /** Makes the pane. */
    public PartsPane(Session session) {
        getStyleClass().add("inner-card");
        list.setId("parts");
        list.setAccessibleText("Parts in beam order");
        list.setEditable(true);
        list.getSelectionModel().setSelectionMode(SelectionMode.MULTIPLE);
        list.setCellFactory(view -> new Row(session));
        list.setPlaceholder(new Label("Nothing is open."));
        list.getSelectionModel().getSelectedIndices().addListener((ListChangeListener<Integer>) change -> {
            if (!isShowing) {
                selected(session);
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
        MultipleSelectionModel<Part> model = list.getSelectionModel();
        if (!model.getSelectedIndices().equals(shown.selection().all())) {
            model.clearSelection();
            shown.selection().all().forEach(model::select);
            shown.selected().ifPresent(lead -> {
                model.select((int) lead);
                list.scrollTo(Math.max(0, lead - 2));
            });
        }
        isShowing = false;
    }

    /** The list's selection becomes the session's, the part that was last touched its lead. */
    private void selected(Session session) {
        List<String> names = new ArrayList<>(list.getSelectionModel().getSelectedItems().stream()
                .filter(Objects::nonNull)
                .map(Part::name)
                .toList());
        Part lead = list.getSelectionModel().getSelectedItem();
        if (lead != null && names.remove(lead.name())) {
            names.add(lead.name());
        }
        session.select(names);
    }

    /** Lets the selected part be renamed in place. */
    public void rename() {
        list.requestFocus();
        list.edit(list.getSelectionModel().getSelectedIndex());
    }

    private static final class Row extends ListCell<Part> {
        private final Label name = new Label();
        private final Label kind = new Label();
        private final HBox box;
        private final TextField field = new TextField();
        private final Session session;

        Row(Session session) {
            this.session = session;
            field.setAccessibleText("New name");
            field.setOnAction(e -> take());
            field.setOnKeyPressed(e -> {
                if (e.getCode() == KeyCode.ESCAPE) {
                    cancelEdit();
                    e.consume();
                }
            });
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
        public void startEdit() {
            super.startEdit();
            if (isEditing()) {
                field.setText(getItem().name());
                setGraphic(field);
                field.selectAll();
                field.requestFocus();
            }
        }

        @Override
        public void cancelEdit() {
            super.cancelEdit();
            field.setTooltip(null);
            setGraphic(box);
            getListView().requestFocus();
        }

        private void take() {
            if (session.edit(PartEdits.rename(getItem().name(), field.getText()))
                    .value()
                    .isPresent()) {
                cancelEdit();
            } else {
                field.setTooltip(new Tooltip(session.shown().obstacles().stream()
                        .map(Problem::message)
                        .collect(Collectors.joining("\n"))));
            }
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
