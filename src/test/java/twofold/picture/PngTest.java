package twofold.picture;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.util.Arrays;
import java.util.Base64;
import java.util.Random;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;

/** Cells as PNG, read back by the platform's own reader; and painted. */
class PngTest {
    private static int[] read(byte[] png) throws Exception {
        BufferedImage image = ImageIO.read(new ByteArrayInputStream(png));
        return image.getRGB(0, 0, image.getWidth(), image.getHeight(), null, 0, image.getWidth());
    }

    @Test
    void fewColoursAndManyComeBackAsTheyWere() throws Exception {
        int[] few = {0xff102030, 0, 0xffffffff, 0xff102030, 0xff000000, 0xff7f8081};
        assertThat(read(Png.of(3, 2, few))).isEqualTo(few);
        // Beyond 256 colours, and beyond one block of 65535 bytes.
        Random random = new Random(5);
        int[] many = random.ints(200 * 130).map(c -> c | 0xff000000).toArray();
        assertThat(read(Png.of(200, 130, many))).isEqualTo(many);
        int[] long_ = new int[300 * 300];
        Arrays.setAll(long_, i -> 0xff000000 | i % 251);
        assertThat(read(Png.of(300, 300, long_))).isEqualTo(long_);
    }

    @Test
    void theBytesAreTheFormatsOwnAndNothingElse() {
        // One black cell: signature, IHDR, PLTE, tRNS, IDAT with one stored block, IEND (ISO/IEC 15948, RFC 1950,
        // 1951);
        // its checksums were computed with Python's zlib.
        assertThat(Base64.getEncoder().encodeToString(Png.of(1, 1, new int[] {0xff000000})))
                .isEqualTo("iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAMAAAAoyzS7AAAAA1BMVEUAAACnej3aAA"
                        + "AAAXRSTlP/beQ36wAAAA1JREFUeAEBAgD9/wAAAAIAAX4FDdIAAAAASUVORK5CYII=");
    }

    @Test
    void anSvgHoldsTheCellsAndSoDoesAnImage() {
        int[] cells = {0xffff0000, 0, 0xff00ff00, 0xff0000ff};
        SvgPainter svg = new SvgPainter(40, 40, Theme.LIGHT, "");
        svg.image(10, 10, 20, 20, 2, 2, cells);
        assertThat(svg.text())
                .contains("<image x=\"10\" y=\"10\" width=\"20\" height=\"20\" preserveAspectRatio=\"none\"")
                .contains("data:image/png;base64," + Base64.getEncoder().encodeToString(Png.of(2, 2, cells)));
        ImagePainter image = new ImagePainter(40, 40, 1, Theme.DARK);
        image.image(10, 10, 20, 20, 2, 2, cells);
        assertThat(image.rgb(10, 10)).isEqualTo(0xff0000);
        assertThat(image.rgb(19, 19)).isEqualTo(0xff0000);
        assertThat(image.rgb(21, 12)).isEqualTo(Theme.DARK.rgb(Ink.PAPER));
        assertThat(image.rgb(12, 28)).isEqualTo(0x00ff00);
        assertThat(image.rgb(29, 29)).isEqualTo(0x0000ff);
        assertThat(image.rgb(31, 31)).isEqualTo(Theme.DARK.rgb(Ink.PAPER));
    }
}
