package twofold.window;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import javafx.scene.Scene;
import javafx.scene.control.Menu;
import javafx.scene.control.MenuBar;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.control.RadioMenuItem;
import javafx.scene.control.SeparatorMenuItem;
import javafx.scene.control.ToggleGroup;
import javafx.scene.layout.HBox;
import javafx.stage.Window;
import twofold.layout.Follow;
import twofold.picture.Theme;
import twofold.session.Samples;

/** The menus and the toolbar over an editor. */
final class Bars {
    private static final List<Integer> FACTORS = List.of(1, 5, 10, 20, 50, 100);

    private final Editor editor;
    private final Recall recall;
    private final Documents documents;
    private final EditActions edits;
    private final Action make;
    private final Action open;
    private final Action save;
    private final Action turnTheme;
    private final Action showAll;
    private final Menu recent = new Menu("Open _recent");

    Bars(Editor editor, Recall recall, Documents documents) {
        this.editor = editor;
        this.recall = recall;
        this.documents = documents;
        edits = new EditActions(editor);
        make = Action.of(
                "new",
                "New…",
                "Shortcut+N",
                "Begins a new design",
                () -> new NewDesign(window(), editor.runner()).showAndWait().ifPresent(documents::create));
        open = Action.of("open", "Open…", "Shortcut+O", "Opens a design file", () -> documents.open());
        save = Action.of("save", "Save", "Shortcut+S", "Saves the design in its file", documents::save)
                .unless(edits::closed);
        turnTheme = Action.of(
                "theme",
                "Light or dark",
                "Shortcut+T",
                "Changes between the light and the dark theme",
                this::turnTheme);
        showAll = Action.of(
                "show-all", "Show all", "Shortcut+0", "Shows all of the bench and of the path", editor::showAll);
    }

    /** Keys beside those that menus show. */
    void addKeys(Scene scene) {
        scene.getAccelerators().put(edits.redoToo(), () -> edits.redo().perform(editor::say));
    }

    MenuBar menus() {
        MenuBar menus = new MenuBar(file(), edit(), place(), plan(), view(), help());
        menus.setId("menus");
        menus.setAccessibleText("Menus");
        return menus;
    }

    HBox toolbar() {
        MenuButton sample = menu("samples", "Samples", "Opens a sample that the program carries");
        sample.getItems().setAll(samples());
        MenuButton place = menu("place", "Place", "Hangs a new part at the pointer, to be put on a leg");
        place.getItems().setAll(items(edits.placing()));
        MenuButton width =
                menu("beam-width", "Beam width", "How many times wider than true the beam is drawn on the bench");
        width.getItems().setAll(factors());
        HBox row = new HBox(
                make.button("New…", editor::say),
                open.button("Open…", editor::say),
                save.button("Save", editor::say),
                edits.undo().button("Undo", editor::say),
                edits.redo().button("Redo", editor::say),
                place,
                edits.nearestStable().button("Nearest stable place", editor::say),
                showAll.button("Show all", editor::say),
                width,
                sample,
                turnTheme.button("Light or dark", editor::say));
        row.getStyleClass().add("toolbar-row");
        return row;
    }

    private static MenuButton menu(String id, String text, String help) {
        MenuButton menu = new MenuButton(text);
        menu.setId(id);
        menu.setAccessibleHelp(help);
        return menu;
    }

    private List<MenuItem> items(List<Action> actions) {
        return actions.stream().map(a -> a.item(editor::say)).toList();
    }

    private static MenuItem plain(String text, Runnable action) {
        MenuItem item = new MenuItem(text);
        item.setMnemonicParsing(false);
        item.setOnAction(e -> action.run());
        return item;
    }

    private List<MenuItem> samples() {
        return Samples.names().stream()
                .map(name -> plain(name, () -> documents.openSample(name)))
                .toList();
    }

    private Menu file() {
        Menu samples = new Menu("Open _sample");
        samples.getItems().setAll(samples());
        Menu file = new Menu("_File");
        file.getItems().addAll(items(List.of(make, open)));
        file.getItems().addAll(samples, recent);
        file.getItems()
                .addAll(items(List.of(
                        save,
                        Action.of(
                                        "save-as",
                                        "Save as…",
                                        "Shortcut+Shift+S",
                                        "Saves the design in another file",
                                        documents::saveAs)
                                .unless(edits::closed),
                        Action.of(
                                "reload",
                                "Reload",
                                "F5",
                                "Reads the file from disk again",
                                editor.session()::reload))));
        file.getItems().add(new SeparatorMenuItem());
        file.getItems()
                .addAll(items(List.of(Action.of(
                        "quit",
                        "Quit",
                        "Shortcut+Q",
                        "Closes the window",
                        () -> documents.close(() -> window().hide())))));
        Action.refresh(file);
        recent.setOnShowing(e -> fillRecent());
        fillRecent();
        return file;
    }

