package twofold.window.inspect;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Objects;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.Function;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Control;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Region;
import org.jspecify.annotations.Nullable;
import twofold.design.Field;
import twofold.edit.Edit;
import twofold.edit.FieldEdits;
import twofold.session.Session;
import twofold.window.form.Reason;
import twofold.window.form.Row;
import twofold.window.form.Text;
import twofold.window.form.Typed;

/** A row with a typed value, its unit, and where it may be absent a button that takes it away. */
final class TypedLine implements Line {
    private final Session session;
    private final Typed typed;
    private final Row row;
    private final String title;
    private final String unit;
    private final Function<Inspected, Text> value;
    private final @Nullable Clear clear;
    private @Nullable Inspected now;

    /** The button that makes a field absent. */
    private static final class Clear extends Button {
        private final Field field;

        Clear(Field field) {
            super("×");
            this.field = field;
            getStyleClass().add("clear");
            setMinWidth(Region.USE_PREF_SIZE);
            String absent = field.absent();
            String words = absent.equals("none") ? "Makes it absent" : "Takes it back to what it usually is: " + absent;
            setTooltip(new Tooltip(words));
            setAccessibleText("Clear " + title(field));
            setAccessibleHelp(words);
        }

        void show(Inspected now) {
            Object stated = now.part().values().stated().get(field);
            setDisable(stated == null || Objects.equals(Optional.of(stated), field.fallback()));
        }
    }

    private TypedLine(
            Session session,
            String title,
            String unit,
            Function<Inspected, Text> value,
            BiFunction<Inspected, String, Edit> edit,
            @Nullable Clear clear,
            Optional<? extends Control> before,
            List<? extends Control> behind,
            List<Reason> reasons) {
        this.session = session;
        this.title = title;
        this.unit = unit;
        this.value = value;
        this.clear = clear;
        typed = Typed.line(
                session,
                text -> now == null
                        ? List.of()
                        : session.edit(edit.apply(now, text)).problems());
        List<Node> nodes = new ArrayList<>();
        before.ifPresent(nodes::add);
        nodes.add(typed.field());
        if (!unit.isEmpty()) {
            nodes.add(Row.word(unit));
        }
        if (clear != null) {
            nodes.add(clear);
            clear.setOnAction(e -> clear());
        }
        nodes.addAll(behind);
        List<Reason> all = new ArrayList<>(List.of(typed.reason()));
        all.addAll(reasons);
        row = new Row(title, nodes, all);
    }

    /** What a field is called at the head of its row. */
    static String title(Field field) {
        String title = field.title();
        return title.substring(0, 1).toUpperCase(Locale.ROOT) + title.substring(1);
    }

    /** A field of a part. */
    static TypedLine of(Session session, Field field) {
        return of(session, field, now -> value(now, field), Optional.empty(), List.of());
    }

    /**
     * A field of a part whose text is not merely its stated value, with a choice before it.
     *
     * @param reasons the choice's
     */
    static TypedLine of(
            Session session,
            Field field,
            Function<Inspected, Text> value,
            Optional<? extends Control> choice,
            List<Reason> reasons) {
        boolean isOptional = field.need() == Field.Need.OPTIONAL;
        TypedLine line = new TypedLine(
                session,
                title(field),
                field.form() == Field.Form.MATRIX ? "" : field.unit().symbol(),
                value,
                (now, text) -> text.isBlank() && isOptional
                        ? FieldEdits.clear(now.name(), field)
                        : FieldEdits.set(now.name(), field, text),
                isOptional ? new Clear(field) : null,
                choice,
                List.of(),
                reasons);
        line.typed.field().setId("field-" + field.json());
        line.help(help(field));
        return line;
    }

    /**
     * A number of the plan, or something else that is no field.
     *
     * @param help what it is and what it may be
     * @param behind controls at the row's end
     * @param reasons theirs
     */
    static TypedLine of(
            Session session,
            String id,
            String title,
            String unit,
            String help,
            Function<Inspected, Text> value,
            BiFunction<Inspected, String, Edit> edit,
            List<? extends Control> behind,
            List<Reason> reasons) {
        TypedLine line = new TypedLine(session, title, unit, value, edit, null, Optional.empty(), behind, reasons);
        line.typed.field().setId("field-" + id);
        line.help(help);
        return line;
    }

    private static Text value(Inspected now, Field field) {
        return now.part().values().find(field).map(v -> Text.of(field, v)).orElse(Text.NONE);
    }

    /** What a field is and what it may be. */
    static String help(Field field) {
        String absent = field.need() == Field.Need.OPTIONAL ? "\nAbsent: " + field.absent() : "";
        String doc = field.doc();
        return doc.substring(0, 1).toUpperCase(Locale.ROOT) + doc.substring(1) + ".\nMay be " + field.accepted()
                + (field.unit().symbol().isEmpty() || field.form() == Field.Form.MATRIX
                        ? ""
                        : ", in " + field.unit().symbol() + " or with another unit behind it")
                + "." + absent;
    }

    private void help(String words) {
        row.help(words);
        String called = unit.isEmpty() ? title : title + ", " + unit;
        typed.name(called, words);
    }

    /** Calls the row something else. */
    void rename(String called, String help) {
        row.rename(called);
        row.help(help);
        typed.name(unit.isEmpty() ? called : called + ", " + unit, help);
    }

    private void clear() {
        if (now != null && clear != null) {
            typed.reason()
                    .say(session.edit(FieldEdits.clear(now.name(), clear.field)).problems());
            typed.field().requestFocus();
        }
    }

    Typed typed() {
        return typed;
    }

    Row row() {
        return row;
    }

    @Override
    public void addTo(GridPane grid) {
        row.addTo(grid);
    }

    @Override
    public void show(Inspected shown) {
        now = shown;
        typed.show(shown.whose(), value.apply(shown));
        if (clear != null) {
            clear.show(shown);
        }
    }

    @Override
    public void stash() {
        typed.stash();
    }
}
