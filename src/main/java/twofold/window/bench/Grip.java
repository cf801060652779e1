package twofold.window.bench;

import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Point;
import twofold.edit.Edit;
import twofold.edit.MirrorEdits;
import twofold.edit.PartEdits;
import twofold.layout.Follow;
import twofold.layout.Laid;
import twofold.layout.Leg;
import twofold.layout.Standing;

/**
 * A part held by the pointer: where it was taken, and what taking it elsewhere does. A mirror moves on the plane, any other
 * part along its leg; either keeps its distance from the pointer.
 */
final class Grip {
    private final Part part;
    private final Point taken;
    private final Leg leg;
    /** From the pointer's place along the leg to the part's middle, m. */
    private final double ahead;

    private Grip(Part part, Point taken, Leg leg, double ahead) {
        this.part = part;
        this.taken = taken;
        this.leg = leg;
        this.ahead = ahead;
    }

    /**
     * Takes a part.
     *
     * @param laid as it was before anything moved, without a preview
     * @param index of the part
     * @param taken where on the table the pointer is
     */
    static Grip of(Laid laid, int index, Point taken) {
        Part part = laid.design().parts().get(index);
        for (Leg leg : laid.legs()) {
            for (Standing s : leg.parts()) {
                if (s.part() == index) {
                    return new Grip(
                            part, taken, leg, s.middle() - leg.nearest(taken).path());
                }
            }
        }
        return new Grip(part, taken, laid.legs().get(0), 0);
    }

    /** Its name. */
    String name() {
        return part.name();
    }

    /** Whether it is a mirror, so that something may follow. */
    boolean isMirror() {
        return part instanceof Mirror;
    }

    /** What taking it to a place of the table does. */
    Edit to(Point pointer, Follow follow) {
        if (part instanceof Mirror mirror) {
            Point to = new Point(
                    mirror.at().x() + pointer.x() - taken.x(), mirror.at().y() + pointer.y() - taken.y());
            return MirrorEdits.moveTo(mirror.name(), to, follow);
        }
        return PartEdits.slide(part.name(), leg.nearest(pointer).path() + ahead);
    }
}
