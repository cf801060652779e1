package twofold.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.awt.Font;
import java.awt.font.FontRenderContext;
import java.io.InputStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Widths of text, against those of the font engine that Java brings. */
class LetteringTest {
    private static final String[] TEXTS = {
        "half trace −0.239, margin 0.76",
        "480.00 mm, held",
        "7.90° incidence",
        "beam width drawn ×22",
        "waist 38.7 µm",
        "AVATAR Type To",
        "λ₀ → Ω ≥ ∞ …",
        "Überlänge Ångström Łódź",
        "İstanbul ıssız",
        "Ελλάδα Москва"
    };

    @ParameterizedTest
    @EnumSource(Type.class)
    void widthsAreThoseOfTheFontEngine(Type type) throws Exception {
        System.setProperty("java.awt.headless", "true");
        FontRenderContext exact = new FontRenderContext(null, true, true);
        try (InputStream file = Lettering.file(type.isBold())) {
            Font font = Font.createFont(Font.TRUETYPE_FONT, file).deriveFont((float) type.size());
            for (String text : TEXTS) {
                double engine = font.getStringBounds(text, exact).getWidth();
                // The engine rounds each advance to 1/64 px.
                assertThat(Lettering.width(text, type)).as(text).isCloseTo(engine, within(text.length() / 64.0));
            }
        }
    }

    @ParameterizedTest
    @EnumSource(Type.class)
    void cutTextFitsAndKeepsItsBeginning(Type type) {
        String text = "A rather long name for an output coupler";
        for (double limit : new double[] {30, 80, 150}) {
            String cut = Lettering.cut(text, type, limit);
            assertThat(Lettering.width(cut, type)).isLessThanOrEqualTo(limit);
            assertThat(cut).endsWith("…");
            assertThat(text).startsWith(cut.substring(0, cut.length() - 1));
        }
        assertThat(Lettering.cut(text, type, 1000)).isEqualTo(text);
    }
}
