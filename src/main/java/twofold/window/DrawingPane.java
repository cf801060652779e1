package twofold.window;

import javafx.scene.AccessibleRole;
import javafx.scene.canvas.Canvas;
import javafx.scene.layout.Region;
import twofold.picture.Painter;
import twofold.picture.Theme;

/**
 * A pane that a picture is drawn on. Any number of calls of {@link #redraw} within one pulse make one drawing, and a pane
 * that is not visible draws nothing.
 */
public abstract class DrawingPane extends Region {
    private final Canvas canvas = new Canvas();
    private Theme theme = Theme.LIGHT;
    private CanvasPainter painter = new CanvasPainter(canvas.getGraphicsContext2D(), theme);
    private boolean isStale = true;

    /** Makes an empty pane; a screen reader calls it by the name. */
    protected DrawingPane(String name) {
        getChildren().add(canvas);
        getStyleClass().add("drawing");
        setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        setAccessibleText(name);
        setMinSize(120, 60);
        setPrefSize(400, 300);
        widthProperty().addListener((o, was, is) -> redraw());
        heightProperty().addListener((o, was, is) -> redraw());
    }

    /** Draws the picture. */
    protected abstract void draw(Painter on, double width, double height);

    /** The theme it is drawn in. */
    protected final Theme theme() {
        return theme;
    }

    /** Draws in another theme from now on. */
    public final void setTheme(Theme next) {
        theme = next;
        painter = new CanvasPainter(canvas.getGraphicsContext2D(), next);
        redraw();
    }

    /** Asks for a new drawing at the next pulse. */
    public final void redraw() {
        isStale = true;
        requestLayout();
    }

    @Override
    protected void layoutChildren() {
        if (!isStale || getWidth() <= 0 || getHeight() <= 0) {
            return;
        }
        isStale = false;
        double width = Math.floor(getWidth());
        double height = Math.floor(getHeight());
        if (canvas.getWidth() != width || canvas.getHeight() != height) {
            canvas.setWidth(width);
            canvas.setHeight(height);
        }
        canvas.getGraphicsContext2D().clearRect(0, 0, width, height);
        painter.push(0, 0, width, height);
        draw(painter, width, height);
        painter.pop();
    }
}
