package twofold.window.ask;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.layout.GridPane;
import org.jspecify.annotations.Nullable;
import twofold.design.Bound;
import twofold.design.Edge;
import twofold.design.Entry;
import twofold.design.Lever;
import twofold.design.Planes;
import twofold.design.Problem;
import twofold.design.Requirement;
import twofold.design.Subject;
import twofold.design.Unit;
import twofold.edit.AskEdits;
import twofold.edit.BoundKind;
import twofold.session.Session;
import twofold.window.form.Choice;
import twofold.window.form.Row;
import twofold.window.form.Text;
import twofold.window.form.Typed;

/** The controls of a requirement: its bound, plane and edge, and over which lever's range it must hold. */
final class RequirementSheet implements Sheet<Requirement> {
    private static final String OVER = "The plan as it is, or a lever's whole range: then the worst value in it counts,"
            + " and no search moves the lever.";

    private final Session session;
    private final GridPane grid = Row.grid();
    private final Choice<BoundKind> kind;
    private final Choice<Planes> plane;
    private final Choice<Edge> edge;
    private final Choice<Optional<String>> over;
    private final Typed low;
    private final Typed high;
    private final Label between = Row.word("");
    private final Label unit = Row.word("");
    private final Row numbers;
    private final Row planes;
    private final Row edges;
    private final Row overs;
    private @Nullable Listed<Requirement> now;

    RequirementSheet(Session session) {
        this.session = session;
        kind = new Choice<>(BoundKind::words, this::bound);
        plane = new Choice<>(
                p -> p == Planes.BOTH ? "both planes" : p.word(),
                p -> with(r -> new Requirement(r.what(), r.at(), Optional.of(p), r.edge(), r.bound(), r.over())));
        edge = new Choice<>(
                Edge::word,
                e -> with(r -> new Requirement(r.what(), r.at(), r.plane(), Optional.of(e), r.bound(), r.over())));
        over = new Choice<>(
                o -> o.orElse("the plan as it is"),
                o -> with(r -> new Requirement(r.what(), r.at(), r.plane(), r.edge(), r.bound(), o)));
        low = Typed.line(session, text -> number(text, true));
        high = Typed.line(session, text -> number(text, false));
        kind.setId("bound");
        plane.setId("plane");
        edge.setId("edge");
        over.setId("over");
        low.field().setId("bound-low");
        high.field().setId("bound-high");
        add("Asked", "What is asked of the value.", kind);
        numbers = new Row("", List.of(low.field(), between, high.field(), unit), List.of(low.reason(), high.reason()));
        numbers.addTo(grid);
        planes = add("Plane", "In which plane; in both: it must hold in each.", plane);
        edges = add("Edge", "Which edge of the zone along the leg.", edge);
        overs = add("Holds over", OVER, over);
    }

    private <C> Row add(String title, String help, Choice<C> choice) {
        choice.setAccessibleText(title);
        choice.setAccessibleHelp(help);
        Row row = new Row(title, List.of(choice), List.of(choice.reason()));
        row.help(help);
        row.addTo(grid);
        return row;
    }

    /** Another requirement made of one. */
    private interface Change {
        Requirement of(Requirement requirement);
    }

    private List<Problem> with(Change change) {
        return now == null
                ? List.of()
                : session.edit(AskEdits.REQUIREMENTS.replace(now.index(), change.of(now.item())))
                        .problems();
    }

    private List<Problem> with(Bound bound) {
        return with(r -> new Requirement(r.what(), r.at(), r.plane(), r.edge(), bound, r.over()));
    }

    private List<Problem> bound(BoundKind next) {
        if (now == null) {
            return List.of();
        }
        double value = now.cavity().judgements().get(now.index()).value();
        return with(next.like(now.item().bound(), now.item().what(), value));
    }

