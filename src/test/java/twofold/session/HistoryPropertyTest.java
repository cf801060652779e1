package twofold.session;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.SplittableRandom;
import java.util.TreeSet;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import twofold.RandomDesigns;
import twofold.Samples;
import twofold.design.Design;
import twofold.edit.Edit;
import twofold.file.DesignReader;
import twofold.file.DesignWriter;
import twofold.file.Fingerprint;
import twofold.layout.Laid;
import twofold.layout.Outcome;

/** Long random histories: whatever was edited, undone and redone, every file comes back byte for byte. */
class HistoryPropertyTest {
    private static final int EDITS = 2000;

    /** A step as this test keeps it: by the name and the fingerprint of the whole file. */
    private record Step(String name, boolean joins, Fingerprint after) {}

    private final Session session = new Session(Runner.onTheSpot(), s -> {});
    private final List<Step> steps = new ArrayList<>();
    private int done;
    private boolean isRunning;
    private Optional<Fingerprint> first = Optional.empty();

    private Fingerprint at(int step) {
        return step == 0 ? first.orElseThrow() : steps.get(step - 1).after();
    }

    private Laid laid() {
        return session.shown().cavity().orElseThrow().laid();
    }

    private Fingerprint file() {
        return Fingerprint.of(DesignWriter.bytes(laid().design()));
    }

    @ParameterizedTest
    @CsvSource({"1, z-fold-rod", "2, bow-tie-doubler", "3, ", "4, v-fold-pumped"})
    void everyFileComesBackByteForByte(long seed, @Nullable String sample) {
        session.create(sample == null ? RandomDesigns.of(3) : Samples.design(sample));
        SplittableRandom random = new SplittableRandom(seed);
        RandomEdits edits = new RandomEdits(seed);
        first = Optional.of(file());
        Set<String> names = new TreeSet<>();
        int made = 0;
        int refused = 0;
        while (made < EDITS) {
            int what = random.nextInt(100);
            if (what < 90) {
                made++;
                Edit edit = edits.next(laid());
                refused += edit(edit) ? 0 : 1;
                names.add(edit.name().split(" ", 2)[0]);
            } else if (what < 94) {
                for (int i = random.nextInt(6); i >= 0; i--) {
                    session.undo();
                    done = Math.max(0, done - 1);
                    assertThat(file()).isEqualTo(at(done));
                }
                isRunning = false;
            } else if (what < 96) {
                for (int i = random.nextInt(6); i >= 0; i--) {
                    session.redo();
                    done = Math.min(steps.size(), done + 1);
                    assertThat(file()).isEqualTo(at(done));
                }
                isRunning = false;
            } else if (what < 98) {
                int before = session.shown().selected().orElse(-1);
                session.step(1);
                isRunning &= before == session.shown().selected().orElse(-1);
            } else {
                preview(edits, random);
            }
            assertThat(session.shown().undo())
                    .isEqualTo(
                            done == 0
                                    ? Optional.empty()
                                    : Optional.of(steps.get(done - 1).name()));
        }
        assertThat(refused).as("refused edits, of %d", EDITS).isLessThan(EDITS * 2 / 3);
        assertThat(names).as("kinds of edits").hasSizeGreaterThanOrEqualTo(6);
        assertThat(steps).hasSizeGreaterThan(100);
        walkBackAndForth();
    }

    /** Makes an edit here and in the session; whether it was not refused. */
    private boolean edit(Edit edit) {
        Fingerprint before = file();
        Outcome<Laid> outcome = session.edit(edit);
        assertThat(outcome.value().isPresent()).isEqualTo(outcome.problems().isEmpty());
        Fingerprint after = file();
        if (outcome.value().isEmpty()) {
            assertThat(after).isEqualTo(before);
        } else {
            record(edit, before, after);
        }
        return outcome.value().isPresent();
    }

    private void record(Edit edit, Fingerprint before, Fingerprint after) {
        if (after.equals(before)) {
            return;
        }
        steps.subList(done, steps.size()).clear();
        boolean joins = isRunning
                && edit.joins()
                && steps.get(done - 1).joins()
                && steps.get(done - 1).name().equals(edit.name());
        if (joins) {
            steps.remove(--done);
        }
        isRunning = !after.equals(at(done));
        if (isRunning) {
            steps.add(new Step(edit.name(), edit.joins(), after));
            done++;
        }
    }

    /** A drag: a few previews, then adopted or abandoned. */
    private void preview(RandomEdits edits, SplittableRandom random) {
        Laid start = laid();
        Fingerprint before = file();
        Optional<Edit> shown = Optional.empty();
        for (int i = random.nextInt(5); i >= 0; i--) {
            Edit edit = edits.next(start);
            if (session.preview(edit).value().isPresent()) {
                shown = Optional.of(edit);
            }
        }
        if (random.nextBoolean()) {
            session.commit();
            Fingerprint after = file();
            shown.ifPresent(e -> record(e, before, after));
        } else {
            session.abandon();
            assertThat(file()).isEqualTo(before);
        }
    }

    private void walkBackAndForth() {
        while (session.shown().redo().isPresent()) {
            session.redo();
            done++;
        }
        assertThat(done).isEqualTo(steps.size());
        List<String> texts = new ArrayList<>();
        for (int i = steps.size(); i > 0; i--) {
            texts.add(0, DesignWriter.text(laid().design()));
            assertThat(file()).isEqualTo(at(i));
            session.undo();
        }
        assertThat(file()).isEqualTo(at(0));
        assertThat(session.shown().undo()).isEmpty();
        for (String text : texts) {
            session.redo();
            Design now = laid().design();
            assertThat(DesignWriter.text(now)).isEqualTo(text);
        }
        assertThat(session.shown().redo()).isEmpty();
        String last = texts.get(texts.size() - 1);
        assertThat(DesignReader.read(last.getBytes(StandardCharsets.UTF_8))
                        .design()
                        .map(DesignWriter::text))
                .as("the file reads back")
                .contains(last);
    }
}
