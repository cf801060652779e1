package twofold.window.ask;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Collectors;
import javafx.scene.Node;
import javafx.scene.control.CheckBox;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.GridPane;
import org.jspecify.annotations.Nullable;
import twofold.design.Entry;
import twofold.design.Field;
import twofold.design.Lever;
import twofold.design.Problem;
import twofold.design.Subject;
import twofold.design.Unit;
import twofold.edit.AskEdits;
import twofold.session.Session;
import twofold.window.form.Choice;
import twofold.window.form.Reason;
import twofold.window.form.Row;
import twofold.window.form.Text;
import twofold.window.form.Typed;

/** The controls of a lever: its name, what it moves, over which range, and whether it is still adjusted on the table. */
final class LeverSheet implements Sheet<Lever> {
    private final Session session;
    private final GridPane grid = Row.grid();
    private final Typed name;
    private final PlacesLine places;
    private final Choice<Boolean> isSpan;
    private final Typed from;
    private final Typed to;
    private final Typed among;
    private final Label fromUnit = Row.word("");
    private final Label amongUnit = Row.word("");
    private final Row span;
    private final Row list;
    private final CheckBox adjuster = new CheckBox("still adjusted");
    private final Reason adjusted = new Reason();
    private @Nullable Listed<Lever> now;

    LeverSheet(Session session) {
        this.session = session;
        name = Typed.line(
                session, text -> with(l -> new Lever(text.strip(), l.set(), l.of(), l.range(), l.adjuster())));
        places = new PlacesLine(of -> with(l -> new Lever(l.name(), l.set(), of, l.range(), l.adjuster())));
        isSpan = new Choice<>(s -> s ? "from … to" : "among values", this::ranged);
        from = Typed.line(session, text -> end(text, true));
        to = Typed.line(session, text -> end(text, false));
        among = Typed.line(session, this::listed);
        name.field().setId("lever-name");
        from.field().setId("lever-from");
        to.field().setId("lever-to");
        among.field().setId("lever-among");
        isSpan.setId("lever-range");
        isSpan.setAccessibleText("Range");
        adjuster.setId("lever-adjuster");
        String help = "What is still adjusted on the built table: a yield lets it move.";
        adjuster.setAccessibleHelp(help);
        adjuster.setTooltip(new Tooltip(help));
        adjuster.setOnAction(e -> {
            boolean is = adjuster.isSelected();
            adjusted.say(with(l -> new Lever(l.name(), l.set(), l.of(), l.range(), is)));
            if (now != null) {
                adjuster.setSelected(now.item().adjuster());
            }
        });
        name.name("Name of the lever", "1 to 60 characters, unlike every other lever's");
        new Row("Name", List.of(name.field()), List.of(name.reason())).addTo(grid);
        places.addTo(grid);
        new Row("Moves", List.of(isSpan), List.of(isSpan.reason())).addTo(grid);
        span = new Row(
                "", List.of(from.field(), Row.word("to"), to.field(), fromUnit), List.of(from.reason(), to.reason()));
        span.addTo(grid);
        list = new Row("", List.of(among.field(), amongUnit), List.of(among.reason()));
        list.addTo(grid);
        new Row("On the table", List.of(adjuster), List.of(adjusted)).addTo(grid);
    }

    /** Another lever made of one. */
    private interface Change {
        Lever of(Lever lever);
    }

    private List<Problem> with(Change change) {
        return now == null
                ? List.of()
                : session.edit(AskEdits.LEVERS.replace(now.index(), change.of(now.item())))
                        .problems();
    }

    private List<Problem> with(Lever.Range range) {
        return with(l -> new Lever(l.name(), l.set(), l.of(), range, l.adjuster()));
    }

    private static Unit unit(Lever lever) {
        return Field.settableUnit(lever.set()).orElse(Unit.ONE);
    }

    private List<Problem> ranged(boolean asSpan) {
        if (now == null) {
            return List.of();
        }
        Lever.Range range = now.item().range();
        if (asSpan && range instanceof Lever.Range.Among a) {
            double least = a.values().stream().mapToDouble(v -> v).min().orElse(0);
            double most = a.values().stream().mapToDouble(v -> v).max().orElse(0);
            return with(new Lever.Range.Span(least, most));
        } else if (!asSpan && range instanceof Lever.Range.Span s) {
            return with(new Lever.Range.Among(List.of(s.from(), s.to())));
        }
        return List.of();
    }

    private static Entry<Double> number(Listed<Lever> of, String text) {
        return Entry.number(Subject.DOCUMENT.at("levers").at(of.index()), text, unit(of.item()));
    }

    private List<Problem> end(String text, boolean isFirst) {
        if (now == null || !(now.item().range() instanceof Lever.Range.Span span)) {
            return List.of();
        }
        Entry<Double> entry = number(now, text);
        if (entry.problem().isPresent()) {
            return List.of(entry.problem().get());
        }
        double value = entry.value().orElseThrow();
        return with(isFirst ? new Lever.Range.Span(value, span.to()) : new Lever.Range.Span(span.from(), value));
    }

    private List<Problem> listed(String text) {
        if (now == null) {
            return List.of();
        }
        List<Double> values = new ArrayList<>();
        for (String one : Arrays.asList(text.split(text.contains(";") ? ";" : ",", -1))) {
            Entry<Double> entry = number(now, one);
            if (entry.problem().isPresent()) {
                return List.of(entry.problem().get());
            }
            values.add(entry.value().orElseThrow());
        }
        return with(new Lever.Range.Among(values));
    }

    @Override
    public Node node() {
        return grid;
    }

    @Override
    public Node first() {
        return name.field();
    }

    @Override
    public void show(Listed<Lever> shown) {
        now = shown;
        Lever lever = shown.item();
        Unit in = unit(lever);
        String whose = shown.document() + " " + lever.set() + " " + lever.name();
        name.show(whose, Text.of(lever.name()));
        places.show(shown.cavity().laid().design(), lever.set(), lever.of());
        boolean spans = lever.range() instanceof Lever.Range.Span;
        isSpan.show(List.of(true, false), spans);
        span.appear(spans);
        list.appear(!spans);
        fromUnit.setText(in.symbol());
        amongUnit.setText(in.symbol());
        String behind = in.symbol().isEmpty() ? "" : ", " + in.symbol();
        from.name("From" + behind, "Where its range begins");
        to.name("To" + behind, "Where its range ends");
        among.name("Values" + behind, "The values, semicolons between");
        if (lever.range() instanceof Lever.Range.Span s) {
            from.show(whose, Text.of(in.text(s.from())));
            to.show(whose, Text.of(in.text(s.to())));
        } else if (lever.range() instanceof Lever.Range.Among a) {
            among.show(whose, Text.of(a.values().stream().map(in::text).collect(Collectors.joining("; "))));
        }
        adjuster.setSelected(lever.adjuster());
    }
}
