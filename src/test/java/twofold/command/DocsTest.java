package twofold.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import twofold.design.Field;
import twofold.design.Kind;
import twofold.design.Quantity;
import twofold.file.DesignReader;

/** What README and the pages in docs show is true: every command of theirs runs, every design reads, tables match. */
class DocsTest {
    private static final String JAR = "java -jar target/twofold.jar ";

    @TempDir
    @SuppressWarnings("NullAway.Init") // set by JUnit
    Path folder;

    private static List<Path> pages() throws IOException {
        try (Stream<Path> docs = Files.list(Path.of("docs"))) {
            return Stream.concat(
                            Stream.of(Path.of("README.md")),
                            docs.filter(p -> p.toString().endsWith(".md")))
                    .sorted()
                    .toList();
        }
    }

    /** The lines of all fenced blocks in a language. */
    private static List<String> blocks(Path page, String language) throws IOException {
        List<String> blocks = new ArrayList<>();
        StringBuilder block = new StringBuilder();
        boolean inside = false;
        for (String line : Files.readAllLines(page)) {
            if (inside && line.startsWith("```")) {
                blocks.add(block.toString());
                block.setLength(0);
                inside = false;
            } else if (inside) {
                block.append(line).append('\n');
            } else {
                inside = line.equals("```" + language);
            }
        }
        return blocks;
    }

    static Stream<String> commands() throws IOException {
        List<String> commands = new ArrayList<>();
        for (Path page : pages()) {
            for (String block : blocks(page, "sh")) {
                for (String line : block.lines().toList()) {
                    Pattern.compile(" && ")
                            .splitAsStream(line)
                            .map(c -> c.startsWith(JAR) ? "twofold " + c.substring(JAR.length()) : c)
                            .filter(c -> c.startsWith("twofold "))
                            .forEach(commands::add);
                }
            }
        }
        return commands.stream().distinct();
    }

    @ParameterizedTest
    @MethodSource("commands")
    void everyCommandShownRunsAndMakesThePictureShown(String command) throws IOException {
        List<String> arguments = words(command);
        arguments.remove(0);
        Map<Path, Path> shown = new HashMap<>();
        for (String option : List.of("--write", "--to", "--picture")) {
            int at = arguments.indexOf(option) + 1;
            if (at > 0) {
                Path written = Path.of(arguments.get(at));
                Path here = folder.resolve(written.getFileName().toString());
                arguments.set(at, here.toString());
                if (written.startsWith("docs")) {
                    shown.put(written, here);
                }
            }
        }
        Run run = Run.of(arguments.toArray(String[]::new));
        assertThat(run.status()).as(run.err()).isZero();
        assertThat(run.out()).isNotEmpty();
        for (Map.Entry<Path, Path> picture : shown.entrySet()) {
            if ("update".equals(System.getProperty("twofold.golden"))) {
                Files.copy(picture.getValue(), picture.getKey(), StandardCopyOption.REPLACE_EXISTING);
            }
            assertThat(picture.getValue())
                    .as(
                            "%s is another picture than `%s` makes; -Dtwofold.golden=update writes it anew",
                            picture.getKey(), command)
                    .hasSameBinaryContentAs(picture.getKey());
        }
    }

    @Test
    void everyPictureShownIsThere() throws IOException {
        List<String> pictures = new ArrayList<>();
        for (Path page : pages()) {
            Matcher shown = Pattern.compile("!\\[([^]]*)]\\(([^)]*)\\)").matcher(Files.readString(page));
            while (shown.find()) {
                assertThat(shown.group(1))
                        .as("what %s shows, in words", shown.group(2))
                        .isNotBlank();
                assertThat(page.resolveSibling(shown.group(2))).isNotEmptyFile();
                pictures.add(shown.group(2));
            }
        }
        assertThat(pictures).hasSizeGreaterThan(4);
    }

    /** As a shell parts a line: at spaces outside double quotes. */
    private static List<String> words(String command) {
        List<String> words = new ArrayList<>();
        Matcher word = Pattern.compile("(?:[^\\s\"]|\"[^\"]*\")+").matcher(command);
        while (word.find()) {
            words.add(word.group().replace("\"", ""));
        }
        return words;
    }

    @Test
    void theseTestsSeeTheCommands() throws IOException {
        assertThat(commands()).hasSizeGreaterThan(4).anyMatch(c -> c.contains("--json"));
    }

    @Test
    void everyDesignShownReads() throws IOException {
        int seen = 0;
        for (Path page : pages()) {
            for (String block : blocks(page, "json")) {
                if (block.contains("\"format\"")) {
                    seen++;
                    assertThat(DesignReader.read(block.getBytes(java.nio.charset.StandardCharsets.UTF_8))
                                    .problems())
                            .as("%s", page)
                            .isEmpty();
                }
            }
        }
        assertThat(seen).isPositive();
    }

    @Test
    void theTableOfFieldsIsTheVocabulary() throws IOException {
        String table = Stream.concat(
                        Stream.of("| field | of | what it is | accepted | when absent |", "|---|---|---|---|---|"),
                        Arrays.stream(Field.values()).map(DocsTest::row))
                .collect(Collectors.joining("\n"));
        assertThat(Files.readString(Path.of("docs/file-format.md")))
                .as("docs/file-format.md between <!-- fields … --> and <!-- /fields --> must read:\n%s", table)
                .contains("checked by a test -->\n" + table + "\n<!-- /fields -->");
    }

    private static String row(Field field) {
        String kinds = field.kinds().stream().sorted().map(Kind::word).collect(Collectors.joining(", "));
        String absent = switch (field.need()) {
            case REQUIRED -> "refused";
            case OTHER_FORM -> "another form is used";
            case OPTIONAL -> field.absent();
        };
        return "| `" + field.json() + "` | " + kinds + " | " + field.doc() + " | " + field.accepted() + " | " + absent
                + " |";
    }

    @Test
    void theTableOfQuantitiesIsTheVocabulary() throws IOException {
        String table = Stream.concat(
                        Stream.of(
                                "| quantity | what it is | unit | read at | plane | source |",
                                "|---|---|---|---|---|---|"),
                        Arrays.stream(Quantity.values()).map(DocsTest::row))
                .collect(Collectors.joining("\n"));
        assertThat(Files.readString(Path.of("docs/quantities.md")))
                .as("docs/quantities.md between <!-- quantities … --> and <!-- /quantities --> must read:\n%s", table)
                .contains("checked by a test -->\n" + table + "\n<!-- /quantities -->");
    }

    private static String row(Quantity quantity) {
        String unit = quantity.unit().symbol().isEmpty() ? "–" : quantity.unit().symbol();
        String plane = quantity.hasPlane() ? "yes" : quantity.hasEdge() ? "no, but an edge: lower or upper" : "no";
        return "| `" + quantity.json() + "` | " + quantity.doc().replace("|", "\\|") + " | " + unit + " | "
                + quantity.where().words() + " | " + plane + " | " + quantity.source() + " |";
    }
}
