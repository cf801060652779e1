package twofold.window.plot;

import java.util.List;
import java.util.Optional;
import javafx.animation.Animation;
import javafx.animation.KeyFrame;
import javafx.animation.Timeline;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ProgressBar;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import javafx.util.Duration;
import twofold.design.Design;
import twofold.design.Lever;
import twofold.design.Part;
import twofold.design.Problem;
import twofold.edit.Edit;
import twofold.edit.LeverEdits;
import twofold.layout.Laid;
import twofold.layout.Outcome;
import twofold.picture.Theme;
import twofold.session.Inquiry;
import twofold.session.Runner;
import twofold.session.Session;
import twofold.session.Shown;

/**
 * A sweep or map of the open design: menus, the picture, and what can be done with it. Asked by itself when it comes into
 * view and when something else is picked; with every change of the design where that is fast, else marked stale and asked
 * again on request. A point that is picked is previewed; applying it is one step that can be undone.
 */
abstract class StudyPane extends HBox {
    /** How often progress is shown. */
    private static final Duration TICK = Duration.millis(100);

    /** Work is said to go on after so many ticks: what ends before would only flicker. */
    private static final int PATIENCE = 2;

    /** Width of the column beside the picture, px. */
    private static final double BESIDE = 200;

    private final Session session;
    private final Inquiry<Picture> inquiry;
    private final PlotPane plot;
    private final VBox menus = new VBox(4);
    private final Button again;
    private final Button stop;
    private final Button apply;
    private final Button back;
    private final ProgressBar progress = new ProgressBar(0);
    private final Label words = new Label();
    private final Timeline ticking = new Timeline(new KeyFrame(TICK, e -> tick()));
    private int ticks;
    private boolean isInView;
    private int document;
    private Optional<Laid> laid = Optional.empty();
    private Optional<Design> filled = Optional.empty();
    private Optional<double[]> picked = Optional.empty();
    private Optional<Laid> previewed = Optional.empty();
    private boolean isPicking;
    private boolean hasQuestion;
    private Optional<String> refusal = Optional.empty();

    StudyPane(String id, String name, Session session, Runner runner) {
        super(8);
        this.session = session;
        inquiry = new Inquiry<>(runner, this::show);
        plot = new PlotPane(id + "-plot", name, this::pick, this::apply, this::back);
        again = button(id + "-again", "Run again", "Asks the same of the design as it is now", this::run);
        stop = button(id + "-stop", "Stop", "Stops the work; what was answered before stays", inquiry::cancel);
        apply = button(id + "-apply", "Apply", "Makes the design at the picked point the design (Enter)", this::apply);
        back = button(id + "-back", "Back", "Returns to the design as it is (Esc)", this::back);
        progress.setId(id + "-progress");
        progress.setAccessibleText("How far the work has come");
        progress.setMaxWidth(Double.MAX_VALUE);
        HBox.setHgrow(progress, Priority.ALWAYS);
        words.setId(id + "-words");
        words.setWrapText(true);
        words.getStyleClass().add("study-words");
        words.setMinHeight(USE_PREF_SIZE);
        HBox working = new HBox(6, progress, stop);
        HBox doing = new HBox(6, again, apply, back);
        List.of(working, doing).forEach(row -> row.getStyleClass().add("study-row"));
        ScrollPane beside = new ScrollPane(new VBox(5, menus, words, working, doing));
        beside.setAccessibleText("What is asked, and what can be done with the answer");
        beside.setFitToWidth(true);
        beside.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
        beside.setMinWidth(BESIDE);
        beside.setPrefWidth(BESIDE);
        beside.setMaxWidth(BESIDE);
        getStyleClass().add("study");
        setHgrow(plot, Priority.ALWAYS);
        getChildren().addAll(beside, plot);
        ticking.setCycleCount(Animation.INDEFINITE);
    }

    private static Button button(String id, String text, String help, Runnable action) {
        Button button = new Button(text);
        button.setId(id);
        button.setTooltip(new Tooltip(help));
        button.setAccessibleHelp(help);
        button.setOnAction(e -> action.run());
        button.setMinWidth(USE_PREF_SIZE);
        return button;
    }

    /** Puts the menus in their column. */
    final void menus(List<Node> nodes) {
        menus.getChildren().setAll(nodes);
    }

    /** Offers in the menus what a design has. */
    abstract void fill(Design design);

    /** What is picked in the menus: work to do, or in words why there is none. */
    abstract Outcome<Inquiry.Work<Picture>> work(Design design);

    /** The lever that is picked at first: one that is adjusted on the built table, else the first. */
    static Optional<Lever> usual(Design design) {
        return design.levers().stream().filter(Lever::adjuster).findFirst();
    }

    /** What the words say while nothing else is to be said. */
    abstract String hint();

