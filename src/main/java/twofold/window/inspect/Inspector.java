package twofold.window.inspect;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import javafx.geometry.Insets;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.CheckBox;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.input.Clipboard;
import javafx.scene.input.ClipboardContent;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import twofold.design.Kind;
import twofold.session.Figure;
import twofold.session.Figures;
import twofold.session.Session;
import twofold.session.Shown;
import twofold.window.Following;
import twofold.window.form.Scrolled;

/**
 * The selected part: its fields, to be changed, and under them the figures that follow, rounded for reading and copied in full
 * precision. Where no part is selected, the design itself.
 */
public final class Inspector extends VBox {
    private static final String NOTHING = "Nothing is open.";

    /** The figures' share of the height, at most. */
    private static final double SHARE = 0.4;

    /** Of the line over the figures, px. */
    private static final double HEAD = 44;

    private final Session session;
    private final Following following;
    private final Label title = new Label(NOTHING);
    private final Button copy = new Button("Copy figures");
    private final CheckBox diameters = new CheckBox("Diameters instead of radii");
    private final Scrolled fields = new Scrolled("Fields of the selected part");
    private final FiguresGrid grid = new FiguresGrid();
    private final VBox figures = new VBox(4) {
        /** So much that they are read while fields are changed, and no more than they need. */
        @Override
        protected double computePrefHeight(double width) {
            double needed = HEAD + grid.prefHeight(-1);
            return Math.min(needed, SHARE * Inspector.this.getHeight());
        }
    };
    private final Map<Kind, PartForm> parts = new EnumMap<>(Kind.class);
    private final DesignForm design;
    private Optional<PartForm> part = Optional.empty();
    private Optional<Inspected> inspected = Optional.empty();

    /** Makes the pane. */
    public Inspector(Session session, Following following) {
        this.session = session;
        this.following = following;
        design = new DesignForm(session);
        getStyleClass().add("inner-card");
        title.setId("inspected");
        title.getStyleClass().add("title");
        title.setMinWidth(0);
        copy.setId("copy-figures");
        copy.setMinWidth(Region.USE_PREF_SIZE);
        copy.setTooltip(new Tooltip("Copy all figures of this part in full precision"));
        copy.setAccessibleHelp("Copies all figures of the selected part in full precision");
        copy.setOnAction(e -> copy());
        diameters.setId("diameters");
        diameters.setAccessibleHelp("Shows beam and waist diameters, twice the 1/e² radii");
        diameters.setTooltip(new Tooltip("Beam and waist sizes as 1/e² diameters, twice the radii"));
        diameters.setOnAction(e -> tell());
        fields.setId("fields-scroll");
        fields.setMinHeight(80);
        VBox.setVgrow(fields, Priority.ALWAYS);
        grid.setPadding(new Insets(0, 6, 2, 0));
        Scrolled scroll = new Scrolled("Figures of the selected part");
        scroll.setContent(grid);
        scroll.setId("figures-scroll");
        VBox.setVgrow(scroll, Priority.ALWAYS);
        heightProperty().addListener((o, was, is) -> figures.requestLayout());
        Region gap = new Region();
        HBox.setHgrow(gap, Priority.ALWAYS);
        HBox bar = new HBox(8, diameters, gap, copy);
        bar.setAlignment(Pos.CENTER_LEFT);
        figures.getChildren().addAll(bar, scroll);
        figures.getStyleClass().add("figures");
        figures.setMinHeight(Region.USE_PREF_SIZE);
        figures.setVisible(false);
        figures.setManaged(false);
        getChildren().addAll(title, fields, figures);
        // A key that clears a field must not reach past a lock or a choice and take the part itself off the beam.
        addEventHandler(KeyEvent.KEY_PRESSED, e -> {
            if (e.getCode() == KeyCode.DELETE) {
                e.consume();
            }
        });
    }

    /** Shows the selected part, or the design. */
    public void show(Shown shown) {
        inspected = shown.cavity().flatMap(c -> shown.selected().map(i -> new Inspected(shown.document(), c, i)));
        if (inspected.isPresent()) {
            show(inspected.get());
        } else {
            shown.cavity().ifPresent(c -> {
                become(design.grid(), Optional.empty());
                design.show(shown.document(), c);
            });
            title.setText(shown.cavity().isPresent() ? "The design" : NOTHING);
        }
        tell();
    }

    private void show(Inspected now) {
        PartForm form = parts.computeIfAbsent(now.part().kind(), k -> new PartForm(k, session, following));
        become(form.grid(), Optional.of(form));
        form.show(now);
        title.setText(now.name() + " · " + now.part().kind().word());
    }

    /** Puts another form into the pane; what is typed in the one before and not applied is laid aside. */
    private void become(GridPane form, Optional<PartForm> next) {
        if (!form.equals(fields.getContent())) {
            part.ifPresentOrElse(PartForm::stash, design::stash);
            part = next;
            form.setPadding(new Insets(2, 6, 4, 2));
            fields.setContent(form);
            fields.setVvalue(0);
        }
        figures.setVisible(next.isPresent());
        figures.setManaged(next.isPresent());
    }

    private List<Figure> all() {
        return inspected.map(i -> Figures.of(i.cavity(), i.index(), across())).orElse(List.of());
    }

    private Figures.Across across() {
        return diameters.isSelected() ? Figures.Across.DIAMETER : Figures.Across.RADIUS;
    }

    private void tell() {
        grid.show(inspected
                .map(i -> Figures.following(i.cavity(), i.index(), across()))
                .orElse(List.of()));
    }

    /** Puts all figures on the clipboard, a line each. */
    public void copy() {
        ClipboardContent content = new ClipboardContent();
        content.putString(
                title.getText() + "\n" + all().stream().map(Figure::line).collect(Collectors.joining("\n")) + "\n");
        Clipboard.getSystemClipboard().setContent(content);
    }
}
