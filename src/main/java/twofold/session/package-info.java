/**
 * One open document without a window: where it lies, the design and what it has been, what is shown of an edit before it is
 * made, what is selected and pointed at, whether there is unsaved work, and a file that could not be opened beside it.
 *
 * <p>{@link twofold.session.Session} is the only mutable thing that others see. It hands a new immutable
 * {@link twofold.session.Shown} to its one listener whenever something changed. Edits are solved before a call returns;
 * reading, writing and judging over a lever's range go through a {@link twofold.session.Runner}, so that a window runs them
 * beside its own thread and a test on the spot. A sweep or map is an {@link twofold.session.Inquiry}, which is cancelled by
 * a newer one and knows whether it is stale.
 */
package twofold.session;
