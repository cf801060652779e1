package twofold.window.inspect;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.function.Function;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Control;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Region;
import org.jspecify.annotations.Nullable;
import twofold.design.Field;
import twofold.design.Names;
import twofold.edit.FieldEdits;
import twofold.session.Session;
import twofold.window.form.Reason;
import twofold.window.form.Row;
import twofold.window.form.Text;

/** The row of a typed field, and where it may be absent a button that takes it away. */
final class TypedLine implements Line {
    private final Session session;
    private final Field field;
    private final Cell cell;
    private final Row row;
    private final Button clear = new Button("×");
    private @Nullable Inspected now;

    /** A field whose text is its stated value. */
    TypedLine(Session session, Field field) {
        this(session, field, now -> value(now, field), Optional.empty(), List.of());
    }

    /**
     * A field whose text is not merely its stated value, with a choice before it.
     *
     * @param reasons the choice's
     */
    TypedLine(
            Session session,
            Field field,
            Function<Inspected, Text> value,
            Optional<? extends Control> choice,
            List<Reason> reasons) {
        this.session = session;
        this.field = field;
        boolean isMatrix = field.form() == Field.Form.MATRIX;
        cell = new Cell(
                session,
                field.json(),
                isMatrix ? "" : field.unit().symbol(),
                value,
                (part, text) -> text.isBlank() && isOptional()
                        ? FieldEdits.clear(part.name(), field)
                        : FieldEdits.set(part.name(), field, text));
        List<Node> nodes = new ArrayList<>();
        choice.ifPresent(nodes::add);
        nodes.addAll(cell.nodes());
        if (isOptional()) {
            nodes.add(clear);
        }
        List<Reason> all = new ArrayList<>(List.of(cell.reason()));
        all.addAll(reasons);
        row = new Row(title(field), nodes, all);
        row.help(help(field));
        cell.name(title(field), help(field));
        clearing();
    }

    private boolean isOptional() {
        return field.need() == Field.Need.OPTIONAL;
    }

    private void clearing() {
        clear.getStyleClass().add("clear");
        clear.setMinWidth(Region.USE_PREF_SIZE);
        String absent = field.absent();
        String words = absent.equals("none") ? "Makes it absent" : "Takes it back to what it usually is: " + absent;
        clear.setTooltip(new Tooltip(words));
        clear.setAccessibleText("Clear " + title(field));
        clear.setAccessibleHelp(words);
        clear.setOnAction(e -> {
            if (now != null) {
                cell.reason()
                        .say(session.edit(FieldEdits.clear(now.name(), field)).problems());
                cell.typed().field().requestFocus();
            }
        });
    }

    /** What a field is called at the head of its row. */
    static String title(Field field) {
        return Names.capital(field.title());
    }

    private static Text value(Inspected now, Field field) {
        return now.part().values().find(field).map(v -> Text.of(field, v)).orElse(Text.NONE);
    }

    /** What a field is and what it may be. */
    static String help(Field field) {
        String symbol = field.unit().symbol();
        boolean hasUnit = !symbol.isEmpty() && field.form() != Field.Form.MATRIX;
        return Names.capital(field.doc()) + ".\nMay be " + field.accepted()
                + (hasUnit ? ", in " + symbol + " or with another unit behind it" : "") + "."
                + (field.need() == Field.Need.OPTIONAL ? "\nAbsent: " + field.absent() : "");
    }

    @Override
    public void addTo(GridPane grid) {
        row.addTo(grid);
    }

    @Override
    public void show(Inspected shown) {
        now = shown;
        cell.show(shown);
        Object stated = shown.part().values().stated().get(field);
        clear.setDisable(stated == null || Objects.equals(Optional.of(stated), field.fallback()));
    }

    @Override
    public void stash() {
        cell.stash();
    }
}
