package twofold.file;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import twofold.cavity.Cavity;
import twofold.layout.Layout;

/** The JSON answer: its shape, and the numbers that the definition of the format prints for its own example. */
class SolveJsonTest {
    private static String example() throws IOException {
        return Files.readString(Path.of("src/test/resources/twofold/z-fold.json"));
    }

    private static String answer(String design) {
        ReadDesign read = DesignReader.read(design.getBytes(StandardCharsets.UTF_8));
        assertThat(read.problems()).isEmpty();
        return SolveJson.of(
                Cavity.solve(Layout.of(read.design().orElseThrow()).value().orElseThrow()));
    }

    /** Every scalar of a JSON text by its path, "/planes/tangential/waists/1/radius_um". */
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

    /** Rounded as printed in the definition of the format, section 3, the ledger in that of the ledger; its clearance, 0.45 mm, takes the beam to widen
     * in straight lines between mirrors and is left out. */
    @ParameterizedTest
    @CsvSource({
        "/legs/1/length_mm, 105.0",
        "/legs/1/distance_mm, 104.327",
        "/legs/1/optical_mm, 108.8",
        "/legs/1/reduced_mm/tangential, 100.917",
        "/legs/1/reduced_mm/sagittal, 102.841",
        "/incidence_deg/Fold 1, 7.9",
        "/incidence_deg/Fold 2, 7.9",
        "/round_trip_mm, 2410.0",
        "/round_trip_optical_mm, 2417.6",
        "/fsr_mhz, 124.0",
        "/planes/tangential/half_trace, -0.2390",
        "/planes/tangential/gouy_deg, 103.8",
        "/planes/tangential/round_trip/0, -0.2390",
        "/planes/tangential/round_trip/1, 1094.77",
        "/planes/tangential/round_trip/2, -0.00086125",
        "/planes/tangential/round_trip/3, -0.2390",
        "/planes/tangential/stations/2/radius_um, 39.0",
        "/planes/tangential/stations/2/wavefront_curvature_per_m, -12.5",
        "/planes/tangential/waists/1/radius_um, 22.0",
        "/planes/tangential/waists/1/after_mm, 50.25",
        "/planes/tangential/waists/1/rayleigh_mm, 1.90",
        "/crystals/0/tangential/waist_radius_um, 38.7",
        "/crystals/0/tangential/shift_to_centre_mm, -0.208",
        "/crystals/0/tangential/rayleigh_mm, 10.35",
        "/crystals/0/sagittal/waist_radius_um, 22.3",
        "/crystals/0/sagittal/waist_offset_mm, -0.364",
        "/crystals/0/sagittal/shift_to_centre_mm, -0.207",
        "/crystals/0/sagittal/rayleigh_mm, 3.44",
        "/ledger/shares/0/mm, -0.954",
        "/ledger/shares/1/mm, 1.924",
        "/ledger/shares/2/mm, -0.954",
        "/ledger/sum_mm, 0.016",
        "/ledger/split_mm, 0.016"
    })
    void theExampleHasItsPrintedNumbers(String path, BigDecimal printed) throws IOException {
        Map<String, String> values = flat(answer(example()));
        assertThat(values).containsKey(path);
        BigDecimal got = new BigDecimal(values.getOrDefault(path, "0"));
        assertThat(got.setScale(printed.scale(), RoundingMode.HALF_EVEN)).isEqualByComparingTo(printed);
    }

    @Test
    void theExampleHasItsPrintedWords() throws IOException {
        assertThat(flat(answer(example())))
                .containsEntry("/result", "twofold-solve/1")
                .containsEntry("/planes/tangential/state", "stable")
                .containsEntry("/planes/tangential/stations/2/at", "Rod")
                .containsEntry("/planes/tangential/stations/2/face", "entry")
                .containsEntry("/planes/tangential/waists/1/from", "Fold 1")
                .containsEntry("/planes/tangential/waists/1/to", "Rod")
                .containsEntry("/planes/tangential/waists/1/real", "false")
                .containsEntry("/crystals/0/tangential/inside", "true")
                .containsEntry("/clearance/0/part", "Fold 2")
                .containsEntry("/clearance/0/to", "beam End A/Fold 1")
                .containsEntry("/requirements/0/what", "waist_offset_rayleighs")
                .containsEntry("/requirements/0/at", "Rod")
                .containsEntry("/requirements/0/plane", "both")
                .containsEntry("/requirements/0/met", "false")
                .containsEntry("/requirements/1/plane", "null")
                .containsEntry("/requirements/1/met", "true")
                .containsEntry("/ledger/leg/0", "Fold 1")
                .containsEntry("/ledger/leg/1", "Fold 2")
                .containsEntry("/ledger/edge", "lower")
                .containsEntry("/ledger/shares/1/part", "Rod")
                .doesNotContainKeys("/incidence_deg/End A", "/incidence_deg/End B");
    }

