/**
 * The bench, the beam and what belongs to them as pictures, described once to a narrow {@link twofold.picture.Painter}.
 *
 * <p>A drawing is a class that draws a {@link twofold.cavity.Cavity} onto a painter: {@link twofold.picture.BenchDrawing},
 * {@link twofold.picture.BeamDrawing}, {@link twofold.picture.CloseUpDrawing}, {@link twofold.picture.StabilityDrawing};
 * {@link twofold.picture.Sheet} puts bench and beam on one page. What a cavity is worth is drawn by
 * {@link twofold.picture.ZoneStripDrawing}, {@link twofold.picture.GDiagramDrawing} and
 * {@link twofold.picture.LedgerDrawing}; studies by {@link twofold.picture.SweepDrawing} and
 * {@link twofold.picture.MapDrawing}, from plain records in the units that they show. Painters: {@link twofold.picture.SvgPainter} and
 * {@link twofold.picture.ImagePainter} here, the window's canvas there. No toolkit is needed; java.awt is used to paint PNG
 * and for nothing else.
 *
 * <p>Guarantees: the same description gives the same picture on every painter, and the same SVG bytes on every run and in
 * every locale. Colours are {@link twofold.picture.Ink} tokens with one table of values. Tangential and sagittal are
 * never told apart by colour alone: tangential above, solid, hatched ///; sagittal below, dashed, hatched \\\. No text is
 * smaller than 11 px.
 *
 * <p>Pixels: x to the right, y down, angles clockwise as seen. Model: metres, x to the right, y up.
 * {@link twofold.picture.Viewport} and {@link twofold.picture.Stretch} lead from one to the other and back.
 */
package twofold.picture;
