package twofold.window.beam;

import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import javafx.scene.Cursor;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import javafx.scene.input.ScrollEvent;
import org.jspecify.annotations.Nullable;
import twofold.cavity.Cavity;
import twofold.picture.BeamDrawing;
import twofold.picture.BeamView;
import twofold.picture.Painter;
import twofold.picture.Stretch;
import twofold.session.Session;
import twofold.session.Shown;
import twofold.window.DrawingPane;

/**
 * The beam along the unfolded path. The wheel zooms at the pointer, the middle button or the space bar with the first pans,
 * a click picks a part, hovering over a waist's dot shows its numbers; keys as on the bench.
 */
public final class BeamPane extends DrawingPane {
    private static final double NEAR_PART = 12;
    private static final double NEAR_DOT = 8;
    private static final double STEP = 1.25;
    private static final double PAN = 40;

    private final Session session;
    private final Tooltip numbers = new Tooltip();
    private @Nullable Cavity cavity;
    private @Nullable BeamDrawing drawing;
    private double from;
    private double to;
    private OptionalInt selected = OptionalInt.empty();
    private OptionalDouble pointed = OptionalDouble.empty();
    private boolean isSpaceDown;
    private boolean isPanning;
    private double lastX;

    /** Makes the pane. */
    public BeamPane(Session session) {
        super("Beam along the path");
        this.session = session;
        setId("beam");
        setFocusTraversable(true);
        addEventHandler(MouseEvent.MOUSE_MOVED, this::moved);
        addEventHandler(MouseEvent.MOUSE_EXITED, e -> left());
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
            drawing = next == null ? null : new BeamDrawing(next);
        }
        if (isOther || drawing == null || to > drawing.course().length()) {
            showAll();
        }
        selected = shown.selected().map(OptionalInt::of).orElse(OptionalInt.empty());
        pointed = shown.pointed().map(OptionalDouble::of).orElse(OptionalDouble.empty());
        redraw();
    }

    /** Shows the whole path. */
    public void showAll() {
        from = 0;
        to = drawing == null ? 0 : drawing.course().length();
        redraw();
    }

    /** What is shown now; empty before anything is. */
    public Optional<BeamView> view() {
        BeamDrawing d = drawing;
        return d == null ? Optional.empty() : Optional.of(view(d, Math.floor(getWidth()), Math.floor(getHeight())));
    }

    private BeamView view(BeamDrawing d, double width, double height) {
        BeamView all = d.all(width, height);
        return all.over(new Stretch(
                        from, to, all.stretch().left(), all.stretch().right()))
                .selecting(selected)
                .crossing(pointed);
    }

    @Override
    protected void draw(Painter on, double width, double height) {
        if (drawing != null) {
            drawing.draw(on, view(drawing, width, height));
        }
    }

    private void over(Stretch stretch) {
        from = stretch.from();
        to = stretch.to();
        redraw();
    }

    private void zoom(double factor, double x) {
        BeamDrawing d = drawing;
        view().ifPresent(v -> {
            if (d != null) {
                over(v.stretch().zoomed(factor, x, d.course().length()));
            }
        });
    }

    private void pan(double dx) {
        BeamDrawing d = drawing;
        view().ifPresent(v -> {
            if (d != null) {
                over(v.stretch().panned(dx, d.course().length()));
            }
        });
    }

    private void moved(MouseEvent e) {
        BeamDrawing d = drawing;
        if (d == null) {
            return;
        }
        BeamView v = view(d, Math.floor(getWidth()), Math.floor(getHeight()));
        OptionalDouble path = d.pathAt(v, e.getX(), e.getY());
        session.point(path.isPresent() ? Optional.of(path.getAsDouble()) : Optional.empty());
        setCursor(
                isSpaceDown
                        ? Cursor.MOVE
                        : d.partAt(v, e.getX(), e.getY(), NEAR_PART).isPresent() ? Cursor.HAND : Cursor.DEFAULT);
        Optional<BeamDrawing.WaistDot> dot = d.waistAt(v, e.getX(), e.getY(), NEAR_DOT);
        if (dot.isPresent()) {
            numbers.setText(WaistWords.of(dot.get()));
            numbers.show(this, e.getScreenX() + 14, e.getScreenY() + 14);
        } else {
            numbers.hide();
        }
    }

    private void left() {
        session.point(Optional.empty());
        numbers.hide();
    }

    private void pressed(MouseEvent e) {
        requestFocus();
        lastX = e.getX();
        boolean first = e.getButton() == MouseButton.PRIMARY;
        isPanning = e.getButton() == MouseButton.MIDDLE || (first && isSpaceDown);
        BeamDrawing d = drawing;
        if (first && !isPanning && d != null) {
            OptionalInt part =
                    d.partAt(view(d, Math.floor(getWidth()), Math.floor(getHeight())), e.getX(), e.getY(), NEAR_PART);
            if (part.isPresent()) {
                session.select(Optional.of(part.getAsInt()));
            }
        }
    }

    private void dragged(MouseEvent e) {
        if (isPanning) {
            pan(e.getX() - lastX);
            lastX = e.getX();
        }
    }

    private void released() {
        isPanning = false;
        setCursor(Cursor.DEFAULT);
    }

    private void scrolled(ScrollEvent e) {
        double steps = e.getDeltaY() / Math.max(1, e.getMultiplierY());
        if (steps != 0) {
            zoom(Math.pow(STEP, Math.max(-4, Math.min(4, steps))), e.getX());
            e.consume();
        }
    }

    private void key(KeyEvent e) {
        boolean known = true;
        switch (e.getCode()) {
            case SPACE -> isSpaceDown = true;
            case HOME -> showAll();
            case PLUS, EQUALS, ADD -> zoom(STEP, getWidth() / 2);
            case MINUS, SUBTRACT -> zoom(1 / STEP, getWidth() / 2);
            case PAGE_DOWN -> session.step(1);
            case PAGE_UP -> session.step(-1);
            case ESCAPE -> session.select(Optional.empty());
            case LEFT -> known = e.isAltDown() && panned(PAN);
            case RIGHT -> known = e.isAltDown() && panned(-PAN);
            default -> known = false;
        }
        if (known) {
            e.consume();
        }
    }

    private boolean panned(double dx) {
        pan(dx);
        return true;
    }
}
