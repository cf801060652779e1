/**
 * Refractive indices: published fits, read from one tab-separated table with source, range and temperature.
 *
 * <p>{@link twofold.material.Materials#standard()} is the shipped table, {@link twofold.material.Material} one row of
 * it. No index number stands in code; which published fit was chosen where several disagree, and why, is said at the top
 * of the table, {@code index-fits.tsv}. Indices are phase indices of undoped material at the temperature of the fit, in
 * air taken as vacuum; wavelengths are vacuum values in m.
 *
 * <p>The package uses no other package of the program. Who asks for an index outside a fit's range gets an
 * extrapolation, so ask {@link twofold.material.Material#covers(double)} first.
 */
package twofold.material;
