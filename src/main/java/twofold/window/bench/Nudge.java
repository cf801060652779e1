package twofold.window.bench;

import java.util.Optional;
import javafx.scene.input.KeyCode;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Unit;
import twofold.edit.Edit;
import twofold.edit.Nudges;
import twofold.layout.Follow;
import twofold.layout.Laid;
import twofold.layout.Leg;

/** What the arrow keys, comma and full stop do to a part. */
final class Nudge {
    /** How far a key goes. */
    enum Reach {
        /** With Ctrl. */
        FINE(0.01, 0.01),
        /** Alone. */
        USUAL(0.1, 0.1),
        /** With Shift. */
        FAR(1, 1);

        private final double step;
        private final double turn;

        Reach(double mm, double degrees) {
            step = Unit.MM.toSi(mm);
            turn = Unit.DEG.toSi(degrees);
        }
    }

    private Nudge() {}

    /**
     * The nudge of a key; empty for other keys. A mirror goes the way of the arrow; another part goes along its leg, as near as
     * that comes to the arrow.
     */
    static Optional<Edit> of(Laid laid, int index, KeyCode key, Reach reach, Follow follow) {
        Part part = laid.design().parts().get(index);
        return switch (key) {
            case LEFT -> moved(laid, index, -reach.step, 0, follow);
            case RIGHT -> moved(laid, index, reach.step, 0, follow);
            case UP -> moved(laid, index, 0, reach.step, follow);
            case DOWN -> moved(laid, index, 0, -reach.step, follow);
            case COMMA -> Optional.of(Nudges.turn(part.name(), -reach.turn));
            case PERIOD -> Optional.of(Nudges.turn(part.name(), reach.turn));
            default -> Optional.empty();
        };
    }

    private static Optional<Edit> moved(Laid laid, int index, double dx, double dy, Follow follow) {
        Part part = laid.design().parts().get(index);
        if (part instanceof Mirror) {
            return Optional.of(Nudges.by(part.name(), dx, dy, follow));
        }
        for (Leg leg : laid.legs()) {
            if (leg.parts().stream().anyMatch(s -> s.part() == index)) {
                Point ahead = leg.heading();
                double along = ahead.x() * dx + ahead.y() * dy;
                return Optional.of(Nudges.along(part.name(), Math.copySign(Math.hypot(dx, dy), along)));
            }
        }
        return Optional.empty();
    }
}
