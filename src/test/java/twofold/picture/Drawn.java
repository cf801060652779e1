package twofold.picture;

import java.util.ArrayList;
import java.util.List;
import twofold.cavity.Cavity;
import twofold.design.Along;
import twofold.design.Design;
import twofold.design.FaceAngle;
import twofold.design.Field;
import twofold.design.Hold;
import twofold.design.Kind;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Point;
import twofold.design.Shape;
import twofold.design.Side;
import twofold.design.TwoPowers;
import twofold.design.Values;
import twofold.layout.Layout;

/** Cavities to draw, all invented: a workshop's lasers for profiling lake ice. */
final class Drawn {
    private Drawn() {}

    static Cavity solved(Design design) {
        return Cavity.solve(Layout.of(design)
                .value()
                .orElseThrow(() -> new IllegalArgumentException(
                        Layout.of(design).problems().toString())));
    }

    /** The pump-side cavity that the page on files gives as its example. */
    static Design zFold() {
        List<Part> parts = List.of(
                mirror("End A", 0, 0),
                curved("Fold 1", 480, 0, 100),
                rod(),
                curved("Fold 2", 378.9482, 25.9354, 100),
                mirror("End B", 998.9482, 25.9354));
        Design plain = Design.of("Lake-ice profiler, pump-side cavity", 800e-9, Shape.STANDING_WAVE, parts);
        return new Design(
                plain.title(),
                "",
                plain.wavelength(),
                plain.shape(),
                parts,
                List.of(new Hold.Leg(Place.of("End A", "Fold 1")), new Hold.Position("End A")),
                List.of(),
                List.of(),
                List.of());
    }

    /** The same with its folds too far apart: no beam in either plane. */
    static Design tooLong() {
        List<Part> parts = new ArrayList<>(zFold().parts());
        parts.set(3, curved("Fold 2", 360, 32, 100));
        return Design.of("Lake-ice profiler, folds too far apart", 800e-9, Shape.STANDING_WAVE, parts);
    }

    /** A fold met at 30°: sagittal unstable alone. */
    static Design oneSided() {
        double turn = Math.toRadians(180 - 60);
        return Design.of(
                "Test arm, one plane only",
                1064e-9,
                Shape.STANDING_WAVE,
                List.of(
                        curved("Left", 0, 0, 300),
                        curved("Fold", 250, 0, 400),
                        mirror("Right", 250 + 600 * Math.cos(turn), 600 * Math.sin(turn))));
    }

    /** Two flat mirrors: half trace exactly 1 in both planes. */
    static Design onEdge() {
        return Design.of(
                "Two flats", 1064e-9, Shape.STANDING_WAVE, List.of(mirror("Near", 0, 0), mirror("Far", 300, 0)));
    }

    /** A bow-tie with 10 mm of crystal between two curved mirrors. */
    static Design bowTie() {
        return Design.of(
                "Ice-depth doubler, bow-tie",
                1064e-9,
                Shape.RING,
                List.of(
                        curved("Curved 1", -56, 0, 100),
                        part(
                                Kind.CRYSTAL,
                                "Doubler",
                                Values.NONE
                                        .with(Field.ALONG, Along.MIDDLE)
                                        .with(Field.INSIDE, (Object) 10e-3)
                                        .with(Field.INDEX, (Object) 1.605)),
                        curved("Curved 2", 56, 0, 100),
                        mirror("Flat 1", -112, -66),
                        mirror("Flat 2", 112, -66)));
    }

    /** A triangle ring with a plate at Brewster's angle, a lens, a stop and a box. */
    static Design triangle() {
        return Design.of(
                "Gas-line reference, triangle",
                1550e-9,
                Shape.RING,
                List.of(
                        curved("Coupler", 0, 0, 700),
                        part(
                                Kind.APERTURE,
                                "Mode stop",
                                Values.NONE.with(Field.ALONG, Along.at(0.06)).with(Field.HOLE, (Object) 2e-3)),
                        part(
                                Kind.PLATE,
                                "Window",
                                Values.NONE
                                        .with(Field.ALONG, Along.at(0.14))
                                        .with(Field.ACROSS, (Object) 6e-3)
                                        .with(Field.MATERIAL, "fused silica")
                                        .with(Field.FACES, FaceAngle.BREWSTER)
                                        .with(Field.SIDE, Side.RIGHT)),
                        curved("Turn 1", 260, 0, 700),
                        part(
                                Kind.LENS,
                                "Weak lens",
                                Values.NONE.with(Field.ALONG, Along.at(0.1)).with(Field.FOCAL_LENGTH, (Object) 2.0)),
                        mirror("Turn 2", 130, 190),
                        part(
                                Kind.MATRIX,
                                "Cell",
                                Values.NONE
                                        .with(Field.ALONG, Along.at(0.11))
                                        .with(Field.BOX, (Object) 40e-3)
                                        .with(Field.TANGENTIAL, new twofold.design.FourNumbers(1, 0.04, 0, 1))
                                        .with(Field.SAGITTAL, new twofold.design.FourNumbers(1, 0.04, 0, 1)))));
    }

    /** A long V with a pumped crystal near one end. */
    static Design longV() {
        double back = Math.toRadians(180 - 2 * 12);
        return Design.of(
                "Ridge sounder, long V",
                1064e-9,
                Shape.STANDING_WAVE,
                List.of(
                        mirror("Pump mirror", 0, 0),
                        part(
                                Kind.CRYSTAL,
                                "Slab",
                                Values.NONE
                                        .with(Field.ALONG, Along.at(0.02))
                                        .with(Field.INSIDE, (Object) 15e-3)
                                        .with(Field.INDEX, (Object) 1.82)
                                        .with(Field.THERMAL_POWER, new TwoPowers(1.2, 1.5))),
                        curved("Fold", 1400, 0, 1500),
                        mirror("Output coupler", 1400 + 900 * Math.cos(back), 900 * Math.sin(back))));
    }

    /** Twelve parts round a hexagon: the ring that speed is measured on. */
    static Design hexagon() {
        return twofold.bench.TwelvePartRing.design();
    }

    private static Part rod() {
        return part(
                Kind.CRYSTAL,
                "Rod",
                Values.NONE
                        .with(Field.ALONG, Along.MIDDLE)
                        .with(Field.INSIDE, (Object) 5e-3)
                        .with(Field.INDEX, (Object) 1.76)
                        .with(Field.FACES, FaceAngle.BREWSTER));
    }

    private static Part part(Kind kind, String name, Values values) {
        return kind.part(name, values);
    }

    static Part mirror(String name, double x, double y) {
        return part(Kind.MIRROR, name, Values.NONE.with(Field.AT, new Point(x * 1e-3, y * 1e-3)));
    }

    static Part curved(String name, double x, double y, double radius) {
        return part(
                Kind.MIRROR,
                name,
                Values.NONE.with(Field.AT, new Point(x * 1e-3, y * 1e-3)).with(Field.ROC, (Object) (radius * 1e-3)));
    }
}
