/**
 * The command line: a function from arguments and two streams to an exit status ({@link twofold.command.Commands#run}).
 *
 * <p>Each command is one small class that reads, asks {@code cavity} or {@code layout}, and prints; the texts for a person
 * are built by {@link twofold.command.SolveText} and {@link twofold.command.PlaceText}. Results go to the out stream alone,
 * errors to the other, one a line. Exit status: 0 done, 1 the answer is no, 2 wrong usage, 3 a file could not be read,
 * written or accepted.
 *
 * <p>A new command is a class like {@link twofold.command.SolveCommand}, a line in {@link twofold.command.Commands}, its
 * row in the README and a test of what the README shows.
 */
package twofold.command;
