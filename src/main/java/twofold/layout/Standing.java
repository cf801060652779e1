package twofold.layout;

/**
 * A part that is not a mirror, where it stands on its leg, with what follows from its glass and faces.
 *
 * @param part index in the design
 * @param middle path from the mirror before to the part's middle, m
 * @param length path inside the part, m; 0 for what is thin
 * @param index phase index inside; 1 where there is no glass
 * @param incidence on its faces, rad
 * @param turn angle by which the beam turns on entry, rad: left or up positive
 * @param shift sideways, m, left positive; 0 for a sagittal tilt
 * @param lift away from the table, m; 0 for a tangential tilt
 * @param advance extent along the leg's heading, m
 */
public record Standing(
        int part,
        double middle,
        double length,
        double index,
        double incidence,
        double turn,
        double shift,
        double lift,
        double advance) {
    /** Path from the mirror before to the first face, m. */
    public double start() {
        return middle - length / 2;
    }

    /** Path from the mirror before to the second face, m. */
    public double end() {
        return middle + length / 2;
    }

    /** The same elsewhere on its leg. */
    Standing at(double place) {
        return new Standing(part, place, length, index, incidence, turn, shift, lift, advance);
    }
}
