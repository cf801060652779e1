package twofold.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalDouble;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.w3c.dom.Document;
import twofold.cavity.Cavity;
import twofold.design.Design;

/** Whole pages, compared with those that were looked at. */
class SheetTest {
    private static final Map<String, Design> DESIGNS = Map.of(
            "z-fold", Drawn.zFold(),
            "bow-tie", Drawn.bowTie(),
            "triangle", Drawn.triangle(),
            "long-v", Drawn.longV(),
            "one-plane", Drawn.oneSided(),
            "no-beam", Drawn.tooLong());

    private static String svg(Design design, double width, double height, Theme theme) {
        Cavity cavity = Drawn.solved(design);
        SvgPainter painter = new SvgPainter(width, height, theme, design.title());
        Sheet.draw(cavity, painter, width, height, OptionalDouble.empty());
        return painter.text();
    }

    private static Design design(String name) {
        Design design = DESIGNS.get(name);
        if (design == null) {
            throw new IllegalArgumentException(name);
        }
        return design;
    }

    @ParameterizedTest
    @ValueSource(strings = {"z-fold", "bow-tie", "triangle", "long-v", "one-plane", "no-beam"})
    void pagesLookAsTheyDid(String name) {
        Golden.matches("sheet-" + name, svg(design(name), 1280, 800, Theme.LIGHT));
    }

    @Test
    void aDarkPageLooksAsItDid() {
        Golden.matches("sheet-z-fold-dark", svg(Drawn.zFold(), 1280, 800, Theme.DARK));
    }

    @Test
    void aSmallPageLooksAsItDid() {
        Golden.matches("sheet-z-fold-small", svg(Drawn.zFold(), 640, 480, Theme.LIGHT));
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
    @ValueSource(strings = {"z-fold", "bow-tie", "triangle", "long-v", "one-plane", "no-beam"})
    void svgIsWellFormedAndNamesItsSubject(String name) throws Exception {
        byte[] bytes = svg(design(name), 1280, 800, Theme.DARK).getBytes(StandardCharsets.UTF_8);
        Document document =
                DocumentBuilderFactory.newInstance().newDocumentBuilder().parse(new ByteArrayInputStream(bytes));
        assertThat(document.getDocumentElement().getTagName()).isEqualTo("svg");
        assertThat(document.getElementsByTagName("title").item(0).getTextContent())
                .isEqualTo(design(name).title());
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
