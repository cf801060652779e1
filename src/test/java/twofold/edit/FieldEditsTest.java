package twofold.edit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static twofold.edit.Edited.by;
import static twofold.edit.Edited.refusal;
import static twofold.edit.Edited.sample;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import twofold.design.Crystal;
import twofold.design.Entry;
import twofold.design.Field;
import twofold.design.Glass;
import twofold.design.Kind;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.design.Side;
import twofold.design.TiltPlane;
import twofold.design.Turn;
import twofold.design.Unit;
import twofold.layout.Follow;
import twofold.layout.Laid;

class FieldEditsTest {
    private final Laid z = sample("z-fold-rod");

    private static Part part(Laid laid, String name) {
        return laid.design().parts().get(laid.design().indexOf(name).orElseThrow());
    }

    @Test
    void aTypedValueIsSetAndTakenBack() {
        Laid set = by(FieldEdits.set("Fold 1", Field.ROC, "15 cm"), z);
        assertThat(((Mirror) part(set, "Fold 1")).radius()).isEqualTo(0.15);
        assertThat(((Mirror) part(by(FieldEdits.clear("Fold 1", Field.ROC), set), "Fold 1")).radius())
                .isEqualTo(Double.POSITIVE_INFINITY);
        assertThat(((Mirror) part(by(FieldEdits.set("Fold 1", Field.CURVATURE, "4 dpt"), z), "Fold 1")).radius())
                .isEqualTo(0.25);
        assertThat(FieldEdits.set("Fold 1", Field.ROC, "1").name()).isEqualTo("set radius of curvature of Fold 1");
    }

    @Test
    void everyFieldOfEveryKindTakesItsOwnText() {
        Laid laid = z;
        for (Kind kind : Kind.values()) {
            laid = by(PartEdits.insertBehind(kind, "Fold 2", Turn.LEFT), laid);
        }
        int fields = 0;
        for (Part part : laid.design().parts()) {
            for (Field field : part.kind().fields()) {
                if (field.need() != Field.Need.OTHER_FORM
                        && part.values().find(field).isPresent()) {
                    Object value = part.values().find(field).orElseThrow();
                    String text = Entry.text(field, value);
                    Laid same = by(FieldEdits.set(part.name(), field, text), laid);
                    assertThat(same.design()).as("%s of %s", field, part.name()).isEqualTo(laid.design());
                    fields++;
                }
            }
        }
        assertThat(fields).isGreaterThan(40);
    }

    @Test
    void refusedTextSaysWhere() {
        assertThat(refusal(FieldEdits.set("Rod", Field.INSIDE, "2,5"), z)).contains("comma");
        assertThat(FieldEdits.set("Rod", Field.INSIDE, "2,5")
                        .on(z)
                        .problems()
                        .get(0)
                        .where())
                .hasToString("parts[2].length_mm");
        assertThat(refusal(FieldEdits.set("Rod", Field.INSIDE, "200"), z)).contains("parts that take 200 mm");
        assertThat(refusal(FieldEdits.set("Rod", Field.ROC, "200"), z)).contains("a crystal");
        assertThat(refusal(FieldEdits.set("Fold 1", Field.LEG, "200"), z)).contains("a mirror");
        assertThat(refusal(FieldEdits.clear("Rod", Field.INSIDE), z)).contains("must have");
        assertThat(refusal(FieldEdits.set("Rods", Field.INSIDE, "5"), z)).contains("nearest is \"Rod\"");
    }

    @Test
    void aMaterialTakesTheIndexAway() {
        Laid index = by(FieldEdits.set("Rod", Field.INDEX, "1.8"), z);
        assertThat(((Crystal) part(index, "Rod")).slab().glass().index()).hasValue(1.8);
        Laid material = by(FieldEdits.set("Rod", Field.MATERIAL, "YAG"), index);
        assertThat(((Crystal) part(material, "Rod")).slab().glass())
                .isEqualTo(new Glass(OptionalDouble.empty(), Optional.of("YAG")));
        assertThat(refusal(FieldEdits.set("Rod", Field.MATERIAL, "YAGG"), z)).contains("nearest is \"YAG\"");
        assertThat(refusal(FieldEdits.clear("Rod", Field.MATERIAL), z)).contains("neither index nor material");
    }

