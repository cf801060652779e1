package twofold.session;

import java.util.List;
import java.util.Optional;
import twofold.cavity.Cavity;
import twofold.cavity.Judgement;
import twofold.design.Problem;
import twofold.file.Located;

/**
 * All that a window shows of a document, at one moment.
 *
 * @param document another number for each document that was opened or made; 0 before the first
 * @param source where the document comes from; empty before anything was opened
 * @param cavity the design, or its preview, solved
 * @param selection the selected parts
 * @param pointed path from the first mirror to the point of the beam under the pointer, m
 * @param undo the step that undo would take back
 * @param redo the step that redo would do again
 * @param isUnsaved whether the design is not the one last saved; a preview does not count
 * @param isPreview whether a preview is shown, which is not part of the design yet
 * @param obstacles why the last edit or preview was refused; empty once another one succeeds
 * @param refused a file that could not be opened, beside the document
 * @param isChangedOnDisk whether the file on disk is no longer what was read or saved: that of {@link #attended}
 * @param trouble what went wrong with saving, in words
 */
public record Shown(
        int document,
        Optional<Source> source,
        Optional<Cavity> cavity,
        Selection selection,
        Optional<Double> pointed,
        Optional<String> undo,
        Optional<String> redo,
        boolean isUnsaved,
        boolean isPreview,
        List<Problem> obstacles,
        Optional<Refused> refused,
        boolean isChangedOnDisk,
        Optional<String> trouble) {
    /** Before anything was opened. */
    static final Shown NOTHING = new Shown(
            0,
            Optional.empty(),
            Optional.empty(),
            Selection.NONE,
            Optional.empty(),
            Optional.empty(),
            Optional.empty(),
            false,
            false,
            List.of(),
            Optional.empty(),
            false,
            Optional.empty());

    /** Copies the list. */
    public Shown {
        obstacles = List.copyOf(obstacles);
    }

    /** Index of the part that leads the selection. */
    public Optional<Integer> selected() {
        return selection.lead();
    }

    /** What is wrong with the file that was last asked for. */
    public List<Located> problems() {
        return refused.map(Refused::problems).orElse(List.of());
    }

    /** Why the file that was last asked for cannot be read at all, in words. */
    public Optional<String> failure() {
        return refused.flatMap(Refused::failure);
    }

    /** What was last asked for, opened or refused: what a reload reads and what is watched for changes. */
    public Optional<Source> attended() {
        return refused.map(Refused::source).or(() -> source);
    }

    /** Whether the document's own file became bad since it was opened: the pictures show what it was before. */
    public boolean isStale() {
        return cavity.isPresent() && refused.map(Refused::source).equals(source);
    }

    /** Whether requirements over a lever's range are still being judged; they stand as open meanwhile. */
    public boolean isPending() {
        return cavity.map(Shown::isPending).orElse(false);
    }

    static boolean isPending(Cavity cavity) {
        return cavity.judgements().stream().anyMatch(j -> j.verdict() == Judgement.Verdict.OPEN);
    }
}
