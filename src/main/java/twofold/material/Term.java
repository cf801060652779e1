package twofold.material;

/**
 * One term of n² as a function of the wavelength, in the units in which such fits are published (λ in µm).
 *
 * @param form how the two numbers are used
 * @param first B of the forms below
 * @param second C of the forms below
 */
public record Term(Form form, double first, double second) {

    /** How a term's two numbers make a contribution to n². */
    public enum Form {
        /** B λ²/(λ² − C²): resonance given by its wavelength. */
        RESONANCE,
        /** B λ²/(λ² − C): resonance given by its wavelength squared. */
        SQUARED,
        /** B/(λ² − C). */
        POLE,
        /** B λ^C. */
        POWER
    }

    /**
     * This term's share of n².
     *
     * @param micrometres vacuum wavelength, µm
     */
    double of(double micrometres) {
        double square = micrometres * micrometres;
        return switch (form) {
            case RESONANCE -> first * square / (square - second * second);
            case SQUARED -> first * square / (square - second);
            case POLE -> first / (square - second);
            case POWER -> first * Math.pow(micrometres, second);
        };
    }
}
