/**
 * What a person states: one immutable {@link twofold.design.Design} and the vocabulary to speak about it.
 *
 * <p>A design is a list of parts in beam order, mirrors with positions on the table, everything else with a place along
 * its leg; plus holds, levers, requirements and tolerances. Nothing here knows optics, files or windows: leg lengths and
 * angles follow from the plan in {@code twofold.layout}, modes in {@code twofold.cavity}.
 *
 * <p>All numbers are SI (m, rad, 1/m); {@link twofold.design.Unit} is the one class that converts. The vocabulary is
 * {@link twofold.design.Field} (what a part is made of) and {@link twofold.design.Quantity} (what can be read off a
 * cavity). Faults are values: {@link twofold.design.Problem}, with a place.
 *
 * <p>Values are never null inside a design; what may be absent is an {@code Optional}.
 */
package twofold.design;
