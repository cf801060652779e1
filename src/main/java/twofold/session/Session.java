package twofold.session;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import twofold.cavity.Cavity;
import twofold.design.Design;
import twofold.design.Kind;
import twofold.design.Part;
import twofold.file.DesignReader;
import twofold.file.ReadDesign;
import twofold.file.SafeFile;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.study.WorstOver;

/**
 * One open document. Confined to the thread that made it; the listener hears of every change there.
 */
public final class Session {
    private final Runner runner;
    private final Consumer<Shown> listener;
    private Shown shown = Shown.NOTHING;
    private byte[] asRead = new byte[0];
    private int newest;

    /**
     * Makes a session with nothing open.
     *
     * @param runner for reading and solving
     * @param listener told of every change
     */
    public Session(Runner runner, Consumer<Shown> listener) {
        this.runner = runner;
        this.listener = listener;
    }

    /** What is shown now. */
    public Shown shown() {
        return shown;
    }

    private void show(Shown next) {
        if (!next.equals(shown)) {
            shown = next;
            listener.accept(next);
        }
    }

    /** What reading a source came to. */
    @SuppressWarnings("ArrayRecordComponent") // compared by nobody
    private record Opened(byte[] bytes, ReadDesign read, Optional<Cavity> cavity) {}

    /** Opens a file; where it is bad, the last good design stays beside its problems. */
    public void open(Path file) {
        open(Source.of(file), () -> SafeFile.read(file, DesignReader.MOST_BYTES));
    }

    /** Opens a sample carried in the program. */
    public void openSample(String name) {
        open(Source.sample(name), () -> Samples.bytes(name));
    }

    /** Where a document's bytes come from. */
    private interface Bytes {
        byte[] read() throws IOException;
    }

    /** Opens; a newer request makes an older one's answer void. */
    private void open(Source source, Bytes bytes) {
        int mine = ++newest;
        runner.run(
                () -> {
                    byte[] all = bytes.read();
                    ReadDesign read = DesignReader.read(all);
                    return new Opened(all, read, read.design().map(Session::solved));
                },
                ended -> {
                    if (mine == newest) {
                        opened(source, ended);
                    }
                });
    }

    private static Cavity solved(Design design) {
        Laid laid = Layout.of(design)
                .value()
                .orElseThrow(() -> new IllegalStateException("a design without problems lies on the table"));
        return Cavity.solve(laid).judgedOver(new WorstOver(laid));
    }

    private void opened(Source source, Runner.Ended<Opened> ended) {
        if (ended instanceof Runner.Ended.Done<Opened> done) {
            Opened opened = done.value();
            asRead = opened.bytes();
            if (opened.cavity().isPresent()) {
                Cavity cavity = opened.cavity().get();
                show(Shown.good(source, cavity, keptSelection(source, cavity)));
            } else {
                show(shown.bad(source, opened.read().problems(), Optional.empty()));
            }
        } else if (ended instanceof Runner.Ended.Failed<Opened> failed) {
            asRead = new byte[0];
            String why = failed.why().getMessage();
            show(shown.bad(
                    source,
                    List.of(),
                    Optional.of(why == null ? failed.why().getClass().getSimpleName() : why)));
        }
    }

    /** The part selected before a reload, by name; else the first crystal, which is what a person asks about. */
    private Optional<Integer> keptSelection(Source source, Cavity cavity) {
        Design design = cavity.laid().design();
        Optional<Integer> kept = shown.source().equals(Optional.of(source))
                ? selectedPart().map(Part::name).flatMap(design::indexOf)
                : Optional.empty();
        return kept.or(() -> first(design, Kind.CRYSTAL));
    }

    private static Optional<Integer> first(Design design, Kind kind) {
        for (int i = 0; i < design.parts().size(); i++) {
            if (design.parts().get(i).kind() == kind) {
                return Optional.of(i);
            }
        }
        return Optional.empty();
    }

    /** The selected part. */
    public Optional<Part> selectedPart() {
        return shown.selected()
                .flatMap(i -> shown.cavity().map(c -> c.laid().design().parts().get(i)));
    }

    /** Reads the file again. */
    public void reload() {
        shown.source().ifPresent(s -> s.file().ifPresentOrElse(this::open, () -> openSample(s.name())));
    }

    /** Compares the file on disk with what was read; a change is shown, not acted on. */
    public void look() {
        Optional<Path> file = shown.source().flatMap(Source::file);
        if (file.isEmpty()) {
            return;
        }
        int mine = newest;
        byte[] known = asRead;
        runner.run(
                () -> Files.isReadable(file.get())
                        && !Arrays.equals(known, SafeFile.read(file.get(), DesignReader.MOST_BYTES)),
                ended -> {
                    if (mine == newest && ended instanceof Runner.Ended.Done<Boolean> done) {
                        show(shown.changedOnDisk(done.value()));
                    }
                });
    }

    /** Selects a part, or none. */
    public void select(Optional<Integer> part) {
        show(shown.select(part.filter(i -> i >= 0 && i < parts())));
    }

    /** Selects the part a number of steps along the beam, round the ends. */
    public void step(int by) {
        if (parts() > 0) {
            int from = shown.selected().orElse(by > 0 ? -1 : 0);
            select(Optional.of(Math.floorMod(from + by, parts())));
        }
    }

    private int parts() {
        return shown.cavity().map(c -> c.laid().design().parts().size()).orElse(0);
    }

    /** Points at the beam, or no longer. */
    public void point(Optional<Double> at) {
        show(shown.point(at));
    }
}
