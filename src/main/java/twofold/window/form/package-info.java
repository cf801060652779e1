/**
 * The controls that values are edited with: typed texts, choices and locks in rows, each with its reason under it where it was
 * refused.
 *
 * <p>What is typed is applied by Enter or by leaving the field, and stays in the field where it is refused; nothing here knows
 * what is edited. The panes in {@link twofold.window.inspect} and {@link twofold.window.ask} are made of these.
 */
package twofold.window.form;
