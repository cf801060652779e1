package twofold.window.beam;

import java.util.OptionalInt;
import org.jspecify.annotations.Nullable;
import twofold.picture.CloseUpDrawing;
import twofold.picture.Painter;
import twofold.session.Shown;
import twofold.window.DrawingPane;

/** The close-up of the selected crystal, plate or leg. */
public final class CloseUpPane extends DrawingPane {
    private @Nullable CloseUpDrawing drawing;
    private OptionalInt selected = OptionalInt.empty();

    /** Makes the pane. */
    public CloseUpPane() {
        super("Close-up of the selected crystal or leg");
        setId("close-up");
    }

    /** Shows a moment of the session. */
    public void show(Shown shown) {
        drawing = shown.cavity().map(CloseUpDrawing::new).orElse(null);
        selected = shown.selected().map(OptionalInt::of).orElse(OptionalInt.empty());
        redraw();
    }

    @Override
    protected void draw(Painter on, double width, double height) {
        if (drawing != null) {
            drawing.draw(on, width, height, selected);
        }
    }
}
