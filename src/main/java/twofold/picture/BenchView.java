package twofold.picture;

import java.util.OptionalDouble;
import java.util.OptionalInt;

/**
 * What of the bench is shown, and how.
 *
 * @param width of the pane, px
 * @param height of the pane, px
 * @param viewport where the table lies in it
 * @param magnify how many times wider than true the beam is drawn, at least 1
 * @param selected index of the part that is selected
 * @param crosshair path from the first mirror to the point that is tied to the beam view, m
 */
public record BenchView(
        double width,
        double height,
        Viewport viewport,
        double magnify,
        OptionalInt selected,
        OptionalDouble crosshair) {

    /** This view through another viewport. */
    public BenchView through(Viewport other) {
        return new BenchView(width, height, other, magnify, selected, crosshair);
    }

    /** This view with the beam drawn so many times wider than true. */
    public BenchView magnified(double factor) {
        return new BenchView(width, height, viewport, factor, selected, crosshair);
    }

    /** This view with a part selected, or none. */
    public BenchView selecting(OptionalInt part) {
        return new BenchView(width, height, viewport, magnify, part, crosshair);
    }

    /** This view with the crosshair at a path, or nowhere. */
    public BenchView crossing(OptionalDouble path) {
        return new BenchView(width, height, viewport, magnify, selected, path);
    }
}
