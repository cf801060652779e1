package twofold.file;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import twofold.design.Along;
import twofold.design.Crystal;
import twofold.design.Design;
import twofold.design.FourNumbers;
import twofold.design.Lever;
import twofold.design.Matrix;
import twofold.design.Mirror;
import twofold.design.Point;
import twofold.design.TwoPowers;
import twofold.layout.Laid;
import twofold.layout.Layout;

class DesignReaderTest {
    private static final String HEAD =
            "{\"format\": \"twofold/1\", \"wavelength_nm\": 800, \"shape\": \"standing-wave\", \"parts\": [\n";
    private static final String A = "{\"name\": \"A\", \"kind\": \"mirror\", \"at_mm\": [0, 0]}";
    private static final String B = "{\"name\": \"B\", \"kind\": \"mirror\", \"at_mm\": [500, 0]}";

    private static Design design(String text) {
        ReadDesign read = Texts.read(text);
        assertThat(read.problems()).isEmpty();
        return read.design().orElseThrow();
    }

    private static List<String> lines(byte[] bytes) {
        return DesignReader.read(bytes).problems().stream()
                .map(p -> p.line("f"))
                .toList();
    }

    @Test
    void theFormatsExampleIsRead() {
        Design design = design(Texts.EXAMPLE);
        assertThat(design.title()).isEqualTo("Lake-ice profiler, pump-side cavity");
        assertThat(design.wavelength()).isEqualTo(800e-9);
        assertThat(design.parts()).hasSize(5);
        Mirror fold = (Mirror) design.parts().get(1);
        assertThat(fold.at()).isEqualTo(new Point(0.48, 0));
        assertThat(fold.radius()).isEqualTo(0.1);
        assertThat(fold.reflectance()).isEqualTo(0.9995);
        assertThat(fold.diameter()).isEqualTo(0.0254);
        Crystal rod = (Crystal) design.parts().get(2);
        assertThat(rod.slab().along()).isEqualTo(Along.MIDDLE);
        assertThat(rod.slab().faces().atBrewster()).isTrue();
        // Set in degrees, millimetres, and without unit.
        assertThat(design.levers().get(0).range())
                .isEqualTo(new Lever.Range.Span(Math.toRadians(4), Math.toRadians(20)));
        assertThat(design.tolerances().get(0).plusMinus()).isEqualTo(0.01);
        assertThat(design.tolerances().get(1).plusMinus()).isEqualTo(0.2e-3);
    }

    @Test
    void everyFieldIsConvertedToSi() {
        Design design = design(Texts.EVERYTHING);
        Matrix box = (Matrix) design.parts().get(2);
        // B in mm is 1e-3 m, C per mm is 1e3 per m.
        assertThat(box.tangential()).isEqualTo(new FourNumbers(1, 12.5e-3, 0, 1));
        assertThat(box.sagittal()).isEqualTo(new FourNumbers(0.5, 0, 1, 2));
        assertThat(((Mirror) design.parts().get(3)).radius()).isEqualTo(0.25);
        assertThat(((Crystal) design.parts().get(11)).thermalPower()).isEqualTo(new TwoPowers(2.5, -1e-7));
        assertThat(((Crystal) design.parts().get(12)).thermalPower()).isEqualTo(new TwoPowers(3, 3));
    }

    @ParameterizedTest
    @CsvSource({"0, Infinity", "-0.0, Infinity", "10, 0.1", "-4, -0.25"})
    void aCurvatureIsARadius(String curvature, double radius) {
        Design design = design(
                HEAD + A + ",\n{\"name\": \"B\", \"kind\": \"mirror\", \"at_mm\": [500, 0], \"curvature_per_m\": "
                        + curvature + "}\n]}");
        assertThat(((Mirror) design.parts().get(1)).radius()).isEqualTo(radius);
        assertThat(DesignWriter.text(design)).doesNotContain("curvature");
    }

