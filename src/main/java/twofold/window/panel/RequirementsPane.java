package twofold.window.panel;

import java.util.List;
import javafx.geometry.HPos;
import javafx.geometry.VPos;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import twofold.cavity.Cavity;
import twofold.cavity.Judgement;
import twofold.session.Ask;
import twofold.session.Shown;

/** The requirements as a live list: met or not, the value, what is asked, the margin. */
public final class RequirementsPane extends VBox {
    private final GridPane grid = new GridPane();
    private List<Ask> asks = List.of();

    /** Makes the pane. */
    public RequirementsPane() {
        getStyleClass().add("inner-card");
        grid.setId("requirements");
        grid.setHgap(8);
        grid.setVgap(4);
        ColumnConstraints mark = new ColumnConstraints();
        mark.setMinWidth(Region.USE_PREF_SIZE);
        ColumnConstraints words = new ColumnConstraints();
        words.setHgrow(Priority.ALWAYS);
        words.setMinWidth(60);
        ColumnConstraints numbers = new ColumnConstraints();
        numbers.setHalignment(HPos.RIGHT);
        numbers.setMinWidth(Region.USE_PREF_SIZE);
        grid.getColumnConstraints().addAll(mark, words, numbers, numbers);
        ScrollPane scroll = new ScrollPane(grid);
        scroll.setFitToWidth(true);
        scroll.setAccessibleText("Requirements");
        VBox.setVgrow(scroll, Priority.ALWAYS);
        getChildren().add(scroll);
        fill();
    }

    /** Shows how the design does. */
    public void show(Shown shown) {
        List<Ask> next = Ask.of(shown.cavity().map(Cavity::judgements).orElse(List.of()));
        if (!next.equals(asks)) {
            asks = next;
            fill();
        }
    }

    private void fill() {
        grid.getChildren().clear();
        if (asks.isEmpty()) {
            grid.add(quiet("Nothing is asked of this design."), 0, 0, 4, 1);
        }
        int row = 0;
        for (Ask ask : asks) {
            Label mark = new Label(sign(ask.verdict()));
            mark.getStyleClass().addAll("mark", style(ask.verdict()));
            mark.setAccessibleText(ask.verdict().word());
            Label words = new Label(ask.what());
            words.setWrapText(true);
            Label value = new Label(ask.value());
            value.getStyleClass().addAll("figure", style(ask.verdict()));
            Label asked = quiet(ask.asked() + (ask.margin().equals("–") ? "" : "\nmargin " + ask.margin()));
            grid.addRow(row, mark, words, value, asked);
            for (Label label : List.of(mark, words, value, asked)) {
                GridPane.setValignment(label, VPos.TOP);
            }
            row++;
        }
    }

    private static Label quiet(String text) {
        Label label = new Label(text);
        label.getStyleClass().add("quiet");
        return label;
    }

    /** A sign that is told from the others without colour. */
    private static String sign(Judgement.Verdict verdict) {
        return switch (verdict) {
            case MET -> "✓";
            case NOT_MET -> "!";
            case WISH -> "☆";
            case OPEN -> "?";
        };
    }

    private static String style(Judgement.Verdict verdict) {
        return switch (verdict) {
            case MET -> "good";
            case NOT_MET -> "bad";
            case WISH, OPEN -> "quiet";
        };
    }
}
