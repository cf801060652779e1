package twofold.file;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.core.util.Separators;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Optional;
import twofold.cavity.Cavity;
import twofold.cavity.CrystalLine;
import twofold.cavity.Eigenmode;
import twofold.cavity.Judgement;
import twofold.cavity.Ledger;
import twofold.cavity.State;
import twofold.cavity.Station;
import twofold.cavity.Waist;
import twofold.design.Design;
import twofold.design.Edge;
import twofold.design.Kind;
import twofold.design.Mirror;
import twofold.design.Place;
import twofold.design.Planes;
import twofold.design.Requirement;
import twofold.design.Shape;
import twofold.design.Unit;
import twofold.layout.Clearance;
import twofold.layout.Leg;
import twofold.optics.Plane;
import twofold.optics.RayMatrix;

/** The answer of a solved design as JSON, {@code "result": "twofold-solve/1"}; lengths in mm, radii in µm, angles in °. */
public final class SolveJson {
    /** The most gaps that an answer lists. */
    private static final int MOST_GAPS = 10;

    private final Cavity cavity;
    private final Design design;
    private final JsonGenerator json;

    private SolveJson(Cavity cavity, JsonGenerator json) {
        this.cavity = cavity;
        this.design = cavity.laid().design();
        this.json = json;
    }

    /** The answer as text that ends in a line feed. */
    public static String of(Cavity cavity) {
        StringWriter text = new StringWriter();
        try (JsonGenerator json = new JsonFactory().createGenerator(text)) {
            DefaultIndenter lines = new DefaultIndenter("  ", "\n");
            json.setPrettyPrinter(new DefaultPrettyPrinter(
                            Separators.createDefaultInstance().withObjectFieldValueSpacing(Separators.Spacing.AFTER))
                    .withObjectIndenter(lines));
            new SolveJson(cavity, json).answer();
        } catch (IOException e) {
            throw new UncheckedIOException("writing to memory failed", e);
        }
        return text.append('\n').toString();
    }

    private void answer() throws IOException {
        json.writeStartObject();
        json.writeStringField("result", "twofold-solve/1");
        json.writeStringField("title", design.title());
        number("wavelength_nm", Unit.NM, design.wavelength());
        json.writeStringField("shape", design.shape().word());
        legs();
        incidences();
        number("round_trip_mm", Unit.MM, cavity.roundTrip());
        number("round_trip_optical_mm", Unit.MM, cavity.opticalRoundTrip());
        number("fsr_mhz", Unit.MHZ, cavity.freeSpectralRange());
        clearance();
        json.writeObjectFieldStart("planes");
        for (Plane plane : Plane.values()) {
            plane(plane);
        }
        json.writeEndObject();
        crystals();
        requirements();
        ledger();
        json.writeEndObject();
    }

    private String name(int part) {
        return design.parts().get(part).name();
    }

    private void number(String name, Unit unit, double si) throws IOException {
        json.writeFieldName(name);
        number(unit, si);
    }

    private void number(Unit unit, double si) throws IOException {
        if (Double.isFinite(si)) {
            json.writeNumber(unit.text(si));
        } else {
            json.writeNull();
        }
    }

    private void legs() throws IOException {
        json.writeArrayFieldStart("legs");
        for (int i = 0; i < cavity.lengths().size(); i++) {
            Leg leg = cavity.laid().legs().get(i);
            Cavity.Lengths lengths = cavity.lengths().get(i);
            json.writeStartObject();
            json.writeStringField("from", name(leg.from()));
            json.writeStringField("to", name(leg.to()));
            number("length_mm", Unit.MM, lengths.path());
            number("distance_mm", Unit.MM, lengths.distance());
            number("optical_mm", Unit.MM, lengths.optical());
            json.writeObjectFieldStart("reduced_mm");
            for (Plane plane : Plane.values()) {
                number(plane.word(), Unit.MM, lengths.reduced(plane));
            }
            json.writeEndObject();
            json.writeEndObject();
        }
        json.writeEndArray();
    }

    /** The incidences of all mirrors but the ends of a standing wave, which are met head-on. */
    private void incidences() throws IOException {
        json.writeObjectFieldStart("incidence_deg");
        int last = design.parts().size() - 1;
        for (int i = 0; i <= last; i++) {
            boolean end = design.shape() == Shape.STANDING_WAVE && (i == 0 || i == last);
            Double angle = cavity.laid().incidence().get(i);
            if (design.parts().get(i) instanceof Mirror && !end && angle != null) {
                number(name(i), Unit.DEG, angle);
            }
        }
        json.writeEndObject();
    }

    private void clearance() throws IOException {
        json.writeArrayFieldStart("clearance");
        for (Clearance.Gap gap : cavity.clearance().smallest(MOST_GAPS)) {
            json.writeStartObject();
            json.writeStringField("part", name(gap.part()));
            json.writeStringField("to", gap.to(cavity.laid()));
            number("gap_mm", Unit.MM, gap.gap());
            json.writeEndObject();
        }
        json.writeEndArray();
    }

