/**
 * Everything that changes a design. A {@link twofold.edit.Edit} is a name and a function from a laid-out design to
 * another design, or to the problems that stand in its way; it is applied only where the result lies on the table without a
 * problem, so that no edit leaves an invalid design behind. New designs come from a {@link twofold.edit.StartingShape} or
 * from a list, {@link twofold.edit.FromList}; {@link twofold.edit.NearestStable} slides a part into a zone. Nothing here
 * knows a file, a document or a window.
 *
 * <p>Edits stand by what they change: {@link twofold.edit.PartEdits} (put on the beam, taken off, copied, renamed, reordered),
 * {@link twofold.edit.MirrorEdits} (put in, dragged, set to typed numbers of the plan), {@link twofold.edit.Nudges} (steps by
 * key), {@link twofold.edit.FieldEdits} (fields from values or typed text, title, wavelength, shape),
 * {@link twofold.edit.HoldEdits} and {@link twofold.edit.AskEdits} (requirements, levers, tolerances),
 * {@link twofold.edit.LeverEdits} (everything that some levers set). They name parts, so that
 * an edit means the same in whatever design it is applied to. {@link twofold.edit.Offers} says for menus what a place
 * accepts, {@link twofold.edit.Spot} what a pointer points at, {@link twofold.edit.Lost} what went along unasked.
 *
 * <p>Where parts come and go, the rest keeps what a person would expect: parts their order and, as numbers, their places;
 * arms their shape; holds, levers, requirements and tolerances whatever they can still refer to ({@code References}). A hold
 * keeps the present value while mirrors are moved, and has a new one after a part was put in or taken out.
 */
package twofold.edit;