    /** The printed offset, −1.135, is the 7.9° of the typed angles; the plan of the example comes to 7.90018°. */
    @Test
    void theTangentialOffsetIsThatOfThePlan() throws IOException {
        assertThat(Double.parseDouble(
                        flat(answer(example())).getOrDefault("/crystals/0/tangential/waist_offset_mm", "")))
                .isBetween(-1.1365, -1.1345);
    }

    @Test
    void aPlaneWithoutABeamHasNulls() throws IOException {
        Map<String, String> values = flat(answer(example().replace("[378.9482, 25.9354]", "[300, 30]")));
        assertThat(values)
                .containsEntry("/planes/tangential/state", "unstable")
                .containsEntry("/planes/tangential/gouy_deg", "null")
                .containsEntry("/planes/tangential/stations", "null")
                .containsEntry("/planes/tangential/waists", "null")
                .containsEntry("/crystals/0/tangential", "null")
                .containsEntry("/crystals/0/sagittal", "null")
                .containsKey("/planes/tangential/round_trip/3");
        assertThat(values)
                .as("undefined values, and no zone that would hold the cavity")
                .containsEntry("/requirements/0/value", "null")
                .containsEntry("/requirements/0/margin", "null")
                .containsEntry("/requirements/0/met", "false")
                .containsEntry("/ledger", "null");
        double h = Math.abs(Double.parseDouble(values.getOrDefault("/planes/tangential/half_trace", "0")));
        assertThat(Double.parseDouble(values.getOrDefault("/planes/tangential/magnification", "0")))
                .isCloseTo(h + Math.sqrt(h * h - 1), org.assertj.core.api.Assertions.withinPercentage(1e-9));
    }

    @Test
    void aThermalLensPartsTheCrystalLine() throws IOException {
        Map<String, String> values =
                flat(answer(example().replace("\"index\": 1.76", "\"index\": 1.76, \"thermal_power_per_m\": [2, 3]")));
        assertThat(values)
                .containsKeys(
                        "/crystals/0/tangential/waist_offset_mm",
                        "/crystals/0/tangential/after_lens/waist_offset_mm",
                        "/crystals/0/sagittal/after_lens/rayleigh_mm");
        assertThat(values.keySet().stream().filter(k -> k.matches("/planes/tangential/waists/\\d+/from")))
                .as("two stretches inside the rod instead of one")
                .hasSize(6);
    }

    @Test
    void aRequirementSaysItsEdgeItsLegItsLeverAndWhatIsNoQuestion() throws IOException {
        String asked = """
                "requirements": [
                  { "what": "zone_edge_split_mm", "at": ["Fold 1", "Fold 2"], "edge": "lower", "equals": 0.02, "within": 0.01 },
                  { "what": "plan_width_mm", "prefer": "smallest" },
                  { "what": "clearance_mm", "at_least": 0, "over": "gap" } ],
                "old":""";
        Map<String, String> values =
                flat(answer(example().replace("\"requirements\":", asked).replaceAll("(?s)\"old\":.*?\\],", "")));
        assertThat(values)
                .containsEntry("/requirements/0/at/0", "Fold 1")
                .containsEntry("/requirements/0/at/1", "Fold 2")
                .containsEntry("/requirements/0/plane", "null")
                .containsEntry("/requirements/0/edge", "lower")
                .containsEntry("/requirements/0/met", "true")
                .containsEntry("/requirements/1/at", "null")
                .containsEntry("/requirements/1/margin", "null")
                .containsEntry("/requirements/1/met", "null")
                .containsEntry("/requirements/2/over", "gap")
                .doesNotContainKey("/requirements/1/edge");
        assertThat(Double.parseDouble(values.getOrDefault("/requirements/0/value", "")))
                .isEqualTo(Double.parseDouble(values.getOrDefault("/ledger/split_mm", "0")));
        assertThat(Double.parseDouble(values.getOrDefault("/requirements/0/margin", "")))
                .isBetween(0.64, 0.66);
    }
}
