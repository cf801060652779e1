package twofold.window;

import java.util.Optional;
import java.util.OptionalInt;
import javafx.scene.Cursor;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import javafx.scene.input.ScrollEvent;
import twofold.session.Session;

/**
 * A drawing that can be zoomed and panned and whose parts can be picked. The wheel zooms at the pointer, the middle button or
 * the space bar with the first pans, a click picks a part; from the keyboard plus and minus zoom, Alt with an arrow pans,
 * Home shows all, Page Up and Page Down pick the part before and behind.
 */
public abstract class ViewPane extends DrawingPane {
    private static final double STEP = 1.25;
    private static final double PAN = 40;
    private static final double MOST_STEPS = 4;

    private final Session session;
    private boolean isSpaceDown;
    private boolean isPanning;
    private double lastX;
    private double lastY;

    /** Makes an empty pane over a session; a screen reader calls it by the name. */
    protected ViewPane(String name, Session session) {
        super(name);
        this.session = session;
        setFocusTraversable(true);
        addEventHandler(MouseEvent.MOUSE_MOVED, this::moved);
        addEventHandler(MouseEvent.MOUSE_EXITED, e -> left());
        addEventHandler(MouseEvent.MOUSE_PRESSED, this::pressed);
        addEventHandler(MouseEvent.MOUSE_DRAGGED, this::dragged);
        addEventHandler(MouseEvent.MOUSE_RELEASED, this::released);
        addEventHandler(ScrollEvent.SCROLL, this::scrolled);
        addEventHandler(KeyEvent.KEY_PRESSED, this::keyed);
        addEventHandler(KeyEvent.KEY_RELEASED, e -> {
            if (e.getCode() == KeyCode.SPACE) {
                isSpaceDown = false;
                isPanning = false;
                setCursor(Cursor.DEFAULT);
            }
        });
    }

    /** The document. */
    protected final Session session() {
        return session;
    }

    /** Shows everything. */
    public abstract void showAll();

    /** Zooms by a factor about a pixel. */
    protected abstract void zoom(double factor, double x, double y);

    /** Moves what is shown by px. */
    protected abstract void pan(double dx, double dy);

    /** The part at a pixel. */
    protected abstract OptionalInt partAt(double x, double y);

    /** The pointer is at a pixel, with no button down. */
    protected abstract void hover(MouseEvent e);

    /** The pointer has left. */
    protected void left() {
        session.point(Optional.empty());
    }

    /** The first button went down, not to pan. */
    protected void press(MouseEvent e) {
        OptionalInt part = partAt(e.getX(), e.getY());
        session.select(part.isPresent() ? Optional.of(part.getAsInt()) : Optional.empty());
    }

    /** The pointer moved with the first button down, not to pan. */
    protected void drag(MouseEvent e) {}

    /** The first button came up. */
    protected void release(MouseEvent e) {}

    /** A key of the pane's own. */
    protected boolean key(KeyEvent e) {
        return false;
    }

    /** Zooms about the middle. */
    public final void zoom(boolean in) {
        zoom(in ? STEP : 1 / STEP, getWidth() / 2, getHeight() / 2);
    }

    private void moved(MouseEvent e) {
        hover(e);
        setCursor(isSpaceDown ? Cursor.MOVE : cursorAt(e.getX(), e.getY()));
    }

    /** The pointer's shape at a pixel. */
    protected Cursor cursorAt(double x, double y) {
        return partAt(x, y).isPresent() ? Cursor.HAND : Cursor.DEFAULT;
    }

    private void pressed(MouseEvent e) {
        requestFocus();
        lastX = e.getX();
        lastY = e.getY();
        boolean first = e.getButton() == MouseButton.PRIMARY;
        isPanning = e.getButton() == MouseButton.MIDDLE || (first && isSpaceDown);
        if (isPanning) {
            setCursor(Cursor.MOVE);
        } else if (first) {
            press(e);
        }
    }

    private void dragged(MouseEvent e) {
        if (isPanning) {
            pan(e.getX() - lastX, e.getY() - lastY);
            lastX = e.getX();
            lastY = e.getY();
        } else if (e.getButton() == MouseButton.PRIMARY) {
            drag(e);
        }
    }

    private void released(MouseEvent e) {
        if (!isPanning && e.getButton() == MouseButton.PRIMARY) {
            release(e);
        }
        isPanning = false;
        setCursor(cursorAt(e.getX(), e.getY()));
    }

    private void scrolled(ScrollEvent e) {
        double steps = e.getDeltaY() / Math.max(1, e.getMultiplierY());
        if (steps != 0) {
            zoom(Math.pow(STEP, Math.max(-MOST_STEPS, Math.min(MOST_STEPS, steps))), e.getX(), e.getY());
            e.consume();
        }
    }

    private void keyed(KeyEvent e) {
        if (key(e)) {
            e.consume();
            return;
        }
        boolean known = true;
        switch (e.getCode()) {
            case SPACE -> isSpaceDown = true;
            case HOME -> showAll();
            case PLUS, EQUALS, ADD -> zoom(true);
            case MINUS, SUBTRACT -> zoom(false);
            case PAGE_DOWN -> session.step(1);
            case PAGE_UP -> session.step(-1);
            case ESCAPE -> session.select(Optional.empty());
            case LEFT, RIGHT, UP, DOWN -> known = e.isAltDown() && panned(e.getCode());
            default -> known = false;
        }
        if (known) {
            e.consume();
        }
    }

    private boolean panned(KeyCode arrow) {
        pan(
                arrow == KeyCode.LEFT ? PAN : arrow == KeyCode.RIGHT ? -PAN : 0,
                arrow == KeyCode.UP ? PAN : arrow == KeyCode.DOWN ? -PAN : 0);
        return true;
    }
}
