package twofold.session;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import twofold.design.Design;
import twofold.design.Field;
import twofold.edit.Edit;
import twofold.file.DesignWriter;

class SavingTest {
    private static final Edit EDIT = Edits.set("Fold 1", Field.ROC, 0.102);

    @TempDir
    @SuppressWarnings("NullAway.Init") // set by JUnit
    private Path folder;

    private final List<Saving> ended = new ArrayList<>();
    private final Session session = new Session(Runner.onTheSpot(), s -> {});

    private Path open() throws Exception {
        Path file = Files.copy(Path.of("samples/z-fold-rod.json"), folder.resolve("mine.json"));
        session.open(file);
        return file;
    }

    private static Design design(Session of) {
        return of.shown().cavity().orElseThrow().laid().design();
    }

    private byte[] bytes() {
        return DesignWriter.bytes(design(session));
    }

    @Test
    void whatIsSavedIsNoLongerUnsaved() throws Exception {
        Path file = open();
        session.edit(EDIT);
        session.save(ended::add);
        assertThat(ended).containsExactly(Saving.DONE);
        assertThat(file).hasBinaryContent(bytes());
        assertThat(session.shown().isUnsaved()).isFalse();
        assertThat(session.shown().undo()).as("history stays").isPresent();
        session.look();
        assertThat(session.shown().isChangedOnDisk())
                .as("what we wrote is no change")
                .isFalse();
        session.undo();
        assertThat(session.shown().isUnsaved()).isTrue();
        session.save(ended::add);
        session.redo();
        session.save(ended::add);
        assertThat(ended).containsOnly(Saving.DONE);
    }

    @Test
    void aFileChangedByAnotherProgramAsks() throws Exception {
        Path file = open();
        session.edit(EDIT);
        Files.writeString(file, "another program's");
        session.save(ended::add);
        assertThat(ended).containsExactly(Saving.CHANGED_ON_DISK);
        assertThat(file).hasContent("another program's");
        assertThat(session.shown().isUnsaved()).isTrue();
        assertThat(session.shown().isChangedOnDisk()).isTrue();
        session.saveOver(ended::add);
        assertThat(ended).endsWith(Saving.DONE);
        assertThat(file).hasBinaryContent(bytes());
        assertThat(session.shown().isChangedOnDisk()).isFalse();
    }

    @Test
    void aFileThatIsGoneIsWrittenAgain() throws Exception {
        Path file = open();
        Files.delete(file);
        session.save(ended::add);
        assertThat(ended).containsExactly(Saving.DONE);
        assertThat(file).hasBinaryContent(bytes());
    }

    @Test
    void samplesAndNewDesignsAreSavedAsAFile() throws Exception {
        session.openSample("x-fold.json");
        session.save(ended::add);
        session.create(design(session));
        session.save(ended::add);
        session.saveOver(ended::add);
        assertThat(ended).containsOnly(Saving.NEEDS_NAME).hasSize(3);
        Path file = folder.resolve("new.json");
        int document = session.shown().document();
        session.saveAs(file, ended::add);
        assertThat(ended).endsWith(Saving.DONE);
        assertThat(session.shown().source()).contains(Source.of(file));
        assertThat(session.shown().document()).isEqualTo(document);
        assertThat(session.shown().isUnsaved()).isFalse();
        session.save(ended::add);
        assertThat(ended).endsWith(Saving.DONE);
        assertThat(file).hasBinaryContent(bytes());
    }

    @Test
    void aFailureIsSaidAndLosesNothing() throws Exception {
        Path file = open();
        byte[] old = Files.readAllBytes(file);
        session.edit(EDIT);
        Path nowhere = folder.resolve("none").resolve("design.json");
        session.saveAs(nowhere, ended::add);
        assertThat(ended).containsExactly(Saving.FAILED);
        assertThat(session.shown().trouble())
                .contains("design.json could not be saved: there is no folder " + nowhere.getParent()
                        + ". The design is still open here, unsaved.");
        assertThat(session.shown().source()).contains(Source.of(file));
        assertThat(session.shown().isUnsaved()).isTrue();
        assertThat(session.shown().undo()).isPresent();
        assertThat(file).hasBinaryContent(old);
        session.save(ended::add);
        assertThat(session.shown().trouble()).isEmpty();
        session.saveAs(folder, ended::add);
        assertThat(session.shown().trouble())
                .hasValueSatisfying(w -> assertThat(w).contains("it is a folder"));
        session.dismiss();
        assertThat(session.shown().trouble()).isEmpty();
    }

    @Test
    void aPreviewIsMadeAStepBeforeItIsSaved() throws Exception {
        Path file = open();
        session.preview(EDIT);
        session.save(ended::add);
        assertThat(session.shown().isPreview()).isFalse();
        assertThat(session.shown().undo()).contains(EDIT.name());
        assertThat(file).hasBinaryContent(bytes());
    }

    @Test
    void whatIsEditedWhileSavingIsUnsavedAndASecondSavingWaits() throws Exception {
        Path file = Files.copy(Path.of("samples/z-fold-rod.json"), folder.resolve("mine.json"));
        Later later = new Later();
        Session slow = new Session(later, s -> {});
        slow.open(file);
        later.runAll();
        slow.edit(EDIT);
        slow.save(ended::add);
        slow.edit(Edits.set("Fold 2", Field.ROC, 0.102));
        slow.save(ended::add);
        assertThat(later.count()).isEqualTo(1);
        later.runOne();
        assertThat(slow.shown().isUnsaved()).as("edited since").isTrue();
        later.runAll();
        assertThat(ended).containsExactly(Saving.DONE, Saving.DONE);
        assertThat(slow.shown().isUnsaved()).isFalse();
        assertThat(file).hasBinaryContent(DesignWriter.bytes(design(slow)));
    }
}
