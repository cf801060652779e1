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
    private final Cell name;
    private final List<Line> lines = new ArrayList<>();

    PartForm(Kind kind, Session session, Following following) {
        name = new Cell(
                session,
                "name",
                "",
                now -> Text.of(now.name()),
                (now, text) -> PartEdits.rename(now.name(), text.strip()));
        String help = "What the part is called: 1 to 60 characters, unlike every other part's.";
        name.name("Name", help);
        Row row = new Row("Name", name.nodes(), List.of(name.reason()));
        row.help(help);
        row.addTo(grid);
        lines.addAll(new FieldLines(session).of(kind));
        if (kind == Kind.MIRROR) {
            // Behind its radius, which comes first.
            lines.add(1, new PlanLines(session, following));
        }
        lines.forEach(line -> line.addTo(grid));
    }

    GridPane grid() {
        return grid;
    }

    void show(Inspected now) {
        name.show(now);
        lines.forEach(line -> line.show(now));
    }

    void stash() {
        name.stash();
        lines.forEach(Line::stash);
    }
}
