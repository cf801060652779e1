package twofold.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.w3c.dom.Document;
import twofold.Samples;
import twofold.cavity.Cavity;
import twofold.design.Design;

/** Whole pages, compared with those that were looked at. */
class SheetTest {
    private static String svg(Design design, double width, double height, Theme theme) {
        Cavity cavity = Drawn.solved(design);
        SvgPainter painter = new SvgPainter(width, height, theme, design.title());
        Sheet.draw(cavity, painter, width, height, OptionalDouble.empty());
        return painter.text();
    }

    static Stream<Path> samples() {
        return Samples.files().stream();
    }

    @ParameterizedTest
    @MethodSource("samples")
    void everySampleLooksAsItDid(Path file) {
        String name = file.getFileName().toString().replace(".json", "");
        Golden.matches("sheet-" + name, svg(Samples.design(file), 1280, 800, Theme.LIGHT));
    }

    @Test
    void aDesignWithoutABeamLooksAsItDid() {
        Golden.matches("sheet-no-beam", svg(Drawn.tooLong(), 1280, 800, Theme.LIGHT));
    }

    @Test
    void everyKindOfPartLooksAsItDid() {
        Golden.matches("sheet-every-kind", svg(Drawn.triangle(), 1280, 800, Theme.LIGHT));
    }

    @Test
    void aDarkPageLooksAsItDid() {
        Golden.matches("sheet-z-fold-rod-dark", svg(Samples.design("z-fold-rod"), 1280, 800, Theme.DARK));
    }

    @Test
    void aSmallPageLooksAsItDid() {
        Golden.matches("sheet-z-fold-rod-small", svg(Samples.design("z-fold-rod"), 640, 480, Theme.LIGHT));
    }

    @ParameterizedTest
    @ValueSource(strings = {"de-DE", "tr-TR", "ar-EG", "hi-IN-u-nu-deva"})
    void bytesDoNotDependOnTheLocale(String tag) {
        String before = svg(Drawn.triangle(), 1000, 700, Theme.LIGHT);
        Locale kept = Locale.getDefault();
        try {
            Locale.setDefault(Locale.forLanguageTag(tag));
            assertThat(svg(Drawn.triangle(), 1000, 700, Theme.LIGHT)).isEqualTo(before);
        } finally {
            Locale.setDefault(kept);
        }
    }

    @ParameterizedTest
    @MethodSource("samples")
    void svgIsWellFormedAndNamesItsSubject(Path file) throws Exception {
        Design design = Samples.design(file);
        byte[] bytes = svg(design, 1280, 800, Theme.DARK).getBytes(StandardCharsets.UTF_8);
        Document document =
                DocumentBuilderFactory.newInstance().newDocumentBuilder().parse(new ByteArrayInputStream(bytes));
        assertThat(document.getDocumentElement().getTagName()).isEqualTo("svg");
        assertThat(document.getElementsByTagName("title").item(0).getTextContent())
                .isEqualTo(design.title());
    }

    @Test
    void themesDifferInColoursAlone() {
        String light = svg(Drawn.bowTie(), 1280, 800, Theme.LIGHT);
        String dark = svg(Drawn.bowTie(), 1280, 800, Theme.DARK);
        assertThat(light).isNotEqualTo(dark);
        assertThat(light.replaceAll("#[0-9a-f]{6}", "#")).isEqualTo(dark.replaceAll("#[0-9a-f]{6}", "#"));
    }

    @Test
    void theMagnificationIsTheOneAskedFor() {
        Recorder recorder = new Recorder();
        Sheet.draw(Drawn.solved(Drawn.zFold()), recorder, 1280, 800, OptionalDouble.of(7.5));
        assertThat(recorder.texts()).contains("beam width drawn ×7.5");
    }

    @Test
    void aPageTooSmallToReadIsRefused() {
        Cavity cavity = Drawn.solved(Drawn.zFold());
        assertThatThrownBy(() -> Sheet.draw(cavity, new Recorder(), 479, 800, OptionalDouble.empty()))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("480");
    }
}
