package twofold.window.form;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import javafx.scene.control.TextArea;
import javafx.scene.control.TextField;
import javafx.scene.control.TextInputControl;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import twofold.design.Problem;
import twofold.session.Session;

/**
 * A text that a person types for a value. Unfocused it shows the value rounded, focused in full. Enter or leaving the field
 * applies what was typed; where that is refused it stays, marked and with its reason, until another is accepted or Esc
 * returns to the value. A text that is not applied also outlasts the sight of another part in the same field.
 *
 * <p>Undo and redo belong to the field while its text is not applied, and to the document otherwise.
 */
public final class Typed {
    private static final String NOT_YET = "not applied yet: Enter applies it, Esc returns to the value";

    private final TextInputControl field;
    private final Session session;
    private final Function<String, List<Problem>> take;
    private final Reason reason = new Reason();
    private final Map<String, Draft> drafts = new HashMap<>();
    private String name = "";
    private String help = "";
    private String whose = "";
    private Text value = Text.NONE;
    private String put = "";
    private String refused = "";
    private boolean isTaking;

    /** A text that is not applied, and why. */
    private record Draft(String text, String refused, String reason) {}

    private Typed(TextInputControl field, Session session, Function<String, List<Problem>> take) {
        this.field = field;
        this.session = session;
        this.take = take;
        // Whoever saves finds what is typed by the field that has the keyboard.
        field.setUserData(this);
        field.focusedProperty().addListener((o, was, is) -> {
            if (is) {
                entered();
            } else if (!isOwner()) {
                left();
            }
        });
        field.addEventFilter(KeyEvent.KEY_PRESSED, this::pressed);
    }

    /**
     * A line.
     *
     * @param take applies a text, and says what is wrong with it
     */
    public static Typed line(Session session, Function<String, List<Problem>> take) {
        TextField field = new TextField();
        field.setPrefColumnCount(7);
        field.setMinWidth(48);
        return new Typed(field, session, take);
    }

    /** Several lines; Ctrl+Enter applies them. */
    public static Typed lines(Session session, Function<String, List<Problem>> take) {
        TextArea area = new TextArea();
        area.setWrapText(true);
        area.setPrefRowCount(8);
        area.setPrefColumnCount(10);
        return new Typed(area, session, take);
    }

    /** The control. */
    public TextInputControl field() {
        return field;
    }

    /** Why the text was refused, to be put under the control. */
    public Reason reason() {
        return reason;
    }

    /** What a screen reader calls it, and what it says besides. */
    public void name(String called, String helped) {
        name = called;
        help = helped;
        tell();
    }

    private void tell() {
        String why = reason.getText().replaceFirst("^! ", "");
        field.setAccessibleText(why.isEmpty() ? name : name + ", not applied: " + why);
        field.setAccessibleHelp(help);
    }

    /**
     * Shows a value; what is typed and not applied stays.
     *
     * @param of whose value it is: a text that is not applied stays with it
     * @param now the value as text
     */
    public void show(String of, Text now) {
        boolean isOther = !of.equals(whose);
        if (isTaking) {
            whose = of;
            value = now;
            return;
        }
        if (isOther) {
            stash();
            whose = of;
        }
        boolean wasTyped = isTyped();
        value = now;
        if (isOther && drafts.containsKey(of)) {
            Draft draft = drafts.remove(of);
            put(text());
            field.setText(draft.text());
            refuse(draft.refused(), draft.reason());
        } else if (!wasTyped) {
            put(text());
        }
    }

    /** Whether a text is in the field that is not applied. */
    public boolean isTyped() {
        return !field.getText().equals(put);
    }

    /** Lays a text that is not applied aside until the same value is shown again. */
    public void stash() {
        if (isTyped()) {
            String why = reason.getText().isEmpty() ? NOT_YET : reason.getText().replaceFirst("^! ", "");
            drafts.put(whose, new Draft(field.getText(), refused, why));
            put(text());
            refuse("", "");
        }
        whose = "";
    }

    private String text() {
        return field.isFocused() ? value.full() : value.rounded();
    }

    private void put(String text) {
        if (!field.getText().equals(text)) {
            int caret = field.getCaretPosition();
            boolean isAll = field.getLength() > 0 && field.getSelectedText().length() == field.getLength();
            field.setText(text);
            if (isAll) {
                field.selectAll();
            } else {
                field.positionCaret(Math.min(caret, text.length()));
            }
        }
        put = text;
    }

    private void refuse(String text, String why) {
        refused = text;
        reason.say(why);
        List<String> styles = field.getStyleClass();
        styles.remove("refused");
        if (!why.isEmpty()) {
            styles.add("refused");
        }
        tell();
    }

    private boolean isOwner() {
        return field.getScene() != null && field.equals(field.getScene().getFocusOwner());
    }

    private void entered() {
        if (!isTyped()) {
            put(value.full());
            field.selectAll();
        }
    }

    private void left() {
        if (!isTyped()) {
            put(value.rounded());
        } else if (refused.isEmpty() || !field.getText().equals(refused)) {
            take();
        }
    }

    /** Applies what is typed. */
    public void take() {
        if (!isTyped() || !field.isEditable()) {
            return;
        }
        String text = field.getText();
        isTaking = true;
        List<Problem> problems = take.apply(text);
        isTaking = false;
        if (problems.isEmpty()) {
            put(text());
            refuse("", "");
        } else {
            refuse(text, Reason.words(problems));
        }
    }

    private void giveUp() {
        put(value.full());
        refuse("", "");
        field.selectAll();
    }

    private void pressed(KeyEvent e) {
        if (e.getCode() == KeyCode.ENTER && (field instanceof TextField || e.isShortcutDown())) {
            take();
            e.consume();
        } else if (e.getCode() == KeyCode.ESCAPE && isTyped()) {
            giveUp();
            e.consume();
        } else if (!isTyped() && e.isShortcutDown() && !e.isAltDown()) {
            undo(e).ifPresent(step -> {
                step.run();
                e.consume();
            });
        }
    }

    private Optional<Runnable> undo(KeyEvent e) {
        if (e.getCode() == KeyCode.Z) {
            return Optional.of(e.isShiftDown() ? session::redo : session::undo);
        }
        return e.getCode() == KeyCode.Y ? Optional.of(session::redo) : Optional.empty();
    }

    /** Keeps the text from being changed, for a reason, or lets it be changed. */
    public void fix(Optional<String> why) {
        field.setEditable(why.isEmpty());
        field.getStyleClass().remove("fixed");
        if (why.isPresent()) {
            field.getStyleClass().add("fixed");
        }
        field.setAccessibleHelp(why.orElse(help));
    }
}