    @Test
    void theOrderOfKeysDoesNotMatter() {
        String text = "{\"parts\": [{\"at_mm\": [0, 0], \"kind\": \"mirror\", \"name\": \"A\"}, " + B
                + "], \"shape\": \"standing-wave\", \"wavelength_nm\": 8E+2, \"format\": \"twofold/1\"}";
        assertThat(design(text)).isEqualTo(design(HEAD + A + "," + B + "]}"));
    }

    @Test
    void typedLegsAndAnglesAreLaidOut() {
        Design design = design(Texts.TYPED);
        Laid laid = Layout.of(design).value().orElseThrow();
        // What was typed is what the plan measures, to the rounding of coordinates of a metre.
        double[] legs = {0.48, 0.105, 0.62};
        for (int i = 0; i < legs.length; i++) {
            assertThat(laid.legs().get(i).path()).isCloseTo(legs[i], within(1e-14));
        }
        assertThat(laid.incidence().get(1)).isCloseTo(Math.toRadians(7.9), within(1e-14));
        assertThat(laid.incidence().get(3)).isCloseTo(Math.toRadians(7.9), within(1e-14));
        assertThat(((Mirror) design.parts().get(0)).at()).isEqualTo(new Point(0, 0));
        assertThat(laid.legs().get(0).heading().y()).isCloseTo(Math.sin(Math.toRadians(30)), within(1e-15));
        assertThat(DesignWriter.text(design)).contains("at_mm").doesNotContain("\"leg_mm\"", "turn", "heading");
    }

    @Test
    void typedMirrorsMayFollowMirrorsWithPositions() {
        Design design = design(HEAD + A + ",\n"
                + "{\"name\": \"B\", \"kind\": \"mirror\", \"at_mm\": [500, 0], \"incidence_deg\": 45, \"turn\": \"right\"},\n"
                + "{\"name\": \"C\", \"kind\": \"mirror\", \"leg_mm\": 100}\n]}");
        Point c = ((Mirror) design.parts().get(2)).at();
        assertThat(c.x()).isCloseTo(0.5, within(1e-15));
        assertThat(c.y()).isCloseTo(-0.1, within(1e-15));
    }

    @Test
    void aByteOrderMarkIsSkippedAndCountsForNothing() {
        byte[] bytes = ("\uFEFF" + Texts.EXAMPLE).getBytes(StandardCharsets.UTF_8);
        assertThat(DesignReader.read(bytes).design()).contains(design(Texts.EXAMPLE));
        assertThat(lines("\uFEFF[]".getBytes(StandardCharsets.UTF_8)).get(0)).startsWith("f:1:1: ");
    }

    @ParameterizedTest
    @ValueSource(strings = {"\n", "\r\n", "\r"})
    void linesEndWithLfCrlfOrCr(String end) {
        String text = HEAD + A + ",\n\n{\"name\": \"\uD834\uDD1E\u00E4\", \"kind\": 5}, 7]}";
        assertThat(Texts.lines(text.replace("\n", end)))
                .containsExactly(
                        "f:4:24: parts[1].kind: found 5; accepted: \"mirror\", \"lens\", \"plate\", \"crystal\","
                                + " \"aperture\" or \"matrix\"",
                        "f:4:28: parts[2]: found 7; accepted: an object: a part with a name and a kind");
    }

