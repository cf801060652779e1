package twofold.design;

/**
 * The rectangle that a part's mount takes on the table.
 *
 * @param width across the beam or along a mirror's face, m
 * @param depth along the beam or behind a mirror's face, m
 */
public record Mount(double width, double depth) {}
