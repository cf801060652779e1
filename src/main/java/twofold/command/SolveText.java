package twofold.command;

import java.util.List;
import java.util.Optional;
import twofold.cavity.Cavity;
import twofold.cavity.CrystalLine;
import twofold.cavity.Eigenmode;
import twofold.cavity.Face;
import twofold.cavity.State;
import twofold.cavity.Station;
import twofold.cavity.Waist;
import twofold.design.Design;
import twofold.design.Kind;
import twofold.design.Shape;
import twofold.design.Unit;
import twofold.layout.Clearance;
import twofold.optics.Plane;

/** The answer of a solved design for a person who has ten seconds. */
final class SolveText {
    /** Gaps shown; the JSON answer has more. */
    private static final int GAPS = 4;

    private final Cavity cavity;
    private final Design design;
    private final StringBuilder text = new StringBuilder();

    private SolveText(Cavity cavity) {
        this.cavity = cavity;
        this.design = cavity.laid().design();
    }

    /** The text, several lines, each ended. */
    static String of(Cavity cavity) {
        SolveText answer = new SolveText(cavity);
        answer.head();
        answer.stability();
        answer.beam();
        answer.waists();
        answer.crystals();
        answer.clearance();
        LedgerText.of(cavity).ifPresent(t -> answer.text.append(t).append('\n'));
        answer.text.append(RequirementText.of(cavity));
        answer.notable();
        return answer.text.toString();
    }

    private void head() {
        if (!design.title().isEmpty()) {
            text.append(design.title()).append('\n');
        }
        text.append(design.shape() == Shape.RING ? "ring" : "standing wave")
                .append(", ")
                .append(Unit.NM.text(design.wavelength()))
                .append(" nm; round trip ")
                .append(Unit.MM.shown(cavity.roundTrip()))
                .append(" mm (optical ")
                .append(Unit.MM.shown(cavity.opticalRoundTrip()))
                .append(" mm), free spectral range ")
                .append(Unit.fixed(Unit.MHZ.fromSi(cavity.freeSpectralRange()), 2))
                .append(" MHz\n\n");
    }

    private void stability() {
        Table table = new Table().row("plane", "state", "half trace", "margin", "Gouy phase", "magnification");
        for (Plane plane : Plane.values()) {
            Eigenmode mode = cavity.mode(plane);
            table.row(
                    plane.word(),
                    mode.state().word(),
                    Unit.ONE.shown(mode.halfTrace()),
                    Unit.ONE.shown(mode.margin()),
                    mode.isStable() ? Unit.DEG.shown(mode.gouy()) + "°" : "-",
                    mode.state() == State.UNSTABLE ? Unit.ONE.shown(mode.magnification()) : "-");
        }
        text.append(table.text("")).append('\n');
    }

    private void beam() {
        if (!cavity.tangential().isStable() && !cavity.sagittal().isStable()) {
            return;
        }
        Eigenmode some = cavity.tangential().isStable() ? cavity.tangential() : cavity.sagittal();
        Table table = new Table().row("beam radius at", "incidence", "tangential", "sagittal", "roundness");
        for (Station s : some.stations()) {
            table.row(
                    place(s.part(), s.face()),
                    incidence(s.part(), s.face()),
                    radius(Plane.TANGENTIAL, s),
                    radius(Plane.SAGITTAL, s),
                    cavity.roundness(s.part(), s.face()).map(Unit.ONE::shown).orElse("-"));
        }
        text.append(table.text("")).append('\n');
    }

    private String place(int part, Face face) {
        String name = design.parts().get(part).name();
        return face == Face.SURFACE ? name : name + ", " + face.word();
    }

    private String incidence(int part, Face face) {
        Double angle = cavity.laid().incidence().get(part);
        return angle == null || face != Face.SURFACE ? "" : Unit.DEG.shown(angle) + "°";
    }

    private String radius(Plane plane, Station at) {
        return cavity.mode(plane)
                .station(at.part(), at.face())
                .map(s -> Unit.UM.shown(s.radius()) + " µm")
                .orElse("-");
    }

