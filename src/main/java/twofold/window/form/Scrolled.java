package twofold.window.form;

import javafx.geometry.Bounds;
import javafx.scene.Node;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.Region;

/** A pane that scrolls up and down and brings what has the keyboard into view. */
public final class Scrolled extends ScrollPane {
    /** Left above and below, px. */
    private static final double MARGIN = 4;

    /** Makes it; a screen reader calls it by the name. */
    public Scrolled(String name) {
        setFitToWidth(true);
        setHbarPolicy(ScrollBarPolicy.NEVER);
        setAccessibleText(name);
        sceneProperty().addListener((o, was, is) -> {
            if (is != null) {
                is.focusOwnerProperty().addListener((p, from, to) -> {
                    if (to != null && holds(to)) {
                        reveal(to);
                    }
                });
            }
        });
    }

    private boolean holds(Node node) {
        for (Node n = node.getParent(); n != null; n = n.getParent()) {
            if (n.equals(getContent())) {
                return true;
            }
        }
        return false;
    }

    /** Scrolls as little as brings a node inside into view; of one that is too high its head. */
    public void reveal(Node node) {
        if (!(getContent() instanceof Region content)) {
            return;
        }
        // What has just appeared has its place only after a layout.
        getScene().getRoot().applyCss();
        getScene().getRoot().layout();
        double seen = getViewportBounds().getHeight();
        double hidden = content.getHeight() - seen;
        if (hidden <= 0) {
            return;
        }
        Bounds at = content.sceneToLocal(node.localToScene(node.getLayoutBounds()));
        double top = getVvalue() * hidden;
        double next = Math.min(at.getMinY() - MARGIN, Math.max(top, at.getMaxY() + MARGIN - seen));
        setVvalue(Math.max(0, Math.min(1, next / hidden)));
    }
}
