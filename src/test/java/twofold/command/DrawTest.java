package twofold.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.stream.Stream;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import twofold.Samples;
import twofold.picture.Golden;

class DrawTest {
    private static final String SAMPLE = "samples/z-fold-rod.json";

    @TempDir
    @SuppressWarnings("NullAway.Init") // set by JUnit
    Path folder;

    static Stream<Path> samples() {
        return Samples.files().stream();
    }

    private String draw(String file, String... options) throws Exception {
        Path out = folder.resolve("out.svg");
        Run run = Run.of(Stream.concat(Stream.of("draw", file, "--to", out.toString()), Stream.of(options))
                .toArray(String[]::new));
        assertThat(run.status()).as(run.err()).isZero();
        assertThat(run.out()).isEqualTo(out + "\n");
        return Files.readString(out);
    }

    @ParameterizedTest
    @MethodSource("samples")
    void everySampleIsDrawnAsItsKeptPicture(Path sample) throws Exception {
        Golden.matches("sheet-" + sample.getFileName().toString().replace(".json", ""), draw(sample.toString()));
    }

    @Test
    void thePictureIsTheSameUnderEveryLocale() throws Exception {
        String here = draw(SAMPLE);
        Locale before = Locale.getDefault();
        try {
            for (Locale locale : new Locale[] {Locale.GERMANY, Locale.forLanguageTag("tr-TR")}) {
                Locale.setDefault(locale);
                assertThat(draw(SAMPLE)).isEqualTo(here);
            }
        } finally {
            Locale.setDefault(before);
        }
    }

    @Test
    void optionsChangeThePicture() throws Exception {
        String usual = draw(SAMPLE);
        assertThat(draw(SAMPLE, "--theme", "dark")).isNotEqualTo(usual);
        assertThat(draw(SAMPLE, "--magnify", "5")).contains("×5").isNotEqualTo(usual);
        assertThat(draw(SAMPLE, "--size", "900x600")).contains("width=\"900\"").contains("height=\"600\"");
    }

    @Test
    void aPngHasTheAskedSize() throws Exception {
        Path out = folder.resolve("out.PNG");
        assertThat(Run.of("draw", SAMPLE, "--to", out.toString(), "--size", "800x500")
                        .status())
                .isZero();
        var image = ImageIO.read(new ByteArrayInputStream(Files.readAllBytes(out)));
        assertThat(image.getWidth()).isEqualTo(800);
        assertThat(image.getHeight()).isEqualTo(500);
    }

    @ParameterizedTest
    @CsvSource({
        "--to, out.pdf, PDF is to come",
        "--to, out.jpg, .svg or .png",
        "--size, 12x12, from 480x480",
        "--size, wide, from 480x480",
        "--size, 99999x800, to 10000x10000",
        "--magnify, 0.5, from 1 to 10000",
        "--magnify, NaN, from 1 to 10000",
        "--theme, blue, light or dark"
    })
    void whatCannotBeDrawnIsRefusedWithWords(String option, String value, String accepted) {
        Run run = option.equals("--to")
                ? Run.of("draw", SAMPLE, option, value)
                : Run.of("draw", SAMPLE, "--to", folder.resolve("x.svg").toString(), option, value);
        assertThat(run.status()).isEqualTo(Commands.USAGE);
        assertThat(run.out()).isEmpty();
        assertThat(run.err()).contains(option).contains(accepted).hasLineCount(1);
    }

    @Test
    void withoutADisplayTheAnswerIsTextAndPictures() throws Exception {
        var out = new java.io.ByteArrayOutputStream();
        var err = new java.io.ByteArrayOutputStream();
        int status = WithoutWindow.answer(
                SAMPLE, "there is no display", new java.io.PrintStream(out), new java.io.PrintStream(err));
        assertThat(status).isZero();
        assertThat(err.toString(java.nio.charset.StandardCharsets.UTF_8))
                .contains("there is no display")
                .hasLineCount(1);
        var lines =
                out.toString(java.nio.charset.StandardCharsets.UTF_8).lines().toList();
        assertThat(lines).contains("Both planes are stable.");
        Path svg = Path.of(lines.get(lines.size() - 2));
        Path png = Path.of(lines.get(lines.size() - 1));
        assertThat(svg).hasFileName("z-fold-rod.svg").isNotEmptyFile();
        assertThat(png).hasFileName("z-fold-rod.png").isNotEmptyFile();
        Files.delete(svg);
        Files.delete(png);
        Files.delete(svg.toAbsolutePath().getParent());
    }
}