    @Test
    void aSideTurnsWithItsTilt() {
        Laid right = by(FieldEdits.set("Rod", Field.SIDE, "right"), z);
        Laid down = by(FieldEdits.set("Rod", Field.TILT_PLANE, "sagittal"), right);
        assertThat(((Crystal) part(down, "Rod")).slab().side()).isEqualTo(Side.DOWN);
        Laid back = by(FieldEdits.set("Rod", Field.TILT_PLANE, TiltPlane.TANGENTIAL), down);
        assertThat(back.design()).isEqualTo(right.design());
        assertThat(refusal(FieldEdits.set("Rod", Field.SIDE, "up"), z)).contains("for a tangential tilt");
    }

    @Test
    void aTypedPositionMovesTheMirrorAlone() {
        Laid moved = by(
                FieldEdits.set("Fold 2", Field.AT, "400, 27"),
                by(HoldEdits.release(z.design().holds().get(2)), z));
        assertThat(Edited.at(moved, "Fold 2")).isEqualTo(new Point(0.4, 0.027));
        assertThat(refusal(FieldEdits.set("Fold 2", Field.AT, "400, 27"), z))
                .contains("the hold of the leg Fold 2/Output coupler");
    }

    @Test
    void typedNumbersOfThePlan() {
        Optional<Follow> usual = Optional.empty();
        Laid leg = by(MirrorEdits.leg(Place.of("Fold 1", "Fold 2"), "11 cm", usual), z);
        // m; the mover reaches 1e-9 mm.
        assertThat(leg.legs().get(1).path()).isCloseTo(0.11, within(1e-12));
        Laid angle = by(MirrorEdits.incidence("Fold 1", "7°30'", usual), z);
        assertThat(Edited.incidence(angle, "Fold 1")).isCloseTo(Math.toRadians(7.5), within(1e-12));
        assertThat(refusal(MirrorEdits.x("Fold 2", "a", Follow.ARM_FOLLOWS), z)).contains("no number");
        assertThat(Edited.at(by(MirrorEdits.y("Fold 2", "1 in", Follow.ARM_FOLLOWS), z), "Fold 2")
                        .y())
                .isEqualTo(0.0254);
    }

    @Test
    void whatTheDesignSaysOfItself() {
        assertThat(by(FieldEdits.title("Other"), z).design().title()).isEqualTo("Other");
        assertThat(by(FieldEdits.notes("a\nb"), z).design().notes()).isEqualTo("a\nb");
        assertThat(by(FieldEdits.wavelength("0.79 µm"), z).design().wavelength())
                .isEqualTo(Unit.NM.toSi(790));
        assertThat(refusal(FieldEdits.wavelength("20 mm"), z)).contains("a number from 1 to 1000000");
        assertThat(refusal(FieldEdits.wavelength("8 µm"), z)).contains("outside the range of its fit");
    }

    @Test
    void aShapeIsOpenedAndClosed() {
        Laid ring = sample("bow-tie-doubler");
        Laid open = by(FieldEdits.shape(Shape.STANDING_WAVE), ring);
        assertThat(open.legs()).hasSize(3);
        assertThat(Lost.between(ring.design(), open.design())).isNotEmpty();
        assertThat(by(FieldEdits.shape(Shape.RING), open).design().parts())
                .isEqualTo(ring.design().parts());
        Laid closing = by(PartEdits.insert(Kind.LENS, Place.of("Flat", "Curved 1"), 0.05), ring);
        assertThat(refusal(FieldEdits.shape(Shape.STANDING_WAVE), closing))
                .contains("Lens 1 on the leg that closes the ring");
        Laid two = by(PartEdits.delete(List.of("Fold 1", "Fold 2")), z);
        assertThat(refusal(FieldEdits.shape(Shape.RING), two)).contains("at least 3 mirrors");
    }
}
