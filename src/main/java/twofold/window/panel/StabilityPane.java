package twofold.window.panel;

import org.jspecify.annotations.Nullable;
import twofold.cavity.Cavity;
import twofold.cavity.Eigenmode;
import twofold.design.Unit;
import twofold.optics.Plane;
import twofold.picture.Painter;
import twofold.picture.StabilityDrawing;
import twofold.session.Shown;
import twofold.window.DrawingPane;

/** Both planes' stability as bars and in words. */
public final class StabilityPane extends DrawingPane {
    private @Nullable StabilityDrawing drawing;

    /** Makes the pane. */
    public StabilityPane() {
        super("Stability");
        setId("stability");
        setMinHeight(StabilityDrawing.HEIGHT);
        setPrefHeight(StabilityDrawing.HEIGHT);
        setMaxHeight(StabilityDrawing.HEIGHT);
    }

    /** Shows a moment of the session. */
    public void show(Shown shown) {
        drawing = shown.cavity().map(StabilityDrawing::new).orElse(null);
        setAccessibleText("Stability"
                + shown.cavity()
                        .map(c -> ": " + said(c, Plane.TANGENTIAL) + "; " + said(c, Plane.SAGITTAL))
                        .orElse(""));
        redraw();
    }

    private static String said(Cavity cavity, Plane plane) {
        Eigenmode mode = cavity.mode(plane);
        return plane.word() + " " + mode.state().word() + ", half trace " + Unit.ONE.shown(mode.halfTrace());
    }

    @Override
    protected void draw(Painter on, double width, double height) {
        if (drawing != null) {
            drawing.draw(on, width, height);
        }
    }
}
