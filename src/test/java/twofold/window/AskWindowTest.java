package twofold.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.control.CheckBox;
import javafx.scene.control.Label;
import javafx.scene.control.Menu;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.control.TabPane;
import javafx.scene.control.TextInputControl;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import twofold.design.Bound;
import twofold.design.Lever;
import twofold.design.Place;
import twofold.design.Planes;
import twofold.design.Quantity;
import twofold.design.Requirement;
import twofold.design.Tolerance;
import twofold.edit.AskEdits;
import twofold.edit.Edit;
import twofold.picture.Theme;

/** Requirements, levers and tolerances added, edited, moved and removed in a real window. */
@Tag("headless-only")
class AskWindowTest extends Staged {
    private static final int REQUIREMENTS = 1;
    private static final int LEVERS = 2;
    private static final int TOLERANCES = 3;

    AskWindowTest() {
        super("z-fold-rod.json");
    }

    private Requirement last() throws Exception {
        List<Requirement> all = design().requirements();
        return all.get(all.size() - 1);
    }

    private void tab(int tab) throws Exception {
        Stagehand.fx(() -> {
            stage.node("lists", TabPane.class).getSelectionModel().select(tab);
            return true;
        });
        stage.settle();
    }

    private void select(String part) throws Exception {
        selectAll(List.of(part));
    }

    /** Takes a way through a menu by its words. */
    private void take(String button, String... way) throws Exception {
        Stagehand.fx(() -> {
            MenuButton menu = stage.node(button, MenuButton.class);
            menu.show();
            List<MenuItem> items = menu.getItems();
            for (String word : way) {
                MenuItem item = items.stream()
                        .filter(i -> word.equals(i.getText()))
                        .findFirst()
                        .orElseThrow(() -> new AssertionError("no " + word));
                if (item instanceof Menu inner) {
                    items = inner.getItems();
                } else {
                    item.fire();
                }
            }
            menu.hide();
            return true;
        });
        stage.settle();
    }

    private void focus(Node node) throws Exception {
        Stagehand.fx(() -> {
            node.requestFocus();
            return true;
        });
        stage.settle();
    }

    /** The head of a row of the list that is shown. */
    private Node head(String list, int row) throws Exception {
        return Stagehand.fx(() -> List.copyOf(stage.node(list, Parent.class).lookupAll(".ask-head"))
                .get(row));
    }

    private Node owner() throws Exception {
        return Stagehand.fx(() -> stage.editor().getScene().getFocusOwner());
    }

    /** Types in place of what is in the field that has the keyboard. */
    private void enter(String text) throws Exception {
        stage.press(KeyCode.CONTROL, KeyCode.A);
        stage.type(text);
        stage.press(KeyCode.ENTER);
    }

    private void tabTo(String id) throws Exception {
        for (int i = 0; i < 20 && !id.equals(owner().getId()); i++) {
            stage.press(KeyCode.TAB);
        }
        assertThat(owner().getId()).isEqualTo(id);
    }

    @Test
    void aRequirementIsAddedEditedAndRemovedWithUndo() throws Exception {
        tab(REQUIREMENTS);
        select("Output coupler");
        int before = design().requirements().size();
        take("add-requirement", "Output coupler", "Radius");
        assertThat(design().requirements()).hasSize(before + 1);
        assertThat(last().what()).isEqualTo(Quantity.RADIUS);
        assertThat(last().at()).contains(Place.of("Output coupler"));
        assertThat(last().plane()).contains(Planes.BOTH);
        double least = ((Bound.AtLeast) last().bound()).value();
        assertThat(least).as("met to begin with").isPositive();
        assertThat(shown().cavity().orElseThrow().judgements().get(before).margin())
                .isNotNegative();
        // The keyboard is in the number that is to be typed.
        assertThat(owner().getId()).isEqualTo("bound-low");
        enter("0.4 mm");
        assertThat(last().bound()).isEqualTo(new Bound.AtLeast(0.4e-3));
        stage.picture("requirement-open-light");
        choose("bound", before, "between");
        assertThat(last().bound()).isInstanceOf(Bound.Between.class);
        choose("bound", before, "equals");
        Bound.Equal equal = (Bound.Equal) last().bound();
        assertThat(equal.within()).isPositive();
        choose("plane", before, "tangential");
        assertThat(last().plane()).contains(Planes.TANGENTIAL);
        choose("over", before, "gap");
        assertThat(last().over()).contains("gap");
        stage.press(KeyCode.CONTROL, KeyCode.Z);
        assertThat(last().over()).isEmpty();
        choose("bound", before, "largest wished");
        assertThat(last().bound()).isEqualTo(Bound.Prefer.LARGEST);
        focus(head("requirements", before));
        stage.press(KeyCode.DELETE);
        assertThat(design().requirements()).hasSize(before);
        assertThat(design().parts()).as("no part was deleted").hasSize(5);
        stage.press(KeyCode.CONTROL, KeyCode.Z);
        assertThat(last().bound()).isEqualTo(Bound.Prefer.LARGEST);
    }

