package twofold.window;

import java.util.EnumMap;
import java.util.Map;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.image.PixelFormat;
import javafx.scene.image.WritableImage;
import javafx.scene.paint.Color;
import javafx.scene.shape.StrokeLineCap;
import javafx.scene.shape.StrokeLineJoin;
import javafx.scene.text.TextAlignment;
import twofold.picture.Anchor;
import twofold.picture.Dash;
import twofold.picture.Ink;
import twofold.picture.Painter;
import twofold.picture.Points;
import twofold.picture.Stroke;
import twofold.picture.Theme;
import twofold.picture.Type;

/** Paints on a canvas of the window. */
final class CanvasPainter implements Painter {
    private final GraphicsContext g;
    private final Map<Ink, Color> colours = new EnumMap<>(Ink.class);
    private final Map<Dash, double[]> dashes = new EnumMap<>(Dash.class);

    CanvasPainter(GraphicsContext g, Theme theme) {
        this.g = g;
        for (Ink ink : Ink.values()) {
            colours.put(ink, Color.web(theme.css(ink)));
        }
        for (Dash dash : Dash.values()) {
            dashes.put(
                    dash,
                    dash.lengths().stream().mapToDouble(Double::doubleValue).toArray());
        }
    }

    private void use(Stroke stroke) {
        g.setStroke(colours.get(stroke.ink()));
        g.setGlobalAlpha(stroke.alpha());
        g.setLineWidth(stroke.width());
        g.setLineCap(StrokeLineCap.BUTT);
        g.setLineJoin(StrokeLineJoin.ROUND);
        g.setLineDashes(dashes.get(stroke.dash()));
    }

    private void use(Ink ink, double alpha) {
        g.setFill(colours.get(ink));
        g.setGlobalAlpha(alpha);
    }

    @Override
    public void line(double x1, double y1, double x2, double y2, Stroke stroke) {
        use(stroke);
        g.strokeLine(x1, y1, x2, y2);
    }

    @Override
    public void polyline(Points points, boolean closed, Stroke stroke) {
        use(stroke);
        if (closed) {
            g.strokePolygon(points.xs(), points.ys(), points.size());
        } else {
            g.strokePolyline(points.xs(), points.ys(), points.size());
        }
    }

    @Override
    public void polygon(Points points, Ink ink, double alpha) {
        use(ink, alpha);
        g.fillPolygon(points.xs(), points.ys(), points.size());
    }

    @Override
    public void segments(Points points, Stroke stroke) {
        use(stroke);
        g.beginPath();
        for (int i = 0; i + 1 < points.size(); i += 2) {
            g.moveTo(points.x(i), points.y(i));
            g.lineTo(points.x(i + 1), points.y(i + 1));
        }
        g.stroke();
    }

    @Override
    public void dots(Points points, double side, Ink ink) {
        use(ink, 1);
        for (int i = 0; i < points.size(); i++) {
            g.fillRect(points.x(i) - side / 2, points.y(i) - side / 2, side, side);
        }
    }

    @Override
    public void text(String text, double x, double y, Type type, Ink ink, Anchor anchor, double degrees) {
        use(ink, 1);
        g.setFont(Look.font(type));
        g.setTextAlign(
                switch (anchor) {
                    case START -> TextAlignment.LEFT;
                    case MIDDLE -> TextAlignment.CENTER;
                    case END -> TextAlignment.RIGHT;
                });
        if (degrees == 0) {
            g.fillText(text, x, y);
            return;
        }
        g.save();
        g.translate(x, y);
        g.rotate(degrees);
        g.fillText(text, 0, 0);
        g.restore();
    }

    @Override
    public void image(double x, double y, double width, double height, int columns, int rows, int[] argb) {
        WritableImage cells = new WritableImage(columns, rows);
        cells.getPixelWriter().setPixels(0, 0, columns, rows, PixelFormat.getIntArgbInstance(), argb, 0, columns);
        g.setGlobalAlpha(1);
        g.setImageSmoothing(false);
        g.drawImage(cells, x, y, width, height);
    }

    @Override
    public void push(double x, double y, double width, double height) {
        g.save();
        g.translate(x, y);
        g.beginPath();
        g.rect(0, 0, width, height);
        g.clip();
    }

    @Override
    public void pop() {
        g.restore();
    }
}
