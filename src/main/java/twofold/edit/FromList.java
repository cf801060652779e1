package twofold.edit;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import twofold.design.Design;
import twofold.design.Problem;
import twofold.layout.Laid;
import twofold.layout.Layout;
import twofold.layout.Outcome;

/**
 * A plan from a typed list of legs and angles: "480, 105, 620; 7.9°, 7.9°".
 *
 * <pre>
 * list   = legs [";" angles [";" radii]]
 * legs   = length {"," length}     along the beam; in mm, or with a unit: 48 cm, 0.2 in
 * angles = angle {"," angle}       of incidence, at the mirror after each leg; in degrees, or with a unit
 * angle  = number                  turning the other way than at the mirror before; at the first to the left
 *        | number ("L" | "R")      turning to the left or right, looking along the beam; before or behind the number,
 *                                  also "left", "right"
 *        | ("+" | "-") number      to the left, to the right
 * radii  = radius {"," radius}     in mm, negative convex, or "flat"
 * </pre>
 *
 * <p>One angle fewer than legs makes a standing wave: two angles of one turn an X, of opposite turns a Z. As many angles as
 * legs, three at least, make a ring, the last angle being that at the first mirror; turns that are not stated are then those
 * with which it closes best. Radii are those of the folds, or of all mirrors from the first; one alone is that of every fold.
 * Without radii mirrors are flat. Spaces and line breaks may stand anywhere between; an empty group is one of none.
 *
 * <p>A ring that misses its beginning by more than 0.01 mm or 0.01° is refused with the closest list that closes; within
 * that, its mirrors stand as typed from the first, and the last leg and the angles at its ends follow.
 *
 * @param design the plan; present exactly when there is no fault
 * @param faults what is wrong, in order of their places
 * @param closing of a ring that does not close, the closest list that does, ready to be typed
 */
public record FromList(Optional<Design> design, List<Fault> faults, Optional<String> closing) {
    /** Copies the list. */
    public FromList {
        faults = List.copyOf(faults);
    }

    /**
     * What is wrong with a part of the text.
     *
     * @param from index of its first character, from 0
     * @param to index behind its last character
     * @param found in words
     * @param accepted in words
     */
    public record Fault(int from, int to, String found, String accepted) {
        /** One line: "character 6: found …; accepted: …", counted from 1. */
        public String line() {
            return "character " + (from + 1) + ": " + found + "; accepted: " + accepted;
        }
    }

    /**
     * The plan of a list.
     *
     * @param wavelength of the design, in vacuum, m
     */
    public static FromList read(String text, double wavelength) {
        ListText list = ListText.of(text);
        if (!list.faults().isEmpty()) {
            return refused(list.faults());
        }
        ListedPlan plan = ListedPlan.of(list);
        if (plan.isRing()) {
            RingClosure closure = RingClosure.of(plan);
            if (!closure.closes()) {
                Optional<String> closing = closure.nearest().map(ListedPlan::text);
                Fault fault = new Fault(
                        list.legs().get(0).from(),
                        list.angles().get(list.angles().size() - 1).to(),
                        "found a ring that misses its beginning by " + closure.words(),
                        "lengths and angles that close"
                                + closing.map(c -> ", the closest: " + c).orElse(""));
                return new FromList(Optional.empty(), List.of(fault), closing);
            }
            plan = closure.plan();
        }
        Outcome<Laid> laid = plan.design(wavelength).then(Layout::of);
        return laid.value().isPresent()
                ? new FromList(laid.value().map(Laid::design), List.of(), Optional.empty())
                : refused(List.of(
                        new Fault(0, text.length(), said(laid, Problem::found), said(laid, Problem::accepted))));
    }

    private static String said(Outcome<Laid> laid, java.util.function.Function<Problem, String> what) {
        return laid.problems().stream().map(what).distinct().collect(Collectors.joining("; "));
    }

    private static FromList refused(List<Fault> faults) {
        List<Fault> sorted = new ArrayList<>(faults);
        sorted.sort(java.util.Comparator.comparingInt(Fault::from));
        return new FromList(Optional.empty(), sorted, Optional.empty());
    }
}
