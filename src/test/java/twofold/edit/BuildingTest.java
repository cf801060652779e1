package twofold.edit;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import twofold.Samples;
import twofold.design.Design;
import twofold.design.Entry;
import twofold.design.Field;
import twofold.design.Kind;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Shape;
import twofold.design.Turn;
import twofold.design.Unit;
import twofold.design.Values;
import twofold.file.DesignWriter;
import twofold.layout.Laid;

/** Everything of a design can be built by edits: every sample from two bare mirrors, or three of a ring, typed as a person would. */
class BuildingTest {
    static Stream<Path> samples() {
        return Samples.files().stream();
    }

    @ParameterizedTest
    @MethodSource("samples")
    void aBuiltDesignIsTheFilesToTheByte(Path sample) {
        Design wanted = Samples.design(sample);
        Laid now = mirrors(wanted, begun(wanted));
        for (int i = 0; i < wanted.parts().size(); i++) {
            Part part = wanted.parts().get(i);
            if (!(part instanceof Mirror)) {
                String before = wanted.parts().get(i - 1).name();
                Design was = now.design();
                now = Edited.by(PartEdits.insertBehind(part.kind(), before, Turn.LEFT), now);
                String name = PartEdits.added(was, now.design()).get(0);
                now = fields(Edited.by(PartEdits.rename(name, part.name()), now), part);
            }
        }
        now = asked(wanted, now);

        assertThat(now.design()).isEqualTo(wanted);
        assertThat(DesignWriter.bytes(now.design())).isEqualTo(Samples.bytes(sample));
    }

    /** Bare mirrors where the sample's outermost are; of a ring, its first three. */
    private static Laid begun(Design wanted) {
        List<Mirror> mirrors = wanted.mirrors();
        boolean ring = wanted.shape() == Shape.RING;
        List<Part> bare = new ArrayList<>();
        for (Mirror mirror : ring ? mirrors.subList(0, 3) : List.of(mirrors.get(0), mirrors.get(mirrors.size() - 1))) {
            bare.add(Kind.MIRROR.part("bare " + bare.size(), Values.NONE.with(Field.AT, mirror.at())));
        }
        return Edited.laid(Design.of("", 1e-6, wanted.shape(), bare));
    }

    private static Laid mirrors(Design wanted, Laid start) {
        Laid now = Edited.by(FieldEdits.wavelength(Unit.NM.text(wanted.wavelength())), start);
        boolean ring = wanted.shape() == Shape.RING;
        List<Mirror> mirrors = wanted.mirrors();
        int given = ring ? 3 : 1;
        String last = "bare 1";
        for (int i = 0; i < given; i++) {
            now = Edited.by(PartEdits.rename("bare " + i, mirrors.get(i).name()), now);
        }
        for (int i = given; i < (ring ? mirrors.size() : mirrors.size() - 1); i++) {
            Place leg =
                    Place.of(mirrors.get(i - 1).name(), ring ? mirrors.get(0).name() : last);
            Design was = now.design();
            now = Edited.by(MirrorEdits.insert(leg, 0.05, Turn.LEFT), now);
            String name = PartEdits.added(was, now.design()).get(0);
            now = Edited.by(PartEdits.rename(name, mirrors.get(i).name()), now);
            now = Edited.by(
                    FieldEdits.set(
                            mirrors.get(i).name(),
                            Field.AT,
                            Entry.text(Field.AT, mirrors.get(i).at())),
                    now);
        }
        if (!ring) {
            now = Edited.by(
                    PartEdits.rename(last, mirrors.get(mirrors.size() - 1).name()), now);
        }
        for (Mirror mirror : mirrors) {
            now = fields(now, mirror);
        }
        return now;
    }

    /** Types every field; where it stands last, once the part has its length. */
    private static Laid fields(Laid from, Part part) {
        Laid now = from;
        Map<Field, Object> stated = part.values().stated();
        if (stated.containsKey(Field.INDEX)) {
            now = Edited.by(FieldEdits.set(part.name(), Field.INDEX, "1.5"), now);
            now = Edited.by(FieldEdits.clear(part.name(), Field.MATERIAL), now);
        }
        for (Field field : stated.keySet()) {
            if (field != Field.ALONG) {
                now = Edited.by(FieldEdits.set(part.name(), field, Entry.text(field, stated.get(field))), now);
            }
        }
        return stated.containsKey(Field.ALONG)
                ? Edited.by(
                        FieldEdits.set(part.name(), Field.ALONG, Entry.text(Field.ALONG, stated.get(Field.ALONG))), now)
                : now;
    }

    private static Laid asked(Design wanted, Laid from) {
        List<Edit> edits = new ArrayList<>();
        edits.add(FieldEdits.title(wanted.title()));
        edits.add(FieldEdits.notes(wanted.notes()));
        wanted.holds().forEach(h -> edits.add(HoldEdits.hold(h)));
        wanted.levers().forEach(l -> edits.add(AskEdits.LEVERS.add(l)));
        wanted.requirements().forEach(r -> edits.add(AskEdits.REQUIREMENTS.add(r)));
        wanted.tolerances().forEach(t -> edits.add(AskEdits.TOLERANCES.add(t)));
        Laid now = from;
        for (Edit edit : edits) {
            now = Edited.by(edit, now);
        }
        return now;
    }

    /** The usual way up: from a cavity of two mirrors to three and a ring, and back. */
    @ParameterizedTest
    @MethodSource("samples")
    void whatWasBuiltComesApart(Path sample) {
        Laid now = Edited.laid(Samples.design(sample).withHolds(List.of()));
        int least = now.design().shape() == Shape.RING ? 3 : 2;
        while (now.design().parts().size() > least) {
            List<Part> parts = now.design().parts();
            Optional<Part> next = parts.stream()
                    .filter(p -> !(p instanceof Mirror))
                    .findFirst()
                    .or(() -> Optional.of(parts.get(1)));
            now = Edited.by(PartEdits.delete(List.of(next.orElseThrow().name())), now);
        }
        assertThat(now.design().mirrors()).hasSize(least);
    }
}
