package twofold.design;

import java.util.List;
import java.util.Optional;

/**
 * What a person states: parts in beam order, and what is asked of them. Immutable; edited into another design.
 *
 * @param title may be empty
 * @param notes may be empty
 * @param wavelength in vacuum, m
 * @param shape how the light closes
 * @param parts in beam order; the first is a mirror, of a standing wave the last too
 * @param holds what keeps its value while mirrors move
 * @param levers what may be moved
 * @param requirements what is asked
 * @param tolerances how far the built thing may be off
 */
public record Design(
        String title,
        String notes,
        double wavelength,
        Shape shape,
        List<Part> parts,
        List<Hold> holds,
        List<Lever> levers,
        List<Requirement> requirements,
        List<Tolerance> tolerances) {

    /** The most parts that a design may have. */
    public static final int MOST_PARTS = 1000;

    /** Shortest vacuum wavelength accepted, m. */
    public static final double SHORTEST_WAVE = 1e-9;

    /** Longest vacuum wavelength accepted, m. */
    public static final double LONGEST_WAVE = 1e-3;

    /** Copies the lists. */
    public Design {
        parts = List.copyOf(parts);
        holds = List.copyOf(holds);
        levers = List.copyOf(levers);
        requirements = List.copyOf(requirements);
        tolerances = List.copyOf(tolerances);
    }

    /** A design of parts alone. */
    public static Design of(String title, double wavelength, Shape shape, List<Part> parts) {
        return new Design(title, "", wavelength, shape, parts, List.of(), List.of(), List.of(), List.of());
    }

    /** This design with other parts. */
    public Design withParts(List<Part> other) {
        return new Design(title, notes, wavelength, shape, other, holds, levers, requirements, tolerances);
    }

    /** This design with other holds. */
    public Design withHolds(List<Hold> other) {
        return new Design(title, notes, wavelength, shape, parts, other, levers, requirements, tolerances);
    }

    /** This design with other levers. */
    public Design withLevers(List<Lever> other) {
        return new Design(title, notes, wavelength, shape, parts, holds, other, requirements, tolerances);
    }

    /** This design with other requirements. */
    public Design withRequirements(List<Requirement> other) {
        return new Design(title, notes, wavelength, shape, parts, holds, levers, other, tolerances);
    }

    /** This design with other tolerances. */
    public Design withTolerances(List<Tolerance> other) {
        return new Design(title, notes, wavelength, shape, parts, holds, levers, requirements, other);
    }

    /** The index of the part with a name. */
    public Optional<Integer> indexOf(String name) {
        for (int i = 0; i < parts.size(); i++) {
            if (parts.get(i).name().equals(name)) {
                return Optional.of(i);
            }
        }
        return Optional.empty();
    }

    /** The mirrors in beam order. */
    public List<Mirror> mirrors() {
        return parts.stream()
                .filter(Mirror.class::isInstance)
                .map(Mirror.class::cast)
                .toList();
    }

    /**
     * Everything that is wrong with what is stated, apart from the plan itself: ranges, names, counts and references.
     * Whether parts fit the plan is for {@code layout} to say.
     */
    public List<Problem> problems() {
        return new Review(this).problems();
    }

    /**
     * What is wrong with asking a requirement of this design: its place, plane, edge, bound and lever.
     *
     * @param requirement not necessarily one of this design's
     */
    public List<Problem> problems(Requirement requirement) {
        return new Review(this).problems(requirement);
    }
}
