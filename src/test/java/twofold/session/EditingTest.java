package twofold.session;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import twofold.Samples;
import twofold.cavity.Cavity;
import twofold.cavity.Judgement;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Kind;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Problem;
import twofold.design.Subject;
import twofold.design.Values;
import twofold.edit.Edit;
import twofold.layout.Outcome;
import twofold.study.WorstOver;

/** Edits, previews, undo and the selection in a session. */
class EditingTest {
    private static final String SAMPLE = "z-fold-rod";

    private final List<Shown> heard = new ArrayList<>();
    private final Session session = new Session(Runner.onTheSpot(), heard::add);

    @BeforeEach
    void open() {
        session.openSample(SAMPLE + ".json");
        heard.clear();
    }

    private Shown shown() {
        return session.shown();
    }

    private Design design() {
        return shown().cavity().orElseThrow().laid().design();
    }

    private double radius(String mirror) {
        return design().mirrors().stream()
                .filter(m -> m.name().equals(mirror))
                .findFirst()
                .orElseThrow()
                .radius();
    }

    private List<String> selectedNames() {
        return shown().selection().all().stream()
                .map(i -> design().parts().get(i).name())
                .toList();
    }

    private String lead() {
        return session.selectedPart().map(Part::name).orElse("none");
    }

    private static Part plate(String name) {
        return Kind.APERTURE.part(name, Values.NONE.with(Field.ALONG, new Along(false, 0.1)));
    }

    @Test
    void anEditIsSolvedAndShownInTheSameCallOnce() {
        Outcome<?> outcome = session.edit(Edits.set("Fold 1", Field.ROC, 0.102));
        assertThat(outcome.problems()).isEmpty();
        assertThat(heard).hasSize(1);
        assertThat(radius("Fold 1")).isEqualTo(0.102);
        Cavity alone = Cavity.solve(Document.lay(design()));
        assertThat(shown().cavity().orElseThrow().roundTrip()).isEqualTo(alone.roundTrip());
        assertThat(shown().undo()).contains("set roc_mm of Fold 1");
        assertThat(shown().isUnsaved()).isTrue();
        session.undo();
        assertThat(radius("Fold 1")).isEqualTo(0.1);
        assertThat(shown().redo()).contains("set roc_mm of Fold 1");
        assertThat(shown().isUnsaved()).isFalse();
        session.redo();
        assertThat(radius("Fold 1")).isEqualTo(0.102);
    }

    @Test
    void aRefusedEditChangesNothingAndSaysWhy() {
        Cavity before = shown().cavity().orElseThrow();
        Edit bad = Edits.set("Rod", Field.INSIDE, 5.0);
        assertThat(session.would(bad).problems()).isNotEmpty();
        assertThat(heard).as("asking changes nothing").isEmpty();
        Outcome<?> outcome = session.edit(bad);
        assertThat(outcome.value()).isEmpty();
        assertThat(shown().obstacles()).isEqualTo(outcome.problems()).isNotEmpty();
        assertThat(shown().cavity().orElseThrow()).isSameAs(before);
        assertThat(shown().undo()).isEmpty();
        session.edit(Edits.set("Rod", Field.INSIDE, 0.006));
        assertThat(shown().obstacles()).isEmpty();
        session.edit(bad);
        session.dismiss();
        assertThat(shown().obstacles()).isEmpty();
    }

    @Test
    void withNothingOpenAnEditIsRefused() {
        Session empty = new Session(Runner.onTheSpot(), heard::add);
        assertThat(empty.edit(Edits.delete("Rod")).problems())
                .extracting(Problem::found)
                .containsExactly("nothing is open");
        empty.undo();
        empty.redo();
        empty.abandon();
        empty.commit();
        empty.selectAll();
        empty.toggle(0);
        assertThat(empty.shown().selection()).isEqualTo(Selection.NONE);
    }

    @Test
    void aDragIsOneStepOfTheDesignBeforeIt() {
        Design before = design();
        for (int i = 1; i <= 20; i++) {
            session.preview(Edits.nudge("Fold 2", i * 1e-5, 0));
            assertThat(shown().isPreview()).isTrue();
            assertThat(shown().isUnsaved()).as("a preview is not recorded").isFalse();
            assertThat(shown().undo()).contains("move Fold 2");
        }
        assertThat(heard).hasSize(20);
        session.commit();
        assertThat(shown().isPreview()).isFalse();
        assertThat(((Mirror) design().parts().get(3)).at())
                .as("the last preview, of the design before the drag")
                .isEqualTo(new Point(
                        ((Mirror) before.parts().get(3)).at().x() + 20 * 1e-5,
                        ((Mirror) before.parts().get(3)).at().y()));
        assertThat(shown().isUnsaved()).isTrue();
        session.undo();
        assertThat(design()).isEqualTo(before);
        assertThat(shown().undo()).isEmpty();
    }

