package twofold.session;

import java.util.HashSet;
import java.util.Set;
import twofold.cavity.Cavity;
import twofold.design.Design;
import twofold.edit.Edit;
import twofold.file.Fingerprint;
import twofold.layout.Laid;
import twofold.layout.Layout;

/** The open document: where it lies, what it has been, and its design solved. */
final class Document {
    private final int number;
    private final History history;
    private final Set<Fingerprint> known = new HashSet<>();
    private Source source;
    private Cavity cavity;

    Document(int number, Source source, History history, Cavity cavity) {
        this.number = number;
        this.source = source;
        this.history = history;
        this.cavity = cavity;
    }

    int number() {
        return number;
    }

    Source source() {
        return source;
    }

    History history() {
        return history;
    }

    Design design() {
        return cavity.laid().design();
    }

    Cavity cavity() {
        return cavity;
    }

    /** What the file may hold without another program having changed it. */
    Set<Fingerprint> known() {
        return Set.copyOf(known);
    }

    /** Says what the file holds. */
    void holds(Fingerprint bytes) {
        known.clear();
        known.add(bytes);
    }

    /** Says what the file may hold too, since writing it failed. */
    void mayHold(Fingerprint bytes) {
        known.add(bytes);
    }

    /** Says in which file the document lies now, with which of its designs. */
    void saved(Source in, Design design, Fingerprint bytes) {
        source = in;
        history.saved(design);
        holds(bytes);
    }

    /** Becomes what an edit made of it. */
    void become(Edit edit, Cavity next) {
        if (history.record(edit, next.laid().design())) {
            cavity = next;
        }
    }

    /** Puts the same answer, judged, in the place of one that is still the document's. */
    void judged(Cavity open, Cavity judged) {
        if (cavity.equals(open)) {
            cavity = judged;
        }
    }

    boolean undo() {
        return history.undo() && solveAgain();
    }

    boolean redo() {
        return history.redo() && solveAgain();
    }

    private boolean solveAgain() {
        cavity = Cavity.solve(lay(history.now()));
        return true;
    }

    /** A design without problems on the table. */
    static Laid lay(Design design) {
        return Layout.of(design)
                .value()
                .orElseThrow(() -> new IllegalStateException("a design without problems lies on the table"));
    }
}
