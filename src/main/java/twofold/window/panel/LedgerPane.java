package twofold.window.panel;

import org.jspecify.annotations.Nullable;
import twofold.design.Edge;
import twofold.picture.LedgerDrawing;
import twofold.picture.Painter;
import twofold.session.Shown;
import twofold.window.DrawingPane;

/** Where the astigmatism comes from: what each part adds to the difference between the planes. */
public final class LedgerPane extends DrawingPane {
    private @Nullable LedgerDrawing drawing;

    /** Makes the pane. */
    public LedgerPane() {
        super("Where the astigmatism comes from");
        setId("ledger");
    }

    /** Shows a moment of the session. */
    public void show(Shown shown) {
        drawing = shown.cavity()
                .map(c -> new LedgerDrawing(c.laid(), c.ledger(), Edge.LOWER))
                .orElse(null);
        redraw();
    }

    @Override
    protected void draw(Painter on, double width, double height) {
        if (drawing != null) {
            drawing.draw(on, width, height);
        }
    }
}
