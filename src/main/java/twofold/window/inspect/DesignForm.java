package twofold.window.inspect;

import java.util.List;
import java.util.function.Function;
import javafx.scene.control.Label;
import javafx.scene.control.TextArea;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import twofold.cavity.Cavity;
import twofold.design.Design;
import twofold.design.Hold;
import twofold.design.Problem;
import twofold.design.Shape;
import twofold.design.Unit;
import twofold.edit.Edit;
import twofold.edit.FieldEdits;
import twofold.edit.HoldEdits;
import twofold.session.Session;
import twofold.window.form.Choice;
import twofold.window.form.Lock;
import twofold.window.form.Row;
import twofold.window.form.Text;
import twofold.window.form.Typed;

/** The rows of the design itself: title, notes, wavelength, shape, and the hold of its round trip. */
final class DesignForm {
    private final Session session;
    private final GridPane grid = Row.grid();
    private final Typed title;
    private final Typed notes;
    private final Typed wavelength;
    private final Choice<Shape> shape;
    private final Label roundTrip = new Label();
    private final Lock held = new Lock();

    DesignForm(Session session) {
        this.session = session;
        title = Typed.line(session, edit(t -> FieldEdits.title(t.strip())));
        notes = Typed.lines(session, edit(FieldEdits::notes));
        wavelength = Typed.line(session, edit(FieldEdits::wavelength));
        shape = new Choice<>(Shape::word, s -> apply(FieldEdits.shape(s)));
        typed("title", "Title", "What the design is called.", title, "");
        typed(
                "wavelength",
                "Wavelength",
                "Of the vacuum, from " + Unit.NM.text(Design.SHORTEST_WAVE) + " to " + Unit.NM.text(Design.LONGEST_WAVE)
                        + " nm. Indices of materials follow it.",
                wavelength,
                Unit.NM.symbol());
        String help =
                "How the light closes: it returns from both ends, or runs round. The mirrors stay where they are.";
        shape.setId("choice-shape");
        shape.setAccessibleText("Shape");
        shape.setAccessibleHelp(help);
        Row shapes = new Row("Shape", List.of(shape), List.of(shape.reason()));
        shapes.help(help);
        shapes.addTo(grid);
        held.setId("lock-round-trip");
        roundTrip.getStyleClass().add("figure");
        roundTrip.setMaxWidth(Double.MAX_VALUE);
        HBox.setHgrow(roundTrip, Priority.ALWAYS);
        Row trip = new Row("Optical round trip", List.of(roundTrip, held), List.of(held.reason()));
        trip.help("Index times path, summed over one round trip.");
        trip.addTo(grid);
        typed(
                "notes",
                "Notes",
                "Whatever is worth keeping with the design. Ctrl+Enter or leaving applies it.",
                notes,
                "");
    }

    private void typed(String id, String called, String help, Typed typed, String unit) {
        typed.field().setId("design-" + id);
        typed.name(unit.isEmpty() ? called : called + ", " + unit, help);
        Row row = new Row(
                called,
                unit.isEmpty() ? List.of(typed.field()) : List.of(typed.field(), Row.word(unit)),
                List.of(typed.reason()));
        row.help(help);
        if (typed.field() instanceof TextArea) {
            row.addWideTo(grid);
        } else {
            row.addTo(grid);
        }
    }

    private Function<String, List<Problem>> edit(Function<String, Edit> edit) {
        return text -> apply(edit.apply(text));
    }

    private List<Problem> apply(Edit edit) {
        return session.edit(edit).problems();
    }

    GridPane grid() {
        return grid;
    }

    void show(int document, Cavity cavity) {
        Design design = cavity.laid().design();
        String whose = String.valueOf(document);
        title.show(whose, Text.of(design.title()));
        notes.show(whose, Text.of(design.notes()));
        wavelength.show(whose, Text.of(Unit.NM, design.wavelength()));
        shape.show(List.of(Shape.values()), design.shape());
        roundTrip.setText(Unit.MM.shown(cavity.opticalRoundTrip()) + " mm");
        Hold hold = new Hold.RoundTrip();
        held.show(
                hold.words(),
                HoldEdits.isHeld(design, hold),
                () -> session.laid()
                        .map(l -> apply(HoldEdits.toggle(l.design(), hold)))
                        .orElse(List.of()));
    }

    void stash() {
        title.stash();
        notes.stash();
        wavelength.stash();
    }
}
