/**
 * One open document without a window: what file it is, the design last read without problems, what is wrong with the file
 * as it stands, what is selected and pointed at, and whether the file has changed on disk.
 *
 * <p>{@link twofold.session.Session} is the only mutable thing here. It hands a new immutable
 * {@link twofold.session.Shown} to its one listener whenever something changed; reading and solving go through a
 * {@link twofold.session.Runner}, so that a window runs them beside its own thread and a test on the spot.
 */
package twofold.session;
