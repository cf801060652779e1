/**
 * Where things stand on the table: from a design to legs, headings, angles of incidence and footprints.
 *
 * <p>{@link twofold.layout.Layout#of} gives a {@link twofold.layout.Laid} or the list of everything that is wrong, the
 * design's own problems among it. {@link twofold.layout.Layout#typed} lays out legs and angles that a person typed.
 * {@link twofold.layout.Clearance} measures gaps between mounts and beams.
 *
 * <p>Seen from above: x to the right, y up, angles counter-clockwise, left of the beam positive, SI throughout. A slab
 * with tangentially tilted faces shifts the beam sideways, so a leg's heading is not the line between its mirrors;
 * {@link twofold.layout.Aim} holds that geometry once, for reports and for the millions of evaluations alike.
 */
package twofold.layout;
