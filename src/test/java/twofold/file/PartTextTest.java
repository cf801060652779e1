package twofold.file;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import twofold.RandomDesigns;
import twofold.Samples;
import twofold.design.Design;
import twofold.design.Part;

class PartTextTest {
    private static final String IRIS = "{ \"name\": \"Iris\", \"kind\": \"aperture\", \"along_mm\": 20 }";

    static List<Path> samples() {
        return Samples.files();
    }

    private static List<String> lines(String text) {
        return PartText.read(text).problems().stream()
                .map(p -> p.line("clipboard"))
                .toList();
    }

    @ParameterizedTest
    @MethodSource("samples")
    void partsComeBackAsTheyWere(Path sample) {
        List<Part> parts = Samples.design(sample).parts();
        PartText.Read read = PartText.read(PartText.of(parts));
        assertThat(read.problems()).isEmpty();
        assertThat(read.parts()).isEqualTo(parts);
        Part one = parts.get(parts.size() / 2);
        assertThat(PartText.read(PartText.of(List.of(one))).parts()).containsExactly(one);
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
    void randomPartsComeBackAsTheyWere(long seed) {
        List<Part> parts = RandomDesigns.of(seed).parts();
        String text = PartText.of(parts);
        assertThat(PartText.read(text).parts()).isEqualTo(parts);
        assertThat(PartText.of(PartText.read(text).parts())).isEqualTo(text);
    }

    @Test
    void theTextIsTheListOfPartsOfTheDesignFile() {
        Design design = Samples.design("z-fold-rod");
        Matcher parts = Pattern.compile("(?s)  \"parts\": \\[.*?\n  \\]").matcher(DesignWriter.text(design));
        assertThat(parts.find()).isTrue();
        assertThat(PartText.of(design.parts())).isEqualTo("{\n" + parts.group() + "\n}\n");
    }

    @Test
    void aListAloneIsReadToo() {
        assertThat(PartText.read("[" + IRIS + "]").parts())
                .isEqualTo(PartText.read("{\"parts\":[" + IRIS + "]}").parts())
                .hasSize(1);
    }

    @Test
    void nothingHangsOnTheWavelengthOrOnADesign() {
        // No design's first part may be a crystal, and the material has no index at the shortest wavelength.
        String rod = "[{ \"name\": \"Rod\", \"kind\": \"crystal\", \"along_mm\": 5, \"length_mm\": 5,"
                + " \"material\": \"sapphire e\", \"incidence_deg\": \"brewster\" }]";
        assertThat(PartText.read(rod).problems()).isEmpty();
    }

    @Test
    void problemsHaveTheirPlaceAndSayWhatIsAccepted() {
        String text = "[\n  " + IRIS + ",\n  " + IRIS.replace("20", "-1").replace("Iris", "Second") + "\n]";
        assertThat(lines(text))
                .singleElement()
                .asString()
                .startsWith("clipboard:3:")
                .contains("parts[1].along_mm: found -1; accepted: ");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '~',
            value = {
                "~~|clipboard:1:1: document: found no text",
                "hello|clipboard:1:1: ",
                "7|clipboard:1:1: document: found 7",
                "[]|clipboard:1:1: parts: found no part",
                "{}|clipboard:1:1: parts: missing",
                "{\"part\":[]}|part: found \"part\"",
                "{\"parts\":7}|clipboard:1:10: parts: found 7",
                "[7]|clipboard:1:2: parts[0]: found 7",
                "[{\"name\":\"A\"}]|parts[0].kind: missing",
                "[{\"name\":\"A\",\"kind\":\"miror\"}]|parts[0].kind: found \"miror\"",
                "[{\"name\":\"A\",\"kind\":\"mirror\"}]|parts[0].at_mm: missing",
                "[{\"name\":\"A\",\"kind\":\"mirror\",\"leg_mm\":3}]|parts[0].leg_mm: found leg_mm outside a design; accepted: at_mm instead",
                "[{\"name\":\"A\",\"kind\":\"mirror\",\"at_mm\":[0,0],\"roc_mm\":NaN}]|parts[0].roc_mm: found NaN",
                "[{\"name\":\"A\",\"kind\":\"mirror\",\"at_mm\":[0,0],\"reflectance\":2}]|parts[0].reflectance: found 2",
                "[{\"name\":\"A\",\"kind\":\"mirror\",\"at_mm\":[0,0],|parts[0]",
                "[{\"name\":\"A\",\"kind\":\"mirror\",\"at_mm\":[0,0]},{\"name\":\"A\",\"kind\":\"mirror\",\"at_mm\":[9,0]}]|parts[1].name: found \"A\" a second time",
            })
    void aBrokenPartIsRefusedInWords(String text, String expected) {
        assertThat(PartText.read(text).parts()).isEmpty();
        assertThat(lines(text)).anySatisfy(l -> assertThat(l).contains(expected).contains("accepted: "));
    }

    @Test
    void oneFaultIsOneProblem() {
        for (String broken : List.of(
                "[{\"name\":7,\"kind\":\"mirror\",\"at_mm\":[0,0]}]",
                "[{\"name\":\"A\",\"kind\":7,\"at_mm\":[0,0]}]",
                "[{\"name\":\"A\",\"kind\":\"mirror\",\"at_mm\":[0]}]",
                "[{\"name\":\"A\",\"kind\":\"mirror\",\"at_mm\":[0,0]},7]")) {
            assertThat(lines(broken)).as(broken).hasSize(1);
        }
    }
}
