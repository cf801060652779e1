/**
 * What is asked of a design: requirements with their live values, levers and tolerances, as lists that are added to, edited in
 * place, reordered and shortened by mouse or by keyboard.
 *
 * <p>{@link twofold.window.ask.AskPanes} makes the three lists. A list ({@link twofold.window.ask.AskPane}) knows rows and keys; a
 * sheet ({@link twofold.window.ask.Sheet}) knows the numbers and choices of one kind of thing that is asked.
 */
package twofold.window.ask;