    private void waists() {
        Eigenmode t = cavity.tangential();
        Eigenmode s = cavity.sagittal();
        List<Waist> some = t.isStable() ? t.waists() : s.waists();
        if (some.isEmpty()) {
            return;
        }
        Table table = new Table().row("waist", "long", "tangential", "after", "sagittal", "after", "");
        for (int i = 0; i < some.size(); i++) {
            Waist here = some.get(i);
            if (here.length() <= 0) {
                continue;
            }
            Optional<Waist> wt = t.isStable() ? Optional.of(t.waists().get(i)) : Optional.empty();
            Optional<Waist> ws = s.isStable() ? Optional.of(s.waists().get(i)) : Optional.empty();
            table.row(
                    stretch(some, i),
                    Unit.MM.shown(here.length()) + " mm",
                    wt.map(w -> Unit.UM.shown(w.radius()) + " µm").orElse("-"),
                    wt.map(w -> Unit.MM.shown(w.after()) + " mm").orElse("-"),
                    ws.map(w -> Unit.UM.shown(w.radius()) + " µm").orElse("-"),
                    ws.map(w -> Unit.MM.shown(w.after()) + " mm").orElse("-"),
                    real(wt, ws));
        }
        text.append(table.text("")).append('\n');
    }

    private String stretch(List<Waist> all, int i) {
        Waist w = all.get(i);
        String from = design.parts().get(w.from()).name();
        if (!w.isInside()) {
            return from + " to " + design.parts().get(w.to()).name();
        }
        boolean first = i + 1 < all.size()
                && all.get(i + 1).isInside()
                && all.get(i + 1).from() == w.from();
        boolean second = i > 0 && all.get(i - 1).isInside() && all.get(i - 1).from() == w.from();
        return "inside " + from + (first ? ", before its lens" : second ? ", behind its lens" : "");
    }

    private static String real(Optional<Waist> t, Optional<Waist> s) {
        boolean inT = t.map(Waist::isReal).orElse(false);
        boolean inS = s.map(Waist::isReal).orElse(false);
        if (inT == inS) {
            return inT ? "here" : "elsewhere";
        }
        return inT ? "tangential here" : "sagittal here";
    }

    private void crystals() {
        for (int i = 0; i < design.parts().size(); i++) {
            if (design.parts().get(i).kind() != Kind.CRYSTAL) {
                continue;
            }
            Table table = new Table()
                    .row(
                            "crystal " + design.parts().get(i).name(),
                            "waist",
                            "off its middle",
                            "Rayleigh length",
                            "move it");
            for (Plane plane : Plane.values()) {
                Optional<CrystalLine> line = cavity.line(i, plane);
                if (line.isPresent()) {
                    boolean split = line.get().afterLens().isPresent();
                    crystal(table, plane.word() + (split ? ", before its lens" : ""), line.get());
                    line.get().afterLens().ifPresent(l -> crystal(table, plane.word() + ", behind its lens", l));
                } else {
                    table.row("  " + plane.word(), "-", "-", "-", "-");
                }
            }
            text.append(table.text("")).append('\n');
        }
    }

    private static void crystal(Table table, String plane, CrystalLine line) {
        table.row(
                "  " + plane,
                Unit.UM.shown(line.radius()) + " µm",
                Unit.MM.shown(line.offset()) + " mm",
                Unit.MM.shown(line.rayleigh()) + " mm",
                Unit.MM.shown(line.shiftToCentre()) + " mm");
    }

    private void clearance() {
        Table table = new Table();
        for (Clearance.Gap gap : cavity.clearance().smallest(GAPS)) {
            table.row(
                    "  " + design.parts().get(gap.part()).name() + " to " + gap.to(cavity.laid()),
                    Unit.MM.shown(gap.gap()) + " mm");
        }
        if (!table.isEmpty()) {
            text.append("smallest clearances\n").append(table.text("")).append('\n');
        }
    }

    private void notable() {
        for (String line : Notable.of(cavity)) {
            text.append(line).append('\n');
        }
    }
}
