package twofold.design;

/**
 * Where a part stands on its leg: at a path length from the surface of the mirror before it to the part's middle, inside
 * parts included, or in the middle of the leg's path.
 *
 * @param inMiddle in the middle of the leg's path
 * @param path m; 0 and without meaning in the middle
 */
public record Along(boolean inMiddle, double path) {
    /** In the middle of the leg's path, wherever that comes to lie. */
    public static final Along MIDDLE = new Along(true, 0);

    /** At a path length, m. */
    public static Along at(double path) {
        return new Along(false, path);
    }
}
