package twofold.material;

import java.util.List;
import java.util.OptionalDouble;

/**
 * A material's published index fit.
 *
 * @param name as design files write it; a crystal's axis belongs to it
 * @param constant what n² starts from, pure number
 * @param terms added to the constant
 * @param from shortest vacuum wavelength of the fit, m
 * @param to longest vacuum wavelength of the fit, m
 * @param temperature of the fit, °C; empty: the source says room temperature
 * @param source where the fit is published
 */
public record Material(
        String name,
        double constant,
        List<Term> terms,
        double from,
        double to,
        OptionalDouble temperature,
        String source) {

    private static final double MICROMETRES_PER_M = 1e6;

    /** Copies the list. */
    public Material {
        terms = List.copyOf(terms);
    }

    /**
     * The phase index. Outside the fit's range this extrapolates: ask {@link #covers} first.
     *
     * @param wavelength in vacuum, m
     * @return NaN where the fit's n² is negative
     */
    public double index(double wavelength) {
        double square = constant;
        for (Term term : terms) {
            square += term.of(wavelength * MICROMETRES_PER_M);
        }
        return Math.sqrt(square);
    }

    /**
     * Whether a wavelength is inside the fit's range, ends included.
     *
     * @param wavelength in vacuum, m
     */
    public boolean covers(double wavelength) {
        return from <= wavelength && wavelength <= to;
    }
}
