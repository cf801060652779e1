package twofold.session;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import java.util.function.Function;
import java.util.function.Predicate;
import java.util.function.UnaryOperator;
import twofold.cavity.Cavity;
import twofold.design.Design;
import twofold.design.Part;
import twofold.design.Problem;
import twofold.design.Subject;
import twofold.edit.Edit;
import twofold.file.DesignReader;
import twofold.file.Fingerprint;
import twofold.file.Journal;
import twofold.file.JournalEntry;
import twofold.file.Located;
import twofold.file.SafeFile;
import twofold.file.UnsavedWork;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.layout.Outcome;

/**
 * One open document: opened or made, edited with undo and redo, saved. Confined to the thread that made it; the listener
 * hears of every change there, of each once.
 *
 * <p>An edit or a preview is solved before the call returns; requirements over a lever's range are judged afterwards, the
 * newest design's alone. Nothing here asks: whoever opens or makes another document has asked what shall become of
 * unsaved work ({@link Shown#isUnsaved}).
 */
public final class Session {
    private final Runner runner;
    private final Consumer<Shown> listener;
    private final Newest<Cavity, Cavity> judge;
    private final Saver saver;
    private final Optional<Keeper> keeper;
    private Shown shown = Shown.NOTHING;
    private Optional<Document> document = Optional.empty();
    private Optional<Double> pointed = Optional.empty();
    private List<Problem> obstacles = List.of();
    private Optional<Refused> refused = Optional.empty();
    private Set<Fingerprint> refusedBytes = Set.of();
    private boolean isChangedOnDisk;
    private Optional<String> trouble = Optional.empty();
    private int documents;
    private int newest;

    /**
     * Makes a session with nothing open and no journal.
     *
     * @param runner for reading, writing and judging
     * @param listener told of every change
     */
    public Session(Runner runner, Consumer<Shown> listener) {
        this(runner, Optional.empty(), runner, listener);
    }

    /**
     * Makes a session with nothing open that keeps a journal of unsaved work.
     *
     * @param runner for reading, writing and judging
     * @param journal empty, and this session's alone
     * @param scribe for the journal, on another thread than the runner's, so that no other work keeps it waiting
     * @param listener told of every change
     */
    public Session(Runner runner, Journal journal, Runner scribe, Consumer<Shown> listener) {
        this(runner, Optional.of(journal), scribe, listener);
    }

    private Session(Runner runner, Optional<Journal> journal, Runner scribe, Consumer<Shown> listener) {
        this.runner = runner;
        this.listener = listener;
        this.judge = new Newest<>(runner, Opened::judged, this::judged);
        this.saver = new Saver(runner);
        this.keeper = journal.map(j -> new Keeper(scribe, j, this::say));
    }

    /** What is shown now. */
    public Shown shown() {
        return shown;
    }

    private void show() {
        Shown next = new Shown(
                document.map(Document::number).orElse(0),
                document.map(Document::source),
                document.map(Document::cavity),
                document.map(Document::selection).orElse(Selection.NONE),
                pointed,
                document.flatMap(Document::undoName),
                document.flatMap(Document::redoName),
                document.map(d -> d.history().isUnsaved()).orElse(false),
                document.map(Document::isPreview).orElse(false),
                obstacles,
                refused,
                isChangedOnDisk,
                trouble);
        if (!next.equals(shown)) {
            shown = next;
            listener.accept(next);
        }
    }

    private Optional<Design> design() {
        return document.map(d -> d.cavity().laid().design());
    }

    static String words(Exception why) {
        String message = why.getMessage();
        return message == null ? why.getClass().getSimpleName() : message;
    }

    // Opening

    /**
     * Opens a file. Where it is bad, the open document stays as it is, and the file's problems are shown beside it. The
     * document's own file, opened again, is one step of its history.
     */
    public void open(Path file) {
        open(Source.of(file));
    }

    /** Opens a sample carried in the program; it can be saved in another file only. */
    public void openSample(String name) {
        open(Source.sample(name));
    }

