package twofold.window.ask;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.Function;
import java.util.function.Supplier;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.Menu;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.control.SeparatorMenuItem;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import twofold.cavity.Cavity;
import twofold.design.Design;
import twofold.edit.AskEdits;
import twofold.layout.Laid;
import twofold.session.Session;
import twofold.session.Shown;
import twofold.window.form.Reason;
import twofold.window.form.Scrolled;

/**
 * A list of requirements, levers or tolerances. Its rows are kept while the list changes, each with the thing that it shows, so
 * that the keyboard stays where it is.
 *
 * @param <T> what is listed
 */
final class AskPane<T> extends VBox {
    /**
     * What makes one list differ from another.
     *
     * @param id of the list in the scene
     * @param one what one of them is called
     * @param none what is said where there is none
     * @param edits its edits
     * @param list its things in a design
     * @param head what a row says of one
     * @param sheet the controls of a row
     * @param offer what can be added at a place, by the words of a menu; at no place: to the whole cavity
     */
    record Kind<T>(
            String id,
            String one,
            String none,
            AskEdits<T> edits,
            Function<Design, List<T>> list,
            Function<Listed<T>, Head> head,
            Supplier<Sheet<T>> sheet,
            BiFunction<Laid, Offered, List<Offer<T>>> offer) {}

    /**
     * Something that can be added.
     *
     * @param words in the menu
     * @param make what is then added
     */
    record Offer<T>(String words, Supplier<T> make) {}

    private final Session session;
    private final Kind<T> kind;
    private final Scrolled scroll;
    private final MenuButton add = new MenuButton();
    private final Reason reason = new Reason();
    private final Label none = new Label();
    private final VBox list = new VBox(2);
    private final List<AskRow<T>> rows = new ArrayList<>();
    private List<T> items = List.of();
    private int document;
    private Optional<Cavity> cavity = Optional.empty();

    private final AskRow.Acts<T> acts = new AskRow.Acts<>() {
        @Override
        public void remove(AskRow<T> row) {
            AskPane.this.remove(row);
        }

        @Override
        public void move(AskRow<T> row, boolean down) {
            AskPane.this.move(row, down);
        }

        @Override
        public void opened(AskRow<T> row) {
            scroll.reveal(row);
        }
    };

    AskPane(Session session, Kind<T> kind) {
        this.session = session;
        this.kind = kind;
        getStyleClass().add("inner-card");
        setId(kind.id());
        add.setText("Add " + kind.one());
        add.setId("add-" + kind.one());
        add.setAccessibleHelp(
                "Adds a " + kind.one() + " of what can be had at the selected part, its legs, or elsewhere");
        add.getItems().add(new MenuItem());
        add.setOnShowing(e -> fill());
        none.setText(kind.none());
        none.getStyleClass().add("quiet");
        none.setWrapText(true);
        VBox.setVgrow(list, Priority.ALWAYS);
        VBox inside = new VBox(6, none, list, add, reason);
        inside.getStyleClass().add("asks");
        scroll = new Scrolled("List of " + kind.id());
        scroll.setContent(inside);
        VBox.setVgrow(scroll, Priority.ALWAYS);
        getChildren().add(scroll);
    }

    void show(Shown shown) {
        boolean isOther = shown.document() != document;
        document = shown.document();
        cavity = shown.cavity();
        List<T> next = cavity.map(c -> kind.list().apply(c.laid().design())).orElse(List.of());
        add.setDisable(cavity.isEmpty());
        none.setText(cavity.isEmpty() ? "Nothing is open." : kind.none());
        none.setVisible(next.isEmpty());
        none.setManaged(next.isEmpty());
        if (isOther) {
            rows.clear();
            items = List.of();
        }
        if (!next.equals(items) || rows.size() != next.size()) {
            align(next);
        }
        items = next;
        cavity.ifPresent(c -> {
            for (int i = 0; i < rows.size(); i++) {
                Listed<T> listed = new Listed<>(document, c, i, next.get(i));
                rows.get(i).show(listed, rows.size(), kind.head().apply(listed));
            }
        });
    }

