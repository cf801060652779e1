package twofold.window;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javafx.geometry.Bounds;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.TextInputControl;
import javafx.scene.control.ToggleButton;
import javafx.scene.input.Clipboard;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import twofold.design.Along;
import twofold.design.Crystal;
import twofold.design.Design;
import twofold.design.FaceAngle;
import twofold.design.Hold;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Shape;
import twofold.design.Unit;
import twofold.file.DesignReader;
import twofold.layout.Follow;
import twofold.picture.Theme;

/** The fields of parts and of the design, typed and chosen in a real window. */
@Tag("headless-only")
class InspectorWindowTest extends Staged {
    /** Typed numbers are read exactly and rounded once. */
    private static final double EXACT = 0;

    /** Mirrors are moved to 1e-9 mm. */
    private static final double MOVED = 1e-12;

    InspectorWindowTest() {
        super("z-fold-rod.json");
    }

    private <T extends Part> T part(String name, Class<T> type) throws Exception {
        return type.cast(design().parts().get(design().indexOf(name).orElseThrow()));
    }

    private Mirror mirror(String name) throws Exception {
        return part(name, Mirror.class);
    }

    private double incidence(String mirror) throws Exception {
        return Math.toDegrees(
                laid().incidence().getOrDefault(design().indexOf(mirror).orElseThrow(), 0.0));
    }

    private void select(String part) throws Exception {
        selectAll(List.of(part));
    }

    private void selectNothing() throws Exception {
        selectAll(List.of());
    }

    private TextInputControl field(String id) {
        return stage.node(id, TextInputControl.class);
    }

    private String text(String id) throws Exception {
        return Stagehand.fx(() -> field(id).getText());
    }

    private void focus(Node node) throws Exception {
        Stagehand.fx(() -> {
            node.requestFocus();
            return true;
        });
        stage.settle();
    }

    /** Types in place of what is in a field, which gets the keyboard; nothing is applied. */
    private void type(String id, String text) throws Exception {
        focus(field(id));
        stage.press(KeyCode.CONTROL, KeyCode.A);
        if (text.isEmpty()) {
            stage.press(KeyCode.DELETE);
        } else {
            stage.type(text);
        }
    }

    private void enter(String id, String text) throws Exception {
        type(id, text);
        stage.press(KeyCode.ENTER);
    }

    /** The reason under a field; empty where there is none. */
    private String reason(String id) throws Exception {
        return Stagehand.fx(() -> field(id).getParent().getParent().lookupAll(".reason").stream()
                .filter(Node::isVisible)
                .map(n -> ((Label) n).getText())
                .findFirst()
                .orElse(""));
    }

    private boolean isMarked(String id) throws Exception {
        return Stagehand.fx(() -> field(id).getStyleClass().contains("refused"));
    }

    @Test
    void typedTextCarriesItsUnit() throws Exception {
        select("Rod");
        enter("field-length_mm", "0.6 cm");
        assertThat(part("Rod", Crystal.class).length()).isCloseTo(6e-3, within(EXACT));
        assertThat(shown().undo()).contains("set length of Rod");
        assertThat(text("field-length_mm"))
                .as("in full, while it has the keyboard")
                .isEqualTo("6");
        enter("field-length_mm", "0.2 in");
        assertThat(part("Rod", Crystal.class).length()).isCloseTo(5.08e-3, within(EXACT));
        enter("field-incidence_deg", "7°30'");
        assertThat(part("Rod", Crystal.class).slab().faces()).isEqualTo(FaceAngle.of(Unit.DEG.toSi(7.5)));
        assertThat(stage.chosen("choice-incidence_deg")).isEqualTo("angle");
        stage.press(KeyCode.CONTROL, KeyCode.Z);
        stage.press(KeyCode.CONTROL, KeyCode.Z);
        assertThat(part("Rod", Crystal.class).length()).isCloseTo(6e-3, within(EXACT));
        stage.press(KeyCode.TAB);
        assertThat(text("field-length_mm")).as("rounded without the keyboard").isEqualTo("6.00");
    }

    @Test
    void deleteOnALockTakesNoPartOffTheBeam() throws Exception {
        select("Fold 1");
        Design before = design();
        focus(stage.node("lock-place", Node.class));
        stage.press(KeyCode.DELETE);
        assertThat(design()).isEqualTo(before);
    }

