/**
 * Everything that changes a design. A {@link twofold.edit.Edit} is a name and a function from a laid-out design to
 * another design, or to the problems that stand in its way; it is applied only where the result lies on the table without a
 * problem, so that no edit leaves an invalid design behind. New designs come from a {@link twofold.edit.StartingShape} or
 * from a list, {@link twofold.edit.FromList}; {@link twofold.edit.NearestStable} slides a part into a zone. Nothing here knows a file, a document or a window.
 */
package twofold.edit;
