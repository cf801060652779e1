package twofold.window.plot;

import java.util.List;
import javafx.event.Event;
import javafx.scene.Node;
import javafx.scene.control.Tab;
import javafx.scene.control.TabPane;
import javafx.scene.input.MouseEvent;
import twofold.picture.Theme;
import twofold.session.Runner;
import twofold.session.Session;
import twofold.session.Shown;

/** The beam along the path, and sweeps and maps beside it. */
public final class PlotTabs extends TabPane {
    private final Node beam;
    private final SweepPane sweep;
    private final MapPane map;
    private final Tab sweeping;
    private final Tab mapping;

    /**
     * The tabs, the beam in front.
     *
     * @param beam along the path
     * @param runner for sweeps and maps alone, which may keep it busy
     */
    public PlotTabs(Session session, Node beam, Runner runner) {
        this.beam = beam;
        sweep = new SweepPane(session, runner);
        map = new MapPane(session, runner);
        sweeping = tab("Sweep", sweep);
        mapping = tab("Map", map);
        getTabs().addAll(new Tab("Beam", beam), sweeping, mapping);
        setId("plots");
        setAccessibleText("The beam, sweeps and maps");
        setTabClosingPolicy(TabClosingPolicy.UNAVAILABLE);
        // A tab pane would take the keyboard from the picture that was clicked.
        List.of(beam, sweep, map).forEach(n -> n.addEventHandler(MouseEvent.MOUSE_PRESSED, Event::consume));
    }

    /** A tab whose controls are made when it is first chosen, so that they do not keep the first picture waiting. */
    private static Tab tab(String name, StudyPane pane) {
        Tab tab = new Tab(name);
        tab.selectedProperty().addListener((o, was, is) -> {
            if (is) {
                tab.setContent(pane);
            }
            pane.setInView(is);
        });
        return tab;
    }

    /** Work leaves a core to the window where there is more than one. */
    static int threads() {
        return Math.max(1, Runtime.getRuntime().availableProcessors() - 1);
    }

    /** Shows a moment of the session. */
    public void show(Shown shown) {
        sweep.show(shown);
        map.show(shown);
    }

    /** Changes the theme of sweeps and maps. */
    public void setTheme(Theme theme) {
        sweep.setTheme(theme);
        map.setTheme(theme);
    }

    /** The picture in front, which takes the keyboard. */
    public Node front() {
        return sweeping.isSelected() ? sweep.plot() : mapping.isSelected() ? map.plot() : beam;
    }
}