    /** Opens; a newer request makes an older one's answer void. */
    private void open(Source source) {
        int mine = ++newest;
        Optional<Design> asked = document.map(d -> d.history().now());
        runner.run(() -> Opened.of(source), ended -> {
            if (mine == newest) {
                opened(source, ended, asked.equals(document.map(d -> d.history().now())));
                settle();
            }
        });
    }

    private void opened(Source source, Runner.Ended<Opened> ended, boolean isUntouched) {
        isChangedOnDisk = false;
        if (ended instanceof Runner.Ended.Failed<Opened> failed) {
            refuse(source, List.of(), Optional.of(words(failed.why())), Set.of());
        } else if (ended instanceof Runner.Ended.Done<Opened> done) {
            Opened opened = done.value();
            boolean isOwn = document.map(Document::source).equals(Optional.of(source));
            if (opened.cavity().isEmpty()) {
                refuse(source, opened.read().problems(), Optional.empty(), Set.of(opened.print()));
            } else if (isOwn) {
                again(document.orElseThrow(), opened);
            } else if (isUntouched) {
                Cavity cavity = opened.cavity().get();
                Design read = cavity.laid().design();
                Document next = begin(source, History.ofSaved(read), cavity);
                next.saved(source, read, opened.print());
            } else {
                String why = "the open design was edited meanwhile; open the file again";
                refuse(source, List.of(), Optional.of(why), Set.of(opened.print()));
            }
        }
    }

    private void refuse(Source source, List<Located> wrong, Optional<String> why, Set<Fingerprint> bytes) {
        refused = Optional.of(new Refused(source, wrong, why));
        refusedBytes = bytes;
    }

    /** Takes over what the document's own file holds. */
    private void again(Document mine, Opened opened) {
        Cavity cavity = opened.cavity().orElseThrow();
        Design read = cavity.laid().design();
        mine.become(Edit.of("reload " + mine.source().name(), now -> Outcome.of(read)), cavity);
        mine.saved(mine.source(), read, opened.print());
        refused = Optional.empty();
        trouble = Optional.empty();
    }

    /**
     * Begins a new document, which is in no file yet.
     *
     * @return the design on the table, or its problems: then nothing changes
     */
    public Outcome<Laid> create(Design design) {
        Outcome<Laid> laid = Layout.of(design);
        if (laid.value().isPresent()) {
            newest++;
            isChangedOnDisk = false;
            begin(
                    Source.UNTITLED,
                    History.ofUnsaved(design),
                    Cavity.solve(laid.value().get()));
        } else {
            obstacles = laid.problems();
        }
        settle();
        return laid;
    }

    private Document begin(Source source, History history, Cavity cavity) {
        Document next = new Document(++documents, source, history, cavity);
        document = Optional.of(next);
        pointed = Optional.empty();
        obstacles = List.of();
        refused = Optional.empty();
        trouble = Optional.empty();
        return next;
    }

    /** Reads again what was last asked for. */
    public void reload() {
        shown.attended().filter(s -> !s.equals(Source.UNTITLED)).ifPresent(this::open);
    }

    /** Compares the file on disk with what was read or saved; a change is shown, not acted on. */
    public void look() {
        Optional<Path> file = shown.attended().flatMap(Source::file);
        if (file.isEmpty()) {
            return;
        }
        int mine = newest;
        Optional<Document> whose = document;
        Set<Fingerprint> known = known();
        runner.run(
                () -> Files.isReadable(file.get())
                        && !known.contains(Fingerprint.of(SafeFile.read(file.get(), DesignReader.MOST_BYTES + 1))),
                ended -> {
                    boolean isCurrent = mine == newest && whose.equals(document) && known.equals(known());
                    if (isCurrent && ended instanceof Runner.Ended.Done<Boolean> done) {
                        isChangedOnDisk = done.value();
                        show();
                    }
                });
    }

    private Set<Fingerprint> known() {
        return refused.isPresent()
                ? refusedBytes
                : document.map(Document::known).orElse(Set.of());
    }

