package twofold.picture;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.FontFormatException;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.Shape;
import java.awt.geom.AffineTransform;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import javax.imageio.ImageIO;
import javax.imageio.ImageWriter;
import javax.imageio.stream.MemoryCacheImageOutputStream;

/** Paints an image of pixels, at any scale, with Java2D and without a display. */
public final class ImagePainter implements Painter {
    static {
        // Else Java2D looks for the display that DISPLAY names and fails where that one is dead.
        System.setProperty("java.awt.headless", "true");
    }

    private final Theme theme;
    private final BufferedImage image;
    private final Graphics2D g;
    private final Font regular;
    private final Font bold;
    private final Deque<Pane> panes = new ArrayDeque<>();

    private record Pane(AffineTransform transform, Shape clip) {}

    /**
     * An image of paper.
     *
     * @param width px of the drawing
     * @param height px of the drawing
     * @param scale pixels of the image per px of the drawing
     * @param theme what inks look like
     */
    public ImagePainter(double width, double height, double scale, Theme theme) {
        this.theme = theme;
        this.image = new BufferedImage(
                (int) Math.ceil(width * scale), (int) Math.ceil(height * scale), BufferedImage.TYPE_INT_RGB);
        this.g = image.createGraphics();
        this.regular = font(false);
        this.bold = font(true);
        g.setColor(color(Ink.PAPER, 1));
        g.fillRect(0, 0, image.getWidth(), image.getHeight());
        g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        g.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
        g.setRenderingHint(RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
        g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
        g.scale(scale, scale);
        g.clip(new Rectangle2D.Double(0, 0, width, height));
    }

    private static Font font(boolean bold) {
        try (InputStream in = Lettering.file(bold)) {
            return Font.createFont(Font.TRUETYPE_FONT, in);
        } catch (IOException e) {
            throw new UncheckedIOException("cannot read the font", e);
        } catch (FontFormatException e) {
            throw new IllegalStateException("the shipped font is damaged", e);
        }
    }

    /** The image as a PNG file. */
    public byte[] png() {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        ImageWriter writer = ImageIO.getImageWritersByFormatName("png").next();
        try (MemoryCacheImageOutputStream out = new MemoryCacheImageOutputStream(bytes)) {
            writer.setOutput(out);
            writer.write(image);
        } catch (IOException e) {
            throw new UncheckedIOException("cannot write a picture to memory", e);
        } finally {
            writer.dispose();
        }
        return bytes.toByteArray();
    }

    /** The colour of a pixel of the image, 0xRRGGBB. */
    int rgb(int x, int y) {
        return image.getRGB(x, y) & 0xffffff;
    }

    private Color color(Ink ink, double alpha) {
        int rgb = theme.rgb(ink);
        return new Color(rgb >> 16, rgb >> 8 & 0xff, rgb & 0xff, (int) Math.round(255 * alpha));
    }

    private void use(Stroke stroke) {
        List<Double> lengths = stroke.dash().lengths();
        float[] dash = new float[lengths.size()];
        for (int i = 0; i < dash.length; i++) {
            dash[i] = lengths.get(i).floatValue();
        }
        g.setColor(color(stroke.ink(), stroke.alpha()));
        g.setStroke(new BasicStroke(
                (float) stroke.width(),
                BasicStroke.CAP_BUTT,
                BasicStroke.JOIN_ROUND,
                1,
                dash.length == 0 ? null : dash,
                0));
    }

    private static Path2D path(Points points) {
        Path2D path = new Path2D.Double(Path2D.WIND_NON_ZERO, points.size());
        for (int i = 0; i < points.size(); i++) {
            if (i == 0) {
                path.moveTo(points.x(i), points.y(i));
            } else {
                path.lineTo(points.x(i), points.y(i));
            }
        }
        return path;
    }

    @Override
    public void line(double x1, double y1, double x2, double y2, Stroke stroke) {
        use(stroke);
        g.draw(new Line2D.Double(x1, y1, x2, y2));
    }

    @Override
    public void polyline(Points points, boolean closed, Stroke stroke) {
        use(stroke);
        Path2D path = path(points);
        if (closed) {
            path.closePath();
        }
        g.draw(path);
    }

    @Override
    public void polygon(Points points, Ink ink, double alpha) {
        g.setColor(color(ink, alpha));
        Path2D path = path(points);
        path.closePath();
        g.fill(path);
    }

    @Override
    public void segments(Points points, Stroke stroke) {
        use(stroke);
        Path2D path = new Path2D.Double(Path2D.WIND_NON_ZERO, points.size());
        for (int i = 0; i + 1 < points.size(); i += 2) {
            path.moveTo(points.x(i), points.y(i));
            path.lineTo(points.x(i + 1), points.y(i + 1));
        }
        g.draw(path);
    }

    @Override
    public void dots(Points points, double side, Ink ink) {
        g.setColor(color(ink, 1));
        for (int i = 0; i < points.size(); i++) {
            g.fill(new Rectangle2D.Double(points.x(i) - side / 2, points.y(i) - side / 2, side, side));
        }
    }

    @Override
    public void text(String text, double x, double y, Type type, Ink ink, Anchor anchor, double degrees) {
        Font font = (type.isBold() ? bold : regular).deriveFont((float) type.size());
        double width = Lettering.width(text, type);
        AffineTransform before = g.getTransform();
        g.translate(x, y);
        g.rotate(Math.toRadians(degrees));
        g.setFont(font);
        g.setColor(color(ink, 1));
        double left = switch (anchor) {
            case START -> 0;
            case MIDDLE -> -width / 2;
            case END -> -width;
        };
        g.drawString(text, (float) left, 0);
        g.setTransform(before);
    }

    @Override
    public void image(double x, double y, double width, double height, int columns, int rows, int[] argb) {
        BufferedImage cells = new BufferedImage(columns, rows, BufferedImage.TYPE_INT_ARGB);
        cells.setRGB(0, 0, columns, rows, argb, 0, columns);
        AffineTransform onto = AffineTransform.getTranslateInstance(x, y);
        onto.scale(width / columns, height / rows);
        g.setRenderingHint(RenderingHints.KEY_INTERPOLATION, RenderingHints.VALUE_INTERPOLATION_NEAREST_NEIGHBOR);
        g.drawImage(cells, onto, null);
    }

    @Override
    public void push(double x, double y, double width, double height) {
        panes.push(new Pane(g.getTransform(), g.getClip()));
        g.translate(x, y);
        g.clip(new Rectangle2D.Double(0, 0, width, height));
    }

    @Override
    public void pop() {
        Pane pane = panes.pop();
        // The clip was read in the outer pane's coordinates, so the transform goes back first.
        g.setTransform(pane.transform());
        g.setClip(pane.clip());
    }
}
