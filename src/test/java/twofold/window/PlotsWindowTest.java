package twofold.window;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.TabPane;
import javafx.scene.image.WritableImage;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import javafx.scene.paint.Color;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import twofold.edit.LeverEdits;
import twofold.layout.Laid;
import twofold.picture.Ink;
import twofold.picture.Theme;

/** Sweeps and maps under a real mouse and real keys of the toolkit. */
@Tag("headless-only")
class PlotsWindowTest extends Staged {
    private static final int BEAM = 0;
    private static final int SWEEP = 1;
    private static final int MAP = 2;
    private static final String HINT = "Click a point to see that design.";

    PlotsWindowTest() {
        super("z-fold-rod.json");
    }

    /** The path from Fold 1 to Fold 2, mm. */
    private double gap() throws Exception {
        return laid().legs().get(1).path() * 1e3;
    }

    /** The incidence at Fold 1, rad. */
    private double fold() throws Exception {
        return laid().incidence().getOrDefault(1, Double.NaN);
    }

    private void tab(int index) throws Exception {
        TabPane tabs = stage.node("plots", TabPane.class);
        Stagehand.fx(() -> {
            tabs.getSelectionModel().select(index);
            return true;
        });
        stage.settle();
    }

    private String words(String id) throws Exception {
        return Stagehand.fx(() -> stage.node(id, Label.class).getText());
    }

    private boolean isVisible(String id) throws Exception {
        return Stagehand.fx(() -> stage.node(id, Node.class).isVisible());
    }

    private void click(String button) throws Exception {
        Button node = stage.node(button, Button.class);
        stage.click(node, node.getWidth() / 2, node.getHeight() / 2);
    }

    /** Clicks where a share of the picture's width and height leads to. */
    private void clickPlot(String id, double right, double down) throws Exception {
        Node plot = stage.node(id, Node.class);
        stage.click(
                plot,
                plot.getLayoutBounds().getWidth() * right,
                plot.getLayoutBounds().getHeight() * down);
    }

    private void focus(String id) throws Exception {
        Stagehand.fx(() -> {
            stage.node(id, Node.class).requestFocus();
            return true;
        });
        stage.settle();
    }

    /** Moves the gap by an edit. */
    private void moveGap(double millimetres) throws Exception {
        Stagehand.fx(() -> stage.editor()
                .session()
                .edit(LeverEdits.set(List.of(laidNow().design().levers().get(1)), millimetres * 1e-3)));
        stage.settle();
    }

    private Laid laidNow() {
        return stage.editor().session().shown().cavity().orElseThrow().laid();
    }

    @Test
    void aSweepIsThereWhenItsTabIsChosen() throws Exception {
        tab(SWEEP);
        assertThat(words("sweep-words")).isEqualTo(HINT);
        assertThat(isVisible("sweep-again")).isFalse();
        assertThat(isVisible("sweep-stop")).isFalse();
        Node plane = stage.node("sweep-plane", Node.class).getParent();
        assertThat(plane.isVisible()).as("both planes are shown").isFalse();
        ComboBox<?> levers = stage.node("sweep-lever", ComboBox.class);
        assertThat(levers.getItems()).hasSize(2);
        assertThat(levers.getConverter()).isNotNull();
    }

    @Test
    void aClickShowsThatDesignAndApplyingIsOneStep() throws Exception {
        tab(SWEEP);
        double before = gap();
        clickPlot("sweep-plot", 0.5, 0.6);
        assertThat(shown().isPreview()).isTrue();
        assertThat(gap()).isNotCloseTo(before, within(0.05));
        // What a person would type, as fine as a pixel: 4.5 mm lie in some 250 px.
        assertThat(gap() * 100).isCloseTo(Math.rint(gap() * 100), within(1e-6));
        assertThat(words("sweep-words")).startsWith("Preview: set gap to ");
        double seen = gap();
        click("sweep-apply");
        assertThat(shown().isPreview()).isFalse();
        assertThat(gap()).isCloseTo(seen, within(1e-9));
        assertThat(shown().undo().orElseThrow()).startsWith("set gap to ");
        assertThat(words("sweep-words")).isEqualTo(HINT);
        stage.press(KeyCode.CONTROL, KeyCode.Z);
        assertThat(gap()).isCloseTo(before, within(1e-9));
        assertThat(shown().undo()).isEmpty();
    }

