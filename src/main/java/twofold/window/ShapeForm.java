package twofold.window;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import java.util.stream.Collectors;
import javafx.scene.Node;
import javafx.scene.control.ChoiceBox;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import twofold.design.Design;
import twofold.design.Entry;
import twofold.design.Names;
import twofold.design.Problem;
import twofold.design.Subject;
import twofold.edit.CrystalCut;
import twofold.edit.Offers;
import twofold.edit.StartingInput;
import twofold.edit.StartingShape;
import twofold.edit.StartingValues;
import twofold.layout.Outcome;
import twofold.session.Runner;
import twofold.window.form.InWords;

/** A form that asks for a starting shape and its numbers, built from their vocabulary. What is typed survives a change of shape. */
final class ShapeForm extends VBox {
    private final ChoiceBox<StartingShape> shape = new ChoiceBox<>();
    private final ChoiceBox<CrystalCut> cut = new ChoiceBox<>();
    private final ChoiceBox<String> material = new ChoiceBox<>();
    private final GridPane grid = new GridPane();
    private final Label refused = new Label();
    private final Map<StartingInput, TextField> fields = new EnumMap<>(StartingInput.class);
    /** What the person typed, to be kept when the shape changes. */
    private final Map<StartingInput, String> typed = new EnumMap<>(StartingInput.class);

    ShapeForm() {
        setSpacing(10);
        shape.setId("shape");
        shape.setAccessibleText("Shape");
        shape.getItems().setAll(StartingShape.values());
        shape.setConverter(new InWords<>(shape::getItems, s -> Names.capital(s.words())));
        cut.setId("crystal");
        cut.setAccessibleText("Crystal");
        cut.setConverter(new InWords<>(cut::getItems, c -> Names.capital(c.words())));
        material.setId("material");
        material.setAccessibleText("Crystal material");
        grid.setHgap(8);
        grid.setVgap(6);
        ColumnConstraints names = new ColumnConstraints();
        names.setMinWidth(Region.USE_PREF_SIZE);
        ColumnConstraints entries = new ColumnConstraints(130);
        ColumnConstraints means = new ColumnConstraints();
        means.setHgrow(Priority.ALWAYS);
        grid.getColumnConstraints().addAll(names, entries, means);
        refused.setId("refused");
        refused.getStyleClass().add("bad");
        refused.setWrapText(true);
        refused.setMinHeight(Region.USE_PREF_SIZE);
        getChildren().addAll(grid, refused);
        shape.valueProperty().addListener((o, was, is) -> choose(is));
        cut.valueProperty().addListener((o, was, is) -> rows());
        shape.setValue(StartingShape.Z);
    }

    /** The control that the keyboard begins with. */
    Node first() {
        return shape;
    }

    private void choose(StartingShape next) {
        StartingValues defaults = next.defaults();
        cut.getItems().setAll(next.cuts());
        cut.setValue(defaults.cut());
        material.getItems().setAll(Offers.materialNames());
        defaults.glass().material().ifPresent(material::setValue);
        rows();
    }

    private void rows() {
        keep();
        fields.clear();
        grid.getChildren().clear();
        StartingShape of = shape.getValue();
        StartingValues values = of.defaults();
        CrystalCut chosen = cut.getValue();
        if (chosen == null) {
            return;
        }
        StartingValues asked = values.with(chosen);
        int row = 0;
        grid.addRow(row++, new Label("Shape"), shape);
        for (StartingInput input : of.inputs()) {
            if (input == StartingInput.CRYSTAL_LENGTH) {
                grid.addRow(row++, new Label("Crystal"), cut);
                if (chosen != CrystalCut.NONE) {
                    grid.addRow(row++, new Label("Material"), material);
                }
            }
            if (of.uses(input, asked)) {
                row(row++, input, values);
            }
        }
        refused.setText("");
    }

    private void row(int row, StartingInput input, StartingValues defaults) {
        OptionalDouble usual = defaults.find(input);
        String text = usual.isEmpty()
                ? ""
                : Double.isInfinite(usual.getAsDouble()) ? "flat" : input.unit().text(usual.getAsDouble());
        TextField field = new TextField(typed.getOrDefault(input, text));
        field.setId("input-" + input.name().toLowerCase(Locale.ROOT));
        Label name =
                new Label(Names.capital(input.words()) + ", " + input.unit().symbol());
        name.setLabelFor(field);
        field.setAccessibleText(name.getText());
        field.setTooltip(new Tooltip(Names.capital(input.doc()) + ". Accepted: " + input.accepted()));
        Label doc = new Label(input.doc());
        doc.getStyleClass().add("quiet");
        doc.setWrapText(true);
        fields.put(input, field);
        grid.addRow(row, name, field, doc);
    }

    private void keep() {
        fields.forEach((input, field) -> typed.put(input, field.getText()));
    }

    /** The search for the design; empty where a number cannot be read, which the form then shows. */
    Optional<Callable<Outcome<Design>>> ask() {
        StartingShape of = shape.getValue();
        StartingValues values = of.defaults().with(cut.getValue());
        if (material.getValue() != null) {
            values = values.withMaterial(material.getValue());
        }
        List<Problem> problems = new ArrayList<>();
        for (Map.Entry<StartingInput, TextField> entry : fields.entrySet()) {
            StartingInput input = entry.getKey();
            String text = entry.getValue().getText();
            if (text.isBlank() && input.form() == StartingInput.Form.OPTIONAL) {
                values = values.without(input);
                continue;
            }
            Entry<Double> number = input.read(text);
            number.problem().ifPresent(problems::add);
            if (number.value().isPresent()) {
                values = values.with(input, number.value().get());
            }
        }
        refuse(problems);
        StartingValues asked = values;
        return problems.isEmpty() ? Optional.of(() -> of.make(asked)) : Optional.empty();
    }

    /** The design that was found, or nothing: the form then shows why. */
    Optional<Design> answer(Runner.Ended<Outcome<Design>> ended) {
        if (ended instanceof Runner.Ended.Done<Outcome<Design>> done) {
            refuse(done.value().problems());
            return done.value().value();
        }
        throw new IllegalStateException("a shape cannot be made: " + ended);
    }

    private void refuse(List<Problem> problems) {
        refused.setText(problems.stream().map(ShapeForm::line).collect(Collectors.joining("\n")));
    }

    private static String line(Problem problem) {
        return (problem.where().equals(Subject.DOCUMENT) ? "" : problem.where() + ": ") + problem.message();
    }
}
