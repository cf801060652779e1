package twofold.edit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import twofold.Samples;
import twofold.design.Design;
import twofold.design.Hold;
import twofold.design.Mirror;
import twofold.design.Place;
import twofold.design.Turn;
import twofold.file.DesignReader;
import twofold.file.DesignWriter;
import twofold.file.ReadDesign;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.layout.Outcome;

/** What must hold whatever a person does in whatever order. */
class EditPropertyTest {
    private static final int STEPS = 2000;

    static Stream<Path> samples() {
        return Samples.files().stream();
    }

    /**
     * Every design that edits reach lies on the table and is a file that reads back to the same design; refused edits say why
     * and leave everything as it was; every sort of edit is seen to succeed.
     */
    @ParameterizedTest
    @MethodSource("samples")
    void nothingLeavesAnInvalidDesign(Path sample) {
        Laid now = Edited.laid(Samples.design(sample));
        RandomEdits edits = new RandomEdits(sample.getFileName().toString().hashCode(), now);
        List<Design> reached = new ArrayList<>(List.of(now.design()));
        List<String> texts = new ArrayList<>(List.of(DesignWriter.text(now.design())));
        Map<RandomEdits.Sort, Integer> done = new EnumMap<>(RandomEdits.Sort.class);
        for (int step = 0; step < STEPS; step++) {
            RandomEdits.Sort sort = edits.sort();
            Edit edit = edits.of(sort, now);
            Design before = now.design();
            Outcome<Laid> outcome = edit.on(now);
            String what = step + ": " + edit.name();
            assertThat(now.design()).as(what).isSameAs(before);
            if (outcome.value().isEmpty()) {
                assertThat(outcome.problems()).as(what).isNotEmpty().allSatisfy(p -> {
                    assertThat(p.found()).isNotBlank();
                    assertThat(p.accepted()).isNotBlank();
                });
                continue;
            }
            now = outcome.value().get();
            assertThat(Layout.of(now.design()).problems()).as(what).isEmpty();
            String text = DesignWriter.text(now.design());
            ReadDesign read = DesignReader.read(text.getBytes(StandardCharsets.UTF_8));
            assertThat(read.problems()).as(what).isEmpty();
            assertThat(read.design()).as(what).hasValue(now.design());
            reached.add(now.design());
            texts.add(text);
            done.merge(sort, 1, Integer::sum);
        }
        for (int i = reached.size() - 1; i >= 0; i--) {
            assertThat(DesignWriter.text(reached.get(i))).isEqualTo(texts.get(i));
        }
        for (int i = 0; i < reached.size(); i++) {
            assertThat(DesignWriter.text(reached.get(i))).isEqualTo(texts.get(i));
        }
        assertThat(new HashSet<>(texts)).hasSizeGreaterThan(STEPS / 4);
        assertThat(done.keySet()).containsExactlyInAnyOrder(RandomEdits.Sort.values());
    }

    /** Moving mirrors, however and whatever follows, keeps what is held. */
    @ParameterizedTest
    @MethodSource("samples")
    void movesKeepHolds(Path sample) {
        Laid now = Edited.laid(Samples.design(sample));
        RandomEdits edits = new RandomEdits(7, now);
        List<RandomEdits.Sort> moves = List.of(
                RandomEdits.Sort.DRAG,
                RandomEdits.Sort.PLACE,
                RandomEdits.Sort.LEG,
                RandomEdits.Sort.INCIDENCE,
                RandomEdits.Sort.HOLD);
        int moved = 0;
        for (int step = 0; step < 300; step++) {
            Laid before = now;
            RandomEdits.Sort sort = moves.get(step % moves.size());
            Edit edit = edits.of(sort, now);
            now = edit.on(now).value().orElse(now);
            if (sort == RandomEdits.Sort.HOLD || now.design().equals(before.design())) {
                continue;
            }
            moved++;
            for (Hold hold : now.design().holds()) {
                if (hold instanceof Hold.Position p) {
                    assertThat(Edited.at(now, p.mirror())).as(edit.name()).isEqualTo(Edited.at(before, p.mirror()));
                } else if (hold instanceof Hold.Leg h && !edit.name().startsWith("set leg")) {
                    // m; the mover keeps what is held to 1e-9 mm.
                    assertThat(Offers.value(now, "leg_mm", h.leg()).orElseThrow())
                            .as(edit.name() + " with " + h.words())
                            .isCloseTo(Offers.value(before, "leg_mm", h.leg()).orElseThrow(), within(1e-12));
                }
            }
        }
        assertThat(moved).isGreaterThan(20);
    }

    /** A mirror put in and taken out again leaves what a person stated about other parts untouched. */
    @ParameterizedTest
    @MethodSource("samples")
    void aFoldPutInAndTakenOutLeavesTheMirrors(Path sample) {
        Laid before = Edited.laid(Samples.design(sample));
        Laid bare = Edited.laid(before.design().withHolds(List.of()));
        int folds = 0;
        for (Place leg : Offers.legs(bare.design())) {
            Outcome<Laid> in = MirrorEdits.insert(leg, 0.03, Turn.LEFT).on(bare);
            if (in.value().isEmpty()) {
                continue;
            }
            folds++;
            String name =
                    PartEdits.added(bare.design(), in.value().get().design()).get(0);
            Laid out = Edited.by(PartEdits.delete(List.of(name)), in.value().get());
            for (Mirror mirror : bare.design().mirrors()) {
                // m; rounding of plans of about 1 m.
                assertThat(Edited.at(out, mirror.name()).distance(mirror.at())).isLessThan(1e-12);
            }
        }
        assertThat(folds).isPositive();
    }
}
