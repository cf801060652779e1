package twofold.material;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.io.StringReader;
import org.junit.jupiter.api.Test;

class MaterialsTest {

    private static final String COLUMNS = "name\tn² constant\tterms\tfrom µm\tto µm\t°C\tsource\n";

    @Test
    void everyNameOfDesignFilesIsThere() {
        assertThat(Materials.standard().names())
                .contains("fused silica", "sapphire o", "sapphire e", "BK7", "CaF2", "YAG", "YVO4 o", "YVO4 e")
                .contains("LBO x", "LBO y", "LBO z", "BBO o", "BBO e", "KTP x", "KTP y", "KTP z");
        assertThat(Materials.standard().find("bk7")).isEmpty();
    }

    @Test
    void aRangeIncludesItsEndsAndNoMore() {
        Material silica = Materials.standard().find("fused silica").orElseThrow();
        assertThat(silica.covers(0.21e-6)).isTrue();
        assertThat(silica.covers(3.71e-6)).isTrue();
        assertThat(silica.covers(Math.nextDown(0.21e-6))).isFalse();
        assertThat(silica.covers(Math.nextUp(3.71e-6))).isFalse();
        assertThat(silica.covers(Double.NaN)).isFalse();
    }

    @Test
    void neodymiumLinesAreInsideTheRangesThatNameThem() {
        assertThat(Materials.standard().find("BBO o").orElseThrow().covers(1064.2e-9))
                .isTrue();
        assertThat(Materials.standard().find("LBO z").orElseThrow().covers(1342e-9))
                .isTrue();
        assertThat(Materials.standard().find("BBO o").orElseThrow().covers(1070e-9))
                .isFalse();
    }

    @Test
    void everyRowIsAPlausibleIndexAllOverItsRangeAndNamesItsSource() {
        for (String name : Materials.standard().names()) {
            Material material = Materials.standard().find(name).orElseThrow();
            assertThat(material.source()).as(name).isNotBlank();
            for (int i = 0; i <= 50; i++) {
                double wavelength = material.from() + (material.to() - material.from()) * i / 50;
                assertThat(material.index(wavelength)).as(name).isBetween(1.2, 2.5);
            }
        }
    }

    @Test
    void everyFormOfATermIsReadAndUsed() throws IOException {
        Material material = only("g\t1\tRESONANCE 1 0.5; SQUARED 1 0.25; POLE 3 0.25; POWER -0.5 2\t0.6\t2\troom\ts\n");
        // At 1 µm: 1 + 1/0.75 + 1/0.75 + 3/0.75 − 0.5; a few roundings.
        assertThat(material.index(1e-6)).isCloseTo(Math.sqrt(0.5 + 5 / 0.75), within(1e-14));
        assertThat(material.temperature()).isEmpty();
    }

    @Test
    void aFaultyTableIsRefusedWithItsLine() {
        assertThatThrownBy(() -> only("g\t1\tPOLE 1\t0.6\t2\t20\ts\n"))
                .hasMessageContaining("line 2")
                .hasRootCauseMessage("a term is FORM B C, found POLE 1");
        assertThatThrownBy(() -> only("g\t1\tHOLE 1 2\t0.6\t2\t20\ts\n")).hasMessageContaining("line 2");
        assertThatThrownBy(() -> only("g\t1\tPOLE 1 2\t2\t0.6\t20\ts\n")).hasRootCauseMessage("an empty range");
        assertThatThrownBy(() -> only("g\t1\tPOLE 1 2\t0.6\t2\t20\n")).hasMessageContaining("found 6 cells");
        assertThatThrownBy(() -> only("g\t1\tPOLE 1 2\t0.6\t2\t20\ts\n".repeat(2)))
                .hasMessageContaining("stated twice");
        assertThatThrownBy(() -> Materials.read(new StringReader("name\n"))).hasMessageContaining("line 1");
    }

    private static Material only(String row) throws IOException {
        return Materials.read(new StringReader(COLUMNS + row)).find("g").orElseThrow();
    }
}
