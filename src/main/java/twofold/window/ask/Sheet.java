package twofold.window.ask;

import javafx.scene.Node;

/**
 * The controls of one thing that is asked, under its row.
 *
 * @param <T> a requirement, lever or tolerance
 */
interface Sheet<T> {
    /** The controls. */
    Node node();

    /** Shows the thing; what is typed and not applied stays. */
    void show(Listed<T> now);

    /** The control that gets the keyboard when the row opens. */
    Node first();
}
