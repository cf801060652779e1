package twofold.command;

import java.util.OptionalDouble;
import twofold.cavity.Cavity;
import twofold.picture.ImagePainter;
import twofold.picture.Sheet;
import twofold.picture.SvgPainter;
import twofold.picture.Theme;

/**
 * A page of a cavity in the formats that commands write.
 *
 * @param width px
 * @param height px
 * @param theme colours
 * @param magnify how many times wider than true the beam is drawn; empty: by itself
 */
record Pictures(double width, double height, Theme theme, OptionalDouble magnify) {
    /** The page as SVG. */
    String svg(Cavity cavity) {
        SvgPainter painter =
                new SvgPainter(width, height, theme, cavity.laid().design().title());
        Sheet.draw(cavity, painter, width, height, magnify);
        return painter.text();
    }

    /** The page as PNG, so many times finer than its px. */
    byte[] png(Cavity cavity, double scale) {
        ImagePainter painter = new ImagePainter(width, height, scale, theme);
        Sheet.draw(cavity, painter, width, height, magnify);
        return painter.png();
    }
}