    /** Takes away what was said of a refused file, a refused edit and of saving. */
    public void dismiss() {
        refused = Optional.empty();
        refusedBytes = Set.of();
        obstacles = List.of();
        trouble = Optional.empty();
        show();
    }

    // Editing

    /** What an edit would lead to, without making it. */
    public Outcome<Laid> would(Edit edit) {
        return ask(d -> d.would(edit));
    }

    private Outcome<Laid> ask(Function<Document, Outcome<Laid>> what) {
        return document.map(what)
                .orElseGet(() ->
                        Outcome.failed(List.of(new Problem(Subject.DOCUMENT, "nothing is open", "an open design"))));
    }

    /** The design on the table as it is without a preview. */
    public Optional<Laid> laid() {
        return document.map(Document::laid);
    }

    /**
     * Makes an edit, after a preview that is shown was made one.
     *
     * @return what it led to, or why it was refused: then nothing changes
     */
    public Outcome<Laid> edit(Edit edit) {
        return attempt(d -> d.edit(edit));
    }

    /** Makes an edit that takes long to work out, which the runner does; given up where the design has changed meanwhile. */
    public void editLater(Edit edit) {
        laid().ifPresent(now -> runner.run(() -> edit.on(now), ended -> {
            if (ended instanceof Runner.Ended.Failed<Outcome<Laid>> failed) {
                throw new IllegalStateException("an edit failed: " + edit.name(), failed.why());
            } else if (ended instanceof Runner.Ended.Done<Outcome<Laid>> done && laid().equals(Optional.of(now))) {
                Outcome<Laid> found = done.value();
                edit(new Edit(edit.name(), edit.joins(), laid -> found.then(l -> Outcome.of(l.design()))));
            }
        }));
    }

    /**
     * Shows what an edit would lead to, as during a drag: always of the design as it is without previews, each in place of
     * the one before, in no history until {@link #commit}. Where it is refused, what was shown stays.
     */
    public Outcome<Laid> preview(Edit edit) {
        return attempt(d -> d.preview(edit));
    }

    private Outcome<Laid> attempt(Function<Document, Outcome<Laid>> what) {
        Outcome<Laid> outcome = ask(what);
        obstacles = outcome.problems();
        settle();
        return outcome;
    }

    /** Makes what the preview shows one step of the history; does nothing without a preview. */
    public void commit() {
        move(Document::commit);
    }

    /** Returns from a preview to the design as it is. */
    public void abandon() {
        move(Document::abandon);
    }

    /** Takes the last step back; where a preview is shown, that alone. */
    public void undo() {
        move(Document::undo);
    }

    /** Does the step again that was undone last; nothing where a preview is shown. */
    public void redo() {
        move(Document::redo);
    }

    private void move(Predicate<Document> by) {
        if (document.filter(by).isPresent()) {
            obstacles = List.of();
            settle();
        }
    }

    /** Has the journal kept, has judged what is still open, and shows the state. */
    private void settle() {
        keeper.ifPresent(k -> k.keep(document));
        document.map(Document::cavity).filter(Shown::isPending).ifPresent(judge::ask);
        show();
    }

    private void judged(Cavity asked, Runner.Ended<Cavity> ended) {
        if (ended instanceof Runner.Ended.Failed<Cavity> failed) {
            throw new IllegalStateException("requirements over a lever cannot be judged", failed.why());
        } else if (ended instanceof Runner.Ended.Done<Cavity> done) {
            document.ifPresent(d -> d.judged(asked, done.value()));
            show();
        }
    }

    // Saving

    /**
     * Saves the design, a preview made a step first, in its file, if no other program changed that.
     *
     * @param then told how it ended, after the listener
     */
    public void save(Consumer<Saving> then) {
        saveOwn(true, then);
    }

    /** Saves the design in its file, whatever that holds. */
    public void saveOver(Consumer<Saving> then) {
        saveOwn(false, then);
    }

