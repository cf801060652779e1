package twofold.picture;

import java.util.OptionalDouble;
import java.util.OptionalInt;

/**
 * What of the unfolded path is shown, and how.
 *
 * @param width of the pane, px
 * @param height of the pane, px
 * @param stretch of the path, along the pane
 * @param selected index of the part that is selected
 * @param crosshair path that is tied to the bench, m
 * @param numbers whether every waist that has room shows its radius, as on paper, where nobody can hover
 */
public record BeamView(
        double width, double height, Stretch stretch, OptionalInt selected, OptionalDouble crosshair, boolean numbers) {
    /** This view of another stretch. */
    public BeamView over(Stretch other) {
        return new BeamView(width, height, other, selected, crosshair, numbers);
    }

    /** This view with a part selected, or none. */
    public BeamView selecting(OptionalInt part) {
        return new BeamView(width, height, stretch, part, crosshair, numbers);
    }

    /** This view with the crosshair at a path, or nowhere. */
    public BeamView crossing(OptionalDouble path) {
        return new BeamView(width, height, stretch, selected, path, numbers);
    }

    /** This view with the radii of waists shown, or not. */
    public BeamView numbering(boolean all) {
        return new BeamView(width, height, stretch, selected, crosshair, all);
    }
}
