package twofold.window.ask;

import java.util.List;
import javafx.scene.Node;
import javafx.scene.layout.GridPane;
import org.jspecify.annotations.Nullable;
import twofold.design.Entry;
import twofold.design.Field;
import twofold.design.Problem;
import twofold.design.Subject;
import twofold.design.Tolerance;
import twofold.design.Unit;
import twofold.edit.AskEdits;
import twofold.session.Session;
import twofold.window.form.Choice;
import twofold.window.form.Row;
import twofold.window.form.Text;
import twofold.window.form.Typed;

/** The controls of a tolerance: of what, how much either way, and how it is spread. */
final class ToleranceSheet implements Sheet<Tolerance> {
    private final Session session;
    private final GridPane grid = Row.grid();
    private final PlacesLine places;
    private final Typed plusMinus;
    private final Choice<Boolean> relative;
    private final Choice<Tolerance.Spread> spread;
    private @Nullable Listed<Tolerance> now;

    ToleranceSheet(Session session) {
        this.session = session;
        places = new PlacesLine(of -> with(t -> new Tolerance(t.set(), of, t.plusMinus(), t.relative(), t.spread())));
        plusMinus = Typed.line(session, this::typed);
        relative = new Choice<>(this::unitWord, this::related);
        spread = new Choice<>(
                s -> s == Tolerance.Spread.UNIFORM ? "uniform" : "normal, two sigma",
                s -> with(t -> new Tolerance(t.set(), t.of(), t.plusMinus(), t.relative(), s)));
        plusMinus.field().setId("plus-minus");
        relative.setId("plus-minus-unit");
        relative.setAccessibleText("Unit of the tolerance");
        spread.setId("spread");
        spread.setAccessibleText("Spread");
        places.addTo(grid);
        new Row("Plus or minus", List.of(plusMinus.field(), relative), List.of(plusMinus.reason(), relative.reason()))
                .addTo(grid);
        Row spreads = new Row("Spread", List.of(spread), List.of(spread.reason()));
        spreads.help("Evenly between the limits; or normally, the limits at two standard deviations, cut at three.");
        spreads.addTo(grid);
    }

    /** Another tolerance made of one. */
    private interface Change {
        Tolerance of(Tolerance tolerance);
    }

    private List<Problem> with(Change change) {
        return now == null
                ? List.of()
                : session.edit(AskEdits.TOLERANCES.replace(now.index(), change.of(now.item())))
                        .problems();
    }

    private static Unit unit(Tolerance tolerance) {
        return tolerance.relative()
                ? Unit.PERCENT
                : Field.settableUnit(tolerance.set()).orElse(Unit.ONE);
    }

    private String unitWord(boolean isRelative) {
        if (isRelative) {
            return "% of it";
        }
        String symbol = now == null
                ? ""
                : Field.settableUnit(now.item().set()).map(Unit::symbol).orElse("");
        return symbol.isEmpty() ? "absolute" : symbol;
    }

    /** The number stays as it is written, in its new unit. */
    private List<Problem> related(boolean isRelative) {
        if (now == null) {
            return List.of();
        }
        Tolerance t = now.item();
        Tolerance in = new Tolerance(t.set(), t.of(), 0, isRelative, t.spread());
        double number = unit(in).toSi(unit(t).fromSi(t.plusMinus()));
        return with(x -> new Tolerance(x.set(), x.of(), number, isRelative, x.spread()));
    }

    private List<Problem> typed(String text) {
        if (now == null) {
            return List.of();
        }
        Entry<Double> entry = Entry.number(Subject.DOCUMENT.at("tolerances").at(now.index()), text, unit(now.item()));
        return entry.problem().isPresent()
                ? List.of(entry.problem().get())
                : with(t -> new Tolerance(t.set(), t.of(), entry.value().orElseThrow(), t.relative(), t.spread()));
    }

    @Override
    public Node node() {
        return grid;
    }

    @Override
    public Node first() {
        return plusMinus.field();
    }

    @Override
    public void show(Listed<Tolerance> shown) {
        now = shown;
        Tolerance t = shown.item();
        places.show(shown.cavity().laid().design(), t.set(), t.of());
        String symbol = unit(t).symbol();
        plusMinus.name("Plus or minus" + (symbol.isEmpty() ? "" : ", " + symbol), "0 or a positive number");
        plusMinus.show(shown.document() + " " + t.set() + " " + t.relative(), Text.of(unit(t).text(t.plusMinus())));
        relative.show(List.of(false, true), t.relative());
        spread.show(List.of(Tolerance.Spread.values()), t.spread());
    }
}
