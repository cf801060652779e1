package twofold.edit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static twofold.edit.Edited.by;
import static twofold.edit.Edited.names;
import static twofold.edit.Edited.refusal;
import static twofold.edit.Edited.sample;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.FaceAngle;
import twofold.design.Field;
import twofold.design.Kind;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Turn;
import twofold.layout.Laid;

class PartEditsTest {
    /** Rounding of plans of about 1 m, some hundred units in the last place. */
    private static final double ROUNDING = 1e-12;

    private final Laid z = sample("z-fold-rod");

    @ParameterizedTest
    @EnumSource(
            value = Kind.class,
            names = {"MIRROR"},
            mode = EnumSource.Mode.EXCLUDE)
    void aNewPartStandsWhereItIsPut(Kind kind) {
        Laid with = by(PartEdits.insert(kind, Place.of("End A", "Fold 1"), 0.2), z);

        String name = PartEdits.added(z.design(), with.design()).get(0);
        assertThat(name).isEqualToIgnoringCase(kind.word() + " 1");
        assertThat(names(with)).containsExactly("End A", name, "Fold 1", "Rod", "Fold 2", "Output coupler");
        assertThat(Edited.along(with, name)).isEqualTo(Along.at(0.2));
    }

    @Test
    void aNewPartGoesToTheNearestGap() {
        Laid with = by(PartEdits.insert(Kind.CRYSTAL, Place.of("Fold 1", "Fold 2"), 0.053), z);

        // The rod ends 2.5 mm behind the middle of its leg; a new crystal is 5 mm long.
        double middle = with.legs().get(1).path() / 2;
        assertThat(names(with)).containsExactly("End A", "Fold 1", "Rod", "Crystal 1", "Fold 2", "Output coupler");
        assertThat(Edited.along(with, "Crystal 1").path()).isCloseTo(middle + 5e-3, within(ROUNDING));
    }

    @Test
    void endsClampANewPart() {
        Laid with = by(PartEdits.insert(Kind.PLATE, Place.of("End A", "Fold 1"), -1), z);

        assertThat(Edited.along(with, "Plate 1").path()).isCloseTo(1.5e-3, within(ROUNDING));
    }

    @Test
    void aFullLegIsRefusedInWords() {
        Part rod = z.design().parts().get(2).with(Field.INSIDE, 0.1).with(Field.FACES, FaceAngle.of(0));
        Laid full = Edited.laid(Placing.with(Placing.without(z.design(), 2), 2, rod));

        assertThat(refusal(PartEdits.insert(Kind.CRYSTAL, Place.of("Fold 1", "Fold 2"), 0.01), full))
                .contains("found no room for Crystal 1, 5.00 mm of path", "at most 1.97 mm");
    }

    @Test
    void deletingAFoldUnfoldsTheArmBeyond() {
        Laid without = by(PartEdits.delete(List.of("Fold 1")), z);

        assertThat(names(without)).containsExactly("End A", "Rod", "Fold 2", "Output coupler");
        assertThat(without.legs().get(0).path())
                .isCloseTo(z.legs().get(0).path() + z.legs().get(1).path(), within(ROUNDING));
        assertThat(without.legs().get(1).path()).isCloseTo(z.legs().get(2).path(), within(ROUNDING));
        assertThat(Edited.incidence(without, "Fold 2")).isCloseTo(Edited.incidence(z, "Fold 2"), within(ROUNDING));
        assertThat(Edited.along(without, "Rod").path())
                .isCloseTo(z.legs().get(0).path() + z.legs().get(1).path() / 2, within(ROUNDING));
    }

    @Test
    void whatReferredToADeletedPartGoesWithIt() {
        Design before = z.design();
        Design after = by(PartEdits.delete(List.of("Fold 1")), z).design();

        assertThat(after.problems()).isEmpty();
        assertThat(after.holds()).noneMatch(h -> h.words().contains("Fold 1"));
        assertThat(after.levers()).anySatisfy(l -> {
            assertThat(l.name()).isEqualTo("fold");
            assertThat(l.of()).containsExactly(Place.of("Fold 2"));
        });
        assertThat(Lost.between(before, after)).contains("Fold 1 of the lever fold", "the lever gap");
    }

    @Test
    void anEndMirrorGoesOnlyFromAnEmptyLeg() {
        assertThat(names(by(PartEdits.delete(List.of("Output coupler")), z)))
                .containsExactly("End A", "Fold 1", "Rod", "Fold 2");
        Laid with = by(PartEdits.insert(Kind.LENS, Place.of("Fold 2", "Output coupler"), 0.1), z);
        assertThat(refusal(PartEdits.delete(List.of("Output coupler")), with))
                .contains("found Lens 1 on the leg that Output coupler ends");
        assertThat(names(by(PartEdits.delete(List.of("Output coupler", "Lens 1")), with)))
                .containsExactly("End A", "Fold 1", "Rod", "Fold 2");
    }

    @Test
    void theLastTwoMirrorsStay() {
        Laid two = by(PartEdits.delete(List.of("Fold 1", "Fold 2")), z);
        assertThat(refusal(PartEdits.delete(List.of("End A")), two)).contains("needs at least 2 mirrors");
        assertThat(refusal(
                        PartEdits.delete(List.of(
                                "Rod",
                                sample("triangle-ring")
                                        .design()
                                        .mirrors()
                                        .get(0)
                                        .name())),
                        sample("triangle-ring")))
                .isNotEmpty();
    }

