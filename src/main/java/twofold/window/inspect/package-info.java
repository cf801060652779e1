/**
 * The inspector: every field of the selected part, or of the design where none is selected, with its limits, its choices and its
 * holds as locks; and the figures that follow.
 *
 * <p>The fields are those of {@link twofold.design.Field}, so that a new field has its row without a line here; only fields
 * that are more than a typed text have rows of their own. Forms are made once a kind of part and told what to show.
 */
package twofold.window.inspect;
