package twofold.window;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Consumer;
import java.util.function.Function;
import javafx.geometry.Orientation;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.SplitPane;
import javafx.scene.control.Tab;
import javafx.scene.control.TabPane;
import javafx.scene.control.TextInputControl;
import javafx.scene.input.DragEvent;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.TransferMode;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import twofold.design.Kind;
import twofold.file.Journal;
import twofold.file.Located;
import twofold.picture.Theme;
import twofold.session.Runner;
import twofold.session.Session;
import twofold.session.Shown;
import twofold.session.Source;
import twofold.window.ask.AskPanes;
import twofold.window.beam.BeamPane;
import twofold.window.beam.CloseUpPane;
import twofold.window.bench.BenchPane;
import twofold.window.form.Typed;
import twofold.window.inspect.Inspector;
import twofold.window.panel.LedgerPane;
import twofold.window.panel.PartsPane;
import twofold.window.panel.ProblemsPane;
import twofold.window.panel.StabilityPane;
import twofold.window.panel.ZonesPane;
import twofold.window.plot.PlotTabs;

/** The editor's panes, wired to one session. A node: the application puts it into a window, a test into a stage. */
public final class Editor extends BorderPane {
    private final Runner runner;
    private final Session session;
    private final Following following;
    private final BenchPane bench;
    private final BeamPane beam;
    private final PlotTabs plots;
    private final CloseUpPane closeUp = new CloseUpPane();
    private final StabilityPane stability = new StabilityPane();
    private final Inspector part;
    private final PartsPane parts;
    private final ProblemsPane problems;
    private final LedgerPane ledger = new LedgerPane();
    private final ZonesPane zones = new ZonesPane();
    private final AskPanes asks;
    private final Tab asked;
    private final TabPane lists;
    private final Notice notice;
    private final Recovery recovery = new Recovery();
    private final Label said = new Label();
    private final Label facts = new Label();
    private final SplitPane pictures;
    private final SplitPane lower;
    private final SplitPane tabs;
    private final SplitPane whole;
    private Consumer<String> titles = t -> {};
    private Consumer<Path> opened = p -> {};
    private Consumer<Path> open;
    private Optional<Source> attended = Optional.empty();
    private int document;
    private Theme theme = Theme.LIGHT;

    /** Makes the editor with nothing open, all work on one runner. */
    public Editor(Runner runner) {
        this(runner, runner, listener -> new Session(runner, listener));
    }

    /**
     * Makes the editor with nothing open, which keeps a journal of unsaved work.
     *
     * @param runner for what is short
     * @param scribe writes the journal
     * @param studies for sweeps and maps, which may keep it busy
     */
    Editor(Runner runner, Journal journal, Runner scribe, Runner studies) {
        this(runner, studies, listener -> new Session(runner, journal, scribe, listener));
    }

    private Editor(Runner runner, Runner studies, Function<Consumer<Shown>, Session> sessions) {
        this.runner = runner;
        session = sessions.apply(this::show);
        problems = new ProblemsPane(session::dismiss);
        following = new Following(session);
        bench = new BenchPane(session, following);
        open = session::open;
        beam = new BeamPane(session);
        part = new Inspector(session, following);
        parts = new PartsPane(session);
        notice = new Notice(session::reload);
        plots = new PlotTabs(session, beam, studies);
        lower = split(Orientation.HORIZONTAL, plots, closeUp);
        VBox benchAndProblems = new VBox(6, problems, bench);
        VBox.setVgrow(bench, Priority.ALWAYS);
        pictures = split(Orientation.VERTICAL, benchAndProblems, lower);
        asks = new AskPanes(session);
        asked = new Tab("Requirements", asks.requirements());
        lists = tabs(
                "lists",
                "Parts, requirements, levers and tolerances",
                new Tab("Parts", parts),
                asked,
                new Tab("Levers", asks.levers()),
                new Tab("Tolerances", asks.tolerances()));
        TabPane looks = tabs(
                "looks",
                "The part, zones and astigmatism",
                new Tab("Part", part),
                new Tab("Zones", zones),
                new Tab("Astigmatism", ledger));
        tabs = split(Orientation.VERTICAL, looks, lists);
        VBox side = new VBox(8, stability, tabs);
        VBox.setVgrow(tabs, Priority.ALWAYS);
        looks.setMinHeight(160);
        lists.setMinHeight(120);
        side.setMinWidth(350);
        side.setPrefWidth(360);
        side.setMaxWidth(460);
        bench.setMinSize(420, 200);
        plots.setMinSize(320, 220);
        closeUp.setMinSize(230, 200);
        whole = split(Orientation.HORIZONTAL, pictures, side);
        SplitPane.setResizableWithParent(side, false);
        setCenter(whole);
        setTop(new VBox(recovery, notice));
        setBottom(status());
        addEventFilter(KeyEvent.KEY_PRESSED, this::paneKey);
        addEventHandler(DragEvent.DRAG_OVER, this::dragged);
        addEventHandler(DragEvent.DRAG_DROPPED, this::dropped);
        setTheme(theme);
        show(session.shown());
    }

    private static SplitPane split(Orientation orientation, Node... panes) {
        SplitPane split = new SplitPane(panes);
        split.setOrientation(orientation);
        return split;
    }

    private static TabPane tabs(String id, String name, Tab... tabs) {
        TabPane pane = new TabPane(tabs);
        pane.setId(id);
        pane.setAccessibleText(name);
        pane.setTabClosingPolicy(TabPane.TabClosingPolicy.UNAVAILABLE);
        return pane;
    }

