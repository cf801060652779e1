package twofold.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javafx.scene.Scene;
import javafx.scene.control.Button;
import javafx.scene.control.ChoiceBox;
import javafx.scene.input.KeyCode;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import twofold.design.Design;
import twofold.design.Entry;
import twofold.design.Field;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Unit;
import twofold.edit.CrystalCut;
import twofold.edit.StartingShape;
import twofold.file.DesignReader;
import twofold.file.DesignWriter;
import twofold.window.bench.BenchPane;

/** Cavities built from nothing in the window equal those that files hold. */
@Tag("headless-only")
class BuildingWindowTest extends Staged {
    @SuppressWarnings("unchecked") // the dialog's own boxes
    private void make(StartingShape shape, CrystalCut cut) throws Exception {
        Stagehand.later(() -> ((Button) stage.editor().lookup("#new")).fire());
        Scene dialog = stage.dialog();
        Stagehand.fx(() -> {
            ((ChoiceBox<StartingShape>) dialog.lookup("#shape")).setValue(shape);
            ((ChoiceBox<CrystalCut>) dialog.lookup("#crystal")).setValue(cut);
            return true;
        });
        stage.fire(dialog, "make");
    }

    /** What a file holds of a cavity, without what is asked of it. */
    private static Design cavity(String sample) throws Exception {
        Design whole = DesignReader.read(Files.readAllBytes(Path.of("samples", sample + ".json")))
                .design()
                .orElseThrow();
        return new Design(
                whole.title(),
                whole.notes(),
                whole.wavelength(),
                whole.shape(),
                whole.parts(),
                List.of(),
                List.of(),
                List.of(),
                List.of());
    }

    /** Gives the selected part a part's name and fields, as far as it has not got them, by typing and choosing. */
    private void become(Part wanted) throws Exception {
        stage.enter("field-name", wanted.name());
        for (Map.Entry<Field, Object> entry : wanted.values().stated().entrySet()) {
            Field field = entry.getKey();
            Part now = design().parts().get(design().indexOf(wanted.name()).orElseThrow());
            if (field == Field.AT || now.values().find(field).equals(Optional.of(entry.getValue()))) {
                continue;
            }
            String text = Entry.text(field, entry.getValue());
            switch (field) {
                case MATERIAL -> stage.choose("choice-material", text);
                case ALONG -> stage.choose("choice-along_mm", text);
                case FACES -> stage.choose("choice-incidence_deg", "Brewster");
                default -> stage.enter("field-" + field.json(), text);
            }
        }
    }

    private void build(Design wanted, String... shapeNames) throws Exception {
        List<Mirror> mirrors = wanted.mirrors();
        for (int i = 0; i < mirrors.size(); i++) {
            selectAll(List.of(shapeNames[i]));
            if (i == 0) {
                stage.choose("choice-follows", "others stay");
            }
            stage.enter("field-x", Unit.MM.text(mirrors.get(i).at().x()));
            stage.enter("field-y", Unit.MM.text(mirrors.get(i).at().y()));
            become(mirrors.get(i));
        }
        for (int i = 0; i < wanted.parts().size(); i++) {
            Part part = wanted.parts().get(i);
            if (!(part instanceof Mirror)) {
                selectAll(List.of(wanted.parts().get(i - 1).name()));
                Stagehand.fx(() -> {
                    stage.node("bench", BenchPane.class).requestFocus();
                    return true;
                });
                stage.press(KeyCode.CONTROL, KeyCode.DIGIT4);
                stage.press(KeyCode.ENTER);
                become(part);
            }
        }
        selectAll(List.of());
        stage.enter("design-title", wanted.title());
        stage.enter("design-wavelength", Unit.NM.text(wanted.wavelength()));
        Stagehand.fx(() -> {
            // The notes are an area, in which Enter is a new line; losing the keyboard takes the text.
            stage.editor().lookup("#design-notes").requestFocus();
            return true;
        });
        stage.press(KeyCode.CONTROL, KeyCode.A);
        stage.type(wanted.notes());
        Stagehand.fx(() -> {
            stage.node("bench", BenchPane.class).requestFocus();
            return true;
        });
        stage.settle();
    }

    private void released() throws Exception {
        Stagehand.fx(() -> {
            var session = stage.editor().session();
            Design now = session.laid().orElseThrow().design();
            session.edit(twofold.edit.Edit.of(
                    "start bare",
                    laid -> twofold.layout.Outcome.of(new Design(
                            now.title(),
                            now.notes(),
                            now.wavelength(),
                            now.shape(),
                            now.parts(),
                            List.of(),
                            List.of(),
                            List.of(),
                            List.of()))));
            return true;
        });
    }

    @Test
    void aZFoldFromNothingEqualsItsFileAndComesApartAgain() throws Exception {
        make(StartingShape.Z, CrystalCut.NONE);
        Design first = design();
        released();
        Design wanted = cavity("z-fold-rod");
        build(wanted, "End A", "Fold 1", "Fold 2", "End B");
        assertThat(design()).isEqualTo(wanted);
        Path file = folder.resolve("mine.json");
        answers.save = Optional.of(file);
        stage.press(KeyCode.CONTROL, KeyCode.S);
        assertThat(file).hasBinaryContent(DesignWriter.bytes(wanted));
        for (int i = 0; i < 200 && shown().undo().isPresent(); i++) {
            stage.press(KeyCode.CONTROL, KeyCode.Z);
        }
        assertThat(design()).isEqualTo(first);
        assertThat(shown().isUnsaved()).isTrue();
    }

    @Test
    void aBowTieFromNothingEqualsItsFile() throws Exception {
        make(StartingShape.BOW_TIE, CrystalCut.NONE);
        released();
        Design wanted = cavity("bow-tie-doubler");
        List<String> names = design().mirrors().stream().map(Part::name).toList();
        build(wanted, names.toArray(String[]::new));
        assertThat(design()).isEqualTo(wanted);
    }
}
