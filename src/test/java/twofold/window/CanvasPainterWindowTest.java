package twofold.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Optional;
import javafx.scene.canvas.Canvas;
import javafx.scene.image.PixelReader;
import org.junit.jupiter.api.Test;
import org.testfx.api.FxToolkit;
import org.testfx.util.WaitForAsyncUtils;
import twofold.picture.Ink;
import twofold.picture.Painter;
import twofold.picture.Points;
import twofold.picture.Theme;

/** The canvas paints cells as the other painters do: hard edges, gaps left alone, nothing beyond. */
class CanvasPainterWindowTest {
    @Test
    void cellsHaveHardEdgesAndGapsAreLeftAlone() throws Exception {
        FxToolkit.registerPrimaryStage();
        PixelReader pixels = WaitForAsyncUtils.waitForAsyncFx(20_000, () -> {
            Canvas canvas = new Canvas(40, 40);
            Painter painter = new CanvasPainter(canvas.getGraphicsContext2D(), Theme.DARK);
            Points all = new Points();
            all.add(0, 0).add(40, 0).add(40, 40).add(0, 40);
            painter.polygon(all, Ink.PAPER, 1);
            painter.image(10, 10, 20, 20, 2, 2, new int[] {0xffff0000, 0, 0xff00ff00, 0xff0000ff});
            return Optional.ofNullable(canvas.snapshot(null, null).getPixelReader())
                    .orElseThrow();
        });
        int paper = 0xff000000 | Theme.DARK.rgb(Ink.PAPER);
        assertThat(pixels.getArgb(10, 10)).isEqualTo(0xffff0000);
        assertThat(pixels.getArgb(19, 19)).isEqualTo(0xffff0000);
        assertThat(pixels.getArgb(21, 12)).isEqualTo(paper);
        assertThat(pixels.getArgb(12, 28)).isEqualTo(0xff00ff00);
        assertThat(pixels.getArgb(29, 29)).isEqualTo(0xff0000ff);
        assertThat(pixels.getArgb(31, 31)).isEqualTo(paper);
    }
}
