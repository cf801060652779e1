package twofold.file;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Every refusal, by its whole line: place, path, what was found, what is accepted. The files and their lines stand in
 * {@code refusals.txt}; in it a line {@code SW} or {@code RING} begins a document of that shape, {@code END} ends it, and
 * {@code A} and {@code B} are two mirrors.
 */
class RefusalsTest {
    private static final Pattern CASE = Pattern.compile("(?m)^=== ");

    record Case(String title, String text, List<String> lines) {
        @Override
        public String toString() {
            return title;
        }
    }

    static Stream<Case> cases() {
        return CASE.splitAsStream(Texts.resource("refusals.txt"))
                .filter(c -> !c.isBlank())
                .map(RefusalsTest::parsed);
    }

    private static Case parsed(String text) {
        List<String> lines = Arrays.asList(text.split("\n"));
        int end = lines.indexOf("---");
        String document = String.join(
                "\n", lines.subList(1, end).stream().map(RefusalsTest::expanded).toList());
        return new Case(lines.get(0), document, lines.subList(end + 1, lines.size()));
    }

    private static String expanded(String line) {
        String begin = "{\"format\": \"twofold/1\", \"wavelength_nm\": 800, \"shape\": \"";
        return line.replaceFirst("^SW$", begin + "standing-wave\", \"parts\": [")
                .replaceFirst("^RING$", begin + "ring\", \"parts\": [")
                .replaceFirst("^END", "]}")
                .replaceFirst("^A(?=,|$)", "{\"name\": \"A\", \"kind\": \"mirror\", \"at_mm\": [0, 0]}")
                .replaceFirst("^B(?=,|$)", "{\"name\": \"B\", \"kind\": \"mirror\", \"at_mm\": [500, 0]}");
    }

    @ParameterizedTest
    @MethodSource("cases")
    void everyRefusalSaysWhereWhatAndWhatElse(Case refusal) {
        ReadDesign read = Texts.read(refusal.text());
        assertThat(refusal.lines()).isNotEmpty();
        assertThat(read.problems().stream().map(p -> p.line("f"))).containsExactlyElementsOf(refusal.lines());
        assertThat(read.design()).isEmpty();
    }

    @Test
    void noRefusalDependsOnTheLocale() {
        for (Locale locale : Texts.locales()) {
            Texts.under(
                    locale,
                    () -> cases().forEach(c -> assertThat(Texts.lines(c.text()))
                            .as("%s under %s", c.title(), locale)
                            .isEqualTo(c.lines())));
        }
    }
}
