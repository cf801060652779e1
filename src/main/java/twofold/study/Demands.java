package twofold.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import twofold.cavity.Chain;
import twofold.cavity.Judgement;
import twofold.cavity.Reading;
import twofold.design.Bound;
import twofold.design.Design;
import twofold.design.Lever;
import twofold.design.Quantity;
import twofold.design.Requirement;
import twofold.layout.Laid;
import twofold.optics.Plane;

/** What a design's requirements ask while levers move, and how well they all hold: the smallest of their margins. */
final class Demands {
    /** A requirement in one plane. */
    private record Demand(Requirement requirement, Optional<Plane> plane) {
        Reading reading(Chain chain) {
            return Reading.of(requirement.what(), requirement.at(), plane, requirement.edge(), chain);
        }

        double margin(double value) {
            return Judgement.margin(requirement, value);
        }
    }

    /** A number while levers stand at values in SI. */
    private interface Answer {
        double at(double[] values);
    }

    private final List<Demand> cheap = new ArrayList<>();
    private final List<Demand> dear = new ArrayList<>();

    private Demands() {}

    /** The requirements of a design; a wish asks for nothing. Empty where nothing is asked. */
    static Optional<Demands> of(Design design) {
        Demands demands = new Demands();
        for (Requirement r : design.requirements()) {
            if (!(r.bound() instanceof Bound.Prefer)) {
                // A range is hundreds of runs, and a clearance takes as long as a hundred readings of light.
                boolean isDear = r.over().isPresent() || r.what() == Quantity.CLEARANCE;
                for (Optional<Plane> plane : Judgement.planes(r)) {
                    (isDear ? demands.dear : demands.cheap).add(new Demand(r, plane));
                }
            }
        }
        return demands.cheap.isEmpty() && demands.dear.isEmpty() ? Optional.empty() : Optional.of(demands);
    }

    /** The quantities whose values a {@link Judge} is to be handed, in this order. */
    List<Asked> quantities() {
        return cheap.stream().map(d -> Asked.of(d.requirement(), d.plane())).toList();
    }

    /** Whether the shortcut of {@link Judge#margin} is ever taken. */
    boolean hasShortcut() {
        return !cheap.isEmpty() && !dear.isEmpty();
    }

    /** Judges points of a study; confined to a thread. */
    final class Judge {
        private final Asker asker;
        private final double[] known = new double[cheap.size()];
        private final List<Answer> answers = new ArrayList<>();

        /** Of a design while levers of it move. */
        Judge(Laid laid, List<Lever> levers) {
            asker = Asker.of(
                    laid,
                    levers,
                    cheap.stream()
                            .<Function<Chain, Reading>>map(d -> d::reading)
                            .toList());
            dear.forEach(d ->
                    answers.add(d.requirement().over().isPresent() ? worst(d, laid, levers) : read(d, laid, levers)));
        }

        private Answer read(Demand demand, Laid laid, List<Lever> levers) {
            Asker alone = Asker.of(laid, levers, List.<Function<Chain, Reading>>of(demand::reading));
            double[] answer = new double[1];
            return values -> {
                alone.ask(values, answer, 0);
                return answer[0];
            };
        }

        private Answer worst(Demand demand, Laid laid, List<Lever> levers) {
            String name = demand.requirement().over().orElseThrow();
            Lever lever = laid.design().levers().stream()
                    .filter(l -> l.name().equals(name))
                    .findFirst()
                    .orElseThrow();
            return new Worst(laid, levers, lever, demand::reading, demand::margin)::value;
        }

        /**
         * The smallest margin; NaN where one is undefined. A shortcut is taken where a cheap requirement is not met: the
         * dear ones are not asked then, and the number is below 0 but may not be the smallest.
         *
         * @param values of the levers, in SI
         * @param cheapOnes the quantities of {@link #quantities}, in SI
         */
        double margin(double[] values, double[] cheapOnes) {
            double least = cheapest(cheapOnes);
            for (int i = 0; i < answers.size() && least >= 0; i++) {
                least = Math.min(least, dear.get(i).margin(answers.get(i).at(values)));
            }
            return least;
        }

        /** The smallest margin without a shortcut; NaN where one is undefined. */
        double margin(double[] values) {
            asker.ask(values, known, 0);
            double least = cheapest(known);
            for (int i = 0; i < answers.size() && !Double.isNaN(least); i++) {
                least = Math.min(least, dear.get(i).margin(answers.get(i).at(values)));
            }
            return least;
        }

        private double cheapest(double[] values) {
            double least = Double.POSITIVE_INFINITY;
            for (int i = 0; i < values.length; i++) {
                least = Math.min(least, cheap.get(i).margin(values[i]));
            }
            return least;
        }
    }
}
