package twofold.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import twofold.Samples;
import twofold.design.Design;
import twofold.design.Unit;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.study.Asked;
import twofold.study.Asker;
import twofold.study.Question;

/** {@code sweep} and {@code map}: what they print, to the bit, and what they refuse. */
class SurveyCommandsTest {
    private static final String ROD = "samples/z-fold-rod.json";

    private static List<String[]> rows(Run run) {
        assertThat(run.status()).as(run.err()).isZero();
        assertThat(run.err()).isEmpty();
        List<String[]> rows = new ArrayList<>();
        run.out().lines().forEach(l -> rows.add(l.split(",", -1)));
        return rows;
    }

    @Test
    void aSweepHasAHeaderWithUnitsAndARowAPoint() {
        Run run = Run.of(
                "sweep",
                ROD,
                "--lever",
                "gap",
                "--of",
                "radius_um@Rod:sagittal",
                "half_trace:tangential",
                "--of",
                "gouy_deg:sagittal",
                "--points",
                "10");
        assertThat(run.out())
                .startsWith("gap (mm),radius_um@Rod:sagittal (µm),half_trace:tangential,gouy_deg:sagittal (°)\n102.5,")
                .endsWith("\n")
                .doesNotContain("\r")
                .doesNotContain("NaN");
        List<String[]> rows = rows(run);
        assertThat(rows).hasSize(11).allMatch(r -> r.length == 4);
        assertThat(rows.get(1)[0]).isEqualTo("102.5");
        assertThat(rows.get(2)[0]).isEqualTo("103");
        assertThat(rows.get(10)[0]).isEqualTo("107");
        // Below the zone there is a half trace and no beam: an empty cell.
        assertThat(rows.get(1)[1]).isEmpty();
        assertThat(rows.get(1)[2]).isNotEmpty();
        assertThat(Run.of("sweep", ROD, "--lever", "gap", "--of", "fsr_mhz")
                        .out()
                        .lines())
                .hasSize(402);
    }

    @Test
    void everyNumberReadsBackToTheSameDouble() {
        Design design = Samples.design("z-fold-rod");
        Laid laid = Layout.of(design).value().orElseThrow();
        List<Asked> asked = List.of(
                Asked.parse("radius_um@Rod:tangential", design).value().orElseThrow(),
                Asked.parse("round_trip_mm", design).value().orElseThrow(),
                Asked.parse("incidence_deg@Fold 1", design).value().orElseThrow());
        Asker asker = new Question(laid, List.of(design.levers().get(1)), asked).asker();
        List<String[]> rows = rows(Run.of(
                "sweep",
                ROD,
                "--lever",
                "gap",
                "--of",
                asked.get(0).text(),
                asked.get(1).text(),
                asked.get(2).text(),
                "--points",
                "97"));
        double[] answers = new double[3];
        for (String[] row : rows.subList(1, rows.size())) {
            asker.ask(new double[] {Unit.MM.toSi(new BigDecimal(row[0]))}, answers, 0);
            for (int q = 0; q < 3; q++) {
                if (row[q + 1].isEmpty()) {
                    assertThat(answers[q]).isNaN();
                } else {
                    Unit unit = asked.get(q).what().unit();
                    assertThat(unit.toSi(new BigDecimal(row[q + 1]))).isEqualTo(answers[q]);
                }
            }
        }
    }

    @Test
    void aMapHasThreeColumnsTheFirstLeverFastest() {
        List<String[]> rows =
                rows(Run.of("map", ROD, "--lever", "gap", "--lever", "fold", "--of", "round_trip_mm", "--size", "5x3"));
        assertThat(rows).hasSize(16).allMatch(r -> r.length == 3);
        assertThat(rows.get(0)).containsExactly("gap (mm)", "fold (°)", "round_trip_mm (mm)");
        assertThat(rows.get(1)[0]).isEqualTo("102.5");
        assertThat(rows.get(2)[0]).isEqualTo("103.625");
        assertThat(rows.get(2)[1]).isEqualTo("4");
        assertThat(rows.get(6)[0]).isEqualTo("102.5");
        assertThat(rows.get(6)[1]).isEqualTo("9");
        assertThat(Run.of("map", ROD, "--lever", "gap", "--lever", "fold", "--of", "round_trip_mm")
                        .out()
                        .lines())
                .hasSize(1 + 400 * 300);
    }

