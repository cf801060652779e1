package twofold.window.inspect;

import java.util.ArrayList;
import java.util.List;
import javafx.scene.layout.GridPane;
import twofold.design.Kind;
import twofold.edit.PartEdits;
import twofold.session.Session;
import twofold.window.Following;
import twofold.window.form.Row;
import twofold.window.form.Text;

/** The rows of one kind of part. */
final class PartForm {
    private final GridPane grid = Row.grid();
    private final List<Line> lines = new ArrayList<>();

    PartForm(Kind kind, Session session, Following following) {
        lines.add(TypedLine.of(
                session,
                "name",
                "Name",
                "",
                "What the part is called: 1 to 60 characters, unlike every other part's.",
                now -> Text.of(now.name()),
                (now, text) -> PartEdits.rename(now.name(), text.strip()),
                List.of(),
                List.of()));
        if (kind == Kind.MIRROR) {
            lines.add(new PlanLines(session, following));
        }
        lines.addAll(new FieldLines(session).of(kind));
        lines.forEach(line -> line.addTo(grid));
    }

    GridPane grid() {
        return grid;
    }

    void show(Inspected now) {
        lines.forEach(line -> line.show(now));
    }

    void stash() {
        lines.forEach(Line::stash);
    }
}
