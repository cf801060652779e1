package twofold.bench;

import java.util.ArrayList;
import java.util.List;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.FaceAngle;
import twofold.design.Field;
import twofold.design.Kind;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.design.TwoPowers;
import twofold.design.Values;

/** The ring that speed is measured on: six mirrors, two of them curved, four slabs, a lens and an aperture. */
public final class TwelvePartRing {
    private static final double SIDE = 0.2;

    private TwelvePartRing() {}

    /** The ring: a hexagon of 0.2 m; three slabs at Brewster's angle, the fourth with a thermal lens. */
    public static Design design() {
        return Design.of("speed", 1064e-9, Shape.RING, parts());
    }

    static List<Part> parts() {
        List<Part> parts = new ArrayList<>();
        for (int corner = 0; corner < 6; corner++) {
            double angle = corner * Math.PI / 3;
            Values mirror = Values.NONE.with(Field.AT, new Point(SIDE * Math.cos(angle), SIDE * Math.sin(angle)));
            parts.add(Kind.MIRROR.part("M" + corner, corner % 3 == 0 ? mirror.with(Field.ROC, (Object) 1.0) : mirror));
            switch (corner) {
                case 0, 2 -> parts.add(brewster(corner));
                case 1 -> {
                    parts.add(brewster(corner));
                    parts.add(Kind.APERTURE.part("Stop", Values.NONE.with(Field.ALONG, Along.at(0.15))));
                }
                case 3 ->
                    parts.add(Kind.LENS.part(
                            "Lens",
                            Values.NONE.with(Field.ALONG, Along.at(0.1)).with(Field.FOCAL_LENGTH, (Object) 5.0)));
                case 4 ->
                    parts.add(Kind.CRYSTAL.part(
                            "Pumped",
                            Values.NONE
                                    .with(Field.ALONG, Along.at(0.1))
                                    .with(Field.INSIDE, (Object) 0.01)
                                    .with(Field.INDEX, (Object) 1.82)
                                    .with(Field.THERMAL_POWER, new TwoPowers(0.1, 0.1))));
                default -> {}
            }
        }
        return parts;
    }

    private static Part brewster(int number) {
        return Kind.CRYSTAL.part(
                "Rod " + number,
                Values.NONE
                        .with(Field.ALONG, Along.at(0.05))
                        .with(Field.INSIDE, (Object) 0.005)
                        .with(Field.INDEX, (Object) 1.5)
                        .with(Field.FACES, FaceAngle.BREWSTER));
    }
}
