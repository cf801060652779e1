package twofold.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.jspecify.annotations.Nullable;
import twofold.cavity.Chain;
import twofold.cavity.Trial;
import twofold.design.Design;
import twofold.design.Field;
import twofold.design.Lever;
import twofold.design.Part;
import twofold.design.Place;
import twofold.layout.Mover;
import twofold.layout.Plan;
import twofold.layout.Target;

/**
 * Sets levers in a trial: all that a lever lists to its one value. Fields are set first, then mirrors move from where the
 * design has them, so that legs, incidences and coordinates have their values and what else the mover keeps is as the
 * fields left it. The answer does not depend on the order of levers, nor on what the trial was set to before.
 *
 * <p>Setting fields, and moving a rigid arm, allocates nothing. Confined to a thread.
 */
public final class Setting {
    private final int[] slots;
    /** The lever of each slot. */
    private final int[] slotLever;

    private final @Nullable Mover mover;
    /** The lever of each of the mover's values. */
    private final int[] moverLever;

    private final double[] moverValues;
    private final boolean slabsChange;
    private final Plan plan;
    private final int[] x;
    private final int[] y;

    private Setting(Chain chain, List<Lever> levers) {
        Design design = chain.laid().design();
        List<Integer> slotList = new ArrayList<>();
        List<Integer> slotLevers = new ArrayList<>();
        List<List<Target>> targets = new ArrayList<>();
        List<Integer> targetLevers = new ArrayList<>();
        boolean slabs = false;
        for (int i = 0; i < levers.size(); i++) {
            Lever lever = levers.get(i);
            List<Target> moved = new ArrayList<>();
            for (Place place : lever.of()) {
                Optional<Target> target = Target.of(design, lever.set(), place);
                if (target.isPresent()) {
                    moved.add(target.get());
                    continue;
                }
                int part = design.indexOf(place.first()).orElseThrow();
                Part what = design.parts().get(part);
                slotList.add(chain.slot(part, what.kind().field(lever.set()).orElseThrow()));
                slotLevers.add(i);
                slabs |= what.kind().isSlab() && !lever.set().equals(Field.ALONG.json());
            }
            if (!moved.isEmpty()) {
                targets.add(moved);
                targetLevers.add(i);
            }
        }
        slots = slotList.stream().mapToInt(Integer::intValue).toArray();
        slotLever = slotLevers.stream().mapToInt(Integer::intValue).toArray();
        mover = targets.isEmpty() ? null : Mover.of(chain.laid(), targets);
        moverLever = targetLevers.stream().mapToInt(Integer::intValue).toArray();
        moverValues = new double[moverLever.length];
        slabsChange = slabs;
        plan = Plan.of(chain.laid());
        x = new int[plan.mirrors()];
        y = new int[plan.mirrors()];
        for (int m = 0; m < x.length; m++) {
            int part = design.indexOf(design.mirrors().get(m).name()).orElseThrow();
            x[m] = chain.x(part);
            y[m] = chain.y(part);
        }
    }

    /**
     * Levers compiled against a chain.
     *
     * @throws IllegalArgumentException where a lever sets what light does not feel, see {@link #canSet}
     */
    public static Setting of(Chain chain, List<Lever> levers) {
        return new Setting(chain, levers);
    }

    /** Whether all that a lever sets is a number of the chain or the plan. */
    public static boolean canSet(Chain chain, Lever lever) {
        Design design = chain.laid().design();
        return lever.of().stream().allMatch(place -> {
            if (Target.of(design, lever.set(), place).isPresent()) {
                return true;
            }
            OptionalInt part = design.indexOf(place.first()).stream()
                    .mapToInt(Integer::intValue)
                    .findFirst();
            return part.isPresent()
                    && design.parts()
                            .get(part.getAsInt())
                            .kind()
                            .field(lever.set())
                            .filter(f -> chain.has(part.getAsInt(), f))
                            .isPresent();
        });
    }

    /**
     * Sets the levers.
     *
     * @param values in SI, one a lever
     * @param trial of the same chain; to be run then
     * @return whether the mirrors could be laid out so; if not, the trial's numbers mean nothing
     */
    public boolean set(double[] values, Trial trial) {
        for (int i = 0; i < slots.length; i++) {
            trial.set(slots[i], values[slotLever[i]]);
        }
        if (mover == null) {
            return true;
        }
        if (slabsChange) {
            trial.load(plan);
            mover.load(plan);
        }
        for (int i = 0; i < moverLever.length; i++) {
            moverValues[i] = values[moverLever[i]];
        }
        if (!mover.move(moverValues, plan)) {
            return false;
        }
        for (int m = 0; m < x.length; m++) {
            put(trial, x[m], plan.x(m));
            put(trial, y[m], plan.y(m));
        }
        return true;
    }

    private static void put(Trial trial, int slot, double value) {
        if (trial.get(slot) != value) {
            trial.set(slot, value);
        }
    }
}