    /** Chooses in the sheet of a row. */
    private void choose(String id, int row, String words) throws Exception {
        Node head = head("requirements", row);
        stage.choose(Stagehand.fx(() -> head.getParent().lookup("#" + id)), words);
    }

    @Test
    void aRefusedBoundStaysWithItsReason() throws Exception {
        tab(REQUIREMENTS);
        focus(head("requirements", 1));
        stage.press(KeyCode.ENTER);
        tabTo("bound-low");
        enter("0.5");
        TextInputControl field = (TextInputControl) owner();
        assertThat(field.getText()).isEqualTo("0.5");
        assertThat(field.getStyleClass()).contains("refused");
        assertThat(field.getAccessibleText()).contains("not applied").contains("the smaller first");
        assertThat(design().requirements().get(1).bound()).isEqualTo(new Bound.Between(-0.25, 0.25));
        enter("-0.1");
        assertThat(design().requirements().get(1).bound()).isEqualTo(new Bound.Between(-0.1, 0.25));
        assertThat(field.getStyleClass()).doesNotContain("refused");
    }

    @Test
    void allIsDoneByKeyboardAlone() throws Exception {
        tab(REQUIREMENTS);
        focus(head("requirements", 0));
        // Down the list by Tab; every shut row is one stop.
        stage.press(KeyCode.TAB);
        stage.press(KeyCode.TAB);
        assertThat(owner()).isEqualTo(head("requirements", 2));
        assertThat(owner().getAccessibleText())
                .contains("Roundness at Output coupler")
                .contains("met");
        Requirement third = design().requirements().get(2);
        stage.press(KeyCode.ALT, KeyCode.UP);
        assertThat(design().requirements().get(1)).isEqualTo(third);
        assertThat(owner()).as("the keyboard stays with it").isEqualTo(head("requirements", 1));
        stage.press(KeyCode.CONTROL, KeyCode.Z);
        assertThat(design().requirements().get(2)).isEqualTo(third);
        assertThat(owner()).isEqualTo(head("requirements", 2));
        stage.press(KeyCode.SPACE);
        tabTo("bound-low");
        enter("0.9");
        assertThat(design().requirements().get(2).bound()).isEqualTo(new Bound.AtLeast(0.9));
        stage.press(KeyCode.ESCAPE);
        assertThat(owner()).as("Esc shuts the row").isEqualTo(head("requirements", 2));
        stage.press(KeyCode.DELETE);
        assertThat(design().requirements()).doesNotContain(third).hasSize(4);
        assertThat(owner()).isEqualTo(head("requirements", 2));
        // To the menu behind the list, and along it.
        tabTo("add-requirement");
        stage.press(KeyCode.SPACE);
        stage.press(KeyCode.DOWN);
        stage.press(KeyCode.RIGHT);
        stage.press(KeyCode.ENTER);
        assertThat(design().requirements()).hasSize(5);
        assertThat(last().at()).isEmpty();
        assertThat(last().what()).isEqualTo(Quantity.HALF_TRACE);
        assertThat(owner().getId()).isEqualTo("bound-low");
    }

    @Test
    void aLeverIsAddedAndEdited() throws Exception {
        tab(LEVERS);
        select("Fold 1");
        take("add-lever", "Fold 1", "Radius of curvature");
        Lever lever = design().levers().get(2);
        assertThat(lever.of()).containsExactly(Place.of("Fold 1"));
        assertThat(lever.range()).isEqualTo(new Lever.Range.Span(0.09, 0.11));
        assertThat(owner().getId()).isEqualTo("lever-name");
        enter("gap");
        assertThat(((TextInputControl) owner()).getStyleClass()).contains("refused");
        enter("radius");
        assertThat(design().levers().get(2).name()).isEqualTo("radius");
        Node sheet = head("levers", 2).getParent();
        take((MenuButton) sheet.lookup("#of-more"), "Fold 2");
        assertThat(design().levers().get(2).of()).containsExactly(Place.of("Fold 1"), Place.of("Fold 2"));
        focus(sheet.lookup("#lever-from"));
        enter("5 cm");
        assertThat(design().levers().get(2).range()).isEqualTo(new Lever.Range.Span(0.05, 0.11));
        stage.choose(sheet.lookup("#lever-range"), "among values");
        focus(sheet.lookup("#lever-among"));
        enter("50; 75; 0.1 m");
        assertThat(design().levers().get(2).range()).isEqualTo(new Lever.Range.Among(List.of(0.05, 0.075, 0.1)));
        stage.picture("lever-open-light");
        CheckBox adjuster = (CheckBox) sheet.lookup("#lever-adjuster");
        focus(adjuster);
        stage.press(KeyCode.SPACE);
        assertThat(design().levers().get(2).adjuster()).isTrue();
        // A lever that a requirement is over: the requirement follows its name, and goes with it.
        focus(head("levers", 2));
        stage.press(KeyCode.DELETE);
        assertThat(design().levers()).hasSize(2);
        stage.press(KeyCode.CONTROL, KeyCode.Z);
        assertThat(design().levers()).hasSize(3);
    }

