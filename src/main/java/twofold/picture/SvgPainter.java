package twofold.picture;

import java.util.ArrayDeque;
import java.util.Base64;
import java.util.Deque;

/**
 * Paints SVG 1.1 (W3C, 2011) as text: numbers with three decimals and trailing zeros cut, fonts by name, nothing
 * embedded but the cells of maps.
 * The same calls give the same text, whatever the machine and the locale.
 */
public final class SvgPainter implements Painter {
    private final Theme theme;
    private final StringBuilder svg = new StringBuilder(1 << 15);
    private final Deque<Integer> open = new ArrayDeque<>();
    private int panes;

    /**
     * An empty page.
     *
     * @param width px
     * @param height px
     * @param theme what inks look like
     * @param title what the picture shows, for those who do not see it
     */
    public SvgPainter(double width, double height, Theme theme, String title) {
        this.theme = theme;
        svg.append("<svg xmlns=\"http://www.w3.org/2000/svg\" role=\"img\"");
        attribute("width", width);
        attribute("height", height);
        svg.append(" viewBox=\"0 0 ");
        number(width).append(' ');
        number(height)
                .append("\" font-family=\"")
                .append(Lettering.FAMILY)
                .append(", sans-serif\" stroke-linejoin=\"round\">\n");
        svg.append("<title>");
        escaped(title).append("</title>\n");
    }

    /** The whole document so far, closed. */
    public String text() {
        return svg + "</g>\n".repeat(open.size()) + "</svg>\n";
    }

    @Override
    public void line(double x1, double y1, double x2, double y2, Stroke stroke) {
        svg.append("<line");
        attribute("x1", x1);
        attribute("y1", y1);
        attribute("x2", x2);
        attribute("y2", y2);
        stroke(stroke);
    }

    @Override
    public void polyline(Points points, boolean closed, Stroke stroke) {
        svg.append(closed ? "<polygon" : "<polyline").append(" fill=\"none\"");
        points(points);
        stroke(stroke);
    }

    @Override
    public void polygon(Points points, Ink ink, double alpha) {
        svg.append("<polygon");
        points(points);
        svg.append(" fill=\"").append(theme.css(ink)).append('"');
        if (alpha < 1) {
            attribute("fill-opacity", alpha);
        }
        svg.append("/>\n");
    }

    @Override
    public void segments(Points points, Stroke stroke) {
        svg.append("<path fill=\"none\" d=\"");
        for (int i = 0; i + 1 < points.size(); i += 2) {
            svg.append('M');
            pair(points, i).append('L');
            pair(points, i + 1);
        }
        svg.append('"');
        stroke(stroke);
    }

    @Override
    public void dots(Points points, double side, Ink ink) {
        svg.append("<path d=\"");
        for (int i = 0; i < points.size(); i++) {
            svg.append('M');
            number(points.x(i) - side / 2).append(' ');
            number(points.y(i)).append('h');
            number(side);
        }
        svg.append('"');
        stroke(Stroke.of(ink, side));
    }

    @Override
    public void text(String text, double x, double y, Type type, Ink ink, Anchor anchor, double degrees) {
        svg.append("<text");
        attribute("x", x);
        attribute("y", y);
        if (degrees != 0) {
            svg.append(" transform=\"rotate(");
            number(degrees).append(' ');
            number(x).append(' ');
            number(y).append(")\"");
        }
        attribute("font-size", type.size());
        if (type.isBold()) {
            svg.append(" font-weight=\"bold\"");
        }
        svg.append(
                switch (anchor) {
                    case START -> "";
                    case MIDDLE -> " text-anchor=\"middle\"";
                    case END -> " text-anchor=\"end\"";
                });
        svg.append(" fill=\"").append(theme.css(ink)).append("\">");
        escaped(text).append("</text>\n");
    }

    @Override
    public void image(double x, double y, double width, double height, int columns, int rows, int[] argb) {
        svg.append("<image");
        attribute("x", x);
        attribute("y", y);
        attribute("width", width);
        attribute("height", height);
        // SVG 1.1 knows optimizeSpeed, which CSS Images 3 (W3C, 2023) reads as "pixelated".
        svg.append(" preserveAspectRatio=\"none\" image-rendering=\"optimizeSpeed\"")
                .append(" xmlns:xlink=\"http://www.w3.org/1999/xlink\" xlink:href=\"data:image/png;base64,")
                .append(Base64.getEncoder().encodeToString(Png.of(columns, rows, argb)))
                .append("\"/>\n");
    }

    @Override
    public void push(double x, double y, double width, double height) {
        panes++;
        svg.append("<clipPath id=\"pane").append(panes).append("\"><rect");
        attribute("width", width);
        attribute("height", height);
        svg.append("/></clipPath>\n<g transform=\"translate(");
        number(x).append(' ');
        number(y).append(")\" clip-path=\"url(#pane").append(panes).append(")\">\n");
        open.push(panes);
    }

    @Override
    public void pop() {
        open.pop();
        svg.append("</g>\n");
    }

    private void points(Points points) {
        svg.append(" points=\"");
        for (int i = 0; i < points.size(); i++) {
            if (i > 0) {
                svg.append(' ');
            }
            pair(points, i);
        }
        svg.append('"');
    }

    private StringBuilder pair(Points points, int i) {
        number(points.x(i)).append(' ');
        return number(points.y(i));
    }

    private void stroke(Stroke stroke) {
        svg.append(" stroke=\"").append(theme.css(stroke.ink())).append('"');
        attribute("stroke-width", stroke.width());
        if (stroke.dash() != Dash.SOLID) {
            svg.append(" stroke-dasharray=\"");
            for (double length : stroke.dash().lengths()) {
                number(length).append(' ');
            }
            svg.setLength(svg.length() - 1);
            svg.append('"');
        }
        if (stroke.alpha() < 1) {
            attribute("stroke-opacity", stroke.alpha());
        }
        svg.append("/>\n");
    }

    private void attribute(String name, double value) {
        svg.append(' ').append(name).append("=\"");
        number(value).append('"');
    }

    /** Three decimals, trailing zeros cut, never "-0". */
    private StringBuilder number(double value) {
        if (!(Math.abs(value) < 1e12)) {
            throw new IllegalArgumentException("a picture cannot hold the number " + value);
        }
        long thousandths = Math.round(value * 1000);
        if (thousandths < 0) {
            svg.append('-');
            thousandths = -thousandths;
        }
        svg.append(thousandths / 1000);
        int rest = (int) (thousandths % 1000);
        if (rest > 0) {
            svg.append('.').append(rest / 100);
            if (rest % 100 > 0) {
                svg.append(rest / 10 % 10);
                if (rest % 10 > 0) {
                    svg.append(rest % 10);
                }
            }
        }
        return svg;
    }

    private StringBuilder escaped(String text) {
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            switch (c) {
                case '&' -> svg.append("&amp;");
                case '<' -> svg.append("&lt;");
                case '>' -> svg.append("&gt;");
                default -> svg.append(c < ' ' ? ' ' : c);
            }
        }
        return svg;
    }
}
