package twofold.session;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import twofold.design.Design;
import twofold.design.Part;
import twofold.edit.Edit;

/**
 * The designs that a document has been, for undo and redo without limit. A step keeps a name and a design, and of the
 * design only what differs from the step before: never a plan or an answer.
 */
public final class History {
    /** A change that was made, and the design that it led to. */
    private record Step(String name, boolean joins, Design after) {}

    private final Design first;
    private final List<Step> steps = new ArrayList<>();
    /** Each name once, however many steps have it. */
    private final Map<String, String> names = new HashMap<>();

    private int done;
    private boolean isRunning;
    private Optional<Design> saved;

    private History(Design first, Optional<Design> saved) {
        this.first = first;
        this.saved = saved;
    }

    /** Begins with a design that lies in a file. */
    public static History ofSaved(Design design) {
        return new History(design, Optional.of(design));
    }

    /** Begins with a design that is in no file yet. */
    public static History ofUnsaved(Design design) {
        return new History(design, Optional.empty());
    }

    /** The design as it is. */
    public Design now() {
        return at(done);
    }

    private Design at(int step) {
        return step == 0 ? first : steps.get(step - 1).after();
    }

    /** The step that undo takes back. */
    public Optional<String> undoName() {
        return done == 0 ? Optional.empty() : Optional.of(steps.get(done - 1).name());
    }

    /** The step that redo does again. */
    public Optional<String> redoName() {
        return done == steps.size()
                ? Optional.empty()
                : Optional.of(steps.get(done).name());
    }

    /** Whether the design is not the one last saved. */
    public boolean isUnsaved() {
        return !saved.equals(Optional.of(now()));
    }

    /** Says that a design, this or an earlier one, is what the file holds now. */
    public void saved(Design design) {
        saved = Optional.of(design);
        breakRun();
    }

    /** Ends a run of edits that become one step. */
    public void breakRun() {
        isRunning = false;
    }

    /**
     * Records what an edit made of the design. What was undone is dropped; what changes nothing is no step; an edit that
     * joins one of the same name right before it becomes one step with it.
     *
     * @return whether the design changed
     */
    public boolean record(Edit edit, Design next) {
        if (next.equals(now())) {
            return false;
        }
        Design kept = shared(next);
        steps.subList(done, steps.size()).clear();
        boolean joins = isRunning
                && edit.joins()
                && steps.get(done - 1).joins()
                && undoName().equals(Optional.of(edit.name()));
        if (joins) {
            steps.remove(--done);
        }
        // A run that came back to where it began is no step.
        isRunning = !joins || !kept.equals(now());
        if (isRunning) {
            steps.add(new Step(names.computeIfAbsent(edit.name(), n -> n), edit.joins(), kept));
            done++;
        }
        return true;
    }

    /** Takes a step back; false where there is none. */
    public boolean undo() {
        breakRun();
        if (done == 0) {
            return false;
        }
        done--;
        return true;
    }

    /** Does an undone step again; false where there is none. */
    public boolean redo() {
        breakRun();
        if (done == steps.size()) {
            return false;
        }
        done++;
        return true;
    }

    /** An equal design that uses the objects of the present one wherever they are equal, so that steps stay small. */
    private Design shared(Design next) {
        Design now = now();
        List<Part> parts = new ArrayList<>(next.parts());
        parts.replaceAll(p ->
                now.indexOf(p.name()).map(now.parts()::get).filter(p::equals).orElse(p));
        return new Design(
                same(now.title(), next.title()),
                same(now.notes(), next.notes()),
                next.wavelength(),
                next.shape(),
                same(now.parts(), parts),
                same(now.holds(), next.holds()),
                same(now.levers(), next.levers()),
                same(now.requirements(), next.requirements()),
                same(now.tolerances(), next.tolerances()));
    }

    private static <T> T same(T known, T next) {
        return next.equals(known) ? known : next;
    }
}
