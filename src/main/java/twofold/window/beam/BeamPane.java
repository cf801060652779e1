package twofold.window.beam;

import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import javafx.scene.control.Tooltip;
import javafx.scene.input.MouseEvent;
import org.jspecify.annotations.Nullable;
import twofold.cavity.Cavity;
import twofold.picture.BeamDrawing;
import twofold.picture.BeamView;
import twofold.picture.Painter;
import twofold.picture.Stretch;
import twofold.session.Session;
import twofold.session.Shown;
import twofold.window.ViewPane;

/** The beam along the unfolded path; hovering over a waist's dot shows its numbers. */
public final class BeamPane extends ViewPane {
    private static final double NEAR_PART = 12;
    private static final double NEAR_DOT = 8;

    private final Tooltip numbers = new Tooltip();
    private @Nullable Cavity cavity;
    private @Nullable BeamDrawing drawing;
    private double from;
    private double to;
    private OptionalInt selected = OptionalInt.empty();
    private OptionalDouble pointed = OptionalDouble.empty();

    /** Makes the pane. */
    public BeamPane(Session session) {
        super("Beam along the path", session);
        setId("beam");
    }

    /** Shows a moment of the session; another design is shown whole. */
    public void show(Shown shown, boolean isOther) {
        Cavity next = shown.cavity().orElse(null);
        boolean isWhole =
                drawing == null || (from == 0 && to == drawing.course().length());
        if (!Objects.equals(next, cavity)) {
            cavity = next;
            drawing = next == null ? null : new BeamDrawing(next);
        }
        if (isOther || isWhole || drawing == null || to > drawing.course().length()) {
            showAll();
        }
        selected = shown.selected().map(OptionalInt::of).orElse(OptionalInt.empty());
        pointed = shown.pointed().map(OptionalDouble::of).orElse(OptionalDouble.empty());
        redraw();
    }

    @Override
    public void showAll() {
        from = 0;
        to = drawing == null ? 0 : drawing.course().length();
        redraw();
    }

    /** What is shown now; empty before anything is. */
    public Optional<BeamView> view() {
        BeamDrawing d = drawing;
        return d == null ? Optional.empty() : Optional.of(view(d));
    }

    private BeamView view(BeamDrawing d) {
        return view(d, Math.floor(getWidth()), Math.floor(getHeight()));
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

    @Override
    protected void zoom(double factor, double x, double y) {
        BeamDrawing d = drawing;
        view().ifPresent(v -> {
            if (d != null) {
                over(v.stretch().zoomed(factor, x, d.course().length()));
            }
        });
    }

    @Override
    protected void pan(double dx, double dy) {
        BeamDrawing d = drawing;
        view().ifPresent(v -> {
            if (d != null) {
                over(v.stretch().panned(dx, d.course().length()));
            }
        });
    }

    @Override
    protected void hover(MouseEvent e) {
        BeamDrawing d = drawing;
        if (d == null) {
            return;
        }
        BeamView v = view(d);
        OptionalDouble path = d.pathAt(v, e.getX(), e.getY());
        session().point(path.isPresent() ? Optional.of(path.getAsDouble()) : Optional.empty());
        Optional<BeamDrawing.WaistDot> dot = d.waistAt(v, e.getX(), e.getY(), NEAR_DOT);
        if (dot.isPresent()) {
            numbers.setText(WaistWords.of(dot.get()));
            numbers.show(this, e.getScreenX() + 14, e.getScreenY() + 14);
        } else {
            numbers.hide();
        }
    }

    @Override
    protected void left() {
        super.left();
        numbers.hide();
    }

    @Override
    protected void press(MouseEvent e) {
        // Between parts a click on the path means nothing: the selection stays.
        if (partAt(e.getX(), e.getY()).isPresent()) {
            super.press(e);
        }
    }

    @Override
    protected OptionalInt partAt(double x, double y) {
        BeamDrawing d = drawing;
        return d == null ? OptionalInt.empty() : d.partAt(view(d), x, y, NEAR_PART);
    }
}
