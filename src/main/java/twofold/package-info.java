/**
 * The program as a whole: {@link twofold.Main} picks command or window, and knows nothing else.
 *
 * <p>Start reading at {@code twofold.design}, what a person states; then {@code twofold.layout}, where it stands;
 * {@code twofold.cavity}, what light makes of it. DEVELOPERS.md has the diagram.
 */
package twofold;
