package twofold.session;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import twofold.Child;
import twofold.Samples;
import twofold.design.Design;
import twofold.design.Field;
import twofold.file.DesignWriter;
import twofold.file.Journal;
import twofold.file.UnsavedWork;

/** What is left of unsaved work after a program was killed. */
class RecoveryTest {
    @TempDir
    private Path root;

    private final List<Saving> ended = new ArrayList<>();

    private Session session(Path folder) {
        return new Session(Runner.onTheSpot(), new Journal(folder), Runner.onTheSpot(), s -> {});
    }

    private static Design design(Session session) {
        return session.shown().cavity().orElseThrow().laid().design();
    }

    private static List<Path> files(Path folder) throws IOException {
        if (!Files.isDirectory(folder)) {
            return List.of();
        }
        try (Stream<Path> all = Files.list(folder)) {
            return all.filter(f -> f.toString().endsWith(".journal")).toList();
        }
    }

    /** Puts a journal of this process where that of a program that is gone would be. */
    private static void crash(Path folder) throws IOException {
        Files.move(files(folder).get(0), folder.resolve("1-1-0.journal"));
    }

    private static UnsavedWork only(Path folder) throws IOException {
        List<UnsavedWork> all = UnsavedWork.in(folder);
        assertThat(all).hasSize(1);
        return all.get(0);
    }

    @Test
    void theWorkUpToTheLastEditOfAKilledProgramIsOfferedByteForByte() throws Exception {
        try (Child child = Child.start(Crash.class, root.toString(), "25")) {
            for (int n = 1; n <= 25; n++) {
                assertThat(child.line()).isEqualTo(Integer.toString(n));
            }
            assertThat(UnsavedWork.in(root))
                    .as("a running program's is not offered")
                    .isEmpty();
            child.kill();
        }
        Session session = session(root);
        UnsavedWork work = only(root);
        assertThat(work.title()).isEqualTo("Ice profiler, tunable bench source");
        session.recover(work);
        assertThat(DesignWriter.bytes(design(session))).isEqualTo(Crash.after(25));
        assertThat(session.shown().isUnsaved()).isTrue();
        assertThat(session.shown().source()).contains(Source.sample("z-fold-rod.json"));
        assertThat(files(root))
                .as("the new session's journal, and no longer the old one")
                .hasSize(1);
        session.close(() -> ended.add(Saving.DONE));
        assertThat(ended).hasSize(1);
        try (Stream<Path> all = Files.list(root)) {
            assertThat(all).as("a clean end leaves nothing").isEmpty();
        }
    }

    @Test
    void aProgramKilledAtAnyMomentHasEveryEditThatWasMade() throws Exception {
        for (int kill = 1; kill <= 4; kill++) {
            Path folder = root.resolve("kill " + kill);
            int made = 37 * kill;
            try (Child child = Child.start(Crash.class, folder.toString(), "1000000")) {
                for (int n = 1; n <= made; n++) {
                    assertThat(child.line()).isEqualTo(Integer.toString(n));
                }
                child.kill();
                for (String more = child.line(); more != null && !more.isEmpty(); more = child.line()) {
                    made = Integer.parseInt(more);
                }
            }
            UnsavedWork work = only(folder);
            byte[] found = DesignWriter.bytes(work.entry().design());
            // The edit after the last one told may have been kept before the program could tell of it.
            assertThat(found).isIn(Crash.after(made), Crash.after(made + 1));
            work.close();
        }
    }

    @Test
    void theJournalFollowsTheWork() throws Exception {
        Path file = Files.copy(Path.of("samples/z-fold-rod.json"), root.resolve("mine.json"));
        Path folder = root.resolve("state");
        Session session = session(folder);
        session.open(file);
        assertThat(files(folder)).as("nothing is unsaved").isEmpty();
        session.preview(Edits.set("Fold 1", Field.ROC, 0.11));
        assertThat(files(folder)).as("a preview is not work").isEmpty();
        session.commit();
        assertThat(files(folder)).hasSize(1);
        session.undo();
        assertThat(files(folder)).isEmpty();
        session.redo();
        assertThat(files(folder)).hasSize(1);
        session.save(ended::add);
        assertThat(files(folder)).isEmpty();
        session.undo();
        assertThat(files(folder)).hasSize(1);
        session.openSample("x-fold.json");
        assertThat(files(folder)).as("given up").isEmpty();
        session.create(design(session));
        assertThat(files(folder)).as("a new design is in no file yet").hasSize(1);
        session.close(() -> {});
        assertThat(files(folder)).isEmpty();
    }

    @Test
    void aRecoveredDocumentKnowsItsFile() throws Exception {
        Path file = Files.copy(Path.of("samples/z-fold-rod.json"), root.resolve("mine.json"));
        Path folder = root.resolve("state");
        Session session = session(folder);
        session.open(file);
        session.edit(Edits.set("Fold 1", Field.ROC, 0.11));
        crash(folder);
        Session next = session(folder);
        next.recover(only(folder));
        assertThat(next.shown().source()).contains(Source.of(file));
        assertThat(design(next)).isEqualTo(design(session));
        next.look();
        assertThat(next.shown().isChangedOnDisk()).isFalse();
        next.save(ended::add);
        assertThat(ended).containsExactly(Saving.DONE);
        assertThat(file).hasBinaryContent(DesignWriter.bytes(design(session)));

        next.edit(Edits.set("Fold 1", Field.ROC, 0.12));
        crash(folder);
        Files.writeString(file, "another program's");
        Session third = session(folder);
        third.recover(only(folder));
        third.save(ended::add);
        assertThat(ended).endsWith(Saving.CHANGED_ON_DISK);
        assertThat(file).hasContent("another program's");
    }

    @Test
    void whatCannotBeKeptAgainStaysWhereItWas() throws Exception {
        Path folder = root.resolve("state");
        Session session = session(folder);
        session.create(Samples.design("x-fold"));
        crash(folder);
        Path blocked = Files.writeString(root.resolve("blocked"), "a file where a folder should be");
        List<Shown> heard = new ArrayList<>();
        Session next = new Session(Runner.onTheSpot(), new Journal(blocked), Runner.onTheSpot(), heard::add);
        next.recover(only(folder));
        assertThat(next.shown().trouble())
                .contains("Unsaved work is not kept for after a crash: there is a file in the way: " + blocked
                        + ". Work can go on; save often.");
        assertThat(files(folder)).hasSize(1);
        next.dismiss();
        next.edit(Edits.move(design(next).mirrors().get(0).name(), 1e-6, 0));
        assertThat(next.shown().trouble()).as("said once").isEmpty();
        assertThat(next.shown().undo()).as("work goes on").isPresent();
        next.close(() -> {});
        only(folder).close();
    }

    @Test
    void ofManyEditsWhileTheJournalIsBusyTheNewestIsKept() throws Exception {
        Later later = new Later();
        Session session = new Session(Runner.onTheSpot(), new Journal(root), later, s -> {});
        session.openSample("z-fold-rod.json");
        later.runAll();
        for (int n = 1; n <= 50; n++) {
            session.edit(Crash.edit(n));
            assertThat(later.count()).isEqualTo(1);
        }
        later.runAll();
        crash(root);
        UnsavedWork work = only(root);
        assertThat(DesignWriter.bytes(work.entry().design())).isEqualTo(Crash.after(50));
        work.discard();
        session.save(ended::add);
        session.close(() -> {});
        later.runAll();
    }
}
