package twofold.session;

import java.util.HashSet;
import java.util.Optional;
import java.util.Set;
import java.util.function.Predicate;
import twofold.cavity.Cavity;
import twofold.design.Design;
import twofold.design.Kind;
import twofold.edit.Edit;
import twofold.file.Fingerprint;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.layout.Outcome;

/**
 * The open document: where it lies, what it has been, its design solved, a preview of an edit, and what is selected of
 * what is seen.
 */
final class Document {
    private final int number;
    private final History history;
    private final Set<Fingerprint> known = new HashSet<>();
    private Source source;
    private Cavity cavity;
    private Optional<Preview> preview = Optional.empty();
    private Selection selection;

    /** What is shown of an edit before it is made; and the selection to return to, unless the person selects meanwhile. */
    private record Preview(Edit edit, Cavity cavity, Optional<Selection> home) {}

    /**
     * A document as it begins.
     *
     * @param cavity of the design that the history begins with
     */
    Document(int number, Source source, History history, Cavity cavity) {
        this.number = number;
        this.source = source;
        this.history = history;
        this.cavity = cavity;
        this.selection = firstCrystal();
    }

    /** A design without problems on the table. */
    static Laid lay(Design design) {
        return Layout.of(design)
                .value()
                .orElseThrow(() -> new IllegalStateException("a design without problems lies on the table"));
    }

    /** What a person asks about first. */
    private Selection firstCrystal() {
        for (int i = 0; i < seen().parts().size(); i++) {
            if (seen().parts().get(i).kind() == Kind.CRYSTAL) {
                return Selection.of(i);
            }
        }
        return Selection.NONE;
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

    /** What is to be seen: the preview, else the design, solved. */
    Cavity cavity() {
        return preview.map(Preview::cavity).orElse(cavity);
    }

    /** The design on the table as it is without a preview. */
    Laid laid() {
        return cavity.laid();
    }

    private Design seen() {
        return cavity().laid().design();
    }

    boolean isPreview() {
        return preview.isPresent();
    }

    /** The step that undo takes back: where a preview is shown, that. */
    Optional<String> undoName() {
        return preview.isPresent() ? preview.map(p -> p.edit().name()) : history.undoName();
    }

    /** The step that redo does again: none where a preview is shown. */
    Optional<String> redoName() {
        return preview.isPresent() ? Optional.empty() : history.redoName();
    }

    // Editing

    /** What an edit of the design as it is without previews would lead to. */
    Outcome<Laid> would(Edit edit) {
        return edit.on(laid());
    }

    Outcome<Laid> edit(Edit edit) {
        commit();
        Outcome<Laid> outcome = would(edit);
        outcome.value().ifPresent(laid -> become(edit, Cavity.solve(laid)));
        return outcome;
    }

    /** Becomes what an edit made of it. */
    void become(Edit edit, Cavity next) {
        Design before = seen();
        preview = Optional.empty();
        if (history.record(edit, next.laid().design())) {
            cavity = next;
        }
        selection = selection.after(before, seen());
    }

    Outcome<Laid> preview(Edit edit) {
        Outcome<Laid> outcome = would(edit);
        outcome.value().ifPresent(laid -> {
            Design before = seen();
            Optional<Selection> home = preview.isPresent() ? preview.get().home() : Optional.of(selection);
            preview = Optional.of(new Preview(edit, Cavity.solve(laid), home));
            selection = selection.after(before, seen());
        });
        return outcome;
    }

    /** Makes the preview a step; false where there is none. */
    boolean commit() {
        boolean isCommitted = preview.isPresent();
        preview.ifPresent(p -> become(p.edit(), p.cavity()));
        return isCommitted;
    }

    /** Returns from the preview; false where there is none. */
    boolean abandon() {
        if (preview.isEmpty()) {
            return false;
        }
        Design before = seen();
        Optional<Selection> home = preview.get().home();
        preview = Optional.empty();
        selection = home.orElseGet(() -> selection.after(before, seen()));
        return true;
    }

    /** Takes back the preview, else the last step; false where there is neither. */
    boolean undo() {
        return abandon() || move(History::undo);
    }

    /** Does the step again that was undone last; false where there is none or a preview is shown. */
    boolean redo() {
        return preview.isEmpty() && move(History::redo);
    }

    private boolean move(Predicate<History> by) {
        Design before = seen();
        if (!by.test(history)) {
            return false;
        }
        cavity = Cavity.solve(lay(history.now()));
        selection = selection.after(before, seen());
        return true;
    }

    /** Puts the same answer, judged, in the place of one that is still to be seen or the design's. */
    void judged(Cavity open, Cavity judged) {
        preview = preview.map(p -> p.cavity().equals(open) ? new Preview(p.edit(), judged, p.home()) : p);
        if (cavity.equals(open)) {
            cavity = judged;
        }
    }

    // Selecting

    Selection selection() {
        return selection;
    }

    /** Selects, which ends a run of edits. */
    void select(Selection next) {
        if (!next.equals(selection)) {
            selection = next;
            history.breakRun();
            preview = preview.map(p -> new Preview(p.edit(), p.cavity(), Optional.empty()));
        }
    }

    // The file

    /** What the file may hold without another program having changed it. */
    Set<Fingerprint> known() {
        return Set.copyOf(known);
    }

    /** Says what the file may hold too, since writing it failed or is not known to have ended. */
    void mayHold(Fingerprint bytes) {
        known.add(bytes);
    }

    /** Says in which file the document lies now, with which of its designs. */
    void saved(Source in, Design design, Fingerprint bytes) {
        source = in;
        history.saved(design);
        known.clear();
        known.add(bytes);
    }
}