    @Test
    void backReturnsToTheDesign() throws Exception {
        tab(SWEEP);
        double before = gap();
        clickPlot("sweep-plot", 0.5, 0.6);
        click("sweep-back");
        assertThat(shown().isPreview()).isFalse();
        assertThat(gap()).isEqualTo(before);
        assertThat(isVisible("sweep-apply")).isFalse();
        clickPlot("sweep-plot", 0.5, 0.6);
        assertThat(shown().isPreview()).isTrue();
        tab(BEAM);
        assertThat(shown().isPreview()).as("out of view nothing is previewed").isFalse();
    }

    @Test
    void draggingAlongTheSweepMovesThePreview() throws Exception {
        tab(SWEEP);
        Node plot = stage.node("sweep-plot", Node.class);
        double width = plot.getLayoutBounds().getWidth();
        stage.drag(plot, MouseButton.PRIMARY, width * 0.3, 150, width * 0.2, 0);
        double right = gap();
        stage.drag(plot, MouseButton.PRIMARY, width * 0.5, 150, -width * 0.2, 0);
        assertThat(right - gap()).isGreaterThan(0.5);
        assertThat(shown().isPreview()).isTrue();
        assertThat(words("sweep-words")).startsWith("Preview: ");
    }

    @Test
    void keysPickAcceptAndLeave() throws Exception {
        tab(SWEEP);
        double before = gap();
        focus("sweep-plot");
        stage.press(KeyCode.RIGHT);
        // The plan is stated to 0.1 µm, so the gap is not quite 104.6 mm; steps lead to round values.
        assertThat(gap()).isCloseTo(before + 0.01, within(1e-4));
        stage.press(KeyCode.SHIFT, KeyCode.LEFT);
        assertThat(gap()).isCloseTo(before - 0.09, within(1e-4));
        assertThat(shown().isPreview()).isTrue();
        stage.press(KeyCode.ESCAPE);
        assertThat(gap()).isEqualTo(before);
        stage.press(KeyCode.RIGHT);
        stage.press(KeyCode.ENTER);
        assertThat(shown().isPreview()).isFalse();
        assertThat(gap()).isCloseTo(before + 0.01, within(1e-4));
        assertThat(shown().undo()).isPresent();
    }

    @Test
    void aClickedPictureHasTheKeyboard() throws Exception {
        tab(SWEEP);
        clickPlot("sweep-plot", 0.5, 0.6);
        double clicked = gap();
        stage.press(KeyCode.RIGHT);
        assertThat(gap()).isCloseTo(clicked + 0.01, within(1e-6));
        stage.press(KeyCode.ESCAPE);
        tab(BEAM);
        Node beam = stage.node("beam", Node.class);
        stage.click(beam, 200, 40);
        assertThat(Stagehand.fx(beam::isFocused)).isTrue();
    }

    @Test
    void f6GoesToThePictureInFront() throws Exception {
        tab(SWEEP);
        focus("bench");
        stage.press(KeyCode.F6);
        assertThat(Stagehand.fx(() -> stage.node("sweep-plot", Node.class).isFocused()))
                .isTrue();
        focus("sweep-lever");
        stage.press(KeyCode.F6);
        assertThat(Stagehand.fx(() -> stage.node("sweep-lever", Node.class).isFocused()))
                .as("the next pane, not the picture of the same")
                .isFalse();
        assertThat(Stagehand.fx(() -> stage.node("sweep-plot", Node.class).isFocused()))
                .isFalse();
        tab(BEAM);
        focus("bench");
        stage.press(KeyCode.F6);
        assertThat(Stagehand.fx(() -> stage.node("beam", Node.class).isFocused()))
                .isTrue();
    }

    @Test
    void aMapSetsBothLevers() throws Exception {
        tab(MAP);
        assertThat(words("map-words")).isEqualTo(HINT);
        double gap = gap();
        double fold = fold();
        clickPlot("map-plot", 0.6, 0.35);
        assertThat(shown().isPreview()).isTrue();
        assertThat(gap()).isNotCloseTo(gap, within(0.01));
        assertThat(fold()).isNotCloseTo(fold, within(1e-3));
        assertThat(words("map-words")).startsWith("Preview: set gap to ").contains(" and fold to ");
        focus("map-plot");
        double up = fold();
        double across = gap();
        stage.press(KeyCode.UP);
        assertThat(fold()).isGreaterThan(up);
        assertThat(gap()).isCloseTo(across, within(1e-6));
        click("map-apply");
        assertThat(shown().undo().orElseThrow()).startsWith("set gap to ");
    }