    @Test
    void aRefusedTextStaysWithItsReason() throws Exception {
        select("Rod");
        Design before = design();
        enter("field-length_mm", "5 kg");
        assertThat(design()).isEqualTo(before);
        assertThat(text("field-length_mm")).isEqualTo("5 kg");
        assertThat(isMarked("field-length_mm")).isTrue();
        assertThat(reason("field-length_mm")).startsWith("! found \"5 kg\"").contains("mm, cm");
        assertThat(field("field-length_mm").getAccessibleText())
                .contains("not applied")
                .contains("5 kg");
        stage.picture("refused-light");
        // Another field is edited, the refused one keeps its text.
        enter("field-loss", "0.1%");
        assertThat(part("Rod", Crystal.class).slab().loss()).isCloseTo(1e-3, within(EXACT));
        assertThat(text("field-length_mm")).isEqualTo("5 kg");
        assertThat(shown().undo()).contains("set loss of Rod");
        // Another part is looked at; the text comes back with its own part, and is no other's.
        select("Fold 1");
        select("Rod");
        assertThat(text("field-length_mm")).isEqualTo("5 kg");
        assertThat(reason("field-length_mm")).contains("5 kg");
        focus(field("field-length_mm"));
        stage.press(KeyCode.ESCAPE);
        assertThat(text("field-length_mm")).isEqualTo("5");
        assertThat(isMarked("field-length_mm")).isFalse();
        assertThat(reason("field-length_mm")).isEmpty();
        assertThat(field("field-length_mm").getAccessibleText()).isEqualTo("Length, mm");
    }

    @Test
    void aTextThatIsNotAppliedStaysWithItsOwnMirror() throws Exception {
        select("Fold 1");
        type("field-roc_mm", "250");
        select("Fold 2");
        assertThat(text("field-roc_mm")).isNotEqualTo("250");
        assertThat(mirror("Fold 1").radius()).isEqualTo(0.1);
        select("Fold 1");
        assertThat(text("field-roc_mm")).isEqualTo("250");
        assertThat(reason("field-roc_mm")).contains("not applied yet");
        focus(field("field-roc_mm"));
        stage.press(KeyCode.ENTER);
        assertThat(mirror("Fold 1").radius()).isEqualTo(0.25);
        assertThat(mirror("Fold 2").radius()).isEqualTo(0.1);
    }

    @Test
    void leavingAFieldAppliesAndAClickElsewhereToo() throws Exception {
        select("Fold 1");
        type("field-roc_mm", "-200");
        stage.press(KeyCode.TAB);
        assertThat(mirror("Fold 1").radius()).isEqualTo(-0.2);
        assertThat(stage.chosen("choice-roc_mm")).isEqualTo("convex");
        type("field-roc_mm", "150");
        Node bench = stage.node("bench", Node.class);
        stage.click(bench, 30, 200);
        assertThat(mirror("Fold 1").radius()).isEqualTo(0.15);
        assertThat(shown().selected()).as("the click selected nothing").isEmpty();
    }

    @Test
    void undoIsTheFieldsUntilItsTextIsApplied() throws Exception {
        select("Fold 1");
        enter("field-roc_mm", "150");
        type("field-roc_mm", "7");
        stage.press(KeyCode.CONTROL, KeyCode.Z);
        assertThat(mirror("Fold 1").radius()).as("the document is as it was").isEqualTo(0.15);
        assertThat(text("field-roc_mm")).isEqualTo("150");
        stage.press(KeyCode.CONTROL, KeyCode.Z);
        assertThat(mirror("Fold 1").radius()).isEqualTo(0.1);
        assertThat(text("field-roc_mm")).isEqualTo("100");
        stage.press(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.Z);
        assertThat(mirror("Fold 1").radius()).isEqualTo(0.15);
    }

    @Test
    void aFocusedFieldIsNotDisturbedByAnEditElsewhere() throws Exception {
        select("Fold 1");
        type("field-roc_mm", "12");
        Stagehand.fx(() -> {
            stage.editor().session().edit(twofold.edit.FieldEdits.title("Another"));
            return true;
        });
        stage.settle();
        stage.type("5");
        assertThat(text("field-roc_mm")).isEqualTo("125");
        assertThat(Stagehand.fx(() -> field("field-roc_mm").isFocused())).isTrue();
        stage.press(KeyCode.ENTER);
        assertThat(mirror("Fold 1").radius()).isEqualTo(0.125);
    }

