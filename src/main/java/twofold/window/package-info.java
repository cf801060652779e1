/**
 * The window, and the only code that knows JavaFX. It is a thin skin: what is shown is a {@link twofold.session.Shown},
 * pictures are drawn by {@code twofold.picture} onto a {@link twofold.window.CanvasPainter}, and every change goes through
 * the {@link twofold.session.Session}.
 *
 * <p>{@link twofold.window.Editor} wires the panes of {@code window.bench}, {@code window.beam}, {@code window.plot},
 * {@code window.inspect}, {@code window.ask} and {@code window.panel} together; fields and choices are those of
 * {@code window.form}; {@link twofold.window.Look} turns the inks of a theme into a style sheet. Panes know the session and nothing of
 * each other.
 */
package twofold.window;
