package twofold.session;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Problem;
import twofold.design.Subject;
import twofold.edit.Edit;
import twofold.layout.Outcome;

/** Simple edits. */
final class Edits {
    private Edits() {}

    /** A part with one field set. */
    static Edit set(String part, Field field, Object value) {
        return Edit.of(
                "set " + field.json() + " of " + part, now -> Outcome.of(with(now.design(), part, field, value)));
    }

    /** A mirror a little elsewhere, m; joins its like. */
    static Edit nudge(String mirror, double dx, double dy) {
        return Edit.nudge("move " + mirror, now -> moved(now.design(), mirror, dx, dy));
    }

    /** A mirror a little elsewhere, m; a step of its own. */
    static Edit move(String mirror, double dx, double dy) {
        return Edit.of("move " + mirror, now -> moved(now.design(), mirror, dx, dy));
    }

    /** A part under another name. */
    static Edit rename(String part, String name) {
        return Edit.of("rename " + part, now -> {
            List<Part> parts = new ArrayList<>(now.design().parts());
            parts.replaceAll(p -> p.name().equals(part) ? p.named(name) : p);
            return Outcome.of(now.design().withParts(parts));
        });
    }

    /** Without a part. */
    static Edit delete(String part) {
        return Edit.of("delete " + part, now -> {
            List<Part> parts = new ArrayList<>(now.design().parts());
            parts.removeIf(p -> p.name().equals(part));
            return Outcome.of(now.design().withParts(parts));
        });
    }

    /** With a part more. */
    static Edit add(int index, Part part) {
        return Edit.of("add " + part.name(), now -> {
            List<Part> parts = new ArrayList<>(now.design().parts());
            parts.add(index, part);
            return Outcome.of(now.design().withParts(parts));
        });
    }

    private static Outcome<Design> moved(Design design, String mirror, double dx, double dy) {
        Optional<Point> at = design.mirrors().stream()
                .filter(m -> m.name().equals(mirror))
                .map(Mirror::at)
                .findFirst();
        return at.map(p -> Outcome.of(with(design, mirror, Field.AT, new Point(p.x() + dx, p.y() + dy))))
                .orElseGet(() -> Outcome.failed(
                        List.of(new Problem(Subject.DOCUMENT.at("parts"), "found no " + mirror, "a mirror's name"))));
    }

    private static Design with(Design design, String part, Field field, Object value) {
        List<Part> parts = new ArrayList<>(design.parts());
        parts.replaceAll(p -> p.name().equals(part) ? p.with(field, value) : p);
        return design.withParts(parts);
    }
}
