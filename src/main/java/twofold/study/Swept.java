package twofold.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import twofold.design.Quantity;
import twofold.optics.Plane;

/**
 * Quantities over one lever with where each plane is stable on the way. Its values ascend; its arrays are nobody's to change.
 */
public final class Swept {
    /** The most points: no picture shows more. */
    public static final int MOST = 10_000;

    private final Question question;
    private final Axis axis;
    private final List<ZonesAlong.Stretch> stable;
    private final double[] answers;

    private Swept(Question question, Axis axis, List<ZonesAlong.Stretch> stable, double[] answers) {
        this.question = question;
        this.axis = axis;
        this.stable = List.copyOf(stable);
        this.answers = answers;
    }

    /**
     * Asks at every point of an axis.
     *
     * @param question of any quantities and the axis' lever
     * @param axis ascending, up to {@link #MOST} values
     * @param threads to ask on
     * @param progress told how far it is; can stop it
     * @return empty where it was stopped
     */
    public static Optional<Swept> of(Question question, Axis axis, int threads, Progress progress) {
        if (axis.size() > MOST) {
            throw new IllegalArgumentException(axis.size() + " values; accepted: up to " + MOST);
        }
        Plane[] planes = Plane.values();
        int width = question.quantities().size();
        List<Asked> asked = Stream.concat(
                        question.quantities().stream(),
                        Stream.of(planes).map(p -> Asked.of(Quantity.STABILITY_MARGIN, p)))
                .toList();
        Survey survey = new Survey(new Question(question.laid(), question.levers(), asked), List.of(axis));
        double[] answers = new double[axis.size() * width];
        double[][] margins = new double[planes.length][axis.size()];
        boolean ended = survey.run(
                threads,
                piece -> {
                    for (int i = 0; i < piece.count(); i++) {
                        int at = (int) piece.first() + i;
                        for (int q = 0; q < width; q++) {
                            answers[at * width + q] = piece.answer(i, q);
                        }
                        for (int p = 0; p < margins.length; p++) {
                            margins[p][at] = piece.answer(i, width + p);
                        }
                    }
                    return piece.count();
                },
                count -> {},
                progress);
        if (!ended) {
            return Optional.empty();
        }
        List<ZonesAlong.Stretch> stable = new ArrayList<>();
        for (int p = 0; p < planes.length; p++) {
            ZonesAlong zones = ZonesAlong.of(question.laid(), axis, planes[p]);
            stable.addAll(zones.stable(question.laid(), axis, margins[p]));
        }
        return Optional.of(new Swept(question, axis, stable, answers));
    }

    /** The design, the lever and the quantities. */
    public Question question() {
        return question;
    }

    /** The lever's values. */
    public Axis axis() {
        return axis;
    }

    /** Where each plane is stable. */
    public List<ZonesAlong.Stretch> stable() {
        return stable;
    }

    /**
     * What a quantity comes to, in SI; NaN where undefined.
     *
     * @param point number of the lever's value
     * @param quantity its number in the question
     */
    public double answer(int point, int quantity) {
        return answers[point * question.quantities().size() + quantity];
    }
}
