package twofold.window.inspect;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import twofold.design.Along;
import twofold.design.FaceAngle;
import twofold.design.Field;
import twofold.design.Kind;
import twofold.design.Problem;
import twofold.design.Side;
import twofold.design.TiltPlane;
import twofold.design.Unit;
import twofold.edit.FieldEdits;
import twofold.session.Session;
import twofold.window.form.Text;

/** The rows of a kind's fields. */
final class FieldLines {
    /** The radius of a mirror that stops being flat, m: to be typed over. */
    private static final double TO_BEGIN_WITH = 1;

    private final Session session;

    FieldLines(Session session) {
        this.session = session;
    }

    /** The rows of all fields of a kind, but for a mirror's place. */
    List<Line> of(Kind kind) {
        List<Line> lines = new ArrayList<>();
        for (Field field : kind.fields()) {
            if (field.need() != Field.Need.OTHER_FORM) {
                line(field).ifPresent(lines::add);
            }
        }
        return lines;
    }

    private Optional<Line> line(Field field) {
        if (field == Field.MATERIAL) {
            // Chosen in the row of the index, which it makes.
            return Optional.empty();
        } else if (field == Field.INDEX) {
            return Optional.of(new GlassLine(session));
        } else if (field == Field.ROC) {
            return Optional.of(radius());
        }
        return switch (field.form()) {
            case POINT, TURN, TEXT -> Optional.empty();
            case ALONG -> Optional.of(along());
            case FACE_ANGLE -> Optional.of(faces());
            case TILT_PLANE -> Optional.of(tiltPlane());
            case SIDE -> Optional.of(side());
            case NUMBER, POSITIVE, SIGNED, MOUNT, POWERS, MATRIX -> Optional.of(new TypedLine(session, field));
        };
    }

    private List<Problem> set(Inspected now, Field field, Object value) {
        return session.edit(FieldEdits.set(now.name(), field, value)).problems();
    }

    private Line leading(Picker<?> choice, TypedLine typed, Field field) {
        choice.name(TypedLine.title(field) + ", kind", TypedLine.help(field));
        return choice.leading(typed);
    }

    /** Middle of the leg, or a path along it. */
    private Line along() {
        Picker<Boolean> choice = new Picker<>(
                Field.ALONG.json(),
                middle -> middle ? "middle" : "at",
                now -> List.of(true, false),
                now -> Along.MIDDLE.equals(now.part().values().find(Field.ALONG).orElseThrow()),
                (now, middle) -> set(
                        now,
                        Field.ALONG,
                        middle ? Along.MIDDLE : Along.at(now.standing().middle())));
        TypedLine typed = new TypedLine(
                session,
                Field.ALONG,
                now -> Text.of(Unit.MM, now.standing().middle()),
                Optional.of(choice.control()),
                List.of(choice.reason()));
        return leading(choice, typed, Field.ALONG);
    }

    /** Brewster's angle, or an angle. */
    private Line faces() {
        Picker<Boolean> choice = new Picker<>(
                Field.FACES.json(),
                brewster -> brewster ? "Brewster" : "angle",
                now -> List.of(true, false),
                now -> FaceAngle.BREWSTER.equals(
                        now.part().values().find(Field.FACES).orElseThrow()),
                (now, brewster) -> set(
                        now,
                        Field.FACES,
                        brewster
                                ? FaceAngle.BREWSTER
                                : FaceAngle.of(now.standing().incidence())));
        TypedLine typed = new TypedLine(
                session,
                Field.FACES,
                now -> Text.of(Unit.DEG, now.standing().incidence()),
                Optional.of(choice.control()),
                List.of(choice.reason()));
        return leading(choice, typed, Field.FACES);
    }

    private enum Bend {
        FLAT("flat"),
        CONCAVE("concave"),
        CONVEX("convex");

        private final String word;

        Bend(String word) {
            this.word = word;
        }

        static Bend of(double radius) {
            return Double.isInfinite(radius) ? FLAT : radius > 0 ? CONCAVE : CONVEX;
        }

        double of(Inspected now) {
            double size = Math.abs(radius(now));
            double radius = Double.isInfinite(size) ? TO_BEGIN_WITH : size;
            return switch (this) {
                case FLAT -> Double.POSITIVE_INFINITY;
                case CONCAVE -> radius;
                case CONVEX -> -radius;
            };
        }
    }

    private static double radius(Inspected now) {
        return (Double) now.part().values().find(Field.ROC).orElseThrow();
    }

    /** Flat, or a radius to one side. */
    private Line radius() {
        Picker<Bend> choice = new Picker<>(
                Field.ROC.json(),
                bend -> bend.word,
                now -> List.of(Bend.values()),
                now -> Bend.of(radius(now)),
                (now, bend) -> set(now, Field.ROC, bend.of(now)));
        TypedLine typed = new TypedLine(
                session,
                Field.ROC,
                now -> Text.of(Field.ROC, radius(now)),
                Optional.of(choice.control()),
                List.of(choice.reason()));
        return leading(choice, typed, Field.ROC);
    }

    private Line tiltPlane() {
        return new Picker<>(
                        Field.TILT_PLANE.json(),
                        TiltPlane::word,
                        now -> List.of(TiltPlane.values()),
                        FieldLines::tilt,
                        (now, plane) -> set(now, Field.TILT_PLANE, plane))
                .line(TypedLine.title(Field.TILT_PLANE), TypedLine.help(Field.TILT_PLANE));
    }

    private static TiltPlane tilt(Inspected now) {
        return (TiltPlane) now.part().values().find(Field.TILT_PLANE).orElseThrow();
    }

    private Line side() {
        return new Picker<>(
                        Field.SIDE.json(),
                        Side::word,
                        now -> List.of(
                                Side.usual(tilt(now)), Side.usual(tilt(now)).opposite()),
                        now -> (Side) now.part().values().find(Field.SIDE).orElse(Side.usual(tilt(now))),
                        (now, side) -> set(now, Field.SIDE, side))
                .line(TypedLine.title(Field.SIDE), TypedLine.help(Field.SIDE));
    }
}
