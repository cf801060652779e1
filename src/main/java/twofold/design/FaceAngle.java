package twofold.design;

/**
 * The angle of incidence on the faces of a plate or crystal: a number, or Brewster's angle of its index.
 *
 * @param atBrewster at Brewster's angle, arctan of the index
 * @param incidence rad; 0 and without meaning at Brewster's angle
 */
public record FaceAngle(boolean atBrewster, double incidence) {
    /** At Brewster's angle, whatever the index. */
    public static final FaceAngle BREWSTER = new FaceAngle(true, 0);

    /** At an angle, rad. */
    public static FaceAngle of(double incidence) {
        return new FaceAngle(false, incidence);
    }
}
