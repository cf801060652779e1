package twofold.window.bench;

import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import javafx.scene.Cursor;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseEvent;
import twofold.design.Kind;
import twofold.design.Part;
import twofold.design.Point;
import twofold.design.Problem;
import twofold.design.Turn;
import twofold.edit.Edit;
import twofold.edit.PartEdits;
import twofold.layout.Laid;
import twofold.layout.Outcome;
import twofold.session.Session;
import twofold.window.Following;

/**
 * What the pointer and the keys do to parts on the bench: drag, place, nudge. While a part is dragged or hangs at the pointer
 * the session shows a preview; letting go makes that one step.
 */
final class Hands {
    /** How far the pointer must go before a press becomes a drag, px. */
    private static final double DRAG = 4;

    /** How near a leg the pointer must be to place a part on it, px. */
    private static final double NEAR_LEG = 60;

    /** From the pointer to the words beside it, px. */
    private static final double OFF = 18;

    private final Session session;
    private final Following following;
    private final BenchPane pane;
    private final Label hint = new Label();
    private Optional<Grip> grip = Optional.empty();
    private Optional<Kind> placing = Optional.empty();
    private boolean isDragging;
    private double startX;
    private double startY;
    private double pointerX;
    private double pointerY;

    Hands(Session session, Following following, BenchPane pane) {
        this.session = session;
        this.following = following;
        this.pane = pane;
        hint.setId("hint");
        hint.getStyleClass().add("hint");
        hint.setManaged(false);
        hint.setMouseTransparent(true);
        hint.setVisible(false);
        pane.overlay(hint);
    }

    /** Whether a new part hangs at the pointer. */
    boolean isPlacing() {
        return placing.isPresent();
    }

    /** The pointer is somewhere; answers whether a new part hangs there. */
    boolean hover(MouseEvent e) {
        at(e);
        placing.ifPresent(this::ghost);
        return placing.isPresent();
    }

    private void at(MouseEvent e) {
        pointerX = e.getX();
        pointerY = e.getY();
    }

    /** Where on the table the pointer is. */
    private Point table() {
        return pane.view().orElseThrow().viewport().at(pointerX, pointerY);
    }

    // Dragging

    /** Takes hold of a part. */
    void take(MouseEvent e, int part) {
        at(e);
        startX = pointerX;
        startY = pointerY;
        grip = session.laid().map(laid -> Grip.of(laid, part, table()));
    }

    /** The pointer moves with the button down. */
    void drag(MouseEvent e) {
        at(e);
        if (grip.isPresent() && (isDragging || Math.hypot(pointerX - startX, pointerY - startY) >= DRAG)) {
            isDragging = true;
            session.point(Optional.empty());
            grip.ifPresent(this::drag);
        }
    }

    private void drag(Grip held) {
        Outcome<Laid> outcome = session.preview(held.to(table(), following.now()));
        String where = outcome.value()
                .map(laid -> PointerWords.place(
                        laid, laid.design().indexOf(held.name()).orElseThrow()))
                .orElseGet(() -> words(outcome));
        hint(held.name() + (held.isMirror() ? " · " + following.now().words() + " (Tab)" : "") + "\n" + where);
    }

    private static String words(Outcome<Laid> outcome) {
        return outcome.problems().stream().map(Problem::found).distinct().collect(Collectors.joining("\n"));
    }

    /** The button came up. */
    void release() {
        if (isDragging) {
            session.commit();
        }
        letGo();
    }

    private void letGo() {
        grip = Optional.empty();
        isDragging = false;
        hint.setVisible(false);
    }

    // Placing

    /** Hangs a new part at the pointer; until the pointer moves, it is shown behind the selected part. */
    void place(Kind kind) {
        session.abandon();
        letGo();
        placing = Optional.of(kind);
        session.laid().ifPresent(laid -> {
            List<Part> parts = laid.design().parts();
            int behind = session.shown().selected().orElse(parts.size() - 1);
            placed(
                    kind,
                    session.preview(
                            PartEdits.insertBehind(kind, parts.get(behind).name(), Turn.LEFT)));
        });
    }

    private void ghost(Kind kind) {
        Optional<Edit> edit = pane.view()
                .flatMap(v -> session.laid()
                        .flatMap(laid -> Ghost.at(
                                laid, kind, table(), NEAR_LEG / v.viewport().scale())));
        if (edit.isEmpty()) {
            session.abandon();
            hint(title(kind) + "\npoint at a leg");
        } else {
            placed(kind, session.preview(edit.get()));
        }
    }

    private void placed(Kind kind, Outcome<Laid> outcome) {
        String where = outcome.value()
                .flatMap(laid -> session.shown().selected().map(i -> PointerWords.place(laid, i)))
                .orElseGet(() -> words(outcome));
        if (outcome.value().isEmpty()) {
            session.abandon();
        }
        hint(title(kind) + ": click or Enter puts it down, Esc does not\n" + where);
    }

    private static String title(Kind kind) {
        return "New " + kind.word();
    }

    /** Puts the new part down where the pointer is; answers whether there was one. */
    boolean put(MouseEvent e) {
        boolean was = placing.isPresent();
        at(e);
        placing.ifPresent(this::ghost);
        put();
        return was;
    }

    /** Where it cannot stand it stays at the pointer. */
    private void put() {
        if (placing.isPresent() && session.shown().isPreview()) {
            session.commit();
            endPlacing();
        }
    }

    private void endPlacing() {
        placing = Optional.empty();
        hint.setVisible(false);
        pane.setCursor(Cursor.DEFAULT);
    }

    /** Words beside the pointer, on the pane. */
    private void hint(String words) {
        hint.setText(words);
        hint.setVisible(true);
        hint.applyCss();
        hint.autosize();
        double x = pointerX + OFF;
        double y = pointerY + OFF;
        hint.relocate(
                x + hint.getWidth() > pane.getWidth() ? Math.max(0, pointerX - OFF - hint.getWidth()) : x,
                y + hint.getHeight() > pane.getHeight() ? Math.max(0, pointerY - OFF - hint.getHeight()) : y);
    }

    // Keys

    /** A key; answers whether it meant something here. */
    boolean key(KeyEvent e) {
        if (placing.isPresent()) {
            return placingKey(e.getCode());
        }
        if (isDragging) {
            return draggingKey(e.getCode());
        }
        return nudged(e);
    }

    private boolean placingKey(KeyCode key) {
        if (key == KeyCode.ENTER) {
            put();
        } else if (key == KeyCode.ESCAPE) {
            session.abandon();
            endPlacing();
        } else {
            return false;
        }
        return true;
    }

    private boolean draggingKey(KeyCode key) {
        if (key == KeyCode.ESCAPE) {
            session.abandon();
            letGo();
        } else if (key == KeyCode.TAB) {
            following.next();
            grip.ifPresent(this::drag);
        }
        // Nothing else is done to a design whose part is in the hand.
        return true;
    }

    private boolean nudged(KeyEvent e) {
        Optional<Edit> nudge = e.isAltDown()
                ? Optional.empty()
                : session.laid()
                        .flatMap(laid -> session.shown()
                                .selected()
                                .flatMap(i -> Nudge.of(laid, i, e.getCode(), reach(e), following.now())));
        nudge.ifPresent(session::edit);
        return nudge.isPresent();
    }

    private static Nudge.Reach reach(KeyEvent e) {
        return e.isShortcutDown() ? Nudge.Reach.FINE : e.isShiftDown() ? Nudge.Reach.FAR : Nudge.Reach.USUAL;
    }
}
