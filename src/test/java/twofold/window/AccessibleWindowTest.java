package twofold.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.Scene;
import javafx.scene.control.Button;
import javafx.scene.control.Control;
import javafx.scene.control.Label;
import javafx.scene.control.Labeled;
import javafx.scene.control.MenuBar;
import javafx.scene.control.ScrollBar;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.SplitPane;
import javafx.scene.control.TabPane;
import javafx.scene.image.WritableImage;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.paint.Color;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import twofold.picture.Ink;
import twofold.picture.Theme;

/** Every control has a name, and every screen is drawn in both themes, at every size. */
@Tag("headless-only")
class AccessibleWindowTest {
    @TempDir
    @SuppressWarnings("NullAway.Init") // set by JUnit
    Path folder;

    private @Nullable Stagehand stage;

    @AfterEach
    void close() throws Exception {
        if (stage != null) {
            stage.close();
        }
    }

    private static void walk(Node node, List<Node> to) {
        to.add(node);
        if (node instanceof Parent parent) {
            parent.getChildrenUnmodifiable().forEach(child -> walk(child, to));
        }
    }

    private static boolean isNamed(Node node) {
        String name = node.getAccessibleText();
        boolean text = node instanceof Labeled labeled
                && labeled.getText() != null
                && !labeled.getText().isBlank();
        return text || (name != null && !name.isBlank());
    }

    @Test
    void everyControlHasAnAccessibleName() throws Exception {
        Stagehand opened = Stagehand.open(folder.resolve("settings.json"), 1280, 800);
        stage = opened;
        opened.openSample("z-fold-rod.json");
        TabPane plots = opened.node("plots", TabPane.class);
        for (int tab = 0; tab < 3; tab++) {
            int chosen = tab;
            Stagehand.fx(() -> {
                plots.getSelectionModel().select(chosen);
                return true;
            });
            opened.settle();
        }
        List<Node> all = new ArrayList<>();
        Stagehand.fx(() -> {
            walk(opened.editor(), all);
            return true;
        });
        List<Node> reached = all.stream()
                .filter(n -> n instanceof Control || n instanceof DrawingPane)
                .filter(n -> n.isFocusTraversable() || n instanceof DrawingPane || n instanceof MenuBar)
                .filter(n -> !(n instanceof ScrollBar) && !(n instanceof SplitPane) && !(n instanceof Label))
                .toList();
        assertThat(reached).hasSizeGreaterThan(8);
        assertThat(reached).extracting(Node::getId).contains("sweep-lever", "sweep-plot", "map-up", "map-plot");
        assertThat(reached)
                .allSatisfy(n -> assertThat(isNamed(n)).as("%s has a name", n).isTrue());
    }

    /** What the keyboard reaches and is seen, in the panes of tabs. */
    private static List<Node> reached(Stagehand stage, String pane) throws Exception {
        List<Node> all = new ArrayList<>();
        Stagehand.fx(() -> {
            walk(stage.node(pane, TabPane.class), all);
            return true;
        });
        return all.stream()
                .filter(Node::isFocusTraversable)
                .filter(AccessibleWindowTest::isSeen)
                .toList();
    }

    private static boolean isSeen(Node node) {
        for (@Nullable Node n = node; n != null; n = n.getParent()) {
            if (!n.isVisible()) {
                return false;
            }
        }
        return true;
    }

    @Test
    void everyFieldAndEveryRowHasAnAccessibleName() throws Exception {
        Stagehand opened = Stagehand.open(folder.resolve("settings.json"), 1280, 800);
        stage = opened;
        int fields = 0;
        for (String sample : List.of("z-fold-rod", "gas-tube", "v-fold-pumped", "bow-tie-doubler")) {
            opened.openSample(sample + ".json");
            int parts = Stagehand.fx(() -> opened.editor()
                    .session()
                    .shown()
                    .cavity()
                    .orElseThrow()
                    .laid()
                    .design()
                    .parts()
                    .size());
            for (int i = -1; i < parts; i++) {
                Optional<Integer> part = i < 0 ? Optional.empty() : Optional.of(i);
                Stagehand.fx(() -> {
                    opened.editor().session().select(part);
                    return true;
                });
                opened.settle();
                List<Node> reached = reached(opened, "looks");
                fields += reached.size();
                assertThat(reached)
                        .allSatisfy(n ->
                                assertThat(isNamed(n)).as("%s has a name", n).isTrue());
            }
        }
        assertThat(fields).as("fields are there").isGreaterThan(150);
        opened.openSample("z-fold-rod.json");
        TabPane lists = opened.node("lists", TabPane.class);
        for (int tab = 1; tab < 4; tab++) {
            int chosen = tab;
            Stagehand.fx(() -> {
                lists.getSelectionModel().select(chosen);
                lists.getSelectionModel()
                        .getSelectedItem()
                        .getContent()
                        .lookupAll(".ask-head")
                        .forEach(head -> {
                            head.requestFocus();
                            head.fireEvent(new KeyEvent(
                                    KeyEvent.KEY_PRESSED, "", "", KeyCode.SPACE, false, false, false, false));
                        });
                return true;
            });
            opened.settle();
            List<Node> reached = reached(opened, "lists");
            assertThat(reached).as("the controls of list %d", tab).hasSizeGreaterThan(10);
            assertThat(reached)
                    .allSatisfy(
                            n -> assertThat(isNamed(n)).as("%s has a name", n).isTrue());
        }
    }

