package twofold.bench;

import twofold.design.Design;
import twofold.design.Shape;

/** The ring that speed is measured on, opened into a standing wave between its first mirror and its last. */
public final class TwelvePartWave {
    private TwelvePartWave() {}

    /** The standing wave. */
    public static Design design() {
        return Design.of("speed", 1064e-9, Shape.STANDING_WAVE, TwelvePartRing.parts());
    }
}
