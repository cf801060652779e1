package twofold.window.inspect;

import java.util.List;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.Function;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import org.jspecify.annotations.Nullable;
import twofold.design.Entry;
import twofold.design.Hold;
import twofold.design.Mirror;
import twofold.design.Place;
import twofold.design.Problem;
import twofold.design.Subject;
import twofold.design.Unit;
import twofold.edit.Edit;
import twofold.edit.HoldEdits;
import twofold.edit.MirrorEdits;
import twofold.layout.Follow;
import twofold.layout.Leg;
import twofold.layout.Outcome;
import twofold.session.Session;
import twofold.window.Following;
import twofold.window.form.Lock;
import twofold.window.form.Row;
import twofold.window.form.Text;

/** The plan's numbers at a mirror: its place, its legs and its incidence, with what follows and with their holds as locks. */
final class PlanLines implements Line {
    private static final String USUAL = "as is usual";
    private static final String PATH = "Path of the leg from mirror to mirror, inside parts included.";
    private static final String FOLLOWS = "What follows";

    private final Session session;
    private final Following following;
    private final Picker<Optional<Follow>> follows;
    private final Line followsLine;
    private final Lock place = new Lock();
    private final Cell x;
    private final Cell y;
    private final LegLines before;
    private final LegLines after;
    private final Lock angle = new Lock();
    private final Cell incidence;
    private final Cell fold;
    private @Nullable Inspected now;

    PlanLines(Session session, Following following) {
        this.session = session;
        this.following = following;
        follows = new Picker<>(
                "follows",
                f -> f.map(Follow::words).orElse(USUAL),
                i -> Stream.concat(
                                Stream.of(Optional.<Follow>empty()),
                                following.allowed().stream().map(Optional::of))
                        .collect(Collectors.toList()),
                i -> following.chosen(),
                (i, f) -> {
                    following.choose(f);
                    return List.of();
                });
        followsLine = follows.line(
                FOLLOWS,
                "What else moves when this mirror is moved by hand or by a typed number; the same choice as in the menu"
                        + " Plan. As is usual: the arm beyond follows; a typed incidence swings it, so that no other"
                        + " angle changes; a ring moves as little as it can.");
        following.onChoice(() -> {
            if (now != null) {
                follows.show(now);
            }
        });
        x = cell(
                "x",
                Unit.MM,
                i -> Text.of(Unit.MM, mirror(i).at().x()),
                (i, text) -> MirrorEdits.x(i.name(), text, following.now()));
        y = cell(
                "y",
                Unit.MM,
                i -> Text.of(Unit.MM, mirror(i).at().y()),
                (i, text) -> MirrorEdits.y(i.name(), text, following.now()));
        incidence = cell(
                "incidence",
                Unit.DEG,
                i -> Text.of(Unit.DEG, angle(i)),
                (i, text) -> MirrorEdits.incidence(i.name(), text, following.chosen()));
        fold = cell("fold", Unit.DEG, i -> Text.of(Unit.DEG, 2 * angle(i)), this::folded);
        before = new LegLines("before", Inspected::before);
        after = new LegLines("after", Inspected::after);
        place.setId("lock-place");
        angle.setId("lock-incidence");
        x.name("X", "Place of the mirror on the table, to the right");
        y.name("Y", "Place of the mirror on the table, away from you");
        incidence.name("Incidence", "Angle of incidence, from 0 to below 89°: 7.5 or 7°30'");
        fold.name("Full fold angle", "Angle between the beam that comes and the beam that goes, twice the incidence");
    }

    private static List<Node> nodes(List<?>... parts) {
        return Stream.of(parts).flatMap(List::stream).map(Node.class::cast).toList();
    }

    private static Mirror mirror(Inspected i) {
        return (Mirror) i.part();
    }

    private static double angle(Inspected i) {
        return i.laid().incidence().getOrDefault(i.index(), 0.0);
    }

    private Edit folded(Inspected i, String text) {
        return Edit.of("set incidence at " + i.name(), laid -> {
            Entry<Double> entry = Entry.number(Subject.DOCUMENT.at("incidence_deg"), text, Unit.DEG);
            return entry.problem().isPresent()
                    ? Outcome.failed(entry.problem().get())
                    : MirrorEdits.incidence(i.name(), entry.value().orElseThrow() / 2, following.chosen())
                            .change()
                            .apply(laid);
        });
    }

    private Cell cell(String id, Unit unit, Function<Inspected, Text> value, BiFunction<Inspected, String, Edit> edit) {
        return new Cell(session, id, unit.symbol(), value, edit);
    }

