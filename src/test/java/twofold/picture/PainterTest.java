package twofold.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.util.OptionalDouble;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;

/** The two painters that need no window. */
class PainterTest {
    private final Points points = new Points();

    @Test
    void svgNumbersAreShort() {
        SvgPainter svg = new SvgPainter(10, 20.5, Theme.LIGHT, "");
        svg.line(1, -0.0001, 2.0004, -3.12349, Stroke.of(Ink.AXIS, 1.5));
        svg.line(-0.05, 100.1, 1000000, 0.009, Stroke.of(Ink.AXIS, 1));
        assertThat(svg.text())
                .contains("width=\"10\" height=\"20.5\"")
                .contains("x1=\"1\" y1=\"0\" x2=\"2\" y2=\"-3.123\"")
                .contains("x1=\"-0.05\" y1=\"100.1\" x2=\"1000000\" y2=\"0.009\"")
                .contains("stroke-width=\"1.5\"");
    }

    @Test
    void svgTextIsEscaped() {
        SvgPainter svg = new SvgPainter(10, 10, Theme.LIGHT, "a < b & c");
        svg.text("<Fold> & \"Rod\"", 1, 2, Type.BODY, Ink.TEXT, Anchor.END, -30);
        assertThat(svg.text())
                .contains("<title>a &lt; b &amp; c</title>")
                .contains(">&lt;Fold&gt; &amp; \"Rod\"</text>")
                .contains("rotate(-30 1 2)")
                .contains("text-anchor=\"end\"");
    }

    @Test
    void whatIsNoNumberIsACallersMistake() {
        SvgPainter svg = new SvgPainter(10, 10, Theme.LIGHT, "");
        assertThatThrownBy(() -> svg.line(Double.NaN, 0, 1, 1, Stroke.of(Ink.AXIS, 1)))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("NaN");
    }

    @Test
    void openPanesAreClosedInTheText() {
        SvgPainter svg = new SvgPainter(10, 10, Theme.LIGHT, "");
        svg.push(1, 1, 5, 5);
        assertThat(svg.text()).endsWith("</g>\n</svg>\n");
        svg.pop();
        assertThat(svg.text().split("</g>", -1)).hasSize(2);
    }

    @Test
    void anImageHasItsScaleThemeAndClip() throws Exception {
        ImagePainter painter = new ImagePainter(40, 30, 2.5, Theme.DARK);
        painter.push(10, 10, 10, 10);
        Pane.rectangle(points, -100, -100, 300, 300);
        painter.polygon(points, Ink.TANGENTIAL, 1);
        painter.pop();
        BufferedImage image = ImageIO.read(new ByteArrayInputStream(painter.png()));
        assertThat(image.getWidth()).isEqualTo(100);
        assertThat(image.getHeight()).isEqualTo(75);
        assertThat(image.getRGB(37, 37) & 0xffffff).isEqualTo(Theme.DARK.rgb(Ink.TANGENTIAL));
        assertThat(image.getRGB(22, 37) & 0xffffff).isEqualTo(Theme.DARK.rgb(Ink.PAPER));
        assertThat(image.getRGB(53, 53) & 0xffffff).isEqualTo(Theme.DARK.rgb(Ink.PAPER));
    }

    @Test
    void panesNestAndEndWhereTheyBegan() {
        ImagePainter painter = new ImagePainter(60, 60, 1, Theme.LIGHT);
        painter.push(10, 10, 40, 40);
        painter.push(30, 30, 40, 40);
        Pane.rectangle(points, 0, 0, 40, 40);
        painter.polygon(points, Ink.BAD, 1);
        painter.pop();
        painter.pop();
        assertThat(painter.rgb(45, 45)).isEqualTo(Theme.LIGHT.rgb(Ink.BAD));
        assertThat(painter.rgb(55, 55)).isEqualTo(Theme.LIGHT.rgb(Ink.PAPER));
        Pane.rectangle(points, 55, 55, 5, 5);
        painter.polygon(points, Ink.GOOD, 1);
        assertThat(painter.rgb(57, 57)).isEqualTo(Theme.LIGHT.rgb(Ink.GOOD));
    }

    @Test
    void aPageIsDrawnOnAnImage() {
        ImagePainter painter = new ImagePainter(1280, 800, 1, Theme.LIGHT);
        Sheet.draw(Drawn.solved(Drawn.zFold()), painter, 1280, 800, OptionalDouble.empty());
        assertThat(painter.rgb(3, 3)).isEqualTo(Theme.LIGHT.rgb(Ink.DESK));
        assertThat(painter.png()).startsWith(0x89, 'P', 'N', 'G');
    }
}
