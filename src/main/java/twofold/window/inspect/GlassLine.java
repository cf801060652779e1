package twofold.window.inspect;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.scene.control.Label;
import javafx.scene.layout.GridPane;
import org.jspecify.annotations.Nullable;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Kind;
import twofold.design.Problem;
import twofold.design.Unit;
import twofold.edit.Edit;
import twofold.edit.FieldEdits;
import twofold.edit.Offers;
import twofold.material.Material;
import twofold.material.Materials;
import twofold.session.Session;
import twofold.window.form.Text;

/** What a part is made of: a material, whose index at the design's wavelength is shown with its source, or an index. */
final class GlassLine implements Line {
    private static final String INDEX = "an index";
    private static final String NONE = "none";

    private final Session session;
    private final Picker<String> choice;
    private final Line chosen;
    private final TypedLine typed;
    private final Label source = new Label();
    private List<String> offered = List.of();
    private double wavelength = Double.NaN;
    private @Nullable String said;

    GlassLine(Session session) {
        this.session = session;
        choice = new Picker<>("material", w -> w, this::offers, GlassLine::made, this::choose);
        typed = new TypedLine(session, Field.INDEX, GlassLine::index, Optional.empty(), List.of());
        chosen = choice.line(
                "Material",
                "What it is made of: a material, whose published index is taken at the design's wavelength, or an index.");
        source.setId("material-source");
        source.getStyleClass().addAll("quiet", "small");
        source.setWrapText(true);
        source.setMinHeight(Label.USE_PREF_SIZE);
    }

    private static Optional<String> material(Inspected now) {
        return now.part().values().find(Field.MATERIAL).map(m -> (String) m);
    }

    private static boolean statesIndex(Inspected now) {
        return now.part().values().states(Field.INDEX);
    }

    /** What it is made of, as the choice says it. */
    private static String made(Inspected now) {
        return statesIndex(now) ? INDEX : material(now).orElse(NONE);
    }

    private static double refracts(Inspected now) {
        if (statesIndex(now)) {
            return (Double) now.part().values().find(Field.INDEX).orElseThrow();
        }
        double wave = now.design().wavelength();
        return material(now)
                .flatMap(Materials.standard()::find)
                .map(m -> m.index(wave))
                .orElse(Double.NaN);
    }

    private static Text index(Inspected now) {
        double index = refracts(now);
        return Double.isNaN(index) ? Text.NONE : Text.of(Unit.ONE, index);
    }

    private List<String> offers(Inspected now) {
        Design design = now.design();
        if (design.wavelength() != wavelength || offered.isEmpty()) {
            wavelength = design.wavelength();
            offered = Offers.materials(design).stream().map(Material::name).toList();
        }
        List<String> all = new ArrayList<>();
        if (now.part().kind() == Kind.LENS) {
            all.add(NONE);
        }
        all.add(INDEX);
        all.addAll(offered);
        return all;
    }

    private List<Problem> choose(Inspected now, String word) {
        if (word.equals(INDEX)) {
            double index = refracts(now);
            return set(now, Field.INDEX, (Object) (Double.isNaN(index) ? 1.5 : index));
        } else if (word.equals(NONE)) {
            return none(now);
        }
        return set(now, Field.MATERIAL, word);
    }

    private List<Problem> set(Inspected now, Field field, Object value) {
        return session.edit(FieldEdits.set(now.name(), field, value)).problems();
    }

    /** Neither an index nor a material, in one step. */
    private List<Problem> none(Inspected now) {
        Edit index = FieldEdits.clear(now.name(), Field.INDEX);
        Edit material = FieldEdits.clear(now.name(), Field.MATERIAL);
        return session.edit(Edit.of(
                        material.name(),
                        laid -> index.on(laid).then(l -> material.change().apply(l))))
                .problems();
    }

    @Override
    public void addTo(GridPane grid) {
        chosen.addTo(grid);
        grid.add(source, 0, grid.getRowCount(), 2, 1);
        typed.addTo(grid);
    }

    @Override
    public void show(Inspected shown) {
        chosen.show(shown);
        typed.show(shown);
        String words = words(shown);
        if (!words.equals(said)) {
            said = words;
            source.setText(words);
            source.setVisible(!words.isEmpty());
            source.setManaged(!words.isEmpty());
        }
    }

    private static String words(Inspected now) {
        Optional<Material> material = material(now).flatMap(Materials.standard()::find);
        if (statesIndex(now)) {
            return material.map(m -> "The index stated wins over " + m.name() + ".")
                    .orElse("");
        }
        return material.map(m -> m.source() + "; " + micrometres(m.from()) + " to " + micrometres(m.to()) + " µm"
                        + (m.temperature().isPresent()
                                ? "; at " + Unit.ONE.text(m.temperature().getAsDouble()) + " °C"
                                : "; at room temperature"))
                .orElse("");
    }

    private static String micrometres(double si) {
        return Unit.UM.text(si);
    }

    @Override
    public void stash() {
        typed.stash();
    }
}
