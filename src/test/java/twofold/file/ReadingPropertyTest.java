package twofold.file;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.stream.LongStream;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import twofold.RandomDesigns;
import twofold.Samples;
import twofold.cavity.Cavity;
import twofold.cavity.Chain;
import twofold.cavity.Fit;
import twofold.cavity.Reading;
import twofold.cavity.Trial;
import twofold.design.Design;
import twofold.design.Edge;
import twofold.design.Kind;
import twofold.design.Part;
import twofold.design.Place;
import twofold.design.Quantity;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.optics.Plane;

/** What is read off a trial is what the solved design's answer says, number by number, and undefined where it says null. */
class ReadingPropertyTest {
    /** A few last bits: optical lengths are summed in another order. */
    private static final double ROUNDING = 1e-13;

    private Map<String, String> answer = Map.of();
    private Trial trial = Chain.of(laid(Samples.design("gas-tube"))).trial();
    private Chain chain = Chain.of(laid(Samples.design("gas-tube")));
    private int compared;

    static Stream<Design> designs() {
        return Stream.concat(
                Samples.files().stream().map(Samples::design),
                LongStream.range(0, 60).mapToObj(RandomDesigns::of));
    }

    private static Laid laid(Design design) {
        return Layout.of(design).value().orElseThrow();
    }

    @ParameterizedTest
    @MethodSource("designs")
    void readingsAreTheAnswer(Design design) throws IOException {
        Cavity cavity = Cavity.solve(laid(design));
        answer = flat(SolveJson.of(cavity));
        chain = Chain.of(laid(design));
        trial = chain.trial();
        assertThat(trial.run()).isEqualTo(Fit.FITS);
        same("/round_trip_mm", Quantity.ROUND_TRIP, Optional.empty(), Optional.empty());
        same("/fsr_mhz", Quantity.FSR, Optional.empty(), Optional.empty());
        for (int i = 0; answer.containsKey("/legs/" + i + "/from"); i++) {
            Optional<Place> leg = Optional.of(Place.of(word("/legs/" + i + "/to"), word("/legs/" + i + "/from")));
            same("/legs/" + i + "/length_mm", Quantity.LEG, leg, Optional.empty());
            same("/legs/" + i + "/distance_mm", Quantity.DISTANCE, leg, Optional.empty());
        }
        for (Part part : design.parts()) {
            String path = "/incidence_deg/" + part.name();
            if (answer.containsKey(path)) {
                same(path, Quantity.INCIDENCE, Optional.of(Place.of(part.name())), Optional.empty());
            }
        }
        if (trial.hasBeam(Plane.TANGENTIAL)) {
            same("/clearance/0/gap_mm", Quantity.CLEARANCE, Optional.empty(), Optional.empty());
        }
        for (Plane plane : Plane.values()) {
            plane(design, plane);
        }
        ledger();
        assertThat(compared).isGreaterThan(7);
    }

    private void plane(Design design, Plane plane) {
        String at = "/planes/" + plane.word();
        Optional<Plane> p = Optional.of(plane);
        same(at + "/half_trace", Quantity.HALF_TRACE, Optional.empty(), p);
        same(at + "/gouy_deg", Quantity.GOUY, Optional.empty(), p);
        assertThat(read(Quantity.STABILITY_MARGIN, Optional.empty(), p))
                .isCloseTo(1 - Math.abs(Double.parseDouble(word(at + "/half_trace"))), within(1e-13 * size(at)));
        for (int i = 0; answer.containsKey(at + "/stations/" + i + "/at"); i++) {
            String station = at + "/stations/" + i;
            if (!word(station + "/face").equals("exit") && !isSlab(design, word(station + "/at"))) {
                same(station + "/radius_um", Quantity.RADIUS, Optional.of(Place.of(word(station + "/at"))), p);
            }
        }
        for (int i = 0; answer.containsKey(at + "/waists/" + i + "/from"); i++) {
            String waist = at + "/waists/" + i;
            String from = word(waist + "/from");
            String to = word(waist + "/to");
            boolean second = i > 0
                    && from.equals(to)
                    && word(at + "/waists/" + (i - 1) + "/to").equals(from)
                    && word(at + "/waists/" + (i - 1) + "/from").equals(from);
            if (!second) {
                Place place = from.equals(to) ? Place.of(from) : Place.of(from, to);
                same(waist + "/radius_um", Quantity.WAIST_RADIUS, Optional.of(place), p);
            }
        }
        for (int i = 0; answer.containsKey("/crystals/" + i + "/at"); i++) {
            String line = "/crystals/" + i + "/" + plane.word();
            Optional<Place> crystal = Optional.of(Place.of(word("/crystals/" + i + "/at")));
            boolean stable = answer.containsKey(line + "/waist_offset_mm");
            same(stable ? line + "/waist_radius_um" : line, Quantity.WAIST_RADIUS, crystal, p);
            same(stable ? line + "/waist_offset_mm" : line, Quantity.WAIST_OFFSET, crystal, p);
            if (stable) {
                double rayleigh = Double.parseDouble(word(line + "/rayleigh_mm"));
                double offset = Double.parseDouble(word(line + "/waist_offset_mm"));
                assertThat(read(Quantity.WAIST_OFFSET_RAYLEIGHS, crystal, p))
                        .isCloseTo(offset / rayleigh, within(1e-12 * Math.abs(offset / rayleigh) + 1e-15));
            }
        }
    }

    private void ledger() {
        Optional<String> from = Optional.ofNullable(answer.get("/ledger/leg/0"));
        if (from.isPresent()) {
            double split = Reading.of(
                            Quantity.ZONE_EDGE_SPLIT,
                            Optional.of(Place.of(from.get(), word("/ledger/leg/1"))),
                            Optional.empty(),
                            Optional.of(Edge.LOWER),
                            chain)
                    .of(trial);
            assertThat(Quantity.ZONE_EDGE_SPLIT.unit().text(split)).isEqualTo(word("/ledger/split_mm"));
        }
    }

    private double size(String plane) {
        return 1 + Math.abs(Double.parseDouble(word(plane + "/half_trace")));
    }

    private static boolean isSlab(Design design, String part) {
        Kind kind = design.parts().get(design.indexOf(part).orElseThrow()).kind();
        return kind.isSlab();
    }

    private String word(String path) {
        return Objects.requireNonNull(answer.get(path), path);
    }

    private double read(Quantity what, Optional<Place> at, Optional<Plane> plane) {
        return Reading.of(what, at, plane, Optional.empty(), chain).of(trial);
    }

    private void same(String path, Quantity what, Optional<Place> at, Optional<Plane> plane) {
        double value = what.unit().fromSi(read(what, at, plane));
        compared++;
        if (word(path).equals("null")) {
            assertThat(value).as(path).isNaN();
        } else {
            double expected = Double.parseDouble(word(path));
            assertThat(value).as(path).isCloseTo(expected, within(ROUNDING * Math.abs(expected)));
        }
    }

    private static Map<String, String> flat(String json) throws IOException {
        Map<String, String> values = new LinkedHashMap<>();
        try (JsonParser parser = new JsonFactory().createParser(json)) {
            for (JsonToken t = parser.nextToken(); t != null; t = parser.nextToken()) {
                if (t.isScalarValue()) {
                    values.put(parser.getParsingContext().pathAsPointer().toString(), parser.getText());
                }
            }
        }
        return values;
    }
}