    /** Gives each thing the row that showed it before, else one of a thing that is gone, else a new one. */
    private void align(List<T> next) {
        List<AskRow<T>> free = new ArrayList<>(rows);
        List<T> freed = new ArrayList<>(items);
        List<Optional<AskRow<T>>> kept = new ArrayList<>();
        for (T item : next) {
            int at = freed.indexOf(item);
            kept.add(at < 0 ? Optional.empty() : Optional.of(free.remove(at)));
            if (at >= 0) {
                freed.remove(at);
            }
        }
        // One that changed keeps its row; where things came or went there is nothing to keep.
        boolean isChange = next.size() == rows.size();
        rows.clear();
        for (Optional<AskRow<T>> row : kept) {
            rows.add(row.orElseGet(
                    () -> isChange ? free.remove(0) : new AskRow<>(kind.sheet().get(), acts)));
        }
        place();
    }

    /** Brings the rows into their order; the keyboard stays where it is. */
    private void place() {
        Node owner = list.getScene() == null ? null : list.getScene().getFocusOwner();
        list.getChildren().retainAll(rows);
        for (int i = 0; i < rows.size(); i++) {
            AskRow<T> row = rows.get(i);
            if (i >= list.getChildren().size() || !list.getChildren().get(i).equals(row)) {
                list.getChildren().remove(row);
                list.getChildren().add(i, row);
            }
        }
        if (owner != null && owner.getScene() != null && !owner.isFocused()) {
            owner.requestFocus();
        }
    }

    private void remove(AskRow<T> row) {
        int index = rows.indexOf(row);
        session.laid()
                .ifPresent(laid -> reason.say(
                        session.edit(kind.edits().remove(laid.design(), index)).problems()));
        if (rows.isEmpty()) {
            add.requestFocus();
        } else {
            rows.get(Math.min(index, rows.size() - 1)).head().requestFocus();
        }
    }

    private void move(AskRow<T> row, boolean down) {
        int index = rows.indexOf(row);
        int to = index + (down ? 1 : -1);
        if (to >= 0 && to < rows.size()) {
            session.edit(kind.edits().move(index, to));
        }
    }

    private void add(T one) {
        int before = rows.size();
        reason.say(session.edit(kind.edits().add(one)).problems());
        if (rows.size() > before) {
            AskRow<T> row = rows.get(rows.size() - 1);
            rows.forEach(r -> r.open(r.equals(row)));
            scroll.reveal(row);
            row.sheet().first().requestFocus();
        }
    }

    private void fill() {
        Optional<Laid> laid = session.laid();
        List<MenuItem> menu = new ArrayList<>();
        laid.ifPresent(l -> {
            Offered.near(l, session.shown()).forEach(o -> menu(l, o).ifPresent(menu::add));
            Menu elsewhere = new Menu("Elsewhere");
            Offered.far(l, session.shown()).forEach(o -> menu(l, o).ifPresent(elsewhere.getItems()::add));
            if (!elsewhere.getItems().isEmpty()) {
                menu.add(new SeparatorMenuItem());
                menu.add(elsewhere);
            }
        });
        add.getItems().setAll(menu);
    }

    private Optional<Menu> menu(Laid laid, Offered at) {
        List<Offer<T>> offers = kind.offer().apply(laid, at);
        if (offers.isEmpty()) {
            return Optional.empty();
        }
        Menu menu = new Menu(at.words());
        menu.setMnemonicParsing(false);
        for (Offer<T> offer : offers) {
            MenuItem item = new MenuItem(offer.words());
            item.setMnemonicParsing(false);
            item.setOnAction(e -> add(offer.make().get()));
            menu.getItems().add(item);
        }
        return Optional.of(menu);
    }
}
