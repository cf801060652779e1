package twofold.window.inspect;

import java.util.List;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.Function;
import java.util.stream.Collectors;
import java.util.stream.Stream;
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
    private static final String FOLLOWS = "What follows";

    private final Session session;
    private final Following following;
    private final Picker<Optional<Follow>> follows;
    private final Line followsLine;
    private final Lock place = lock();
    private final TypedLine x;
    private final TypedLine y;
    private final LegLines before;
    private final LegLines after;
    private final Lock angle = lock();
    private final TypedLine incidence;
    private final TypedLine fold;
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
        x = typed(
                "x",
                "X",
                Unit.MM,
                "Place of the mirror on the table, to the right.",
                i -> Text.of(Unit.MM, mirror(i).at().x()),
                (i, text) -> MirrorEdits.x(i.name(), text, following.now()),
                place);
        y = typed(
                "y",
                "Y",
                Unit.MM,
                "Place of the mirror on the table, away from you.",
                i -> Text.of(Unit.MM, mirror(i).at().y()),
                (i, text) -> MirrorEdits.y(i.name(), text, following.now()));
        before = new LegLines("before", Inspected::before);
        after = new LegLines("after", Inspected::after);
        incidence = typed(
                "incidence",
                "Incidence",
                Unit.DEG,
                "Angle of incidence, from 0 to below 89°: 7.5 or 7°30'.",
                i -> Text.of(Unit.DEG, angle(i)),
                (i, text) -> MirrorEdits.incidence(i.name(), text, following.chosen()),
                angle);
        fold = typed(
                "fold",
                "Full fold angle",
                Unit.DEG,
                "Angle between the beam that comes and the beam that goes, twice the incidence.",
                i -> Text.of(Unit.DEG, 2 * angle(i)),
                this::folded);
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

    private TypedLine typed(
            String id,
            String title,
            Unit unit,
            String help,
            Function<Inspected, Text> value,
            BiFunction<Inspected, String, Edit> edit,
            Lock... locks) {
        return TypedLine.of(
                session,
                id,
                title,
                unit.symbol(),
                help,
                value,
                edit,
                List.of(locks),
                Stream.of(locks).map(Lock::reason).toList());
    }

    /** A lock whose hold is said when it is shown. */
    private Lock lock() {
        return new Lock();
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
        x.addTo(grid);
        y.addTo(grid);
        before.addTo(grid);
        after.addTo(grid);
        incidence.addTo(grid);
        fold.addTo(grid);
    }

    @Override
    public void show(Inspected shown) {
        now = shown;
        followsLine.show(shown);
        x.show(shown);
        y.show(shown);
        place.setId("lock-place");
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
        angle.setId("lock-incidence");
        angle.setDisable(!isFold);
        show(angle, shown, new Hold.Incidence(shown.name()));
    }

    @Override
    public void stash() {
        for (TypedLine line : List.of(x, y, before.path, after.path, incidence, fold)) {
            line.stash();
        }
    }

    /** The length and the direction of one of the mirror's legs, with a lock for each. */
    private final class LegLines {
        private final Function<Inspected, Optional<Leg>> leg;
        private final String word;
        private final Lock length = lock();
        private final Lock direction = lock();
        private final TypedLine path;
        private final Label heading = new Label();
        private final Row headed;
        private String named = "";

        LegLines(String word, Function<Inspected, Optional<Leg>> leg) {
            this.word = word;
            this.leg = leg;
            length.setId("lock-leg-" + word);
            direction.setId("lock-direction-" + word);
            path = typed(
                    "leg-" + word,
                    "Leg " + word,
                    Unit.MM,
                    "",
                    i -> leg.apply(i).map(l -> Text.of(Unit.MM, l.path())).orElse(Text.NONE),
                    (i, text) -> MirrorEdits.leg(place(i, leg.apply(i).orElseThrow()), text, following.chosen()),
                    length);
            heading.getStyleClass().add("figure");
            heading.setMaxWidth(Double.MAX_VALUE);
            HBox.setHgrow(heading, Priority.ALWAYS);
            headed = new Row("Its direction", List.of(heading, direction), List.of(direction.reason()));
        }

        /** The leg, with the inspected mirror as the one that moves where others stay. */
        private Place place(Inspected i, Leg l) {
            return Place.of(i.name(l.from() == i.index() ? l.to() : l.from()), i.name());
        }

        void addTo(GridPane grid) {
            path.addTo(grid);
            headed.addTo(grid);
        }

        void show(Inspected i) {
            Optional<Leg> l = leg.apply(i);
            path.row().appear(l.isPresent());
            headed.appear(l.isPresent());
            l.ifPresent(at -> show(i, at));
        }

        private void show(Inspected i, Leg l) {
            boolean isBefore = word.equals("before");
            String other = i.name(isBefore ? l.from() : l.to());
            String title = "Leg " + (isBefore ? "from " : "to ") + other;
            if (!title.equals(named)) {
                named = title;
                path.rename(title, "Path of the leg from mirror to mirror, inside parts included.");
                headed.help("The way the beam runs on this leg, from the right towards away from you.");
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