    private void saveOwn(boolean isStrict, Consumer<Saving> then) {
        Optional<Path> file = document.map(Document::source).flatMap(Source::file);
        if (file.isPresent()) {
            save(file.get(), isStrict, then);
        } else {
            then.accept(Saving.NEEDS_NAME);
        }
    }

    /** Saves the design in a file, whatever that holds, which is the document's from then on. */
    public void saveAs(Path file, Consumer<Saving> then) {
        save(file, false, then);
    }

    private void save(Path file, boolean isStrict, Consumer<Saving> then) {
        commit();
        Document mine = document.orElseThrow(() -> new IllegalStateException("nothing is open"));
        mine.history().breakRun();
        saver.save(mine, file, () -> isStrict ? Optional.of(mine.known()) : Optional.empty(), end -> {
            if (document.equals(Optional.of(mine))) {
                if (end.saving() == Saving.DONE) {
                    isChangedOnDisk = false;
                    refused = refused.filter(r -> !r.source().equals(mine.source()));
                } else if (end.saving() == Saving.CHANGED_ON_DISK) {
                    isChangedOnDisk = true;
                }
                trouble = end.why()
                        .map(why -> Source.of(file).name() + " could not be saved: " + why
                                + ". The design is still open here, unsaved.");
                settle();
            }
            then.accept(end.saving());
        });
    }

    // After a crash

    /**
     * Opens work that an earlier run of the program left unsaved, as unsaved as it was. It is deleted where it was left once
     * this session's own journal holds it.
     */
    public void recover(UnsavedWork work) {
        JournalEntry entry = work.entry();
        newest++;
        isChangedOnDisk = false;
        Source source = entry.file().map(Source::of).orElseGet(() -> new Source(entry.name(), Optional.empty()));
        begin(source, History.ofUnsaved(entry.design()), Cavity.solve(Document.lay(entry.design())));
        entry.known().forEach(document.orElseThrow()::mayHold);
        keeper.ifPresent(k -> k.adopt(work));
        settle();
    }

    private void say(String words) {
        trouble = Optional.of(words);
        show();
    }

    /**
     * Ends the session as the person asked: nothing of it will be offered again, saved or not.
     *
     * @param then told once the journal is gone, or cannot be removed
     */
    public void close(Runnable then) {
        newest++;
        keeper.ifPresentOrElse(k -> k.close(then), then);
    }

    // Selecting and pointing

    /** The part that leads the selection. */
    public Optional<Part> selectedPart() {
        return shown.selected().flatMap(i -> design().map(d -> d.parts().get(i)));
    }

    /** Selects a part alone, or none. */
    public void select(Optional<Integer> part) {
        selecting(now -> part.filter(this::isPart).map(Selection::of).orElse(Selection.NONE));
    }

    /** Selects the parts with some names, the last of them as the lead. */
    public void select(List<String> names) {
        selecting(now -> Selection.of(names.stream()
                .flatMap(n -> design().flatMap(d -> d.indexOf(n)).stream())
                .toList()));
    }

    /** Selects a part beside the others, or no longer. */
    public void toggle(int part) {
        selecting(now -> isPart(part) ? now.toggled(part) : now);
    }

    /** Selects everything from the lead to a part. */
    public void selectTo(int part) {
        selecting(now -> isPart(part) ? now.upTo(part) : now);
    }

    /** Selects every part. */
    public void selectAll() {
        selecting(now -> now.everything(parts()));
    }

    /** Selects the part a number of steps along the beam, round the ends. */
    public void step(int by) {
        if (parts() > 0) {
            int from = shown.selected().orElse(by > 0 ? -1 : 0);
            select(Optional.of(Math.floorMod(from + by, parts())));
        }
    }

    private void selecting(UnaryOperator<Selection> change) {
        document.ifPresent(d -> {
            d.select(change.apply(d.selection()));
            show();
        });
    }

    private boolean isPart(int index) {
        return index >= 0 && index < parts();
    }

    private int parts() {
        return design().map(d -> d.parts().size()).orElse(0);
    }

    /** Points at the beam, or no longer. */
    public void point(Optional<Double> at) {
        pointed = at;
        show();
    }
}
