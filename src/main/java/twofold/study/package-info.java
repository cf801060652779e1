/**
 * Questions over many cavities: what becomes of some quantities while levers move.
 *
 * <p>{@link twofold.study.Setting} sets levers in a trial, moving mirrors where a leg or an incidence is set.
 * {@link twofold.study.Question} puts levers and quantities together, {@link twofold.study.Survey} asks it along one or two
 * {@link twofold.study.Axis axes} on all cores, in order and with bounded memory. {@link twofold.study.Swept} and
 * {@link twofold.study.Mapped} keep what a picture of a sweep or map shows: zones and requirements too.
 * {@link twofold.study.WorstOver} finds the worst value over a lever's range, {@link twofold.study.Levered} makes a design
 * of a point, {@link twofold.study.StableStretches} tells where along a leg or lever both planes are stable, and
 * {@link twofold.study.EqualEdges} at which incidence folds compensate.
 *
 * <p>Each takes values, answers NaN where something is undefined, and tells its {@link twofold.study.Progress}, which can
 * stop it. A point's answer depends on the levers' values alone: not on its neighbours, nor on how many cores there are.
 */
package twofold.study;
