package twofold.layout;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import twofold.design.Design;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Problem;
import twofold.design.Subject;
import twofold.design.Turn;
import twofold.design.Unit;
import twofold.material.Materials;

/** One laying out of typed legs and angles, mirror by mirror; see {@link Layout#typed}. */
final class TypedPlan {
    private final Design draft;
    private final Map<Integer, Typed> typed;
    private final Glazing glazing;
    private final List<Part> parts;
    private final List<Problem> problems = new ArrayList<>();

    private Point here = new Point(0, 0);
    private double headingX = 1;
    private double headingY = 0;

    TypedPlan(Design draft, Map<Integer, Typed> typed) {
        this.draft = draft;
        this.typed = typed;
        this.glazing = new Glazing(draft.wavelength(), Materials.standard());
        this.parts = new ArrayList<>(draft.parts());
    }

    Outcome<Design> place() {
        List<Standing> since = new ArrayList<>();
        boolean first = true;
        for (int i = 0; i < parts.size(); i++) {
            if (!(parts.get(i) instanceof Mirror mirror)) {
                glazing.problem(i, parts.get(i)).ifPresent(problems::add);
                if (problems.isEmpty()) {
                    since.add(glazing.standing(i, parts.get(i)));
                }
                continue;
            }
            Typed t = typed.get(i);
            if (first) {
                start(mirror, t);
            } else if (t != null && t.leg().isPresent()) {
                go(i, mirror, t.leg().getAsDouble(), since);
            } else {
                meet(mirror.at(), since);
            }
            if (!problems.isEmpty()) {
                return Outcome.failed(problems);
            }
            if (t != null && t.incidence().isPresent()) {
                turn(2 * t.incidence().getAsDouble(), t.turn().map(Turn::sign).orElse(1));
            }
            first = false;
            since.clear();
        }
        return Outcome.of(draft.withParts(parts));
    }

    private void start(Mirror mirror, @org.jspecify.annotations.Nullable Typed t) {
        here = mirror.at();
        if (t != null && t.heading().isPresent()) {
            headingX = Math.cos(t.heading().getAsDouble());
            headingY = Math.sin(t.heading().getAsDouble());
        }
    }

    private void go(int index, Mirror mirror, double path, List<Standing> since) {
        double air = path - since.stream().mapToDouble(Standing::length).sum();
        if (air < -Layout.TOUCH) {
            problems.add(new Problem(
                    Subject.part(index).at("leg_mm"),
                    "found " + Unit.MM.text(path) + ", less than the paths inside the parts on the leg",
                    "at least " + Layout.millimetres(path - air)));
            return;
        }
        double extent = air + since.stream().mapToDouble(Standing::advance).sum();
        double shift = since.stream().mapToDouble(Standing::shift).sum();
        here = new Point(
                here.x() + extent * headingX - shift * headingY, here.y() + extent * headingY + shift * headingX);
        parts.set(index, mirror.at(here));
    }

    private void meet(Point there, List<Standing> since) {
        double shift = since.stream().mapToDouble(Standing::shift).sum();
        double dx = there.x() - here.x();
        double dy = there.y() - here.y();
        double extent = Aim.extent(dx, dy, shift);
        headingX = Aim.headingX(dx, dy, extent, shift);
        headingY = Aim.headingY(dx, dy, extent, shift);
        here = there;
    }

    /** The beam turns by π minus twice the incidence, to the left for a positive sign. */
    private void turn(double twice, int sign) {
        double cos = -Math.cos(twice);
        double sin = sign * Math.sin(twice);
        double x = headingX;
        headingX = cos * x - sin * headingY;
        headingY = sin * x + cos * headingY;
    }
}