    /** Takes the keyboard. */
    final Node plot() {
        return plot;
    }

    final void setTheme(Theme theme) {
        plot.setTheme(theme);
    }

    /** Comes into view, or goes out of it: then nothing is asked or previewed. */
    final void setInView(boolean is) {
        isInView = is;
        if (is) {
            look();
        } else {
            back();
            inquiry.cancel();
        }
    }

    /** Shows a moment of the session. */
    final void show(Shown shown) {
        if (shown.document() != document) {
            document = shown.document();
            laid = Optional.empty();
            filled = Optional.empty();
            picked = Optional.empty();
            previewed = Optional.empty();
            inquiry.clear();
        }
        Optional<Laid> now = shown.cavity().map(c -> c.laid());
        if (isPicking && shown.isPreview()) {
            previewed = now;
        }
        boolean isOurs = shown.isPreview() && previewed.isPresent() && previewed.equals(now);
        if (!isOurs) {
            picked = Optional.empty();
            previewed = Optional.empty();
            laid = now;
            refusal = Optional.empty();
        }
        if (isInView) {
            look();
        }
    }

    /** Asks what is to be asked of the design. */
    private void look() {
        if (laid.isPresent()) {
            Design design = laid.get().design();
            if (filled.isEmpty() || offersOther(filled.get(), design)) {
                filled = Optional.of(design);
                fill(design);
                inquiry.design(laid.get());
                ask();
            } else {
                inquiry.design(laid.get());
            }
        }
        show();
    }

    private static boolean offersOther(Design before, Design now) {
        return !before.levers().equals(now.levers()) || !offered(before).equals(offered(now));
    }

    private static List<String> offered(Design design) {
        return design.parts().stream()
                .map((Part p) -> p.kind().word() + " " + p.name())
                .toList();
    }

    /** Another question, or none. */
    final void ask() {
        if (laid.isPresent()) {
            Outcome<Inquiry.Work<Picture>> work = work(laid.get().design());
            refusal = work.problems().stream().findFirst().map(Problem::found);
            back();
            hasQuestion = work.value().isPresent();
            work.value().ifPresentOrElse(inquiry::ask, inquiry::cancel);
        }
    }

    private void run() {
        back();
        inquiry.again();
    }

    private void pick(double[] values) {
        inquiry.answer().ifPresent(picture -> {
            Edit edit = LeverEdits.set(picture.levers(), values);
            isPicking = true;
            Outcome<Laid> outcome = session.preview(edit);
            isPicking = false;
            picked = Optional.of(values);
            refusal = outcome.problems().stream().findFirst().map(p -> "There is no such design: " + p.found());
            show();
        });
    }

    private void apply() {
        if (previewed.isPresent()) {
            session.commit();
        }
    }

    private void back() {
        if (previewed.isPresent()) {
            session.abandon();
        }
    }

    private void tick() {
        ticks++;
        show();
    }

    /** Puts into the controls what is so. */
    private void show() {
        boolean isRunning = inquiry.isRunning();
        if (isRunning && ticking.getStatus() != Animation.Status.RUNNING) {
            ticks = 0;
            ticking.play();
        } else if (!isRunning) {
            ticking.stop();
            ticks = 0;
        }
        boolean isLong = isRunning && ticks >= PATIENCE;
        boolean isPreview = previewed.isPresent();
        boolean isStale = inquiry.isStale() && (!isRunning || isLong);
        progress.setProgress(inquiry.share());
        shown(progress, isLong);
        shown(stop, isLong);
        boolean isDone = inquiry.answer().isPresent()
                && !inquiry.isStale()
                && inquiry.failure().isEmpty();
        shown(again, !isRunning && !isDone && !isPreview && hasQuestion);
        shown(apply, isPreview);
        shown(back, isPreview);
        words.setText(words(isLong, isStale, isPreview));
        pseudoClassStateChanged(javafx.css.PseudoClass.getPseudoClass("stale"), isStale);
        plot.show(inquiry.answer(), isStale, picked);
    }

    private static void shown(Node node, boolean is) {
        node.setVisible(is);
        node.setManaged(is);
    }

    private String words(boolean isLong, boolean isStale, boolean isPreview) {
        if (laid.isEmpty()) {
            return "Nothing is open.";
        } else if (refusal.isPresent()) {
            return refusal.get();
        } else if (inquiry.failure().isPresent()) {
            return "This failed: " + inquiry.failure().get();
        } else if (isLong) {
            return (isStale ? "Stale until it is done: " : "Working: ") + Math.round(inquiry.share() * 100) + " %";
        } else if (isStale) {
            return "Stale: the design has changed since.";
        } else if (isPreview) {
            return "Preview: " + session.shown().undo().orElse("");
        }
        return inquiry.answer().isPresent() ? hint() : "Stopped: nothing is answered yet.";
    }
}
