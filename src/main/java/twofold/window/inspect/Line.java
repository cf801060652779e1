package twofold.window.inspect;

import javafx.scene.layout.GridPane;

/** One row of the inspector, or several that belong together. */
interface Line {
    /** Puts it at the end of a grid. */
    void addTo(GridPane grid);

    /** Shows a part, of a kind that has this. */
    void show(Inspected now);

    /** Lays what is typed and not applied aside until the same part is shown again. */
    void stash();
}
