package twofold.window.bench;

import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import javafx.scene.Cursor;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import javafx.scene.input.ScrollEvent;
import org.jspecify.annotations.Nullable;
import twofold.cavity.Cavity;
import twofold.picture.BenchDrawing;
import twofold.picture.BenchView;
import twofold.picture.Painter;
import twofold.picture.Viewport;
import twofold.session.Session;
import twofold.session.Shown;
import twofold.window.DrawingPane;

/**
 * The bench: the plan from above. The wheel zooms at the pointer, the middle button or the space bar with the first pans, a
 * click picks a part; from the keyboard plus and minus zoom, Alt with an arrow pans, Home shows all, Page Up and Page Down
 * pick the part before and behind.
 */
public final class BenchPane extends DrawingPane {
    /** How near a click must come to a part, and the pointer to the beam, px. */
    private static final double NEAR_PART = 8;

    private static final double NEAR_BEAM = 14;
    private static final double STEP = 1.25;
    private static final double PAN = 40;

    private final Session session;
    private @Nullable Cavity cavity;
    private @Nullable BenchDrawing drawing;
    private @Nullable Viewport viewport;
    private OptionalDouble magnify = OptionalDouble.empty();
    private OptionalInt selected = OptionalInt.empty();
    private OptionalDouble pointed = OptionalDouble.empty();
    private boolean isSpaceDown;
    private boolean isPanning;
    private double lastX;
    private double lastY;

    /** Makes the pane. */
    public BenchPane(Session session) {
        super("Bench, the plan seen from above");
        this.session = session;
        setId("bench");
        setFocusTraversable(true);
        addEventHandler(MouseEvent.MOUSE_MOVED, this::moved);
        addEventHandler(MouseEvent.MOUSE_EXITED, e -> session.point(Optional.empty()));
        addEventHandler(MouseEvent.MOUSE_PRESSED, this::pressed);
        addEventHandler(MouseEvent.MOUSE_DRAGGED, this::dragged);
        addEventHandler(MouseEvent.MOUSE_RELEASED, e -> released());
        addEventHandler(ScrollEvent.SCROLL, this::scrolled);
        addEventHandler(KeyEvent.KEY_PRESSED, this::key);
        addEventHandler(KeyEvent.KEY_RELEASED, e -> {
            if (e.getCode() == KeyCode.SPACE) {
                isSpaceDown = false;
                released();
            }
        });
    }

    /** Shows a moment of the session; another design is shown whole. */
    public void show(Shown shown, boolean isOther) {
        Cavity next = shown.cavity().orElse(null);
        if (!Objects.equals(next, cavity)) {
            cavity = next;
            drawing = next == null ? null : new BenchDrawing(next);
        }
        if (isOther) {
            viewport = null;
        }
        selected = shown.selected().map(OptionalInt::of).orElse(OptionalInt.empty());
        pointed = shown.pointed().map(OptionalDouble::of).orElse(OptionalDouble.empty());
        setAccessibleText("Bench, the plan seen from above"
                + session.selectedPart()
                        .map(p -> "; selected: " + p.name() + ", " + p.kind().word())
                        .orElse(""));
        redraw();
    }

    /** Draws the beam so many times wider than true, or by itself. */
    public void magnify(OptionalDouble factor) {
        magnify = factor;
        redraw();
    }

    /** Shows all of the plan. */
    public void showAll() {
        viewport = null;
        redraw();
    }

    /** Zooms about the middle of the pane. */
    public void zoom(boolean in) {
        zoom(in ? STEP : 1 / STEP, getWidth() / 2, getHeight() / 2);
    }

    /** What is shown now; empty before anything is. */
    public Optional<BenchView> view() {
        BenchDrawing d = drawing;
        return d == null ? Optional.empty() : Optional.of(view(d, Math.floor(getWidth()), Math.floor(getHeight())));
    }

    private BenchView view(BenchDrawing d, double width, double height) {
        BenchView all = d.all(width, height);
        Viewport port = viewport == null ? all.viewport() : viewport;
        return all.through(port)
                .magnified(magnify.orElseGet(() -> d.magnification(port.scale())))
                .selecting(selected)
                .crossing(pointed);
    }

    @Override
    protected void draw(Painter on, double width, double height) {
        if (drawing == null) {
            Empty.draw(on, width, height);
        } else {
            drawing.draw(on, view(drawing, width, height));
        }
    }

    private void zoom(double factor, double x, double y) {
        view().ifPresent(v -> {
            viewport = v.viewport().zoomed(factor, x, y);
            redraw();
        });
    }

    private void pan(double dx, double dy) {
        view().ifPresent(v -> {
            viewport = v.viewport().panned(dx, dy);
            redraw();
        });
    }

    private void moved(MouseEvent e) {
        BenchDrawing d = drawing;
        if (d == null) {
            return;
        }
        BenchView v = view(d, Math.floor(getWidth()), Math.floor(getHeight()));
        OptionalDouble path = d.pathAt(v, e.getX(), e.getY(), NEAR_BEAM);
        session.point(path.isPresent() ? Optional.of(path.getAsDouble()) : Optional.empty());
        setCursor(
                isSpaceDown
                        ? Cursor.MOVE
                        : d.partAt(v, e.getX(), e.getY(), NEAR_PART).isPresent() ? Cursor.HAND : Cursor.DEFAULT);
    }

    private void pressed(MouseEvent e) {
        requestFocus();
        lastX = e.getX();
        lastY = e.getY();
        boolean first = e.getButton() == MouseButton.PRIMARY;
        isPanning = e.getButton() == MouseButton.MIDDLE || (first && isSpaceDown);
        BenchDrawing d = drawing;
        if (first && !isPanning && d != null) {
            OptionalInt part =
                    d.partAt(view(d, Math.floor(getWidth()), Math.floor(getHeight())), e.getX(), e.getY(), NEAR_PART);
            session.select(part.isPresent() ? Optional.of(part.getAsInt()) : Optional.empty());
        }
        if (isPanning) {
            setCursor(Cursor.MOVE);
        }
    }

    private void dragged(MouseEvent e) {
        if (isPanning) {
            pan(e.getX() - lastX, e.getY() - lastY);
            lastX = e.getX();
            lastY = e.getY();
        }
    }

    private void released() {
        isPanning = false;
        setCursor(Cursor.DEFAULT);
    }

    private void scrolled(ScrollEvent e) {
        double steps = e.getDeltaY() / Math.max(1, e.getMultiplierY());
        if (steps != 0) {
            zoom(Math.pow(STEP, Math.max(-4, Math.min(4, steps))), e.getX(), e.getY());
            e.consume();
        }
    }

    private void key(KeyEvent e) {
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
