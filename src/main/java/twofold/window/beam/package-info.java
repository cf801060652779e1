/**
 * The beam along its unfolded path, and the close-up of one crystal or leg.
 *
 * <p>A pane is handed the {@link twofold.session.Session} and is told what to show; it knows no other pane.
 */
package twofold.window.beam;
