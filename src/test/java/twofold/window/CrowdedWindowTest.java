package twofold.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import javafx.geometry.Bounds;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.control.Label;
import javafx.scene.control.TabPane;
import javafx.scene.control.TextInputControl;
import javafx.scene.input.KeyCode;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import twofold.picture.Theme;

/** A cavity of seven folds whose parts have names as long as names may be, in windows of every size. */
@Tag("headless-only")
class CrowdedWindowTest {
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

    /** 60 characters. */
    private static String name(int number) {
        String name = "Mirror " + number + " of the folded delay arm behind the lake-ice receiver's window";
        return name.substring(0, 60).strip();
    }

    private static String design() {
        StringBuilder parts =
                new StringBuilder("{ \"name\": \"" + name(0) + "\", \"kind\": \"mirror\", \"roc_mm\": 2000 }");
        for (int i = 1; i <= 8; i++) {
            parts.append(",\n{ \"name\": \"" + name(i) + "\", \"kind\": \"mirror\", \"leg_mm\": " + (280 - 4 * i));
            parts.append(
                    i == 8
                            ? " }"
                            : ", \"incidence_deg\": 12, \"roc_mm\": 1500, \"turn\": \""
                                    + (i % 2 == 0 ? "right" : "left") + "\" }");
            if (i == 3) {
                parts.append(
                        ",\n{ \"name\": \"Crystal of the folded delay arm behind the receiver's window\", \"kind\": \"crystal\","
                                + " \"along_mm\": \"middle\", \"length_mm\": 8, \"material\": \"sapphire e\","
                                + " \"incidence_deg\": \"brewster\" }");
            }
        }
        return "{ \"format\": \"twofold/1\", \"title\": \"Seven folds for the delay of the ice profiler's receiver, as built on the small table in the workshop\","
                + " \"wavelength_nm\": 800, \"shape\": \"standing-wave\", \"parts\": [\n" + parts + "],\n"
                + "\"holds\": [ { \"leg\": [\"" + name(2) + "\", \"" + name(3) + "\"] } ],\n"
                + "\"levers\": [ { \"name\": \"" + name(9) + "\", \"set\": \"leg_mm\", \"of\": [[\"" + name(3)
                + "\", \""
                + name(4) + "\"]], \"from\": 250, \"to\": 290 } ],\n"
                + "\"requirements\": [ { \"what\": \"waist_offset_rayleighs\", \"at\": \"Crystal of the folded delay arm behind the receiver's window\","
                + " \"plane\": \"both\", \"between\": [-0.1, 0.1], \"over\": \"" + name(9) + "\" },"
                + " { \"what\": \"zone_edge_split_mm\", \"at\": [\"" + name(4) + "\", \"" + name(5)
                + "\"], \"edge\": \"lower\", \"equals\": 0, \"within\": 0.25 } ],\n"
                + "\"tolerances\": [ { \"set\": \"roc_mm\", \"of\": [\"" + name(1) + "\", \"" + name(2)
                + "\"], \"plus_minus_percent\": 1 } ] }";
    }

    private static void walk(Node node, List<Node> to) {
        if (!node.isVisible()) {
            return;
        }
        to.add(node);
        if (node instanceof Parent parent) {
            parent.getChildrenUnmodifiable().forEach(child -> walk(child, to));
        }
    }

    /** Nothing that is read or used in a pane of tabs reaches over its sides. */
    private static void fits(Stagehand opened, String pane) throws Exception {
        List<String> over = Stagehand.fx(() -> {
            TabPane tabs = opened.node(pane, TabPane.class);
            Bounds all = tabs.localToScene(tabs.getLayoutBounds());
            List<Node> nodes = new ArrayList<>();
            walk(tabs.getSelectionModel().getSelectedItem().getContent(), nodes);
            return nodes.stream()
                    .filter(n -> n instanceof Label || n.isFocusTraversable())
                    .filter(n -> {
                        Bounds at = n.localToScene(n.getLayoutBounds());
                        return at.getMinX() < all.getMinX() - 0.5 || at.getMaxX() > all.getMaxX() + 0.5;
                    })
                    .map(Node::toString)
                    .toList();
        });
        assertThat(over).isEmpty();
    }

    @ParameterizedTest
    @CsvSource({"1024, 700", "1280, 800", "1920, 1080"})
    void longNamesFitAndAreReadInFull(int width, int height) throws Exception {
        Path file = Files.writeString(folder.resolve("seven.json"), design(), StandardCharsets.UTF_8);
        Stagehand opened = Stagehand.open(folder.resolve("settings.json"), width, height);
        stage = opened;
        opened.open(file);
        TabPane lists = opened.node("lists", TabPane.class);
        for (Theme theme : Theme.values()) {
            for (String part : List.of(name(4), "Crystal of the folded delay arm behind the receiver's window", "")) {
                Stagehand.fx(() -> {
                    opened.editor().setTheme(theme);
                    opened.editor().session().select(part.isEmpty() ? List.of() : List.of(part));
                    return true;
                });
                opened.settle();
                fits(opened, "looks");
                String kind = part.isEmpty() ? "design" : part.substring(0, part.indexOf(' '));
                opened.picture("seven-" + kind + "-" + width + "-" + theme.word());
            }
            Stagehand.fx(() -> {
                opened.editor().session().select(List.of(name(4)));
                return true;
            });
            // A number that the plan cannot have: the reason is long.
            Node field = opened.node("field-leg-before", TextInputControl.class);
            Stagehand.fx(() -> {
                field.requestFocus();
                return true;
            });
            opened.press(KeyCode.CONTROL, KeyCode.A);
            opened.type("9e9 furlong");
            opened.press(KeyCode.ENTER);
            for (int tab = 1; tab < 4; tab++) {
                int chosen = tab;
                Stagehand.fx(() -> {
                    lists.getSelectionModel().select(chosen);
                    return true;
                });
                opened.settle();
                Stagehand.fx(() -> {
                    List<Node> heads = List.copyOf(lists.getSelectionModel()
                            .getSelectedItem()
                            .getContent()
                            .lookupAll(".ask-head"));
                    heads.get(0).requestFocus();
                    return true;
                });
                if (theme == Theme.LIGHT) {
                    opened.press(KeyCode.ENTER);
                }
                opened.settle();
                fits(opened, "lists");
                fits(opened, "looks");
                opened.picture("seven-list" + tab + "-" + width + "-" + theme.word());
            }
            Stagehand.fx(() -> {
                field.requestFocus();
                return true;
            });
            opened.press(KeyCode.ESCAPE);
        }
    }
}
