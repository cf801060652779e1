package twofold.command;

import twofold.cavity.Cavity;
import twofold.design.Design;
import twofold.design.Kind;
import twofold.design.Mirror;
import twofold.design.Point;
import twofold.design.Unit;
import twofold.layout.Clearance;
import twofold.layout.Leg;
import twofold.layout.Standing;

/** Where everything stands, for a person at the table. */
final class PlaceText {
    private static final int GAPS = 10;

    private PlaceText() {}

    /** The text, several lines, each ended. */
    static String of(Cavity cavity) {
        Design design = cavity.laid().design();
        StringBuilder text = new StringBuilder();
        if (!design.title().isEmpty()) {
            text.append(design.title()).append('\n');
        }
        Table parts = new Table().row("part", "kind", "x", "y", "along its leg", "incidence");
        for (Leg leg : cavity.laid().legs()) {
            mirror(parts, cavity, leg.from());
            for (Standing s : leg.parts()) {
                Point at = leg.at(s.middle());
                parts.row(
                        design.parts().get(s.part()).name(),
                        design.parts().get(s.part()).kind().word(),
                        Unit.MM.shown(at.x()),
                        Unit.MM.shown(at.y()),
                        Unit.MM.shown(s.middle()),
                        design.parts().get(s.part()).kind() == Kind.LENS
                                        || design.parts().get(s.part()).kind().isSlab()
                                ? Unit.DEG.shown(s.incidence()) + "°"
                                : "");
            }
        }
        int last = design.parts().size() - 1;
        if (cavity.laid().legs().get(cavity.laid().legs().size() - 1).to() == last) {
            mirror(parts, cavity, last);
        }
        text.append(parts.text("")).append('\n');
        Table legs = new Table().row("leg", "path", "by ruler", "heading");
        for (Leg leg : cavity.laid().legs()) {
            legs.row(
                    design.parts().get(leg.from()).name() + " to "
                            + design.parts().get(leg.to()).name(),
                    Unit.MM.shown(leg.path()),
                    Unit.MM.shown(leg.distance()),
                    Unit.DEG.shown(Math.atan2(leg.heading().y(), leg.heading().x())) + "°");
        }
        text.append(legs.text("")).append('\n');
        Table gaps = new Table().row("clearance", "gap");
        for (Clearance.Gap gap : cavity.clearance().smallest(GAPS)) {
            gaps.row(design.parts().get(gap.part()).name() + " to " + gap.to(cavity.laid()), Unit.MM.shown(gap.gap()));
        }
        text.append(gaps.text(""));
        text.append("all lengths in mm\n");
        Notable.ofPlan(cavity).forEach(line -> text.append(line).append('\n'));
        return text.toString();
    }

    private static void mirror(Table table, Cavity cavity, int part) {
        Mirror mirror = (Mirror) cavity.laid().design().parts().get(part);
        Double incidence = cavity.laid().incidence().get(part);
        table.row(
                mirror.name(),
                mirror.kind().word(),
                Unit.MM.shown(mirror.at().x()),
                Unit.MM.shown(mirror.at().y()),
                "",
                incidence == null ? "" : Unit.DEG.shown(incidence) + "°");
    }
}
