package twofold.window;

import java.util.Optional;
import java.util.stream.Collectors;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.TextArea;
import javafx.scene.control.TextField;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import twofold.design.Design;
import twofold.design.Entry;
import twofold.design.Problem;
import twofold.design.Subject;
import twofold.design.Unit;
import twofold.edit.FromList;

/** A form that takes a plan as a list of legs and angles. */
final class ListForm extends VBox {
    private static final String HELP = """
            Legs along the beam; angles of incidence at the mirrors between them; radii, if any. In mm and degrees, or \
            with a unit. Turns alternate (a Z) unless L or R stands behind an angle. As many angles as legs make a ring.
            480, 105, 620; 7.9, 7.9; 100, 100
            48 cm, 105, 620; 7.9 L, 7.9 L; flat, 100, 100, flat""";

    private final TextArea list = new TextArea("480, 105, 620; 7.9, 7.9; 100, 100");
    private final TextField wavelength = new TextField("1064");
    private final Label refused = new Label();

    ListForm() {
        setSpacing(10);
        Label help = new Label(HELP);
        help.setWrapText(true);
        help.setMinHeight(Region.USE_PREF_SIZE);
        list.setId("list");
        list.setAccessibleText("Legs and angles");
        list.setPrefRowCount(3);
        list.setWrapText(true);
        wavelength.setId("list-wavelength");
        wavelength.setAccessibleText("Wavelength, nm");
        wavelength.setPrefColumnCount(8);
        Label name = new Label("Wavelength, nm");
        name.setLabelFor(wavelength);
        HBox wave = new HBox(8, name, wavelength);
        wave.setAlignment(Pos.BASELINE_LEFT);
        refused.setId("list-refused");
        refused.getStyleClass().add("bad");
        refused.setWrapText(true);
        refused.setMinHeight(Region.USE_PREF_SIZE);
        getChildren().addAll(help, list, wave, refused);
    }

    /** The design; where there is none, the form shows why and marks the first place. */
    Optional<Design> make() {
        Entry<Double> wave = Entry.number(Subject.DOCUMENT.at("wavelength"), wavelength.getText(), Unit.NM);
        if (wave.value().isEmpty()) {
            refused.setText(wave.problem().map(Problem::line).orElse(""));
            return Optional.empty();
        }
        FromList read = FromList.read(list.getText(), wave.value().get());
        refused.setText(read.faults().stream().map(FromList.Fault::line).collect(Collectors.joining("\n"))
                + read.closing()
                        .map(c -> "\nThe closest list that closes: " + c)
                        .orElse(""));
        read.faults().stream().findFirst().ifPresent(fault -> {
            list.requestFocus();
            list.selectRange(fault.from(), fault.to());
        });
        return read.design();
    }
}
