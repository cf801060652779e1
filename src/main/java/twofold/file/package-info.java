/**
 * Everything that leaves or enters as data.
 *
 * <p>{@link twofold.file.DesignReader} makes a design of a file, strictly and with every problem at once:
 * {@code JsonText} parses into {@code Json} values that know their places, {@code DocumentReader} and its parts make a
 * draft of them in which legal values stand in for unreadable ones, {@code Sieve} and {@code PlanReader} check what can
 * be trusted. {@link twofold.file.DesignWriter} writes the same bytes for the same design, {@link twofold.file.SafeFile}
 * puts bytes on the disk so that the old file is whole until the new one is, {@link twofold.file.SolveJson} gives a
 * solved design to other programs, {@link twofold.file.PartText} parts to the clipboard.
 *
 * <p>{@link twofold.file.Journal} keeps unsaved work on the disk while a program runs; {@link twofold.file.UnsavedWork} is
 * what it finds of a program that did not end as it should.
 *
 * <p>Numbers cross here between the files' units and SI, always by {@link twofold.design.Unit}; no other package knows
 * JSON.
 */
package twofold.file;