    @Test
    void menusAskSomethingElse() throws Exception {
        tab(SWEEP);
        WritableImage before = stage.picture("sweep-before");
        ComboBox<?> quantity = stage.node("sweep-quantity", ComboBox.class);
        int picked = quantity.getSelectionModel().getSelectedIndex();
        focus("sweep-quantity");
        stage.press(KeyCode.DOWN);
        assertThat(quantity.getSelectionModel().getSelectedIndex()).isEqualTo(picked + 1);
        assertThat(words("sweep-words")).isEqualTo(HINT);
        WritableImage after = stage.picture("sweep-after");
        assertThat(differences(before, after)).isGreaterThan(500);
        ComboBox<?> lever = stage.node("sweep-lever", ComboBox.class);
        stage.click(lever, 20, 10);
        assertThat(Stagehand.fx(lever::isShowing)).isTrue();
        stage.press(KeyCode.UP);
        stage.press(KeyCode.ENTER);
        assertThat(lever.getSelectionModel().getSelectedIndex()).isZero();
        clickPlot("sweep-plot", 0.5, 0.6);
        assertThat(words("sweep-words")).startsWith("Preview: set fold to ");
    }

    private static int differences(WritableImage a, WritableImage b) {
        int count = 0;
        for (int x = 230; x < 660; x++) {
            for (int y = 520; y < 760; y++) {
                count += a.getPixelReader().getArgb(x, y) == b.getPixelReader().getArgb(x, y) ? 0 : 1;
            }
        }
        return count;
    }

    @Test
    void anotherQuantityEndsThePreview() throws Exception {
        tab(SWEEP);
        double before = gap();
        clickPlot("sweep-plot", 0.5, 0.6);
        focus("sweep-quantity");
        stage.press(KeyCode.DOWN);
        assertThat(shown().isPreview()).isFalse();
        assertThat(gap()).isEqualTo(before);
    }

    @Test
    void whatIsSlowGoesStaleInWordsAndLook() throws Exception {
        stage.openSample("bow-tie-doubler.json");
        tab(MAP);
        assertThat(words("map-words")).isEqualTo(HINT);
        stage.picture("map-fresh");
        Stagehand.fx(() -> stage.editor()
                .session()
                .edit(LeverEdits.set(List.of(laidNow().design().levers().get(1)), Math.toRadians(9))));
        stage.settle();
        assertThat(words("map-words")).startsWith("Stale: the design has changed since.");
        assertThat(isVisible("map-again")).isTrue();
        stage.picture("map-stale");
        clickPlot("map-plot", 0.6, 0.35);
        assertThat(shown().isPreview()).as("a stale map is not clicked").isFalse();
        stage.press(KeyCode.CONTROL, KeyCode.Z);
        assertThat(words("map-words"))
                .as("back at the design that was asked of")
                .isEqualTo(HINT);
        stage.press(KeyCode.CONTROL, KeyCode.Y);
        click("map-again");
        assertThat(words("map-words")).isEqualTo(HINT);
        assertThat(isVisible("map-again")).isFalse();
    }

    @Test
    void anotherDocumentIsAskedAnew() throws Exception {
        tab(SWEEP);
        stage.openSample("triangle-ring.json");
        assertThat(words("sweep-words")).isEqualTo(HINT);
        ComboBox<?> levers = stage.node("sweep-lever", ComboBox.class);
        assertThat(levers.getItems()).hasSize(2);
        assertThat(String.valueOf(levers.getValue())).contains("apex");
        tab(BEAM);
        stage.openSample("x-fold.json");
        tab(SWEEP);
        assertThat(words("sweep-words")).isEqualTo(HINT);
        clickPlot("sweep-plot", 0.5, 0.6);
        assertThat(words("sweep-words")).startsWith("Preview: set gap to 1");
    }

    @Test
    void withoutLeversThereAreWords() throws Exception {
        Path bare = folder.resolve("bare.json");
        java.nio.file.Files.writeString(bare, """
                { "format": "twofold/1", "wavelength_nm": 1064, "shape": "standing-wave", "parts": [
                  { "name": "A", "kind": "mirror", "at_mm": [0, 0], "roc_mm": 500 },
                  { "name": "B", "kind": "mirror", "at_mm": [300, 0] } ] }
                """);
        stage.open(bare);
        tab(SWEEP);
        assertThat(words("sweep-words")).isEqualTo("A sweep moves a lever, and this design has none.");
        assertThat(isVisible("sweep-again")).isFalse();
        tab(MAP);
        assertThat(words("map-words")).isEqualTo("A map moves two levers, and this design has none.");
    }

