package twofold.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class CommandsTest {
    private static final String DESIGN = "src/test/resources/twofold/z-fold.json";

    @TempDir
    @SuppressWarnings("NullAway.Init") // set by JUnit
    Path folder;

    private String file(String name, String text) throws IOException {
        return Files.writeString(folder.resolve(name), text).toString();
    }

    private static String design() throws IOException {
        return Files.readString(Path.of(DESIGN));
    }

    private String unstable() throws IOException {
        return file("unstable.json", design().replace("[378.9482, 25.9354]", "[300, 30]"));
    }

    @Test
    void solveAnswersAsTextOnTheOutStreamAlone() {
        Run run = Run.of("solve", DESIGN);
        assertThat(run.status()).isZero();
        assertThat(run.err()).isEmpty();
        assertThat(run.out())
                .contains("tangential  stable      -0.239   0.761     103.83°")
                .contains("sagittal    stable      -0.209   0.791     102.09°")
                .contains("Rod, entry                    39.0 µm   26.3 µm      0.673")
                .contains("  tangential  38.7 µm        -1.14 mm         10.35 mm  -0.21 mm")
                .contains("astigmatism ledger: the lower edge along Fold 1/Fold 2, tangential minus sagittal")
                .containsPattern(
                        "  Rod +1\\.924 mm\n  Fold 2 +-0\\.954 mm\n  sum +0\\.016 mm\n  edge split +0\\.016 mm")
                .containsPattern("waist_offset_rayleighs@Rod:both +-0\\.110 +-0\\.1 to 0\\.1 +-0\\.10 +not met")
                .containsPattern("roundness@End B +0\\.989 +at least 0\\.95 +0\\.04 +met")
                .contains("Both planes are stable.")
                .contains("Not checked for clearance, as no mount is stated: Rod.");
    }

    @Test
    void aFileAloneIsAnsweredAsText() {
        Run run = Run.of(DESIGN);
        assertThat(run.status()).isZero();
        assertThat(run.out()).isEqualTo(Run.of("solve", DESIGN).out());
    }

    @Test
    void unstableIsAnAnswer() throws IOException {
        Run run = Run.of("solve", unstable());
        assertThat(run.status()).isZero();
        assertThat(run.out())
                .contains("unstable")
                .contains("Neither plane is stable: there is no beam.")
                .contains("astigmatism ledger: none along Fold 1/Fold 2, as the sagittal plane is not stable")
                .containsPattern("roundness@End B +undefined +at least 0\\.95 +- +not met")
                .contains("Clearances are between mounts alone: the tangential plane has no beam.")
                .doesNotContain("NaN");
        assertThat(Run.of("solve", unstable(), "--json").out())
                .contains("\"stations\": null")
                .doesNotContain("NaN");
    }

    @Test
    void placeSaysWhereEverythingStandsAndWritesIt() throws IOException {
        Path out = folder.resolve("laid-out.json");
        Run run = Run.of("place", DESIGN, "--write", out.toString());
        assertThat(run.status()).isZero();
        assertThat(run.out()).contains("Rod     crystal  429.47  12.97          52.50     60.40°");
        assertThat(Files.readString(out)).contains("\"at_mm\": [378.9482, 25.9354]");
        assertThat(Run.of("solve", out.toString()).out())
                .isEqualTo(Run.of("solve", DESIGN).out());
        byte[] once = Files.readAllBytes(out);
        Run.of("place", out.toString(), "--write", out.toString());
        assertThat(Files.readAllBytes(out)).isEqualTo(once);
    }

    @Test
    void placeLaysTypedLegsOut() throws IOException {
        String typed = design().replace(
                        "\"at_mm\": [480, 0]", "\"leg_mm\": 480, \"incidence_deg\": 7.9, \"turn\": \"left\"")
                .replace(
                        "\"at_mm\": [378.9482, 25.9354]",
                        "\"leg_mm\": 105, \"incidence_deg\": 7.9, \"turn\": \"right\"")
                .replace("\"at_mm\": [998.9482, 25.9354]", "\"leg_mm\": 620");
        String file = file("typed.json", typed);
        Path out = folder.resolve("out.json");
        assertThat(Run.of("place", file, "--write", out.toString()).status()).isZero();
        assertThat(Files.readString(out))
                .contains("at_mm")
                .doesNotContain("leg_mm\":")
                .doesNotContain("turn");
        assertThat(Run.of("place", out.toString()).out())
                .contains("End A to Fold 1   480.00")
                .contains("Fold 1 to Fold 2  105.00")
                .contains("Fold 2 to End B   620.00")
                .contains("378.95");
    }

    @Test
    void placeRefusesToWriteWhereItCannot() {
        Run run = Run.of(
                "place", DESIGN, "--write", folder.resolve("none/out.json").toString());
        assertThat(run.status()).isEqualTo(Commands.FILE);
        assertThat(run.out()).isEmpty();
        assertThat(run.err()).contains("out.json").hasLineCount(1);
        assertThat(Run.of("place", DESIGN, "--write", "out.txt").status()).isEqualTo(Commands.USAGE);
    }

    @Test
    void checkReportsEveryErrorOfEveryFile() throws IOException {
        String bad = file(
                "bad.json",
                design().replace("\"roc_mm\": 100 }", "\"rock_mm\": 100 }").replace("0.98", "1.98"));
        Run run = Run.of("check", DESIGN, bad);
        assertThat(run.status()).isEqualTo(Commands.NO);
        assertThat(run.out()).isEqualTo(DESIGN + ": no problems\n");
        assertThat(run.err().lines())
                .hasSize(2)
                .allMatch(l -> l.startsWith(bad + ":"))
                .anyMatch(l -> l.contains(":12:73: parts[3].rock_mm: ") && l.contains("nearest is \"roc_mm\""))
                .anyMatch(l -> l.contains(":13:88: parts[4].reflectance: found 1.98"));
    }

    @Test
    void aFileThatCannotBeOpenedWinsOverProblems() throws IOException {
        String bad = file("bad.json", "{}");
        String none = folder.resolve("none.json").toString();
        Run run = Run.of("check", none, bad);
        assertThat(run.status()).isEqualTo(Commands.FILE);
        assertThat(run.err()).contains(none + ": there is no such file").contains(bad + ":1:1:");
        assertThat(Run.of("check", bad).status()).isEqualTo(Commands.NO);
        assertThat(Run.of("solve", bad).status()).isEqualTo(Commands.FILE);
        assertThat(Run.of("solve", folder.toString()).status()).isEqualTo(Commands.FILE);
        assertThat(Run.of("solve", folder.toString()).err()).contains("folder").hasLineCount(1);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "slove x.json",
                "solve",
                "solve a.json b.json",
                "solve --jsn a.json",
                "place",
                "check",
                "a.txt",
                "a.json b.json"
            })
    void wrongUsageEndsWithTwoAndACleanOutStream(String arguments) {
        Run run = Run.of(arguments.split(" ", -1));
        assertThat(run.status()).isEqualTo(Commands.USAGE);
        assertThat(run.out()).isEmpty();
        assertThat(run.err()).startsWith("twofold: ").doesNotContain("\tat ");
    }

    @Test
    void aMisspelledCommandIsGuessed() {
        assertThat(Run.of("slove", DESIGN).err()).contains("nearest is \"solve\"");
    }

    @ParameterizedTest
    @ValueSource(strings = {"solve", "place", "check", "sweep", "map"})
    void everyCommandHasHelpWithAnExample(String command) {
        Run run = Run.of(command, "--help");
        assertThat(run.status()).isZero();
        assertThat(run.out()).contains("Example:").contains("  twofold " + command + " samples/");
        assertThat(run.err()).isEmpty();
    }

    @Test
    void withoutArgumentsItSaysHowToUseIt() {
        Run run = Run.of();
        assertThat(run.status()).isZero();
        assertThat(run.out()).contains("Usage:").contains("solve").contains("Example:");
    }

    @Test
    void answersAreTheSameUnderEveryLocale() {
        Locale before = Locale.getDefault();
        try {
            Stream<Run> runs = Stream.of(Locale.ROOT, Locale.GERMANY, Locale.forLanguageTag("tr-TR"))
                    .map(locale -> {
                        Locale.setDefault(locale);
                        Run text = Run.of("solve", DESIGN);
                        Run json = Run.of("solve", DESIGN, "--json");
                        Run place = Run.of("place", DESIGN);
                        return new Run(0, text.out() + json.out() + place.out(), "");
                    });
            assertThat(runs.distinct()).hasSize(1);
        } finally {
            Locale.setDefault(before);
        }
    }

    @Test
    void outputIsUtf8() {
        Run run = Run.of("solve", DESIGN);
        assertThat(run.out().getBytes(StandardCharsets.UTF_8)).contains((byte) 0xC2, (byte) 0xB5);
    }
}
