package twofold.window.plot;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import twofold.design.Lever;
import twofold.picture.Painter;
import twofold.picture.SweepDrawing;
import twofold.picture.SweepPlot;
import twofold.study.Levered;
import twofold.study.Swept;

/** A sweep to point at. */
final class SweepPicture implements Picture {
    private final Swept swept;
    private final SweepDrawing drawing;
    private final Track track;
    private final OptionalDouble now;

    SweepPicture(Swept swept) {
        this.swept = swept;
        drawing = new SweepDrawing(SweepPlot.of(swept));
        track = new Track(swept.axis());
        now = Levered.now(swept.question().laid(), swept.axis().lever());
    }

    @Override
    public List<Lever> levers() {
        return swept.question().levers();
    }

    @Override
    public void draw(Painter on, double width, double height, Optional<double[]> point) {
        drawing.draw(
                on,
                width,
                height,
                point.map(p -> OptionalDouble.of(swept.axis().unit().fromSi(p[0])))
                        .orElse(OptionalDouble.empty()));
    }

    @Override
    public Optional<double[]> at(double x, double y, double width, double height) {
        OptionalDouble here = drawing.valueAt(x, width, height);
        OptionalDouble beside = drawing.valueAt(x + 1, width, height);
        if (beside.isEmpty()) {
            beside = drawing.valueAt(x - 1, width, height);
        }
        return here.isEmpty() || beside.isEmpty()
                ? Optional.empty()
                : Optional.of(
                        new double[] {track.value(here.getAsDouble(), beside.getAsDouble() - here.getAsDouble())});
    }

    @Override
    public Optional<double[]> now() {
        return now.isPresent() ? Optional.of(new double[] {now.getAsDouble()}) : Optional.empty();
    }

    @Override
    public double[] moved(double[] from, int right, int up) {
        return new double[] {track.moved(from[0], right)};
    }
}