    /** A typed number of the bound. */
    private List<Problem> number(String text, boolean isFirst) {
        if (now == null) {
            return List.of();
        }
        Bound bound = now.item().bound();
        Subject where = Subject.DOCUMENT.at("requirements").at(now.index());
        Entry<Double> entry = Entry.number(where, text, now.item().what().unit());
        if (entry.problem().isPresent()) {
            return List.of(entry.problem().get());
        }
        double number = entry.value().orElseThrow();
        if (bound instanceof Bound.AtLeast) {
            return with(new Bound.AtLeast(number));
        } else if (bound instanceof Bound.AtMost) {
            return with(new Bound.AtMost(number));
        } else if (bound instanceof Bound.Between b) {
            return with(isFirst ? new Bound.Between(number, b.high()) : new Bound.Between(b.low(), number));
        } else if (bound instanceof Bound.Equal b) {
            return with(isFirst ? new Bound.Equal(number, b.within()) : new Bound.Equal(b.value(), number));
        }
        throw new IllegalStateException("a wish has no number: " + bound);
    }

    @Override
    public Node node() {
        return grid;
    }

    @Override
    public Node first() {
        return now != null && now.item().bound() instanceof Bound.Prefer ? kind : low.field();
    }

    @Override
    public void show(Listed<Requirement> shown) {
        now = shown;
        Requirement r = shown.item();
        String whose = shown.document() + " " + r.what().json() + " "
                + r.at().map(Object::toString).orElse("") + " " + BoundKind.of(r.bound());
        kind.show(List.of(BoundKind.values()), BoundKind.of(r.bound()));
        numbers(r, whose);
        planes.appear(r.what().hasPlane());
        r.plane().ifPresent(p -> plane.show(List.of(Planes.BOTH, Planes.TANGENTIAL, Planes.SAGITTAL), p));
        edges.appear(r.what().hasEdge());
        r.edge().ifPresent(e -> edge.show(List.of(Edge.values()), e));
        List<Lever> levers = shown.cavity().laid().design().levers();
        over.show(
                Stream.concat(
                                Stream.of(Optional.<String>empty()),
                                levers.stream().map(Lever::name).map(Optional::of))
                        .collect(Collectors.toList()),
                r.over());
        over.setDisable(levers.isEmpty());
        overs.help(levers.isEmpty() ? "There is no lever yet over whose range it could hold." : OVER);
    }

    private void numbers(Requirement r, String whose) {
        Unit in = r.what().unit();
        Bound bound = r.bound();
        List<Double> values = new ArrayList<>();
        String word = "";
        if (bound instanceof Bound.AtLeast b) {
            values.add(b.value());
        } else if (bound instanceof Bound.AtMost b) {
            values.add(b.value());
        } else if (bound instanceof Bound.Between b) {
            values.addAll(List.of(b.low(), b.high()));
            word = "and";
        } else if (bound instanceof Bound.Equal b) {
            values.addAll(List.of(b.value(), b.within()));
            word = "±";
        }
        numbers.appear(!values.isEmpty());
        between.setText(word);
        boolean isPair = values.size() == 2;
        for (Node node : List.of(between, high.field())) {
            node.setVisible(isPair);
            node.setManaged(isPair);
        }
        unit.setText(in.symbol());
        unit.setVisible(!in.symbol().isEmpty());
        unit.setManaged(!in.symbol().isEmpty());
        String behind = in.symbol().isEmpty() ? "" : ", " + in.symbol();
        String help =
                "A number" + (in.symbol().isEmpty() ? "" : " in " + in.symbol() + ", or with another unit behind it");
        low.name((isPair && word.equals("and") ? "Lower bound" : "Bound") + behind, help);
        high.name((word.equals("±") ? "Give or take" : "Upper bound") + behind, help);
        if (!values.isEmpty()) {
            low.show(whose, Text.of(in.text(values.get(0))));
        }
        if (isPair) {
            high.show(whose, Text.of(in.text(values.get(1))));
        }
    }
}