    @Test
    void brewsterAndTheMiddleAreChoices() throws Exception {
        select("Rod");
        assertThat(stage.chosen("choice-along_mm")).isEqualTo("middle");
        double middle = laid().legs().get(1).parts().get(0).middle();
        stage.choose("choice-along_mm", "at");
        assertThat(part("Rod", Crystal.class).slab().along()).isEqualTo(Along.at(middle));
        enter("field-along_mm", "5 cm");
        assertThat(part("Rod", Crystal.class).slab().along()).isEqualTo(Along.at(0.05));
        stage.choose("choice-along_mm", "middle");
        assertThat(part("Rod", Crystal.class).slab().along()).isEqualTo(Along.MIDDLE);
        double brewster = laid().legs().get(1).parts().get(0).incidence();
        stage.choose("choice-incidence_deg", "angle");
        assertThat(part("Rod", Crystal.class).slab().faces()).isEqualTo(FaceAngle.of(brewster));
        enter("field-incidence_deg", "brewster");
        assertThat(part("Rod", Crystal.class).slab().faces()).isEqualTo(FaceAngle.BREWSTER);
        stage.choose("choice-side", "right");
        assertThat(part("Rod", Crystal.class).slab().side().word()).isEqualTo("right");
        stage.choose("choice-tilt_plane", "sagittal");
        assertThat(part("Rod", Crystal.class).slab().side().word()).isEqualTo("down");
    }

    @Test
    void aMaterialIsChosenWithItsSource() throws Exception {
        select("Rod");
        Label source = stage.node("material-source", Label.class);
        assertThat(source.getText()).contains("Malitson").contains("µm").contains("°C");
        stage.choose("choice-material", "YAG");
        assertThat(part("Rod", Crystal.class).slab().glass().material()).contains("YAG");
        assertThat(text("field-index")).startsWith("1.82");
        enter("field-index", "1.76");
        assertThat(part("Rod", Crystal.class).slab().glass().index()).hasValue(1.76);
        assertThat(stage.chosen("choice-material")).isEqualTo("an index");
        assertThat(source.getText()).contains("wins over YAG");
        // Taken back, the material counts again.
        enter("field-index", "");
        assertThat(part("Rod", Crystal.class).slab().glass().index()).isEmpty();
        assertThat(stage.chosen("choice-material")).isEqualTo("YAG");
    }

    @Test
    void optionalFieldsAreTakenBack() throws Exception {
        select("Fold 1");
        Node clear = Stagehand.fx(() -> field("field-diameter_mm").getParent().lookup(".clear"));
        assertThat(clear.isDisabled()).isFalse();
        focus(clear);
        stage.press(KeyCode.SPACE);
        assertThat(mirror("Fold 1").diameter()).isEqualTo(25.4e-3);
        assertThat(clear.isDisabled()).isTrue();
        enter("field-roc_mm", "");
        assertThat(mirror("Fold 1").radius()).isInfinite();
        assertThat(text("field-roc_mm")).isEqualTo("flat");
        select("Rod");
        enter("field-length_mm", "");
        assertThat(reason("field-length_mm")).contains("found nothing");
    }

    @Test
    void aLockHoldsAndIsRespected() throws Exception {
        select("Fold 1");
        ToggleButton lock = stage.node("lock-incidence", ToggleButton.class);
        assertThat(lock.getAccessibleText()).isEqualTo("Hold the incidence at Fold 1");
        focus(lock);
        stage.press(KeyCode.SPACE);
        assertThat(design().holds()).contains(new Hold.Incidence("Fold 1"));
        assertThat(lock.isSelected()).isTrue();
        double held = incidence("Fold 1");
        select("Fold 2");
        enter("field-x", "395");
        assertThat(incidence("Fold 1")).isCloseTo(held, within(1e-9));
        stage.press(KeyCode.CONTROL, KeyCode.Z);
        stage.press(KeyCode.CONTROL, KeyCode.Z);
        assertThat(lock.isSelected()).isFalse();
        assertThat(design().holds()).doesNotContain(new Hold.Incidence("Fold 1"));
        // The place of End A and the first leg are held by the file: the mirror between cannot be typed elsewhere on
        // its axis.
        select("Fold 1");
        enter("field-x", "510");
        assertThat(mirror("Fold 1").at().x()).isEqualTo(0.5);
        assertThat(reason("field-x")).contains("End A/Fold 1");
    }

