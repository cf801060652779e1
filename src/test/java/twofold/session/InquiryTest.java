package twofold.session;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.function.Consumer;
import org.junit.jupiter.api.Test;
import twofold.Samples;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.study.Progress;

/** Long questions: the newest alone counts, what is fast follows the design, what is not goes stale. */
class InquiryTest {
    private static final Laid FIRST = laid("z-fold-rod");
    private static final Laid SECOND = laid("x-fold");
    private static final Laid THIRD = laid("gas-tube");

    private static Laid laid(String sample) {
        return Layout.of(Samples.design(sample)).value().orElseThrow();
    }

    /** Runs what was asked for when it is told to. */
    private static final class Later implements Runner {
        private final Deque<Runnable> waiting = new ArrayDeque<>();

        @Override
        public <T> void run(Callable<T> work, Consumer<Ended<T>> then) {
            waiting.add(() -> then.accept(Runner.attempt(work)));
        }

        int count() {
            return waiting.size();
        }

        void one() {
            waiting.remove().run();
        }
    }

    private final Later runner = new Later();
    private final List<String> heard = new ArrayList<>();
    private long now;
    private final Inquiry<String> inquiry = new Inquiry<>(runner, () -> heard.add("changed"), () -> now);

    private static Optional<String> title(Laid laid, Progress progress) {
        return progress.at(0.5) ? Optional.of(laid.design().title()) : Optional.empty();
    }

    private Optional<String> slowTitle(Laid laid, Progress progress) {
        now += Inquiry.FAST + 1;
        return title(laid, progress);
    }

    @Test
    void nothingIsAskedWithoutADesignOrAQuestion() {
        inquiry.ask(InquiryTest::title);
        assertThat(runner.count()).isZero();
        inquiry.clear();
        inquiry.design(FIRST);
        assertThat(runner.count()).isZero();
        assertThat(inquiry.answer()).isEmpty();
        assertThat(inquiry.isStale()).isFalse();
    }

    @Test
    void aQuestionIsAnsweredOfTheDesign() {
        inquiry.design(FIRST);
        inquiry.ask(InquiryTest::title);
        assertThat(inquiry.isRunning()).isTrue();
        heard.clear();
        runner.one();
        assertThat(heard).isNotEmpty();
        assertThat(inquiry.answer()).contains(FIRST.design().title());
        assertThat(inquiry.isRunning()).isFalse();
        assertThat(inquiry.isStale()).isFalse();
    }

    @Test
    void aNewerQuestionCancelsTheOlder() {
        inquiry.design(FIRST);
        inquiry.ask((laid, progress) -> progress.at(0.1) ? Optional.of("older") : Optional.empty());
        inquiry.ask((laid, progress) -> Optional.of("newer"));
        assertThat(runner.count()).isEqualTo(2);
        runner.one();
        assertThat(inquiry.answer()).as("the older was stopped before it began").isEmpty();
        assertThat(inquiry.isRunning()).isTrue();
        runner.one();
        assertThat(inquiry.answer()).contains("newer");
    }

    @Test
    void anAnswerOfTheOlderQuestionThatComesLateIsDropped() {
        inquiry.design(FIRST);
        inquiry.ask((laid, progress) -> {
            // Work that has no time to notice.
            inquiry.ask((l, p) -> Optional.of("newer"));
            return Optional.of("older");
        });
        runner.one();
        assertThat(inquiry.answer()).isEmpty();
        runner.one();
        assertThat(inquiry.answer()).contains("newer");
    }

    @Test
    void whatIsFastIsAskedAgainOfEveryDesign() {
        inquiry.design(FIRST);
        inquiry.ask(InquiryTest::title);
        runner.one();
        inquiry.design(SECOND);
        assertThat(inquiry.isStale()).as("until it is answered").isTrue();
        assertThat(runner.count()).isEqualTo(1);
        inquiry.design(THIRD);
        assertThat(runner.count()).as("a drag does not pile up work").isEqualTo(1);
        runner.one();
        assertThat(runner.count()).as("the newest design is asked next").isEqualTo(1);
        runner.one();
        assertThat(inquiry.answer()).contains(THIRD.design().title());
        assertThat(inquiry.isStale()).isFalse();
        assertThat(runner.count()).isZero();
    }

    @Test
    void whatIsSlowGoesStaleUntilItIsAskedAgain() {
        inquiry.design(FIRST);
        inquiry.ask(this::slowTitle);
        runner.one();
        inquiry.design(SECOND);
        assertThat(runner.count()).isZero();
        assertThat(inquiry.isStale()).isTrue();
        assertThat(inquiry.answer()).contains(FIRST.design().title());
        inquiry.design(FIRST);
        assertThat(inquiry.isStale()).as("back at the design that was asked of").isFalse();
        inquiry.design(SECOND);
        inquiry.again();
        runner.one();
        assertThat(inquiry.answer()).contains(SECOND.design().title());
        assertThat(inquiry.isStale()).isFalse();
    }

    @Test
    void slowWorkOnAnOlderDesignIsStopped() {
        inquiry.design(FIRST);
        inquiry.ask(this::slowTitle);
        runner.one();
        inquiry.again();
        assertThat(inquiry.isRunning()).isTrue();
        inquiry.design(SECOND);
        assertThat(inquiry.isRunning()).isFalse();
        runner.one();
        assertThat(inquiry.answer()).contains(FIRST.design().title());
        assertThat(inquiry.isStale()).isTrue();
    }

    @Test
    void cancelStopsAndKeepsWhatWasAnswered() {
        inquiry.design(FIRST);
        inquiry.ask(InquiryTest::title);
        runner.one();
        inquiry.ask((laid, progress) -> Optional.of("other"));
        inquiry.cancel();
        assertThat(inquiry.isRunning()).isFalse();
        runner.one();
        assertThat(inquiry.answer()).contains(FIRST.design().title());
        assertThat(inquiry.isStale()).as("it answers an older question").isTrue();
        inquiry.again();
        runner.one();
        assertThat(inquiry.answer()).contains("other");
    }

    @Test
    void aFailureIsSaidAndTheNextAnswerClearsIt() {
        inquiry.design(FIRST);
        inquiry.ask((laid, progress) -> {
            throw new IllegalStateException("no light");
        });
        runner.one();
        assertThat(inquiry.failure()).contains("no light");
        inquiry.ask(InquiryTest::title);
        assertThat(inquiry.failure()).isEmpty();
        runner.one();
        assertThat(inquiry.answer()).isPresent();
    }

    @Test
    void howFarItIsCanBeSeenMeanwhile() {
        inquiry.design(FIRST);
        List<Double> shares = new ArrayList<>();
        inquiry.ask((laid, progress) -> {
            progress.at(0.25);
            shares.add(inquiry.share());
            return Optional.of("done");
        });
        runner.one();
        assertThat(shares).containsExactly(0.25);
        assertThat(inquiry.share()).isZero();
    }

    @Test
    void anotherDocumentForgetsEverything() {
        inquiry.design(FIRST);
        inquiry.ask(InquiryTest::title);
        runner.one();
        inquiry.again();
        inquiry.clear();
        assertThat(inquiry.answer()).isEmpty();
        runner.one();
        assertThat(inquiry.answer()).isEmpty();
    }
}
