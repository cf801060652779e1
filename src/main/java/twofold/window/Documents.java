package twofold.window;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.function.Consumer;
import twofold.design.Design;
import twofold.file.UnsavedWork;
import twofold.session.Saving;
import twofold.session.Session;
import twofold.session.Shown;
import twofold.session.Source;

/** Opening, saving and leaving documents, with the questions that have to be asked so that no work is lost. */
final class Documents {
    private static final String ENDING = ".json";

    private final Session session;
    private final Asks asks;
    private final Runnable take;

    /**
     * Makes it.
     *
     * @param take applies what is typed and not applied yet, before anything is saved or left
     */
    Documents(Session session, Asks asks, Runnable take) {
        this.session = session;
        this.asks = asks;
        this.take = take;
    }

    /** Does something that leaves the document, after its unsaved work was saved or given up; not, where the person stays. */
    void leave(Runnable then) {
        take.run();
        if (!session.shown().isUnsaved()) {
            then.run();
            return;
        }
        switch (asks.unsaved(name())) {
            case SAVE -> save(done -> then.run());
            case DISCARD -> then.run();
            case STAY -> {}
        }
    }

    /** Asks for a file and opens it. */
    void open() {
        asks.open(folder()).ifPresent(this::open);
    }

    /** Opens a file. */
    void open(Path file) {
        leave(() -> session.open(file));
    }

    /** Opens a sample. */
    void openSample(String name) {
        leave(() -> session.openSample(name));
    }

    /** Opens what an earlier run left unsaved. */
    void recover(UnsavedWork work, Consumer<UnsavedWork> opened) {
        leave(() -> {
            session.recover(work);
            opened.accept(work);
        });
    }

    /** Ends the session as the person asked. */
    void close(Runnable then) {
        leave(() -> session.close(then));
    }

    /** Begins a new design. */
    void create(Design design) {
        leave(() -> session.create(design));
    }

    /** Saves in the document's file. */
    void save() {
        save(done -> {});
    }

    private void save(Consumer<Saving> done) {
        take.run();
        session.save(end -> {
            switch (end) {
                case DONE -> done.accept(end);
                case NEEDS_NAME -> saveAs(done);
                case CHANGED_ON_DISK -> changed(done);
                case FAILED -> {} // the session shows why
            }
        });
    }

    private void changed(Consumer<Saving> done) {
        switch (asks.changed(name())) {
            case WRITE_OVER -> session.saveOver(end -> ended(end, done));
            case ELSEWHERE -> saveAs(done);
            case STAY -> {}
        }
    }

    /** Saves in another file. */
    void saveAs() {
        saveAs(done -> {});
    }

    private void saveAs(Consumer<Saving> done) {
        take.run();
        String name = name();
        asks.save(folder(), name.endsWith(ENDING) ? name : name + ENDING)
                .map(Documents::ending)
                .ifPresent(file -> session.saveAs(file, end -> ended(end, done)));
    }

    private static void ended(Saving end, Consumer<Saving> done) {
        if (end == Saving.DONE) {
            done.accept(end);
        }
    }

    /** A file without an ending gets ours. */
    private static Path ending(Path file) {
        Path name = file.getFileName();
        return name == null || name.toString().contains(".") ? file : file.resolveSibling(name + ENDING);
    }

    private String name() {
        return session.shown().source().map(Source::name).orElse("The design");
    }

    private Optional<Path> folder() {
        Shown shown = session.shown();
        return shown.source()
                .flatMap(Source::file)
                .map(f -> f.toAbsolutePath().getParent())
                .filter(Files::isDirectory);
    }
}