    @Test
    void eachPreviewBeginsFromTheDesignBeforeTheDrag() {
        session.preview(Edits.set("Fold 1", Field.ROC, 0.11));
        session.preview(Edits.set("Fold 2", Field.ROC, 0.12));
        assertThat(radius("Fold 1")).isEqualTo(0.1);
        assertThat(radius("Fold 2")).isEqualTo(0.12);
    }

    @Test
    void anAbandonedDragLeavesNoTrace() {
        Shown before = shown();
        session.preview(Edits.nudge("Fold 2", 1e-4, 0));
        session.preview(Edits.set("Rod", Field.INSIDE, 5.0));
        assertThat(shown().obstacles()).isNotEmpty();
        assertThat(shown().isPreview()).as("what was shown stays").isTrue();
        session.abandon();
        assertThat(shown()).isEqualTo(before);
        session.preview(Edits.nudge("Fold 2", 1e-4, 0));
        session.undo();
        assertThat(shown()).as("undo takes back the preview alone").isEqualTo(before);
        session.preview(Edits.nudge("Fold 2", 0, 0));
        session.commit();
        assertThat(shown()).as("what changes nothing is no step").isEqualTo(before);
    }

    @Test
    void anEditDuringAPreviewComesAfterIt() {
        session.preview(Edits.set("Fold 1", Field.ROC, 0.11));
        session.redo();
        assertThat(shown().isPreview()).isTrue();
        session.edit(Edits.set("Fold 2", Field.ROC, 0.12));
        assertThat(shown().isPreview()).isFalse();
        session.undo();
        assertThat(radius("Fold 1")).isEqualTo(0.11);
        session.undo();
        assertThat(radius("Fold 1")).isEqualTo(0.1);
    }

    @Test
    void aDragJoinsNoStepBeforeItUnlessItSaysSo() {
        session.preview(Edits.move("Fold 2", 1e-5, 0));
        session.commit();
        Design one = design();
        session.preview(Edits.move("Fold 2", 1e-5, 0));
        session.commit();
        session.undo();
        assertThat(design()).isEqualTo(one);
    }

    @Test
    void selectingEndsARunOfNudges() {
        session.edit(Edits.nudge("Fold 1", 1e-5, 0));
        Design one = design();
        session.step(1);
        session.edit(Edits.nudge("Fold 1", 1e-5, 0));
        session.undo();
        assertThat(design()).isEqualTo(one);
    }

    @Test
    void severalPartsAreSelectedUnderOneLead() {
        session.select(Optional.of(1));
        session.toggle(3);
        assertThat(selectedNames()).containsExactly("Fold 1", "Fold 2");
        assertThat(lead()).isEqualTo("Fold 2");
        session.toggle(0);
        session.toggle(3);
        assertThat(selectedNames()).containsExactly("End A", "Fold 1");
        assertThat(lead()).isEqualTo("End A");
        session.toggle(0);
        assertThat(lead()).as("another one leads").isEqualTo("Fold 1");
        session.selectTo(4);
        assertThat(shown().selection().all()).containsExactly(1, 2, 3, 4);
        assertThat(lead()).isEqualTo("Fold 1");
        session.selectTo(0);
        assertThat(shown().selection().all()).containsExactly(0, 1);
        session.selectAll();
        assertThat(shown().selection().all()).containsExactly(0, 1, 2, 3, 4);
        assertThat(lead()).isEqualTo("Fold 1");
        session.toggle(99);
        session.selectTo(-1);
        assertThat(shown().selection().all()).hasSize(5);
        session.select(Optional.empty());
        assertThat(shown().selection()).isEqualTo(Selection.NONE);
        session.select(List.of("Rod", "nobody", "End A"));
        assertThat(selectedNames()).containsExactly("End A", "Rod");
        assertThat(lead()).isEqualTo("End A");
    }

