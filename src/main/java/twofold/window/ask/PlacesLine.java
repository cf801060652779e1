package twofold.window.ask;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import twofold.design.Design;
import twofold.design.Place;
import twofold.design.Problem;
import twofold.edit.Offers;
import twofold.window.form.Reason;
import twofold.window.form.Row;

/** The parts or legs that a lever or tolerance sets together: each taken away by its button, others added by a menu. */
final class PlacesLine {
    private final VBox lines = new VBox(2);
    private final MenuButton more = new MenuButton("and…");
    private final Reason reason = new Reason();
    private final Function<List<Place>, List<Problem>> take;
    private List<Place> shown = List.of();

    PlacesLine(Function<List<Place>, List<Problem>> take) {
        this.take = take;
        more.setId("of-more");
        more.setAccessibleText("Add a place");
        more.setAccessibleHelp("Sets another part or leg together with these");
        HBox.setHgrow(lines, Priority.ALWAYS);
    }

    void addTo(GridPane grid) {
        Row row = new Row("Of", List.of(lines), List.of(reason));
        row.help("The parts or legs that are set together, to one value.");
        row.addTo(grid);
    }

    void show(Design design, String set, List<Place> of) {
        if (!of.equals(shown) || lines.getChildren().isEmpty()) {
            shown = of;
            List<Node> nodes = new ArrayList<>();
            of.forEach(p -> nodes.add(line(p)));
            nodes.add(more);
            lines.getChildren().setAll(nodes);
        }
        more.setOnShowing(e -> fill(design, set));
        if (more.getItems().isEmpty()) {
            more.getItems().add(new MenuItem());
        }
    }

    private Node line(Place place) {
        Label name = new Label(place.toString());
        name.setWrapText(true);
        name.setMinWidth(0);
        name.setMaxWidth(Double.MAX_VALUE);
        HBox.setHgrow(name, Priority.ALWAYS);
        Button out = new Button("×");
        out.getStyleClass().add("clear");
        out.setMinWidth(Region.USE_PREF_SIZE);
        boolean isLast = shown.size() == 1;
        out.setTooltip(new Tooltip("Takes it out"));
        out.setAccessibleText("Take out " + place);
        out.setAccessibleHelp(isLast ? "One has to stay" : "Takes it out");
        out.setDisable(isLast);
        out.setOnAction(e -> {
            List<Place> left = new ArrayList<>(shown);
            left.remove(place);
            reason.say(take.apply(left));
        });
        HBox line = new HBox(4, name, out);
        line.setAlignment(Pos.CENTER_LEFT);
        return line;
    }

    private void fill(Design design, String set) {
        List<MenuItem> items = new ArrayList<>();
        List<Place> all = new ArrayList<>(Offers.legs(design));
        design.parts().forEach(p -> all.add(Place.of(p.name())));
        for (Place place : all) {
            if (!shown.contains(place) && Offers.settings(design, place).contains(set)) {
                MenuItem item = new MenuItem(place.toString());
                item.setMnemonicParsing(false);
                item.setOnAction(e -> {
                    List<Place> longer = new ArrayList<>(shown);
                    longer.add(place);
                    reason.say(take.apply(longer));
                });
                items.add(item);
            }
        }
        if (items.isEmpty()) {
            MenuItem none = new MenuItem("nothing else has such a number");
            none.setDisable(true);
            items.add(none);
        }
        more.getItems().setAll(items);
    }
}
