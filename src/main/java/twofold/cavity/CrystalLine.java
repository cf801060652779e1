package twofold.cavity;

import java.util.Optional;

/**
 * Where the light of one plane has its waist in a crystal or plate. With a thermal lens the line tells of the half before
 * it, and {@code afterLens} of the half behind it.
 *
 * @param radius of the waist of the light inside, m
 * @param offset from the part's middle to the waist, along the beam inside, m, positive downstream
 * @param shiftToCentre how far to move the part along its leg, to first order, so that the waist is in its middle, m
 * @param rayleigh inside, m
 * @param inside whether the waist lies in the part, or in the half that the line tells of
 * @param afterLens the half behind the thermal lens
 */
public record CrystalLine(
        double radius,
        double offset,
        double shiftToCentre,
        double rayleigh,
        boolean inside,
        Optional<CrystalLine> afterLens) {}
