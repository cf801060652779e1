package twofold.window.inspect;

import java.util.List;
import java.util.function.BiFunction;
import java.util.function.Function;
import javafx.scene.Node;
import org.jspecify.annotations.Nullable;
import twofold.edit.Edit;
import twofold.session.Session;
import twofold.window.form.Reason;
import twofold.window.form.Row;
import twofold.window.form.Text;
import twofold.window.form.Typed;

/** A typed value of a part with its unit behind it, in a row of its own or beside another. */
final class Cell {
    private final Typed typed;
    private final String unit;
    private final Function<Inspected, Text> value;
    private @Nullable Inspected now;

    /**
     * Makes it.
     *
     * @param id of the field in the scene, behind "field-"
     * @param unit behind the field; may be empty
     * @param value of a part
     * @param edit makes what is typed a part's value
     */
    Cell(
            Session session,
            String id,
            String unit,
            Function<Inspected, Text> value,
            BiFunction<Inspected, String, Edit> edit) {
        this.unit = unit;
        this.value = value;
        typed = Typed.line(
                session,
                text -> now == null
                        ? List.of()
                        : session.edit(edit.apply(now, text)).problems());
        typed.field().setId("field-" + id);
    }

    /** The field and its unit. */
    List<Node> nodes() {
        return unit.isEmpty() ? List.of(typed.field()) : List.of(typed.field(), Row.word(unit));
    }

    Typed typed() {
        return typed;
    }

    Reason reason() {
        return typed.reason();
    }

    /** What a screen reader calls it, but for its unit, and what it says besides. */
    void name(String called, String help) {
        typed.name(unit.isEmpty() ? called : called + ", " + unit, help);
    }

    void show(Inspected shown) {
        now = shown;
        typed.show(shown.whose(), value.apply(shown));
    }

    void stash() {
        typed.stash();
    }
}