    private void show(Lock lock, Inspected i, Hold hold) {
        lock.show(hold.words(), HoldEdits.isHeld(i.design(), hold), () -> turned(hold));
    }

    private List<Problem> turned(Hold hold) {
        return session.laid()
                .map(laid -> session.edit(HoldEdits.toggle(laid.design(), hold)).problems())
                .orElse(List.of());
    }

    @Override
    public void addTo(GridPane grid) {
        followsLine.addTo(grid);
        Row at = new Row(
                "X, Y",
                nodes(List.of(x.typed().field()), y.nodes(), List.of(place)),
                List.of(x.reason(), y.reason(), place.reason()));
        at.help("Place of the mirror on the table: to the right, and away from you. Lengths may carry a unit.");
        at.addTo(grid);
        before.addTo(grid);
        after.addTo(grid);
        Row angles = new Row(
                "Incidence, full fold angle",
                nodes(incidence.nodes(), fold.nodes(), List.of(angle)),
                List.of(incidence.reason(), fold.reason(), angle.reason()));
        angles.help("Angle of incidence, from 0 to below 89°, as 7.5 or 7°30'; and twice that, the angle between the"
                + " beam that comes and the beam that goes.");
        angles.addTo(grid);
    }

    @Override
    public void show(Inspected shown) {
        now = shown;
        followsLine.show(shown);
        x.show(shown);
        y.show(shown);
        show(place, shown, new Hold.Position(shown.name()));
        before.show(shown);
        after.show(shown);
        boolean isFold = shown.before().isPresent() && shown.after().isPresent();
        Optional<String> why =
                isFold ? Optional.empty() : Optional.of("An end mirror is met head-on: its incidence is 0.");
        incidence.show(shown);
        incidence.typed().fix(why);
        fold.show(shown);
        fold.typed().fix(why);
        angle.setDisable(!isFold);
        show(angle, shown, new Hold.Incidence(shown.name()));
    }

    @Override
    public void stash() {
        for (Cell cell : List.of(x, y, before.path, after.path, incidence, fold)) {
            cell.stash();
        }
    }

    /** The length and the direction of one of the mirror's legs, with a lock for each. */
    private final class LegLines {
        private final Function<Inspected, Optional<Leg>> leg;
        private final String word;
        private final Lock length = new Lock();
        private final Lock direction = new Lock();
        private final Cell path;
        private final Row row;
        private final Label heading = new Label();
        private final Row headed;
        private String named = "";

        LegLines(String word, Function<Inspected, Optional<Leg>> leg) {
            this.word = word;
            this.leg = leg;
            length.setId("lock-leg-" + word);
            direction.setId("lock-direction-" + word);
            path = cell(
                    "leg-" + word,
                    Unit.MM,
                    i -> leg.apply(i).map(l -> Text.of(Unit.MM, l.path())).orElse(Text.NONE),
                    (i, text) -> MirrorEdits.leg(place(i, leg.apply(i).orElseThrow()), text, following.chosen()));
            row = new Row("Leg " + word, nodes(path.nodes(), List.of(length)), List.of(path.reason(), length.reason()));
            heading.getStyleClass().add("figure");
            heading.setMaxWidth(Double.MAX_VALUE);
            HBox.setHgrow(heading, Priority.ALWAYS);
            headed = new Row("Its direction", List.of(heading, direction), List.of(direction.reason()));
            headed.help("The way the beam runs on this leg, from the right towards away from you.");
        }

        /** The leg, with the inspected mirror as the one that moves where others stay. */
        private Place place(Inspected i, Leg l) {
            return Place.of(i.name(l.from() == i.index() ? l.to() : l.from()), i.name());
        }

        void addTo(GridPane grid) {
            row.addTo(grid);
            headed.addTo(grid);
        }

        void show(Inspected i) {
            Optional<Leg> l = leg.apply(i);
            row.appear(l.isPresent());
            headed.appear(l.isPresent());
            l.ifPresent(at -> show(i, at));
        }

        private void show(Inspected i, Leg l) {
            boolean isBefore = word.equals("before");
            String other = i.name(isBefore ? l.from() : l.to());
            String title = "Leg " + (isBefore ? "from " : "to ") + other;
            if (!title.equals(named)) {
                named = title;
                row.rename(title, PATH);
                path.name(title, PATH);
            }
            path.show(i);
            heading.setText(
                    Unit.DEG.shown(Math.atan2(l.heading().y(), l.heading().x())).replace('-', '−') + "°");
            Place leg = Place.of(i.name(l.from()), i.name(l.to()));
            PlanLines.this.show(length, i, new Hold.Leg(leg));
            PlanLines.this.show(direction, i, new Hold.Direction(leg));
        }
    }
}