    @Test
    void theSelectionFollowsPartsByName() {
        Design bare = Design.of("", 8e-7, design().shape(), design().parts());
        session.create(bare);
        session.select(List.of("Rod", "Fold 2"));
        session.edit(Edits.add(1, plate("Iris")));
        assertThat(selectedNames()).as("what is added is selected").containsExactly("Iris");
        session.select(List.of("Rod", "Fold 2"));
        session.edit(Edits.rename("Fold 2", "Second fold"));
        assertThat(selectedNames()).containsExactly("Rod", "Second fold");
        assertThat(lead()).isEqualTo("Second fold");
        session.edit(Edits.delete("Iris"));
        assertThat(selectedNames()).containsExactly("Rod", "Second fold");
        session.undo();
        assertThat(selectedNames()).as("what undo brings back is selected").containsExactly("Iris");
        session.edit(Edits.delete("Iris"));
        assertThat(lead()).as("its neighbour follows one that is gone").isEqualTo("Fold 1");
    }

    @Test
    void aPreviewOfAnotherPartIsSelectedAndAbandonedReturnsToTheSelectionBefore() {
        session.select(List.of("End A", "Fold 1"));
        session.preview(Edits.add(1, plate("Iris")));
        session.preview(Edits.add(1, plate("Iris")));
        assertThat(lead()).isEqualTo("Iris");
        session.abandon();
        assertThat(selectedNames()).containsExactly("End A", "Fold 1");
        session.preview(Edits.add(1, plate("Iris")));
        session.select(Optional.of(4));
        session.abandon();
        assertThat(lead()).isEqualTo("Fold 2");
    }

    @Test
    void aNewDesignIsUntitledAndUnsaved() {
        int before = shown().document();
        Design design = Samples.design("x-fold");
        assertThat(session.create(design).problems()).isEmpty();
        assertThat(shown().source()).contains(Source.UNTITLED);
        assertThat(shown().document()).isNotEqualTo(before);
        assertThat(shown().isUnsaved()).isTrue();
        assertThat(shown().undo()).isEmpty();
        Shown good = shown();
        Design bad = design.withParts(design.parts().subList(0, 1));
        assertThat(session.create(bad).problems()).isNotEmpty();
        assertThat(shown().obstacles()).isNotEmpty();
        session.dismiss();
        assertThat(shown()).isEqualTo(good);
        session.reload();
        assertThat(shown()).as("there is nothing to read again").isEqualTo(good);
    }

    private static boolean isOpen(Judgement judgement) {
        return judgement.verdict() == Judgement.Verdict.OPEN;
    }

    @Test
    void requirementsOverALeverAreJudgedAfterwardsTheNewestDesignsAlone() {
        Later later = new Later();
        Session slow = new Session(later, heard::add);
        slow.openSample("v-fold-pumped.json");
        later.runAll();
        Design first = slow.shown().cavity().orElseThrow().laid().design();
        String mirror = first.mirrors().get(0).name();
        assertThat(slow.shown().isPending()).isFalse();
        for (int i = 1; i <= 5; i++) {
            slow.preview(Edits.set(mirror, Field.DIAMETER, 0.02 + i * 1e-4));
            assertThat(slow.shown().isPending()).isTrue();
            assertThat(slow.shown().cavity().orElseThrow().judgements()).anyMatch(EditingTest::isOpen);
        }
        slow.commit();
        assertThat(later.count()).as("one is run at a time").isEqualTo(1);
        later.runOne();
        assertThat(slow.shown().isPending())
                .as("the oldest one's answer is void")
                .isTrue();
        later.runAll();
        Cavity judged = slow.shown().cavity().orElseThrow();
        assertThat(slow.shown().isPending()).isFalse();
        assertThat(judged.judgements())
                .isEqualTo(Cavity.solve(judged.laid())
                        .judgedOver(new WorstOver(judged.laid()))
                        .judgements());
        slow.undo();
        assertThat(slow.shown().isPending()).isTrue();
        later.runAll();
        assertThat(slow.shown().isPending()).isFalse();
        assertThat(slow.shown().cavity().orElseThrow().laid().design()).isEqualTo(first);
    }

    @Test
    void aDesignWithoutSuchRequirementsNeedsNoSecondPass() {
        Later later = new Later();
        Session slow = new Session(later, heard::add);
        slow.create(Samples.design(SAMPLE));
        slow.edit(Edits.set("Fold 1", Field.ROC, 0.102));
        assertThat(later.count()).isZero();
        assertThat(slow.shown().isPending()).isFalse();
    }

    @Test
    void aProblemOfAnEditKeepsItsPlace() {
        Problem why = new Problem(Subject.part(2), "found this", "that");
        Outcome<?> outcome = session.edit(Edit.of("try", now -> Outcome.failed(List.of(why))));
        assertThat(outcome.problems()).containsExactly(why);
        assertThat(shown().obstacles()).containsExactly(why);
    }
}
