package twofold.window.plot;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import twofold.design.Lever;
import twofold.picture.MapDrawing;
import twofold.picture.MapPlot;
import twofold.picture.Painter;
import twofold.study.Levered;
import twofold.study.Mapped;

/** A map to point at. */
final class MapPicture implements Picture {
    private final Mapped mapped;
    private final MapDrawing drawing;
    private final Track x;
    private final Track y;
    private final OptionalDouble nowX;
    private final OptionalDouble nowY;

    MapPicture(Mapped mapped) {
        this.mapped = mapped;
        drawing = new MapDrawing(MapPlot.of(mapped));
        x = new Track(mapped.x());
        y = new Track(mapped.y());
        nowX = Levered.now(mapped.question().laid(), mapped.x().lever());
        nowY = Levered.now(mapped.question().laid(), mapped.y().lever());
    }

    @Override
    public List<Lever> levers() {
        return mapped.question().levers();
    }

    @Override
    public void draw(Painter on, double width, double height, Optional<double[]> point) {
        drawing.draw(
                on,
                width,
                height,
                point.map(p -> new MapPlot.Place(
                        mapped.x().unit().fromSi(p[0]), mapped.y().unit().fromSi(p[1]))));
    }

    @Override
    public Optional<double[]> at(double px, double py, double width, double height) {
        Optional<MapPlot.Place> here = drawing.pointAt(px, py, width, height);
        Optional<MapPlot.Place> right =
                drawing.pointAt(px + 1, py, width, height).or(() -> drawing.pointAt(px - 1, py, width, height));
        Optional<MapPlot.Place> below =
                drawing.pointAt(px, py + 1, width, height).or(() -> drawing.pointAt(px, py - 1, width, height));
        if (here.isEmpty() || right.isEmpty() || below.isEmpty()) {
            return Optional.empty();
        }
        MapPlot.Place at = here.get();
        return Optional.of(new double[] {
            x.value(at.x(), right.get().x() - at.x()),
            y.value(at.y(), below.get().y() - at.y())
        });
    }

    @Override
    public Optional<double[]> now() {
        return nowX.isPresent() && nowY.isPresent()
                ? Optional.of(new double[] {nowX.getAsDouble(), nowY.getAsDouble()})
                : Optional.empty();
    }

    @Override
    public double[] moved(double[] from, int right, int up) {
        return new double[] {x.moved(from[0], right), y.moved(from[1], up)};
    }
}