    /** As near as a line's smoothed rim leaves it, nearer than any two inks are to each other. */
    private static boolean isNear(Color a, Color b) {
        return Math.abs(a.getRed() - b.getRed()) < 0.1
                && Math.abs(a.getGreen() - b.getGreen()) < 0.1
                && Math.abs(a.getBlue() - b.getBlue()) < 0.1;
    }

    /** How many pixels of the tabs beside the pictures have an ink's colour. */
    private static int count(WritableImage image, Theme theme, Ink ink) {
        Color colour = Color.web(theme.css(ink));
        int count = 0;
        for (int x = 980; x < 1265; x++) {
            for (int y = 225; y < 550; y++) {
                count += isNear(image.getPixelReader().getColor(x, y), colour) ? 1 : 0;
            }
        }
        return count;
    }

    @ParameterizedTest
    @CsvSource({"z-fold-rod", "bow-tie-doubler", "one-plane", "v-fold-pumped"})
    void zonesAndAstigmatismAreDrawnInBothThemes(String sample) throws Exception {
        Stagehand opened = Stagehand.open(folder.resolve("settings.json"), 1280, 800);
        stage = opened;
        opened.openSample(sample + ".json");
        TabPane looks = opened.node("looks", TabPane.class);
        TabPane lists = opened.node("lists", TabPane.class);
        for (Theme theme : Theme.values()) {
            for (int tab = 1; tab < 3; tab++) {
                int chosen = tab;
                Stagehand.fx(() -> {
                    opened.editor().setTheme(theme);
                    looks.getSelectionModel().select(chosen);
                    lists.getSelectionModel().select(1);
                    return true;
                });
                WritableImage image = opened.picture(sample + "-tab" + tab + "-" + theme.word());
                boolean areZones = tab == 1;
                // Lanes, edges and names of both planes, which no other tab draws in such amounts; a ledger has its
                // zero line.
                assertThat(count(image, theme, Ink.TANGENTIAL) > 60)
                        .as("tangential zones on tab %d", tab)
                        .isEqualTo(areZones);
                assertThat(count(image, theme, Ink.SAGITTAL) > 60)
                        .as("sagittal zones on tab %d", tab)
                        .isEqualTo(areZones);
                assertThat(count(image, theme, Ink.PAPER)).as("paper").isGreaterThan(10_000);
            }
        }
    }

    @ParameterizedTest
    @CsvSource({
        "z-fold-rod, 1024, 700", "z-fold-rod, 1280, 800", "z-fold-rod, 1920, 1080",
        "bow-tie-doubler, 1280, 800", "x-fold, 1920, 1080", "triangle-ring, 1280, 800",
        "v-fold-pumped, 1280, 800", "gas-tube, 1280, 800", "one-plane, 1920, 1080"
    })
    void everyScreenIsDrawnInBothThemes(String sample, int width, int height) throws Exception {
        Stagehand opened = Stagehand.open(folder.resolve("settings.json"), width, height);
        stage = opened;
        opened.openSample(sample + ".json");
        for (Theme theme : Theme.values()) {
            Stagehand.fx(() -> {
                opened.editor().setTheme(theme);
                return true;
            });
            WritableImage image = opened.picture(sample + "-" + width + "-" + theme.word());
            Color paper = Color.web(theme.css(Ink.PAPER));
            int onPaper = 0;
            int inked = 0;
            for (int x = 40; x < width - 400; x += 3) {
                for (int y = 120; y < height - 60; y += 3) {
                    boolean isPaper = image.getPixelReader().getColor(x, y).equals(paper);
                    onPaper += isPaper ? 1 : 0;
                    inked += isPaper ? 0 : 1;
                }
            }
            assertThat(onPaper).as("the drawings' paper in the theme %s", theme).isGreaterThan(inked);
            assertThat(inked).as("something is drawn").isGreaterThan(2000);
        }
    }

    @ParameterizedTest
    @EnumSource
    void theDialogForANewDesignIsNamedAndInTheTheme(Theme theme) throws Exception {
        Stagehand opened = Stagehand.open(folder.resolve("settings.json"), 1280, 800);
        stage = opened;
        Stagehand.fx(() -> {
            opened.editor().setTheme(theme);
            return true;
        });
        Stagehand.later(() -> ((Button) opened.editor().lookup("#new")).fire());
        Scene dialog = opened.dialog();
        TabPane ways = (TabPane) dialog.lookup("#ways");
        for (int way = 0; way < 2; way++) {
            int chosen = way;
            Stagehand.fx(() -> {
                ways.getSelectionModel().select(chosen);
                return true;
            });
            List<Node> all = new ArrayList<>();
            WritableImage image = opened.picture(dialog, "new-" + way + "-" + theme.word());
            Stagehand.fx(() -> {
                walk(dialog.getRoot(), all);
                return true;
            });
            assertThat(all.stream()
                            .filter(n -> n instanceof Control && n.isFocusTraversable() && !(n instanceof ScrollBar))
                            .filter(n -> !(n instanceof Label) && !(n instanceof ScrollPane)))
                    .hasSizeGreaterThan(3)
                    .allSatisfy(
                            n -> assertThat(isNamed(n)).as("%s has a name", n).isTrue());
            Color paper = Color.web(theme.css(Ink.PAPER));
            int onPaper = 0;
            for (int x = 20; x < 600; x += 4) {
                onPaper += image.getPixelReader().getColor(x, 470).equals(paper) ? 1 : 0;
            }
            assertThat(onPaper).as("paper of the theme %s", theme).isGreaterThan(100);
        }
        opened.fire(dialog, "make");
    }
}
