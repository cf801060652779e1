package twofold.window;

import javafx.event.ActionEvent;
import javafx.geometry.Insets;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ButtonBar;
import javafx.scene.control.ButtonType;
import javafx.scene.control.Dialog;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.Tab;
import javafx.scene.control.TabPane;
import javafx.scene.layout.Region;
import javafx.stage.Window;
import twofold.design.Design;
import twofold.session.Runner;

/** Asks what a new design starts from: a shape with its numbers, or a list of legs and angles. */
final class NewDesign extends Dialog<Design> {
    private final ShapeForm shape = new ShapeForm();
    private final ListForm list = new ListForm();
    private final TabPane ways;
    private final ButtonType make = new ButtonType("Make", ButtonBar.ButtonData.OK_DONE);
    private final Runner runner;

    /**
     * Makes the dialog.
     *
     * @param runner for the search for a stable place
     */
    NewDesign(Window over, Runner runner) {
        this.runner = runner;
        setTitle("New design");
        setResizable(true);
        Dialogs.dress(this, over);
        ways = new TabPane(tab("A shape", shape), tab("From a list", list));
        ways.setId("ways");
        ways.setTabClosingPolicy(TabPane.TabClosingPolicy.UNAVAILABLE);
        ways.setAccessibleText("What the design starts from");
        getDialogPane().setContent(ways);
        getDialogPane().setPrefSize(620, 560);
        getDialogPane().setMinHeight(Region.USE_COMPUTED_SIZE);
        getDialogPane().getButtonTypes().addAll(make, ButtonType.CANCEL);
        button().setId("make");
        button().addEventFilter(ActionEvent.ACTION, e -> {
            make();
            e.consume();
        });
        setResultConverter(type -> null);
        setOnShown(e -> shape.first().requestFocus());
    }

    private static Tab tab(String title, Region form) {
        form.setPadding(new Insets(12));
        ScrollPane scroll = new ScrollPane(form);
        scroll.setFitToWidth(true);
        Node content = scroll;
        return new Tab(title, content);
    }

    private Button button() {
        return (Button) getDialogPane().lookupButton(make);
    }

    private void make() {
        if (ways.getSelectionModel().getSelectedIndex() == 1) {
            list.make().ifPresent(this::made);
            return;
        }
        shape.ask().ifPresent(search -> {
            button().setDisable(true);
            runner.run(search, ended -> {
                button().setDisable(false);
                shape.answer(ended).ifPresent(this::made);
            });
        });
    }

    private void made(Design design) {
        setResult(design);
        close();
    }
}
