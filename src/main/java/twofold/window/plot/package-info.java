/**
 * Sweeps and maps beside the beam: what is asked is chosen from the vocabulary and the design's levers, the answer is made
 * on other threads and drawn by {@link twofold.picture.SweepDrawing} and {@link twofold.picture.MapDrawing}, and a point of
 * it is previewed as a design.
 *
 * <p>A pane asks through a {@link twofold.session.Inquiry}, which knows what is stale.
 */
package twofold.window.plot;
