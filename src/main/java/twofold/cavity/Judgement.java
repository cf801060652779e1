package twofold.cavity;

import java.util.List;
import java.util.Optional;
import twofold.design.Bound;
import twofold.design.Lever;
import twofold.design.Requirement;
import twofold.design.Unit;
import twofold.optics.Plane;

/**
 * How a cavity does on one requirement.
 *
 * @param requirement what is asked
 * @param value what it comes to, in SI; of both planes the worse one's; NaN where undefined
 * @param margin distance to the nearest bound, over half the width, over {@code within}, or over |bound|; negative where
 *     not met; NaN for a wish and where undefined
 * @param verdict whether it is met
 */
public record Judgement(Requirement requirement, double value, double margin, Verdict verdict) {
    /** Whether a requirement is met. */
    public enum Verdict {
        /** Its margin is at least 0. */
        MET("met"),
        /** Its margin is below 0, or its value is undefined. */
        NOT_MET("not met"),
        /** It ranks solutions and cannot be failed. */
        WISH("wish"),
        /** It asks for the worst over a lever's range, and the range was not run. */
        OPEN("open");

        private final String word;

        Verdict(String word) {
            this.word = word;
        }

        /** The word in answers. */
        public String word() {
            return word;
        }
    }

    /** Judges a requirement without {@code over}, by a trial that has run. */
    public static Judgement of(Requirement requirement, Chain chain, Trial trial) {
        double worst = Double.NaN;
        for (Optional<Plane> plane : planes(requirement)) {
            double value = reading(requirement, plane, chain).of(trial);
            worst = plane.equals(planes(requirement).get(0)) ? value : worse(requirement, worst, value);
        }
        return judged(requirement, worst);
    }

    /** Judges a requirement with {@code over}, by the worst value over the lever's range. */
    public static Judgement over(Requirement requirement, Chain chain, Sweeper sweeper) {
        String name = requirement.over().orElseThrow();
        Lever lever = chain.laid().design().levers().stream()
                .filter(l -> l.name().equals(name))
                .findFirst()
                .orElseThrow();
        double worst = Double.NaN;
        for (Optional<Plane> plane : planes(requirement)) {
            double value = sweeper.worst(lever, c -> reading(requirement, plane, c), v -> goodness(requirement, v));
            worst = plane.equals(planes(requirement).get(0)) ? value : worse(requirement, worst, value);
        }
        return judged(requirement, worst);
    }

    /** A requirement whose range was not run. */
    static Judgement open(Requirement requirement) {
        return new Judgement(requirement, Double.NaN, Double.NaN, Verdict.OPEN);
    }

    private static Judgement judged(Requirement requirement, double value) {
        double margin = margin(requirement, value);
        Verdict verdict = requirement.bound() instanceof Bound.Prefer
                ? Verdict.WISH
                : margin >= 0 ? Verdict.MET : Verdict.NOT_MET;
        // Adding 0 turns −0 into 0.
        return new Judgement(requirement, value + 0.0, margin + 0.0, verdict);
    }

    private static Reading reading(Requirement r, Optional<Plane> plane, Chain chain) {
        return Reading.of(r.what(), r.at(), plane, r.edge(), chain);
    }

    /** The planes in which a requirement must hold; one without a plane where its quantity has none. */
    public static List<Optional<Plane>> planes(Requirement r) {
        return r.plane()
                .map(p -> switch (p) {
                    case TANGENTIAL -> List.of(Optional.of(Plane.TANGENTIAL));
                    case SAGITTAL -> List.of(Optional.of(Plane.SAGITTAL));
                    case BOTH -> List.of(Optional.of(Plane.TANGENTIAL), Optional.of(Plane.SAGITTAL));
                })
                .orElse(List.of(Optional.empty()));
    }

    /** Undefined is worst. */
    private static double worse(Requirement r, double one, double other) {
        if (Double.isNaN(one) || Double.isNaN(other)) {
            return Double.NaN;
        }
        return goodness(r, one) <= goodness(r, other) ? one : other;
    }

    /** How good a value is: its margin, or for a wish how far it goes the way that is wished. */
    public static double goodness(Requirement requirement, double value) {
        if (requirement.bound() instanceof Bound.Prefer wish) {
            return switch (wish) {
                case SMALLEST -> -value;
                case LARGEST -> value;
            };
        }
        return margin(requirement, value);
    }

    /**
     * The margin of a value, a pure number.
     *
     * @param value in SI
     * @return NaN for a wish and for NaN
     */
    public static double margin(Requirement requirement, double value) {
        Bound bound = requirement.bound();
        if (bound instanceof Bound.Between b) {
            return Math.min(value - b.low(), b.high() - value) / ((b.high() - b.low()) / 2);
        } else if (bound instanceof Bound.Equal e) {
            return (e.within() - Math.abs(value - e.value())) / e.within();
        } else if (bound instanceof Bound.AtLeast a) {
            return (value - a.value()) / scale(requirement, a.value());
        } else if (bound instanceof Bound.AtMost a) {
            return (a.value() - value) / scale(requirement, a.value());
        }
        return Double.NaN;
    }

    /** |bound|, or 1 in the quantity's own unit. */
    private static double scale(Requirement requirement, double bound) {
        Unit unit = requirement.what().unit();
        return bound == 0 ? unit.toSi(1) : Math.abs(bound);
    }
}