    @Test
    void aLegIsTypedWithEachThatFollows() throws Exception {
        double gap = laid().legs().get(1).path();
        for (Follow follow : Follow.values()) {
            select("Fold 2");
            boolean isOffered = stage.choices("choice-follows").contains(follow.words());
            assertThat(isOffered).isEqualTo(Follow.allowed(laid()).contains(follow));
            if (!isOffered) {
                continue;
            }
            stage.choose("choice-follows", follow.words());
            double end = mirror("Output coupler").at().x();
            enter("field-leg-before", "10.3 cm");
            assertThat(laid().legs().get(1).path()).isCloseTo(0.103, within(MOVED));
            assertThat(laid().legs().get(2).path()).as("held").isCloseTo(0.7, within(1e-9));
            assertThat(mirror("Output coupler").at().x() == end).isEqualTo(follow == Follow.OTHERS_STAY);
            stage.press(KeyCode.CONTROL, KeyCode.Z);
            assertThat(laid().legs().get(1).path()).isCloseTo(gap, within(MOVED));
        }
        assertThat(Stagehand.fx(() -> stage.editor().following().chosen())).isPresent();
        stage.choose("choice-follows", "as is usual");
        assertThat(Stagehand.fx(() -> stage.editor().following().chosen())).isEmpty();
    }

    @Test
    void anIncidenceAndAFullFoldAngleAreTyped() throws Exception {
        select("Fold 1");
        double other = incidence("Fold 2");
        enter("field-incidence", "7°30'");
        assertThat(incidence("Fold 1")).isCloseTo(7.5, within(1e-9));
        assertThat(incidence("Fold 2")).as("the usual way no other changes").isCloseTo(other, within(1e-9));
        assertThat(Double.parseDouble(text("field-fold"))).isEqualTo(15.0);
        enter("field-fold", "16");
        assertThat(incidence("Fold 1")).isCloseTo(8, within(1e-9));
        select("End A");
        assertThat(field("field-incidence").isEditable()).isFalse();
        assertThat(field("field-incidence").getAccessibleHelp()).contains("head-on");
    }

    @Test
    void theDesignItselfIsEditedWhereNothingIsSelected() throws Exception {
        selectNothing();
        enter("design-title", "Bench source");
        assertThat(design().title()).isEqualTo("Bench source");
        enter("design-wavelength", "0.81 µm");
        assertThat(design().wavelength()).isEqualTo(810e-9);
        enter("design-wavelength", "6 µm");
        assertThat(reason("design-wavelength")).as("beyond the sapphire's fit").isNotEmpty();
        assertThat(design().wavelength()).isEqualTo(810e-9);
        stage.press(KeyCode.ESCAPE);
        type("design-notes", "Two lines,");
        stage.press(KeyCode.ENTER);
        stage.type("the second.");
        stage.press(KeyCode.CONTROL, KeyCode.ENTER);
        assertThat(design().notes()).isEqualTo("Two lines,\nthe second.");
        focus(stage.node("lock-round-trip", ToggleButton.class));
        stage.press(KeyCode.SPACE);
        assertThat(design().holds()).contains(new Hold.RoundTrip());
        stage.choose("choice-shape", "ring");
        // A ring of these four mirrors is laid out or refused in words; the choice shows what is.
        assertThat(stage.chosen("choice-shape")).isEqualTo(design().shape().word());
        assertThat(design().shape()).isIn(Shape.RING, Shape.STANDING_WAVE);
    }

