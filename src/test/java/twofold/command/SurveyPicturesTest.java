package twofold.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** {@code sweep} and {@code map} with {@code --picture}: what is written, what it says, and what is refused. */
class SurveyPicturesTest {
    private static final String ROD = "samples/z-fold-rod.json";

    @TempDir
    @SuppressWarnings("NullAway.Init") // set by JUnit
    Path folder;

    private String svg(String... arguments) throws Exception {
        Path out = folder.resolve("out.svg");
        List<String> all = new ArrayList<>(Arrays.asList(arguments));
        all.addAll(List.of("--picture", out.toString()));
        Run run = Run.of(all.toArray(String[]::new));
        assertThat(run.status()).as(run.err()).isZero();
        assertThat(run.out()).isEqualTo(out + "\n");
        assertThat(run.err()).isEmpty();
        return Files.readString(out);
    }

    private String sweep(String... more) throws Exception {
        return svg(all(
                List.of("sweep", ROD, "--lever", "gap", "--of", "radius_um@Rod:tangential", "roundness@Rod"), more));
    }

    private String map(String... more) throws Exception {
        return svg(all(
                List.of("map", ROD, "--lever", "gap", "--lever", "fold", "--of", "roundness@Rod", "--size", "23x17"),
                more));
    }

    private static String[] all(List<String> some, String... more) {
        List<String> all = new ArrayList<>(some);
        all.addAll(Arrays.asList(more));
        return all.toArray(String[]::new);
    }

    @Test
    void aSweepShowsZonesWithNamedEdgesBothPlanesAndWhatIsRequired() throws Exception {
        String svg = sweep();
        assertThat(svg)
                .contains("<title>Ice profiler, tunable bench source", ", over gap</title>")
                .contains(">C = 0<", ">A = 0<", "tangential, stable where hatched", "sagittal, stable where hatched")
                .contains("Radius at Rod, tangential", "Roundness at Rod", "now 104.6");
        assertThat(sweep("--of", "roundness@Output coupler")).contains("required");
    }

    @Test
    void aMapShowsColoursZonesAndWhereAllHolds() throws Exception {
        assertThat(map())
                .contains("Roundness at Rod over gap and fold</title>")
                .contains("<image ", "tangential zone, hatched where alone", "sagittal zone, hatched where alone")
                .contains("all requirements hold", "gap, mm", "fold, °", "now gap 104.6");
    }

    @Test
    void optionsChangeThePictureAndLocalesDoNot() throws Exception {
        assertThat(sweep("--theme", "dark")).isNotEqualTo(sweep());
        assertThat(map("--theme", "dark")).isNotEqualTo(map());
        assertThat(sweep("--pixels", "700x500")).contains("width=\"700\"").contains("height=\"500\"");
        assertThat(sweep("--points", "17")).isNotEqualTo(sweep());
        String here = map();
        Locale before = Locale.getDefault();
        try {
            Locale.setDefault(Locale.forLanguageTag("tr-TR"));
            assertThat(map()).isEqualTo(here);
        } finally {
            Locale.setDefault(before);
        }
    }

    @Test
    void aPngHasTheAskedSize() throws Exception {
        Path out = folder.resolve("out.PNG");
        Run run = Run.of(
                "map",
                "samples/triangle-ring.json",
                "--lever",
                "apex",
                "--lever",
                "radius",
                "--of",
                "half_trace:sagittal",
                "--size",
                "30x2",
                "--picture",
                out.toString(),
                "--pixels",
                "640x480");
        assertThat(run.status()).as(run.err()).isZero();
        var image = ImageIO.read(new ByteArrayInputStream(Files.readAllBytes(out)));
        assertThat(image.getWidth()).isEqualTo(640);
        assertThat(image.getHeight()).isEqualTo(480);
    }

    @Test
    void progressGoesToTheErrorStream() {
        Run run = Run.of(all(
                List.of("map", ROD, "--lever", "gap", "--lever", "fold", "--of", "fsr_mhz", "--size", "40x40"),
                "--progress",
                "--picture",
                folder.resolve("m.png").toString()));
        assertThat(run.out()).isEqualTo(folder.resolve("m.png") + "\n");
        assertThat(run.err()).startsWith("twofold: map 10 %\n").endsWith("twofold: map 100 %\n");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "S,--picture,o.pdf | --picture: found \"o.pdf\"; accepted: a name that ends in .svg or .png; PDF is to come",
                "S,--picture,o.jpg | accepted: a name that ends in .svg or .png",
                "S,--picture,o.svg,--pixels,20x20 | --pixels: found \"20x20\"; accepted: width x height in px, from 260x200",
                "S,--picture,o.svg,--theme,blue | --theme: found \"blue\"; accepted: light or dark",
                "S,--theme,dark | --theme: found \"dark\"; accepted: only beside --picture",
                "S,--pixels,900x600 | --pixels: found \"900x600\"; accepted: only beside --picture",
                "S,--picture,o.svg,--points,10001 | --points: found 10001; accepted: 2 to 10000 for a picture",
                "M,--picture,o.pdf | PDF is to come",
                "M,--picture,o.svg,--pixels,20x20 | from 260x220 to 10000x10000",
                "M,--picture,o.svg,--size,1001x4 | --size: found \"1001x4\"; accepted: up to 1000x1000 for a picture",
                "M,--picture,o.svg,--size,4000x2500 | accepted: up to 1000x1000 for a picture",
            })
    void whatCannotBeDrawnIsRefusedWithWords(String arguments, String said) {
        String sweep = "sweep," + ROD + ",--lever,gap,--of,fsr_mhz";
        String map = "map," + ROD + ",--lever,gap,--lever,fold,--of,fsr_mhz";
        Run run = Run.of(
                arguments.replaceFirst("^S", sweep).replaceFirst("^M", map).split(",", -1));
        assertThat(run.status()).isEqualTo(Commands.USAGE);
        assertThat(run.out()).isEmpty();
        assertThat(run.err()).contains(said).hasLineCount(1);
    }

    @Test
    void aPictureThatCannotBeWrittenIsSaidSo() {
        Run run = Run.of(all(
                List.of("sweep", ROD, "--lever", "gap", "--of", "fsr_mhz", "--picture"),
                folder.resolve("nowhere").resolve("o.svg").toString()));
        assertThat(run.status()).isEqualTo(Commands.FILE);
        assertThat(run.out()).isEmpty();
        assertThat(run.err()).contains("there is no folder").hasLineCount(1);
    }
}
