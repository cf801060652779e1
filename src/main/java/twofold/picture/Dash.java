package twofold.picture;

import java.util.List;

/** The rhythm of a line; its ends are butt. */
public enum Dash {
    /** No gaps. */
    SOLID,
    /** The sagittal plane's. */
    DASHED,
    /** The axis's. */
    DASH_DOT,
    /** For ties and leaders. */
    DOTTED;

    /** Lengths in px, on and off by turns; none for a solid line. */
    public List<Double> lengths() {
        return switch (this) {
            case SOLID -> List.of();
            case DASHED -> List.of(7.0, 4.0);
            case DASH_DOT -> List.of(9.0, 3.0, 1.5, 3.0);
            case DOTTED -> List.of(1.5, 3.0);
        };
    }
}