    @Test
    void partsAreRenamedAndWalkedThroughByKeyboard() throws Exception {
        select("Rod");
        enter("field-name", "Fold 1");
        assertThat(reason("field-name")).contains("a second time");
        enter("field-name", "Ruby");
        assertThat(design().indexOf("Ruby")).isPresent();
        assertThat(reason("field-name")).isEmpty();
        // Tab goes through every control in the order of reading.
        focus(field("field-name"));
        stage.press(KeyCode.TAB);
        assertThat(focused()).isEqualTo("choice-along_mm");
        stage.press(KeyCode.TAB);
        assertThat(focused()).isEqualTo("field-along_mm");
        stage.press(KeyCode.TAB);
        assertThat(focused()).isEqualTo("field-length_mm");
        stage.type("4");
        stage.press(KeyCode.SHIFT, KeyCode.TAB);
        assertThat(part("Ruby", Crystal.class).length()).isEqualTo(4e-3);
        assertThat(focused()).isEqualTo("field-along_mm");
    }

    private String focused() throws Exception {
        return Stagehand.fx(
                () -> String.valueOf(stage.editor().getScene().getFocusOwner().getId()));
    }

    @Test
    void diametersAreTwiceTheRadii() throws Exception {
        select("Output coupler");
        double radius = copied("Beam radius, µm");
        focus(stage.node("diameters", Node.class));
        stage.press(KeyCode.SPACE);
        assertThat(copied("Beam diameter, µm")).isCloseTo(2 * radius, within(1e-9));
    }

    /** The tangential figure of a copied line. */
    private double copied(String name) throws Exception {
        return Stagehand.fx(() -> {
            stage.editor().copyFigures();
            return Clipboard.getSystemClipboard()
                    .getString()
                    .lines()
                    .filter(l -> l.startsWith(name))
                    .mapToDouble(l -> Double.parseDouble(l.split("\t", -1)[1]))
                    .findFirst()
                    .orElseThrow();
        });
    }

    @Test
    void savingTakesWhatIsTyped() throws Exception {
        stage.close();
        Answers answers = new Answers();
        Path file = folder.resolve("mine.json");
        answers.save = Optional.of(file);
        stage = Stagehand.open(folder.resolve("others.json"), 1280, 800, answers);
        stage.openSample("z-fold-rod.json");
        select("Fold 1");
        type("field-roc_mm", "150");
        stage.press(KeyCode.CONTROL, KeyCode.S);
        Design saved = DesignReader.read(Files.readAllBytes(file)).design().orElseThrow();
        assertThat(((Mirror) saved.parts().get(1)).radius()).isEqualTo(0.15);
        assertThat(shown().isUnsaved()).isFalse();
    }

    @Test
    void whatHasTheKeyboardIsInView() throws Exception {
        select("Fold 1");
        focus(field("field-name"));
        ScrollPane scroll = stage.node("fields-scroll", ScrollPane.class);
        for (int i = 0; i < 40 && !"field-mount_mm".equals(focused()); i++) {
            stage.press(KeyCode.TAB);
            Node owner = Stagehand.fx(() -> stage.editor().getScene().getFocusOwner());
            Bounds at = Stagehand.fx(() -> owner.localToScene(owner.getLayoutBounds()));
            Bounds view = Stagehand.fx(() -> scroll.localToScene(scroll.getLayoutBounds()));
            assertThat(at.getMinY()).as("%s", owner).isGreaterThanOrEqualTo(view.getMinY());
            assertThat(at.getMaxY()).as("%s", owner).isLessThanOrEqualTo(view.getMaxY());
        }
        assertThat(focused()).isEqualTo("field-mount_mm");
        assertThat(scroll.getVvalue()).as("it scrolled").isPositive();
        enter("field-mount_mm", "30 x 2 cm");
        assertThat(mirror("Fold 1").mount().depth()).isEqualTo(0.02);
        assertThat(mirror("Fold 1").mount().width()).isEqualTo(0.03);
    }

    @Test
    void everyPartIsShownInBothThemes() throws Exception {
        for (Theme theme : Theme.values()) {
            for (int i = -1; i < 5; i++) {
                int part = i;
                Stagehand.fx(() -> {
                    stage.editor().setTheme(theme);
                    stage.editor().session().select(part < 0 ? Optional.empty() : Optional.of(part));
                    return true;
                });
                stage.picture("inspect-" + (i + 1) + "-" + theme.word());
                Label title = (Label) Stagehand.fx(() -> stage.editor().lookup("#inspected"));
                assertThat(title.getText())
                        .startsWith(
                                i < 0 ? "The design" : design().parts().get(i).name());
            }
        }
    }
}
