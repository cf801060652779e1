/**
 * Light in one plane, on primitives: a ray matrix that grows along the beam ({@link twofold.optics.Walk}), the formulas
 * of a closed chain ({@link twofold.optics.Mode}) and refraction at a plane face ({@link twofold.optics.Refraction}).
 *
 * <p>Rays are (x, n x′), the slope reduced by the index, so every matrix has determinant 1 and a plane-parallel medium
 * acts as a shorter space. Products run right to left in order of travel. A mirror acts as the lens that it is: the
 * left-right swap of reflections is left out. 1/q̂ = n/R − iλ/(πw²) with the vacuum wavelength and R positive for a
 * diverging wavefront; Siegman, Lasers (1986), ch. 20 and 21 uses the same q̂ and calls it q̃ with the other sign of i in
 * places.
 *
 * <p>Nothing here allocates or knows what a part is; {@code twofold.cavity} puts parts into chains.
 */
package twofold.optics;
