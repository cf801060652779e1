package twofold.session;

import java.io.IOException;
import java.time.Instant;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import twofold.design.Design;
import twofold.file.Fingerprint;
import twofold.file.Journal;
import twofold.file.JournalEntry;
import twofold.file.UnsavedWork;

/** Keeps a journal of the unsaved work: when something changed, and the newest alone. Confined to the thread that made it. */
final class Keeper {
    private static final System.Logger LOG = System.getLogger(Keeper.class.getName());

    private final Runner runner;
    private final Journal journal;
    private final Newest<Optional<JournalEntry>, Boolean> writer;
    private final Consumer<String> trouble;
    private Optional<Work> last = Optional.empty();
    private Optional<UnsavedWork> recovered = Optional.empty();
    private boolean isFailing;

    /** What is to be kept. */
    private record Work(Source source, Set<Fingerprint> known, Design design) {}

    /**
     * Makes a keeper.
     *
     * @param runner a thread of its own, so that the work of no other keeps a journal waiting
     * @param trouble is told in words what the journal does not do, once until it does again
     */
    Keeper(Runner runner, Journal journal, Consumer<String> trouble) {
        this.runner = runner;
        this.journal = journal;
        this.trouble = trouble;
        this.writer = new Newest<>(runner, this::write, (entry, ended) -> kept(ended));
    }

    /** Takes work over that was recovered: it is deleted once the journal holds it itself. */
    void adopt(UnsavedWork work) {
        leave();
        recovered = Optional.of(work);
    }

    private void leave() {
        try {
            if (recovered.isPresent()) {
                recovered.get().close();
            }
        } catch (IOException e) {
            // It stays locked until the process ends.
            LOG.log(System.Logger.Level.WARNING, "a journal stays locked", e);
        }
        recovered = Optional.empty();
    }

    private void kept(Runner.Ended<Boolean> ended) {
        if (ended instanceof Runner.Ended.Failed<Boolean> failed) {
            if (!isFailing) {
                isFailing = true;
                trouble.accept("Unsaved work is not kept for after a crash: " + Session.words(failed.why())
                        + ". Work can go on; save often.");
            }
            return;
        }
        isFailing = false;
        try {
            if (recovered.isPresent()) {
                recovered.get().discard();
            }
        } catch (IOException e) {
            trouble.accept("What was recovered will be offered again: " + Session.words(e) + ".");
        }
        recovered = Optional.empty();
    }

    private boolean write(Optional<JournalEntry> entry) throws Exception {
        if (entry.isPresent()) {
            journal.keep(entry.get());
        } else {
            journal.clear();
        }
        return true;
    }

    /** Has the journal hold the unsaved work of a document, or nothing where there is none. */
    void keep(Optional<Document> document) {
        Optional<Work> next = document.filter(d -> d.history().isUnsaved())
                .map(d -> new Work(d.source(), d.known(), d.history().now()));
        if (!next.equals(last)) {
            last = next;
            writer.ask(next.map(w -> new JournalEntry(
                    Instant.now(), w.source().name(), w.source().file(), w.known(), w.design())));
        }
    }

    /** Ends the journal and whatever it holds; what was recovered and is not in it yet stays where it was. */
    void close(Runnable then) {
        leave();
        runner.run(
                () -> {
                    journal.close();
                    return true;
                },
                ended -> {
                    if (ended instanceof Runner.Ended.Failed<Boolean> failed) {
                        LOG.log(System.Logger.Level.WARNING, "the journal stays", failed.why());
                    }
                    then.run();
                });
    }
}
