package twofold.design;

/**
 * The power of a thermal lens in each plane, for the reduced slope inside the part.
 *
 * @param tangential 1/m, positive converging
 * @param sagittal 1/m, positive converging
 */
public record TwoPowers(double tangential, double sagittal) {
    /** No lens. */
    public static final TwoPowers NONE = new TwoPowers(0, 0);

    /** Whether there is no lens in either plane. */
    public boolean isNone() {
        return tangential == 0 && sagittal == 0;
    }
}
