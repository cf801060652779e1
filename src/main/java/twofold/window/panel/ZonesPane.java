package twofold.window.panel;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import javafx.scene.control.Tooltip;
import javafx.scene.input.MouseEvent;
import org.jspecify.annotations.Nullable;
import twofold.cavity.Cavity;
import twofold.cavity.Chain;
import twofold.cavity.Trial;
import twofold.cavity.Zones;
import twofold.design.Part;
import twofold.layout.Leg;
import twofold.optics.Plane;
import twofold.picture.GDiagramDrawing;
import twofold.picture.GPair;
import twofold.picture.Painter;
import twofold.picture.ZoneStripDrawing;
import twofold.session.Shown;
import twofold.window.DrawingPane;

/**
 * The stability zones along the leg of the selected part, with their named edges, and the G1–G2 diagram with the way that
 * both planes' points came since the file was opened.
 */
public final class ZonesPane extends DrawingPane {
    /** The longest trail that is kept. */
    private static final int TRAIL = 200;

    private static final double STRIP = 170;

    private final Tooltip words = new Tooltip();
    private final List<GPair> tangential = new ArrayList<>();
    private final List<GPair> sagittal = new ArrayList<>();
    private int document;
    private @Nullable Cavity cavity;
    private @Nullable ZoneStripDrawing strip;

    /** Makes the pane. */
    public ZonesPane() {
        super("Stability zones along a leg, and the G1–G2 diagram");
        setId("zones");
        addEventHandler(MouseEvent.MOUSE_MOVED, this::moved);
        addEventHandler(MouseEvent.MOUSE_EXITED, e -> words.hide());
    }

    /** Shows a moment of the session. */
    public void show(Shown shown) {
        if (shown.document() != document) {
            document = shown.document();
            tangential.clear();
            sagittal.clear();
        }
        Cavity next = shown.cavity().orElse(null);
        if (next != null && !Objects.equals(next, cavity)) {
            follow(tangential, GPair.of(next.tangential()));
            follow(sagittal, GPair.of(next.sagittal()));
        }
        cavity = next;
        strip = next == null ? null : strip(next, leg(next, shown.selected()));
        redraw();
    }

    private static void follow(List<GPair> trail, Optional<GPair> to) {
        to.ifPresent(trail::add);
        if (trail.size() > TRAIL) {
            trail.remove(0);
        }
    }

    /** The leg that the selected part stands on or sends the beam along; without one, the ledger's. */
    private static int leg(Cavity cavity, Optional<Integer> selected) {
        List<Leg> legs = cavity.laid().legs();
        for (int i = 0; i < legs.size() && selected.isPresent(); i++) {
            int part = selected.get();
            Leg leg = legs.get(i);
            if (leg.from() == part || leg.parts().stream().anyMatch(s -> s.part() == part)) {
                return i;
            }
        }
        return cavity.ledgerLeg().orElse(legs.size() - 1);
    }

    private static ZoneStripDrawing strip(Cavity cavity, int leg) {
        Trial trial = Chain.of(cavity.laid()).trial();
        trial.run();
        List<Part> parts = cavity.laid().design().parts();
        Leg along = cavity.laid().legs().get(leg);
        return new ZoneStripDrawing(
                Zones.of(trial, leg, Plane.TANGENTIAL),
                Zones.of(trial, leg, Plane.SAGITTAL),
                parts.get(along.from()).name() + " to " + parts.get(along.to()).name());
    }

    private static double stripHeight(double height) {
        return Math.min(STRIP, Math.max(ZoneStripDrawing.LEAST_HEIGHT, height / 2));
    }

    @Override
    protected void draw(Painter on, double width, double height) {
        if (strip == null) {
            return;
        }
        double high = stripHeight(height);
        strip.draw(on, width, high);
        if (height - high > 120) {
            on.push(0, high, width, height - high);
            new GDiagramDrawing(tangential, sagittal).draw(on, width, height - high);
            on.pop();
        }
    }

    private void moved(MouseEvent e) {
        Optional<ZoneStripDrawing.Hit> hit = strip == null
                ? Optional.empty()
                : strip.edgeAt(e.getX(), e.getY(), Math.floor(getWidth()), stripHeight(Math.floor(getHeight())));
        if (hit.isPresent()) {
            words.setText(hit.get().words());
            words.show(this, e.getScreenX() + 14, e.getScreenY() + 14);
        } else {
            words.hide();
        }
    }
}
