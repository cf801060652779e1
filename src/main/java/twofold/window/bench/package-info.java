/**
 * The bench: the plan seen from above, zoomed, panned and picked from by mouse and keyboard.
 *
 * <p>A pane is handed the {@link twofold.session.Session} and is told what to show; it knows no other pane.
 */
package twofold.window.bench;
