package twofold.session;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import java.util.function.Supplier;
import twofold.design.Design;
import twofold.file.DesignReader;
import twofold.file.DesignWriter;
import twofold.file.Fingerprint;
import twofold.file.SafeFile;

/** Saves documents, one after another in the order asked for. Confined to the thread that made it. */
final class Saver {
    private final Runner runner;
    private final Deque<Runnable> waiting = new ArrayDeque<>();
    private boolean isSaving;

    Saver(Runner runner) {
        this.runner = runner;
    }

    /** How saving ended, and why it failed. */
    record End(Saving saving, Optional<String> why) {
        static End of(Saving saving) {
            return new End(saving, Optional.empty());
        }
    }

    /**
     * Writes the design that a document has now.
     *
     * @param file where to
     * @param expected says, once it is this one's turn, what the file may hold; empty where it may hold anything
     * @param then is told, after the document was
     */
    void save(Document document, Path file, Supplier<Optional<Set<Fingerprint>>> expected, Consumer<End> then) {
        Design design = document.history().now();
        waiting.add(() -> {
            byte[] bytes = DesignWriter.bytes(design);
            Fingerprint print = Fingerprint.of(bytes);
            Optional<Set<Fingerprint>> known = expected.get();
            runner.run(() -> write(file, known, bytes), ended -> {
                End end;
                if (ended instanceof Runner.Ended.Done<Saving> done) {
                    end = End.of(done.value());
                    if (done.value() == Saving.DONE) {
                        document.saved(Source.of(file), design, print);
                    }
                } else {
                    Exception why = ((Runner.Ended.Failed<Saving>) ended).why();
                    end = new End(Saving.FAILED, Optional.of(Session.words(why)));
                    document.mayHold(print);
                }
                isSaving = false;
                then.accept(end);
                next();
            });
        });
        next();
    }

    private void next() {
        if (!isSaving && !waiting.isEmpty()) {
            isSaving = true;
            waiting.remove().run();
        }
    }

    private static Saving write(Path file, Optional<Set<Fingerprint>> known, byte[] bytes) throws IOException {
        if (known.isPresent()
                && Files.exists(file)
                && !known.get().contains(Fingerprint.of(SafeFile.read(file, DesignReader.MOST_BYTES + 1)))) {
            return Saving.CHANGED_ON_DISK;
        }
        SafeFile.write(file, bytes);
        return Saving.DONE;
    }
}