    private void take(MenuButton menu, String word) throws Exception {
        Stagehand.fx(() -> {
            menu.show();
            menu.getItems().stream()
                    .filter(i -> word.equals(i.getText()))
                    .findFirst()
                    .orElseThrow()
                    .fire();
            menu.hide();
            return true;
        });
        stage.settle();
    }

    @Test
    void aToleranceIsAddedAndEdited() throws Exception {
        tab(TOLERANCES);
        select("Rod");
        int before = design().tolerances().size();
        take("add-tolerance", "Rod", "Length");
        Tolerance added = design().tolerances().get(before);
        assertThat(added)
                .isEqualTo(
                        new Tolerance("length_mm", List.of(Place.of("Rod")), 0.1e-3, false, Tolerance.Spread.UNIFORM));
        assertThat(owner().getId()).isEqualTo("plus-minus");
        enter("50 µm");
        assertThat(design().tolerances().get(before).plusMinus()).isEqualTo(50e-6);
        Node sheet = head("tolerances", before).getParent();
        stage.choose(sheet.lookup("#spread"), "normal, two sigma");
        assertThat(design().tolerances().get(before).spread()).isEqualTo(Tolerance.Spread.NORMAL);
        stage.choose(sheet.lookup("#plus-minus-unit"), "% of it");
        assertThat(design().tolerances().get(before).relative()).isTrue();
        enter("-1");
        assertThat(((TextInputControl) owner()).getStyleClass()).contains("refused");
        stage.press(KeyCode.ESCAPE);
        stage.press(KeyCode.SHIFT, KeyCode.TAB);
        assertThat(design().tolerances().get(before).plusMinus()).isEqualTo(0.05e-2);
    }

    @Test
    void rowsStayOpenWhileTheDesignIsEditedElsewhere() throws Exception {
        tab(REQUIREMENTS);
        focus(head("requirements", 2));
        stage.press(KeyCode.ENTER);
        tabTo("bound-low");
        stage.press(KeyCode.CONTROL, KeyCode.A);
        stage.type("0.9");
        Node field = owner();
        Edit first = AskEdits.REQUIREMENTS.remove(design(), 0);
        Stagehand.fx(() -> {
            stage.editor().session().edit(first);
            return true;
        });
        stage.settle();
        assertThat(owner()).isEqualTo(field);
        stage.type("1");
        stage.press(KeyCode.ENTER);
        assertThat(design().requirements().get(1).bound()).isEqualTo(new Bound.AtLeast(0.91));
    }

    @Test
    void nothingOpenOffersNothing() throws Exception {
        stage.close();
        stage = Stagehand.open(folder.resolve("other.json"), 1280, 800);
        for (String button : List.of("add-requirement", "add-lever", "add-tolerance")) {
            tab(List.of("add-requirement", "add-lever", "add-tolerance").indexOf(button) + 1);
            assertThat(stage.node(button, MenuButton.class).isDisabled()).isTrue();
        }
        assertThat(stage.node("requirements", Parent.class).lookupAll(".label").stream()
                        .map(n -> ((Label) n).getText()))
                .contains("Nothing is open.");
    }

    @Test
    void everyListIsShownInBothThemes() throws Exception {
        for (Theme theme : Theme.values()) {
            for (int tab : List.of(REQUIREMENTS, LEVERS, TOLERANCES)) {
                tab(tab);
                Stagehand.fx(() -> {
                    stage.editor().setTheme(theme);
                    return true;
                });
                String list = List.of("requirements", "levers", "tolerances").get(tab - 1);
                focus(head(list, 0));
                if (theme == Theme.LIGHT) {
                    stage.press(KeyCode.ENTER);
                }
                stage.picture(list + "-" + theme.word());
                assertThat(head(list, 0).getBoundsInLocal().getWidth()).isGreaterThan(200);
            }
        }
    }
}