    private void plane(Plane plane) throws IOException {
        Eigenmode mode = cavity.mode(plane);
        json.writeObjectFieldStart(plane.word());
        json.writeStringField("state", mode.state().word());
        number("half_trace", Unit.ONE, mode.halfTrace());
        number("gouy_deg", Unit.DEG, mode.gouy());
        if (!mode.isStable()) {
            number("magnification", Unit.ONE, mode.state() == State.EDGE ? 1 : mode.magnification());
        }
        RayMatrix m = mode.roundTrip();
        json.writeArrayFieldStart("round_trip");
        number(Unit.ONE, m.a());
        number(Unit.MM, m.b());
        // 1/mm is 1000/m: a length in mm upside down.
        number(Unit.ONE, Unit.MM.toSi(m.c()));
        number(Unit.ONE, m.d());
        json.writeEndArray();
        if (mode.isStable()) {
            stations(mode.stations());
            waists(mode.waists());
        } else {
            json.writeNullField("stations");
            json.writeNullField("waists");
        }
        json.writeEndObject();
    }

    private void stations(List<Station> stations) throws IOException {
        json.writeArrayFieldStart("stations");
        for (Station s : stations) {
            json.writeStartObject();
            json.writeStringField("at", name(s.part()));
            json.writeStringField("face", s.face().word());
            number("radius_um", Unit.UM, s.radius());
            number("wavefront_curvature_per_m", Unit.PER_M, s.curvature());
            json.writeEndObject();
        }
        json.writeEndArray();
    }

    private void waists(List<Waist> waists) throws IOException {
        json.writeArrayFieldStart("waists");
        for (Waist w : waists) {
            json.writeStartObject();
            json.writeStringField("from", name(w.from()));
            json.writeStringField("to", name(w.to()));
            number("radius_um", Unit.UM, w.radius());
            number("after_mm", Unit.MM, w.after());
            number("rayleigh_mm", Unit.MM, w.rayleigh());
            json.writeBooleanField("real", w.isReal());
            json.writeEndObject();
        }
        json.writeEndArray();
    }

    private void crystals() throws IOException {
        json.writeArrayFieldStart("crystals");
        for (int i = 0; i < design.parts().size(); i++) {
            if (design.parts().get(i).kind() != Kind.CRYSTAL) {
                continue;
            }
            json.writeStartObject();
            json.writeStringField("at", name(i));
            for (Plane plane : Plane.values()) {
                json.writeFieldName(plane.word());
                CrystalLine line = cavity.line(i, plane).orElse(null);
                if (line == null) {
                    json.writeNull();
                } else {
                    line(line);
                }
            }
            json.writeEndObject();
        }
        json.writeEndArray();
    }

    private void line(CrystalLine line) throws IOException {
        json.writeStartObject();
        number("waist_radius_um", Unit.UM, line.radius());
        number("waist_offset_mm", Unit.MM, line.offset());
        number("shift_to_centre_mm", Unit.MM, line.shiftToCentre());
        number("rayleigh_mm", Unit.MM, line.rayleigh());
        json.writeBooleanField("inside", line.inside());
        if (line.afterLens().isPresent()) {
            json.writeFieldName("after_lens");
            line(line.afterLens().get());
        }
        json.writeEndObject();
    }

    private void requirements() throws IOException {
        json.writeArrayFieldStart("requirements");
        for (Judgement j : cavity.judgements()) {
            Requirement r = j.requirement();
            json.writeStartObject();
            json.writeStringField("what", r.what().json());
            json.writeFieldName("at");
            place(r.at());
            word("plane", r.plane().map(Planes::word));
            if (r.what().hasEdge()) {
                word("edge", r.edge().map(Edge::word));
            }
            if (r.over().isPresent()) {
                json.writeStringField("over", r.over().get());
            }
            number("value", r.what().unit(), j.value());
            number("margin", Unit.ONE, j.margin());
            switch (j.verdict()) {
                case MET -> json.writeBooleanField("met", true);
                case NOT_MET -> json.writeBooleanField("met", false);
                case WISH, OPEN -> json.writeNullField("met");
            }
            json.writeEndObject();
        }
        json.writeEndArray();
    }

    private void place(Optional<Place> at) throws IOException {
        if (at.isEmpty()) {
            json.writeNull();
        } else if (at.get().second().isEmpty()) {
            json.writeString(at.get().first());
        } else {
            pair(at.get().first(), at.get().second().get());
        }
    }

    private void pair(String first, String second) throws IOException {
        json.writeStartArray();
        json.writeString(first);
        json.writeString(second);
        json.writeEndArray();
    }

    private void word(String name, Optional<String> word) throws IOException {
        if (word.isPresent()) {
            json.writeStringField(name, word.get());
        } else {
            json.writeNullField(name);
        }
    }

    private void ledger() throws IOException {
        if (cavity.ledger().isEmpty()) {
            json.writeNullField("ledger");
            return;
        }
        Ledger ledger = cavity.ledger().get();
        Leg leg = cavity.laid().legs().get(ledger.leg());
        json.writeObjectFieldStart("ledger");
        json.writeFieldName("leg");
        pair(name(leg.from()), name(leg.to()));
        json.writeStringField("edge", ledger.edge().word());
        json.writeArrayFieldStart("shares");
        for (Ledger.Share share : ledger.shares()) {
            json.writeStartObject();
            json.writeStringField("part", name(share.part()));
            number("mm", Unit.MM, share.length());
            json.writeEndObject();
        }
        json.writeEndArray();
        number("sum_mm", Unit.MM, ledger.sum());
        number("split_mm", Unit.MM, ledger.split());
        json.writeEndObject();
    }
}
