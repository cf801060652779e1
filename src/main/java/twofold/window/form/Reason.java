package twofold.window.form;

import java.util.List;
import java.util.stream.Collectors;
import javafx.scene.control.Label;
import twofold.design.Problem;

/** Why something was refused, in words under the control; takes no room when nothing was. */
public final class Reason extends Label {
    /** Makes it without words. */
    public Reason() {
        getStyleClass().addAll("bad", "reason");
        setWrapText(true);
        setMinHeight(USE_PREF_SIZE);
        say("");
    }

    /** Says why; nothing where the words are empty. */
    public void say(String words) {
        boolean isRefused = !words.isEmpty();
        setText(isRefused ? "! " + words : "");
        setVisible(isRefused);
        setManaged(isRefused);
    }

    /** Says what is wrong. */
    public void say(List<Problem> problems) {
        say(words(problems));
    }

    /** Problems as words, a line each. */
    static String words(List<Problem> problems) {
        return problems.stream().map(Problem::message).distinct().collect(Collectors.joining("\n"));
    }
}