    @Test
    void aListOfValuesHasItsOwnPoints() {
        List<String[]> rows =
                rows(Run.of("sweep", "samples/triangle-ring.json", "--lever", "radius", "--of", "fsr_mhz"));
        assertThat(rows.stream().skip(1).map(r -> r[0])).containsExactly("300", "500", "750", "1000");
    }

    @Test
    void zonesAreColumnsBehindTheOthers() {
        List<String[]> rows = rows(Run.of("sweep", ROD, "--lever", "gap", "--of", "fsr_mhz", "--zones"));
        assertThat(rows.get(0)).containsExactly("gap (mm)", "fsr_mhz (MHz)", "zone tangential", "zone sagittal");
        assertThat(rows.stream().skip(1).map(r -> r[2]).distinct()).containsExactly("", "C = 0 to A = 0");
        // The upper edge of the sagittal plane lies beyond the lever's range.
        assertThat(rows.stream().skip(1).map(r -> r[3]).distinct()).containsExactly("", "C = 0 to -");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "sweep,F,--lever,gpa,--of,fsr_mhz | found \"gpa\", which no lever of the file is called; nearest is \"gap\"",
                "sweep,F,--lever,gap,--of,fsr | nearest is \"fsr_mhz\"",
                "sweep,F,--lever,gap,--of,radius_um@Rod | found no plane",
                "sweep,F,--lever,gap | --of",
                "sweep,F,--of,fsr_mhz | --lever",
                "sweep,F,--lever,gap,--of,fsr_mhz,--points,1 | --points: found 1; accepted: 2 to 10000000",
                "map,F,--lever,gap,--of,fsr_mhz | --lever: found 1; accepted: two different levers",
                "map,F,--lever,gap,--lever,gap,--of,fsr_mhz | --lever: found the same twice",
                "map,F,--lever,gap,--lever,fold,--of,fsr_mhz,--size,20 | --size: found \"20\"",
                "map,F,--lever,gap,--lever,fold,--of,fsr_mhz,--size,9999x9999 | accepted: up to 10000000",
                "map,F,--lever,gap,--lever,fold,--of,fsr_mhz,--of,fsr_mhz | --of",
            })
    void whatIsNotUnderstoodEndsWithTwo(String arguments, String said) {
        Run run = Run.of(arguments.replace("F", ROD).split(",", -1));
        assertThat(run.status()).isEqualTo(Commands.USAGE);
        assertThat(run.out()).isEmpty();
        assertThat(run.err()).contains(said).doesNotContain("\tat ");
    }

    @Test
    void progressGoesToTheErrorStreamAlone() {
        Run run = Run.of("sweep", ROD, "--lever", "gap", "--of", "fsr_mhz", "--progress");
        assertThat(run.out().lines()).hasSize(402);
        assertThat(run.err()).startsWith("twofold: sweep 10 %\n").endsWith("twofold: sweep 100 %\n");
        assertThat(run.err().lines()).hasSize(10);
    }

    @Test
    void inATerminalTheLineIsWipedAtTheEnd() {
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int status = Commands.run(
                List.of("map", ROD, "--lever", "gap", "--lever", "fold", "--of", "zone_overlap_mm@Fold 1/Fold 2"),
                new PrintStream(new ByteArrayOutputStream(), false, StandardCharsets.UTF_8),
                new PrintStream(err, false, StandardCharsets.UTF_8),
                true);
        assertThat(status).isZero();
        assertThat(err.toString(StandardCharsets.UTF_8))
                .contains("twofold: map ")
                .endsWith("\r\u001b[K");
    }

    @Test
    void aClosedOutputEndsTheWork() {
        PrintStream closed = new PrintStream(
                new java.io.OutputStream() {
                    @Override
                    public void write(int b) throws java.io.IOException {
                        throw new java.io.IOException("no room");
                    }
                },
                false,
                StandardCharsets.UTF_8);
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int status = Commands.run(
                List.of("sweep", ROD, "--lever", "gap", "--of", "fsr_mhz"),
                closed,
                new PrintStream(err, false, StandardCharsets.UTF_8),
                false);
        assertThat(status).isEqualTo(Commands.FILE);
        assertThat(err.toString(StandardCharsets.UTF_8)).contains("standard output is closed or full");
    }
}
