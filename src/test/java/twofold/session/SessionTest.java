package twofold.session;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Part;

class SessionTest {
    private static final Path SAMPLE = Path.of("samples/z-fold-rod.json");

    @TempDir
    @SuppressWarnings("NullAway.Init") // set by JUnit
    Path folder;

    private final List<Shown> heard = new ArrayList<>();
    private final Session session = new Session(Runner.onTheSpot(), heard::add);

    private Path copy() throws Exception {
        return Files.copy(SAMPLE, folder.resolve("mine.json"));
    }

    @Test
    void aGoodFileIsShownSolvedWithItsFirstCrystalSelected() {
        session.open(SAMPLE);
        assertThat(heard).hasSize(1);
        assertThat(session.shown().cavity()).isPresent();
        assertThat(session.selectedPart().map(Part::name)).contains("Rod");
        assertThat(session.shown().isStale()).isFalse();
    }

    @Test
    void theLastGoodDesignStaysBesideABadFile() throws Exception {
        Path file = copy();
        session.open(file);
        Files.writeString(file, "{");
        session.reload();
        assertThat(session.shown().problems()).isNotEmpty();
        assertThat(session.shown().cavity()).isPresent();
        assertThat(session.shown().isStale()).isTrue();
        Files.copy(SAMPLE, file, java.nio.file.StandardCopyOption.REPLACE_EXISTING);
        session.reload();
        assertThat(session.shown().problems()).isEmpty();
        assertThat(session.shown().isStale()).isFalse();
    }

    @Test
    void aChangeOnDiskIsShownAndNotActedOn() throws Exception {
        Path file = copy();
        session.open(file);
        session.look();
        assertThat(session.shown().isChangedOnDisk()).isFalse();
        Files.writeString(file, Files.readString(file).replace("Z", "z") + " ");
        session.look();
        assertThat(session.shown().isChangedOnDisk()).isTrue();
        session.reload();
        assertThat(session.shown().isChangedOnDisk()).isFalse();
    }

    @Test
    void aReloadKeepsTheSelectionByName() throws Exception {
        Path file = copy();
        session.open(file);
        session.select(Optional.of(3));
        assertThat(session.selectedPart().map(Part::name)).contains("Fold 2");
        session.reload();
        assertThat(session.selectedPart().map(Part::name)).contains("Fold 2");
    }

    @Test
    void selectionStaysWithinTheParts() {
        session.select(Optional.of(0));
        assertThat(session.shown().selected()).as("nothing is open").isEmpty();
        session.open(SAMPLE);
        session.select(Optional.of(99));
        assertThat(session.shown().selected()).isEmpty();
        session.step(-1);
        assertThat(session.selectedPart().map(Part::name)).contains("Output coupler");
        session.step(1);
        assertThat(session.selectedPart().map(Part::name)).contains("End A");
    }

    @Test
    void theNewestRequestWins() throws Exception {
        Later later = new Later();
        Session slow = new Session(later, heard::add);
        Path other = Files.copy(Path.of("samples/x-fold.json"), folder.resolve("other.json"));
        slow.open(SAMPLE);
        slow.open(other);
        // The older answer comes last.
        later.runLast();
        later.runOne();
        assertThat(slow.shown().source().map(Source::name)).contains("other.json");
    }

    @Test
    void whatDoesNotChangeIsNotTold() {
        session.open(SAMPLE);
        int before = heard.size();
        session.point(Optional.empty());
        session.select(session.shown().selected());
        assertThat(heard).hasSize(before);
        session.point(Optional.of(0.1));
        assertThat(heard).hasSize(before + 1);
    }

    @Test
    void everySampleOfTheFolderIsCarried() throws Exception {
        try (var files = Files.list(Path.of("samples"))) {
            assertThat(Samples.names())
                    .isEqualTo(
                            files.map(f -> f.getFileName().toString()).sorted().toList());
        }
        for (String name : Samples.names()) {
            session.openSample(name);
            assertThat(session.shown().cavity()).as(name).isPresent();
            assertThat(session.shown().problems()).as(name).isEmpty();
        }
    }

    @Test
    void figuresTellEveryPartOfEverySample() {
        for (String name : Samples.names()) {
            session.openSample(name);
            var cavity = session.shown().cavity().orElseThrow();
            for (int i = 0; i < cavity.laid().design().parts().size(); i++) {
                assertThat(Figures.of(cavity, i, Figures.Across.RADIUS))
                        .as("%s part %d", name, i)
                        .hasSizeGreaterThan(3)
                        .allSatisfy(f -> {
                            assertThat(f.shown()).doesNotContain("NaN");
                            assertThat(f.line()).contains("\t");
                        });
            }
        }
    }

    @Test
    void aBadFileLeavesTheEditedDesignAndItsHistoryAlone() throws Exception {
        Path file = copy();
        session.open(file);
        session.edit(Edits.set("Fold 1", Field.ROC, 0.102));
        Shown edited = session.shown();
        Path bad = Files.writeString(folder.resolve("bad.json"), "{");
        session.open(bad);
        assertThat(session.shown().refused().map(Refused::source)).contains(Source.of(bad));
        assertThat(session.shown().problems()).isNotEmpty();
        assertThat(session.shown().source()).contains(Source.of(file));
        assertThat(session.shown().isStale())
                .as("the pictures show what is edited")
                .isFalse();
        session.dismiss();
        assertThat(session.shown()).isEqualTo(edited);
        session.open(folder.resolve("none.json"));
        assertThat(session.shown().failure()).contains("there is no such file");
        session.undo();
        assertThat(session.shown().isUnsaved()).isFalse();
        // Mended, it is opened by a reload.
        Files.copy(SAMPLE, folder.resolve("none.json"));
        session.look();
        assertThat(session.shown().isChangedOnDisk()).isTrue();
        session.reload();
        assertThat(session.shown().source()).contains(Source.of(folder.resolve("none.json")));
        assertThat(session.shown().refused()).isEmpty();
    }

    @Test
    void aReloadIsAStepSoThatUnsavedWorkCanBeTakenBack() throws Exception {
        Path file = copy();
        session.open(file);
        int document = session.shown().document();
        session.edit(Edits.set("Fold 1", Field.ROC, 0.102));
        Design mine = session.shown().cavity().orElseThrow().laid().design();
        session.reload();
        assertThat(session.shown().isUnsaved()).isFalse();
        assertThat(session.shown().undo()).contains("reload mine.json");
        assertThat(session.shown().document()).isEqualTo(document);
        session.undo();
        assertThat(session.shown().cavity().orElseThrow().laid().design()).isEqualTo(mine);
        assertThat(session.shown().isUnsaved()).isTrue();
        session.undo();
        assertThat(session.shown().isUnsaved()).isFalse();
    }

    @Test
    void whatWasEditedWhileAFileWasReadIsNotLost() throws Exception {
        Later later = new Later();
        Session slow = new Session(later, heard::add);
        slow.open(SAMPLE);
        later.runAll();
        Path other = Files.copy(Path.of("samples/x-fold.json"), folder.resolve("other.json"));
        slow.open(other);
        slow.edit(Edits.set("Fold 1", Field.ROC, 0.102));
        later.runAll();
        assertThat(slow.shown().source()).contains(Source.of(SAMPLE));
        assertThat(slow.shown().failure()).hasValueSatisfying(w -> assertThat(w).contains("edited meanwhile"));
        slow.open(other);
        later.runAll();
        assertThat(slow.shown().source()).contains(Source.of(other));
    }
}
