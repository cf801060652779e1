package twofold.window.plot;

import java.util.List;
import java.util.Optional;
import twofold.design.Lever;
import twofold.picture.Painter;

/** What came of a sweep or map, ready to be drawn and pointed at. Values of levers are in SI. */
interface Picture {
    /** The levers that a point sets. */
    List<Lever> levers();

    /** Draws it, with a point that is said in numbers. */
    void draw(Painter on, double width, double height, Optional<double[]> point);

    /** The levers' values at a pixel, as round as a pixel is wide; empty beside the picture. */
    Optional<double[]> at(double x, double y, double width, double height);

    /** Where the design stands; empty where its levers have no one value. */
    Optional<double[]> now();

    /**
     * A point a step away, within the levers' ranges.
     *
     * @param right steps of the first lever
     * @param up steps of the second, where there is one
     */
    double[] moved(double[] from, int right, int up);
}
