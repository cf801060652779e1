package twofold.command;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import twofold.cavity.Cavity;
import twofold.cavity.CrystalLine;
import twofold.cavity.Eigenmode;
import twofold.cavity.Face;
import twofold.cavity.State;
import twofold.cavity.Station;
import twofold.design.Aperture;
import twofold.design.Crystal;
import twofold.design.Design;
import twofold.design.Lens;
import twofold.design.Matrix;
import twofold.design.Mirror;
import twofold.design.Part;
import twofold.design.Plate;
import twofold.design.Unit;
import twofold.layout.Clearance;
import twofold.optics.Plane;

/** What is notable about a solved design, in words, the gravest first. */
final class Notable {
    /** Below this margin a plane is called close to its edge; common practice, no source. */
    private static final double SMALL_MARGIN = 0.1;

    /** Clear diameters below this many radii clip a per cent of the power; common practice, no source. */
    private static final double BARE_MINIMUM = 3;

    /** How many gaps are looked at. */
    private static final int MOST_GAPS = 10;

    /** Incidences above this are warned of, rad: 60°. */
    private static final double STEEP = Math.PI / 3;

    private final Cavity cavity;
    private final Design design;
    private final List<String> lines = new ArrayList<>();

    private Notable(Cavity cavity) {
        this.cavity = cavity;
        this.design = cavity.laid().design();
    }

    /** All lines; the first says whether both planes are stable. */
    static List<String> of(Cavity cavity) {
        Notable notable = new Notable(cavity);
        notable.stability();
        notable.plan();
        notable.waists();
        notable.apertures();
        return List.copyOf(notable.lines);
    }

    /** The lines that the plan alone gives rise to. */
    static List<String> ofPlan(Cavity cavity) {
        Notable notable = new Notable(cavity);
        notable.plan();
        return List.copyOf(notable.lines);
    }

    private String name(int part) {
        return design.parts().get(part).name();
    }

    private void stability() {
        State t = cavity.tangential().state();
        State s = cavity.sagittal().state();
        if (t == s) {
            lines.add(
                    switch (t) {
                        case STABLE -> "Both planes are stable.";
                        case UNSTABLE -> "Neither plane is stable: there is no beam.";
                        case EDGE -> "Both planes stand on the edge of stability: there is no beam to speak of.";
                    });
        } else {
            lines.add("The tangential plane is " + said(t) + ", the sagittal plane " + said(s)
                    + ": there is no beam in both.");
        }
        for (Plane plane : Plane.values()) {
            Eigenmode mode = cavity.mode(plane);
            if (mode.isStable() && mode.margin() < SMALL_MARGIN) {
                lines.add("The " + plane.word() + " plane is close to its edge: margin " + Unit.ONE.shown(mode.margin())
                        + ".");
            }
        }
    }

    private static String said(State state) {
        return state == State.EDGE ? "on the edge" : state.word();
    }

    private void plan() {
        for (Clearance.Gap gap : cavity.clearance().smallest(MOST_GAPS)) {
            if (gap.gap() < 0) {
                lines.add("The mount of " + name(gap.part())
                        + (gap.beam().isPresent() ? " cuts the " : " overlaps that of ") + gap.to(cavity.laid())
                        + " by " + Unit.MM.shown(-gap.gap()) + " mm.");
            }
        }
        if (!cavity.clearance().knowsBeams()) {
            lines.add("Clearances are between mounts alone: the tangential plane has no beam.");
        }
        List<String> unchecked = cavity.clearance().unchecked().stream()
                .filter(i -> !(design.parts().get(i) instanceof Aperture)
                        && !(design.parts().get(i) instanceof Matrix))
                .map(this::name)
                .toList();
        if (!unchecked.isEmpty()) {
            lines.add("Not checked for clearance, as no mount is stated: " + String.join(", ", unchecked) + ".");
        }
        cavity.laid().incidence().entrySet().stream()
                .filter(e -> e.getValue() > STEEP)
                .sorted(java.util.Map.Entry.comparingByKey())
                .forEach(e -> lines.add(
                        "Steep incidence at " + name(e.getKey()) + ": " + Unit.DEG.shown(e.getValue()) + "°."));
    }

    private void waists() {
        for (int i = 0; i < design.parts().size(); i++) {
            if (!(design.parts().get(i) instanceof Crystal)) {
                continue;
            }
            for (Plane plane : Plane.values()) {
                Optional<CrystalLine> line = cavity.line(i, plane);
                if (line.isPresent()
                        && !line.get().inside()
                        && !line.get().afterLens().map(CrystalLine::inside).orElse(false)) {
                    lines.add("The " + plane.word() + " waist lies outside " + name(i) + ".");
                }
            }
        }
    }

    private void apertures() {
        for (int i = 0; i < design.parts().size(); i++) {
            OptionalDouble clear = clearDiameter(design.parts().get(i));
            double radius = widest(i);
            if (clear.isPresent() && radius > 0 && clear.getAsDouble() < BARE_MINIMUM * radius) {
                lines.add("The clear diameter of " + name(i) + ", " + Unit.MM.shown(clear.getAsDouble())
                        + " mm, is only " + Unit.fixed(clear.getAsDouble() / radius, 1) + " beam radii.");
            }
        }
    }

    /** The larger footprint half-axis on any face of a part, m; 0 where there is no beam. */
    private double widest(int part) {
        double cos = Math.cos(cavity.laid().incidence().getOrDefault(part, 0.0));
        double widest = 0;
        for (Plane plane : Plane.values()) {
            for (Face face : new Face[] {Face.SURFACE, Face.EXIT}) {
                double radius = cavity.mode(plane)
                        .station(part, face)
                        .map(Station::radius)
                        .orElse(0.0);
                widest = Math.max(widest, plane == Plane.TANGENTIAL ? radius / cos : radius);
            }
        }
        return widest;
    }

    private static OptionalDouble clearDiameter(Part part) {
        return part.match(new Part.Cases<OptionalDouble>() {
            @Override
            public OptionalDouble mirror(Mirror mirror) {
                return OptionalDouble.of(mirror.clearDiameter());
            }

            @Override
            public OptionalDouble lens(Lens lens) {
                return lens.clear();
            }

            @Override
            public OptionalDouble plate(Plate plate) {
                return plate.slab().clear();
            }

            @Override
            public OptionalDouble crystal(Crystal crystal) {
                return crystal.slab().clear();
            }

            @Override
            public OptionalDouble aperture(Aperture aperture) {
                return aperture.hole();
            }

            @Override
            public OptionalDouble matrix(Matrix matrix) {
                return OptionalDouble.empty();
            }
        });
    }
}
