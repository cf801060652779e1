package twofold.session;

import java.util.List;
import java.util.Optional;
import twofold.cavity.Cavity;
import twofold.file.Located;

/**
 * All that a window shows of a document, at one moment.
 *
 * @param source where it comes from; empty before anything was opened
 * @param cavity the last good design, solved; stays beside the problems of a file that became bad
 * @param problems what is wrong with the file as it stands
 * @param failure why the file cannot be read at all, in words
 * @param selected index of the selected part
 * @param pointed path from the first mirror to the point of the beam under the pointer, m
 * @param isChangedOnDisk whether the file on disk is no longer what was read
 */
public record Shown(
        Optional<Source> source,
        Optional<Cavity> cavity,
        List<Located> problems,
        Optional<String> failure,
        Optional<Integer> selected,
        Optional<Double> pointed,
        boolean isChangedOnDisk) {
    /** Before anything was opened. */
    static final Shown NOTHING = new Shown(
            Optional.empty(), Optional.empty(), List.of(), Optional.empty(), Optional.empty(), Optional.empty(), false);

    /** Copies the list. */
    public Shown {
        problems = List.copyOf(problems);
    }

    /** Whether the file as it stands is not what the pictures show. */
    public boolean isStale() {
        return cavity.isPresent() && (!problems.isEmpty() || failure.isPresent());
    }

    Shown select(Optional<Integer> part) {
        return new Shown(source, cavity, problems, failure, part, pointed, isChangedOnDisk);
    }

    Shown point(Optional<Double> at) {
        return new Shown(source, cavity, problems, failure, selected, at, isChangedOnDisk);
    }

    Shown changedOnDisk(boolean changed) {
        return new Shown(source, cavity, problems, failure, selected, pointed, changed);
    }

    /** A file that was read without problems. */
    static Shown good(Source source, Cavity cavity, Optional<Integer> selected) {
        return new Shown(
                Optional.of(source),
                Optional.of(cavity),
                List.of(),
                Optional.empty(),
                selected,
                Optional.empty(),
                false);
    }

    /** A file that was not, beside the last good design. */
    Shown bad(Source from, List<Located> wrong, Optional<String> why) {
        return new Shown(Optional.of(from), cavity, wrong, why, selected, Optional.empty(), false);
    }
}
