package twofold.window;

import java.io.File;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import javafx.scene.control.Button;
import javafx.scene.control.Menu;
import javafx.scene.control.MenuBar;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.control.RadioMenuItem;
import javafx.scene.control.SeparatorMenuItem;
import javafx.scene.control.ToggleGroup;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import javafx.scene.layout.HBox;
import javafx.stage.FileChooser;
import javafx.stage.Window;
import twofold.picture.Theme;
import twofold.session.Samples;

/** The menus and the toolbar over an editor. */
final class Bars {
    private static final List<Integer> FACTORS = List.of(1, 5, 10, 20, 50, 100);

    private final Editor editor;
    private final Recall recall;
    private final Menu recent = new Menu("Open _recent");
    private final MenuBar menus;
    private final HBox toolbar;

    Bars(Editor editor, Recall recall) {
        this.editor = editor;
        this.recall = recall;
        menus = new MenuBar(file(), view(), help());
        menus.setId("menus");
        menus.setAccessibleText("Menus");
        toolbar = toolbar();
    }

    MenuBar menus() {
        return menus;
    }

    HBox toolbar() {
        if (toolbar != null) {
            return toolbar;
        }
        Button open = button("open", "Open…", "Opens a design file (Ctrl+O)", this::open);
        MenuButton sample = new MenuButton("Samples");
        sample.setId("samples");
        sample.setAccessibleHelp("Opens a sample that the program carries");
        for (String name : Samples.names()) {
            sample.getItems().add(item(name, () -> editor.session().openSample(name)));
        }
        Button all = button("show-all", "Show all", "Shows all of the bench and of the path (Home)", editor::showAll);
        MenuButton width = new MenuButton("Beam width");
        width.setId("beam-width");
        width.setAccessibleHelp("How many times wider than true the beam is drawn on the bench");
        width.getItems().setAll(factors());
        Button theme = button(
                "theme", "Light or dark", "Changes between the light and the dark theme (Ctrl+D)", this::turnTheme);
        HBox row = new HBox(open, sample, all, width, theme);
        row.getStyleClass().add("toolbar-row");
        return row;
    }

    private static Button button(String id, String text, String tip, Runnable action) {
        Button button = new Button(text);
        button.setId(id);
        button.setTooltip(new Tooltip(tip));
        button.setAccessibleHelp(tip);
        button.setOnAction(e -> action.run());
        return button;
    }

    private static MenuItem item(String text, Runnable action) {
        MenuItem item = new MenuItem(text);
        item.setMnemonicParsing(false);
        item.setOnAction(e -> action.run());
        return item;
    }

    private static MenuItem item(String text, KeyCombination keys, Runnable action) {
        MenuItem item = item(text, action);
        item.setAccelerator(keys);
        return item;
    }

    private static KeyCombination shortcut(KeyCode key) {
        return new KeyCodeCombination(key, KeyCombination.SHORTCUT_DOWN);
    }

    private Menu file() {
        Menu samples = new Menu("Open _sample");
        for (String name : Samples.names()) {
            samples.getItems().add(item(name, () -> editor.session().openSample(name)));
        }
        Menu file = new Menu("_File");
        file.getItems()
                .addAll(
                        item("Open…", shortcut(KeyCode.O), this::open),
                        samples,
                        recent,
                        item(
                                "Reload",
                                new KeyCodeCombination(KeyCode.F5),
                                () -> editor.session().reload()),
                        new SeparatorMenuItem(),
                        item("Quit", shortcut(KeyCode.Q), () -> window().hide()));
        file.setOnShowing(e -> fillRecent());
        fillRecent();
        return file;
    }

    private void fillRecent() {
        recent.getItems().clear();
        for (String name : recall.settings().recent()) {
            MenuItem item = item(name, () -> editor.session().open(Path.of(name)));
            if (!Files.isReadable(Path.of(name))) {
                item.setText(name + " (is no longer there)");
                item.setDisable(true);
            }
            recent.getItems().add(item);
        }
        if (recent.getItems().isEmpty()) {
            MenuItem none = item("No file was opened yet", () -> {});
            none.setDisable(true);
            recent.getItems().add(none);
        }
    }

    private Menu view() {
        Menu width = new Menu("Beam _width");
        width.getItems().setAll(factors());
        Menu view = new Menu("_View");
        view.getItems()
                .addAll(
                        item("Show all", shortcut(KeyCode.DIGIT0), editor::showAll),
                        item("Zoom in", shortcut(KeyCode.PLUS), () -> editor.zoom(true)),
                        item("Zoom out", shortcut(KeyCode.MINUS), () -> editor.zoom(false)),
                        width,
                        new SeparatorMenuItem(),
                        item("Light or dark", shortcut(KeyCode.D), this::turnTheme),
                        new SeparatorMenuItem(),
                        item("Next pane", new KeyCodeCombination(KeyCode.F6), () -> editor.nextPane(false)),
                        item(
                                "Pane before",
                                new KeyCodeCombination(KeyCode.F6, KeyCombination.SHIFT_DOWN),
                                () -> editor.nextPane(true)),
                        item(
                                "Copy figures",
                                new KeyCodeCombination(
                                        KeyCode.C, KeyCombination.SHORTCUT_DOWN, KeyCombination.SHIFT_DOWN),
                                editor::copyFigures));
        return view;
    }

    private List<MenuItem> factors() {
        ToggleGroup group = new ToggleGroup();
        RadioMenuItem auto = new RadioMenuItem("As suits the view");
        auto.setToggleGroup(group);
        auto.setSelected(true);
        auto.setOnAction(e -> editor.magnify(OptionalDouble.empty()));
        List<MenuItem> items = new java.util.ArrayList<>(List.of(auto));
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
                .addAll(
                        item("Keys and mouse", new KeyCodeCombination(KeyCode.F1), () -> Words.keys(window())),
                        item("About Twofold", () -> Words.about(window())));
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

    private void open() {
        FileChooser chooser = new FileChooser();
        chooser.setTitle("Open a design");
        chooser.getExtensionFilters().add(new FileChooser.ExtensionFilter("Designs", "*.json"));
        folder().ifPresent(chooser::setInitialDirectory);
        File file = chooser.showOpenDialog(window());
        if (file != null) {
            editor.session().open(file.toPath());
        }
    }

    private Optional<File> folder() {
        return editor.session()
                .shown()
                .source()
                .flatMap(s -> s.file())
                .map(f -> f.toAbsolutePath().getParent())
                .filter(Files::isDirectory)
                .map(Path::toFile);
    }
}
