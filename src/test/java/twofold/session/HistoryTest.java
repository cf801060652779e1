package twofold.session;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import twofold.Samples;
import twofold.design.Design;
import twofold.design.Field;
import twofold.edit.Edit;
import twofold.layout.Layout;

class HistoryTest {
    private final Design first = Samples.design("z-fold-rod");
    private final History history = History.ofSaved(first);

    private Design make(Edit edit) {
        Design next = edit.on(Layout.of(history.now()).value().orElseThrow())
                .value()
                .orElseThrow()
                .design();
        history.record(edit, next);
        return next;
    }

    @Test
    void stepsAreNamedAndTakenBackAndDoneAgain() {
        Design one = make(Edits.set("Fold 1", Field.ROC, 0.2));
        Design two = make(Edits.move("Fold 2", 0.001, 0));
        assertThat(history.undoName()).contains("move Fold 2");
        assertThat(history.redoName()).isEmpty();
        assertThat(history.undo()).isTrue();
        assertThat(history.now()).isEqualTo(one);
        assertThat(history.undoName()).contains("set roc_mm of Fold 1");
        assertThat(history.redoName()).contains("move Fold 2");
        assertThat(history.undo()).isTrue();
        assertThat(history.now()).isEqualTo(first);
        assertThat(history.undo()).isFalse();
        assertThat(history.undoName()).isEmpty();
        assertThat(history.redo()).isTrue();
        assertThat(history.redo()).isTrue();
        assertThat(history.redo()).isFalse();
        assertThat(history.now()).isEqualTo(two);
    }

    @Test
    void whatChangesNothingIsNoStep() {
        make(Edits.set("Fold 1", Field.ROC, 0.1));
        assertThat(history.undoName()).isEmpty();
        assertThat(history.isUnsaved()).isFalse();
    }

    @Test
    void whatWasUndoneIsDroppedByANewStep() {
        make(Edits.set("Fold 1", Field.ROC, 0.2));
        history.undo();
        Design other = make(Edits.set("Fold 1", Field.ROC, 0.3));
        assertThat(history.redoName()).isEmpty();
        assertThat(history.now()).isEqualTo(other);
        history.undo();
        assertThat(history.now()).isEqualTo(first);
    }

    @Test
    void aRunIsOneStepUntilSomethingElseHappens() {
        for (Runnable interruption : List.<Runnable>of(
                history::breakRun,
                () -> history.saved(history.now()),
                () -> make(Edits.set("Fold 2", Field.DIAMETER, 0.0125)),
                () -> make(Edits.nudge("Fold 2", 1e-4, 0)),
                () -> {
                    history.undo();
                    history.redo();
                })) {
            Design start = history.now();
            make(Edits.nudge("Fold 1", 1e-4, 0));
            make(Edits.nudge("Fold 1", 1e-4, 0));
            Design run = make(Edits.nudge("Fold 1", 0, 1e-4));
            interruption.run();
            Design broken = history.now();
            make(Edits.nudge("Fold 1", 1e-4, 0));
            make(Edits.nudge("Fold 1", 1e-4, 0));
            history.undo();
            assertThat(history.now()).as("the second run is a step of its own").isEqualTo(broken);
            if (!broken.equals(run)) {
                history.undo();
                assertThat(history.now()).isEqualTo(run);
            }
            history.undo();
            assertThat(history.now()).as("three nudges are one step").isEqualTo(start);
        }
    }

    @Test
    void anEditThatDoesNotJoinIsAStepOfItsOwn() {
        Design one = make(Edits.nudge("Fold 1", 1e-4, 0));
        make(Edits.move("Fold 1", 1e-4, 0));
        history.undo();
        assertThat(history.now()).isEqualTo(one);
        make(Edits.move("Fold 1", 1e-4, 0));
        Design two = history.now();
        make(Edits.nudge("Fold 1", 1e-4, 0));
        history.undo();
        assertThat(history.now()).isEqualTo(two);
    }

    @Test
    void aRunThatComesBackToWhereItBeganIsNoStep() {
        double dx = 0x1p-10;
        make(Edits.nudge("End A", dx, 0));
        make(Edits.nudge("End A", -dx, 0));
        assertThat(history.now()).isEqualTo(first);
        assertThat(history.undoName()).isEmpty();
        assertThat(history.isUnsaved()).isFalse();
        make(Edits.nudge("End A", dx, 0));
        assertThat(history.undoName()).isPresent();
    }

    @Test
    void unsavedIsExact() {
        assertThat(history.isUnsaved()).isFalse();
        Design one = make(Edits.set("Fold 1", Field.ROC, 0.2));
        assertThat(history.isUnsaved()).isTrue();
        make(Edits.set("Fold 1", Field.ROC, 0.1));
        assertThat(history.isUnsaved()).as("typed back").isFalse();
        history.undo();
        assertThat(history.isUnsaved()).isTrue();
        history.saved(one);
        assertThat(history.isUnsaved()).isFalse();
        history.undo();
        assertThat(history.isUnsaved()).as("the file holds the step undone").isTrue();
        history.redo();
        assertThat(history.isUnsaved()).isFalse();
        assertThat(History.ofUnsaved(first).isUnsaved()).as("in no file yet").isTrue();
    }

    @Test
    void stepsShareWhatTheyHaveInCommon() {
        make(Edits.set("Fold 1", Field.ROC, 0.2));
        // Made anew, every object of it.
        Design copy = Samples.design("z-fold-rod");
        history.record(Edit.of("again", now -> twofold.layout.Outcome.of(copy)), copy);
        Design now = history.now();
        history.undo();
        Design before = history.now();
        assertThat(now.parts().get(0)).isSameAs(before.parts().get(0));
        assertThat(now.parts().get(1)).isNotEqualTo(before.parts().get(1));
        assertThat(now.holds()).isSameAs(before.holds());
        assertThat(now.notes()).isSameAs(before.notes());
        assertThat(now.requirements()).isSameAs(before.requirements());
    }
}
