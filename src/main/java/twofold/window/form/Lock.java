package twofold.window.form;

import java.util.List;
import java.util.function.Supplier;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.Tooltip;
import javafx.scene.shape.SVGPath;
import twofold.design.Problem;

/** A lock that is closed or open: told by its shackle, and in words. */
public final class Lock extends ToggleButton {
    private static final String BODY = "M1 7 H11 V14 H1 Z ";
    private static final String CLOSED = BODY + "M3 7 V4 A3 3 0 0 1 9 4 V7 H7.4 V4 A1.4 1.4 0 0 0 4.6 4 V7 Z";
    private static final String OPEN = BODY + "M7 7 V4 A3 3 0 0 1 13 4 V5 H11.4 V4 A1.4 1.4 0 0 0 8.6 4 V7 Z";

    private final SVGPath picture = new SVGPath();
    private final Reason reason = new Reason();
    private final Tooltip tip = new Tooltip();
    private Supplier<List<Problem>> turn = List::of;
    private boolean isShut;
    private String what = "";

    /** Makes it open, holding nothing. */
    public Lock() {
        getStyleClass().add("lock");
        setMinWidth(USE_PREF_SIZE);
        picture.getStyleClass().add("picture");
        setGraphic(picture);
        setTooltip(tip);
        setOnAction(e -> {
            reason.say(turn.get());
            draw();
        });
        draw();
    }

    /** Why it could not be turned, to be put under the control. */
    public Reason reason() {
        return reason;
    }

    /**
     * Shows whether it is closed.
     *
     * @param of what it holds: "the leg End A/Fold 1"
     * @param turned opens or closes it, and says what is wrong with that
     */
    public void show(String of, boolean isClosed, Supplier<List<Problem>> turned) {
        if (!of.equals(what) || isClosed != isShut) {
            reason.say("");
        }
        turn = turned;
        what = of;
        isShut = isClosed;
        draw();
    }

    private void draw() {
        setSelected(isShut);
        picture.setContent(isShut ? CLOSED : OPEN);
        setAccessibleText("Hold " + what);
        String words = isShut
                ? "Held: " + what + " keeps its value while mirrors move. A click lets it change."
                : "Free: a click holds " + what + " at its present value while mirrors move.";
        tip.setText(words);
        setAccessibleHelp(words);
    }
}
