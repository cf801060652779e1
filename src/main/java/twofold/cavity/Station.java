package twofold.cavity;

/**
 * The beam of one plane at a face of a part, in the forward pass.
 *
 * @param part index in the design
 * @param face which
 * @param radius 1/e² radius of intensity across the beam, m; never the footprint
 * @param curvature of the wavefront just after the face, 1/m, positive diverging, 0 plane
 */
public record Station(int part, Face face, double radius, double curvature) {}