    @Test
    void aDragOnTheBenchIsFollowedWhereThatIsFast() throws Exception {
        tab(SWEEP);
        WritableImage before = stage.picture("sweep-still");
        moveGap(105.9);
        // Fast or, on a machine too slow for that, stale: never an older answer that looks current.
        if (words("sweep-words").equals(HINT)) {
            assertThat(differences(before, stage.picture("sweep-moved")))
                    .as("the mark of now moves")
                    .isGreaterThan(50);
        } else {
            assertThat(words("sweep-words")).startsWith("Stale");
        }
    }

    private static void until(String what, Callable<Boolean> is) throws Exception {
        for (int i = 0; i < 600; i++) {
            if (Stagehand.fx(is)) {
                return;
            }
            Thread.sleep(50);
        }
        throw new AssertionError("never: " + what);
    }

    @Test
    void longWorkShowsHowFarItIsAndCanBeStopped() throws Exception {
        stage.close();
        try (Background background = new Background()) {
            stage = Stagehand.open(folder.resolve("settings.json"), 1280, 800, new Answers(), background);
            Stagehand.fx(() -> {
                stage.editor().session().openSample("v-fold-pumped.json");
                return true;
            });
            until(
                    "the sample is open",
                    () -> stage.editor().session().shown().cavity().isPresent());
            tab(MAP);
            until(
                    "work is seen to go on",
                    () -> stage.node("map-stop", Node.class).isVisible());
            assertThat(words("map-words")).matches("Working: \\d+ %");
            stage.picture("map-working");
            click("map-stop");
            assertThat(words("map-words")).isEqualTo("Stopped: nothing is answered yet.");
            assertThat(isVisible("map-stop")).isFalse();
            assertThat(isVisible("map-again")).isTrue();
            click("map-again");
            until("it goes on", () -> stage.node("map-stop", Node.class).isVisible());
            tab(BEAM);
            assertThat(isVisible("map-stop")).as("out of view nothing is asked").isFalse();
        }
    }

    @ParameterizedTest
    @CsvSource({
        "z-fold-rod, 1024, 700", "z-fold-rod, 1280, 800", "z-fold-rod, 1920, 1080",
        "triangle-ring, 1280, 800", "gas-tube, 1920, 1080", "one-plane, 1280, 800"
    })
    void everyPlotIsDrawnInBothThemes(String sample, int width, int height) throws Exception {
        stage.close();
        stage = Stagehand.open(folder.resolve("settings.json"), width, height);
        stage.openSample(sample + ".json");
        for (Theme theme : Theme.values()) {
            Stagehand.fx(() -> {
                stage.editor().setTheme(theme);
                return true;
            });
            for (int tab : new int[] {SWEEP, MAP}) {
                tab(tab);
                String name = tab == SWEEP ? "sweep" : "map";
                WritableImage image = stage.picture(name + "-" + sample + "-" + width + "-" + theme.word());
                Node plot = stage.node(name + "-plot", Node.class);
                assertThat(count(image, plot, theme, Ink.PAPER)).as("paper").isGreaterThan(3_000);
                assertThat(count(image, plot, theme, Ink.TANGENTIAL)).isGreaterThan(20);
                assertThat(count(image, plot, theme, Ink.SAGITTAL)).isGreaterThan(20);
                assertThat(count(image, plot, theme, Ink.SELECTED)).as("now").isGreaterThan(5);
            }
        }
    }

    /** How many pixels over a node have an ink's colour. */
    private static int count(WritableImage image, Node over, Theme theme, Ink ink) throws Exception {
        var bounds = Stagehand.fx(() -> over.localToScene(over.getLayoutBounds()));
        Color colour = Color.web(theme.css(ink));
        int count = 0;
        for (int x = (int) bounds.getMinX(); x < bounds.getMaxX() - 1; x++) {
            for (int y = (int) bounds.getMinY(); y < bounds.getMaxY() - 1; y++) {
                Color at = image.getPixelReader().getColor(x, y);
                boolean near = Math.abs(at.getRed() - colour.getRed()) < 0.1
                        && Math.abs(at.getGreen() - colour.getGreen()) < 0.1
                        && Math.abs(at.getBlue() - colour.getBlue()) < 0.1;
                count += near ? 1 : 0;
            }
        }
        return count;
    }
}