    @Test
    void whatIsNotUtf8IsRefusedAtItsPlace() throws IOException {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        bytes.write("{\n\"title\": \"\u00E4".getBytes(StandardCharsets.UTF_8));
        bytes.write(0xff);
        bytes.write("\"}".getBytes(StandardCharsets.UTF_8));
        assertThat(lines(bytes.toByteArray()))
                .containsExactly(
                        "f:2:12: document: found the byte 0xff, which is not UTF-8 here; accepted: a text in UTF-8");
        assertThat(lines(new byte[] {'{', (byte) 0xc3}))
                .containsExactly(
                        "f:1:2: document: found the byte 0xc3, which is not UTF-8 here; accepted: a text in UTF-8");
        assertThat(lines(Texts.EXAMPLE.getBytes(StandardCharsets.UTF_16)))
                .containsExactly(
                        "f:1:1: document: found the byte 0xfe, which is not UTF-8 here; accepted: a text in UTF-8");
        // A surrogate in three bytes, and an overlong slash: RFC 3629 forbids both.
        assertThat(lines(new byte[] {'"', (byte) 0xed, (byte) 0xa0, (byte) 0x80}))
                .hasSize(1);
        assertThat(lines(new byte[] {'"', (byte) 0xc0, (byte) 0xaf})).hasSize(1);
    }

    @Test
    void aFileAboveFourMegabytesIsRefused() {
        String text = HEAD + A + ",\n" + B + "\n]}";
        String full = text + " ".repeat(DesignReader.MOST_BYTES - text.length());
        assertThat(Texts.read(full).design()).isPresent();
        assertThat(Texts.lines(full + " "))
                .containsExactly("f:1:1: document: found more than 4 MB; accepted: at most 4000000 bytes");
    }

    private static String marks(int count) {
        return HEAD + A + ",\n"
                + IntStream.range(0, count)
                        .mapToObj(i ->
                                "{\"name\": \"P" + i + "\", \"kind\": \"aperture\", \"along_mm\": " + i * 0.5 + "},\n")
                        .collect(Collectors.joining())
                + B + "\n]}";
    }

    @Test
    void aThousandPartsAreReadAndMoreRefused() {
        assertThat(design(marks(998)).parts()).hasSize(1000);
        assertThat(Texts.lines(marks(999))).containsExactly("f:1:82: parts: found 1001 parts; accepted: at most 1000");
    }

    @Test
    void nestingAndNumbersBeyondAllReasonAreRefusedAtTheirPlace() {
        assertThat(Texts.lines("{\"title\": " + "[".repeat(5000)))
                .containsExactly(
                        "f:1:11: title: found a list of 1; accepted: a text",
                        "f:1:110: title" + "[0]".repeat(99)
                                + ": found lists and objects nested too deep; accepted: at most 100 inside each other");
        assertThat(Texts.lines("{\n \"title\": " + "1".repeat(1001)))
                .containsExactly(
                        "f:2:11: document: found a number that is too long; accepted: at most 1000 characters");
        assertThat(Texts.lines("{\n \"title\": 0." + "1".repeat(1001)))
                .containsExactly(
                        "f:2:11: document: found a number that is too long; accepted: at most 1000 characters");
    }

    @Test
    void longTextsAreCutInMessages() {
        String key = "k".repeat(100_000);
        assertThat(Texts.lines(
                        "{\"format\": \"twofold/2" + "2".repeat(100_000) + "\", \"" + key + "\": \"" + key + "\"}"))
                .hasSize(5)
                .allSatisfy(l -> assertThat(l).hasSizeLessThan(500));
    }

    @Test
    void problemsWithoutEndAreCounted() {
        String text = HEAD + A + ",\n" + B + "], \"tolerances\": [" + "1, ".repeat(100_000) + "1]}";
        List<String> lines = Texts.lines(text);
        assertThat(lines).hasSize(Faults.MOST + 1);
        assertThat(lines.get(Faults.MOST)).contains("found 99001 more problems, which are not listed");
    }

    @Test
    void aFileIsReadFromItsPath(@TempDir Path folder) throws IOException {
        Path file = folder.resolve("design.json");
        Files.writeString(file, Texts.EXAMPLE);
        assertThat(DesignReader.read(file).design()).contains(design(Texts.EXAMPLE));
        assertThatThrownBy(() -> DesignReader.read(folder.resolve("none.json")))
                .isInstanceOf(IOException.class)
                .hasMessage("there is no such file");
        assertThatThrownBy(() -> DesignReader.read(folder)).hasMessage("it is a folder");
    }
}
