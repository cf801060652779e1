/**
 * Panes of controls round the pictures: the parts, stability, zones and the ledger, the problems of a file.
 *
 * <p>A pane is handed the {@link twofold.session.Session} and is told what to show; it knows no other pane.
 */
package twofold.window.panel;
