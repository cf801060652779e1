package twofold.edit;

import java.util.Optional;
import twofold.design.Design;
import twofold.design.FaceAngle;
import twofold.design.Field;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Problem;
import twofold.design.Side;
import twofold.design.Subject;
import twofold.design.TiltPlane;
import twofold.layout.Follow;
import twofold.layout.Laid;
import twofold.layout.Leg;
import twofold.layout.Outcome;
import twofold.layout.Standing;

/** Small steps by key; a run of the same becomes one step of the history. */
public final class Nudges {
    private Nudges() {}

    /** A mirror by a vector on the table, m; holds keep it as near as they allow. */
    public static Edit by(String mirror, double dx, double dy, Follow follow) {
        return Edit.nudge(
                "nudge " + mirror,
                laid -> Named.mirror(laid.design(), mirror)
                        .then(m -> {
                            Point at = laid.design().mirrors().get(m).at();
                            return MirrorEdits.dragged(laid, mirror, new Point(at.x() + dx, at.y() + dy), follow);
                        })
                        .then(m -> Outcome.of(Moves.at(laid.design(), m.places()))));
    }

    /** A part along its leg, m, downstream positive, as far as its neighbours let it. */
    public static Edit along(String part, double by) {
        return Edit.nudge(
                "nudge " + part,
                laid -> Named.part(laid.design(), part)
                        .then(i -> PartEdits.slid(
                                laid.design(),
                                part,
                                standing(laid, i).map(s -> s.middle() + by).orElse(0.0))));
    }

    private static Optional<Standing> standing(Laid laid, int part) {
        return laid.legs().stream()
                .flatMap(l -> l.parts().stream())
                .filter(s -> s.part() == part)
                .findFirst();
    }

    /**
     * A part turned, rad: the incidence at a fold, the usual way, or on the faces of a plate, crystal or lens, grows by the angle,
     * through 0 to the other side; an end mirror's leg swings about its other mirror, counter-clockwise positive.
     */
    public static Edit turn(String part, double by) {
        return Edit.nudge(
                "turn " + part, laid -> Named.part(laid.design(), part).then(i -> turned(laid, i, by)));
    }

    private static Outcome<Design> turned(Laid laid, int index, double by) {
        Part part = laid.design().parts().get(index);
        if (part instanceof Mirror mirror) {
            int number = Placing.leg(laid.design(), index);
            return Moves.isEnd(laid.design(), number)
                    ? swung(laid, mirror, number, by)
                    : MirrorEdits.incident(
                            laid, mirror.name(), laid.incidence().getOrDefault(index, 0.0) + by, Optional.empty());
        }
        Standing standing = standing(laid, index).orElseThrow();
        double angle = standing.incidence() + by;
        Part turned;
        if (part.kind().isSlab()) {
            turned = part.with(Field.FACES, FaceAngle.of(Math.abs(angle)));
            if (angle < 0) {
                Side side =
                        part.values().find(Field.SIDE).map(Side.class::cast).orElseGet(() -> Side.usual(tilt(part)));
                turned = turned.with(Field.SIDE, side.opposite());
            }
        } else if (part.kind().fields().contains(Field.TILT)) {
            turned = part.with(Field.TILT, Math.abs(angle));
        } else {
            return Outcome.failed(new Problem(
                    Subject.part(index),
                    "found " + part.name() + ", which has no incidence",
                    "a mirror, lens, plate or crystal"));
        }
        return Outcome.of(Placing.with(Placing.without(laid.design(), index), index, turned));
    }

    private static TiltPlane tilt(Part part) {
        return part.values().find(Field.TILT_PLANE).map(TiltPlane.class::cast).orElseThrow();
    }

    /** The leg of an end mirror swung about its other mirror. */
    private static Outcome<Design> swung(Laid laid, Mirror end, int number, double by) {
        Leg leg = laid.legs().get(number == 0 ? 0 : number - 1);
        Mirror about = (Mirror) laid.design().parts().get(number == 0 ? leg.to() : leg.from());
        Point to = Turned.about(about.at(), end.at(), by);
        return MirrorEdits.dragged(laid, end.name(), to, Follow.OTHERS_STAY)
                .then(m -> Outcome.of(Moves.at(laid.design(), m.places())));
    }
}
