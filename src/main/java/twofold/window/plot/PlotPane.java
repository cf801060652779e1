package twofold.window.plot;

import java.util.Optional;
import java.util.function.Consumer;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import twofold.picture.Ink;
import twofold.picture.Painter;
import twofold.picture.Points;
import twofold.window.DrawingPane;

/**
 * A sweep or map under the mouse and the keys: pointing says the numbers there, the first button or an arrow key picks a
 * point; Shift with an arrow goes ten steps.
 */
final class PlotPane extends DrawingPane {
    /** How much of a stale picture its paper covers. */
    private static final double VEIL = 0.55;

    private static final int FAR = 10;

    private final Consumer<double[]> pick;
    private final Runnable accept;
    private final Runnable leave;
    private Optional<Picture> picture = Optional.empty();
    private Optional<double[]> pointed = Optional.empty();
    private Optional<double[]> picked = Optional.empty();
    private boolean isStale;

    /**
     * An empty pane.
     *
     * @param pick takes the levers' values of a point that is picked
     * @param accept told that a person wants to keep what is picked, by Enter
     * @param leave told that a person does not, by Escape
     */
    PlotPane(String id, String name, Consumer<double[]> pick, Runnable accept, Runnable leave) {
        super(name);
        this.pick = pick;
        this.accept = accept;
        this.leave = leave;
        setId(id);
        setFocusTraversable(true);
        focusedProperty().addListener((o, was, is) -> redraw());
        addEventHandler(MouseEvent.MOUSE_MOVED, e -> point(at(e)));
        addEventHandler(MouseEvent.MOUSE_EXITED, e -> point(Optional.empty()));
        addEventHandler(MouseEvent.MOUSE_PRESSED, this::pressed);
        addEventHandler(MouseEvent.MOUSE_DRAGGED, this::dragged);
        addEventHandler(KeyEvent.KEY_PRESSED, this::keyed);
    }

    /** Shows a picture, or none. */
    void show(Optional<Picture> next, boolean stale, Optional<double[]> point) {
        if (!next.equals(picture)) {
            pointed = Optional.empty();
        }
        picture = next;
        isStale = stale;
        picked = point;
        redraw();
    }

    private Optional<double[]> at(MouseEvent e) {
        return picture.flatMap(p -> p.at(e.getX(), e.getY(), Math.floor(getWidth()), Math.floor(getHeight())));
    }

    private void point(Optional<double[]> at) {
        pointed = at;
        redraw();
    }

    private void pressed(MouseEvent e) {
        requestFocus();
        if (e.getButton() == MouseButton.PRIMARY && !isStale) {
            at(e).ifPresent(pick);
        }
    }

    private void dragged(MouseEvent e) {
        if (e.getButton() == MouseButton.PRIMARY && !isStale) {
            point(at(e));
            pointed.ifPresent(pick);
        }
    }

    private void keyed(KeyEvent e) {
        int far = e.isShiftDown() ? FAR : 1;
        boolean known = !e.isAltDown() && !e.isShortcutDown();
        if (known) {
            switch (e.getCode()) {
                case LEFT -> move(-far, 0);
                case RIGHT -> move(far, 0);
                case DOWN -> move(0, -far);
                case UP -> move(0, far);
                case ENTER -> accept.run();
                case ESCAPE -> leave.run();
                default -> known = false;
            }
        }
        if (known) {
            e.consume();
        }
    }

    private void move(int right, int up) {
        if (picture.isPresent() && !isStale) {
            Picture p = picture.get();
            Optional<double[]> from = picked.or(p::now);
            pointed = Optional.empty();
            from.ifPresent(f -> pick.accept(p.moved(f, right, up)));
        }
    }

    @Override
    protected void draw(Painter on, double width, double height) {
        if (picture.isEmpty()) {
            return;
        }
        picture.get().draw(on, width, height, pointed.or(() -> picked));
        if (isStale) {
            Points all = new Points();
            all.add(0, 0).add(width, 0).add(width, height).add(0, height);
            on.polygon(all, Ink.PAPER, VEIL);
        }
    }
}
