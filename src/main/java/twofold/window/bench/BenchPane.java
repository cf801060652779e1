package twofold.window.bench;

import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import javafx.scene.Cursor;
import javafx.scene.Node;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseEvent;
import org.jspecify.annotations.Nullable;
import twofold.cavity.Cavity;
import twofold.design.Kind;
import twofold.picture.BenchDrawing;
import twofold.picture.BenchView;
import twofold.picture.Painter;
import twofold.picture.Viewport;
import twofold.session.Session;
import twofold.session.Shown;
import twofold.window.Following;
import twofold.window.ViewPane;

/**
 * The bench: the plan from above. A mirror is dragged on the plane, any other part along its leg, and the beam follows; Tab
 * chooses what else moves, Esc abandons. A part chosen to be placed hangs at the pointer until a click or Enter puts it down.
 * Arrow keys, comma and full stop nudge and turn the selected part.
 */
public final class BenchPane extends ViewPane {
    /** How near a click must come to a part, and the pointer to the beam, px. */
    private static final double NEAR_PART = 8;

    private static final double NEAR_BEAM = 14;

    private final Hands hands;

    private @Nullable Cavity cavity;
    private @Nullable BenchDrawing drawing;
    private @Nullable Viewport viewport;
    private OptionalDouble magnify = OptionalDouble.empty();
    private OptionalInt selected = OptionalInt.empty();
    private OptionalDouble pointed = OptionalDouble.empty();

    /** Makes the pane. */
    public BenchPane(Session session, Following following) {
        super("Bench, the plan seen from above", session);
        setId("bench");
        hands = new Hands(session, following, this);
        // What is in the middle stays there when the pane grows or shrinks.
        widthProperty().addListener((o, was, is) -> resized(is.doubleValue() - was.doubleValue(), 0));
        heightProperty().addListener((o, was, is) -> resized(0, is.doubleValue() - was.doubleValue()));
    }

    /** Shows a moment of the session; another design is shown whole. */
    public void show(Shown shown, boolean isOther) {
        Cavity next = shown.cavity().orElse(null);
        if (!Objects.equals(next, cavity)) {
            if (!isOther && viewport == null && getWidth() > 0) {
                // What is edited stays where the person sees it; until then the view follows the window's size.
                view().ifPresent(v -> viewport = v.viewport());
            }
            cavity = next;
            drawing = next == null ? null : new BenchDrawing(next);
        }
        if (isOther) {
            viewport = null;
        }
        selected = shown.selected().map(OptionalInt::of).orElse(OptionalInt.empty());
        pointed = shown.pointed().map(OptionalDouble::of).orElse(OptionalDouble.empty());
        setAccessibleText("Bench, the plan seen from above"
                + session()
                        .selectedPart()
                        .map(p -> "; selected: " + p.name() + ", " + p.kind().word())
                        .orElse(""));
        redraw();
    }

    /** Draws the beam so many times wider than true, or by itself. */
    public void magnify(OptionalDouble factor) {
        magnify = factor;
        redraw();
    }

    @Override
    public void showAll() {
        viewport = null;
        redraw();
    }

    /** What is shown now; empty before anything is. */
    public Optional<BenchView> view() {
        BenchDrawing d = drawing;
        return d == null ? Optional.empty() : Optional.of(view(d));
    }

    private BenchView view(BenchDrawing d) {
        return view(d, Math.floor(getWidth()), Math.floor(getHeight()));
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

    private void resized(double wider, double higher) {
        if (viewport != null) {
            viewport = viewport.panned(wider / 2, higher / 2);
        }
    }

    @Override
    protected void zoom(double factor, double x, double y) {
        view().ifPresent(v -> {
            viewport = v.viewport().zoomed(factor, x, y);
            redraw();
        });
    }

    @Override
    protected void pan(double dx, double dy) {
        view().ifPresent(v -> {
            viewport = v.viewport().panned(dx, dy);
            redraw();
        });
    }

    @Override
    protected void hover(MouseEvent e) {
        if (hands.hover(e)) {
            return;
        }
        BenchDrawing d = drawing;
        if (d != null) {
            OptionalDouble path = d.pathAt(view(d), e.getX(), e.getY(), NEAR_BEAM);
            session().point(path.isPresent() ? Optional.of(path.getAsDouble()) : Optional.empty());
        }
    }

    @Override
    protected OptionalInt partAt(double x, double y) {
        BenchDrawing d = drawing;
        return d == null ? OptionalInt.empty() : d.partAt(view(d), x, y, NEAR_PART);
    }

    @Override
    protected Cursor cursorAt(double x, double y) {
        return hands.isPlacing() ? Cursor.CROSSHAIR : super.cursorAt(x, y);
    }

    /** Hangs a new part at the pointer, to be put down by a click or Enter. */
    public void place(Kind kind) {
        requestFocus();
        hands.place(kind);
        setCursor(Cursor.CROSSHAIR);
    }

    /** Shows words on the pane. */
    void overlay(Node words) {
        getChildren().add(words);
    }

    @Override
    protected void press(MouseEvent e) {
        OptionalInt part = partAt(e.getX(), e.getY());
        if (hands.put(e)) {
            setCursor(cursorAt(e.getX(), e.getY()));
        } else if (part.isPresent() && e.isShortcutDown()) {
            session().toggle(part.getAsInt());
        } else if (part.isPresent() && e.isShiftDown()) {
            session().selectTo(part.getAsInt());
        } else {
            super.press(e);
            part.ifPresent(p -> hands.take(e, p));
        }
    }

    @Override
    protected void drag(MouseEvent e) {
        hands.drag(e);
    }

    @Override
    protected void release(MouseEvent e) {
        hands.release();
    }

    @Override
    protected boolean key(KeyEvent e) {
        return hands.key(e);
    }
}