    @Test
    void aRingIsAimedAnew() {
        Laid ring = sample("bow-tie-doubler");
        for (int m = 0; m < 4; m++) {
            String name = ring.design().mirrors().get(m).name();
            Laid without = by(PartEdits.delete(List.of(name)), ring);
            assertThat(without.design().mirrors()).hasSize(3);
            ring.design().mirrors().stream()
                    .filter(other -> !other.name().equals(name))
                    .forEach(other ->
                            assertThat(Edited.at(without, other.name())).isEqualTo(other.at()));
        }
    }

    @Test
    void duplicatesAndPastesAreRenamedOnClash() {
        Laid twice = by(PartEdits.duplicate(List.of("Rod")), z);
        assertThat(names(twice)).containsExactly("End A", "Fold 1", "Rod", "Rod 2", "Fold 2", "Output coupler");
        Laid pasted = by(PartEdits.paste(List.of(z.design().parts().get(2)), Optional.of("End A")), z);
        assertThat(names(pasted)).containsExactly("End A", "Rod 2", "Fold 1", "Rod", "Fold 2", "Output coupler");
        assertThat(Edited.along(pasted, "Rod 2")).isEqualTo(Along.MIDDLE);
        Laid folded = by(PartEdits.duplicate(List.of("Fold 1")), z);
        assertThat(names(folded)).containsExactly("End A", "Fold 1", "Fold 3", "Rod", "Fold 2", "Output coupler");
        assertThat(Edited.incidence(folded, "Fold 3")).isCloseTo(Math.toRadians(10), within(ROUNDING));
        Laid last = by(PartEdits.paste(List.of(z.design().parts().get(2)), Optional.empty()), z);
        assertThat(names(last)).containsExactly("End A", "Fold 1", "Rod", "Fold 2", "Rod 2", "Output coupler");
    }

    @Test
    void whatIsCutCanBePasted() {
        List<Part> copied = PartEdits.copied(z.design(), List.of("Rod"));
        Laid cut = by(PartEdits.cut(List.of("Rod")), z);
        assertThat(PartEdits.cut(List.of("Rod")).name()).isEqualTo("cut Rod");
        Laid back = by(PartEdits.paste(copied, Optional.of("Fold 1")), cut);
        assertThat(back.design().parts()).isEqualTo(z.design().parts());
        assertThat(refusal(PartEdits.paste(List.of(), Optional.empty()), z)).contains("no part to paste");
    }

    @Test
    void aNameIsFollowedEverywhere() {
        Design renamed = by(PartEdits.rename("Fold 1", " Curved "), z).design();

        assertThat(renamed.toString()).doesNotContain("Fold 1");
        assertThat(renamed.holds().toString()).contains("End A/Curved");
        assertThat(Lost.between(z.design(), renamed)).isEmpty();
        assertThat(by(PartEdits.rename("Curved", "Fold 1"), Edited.laid(renamed))
                        .design())
                .isEqualTo(z.design());
        assertThat(refusal(PartEdits.rename("Rod", "End A"), z)).contains("a second time");
        assertThat(refusal(PartEdits.rename("Rod", "a/b"), z)).contains("printable");
    }

    @Test
    void aPartCrossesAMirrorAndComesBack() {
        Laid up = by(PartEdits.reorder(List.of("Rod"), false), z);
        assertThat(names(up)).containsExactly("End A", "Rod", "Fold 1", "Fold 2", "Output coupler");
        Laid back = by(PartEdits.reorder(List.of("Rod"), true), up);
        assertThat(back.design().parts()).isEqualTo(z.design().parts());
    }

    @Test
    void twoPartsExchangeTheirPlaces() {
        Laid two = by(PartEdits.insert(Kind.LENS, Place.of("Fold 1", "Fold 2"), 0.02), z);
        Laid moved = by(PartEdits.reorder(List.of("Rod"), false), two);
        assertThat(names(moved)).containsExactly("End A", "Fold 1", "Rod", "Lens 1", "Fold 2", "Output coupler");
        assertThat(Edited.along(moved, "Rod").path()).isCloseTo(0.02 + 2.5e-3, within(ROUNDING));
        assertThat(Edited.along(moved, "Lens 1").path())
                .isCloseTo(two.legs().get(1).path() / 2 + 2.5e-3, within(ROUNDING));
    }

    @Test
    void endsAreEnds() {
        assertThat(refusal(PartEdits.reorder(List.of("End A"), false), z)).contains("at the beginning");
        assertThat(refusal(PartEdits.reorder(List.of("Output coupler"), true), z))
                .contains("at the end");
        Laid behind = by(PartEdits.insertBehind(Kind.LENS, "Output coupler", Turn.LEFT), z);
        assertThat(refusal(PartEdits.reorder(List.of("Lens 1"), true), behind)).contains("at the end");
    }

    @Test
    void aPartSlidesBetweenItsNeighbours() {
        Laid slid = by(PartEdits.slide("Rod", 0.03), z);
        assertThat(Edited.along(slid, "Rod")).isEqualTo(Along.at(0.03));
        assertThat(Edited.along(by(PartEdits.slide("Rod", -5), z), "Rod").path())
                .isCloseTo(2.5e-3, within(ROUNDING));
        assertThat(Edited.along(by(PartEdits.slide("Rod", 5), z), "Rod").path())
                .isCloseTo(z.legs().get(1).path() - 2.5e-3, within(ROUNDING));
    }
}