    private HBox status() {
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        said.setId("said");
        said.setMinWidth(0);
        facts.setId("facts");
        facts.getStyleClass().add("quiet");
        facts.setMinWidth(Region.USE_PREF_SIZE);
        HBox status = new HBox(said, gap, facts);
        status.getStyleClass().add("status");
        return status;
    }

    /** The document. */
    public Session session() {
        return session;
    }

    /** Where what takes long is worked out. */
    Runner runner() {
        return runner;
    }

    /** What else moves when a mirror is moved. */
    Following following() {
        return following;
    }

    /** Says something in the status line until something else is shown. */
    void say(String words) {
        said.setText(words);
    }

    /** Says what is wrong with a text that was to be pasted. */
    void pasted(List<Located> wrong) {
        problems.pasted(wrong);
    }

    /** What an earlier run left unsaved. */
    Recovery recovery() {
        return recovery;
    }

    /** Applies what is typed in the field that has the keyboard. */
    void take() {
        if (getScene() != null
                && getScene().getFocusOwner() instanceof TextInputControl field
                && field.getUserData() instanceof Typed typed) {
            typed.take();
        }
    }

    /** Hangs a new part at the pointer on the bench. */
    void place(Kind kind) {
        bench.place(kind);
    }

    /** Lets the selected part be renamed in the list. */
    void rename() {
        lists.getSelectionModel().select(0);
        parts.rename();
    }

    /** Puts menus and a toolbar on top. */
    void setBars(Node menus, Node toolbar) {
        setTop(new VBox(menus, toolbar, recovery, notice));
    }

    /** Is told what the window's title should be. */
    void onTitle(Consumer<String> listener) {
        titles = listener;
    }

    /** Opens a file that is dropped on the window. */
    void onDropped(Consumer<Path> opener) {
        open = opener;
    }

    /** Is told of every file that was opened, good or bad. */
    void onOpened(Consumer<Path> listener) {
        opened = listener;
    }

    /** The theme. */
    public Theme theme() {
        return theme;
    }

    /** Changes the theme. */
    public void setTheme(Theme next) {
        theme = next;
        Look.apply(this, next);
        bench.setTheme(next);
        beam.setTheme(next);
        plots.setTheme(next);
        closeUp.setTheme(next);
        stability.setTheme(next);
        zones.setTheme(next);
        ledger.setTheme(next);
    }

    /** Positions of the dividers, 0 to 1. */
    List<Double> dividers() {
        return List.of(
                whole.getDividerPositions()[0],
                pictures.getDividerPositions()[0],
                lower.getDividerPositions()[0],
                tabs.getDividerPositions()[0]);
    }

    /** Moves the dividers. */
    void setDividers(List<Double> positions) {
        whole.setDividerPositions(positions.get(0));
        pictures.setDividerPositions(positions.get(1));
        lower.setDividerPositions(positions.get(2));
        tabs.setDividerPositions(positions.get(3));
    }

    /** Shows all of the bench and of the path. */
    public void showAll() {
        bench.showAll();
        beam.showAll();
    }

    /** Zooms the bench. */
    void zoom(boolean in) {
        bench.zoom(in);
    }

    /** Draws the beam on the bench so many times wider than true, or by itself. */
    public void magnify(OptionalDouble factor) {
        bench.magnify(factor);
    }

    /** Copies the figures of the selected part. */
    void copyFigures() {
        part.copy();
    }

    /** Taken before the controls see it: some use the key for themselves. */
    private void paneKey(KeyEvent e) {
        if (e.getCode() == KeyCode.F6 && !e.isShortcutDown() && !e.isAltDown()) {
            nextPane(e.isShiftDown());
            e.consume();
        }
    }

    /** Moves the keyboard to the next pane, or back. */
    void nextPane(boolean back) {
        List<Node> panes = List.of(bench, plots, part.lookup("#fields-scroll"), parts.lookup("#parts"));
        int at = 0;
        for (int i = 0; i < panes.size(); i++) {
            if (holdsFocus(panes.get(i))) {
                at = back ? i - 1 : i + 1;
            }
        }
        Node next = panes.get(Math.floorMod(at, panes.size()));
        (next.equals(plots) ? plots.front() : next).requestFocus();
    }

    private boolean holdsFocus(Node pane) {
        for (Node n = getScene().getFocusOwner(); n != null; n = n.getParent()) {
            if (n.equals(pane)) {
                return true;
            }
        }
        return false;
    }

    private void show(Shown shown) {
        boolean isOther = shown.document() != document;
        document = shown.document();
        bench.show(shown, isOther);
        beam.show(shown, isOther);
        plots.show(shown);
        closeUp.show(shown);
        stability.show(shown);
        part.show(shown);
        parts.show(shown);
        zones.show(shown);
        ledger.show(shown);
        asks.show(shown);
        asked.setText(StatusWords.asked(shown));
        problems.show(shown);
        notice.show(shown);
        said.setText(StatusWords.said(shown));
        facts.setText(StatusWords.facts(shown));
        if (!shown.attended().equals(attended)) {
            attended = shown.attended();
            attended.flatMap(Source::file).ifPresent(opened);
        }
        titles.accept(StatusWords.title(shown));
    }

    private static Optional<Path> dragged(List<java.io.File> files) {
        return files.stream().map(java.io.File::toPath).findFirst();
    }

    private void dragged(DragEvent e) {
        if (e.getDragboard().hasFiles()) {
            e.acceptTransferModes(TransferMode.COPY);
            e.consume();
        }
    }

    private void dropped(DragEvent e) {
        Optional<Path> file = dragged(e.getDragboard().getFiles());
        file.ifPresent(open);
        e.setDropCompleted(file.isPresent());
        e.consume();
    }
}