    private void fillRecent() {
        recent.getItems().clear();
        for (String name : recall.settings().recent()) {
            MenuItem item = plain(name, () -> documents.open(Path.of(name)));
            if (!Files.isReadable(Path.of(name))) {
                item.setText(name + " (is no longer there)");
                item.setDisable(true);
            }
            recent.getItems().add(item);
        }
        if (recent.getItems().isEmpty()) {
            MenuItem none = plain("No file was opened yet", () -> {});
            none.setDisable(true);
            recent.getItems().add(none);
        }
    }

    private Menu edit() {
        Menu edit = new Menu("_Edit");
        edit.getItems().addAll(items(List.of(edits.undo(), edits.redo())));
        edit.getItems().add(new SeparatorMenuItem());
        edit.getItems().addAll(items(edits.parts()));
        Action.refresh(edit);
        return edit;
    }

    private Menu place() {
        Menu place = new Menu("_Place");
        place.getItems().addAll(items(edits.placing()));
        Action.refresh(place);
        return place;
    }

    private Menu plan() {
        Menu follows = new Menu("What _follows");
        Menu plan = new Menu("P_lan");
        plan.getItems().add(edits.nearestStable().item(editor::say));
        plan.getItems().add(follows);
        Action.refresh(plan);
        follows.getItems().setAll(follows());
        follows.setOnShowing(e -> follows.getItems().setAll(follows()));
        return plan;
    }

    private List<MenuItem> follows() {
        ToggleGroup group = new ToggleGroup();
        List<MenuItem> items = new ArrayList<>();
        for (Follow follow : editor.following().allowed()) {
            RadioMenuItem item = new RadioMenuItem(follow.words());
            item.setToggleGroup(group);
            item.setSelected(follow == editor.following().now());
            item.setOnAction(e -> editor.following().choose(follow));
            items.add(item);
        }
        return items;
    }

    private Menu view() {
        Menu width = new Menu("Beam _width");
        width.getItems().setAll(factors());
        Menu view = new Menu("_View");
        view.getItems()
                .addAll(items(List.of(
                        showAll,
                        Action.of("zoom-in", "Zoom in", "Shortcut+Plus", "Zooms the bench in", () -> editor.zoom(true)),
                        Action.of(
                                "zoom-out",
                                "Zoom out",
                                "Shortcut+Minus",
                                "Zooms the bench out",
                                () -> editor.zoom(false)))));
        view.getItems().addAll(width, new SeparatorMenuItem());
        view.getItems()
                .addAll(items(List.of(
                        turnTheme,
                        Action.of("next-pane", "Next pane", "F6", "The keyboard goes on", () -> editor.nextPane(false)),
                        Action.of(
                                "pane-before",
                                "Pane before",
                                "Shift+F6",
                                "The keyboard goes back",
                                () -> editor.nextPane(true)),
                        Action.of(
                                "copy-all",
                                "Copy figures",
                                "Shortcut+Shift+C",
                                "Copies the figures of the selected part in full precision",
                                editor::copyFigures))));
        return view;
    }

    private List<MenuItem> factors() {
        ToggleGroup group = new ToggleGroup();
        RadioMenuItem auto = new RadioMenuItem("As suits the view");
        auto.setToggleGroup(group);
        auto.setSelected(true);
        auto.setOnAction(e -> editor.magnify(OptionalDouble.empty()));
        List<MenuItem> items = new ArrayList<>(List.of(auto));
        for (int factor : FACTORS) {
            RadioMenuItem item = new RadioMenuItem(factor == 1 ? "True width" : factor + " times");
            item.setToggleGroup(group);
            item.setOnAction(e -> editor.magnify(OptionalDouble.of(factor)));
            items.add(item);
        }
        return items;
    }

    private Menu help() {
        Menu help = new Menu("_Help");
        help.getItems()
                .addAll(items(List.of(
                        Action.of("keys", "Keys and mouse", "F1", "Lists keys and mouse", () -> Words.keys(window())),
                        Action.of("about", "About Twofold", "", "What the program is", () -> Words.about(window())))));
        return help;
    }

    private void turnTheme() {
        Theme next = editor.theme() == Theme.LIGHT ? Theme.DARK : Theme.LIGHT;
        editor.setTheme(next);
        recall.change(s -> s.dark(next == Theme.DARK));
    }

    private Window window() {
        return editor.getScene().getWindow();
    }
}
